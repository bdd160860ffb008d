/**
 * Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0
 */
package spanfield.model.impl;

import org.eclipse.emf.common.notify.Notification;

import org.eclipse.emf.ecore.EClass;

import org.eclipse.emf.ecore.impl.ENotificationImpl;

import spanfield.model.SpanfieldPackage;
import spanfield.model.TensionStringing;

/**
 * <!-- begin-user-doc -->
 * An implementation of the model object '<em><b>Tension Stringing</b></em>'.
 * <!-- end-user-doc -->
 * <p>
 * The following features are implemented:
 * </p>
 * <ul>
 *   <li>{@link spanfield.model.impl.TensionStringingImpl#getHorizontalTensionNewtons <em>Horizontal Tension Newtons</em>}</li>
 * </ul>
 *
 * @generated
 */
public class TensionStringingImpl extends StringingImpl implements TensionStringing {
	/**
	 * The default value of the '{@link #getHorizontalTensionNewtons() <em>Horizontal Tension Newtons</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getHorizontalTensionNewtons()
	 * @generated
	 * @ordered
	 */
	protected static final double HORIZONTAL_TENSION_NEWTONS_EDEFAULT = 0.0;

	/**
	 * The cached value of the '{@link #getHorizontalTensionNewtons() <em>Horizontal Tension Newtons</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getHorizontalTensionNewtons()
	 * @generated
	 * @ordered
	 */
	protected double horizontalTensionNewtons = HORIZONTAL_TENSION_NEWTONS_EDEFAULT;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected TensionStringingImpl() {
		super();
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	protected EClass eStaticClass() {
		return SpanfieldPackage.Literals.TENSION_STRINGING;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public double getHorizontalTensionNewtons() {
		return horizontalTensionNewtons;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setHorizontalTensionNewtons(double newHorizontalTensionNewtons) {
		double oldHorizontalTensionNewtons = horizontalTensionNewtons;
		horizontalTensionNewtons = newHorizontalTensionNewtons;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, SpanfieldPackage.TENSION_STRINGING__HORIZONTAL_TENSION_NEWTONS, oldHorizontalTensionNewtons, horizontalTensionNewtons));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Object eGet(int featureID, boolean resolve, boolean coreType) {
		switch (featureID) {
			case SpanfieldPackage.TENSION_STRINGING__HORIZONTAL_TENSION_NEWTONS:
				return getHorizontalTensionNewtons();
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
			case SpanfieldPackage.TENSION_STRINGING__HORIZONTAL_TENSION_NEWTONS:
				setHorizontalTensionNewtons((Double)newValue);
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
			case SpanfieldPackage.TENSION_STRINGING__HORIZONTAL_TENSION_NEWTONS:
				setHorizontalTensionNewtons(HORIZONTAL_TENSION_NEWTONS_EDEFAULT);
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
			case SpanfieldPackage.TENSION_STRINGING__HORIZONTAL_TENSION_NEWTONS:
				return horizontalTensionNewtons != HORIZONTAL_TENSION_NEWTONS_EDEFAULT;
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
		result.append(" (horizontalTensionNewtons: ");
		result.append(horizontalTensionNewtons);
		result.append(')');
		return result.toString();
	}

} //TensionStringingImpl
