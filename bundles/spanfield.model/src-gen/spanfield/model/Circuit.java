/**
 * Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0
 */
package spanfield.model;

import org.eclipse.emf.common.util.EList;

/**
 * <!-- begin-user-doc -->
 * A representation of the model object '<em><b>Circuit</b></em>'.
 * <!-- end-user-doc -->
 *
 * <!-- begin-model-doc -->
 * A circuit of n phases (or poles). Three-phase circuits have three phases with angles 0, -120 and +120 degrees.
 * <!-- end-model-doc -->
 *
 * <p>
 * The following features are supported:
 * </p>
 * <ul>
 *   <li>{@link spanfield.model.Circuit#getNominalVoltageVolts <em>Nominal Voltage Volts</em>}</li>
 *   <li>{@link spanfield.model.Circuit#getBundleCount <em>Bundle Count</em>}</li>
 *   <li>{@link spanfield.model.Circuit#getBundleSpacingMetres <em>Bundle Spacing Metres</em>}</li>
 *   <li>{@link spanfield.model.Circuit#getPhasing <em>Phasing</em>}</li>
 *   <li>{@link spanfield.model.Circuit#getPhases <em>Phases</em>}</li>
 * </ul>
 *
 * @see spanfield.model.SpanfieldPackage#getCircuit()
 * @model
 * @generated
 */
public interface Circuit extends StrungElement {
	/**
	 * Returns the value of the '<em><b>Nominal Voltage Volts</b></em>' attribute.
	 * The default value is <code>"0"</code>.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Nominal voltage in volts, line to line for three-phase circuits; to earth for other circuits.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Nominal Voltage Volts</em>' attribute.
	 * @see #setNominalVoltageVolts(double)
	 * @see spanfield.model.SpanfieldPackage#getCircuit_NominalVoltageVolts()
	 * @model default="0"
	 * @generated
	 */
	double getNominalVoltageVolts();

	/**
	 * Sets the value of the '{@link spanfield.model.Circuit#getNominalVoltageVolts <em>Nominal Voltage Volts</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Nominal Voltage Volts</em>' attribute.
	 * @see #getNominalVoltageVolts()
	 * @generated
	 */
	void setNominalVoltageVolts(double value);

	/**
	 * Returns the value of the '<em><b>Bundle Count</b></em>' attribute.
	 * The default value is <code>"1"</code>.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Number of subconductors of each phase.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Bundle Count</em>' attribute.
	 * @see #setBundleCount(int)
	 * @see spanfield.model.SpanfieldPackage#getCircuit_BundleCount()
	 * @model default="1"
	 * @generated
	 */
	int getBundleCount();

	/**
	 * Sets the value of the '{@link spanfield.model.Circuit#getBundleCount <em>Bundle Count</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Bundle Count</em>' attribute.
	 * @see #getBundleCount()
	 * @generated
	 */
	void setBundleCount(int value);

	/**
	 * Returns the value of the '<em><b>Bundle Spacing Metres</b></em>' attribute.
	 * The default value is <code>"0"</code>.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Distance between adjacent subconductors in metres: corners of a regular polygon, a pair lies level.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Bundle Spacing Metres</em>' attribute.
	 * @see #setBundleSpacingMetres(double)
	 * @see spanfield.model.SpanfieldPackage#getCircuit_BundleSpacingMetres()
	 * @model default="0"
	 * @generated
	 */
	double getBundleSpacingMetres();

	/**
	 * Sets the value of the '{@link spanfield.model.Circuit#getBundleSpacingMetres <em>Bundle Spacing Metres</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Bundle Spacing Metres</em>' attribute.
	 * @see #getBundleSpacingMetres()
	 * @generated
	 */
	void setBundleSpacingMetres(double value);

	/**
	 * Returns the value of the '<em><b>Phasing</b></em>' attribute.
	 * The default value is <code>"FIXED"</code>.
	 * The literals are from the enumeration {@link spanfield.model.Phasing}.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Whether a phasing comparison may rearrange the phases.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Phasing</em>' attribute.
	 * @see spanfield.model.Phasing
	 * @see #setPhasing(Phasing)
	 * @see spanfield.model.SpanfieldPackage#getCircuit_Phasing()
	 * @model default="FIXED"
	 * @generated
	 */
	Phasing getPhasing();

	/**
	 * Sets the value of the '{@link spanfield.model.Circuit#getPhasing <em>Phasing</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Phasing</em>' attribute.
	 * @see spanfield.model.Phasing
	 * @see #getPhasing()
	 * @generated
	 */
	void setPhasing(Phasing value);

	/**
	 * Returns the value of the '<em><b>Phases</b></em>' containment reference list.
	 * The list contents are of type {@link spanfield.model.Phase}.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Phases of the circuit, each on an attachment.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Phases</em>' containment reference list.
	 * @see spanfield.model.SpanfieldPackage#getCircuit_Phases()
	 * @model containment="true" required="true"
	 * @generated
	 */
	EList<Phase> getPhases();

} // Circuit
