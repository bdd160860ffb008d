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

import org.eclipse.emf.ecore.util.EObjectContainmentEList;
import org.eclipse.emf.ecore.util.InternalEList;

import spanfield.model.CircuitLoad;
import spanfield.model.LoadCase;
import spanfield.model.SpanfieldPackage;

/**
 * <!-- begin-user-doc -->
 * An implementation of the model object '<em><b>Load Case</b></em>'.
 * <!-- end-user-doc -->
 * <p>
 * The following features are implemented:
 * </p>
 * <ul>
 *   <li>{@link spanfield.model.impl.LoadCaseImpl#getBasis <em>Basis</em>}</li>
 *   <li>{@link spanfield.model.impl.LoadCaseImpl#getWindSwingDegrees <em>Wind Swing Degrees</em>}</li>
 *   <li>{@link spanfield.model.impl.LoadCaseImpl#getLoads <em>Loads</em>}</li>
 * </ul>
 *
 * @generated
 */
public class LoadCaseImpl extends NamedElementImpl implements LoadCase {
	/**
	 * The default value of the '{@link #getBasis() <em>Basis</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getBasis()
	 * @generated
	 * @ordered
	 */
	protected static final String BASIS_EDEFAULT = null;

	/**
	 * The cached value of the '{@link #getBasis() <em>Basis</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getBasis()
	 * @generated
	 * @ordered
	 */
	protected String basis = BASIS_EDEFAULT;

	/**
	 * The default value of the '{@link #getWindSwingDegrees() <em>Wind Swing Degrees</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getWindSwingDegrees()
	 * @generated
	 * @ordered
	 */
	protected static final double WIND_SWING_DEGREES_EDEFAULT = 0.0;

	/**
	 * The cached value of the '{@link #getWindSwingDegrees() <em>Wind Swing Degrees</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getWindSwingDegrees()
	 * @generated
	 * @ordered
	 */
	protected double windSwingDegrees = WIND_SWING_DEGREES_EDEFAULT;

	/**
	 * The cached value of the '{@link #getLoads() <em>Loads</em>}' containment reference list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getLoads()
	 * @generated
	 * @ordered
	 */
	protected EList<CircuitLoad> loads;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected LoadCaseImpl() {
		super();
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	protected EClass eStaticClass() {
		return SpanfieldPackage.Literals.LOAD_CASE;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public String getBasis() {
		return basis;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setBasis(String newBasis) {
		String oldBasis = basis;
		basis = newBasis;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, SpanfieldPackage.LOAD_CASE__BASIS, oldBasis, basis));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public double getWindSwingDegrees() {
		return windSwingDegrees;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setWindSwingDegrees(double newWindSwingDegrees) {
		double oldWindSwingDegrees = windSwingDegrees;
		windSwingDegrees = newWindSwingDegrees;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, SpanfieldPackage.LOAD_CASE__WIND_SWING_DEGREES, oldWindSwingDegrees, windSwingDegrees));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EList<CircuitLoad> getLoads() {
		if (loads == null) {
			loads = new EObjectContainmentEList<CircuitLoad>(CircuitLoad.class, this, SpanfieldPackage.LOAD_CASE__LOADS);
		}
		return loads;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public NotificationChain eInverseRemove(InternalEObject otherEnd, int featureID, NotificationChain msgs) {
		switch (featureID) {
			case SpanfieldPackage.LOAD_CASE__LOADS:
				return ((InternalEList<?>)getLoads()).basicRemove(otherEnd, msgs);
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
			case SpanfieldPackage.LOAD_CASE__BASIS:
				return getBasis();
			case SpanfieldPackage.LOAD_CASE__WIND_SWING_DEGREES:
				return getWindSwingDegrees();
			case SpanfieldPackage.LOAD_CASE__LOADS:
				return getLoads();
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
			case SpanfieldPackage.LOAD_CASE__BASIS:
				setBasis((String)newValue);
				return;
			case SpanfieldPackage.LOAD_CASE__WIND_SWING_DEGREES:
				setWindSwingDegrees((Double)newValue);
				return;
			case SpanfieldPackage.LOAD_CASE__LOADS:
				getLoads().clear();
				getLoads().addAll((Collection<? extends CircuitLoad>)newValue);
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
			case SpanfieldPackage.LOAD_CASE__BASIS:
				setBasis(BASIS_EDEFAULT);
				return;
			case SpanfieldPackage.LOAD_CASE__WIND_SWING_DEGREES:
				setWindSwingDegrees(WIND_SWING_DEGREES_EDEFAULT);
				return;
			case SpanfieldPackage.LOAD_CASE__LOADS:
				getLoads().clear();
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
			case SpanfieldPackage.LOAD_CASE__BASIS:
				return BASIS_EDEFAULT == null ? basis != null : !BASIS_EDEFAULT.equals(basis);
			case SpanfieldPackage.LOAD_CASE__WIND_SWING_DEGREES:
				return windSwingDegrees != WIND_SWING_DEGREES_EDEFAULT;
			case SpanfieldPackage.LOAD_CASE__LOADS:
				return loads != null && !loads.isEmpty();
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
		result.append(" (basis: ");
		result.append(basis);
		result.append(", windSwingDegrees: ");
		result.append(windSwingDegrees);
		result.append(')');
		return result.toString();
	}

} //LoadCaseImpl
