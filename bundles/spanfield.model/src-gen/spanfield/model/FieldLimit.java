/**
 * Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0
 */
package spanfield.model;


/**
 * <!-- begin-user-doc -->
 * A representation of the model object '<em><b>Field Limit</b></em>'.
 * <!-- end-user-doc -->
 *
 * <!-- begin-model-doc -->
 * A level against which the field is compared. Local codes and licensed practice decide which limit holds.
 * <!-- end-model-doc -->
 *
 * <p>
 * The following features are supported:
 * </p>
 * <ul>
 *   <li>{@link spanfield.model.FieldLimit#getQuantity <em>Quantity</em>}</li>
 *   <li>{@link spanfield.model.FieldLimit#getMeasure <em>Measure</em>}</li>
 *   <li>{@link spanfield.model.FieldLimit#getLevel <em>Level</em>}</li>
 *   <li>{@link spanfield.model.FieldLimit#getPlace <em>Place</em>}</li>
 *   <li>{@link spanfield.model.FieldLimit#getBody <em>Body</em>}</li>
 *   <li>{@link spanfield.model.FieldLimit#getEdition <em>Edition</em>}</li>
 *   <li>{@link spanfield.model.FieldLimit#getLoadCondition <em>Load Condition</em>}</li>
 *   <li>{@link spanfield.model.FieldLimit#getBasis <em>Basis</em>}</li>
 * </ul>
 *
 * @see spanfield.model.SpanfieldPackage#getFieldLimit()
 * @model
 * @generated
 */
public interface FieldLimit extends NamedElement {
	/**
	 * Returns the value of the '<em><b>Quantity</b></em>' attribute.
	 * The default value is <code>"MAGNETIC"</code>.
	 * The literals are from the enumeration {@link spanfield.model.FieldQuantity}.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Kind of field.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Quantity</em>' attribute.
	 * @see spanfield.model.FieldQuantity
	 * @see #setQuantity(FieldQuantity)
	 * @see spanfield.model.SpanfieldPackage#getFieldLimit_Quantity()
	 * @model default="MAGNETIC"
	 * @generated
	 */
	FieldQuantity getQuantity();

	/**
	 * Sets the value of the '{@link spanfield.model.FieldLimit#getQuantity <em>Quantity</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Quantity</em>' attribute.
	 * @see spanfield.model.FieldQuantity
	 * @see #getQuantity()
	 * @generated
	 */
	void setQuantity(FieldQuantity value);

	/**
	 * Returns the value of the '<em><b>Measure</b></em>' attribute.
	 * The default value is <code>"RESULTANT"</code>.
	 * The literals are from the enumeration {@link spanfield.model.FieldMeasure}.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Scalar that is compared.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Measure</em>' attribute.
	 * @see spanfield.model.FieldMeasure
	 * @see #setMeasure(FieldMeasure)
	 * @see spanfield.model.SpanfieldPackage#getFieldLimit_Measure()
	 * @model default="RESULTANT"
	 * @generated
	 */
	FieldMeasure getMeasure();

	/**
	 * Sets the value of the '{@link spanfield.model.FieldLimit#getMeasure <em>Measure</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Measure</em>' attribute.
	 * @see spanfield.model.FieldMeasure
	 * @see #getMeasure()
	 * @generated
	 */
	void setMeasure(FieldMeasure value);

	/**
	 * Returns the value of the '<em><b>Level</b></em>' attribute.
	 * The default value is <code>"0"</code>.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Level: tesla RMS for the magnetic field, volt per metre RMS for the electric field.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Level</em>' attribute.
	 * @see #setLevel(double)
	 * @see spanfield.model.SpanfieldPackage#getFieldLimit_Level()
	 * @model default="0"
	 * @generated
	 */
	double getLevel();

	/**
	 * Sets the value of the '{@link spanfield.model.FieldLimit#getLevel <em>Level</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Level</em>' attribute.
	 * @see #getLevel()
	 * @generated
	 */
	void setLevel(double value);

	/**
	 * Returns the value of the '<em><b>Place</b></em>' attribute.
	 * The default value is <code>"EDGE"</code>.
	 * The literals are from the enumeration {@link spanfield.model.LimitPlace}.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Where the limit applies.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Place</em>' attribute.
	 * @see spanfield.model.LimitPlace
	 * @see #setPlace(LimitPlace)
	 * @see spanfield.model.SpanfieldPackage#getFieldLimit_Place()
	 * @model default="EDGE"
	 * @generated
	 */
	LimitPlace getPlace();

	/**
	 * Sets the value of the '{@link spanfield.model.FieldLimit#getPlace <em>Place</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Place</em>' attribute.
	 * @see spanfield.model.LimitPlace
	 * @see #getPlace()
	 * @generated
	 */
	void setPlace(LimitPlace value);

	/**
	 * Returns the value of the '<em><b>Body</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Body or law that set the level.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Body</em>' attribute.
	 * @see #setBody(String)
	 * @see spanfield.model.SpanfieldPackage#getFieldLimit_Body()
	 * @model
	 * @generated
	 */
	String getBody();

	/**
	 * Sets the value of the '{@link spanfield.model.FieldLimit#getBody <em>Body</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Body</em>' attribute.
	 * @see #getBody()
	 * @generated
	 */
	void setBody(String value);

	/**
	 * Returns the value of the '<em><b>Edition</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Edition or date.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Edition</em>' attribute.
	 * @see #setEdition(String)
	 * @see spanfield.model.SpanfieldPackage#getFieldLimit_Edition()
	 * @model
	 * @generated
	 */
	String getEdition();

	/**
	 * Sets the value of the '{@link spanfield.model.FieldLimit#getEdition <em>Edition</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Edition</em>' attribute.
	 * @see #getEdition()
	 * @generated
	 */
	void setEdition(String value);

	/**
	 * Returns the value of the '<em><b>Load Condition</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Load condition to which the level refers.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Load Condition</em>' attribute.
	 * @see #setLoadCondition(String)
	 * @see spanfield.model.SpanfieldPackage#getFieldLimit_LoadCondition()
	 * @model
	 * @generated
	 */
	String getLoadCondition();

	/**
	 * Sets the value of the '{@link spanfield.model.FieldLimit#getLoadCondition <em>Load Condition</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Load Condition</em>' attribute.
	 * @see #getLoadCondition()
	 * @generated
	 */
	void setLoadCondition(String value);

	/**
	 * Returns the value of the '<em><b>Basis</b></em>' attribute.
	 * The default value is <code>"USER"</code>.
	 * The literals are from the enumeration {@link spanfield.model.LimitBasis}.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * How the level is known.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Basis</em>' attribute.
	 * @see spanfield.model.LimitBasis
	 * @see #setBasis(LimitBasis)
	 * @see spanfield.model.SpanfieldPackage#getFieldLimit_Basis()
	 * @model default="USER"
	 * @generated
	 */
	LimitBasis getBasis();

	/**
	 * Sets the value of the '{@link spanfield.model.FieldLimit#getBasis <em>Basis</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Basis</em>' attribute.
	 * @see spanfield.model.LimitBasis
	 * @see #getBasis()
	 * @generated
	 */
	void setBasis(LimitBasis value);

} // FieldLimit
