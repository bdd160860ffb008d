/**
 * Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0
 */
package spanfield.model;


/**
 * <!-- begin-user-doc -->
 * A representation of the model object '<em><b>Strung Element</b></em>'.
 * <!-- end-user-doc -->
 *
 * <!-- begin-model-doc -->
 * A circuit or shield wire: something strung along a line.
 * <!-- end-model-doc -->
 *
 * <p>
 * The following features are supported:
 * </p>
 * <ul>
 *   <li>{@link spanfield.model.StrungElement#getConductor <em>Conductor</em>}</li>
 * </ul>
 *
 * @see spanfield.model.SpanfieldPackage#getStrungElement()
 * @model abstract="true"
 * @generated
 */
public interface StrungElement extends NamedElement {
	/**
	 * Returns the value of the '<em><b>Conductor</b></em>' reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Conductor from the catalogue.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Conductor</em>' reference.
	 * @see #setConductor(Conductor)
	 * @see spanfield.model.SpanfieldPackage#getStrungElement_Conductor()
	 * @model required="true"
	 * @generated
	 */
	Conductor getConductor();

	/**
	 * Sets the value of the '{@link spanfield.model.StrungElement#getConductor <em>Conductor</em>}' reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Conductor</em>' reference.
	 * @see #getConductor()
	 * @generated
	 */
	void setConductor(Conductor value);

} // StrungElement
