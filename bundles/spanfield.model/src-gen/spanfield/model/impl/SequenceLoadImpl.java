/**
 * Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0
 */
package spanfield.model.impl;

import org.eclipse.emf.common.notify.Notification;

import org.eclipse.emf.ecore.EClass;

import org.eclipse.emf.ecore.impl.ENotificationImpl;

import spanfield.model.SequenceLoad;
import spanfield.model.SpanfieldPackage;

/**
 * <!-- begin-user-doc -->
 * An implementation of the model object '<em><b>Sequence Load</b></em>'.
 * <!-- end-user-doc -->
 * <p>
 * The following features are implemented:
 * </p>
 * <ul>
 *   <li>{@link spanfield.model.impl.SequenceLoadImpl#getPositiveAmperes <em>Positive Amperes</em>}</li>
 *   <li>{@link spanfield.model.impl.SequenceLoadImpl#getPositiveAngleDegrees <em>Positive Angle Degrees</em>}</li>
 *   <li>{@link spanfield.model.impl.SequenceLoadImpl#getNegativeAmperes <em>Negative Amperes</em>}</li>
 *   <li>{@link spanfield.model.impl.SequenceLoadImpl#getNegativeAngleDegrees <em>Negative Angle Degrees</em>}</li>
 *   <li>{@link spanfield.model.impl.SequenceLoadImpl#getZeroAmperes <em>Zero Amperes</em>}</li>
 *   <li>{@link spanfield.model.impl.SequenceLoadImpl#getZeroAngleDegrees <em>Zero Angle Degrees</em>}</li>
 * </ul>
 *
 * @generated
 */
public class SequenceLoadImpl extends CircuitLoadImpl implements SequenceLoad {
	/**
	 * The default value of the '{@link #getPositiveAmperes() <em>Positive Amperes</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getPositiveAmperes()
	 * @generated
	 * @ordered
	 */
	protected static final double POSITIVE_AMPERES_EDEFAULT = 0.0;

	/**
	 * The cached value of the '{@link #getPositiveAmperes() <em>Positive Amperes</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getPositiveAmperes()
	 * @generated
	 * @ordered
	 */
	protected double positiveAmperes = POSITIVE_AMPERES_EDEFAULT;

	/**
	 * The default value of the '{@link #getPositiveAngleDegrees() <em>Positive Angle Degrees</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getPositiveAngleDegrees()
	 * @generated
	 * @ordered
	 */
	protected static final double POSITIVE_ANGLE_DEGREES_EDEFAULT = 0.0;

	/**
	 * The cached value of the '{@link #getPositiveAngleDegrees() <em>Positive Angle Degrees</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getPositiveAngleDegrees()
	 * @generated
	 * @ordered
	 */
	protected double positiveAngleDegrees = POSITIVE_ANGLE_DEGREES_EDEFAULT;

	/**
	 * The default value of the '{@link #getNegativeAmperes() <em>Negative Amperes</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getNegativeAmperes()
	 * @generated
	 * @ordered
	 */
	protected static final double NEGATIVE_AMPERES_EDEFAULT = 0.0;

	/**
	 * The cached value of the '{@link #getNegativeAmperes() <em>Negative Amperes</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getNegativeAmperes()
	 * @generated
	 * @ordered
	 */
	protected double negativeAmperes = NEGATIVE_AMPERES_EDEFAULT;

	/**
	 * The default value of the '{@link #getNegativeAngleDegrees() <em>Negative Angle Degrees</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getNegativeAngleDegrees()
	 * @generated
	 * @ordered
	 */
	protected static final double NEGATIVE_ANGLE_DEGREES_EDEFAULT = 0.0;

	/**
	 * The cached value of the '{@link #getNegativeAngleDegrees() <em>Negative Angle Degrees</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getNegativeAngleDegrees()
	 * @generated
	 * @ordered
	 */
	protected double negativeAngleDegrees = NEGATIVE_ANGLE_DEGREES_EDEFAULT;

	/**
	 * The default value of the '{@link #getZeroAmperes() <em>Zero Amperes</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getZeroAmperes()
	 * @generated
	 * @ordered
	 */
	protected static final double ZERO_AMPERES_EDEFAULT = 0.0;

	/**
	 * The cached value of the '{@link #getZeroAmperes() <em>Zero Amperes</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getZeroAmperes()
	 * @generated
	 * @ordered
	 */
	protected double zeroAmperes = ZERO_AMPERES_EDEFAULT;

	/**
	 * The default value of the '{@link #getZeroAngleDegrees() <em>Zero Angle Degrees</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getZeroAngleDegrees()
	 * @generated
	 * @ordered
	 */
	protected static final double ZERO_ANGLE_DEGREES_EDEFAULT = 0.0;

	/**
	 * The cached value of the '{@link #getZeroAngleDegrees() <em>Zero Angle Degrees</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getZeroAngleDegrees()
	 * @generated
	 * @ordered
	 */
	protected double zeroAngleDegrees = ZERO_ANGLE_DEGREES_EDEFAULT;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected SequenceLoadImpl() {
		super();
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	protected EClass eStaticClass() {
		return SpanfieldPackage.Literals.SEQUENCE_LOAD;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public double getPositiveAmperes() {
		return positiveAmperes;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setPositiveAmperes(double newPositiveAmperes) {
		double oldPositiveAmperes = positiveAmperes;
		positiveAmperes = newPositiveAmperes;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, SpanfieldPackage.SEQUENCE_LOAD__POSITIVE_AMPERES, oldPositiveAmperes, positiveAmperes));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public double getPositiveAngleDegrees() {
		return positiveAngleDegrees;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setPositiveAngleDegrees(double newPositiveAngleDegrees) {
		double oldPositiveAngleDegrees = positiveAngleDegrees;
		positiveAngleDegrees = newPositiveAngleDegrees;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, SpanfieldPackage.SEQUENCE_LOAD__POSITIVE_ANGLE_DEGREES, oldPositiveAngleDegrees, positiveAngleDegrees));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public double getNegativeAmperes() {
		return negativeAmperes;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setNegativeAmperes(double newNegativeAmperes) {
		double oldNegativeAmperes = negativeAmperes;
		negativeAmperes = newNegativeAmperes;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, SpanfieldPackage.SEQUENCE_LOAD__NEGATIVE_AMPERES, oldNegativeAmperes, negativeAmperes));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public double getNegativeAngleDegrees() {
		return negativeAngleDegrees;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setNegativeAngleDegrees(double newNegativeAngleDegrees) {
		double oldNegativeAngleDegrees = negativeAngleDegrees;
		negativeAngleDegrees = newNegativeAngleDegrees;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, SpanfieldPackage.SEQUENCE_LOAD__NEGATIVE_ANGLE_DEGREES, oldNegativeAngleDegrees, negativeAngleDegrees));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public double getZeroAmperes() {
		return zeroAmperes;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setZeroAmperes(double newZeroAmperes) {
		double oldZeroAmperes = zeroAmperes;
		zeroAmperes = newZeroAmperes;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, SpanfieldPackage.SEQUENCE_LOAD__ZERO_AMPERES, oldZeroAmperes, zeroAmperes));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public double getZeroAngleDegrees() {
		return zeroAngleDegrees;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setZeroAngleDegrees(double newZeroAngleDegrees) {
		double oldZeroAngleDegrees = zeroAngleDegrees;
		zeroAngleDegrees = newZeroAngleDegrees;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, SpanfieldPackage.SEQUENCE_LOAD__ZERO_ANGLE_DEGREES, oldZeroAngleDegrees, zeroAngleDegrees));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Object eGet(int featureID, boolean resolve, boolean coreType) {
		switch (featureID) {
			case SpanfieldPackage.SEQUENCE_LOAD__POSITIVE_AMPERES:
				return getPositiveAmperes();
			case SpanfieldPackage.SEQUENCE_LOAD__POSITIVE_ANGLE_DEGREES:
				return getPositiveAngleDegrees();
			case SpanfieldPackage.SEQUENCE_LOAD__NEGATIVE_AMPERES:
				return getNegativeAmperes();
			case SpanfieldPackage.SEQUENCE_LOAD__NEGATIVE_ANGLE_DEGREES:
				return getNegativeAngleDegrees();
			case SpanfieldPackage.SEQUENCE_LOAD__ZERO_AMPERES:
				return getZeroAmperes();
			case SpanfieldPackage.SEQUENCE_LOAD__ZERO_ANGLE_DEGREES:
				return getZeroAngleDegrees();
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
			case SpanfieldPackage.SEQUENCE_LOAD__POSITIVE_AMPERES:
				setPositiveAmperes((Double)newValue);
				return;
			case SpanfieldPackage.SEQUENCE_LOAD__POSITIVE_ANGLE_DEGREES:
				setPositiveAngleDegrees((Double)newValue);
				return;
			case SpanfieldPackage.SEQUENCE_LOAD__NEGATIVE_AMPERES:
				setNegativeAmperes((Double)newValue);
				return;
			case SpanfieldPackage.SEQUENCE_LOAD__NEGATIVE_ANGLE_DEGREES:
				setNegativeAngleDegrees((Double)newValue);
				return;
			case SpanfieldPackage.SEQUENCE_LOAD__ZERO_AMPERES:
				setZeroAmperes((Double)newValue);
				return;
			case SpanfieldPackage.SEQUENCE_LOAD__ZERO_ANGLE_DEGREES:
				setZeroAngleDegrees((Double)newValue);
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
			case SpanfieldPackage.SEQUENCE_LOAD__POSITIVE_AMPERES:
				setPositiveAmperes(POSITIVE_AMPERES_EDEFAULT);
				return;
			case SpanfieldPackage.SEQUENCE_LOAD__POSITIVE_ANGLE_DEGREES:
				setPositiveAngleDegrees(POSITIVE_ANGLE_DEGREES_EDEFAULT);
				return;
			case SpanfieldPackage.SEQUENCE_LOAD__NEGATIVE_AMPERES:
				setNegativeAmperes(NEGATIVE_AMPERES_EDEFAULT);
				return;
			case SpanfieldPackage.SEQUENCE_LOAD__NEGATIVE_ANGLE_DEGREES:
				setNegativeAngleDegrees(NEGATIVE_ANGLE_DEGREES_EDEFAULT);
				return;
			case SpanfieldPackage.SEQUENCE_LOAD__ZERO_AMPERES:
				setZeroAmperes(ZERO_AMPERES_EDEFAULT);
				return;
			case SpanfieldPackage.SEQUENCE_LOAD__ZERO_ANGLE_DEGREES:
				setZeroAngleDegrees(ZERO_ANGLE_DEGREES_EDEFAULT);
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
			case SpanfieldPackage.SEQUENCE_LOAD__POSITIVE_AMPERES:
				return positiveAmperes != POSITIVE_AMPERES_EDEFAULT;
			case SpanfieldPackage.SEQUENCE_LOAD__POSITIVE_ANGLE_DEGREES:
				return positiveAngleDegrees != POSITIVE_ANGLE_DEGREES_EDEFAULT;
			case SpanfieldPackage.SEQUENCE_LOAD__NEGATIVE_AMPERES:
				return negativeAmperes != NEGATIVE_AMPERES_EDEFAULT;
			case SpanfieldPackage.SEQUENCE_LOAD__NEGATIVE_ANGLE_DEGREES:
				return negativeAngleDegrees != NEGATIVE_ANGLE_DEGREES_EDEFAULT;
			case SpanfieldPackage.SEQUENCE_LOAD__ZERO_AMPERES:
				return zeroAmperes != ZERO_AMPERES_EDEFAULT;
			case SpanfieldPackage.SEQUENCE_LOAD__ZERO_ANGLE_DEGREES:
				return zeroAngleDegrees != ZERO_ANGLE_DEGREES_EDEFAULT;
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
		result.append(" (positiveAmperes: ");
		result.append(positiveAmperes);
		result.append(", positiveAngleDegrees: ");
		result.append(positiveAngleDegrees);
		result.append(", negativeAmperes: ");
		result.append(negativeAmperes);
		result.append(", negativeAngleDegrees: ");
		result.append(negativeAngleDegrees);
		result.append(", zeroAmperes: ");
		result.append(zeroAmperes);
		result.append(", zeroAngleDegrees: ");
		result.append(zeroAngleDegrees);
		result.append(')');
		return result.toString();
	}

} //SequenceLoadImpl
