/**
 * Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0
 */
package spanfield.model;

import org.eclipse.emf.ecore.EObject;

/**
 * <!-- begin-user-doc -->
 * A representation of the model object '<em><b>Edge Point</b></em>'.
 * <!-- end-user-doc -->
 *
 * <!-- begin-model-doc -->
 * Edges of the right-of-way at a station.
 * <!-- end-model-doc -->
 *
 * <p>
 * The following features are supported:
 * </p>
 * <ul>
 *   <li>{@link spanfield.model.EdgePoint#getStationMetres <em>Station Metres</em>}</li>
 *   <li>{@link spanfield.model.EdgePoint#getLeftOffsetMetres <em>Left Offset Metres</em>}</li>
 *   <li>{@link spanfield.model.EdgePoint#getRightOffsetMetres <em>Right Offset Metres</em>}</li>
 * </ul>
 *
 * @see spanfield.model.SpanfieldPackage#getEdgePoint()
 * @model
 * @generated
 */
public interface EdgePoint extends EObject {
	/**
	 * Returns the value of the '<em><b>Station Metres</b></em>' attribute.
	 * The default value is <code>"0"</code>.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Station in metres.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Station Metres</em>' attribute.
	 * @see #setStationMetres(double)
	 * @see spanfield.model.SpanfieldPackage#getEdgePoint_StationMetres()
	 * @model default="0"
	 * @generated
	 */
	double getStationMetres();

	/**
	 * Sets the value of the '{@link spanfield.model.EdgePoint#getStationMetres <em>Station Metres</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Station Metres</em>' attribute.
	 * @see #getStationMetres()
	 * @generated
	 */
	void setStationMetres(double value);

	/**
	 * Returns the value of the '<em><b>Left Offset Metres</b></em>' attribute.
	 * The default value is <code>"0"</code>.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Offset of the left edge in metres; less than the right offset.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Left Offset Metres</em>' attribute.
	 * @see #setLeftOffsetMetres(double)
	 * @see spanfield.model.SpanfieldPackage#getEdgePoint_LeftOffsetMetres()
	 * @model default="0"
	 * @generated
	 */
	double getLeftOffsetMetres();

	/**
	 * Sets the value of the '{@link spanfield.model.EdgePoint#getLeftOffsetMetres <em>Left Offset Metres</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Left Offset Metres</em>' attribute.
	 * @see #getLeftOffsetMetres()
	 * @generated
	 */
	void setLeftOffsetMetres(double value);

	/**
	 * Returns the value of the '<em><b>Right Offset Metres</b></em>' attribute.
	 * The default value is <code>"0"</code>.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Offset of the right edge in metres; greater than the left offset.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Right Offset Metres</em>' attribute.
	 * @see #setRightOffsetMetres(double)
	 * @see spanfield.model.SpanfieldPackage#getEdgePoint_RightOffsetMetres()
	 * @model default="0"
	 * @generated
	 */
	double getRightOffsetMetres();

	/**
	 * Sets the value of the '{@link spanfield.model.EdgePoint#getRightOffsetMetres <em>Right Offset Metres</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Right Offset Metres</em>' attribute.
	 * @see #getRightOffsetMetres()
	 * @generated
	 */
	void setRightOffsetMetres(double value);

} // EdgePoint
