/**
 * Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0
 */
package spanfield.model.impl;

import org.eclipse.emf.common.notify.Notification;

import org.eclipse.emf.ecore.EClass;

import org.eclipse.emf.ecore.impl.ENotificationImpl;
import org.eclipse.emf.ecore.impl.MinimalEObjectImpl;

import spanfield.model.OutlinePoint;
import spanfield.model.SpanfieldPackage;

/**
 * <!-- begin-user-doc -->
 * An implementation of the model object '<em><b>Outline Point</b></em>'.
 * <!-- end-user-doc -->
 * <p>
 * The following features are implemented:
 * </p>
 * <ul>
 *   <li>{@link spanfield.model.impl.OutlinePointImpl#getOffsetMetres <em>Offset Metres</em>}</li>
 *   <li>{@link spanfield.model.impl.OutlinePointImpl#getHeightMetres <em>Height Metres</em>}</li>
 * </ul>
 *
 * @generated
 */
public class OutlinePointImpl extends MinimalEObjectImpl.Container implements OutlinePoint {
	/**
	 * The default value of the '{@link #getOffsetMetres() <em>Offset Metres</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getOffsetMetres()
	 * @generated
	 * @ordered
	 */
	protected static final double OFFSET_METRES_EDEFAULT = 0.0;

	/**
	 * The cached value of the '{@link #getOffsetMetres() <em>Offset Metres</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getOffsetMetres()
	 * @generated
	 * @ordered
	 */
	protected double offsetMetres = OFFSET_METRES_EDEFAULT;

	/**
	 * The default value of the '{@link #getHeightMetres() <em>Height Metres</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getHeightMetres()
	 * @generated
	 * @ordered
	 */
	protected static final double HEIGHT_METRES_EDEFAULT = 0.0;

	/**
	 * The cached value of the '{@link #getHeightMetres() <em>Height Metres</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getHeightMetres()
	 * @generated
	 * @ordered
	 */
	protected double heightMetres = HEIGHT_METRES_EDEFAULT;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected OutlinePointImpl() {
		super();
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	protected EClass eStaticClass() {
		return SpanfieldPackage.Literals.OUTLINE_POINT;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public double getOffsetMetres() {
		return offsetMetres;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setOffsetMetres(double newOffsetMetres) {
		double oldOffsetMetres = offsetMetres;
		offsetMetres = newOffsetMetres;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, SpanfieldPackage.OUTLINE_POINT__OFFSET_METRES, oldOffsetMetres, offsetMetres));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public double getHeightMetres() {
		return heightMetres;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setHeightMetres(double newHeightMetres) {
		double oldHeightMetres = heightMetres;
		heightMetres = newHeightMetres;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, SpanfieldPackage.OUTLINE_POINT__HEIGHT_METRES, oldHeightMetres, heightMetres));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Object eGet(int featureID, boolean resolve, boolean coreType) {
		switch (featureID) {
			case SpanfieldPackage.OUTLINE_POINT__OFFSET_METRES:
				return getOffsetMetres();
			case SpanfieldPackage.OUTLINE_POINT__HEIGHT_METRES:
				return getHeightMetres();
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
			case SpanfieldPackage.OUTLINE_POINT__OFFSET_METRES:
				setOffsetMetres((Double)newValue);
				return;
			case SpanfieldPackage.OUTLINE_POINT__HEIGHT_METRES:
				setHeightMetres((Double)newValue);
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
			case SpanfieldPackage.OUTLINE_POINT__OFFSET_METRES:
				setOffsetMetres(OFFSET_METRES_EDEFAULT);
				return;
			case SpanfieldPackage.OUTLINE_POINT__HEIGHT_METRES:
				setHeightMetres(HEIGHT_METRES_EDEFAULT);
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
			case SpanfieldPackage.OUTLINE_POINT__OFFSET_METRES:
				return offsetMetres != OFFSET_METRES_EDEFAULT;
			case SpanfieldPackage.OUTLINE_POINT__HEIGHT_METRES:
				return heightMetres != HEIGHT_METRES_EDEFAULT;
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
		result.append(" (offsetMetres: ");
		result.append(offsetMetres);
		result.append(", heightMetres: ");
		result.append(heightMetres);
		result.append(')');
		return result.toString();
	}

} //OutlinePointImpl
