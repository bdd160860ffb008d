/**
 * Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0
 */
package spanfield.model;

import org.eclipse.emf.common.util.EList;

/**
 * <!-- begin-user-doc -->
 * A representation of the model object '<em><b>Load Case</b></em>'.
 * <!-- end-user-doc -->
 *
 * <!-- begin-model-doc -->
 * Currents of all circuits at one time, and the swing of the wires in the wind.
 * <!-- end-model-doc -->
 *
 * <p>
 * The following features are supported:
 * </p>
 * <ul>
 *   <li>{@link spanfield.model.LoadCase#getBasis <em>Basis</em>}</li>
 *   <li>{@link spanfield.model.LoadCase#getWindSwingDegrees <em>Wind Swing Degrees</em>}</li>
 *   <li>{@link spanfield.model.LoadCase#getLoads <em>Loads</em>}</li>
 * </ul>
 *
 * @see spanfield.model.SpanfieldPackage#getLoadCase()
 * @model
 * @generated
 */
public interface LoadCase extends NamedElement {
	/**
	 * Returns the value of the '<em><b>Basis</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Basis of the load, for the report: rating, peak, average and so on.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Basis</em>' attribute.
	 * @see #setBasis(String)
	 * @see spanfield.model.SpanfieldPackage#getLoadCase_Basis()
	 * @model
	 * @generated
	 */
	String getBasis();

	/**
	 * Sets the value of the '{@link spanfield.model.LoadCase#getBasis <em>Basis</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Basis</em>' attribute.
	 * @see #getBasis()
	 * @generated
	 */
	void setBasis(String value);

	/**
	 * Returns the value of the '<em><b>Wind Swing Degrees</b></em>' attribute.
	 * The default value is <code>"0"</code>.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Swing of all wires about their chords in degrees, positive to the right, seen along increasing station.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Wind Swing Degrees</em>' attribute.
	 * @see #setWindSwingDegrees(double)
	 * @see spanfield.model.SpanfieldPackage#getLoadCase_WindSwingDegrees()
	 * @model default="0"
	 * @generated
	 */
	double getWindSwingDegrees();

	/**
	 * Sets the value of the '{@link spanfield.model.LoadCase#getWindSwingDegrees <em>Wind Swing Degrees</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Wind Swing Degrees</em>' attribute.
	 * @see #getWindSwingDegrees()
	 * @generated
	 */
	void setWindSwingDegrees(double value);

	/**
	 * Returns the value of the '<em><b>Loads</b></em>' containment reference list.
	 * The list contents are of type {@link spanfield.model.CircuitLoad}.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Loads, one for a circuit. A circuit without one carries no current.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Loads</em>' containment reference list.
	 * @see spanfield.model.SpanfieldPackage#getLoadCase_Loads()
	 * @model containment="true"
	 * @generated
	 */
	EList<CircuitLoad> getLoads();

} // LoadCase
