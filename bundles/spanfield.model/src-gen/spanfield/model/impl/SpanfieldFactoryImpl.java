/**
 * Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0
 */
package spanfield.model.impl;

import org.eclipse.emf.ecore.EClass;
import org.eclipse.emf.ecore.EDataType;
import org.eclipse.emf.ecore.EObject;
import org.eclipse.emf.ecore.EPackage;

import org.eclipse.emf.ecore.impl.EFactoryImpl;

import org.eclipse.emf.ecore.plugin.EcorePlugin;

import spanfield.model.*;

/**
 * <!-- begin-user-doc -->
 * An implementation of the model <b>Factory</b>.
 * <!-- end-user-doc -->
 * @generated
 */
public class SpanfieldFactoryImpl extends EFactoryImpl implements SpanfieldFactory {
	/**
	 * Creates the default factory implementation.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public static SpanfieldFactory init() {
		try {
			SpanfieldFactory theSpanfieldFactory = (SpanfieldFactory)EPackage.Registry.INSTANCE.getEFactory(SpanfieldPackage.eNS_URI);
			if (theSpanfieldFactory != null) {
				return theSpanfieldFactory;
			}
		}
		catch (Exception exception) {
			EcorePlugin.INSTANCE.log(exception);
		}
		return new SpanfieldFactoryImpl();
	}

	/**
	 * Creates an instance of the factory.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public SpanfieldFactoryImpl() {
		super();
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EObject create(EClass eClass) {
		switch (eClass.getClassifierID()) {
			case SpanfieldPackage.STUDY: return createStudy();
			case SpanfieldPackage.CORRIDOR: return createCorridor();
			case SpanfieldPackage.EDGE_POINT: return createEdgePoint();
			case SpanfieldPackage.GROUND_POINT: return createGroundPoint();
			case SpanfieldPackage.ELEVATION_POINT: return createElevationPoint();
			case SpanfieldPackage.ALIGNMENT_BEND: return createAlignmentBend();
			case SpanfieldPackage.CONDUCTOR: return createConductor();
			case SpanfieldPackage.STRUCTURE_TYPE: return createStructureType();
			case SpanfieldPackage.ATTACHMENT: return createAttachment();
			case SpanfieldPackage.OUTLINE_STROKE: return createOutlineStroke();
			case SpanfieldPackage.OUTLINE_POINT: return createOutlinePoint();
			case SpanfieldPackage.LINE: return createLine();
			case SpanfieldPackage.STRUCTURE: return createStructure();
			case SpanfieldPackage.STRINGING_SECTION: return createStringingSection();
			case SpanfieldPackage.WIRE_STRINGING: return createWireStringing();
			case SpanfieldPackage.CATENARY_STRINGING: return createCatenaryStringing();
			case SpanfieldPackage.SAG_STRINGING: return createSagStringing();
			case SpanfieldPackage.TENSION_STRINGING: return createTensionStringing();
			case SpanfieldPackage.CLEARANCE_STRINGING: return createClearanceStringing();
			case SpanfieldPackage.CIRCUIT: return createCircuit();
			case SpanfieldPackage.PHASE: return createPhase();
			case SpanfieldPackage.SHIELD_WIRE: return createShieldWire();
			case SpanfieldPackage.LOAD_CASE: return createLoadCase();
			case SpanfieldPackage.CURRENT_LOAD: return createCurrentLoad();
			case SpanfieldPackage.POWER_LOAD: return createPowerLoad();
			case SpanfieldPackage.SEQUENCE_LOAD: return createSequenceLoad();
			case SpanfieldPackage.PHASOR_LOAD: return createPhasorLoad();
			case SpanfieldPackage.PHASE_PHASOR: return createPhasePhasor();
			case SpanfieldPackage.PROFILE_STATION: return createProfileStation();
			case SpanfieldPackage.FIELD_LIMIT: return createFieldLimit();
			case SpanfieldPackage.SURVEY: return createSurvey();
			case SpanfieldPackage.SURVEY_READING: return createSurveyReading();
			default:
				throw new IllegalArgumentException("The class '" + eClass.getName() + "' is not a valid classifier");
		}
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Object createFromString(EDataType eDataType, String initialValue) {
		switch (eDataType.getClassifierID()) {
			case SpanfieldPackage.EARTH_MODEL:
				return createEarthModelFromString(eDataType, initialValue);
			case SpanfieldPackage.IMPEDANCE_FORMULA:
				return createImpedanceFormulaFromString(eDataType, initialValue);
			case SpanfieldPackage.ATTACHMENT_ROLE:
				return createAttachmentRoleFromString(eDataType, initialValue);
			case SpanfieldPackage.LINE_END:
				return createLineEndFromString(eDataType, initialValue);
			case SpanfieldPackage.BONDING:
				return createBondingFromString(eDataType, initialValue);
			case SpanfieldPackage.PHASING:
				return createPhasingFromString(eDataType, initialValue);
			case SpanfieldPackage.FLOW_DIRECTION:
				return createFlowDirectionFromString(eDataType, initialValue);
			case SpanfieldPackage.FIELD_QUANTITY:
				return createFieldQuantityFromString(eDataType, initialValue);
			case SpanfieldPackage.FIELD_MEASURE:
				return createFieldMeasureFromString(eDataType, initialValue);
			case SpanfieldPackage.LIMIT_PLACE:
				return createLimitPlaceFromString(eDataType, initialValue);
			case SpanfieldPackage.LIMIT_BASIS:
				return createLimitBasisFromString(eDataType, initialValue);
			default:
				throw new IllegalArgumentException("The datatype '" + eDataType.getName() + "' is not a valid classifier");
		}
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public String convertToString(EDataType eDataType, Object instanceValue) {
		switch (eDataType.getClassifierID()) {
			case SpanfieldPackage.EARTH_MODEL:
				return convertEarthModelToString(eDataType, instanceValue);
			case SpanfieldPackage.IMPEDANCE_FORMULA:
				return convertImpedanceFormulaToString(eDataType, instanceValue);
			case SpanfieldPackage.ATTACHMENT_ROLE:
				return convertAttachmentRoleToString(eDataType, instanceValue);
			case SpanfieldPackage.LINE_END:
				return convertLineEndToString(eDataType, instanceValue);
			case SpanfieldPackage.BONDING:
				return convertBondingToString(eDataType, instanceValue);
			case SpanfieldPackage.PHASING:
				return convertPhasingToString(eDataType, instanceValue);
			case SpanfieldPackage.FLOW_DIRECTION:
				return convertFlowDirectionToString(eDataType, instanceValue);
			case SpanfieldPackage.FIELD_QUANTITY:
				return convertFieldQuantityToString(eDataType, instanceValue);
			case SpanfieldPackage.FIELD_MEASURE:
				return convertFieldMeasureToString(eDataType, instanceValue);
			case SpanfieldPackage.LIMIT_PLACE:
				return convertLimitPlaceToString(eDataType, instanceValue);
			case SpanfieldPackage.LIMIT_BASIS:
				return convertLimitBasisToString(eDataType, instanceValue);
			default:
				throw new IllegalArgumentException("The datatype '" + eDataType.getName() + "' is not a valid classifier");
		}
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Study createStudy() {
		StudyImpl study = new StudyImpl();
		return study;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Corridor createCorridor() {
		CorridorImpl corridor = new CorridorImpl();
		return corridor;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EdgePoint createEdgePoint() {
		EdgePointImpl edgePoint = new EdgePointImpl();
		return edgePoint;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public GroundPoint createGroundPoint() {
		GroundPointImpl groundPoint = new GroundPointImpl();
		return groundPoint;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public ElevationPoint createElevationPoint() {
		ElevationPointImpl elevationPoint = new ElevationPointImpl();
		return elevationPoint;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public AlignmentBend createAlignmentBend() {
		AlignmentBendImpl alignmentBend = new AlignmentBendImpl();
		return alignmentBend;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Conductor createConductor() {
		ConductorImpl conductor = new ConductorImpl();
		return conductor;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public StructureType createStructureType() {
		StructureTypeImpl structureType = new StructureTypeImpl();
		return structureType;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Attachment createAttachment() {
		AttachmentImpl attachment = new AttachmentImpl();
		return attachment;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public OutlineStroke createOutlineStroke() {
		OutlineStrokeImpl outlineStroke = new OutlineStrokeImpl();
		return outlineStroke;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public OutlinePoint createOutlinePoint() {
		OutlinePointImpl outlinePoint = new OutlinePointImpl();
		return outlinePoint;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Line createLine() {
		LineImpl line = new LineImpl();
		return line;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Structure createStructure() {
		StructureImpl structure = new StructureImpl();
		return structure;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public StringingSection createStringingSection() {
		StringingSectionImpl stringingSection = new StringingSectionImpl();
		return stringingSection;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public WireStringing createWireStringing() {
		WireStringingImpl wireStringing = new WireStringingImpl();
		return wireStringing;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public CatenaryStringing createCatenaryStringing() {
		CatenaryStringingImpl catenaryStringing = new CatenaryStringingImpl();
		return catenaryStringing;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public SagStringing createSagStringing() {
		SagStringingImpl sagStringing = new SagStringingImpl();
		return sagStringing;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public TensionStringing createTensionStringing() {
		TensionStringingImpl tensionStringing = new TensionStringingImpl();
		return tensionStringing;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public ClearanceStringing createClearanceStringing() {
		ClearanceStringingImpl clearanceStringing = new ClearanceStringingImpl();
		return clearanceStringing;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Circuit createCircuit() {
		CircuitImpl circuit = new CircuitImpl();
		return circuit;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Phase createPhase() {
		PhaseImpl phase = new PhaseImpl();
		return phase;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public ShieldWire createShieldWire() {
		ShieldWireImpl shieldWire = new ShieldWireImpl();
		return shieldWire;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public LoadCase createLoadCase() {
		LoadCaseImpl loadCase = new LoadCaseImpl();
		return loadCase;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public CurrentLoad createCurrentLoad() {
		CurrentLoadImpl currentLoad = new CurrentLoadImpl();
		return currentLoad;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public PowerLoad createPowerLoad() {
		PowerLoadImpl powerLoad = new PowerLoadImpl();
		return powerLoad;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public SequenceLoad createSequenceLoad() {
		SequenceLoadImpl sequenceLoad = new SequenceLoadImpl();
		return sequenceLoad;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public PhasorLoad createPhasorLoad() {
		PhasorLoadImpl phasorLoad = new PhasorLoadImpl();
		return phasorLoad;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public PhasePhasor createPhasePhasor() {
		PhasePhasorImpl phasePhasor = new PhasePhasorImpl();
		return phasePhasor;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public ProfileStation createProfileStation() {
		ProfileStationImpl profileStation = new ProfileStationImpl();
		return profileStation;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public FieldLimit createFieldLimit() {
		FieldLimitImpl fieldLimit = new FieldLimitImpl();
		return fieldLimit;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Survey createSurvey() {
		SurveyImpl survey = new SurveyImpl();
		return survey;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public SurveyReading createSurveyReading() {
		SurveyReadingImpl surveyReading = new SurveyReadingImpl();
		return surveyReading;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public EarthModel createEarthModelFromString(EDataType eDataType, String initialValue) {
		EarthModel result = EarthModel.get(initialValue);
		if (result == null) throw new IllegalArgumentException("The value '" + initialValue + "' is not a valid enumerator of '" + eDataType.getName() + "'");
		return result;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public String convertEarthModelToString(EDataType eDataType, Object instanceValue) {
		return instanceValue == null ? null : instanceValue.toString();
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public ImpedanceFormula createImpedanceFormulaFromString(EDataType eDataType, String initialValue) {
		ImpedanceFormula result = ImpedanceFormula.get(initialValue);
		if (result == null) throw new IllegalArgumentException("The value '" + initialValue + "' is not a valid enumerator of '" + eDataType.getName() + "'");
		return result;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public String convertImpedanceFormulaToString(EDataType eDataType, Object instanceValue) {
		return instanceValue == null ? null : instanceValue.toString();
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public AttachmentRole createAttachmentRoleFromString(EDataType eDataType, String initialValue) {
		AttachmentRole result = AttachmentRole.get(initialValue);
		if (result == null) throw new IllegalArgumentException("The value '" + initialValue + "' is not a valid enumerator of '" + eDataType.getName() + "'");
		return result;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public String convertAttachmentRoleToString(EDataType eDataType, Object instanceValue) {
		return instanceValue == null ? null : instanceValue.toString();
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public LineEnd createLineEndFromString(EDataType eDataType, String initialValue) {
		LineEnd result = LineEnd.get(initialValue);
		if (result == null) throw new IllegalArgumentException("The value '" + initialValue + "' is not a valid enumerator of '" + eDataType.getName() + "'");
		return result;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public String convertLineEndToString(EDataType eDataType, Object instanceValue) {
		return instanceValue == null ? null : instanceValue.toString();
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public Bonding createBondingFromString(EDataType eDataType, String initialValue) {
		Bonding result = Bonding.get(initialValue);
		if (result == null) throw new IllegalArgumentException("The value '" + initialValue + "' is not a valid enumerator of '" + eDataType.getName() + "'");
		return result;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public String convertBondingToString(EDataType eDataType, Object instanceValue) {
		return instanceValue == null ? null : instanceValue.toString();
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public Phasing createPhasingFromString(EDataType eDataType, String initialValue) {
		Phasing result = Phasing.get(initialValue);
		if (result == null) throw new IllegalArgumentException("The value '" + initialValue + "' is not a valid enumerator of '" + eDataType.getName() + "'");
		return result;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public String convertPhasingToString(EDataType eDataType, Object instanceValue) {
		return instanceValue == null ? null : instanceValue.toString();
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public FlowDirection createFlowDirectionFromString(EDataType eDataType, String initialValue) {
		FlowDirection result = FlowDirection.get(initialValue);
		if (result == null) throw new IllegalArgumentException("The value '" + initialValue + "' is not a valid enumerator of '" + eDataType.getName() + "'");
		return result;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public String convertFlowDirectionToString(EDataType eDataType, Object instanceValue) {
		return instanceValue == null ? null : instanceValue.toString();
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public FieldQuantity createFieldQuantityFromString(EDataType eDataType, String initialValue) {
		FieldQuantity result = FieldQuantity.get(initialValue);
		if (result == null) throw new IllegalArgumentException("The value '" + initialValue + "' is not a valid enumerator of '" + eDataType.getName() + "'");
		return result;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public String convertFieldQuantityToString(EDataType eDataType, Object instanceValue) {
		return instanceValue == null ? null : instanceValue.toString();
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public FieldMeasure createFieldMeasureFromString(EDataType eDataType, String initialValue) {
		FieldMeasure result = FieldMeasure.get(initialValue);
		if (result == null) throw new IllegalArgumentException("The value '" + initialValue + "' is not a valid enumerator of '" + eDataType.getName() + "'");
		return result;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public String convertFieldMeasureToString(EDataType eDataType, Object instanceValue) {
		return instanceValue == null ? null : instanceValue.toString();
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public LimitPlace createLimitPlaceFromString(EDataType eDataType, String initialValue) {
		LimitPlace result = LimitPlace.get(initialValue);
		if (result == null) throw new IllegalArgumentException("The value '" + initialValue + "' is not a valid enumerator of '" + eDataType.getName() + "'");
		return result;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public String convertLimitPlaceToString(EDataType eDataType, Object instanceValue) {
		return instanceValue == null ? null : instanceValue.toString();
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public LimitBasis createLimitBasisFromString(EDataType eDataType, String initialValue) {
		LimitBasis result = LimitBasis.get(initialValue);
		if (result == null) throw new IllegalArgumentException("The value '" + initialValue + "' is not a valid enumerator of '" + eDataType.getName() + "'");
		return result;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public String convertLimitBasisToString(EDataType eDataType, Object instanceValue) {
		return instanceValue == null ? null : instanceValue.toString();
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public SpanfieldPackage getSpanfieldPackage() {
		return (SpanfieldPackage)getEPackage();
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @deprecated
	 * @generated
	 */
	@Deprecated
	public static SpanfieldPackage getPackage() {
		return SpanfieldPackage.eINSTANCE;
	}

} //SpanfieldFactoryImpl
