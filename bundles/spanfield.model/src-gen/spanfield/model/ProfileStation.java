/**
 * Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0
 */
package spanfield.model;


/**
 * <!-- begin-user-doc -->
 * A representation of the model object '<em><b>Profile Station</b></em>'.
 * <!-- end-user-doc -->
 *
 * <!-- begin-model-doc -->
 * A station at which a lateral profile and an edge table are made.
 * <!-- end-model-doc -->
 *
 * <p>
 * The following features are supported:
 * </p>
 * <ul>
 *   <li>{@link spanfield.model.ProfileStation#getStationMetres <em>Station Metres</em>}</li>
 *   <li>{@link spanfield.model.ProfileStation#getFromOffsetMetres <em>From Offset Metres</em>}</li>
 *   <li>{@link spanfield.model.ProfileStation#getToOffsetMetres <em>To Offset Metres</em>}</li>
 *   <li>{@link spanfield.model.ProfileStation#getSpacingMetres <em>Spacing Metres</em>}</li>
 * </ul>
 *
 * @see spanfield.model.SpanfieldPackage#getProfileStation()
 * @model
 * @generated
 */
public interface ProfileStation extends NamedElement {
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
	 * @see spanfield.model.SpanfieldPackage#getProfileStation_StationMetres()
	 * @model default="0"
	 * @generated
	 */
	double getStationMetres();

	/**
	 * Sets the value of the '{@link spanfield.model.ProfileStation#getStationMetres <em>Station Metres</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Station Metres</em>' attribute.
	 * @see #getStationMetres()
	 * @generated
	 */
	void setStationMetres(double value);

	/**
	 * Returns the value of the '<em><b>From Offset Metres</b></em>' attribute.
	 * The default value is <code>"-100"</code>.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * First offset of the profile in metres.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>From Offset Metres</em>' attribute.
	 * @see #setFromOffsetMetres(double)
	 * @see spanfield.model.SpanfieldPackage#getProfileStation_FromOffsetMetres()
	 * @model default="-100"
	 * @generated
	 */
	double getFromOffsetMetres();

	/**
	 * Sets the value of the '{@link spanfield.model.ProfileStation#getFromOffsetMetres <em>From Offset Metres</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>From Offset Metres</em>' attribute.
	 * @see #getFromOffsetMetres()
	 * @generated
	 */
	void setFromOffsetMetres(double value);

	/**
	 * Returns the value of the '<em><b>To Offset Metres</b></em>' attribute.
	 * The default value is <code>"100"</code>.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Last offset of the profile in metres.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>To Offset Metres</em>' attribute.
	 * @see #setToOffsetMetres(double)
	 * @see spanfield.model.SpanfieldPackage#getProfileStation_ToOffsetMetres()
	 * @model default="100"
	 * @generated
	 */
	double getToOffsetMetres();

	/**
	 * Sets the value of the '{@link spanfield.model.ProfileStation#getToOffsetMetres <em>To Offset Metres</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>To Offset Metres</em>' attribute.
	 * @see #getToOffsetMetres()
	 * @generated
	 */
	void setToOffsetMetres(double value);

	/**
	 * Returns the value of the '<em><b>Spacing Metres</b></em>' attribute.
	 * The default value is <code>"1"</code>.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Distance between the points of the profile in metres.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Spacing Metres</em>' attribute.
	 * @see #setSpacingMetres(double)
	 * @see spanfield.model.SpanfieldPackage#getProfileStation_SpacingMetres()
	 * @model default="1"
	 * @generated
	 */
	double getSpacingMetres();

	/**
	 * Sets the value of the '{@link spanfield.model.ProfileStation#getSpacingMetres <em>Spacing Metres</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Spacing Metres</em>' attribute.
	 * @see #getSpacingMetres()
	 * @generated
	 */
	void setSpacingMetres(double value);

} // ProfileStation
