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

import spanfield.model.SpanfieldPackage;
import spanfield.model.Survey;
import spanfield.model.SurveyReading;

/**
 * <!-- begin-user-doc -->
 * An implementation of the model object '<em><b>Survey</b></em>'.
 * <!-- end-user-doc -->
 * <p>
 * The following features are implemented:
 * </p>
 * <ul>
 *   <li>{@link spanfield.model.impl.SurveyImpl#getDate <em>Date</em>}</li>
 *   <li>{@link spanfield.model.impl.SurveyImpl#getInstrument <em>Instrument</em>}</li>
 *   <li>{@link spanfield.model.impl.SurveyImpl#getRelativeUncertainty <em>Relative Uncertainty</em>}</li>
 *   <li>{@link spanfield.model.impl.SurveyImpl#getReadings <em>Readings</em>}</li>
 * </ul>
 *
 * @generated
 */
public class SurveyImpl extends NamedElementImpl implements Survey {
	/**
	 * The default value of the '{@link #getDate() <em>Date</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getDate()
	 * @generated
	 * @ordered
	 */
	protected static final String DATE_EDEFAULT = null;

	/**
	 * The cached value of the '{@link #getDate() <em>Date</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getDate()
	 * @generated
	 * @ordered
	 */
	protected String date = DATE_EDEFAULT;

	/**
	 * The default value of the '{@link #getInstrument() <em>Instrument</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getInstrument()
	 * @generated
	 * @ordered
	 */
	protected static final String INSTRUMENT_EDEFAULT = null;

	/**
	 * The cached value of the '{@link #getInstrument() <em>Instrument</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getInstrument()
	 * @generated
	 * @ordered
	 */
	protected String instrument = INSTRUMENT_EDEFAULT;

	/**
	 * The default value of the '{@link #getRelativeUncertainty() <em>Relative Uncertainty</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getRelativeUncertainty()
	 * @generated
	 * @ordered
	 */
	protected static final double RELATIVE_UNCERTAINTY_EDEFAULT = 0.05;

	/**
	 * The cached value of the '{@link #getRelativeUncertainty() <em>Relative Uncertainty</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getRelativeUncertainty()
	 * @generated
	 * @ordered
	 */
	protected double relativeUncertainty = RELATIVE_UNCERTAINTY_EDEFAULT;

	/**
	 * The cached value of the '{@link #getReadings() <em>Readings</em>}' containment reference list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getReadings()
	 * @generated
	 * @ordered
	 */
	protected EList<SurveyReading> readings;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected SurveyImpl() {
		super();
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	protected EClass eStaticClass() {
		return SpanfieldPackage.Literals.SURVEY;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public String getDate() {
		return date;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setDate(String newDate) {
		String oldDate = date;
		date = newDate;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, SpanfieldPackage.SURVEY__DATE, oldDate, date));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public String getInstrument() {
		return instrument;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setInstrument(String newInstrument) {
		String oldInstrument = instrument;
		instrument = newInstrument;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, SpanfieldPackage.SURVEY__INSTRUMENT, oldInstrument, instrument));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public double getRelativeUncertainty() {
		return relativeUncertainty;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setRelativeUncertainty(double newRelativeUncertainty) {
		double oldRelativeUncertainty = relativeUncertainty;
		relativeUncertainty = newRelativeUncertainty;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, SpanfieldPackage.SURVEY__RELATIVE_UNCERTAINTY, oldRelativeUncertainty, relativeUncertainty));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EList<SurveyReading> getReadings() {
		if (readings == null) {
			readings = new EObjectContainmentEList<SurveyReading>(SurveyReading.class, this, SpanfieldPackage.SURVEY__READINGS);
		}
		return readings;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public NotificationChain eInverseRemove(InternalEObject otherEnd, int featureID, NotificationChain msgs) {
		switch (featureID) {
			case SpanfieldPackage.SURVEY__READINGS:
				return ((InternalEList<?>)getReadings()).basicRemove(otherEnd, msgs);
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
			case SpanfieldPackage.SURVEY__DATE:
				return getDate();
			case SpanfieldPackage.SURVEY__INSTRUMENT:
				return getInstrument();
			case SpanfieldPackage.SURVEY__RELATIVE_UNCERTAINTY:
				return getRelativeUncertainty();
			case SpanfieldPackage.SURVEY__READINGS:
				return getReadings();
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
			case SpanfieldPackage.SURVEY__DATE:
				setDate((String)newValue);
				return;
			case SpanfieldPackage.SURVEY__INSTRUMENT:
				setInstrument((String)newValue);
				return;
			case SpanfieldPackage.SURVEY__RELATIVE_UNCERTAINTY:
				setRelativeUncertainty((Double)newValue);
				return;
			case SpanfieldPackage.SURVEY__READINGS:
				getReadings().clear();
				getReadings().addAll((Collection<? extends SurveyReading>)newValue);
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
			case SpanfieldPackage.SURVEY__DATE:
				setDate(DATE_EDEFAULT);
				return;
			case SpanfieldPackage.SURVEY__INSTRUMENT:
				setInstrument(INSTRUMENT_EDEFAULT);
				return;
			case SpanfieldPackage.SURVEY__RELATIVE_UNCERTAINTY:
				setRelativeUncertainty(RELATIVE_UNCERTAINTY_EDEFAULT);
				return;
			case SpanfieldPackage.SURVEY__READINGS:
				getReadings().clear();
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
			case SpanfieldPackage.SURVEY__DATE:
				return DATE_EDEFAULT == null ? date != null : !DATE_EDEFAULT.equals(date);
			case SpanfieldPackage.SURVEY__INSTRUMENT:
				return INSTRUMENT_EDEFAULT == null ? instrument != null : !INSTRUMENT_EDEFAULT.equals(instrument);
			case SpanfieldPackage.SURVEY__RELATIVE_UNCERTAINTY:
				return relativeUncertainty != RELATIVE_UNCERTAINTY_EDEFAULT;
			case SpanfieldPackage.SURVEY__READINGS:
				return readings != null && !readings.isEmpty();
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
		result.append(" (date: ");
		result.append(date);
		result.append(", instrument: ");
		result.append(instrument);
		result.append(", relativeUncertainty: ");
		result.append(relativeUncertainty);
		result.append(')');
		return result.toString();
	}

} //SurveyImpl
