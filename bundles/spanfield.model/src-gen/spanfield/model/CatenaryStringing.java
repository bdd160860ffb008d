/**
 * Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0
 */
package spanfield.model;


/**
 * <!-- begin-user-doc -->
 * A representation of the model object '<em><b>Catenary Stringing</b></em>'.
 * <!-- end-user-doc -->
 *
 * <!-- begin-model-doc -->
 * Stringing by catenary constant.
 * <!-- end-model-doc -->
 *
 * <p>
 * The following features are supported:
 * </p>
 * <ul>
 *   <li>{@link spanfield.model.CatenaryStringing#getCatenaryConstantMetres <em>Catenary Constant Metres</em>}</li>
 * </ul>
 *
 * @see spanfield.model.SpanfieldPackage#getCatenaryStringing()
 * @model
 * @generated
 */
public interface CatenaryStringing extends Stringing {
	/**
	 * Returns the value of the '<em><b>Catenary Constant Metres</b></em>' attribute.
	 * The default value is <code>"0"</code>.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Catenary constant in metres: horizontal tension divided by weight per length.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Catenary Constant Metres</em>' attribute.
	 * @see #setCatenaryConstantMetres(double)
	 * @see spanfield.model.SpanfieldPackage#getCatenaryStringing_CatenaryConstantMetres()
	 * @model default="0"
	 * @generated
	 */
	double getCatenaryConstantMetres();

	/**
	 * Sets the value of the '{@link spanfield.model.CatenaryStringing#getCatenaryConstantMetres <em>Catenary Constant Metres</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Catenary Constant Metres</em>' attribute.
	 * @see #getCatenaryConstantMetres()
	 * @generated
	 */
	void setCatenaryConstantMetres(double value);

} // CatenaryStringing
