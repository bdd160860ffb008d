/**
 * Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0
 */
package spanfield.model;

import org.eclipse.emf.common.util.EList;

/**
 * <!-- begin-user-doc -->
 * A representation of the model object '<em><b>Phasor Load</b></em>'.
 * <!-- end-user-doc -->
 *
 * <!-- begin-model-doc -->
 * Load by the current of every phase.
 * <!-- end-model-doc -->
 *
 * <p>
 * The following features are supported:
 * </p>
 * <ul>
 *   <li>{@link spanfield.model.PhasorLoad#getPhasors <em>Phasors</em>}</li>
 * </ul>
 *
 * @see spanfield.model.SpanfieldPackage#getPhasorLoad()
 * @model
 * @generated
 */
public interface PhasorLoad extends CircuitLoad {
	/**
	 * Returns the value of the '<em><b>Phasors</b></em>' containment reference list.
	 * The list contents are of type {@link spanfield.model.PhasePhasor}.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Current of each phase; a phase without one carries none.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Phasors</em>' containment reference list.
	 * @see spanfield.model.SpanfieldPackage#getPhasorLoad_Phasors()
	 * @model containment="true" required="true"
	 * @generated
	 */
	EList<PhasePhasor> getPhasors();

} // PhasorLoad
