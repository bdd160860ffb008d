/**
 * Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0
 */
package spanfield.model;


/**
 * <!-- begin-user-doc -->
 * A representation of the model object '<em><b>Power Load</b></em>'.
 * <!-- end-user-doc -->
 *
 * <!-- begin-model-doc -->
 * Balanced load by power.
 * <!-- end-model-doc -->
 *
 * <p>
 * The following features are supported:
 * </p>
 * <ul>
 *   <li>{@link spanfield.model.PowerLoad#getActivePowerWatts <em>Active Power Watts</em>}</li>
 *   <li>{@link spanfield.model.PowerLoad#getReactivePowerVars <em>Reactive Power Vars</em>}</li>
 *   <li>{@link spanfield.model.PowerLoad#getVoltageVolts <em>Voltage Volts</em>}</li>
 * </ul>
 *
 * @see spanfield.model.SpanfieldPackage#getPowerLoad()
 * @model
 * @generated
 */
public interface PowerLoad extends CircuitLoad {
	/**
	 * Returns the value of the '<em><b>Active Power Watts</b></em>' attribute.
	 * The default value is <code>"0"</code>.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Active power of the circuit in watts.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Active Power Watts</em>' attribute.
	 * @see #setActivePowerWatts(double)
	 * @see spanfield.model.SpanfieldPackage#getPowerLoad_ActivePowerWatts()
	 * @model default="0"
	 * @generated
	 */
	double getActivePowerWatts();

	/**
	 * Sets the value of the '{@link spanfield.model.PowerLoad#getActivePowerWatts <em>Active Power Watts</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Active Power Watts</em>' attribute.
	 * @see #getActivePowerWatts()
	 * @generated
	 */
	void setActivePowerWatts(double value);

	/**
	 * Returns the value of the '<em><b>Reactive Power Vars</b></em>' attribute.
	 * The default value is <code>"0"</code>.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Reactive power of the circuit in vars, positive when inductive.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Reactive Power Vars</em>' attribute.
	 * @see #setReactivePowerVars(double)
	 * @see spanfield.model.SpanfieldPackage#getPowerLoad_ReactivePowerVars()
	 * @model default="0"
	 * @generated
	 */
	double getReactivePowerVars();

	/**
	 * Sets the value of the '{@link spanfield.model.PowerLoad#getReactivePowerVars <em>Reactive Power Vars</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Reactive Power Vars</em>' attribute.
	 * @see #getReactivePowerVars()
	 * @generated
	 */
	void setReactivePowerVars(double value);

	/**
	 * Returns the value of the '<em><b>Voltage Volts</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Operating voltage in volts. Absent: the nominal voltage of the circuit.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Voltage Volts</em>' attribute.
	 * @see #setVoltageVolts(Double)
	 * @see spanfield.model.SpanfieldPackage#getPowerLoad_VoltageVolts()
	 * @model
	 * @generated
	 */
	Double getVoltageVolts();

	/**
	 * Sets the value of the '{@link spanfield.model.PowerLoad#getVoltageVolts <em>Voltage Volts</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Voltage Volts</em>' attribute.
	 * @see #getVoltageVolts()
	 * @generated
	 */
	void setVoltageVolts(Double value);

} // PowerLoad
