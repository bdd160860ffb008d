/**
 * Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0
 */
package spanfield.model.impl;

import org.eclipse.emf.common.notify.Notification;

import org.eclipse.emf.ecore.EClass;

import org.eclipse.emf.ecore.impl.ENotificationImpl;

import spanfield.model.ProfileStation;
import spanfield.model.SpanfieldPackage;

/**
 * <!-- begin-user-doc -->
 * An implementation of the model object '<em><b>Profile Station</b></em>'.
 * <!-- end-user-doc -->
 * <p>
 * The following features are implemented:
 * </p>
 * <ul>
 *   <li>{@link spanfield.model.impl.ProfileStationImpl#getStationMetres <em>Station Metres</em>}</li>
 *   <li>{@link spanfield.model.impl.ProfileStationImpl#getFromOffsetMetres <em>From Offset Metres</em>}</li>
 *   <li>{@link spanfield.model.impl.ProfileStationImpl#getToOffsetMetres <em>To Offset Metres</em>}</li>
 *   <li>{@link spanfield.model.impl.ProfileStationImpl#getSpacingMetres <em>Spacing Metres</em>}</li>
 * </ul>
 *
 * @generated
 */
public class ProfileStationImpl extends NamedElementImpl implements ProfileStation {
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
	 * The default value of the '{@link #getFromOffsetMetres() <em>From Offset Metres</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getFromOffsetMetres()
	 * @generated
	 * @ordered
	 */
	protected static final double FROM_OFFSET_METRES_EDEFAULT = -100.0;

	/**
	 * The cached value of the '{@link #getFromOffsetMetres() <em>From Offset Metres</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getFromOffsetMetres()
	 * @generated
	 * @ordered
	 */
	protected double fromOffsetMetres = FROM_OFFSET_METRES_EDEFAULT;

	/**
	 * The default value of the '{@link #getToOffsetMetres() <em>To Offset Metres</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getToOffsetMetres()
	 * @generated
	 * @ordered
	 */
	protected static final double TO_OFFSET_METRES_EDEFAULT = 100.0;

	/**
	 * The cached value of the '{@link #getToOffsetMetres() <em>To Offset Metres</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getToOffsetMetres()
	 * @generated
	 * @ordered
	 */
	protected double toOffsetMetres = TO_OFFSET_METRES_EDEFAULT;

	/**
	 * The default value of the '{@link #getSpacingMetres() <em>Spacing Metres</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getSpacingMetres()
	 * @generated
	 * @ordered
	 */
	protected static final double SPACING_METRES_EDEFAULT = 1.0;

	/**
	 * The cached value of the '{@link #getSpacingMetres() <em>Spacing Metres</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getSpacingMetres()
	 * @generated
	 * @ordered
	 */
	protected double spacingMetres = SPACING_METRES_EDEFAULT;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected ProfileStationImpl() {
		super();
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	protected EClass eStaticClass() {
		return SpanfieldPackage.Literals.PROFILE_STATION;
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
			eNotify(new ENotificationImpl(this, Notification.SET, SpanfieldPackage.PROFILE_STATION__STATION_METRES, oldStationMetres, stationMetres));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public double getFromOffsetMetres() {
		return fromOffsetMetres;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setFromOffsetMetres(double newFromOffsetMetres) {
		double oldFromOffsetMetres = fromOffsetMetres;
		fromOffsetMetres = newFromOffsetMetres;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, SpanfieldPackage.PROFILE_STATION__FROM_OFFSET_METRES, oldFromOffsetMetres, fromOffsetMetres));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public double getToOffsetMetres() {
		return toOffsetMetres;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setToOffsetMetres(double newToOffsetMetres) {
		double oldToOffsetMetres = toOffsetMetres;
		toOffsetMetres = newToOffsetMetres;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, SpanfieldPackage.PROFILE_STATION__TO_OFFSET_METRES, oldToOffsetMetres, toOffsetMetres));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public double getSpacingMetres() {
		return spacingMetres;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setSpacingMetres(double newSpacingMetres) {
		double oldSpacingMetres = spacingMetres;
		spacingMetres = newSpacingMetres;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, SpanfieldPackage.PROFILE_STATION__SPACING_METRES, oldSpacingMetres, spacingMetres));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Object eGet(int featureID, boolean resolve, boolean coreType) {
		switch (featureID) {
			case SpanfieldPackage.PROFILE_STATION__STATION_METRES:
				return getStationMetres();
			case SpanfieldPackage.PROFILE_STATION__FROM_OFFSET_METRES:
				return getFromOffsetMetres();
			case SpanfieldPackage.PROFILE_STATION__TO_OFFSET_METRES:
				return getToOffsetMetres();
			case SpanfieldPackage.PROFILE_STATION__SPACING_METRES:
				return getSpacingMetres();
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
			case SpanfieldPackage.PROFILE_STATION__STATION_METRES:
				setStationMetres((Double)newValue);
				return;
			case SpanfieldPackage.PROFILE_STATION__FROM_OFFSET_METRES:
				setFromOffsetMetres((Double)newValue);
				return;
			case SpanfieldPackage.PROFILE_STATION__TO_OFFSET_METRES:
				setToOffsetMetres((Double)newValue);
				return;
			case SpanfieldPackage.PROFILE_STATION__SPACING_METRES:
				setSpacingMetres((Double)newValue);
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
			case SpanfieldPackage.PROFILE_STATION__STATION_METRES:
				setStationMetres(STATION_METRES_EDEFAULT);
				return;
			case SpanfieldPackage.PROFILE_STATION__FROM_OFFSET_METRES:
				setFromOffsetMetres(FROM_OFFSET_METRES_EDEFAULT);
				return;
			case SpanfieldPackage.PROFILE_STATION__TO_OFFSET_METRES:
				setToOffsetMetres(TO_OFFSET_METRES_EDEFAULT);
				return;
			case SpanfieldPackage.PROFILE_STATION__SPACING_METRES:
				setSpacingMetres(SPACING_METRES_EDEFAULT);
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
			case SpanfieldPackage.PROFILE_STATION__STATION_METRES:
				return stationMetres != STATION_METRES_EDEFAULT;
			case SpanfieldPackage.PROFILE_STATION__FROM_OFFSET_METRES:
				return fromOffsetMetres != FROM_OFFSET_METRES_EDEFAULT;
			case SpanfieldPackage.PROFILE_STATION__TO_OFFSET_METRES:
				return toOffsetMetres != TO_OFFSET_METRES_EDEFAULT;
			case SpanfieldPackage.PROFILE_STATION__SPACING_METRES:
				return spacingMetres != SPACING_METRES_EDEFAULT;
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
		result.append(", fromOffsetMetres: ");
		result.append(fromOffsetMetres);
		result.append(", toOffsetMetres: ");
		result.append(toOffsetMetres);
		result.append(", spacingMetres: ");
		result.append(spacingMetres);
		result.append(')');
		return result.toString();
	}

} //ProfileStationImpl
