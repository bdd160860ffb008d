/**
 * Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0
 */
package spanfield.model.impl;

import org.eclipse.emf.common.notify.Notification;

import org.eclipse.emf.ecore.EClass;

import org.eclipse.emf.ecore.impl.ENotificationImpl;
import org.eclipse.emf.ecore.impl.MinimalEObjectImpl;

import spanfield.model.AlignmentBend;
import spanfield.model.SpanfieldPackage;

/**
 * <!-- begin-user-doc -->
 * An implementation of the model object '<em><b>Alignment Bend</b></em>'.
 * <!-- end-user-doc -->
 * <p>
 * The following features are implemented:
 * </p>
 * <ul>
 *   <li>{@link spanfield.model.impl.AlignmentBendImpl#getStationMetres <em>Station Metres</em>}</li>
 *   <li>{@link spanfield.model.impl.AlignmentBendImpl#getDeflectionDegrees <em>Deflection Degrees</em>}</li>
 * </ul>
 *
 * @generated
 */
public class AlignmentBendImpl extends MinimalEObjectImpl.Container implements AlignmentBend {
	/**
	 * The default value of the '{@link #getStationMetres() <em>Station Metres</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getStationMetres()
	 * @generated
	 * @ordered
	 */
	protected static final double STATION_METRES_EDEFAULT = 0.0;

	/**
	 * The cached value of the '{@link #getStationMetres() <em>Station Metres</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getStationMetres()
	 * @generated
	 * @ordered
	 */
	protected double stationMetres = STATION_METRES_EDEFAULT;

	/**
	 * The default value of the '{@link #getDeflectionDegrees() <em>Deflection Degrees</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getDeflectionDegrees()
	 * @generated
	 * @ordered
	 */
	protected static final double DEFLECTION_DEGREES_EDEFAULT = 0.0;

	/**
	 * The cached value of the '{@link #getDeflectionDegrees() <em>Deflection Degrees</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getDeflectionDegrees()
	 * @generated
	 * @ordered
	 */
	protected double deflectionDegrees = DEFLECTION_DEGREES_EDEFAULT;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected AlignmentBendImpl() {
		super();
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	protected EClass eStaticClass() {
		return SpanfieldPackage.Literals.ALIGNMENT_BEND;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public double getStationMetres() {
		return stationMetres;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setStationMetres(double newStationMetres) {
		double oldStationMetres = stationMetres;
		stationMetres = newStationMetres;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, SpanfieldPackage.ALIGNMENT_BEND__STATION_METRES, oldStationMetres, stationMetres));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public double getDeflectionDegrees() {
		return deflectionDegrees;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setDeflectionDegrees(double newDeflectionDegrees) {
		double oldDeflectionDegrees = deflectionDegrees;
		deflectionDegrees = newDeflectionDegrees;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, SpanfieldPackage.ALIGNMENT_BEND__DEFLECTION_DEGREES, oldDeflectionDegrees, deflectionDegrees));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Object eGet(int featureID, boolean resolve, boolean coreType) {
		switch (featureID) {
			case SpanfieldPackage.ALIGNMENT_BEND__STATION_METRES:
				return getStationMetres();
			case SpanfieldPackage.ALIGNMENT_BEND__DEFLECTION_DEGREES:
				return getDeflectionDegrees();
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
			case SpanfieldPackage.ALIGNMENT_BEND__STATION_METRES:
				setStationMetres((Double)newValue);
				return;
			case SpanfieldPackage.ALIGNMENT_BEND__DEFLECTION_DEGREES:
				setDeflectionDegrees((Double)newValue);
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
			case SpanfieldPackage.ALIGNMENT_BEND__STATION_METRES:
				setStationMetres(STATION_METRES_EDEFAULT);
				return;
			case SpanfieldPackage.ALIGNMENT_BEND__DEFLECTION_DEGREES:
				setDeflectionDegrees(DEFLECTION_DEGREES_EDEFAULT);
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
			case SpanfieldPackage.ALIGNMENT_BEND__STATION_METRES:
				return stationMetres != STATION_METRES_EDEFAULT;
			case SpanfieldPackage.ALIGNMENT_BEND__DEFLECTION_DEGREES:
				return deflectionDegrees != DEFLECTION_DEGREES_EDEFAULT;
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
		result.append(" (stationMetres: ");
		result.append(stationMetres);
		result.append(", deflectionDegrees: ");
		result.append(deflectionDegrees);
		result.append(')');
		return result.toString();
	}

} //AlignmentBendImpl
