/**
 * Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0
 */
package spanfield.model;

import org.eclipse.emf.common.util.EList;

import org.eclipse.emf.ecore.EObject;

/**
 * <!-- begin-user-doc -->
 * A representation of the model object '<em><b>Stringing Section</b></em>'.
 * <!-- end-user-doc -->
 *
 * <!-- begin-model-doc -->
 * Consecutive spans whose wires hang with one catenary constant each.
 * <!-- end-model-doc -->
 *
 * <p>
 * The following features are supported:
 * </p>
 * <ul>
 *   <li>{@link spanfield.model.StringingSection#getFrom <em>From</em>}</li>
 *   <li>{@link spanfield.model.StringingSection#getTo <em>To</em>}</li>
 *   <li>{@link spanfield.model.StringingSection#getPhaseStringing <em>Phase Stringing</em>}</li>
 *   <li>{@link spanfield.model.StringingSection#getShieldStringing <em>Shield Stringing</em>}</li>
 *   <li>{@link spanfield.model.StringingSection#getExceptions <em>Exceptions</em>}</li>
 * </ul>
 *
 * @see spanfield.model.SpanfieldPackage#getStringingSection()
 * @model
 * @generated
 */
public interface StringingSection extends EObject {
	/**
	 * Returns the value of the '<em><b>From</b></em>' reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * First structure of the section. Absent: first of the line.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>From</em>' reference.
	 * @see #setFrom(Structure)
	 * @see spanfield.model.SpanfieldPackage#getStringingSection_From()
	 * @model
	 * @generated
	 */
	Structure getFrom();

	/**
	 * Sets the value of the '{@link spanfield.model.StringingSection#getFrom <em>From</em>}' reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>From</em>' reference.
	 * @see #getFrom()
	 * @generated
	 */
	void setFrom(Structure value);

	/**
	 * Returns the value of the '<em><b>To</b></em>' reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Last structure of the section. Absent: last of the line.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>To</em>' reference.
	 * @see #setTo(Structure)
	 * @see spanfield.model.SpanfieldPackage#getStringingSection_To()
	 * @model
	 * @generated
	 */
	Structure getTo();

	/**
	 * Sets the value of the '{@link spanfield.model.StringingSection#getTo <em>To</em>}' reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>To</em>' reference.
	 * @see #getTo()
	 * @generated
	 */
	void setTo(Structure value);

	/**
	 * Returns the value of the '<em><b>Phase Stringing</b></em>' containment reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Stringing of the phase conductors.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Phase Stringing</em>' containment reference.
	 * @see #setPhaseStringing(Stringing)
	 * @see spanfield.model.SpanfieldPackage#getStringingSection_PhaseStringing()
	 * @model containment="true" required="true"
	 * @generated
	 */
	Stringing getPhaseStringing();

	/**
	 * Sets the value of the '{@link spanfield.model.StringingSection#getPhaseStringing <em>Phase Stringing</em>}' containment reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Phase Stringing</em>' containment reference.
	 * @see #getPhaseStringing()
	 * @generated
	 */
	void setPhaseStringing(Stringing value);

	/**
	 * Returns the value of the '<em><b>Shield Stringing</b></em>' containment reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Stringing of the shield wires. Absent: as the phase conductors.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Shield Stringing</em>' containment reference.
	 * @see #setShieldStringing(Stringing)
	 * @see spanfield.model.SpanfieldPackage#getStringingSection_ShieldStringing()
	 * @model containment="true"
	 * @generated
	 */
	Stringing getShieldStringing();

	/**
	 * Sets the value of the '{@link spanfield.model.StringingSection#getShieldStringing <em>Shield Stringing</em>}' containment reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Shield Stringing</em>' containment reference.
	 * @see #getShieldStringing()
	 * @generated
	 */
	void setShieldStringing(Stringing value);

	/**
	 * Returns the value of the '<em><b>Exceptions</b></em>' containment reference list.
	 * The list contents are of type {@link spanfield.model.WireStringing}.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Stringing of single circuits or shield wires that differs.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Exceptions</em>' containment reference list.
	 * @see spanfield.model.SpanfieldPackage#getStringingSection_Exceptions()
	 * @model containment="true"
	 * @generated
	 */
	EList<WireStringing> getExceptions();

} // StringingSection
