/**
 * Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0
 */
package spanfield.model;

import org.eclipse.emf.ecore.EFactory;

/**
 * <!-- begin-user-doc -->
 * The <b>Factory</b> for the model.
 * It provides a create method for each non-abstract class of the model.
 * <!-- end-user-doc -->
 * @see spanfield.model.SpanfieldPackage
 * @generated
 */
public interface SpanfieldFactory extends EFactory {
	/**
	 * The singleton instance of the factory.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	SpanfieldFactory eINSTANCE = spanfield.model.impl.SpanfieldFactoryImpl.init();

	/**
	 * Returns a new object of class '<em>Study</em>'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return a new object of class '<em>Study</em>'.
	 * @generated
	 */
	Study createStudy();

	/**
	 * Returns a new object of class '<em>Corridor</em>'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return a new object of class '<em>Corridor</em>'.
	 * @generated
	 */
	Corridor createCorridor();

	/**
	 * Returns a new object of class '<em>Edge Point</em>'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return a new object of class '<em>Edge Point</em>'.
	 * @generated
	 */
	EdgePoint createEdgePoint();

	/**
	 * Returns a new object of class '<em>Ground Point</em>'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return a new object of class '<em>Ground Point</em>'.
	 * @generated
	 */
	GroundPoint createGroundPoint();

	/**
	 * Returns a new object of class '<em>Elevation Point</em>'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return a new object of class '<em>Elevation Point</em>'.
	 * @generated
	 */
	ElevationPoint createElevationPoint();

	/**
	 * Returns a new object of class '<em>Alignment Bend</em>'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return a new object of class '<em>Alignment Bend</em>'.
	 * @generated
	 */
	AlignmentBend createAlignmentBend();

	/**
	 * Returns a new object of class '<em>Conductor</em>'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return a new object of class '<em>Conductor</em>'.
	 * @generated
	 */
	Conductor createConductor();

	/**
	 * Returns a new object of class '<em>Structure Type</em>'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return a new object of class '<em>Structure Type</em>'.
	 * @generated
	 */
	StructureType createStructureType();

	/**
	 * Returns a new object of class '<em>Attachment</em>'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return a new object of class '<em>Attachment</em>'.
	 * @generated
	 */
	Attachment createAttachment();

	/**
	 * Returns a new object of class '<em>Outline Stroke</em>'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return a new object of class '<em>Outline Stroke</em>'.
	 * @generated
	 */
	OutlineStroke createOutlineStroke();

	/**
	 * Returns a new object of class '<em>Outline Point</em>'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return a new object of class '<em>Outline Point</em>'.
	 * @generated
	 */
	OutlinePoint createOutlinePoint();

	/**
	 * Returns a new object of class '<em>Line</em>'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return a new object of class '<em>Line</em>'.
	 * @generated
	 */
	Line createLine();

	/**
	 * Returns a new object of class '<em>Structure</em>'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return a new object of class '<em>Structure</em>'.
	 * @generated
	 */
	Structure createStructure();

	/**
	 * Returns a new object of class '<em>Stringing Section</em>'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return a new object of class '<em>Stringing Section</em>'.
	 * @generated
	 */
	StringingSection createStringingSection();

	/**
	 * Returns a new object of class '<em>Wire Stringing</em>'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return a new object of class '<em>Wire Stringing</em>'.
	 * @generated
	 */
	WireStringing createWireStringing();

	/**
	 * Returns a new object of class '<em>Catenary Stringing</em>'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return a new object of class '<em>Catenary Stringing</em>'.
	 * @generated
	 */
	CatenaryStringing createCatenaryStringing();

	/**
	 * Returns a new object of class '<em>Sag Stringing</em>'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return a new object of class '<em>Sag Stringing</em>'.
	 * @generated
	 */
	SagStringing createSagStringing();

	/**
	 * Returns a new object of class '<em>Tension Stringing</em>'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return a new object of class '<em>Tension Stringing</em>'.
	 * @generated
	 */
	TensionStringing createTensionStringing();

	/**
	 * Returns a new object of class '<em>Clearance Stringing</em>'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return a new object of class '<em>Clearance Stringing</em>'.
	 * @generated
	 */
	ClearanceStringing createClearanceStringing();

	/**
	 * Returns a new object of class '<em>Circuit</em>'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return a new object of class '<em>Circuit</em>'.
	 * @generated
	 */
	Circuit createCircuit();

	/**
	 * Returns a new object of class '<em>Phase</em>'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return a new object of class '<em>Phase</em>'.
	 * @generated
	 */
	Phase createPhase();

	/**
	 * Returns a new object of class '<em>Shield Wire</em>'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return a new object of class '<em>Shield Wire</em>'.
	 * @generated
	 */
	ShieldWire createShieldWire();

	/**
	 * Returns a new object of class '<em>Load Case</em>'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return a new object of class '<em>Load Case</em>'.
	 * @generated
	 */
	LoadCase createLoadCase();

	/**
	 * Returns a new object of class '<em>Current Load</em>'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return a new object of class '<em>Current Load</em>'.
	 * @generated
	 */
	CurrentLoad createCurrentLoad();

	/**
	 * Returns a new object of class '<em>Power Load</em>'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return a new object of class '<em>Power Load</em>'.
	 * @generated
	 */
	PowerLoad createPowerLoad();

	/**
	 * Returns a new object of class '<em>Sequence Load</em>'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return a new object of class '<em>Sequence Load</em>'.
	 * @generated
	 */
	SequenceLoad createSequenceLoad();

	/**
	 * Returns a new object of class '<em>Phasor Load</em>'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return a new object of class '<em>Phasor Load</em>'.
	 * @generated
	 */
	PhasorLoad createPhasorLoad();

	/**
	 * Returns a new object of class '<em>Phase Phasor</em>'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return a new object of class '<em>Phase Phasor</em>'.
	 * @generated
	 */
	PhasePhasor createPhasePhasor();

	/**
	 * Returns a new object of class '<em>Profile Station</em>'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return a new object of class '<em>Profile Station</em>'.
	 * @generated
	 */
	ProfileStation createProfileStation();

	/**
	 * Returns a new object of class '<em>Field Limit</em>'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return a new object of class '<em>Field Limit</em>'.
	 * @generated
	 */
	FieldLimit createFieldLimit();

	/**
	 * Returns a new object of class '<em>Survey</em>'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return a new object of class '<em>Survey</em>'.
	 * @generated
	 */
	Survey createSurvey();

	/**
	 * Returns a new object of class '<em>Survey Reading</em>'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return a new object of class '<em>Survey Reading</em>'.
	 * @generated
	 */
	SurveyReading createSurveyReading();

	/**
	 * Returns the package supported by this factory.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the package supported by this factory.
	 * @generated
	 */
	SpanfieldPackage getSpanfieldPackage();

} //SpanfieldFactory
