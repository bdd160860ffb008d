/**
 * Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0
 */
package spanfield.model;

import org.eclipse.emf.common.util.EList;

import org.eclipse.emf.ecore.EObject;

/**
 * <!-- begin-user-doc -->
 * A representation of the model object '<em><b>Corridor</b></em>'.
 * <!-- end-user-doc -->
 *
 * <!-- begin-model-doc -->
 * A right-of-way: edges, ground line and optional bends of its centreline. Offsets are positive to the right, looking towards increasing station.
 * <!-- end-model-doc -->
 *
 * <p>
 * The following features are supported:
 * </p>
 * <ul>
 *   <li>{@link spanfield.model.Corridor#getCrossSlope <em>Cross Slope</em>}</li>
 *   <li>{@link spanfield.model.Corridor#getEdges <em>Edges</em>}</li>
 *   <li>{@link spanfield.model.Corridor#getGroundPoints <em>Ground Points</em>}</li>
 *   <li>{@link spanfield.model.Corridor#getCentrelineElevations <em>Centreline Elevations</em>}</li>
 *   <li>{@link spanfield.model.Corridor#getBends <em>Bends</em>}</li>
 * </ul>
 *
 * @see spanfield.model.SpanfieldPackage#getCorridor()
 * @model
 * @generated
 */
public interface Corridor extends EObject {
	/**
	 * Returns the value of the '<em><b>Cross Slope</b></em>' attribute.
	 * The default value is <code>"0"</code>.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Rise of the ground per metre of offset to the right (dimensionless), used where no ground points are given.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Cross Slope</em>' attribute.
	 * @see #setCrossSlope(double)
	 * @see spanfield.model.SpanfieldPackage#getCorridor_CrossSlope()
	 * @model default="0"
	 * @generated
	 */
	double getCrossSlope();

	/**
	 * Sets the value of the '{@link spanfield.model.Corridor#getCrossSlope <em>Cross Slope</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Cross Slope</em>' attribute.
	 * @see #getCrossSlope()
	 * @generated
	 */
	void setCrossSlope(double value);

	/**
	 * Returns the value of the '<em><b>Edges</b></em>' containment reference list.
	 * The list contents are of type {@link spanfield.model.EdgePoint}.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Edges of the right-of-way along the station, linear between points, constant beyond the first and last.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Edges</em>' containment reference list.
	 * @see spanfield.model.SpanfieldPackage#getCorridor_Edges()
	 * @model containment="true" required="true"
	 * @generated
	 */
	EList<EdgePoint> getEdges();

	/**
	 * Returns the value of the '<em><b>Ground Points</b></em>' containment reference list.
	 * The list contents are of type {@link spanfield.model.GroundPoint}.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Cross-section of the ground relative to its centreline elevation, linear between points, level beyond the outermost.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Ground Points</em>' containment reference list.
	 * @see spanfield.model.SpanfieldPackage#getCorridor_GroundPoints()
	 * @model containment="true"
	 * @generated
	 */
	EList<GroundPoint> getGroundPoints();

	/**
	 * Returns the value of the '<em><b>Centreline Elevations</b></em>' containment reference list.
	 * The list contents are of type {@link spanfield.model.ElevationPoint}.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Ground elevation along the centreline, linear between points, level beyond. None: elevation 0.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Centreline Elevations</em>' containment reference list.
	 * @see spanfield.model.SpanfieldPackage#getCorridor_CentrelineElevations()
	 * @model containment="true"
	 * @generated
	 */
	EList<ElevationPoint> getCentrelineElevations();

	/**
	 * Returns the value of the '<em><b>Bends</b></em>' containment reference list.
	 * The list contents are of type {@link spanfield.model.AlignmentBend}.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Angle points of the centreline in plan. None: a straight centreline.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Bends</em>' containment reference list.
	 * @see spanfield.model.SpanfieldPackage#getCorridor_Bends()
	 * @model containment="true"
	 * @generated
	 */
	EList<AlignmentBend> getBends();

} // Corridor
