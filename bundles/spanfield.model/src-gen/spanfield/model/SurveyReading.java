/**
 * Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0
 */
package spanfield.model;

import org.eclipse.emf.ecore.EObject;

/**
 * <!-- begin-user-doc -->
 * A representation of the model object '<em><b>Survey Reading</b></em>'.
 * <!-- end-user-doc -->
 *
 * <!-- begin-model-doc -->
 * One reading.
 * <!-- end-model-doc -->
 *
 * <p>
 * The following features are supported:
 * </p>
 * <ul>
 *   <li>{@link spanfield.model.SurveyReading#getStationMetres <em>Station Metres</em>}</li>
 *   <li>{@link spanfield.model.SurveyReading#getOffsetMetres <em>Offset Metres</em>}</li>
 *   <li>{@link spanfield.model.SurveyReading#getHeightMetres <em>Height Metres</em>}</li>
 *   <li>{@link spanfield.model.SurveyReading#getResultantTesla <em>Resultant Tesla</em>}</li>
 * </ul>
 *
 * @see spanfield.model.SpanfieldPackage#getSurveyReading()
 * @model
 * @generated
 */
public interface SurveyReading extends EObject {
	/**
	 * Returns the value of the '<em><b>Station Metres</b></em>' attribute.
	 * The default value is <code>"0"</code>.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Station in metres.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Station Metres</em>' attribute.
	 * @see #setStationMetres(double)
	 * @see spanfield.model.SpanfieldPackage#getSurveyReading_StationMetres()
	 * @model default="0"
	 * @generated
	 */
	double getStationMetres();

	/**
	 * Sets the value of the '{@link spanfield.model.SurveyReading#getStationMetres <em>Station Metres</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Station Metres</em>' attribute.
	 * @see #getStationMetres()
	 * @generated
	 */
	void setStationMetres(double value);

	/**
	 * Returns the value of the '<em><b>Offset Metres</b></em>' attribute.
	 * The default value is <code>"0"</code>.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Offset in metres.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Offset Metres</em>' attribute.
	 * @see #setOffsetMetres(double)
	 * @see spanfield.model.SpanfieldPackage#getSurveyReading_OffsetMetres()
	 * @model default="0"
	 * @generated
	 */
	double getOffsetMetres();

	/**
	 * Sets the value of the '{@link spanfield.model.SurveyReading#getOffsetMetres <em>Offset Metres</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Offset Metres</em>' attribute.
	 * @see #getOffsetMetres()
	 * @generated
	 */
	void setOffsetMetres(double value);

	/**
	 * Returns the value of the '<em><b>Height Metres</b></em>' attribute.
	 * The default value is <code>"1"</code>.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Height above the local ground in metres.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Height Metres</em>' attribute.
	 * @see #setHeightMetres(double)
	 * @see spanfield.model.SpanfieldPackage#getSurveyReading_HeightMetres()
	 * @model default="1"
	 * @generated
	 */
	double getHeightMetres();

	/**
	 * Sets the value of the '{@link spanfield.model.SurveyReading#getHeightMetres <em>Height Metres</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Height Metres</em>' attribute.
	 * @see #getHeightMetres()
	 * @generated
	 */
	void setHeightMetres(double value);

	/**
	 * Returns the value of the '<em><b>Resultant Tesla</b></em>' attribute.
	 * The default value is <code>"0"</code>.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Resultant of the magnetic flux density in tesla RMS.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Resultant Tesla</em>' attribute.
	 * @see #setResultantTesla(double)
	 * @see spanfield.model.SpanfieldPackage#getSurveyReading_ResultantTesla()
	 * @model default="0"
	 * @generated
	 */
	double getResultantTesla();

	/**
	 * Sets the value of the '{@link spanfield.model.SurveyReading#getResultantTesla <em>Resultant Tesla</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Resultant Tesla</em>' attribute.
	 * @see #getResultantTesla()
	 * @generated
	 */
	void setResultantTesla(double value);

} // SurveyReading
