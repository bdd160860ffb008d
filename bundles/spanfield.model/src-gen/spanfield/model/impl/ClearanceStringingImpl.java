/**
 * Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0
 */
package spanfield.model.impl;

import org.eclipse.emf.common.notify.Notification;

import org.eclipse.emf.ecore.EClass;

import org.eclipse.emf.ecore.impl.ENotificationImpl;

import spanfield.model.ClearanceStringing;
import spanfield.model.SpanfieldPackage;

/**
 * <!-- begin-user-doc -->
 * An implementation of the model object '<em><b>Clearance Stringing</b></em>'.
 * <!-- end-user-doc -->
 * <p>
 * The following features are implemented:
 * </p>
 * <ul>
 *   <li>{@link spanfield.model.impl.ClearanceStringingImpl#getClearanceMetres <em>Clearance Metres</em>}</li>
 * </ul>
 *
 * @generated
 */
public class ClearanceStringingImpl extends StringingImpl implements ClearanceStringing {
	/**
	 * The default value of the '{@link #getClearanceMetres() <em>Clearance Metres</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getClearanceMetres()
	 * @generated
	 * @ordered
	 */
	protected static final double CLEARANCE_METRES_EDEFAULT = 0.0;

	/**
	 * The cached value of the '{@link #getClearanceMetres() <em>Clearance Metres</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getClearanceMetres()
	 * @generated
	 * @ordered
	 */
	protected double clearanceMetres = CLEARANCE_METRES_EDEFAULT;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected ClearanceStringingImpl() {
		super();
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	protected EClass eStaticClass() {
		return SpanfieldPackage.Literals.CLEARANCE_STRINGING;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public double getClearanceMetres() {
		return clearanceMetres;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setClearanceMetres(double newClearanceMetres) {
		double oldClearanceMetres = clearanceMetres;
		clearanceMetres = newClearanceMetres;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, SpanfieldPackage.CLEARANCE_STRINGING__CLEARANCE_METRES, oldClearanceMetres, clearanceMetres));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Object eGet(int featureID, boolean resolve, boolean coreType) {
		switch (featureID) {
			case SpanfieldPackage.CLEARANCE_STRINGING__CLEARANCE_METRES:
				return getClearanceMetres();
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
			case SpanfieldPackage.CLEARANCE_STRINGING__CLEARANCE_METRES:
				setClearanceMetres((Double)newValue);
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
			case SpanfieldPackage.CLEARANCE_STRINGING__CLEARANCE_METRES:
				setClearanceMetres(CLEARANCE_METRES_EDEFAULT);
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
			case SpanfieldPackage.CLEARANCE_STRINGING__CLEARANCE_METRES:
				return clearanceMetres != CLEARANCE_METRES_EDEFAULT;
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
		result.append(" (clearanceMetres: ");
		result.append(clearanceMetres);
		result.append(')');
		return result.toString();
	}

} //ClearanceStringingImpl
