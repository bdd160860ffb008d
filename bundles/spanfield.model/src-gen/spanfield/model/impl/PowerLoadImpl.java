/**
 * Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0
 */
package spanfield.model.impl;

import org.eclipse.emf.common.notify.Notification;

import org.eclipse.emf.ecore.EClass;

import org.eclipse.emf.ecore.impl.ENotificationImpl;

import spanfield.model.PowerLoad;
import spanfield.model.SpanfieldPackage;

/**
 * <!-- begin-user-doc -->
 * An implementation of the model object '<em><b>Power Load</b></em>'.
 * <!-- end-user-doc -->
 * <p>
 * The following features are implemented:
 * </p>
 * <ul>
 *   <li>{@link spanfield.model.impl.PowerLoadImpl#getActivePowerWatts <em>Active Power Watts</em>}</li>
 *   <li>{@link spanfield.model.impl.PowerLoadImpl#getReactivePowerVars <em>Reactive Power Vars</em>}</li>
 *   <li>{@link spanfield.model.impl.PowerLoadImpl#getVoltageVolts <em>Voltage Volts</em>}</li>
 * </ul>
 *
 * @generated
 */
public class PowerLoadImpl extends CircuitLoadImpl implements PowerLoad {
	/**
	 * The default value of the '{@link #getActivePowerWatts() <em>Active Power Watts</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getActivePowerWatts()
	 * @generated
	 * @ordered
	 */
	protected static final double ACTIVE_POWER_WATTS_EDEFAULT = 0.0;

	/**
	 * The cached value of the '{@link #getActivePowerWatts() <em>Active Power Watts</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getActivePowerWatts()
	 * @generated
	 * @ordered
	 */
	protected double activePowerWatts = ACTIVE_POWER_WATTS_EDEFAULT;

	/**
	 * The default value of the '{@link #getReactivePowerVars() <em>Reactive Power Vars</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getReactivePowerVars()
	 * @generated
	 * @ordered
	 */
	protected static final double REACTIVE_POWER_VARS_EDEFAULT = 0.0;

	/**
	 * The cached value of the '{@link #getReactivePowerVars() <em>Reactive Power Vars</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getReactivePowerVars()
	 * @generated
	 * @ordered
	 */
	protected double reactivePowerVars = REACTIVE_POWER_VARS_EDEFAULT;

	/**
	 * The default value of the '{@link #getVoltageVolts() <em>Voltage Volts</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getVoltageVolts()
	 * @generated
	 * @ordered
	 */
	protected static final Double VOLTAGE_VOLTS_EDEFAULT = null;

	/**
	 * The cached value of the '{@link #getVoltageVolts() <em>Voltage Volts</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getVoltageVolts()
	 * @generated
	 * @ordered
	 */
	protected Double voltageVolts = VOLTAGE_VOLTS_EDEFAULT;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected PowerLoadImpl() {
		super();
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	protected EClass eStaticClass() {
		return SpanfieldPackage.Literals.POWER_LOAD;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public double getActivePowerWatts() {
		return activePowerWatts;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setActivePowerWatts(double newActivePowerWatts) {
		double oldActivePowerWatts = activePowerWatts;
		activePowerWatts = newActivePowerWatts;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, SpanfieldPackage.POWER_LOAD__ACTIVE_POWER_WATTS, oldActivePowerWatts, activePowerWatts));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public double getReactivePowerVars() {
		return reactivePowerVars;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setReactivePowerVars(double newReactivePowerVars) {
		double oldReactivePowerVars = reactivePowerVars;
		reactivePowerVars = newReactivePowerVars;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, SpanfieldPackage.POWER_LOAD__REACTIVE_POWER_VARS, oldReactivePowerVars, reactivePowerVars));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Double getVoltageVolts() {
		return voltageVolts;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setVoltageVolts(Double newVoltageVolts) {
		Double oldVoltageVolts = voltageVolts;
		voltageVolts = newVoltageVolts;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, SpanfieldPackage.POWER_LOAD__VOLTAGE_VOLTS, oldVoltageVolts, voltageVolts));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Object eGet(int featureID, boolean resolve, boolean coreType) {
		switch (featureID) {
			case SpanfieldPackage.POWER_LOAD__ACTIVE_POWER_WATTS:
				return getActivePowerWatts();
			case SpanfieldPackage.POWER_LOAD__REACTIVE_POWER_VARS:
				return getReactivePowerVars();
			case SpanfieldPackage.POWER_LOAD__VOLTAGE_VOLTS:
				return getVoltageVolts();
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
			case SpanfieldPackage.POWER_LOAD__ACTIVE_POWER_WATTS:
				setActivePowerWatts((Double)newValue);
				return;
			case SpanfieldPackage.POWER_LOAD__REACTIVE_POWER_VARS:
				setReactivePowerVars((Double)newValue);
				return;
			case SpanfieldPackage.POWER_LOAD__VOLTAGE_VOLTS:
				setVoltageVolts((Double)newValue);
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
			case SpanfieldPackage.POWER_LOAD__ACTIVE_POWER_WATTS:
				setActivePowerWatts(ACTIVE_POWER_WATTS_EDEFAULT);
				return;
			case SpanfieldPackage.POWER_LOAD__REACTIVE_POWER_VARS:
				setReactivePowerVars(REACTIVE_POWER_VARS_EDEFAULT);
				return;
			case SpanfieldPackage.POWER_LOAD__VOLTAGE_VOLTS:
				setVoltageVolts(VOLTAGE_VOLTS_EDEFAULT);
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
			case SpanfieldPackage.POWER_LOAD__ACTIVE_POWER_WATTS:
				return activePowerWatts != ACTIVE_POWER_WATTS_EDEFAULT;
			case SpanfieldPackage.POWER_LOAD__REACTIVE_POWER_VARS:
				return reactivePowerVars != REACTIVE_POWER_VARS_EDEFAULT;
			case SpanfieldPackage.POWER_LOAD__VOLTAGE_VOLTS:
				return VOLTAGE_VOLTS_EDEFAULT == null ? voltageVolts != null : !VOLTAGE_VOLTS_EDEFAULT.equals(voltageVolts);
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
		result.append(" (activePowerWatts: ");
		result.append(activePowerWatts);
		result.append(", reactivePowerVars: ");
		result.append(reactivePowerVars);
		result.append(", voltageVolts: ");
		result.append(voltageVolts);
		result.append(')');
		return result.toString();
	}

} //PowerLoadImpl
