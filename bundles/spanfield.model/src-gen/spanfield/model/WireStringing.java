/**
 * Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0
 */
package spanfield.model;

import org.eclipse.emf.common.util.EList;

import org.eclipse.emf.ecore.EObject;

/**
 * <!-- begin-user-doc -->
 * A representation of the model object '<em><b>Wire Stringing</b></em>'.
 * <!-- end-user-doc -->
 *
 * <!-- begin-model-doc -->
 * Stringing of chosen circuits or shield wires in a section.
 * <!-- end-model-doc -->
 *
 * <p>
 * The following features are supported:
 * </p>
 * <ul>
 *   <li>{@link spanfield.model.WireStringing#getWires <em>Wires</em>}</li>
 *   <li>{@link spanfield.model.WireStringing#getStringing <em>Stringing</em>}</li>
 * </ul>
 *
 * @see spanfield.model.SpanfieldPackage#getWireStringing()
 * @model
 * @generated
 */
public interface WireStringing extends EObject {
	/**
	 * Returns the value of the '<em><b>Wires</b></em>' reference list.
	 * The list contents are of type {@link spanfield.model.StrungElement}.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Circuits and shield wires for which the stringing holds.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Wires</em>' reference list.
	 * @see spanfield.model.SpanfieldPackage#getWireStringing_Wires()
	 * @model required="true"
	 * @generated
	 */
	EList<StrungElement> getWires();

	/**
	 * Returns the value of the '<em><b>Stringing</b></em>' containment reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * The stringing.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Stringing</em>' containment reference.
	 * @see #setStringing(Stringing)
	 * @see spanfield.model.SpanfieldPackage#getWireStringing_Stringing()
	 * @model containment="true" required="true"
	 * @generated
	 */
	Stringing getStringing();

	/**
	 * Sets the value of the '{@link spanfield.model.WireStringing#getStringing <em>Stringing</em>}' containment reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Stringing</em>' containment reference.
	 * @see #getStringing()
	 * @generated
	 */
	void setStringing(Stringing value);

} // WireStringing
