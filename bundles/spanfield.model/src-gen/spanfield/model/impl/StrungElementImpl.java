/**
 * Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0
 */
package spanfield.model.impl;

import org.eclipse.emf.common.notify.Notification;

import org.eclipse.emf.ecore.EClass;
import org.eclipse.emf.ecore.InternalEObject;

import org.eclipse.emf.ecore.impl.ENotificationImpl;

import spanfield.model.Conductor;
import spanfield.model.SpanfieldPackage;
import spanfield.model.StrungElement;

/**
 * <!-- begin-user-doc -->
 * An implementation of the model object '<em><b>Strung Element</b></em>'.
 * <!-- end-user-doc -->
 * <p>
 * The following features are implemented:
 * </p>
 * <ul>
 *   <li>{@link spanfield.model.impl.StrungElementImpl#getConductor <em>Conductor</em>}</li>
 * </ul>
 *
 * @generated
 */
public abstract class StrungElementImpl extends NamedElementImpl implements StrungElement {
	/**
	 * The cached value of the '{@link #getConductor() <em>Conductor</em>}' reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getConductor()
	 * @generated
	 * @ordered
	 */
	protected Conductor conductor;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected StrungElementImpl() {
		super();
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	protected EClass eStaticClass() {
		return SpanfieldPackage.Literals.STRUNG_ELEMENT;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Conductor getConductor() {
		if (conductor != null && conductor.eIsProxy()) {
			InternalEObject oldConductor = (InternalEObject)conductor;
			conductor = (Conductor)eResolveProxy(oldConductor);
			if (conductor != oldConductor) {
				if (eNotificationRequired())
					eNotify(new ENotificationImpl(this, Notification.RESOLVE, SpanfieldPackage.STRUNG_ELEMENT__CONDUCTOR, oldConductor, conductor));
			}
		}
		return conductor;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public Conductor basicGetConductor() {
		return conductor;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setConductor(Conductor newConductor) {
		Conductor oldConductor = conductor;
		conductor = newConductor;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, SpanfieldPackage.STRUNG_ELEMENT__CONDUCTOR, oldConductor, conductor));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Object eGet(int featureID, boolean resolve, boolean coreType) {
		switch (featureID) {
			case SpanfieldPackage.STRUNG_ELEMENT__CONDUCTOR:
				if (resolve) return getConductor();
				return basicGetConductor();
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
			case SpanfieldPackage.STRUNG_ELEMENT__CONDUCTOR:
				setConductor((Conductor)newValue);
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
			case SpanfieldPackage.STRUNG_ELEMENT__CONDUCTOR:
				setConductor((Conductor)null);
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
			case SpanfieldPackage.STRUNG_ELEMENT__CONDUCTOR:
				return conductor != null;
		}
		return super.eIsSet(featureID);
	}

} //StrungElementImpl
