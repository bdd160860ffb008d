/**
 * Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0
 */
package spanfield.model.impl;

import org.eclipse.emf.common.notify.Notification;

import org.eclipse.emf.ecore.EClass;

import org.eclipse.emf.ecore.impl.ENotificationImpl;
import org.eclipse.emf.ecore.impl.MinimalEObjectImpl;

import spanfield.model.PhasePhasor;
import spanfield.model.SpanfieldPackage;

/**
 * <!-- begin-user-doc -->
 * An implementation of the model object '<em><b>Phase Phasor</b></em>'.
 * <!-- end-user-doc -->
 * <p>
 * The following features are implemented:
 * </p>
 * <ul>
 *   <li>{@link spanfield.model.impl.PhasePhasorImpl#getPhase <em>Phase</em>}</li>
 *   <li>{@link spanfield.model.impl.PhasePhasorImpl#getCurrentAmperes <em>Current Amperes</em>}</li>
 *   <li>{@link spanfield.model.impl.PhasePhasorImpl#getAngleDegrees <em>Angle Degrees</em>}</li>
 * </ul>
 *
 * @generated
 */
public class PhasePhasorImpl extends MinimalEObjectImpl.Container implements PhasePhasor {
	/**
	 * The default value of the '{@link #getPhase() <em>Phase</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getPhase()
	 * @generated
	 * @ordered
	 */
	protected static final String PHASE_EDEFAULT = null;

	/**
	 * The cached value of the '{@link #getPhase() <em>Phase</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getPhase()
	 * @generated
	 * @ordered
	 */
	protected String phase = PHASE_EDEFAULT;

	/**
	 * The default value of the '{@link #getCurrentAmperes() <em>Current Amperes</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getCurrentAmperes()
	 * @generated
	 * @ordered
	 */
	protected static final double CURRENT_AMPERES_EDEFAULT = 0.0;

	/**
	 * The cached value of the '{@link #getCurrentAmperes() <em>Current Amperes</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getCurrentAmperes()
	 * @generated
	 * @ordered
	 */
	protected double currentAmperes = CURRENT_AMPERES_EDEFAULT;

	/**
	 * The default value of the '{@link #getAngleDegrees() <em>Angle Degrees</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getAngleDegrees()
	 * @generated
	 * @ordered
	 */
	protected static final double ANGLE_DEGREES_EDEFAULT = 0.0;

	/**
	 * The cached value of the '{@link #getAngleDegrees() <em>Angle Degrees</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getAngleDegrees()
	 * @generated
	 * @ordered
	 */
	protected double angleDegrees = ANGLE_DEGREES_EDEFAULT;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected PhasePhasorImpl() {
		super();
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	protected EClass eStaticClass() {
		return SpanfieldPackage.Literals.PHASE_PHASOR;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public String getPhase() {
		return phase;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setPhase(String newPhase) {
		String oldPhase = phase;
		phase = newPhase;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, SpanfieldPackage.PHASE_PHASOR__PHASE, oldPhase, phase));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public double getCurrentAmperes() {
		return currentAmperes;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setCurrentAmperes(double newCurrentAmperes) {
		double oldCurrentAmperes = currentAmperes;
		currentAmperes = newCurrentAmperes;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, SpanfieldPackage.PHASE_PHASOR__CURRENT_AMPERES, oldCurrentAmperes, currentAmperes));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public double getAngleDegrees() {
		return angleDegrees;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setAngleDegrees(double newAngleDegrees) {
		double oldAngleDegrees = angleDegrees;
		angleDegrees = newAngleDegrees;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, SpanfieldPackage.PHASE_PHASOR__ANGLE_DEGREES, oldAngleDegrees, angleDegrees));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Object eGet(int featureID, boolean resolve, boolean coreType) {
		switch (featureID) {
			case SpanfieldPackage.PHASE_PHASOR__PHASE:
				return getPhase();
			case SpanfieldPackage.PHASE_PHASOR__CURRENT_AMPERES:
				return getCurrentAmperes();
			case SpanfieldPackage.PHASE_PHASOR__ANGLE_DEGREES:
				return getAngleDegrees();
		}
		return super.eGet(featureID, resolve, coreType);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void eSet(int featureID, Object newValue) {
		switch (featureID) {
			case SpanfieldPackage.PHASE_PHASOR__PHASE:
				setPhase((String)newValue);
				return;
			case SpanfieldPackage.PHASE_PHASOR__CURRENT_AMPERES:
				setCurrentAmperes((Double)newValue);
				return;
			case SpanfieldPackage.PHASE_PHASOR__ANGLE_DEGREES:
				setAngleDegrees((Double)newValue);
				return;
		}
		super.eSet(featureID, newValue);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void eUnset(int featureID) {
		switch (featureID) {
			case SpanfieldPackage.PHASE_PHASOR__PHASE:
				setPhase(PHASE_EDEFAULT);
				return;
			case SpanfieldPackage.PHASE_PHASOR__CURRENT_AMPERES:
				setCurrentAmperes(CURRENT_AMPERES_EDEFAULT);
				return;
			case SpanfieldPackage.PHASE_PHASOR__ANGLE_DEGREES:
				setAngleDegrees(ANGLE_DEGREES_EDEFAULT);
				return;
		}
		super.eUnset(featureID);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public boolean eIsSet(int featureID) {
		switch (featureID) {
			case SpanfieldPackage.PHASE_PHASOR__PHASE:
				return PHASE_EDEFAULT == null ? phase != null : !PHASE_EDEFAULT.equals(phase);
			case SpanfieldPackage.PHASE_PHASOR__CURRENT_AMPERES:
				return currentAmperes != CURRENT_AMPERES_EDEFAULT;
			case SpanfieldPackage.PHASE_PHASOR__ANGLE_DEGREES:
				return angleDegrees != ANGLE_DEGREES_EDEFAULT;
		}
		return super.eIsSet(featureID);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public String toString() {
		if (eIsProxy()) return super.toString();

		StringBuilder result = new StringBuilder(super.toString());
		result.append(" (phase: ");
		result.append(phase);
		result.append(", currentAmperes: ");
		result.append(currentAmperes);
		result.append(", angleDegrees: ");
		result.append(angleDegrees);
		result.append(')');
		return result.toString();
	}

} //PhasePhasorImpl
