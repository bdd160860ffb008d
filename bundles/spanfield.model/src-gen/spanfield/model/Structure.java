/**
 * Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0
 */
package spanfield.model;


/**
 * <!-- begin-user-doc -->
 * A representation of the model object '<em><b>Structure</b></em>'.
 * <!-- end-user-doc -->
 *
 * <!-- begin-model-doc -->
 * A tower or pole of a line.
 * <!-- end-model-doc -->
 *
 * <p>
 * The following features are supported:
 * </p>
 * <ul>
 *   <li>{@link spanfield.model.Structure#getType <em>Type</em>}</li>
 *   <li>{@link spanfield.model.Structure#getStationMetres <em>Station Metres</em>}</li>
 *   <li>{@link spanfield.model.Structure#getOffsetMetres <em>Offset Metres</em>}</li>
 *   <li>{@link spanfield.model.Structure#getBaseElevationMetres <em>Base Elevation Metres</em>}</li>
 *   <li>{@link spanfield.model.Structure#getHeightAdjustmentMetres <em>Height Adjustment Metres</em>}</li>
 *   <li>{@link spanfield.model.Structure#getTurnDegrees <em>Turn Degrees</em>}</li>
 * </ul>
 *
 * @see spanfield.model.SpanfieldPackage#getStructure()
 * @model
 * @generated
 */
public interface Structure extends NamedElement {
	/**
	 * Returns the value of the '<em><b>Type</b></em>' reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Structure type from the catalogue.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Type</em>' reference.
	 * @see #setType(StructureType)
	 * @see spanfield.model.SpanfieldPackage#getStructure_Type()
	 * @model required="true"
	 * @generated
	 */
	StructureType getType();

	/**
	 * Sets the value of the '{@link spanfield.model.Structure#getType <em>Type</em>}' reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Type</em>' reference.
	 * @see #getType()
	 * @generated
	 */
	void setType(StructureType value);

	/**
	 * Returns the value of the '<em><b>Station Metres</b></em>' attribute.
	 * The default value is <code>"0"</code>.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Station along the corridor in metres.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Station Metres</em>' attribute.
	 * @see #setStationMetres(double)
	 * @see spanfield.model.SpanfieldPackage#getStructure_StationMetres()
	 * @model default="0"
	 * @generated
	 */
	double getStationMetres();

	/**
	 * Sets the value of the '{@link spanfield.model.Structure#getStationMetres <em>Station Metres</em>}' attribute.
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
	 * Offset of the axis from the corridor centreline in metres.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Offset Metres</em>' attribute.
	 * @see #setOffsetMetres(double)
	 * @see spanfield.model.SpanfieldPackage#getStructure_OffsetMetres()
	 * @model default="0"
	 * @generated
	 */
	double getOffsetMetres();

	/**
	 * Sets the value of the '{@link spanfield.model.Structure#getOffsetMetres <em>Offset Metres</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Offset Metres</em>' attribute.
	 * @see #getOffsetMetres()
	 * @generated
	 */
	void setOffsetMetres(double value);

	/**
	 * Returns the value of the '<em><b>Base Elevation Metres</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Elevation of the base in metres. Absent: the ground at the structure.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Base Elevation Metres</em>' attribute.
	 * @see #setBaseElevationMetres(Double)
	 * @see spanfield.model.SpanfieldPackage#getStructure_BaseElevationMetres()
	 * @model
	 * @generated
	 */
	Double getBaseElevationMetres();

	/**
	 * Sets the value of the '{@link spanfield.model.Structure#getBaseElevationMetres <em>Base Elevation Metres</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Base Elevation Metres</em>' attribute.
	 * @see #getBaseElevationMetres()
	 * @generated
	 */
	void setBaseElevationMetres(Double value);

	/**
	 * Returns the value of the '<em><b>Height Adjustment Metres</b></em>' attribute.
	 * The default value is <code>"0"</code>.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Body or leg extension in metres, added to every attachment height; may be negative.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Height Adjustment Metres</em>' attribute.
	 * @see #setHeightAdjustmentMetres(double)
	 * @see spanfield.model.SpanfieldPackage#getStructure_HeightAdjustmentMetres()
	 * @model default="0"
	 * @generated
	 */
	double getHeightAdjustmentMetres();

	/**
	 * Sets the value of the '{@link spanfield.model.Structure#getHeightAdjustmentMetres <em>Height Adjustment Metres</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Height Adjustment Metres</em>' attribute.
	 * @see #getHeightAdjustmentMetres()
	 * @generated
	 */
	void setHeightAdjustmentMetres(double value);

	/**
	 * Returns the value of the '<em><b>Turn Degrees</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Direction in which the structure faces, degrees clockwise (seen from above) from the direction of increasing station of a straight centreline. Absent: along the bisector of the two adjacent spans.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Turn Degrees</em>' attribute.
	 * @see #setTurnDegrees(Double)
	 * @see spanfield.model.SpanfieldPackage#getStructure_TurnDegrees()
	 * @model
	 * @generated
	 */
	Double getTurnDegrees();

	/**
	 * Sets the value of the '{@link spanfield.model.Structure#getTurnDegrees <em>Turn Degrees</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Turn Degrees</em>' attribute.
	 * @see #getTurnDegrees()
	 * @generated
	 */
	void setTurnDegrees(Double value);

} // Structure
