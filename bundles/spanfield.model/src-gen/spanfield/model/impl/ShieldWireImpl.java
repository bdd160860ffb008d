/**
 * Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0
 */
package spanfield.model.impl;

import org.eclipse.emf.common.notify.Notification;

import org.eclipse.emf.ecore.EClass;

import org.eclipse.emf.ecore.impl.ENotificationImpl;

import spanfield.model.Bonding;
import spanfield.model.ShieldWire;
import spanfield.model.SpanfieldPackage;

/**
 * <!-- begin-user-doc -->
 * An implementation of the model object '<em><b>Shield Wire</b></em>'.
 * <!-- end-user-doc -->
 * <p>
 * The following features are implemented:
 * </p>
 * <ul>
 *   <li>{@link spanfield.model.impl.ShieldWireImpl#getAttachment <em>Attachment</em>}</li>
 *   <li>{@link spanfield.model.impl.ShieldWireImpl#getBonding <em>Bonding</em>}</li>
 *   <li>{@link spanfield.model.impl.ShieldWireImpl#getGivenCurrentAmperes <em>Given Current Amperes</em>}</li>
 *   <li>{@link spanfield.model.impl.ShieldWireImpl#getGivenAngleDegrees <em>Given Angle Degrees</em>}</li>
 * </ul>
 *
 * @generated
 */
public class ShieldWireImpl extends StrungElementImpl implements ShieldWire {
	/**
	 * The default value of the '{@link #getAttachment() <em>Attachment</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getAttachment()
	 * @generated
	 * @ordered
	 */
	protected static final String ATTACHMENT_EDEFAULT = null;

	/**
	 * The cached value of the '{@link #getAttachment() <em>Attachment</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getAttachment()
	 * @generated
	 * @ordered
	 */
	protected String attachment = ATTACHMENT_EDEFAULT;

	/**
	 * The default value of the '{@link #getBonding() <em>Bonding</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getBonding()
	 * @generated
	 * @ordered
	 */
	protected static final Bonding BONDING_EDEFAULT = Bonding.BONDED;

	/**
	 * The cached value of the '{@link #getBonding() <em>Bonding</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getBonding()
	 * @generated
	 * @ordered
	 */
	protected Bonding bonding = BONDING_EDEFAULT;

	/**
	 * The default value of the '{@link #getGivenCurrentAmperes() <em>Given Current Amperes</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getGivenCurrentAmperes()
	 * @generated
	 * @ordered
	 */
	protected static final double GIVEN_CURRENT_AMPERES_EDEFAULT = 0.0;

	/**
	 * The cached value of the '{@link #getGivenCurrentAmperes() <em>Given Current Amperes</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getGivenCurrentAmperes()
	 * @generated
	 * @ordered
	 */
	protected double givenCurrentAmperes = GIVEN_CURRENT_AMPERES_EDEFAULT;

	/**
	 * The default value of the '{@link #getGivenAngleDegrees() <em>Given Angle Degrees</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getGivenAngleDegrees()
	 * @generated
	 * @ordered
	 */
	protected static final double GIVEN_ANGLE_DEGREES_EDEFAULT = 0.0;

	/**
	 * The cached value of the '{@link #getGivenAngleDegrees() <em>Given Angle Degrees</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getGivenAngleDegrees()
	 * @generated
	 * @ordered
	 */
	protected double givenAngleDegrees = GIVEN_ANGLE_DEGREES_EDEFAULT;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected ShieldWireImpl() {
		super();
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	protected EClass eStaticClass() {
		return SpanfieldPackage.Literals.SHIELD_WIRE;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public String getAttachment() {
		return attachment;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setAttachment(String newAttachment) {
		String oldAttachment = attachment;
		attachment = newAttachment;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, SpanfieldPackage.SHIELD_WIRE__ATTACHMENT, oldAttachment, attachment));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Bonding getBonding() {
		return bonding;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setBonding(Bonding newBonding) {
		Bonding oldBonding = bonding;
		bonding = newBonding == null ? BONDING_EDEFAULT : newBonding;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, SpanfieldPackage.SHIELD_WIRE__BONDING, oldBonding, bonding));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public double getGivenCurrentAmperes() {
		return givenCurrentAmperes;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setGivenCurrentAmperes(double newGivenCurrentAmperes) {
		double oldGivenCurrentAmperes = givenCurrentAmperes;
		givenCurrentAmperes = newGivenCurrentAmperes;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, SpanfieldPackage.SHIELD_WIRE__GIVEN_CURRENT_AMPERES, oldGivenCurrentAmperes, givenCurrentAmperes));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public double getGivenAngleDegrees() {
		return givenAngleDegrees;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setGivenAngleDegrees(double newGivenAngleDegrees) {
		double oldGivenAngleDegrees = givenAngleDegrees;
		givenAngleDegrees = newGivenAngleDegrees;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, SpanfieldPackage.SHIELD_WIRE__GIVEN_ANGLE_DEGREES, oldGivenAngleDegrees, givenAngleDegrees));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Object eGet(int featureID, boolean resolve, boolean coreType) {
		switch (featureID) {
			case SpanfieldPackage.SHIELD_WIRE__ATTACHMENT:
				return getAttachment();
			case SpanfieldPackage.SHIELD_WIRE__BONDING:
				return getBonding();
			case SpanfieldPackage.SHIELD_WIRE__GIVEN_CURRENT_AMPERES:
				return getGivenCurrentAmperes();
			case SpanfieldPackage.SHIELD_WIRE__GIVEN_ANGLE_DEGREES:
				return getGivenAngleDegrees();
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
			case SpanfieldPackage.SHIELD_WIRE__ATTACHMENT:
				setAttachment((String)newValue);
				return;
			case SpanfieldPackage.SHIELD_WIRE__BONDING:
				setBonding((Bonding)newValue);
				return;
			case SpanfieldPackage.SHIELD_WIRE__GIVEN_CURRENT_AMPERES:
				setGivenCurrentAmperes((Double)newValue);
				return;
			case SpanfieldPackage.SHIELD_WIRE__GIVEN_ANGLE_DEGREES:
				setGivenAngleDegrees((Double)newValue);
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
			case SpanfieldPackage.SHIELD_WIRE__ATTACHMENT:
				setAttachment(ATTACHMENT_EDEFAULT);
				return;
			case SpanfieldPackage.SHIELD_WIRE__BONDING:
				setBonding(BONDING_EDEFAULT);
				return;
			case SpanfieldPackage.SHIELD_WIRE__GIVEN_CURRENT_AMPERES:
				setGivenCurrentAmperes(GIVEN_CURRENT_AMPERES_EDEFAULT);
				return;
			case SpanfieldPackage.SHIELD_WIRE__GIVEN_ANGLE_DEGREES:
				setGivenAngleDegrees(GIVEN_ANGLE_DEGREES_EDEFAULT);
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
			case SpanfieldPackage.SHIELD_WIRE__ATTACHMENT:
				return ATTACHMENT_EDEFAULT == null ? attachment != null : !ATTACHMENT_EDEFAULT.equals(attachment);
			case SpanfieldPackage.SHIELD_WIRE__BONDING:
				return bonding != BONDING_EDEFAULT;
			case SpanfieldPackage.SHIELD_WIRE__GIVEN_CURRENT_AMPERES:
				return givenCurrentAmperes != GIVEN_CURRENT_AMPERES_EDEFAULT;
			case SpanfieldPackage.SHIELD_WIRE__GIVEN_ANGLE_DEGREES:
				return givenAngleDegrees != GIVEN_ANGLE_DEGREES_EDEFAULT;
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
		result.append(" (attachment: ");
		result.append(attachment);
		result.append(", bonding: ");
		result.append(bonding);
		result.append(", givenCurrentAmperes: ");
		result.append(givenCurrentAmperes);
		result.append(", givenAngleDegrees: ");
		result.append(givenAngleDegrees);
		result.append(')');
		return result.toString();
	}

} //ShieldWireImpl
