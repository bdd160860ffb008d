/**
 * Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0
 */
package spanfield.model;

import org.eclipse.emf.common.util.EList;

/**
 * <!-- begin-user-doc -->
 * A representation of the model object '<em><b>Survey</b></em>'.
 * <!-- end-user-doc -->
 *
 * <!-- begin-model-doc -->
 * Readings of the magnetic field taken in the corridor.
 * <!-- end-model-doc -->
 *
 * <p>
 * The following features are supported:
 * </p>
 * <ul>
 *   <li>{@link spanfield.model.Survey#getDate <em>Date</em>}</li>
 *   <li>{@link spanfield.model.Survey#getInstrument <em>Instrument</em>}</li>
 *   <li>{@link spanfield.model.Survey#getRelativeUncertainty <em>Relative Uncertainty</em>}</li>
 *   <li>{@link spanfield.model.Survey#getReadings <em>Readings</em>}</li>
 * </ul>
 *
 * @see spanfield.model.SpanfieldPackage#getSurvey()
 * @model
 * @generated
 */
public interface Survey extends NamedElement {
	/**
	 * Returns the value of the '<em><b>Date</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Date of the measurement, ISO 8601.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Date</em>' attribute.
	 * @see #setDate(String)
	 * @see spanfield.model.SpanfieldPackage#getSurvey_Date()
	 * @model
	 * @generated
	 */
	String getDate();

	/**
	 * Sets the value of the '{@link spanfield.model.Survey#getDate <em>Date</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Date</em>' attribute.
	 * @see #getDate()
	 * @generated
	 */
	void setDate(String value);

	/**
	 * Returns the value of the '<em><b>Instrument</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Instrument and its calibration.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Instrument</em>' attribute.
	 * @see #setInstrument(String)
	 * @see spanfield.model.SpanfieldPackage#getSurvey_Instrument()
	 * @model
	 * @generated
	 */
	String getInstrument();

	/**
	 * Sets the value of the '{@link spanfield.model.Survey#getInstrument <em>Instrument</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Instrument</em>' attribute.
	 * @see #getInstrument()
	 * @generated
	 */
	void setInstrument(String value);

	/**
	 * Returns the value of the '<em><b>Relative Uncertainty</b></em>' attribute.
	 * The default value is <code>"0.05"</code>.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Relative uncertainty of the readings (dimensionless), as stated for the instrument.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Relative Uncertainty</em>' attribute.
	 * @see #setRelativeUncertainty(double)
	 * @see spanfield.model.SpanfieldPackage#getSurvey_RelativeUncertainty()
	 * @model default="0.05"
	 * @generated
	 */
	double getRelativeUncertainty();

	/**
	 * Sets the value of the '{@link spanfield.model.Survey#getRelativeUncertainty <em>Relative Uncertainty</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Relative Uncertainty</em>' attribute.
	 * @see #getRelativeUncertainty()
	 * @generated
	 */
	void setRelativeUncertainty(double value);

	/**
	 * Returns the value of the '<em><b>Readings</b></em>' containment reference list.
	 * The list contents are of type {@link spanfield.model.SurveyReading}.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Readings.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Readings</em>' containment reference list.
	 * @see spanfield.model.SpanfieldPackage#getSurvey_Readings()
	 * @model containment="true"
	 * @generated
	 */
	EList<SurveyReading> getReadings();

} // Survey
