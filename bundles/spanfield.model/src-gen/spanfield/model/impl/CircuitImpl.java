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

import org.eclipse.emf.ecore.util.EObjectContainmentEList;
import org.eclipse.emf.ecore.util.InternalEList;

import spanfield.model.Circuit;
import spanfield.model.Phase;
import spanfield.model.Phasing;
import spanfield.model.SpanfieldPackage;

/**
 * <!-- begin-user-doc -->
 * An implementation of the model object '<em><b>Circuit</b></em>'.
 * <!-- end-user-doc -->
 * <p>
 * The following features are implemented:
 * </p>
 * <ul>
 *   <li>{@link spanfield.model.impl.CircuitImpl#getNominalVoltageVolts <em>Nominal Voltage Volts</em>}</li>
 *   <li>{@link spanfield.model.impl.CircuitImpl#getBundleCount <em>Bundle Count</em>}</li>
 *   <li>{@link spanfield.model.impl.CircuitImpl#getBundleSpacingMetres <em>Bundle Spacing Metres</em>}</li>
 *   <li>{@link spanfield.model.impl.CircuitImpl#getPhasing <em>Phasing</em>}</li>
 *   <li>{@link spanfield.model.impl.CircuitImpl#getPhases <em>Phases</em>}</li>
 * </ul>
 *
 * @generated
 */
public class CircuitImpl extends StrungElementImpl implements Circuit {
	/**
	 * The default value of the '{@link #getNominalVoltageVolts() <em>Nominal Voltage Volts</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getNominalVoltageVolts()
	 * @generated
	 * @ordered
	 */
	protected static final double NOMINAL_VOLTAGE_VOLTS_EDEFAULT = 0.0;

	/**
	 * The cached value of the '{@link #getNominalVoltageVolts() <em>Nominal Voltage Volts</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getNominalVoltageVolts()
	 * @generated
	 * @ordered
	 */
	protected double nominalVoltageVolts = NOMINAL_VOLTAGE_VOLTS_EDEFAULT;

	/**
	 * The default value of the '{@link #getBundleCount() <em>Bundle Count</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getBundleCount()
	 * @generated
	 * @ordered
	 */
	protected static final int BUNDLE_COUNT_EDEFAULT = 1;

	/**
	 * The cached value of the '{@link #getBundleCount() <em>Bundle Count</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getBundleCount()
	 * @generated
	 * @ordered
	 */
	protected int bundleCount = BUNDLE_COUNT_EDEFAULT;

	/**
	 * The default value of the '{@link #getBundleSpacingMetres() <em>Bundle Spacing Metres</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getBundleSpacingMetres()
	 * @generated
	 * @ordered
	 */
	protected static final double BUNDLE_SPACING_METRES_EDEFAULT = 0.0;

	/**
	 * The cached value of the '{@link #getBundleSpacingMetres() <em>Bundle Spacing Metres</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getBundleSpacingMetres()
	 * @generated
	 * @ordered
	 */
	protected double bundleSpacingMetres = BUNDLE_SPACING_METRES_EDEFAULT;

	/**
	 * The default value of the '{@link #getPhasing() <em>Phasing</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getPhasing()
	 * @generated
	 * @ordered
	 */
	protected static final Phasing PHASING_EDEFAULT = Phasing.FIXED;

	/**
	 * The cached value of the '{@link #getPhasing() <em>Phasing</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getPhasing()
	 * @generated
	 * @ordered
	 */
	protected Phasing phasing = PHASING_EDEFAULT;

	/**
	 * The cached value of the '{@link #getPhases() <em>Phases</em>}' containment reference list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getPhases()
	 * @generated
	 * @ordered
	 */
	protected EList<Phase> phases;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected CircuitImpl() {
		super();
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	protected EClass eStaticClass() {
		return SpanfieldPackage.Literals.CIRCUIT;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public double getNominalVoltageVolts() {
		return nominalVoltageVolts;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setNominalVoltageVolts(double newNominalVoltageVolts) {
		double oldNominalVoltageVolts = nominalVoltageVolts;
		nominalVoltageVolts = newNominalVoltageVolts;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, SpanfieldPackage.CIRCUIT__NOMINAL_VOLTAGE_VOLTS, oldNominalVoltageVolts, nominalVoltageVolts));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public int getBundleCount() {
		return bundleCount;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setBundleCount(int newBundleCount) {
		int oldBundleCount = bundleCount;
		bundleCount = newBundleCount;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, SpanfieldPackage.CIRCUIT__BUNDLE_COUNT, oldBundleCount, bundleCount));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public double getBundleSpacingMetres() {
		return bundleSpacingMetres;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setBundleSpacingMetres(double newBundleSpacingMetres) {
		double oldBundleSpacingMetres = bundleSpacingMetres;
		bundleSpacingMetres = newBundleSpacingMetres;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, SpanfieldPackage.CIRCUIT__BUNDLE_SPACING_METRES, oldBundleSpacingMetres, bundleSpacingMetres));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Phasing getPhasing() {
		return phasing;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setPhasing(Phasing newPhasing) {
		Phasing oldPhasing = phasing;
		phasing = newPhasing == null ? PHASING_EDEFAULT : newPhasing;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, SpanfieldPackage.CIRCUIT__PHASING, oldPhasing, phasing));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EList<Phase> getPhases() {
		if (phases == null) {
			phases = new EObjectContainmentEList<Phase>(Phase.class, this, SpanfieldPackage.CIRCUIT__PHASES);
		}
		return phases;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public NotificationChain eInverseRemove(InternalEObject otherEnd, int featureID, NotificationChain msgs) {
		switch (featureID) {
			case SpanfieldPackage.CIRCUIT__PHASES:
				return ((InternalEList<?>)getPhases()).basicRemove(otherEnd, msgs);
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
			case SpanfieldPackage.CIRCUIT__NOMINAL_VOLTAGE_VOLTS:
				return getNominalVoltageVolts();
			case SpanfieldPackage.CIRCUIT__BUNDLE_COUNT:
				return getBundleCount();
			case SpanfieldPackage.CIRCUIT__BUNDLE_SPACING_METRES:
				return getBundleSpacingMetres();
			case SpanfieldPackage.CIRCUIT__PHASING:
				return getPhasing();
			case SpanfieldPackage.CIRCUIT__PHASES:
				return getPhases();
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
			case SpanfieldPackage.CIRCUIT__NOMINAL_VOLTAGE_VOLTS:
				setNominalVoltageVolts((Double)newValue);
				return;
			case SpanfieldPackage.CIRCUIT__BUNDLE_COUNT:
				setBundleCount((Integer)newValue);
				return;
			case SpanfieldPackage.CIRCUIT__BUNDLE_SPACING_METRES:
				setBundleSpacingMetres((Double)newValue);
				return;
			case SpanfieldPackage.CIRCUIT__PHASING:
				setPhasing((Phasing)newValue);
				return;
			case SpanfieldPackage.CIRCUIT__PHASES:
				getPhases().clear();
				getPhases().addAll((Collection<? extends Phase>)newValue);
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
			case SpanfieldPackage.CIRCUIT__NOMINAL_VOLTAGE_VOLTS:
				setNominalVoltageVolts(NOMINAL_VOLTAGE_VOLTS_EDEFAULT);
				return;
			case SpanfieldPackage.CIRCUIT__BUNDLE_COUNT:
				setBundleCount(BUNDLE_COUNT_EDEFAULT);
				return;
			case SpanfieldPackage.CIRCUIT__BUNDLE_SPACING_METRES:
				setBundleSpacingMetres(BUNDLE_SPACING_METRES_EDEFAULT);
				return;
			case SpanfieldPackage.CIRCUIT__PHASING:
				setPhasing(PHASING_EDEFAULT);
				return;
			case SpanfieldPackage.CIRCUIT__PHASES:
				getPhases().clear();
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
			case SpanfieldPackage.CIRCUIT__NOMINAL_VOLTAGE_VOLTS:
				return nominalVoltageVolts != NOMINAL_VOLTAGE_VOLTS_EDEFAULT;
			case SpanfieldPackage.CIRCUIT__BUNDLE_COUNT:
				return bundleCount != BUNDLE_COUNT_EDEFAULT;
			case SpanfieldPackage.CIRCUIT__BUNDLE_SPACING_METRES:
				return bundleSpacingMetres != BUNDLE_SPACING_METRES_EDEFAULT;
			case SpanfieldPackage.CIRCUIT__PHASING:
				return phasing != PHASING_EDEFAULT;
			case SpanfieldPackage.CIRCUIT__PHASES:
				return phases != null && !phases.isEmpty();
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
		result.append(" (nominalVoltageVolts: ");
		result.append(nominalVoltageVolts);
		result.append(", bundleCount: ");
		result.append(bundleCount);
		result.append(", bundleSpacingMetres: ");
		result.append(bundleSpacingMetres);
		result.append(", phasing: ");
		result.append(phasing);
		result.append(')');
		return result.toString();
	}

} //CircuitImpl
