/**
 * Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0
 */
package spanfield.model.impl;

import org.eclipse.emf.common.notify.Notification;

import org.eclipse.emf.ecore.EClass;

import org.eclipse.emf.ecore.impl.ENotificationImpl;
import org.eclipse.emf.ecore.impl.MinimalEObjectImpl;

import spanfield.model.SpanfieldPackage;
import spanfield.model.SurveyReading;

/**
 * <!-- begin-user-doc -->
 * An implementation of the model object '<em><b>Survey Reading</b></em>'.
 * <!-- end-user-doc -->
 * <p>
 * The following features are implemented:
 * </p>
 * <ul>
 *   <li>{@link spanfield.model.impl.SurveyReadingImpl#getStationMetres <em>Station Metres</em>}</li>
 *   <li>{@link spanfield.model.impl.SurveyReadingImpl#getOffsetMetres <em>Offset Metres</em>}</li>
 *   <li>{@link spanfield.model.impl.SurveyReadingImpl#getHeightMetres <em>Height Metres</em>}</li>
 *   <li>{@link spanfield.model.impl.SurveyReadingImpl#getResultantTesla <em>Resultant Tesla</em>}</li>
 * </ul>
 *
 * @generated
 */
public class SurveyReadingImpl extends MinimalEObjectImpl.Container implements SurveyReading {
	/**
	 * The default value of the '{@link #getStationMetres() <em>Station Metres</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getStationMetres()
	 * @generated
	 * @ordered
	 */
	protected static final double STATION_METRES_EDEFAULT = 0.0;

	/**
	 * The cached value of the '{@link #getStationMetres() <em>Station Metres</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getStationMetres()
	 * @generated
	 * @ordered
	 */
	protected double stationMetres = STATION_METRES_EDEFAULT;

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
	protected static final double HEIGHT_METRES_EDEFAULT = 1.0;

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
	 * The default value of the '{@link #getResultantTesla() <em>Resultant Tesla</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getResultantTesla()
	 * @generated
	 * @ordered
	 */
	protected static final double RESULTANT_TESLA_EDEFAULT = 0.0;

	/**
	 * The cached value of the '{@link #getResultantTesla() <em>Resultant Tesla</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getResultantTesla()
	 * @generated
	 * @ordered
	 */
	protected double resultantTesla = RESULTANT_TESLA_EDEFAULT;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected SurveyReadingImpl() {
		super();
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	protected EClass eStaticClass() {
		return SpanfieldPackage.Literals.SURVEY_READING;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public double getStationMetres() {
		return stationMetres;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setStationMetres(double newStationMetres) {
		double oldStationMetres = stationMetres;
		stationMetres = newStationMetres;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, SpanfieldPackage.SURVEY_READING__STATION_METRES, oldStationMetres, stationMetres));
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
			eNotify(new ENotificationImpl(this, Notification.SET, SpanfieldPackage.SURVEY_READING__OFFSET_METRES, oldOffsetMetres, offsetMetres));
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
			eNotify(new ENotificationImpl(this, Notification.SET, SpanfieldPackage.SURVEY_READING__HEIGHT_METRES, oldHeightMetres, heightMetres));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public double getResultantTesla() {
		return resultantTesla;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setResultantTesla(double newResultantTesla) {
		double oldResultantTesla = resultantTesla;
		resultantTesla = newResultantTesla;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, SpanfieldPackage.SURVEY_READING__RESULTANT_TESLA, oldResultantTesla, resultantTesla));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Object eGet(int featureID, boolean resolve, boolean coreType) {
		switch (featureID) {
			case SpanfieldPackage.SURVEY_READING__STATION_METRES:
				return getStationMetres();
			case SpanfieldPackage.SURVEY_READING__OFFSET_METRES:
				return getOffsetMetres();
			case SpanfieldPackage.SURVEY_READING__HEIGHT_METRES:
				return getHeightMetres();
			case SpanfieldPackage.SURVEY_READING__RESULTANT_TESLA:
				return getResultantTesla();
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
			case SpanfieldPackage.SURVEY_READING__STATION_METRES:
				setStationMetres((Double)newValue);
				return;
			case SpanfieldPackage.SURVEY_READING__OFFSET_METRES:
				setOffsetMetres((Double)newValue);
				return;
			case SpanfieldPackage.SURVEY_READING__HEIGHT_METRES:
				setHeightMetres((Double)newValue);
				return;
			case SpanfieldPackage.SURVEY_READING__RESULTANT_TESLA:
				setResultantTesla((Double)newValue);
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
			case SpanfieldPackage.SURVEY_READING__STATION_METRES:
				setStationMetres(STATION_METRES_EDEFAULT);
				return;
			case SpanfieldPackage.SURVEY_READING__OFFSET_METRES:
				setOffsetMetres(OFFSET_METRES_EDEFAULT);
				return;
			case SpanfieldPackage.SURVEY_READING__HEIGHT_METRES:
				setHeightMetres(HEIGHT_METRES_EDEFAULT);
				return;
			case SpanfieldPackage.SURVEY_READING__RESULTANT_TESLA:
				setResultantTesla(RESULTANT_TESLA_EDEFAULT);
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
			case SpanfieldPackage.SURVEY_READING__STATION_METRES:
				return stationMetres != STATION_METRES_EDEFAULT;
			case SpanfieldPackage.SURVEY_READING__OFFSET_METRES:
				return offsetMetres != OFFSET_METRES_EDEFAULT;
			case SpanfieldPackage.SURVEY_READING__HEIGHT_METRES:
				return heightMetres != HEIGHT_METRES_EDEFAULT;
			case SpanfieldPackage.SURVEY_READING__RESULTANT_TESLA:
				return resultantTesla != RESULTANT_TESLA_EDEFAULT;
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
		result.append(" (stationMetres: ");
		result.append(stationMetres);
		result.append(", offsetMetres: ");
		result.append(offsetMetres);
		result.append(", heightMetres: ");
		result.append(heightMetres);
		result.append(", resultantTesla: ");
		result.append(resultantTesla);
		result.append(')');
		return result.toString();
	}

} //SurveyReadingImpl
