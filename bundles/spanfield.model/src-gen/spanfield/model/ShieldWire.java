/**
 * Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0
 */
package spanfield.model;


/**
 * <!-- begin-user-doc -->
 * A representation of the model object '<em><b>Shield Wire</b></em>'.
 * <!-- end-user-doc -->
 *
 * <!-- begin-model-doc -->
 * A shield (earth) wire.
 * <!-- end-model-doc -->
 *
 * <p>
 * The following features are supported:
 * </p>
 * <ul>
 *   <li>{@link spanfield.model.ShieldWire#getAttachment <em>Attachment</em>}</li>
 *   <li>{@link spanfield.model.ShieldWire#getBonding <em>Bonding</em>}</li>
 *   <li>{@link spanfield.model.ShieldWire#getGivenCurrentAmperes <em>Given Current Amperes</em>}</li>
 *   <li>{@link spanfield.model.ShieldWire#getGivenAngleDegrees <em>Given Angle Degrees</em>}</li>
 * </ul>
 *
 * @see spanfield.model.SpanfieldPackage#getShieldWire()
 * @model
 * @generated
 */
public interface ShieldWire extends StrungElement {
	/**
	 * Returns the value of the '<em><b>Attachment</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Name of the attachment that carries the wire on every structure of the line.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Attachment</em>' attribute.
	 * @see #setAttachment(String)
	 * @see spanfield.model.SpanfieldPackage#getShieldWire_Attachment()
	 * @model
	 * @generated
	 */
	String getAttachment();

	/**
	 * Sets the value of the '{@link spanfield.model.ShieldWire#getAttachment <em>Attachment</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Attachment</em>' attribute.
	 * @see #getAttachment()
	 * @generated
	 */
	void setAttachment(String value);

	/**
	 * Returns the value of the '<em><b>Bonding</b></em>' attribute.
	 * The default value is <code>"BONDED"</code>.
	 * The literals are from the enumeration {@link spanfield.model.Bonding}.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * How the wire is connected.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Bonding</em>' attribute.
	 * @see spanfield.model.Bonding
	 * @see #setBonding(Bonding)
	 * @see spanfield.model.SpanfieldPackage#getShieldWire_Bonding()
	 * @model default="BONDED"
	 * @generated
	 */
	Bonding getBonding();

	/**
	 * Sets the value of the '{@link spanfield.model.ShieldWire#getBonding <em>Bonding</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Bonding</em>' attribute.
	 * @see spanfield.model.Bonding
	 * @see #getBonding()
	 * @generated
	 */
	void setBonding(Bonding value);

	/**
	 * Returns the value of the '<em><b>Given Current Amperes</b></em>' attribute.
	 * The default value is <code>"0"</code>.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Current in amperes RMS, for a given current.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Given Current Amperes</em>' attribute.
	 * @see #setGivenCurrentAmperes(double)
	 * @see spanfield.model.SpanfieldPackage#getShieldWire_GivenCurrentAmperes()
	 * @model default="0"
	 * @generated
	 */
	double getGivenCurrentAmperes();

	/**
	 * Sets the value of the '{@link spanfield.model.ShieldWire#getGivenCurrentAmperes <em>Given Current Amperes</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Given Current Amperes</em>' attribute.
	 * @see #getGivenCurrentAmperes()
	 * @generated
	 */
	void setGivenCurrentAmperes(double value);

	/**
	 * Returns the value of the '<em><b>Given Angle Degrees</b></em>' attribute.
	 * The default value is <code>"0"</code>.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Angle of the given current in degrees.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Given Angle Degrees</em>' attribute.
	 * @see #setGivenAngleDegrees(double)
	 * @see spanfield.model.SpanfieldPackage#getShieldWire_GivenAngleDegrees()
	 * @model default="0"
	 * @generated
	 */
	double getGivenAngleDegrees();

	/**
	 * Sets the value of the '{@link spanfield.model.ShieldWire#getGivenAngleDegrees <em>Given Angle Degrees</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Given Angle Degrees</em>' attribute.
	 * @see #getGivenAngleDegrees()
	 * @generated
	 */
	void setGivenAngleDegrees(double value);

} // ShieldWire
