/**
 * Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0
 */
package spanfield.model.impl;

import org.eclipse.emf.common.notify.Notification;

import org.eclipse.emf.ecore.EClass;
import org.eclipse.emf.ecore.InternalEObject;

import org.eclipse.emf.ecore.impl.ENotificationImpl;

import spanfield.model.SpanfieldPackage;
import spanfield.model.Structure;
import spanfield.model.StructureType;

/**
 * <!-- begin-user-doc -->
 * An implementation of the model object '<em><b>Structure</b></em>'.
 * <!-- end-user-doc -->
 * <p>
 * The following features are implemented:
 * </p>
 * <ul>
 *   <li>{@link spanfield.model.impl.StructureImpl#getType <em>Type</em>}</li>
 *   <li>{@link spanfield.model.impl.StructureImpl#getStationMetres <em>Station Metres</em>}</li>
 *   <li>{@link spanfield.model.impl.StructureImpl#getOffsetMetres <em>Offset Metres</em>}</li>
 *   <li>{@link spanfield.model.impl.StructureImpl#getBaseElevationMetres <em>Base Elevation Metres</em>}</li>
 *   <li>{@link spanfield.model.impl.StructureImpl#getHeightAdjustmentMetres <em>Height Adjustment Metres</em>}</li>
 *   <li>{@link spanfield.model.impl.StructureImpl#getTurnDegrees <em>Turn Degrees</em>}</li>
 * </ul>
 *
 * @generated
 */
public class StructureImpl extends NamedElementImpl implements Structure {
	/**
	 * The cached value of the '{@link #getType() <em>Type</em>}' reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getType()
	 * @generated
	 * @ordered
	 */
	protected StructureType type;

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
	 * The default value of the '{@link #getBaseElevationMetres() <em>Base Elevation Metres</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getBaseElevationMetres()
	 * @generated
	 * @ordered
	 */
	protected static final Double BASE_ELEVATION_METRES_EDEFAULT = null;

	/**
	 * The cached value of the '{@link #getBaseElevationMetres() <em>Base Elevation Metres</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getBaseElevationMetres()
	 * @generated
	 * @ordered
	 */
	protected Double baseElevationMetres = BASE_ELEVATION_METRES_EDEFAULT;

	/**
	 * The default value of the '{@link #getHeightAdjustmentMetres() <em>Height Adjustment Metres</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getHeightAdjustmentMetres()
	 * @generated
	 * @ordered
	 */
	protected static final double HEIGHT_ADJUSTMENT_METRES_EDEFAULT = 0.0;

	/**
	 * The cached value of the '{@link #getHeightAdjustmentMetres() <em>Height Adjustment Metres</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getHeightAdjustmentMetres()
	 * @generated
	 * @ordered
	 */
	protected double heightAdjustmentMetres = HEIGHT_ADJUSTMENT_METRES_EDEFAULT;

	/**
	 * The default value of the '{@link #getTurnDegrees() <em>Turn Degrees</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getTurnDegrees()
	 * @generated
	 * @ordered
	 */
	protected static final Double TURN_DEGREES_EDEFAULT = null;

	/**
	 * The cached value of the '{@link #getTurnDegrees() <em>Turn Degrees</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getTurnDegrees()
	 * @generated
	 * @ordered
	 */
	protected Double turnDegrees = TURN_DEGREES_EDEFAULT;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected StructureImpl() {
		super();
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	protected EClass eStaticClass() {
		return SpanfieldPackage.Literals.STRUCTURE;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public StructureType getType() {
		if (type != null && type.eIsProxy()) {
			InternalEObject oldType = (InternalEObject)type;
			type = (StructureType)eResolveProxy(oldType);
			if (type != oldType) {
				if (eNotificationRequired())
					eNotify(new ENotificationImpl(this, Notification.RESOLVE, SpanfieldPackage.STRUCTURE__TYPE, oldType, type));
			}
		}
		return type;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public StructureType basicGetType() {
		return type;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setType(StructureType newType) {
		StructureType oldType = type;
		type = newType;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, SpanfieldPackage.STRUCTURE__TYPE, oldType, type));
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
			eNotify(new ENotificationImpl(this, Notification.SET, SpanfieldPackage.STRUCTURE__STATION_METRES, oldStationMetres, stationMetres));
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
			eNotify(new ENotificationImpl(this, Notification.SET, SpanfieldPackage.STRUCTURE__OFFSET_METRES, oldOffsetMetres, offsetMetres));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Double getBaseElevationMetres() {
		return baseElevationMetres;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setBaseElevationMetres(Double newBaseElevationMetres) {
		Double oldBaseElevationMetres = baseElevationMetres;
		baseElevationMetres = newBaseElevationMetres;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, SpanfieldPackage.STRUCTURE__BASE_ELEVATION_METRES, oldBaseElevationMetres, baseElevationMetres));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public double getHeightAdjustmentMetres() {
		return heightAdjustmentMetres;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setHeightAdjustmentMetres(double newHeightAdjustmentMetres) {
		double oldHeightAdjustmentMetres = heightAdjustmentMetres;
		heightAdjustmentMetres = newHeightAdjustmentMetres;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, SpanfieldPackage.STRUCTURE__HEIGHT_ADJUSTMENT_METRES, oldHeightAdjustmentMetres, heightAdjustmentMetres));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Double getTurnDegrees() {
		return turnDegrees;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setTurnDegrees(Double newTurnDegrees) {
		Double oldTurnDegrees = turnDegrees;
		turnDegrees = newTurnDegrees;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, SpanfieldPackage.STRUCTURE__TURN_DEGREES, oldTurnDegrees, turnDegrees));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Object eGet(int featureID, boolean resolve, boolean coreType) {
		switch (featureID) {
			case SpanfieldPackage.STRUCTURE__TYPE:
				if (resolve) return getType();
				return basicGetType();
			case SpanfieldPackage.STRUCTURE__STATION_METRES:
				return getStationMetres();
			case SpanfieldPackage.STRUCTURE__OFFSET_METRES:
				return getOffsetMetres();
			case SpanfieldPackage.STRUCTURE__BASE_ELEVATION_METRES:
				return getBaseElevationMetres();
			case SpanfieldPackage.STRUCTURE__HEIGHT_ADJUSTMENT_METRES:
				return getHeightAdjustmentMetres();
			case SpanfieldPackage.STRUCTURE__TURN_DEGREES:
				return getTurnDegrees();
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
			case SpanfieldPackage.STRUCTURE__TYPE:
				setType((StructureType)newValue);
				return;
			case SpanfieldPackage.STRUCTURE__STATION_METRES:
				setStationMetres((Double)newValue);
				return;
			case SpanfieldPackage.STRUCTURE__OFFSET_METRES:
				setOffsetMetres((Double)newValue);
				return;
			case SpanfieldPackage.STRUCTURE__BASE_ELEVATION_METRES:
				setBaseElevationMetres((Double)newValue);
				return;
			case SpanfieldPackage.STRUCTURE__HEIGHT_ADJUSTMENT_METRES:
				setHeightAdjustmentMetres((Double)newValue);
				return;
			case SpanfieldPackage.STRUCTURE__TURN_DEGREES:
				setTurnDegrees((Double)newValue);
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
			case SpanfieldPackage.STRUCTURE__TYPE:
				setType((StructureType)null);
				return;
			case SpanfieldPackage.STRUCTURE__STATION_METRES:
				setStationMetres(STATION_METRES_EDEFAULT);
				return;
			case SpanfieldPackage.STRUCTURE__OFFSET_METRES:
				setOffsetMetres(OFFSET_METRES_EDEFAULT);
				return;
			case SpanfieldPackage.STRUCTURE__BASE_ELEVATION_METRES:
				setBaseElevationMetres(BASE_ELEVATION_METRES_EDEFAULT);
				return;
			case SpanfieldPackage.STRUCTURE__HEIGHT_ADJUSTMENT_METRES:
				setHeightAdjustmentMetres(HEIGHT_ADJUSTMENT_METRES_EDEFAULT);
				return;
			case SpanfieldPackage.STRUCTURE__TURN_DEGREES:
				setTurnDegrees(TURN_DEGREES_EDEFAULT);
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
			case SpanfieldPackage.STRUCTURE__TYPE:
				return type != null;
			case SpanfieldPackage.STRUCTURE__STATION_METRES:
				return stationMetres != STATION_METRES_EDEFAULT;
			case SpanfieldPackage.STRUCTURE__OFFSET_METRES:
				return offsetMetres != OFFSET_METRES_EDEFAULT;
			case SpanfieldPackage.STRUCTURE__BASE_ELEVATION_METRES:
				return BASE_ELEVATION_METRES_EDEFAULT == null ? baseElevationMetres != null : !BASE_ELEVATION_METRES_EDEFAULT.equals(baseElevationMetres);
			case SpanfieldPackage.STRUCTURE__HEIGHT_ADJUSTMENT_METRES:
				return heightAdjustmentMetres != HEIGHT_ADJUSTMENT_METRES_EDEFAULT;
			case SpanfieldPackage.STRUCTURE__TURN_DEGREES:
				return TURN_DEGREES_EDEFAULT == null ? turnDegrees != null : !TURN_DEGREES_EDEFAULT.equals(turnDegrees);
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
		result.append(", offsetMetres: ");
		result.append(offsetMetres);
		result.append(", baseElevationMetres: ");
		result.append(baseElevationMetres);
		result.append(", heightAdjustmentMetres: ");
		result.append(heightAdjustmentMetres);
		result.append(", turnDegrees: ");
		result.append(turnDegrees);
		result.append(')');
		return result.toString();
	}

} //StructureImpl
