/**
 * Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0
 */
package spanfield.model;


/**
 * <!-- begin-user-doc -->
 * A representation of the model object '<em><b>Clearance Stringing</b></em>'.
 * <!-- end-user-doc -->
 *
 * <!-- begin-model-doc -->
 * Stringing by clearance: the catenary constant that leaves the given least clearance to the ground in the section.
 * <!-- end-model-doc -->
 *
 * <p>
 * The following features are supported:
 * </p>
 * <ul>
 *   <li>{@link spanfield.model.ClearanceStringing#getClearanceMetres <em>Clearance Metres</em>}</li>
 * </ul>
 *
 * @see spanfield.model.SpanfieldPackage#getClearanceStringing()
 * @model
 * @generated
 */
public interface ClearanceStringing extends Stringing {
	/**
	 * Returns the value of the '<em><b>Clearance Metres</b></em>' attribute.
	 * The default value is <code>"0"</code>.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Least clearance in metres between the lowest wire of the group and the ground.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Clearance Metres</em>' attribute.
	 * @see #setClearanceMetres(double)
	 * @see spanfield.model.SpanfieldPackage#getClearanceStringing_ClearanceMetres()
	 * @model default="0"
	 * @generated
	 */
	double getClearanceMetres();

	/**
	 * Sets the value of the '{@link spanfield.model.ClearanceStringing#getClearanceMetres <em>Clearance Metres</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Clearance Metres</em>' attribute.
	 * @see #getClearanceMetres()
	 * @generated
	 */
	void setClearanceMetres(double value);

} // ClearanceStringing
