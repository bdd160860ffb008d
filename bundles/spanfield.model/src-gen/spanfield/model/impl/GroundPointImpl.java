/**
 * Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0
 */
package spanfield.model.impl;

import org.eclipse.emf.common.notify.Notification;

import org.eclipse.emf.ecore.EClass;

import org.eclipse.emf.ecore.impl.ENotificationImpl;
import org.eclipse.emf.ecore.impl.MinimalEObjectImpl;

import spanfield.model.GroundPoint;
import spanfield.model.SpanfieldPackage;

/**
 * <!-- begin-user-doc -->
 * An implementation of the model object '<em><b>Ground Point</b></em>'.
 * <!-- end-user-doc -->
 * <p>
 * The following features are implemented:
 * </p>
 * <ul>
 *   <li>{@link spanfield.model.impl.GroundPointImpl#getOffsetMetres <em>Offset Metres</em>}</li>
 *   <li>{@link spanfield.model.impl.GroundPointImpl#getElevationMetres <em>Elevation Metres</em>}</li>
 * </ul>
 *
 * @generated
 */
public class GroundPointImpl extends MinimalEObjectImpl.Container implements GroundPoint {
	/**
	 * The default value of the '{@link #getOffsetMetres() <em>Offset Metres</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getOffsetMetres()
	 * @generated
	 * @ordered
	 */
	protected static final double OFFSET_METRES_EDEFAULT = 0.0;

	/**
	 * The cached value of the '{@link #getOffsetMetres() <em>Offset Metres</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getOffsetMetres()
	 * @generated
	 * @ordered
	 */
	protected double offsetMetres = OFFSET_METRES_EDEFAULT;

	/**
	 * The default value of the '{@link #getElevationMetres() <em>Elevation Metres</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getElevationMetres()
	 * @generated
	 * @ordered
	 */
	protected static final double ELEVATION_METRES_EDEFAULT = 0.0;

	/**
	 * The cached value of the '{@link #getElevationMetres() <em>Elevation Metres</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getElevationMetres()
	 * @generated
	 * @ordered
	 */
	protected double elevationMetres = ELEVATION_METRES_EDEFAULT;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected GroundPointImpl() {
		super();
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	protected EClass eStaticClass() {
		return SpanfieldPackage.Literals.GROUND_POINT;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public double getOffsetMetres() {
		return offsetMetres;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setOffsetMetres(double newOffsetMetres) {
		double oldOffsetMetres = offsetMetres;
		offsetMetres = newOffsetMetres;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, SpanfieldPackage.GROUND_POINT__OFFSET_METRES, oldOffsetMetres, offsetMetres));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public double getElevationMetres() {
		return elevationMetres;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setElevationMetres(double newElevationMetres) {
		double oldElevationMetres = elevationMetres;
		elevationMetres = newElevationMetres;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, SpanfieldPackage.GROUND_POINT__ELEVATION_METRES, oldElevationMetres, elevationMetres));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Object eGet(int featureID, boolean resolve, boolean coreType) {
		switch (featureID) {
			case SpanfieldPackage.GROUND_POINT__OFFSET_METRES:
				return getOffsetMetres();
			case SpanfieldPackage.GROUND_POINT__ELEVATION_METRES:
				return getElevationMetres();
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
			case SpanfieldPackage.GROUND_POINT__OFFSET_METRES:
				setOffsetMetres((Double)newValue);
				return;
			case SpanfieldPackage.GROUND_POINT__ELEVATION_METRES:
				setElevationMetres((Double)newValue);
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
			case SpanfieldPackage.GROUND_POINT__OFFSET_METRES:
				setOffsetMetres(OFFSET_METRES_EDEFAULT);
				return;
			case SpanfieldPackage.GROUND_POINT__ELEVATION_METRES:
				setElevationMetres(ELEVATION_METRES_EDEFAULT);
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
			case SpanfieldPackage.GROUND_POINT__OFFSET_METRES:
				return offsetMetres != OFFSET_METRES_EDEFAULT;
			case SpanfieldPackage.GROUND_POINT__ELEVATION_METRES:
				return elevationMetres != ELEVATION_METRES_EDEFAULT;
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
		result.append(" (offsetMetres: ");
		result.append(offsetMetres);
		result.append(", elevationMetres: ");
		result.append(elevationMetres);
		result.append(')');
		return result.toString();
	}

} //GroundPointImpl
