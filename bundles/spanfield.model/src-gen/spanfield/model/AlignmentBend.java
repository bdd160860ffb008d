/**
 * Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0
 */
package spanfield.model;

import org.eclipse.emf.ecore.EObject;

/**
 * <!-- begin-user-doc -->
 * A representation of the model object '<em><b>Alignment Bend</b></em>'.
 * <!-- end-user-doc -->
 *
 * <!-- begin-model-doc -->
 * An angle point of the corridor centreline.
 * <!-- end-model-doc -->
 *
 * <p>
 * The following features are supported:
 * </p>
 * <ul>
 *   <li>{@link spanfield.model.AlignmentBend#getStationMetres <em>Station Metres</em>}</li>
 *   <li>{@link spanfield.model.AlignmentBend#getDeflectionDegrees <em>Deflection Degrees</em>}</li>
 * </ul>
 *
 * @see spanfield.model.SpanfieldPackage#getAlignmentBend()
 * @model
 * @generated
 */
public interface AlignmentBend extends EObject {
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
	 * @see spanfield.model.SpanfieldPackage#getAlignmentBend_StationMetres()
	 * @model default="0"
	 * @generated
	 */
	double getStationMetres();

	/**
	 * Sets the value of the '{@link spanfield.model.AlignmentBend#getStationMetres <em>Station Metres</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Station Metres</em>' attribute.
	 * @see #getStationMetres()
	 * @generated
	 */
	void setStationMetres(double value);

	/**
	 * Returns the value of the '<em><b>Deflection Degrees</b></em>' attribute.
	 * The default value is <code>"0"</code>.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Change of direction in degrees, positive to the right.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Deflection Degrees</em>' attribute.
	 * @see #setDeflectionDegrees(double)
	 * @see spanfield.model.SpanfieldPackage#getAlignmentBend_DeflectionDegrees()
	 * @model default="0"
	 * @generated
	 */
	double getDeflectionDegrees();

	/**
	 * Sets the value of the '{@link spanfield.model.AlignmentBend#getDeflectionDegrees <em>Deflection Degrees</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Deflection Degrees</em>' attribute.
	 * @see #getDeflectionDegrees()
	 * @generated
	 */
	void setDeflectionDegrees(double value);

} // AlignmentBend
