/**
 * Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0
 */
package spanfield.model;


/**
 * <!-- begin-user-doc -->
 * A representation of the model object '<em><b>Tension Stringing</b></em>'.
 * <!-- end-user-doc -->
 *
 * <!-- begin-model-doc -->
 * Stringing by horizontal tension.
 * <!-- end-model-doc -->
 *
 * <p>
 * The following features are supported:
 * </p>
 * <ul>
 *   <li>{@link spanfield.model.TensionStringing#getHorizontalTensionNewtons <em>Horizontal Tension Newtons</em>}</li>
 * </ul>
 *
 * @see spanfield.model.SpanfieldPackage#getTensionStringing()
 * @model
 * @generated
 */
public interface TensionStringing extends Stringing {
	/**
	 * Returns the value of the '<em><b>Horizontal Tension Newtons</b></em>' attribute.
	 * The default value is <code>"0"</code>.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Horizontal tension of one conductor in newtons; the catenary constant is the tension divided by the weight per length of the conductor.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Horizontal Tension Newtons</em>' attribute.
	 * @see #setHorizontalTensionNewtons(double)
	 * @see spanfield.model.SpanfieldPackage#getTensionStringing_HorizontalTensionNewtons()
	 * @model default="0"
	 * @generated
	 */
	double getHorizontalTensionNewtons();

	/**
	 * Sets the value of the '{@link spanfield.model.TensionStringing#getHorizontalTensionNewtons <em>Horizontal Tension Newtons</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Horizontal Tension Newtons</em>' attribute.
	 * @see #getHorizontalTensionNewtons()
	 * @generated
	 */
	void setHorizontalTensionNewtons(double value);

} // TensionStringing
