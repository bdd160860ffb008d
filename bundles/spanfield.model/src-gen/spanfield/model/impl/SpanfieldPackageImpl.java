/**
 * Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0
 */
package spanfield.model.impl;

import org.eclipse.emf.ecore.EAttribute;
import org.eclipse.emf.ecore.EClass;
import org.eclipse.emf.ecore.EEnum;
import org.eclipse.emf.ecore.EPackage;
import org.eclipse.emf.ecore.EReference;

import org.eclipse.emf.ecore.impl.EPackageImpl;

import spanfield.model.AlignmentBend;
import spanfield.model.Attachment;
import spanfield.model.AttachmentRole;
import spanfield.model.Bonding;
import spanfield.model.CatenaryStringing;
import spanfield.model.Circuit;
import spanfield.model.CircuitLoad;
import spanfield.model.ClearanceStringing;
import spanfield.model.Conductor;
import spanfield.model.Corridor;
import spanfield.model.CurrentLoad;
import spanfield.model.EarthModel;
import spanfield.model.EdgePoint;
import spanfield.model.ElevationPoint;
import spanfield.model.FieldLimit;
import spanfield.model.FieldMeasure;
import spanfield.model.FieldQuantity;
import spanfield.model.FlowDirection;
import spanfield.model.GroundPoint;
import spanfield.model.ImpedanceFormula;
import spanfield.model.LimitBasis;
import spanfield.model.LimitPlace;
import spanfield.model.Line;
import spanfield.model.LineEnd;
import spanfield.model.LoadCase;
import spanfield.model.NamedElement;
import spanfield.model.OutlinePoint;
import spanfield.model.OutlineStroke;
import spanfield.model.Phase;
import spanfield.model.PhasePhasor;
import spanfield.model.Phasing;
import spanfield.model.PhasorLoad;
import spanfield.model.PowerLoad;
import spanfield.model.ProfileStation;
import spanfield.model.SagStringing;
import spanfield.model.SequenceLoad;
import spanfield.model.ShieldWire;
import spanfield.model.SpanfieldFactory;
import spanfield.model.SpanfieldPackage;
import spanfield.model.Stringing;
import spanfield.model.StringingSection;
import spanfield.model.Structure;
import spanfield.model.StructureType;
import spanfield.model.StrungElement;
import spanfield.model.Study;
import spanfield.model.Survey;
import spanfield.model.SurveyReading;
import spanfield.model.TensionStringing;
import spanfield.model.WireStringing;

/**
 * <!-- begin-user-doc -->
 * An implementation of the model <b>Package</b>.
 * <!-- end-user-doc -->
 * @generated
 */
public class SpanfieldPackageImpl extends EPackageImpl implements SpanfieldPackage {
	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EClass namedElementEClass = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EClass studyEClass = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EClass corridorEClass = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EClass edgePointEClass = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EClass groundPointEClass = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EClass elevationPointEClass = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EClass alignmentBendEClass = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EClass conductorEClass = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EClass structureTypeEClass = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EClass attachmentEClass = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EClass outlineStrokeEClass = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EClass outlinePointEClass = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EClass lineEClass = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EClass structureEClass = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EClass stringingSectionEClass = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EClass wireStringingEClass = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EClass stringingEClass = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EClass catenaryStringingEClass = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EClass sagStringingEClass = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EClass tensionStringingEClass = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EClass clearanceStringingEClass = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EClass strungElementEClass = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EClass circuitEClass = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EClass phaseEClass = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EClass shieldWireEClass = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EClass loadCaseEClass = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EClass circuitLoadEClass = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EClass currentLoadEClass = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EClass powerLoadEClass = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EClass sequenceLoadEClass = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EClass phasorLoadEClass = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EClass phasePhasorEClass = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EClass profileStationEClass = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EClass fieldLimitEClass = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EClass surveyEClass = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EClass surveyReadingEClass = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EEnum earthModelEEnum = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EEnum impedanceFormulaEEnum = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EEnum attachmentRoleEEnum = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EEnum lineEndEEnum = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EEnum bondingEEnum = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EEnum phasingEEnum = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EEnum flowDirectionEEnum = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EEnum fieldQuantityEEnum = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EEnum fieldMeasureEEnum = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EEnum limitPlaceEEnum = null;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private EEnum limitBasisEEnum = null;

	/**
	 * Creates an instance of the model <b>Package</b>, registered with
	 * {@link org.eclipse.emf.ecore.EPackage.Registry EPackage.Registry} by the package
	 * package URI value.
	 * <p>Note: the correct way to create the package is via the static
	 * factory method {@link #init init()}, which also performs
	 * initialization of the package, or returns the registered package,
	 * if one already exists.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see org.eclipse.emf.ecore.EPackage.Registry
	 * @see spanfield.model.SpanfieldPackage#eNS_URI
	 * @see #init()
	 * @generated
	 */
	private SpanfieldPackageImpl() {
		super(eNS_URI, SpanfieldFactory.eINSTANCE);
	}
	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private static boolean isInited = false;

	/**
	 * Creates, registers, and initializes the <b>Package</b> for this model, and for any others upon which it depends.
	 *
	 * <p>This method is used to initialize {@link SpanfieldPackage#eINSTANCE} when that field is accessed.
	 * Clients should not invoke it directly. Instead, they should simply access that field to obtain the package.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #eNS_URI
	 * @see #createPackageContents()
	 * @see #initializePackageContents()
	 * @generated
	 */
	public static SpanfieldPackage init() {
		if (isInited) return (SpanfieldPackage)EPackage.Registry.INSTANCE.getEPackage(SpanfieldPackage.eNS_URI);

		// Obtain or create and register package
		Object registeredSpanfieldPackage = EPackage.Registry.INSTANCE.get(eNS_URI);
		SpanfieldPackageImpl theSpanfieldPackage = registeredSpanfieldPackage instanceof SpanfieldPackageImpl ? (SpanfieldPackageImpl)registeredSpanfieldPackage : new SpanfieldPackageImpl();

		isInited = true;

		// Create package meta-data objects
		theSpanfieldPackage.createPackageContents();

		// Initialize created meta-data
		theSpanfieldPackage.initializePackageContents();

		// Mark meta-data to indicate it can't be changed
		theSpanfieldPackage.freeze();

		// Update the registry and return the package
		EPackage.Registry.INSTANCE.put(SpanfieldPackage.eNS_URI, theSpanfieldPackage);
		return theSpanfieldPackage;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EClass getNamedElement() {
		return namedElementEClass;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getNamedElement_Id() {
		return (EAttribute)namedElementEClass.getEStructuralFeatures().get(0);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getNamedElement_Name() {
		return (EAttribute)namedElementEClass.getEStructuralFeatures().get(1);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getNamedElement_Notes() {
		return (EAttribute)namedElementEClass.getEStructuralFeatures().get(2);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EClass getStudy() {
		return studyEClass;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getStudy_Author() {
		return (EAttribute)studyEClass.getEStructuralFeatures().get(0);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getStudy_Organisation() {
		return (EAttribute)studyEClass.getEStructuralFeatures().get(1);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getStudy_Date() {
		return (EAttribute)studyEClass.getEStructuralFeatures().get(2);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getStudy_FrequencyHertz() {
		return (EAttribute)studyEClass.getEStructuralFeatures().get(3);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getStudy_EarthResistivityOhmMetres() {
		return (EAttribute)studyEClass.getEStructuralFeatures().get(4);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getStudy_EarthModel() {
		return (EAttribute)studyEClass.getEStructuralFeatures().get(5);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getStudy_ImpedanceFormula() {
		return (EAttribute)studyEClass.getEStructuralFeatures().get(6);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getStudy_ReferenceHeightMetres() {
		return (EAttribute)studyEClass.getEStructuralFeatures().get(7);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getStudy_RelativeAccuracy() {
		return (EAttribute)studyEClass.getEStructuralFeatures().get(8);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EReference getStudy_Corridor() {
		return (EReference)studyEClass.getEStructuralFeatures().get(9);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EReference getStudy_Conductors() {
		return (EReference)studyEClass.getEStructuralFeatures().get(10);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EReference getStudy_StructureTypes() {
		return (EReference)studyEClass.getEStructuralFeatures().get(11);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EReference getStudy_Lines() {
		return (EReference)studyEClass.getEStructuralFeatures().get(12);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EReference getStudy_LoadCases() {
		return (EReference)studyEClass.getEStructuralFeatures().get(13);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EReference getStudy_Stations() {
		return (EReference)studyEClass.getEStructuralFeatures().get(14);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EReference getStudy_Limits() {
		return (EReference)studyEClass.getEStructuralFeatures().get(15);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EReference getStudy_Surveys() {
		return (EReference)studyEClass.getEStructuralFeatures().get(16);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EClass getCorridor() {
		return corridorEClass;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getCorridor_CrossSlope() {
		return (EAttribute)corridorEClass.getEStructuralFeatures().get(0);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EReference getCorridor_Edges() {
		return (EReference)corridorEClass.getEStructuralFeatures().get(1);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EReference getCorridor_GroundPoints() {
		return (EReference)corridorEClass.getEStructuralFeatures().get(2);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EReference getCorridor_CentrelineElevations() {
		return (EReference)corridorEClass.getEStructuralFeatures().get(3);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EReference getCorridor_Bends() {
		return (EReference)corridorEClass.getEStructuralFeatures().get(4);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EClass getEdgePoint() {
		return edgePointEClass;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getEdgePoint_StationMetres() {
		return (EAttribute)edgePointEClass.getEStructuralFeatures().get(0);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getEdgePoint_LeftOffsetMetres() {
		return (EAttribute)edgePointEClass.getEStructuralFeatures().get(1);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getEdgePoint_RightOffsetMetres() {
		return (EAttribute)edgePointEClass.getEStructuralFeatures().get(2);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EClass getGroundPoint() {
		return groundPointEClass;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getGroundPoint_OffsetMetres() {
		return (EAttribute)groundPointEClass.getEStructuralFeatures().get(0);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getGroundPoint_ElevationMetres() {
		return (EAttribute)groundPointEClass.getEStructuralFeatures().get(1);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EClass getElevationPoint() {
		return elevationPointEClass;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getElevationPoint_StationMetres() {
		return (EAttribute)elevationPointEClass.getEStructuralFeatures().get(0);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getElevationPoint_ElevationMetres() {
		return (EAttribute)elevationPointEClass.getEStructuralFeatures().get(1);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EClass getAlignmentBend() {
		return alignmentBendEClass;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getAlignmentBend_StationMetres() {
		return (EAttribute)alignmentBendEClass.getEStructuralFeatures().get(0);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getAlignmentBend_DeflectionDegrees() {
		return (EAttribute)alignmentBendEClass.getEStructuralFeatures().get(1);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EClass getConductor() {
		return conductorEClass;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getConductor_DiameterMetres() {
		return (EAttribute)conductorEClass.getEStructuralFeatures().get(0);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getConductor_GeometricMeanRadiusMetres() {
		return (EAttribute)conductorEClass.getEStructuralFeatures().get(1);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getConductor_LowTemperatureCelsius() {
		return (EAttribute)conductorEClass.getEStructuralFeatures().get(2);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getConductor_LowResistanceOhmsPerMetre() {
		return (EAttribute)conductorEClass.getEStructuralFeatures().get(3);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getConductor_HighTemperatureCelsius() {
		return (EAttribute)conductorEClass.getEStructuralFeatures().get(4);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getConductor_HighResistanceOhmsPerMetre() {
		return (EAttribute)conductorEClass.getEStructuralFeatures().get(5);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getConductor_MassKilogramsPerMetre() {
		return (EAttribute)conductorEClass.getEStructuralFeatures().get(6);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getConductor_AreaSquareMetres() {
		return (EAttribute)conductorEClass.getEStructuralFeatures().get(7);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getConductor_ElasticModulusPascals() {
		return (EAttribute)conductorEClass.getEStructuralFeatures().get(8);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getConductor_ThermalExpansionPerKelvin() {
		return (EAttribute)conductorEClass.getEStructuralFeatures().get(9);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getConductor_RatedStrengthNewtons() {
		return (EAttribute)conductorEClass.getEStructuralFeatures().get(10);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getConductor_Emissivity() {
		return (EAttribute)conductorEClass.getEStructuralFeatures().get(11);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getConductor_Absorptivity() {
		return (EAttribute)conductorEClass.getEStructuralFeatures().get(12);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EClass getStructureType() {
		return structureTypeEClass;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EReference getStructureType_Attachments() {
		return (EReference)structureTypeEClass.getEStructuralFeatures().get(0);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EReference getStructureType_Outline() {
		return (EReference)structureTypeEClass.getEStructuralFeatures().get(1);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EClass getAttachment() {
		return attachmentEClass;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getAttachment_Name() {
		return (EAttribute)attachmentEClass.getEStructuralFeatures().get(0);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getAttachment_Role() {
		return (EAttribute)attachmentEClass.getEStructuralFeatures().get(1);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getAttachment_OffsetMetres() {
		return (EAttribute)attachmentEClass.getEStructuralFeatures().get(2);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getAttachment_HeightMetres() {
		return (EAttribute)attachmentEClass.getEStructuralFeatures().get(3);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getAttachment_InsulatorLengthMetres() {
		return (EAttribute)attachmentEClass.getEStructuralFeatures().get(4);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EClass getOutlineStroke() {
		return outlineStrokeEClass;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EReference getOutlineStroke_Points() {
		return (EReference)outlineStrokeEClass.getEStructuralFeatures().get(0);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EClass getOutlinePoint() {
		return outlinePointEClass;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getOutlinePoint_OffsetMetres() {
		return (EAttribute)outlinePointEClass.getEStructuralFeatures().get(0);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getOutlinePoint_HeightMetres() {
		return (EAttribute)outlinePointEClass.getEStructuralFeatures().get(1);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EClass getLine() {
		return lineEClass;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EReference getLine_Structures() {
		return (EReference)lineEClass.getEStructuralFeatures().get(0);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EReference getLine_Sections() {
		return (EReference)lineEClass.getEStructuralFeatures().get(1);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EReference getLine_Circuits() {
		return (EReference)lineEClass.getEStructuralFeatures().get(2);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EReference getLine_ShieldWires() {
		return (EReference)lineEClass.getEStructuralFeatures().get(3);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getLine_StartEnd() {
		return (EAttribute)lineEClass.getEStructuralFeatures().get(4);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getLine_FinishEnd() {
		return (EAttribute)lineEClass.getEStructuralFeatures().get(5);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EClass getStructure() {
		return structureEClass;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EReference getStructure_Type() {
		return (EReference)structureEClass.getEStructuralFeatures().get(0);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getStructure_StationMetres() {
		return (EAttribute)structureEClass.getEStructuralFeatures().get(1);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getStructure_OffsetMetres() {
		return (EAttribute)structureEClass.getEStructuralFeatures().get(2);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getStructure_BaseElevationMetres() {
		return (EAttribute)structureEClass.getEStructuralFeatures().get(3);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getStructure_HeightAdjustmentMetres() {
		return (EAttribute)structureEClass.getEStructuralFeatures().get(4);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getStructure_TurnDegrees() {
		return (EAttribute)structureEClass.getEStructuralFeatures().get(5);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EClass getStringingSection() {
		return stringingSectionEClass;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EReference getStringingSection_From() {
		return (EReference)stringingSectionEClass.getEStructuralFeatures().get(0);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EReference getStringingSection_To() {
		return (EReference)stringingSectionEClass.getEStructuralFeatures().get(1);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EReference getStringingSection_PhaseStringing() {
		return (EReference)stringingSectionEClass.getEStructuralFeatures().get(2);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EReference getStringingSection_ShieldStringing() {
		return (EReference)stringingSectionEClass.getEStructuralFeatures().get(3);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EReference getStringingSection_Exceptions() {
		return (EReference)stringingSectionEClass.getEStructuralFeatures().get(4);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EClass getWireStringing() {
		return wireStringingEClass;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EReference getWireStringing_Wires() {
		return (EReference)wireStringingEClass.getEStructuralFeatures().get(0);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EReference getWireStringing_Stringing() {
		return (EReference)wireStringingEClass.getEStructuralFeatures().get(1);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EClass getStringing() {
		return stringingEClass;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EClass getCatenaryStringing() {
		return catenaryStringingEClass;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getCatenaryStringing_CatenaryConstantMetres() {
		return (EAttribute)catenaryStringingEClass.getEStructuralFeatures().get(0);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EClass getSagStringing() {
		return sagStringingEClass;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getSagStringing_SagMetres() {
		return (EAttribute)sagStringingEClass.getEStructuralFeatures().get(0);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EClass getTensionStringing() {
		return tensionStringingEClass;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getTensionStringing_HorizontalTensionNewtons() {
		return (EAttribute)tensionStringingEClass.getEStructuralFeatures().get(0);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EClass getClearanceStringing() {
		return clearanceStringingEClass;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getClearanceStringing_ClearanceMetres() {
		return (EAttribute)clearanceStringingEClass.getEStructuralFeatures().get(0);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EClass getStrungElement() {
		return strungElementEClass;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EReference getStrungElement_Conductor() {
		return (EReference)strungElementEClass.getEStructuralFeatures().get(0);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EClass getCircuit() {
		return circuitEClass;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getCircuit_NominalVoltageVolts() {
		return (EAttribute)circuitEClass.getEStructuralFeatures().get(0);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getCircuit_BundleCount() {
		return (EAttribute)circuitEClass.getEStructuralFeatures().get(1);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getCircuit_BundleSpacingMetres() {
		return (EAttribute)circuitEClass.getEStructuralFeatures().get(2);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getCircuit_Phasing() {
		return (EAttribute)circuitEClass.getEStructuralFeatures().get(3);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EReference getCircuit_Phases() {
		return (EReference)circuitEClass.getEStructuralFeatures().get(4);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EClass getPhase() {
		return phaseEClass;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getPhase_Label() {
		return (EAttribute)phaseEClass.getEStructuralFeatures().get(0);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getPhase_AngleDegrees() {
		return (EAttribute)phaseEClass.getEStructuralFeatures().get(1);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getPhase_Attachment() {
		return (EAttribute)phaseEClass.getEStructuralFeatures().get(2);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EClass getShieldWire() {
		return shieldWireEClass;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getShieldWire_Attachment() {
		return (EAttribute)shieldWireEClass.getEStructuralFeatures().get(0);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getShieldWire_Bonding() {
		return (EAttribute)shieldWireEClass.getEStructuralFeatures().get(1);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getShieldWire_GivenCurrentAmperes() {
		return (EAttribute)shieldWireEClass.getEStructuralFeatures().get(2);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getShieldWire_GivenAngleDegrees() {
		return (EAttribute)shieldWireEClass.getEStructuralFeatures().get(3);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EClass getLoadCase() {
		return loadCaseEClass;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getLoadCase_Basis() {
		return (EAttribute)loadCaseEClass.getEStructuralFeatures().get(0);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getLoadCase_WindSwingDegrees() {
		return (EAttribute)loadCaseEClass.getEStructuralFeatures().get(1);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EReference getLoadCase_Loads() {
		return (EReference)loadCaseEClass.getEStructuralFeatures().get(2);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EClass getCircuitLoad() {
		return circuitLoadEClass;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EReference getCircuitLoad_Circuit() {
		return (EReference)circuitLoadEClass.getEStructuralFeatures().get(0);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getCircuitLoad_Direction() {
		return (EAttribute)circuitLoadEClass.getEStructuralFeatures().get(1);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EClass getCurrentLoad() {
		return currentLoadEClass;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getCurrentLoad_CurrentAmperes() {
		return (EAttribute)currentLoadEClass.getEStructuralFeatures().get(0);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getCurrentLoad_AngleDegrees() {
		return (EAttribute)currentLoadEClass.getEStructuralFeatures().get(1);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EClass getPowerLoad() {
		return powerLoadEClass;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getPowerLoad_ActivePowerWatts() {
		return (EAttribute)powerLoadEClass.getEStructuralFeatures().get(0);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getPowerLoad_ReactivePowerVars() {
		return (EAttribute)powerLoadEClass.getEStructuralFeatures().get(1);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getPowerLoad_VoltageVolts() {
		return (EAttribute)powerLoadEClass.getEStructuralFeatures().get(2);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EClass getSequenceLoad() {
		return sequenceLoadEClass;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getSequenceLoad_PositiveAmperes() {
		return (EAttribute)sequenceLoadEClass.getEStructuralFeatures().get(0);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getSequenceLoad_PositiveAngleDegrees() {
		return (EAttribute)sequenceLoadEClass.getEStructuralFeatures().get(1);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getSequenceLoad_NegativeAmperes() {
		return (EAttribute)sequenceLoadEClass.getEStructuralFeatures().get(2);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getSequenceLoad_NegativeAngleDegrees() {
		return (EAttribute)sequenceLoadEClass.getEStructuralFeatures().get(3);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getSequenceLoad_ZeroAmperes() {
		return (EAttribute)sequenceLoadEClass.getEStructuralFeatures().get(4);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getSequenceLoad_ZeroAngleDegrees() {
		return (EAttribute)sequenceLoadEClass.getEStructuralFeatures().get(5);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EClass getPhasorLoad() {
		return phasorLoadEClass;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EReference getPhasorLoad_Phasors() {
		return (EReference)phasorLoadEClass.getEStructuralFeatures().get(0);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EClass getPhasePhasor() {
		return phasePhasorEClass;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getPhasePhasor_Phase() {
		return (EAttribute)phasePhasorEClass.getEStructuralFeatures().get(0);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getPhasePhasor_CurrentAmperes() {
		return (EAttribute)phasePhasorEClass.getEStructuralFeatures().get(1);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getPhasePhasor_AngleDegrees() {
		return (EAttribute)phasePhasorEClass.getEStructuralFeatures().get(2);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EClass getProfileStation() {
		return profileStationEClass;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getProfileStation_StationMetres() {
		return (EAttribute)profileStationEClass.getEStructuralFeatures().get(0);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getProfileStation_FromOffsetMetres() {
		return (EAttribute)profileStationEClass.getEStructuralFeatures().get(1);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getProfileStation_ToOffsetMetres() {
		return (EAttribute)profileStationEClass.getEStructuralFeatures().get(2);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getProfileStation_SpacingMetres() {
		return (EAttribute)profileStationEClass.getEStructuralFeatures().get(3);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EClass getFieldLimit() {
		return fieldLimitEClass;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getFieldLimit_Quantity() {
		return (EAttribute)fieldLimitEClass.getEStructuralFeatures().get(0);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getFieldLimit_Measure() {
		return (EAttribute)fieldLimitEClass.getEStructuralFeatures().get(1);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getFieldLimit_Level() {
		return (EAttribute)fieldLimitEClass.getEStructuralFeatures().get(2);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getFieldLimit_Place() {
		return (EAttribute)fieldLimitEClass.getEStructuralFeatures().get(3);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getFieldLimit_Body() {
		return (EAttribute)fieldLimitEClass.getEStructuralFeatures().get(4);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getFieldLimit_Edition() {
		return (EAttribute)fieldLimitEClass.getEStructuralFeatures().get(5);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getFieldLimit_LoadCondition() {
		return (EAttribute)fieldLimitEClass.getEStructuralFeatures().get(6);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getFieldLimit_Basis() {
		return (EAttribute)fieldLimitEClass.getEStructuralFeatures().get(7);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EClass getSurvey() {
		return surveyEClass;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getSurvey_Date() {
		return (EAttribute)surveyEClass.getEStructuralFeatures().get(0);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getSurvey_Instrument() {
		return (EAttribute)surveyEClass.getEStructuralFeatures().get(1);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getSurvey_RelativeUncertainty() {
		return (EAttribute)surveyEClass.getEStructuralFeatures().get(2);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EReference getSurvey_Readings() {
		return (EReference)surveyEClass.getEStructuralFeatures().get(3);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EClass getSurveyReading() {
		return surveyReadingEClass;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getSurveyReading_StationMetres() {
		return (EAttribute)surveyReadingEClass.getEStructuralFeatures().get(0);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getSurveyReading_OffsetMetres() {
		return (EAttribute)surveyReadingEClass.getEStructuralFeatures().get(1);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getSurveyReading_HeightMetres() {
		return (EAttribute)surveyReadingEClass.getEStructuralFeatures().get(2);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EAttribute getSurveyReading_ResultantTesla() {
		return (EAttribute)surveyReadingEClass.getEStructuralFeatures().get(3);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EEnum getEarthModel() {
		return earthModelEEnum;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EEnum getImpedanceFormula() {
		return impedanceFormulaEEnum;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EEnum getAttachmentRole() {
		return attachmentRoleEEnum;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EEnum getLineEnd() {
		return lineEndEEnum;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EEnum getBonding() {
		return bondingEEnum;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EEnum getPhasing() {
		return phasingEEnum;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EEnum getFlowDirection() {
		return flowDirectionEEnum;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EEnum getFieldQuantity() {
		return fieldQuantityEEnum;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EEnum getFieldMeasure() {
		return fieldMeasureEEnum;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EEnum getLimitPlace() {
		return limitPlaceEEnum;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public EEnum getLimitBasis() {
		return limitBasisEEnum;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public SpanfieldFactory getSpanfieldFactory() {
		return (SpanfieldFactory)getEFactoryInstance();
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private boolean isCreated = false;

	/**
	 * Creates the meta-model objects for the package.  This method is
	 * guarded to have no affect on any invocation but its first.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public void createPackageContents() {
		if (isCreated) return;
		isCreated = true;

		// Create classes and their features
		namedElementEClass = createEClass(NAMED_ELEMENT);
		createEAttribute(namedElementEClass, NAMED_ELEMENT__ID);
		createEAttribute(namedElementEClass, NAMED_ELEMENT__NAME);
		createEAttribute(namedElementEClass, NAMED_ELEMENT__NOTES);

		studyEClass = createEClass(STUDY);
		createEAttribute(studyEClass, STUDY__AUTHOR);
		createEAttribute(studyEClass, STUDY__ORGANISATION);
		createEAttribute(studyEClass, STUDY__DATE);
		createEAttribute(studyEClass, STUDY__FREQUENCY_HERTZ);
		createEAttribute(studyEClass, STUDY__EARTH_RESISTIVITY_OHM_METRES);
		createEAttribute(studyEClass, STUDY__EARTH_MODEL);
		createEAttribute(studyEClass, STUDY__IMPEDANCE_FORMULA);
		createEAttribute(studyEClass, STUDY__REFERENCE_HEIGHT_METRES);
		createEAttribute(studyEClass, STUDY__RELATIVE_ACCURACY);
		createEReference(studyEClass, STUDY__CORRIDOR);
		createEReference(studyEClass, STUDY__CONDUCTORS);
		createEReference(studyEClass, STUDY__STRUCTURE_TYPES);
		createEReference(studyEClass, STUDY__LINES);
		createEReference(studyEClass, STUDY__LOAD_CASES);
		createEReference(studyEClass, STUDY__STATIONS);
		createEReference(studyEClass, STUDY__LIMITS);
		createEReference(studyEClass, STUDY__SURVEYS);

		corridorEClass = createEClass(CORRIDOR);
		createEAttribute(corridorEClass, CORRIDOR__CROSS_SLOPE);
		createEReference(corridorEClass, CORRIDOR__EDGES);
		createEReference(corridorEClass, CORRIDOR__GROUND_POINTS);
		createEReference(corridorEClass, CORRIDOR__CENTRELINE_ELEVATIONS);
		createEReference(corridorEClass, CORRIDOR__BENDS);

		edgePointEClass = createEClass(EDGE_POINT);
		createEAttribute(edgePointEClass, EDGE_POINT__STATION_METRES);
		createEAttribute(edgePointEClass, EDGE_POINT__LEFT_OFFSET_METRES);
		createEAttribute(edgePointEClass, EDGE_POINT__RIGHT_OFFSET_METRES);

		groundPointEClass = createEClass(GROUND_POINT);
		createEAttribute(groundPointEClass, GROUND_POINT__OFFSET_METRES);
		createEAttribute(groundPointEClass, GROUND_POINT__ELEVATION_METRES);

		elevationPointEClass = createEClass(ELEVATION_POINT);
		createEAttribute(elevationPointEClass, ELEVATION_POINT__STATION_METRES);
		createEAttribute(elevationPointEClass, ELEVATION_POINT__ELEVATION_METRES);

		alignmentBendEClass = createEClass(ALIGNMENT_BEND);
		createEAttribute(alignmentBendEClass, ALIGNMENT_BEND__STATION_METRES);
		createEAttribute(alignmentBendEClass, ALIGNMENT_BEND__DEFLECTION_DEGREES);

		conductorEClass = createEClass(CONDUCTOR);
		createEAttribute(conductorEClass, CONDUCTOR__DIAMETER_METRES);
		createEAttribute(conductorEClass, CONDUCTOR__GEOMETRIC_MEAN_RADIUS_METRES);
		createEAttribute(conductorEClass, CONDUCTOR__LOW_TEMPERATURE_CELSIUS);
		createEAttribute(conductorEClass, CONDUCTOR__LOW_RESISTANCE_OHMS_PER_METRE);
		createEAttribute(conductorEClass, CONDUCTOR__HIGH_TEMPERATURE_CELSIUS);
		createEAttribute(conductorEClass, CONDUCTOR__HIGH_RESISTANCE_OHMS_PER_METRE);
		createEAttribute(conductorEClass, CONDUCTOR__MASS_KILOGRAMS_PER_METRE);
		createEAttribute(conductorEClass, CONDUCTOR__AREA_SQUARE_METRES);
		createEAttribute(conductorEClass, CONDUCTOR__ELASTIC_MODULUS_PASCALS);
		createEAttribute(conductorEClass, CONDUCTOR__THERMAL_EXPANSION_PER_KELVIN);
		createEAttribute(conductorEClass, CONDUCTOR__RATED_STRENGTH_NEWTONS);
		createEAttribute(conductorEClass, CONDUCTOR__EMISSIVITY);
		createEAttribute(conductorEClass, CONDUCTOR__ABSORPTIVITY);

		structureTypeEClass = createEClass(STRUCTURE_TYPE);
		createEReference(structureTypeEClass, STRUCTURE_TYPE__ATTACHMENTS);
		createEReference(structureTypeEClass, STRUCTURE_TYPE__OUTLINE);

		attachmentEClass = createEClass(ATTACHMENT);
		createEAttribute(attachmentEClass, ATTACHMENT__NAME);
		createEAttribute(attachmentEClass, ATTACHMENT__ROLE);
		createEAttribute(attachmentEClass, ATTACHMENT__OFFSET_METRES);
		createEAttribute(attachmentEClass, ATTACHMENT__HEIGHT_METRES);
		createEAttribute(attachmentEClass, ATTACHMENT__INSULATOR_LENGTH_METRES);

		outlineStrokeEClass = createEClass(OUTLINE_STROKE);
		createEReference(outlineStrokeEClass, OUTLINE_STROKE__POINTS);

		outlinePointEClass = createEClass(OUTLINE_POINT);
		createEAttribute(outlinePointEClass, OUTLINE_POINT__OFFSET_METRES);
		createEAttribute(outlinePointEClass, OUTLINE_POINT__HEIGHT_METRES);

		lineEClass = createEClass(LINE);
		createEReference(lineEClass, LINE__STRUCTURES);
		createEReference(lineEClass, LINE__SECTIONS);
		createEReference(lineEClass, LINE__CIRCUITS);
		createEReference(lineEClass, LINE__SHIELD_WIRES);
		createEAttribute(lineEClass, LINE__START_END);
		createEAttribute(lineEClass, LINE__FINISH_END);

		structureEClass = createEClass(STRUCTURE);
		createEReference(structureEClass, STRUCTURE__TYPE);
		createEAttribute(structureEClass, STRUCTURE__STATION_METRES);
		createEAttribute(structureEClass, STRUCTURE__OFFSET_METRES);
		createEAttribute(structureEClass, STRUCTURE__BASE_ELEVATION_METRES);
		createEAttribute(structureEClass, STRUCTURE__HEIGHT_ADJUSTMENT_METRES);
		createEAttribute(structureEClass, STRUCTURE__TURN_DEGREES);

		stringingSectionEClass = createEClass(STRINGING_SECTION);
		createEReference(stringingSectionEClass, STRINGING_SECTION__FROM);
		createEReference(stringingSectionEClass, STRINGING_SECTION__TO);
		createEReference(stringingSectionEClass, STRINGING_SECTION__PHASE_STRINGING);
		createEReference(stringingSectionEClass, STRINGING_SECTION__SHIELD_STRINGING);
		createEReference(stringingSectionEClass, STRINGING_SECTION__EXCEPTIONS);

		wireStringingEClass = createEClass(WIRE_STRINGING);
		createEReference(wireStringingEClass, WIRE_STRINGING__WIRES);
		createEReference(wireStringingEClass, WIRE_STRINGING__STRINGING);

		stringingEClass = createEClass(STRINGING);

		catenaryStringingEClass = createEClass(CATENARY_STRINGING);
		createEAttribute(catenaryStringingEClass, CATENARY_STRINGING__CATENARY_CONSTANT_METRES);

		sagStringingEClass = createEClass(SAG_STRINGING);
		createEAttribute(sagStringingEClass, SAG_STRINGING__SAG_METRES);

		tensionStringingEClass = createEClass(TENSION_STRINGING);
		createEAttribute(tensionStringingEClass, TENSION_STRINGING__HORIZONTAL_TENSION_NEWTONS);

		clearanceStringingEClass = createEClass(CLEARANCE_STRINGING);
		createEAttribute(clearanceStringingEClass, CLEARANCE_STRINGING__CLEARANCE_METRES);

		strungElementEClass = createEClass(STRUNG_ELEMENT);
		createEReference(strungElementEClass, STRUNG_ELEMENT__CONDUCTOR);

		circuitEClass = createEClass(CIRCUIT);
		createEAttribute(circuitEClass, CIRCUIT__NOMINAL_VOLTAGE_VOLTS);
		createEAttribute(circuitEClass, CIRCUIT__BUNDLE_COUNT);
		createEAttribute(circuitEClass, CIRCUIT__BUNDLE_SPACING_METRES);
		createEAttribute(circuitEClass, CIRCUIT__PHASING);
		createEReference(circuitEClass, CIRCUIT__PHASES);

		phaseEClass = createEClass(PHASE);
		createEAttribute(phaseEClass, PHASE__LABEL);
		createEAttribute(phaseEClass, PHASE__ANGLE_DEGREES);
		createEAttribute(phaseEClass, PHASE__ATTACHMENT);

		shieldWireEClass = createEClass(SHIELD_WIRE);
		createEAttribute(shieldWireEClass, SHIELD_WIRE__ATTACHMENT);
		createEAttribute(shieldWireEClass, SHIELD_WIRE__BONDING);
		createEAttribute(shieldWireEClass, SHIELD_WIRE__GIVEN_CURRENT_AMPERES);
		createEAttribute(shieldWireEClass, SHIELD_WIRE__GIVEN_ANGLE_DEGREES);

		loadCaseEClass = createEClass(LOAD_CASE);
		createEAttribute(loadCaseEClass, LOAD_CASE__BASIS);
		createEAttribute(loadCaseEClass, LOAD_CASE__WIND_SWING_DEGREES);
		createEReference(loadCaseEClass, LOAD_CASE__LOADS);

		circuitLoadEClass = createEClass(CIRCUIT_LOAD);
		createEReference(circuitLoadEClass, CIRCUIT_LOAD__CIRCUIT);
		createEAttribute(circuitLoadEClass, CIRCUIT_LOAD__DIRECTION);

		currentLoadEClass = createEClass(CURRENT_LOAD);
		createEAttribute(currentLoadEClass, CURRENT_LOAD__CURRENT_AMPERES);
		createEAttribute(currentLoadEClass, CURRENT_LOAD__ANGLE_DEGREES);

		powerLoadEClass = createEClass(POWER_LOAD);
		createEAttribute(powerLoadEClass, POWER_LOAD__ACTIVE_POWER_WATTS);
		createEAttribute(powerLoadEClass, POWER_LOAD__REACTIVE_POWER_VARS);
		createEAttribute(powerLoadEClass, POWER_LOAD__VOLTAGE_VOLTS);

		sequenceLoadEClass = createEClass(SEQUENCE_LOAD);
		createEAttribute(sequenceLoadEClass, SEQUENCE_LOAD__POSITIVE_AMPERES);
		createEAttribute(sequenceLoadEClass, SEQUENCE_LOAD__POSITIVE_ANGLE_DEGREES);
		createEAttribute(sequenceLoadEClass, SEQUENCE_LOAD__NEGATIVE_AMPERES);
		createEAttribute(sequenceLoadEClass, SEQUENCE_LOAD__NEGATIVE_ANGLE_DEGREES);
		createEAttribute(sequenceLoadEClass, SEQUENCE_LOAD__ZERO_AMPERES);
		createEAttribute(sequenceLoadEClass, SEQUENCE_LOAD__ZERO_ANGLE_DEGREES);

		phasorLoadEClass = createEClass(PHASOR_LOAD);
		createEReference(phasorLoadEClass, PHASOR_LOAD__PHASORS);

		phasePhasorEClass = createEClass(PHASE_PHASOR);
		createEAttribute(phasePhasorEClass, PHASE_PHASOR__PHASE);
		createEAttribute(phasePhasorEClass, PHASE_PHASOR__CURRENT_AMPERES);
		createEAttribute(phasePhasorEClass, PHASE_PHASOR__ANGLE_DEGREES);

		profileStationEClass = createEClass(PROFILE_STATION);
		createEAttribute(profileStationEClass, PROFILE_STATION__STATION_METRES);
		createEAttribute(profileStationEClass, PROFILE_STATION__FROM_OFFSET_METRES);
		createEAttribute(profileStationEClass, PROFILE_STATION__TO_OFFSET_METRES);
		createEAttribute(profileStationEClass, PROFILE_STATION__SPACING_METRES);

		fieldLimitEClass = createEClass(FIELD_LIMIT);
		createEAttribute(fieldLimitEClass, FIELD_LIMIT__QUANTITY);
		createEAttribute(fieldLimitEClass, FIELD_LIMIT__MEASURE);
		createEAttribute(fieldLimitEClass, FIELD_LIMIT__LEVEL);
		createEAttribute(fieldLimitEClass, FIELD_LIMIT__PLACE);
		createEAttribute(fieldLimitEClass, FIELD_LIMIT__BODY);
		createEAttribute(fieldLimitEClass, FIELD_LIMIT__EDITION);
		createEAttribute(fieldLimitEClass, FIELD_LIMIT__LOAD_CONDITION);
		createEAttribute(fieldLimitEClass, FIELD_LIMIT__BASIS);

		surveyEClass = createEClass(SURVEY);
		createEAttribute(surveyEClass, SURVEY__DATE);
		createEAttribute(surveyEClass, SURVEY__INSTRUMENT);
		createEAttribute(surveyEClass, SURVEY__RELATIVE_UNCERTAINTY);
		createEReference(surveyEClass, SURVEY__READINGS);

		surveyReadingEClass = createEClass(SURVEY_READING);
		createEAttribute(surveyReadingEClass, SURVEY_READING__STATION_METRES);
		createEAttribute(surveyReadingEClass, SURVEY_READING__OFFSET_METRES);
		createEAttribute(surveyReadingEClass, SURVEY_READING__HEIGHT_METRES);
		createEAttribute(surveyReadingEClass, SURVEY_READING__RESULTANT_TESLA);

		// Create enums
		earthModelEEnum = createEEnum(EARTH_MODEL);
		impedanceFormulaEEnum = createEEnum(IMPEDANCE_FORMULA);
		attachmentRoleEEnum = createEEnum(ATTACHMENT_ROLE);
		lineEndEEnum = createEEnum(LINE_END);
		bondingEEnum = createEEnum(BONDING);
		phasingEEnum = createEEnum(PHASING);
		flowDirectionEEnum = createEEnum(FLOW_DIRECTION);
		fieldQuantityEEnum = createEEnum(FIELD_QUANTITY);
		fieldMeasureEEnum = createEEnum(FIELD_MEASURE);
		limitPlaceEEnum = createEEnum(LIMIT_PLACE);
		limitBasisEEnum = createEEnum(LIMIT_BASIS);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private boolean isInitialized = false;

	/**
	 * Complete the initialization of the package and its meta-model.  This
	 * method is guarded to have no affect on any invocation but its first.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public void initializePackageContents() {
		if (isInitialized) return;
		isInitialized = true;

		// Initialize package
		setName(eNAME);
		setNsPrefix(eNS_PREFIX);
		setNsURI(eNS_URI);

		// Create type parameters

		// Set bounds for type parameters

		// Add supertypes to classes
		studyEClass.getESuperTypes().add(this.getNamedElement());
		conductorEClass.getESuperTypes().add(this.getNamedElement());
		structureTypeEClass.getESuperTypes().add(this.getNamedElement());
		lineEClass.getESuperTypes().add(this.getNamedElement());
		structureEClass.getESuperTypes().add(this.getNamedElement());
		catenaryStringingEClass.getESuperTypes().add(this.getStringing());
		sagStringingEClass.getESuperTypes().add(this.getStringing());
		tensionStringingEClass.getESuperTypes().add(this.getStringing());
		clearanceStringingEClass.getESuperTypes().add(this.getStringing());
		strungElementEClass.getESuperTypes().add(this.getNamedElement());
		circuitEClass.getESuperTypes().add(this.getStrungElement());
		shieldWireEClass.getESuperTypes().add(this.getStrungElement());
		loadCaseEClass.getESuperTypes().add(this.getNamedElement());
		currentLoadEClass.getESuperTypes().add(this.getCircuitLoad());
		powerLoadEClass.getESuperTypes().add(this.getCircuitLoad());
		sequenceLoadEClass.getESuperTypes().add(this.getCircuitLoad());
		phasorLoadEClass.getESuperTypes().add(this.getCircuitLoad());
		profileStationEClass.getESuperTypes().add(this.getNamedElement());
		fieldLimitEClass.getESuperTypes().add(this.getNamedElement());
		surveyEClass.getESuperTypes().add(this.getNamedElement());

		// Initialize classes, features, and operations; add parameters
		initEClass(namedElementEClass, NamedElement.class, "NamedElement", IS_ABSTRACT, !IS_INTERFACE, IS_GENERATED_INSTANCE_CLASS);
		initEAttribute(getNamedElement_Id(), ecorePackage.getEString(), "id", null, 0, 1, NamedElement.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getNamedElement_Name(), ecorePackage.getEString(), "name", null, 0, 1, NamedElement.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getNamedElement_Notes(), ecorePackage.getEString(), "notes", null, 0, 1, NamedElement.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);

		initEClass(studyEClass, Study.class, "Study", !IS_ABSTRACT, !IS_INTERFACE, IS_GENERATED_INSTANCE_CLASS);
		initEAttribute(getStudy_Author(), ecorePackage.getEString(), "author", null, 0, 1, Study.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getStudy_Organisation(), ecorePackage.getEString(), "organisation", null, 0, 1, Study.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getStudy_Date(), ecorePackage.getEString(), "date", null, 0, 1, Study.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getStudy_FrequencyHertz(), ecorePackage.getEDouble(), "frequencyHertz", "50", 0, 1, Study.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getStudy_EarthResistivityOhmMetres(), ecorePackage.getEDoubleObject(), "earthResistivityOhmMetres", null, 0, 1, Study.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getStudy_EarthModel(), this.getEarthModel(), "earthModel", "EXACT_HALF_SPACE", 0, 1, Study.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getStudy_ImpedanceFormula(), this.getImpedanceFormula(), "impedanceFormula", "COMPLEX_DEPTH", 0, 1, Study.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getStudy_ReferenceHeightMetres(), ecorePackage.getEDouble(), "referenceHeightMetres", "1", 0, 1, Study.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getStudy_RelativeAccuracy(), ecorePackage.getEDouble(), "relativeAccuracy", "1e-6", 0, 1, Study.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEReference(getStudy_Corridor(), this.getCorridor(), null, "corridor", null, 1, 1, Study.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, IS_COMPOSITE, !IS_RESOLVE_PROXIES, !IS_UNSETTABLE, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEReference(getStudy_Conductors(), this.getConductor(), null, "conductors", null, 0, -1, Study.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, IS_COMPOSITE, !IS_RESOLVE_PROXIES, !IS_UNSETTABLE, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEReference(getStudy_StructureTypes(), this.getStructureType(), null, "structureTypes", null, 0, -1, Study.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, IS_COMPOSITE, !IS_RESOLVE_PROXIES, !IS_UNSETTABLE, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEReference(getStudy_Lines(), this.getLine(), null, "lines", null, 0, -1, Study.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, IS_COMPOSITE, !IS_RESOLVE_PROXIES, !IS_UNSETTABLE, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEReference(getStudy_LoadCases(), this.getLoadCase(), null, "loadCases", null, 0, -1, Study.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, IS_COMPOSITE, !IS_RESOLVE_PROXIES, !IS_UNSETTABLE, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEReference(getStudy_Stations(), this.getProfileStation(), null, "stations", null, 0, -1, Study.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, IS_COMPOSITE, !IS_RESOLVE_PROXIES, !IS_UNSETTABLE, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEReference(getStudy_Limits(), this.getFieldLimit(), null, "limits", null, 0, -1, Study.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, IS_COMPOSITE, !IS_RESOLVE_PROXIES, !IS_UNSETTABLE, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEReference(getStudy_Surveys(), this.getSurvey(), null, "surveys", null, 0, -1, Study.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, IS_COMPOSITE, !IS_RESOLVE_PROXIES, !IS_UNSETTABLE, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);

		initEClass(corridorEClass, Corridor.class, "Corridor", !IS_ABSTRACT, !IS_INTERFACE, IS_GENERATED_INSTANCE_CLASS);
		initEAttribute(getCorridor_CrossSlope(), ecorePackage.getEDouble(), "crossSlope", "0", 0, 1, Corridor.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEReference(getCorridor_Edges(), this.getEdgePoint(), null, "edges", null, 1, -1, Corridor.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, IS_COMPOSITE, !IS_RESOLVE_PROXIES, !IS_UNSETTABLE, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEReference(getCorridor_GroundPoints(), this.getGroundPoint(), null, "groundPoints", null, 0, -1, Corridor.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, IS_COMPOSITE, !IS_RESOLVE_PROXIES, !IS_UNSETTABLE, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEReference(getCorridor_CentrelineElevations(), this.getElevationPoint(), null, "centrelineElevations", null, 0, -1, Corridor.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, IS_COMPOSITE, !IS_RESOLVE_PROXIES, !IS_UNSETTABLE, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEReference(getCorridor_Bends(), this.getAlignmentBend(), null, "bends", null, 0, -1, Corridor.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, IS_COMPOSITE, !IS_RESOLVE_PROXIES, !IS_UNSETTABLE, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);

		initEClass(edgePointEClass, EdgePoint.class, "EdgePoint", !IS_ABSTRACT, !IS_INTERFACE, IS_GENERATED_INSTANCE_CLASS);
		initEAttribute(getEdgePoint_StationMetres(), ecorePackage.getEDouble(), "stationMetres", "0", 0, 1, EdgePoint.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getEdgePoint_LeftOffsetMetres(), ecorePackage.getEDouble(), "leftOffsetMetres", "0", 0, 1, EdgePoint.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getEdgePoint_RightOffsetMetres(), ecorePackage.getEDouble(), "rightOffsetMetres", "0", 0, 1, EdgePoint.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);

		initEClass(groundPointEClass, GroundPoint.class, "GroundPoint", !IS_ABSTRACT, !IS_INTERFACE, IS_GENERATED_INSTANCE_CLASS);
		initEAttribute(getGroundPoint_OffsetMetres(), ecorePackage.getEDouble(), "offsetMetres", "0", 0, 1, GroundPoint.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getGroundPoint_ElevationMetres(), ecorePackage.getEDouble(), "elevationMetres", "0", 0, 1, GroundPoint.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);

		initEClass(elevationPointEClass, ElevationPoint.class, "ElevationPoint", !IS_ABSTRACT, !IS_INTERFACE, IS_GENERATED_INSTANCE_CLASS);
		initEAttribute(getElevationPoint_StationMetres(), ecorePackage.getEDouble(), "stationMetres", "0", 0, 1, ElevationPoint.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getElevationPoint_ElevationMetres(), ecorePackage.getEDouble(), "elevationMetres", "0", 0, 1, ElevationPoint.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);

		initEClass(alignmentBendEClass, AlignmentBend.class, "AlignmentBend", !IS_ABSTRACT, !IS_INTERFACE, IS_GENERATED_INSTANCE_CLASS);
		initEAttribute(getAlignmentBend_StationMetres(), ecorePackage.getEDouble(), "stationMetres", "0", 0, 1, AlignmentBend.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getAlignmentBend_DeflectionDegrees(), ecorePackage.getEDouble(), "deflectionDegrees", "0", 0, 1, AlignmentBend.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);

		initEClass(conductorEClass, Conductor.class, "Conductor", !IS_ABSTRACT, !IS_INTERFACE, IS_GENERATED_INSTANCE_CLASS);
		initEAttribute(getConductor_DiameterMetres(), ecorePackage.getEDouble(), "diameterMetres", "0", 0, 1, Conductor.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getConductor_GeometricMeanRadiusMetres(), ecorePackage.getEDoubleObject(), "geometricMeanRadiusMetres", null, 0, 1, Conductor.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getConductor_LowTemperatureCelsius(), ecorePackage.getEDouble(), "lowTemperatureCelsius", "20", 0, 1, Conductor.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getConductor_LowResistanceOhmsPerMetre(), ecorePackage.getEDoubleObject(), "lowResistanceOhmsPerMetre", null, 0, 1, Conductor.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getConductor_HighTemperatureCelsius(), ecorePackage.getEDouble(), "highTemperatureCelsius", "75", 0, 1, Conductor.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getConductor_HighResistanceOhmsPerMetre(), ecorePackage.getEDoubleObject(), "highResistanceOhmsPerMetre", null, 0, 1, Conductor.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getConductor_MassKilogramsPerMetre(), ecorePackage.getEDoubleObject(), "massKilogramsPerMetre", null, 0, 1, Conductor.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getConductor_AreaSquareMetres(), ecorePackage.getEDoubleObject(), "areaSquareMetres", null, 0, 1, Conductor.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getConductor_ElasticModulusPascals(), ecorePackage.getEDoubleObject(), "elasticModulusPascals", null, 0, 1, Conductor.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getConductor_ThermalExpansionPerKelvin(), ecorePackage.getEDoubleObject(), "thermalExpansionPerKelvin", null, 0, 1, Conductor.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getConductor_RatedStrengthNewtons(), ecorePackage.getEDoubleObject(), "ratedStrengthNewtons", null, 0, 1, Conductor.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getConductor_Emissivity(), ecorePackage.getEDoubleObject(), "emissivity", null, 0, 1, Conductor.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getConductor_Absorptivity(), ecorePackage.getEDoubleObject(), "absorptivity", null, 0, 1, Conductor.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);

		initEClass(structureTypeEClass, StructureType.class, "StructureType", !IS_ABSTRACT, !IS_INTERFACE, IS_GENERATED_INSTANCE_CLASS);
		initEReference(getStructureType_Attachments(), this.getAttachment(), null, "attachments", null, 1, -1, StructureType.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, IS_COMPOSITE, !IS_RESOLVE_PROXIES, !IS_UNSETTABLE, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEReference(getStructureType_Outline(), this.getOutlineStroke(), null, "outline", null, 0, -1, StructureType.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, IS_COMPOSITE, !IS_RESOLVE_PROXIES, !IS_UNSETTABLE, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);

		initEClass(attachmentEClass, Attachment.class, "Attachment", !IS_ABSTRACT, !IS_INTERFACE, IS_GENERATED_INSTANCE_CLASS);
		initEAttribute(getAttachment_Name(), ecorePackage.getEString(), "name", null, 0, 1, Attachment.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getAttachment_Role(), this.getAttachmentRole(), "role", "PHASE", 0, 1, Attachment.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getAttachment_OffsetMetres(), ecorePackage.getEDouble(), "offsetMetres", "0", 0, 1, Attachment.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getAttachment_HeightMetres(), ecorePackage.getEDouble(), "heightMetres", "0", 0, 1, Attachment.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getAttachment_InsulatorLengthMetres(), ecorePackage.getEDouble(), "insulatorLengthMetres", "0", 0, 1, Attachment.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);

		initEClass(outlineStrokeEClass, OutlineStroke.class, "OutlineStroke", !IS_ABSTRACT, !IS_INTERFACE, IS_GENERATED_INSTANCE_CLASS);
		initEReference(getOutlineStroke_Points(), this.getOutlinePoint(), null, "points", null, 1, -1, OutlineStroke.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, IS_COMPOSITE, !IS_RESOLVE_PROXIES, !IS_UNSETTABLE, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);

		initEClass(outlinePointEClass, OutlinePoint.class, "OutlinePoint", !IS_ABSTRACT, !IS_INTERFACE, IS_GENERATED_INSTANCE_CLASS);
		initEAttribute(getOutlinePoint_OffsetMetres(), ecorePackage.getEDouble(), "offsetMetres", "0", 0, 1, OutlinePoint.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getOutlinePoint_HeightMetres(), ecorePackage.getEDouble(), "heightMetres", "0", 0, 1, OutlinePoint.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);

		initEClass(lineEClass, Line.class, "Line", !IS_ABSTRACT, !IS_INTERFACE, IS_GENERATED_INSTANCE_CLASS);
		initEReference(getLine_Structures(), this.getStructure(), null, "structures", null, 1, -1, Line.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, IS_COMPOSITE, !IS_RESOLVE_PROXIES, !IS_UNSETTABLE, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEReference(getLine_Sections(), this.getStringingSection(), null, "sections", null, 1, -1, Line.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, IS_COMPOSITE, !IS_RESOLVE_PROXIES, !IS_UNSETTABLE, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEReference(getLine_Circuits(), this.getCircuit(), null, "circuits", null, 0, -1, Line.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, IS_COMPOSITE, !IS_RESOLVE_PROXIES, !IS_UNSETTABLE, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEReference(getLine_ShieldWires(), this.getShieldWire(), null, "shieldWires", null, 0, -1, Line.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, IS_COMPOSITE, !IS_RESOLVE_PROXIES, !IS_UNSETTABLE, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getLine_StartEnd(), this.getLineEnd(), "startEnd", "CONTINUES", 0, 1, Line.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getLine_FinishEnd(), this.getLineEnd(), "finishEnd", "CONTINUES", 0, 1, Line.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);

		initEClass(structureEClass, Structure.class, "Structure", !IS_ABSTRACT, !IS_INTERFACE, IS_GENERATED_INSTANCE_CLASS);
		initEReference(getStructure_Type(), this.getStructureType(), null, "type", null, 1, 1, Structure.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_COMPOSITE, IS_RESOLVE_PROXIES, !IS_UNSETTABLE, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getStructure_StationMetres(), ecorePackage.getEDouble(), "stationMetres", "0", 0, 1, Structure.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getStructure_OffsetMetres(), ecorePackage.getEDouble(), "offsetMetres", "0", 0, 1, Structure.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getStructure_BaseElevationMetres(), ecorePackage.getEDoubleObject(), "baseElevationMetres", null, 0, 1, Structure.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getStructure_HeightAdjustmentMetres(), ecorePackage.getEDouble(), "heightAdjustmentMetres", "0", 0, 1, Structure.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getStructure_TurnDegrees(), ecorePackage.getEDoubleObject(), "turnDegrees", null, 0, 1, Structure.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);

		initEClass(stringingSectionEClass, StringingSection.class, "StringingSection", !IS_ABSTRACT, !IS_INTERFACE, IS_GENERATED_INSTANCE_CLASS);
		initEReference(getStringingSection_From(), this.getStructure(), null, "from", null, 0, 1, StringingSection.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_COMPOSITE, IS_RESOLVE_PROXIES, !IS_UNSETTABLE, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEReference(getStringingSection_To(), this.getStructure(), null, "to", null, 0, 1, StringingSection.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_COMPOSITE, IS_RESOLVE_PROXIES, !IS_UNSETTABLE, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEReference(getStringingSection_PhaseStringing(), this.getStringing(), null, "phaseStringing", null, 1, 1, StringingSection.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, IS_COMPOSITE, !IS_RESOLVE_PROXIES, !IS_UNSETTABLE, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEReference(getStringingSection_ShieldStringing(), this.getStringing(), null, "shieldStringing", null, 0, 1, StringingSection.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, IS_COMPOSITE, !IS_RESOLVE_PROXIES, !IS_UNSETTABLE, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEReference(getStringingSection_Exceptions(), this.getWireStringing(), null, "exceptions", null, 0, -1, StringingSection.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, IS_COMPOSITE, !IS_RESOLVE_PROXIES, !IS_UNSETTABLE, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);

		initEClass(wireStringingEClass, WireStringing.class, "WireStringing", !IS_ABSTRACT, !IS_INTERFACE, IS_GENERATED_INSTANCE_CLASS);
		initEReference(getWireStringing_Wires(), this.getStrungElement(), null, "wires", null, 1, -1, WireStringing.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_COMPOSITE, IS_RESOLVE_PROXIES, !IS_UNSETTABLE, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEReference(getWireStringing_Stringing(), this.getStringing(), null, "stringing", null, 1, 1, WireStringing.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, IS_COMPOSITE, !IS_RESOLVE_PROXIES, !IS_UNSETTABLE, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);

		initEClass(stringingEClass, Stringing.class, "Stringing", IS_ABSTRACT, !IS_INTERFACE, IS_GENERATED_INSTANCE_CLASS);

		initEClass(catenaryStringingEClass, CatenaryStringing.class, "CatenaryStringing", !IS_ABSTRACT, !IS_INTERFACE, IS_GENERATED_INSTANCE_CLASS);
		initEAttribute(getCatenaryStringing_CatenaryConstantMetres(), ecorePackage.getEDouble(), "catenaryConstantMetres", "0", 0, 1, CatenaryStringing.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);

		initEClass(sagStringingEClass, SagStringing.class, "SagStringing", !IS_ABSTRACT, !IS_INTERFACE, IS_GENERATED_INSTANCE_CLASS);
		initEAttribute(getSagStringing_SagMetres(), ecorePackage.getEDouble(), "sagMetres", "0", 0, 1, SagStringing.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);

		initEClass(tensionStringingEClass, TensionStringing.class, "TensionStringing", !IS_ABSTRACT, !IS_INTERFACE, IS_GENERATED_INSTANCE_CLASS);
		initEAttribute(getTensionStringing_HorizontalTensionNewtons(), ecorePackage.getEDouble(), "horizontalTensionNewtons", "0", 0, 1, TensionStringing.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);

		initEClass(clearanceStringingEClass, ClearanceStringing.class, "ClearanceStringing", !IS_ABSTRACT, !IS_INTERFACE, IS_GENERATED_INSTANCE_CLASS);
		initEAttribute(getClearanceStringing_ClearanceMetres(), ecorePackage.getEDouble(), "clearanceMetres", "0", 0, 1, ClearanceStringing.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);

		initEClass(strungElementEClass, StrungElement.class, "StrungElement", IS_ABSTRACT, !IS_INTERFACE, IS_GENERATED_INSTANCE_CLASS);
		initEReference(getStrungElement_Conductor(), this.getConductor(), null, "conductor", null, 1, 1, StrungElement.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_COMPOSITE, IS_RESOLVE_PROXIES, !IS_UNSETTABLE, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);

		initEClass(circuitEClass, Circuit.class, "Circuit", !IS_ABSTRACT, !IS_INTERFACE, IS_GENERATED_INSTANCE_CLASS);
		initEAttribute(getCircuit_NominalVoltageVolts(), ecorePackage.getEDouble(), "nominalVoltageVolts", "0", 0, 1, Circuit.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getCircuit_BundleCount(), ecorePackage.getEInt(), "bundleCount", "1", 0, 1, Circuit.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getCircuit_BundleSpacingMetres(), ecorePackage.getEDouble(), "bundleSpacingMetres", "0", 0, 1, Circuit.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getCircuit_Phasing(), this.getPhasing(), "phasing", "FIXED", 0, 1, Circuit.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEReference(getCircuit_Phases(), this.getPhase(), null, "phases", null, 1, -1, Circuit.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, IS_COMPOSITE, !IS_RESOLVE_PROXIES, !IS_UNSETTABLE, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);

		initEClass(phaseEClass, Phase.class, "Phase", !IS_ABSTRACT, !IS_INTERFACE, IS_GENERATED_INSTANCE_CLASS);
		initEAttribute(getPhase_Label(), ecorePackage.getEString(), "label", null, 0, 1, Phase.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getPhase_AngleDegrees(), ecorePackage.getEDouble(), "angleDegrees", "0", 0, 1, Phase.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getPhase_Attachment(), ecorePackage.getEString(), "attachment", null, 0, 1, Phase.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);

		initEClass(shieldWireEClass, ShieldWire.class, "ShieldWire", !IS_ABSTRACT, !IS_INTERFACE, IS_GENERATED_INSTANCE_CLASS);
		initEAttribute(getShieldWire_Attachment(), ecorePackage.getEString(), "attachment", null, 0, 1, ShieldWire.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getShieldWire_Bonding(), this.getBonding(), "bonding", "BONDED", 0, 1, ShieldWire.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getShieldWire_GivenCurrentAmperes(), ecorePackage.getEDouble(), "givenCurrentAmperes", "0", 0, 1, ShieldWire.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getShieldWire_GivenAngleDegrees(), ecorePackage.getEDouble(), "givenAngleDegrees", "0", 0, 1, ShieldWire.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);

		initEClass(loadCaseEClass, LoadCase.class, "LoadCase", !IS_ABSTRACT, !IS_INTERFACE, IS_GENERATED_INSTANCE_CLASS);
		initEAttribute(getLoadCase_Basis(), ecorePackage.getEString(), "basis", null, 0, 1, LoadCase.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getLoadCase_WindSwingDegrees(), ecorePackage.getEDouble(), "windSwingDegrees", "0", 0, 1, LoadCase.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEReference(getLoadCase_Loads(), this.getCircuitLoad(), null, "loads", null, 0, -1, LoadCase.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, IS_COMPOSITE, !IS_RESOLVE_PROXIES, !IS_UNSETTABLE, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);

		initEClass(circuitLoadEClass, CircuitLoad.class, "CircuitLoad", IS_ABSTRACT, !IS_INTERFACE, IS_GENERATED_INSTANCE_CLASS);
		initEReference(getCircuitLoad_Circuit(), this.getCircuit(), null, "circuit", null, 1, 1, CircuitLoad.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_COMPOSITE, IS_RESOLVE_PROXIES, !IS_UNSETTABLE, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getCircuitLoad_Direction(), this.getFlowDirection(), "direction", "FORWARD", 0, 1, CircuitLoad.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);

		initEClass(currentLoadEClass, CurrentLoad.class, "CurrentLoad", !IS_ABSTRACT, !IS_INTERFACE, IS_GENERATED_INSTANCE_CLASS);
		initEAttribute(getCurrentLoad_CurrentAmperes(), ecorePackage.getEDouble(), "currentAmperes", "0", 0, 1, CurrentLoad.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getCurrentLoad_AngleDegrees(), ecorePackage.getEDouble(), "angleDegrees", "0", 0, 1, CurrentLoad.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);

		initEClass(powerLoadEClass, PowerLoad.class, "PowerLoad", !IS_ABSTRACT, !IS_INTERFACE, IS_GENERATED_INSTANCE_CLASS);
		initEAttribute(getPowerLoad_ActivePowerWatts(), ecorePackage.getEDouble(), "activePowerWatts", "0", 0, 1, PowerLoad.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getPowerLoad_ReactivePowerVars(), ecorePackage.getEDouble(), "reactivePowerVars", "0", 0, 1, PowerLoad.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getPowerLoad_VoltageVolts(), ecorePackage.getEDoubleObject(), "voltageVolts", null, 0, 1, PowerLoad.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);

		initEClass(sequenceLoadEClass, SequenceLoad.class, "SequenceLoad", !IS_ABSTRACT, !IS_INTERFACE, IS_GENERATED_INSTANCE_CLASS);
		initEAttribute(getSequenceLoad_PositiveAmperes(), ecorePackage.getEDouble(), "positiveAmperes", "0", 0, 1, SequenceLoad.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getSequenceLoad_PositiveAngleDegrees(), ecorePackage.getEDouble(), "positiveAngleDegrees", "0", 0, 1, SequenceLoad.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getSequenceLoad_NegativeAmperes(), ecorePackage.getEDouble(), "negativeAmperes", "0", 0, 1, SequenceLoad.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getSequenceLoad_NegativeAngleDegrees(), ecorePackage.getEDouble(), "negativeAngleDegrees", "0", 0, 1, SequenceLoad.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getSequenceLoad_ZeroAmperes(), ecorePackage.getEDouble(), "zeroAmperes", "0", 0, 1, SequenceLoad.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getSequenceLoad_ZeroAngleDegrees(), ecorePackage.getEDouble(), "zeroAngleDegrees", "0", 0, 1, SequenceLoad.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);

		initEClass(phasorLoadEClass, PhasorLoad.class, "PhasorLoad", !IS_ABSTRACT, !IS_INTERFACE, IS_GENERATED_INSTANCE_CLASS);
		initEReference(getPhasorLoad_Phasors(), this.getPhasePhasor(), null, "phasors", null, 1, -1, PhasorLoad.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, IS_COMPOSITE, !IS_RESOLVE_PROXIES, !IS_UNSETTABLE, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);

		initEClass(phasePhasorEClass, PhasePhasor.class, "PhasePhasor", !IS_ABSTRACT, !IS_INTERFACE, IS_GENERATED_INSTANCE_CLASS);
		initEAttribute(getPhasePhasor_Phase(), ecorePackage.getEString(), "phase", null, 0, 1, PhasePhasor.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getPhasePhasor_CurrentAmperes(), ecorePackage.getEDouble(), "currentAmperes", "0", 0, 1, PhasePhasor.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getPhasePhasor_AngleDegrees(), ecorePackage.getEDouble(), "angleDegrees", "0", 0, 1, PhasePhasor.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);

		initEClass(profileStationEClass, ProfileStation.class, "ProfileStation", !IS_ABSTRACT, !IS_INTERFACE, IS_GENERATED_INSTANCE_CLASS);
		initEAttribute(getProfileStation_StationMetres(), ecorePackage.getEDouble(), "stationMetres", "0", 0, 1, ProfileStation.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getProfileStation_FromOffsetMetres(), ecorePackage.getEDouble(), "fromOffsetMetres", "-100", 0, 1, ProfileStation.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getProfileStation_ToOffsetMetres(), ecorePackage.getEDouble(), "toOffsetMetres", "100", 0, 1, ProfileStation.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getProfileStation_SpacingMetres(), ecorePackage.getEDouble(), "spacingMetres", "1", 0, 1, ProfileStation.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);

		initEClass(fieldLimitEClass, FieldLimit.class, "FieldLimit", !IS_ABSTRACT, !IS_INTERFACE, IS_GENERATED_INSTANCE_CLASS);
		initEAttribute(getFieldLimit_Quantity(), this.getFieldQuantity(), "quantity", "MAGNETIC", 0, 1, FieldLimit.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getFieldLimit_Measure(), this.getFieldMeasure(), "measure", "RESULTANT", 0, 1, FieldLimit.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getFieldLimit_Level(), ecorePackage.getEDouble(), "level", "0", 0, 1, FieldLimit.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getFieldLimit_Place(), this.getLimitPlace(), "place", "EDGE", 0, 1, FieldLimit.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getFieldLimit_Body(), ecorePackage.getEString(), "body", null, 0, 1, FieldLimit.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getFieldLimit_Edition(), ecorePackage.getEString(), "edition", null, 0, 1, FieldLimit.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getFieldLimit_LoadCondition(), ecorePackage.getEString(), "loadCondition", null, 0, 1, FieldLimit.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getFieldLimit_Basis(), this.getLimitBasis(), "basis", "USER", 0, 1, FieldLimit.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);

		initEClass(surveyEClass, Survey.class, "Survey", !IS_ABSTRACT, !IS_INTERFACE, IS_GENERATED_INSTANCE_CLASS);
		initEAttribute(getSurvey_Date(), ecorePackage.getEString(), "date", null, 0, 1, Survey.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getSurvey_Instrument(), ecorePackage.getEString(), "instrument", null, 0, 1, Survey.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getSurvey_RelativeUncertainty(), ecorePackage.getEDouble(), "relativeUncertainty", "0.05", 0, 1, Survey.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEReference(getSurvey_Readings(), this.getSurveyReading(), null, "readings", null, 0, -1, Survey.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, IS_COMPOSITE, !IS_RESOLVE_PROXIES, !IS_UNSETTABLE, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);

		initEClass(surveyReadingEClass, SurveyReading.class, "SurveyReading", !IS_ABSTRACT, !IS_INTERFACE, IS_GENERATED_INSTANCE_CLASS);
		initEAttribute(getSurveyReading_StationMetres(), ecorePackage.getEDouble(), "stationMetres", "0", 0, 1, SurveyReading.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getSurveyReading_OffsetMetres(), ecorePackage.getEDouble(), "offsetMetres", "0", 0, 1, SurveyReading.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getSurveyReading_HeightMetres(), ecorePackage.getEDouble(), "heightMetres", "1", 0, 1, SurveyReading.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);
		initEAttribute(getSurveyReading_ResultantTesla(), ecorePackage.getEDouble(), "resultantTesla", "0", 0, 1, SurveyReading.class, !IS_TRANSIENT, !IS_VOLATILE, IS_CHANGEABLE, !IS_UNSETTABLE, !IS_ID, IS_UNIQUE, !IS_DERIVED, IS_ORDERED);

		// Initialize enums and add enum literals
		initEEnum(earthModelEEnum, EarthModel.class, "EarthModel");
		addEEnumLiteral(earthModelEEnum, EarthModel.NONE);
		addEEnumLiteral(earthModelEEnum, EarthModel.COMPLEX_IMAGES);
		addEEnumLiteral(earthModelEEnum, EarthModel.EXACT_HALF_SPACE);

		initEEnum(impedanceFormulaEEnum, ImpedanceFormula.class, "ImpedanceFormula");
		addEEnumLiteral(impedanceFormulaEEnum, ImpedanceFormula.COMPLEX_DEPTH);
		addEEnumLiteral(impedanceFormulaEEnum, ImpedanceFormula.CARSON);

		initEEnum(attachmentRoleEEnum, AttachmentRole.class, "AttachmentRole");
		addEEnumLiteral(attachmentRoleEEnum, AttachmentRole.PHASE);
		addEEnumLiteral(attachmentRoleEEnum, AttachmentRole.SHIELD);

		initEEnum(lineEndEEnum, LineEnd.class, "LineEnd");
		addEEnumLiteral(lineEndEEnum, LineEnd.CONTINUES);
		addEEnumLiteral(lineEndEEnum, LineEnd.DEAD_END);

		initEEnum(bondingEEnum, Bonding.class, "Bonding");
		addEEnumLiteral(bondingEEnum, Bonding.BONDED);
		addEEnumLiteral(bondingEEnum, Bonding.INSULATED);
		addEEnumLiteral(bondingEEnum, Bonding.GIVEN_CURRENT);

		initEEnum(phasingEEnum, Phasing.class, "Phasing");
		addEEnumLiteral(phasingEEnum, Phasing.FIXED);
		addEEnumLiteral(phasingEEnum, Phasing.FREE);

		initEEnum(flowDirectionEEnum, FlowDirection.class, "FlowDirection");
		addEEnumLiteral(flowDirectionEEnum, FlowDirection.FORWARD);
		addEEnumLiteral(flowDirectionEEnum, FlowDirection.REVERSED);

		initEEnum(fieldQuantityEEnum, FieldQuantity.class, "FieldQuantity");
		addEEnumLiteral(fieldQuantityEEnum, FieldQuantity.MAGNETIC);
		addEEnumLiteral(fieldQuantityEEnum, FieldQuantity.ELECTRIC);

		initEEnum(fieldMeasureEEnum, FieldMeasure.class, "FieldMeasure");
		addEEnumLiteral(fieldMeasureEEnum, FieldMeasure.RESULTANT);
		addEEnumLiteral(fieldMeasureEEnum, FieldMeasure.MAJOR_AXIS);

		initEEnum(limitPlaceEEnum, LimitPlace.class, "LimitPlace");
		addEEnumLiteral(limitPlaceEEnum, LimitPlace.EDGE);
		addEEnumLiteral(limitPlaceEEnum, LimitPlace.WITHIN);
		addEEnumLiteral(limitPlaceEEnum, LimitPlace.EVERYWHERE);

		initEEnum(limitBasisEEnum, LimitBasis.class, "LimitBasis");
		addEEnumLiteral(limitBasisEEnum, LimitBasis.CONFIRMED);
		addEEnumLiteral(limitBasisEEnum, LimitBasis.FROM_MEMORY);
		addEEnumLiteral(limitBasisEEnum, LimitBasis.USER);

		// Create resource
		createResource(eNS_URI);
	}

} //SpanfieldPackageImpl
