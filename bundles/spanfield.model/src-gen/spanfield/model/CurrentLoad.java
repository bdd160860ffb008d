/**
 * Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0
 */
package spanfield.model;


/**
 * <!-- begin-user-doc -->
 * A representation of the model object '<em><b>Current Load</b></em>'.
 * <!-- end-user-doc -->
 *
 * <!-- begin-model-doc -->
 * Balanced load by current.
 * <!-- end-model-doc -->
 *
 * <p>
 * The following features are supported:
 * </p>
 * <ul>
 *   <li>{@link spanfield.model.CurrentLoad#getCurrentAmperes <em>Current Amperes</em>}</li>
 *   <li>{@link spanfield.model.CurrentLoad#getAngleDegrees <em>Angle Degrees</em>}</li>
 * </ul>
 *
 * @see spanfield.model.SpanfieldPackage#getCurrentLoad()
 * @model
 * @generated
 */
public interface CurrentLoad extends CircuitLoad {
	/**
	 * Returns the value of the '<em><b>Current Amperes</b></em>' attribute.
	 * The default value is <code>"0"</code>.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Current of each phase in amperes RMS.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Current Amperes</em>' attribute.
	 * @see #setCurrentAmperes(double)
	 * @see spanfield.model.SpanfieldPackage#getCurrentLoad_CurrentAmperes()
	 * @model default="0"
	 * @generated
	 */
	double getCurrentAmperes();

	/**
	 * Sets the value of the '{@link spanfield.model.CurrentLoad#getCurrentAmperes <em>Current Amperes</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Current Amperes</em>' attribute.
	 * @see #getCurrentAmperes()
	 * @generated
	 */
	void setCurrentAmperes(double value);

	/**
	 * Returns the value of the '<em><b>Angle Degrees</b></em>' attribute.
	 * The default value is <code>"0"</code>.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Angle in degrees that is added to the angle of every phase.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Angle Degrees</em>' attribute.
	 * @see #setAngleDegrees(double)
	 * @see spanfield.model.SpanfieldPackage#getCurrentLoad_AngleDegrees()
	 * @model default="0"
	 * @generated
	 */
	double getAngleDegrees();

	/**
	 * Sets the value of the '{@link spanfield.model.CurrentLoad#getAngleDegrees <em>Angle Degrees</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Angle Degrees</em>' attribute.
	 * @see #getAngleDegrees()
	 * @generated
	 */
	void setAngleDegrees(double value);

} // CurrentLoad
