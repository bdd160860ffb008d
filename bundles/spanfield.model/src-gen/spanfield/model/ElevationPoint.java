/**
 * Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0
 */
package spanfield.model;

import org.eclipse.emf.ecore.EObject;

/**
 * <!-- begin-user-doc -->
 * A representation of the model object '<em><b>Elevation Point</b></em>'.
 * <!-- end-user-doc -->
 *
 * <!-- begin-model-doc -->
 * Ground elevation at a station of the centreline.
 * <!-- end-model-doc -->
 *
 * <p>
 * The following features are supported:
 * </p>
 * <ul>
 *   <li>{@link spanfield.model.ElevationPoint#getStationMetres <em>Station Metres</em>}</li>
 *   <li>{@link spanfield.model.ElevationPoint#getElevationMetres <em>Elevation Metres</em>}</li>
 * </ul>
 *
 * @see spanfield.model.SpanfieldPackage#getElevationPoint()
 * @model
 * @generated
 */
public interface ElevationPoint extends EObject {
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
	 * @see spanfield.model.SpanfieldPackage#getElevationPoint_StationMetres()
	 * @model default="0"
	 * @generated
	 */
	double getStationMetres();

	/**
	 * Sets the value of the '{@link spanfield.model.ElevationPoint#getStationMetres <em>Station Metres</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Station Metres</em>' attribute.
	 * @see #getStationMetres()
	 * @generated
	 */
	void setStationMetres(double value);

	/**
	 * Returns the value of the '<em><b>Elevation Metres</b></em>' attribute.
	 * The default value is <code>"0"</code>.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Elevation in metres.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Elevation Metres</em>' attribute.
	 * @see #setElevationMetres(double)
	 * @see spanfield.model.SpanfieldPackage#getElevationPoint_ElevationMetres()
	 * @model default="0"
	 * @generated
	 */
	double getElevationMetres();

	/**
	 * Sets the value of the '{@link spanfield.model.ElevationPoint#getElevationMetres <em>Elevation Metres</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Elevation Metres</em>' attribute.
	 * @see #getElevationMetres()
	 * @generated
	 */
	void setElevationMetres(double value);

} // ElevationPoint
