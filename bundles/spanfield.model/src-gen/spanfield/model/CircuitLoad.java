/**
 * Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0
 */
package spanfield.model;

import org.eclipse.emf.ecore.EObject;

/**
 * <!-- begin-user-doc -->
 * A representation of the model object '<em><b>Circuit Load</b></em>'.
 * <!-- end-user-doc -->
 *
 * <!-- begin-model-doc -->
 * Load of a circuit.
 * <!-- end-model-doc -->
 *
 * <p>
 * The following features are supported:
 * </p>
 * <ul>
 *   <li>{@link spanfield.model.CircuitLoad#getCircuit <em>Circuit</em>}</li>
 *   <li>{@link spanfield.model.CircuitLoad#getDirection <em>Direction</em>}</li>
 * </ul>
 *
 * @see spanfield.model.SpanfieldPackage#getCircuitLoad()
 * @model abstract="true"
 * @generated
 */
public interface CircuitLoad extends EObject {
	/**
	 * Returns the value of the '<em><b>Circuit</b></em>' reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * The circuit.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Circuit</em>' reference.
	 * @see #setCircuit(Circuit)
	 * @see spanfield.model.SpanfieldPackage#getCircuitLoad_Circuit()
	 * @model required="true"
	 * @generated
	 */
	Circuit getCircuit();

	/**
	 * Sets the value of the '{@link spanfield.model.CircuitLoad#getCircuit <em>Circuit</em>}' reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Circuit</em>' reference.
	 * @see #getCircuit()
	 * @generated
	 */
	void setCircuit(Circuit value);

	/**
	 * Returns the value of the '<em><b>Direction</b></em>' attribute.
	 * The default value is <code>"FORWARD"</code>.
	 * The literals are from the enumeration {@link spanfield.model.FlowDirection}.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Direction of the flow.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Direction</em>' attribute.
	 * @see spanfield.model.FlowDirection
	 * @see #setDirection(FlowDirection)
	 * @see spanfield.model.SpanfieldPackage#getCircuitLoad_Direction()
	 * @model default="FORWARD"
	 * @generated
	 */
	FlowDirection getDirection();

	/**
	 * Sets the value of the '{@link spanfield.model.CircuitLoad#getDirection <em>Direction</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Direction</em>' attribute.
	 * @see spanfield.model.FlowDirection
	 * @see #getDirection()
	 * @generated
	 */
	void setDirection(FlowDirection value);

} // CircuitLoad
