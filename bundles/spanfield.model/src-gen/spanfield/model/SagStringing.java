/**
 * Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0
 */
package spanfield.model;


/**
 * <!-- begin-user-doc -->
 * A representation of the model object '<em><b>Sag Stringing</b></em>'.
 * <!-- end-user-doc -->
 *
 * <!-- begin-model-doc -->
 * Stringing by sag. The sag holds in the longest span of the section; the other spans share its catenary constant.
 * <!-- end-model-doc -->
 *
 * <p>
 * The following features are supported:
 * </p>
 * <ul>
 *   <li>{@link spanfield.model.SagStringing#getSagMetres <em>Sag Metres</em>}</li>
 * </ul>
 *
 * @see spanfield.model.SpanfieldPackage#getSagStringing()
 * @model
 * @generated
 */
public interface SagStringing extends Stringing {
	/**
	 * Returns the value of the '<em><b>Sag Metres</b></em>' attribute.
	 * The default value is <code>"0"</code>.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Sag in metres at mid-span, measured vertically from the chord.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Sag Metres</em>' attribute.
	 * @see #setSagMetres(double)
	 * @see spanfield.model.SpanfieldPackage#getSagStringing_SagMetres()
	 * @model default="0"
	 * @generated
	 */
	double getSagMetres();

	/**
	 * Sets the value of the '{@link spanfield.model.SagStringing#getSagMetres <em>Sag Metres</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Sag Metres</em>' attribute.
	 * @see #getSagMetres()
	 * @generated
	 */
	void setSagMetres(double value);

} // SagStringing
