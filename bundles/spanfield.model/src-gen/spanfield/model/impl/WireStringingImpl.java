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

import org.eclipse.emf.ecore.util.EObjectResolvingEList;

import spanfield.model.SpanfieldPackage;
import spanfield.model.Stringing;
import spanfield.model.StrungElement;
import spanfield.model.WireStringing;

/**
 * <!-- begin-user-doc -->
 * An implementation of the model object '<em><b>Wire Stringing</b></em>'.
 * <!-- end-user-doc -->
 * <p>
 * The following features are implemented:
 * </p>
 * <ul>
 *   <li>{@link spanfield.model.impl.WireStringingImpl#getWires <em>Wires</em>}</li>
 *   <li>{@link spanfield.model.impl.WireStringingImpl#getStringing <em>Stringing</em>}</li>
 * </ul>
 *
 * @generated
 */
public class WireStringingImpl extends MinimalEObjectImpl.Container implements WireStringing {
	/**
	 * The cached value of the '{@link #getWires() <em>Wires</em>}' reference list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getWires()
	 * @generated
	 * @ordered
	 */
	protected EList<StrungElement> wires;

	/**
	 * The cached value of the '{@link #getStringing() <em>Stringing</em>}' containment reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getStringing()
	 * @generated
	 * @ordered
	 */
	protected Stringing stringing;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected WireStringingImpl() {
		super();
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	protected EClass eStaticClass() {
		return SpanfieldPackage.Literals.WIRE_STRINGING;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EList<StrungElement> getWires() {
		if (wires == null) {
			wires = new EObjectResolvingEList<StrungElement>(StrungElement.class, this, SpanfieldPackage.WIRE_STRINGING__WIRES);
		}
		return wires;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Stringing getStringing() {
		return stringing;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public NotificationChain basicSetStringing(Stringing newStringing, NotificationChain msgs) {
		Stringing oldStringing = stringing;
		stringing = newStringing;
		if (eNotificationRequired()) {
			ENotificationImpl notification = new ENotificationImpl(this, Notification.SET, SpanfieldPackage.WIRE_STRINGING__STRINGING, oldStringing, newStringing);
			if (msgs == null) msgs = notification; else msgs.add(notification);
		}
		return msgs;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setStringing(Stringing newStringing) {
		if (newStringing != stringing) {
			NotificationChain msgs = null;
			if (stringing != null)
				msgs = ((InternalEObject)stringing).eInverseRemove(this, EOPPOSITE_FEATURE_BASE - SpanfieldPackage.WIRE_STRINGING__STRINGING, null, msgs);
			if (newStringing != null)
				msgs = ((InternalEObject)newStringing).eInverseAdd(this, EOPPOSITE_FEATURE_BASE - SpanfieldPackage.WIRE_STRINGING__STRINGING, null, msgs);
			msgs = basicSetStringing(newStringing, msgs);
			if (msgs != null) msgs.dispatch();
		}
		else if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, SpanfieldPackage.WIRE_STRINGING__STRINGING, newStringing, newStringing));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public NotificationChain eInverseRemove(InternalEObject otherEnd, int featureID, NotificationChain msgs) {
		switch (featureID) {
			case SpanfieldPackage.WIRE_STRINGING__STRINGING:
				return basicSetStringing(null, msgs);
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
			case SpanfieldPackage.WIRE_STRINGING__WIRES:
				return getWires();
			case SpanfieldPackage.WIRE_STRINGING__STRINGING:
				return getStringing();
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
			case SpanfieldPackage.WIRE_STRINGING__WIRES:
				getWires().clear();
				getWires().addAll((Collection<? extends StrungElement>)newValue);
				return;
			case SpanfieldPackage.WIRE_STRINGING__STRINGING:
				setStringing((Stringing)newValue);
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
			case SpanfieldPackage.WIRE_STRINGING__WIRES:
				getWires().clear();
				return;
			case SpanfieldPackage.WIRE_STRINGING__STRINGING:
				setStringing((Stringing)null);
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
			case SpanfieldPackage.WIRE_STRINGING__WIRES:
				return wires != null && !wires.isEmpty();
			case SpanfieldPackage.WIRE_STRINGING__STRINGING:
				return stringing != null;
		}
		return super.eIsSet(featureID);
	}

} //WireStringingImpl
