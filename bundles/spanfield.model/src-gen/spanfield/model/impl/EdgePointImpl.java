/**
 * Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0
 */
package spanfield.model.impl;

import org.eclipse.emf.common.notify.Notification;

import org.eclipse.emf.ecore.EClass;

import org.eclipse.emf.ecore.impl.ENotificationImpl;
import org.eclipse.emf.ecore.impl.MinimalEObjectImpl;

import spanfield.model.EdgePoint;
import spanfield.model.SpanfieldPackage;

/**
 * <!-- begin-user-doc -->
 * An implementation of the model object '<em><b>Edge Point</b></em>'.
 * <!-- end-user-doc -->
 * <p>
 * The following features are implemented:
 * </p>
 * <ul>
 *   <li>{@link spanfield.model.impl.EdgePointImpl#getStationMetres <em>Station Metres</em>}</li>
 *   <li>{@link spanfield.model.impl.EdgePointImpl#getLeftOffsetMetres <em>Left Offset Metres</em>}</li>
 *   <li>{@link spanfield.model.impl.EdgePointImpl#getRightOffsetMetres <em>Right Offset Metres</em>}</li>
 * </ul>
 *
 * @generated
 */
public class EdgePointImpl extends MinimalEObjectImpl.Container implements EdgePoint {
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
	 * The default value of the '{@link #getLeftOffsetMetres() <em>Left Offset Metres</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getLeftOffsetMetres()
	 * @generated
	 * @ordered
	 */
	protected static final double LEFT_OFFSET_METRES_EDEFAULT = 0.0;

	/**
	 * The cached value of the '{@link #getLeftOffsetMetres() <em>Left Offset Metres</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getLeftOffsetMetres()
	 * @generated
	 * @ordered
	 */
	protected double leftOffsetMetres = LEFT_OFFSET_METRES_EDEFAULT;

	/**
	 * The default value of the '{@link #getRightOffsetMetres() <em>Right Offset Metres</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getRightOffsetMetres()
	 * @generated
	 * @ordered
	 */
	protected static final double RIGHT_OFFSET_METRES_EDEFAULT = 0.0;

	/**
	 * The cached value of the '{@link #getRightOffsetMetres() <em>Right Offset Metres</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getRightOffsetMetres()
	 * @generated
	 * @ordered
	 */
	protected double rightOffsetMetres = RIGHT_OFFSET_METRES_EDEFAULT;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected EdgePointImpl() {
		super();
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	protected EClass eStaticClass() {
		return SpanfieldPackage.Literals.EDGE_POINT;
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
			eNotify(new ENotificationImpl(this, Notification.SET, SpanfieldPackage.EDGE_POINT__STATION_METRES, oldStationMetres, stationMetres));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public double getLeftOffsetMetres() {
		return leftOffsetMetres;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setLeftOffsetMetres(double newLeftOffsetMetres) {
		double oldLeftOffsetMetres = leftOffsetMetres;
		leftOffsetMetres = newLeftOffsetMetres;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, SpanfieldPackage.EDGE_POINT__LEFT_OFFSET_METRES, oldLeftOffsetMetres, leftOffsetMetres));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public double getRightOffsetMetres() {
		return rightOffsetMetres;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setRightOffsetMetres(double newRightOffsetMetres) {
		double oldRightOffsetMetres = rightOffsetMetres;
		rightOffsetMetres = newRightOffsetMetres;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, SpanfieldPackage.EDGE_POINT__RIGHT_OFFSET_METRES, oldRightOffsetMetres, rightOffsetMetres));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Object eGet(int featureID, boolean resolve, boolean coreType) {
		switch (featureID) {
			case SpanfieldPackage.EDGE_POINT__STATION_METRES:
				return getStationMetres();
			case SpanfieldPackage.EDGE_POINT__LEFT_OFFSET_METRES:
				return getLeftOffsetMetres();
			case SpanfieldPackage.EDGE_POINT__RIGHT_OFFSET_METRES:
				return getRightOffsetMetres();
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
			case SpanfieldPackage.EDGE_POINT__STATION_METRES:
				setStationMetres((Double)newValue);
				return;
			case SpanfieldPackage.EDGE_POINT__LEFT_OFFSET_METRES:
				setLeftOffsetMetres((Double)newValue);
				return;
			case SpanfieldPackage.EDGE_POINT__RIGHT_OFFSET_METRES:
				setRightOffsetMetres((Double)newValue);
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
			case SpanfieldPackage.EDGE_POINT__STATION_METRES:
				setStationMetres(STATION_METRES_EDEFAULT);
				return;
			case SpanfieldPackage.EDGE_POINT__LEFT_OFFSET_METRES:
				setLeftOffsetMetres(LEFT_OFFSET_METRES_EDEFAULT);
				return;
			case SpanfieldPackage.EDGE_POINT__RIGHT_OFFSET_METRES:
				setRightOffsetMetres(RIGHT_OFFSET_METRES_EDEFAULT);
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
			case SpanfieldPackage.EDGE_POINT__STATION_METRES:
				return stationMetres != STATION_METRES_EDEFAULT;
			case SpanfieldPackage.EDGE_POINT__LEFT_OFFSET_METRES:
				return leftOffsetMetres != LEFT_OFFSET_METRES_EDEFAULT;
			case SpanfieldPackage.EDGE_POINT__RIGHT_OFFSET_METRES:
				return rightOffsetMetres != RIGHT_OFFSET_METRES_EDEFAULT;
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
		result.append(", leftOffsetMetres: ");
		result.append(leftOffsetMetres);
		result.append(", rightOffsetMetres: ");
		result.append(rightOffsetMetres);
		result.append(')');
		return result.toString();
	}

} //EdgePointImpl
