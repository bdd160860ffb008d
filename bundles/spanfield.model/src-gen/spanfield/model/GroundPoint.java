/**
 * Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0
 */
package spanfield.model;

import org.eclipse.emf.ecore.EObject;

/**
 * <!-- begin-user-doc -->
 * A representation of the model object '<em><b>Ground Point</b></em>'.
 * <!-- end-user-doc -->
 *
 * <!-- begin-model-doc -->
 * A point of the ground cross-section.
 * <!-- end-model-doc -->
 *
 * <p>
 * The following features are supported:
 * </p>
 * <ul>
 *   <li>{@link spanfield.model.GroundPoint#getOffsetMetres <em>Offset Metres</em>}</li>
 *   <li>{@link spanfield.model.GroundPoint#getElevationMetres <em>Elevation Metres</em>}</li>
 * </ul>
 *
 * @see spanfield.model.SpanfieldPackage#getGroundPoint()
 * @model
 * @generated
 */
public interface GroundPoint extends EObject {
	/**
	 * Returns the value of the '<em><b>Offset Metres</b></em>' attribute.
	 * The default value is <code>"0"</code>.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Offset in metres.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Offset Metres</em>' attribute.
	 * @see #setOffsetMetres(double)
	 * @see spanfield.model.SpanfieldPackage#getGroundPoint_OffsetMetres()
	 * @model default="0"
	 * @generated
	 */
	double getOffsetMetres();

	/**
	 * Sets the value of the '{@link spanfield.model.GroundPoint#getOffsetMetres <em>Offset Metres</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Offset Metres</em>' attribute.
	 * @see #getOffsetMetres()
	 * @generated
	 */
	void setOffsetMetres(double value);

	/**
	 * Returns the value of the '<em><b>Elevation Metres</b></em>' attribute.
	 * The default value is <code>"0"</code>.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Elevation relative to the ground at the centreline in metres.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Elevation Metres</em>' attribute.
	 * @see #setElevationMetres(double)
	 * @see spanfield.model.SpanfieldPackage#getGroundPoint_ElevationMetres()
	 * @model default="0"
	 * @generated
	 */
	double getElevationMetres();

	/**
	 * Sets the value of the '{@link spanfield.model.GroundPoint#getElevationMetres <em>Elevation Metres</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Elevation Metres</em>' attribute.
	 * @see #getElevationMetres()
	 * @generated
	 */
	void setElevationMetres(double value);

} // GroundPoint
