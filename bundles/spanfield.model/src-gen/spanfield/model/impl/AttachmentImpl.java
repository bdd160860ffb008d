/**
 * Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0
 */
package spanfield.model.impl;

import org.eclipse.emf.common.notify.Notification;

import org.eclipse.emf.ecore.EClass;

import org.eclipse.emf.ecore.impl.ENotificationImpl;
import org.eclipse.emf.ecore.impl.MinimalEObjectImpl;

import spanfield.model.Attachment;
import spanfield.model.AttachmentRole;
import spanfield.model.SpanfieldPackage;

/**
 * <!-- begin-user-doc -->
 * An implementation of the model object '<em><b>Attachment</b></em>'.
 * <!-- end-user-doc -->
 * <p>
 * The following features are implemented:
 * </p>
 * <ul>
 *   <li>{@link spanfield.model.impl.AttachmentImpl#getName <em>Name</em>}</li>
 *   <li>{@link spanfield.model.impl.AttachmentImpl#getRole <em>Role</em>}</li>
 *   <li>{@link spanfield.model.impl.AttachmentImpl#getOffsetMetres <em>Offset Metres</em>}</li>
 *   <li>{@link spanfield.model.impl.AttachmentImpl#getHeightMetres <em>Height Metres</em>}</li>
 *   <li>{@link spanfield.model.impl.AttachmentImpl#getInsulatorLengthMetres <em>Insulator Length Metres</em>}</li>
 * </ul>
 *
 * @generated
 */
public class AttachmentImpl extends MinimalEObjectImpl.Container implements Attachment {
	/**
	 * The default value of the '{@link #getName() <em>Name</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getName()
	 * @generated
	 * @ordered
	 */
	protected static final String NAME_EDEFAULT = null;

	/**
	 * The cached value of the '{@link #getName() <em>Name</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getName()
	 * @generated
	 * @ordered
	 */
	protected String name = NAME_EDEFAULT;

	/**
	 * The default value of the '{@link #getRole() <em>Role</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getRole()
	 * @generated
	 * @ordered
	 */
	protected static final AttachmentRole ROLE_EDEFAULT = AttachmentRole.PHASE;

	/**
	 * The cached value of the '{@link #getRole() <em>Role</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getRole()
	 * @generated
	 * @ordered
	 */
	protected AttachmentRole role = ROLE_EDEFAULT;

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
	 * The default value of the '{@link #getInsulatorLengthMetres() <em>Insulator Length Metres</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getInsulatorLengthMetres()
	 * @generated
	 * @ordered
	 */
	protected static final double INSULATOR_LENGTH_METRES_EDEFAULT = 0.0;

	/**
	 * The cached value of the '{@link #getInsulatorLengthMetres() <em>Insulator Length Metres</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getInsulatorLengthMetres()
	 * @generated
	 * @ordered
	 */
	protected double insulatorLengthMetres = INSULATOR_LENGTH_METRES_EDEFAULT;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected AttachmentImpl() {
		super();
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	protected EClass eStaticClass() {
		return SpanfieldPackage.Literals.ATTACHMENT;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public String getName() {
		return name;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setName(String newName) {
		String oldName = name;
		name = newName;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, SpanfieldPackage.ATTACHMENT__NAME, oldName, name));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public AttachmentRole getRole() {
		return role;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setRole(AttachmentRole newRole) {
		AttachmentRole oldRole = role;
		role = newRole == null ? ROLE_EDEFAULT : newRole;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, SpanfieldPackage.ATTACHMENT__ROLE, oldRole, role));
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
			eNotify(new ENotificationImpl(this, Notification.SET, SpanfieldPackage.ATTACHMENT__OFFSET_METRES, oldOffsetMetres, offsetMetres));
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
			eNotify(new ENotificationImpl(this, Notification.SET, SpanfieldPackage.ATTACHMENT__HEIGHT_METRES, oldHeightMetres, heightMetres));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public double getInsulatorLengthMetres() {
		return insulatorLengthMetres;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setInsulatorLengthMetres(double newInsulatorLengthMetres) {
		double oldInsulatorLengthMetres = insulatorLengthMetres;
		insulatorLengthMetres = newInsulatorLengthMetres;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, SpanfieldPackage.ATTACHMENT__INSULATOR_LENGTH_METRES, oldInsulatorLengthMetres, insulatorLengthMetres));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Object eGet(int featureID, boolean resolve, boolean coreType) {
		switch (featureID) {
			case SpanfieldPackage.ATTACHMENT__NAME:
				return getName();
			case SpanfieldPackage.ATTACHMENT__ROLE:
				return getRole();
			case SpanfieldPackage.ATTACHMENT__OFFSET_METRES:
				return getOffsetMetres();
			case SpanfieldPackage.ATTACHMENT__HEIGHT_METRES:
				return getHeightMetres();
			case SpanfieldPackage.ATTACHMENT__INSULATOR_LENGTH_METRES:
				return getInsulatorLengthMetres();
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
			case SpanfieldPackage.ATTACHMENT__NAME:
				setName((String)newValue);
				return;
			case SpanfieldPackage.ATTACHMENT__ROLE:
				setRole((AttachmentRole)newValue);
				return;
			case SpanfieldPackage.ATTACHMENT__OFFSET_METRES:
				setOffsetMetres((Double)newValue);
				return;
			case SpanfieldPackage.ATTACHMENT__HEIGHT_METRES:
				setHeightMetres((Double)newValue);
				return;
			case SpanfieldPackage.ATTACHMENT__INSULATOR_LENGTH_METRES:
				setInsulatorLengthMetres((Double)newValue);
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
			case SpanfieldPackage.ATTACHMENT__NAME:
				setName(NAME_EDEFAULT);
				return;
			case SpanfieldPackage.ATTACHMENT__ROLE:
				setRole(ROLE_EDEFAULT);
				return;
			case SpanfieldPackage.ATTACHMENT__OFFSET_METRES:
				setOffsetMetres(OFFSET_METRES_EDEFAULT);
				return;
			case SpanfieldPackage.ATTACHMENT__HEIGHT_METRES:
				setHeightMetres(HEIGHT_METRES_EDEFAULT);
				return;
			case SpanfieldPackage.ATTACHMENT__INSULATOR_LENGTH_METRES:
				setInsulatorLengthMetres(INSULATOR_LENGTH_METRES_EDEFAULT);
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
			case SpanfieldPackage.ATTACHMENT__NAME:
				return NAME_EDEFAULT == null ? name != null : !NAME_EDEFAULT.equals(name);
			case SpanfieldPackage.ATTACHMENT__ROLE:
				return role != ROLE_EDEFAULT;
			case SpanfieldPackage.ATTACHMENT__OFFSET_METRES:
				return offsetMetres != OFFSET_METRES_EDEFAULT;
			case SpanfieldPackage.ATTACHMENT__HEIGHT_METRES:
				return heightMetres != HEIGHT_METRES_EDEFAULT;
			case SpanfieldPackage.ATTACHMENT__INSULATOR_LENGTH_METRES:
				return insulatorLengthMetres != INSULATOR_LENGTH_METRES_EDEFAULT;
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
		result.append(" (name: ");
		result.append(name);
		result.append(", role: ");
		result.append(role);
		result.append(", offsetMetres: ");
		result.append(offsetMetres);
		result.append(", heightMetres: ");
		result.append(heightMetres);
		result.append(", insulatorLengthMetres: ");
		result.append(insulatorLengthMetres);
		result.append(')');
		return result.toString();
	}

} //AttachmentImpl
