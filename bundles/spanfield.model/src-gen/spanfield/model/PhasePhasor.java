/**
 * Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0
 */
package spanfield.model;

import org.eclipse.emf.ecore.EObject;

/**
 * <!-- begin-user-doc -->
 * A representation of the model object '<em><b>Phase Phasor</b></em>'.
 * <!-- end-user-doc -->
 *
 * <!-- begin-model-doc -->
 * Current of a phase.
 * <!-- end-model-doc -->
 *
 * <p>
 * The following features are supported:
 * </p>
 * <ul>
 *   <li>{@link spanfield.model.PhasePhasor#getPhase <em>Phase</em>}</li>
 *   <li>{@link spanfield.model.PhasePhasor#getCurrentAmperes <em>Current Amperes</em>}</li>
 *   <li>{@link spanfield.model.PhasePhasor#getAngleDegrees <em>Angle Degrees</em>}</li>
 * </ul>
 *
 * @see spanfield.model.SpanfieldPackage#getPhasePhasor()
 * @model
 * @generated
 */
public interface PhasePhasor extends EObject {
	/**
	 * Returns the value of the '<em><b>Phase</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Label of the phase in its circuit.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Phase</em>' attribute.
	 * @see #setPhase(String)
	 * @see spanfield.model.SpanfieldPackage#getPhasePhasor_Phase()
	 * @model
	 * @generated
	 */
	String getPhase();

	/**
	 * Sets the value of the '{@link spanfield.model.PhasePhasor#getPhase <em>Phase</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Phase</em>' attribute.
	 * @see #getPhase()
	 * @generated
	 */
	void setPhase(String value);

	/**
	 * Returns the value of the '<em><b>Current Amperes</b></em>' attribute.
	 * The default value is <code>"0"</code>.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Current in amperes RMS.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Current Amperes</em>' attribute.
	 * @see #setCurrentAmperes(double)
	 * @see spanfield.model.SpanfieldPackage#getPhasePhasor_CurrentAmperes()
	 * @model default="0"
	 * @generated
	 */
	double getCurrentAmperes();

	/**
	 * Sets the value of the '{@link spanfield.model.PhasePhasor#getCurrentAmperes <em>Current Amperes</em>}' attribute.
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
	 * Angle of the current in degrees, the phase angle included.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Angle Degrees</em>' attribute.
	 * @see #setAngleDegrees(double)
	 * @see spanfield.model.SpanfieldPackage#getPhasePhasor_AngleDegrees()
	 * @model default="0"
	 * @generated
	 */
	double getAngleDegrees();

	/**
	 * Sets the value of the '{@link spanfield.model.PhasePhasor#getAngleDegrees <em>Angle Degrees</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Angle Degrees</em>' attribute.
	 * @see #getAngleDegrees()
	 * @generated
	 */
	void setAngleDegrees(double value);

} // PhasePhasor
