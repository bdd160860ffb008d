/**
 * Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0
 */
package spanfield.model.impl;

import java.util.Collection;

import org.eclipse.emf.common.notify.Notification;
import org.eclipse.emf.common.notify.NotificationChain;

import org.eclipse.emf.common.util.EList;

import org.eclipse.emf.ecore.EClass;
import org.eclipse.emf.ecore.InternalEObject;

import org.eclipse.emf.ecore.impl.ENotificationImpl;
import org.eclipse.emf.ecore.impl.MinimalEObjectImpl;

import org.eclipse.emf.ecore.util.EObjectContainmentEList;
import org.eclipse.emf.ecore.util.InternalEList;

import spanfield.model.AlignmentBend;
import spanfield.model.Corridor;
import spanfield.model.EdgePoint;
import spanfield.model.ElevationPoint;
import spanfield.model.GroundPoint;
import spanfield.model.SpanfieldPackage;

/**
 * <!-- begin-user-doc -->
 * An implementation of the model object '<em><b>Corridor</b></em>'.
 * <!-- end-user-doc -->
 * <p>
 * The following features are implemented:
 * </p>
 * <ul>
 *   <li>{@link spanfield.model.impl.CorridorImpl#getCrossSlope <em>Cross Slope</em>}</li>
 *   <li>{@link spanfield.model.impl.CorridorImpl#getEdges <em>Edges</em>}</li>
 *   <li>{@link spanfield.model.impl.CorridorImpl#getGroundPoints <em>Ground Points</em>}</li>
 *   <li>{@link spanfield.model.impl.CorridorImpl#getCentrelineElevations <em>Centreline Elevations</em>}</li>
 *   <li>{@link spanfield.model.impl.CorridorImpl#getBends <em>Bends</em>}</li>
 * </ul>
 *
 * @generated
 */
public class CorridorImpl extends MinimalEObjectImpl.Container implements Corridor {
	/**
	 * The default value of the '{@link #getCrossSlope() <em>Cross Slope</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getCrossSlope()
	 * @generated
	 * @ordered
	 */
	protected static final double CROSS_SLOPE_EDEFAULT = 0.0;

	/**
	 * The cached value of the '{@link #getCrossSlope() <em>Cross Slope</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getCrossSlope()
	 * @generated
	 * @ordered
	 */
	protected double crossSlope = CROSS_SLOPE_EDEFAULT;

	/**
	 * The cached value of the '{@link #getEdges() <em>Edges</em>}' containment reference list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getEdges()
	 * @generated
	 * @ordered
	 */
	protected EList<EdgePoint> edges;

	/**
	 * The cached value of the '{@link #getGroundPoints() <em>Ground Points</em>}' containment reference list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getGroundPoints()
	 * @generated
	 * @ordered
	 */
	protected EList<GroundPoint> groundPoints;

	/**
	 * The cached value of the '{@link #getCentrelineElevations() <em>Centreline Elevations</em>}' containment reference list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getCentrelineElevations()
	 * @generated
	 * @ordered
	 */
	protected EList<ElevationPoint> centrelineElevations;

	/**
	 * The cached value of the '{@link #getBends() <em>Bends</em>}' containment reference list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getBends()
	 * @generated
	 * @ordered
	 */
	protected EList<AlignmentBend> bends;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected CorridorImpl() {
		super();
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	protected EClass eStaticClass() {
		return SpanfieldPackage.Literals.CORRIDOR;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public double getCrossSlope() {
		return crossSlope;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setCrossSlope(double newCrossSlope) {
		double oldCrossSlope = crossSlope;
		crossSlope = newCrossSlope;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, SpanfieldPackage.CORRIDOR__CROSS_SLOPE, oldCrossSlope, crossSlope));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EList<EdgePoint> getEdges() {
		if (edges == null) {
			edges = new EObjectContainmentEList<EdgePoint>(EdgePoint.class, this, SpanfieldPackage.CORRIDOR__EDGES);
		}
		return edges;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EList<GroundPoint> getGroundPoints() {
		if (groundPoints == null) {
			groundPoints = new EObjectContainmentEList<GroundPoint>(GroundPoint.class, this, SpanfieldPackage.CORRIDOR__GROUND_POINTS);
		}
		return groundPoints;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EList<ElevationPoint> getCentrelineElevations() {
		if (centrelineElevations == null) {
			centrelineElevations = new EObjectContainmentEList<ElevationPoint>(ElevationPoint.class, this, SpanfieldPackage.CORRIDOR__CENTRELINE_ELEVATIONS);
		}
		return centrelineElevations;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EList<AlignmentBend> getBends() {
		if (bends == null) {
			bends = new EObjectContainmentEList<AlignmentBend>(AlignmentBend.class, this, SpanfieldPackage.CORRIDOR__BENDS);
		}
		return bends;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public NotificationChain eInverseRemove(InternalEObject otherEnd, int featureID, NotificationChain msgs) {
		switch (featureID) {
			case SpanfieldPackage.CORRIDOR__EDGES:
				return ((InternalEList<?>)getEdges()).basicRemove(otherEnd, msgs);
			case SpanfieldPackage.CORRIDOR__GROUND_POINTS:
				return ((InternalEList<?>)getGroundPoints()).basicRemove(otherEnd, msgs);
			case SpanfieldPackage.CORRIDOR__CENTRELINE_ELEVATIONS:
				return ((InternalEList<?>)getCentrelineElevations()).basicRemove(otherEnd, msgs);
			case SpanfieldPackage.CORRIDOR__BENDS:
				return ((InternalEList<?>)getBends()).basicRemove(otherEnd, msgs);
		}
		return super.eInverseRemove(otherEnd, featureID, msgs);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Object eGet(int featureID, boolean resolve, boolean coreType) {
		switch (featureID) {
			case SpanfieldPackage.CORRIDOR__CROSS_SLOPE:
				return getCrossSlope();
			case SpanfieldPackage.CORRIDOR__EDGES:
				return getEdges();
			case SpanfieldPackage.CORRIDOR__GROUND_POINTS:
				return getGroundPoints();
			case SpanfieldPackage.CORRIDOR__CENTRELINE_ELEVATIONS:
				return getCentrelineElevations();
			case SpanfieldPackage.CORRIDOR__BENDS:
				return getBends();
		}
		return super.eGet(featureID, resolve, coreType);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@SuppressWarnings("unchecked")
	@Override
	public void eSet(int featureID, Object newValue) {
		switch (featureID) {
			case SpanfieldPackage.CORRIDOR__CROSS_SLOPE:
				setCrossSlope((Double)newValue);
				return;
			case SpanfieldPackage.CORRIDOR__EDGES:
				getEdges().clear();
				getEdges().addAll((Collection<? extends EdgePoint>)newValue);
				return;
			case SpanfieldPackage.CORRIDOR__GROUND_POINTS:
				getGroundPoints().clear();
				getGroundPoints().addAll((Collection<? extends GroundPoint>)newValue);
				return;
			case SpanfieldPackage.CORRIDOR__CENTRELINE_ELEVATIONS:
				getCentrelineElevations().clear();
				getCentrelineElevations().addAll((Collection<? extends ElevationPoint>)newValue);
				return;
			case SpanfieldPackage.CORRIDOR__BENDS:
				getBends().clear();
				getBends().addAll((Collection<? extends AlignmentBend>)newValue);
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
			case SpanfieldPackage.CORRIDOR__CROSS_SLOPE:
				setCrossSlope(CROSS_SLOPE_EDEFAULT);
				return;
			case SpanfieldPackage.CORRIDOR__EDGES:
				getEdges().clear();
				return;
			case SpanfieldPackage.CORRIDOR__GROUND_POINTS:
				getGroundPoints().clear();
				return;
			case SpanfieldPackage.CORRIDOR__CENTRELINE_ELEVATIONS:
				getCentrelineElevations().clear();
				return;
			case SpanfieldPackage.CORRIDOR__BENDS:
				getBends().clear();
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
			case SpanfieldPackage.CORRIDOR__CROSS_SLOPE:
				return crossSlope != CROSS_SLOPE_EDEFAULT;
			case SpanfieldPackage.CORRIDOR__EDGES:
				return edges != null && !edges.isEmpty();
			case SpanfieldPackage.CORRIDOR__GROUND_POINTS:
				return groundPoints != null && !groundPoints.isEmpty();
			case SpanfieldPackage.CORRIDOR__CENTRELINE_ELEVATIONS:
				return centrelineElevations != null && !centrelineElevations.isEmpty();
			case SpanfieldPackage.CORRIDOR__BENDS:
				return bends != null && !bends.isEmpty();
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
		result.append(" (crossSlope: ");
		result.append(crossSlope);
		result.append(')');
		return result.toString();
	}

} //CorridorImpl
