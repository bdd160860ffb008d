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

import spanfield.model.SpanfieldPackage;
import spanfield.model.Stringing;
import spanfield.model.StringingSection;
import spanfield.model.Structure;
import spanfield.model.WireStringing;

/**
 * <!-- begin-user-doc -->
 * An implementation of the model object '<em><b>Stringing Section</b></em>'.
 * <!-- end-user-doc -->
 * <p>
 * The following features are implemented:
 * </p>
 * <ul>
 *   <li>{@link spanfield.model.impl.StringingSectionImpl#getFrom <em>From</em>}</li>
 *   <li>{@link spanfield.model.impl.StringingSectionImpl#getTo <em>To</em>}</li>
 *   <li>{@link spanfield.model.impl.StringingSectionImpl#getPhaseStringing <em>Phase Stringing</em>}</li>
 *   <li>{@link spanfield.model.impl.StringingSectionImpl#getShieldStringing <em>Shield Stringing</em>}</li>
 *   <li>{@link spanfield.model.impl.StringingSectionImpl#getExceptions <em>Exceptions</em>}</li>
 * </ul>
 *
 * @generated
 */
public class StringingSectionImpl extends MinimalEObjectImpl.Container implements StringingSection {
	/**
	 * The cached value of the '{@link #getFrom() <em>From</em>}' reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getFrom()
	 * @generated
	 * @ordered
	 */
	protected Structure from;

	/**
	 * The cached value of the '{@link #getTo() <em>To</em>}' reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getTo()
	 * @generated
	 * @ordered
	 */
	protected Structure to;

	/**
	 * The cached value of the '{@link #getPhaseStringing() <em>Phase Stringing</em>}' containment reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getPhaseStringing()
	 * @generated
	 * @ordered
	 */
	protected Stringing phaseStringing;

	/**
	 * The cached value of the '{@link #getShieldStringing() <em>Shield Stringing</em>}' containment reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getShieldStringing()
	 * @generated
	 * @ordered
	 */
	protected Stringing shieldStringing;

	/**
	 * The cached value of the '{@link #getExceptions() <em>Exceptions</em>}' containment reference list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getExceptions()
	 * @generated
	 * @ordered
	 */
	protected EList<WireStringing> exceptions;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected StringingSectionImpl() {
		super();
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	protected EClass eStaticClass() {
		return SpanfieldPackage.Literals.STRINGING_SECTION;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Structure getFrom() {
		if (from != null && from.eIsProxy()) {
			InternalEObject oldFrom = (InternalEObject)from;
			from = (Structure)eResolveProxy(oldFrom);
			if (from != oldFrom) {
				if (eNotificationRequired())
					eNotify(new ENotificationImpl(this, Notification.RESOLVE, SpanfieldPackage.STRINGING_SECTION__FROM, oldFrom, from));
			}
		}
		return from;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public Structure basicGetFrom() {
		return from;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setFrom(Structure newFrom) {
		Structure oldFrom = from;
		from = newFrom;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, SpanfieldPackage.STRINGING_SECTION__FROM, oldFrom, from));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Structure getTo() {
		if (to != null && to.eIsProxy()) {
			InternalEObject oldTo = (InternalEObject)to;
			to = (Structure)eResolveProxy(oldTo);
			if (to != oldTo) {
				if (eNotificationRequired())
					eNotify(new ENotificationImpl(this, Notification.RESOLVE, SpanfieldPackage.STRINGING_SECTION__TO, oldTo, to));
			}
		}
		return to;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public Structure basicGetTo() {
		return to;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setTo(Structure newTo) {
		Structure oldTo = to;
		to = newTo;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, SpanfieldPackage.STRINGING_SECTION__TO, oldTo, to));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Stringing getPhaseStringing() {
		return phaseStringing;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public NotificationChain basicSetPhaseStringing(Stringing newPhaseStringing, NotificationChain msgs) {
		Stringing oldPhaseStringing = phaseStringing;
		phaseStringing = newPhaseStringing;
		if (eNotificationRequired()) {
			ENotificationImpl notification = new ENotificationImpl(this, Notification.SET, SpanfieldPackage.STRINGING_SECTION__PHASE_STRINGING, oldPhaseStringing, newPhaseStringing);
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
	public void setPhaseStringing(Stringing newPhaseStringing) {
		if (newPhaseStringing != phaseStringing) {
			NotificationChain msgs = null;
			if (phaseStringing != null)
				msgs = ((InternalEObject)phaseStringing).eInverseRemove(this, EOPPOSITE_FEATURE_BASE - SpanfieldPackage.STRINGING_SECTION__PHASE_STRINGING, null, msgs);
			if (newPhaseStringing != null)
				msgs = ((InternalEObject)newPhaseStringing).eInverseAdd(this, EOPPOSITE_FEATURE_BASE - SpanfieldPackage.STRINGING_SECTION__PHASE_STRINGING, null, msgs);
			msgs = basicSetPhaseStringing(newPhaseStringing, msgs);
			if (msgs != null) msgs.dispatch();
		}
		else if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, SpanfieldPackage.STRINGING_SECTION__PHASE_STRINGING, newPhaseStringing, newPhaseStringing));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Stringing getShieldStringing() {
		return shieldStringing;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public NotificationChain basicSetShieldStringing(Stringing newShieldStringing, NotificationChain msgs) {
		Stringing oldShieldStringing = shieldStringing;
		shieldStringing = newShieldStringing;
		if (eNotificationRequired()) {
			ENotificationImpl notification = new ENotificationImpl(this, Notification.SET, SpanfieldPackage.STRINGING_SECTION__SHIELD_STRINGING, oldShieldStringing, newShieldStringing);
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
	public void setShieldStringing(Stringing newShieldStringing) {
		if (newShieldStringing != shieldStringing) {
			NotificationChain msgs = null;
			if (shieldStringing != null)
				msgs = ((InternalEObject)shieldStringing).eInverseRemove(this, EOPPOSITE_FEATURE_BASE - SpanfieldPackage.STRINGING_SECTION__SHIELD_STRINGING, null, msgs);
			if (newShieldStringing != null)
				msgs = ((InternalEObject)newShieldStringing).eInverseAdd(this, EOPPOSITE_FEATURE_BASE - SpanfieldPackage.STRINGING_SECTION__SHIELD_STRINGING, null, msgs);
			msgs = basicSetShieldStringing(newShieldStringing, msgs);
			if (msgs != null) msgs.dispatch();
		}
		else if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, SpanfieldPackage.STRINGING_SECTION__SHIELD_STRINGING, newShieldStringing, newShieldStringing));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EList<WireStringing> getExceptions() {
		if (exceptions == null) {
			exceptions = new EObjectContainmentEList<WireStringing>(WireStringing.class, this, SpanfieldPackage.STRINGING_SECTION__EXCEPTIONS);
		}
		return exceptions;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public NotificationChain eInverseRemove(InternalEObject otherEnd, int featureID, NotificationChain msgs) {
		switch (featureID) {
			case SpanfieldPackage.STRINGING_SECTION__PHASE_STRINGING:
				return basicSetPhaseStringing(null, msgs);
			case SpanfieldPackage.STRINGING_SECTION__SHIELD_STRINGING:
				return basicSetShieldStringing(null, msgs);
			case SpanfieldPackage.STRINGING_SECTION__EXCEPTIONS:
				return ((InternalEList<?>)getExceptions()).basicRemove(otherEnd, msgs);
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
			case SpanfieldPackage.STRINGING_SECTION__FROM:
				if (resolve) return getFrom();
				return basicGetFrom();
			case SpanfieldPackage.STRINGING_SECTION__TO:
				if (resolve) return getTo();
				return basicGetTo();
			case SpanfieldPackage.STRINGING_SECTION__PHASE_STRINGING:
				return getPhaseStringing();
			case SpanfieldPackage.STRINGING_SECTION__SHIELD_STRINGING:
				return getShieldStringing();
			case SpanfieldPackage.STRINGING_SECTION__EXCEPTIONS:
				return getExceptions();
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
			case SpanfieldPackage.STRINGING_SECTION__FROM:
				setFrom((Structure)newValue);
				return;
			case SpanfieldPackage.STRINGING_SECTION__TO:
				setTo((Structure)newValue);
				return;
			case SpanfieldPackage.STRINGING_SECTION__PHASE_STRINGING:
				setPhaseStringing((Stringing)newValue);
				return;
			case SpanfieldPackage.STRINGING_SECTION__SHIELD_STRINGING:
				setShieldStringing((Stringing)newValue);
				return;
			case SpanfieldPackage.STRINGING_SECTION__EXCEPTIONS:
				getExceptions().clear();
				getExceptions().addAll((Collection<? extends WireStringing>)newValue);
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
			case SpanfieldPackage.STRINGING_SECTION__FROM:
				setFrom((Structure)null);
				return;
			case SpanfieldPackage.STRINGING_SECTION__TO:
				setTo((Structure)null);
				return;
			case SpanfieldPackage.STRINGING_SECTION__PHASE_STRINGING:
				setPhaseStringing((Stringing)null);
				return;
			case SpanfieldPackage.STRINGING_SECTION__SHIELD_STRINGING:
				setShieldStringing((Stringing)null);
				return;
			case SpanfieldPackage.STRINGING_SECTION__EXCEPTIONS:
				getExceptions().clear();
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
			case SpanfieldPackage.STRINGING_SECTION__FROM:
				return from != null;
			case SpanfieldPackage.STRINGING_SECTION__TO:
				return to != null;
			case SpanfieldPackage.STRINGING_SECTION__PHASE_STRINGING:
				return phaseStringing != null;
			case SpanfieldPackage.STRINGING_SECTION__SHIELD_STRINGING:
				return shieldStringing != null;
			case SpanfieldPackage.STRINGING_SECTION__EXCEPTIONS:
				return exceptions != null && !exceptions.isEmpty();
		}
		return super.eIsSet(featureID);
	}

} //StringingSectionImpl
