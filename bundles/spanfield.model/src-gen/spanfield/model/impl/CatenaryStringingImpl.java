/**
 * Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0
 */
package spanfield.model.impl;

import org.eclipse.emf.common.notify.Notification;

import org.eclipse.emf.ecore.EClass;

import org.eclipse.emf.ecore.impl.ENotificationImpl;

import spanfield.model.CatenaryStringing;
import spanfield.model.SpanfieldPackage;

/**
 * <!-- begin-user-doc -->
 * An implementation of the model object '<em><b>Catenary Stringing</b></em>'.
 * <!-- end-user-doc -->
 * <p>
 * The following features are implemented:
 * </p>
 * <ul>
 *   <li>{@link spanfield.model.impl.CatenaryStringingImpl#getCatenaryConstantMetres <em>Catenary Constant Metres</em>}</li>
 * </ul>
 *
 * @generated
 */
public class CatenaryStringingImpl extends StringingImpl implements CatenaryStringing {
	/**
	 * The default value of the '{@link #getCatenaryConstantMetres() <em>Catenary Constant Metres</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getCatenaryConstantMetres()
	 * @generated
	 * @ordered
	 */
	protected static final double CATENARY_CONSTANT_METRES_EDEFAULT = 0.0;

	/**
	 * The cached value of the '{@link #getCatenaryConstantMetres() <em>Catenary Constant Metres</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getCatenaryConstantMetres()
	 * @generated
	 * @ordered
	 */
	protected double catenaryConstantMetres = CATENARY_CONSTANT_METRES_EDEFAULT;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected CatenaryStringingImpl() {
		super();
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	protected EClass eStaticClass() {
		return SpanfieldPackage.Literals.CATENARY_STRINGING;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public double getCatenaryConstantMetres() {
		return catenaryConstantMetres;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setCatenaryConstantMetres(double newCatenaryConstantMetres) {
		double oldCatenaryConstantMetres = catenaryConstantMetres;
		catenaryConstantMetres = newCatenaryConstantMetres;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, SpanfieldPackage.CATENARY_STRINGING__CATENARY_CONSTANT_METRES, oldCatenaryConstantMetres, catenaryConstantMetres));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Object eGet(int featureID, boolean resolve, boolean coreType) {
		switch (featureID) {
			case SpanfieldPackage.CATENARY_STRINGING__CATENARY_CONSTANT_METRES:
				return getCatenaryConstantMetres();
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
			case SpanfieldPackage.CATENARY_STRINGING__CATENARY_CONSTANT_METRES:
				setCatenaryConstantMetres((Double)newValue);
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
			case SpanfieldPackage.CATENARY_STRINGING__CATENARY_CONSTANT_METRES:
				setCatenaryConstantMetres(CATENARY_CONSTANT_METRES_EDEFAULT);
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
			case SpanfieldPackage.CATENARY_STRINGING__CATENARY_CONSTANT_METRES:
				return catenaryConstantMetres != CATENARY_CONSTANT_METRES_EDEFAULT;
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
		result.append(" (catenaryConstantMetres: ");
		result.append(catenaryConstantMetres);
		result.append(')');
		return result.toString();
	}

} //CatenaryStringingImpl
