/**
 * Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0
 */
package spanfield.model;

import org.eclipse.emf.common.util.EList;

/**
 * <!-- begin-user-doc -->
 * A representation of the model object '<em><b>Study</b></em>'.
 * <!-- end-user-doc -->
 *
 * <!-- begin-model-doc -->
 * A corridor study: everything that is needed to compute and report the field across a right-of-way.
 * <!-- end-model-doc -->
 *
 * <p>
 * The following features are supported:
 * </p>
 * <ul>
 *   <li>{@link spanfield.model.Study#getAuthor <em>Author</em>}</li>
 *   <li>{@link spanfield.model.Study#getOrganisation <em>Organisation</em>}</li>
 *   <li>{@link spanfield.model.Study#getDate <em>Date</em>}</li>
 *   <li>{@link spanfield.model.Study#getFrequencyHertz <em>Frequency Hertz</em>}</li>
 *   <li>{@link spanfield.model.Study#getEarthResistivityOhmMetres <em>Earth Resistivity Ohm Metres</em>}</li>
 *   <li>{@link spanfield.model.Study#getEarthModel <em>Earth Model</em>}</li>
 *   <li>{@link spanfield.model.Study#getImpedanceFormula <em>Impedance Formula</em>}</li>
 *   <li>{@link spanfield.model.Study#getReferenceHeightMetres <em>Reference Height Metres</em>}</li>
 *   <li>{@link spanfield.model.Study#getRelativeAccuracy <em>Relative Accuracy</em>}</li>
 *   <li>{@link spanfield.model.Study#getCorridor <em>Corridor</em>}</li>
 *   <li>{@link spanfield.model.Study#getConductors <em>Conductors</em>}</li>
 *   <li>{@link spanfield.model.Study#getStructureTypes <em>Structure Types</em>}</li>
 *   <li>{@link spanfield.model.Study#getLines <em>Lines</em>}</li>
 *   <li>{@link spanfield.model.Study#getLoadCases <em>Load Cases</em>}</li>
 *   <li>{@link spanfield.model.Study#getStations <em>Stations</em>}</li>
 *   <li>{@link spanfield.model.Study#getLimits <em>Limits</em>}</li>
 *   <li>{@link spanfield.model.Study#getSurveys <em>Surveys</em>}</li>
 * </ul>
 *
 * @see spanfield.model.SpanfieldPackage#getStudy()
 * @model
 * @generated
 */
public interface Study extends NamedElement {
	/**
	 * Returns the value of the '<em><b>Author</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Who made the study.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Author</em>' attribute.
	 * @see #setAuthor(String)
	 * @see spanfield.model.SpanfieldPackage#getStudy_Author()
	 * @model
	 * @generated
	 */
	String getAuthor();

	/**
	 * Sets the value of the '{@link spanfield.model.Study#getAuthor <em>Author</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Author</em>' attribute.
	 * @see #getAuthor()
	 * @generated
	 */
	void setAuthor(String value);

	/**
	 * Returns the value of the '<em><b>Organisation</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * For whom the study was made.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Organisation</em>' attribute.
	 * @see #setOrganisation(String)
	 * @see spanfield.model.SpanfieldPackage#getStudy_Organisation()
	 * @model
	 * @generated
	 */
	String getOrganisation();

	/**
	 * Sets the value of the '{@link spanfield.model.Study#getOrganisation <em>Organisation</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Organisation</em>' attribute.
	 * @see #getOrganisation()
	 * @generated
	 */
	void setOrganisation(String value);

	/**
	 * Returns the value of the '<em><b>Date</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Date of the study, ISO 8601 (year-month-day).
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Date</em>' attribute.
	 * @see #setDate(String)
	 * @see spanfield.model.SpanfieldPackage#getStudy_Date()
	 * @model
	 * @generated
	 */
	String getDate();

	/**
	 * Sets the value of the '{@link spanfield.model.Study#getDate <em>Date</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Date</em>' attribute.
	 * @see #getDate()
	 * @generated
	 */
	void setDate(String value);

	/**
	 * Returns the value of the '<em><b>Frequency Hertz</b></em>' attribute.
	 * The default value is <code>"50"</code>.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Power frequency in hertz; 0 for direct current.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Frequency Hertz</em>' attribute.
	 * @see #setFrequencyHertz(double)
	 * @see spanfield.model.SpanfieldPackage#getStudy_FrequencyHertz()
	 * @model default="50"
	 * @generated
	 */
	double getFrequencyHertz();

	/**
	 * Sets the value of the '{@link spanfield.model.Study#getFrequencyHertz <em>Frequency Hertz</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Frequency Hertz</em>' attribute.
	 * @see #getFrequencyHertz()
	 * @generated
	 */
	void setFrequencyHertz(double value);

	/**
	 * Returns the value of the '<em><b>Earth Resistivity Ohm Metres</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Resistivity of the earth in ohm metres, homogeneous. Absent: no earth return is modelled.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Earth Resistivity Ohm Metres</em>' attribute.
	 * @see #setEarthResistivityOhmMetres(Double)
	 * @see spanfield.model.SpanfieldPackage#getStudy_EarthResistivityOhmMetres()
	 * @model
	 * @generated
	 */
	Double getEarthResistivityOhmMetres();

	/**
	 * Sets the value of the '{@link spanfield.model.Study#getEarthResistivityOhmMetres <em>Earth Resistivity Ohm Metres</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Earth Resistivity Ohm Metres</em>' attribute.
	 * @see #getEarthResistivityOhmMetres()
	 * @generated
	 */
	void setEarthResistivityOhmMetres(Double value);

	/**
	 * Returns the value of the '<em><b>Earth Model</b></em>' attribute.
	 * The default value is <code>"EXACT_HALF_SPACE"</code>.
	 * The literals are from the enumeration {@link spanfield.model.EarthModel}.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Earth model of the reported field. The difference to the other model is reported beside it.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Earth Model</em>' attribute.
	 * @see spanfield.model.EarthModel
	 * @see #setEarthModel(EarthModel)
	 * @see spanfield.model.SpanfieldPackage#getStudy_EarthModel()
	 * @model default="EXACT_HALF_SPACE"
	 * @generated
	 */
	EarthModel getEarthModel();

	/**
	 * Sets the value of the '{@link spanfield.model.Study#getEarthModel <em>Earth Model</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Earth Model</em>' attribute.
	 * @see spanfield.model.EarthModel
	 * @see #getEarthModel()
	 * @generated
	 */
	void setEarthModel(EarthModel value);

	/**
	 * Returns the value of the '<em><b>Impedance Formula</b></em>' attribute.
	 * The default value is <code>"COMPLEX_DEPTH"</code>.
	 * The literals are from the enumeration {@link spanfield.model.ImpedanceFormula}.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Formula of the series impedances for induced shield-wire currents.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Impedance Formula</em>' attribute.
	 * @see spanfield.model.ImpedanceFormula
	 * @see #setImpedanceFormula(ImpedanceFormula)
	 * @see spanfield.model.SpanfieldPackage#getStudy_ImpedanceFormula()
	 * @model default="COMPLEX_DEPTH"
	 * @generated
	 */
	ImpedanceFormula getImpedanceFormula();

	/**
	 * Sets the value of the '{@link spanfield.model.Study#getImpedanceFormula <em>Impedance Formula</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Impedance Formula</em>' attribute.
	 * @see spanfield.model.ImpedanceFormula
	 * @see #getImpedanceFormula()
	 * @generated
	 */
	void setImpedanceFormula(ImpedanceFormula value);

	/**
	 * Returns the value of the '<em><b>Reference Height Metres</b></em>' attribute.
	 * The default value is <code>"1"</code>.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Height of the field points above the local ground in metres (usual practice: 1 m).
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Reference Height Metres</em>' attribute.
	 * @see #setReferenceHeightMetres(double)
	 * @see spanfield.model.SpanfieldPackage#getStudy_ReferenceHeightMetres()
	 * @model default="1"
	 * @generated
	 */
	double getReferenceHeightMetres();

	/**
	 * Sets the value of the '{@link spanfield.model.Study#getReferenceHeightMetres <em>Reference Height Metres</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Reference Height Metres</em>' attribute.
	 * @see #getReferenceHeightMetres()
	 * @generated
	 */
	void setReferenceHeightMetres(double value);

	/**
	 * Returns the value of the '<em><b>Relative Accuracy</b></em>' attribute.
	 * The default value is <code>"1e-6"</code>.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Relative numerical accuracy that is asked of the field, dimensionless.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Relative Accuracy</em>' attribute.
	 * @see #setRelativeAccuracy(double)
	 * @see spanfield.model.SpanfieldPackage#getStudy_RelativeAccuracy()
	 * @model default="1e-6"
	 * @generated
	 */
	double getRelativeAccuracy();

	/**
	 * Sets the value of the '{@link spanfield.model.Study#getRelativeAccuracy <em>Relative Accuracy</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Relative Accuracy</em>' attribute.
	 * @see #getRelativeAccuracy()
	 * @generated
	 */
	void setRelativeAccuracy(double value);

	/**
	 * Returns the value of the '<em><b>Corridor</b></em>' containment reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * The right-of-way and its ground.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Corridor</em>' containment reference.
	 * @see #setCorridor(Corridor)
	 * @see spanfield.model.SpanfieldPackage#getStudy_Corridor()
	 * @model containment="true" required="true"
	 * @generated
	 */
	Corridor getCorridor();

	/**
	 * Sets the value of the '{@link spanfield.model.Study#getCorridor <em>Corridor</em>}' containment reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Corridor</em>' containment reference.
	 * @see #getCorridor()
	 * @generated
	 */
	void setCorridor(Corridor value);

	/**
	 * Returns the value of the '<em><b>Conductors</b></em>' containment reference list.
	 * The list contents are of type {@link spanfield.model.Conductor}.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Catalogue of conductors.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Conductors</em>' containment reference list.
	 * @see spanfield.model.SpanfieldPackage#getStudy_Conductors()
	 * @model containment="true"
	 * @generated
	 */
	EList<Conductor> getConductors();

	/**
	 * Returns the value of the '<em><b>Structure Types</b></em>' containment reference list.
	 * The list contents are of type {@link spanfield.model.StructureType}.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Catalogue of structure types.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Structure Types</em>' containment reference list.
	 * @see spanfield.model.SpanfieldPackage#getStudy_StructureTypes()
	 * @model containment="true"
	 * @generated
	 */
	EList<StructureType> getStructureTypes();

	/**
	 * Returns the value of the '<em><b>Lines</b></em>' containment reference list.
	 * The list contents are of type {@link spanfield.model.Line}.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Lines in the corridor or crossing it.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Lines</em>' containment reference list.
	 * @see spanfield.model.SpanfieldPackage#getStudy_Lines()
	 * @model containment="true"
	 * @generated
	 */
	EList<Line> getLines();

	/**
	 * Returns the value of the '<em><b>Load Cases</b></em>' containment reference list.
	 * The list contents are of type {@link spanfield.model.LoadCase}.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Load cases.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Load Cases</em>' containment reference list.
	 * @see spanfield.model.SpanfieldPackage#getStudy_LoadCases()
	 * @model containment="true"
	 * @generated
	 */
	EList<LoadCase> getLoadCases();

	/**
	 * Returns the value of the '<em><b>Stations</b></em>' containment reference list.
	 * The list contents are of type {@link spanfield.model.ProfileStation}.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Stations at which lateral profiles and edge tables are made.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Stations</em>' containment reference list.
	 * @see spanfield.model.SpanfieldPackage#getStudy_Stations()
	 * @model containment="true"
	 * @generated
	 */
	EList<ProfileStation> getStations();

	/**
	 * Returns the value of the '<em><b>Limits</b></em>' containment reference list.
	 * The list contents are of type {@link spanfield.model.FieldLimit}.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Levels against which results are compared.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Limits</em>' containment reference list.
	 * @see spanfield.model.SpanfieldPackage#getStudy_Limits()
	 * @model containment="true"
	 * @generated
	 */
	EList<FieldLimit> getLimits();

	/**
	 * Returns the value of the '<em><b>Surveys</b></em>' containment reference list.
	 * The list contents are of type {@link spanfield.model.Survey}.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Measured surveys of the field.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Surveys</em>' containment reference list.
	 * @see spanfield.model.SpanfieldPackage#getStudy_Surveys()
	 * @model containment="true"
	 * @generated
	 */
	EList<Survey> getSurveys();

} // Study
