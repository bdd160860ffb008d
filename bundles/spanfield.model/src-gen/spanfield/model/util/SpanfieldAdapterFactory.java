/**
 * Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0
 */
package spanfield.model.util;

import org.eclipse.emf.common.notify.Adapter;
import org.eclipse.emf.common.notify.Notifier;

import org.eclipse.emf.common.notify.impl.AdapterFactoryImpl;

import org.eclipse.emf.ecore.EObject;

import spanfield.model.*;

/**
 * <!-- begin-user-doc -->
 * The <b>Adapter Factory</b> for the model.
 * It provides an adapter <code>createXXX</code> method for each class of the model.
 * <!-- end-user-doc -->
 * @see spanfield.model.SpanfieldPackage
 * @generated
 */
public class SpanfieldAdapterFactory extends AdapterFactoryImpl {
	/**
	 * The cached model package.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected static SpanfieldPackage modelPackage;

	/**
	 * Creates an instance of the adapter factory.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public SpanfieldAdapterFactory() {
		if (modelPackage == null) {
			modelPackage = SpanfieldPackage.eINSTANCE;
		}
	}

	/**
	 * Returns whether this factory is applicable for the type of the object.
	 * <!-- begin-user-doc -->
	 * This implementation returns <code>true</code> if the object is either the model's package or is an instance object of the model.
	 * <!-- end-user-doc -->
	 * @return whether this factory is applicable for the type of the object.
	 * @generated
	 */
	@Override
	public boolean isFactoryForType(Object object) {
		if (object == modelPackage) {
			return true;
		}
		if (object instanceof EObject) {
			return ((EObject)object).eClass().getEPackage() == modelPackage;
		}
		return false;
	}

	/**
	 * The switch that delegates to the <code>createXXX</code> methods.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected SpanfieldSwitch<Adapter> modelSwitch =
		new SpanfieldSwitch<Adapter>() {
			@Override
			public Adapter caseNamedElement(NamedElement object) {
				return createNamedElementAdapter();
			}
			@Override
			public Adapter caseStudy(Study object) {
				return createStudyAdapter();
			}
			@Override
			public Adapter caseCorridor(Corridor object) {
				return createCorridorAdapter();
			}
			@Override
			public Adapter caseEdgePoint(EdgePoint object) {
				return createEdgePointAdapter();
			}
			@Override
			public Adapter caseGroundPoint(GroundPoint object) {
				return createGroundPointAdapter();
			}
			@Override
			public Adapter caseElevationPoint(ElevationPoint object) {
				return createElevationPointAdapter();
			}
			@Override
			public Adapter caseAlignmentBend(AlignmentBend object) {
				return createAlignmentBendAdapter();
			}
			@Override
			public Adapter caseConductor(Conductor object) {
				return createConductorAdapter();
			}
			@Override
			public Adapter caseStructureType(StructureType object) {
				return createStructureTypeAdapter();
			}
			@Override
			public Adapter caseAttachment(Attachment object) {
				return createAttachmentAdapter();
			}
			@Override
			public Adapter caseOutlineStroke(OutlineStroke object) {
				return createOutlineStrokeAdapter();
			}
			@Override
			public Adapter caseOutlinePoint(OutlinePoint object) {
				return createOutlinePointAdapter();
			}
			@Override
			public Adapter caseLine(Line object) {
				return createLineAdapter();
			}
			@Override
			public Adapter caseStructure(Structure object) {
				return createStructureAdapter();
			}
			@Override
			public Adapter caseStringingSection(StringingSection object) {
				return createStringingSectionAdapter();
			}
			@Override
			public Adapter caseWireStringing(WireStringing object) {
				return createWireStringingAdapter();
			}
			@Override
			public Adapter caseStringing(Stringing object) {
				return createStringingAdapter();
			}
			@Override
			public Adapter caseCatenaryStringing(CatenaryStringing object) {
				return createCatenaryStringingAdapter();
			}
			@Override
			public Adapter caseSagStringing(SagStringing object) {
				return createSagStringingAdapter();
			}
			@Override
			public Adapter caseTensionStringing(TensionStringing object) {
				return createTensionStringingAdapter();
			}
			@Override
			public Adapter caseClearanceStringing(ClearanceStringing object) {
				return createClearanceStringingAdapter();
			}
			@Override
			public Adapter caseStrungElement(StrungElement object) {
				return createStrungElementAdapter();
			}
			@Override
			public Adapter caseCircuit(Circuit object) {
				return createCircuitAdapter();
			}
			@Override
			public Adapter casePhase(Phase object) {
				return createPhaseAdapter();
			}
			@Override
			public Adapter caseShieldWire(ShieldWire object) {
				return createShieldWireAdapter();
			}
			@Override
			public Adapter caseLoadCase(LoadCase object) {
				return createLoadCaseAdapter();
			}
			@Override
			public Adapter caseCircuitLoad(CircuitLoad object) {
				return createCircuitLoadAdapter();
			}
			@Override
			public Adapter caseCurrentLoad(CurrentLoad object) {
				return createCurrentLoadAdapter();
			}
			@Override
			public Adapter casePowerLoad(PowerLoad object) {
				return createPowerLoadAdapter();
			}
			@Override
			public Adapter caseSequenceLoad(SequenceLoad object) {
				return createSequenceLoadAdapter();
			}
			@Override
			public Adapter casePhasorLoad(PhasorLoad object) {
				return createPhasorLoadAdapter();
			}
			@Override
			public Adapter casePhasePhasor(PhasePhasor object) {
				return createPhasePhasorAdapter();
			}
			@Override
			public Adapter caseProfileStation(ProfileStation object) {
				return createProfileStationAdapter();
			}
			@Override
			public Adapter caseFieldLimit(FieldLimit object) {
				return createFieldLimitAdapter();
			}
			@Override
			public Adapter caseSurvey(Survey object) {
				return createSurveyAdapter();
			}
			@Override
			public Adapter caseSurveyReading(SurveyReading object) {
				return createSurveyReadingAdapter();
			}
			@Override
			public Adapter defaultCase(EObject object) {
				return createEObjectAdapter();
			}
		};

	/**
	 * Creates an adapter for the <code>target</code>.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param target the object to adapt.
	 * @return the adapter for the <code>target</code>.
	 * @generated
	 */
	@Override
	public Adapter createAdapter(Notifier target) {
		return modelSwitch.doSwitch((EObject)target);
	}


	/**
	 * Creates a new adapter for an object of class '{@link spanfield.model.NamedElement <em>Named Element</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see spanfield.model.NamedElement
	 * @generated
	 */
	public Adapter createNamedElementAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link spanfield.model.Study <em>Study</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see spanfield.model.Study
	 * @generated
	 */
	public Adapter createStudyAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link spanfield.model.Corridor <em>Corridor</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see spanfield.model.Corridor
	 * @generated
	 */
	public Adapter createCorridorAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link spanfield.model.EdgePoint <em>Edge Point</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see spanfield.model.EdgePoint
	 * @generated
	 */
	public Adapter createEdgePointAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link spanfield.model.GroundPoint <em>Ground Point</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see spanfield.model.GroundPoint
	 * @generated
	 */
	public Adapter createGroundPointAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link spanfield.model.ElevationPoint <em>Elevation Point</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see spanfield.model.ElevationPoint
	 * @generated
	 */
	public Adapter createElevationPointAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link spanfield.model.AlignmentBend <em>Alignment Bend</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see spanfield.model.AlignmentBend
	 * @generated
	 */
	public Adapter createAlignmentBendAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link spanfield.model.Conductor <em>Conductor</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see spanfield.model.Conductor
	 * @generated
	 */
	public Adapter createConductorAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link spanfield.model.StructureType <em>Structure Type</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see spanfield.model.StructureType
	 * @generated
	 */
	public Adapter createStructureTypeAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link spanfield.model.Attachment <em>Attachment</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see spanfield.model.Attachment
	 * @generated
	 */
	public Adapter createAttachmentAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link spanfield.model.OutlineStroke <em>Outline Stroke</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see spanfield.model.OutlineStroke
	 * @generated
	 */
	public Adapter createOutlineStrokeAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link spanfield.model.OutlinePoint <em>Outline Point</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see spanfield.model.OutlinePoint
	 * @generated
	 */
	public Adapter createOutlinePointAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link spanfield.model.Line <em>Line</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see spanfield.model.Line
	 * @generated
	 */
	public Adapter createLineAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link spanfield.model.Structure <em>Structure</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see spanfield.model.Structure
	 * @generated
	 */
	public Adapter createStructureAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link spanfield.model.StringingSection <em>Stringing Section</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see spanfield.model.StringingSection
	 * @generated
	 */
	public Adapter createStringingSectionAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link spanfield.model.WireStringing <em>Wire Stringing</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see spanfield.model.WireStringing
	 * @generated
	 */
	public Adapter createWireStringingAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link spanfield.model.Stringing <em>Stringing</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see spanfield.model.Stringing
	 * @generated
	 */
	public Adapter createStringingAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link spanfield.model.CatenaryStringing <em>Catenary Stringing</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see spanfield.model.CatenaryStringing
	 * @generated
	 */
	public Adapter createCatenaryStringingAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link spanfield.model.SagStringing <em>Sag Stringing</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see spanfield.model.SagStringing
	 * @generated
	 */
	public Adapter createSagStringingAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link spanfield.model.TensionStringing <em>Tension Stringing</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see spanfield.model.TensionStringing
	 * @generated
	 */
	public Adapter createTensionStringingAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link spanfield.model.ClearanceStringing <em>Clearance Stringing</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see spanfield.model.ClearanceStringing
	 * @generated
	 */
	public Adapter createClearanceStringingAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link spanfield.model.StrungElement <em>Strung Element</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see spanfield.model.StrungElement
	 * @generated
	 */
	public Adapter createStrungElementAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link spanfield.model.Circuit <em>Circuit</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see spanfield.model.Circuit
	 * @generated
	 */
	public Adapter createCircuitAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link spanfield.model.Phase <em>Phase</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see spanfield.model.Phase
	 * @generated
	 */
	public Adapter createPhaseAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link spanfield.model.ShieldWire <em>Shield Wire</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see spanfield.model.ShieldWire
	 * @generated
	 */
	public Adapter createShieldWireAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link spanfield.model.LoadCase <em>Load Case</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see spanfield.model.LoadCase
	 * @generated
	 */
	public Adapter createLoadCaseAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link spanfield.model.CircuitLoad <em>Circuit Load</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see spanfield.model.CircuitLoad
	 * @generated
	 */
	public Adapter createCircuitLoadAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link spanfield.model.CurrentLoad <em>Current Load</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see spanfield.model.CurrentLoad
	 * @generated
	 */
	public Adapter createCurrentLoadAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link spanfield.model.PowerLoad <em>Power Load</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see spanfield.model.PowerLoad
	 * @generated
	 */
	public Adapter createPowerLoadAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link spanfield.model.SequenceLoad <em>Sequence Load</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see spanfield.model.SequenceLoad
	 * @generated
	 */
	public Adapter createSequenceLoadAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link spanfield.model.PhasorLoad <em>Phasor Load</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see spanfield.model.PhasorLoad
	 * @generated
	 */
	public Adapter createPhasorLoadAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link spanfield.model.PhasePhasor <em>Phase Phasor</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see spanfield.model.PhasePhasor
	 * @generated
	 */
	public Adapter createPhasePhasorAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link spanfield.model.ProfileStation <em>Profile Station</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see spanfield.model.ProfileStation
	 * @generated
	 */
	public Adapter createProfileStationAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link spanfield.model.FieldLimit <em>Field Limit</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see spanfield.model.FieldLimit
	 * @generated
	 */
	public Adapter createFieldLimitAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link spanfield.model.Survey <em>Survey</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see spanfield.model.Survey
	 * @generated
	 */
	public Adapter createSurveyAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for an object of class '{@link spanfield.model.SurveyReading <em>Survey Reading</em>}'.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null so that we can easily ignore cases;
	 * it's useful to ignore a case when inheritance will catch all the cases anyway.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @see spanfield.model.SurveyReading
	 * @generated
	 */
	public Adapter createSurveyReadingAdapter() {
		return null;
	}

	/**
	 * Creates a new adapter for the default case.
	 * <!-- begin-user-doc -->
	 * This default implementation returns null.
	 * <!-- end-user-doc -->
	 * @return the new adapter.
	 * @generated
	 */
	public Adapter createEObjectAdapter() {
		return null;
	}

} //SpanfieldAdapterFactory
