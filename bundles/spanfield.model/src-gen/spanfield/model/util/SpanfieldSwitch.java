/**
 * Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0
 */
package spanfield.model.util;

import org.eclipse.emf.ecore.EObject;
import org.eclipse.emf.ecore.EPackage;

import org.eclipse.emf.ecore.util.Switch;

import spanfield.model.*;

/**
 * <!-- begin-user-doc -->
 * The <b>Switch</b> for the model's inheritance hierarchy.
 * It supports the call {@link #doSwitch(EObject) doSwitch(object)}
 * to invoke the <code>caseXXX</code> method for each class of the model,
 * starting with the actual class of the object
 * and proceeding up the inheritance hierarchy
 * until a non-null result is returned,
 * which is the result of the switch.
 * <!-- end-user-doc -->
 * @see spanfield.model.SpanfieldPackage
 * @generated
 */
public class SpanfieldSwitch<T> extends Switch<T> {
	/**
	 * The cached model package
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected static SpanfieldPackage modelPackage;

	/**
	 * Creates an instance of the switch.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public SpanfieldSwitch() {
		if (modelPackage == null) {
			modelPackage = SpanfieldPackage.eINSTANCE;
		}
	}

	/**
	 * Checks whether this is a switch for the given package.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param ePackage the package in question.
	 * @return whether this is a switch for the given package.
	 * @generated
	 */
	@Override
	protected boolean isSwitchFor(EPackage ePackage) {
		return ePackage == modelPackage;
	}

	/**
	 * Calls <code>caseXXX</code> for each class of the model until one returns a non null result; it yields that result.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the first non-null result returned by a <code>caseXXX</code> call.
	 * @generated
	 */
	@Override
	protected T doSwitch(int classifierID, EObject theEObject) {
		switch (classifierID) {
			case SpanfieldPackage.NAMED_ELEMENT: {
				NamedElement namedElement = (NamedElement)theEObject;
				T result = caseNamedElement(namedElement);
				if (result == null) result = defaultCase(theEObject);
				return result;
			}
			case SpanfieldPackage.STUDY: {
				Study study = (Study)theEObject;
				T result = caseStudy(study);
				if (result == null) result = caseNamedElement(study);
				if (result == null) result = defaultCase(theEObject);
				return result;
			}
			case SpanfieldPackage.CORRIDOR: {
				Corridor corridor = (Corridor)theEObject;
				T result = caseCorridor(corridor);
				if (result == null) result = defaultCase(theEObject);
				return result;
			}
			case SpanfieldPackage.EDGE_POINT: {
				EdgePoint edgePoint = (EdgePoint)theEObject;
				T result = caseEdgePoint(edgePoint);
				if (result == null) result = defaultCase(theEObject);
				return result;
			}
			case SpanfieldPackage.GROUND_POINT: {
				GroundPoint groundPoint = (GroundPoint)theEObject;
				T result = caseGroundPoint(groundPoint);
				if (result == null) result = defaultCase(theEObject);
				return result;
			}
			case SpanfieldPackage.ELEVATION_POINT: {
				ElevationPoint elevationPoint = (ElevationPoint)theEObject;
				T result = caseElevationPoint(elevationPoint);
				if (result == null) result = defaultCase(theEObject);
				return result;
			}
			case SpanfieldPackage.ALIGNMENT_BEND: {
				AlignmentBend alignmentBend = (AlignmentBend)theEObject;
				T result = caseAlignmentBend(alignmentBend);
				if (result == null) result = defaultCase(theEObject);
				return result;
			}
			case SpanfieldPackage.CONDUCTOR: {
				Conductor conductor = (Conductor)theEObject;
				T result = caseConductor(conductor);
				if (result == null) result = caseNamedElement(conductor);
				if (result == null) result = defaultCase(theEObject);
				return result;
			}
			case SpanfieldPackage.STRUCTURE_TYPE: {
				StructureType structureType = (StructureType)theEObject;
				T result = caseStructureType(structureType);
				if (result == null) result = caseNamedElement(structureType);
				if (result == null) result = defaultCase(theEObject);
				return result;
			}
			case SpanfieldPackage.ATTACHMENT: {
				Attachment attachment = (Attachment)theEObject;
				T result = caseAttachment(attachment);
				if (result == null) result = defaultCase(theEObject);
				return result;
			}
			case SpanfieldPackage.OUTLINE_STROKE: {
				OutlineStroke outlineStroke = (OutlineStroke)theEObject;
				T result = caseOutlineStroke(outlineStroke);
				if (result == null) result = defaultCase(theEObject);
				return result;
			}
			case SpanfieldPackage.OUTLINE_POINT: {
				OutlinePoint outlinePoint = (OutlinePoint)theEObject;
				T result = caseOutlinePoint(outlinePoint);
				if (result == null) result = defaultCase(theEObject);
				return result;
			}
			case SpanfieldPackage.LINE: {
				Line line = (Line)theEObject;
				T result = caseLine(line);
				if (result == null) result = caseNamedElement(line);
				if (result == null) result = defaultCase(theEObject);
				return result;
			}
			case SpanfieldPackage.STRUCTURE: {
				Structure structure = (Structure)theEObject;
				T result = caseStructure(structure);
				if (result == null) result = caseNamedElement(structure);
				if (result == null) result = defaultCase(theEObject);
				return result;
			}
			case SpanfieldPackage.STRINGING_SECTION: {
				StringingSection stringingSection = (StringingSection)theEObject;
				T result = caseStringingSection(stringingSection);
				if (result == null) result = defaultCase(theEObject);
				return result;
			}
			case SpanfieldPackage.WIRE_STRINGING: {
				WireStringing wireStringing = (WireStringing)theEObject;
				T result = caseWireStringing(wireStringing);
				if (result == null) result = defaultCase(theEObject);
				return result;
			}
			case SpanfieldPackage.STRINGING: {
				Stringing stringing = (Stringing)theEObject;
				T result = caseStringing(stringing);
				if (result == null) result = defaultCase(theEObject);
				return result;
			}
			case SpanfieldPackage.CATENARY_STRINGING: {
				CatenaryStringing catenaryStringing = (CatenaryStringing)theEObject;
				T result = caseCatenaryStringing(catenaryStringing);
				if (result == null) result = caseStringing(catenaryStringing);
				if (result == null) result = defaultCase(theEObject);
				return result;
			}
			case SpanfieldPackage.SAG_STRINGING: {
				SagStringing sagStringing = (SagStringing)theEObject;
				T result = caseSagStringing(sagStringing);
				if (result == null) result = caseStringing(sagStringing);
				if (result == null) result = defaultCase(theEObject);
				return result;
			}
			case SpanfieldPackage.TENSION_STRINGING: {
				TensionStringing tensionStringing = (TensionStringing)theEObject;
				T result = caseTensionStringing(tensionStringing);
				if (result == null) result = caseStringing(tensionStringing);
				if (result == null) result = defaultCase(theEObject);
				return result;
			}
			case SpanfieldPackage.CLEARANCE_STRINGING: {
				ClearanceStringing clearanceStringing = (ClearanceStringing)theEObject;
				T result = caseClearanceStringing(clearanceStringing);
				if (result == null) result = caseStringing(clearanceStringing);
				if (result == null) result = defaultCase(theEObject);
				return result;
			}
			case SpanfieldPackage.STRUNG_ELEMENT: {
				StrungElement strungElement = (StrungElement)theEObject;
				T result = caseStrungElement(strungElement);
				if (result == null) result = caseNamedElement(strungElement);
				if (result == null) result = defaultCase(theEObject);
				return result;
			}
			case SpanfieldPackage.CIRCUIT: {
				Circuit circuit = (Circuit)theEObject;
				T result = caseCircuit(circuit);
				if (result == null) result = caseStrungElement(circuit);
				if (result == null) result = caseNamedElement(circuit);
				if (result == null) result = defaultCase(theEObject);
				return result;
			}
			case SpanfieldPackage.PHASE: {
				Phase phase = (Phase)theEObject;
				T result = casePhase(phase);
				if (result == null) result = defaultCase(theEObject);
				return result;
			}
			case SpanfieldPackage.SHIELD_WIRE: {
				ShieldWire shieldWire = (ShieldWire)theEObject;
				T result = caseShieldWire(shieldWire);
				if (result == null) result = caseStrungElement(shieldWire);
				if (result == null) result = caseNamedElement(shieldWire);
				if (result == null) result = defaultCase(theEObject);
				return result;
			}
			case SpanfieldPackage.LOAD_CASE: {
				LoadCase loadCase = (LoadCase)theEObject;
				T result = caseLoadCase(loadCase);
				if (result == null) result = caseNamedElement(loadCase);
				if (result == null) result = defaultCase(theEObject);
				return result;
			}
			case SpanfieldPackage.CIRCUIT_LOAD: {
				CircuitLoad circuitLoad = (CircuitLoad)theEObject;
				T result = caseCircuitLoad(circuitLoad);
				if (result == null) result = defaultCase(theEObject);
				return result;
			}
			case SpanfieldPackage.CURRENT_LOAD: {
				CurrentLoad currentLoad = (CurrentLoad)theEObject;
				T result = caseCurrentLoad(currentLoad);
				if (result == null) result = caseCircuitLoad(currentLoad);
				if (result == null) result = defaultCase(theEObject);
				return result;
			}
			case SpanfieldPackage.POWER_LOAD: {
				PowerLoad powerLoad = (PowerLoad)theEObject;
				T result = casePowerLoad(powerLoad);
				if (result == null) result = caseCircuitLoad(powerLoad);
				if (result == null) result = defaultCase(theEObject);
				return result;
			}
			case SpanfieldPackage.SEQUENCE_LOAD: {
				SequenceLoad sequenceLoad = (SequenceLoad)theEObject;
				T result = caseSequenceLoad(sequenceLoad);
				if (result == null) result = caseCircuitLoad(sequenceLoad);
				if (result == null) result = defaultCase(theEObject);
				return result;
			}
			case SpanfieldPackage.PHASOR_LOAD: {
				PhasorLoad phasorLoad = (PhasorLoad)theEObject;
				T result = casePhasorLoad(phasorLoad);
				if (result == null) result = caseCircuitLoad(phasorLoad);
				if (result == null) result = defaultCase(theEObject);
				return result;
			}
			case SpanfieldPackage.PHASE_PHASOR: {
				PhasePhasor phasePhasor = (PhasePhasor)theEObject;
				T result = casePhasePhasor(phasePhasor);
				if (result == null) result = defaultCase(theEObject);
				return result;
			}
			case SpanfieldPackage.PROFILE_STATION: {
				ProfileStation profileStation = (ProfileStation)theEObject;
				T result = caseProfileStation(profileStation);
				if (result == null) result = caseNamedElement(profileStation);
				if (result == null) result = defaultCase(theEObject);
				return result;
			}
			case SpanfieldPackage.FIELD_LIMIT: {
				FieldLimit fieldLimit = (FieldLimit)theEObject;
				T result = caseFieldLimit(fieldLimit);
				if (result == null) result = caseNamedElement(fieldLimit);
				if (result == null) result = defaultCase(theEObject);
				return result;
			}
			case SpanfieldPackage.SURVEY: {
				Survey survey = (Survey)theEObject;
				T result = caseSurvey(survey);
				if (result == null) result = caseNamedElement(survey);
				if (result == null) result = defaultCase(theEObject);
				return result;
			}
			case SpanfieldPackage.SURVEY_READING: {
				SurveyReading surveyReading = (SurveyReading)theEObject;
				T result = caseSurveyReading(surveyReading);
				if (result == null) result = defaultCase(theEObject);
				return result;
			}
			default: return defaultCase(theEObject);
		}
	}

	/**
	 * Returns the result of interpreting the object as an instance of '<em>Named Element</em>'.
	 * <!-- begin-user-doc -->
	 * This implementation returns null;
	 * returning a non-null result will terminate the switch.
	 * <!-- end-user-doc -->
	 * @param object the target of the switch.
	 * @return the result of interpreting the object as an instance of '<em>Named Element</em>'.
	 * @see #doSwitch(org.eclipse.emf.ecore.EObject) doSwitch(EObject)
	 * @generated
	 */
	public T caseNamedElement(NamedElement object) {
		return null;
	}

	/**
	 * Returns the result of interpreting the object as an instance of '<em>Study</em>'.
	 * <!-- begin-user-doc -->
	 * This implementation returns null;
	 * returning a non-null result will terminate the switch.
	 * <!-- end-user-doc -->
	 * @param object the target of the switch.
	 * @return the result of interpreting the object as an instance of '<em>Study</em>'.
	 * @see #doSwitch(org.eclipse.emf.ecore.EObject) doSwitch(EObject)
	 * @generated
	 */
	public T caseStudy(Study object) {
		return null;
	}

	/**
	 * Returns the result of interpreting the object as an instance of '<em>Corridor</em>'.
	 * <!-- begin-user-doc -->
	 * This implementation returns null;
	 * returning a non-null result will terminate the switch.
	 * <!-- end-user-doc -->
	 * @param object the target of the switch.
	 * @return the result of interpreting the object as an instance of '<em>Corridor</em>'.
	 * @see #doSwitch(org.eclipse.emf.ecore.EObject) doSwitch(EObject)
	 * @generated
	 */
	public T caseCorridor(Corridor object) {
		return null;
	}

	/**
	 * Returns the result of interpreting the object as an instance of '<em>Edge Point</em>'.
	 * <!-- begin-user-doc -->
	 * This implementation returns null;
	 * returning a non-null result will terminate the switch.
	 * <!-- end-user-doc -->
	 * @param object the target of the switch.
	 * @return the result of interpreting the object as an instance of '<em>Edge Point</em>'.
	 * @see #doSwitch(org.eclipse.emf.ecore.EObject) doSwitch(EObject)
	 * @generated
	 */
	public T caseEdgePoint(EdgePoint object) {
		return null;
	}

	/**
	 * Returns the result of interpreting the object as an instance of '<em>Ground Point</em>'.
	 * <!-- begin-user-doc -->
	 * This implementation returns null;
	 * returning a non-null result will terminate the switch.
	 * <!-- end-user-doc -->
	 * @param object the target of the switch.
	 * @return the result of interpreting the object as an instance of '<em>Ground Point</em>'.
	 * @see #doSwitch(org.eclipse.emf.ecore.EObject) doSwitch(EObject)
	 * @generated
	 */
	public T caseGroundPoint(GroundPoint object) {
		return null;
	}

	/**
	 * Returns the result of interpreting the object as an instance of '<em>Elevation Point</em>'.
	 * <!-- begin-user-doc -->
	 * This implementation returns null;
	 * returning a non-null result will terminate the switch.
	 * <!-- end-user-doc -->
	 * @param object the target of the switch.
	 * @return the result of interpreting the object as an instance of '<em>Elevation Point</em>'.
	 * @see #doSwitch(org.eclipse.emf.ecore.EObject) doSwitch(EObject)
	 * @generated
	 */
	public T caseElevationPoint(ElevationPoint object) {
		return null;
	}

	/**
	 * Returns the result of interpreting the object as an instance of '<em>Alignment Bend</em>'.
	 * <!-- begin-user-doc -->
	 * This implementation returns null;
	 * returning a non-null result will terminate the switch.
	 * <!-- end-user-doc -->
	 * @param object the target of the switch.
	 * @return the result of interpreting the object as an instance of '<em>Alignment Bend</em>'.
	 * @see #doSwitch(org.eclipse.emf.ecore.EObject) doSwitch(EObject)
	 * @generated
	 */
	public T caseAlignmentBend(AlignmentBend object) {
		return null;
	}

	/**
	 * Returns the result of interpreting the object as an instance of '<em>Conductor</em>'.
	 * <!-- begin-user-doc -->
	 * This implementation returns null;
	 * returning a non-null result will terminate the switch.
	 * <!-- end-user-doc -->
	 * @param object the target of the switch.
	 * @return the result of interpreting the object as an instance of '<em>Conductor</em>'.
	 * @see #doSwitch(org.eclipse.emf.ecore.EObject) doSwitch(EObject)
	 * @generated
	 */
	public T caseConductor(Conductor object) {
		return null;
	}

	/**
	 * Returns the result of interpreting the object as an instance of '<em>Structure Type</em>'.
	 * <!-- begin-user-doc -->
	 * This implementation returns null;
	 * returning a non-null result will terminate the switch.
	 * <!-- end-user-doc -->
	 * @param object the target of the switch.
	 * @return the result of interpreting the object as an instance of '<em>Structure Type</em>'.
	 * @see #doSwitch(org.eclipse.emf.ecore.EObject) doSwitch(EObject)
	 * @generated
	 */
	public T caseStructureType(StructureType object) {
		return null;
	}

	/**
	 * Returns the result of interpreting the object as an instance of '<em>Attachment</em>'.
	 * <!-- begin-user-doc -->
	 * This implementation returns null;
	 * returning a non-null result will terminate the switch.
	 * <!-- end-user-doc -->
	 * @param object the target of the switch.
	 * @return the result of interpreting the object as an instance of '<em>Attachment</em>'.
	 * @see #doSwitch(org.eclipse.emf.ecore.EObject) doSwitch(EObject)
	 * @generated
	 */
	public T caseAttachment(Attachment object) {
		return null;
	}

	/**
	 * Returns the result of interpreting the object as an instance of '<em>Outline Stroke</em>'.
	 * <!-- begin-user-doc -->
	 * This implementation returns null;
	 * returning a non-null result will terminate the switch.
	 * <!-- end-user-doc -->
	 * @param object the target of the switch.
	 * @return the result of interpreting the object as an instance of '<em>Outline Stroke</em>'.
	 * @see #doSwitch(org.eclipse.emf.ecore.EObject) doSwitch(EObject)
	 * @generated
	 */
	public T caseOutlineStroke(OutlineStroke object) {
		return null;
	}

	/**
	 * Returns the result of interpreting the object as an instance of '<em>Outline Point</em>'.
	 * <!-- begin-user-doc -->
	 * This implementation returns null;
	 * returning a non-null result will terminate the switch.
	 * <!-- end-user-doc -->
	 * @param object the target of the switch.
	 * @return the result of interpreting the object as an instance of '<em>Outline Point</em>'.
	 * @see #doSwitch(org.eclipse.emf.ecore.EObject) doSwitch(EObject)
	 * @generated
	 */
	public T caseOutlinePoint(OutlinePoint object) {
		return null;
	}

	/**
	 * Returns the result of interpreting the object as an instance of '<em>Line</em>'.
	 * <!-- begin-user-doc -->
	 * This implementation returns null;
	 * returning a non-null result will terminate the switch.
	 * <!-- end-user-doc -->
	 * @param object the target of the switch.
	 * @return the result of interpreting the object as an instance of '<em>Line</em>'.
	 * @see #doSwitch(org.eclipse.emf.ecore.EObject) doSwitch(EObject)
	 * @generated
	 */
	public T caseLine(Line object) {
		return null;
	}

	/**
	 * Returns the result of interpreting the object as an instance of '<em>Structure</em>'.
	 * <!-- begin-user-doc -->
	 * This implementation returns null;
	 * returning a non-null result will terminate the switch.
	 * <!-- end-user-doc -->
	 * @param object the target of the switch.
	 * @return the result of interpreting the object as an instance of '<em>Structure</em>'.
	 * @see #doSwitch(org.eclipse.emf.ecore.EObject) doSwitch(EObject)
	 * @generated
	 */
	public T caseStructure(Structure object) {
		return null;
	}

	/**
	 * Returns the result of interpreting the object as an instance of '<em>Stringing Section</em>'.
	 * <!-- begin-user-doc -->
	 * This implementation returns null;
	 * returning a non-null result will terminate the switch.
	 * <!-- end-user-doc -->
	 * @param object the target of the switch.
	 * @return the result of interpreting the object as an instance of '<em>Stringing Section</em>'.
	 * @see #doSwitch(org.eclipse.emf.ecore.EObject) doSwitch(EObject)
	 * @generated
	 */
	public T caseStringingSection(StringingSection object) {
		return null;
	}

	/**
	 * Returns the result of interpreting the object as an instance of '<em>Wire Stringing</em>'.
	 * <!-- begin-user-doc -->
	 * This implementation returns null;
	 * returning a non-null result will terminate the switch.
	 * <!-- end-user-doc -->
	 * @param object the target of the switch.
	 * @return the result of interpreting the object as an instance of '<em>Wire Stringing</em>'.
	 * @see #doSwitch(org.eclipse.emf.ecore.EObject) doSwitch(EObject)
	 * @generated
	 */
	public T caseWireStringing(WireStringing object) {
		return null;
	}

	/**
	 * Returns the result of interpreting the object as an instance of '<em>Stringing</em>'.
	 * <!-- begin-user-doc -->
	 * This implementation returns null;
	 * returning a non-null result will terminate the switch.
	 * <!-- end-user-doc -->
	 * @param object the target of the switch.
	 * @return the result of interpreting the object as an instance of '<em>Stringing</em>'.
	 * @see #doSwitch(org.eclipse.emf.ecore.EObject) doSwitch(EObject)
	 * @generated
	 */
	public T caseStringing(Stringing object) {
		return null;
	}

	/**
	 * Returns the result of interpreting the object as an instance of '<em>Catenary Stringing</em>'.
	 * <!-- begin-user-doc -->
	 * This implementation returns null;
	 * returning a non-null result will terminate the switch.
	 * <!-- end-user-doc -->
	 * @param object the target of the switch.
	 * @return the result of interpreting the object as an instance of '<em>Catenary Stringing</em>'.
	 * @see #doSwitch(org.eclipse.emf.ecore.EObject) doSwitch(EObject)
	 * @generated
	 */
	public T caseCatenaryStringing(CatenaryStringing object) {
		return null;
	}

	/**
	 * Returns the result of interpreting the object as an instance of '<em>Sag Stringing</em>'.
	 * <!-- begin-user-doc -->
	 * This implementation returns null;
	 * returning a non-null result will terminate the switch.
	 * <!-- end-user-doc -->
	 * @param object the target of the switch.
	 * @return the result of interpreting the object as an instance of '<em>Sag Stringing</em>'.
	 * @see #doSwitch(org.eclipse.emf.ecore.EObject) doSwitch(EObject)
	 * @generated
	 */
	public T caseSagStringing(SagStringing object) {
		return null;
	}

	/**
	 * Returns the result of interpreting the object as an instance of '<em>Tension Stringing</em>'.
	 * <!-- begin-user-doc -->
	 * This implementation returns null;
	 * returning a non-null result will terminate the switch.
	 * <!-- end-user-doc -->
	 * @param object the target of the switch.
	 * @return the result of interpreting the object as an instance of '<em>Tension Stringing</em>'.
	 * @see #doSwitch(org.eclipse.emf.ecore.EObject) doSwitch(EObject)
	 * @generated
	 */
	public T caseTensionStringing(TensionStringing object) {
		return null;
	}

	/**
	 * Returns the result of interpreting the object as an instance of '<em>Clearance Stringing</em>'.
	 * <!-- begin-user-doc -->
	 * This implementation returns null;
	 * returning a non-null result will terminate the switch.
	 * <!-- end-user-doc -->
	 * @param object the target of the switch.
	 * @return the result of interpreting the object as an instance of '<em>Clearance Stringing</em>'.
	 * @see #doSwitch(org.eclipse.emf.ecore.EObject) doSwitch(EObject)
	 * @generated
	 */
	public T caseClearanceStringing(ClearanceStringing object) {
		return null;
	}

	/**
	 * Returns the result of interpreting the object as an instance of '<em>Strung Element</em>'.
	 * <!-- begin-user-doc -->
	 * This implementation returns null;
	 * returning a non-null result will terminate the switch.
	 * <!-- end-user-doc -->
	 * @param object the target of the switch.
	 * @return the result of interpreting the object as an instance of '<em>Strung Element</em>'.
	 * @see #doSwitch(org.eclipse.emf.ecore.EObject) doSwitch(EObject)
	 * @generated
	 */
	public T caseStrungElement(StrungElement object) {
		return null;
	}

	/**
	 * Returns the result of interpreting the object as an instance of '<em>Circuit</em>'.
	 * <!-- begin-user-doc -->
	 * This implementation returns null;
	 * returning a non-null result will terminate the switch.
	 * <!-- end-user-doc -->
	 * @param object the target of the switch.
	 * @return the result of interpreting the object as an instance of '<em>Circuit</em>'.
	 * @see #doSwitch(org.eclipse.emf.ecore.EObject) doSwitch(EObject)
	 * @generated
	 */
	public T caseCircuit(Circuit object) {
		return null;
	}

	/**
	 * Returns the result of interpreting the object as an instance of '<em>Phase</em>'.
	 * <!-- begin-user-doc -->
	 * This implementation returns null;
	 * returning a non-null result will terminate the switch.
	 * <!-- end-user-doc -->
	 * @param object the target of the switch.
	 * @return the result of interpreting the object as an instance of '<em>Phase</em>'.
	 * @see #doSwitch(org.eclipse.emf.ecore.EObject) doSwitch(EObject)
	 * @generated
	 */
	public T casePhase(Phase object) {
		return null;
	}

	/**
	 * Returns the result of interpreting the object as an instance of '<em>Shield Wire</em>'.
	 * <!-- begin-user-doc -->
	 * This implementation returns null;
	 * returning a non-null result will terminate the switch.
	 * <!-- end-user-doc -->
	 * @param object the target of the switch.
	 * @return the result of interpreting the object as an instance of '<em>Shield Wire</em>'.
	 * @see #doSwitch(org.eclipse.emf.ecore.EObject) doSwitch(EObject)
	 * @generated
	 */
	public T caseShieldWire(ShieldWire object) {
		return null;
	}

	/**
	 * Returns the result of interpreting the object as an instance of '<em>Load Case</em>'.
	 * <!-- begin-user-doc -->
	 * This implementation returns null;
	 * returning a non-null result will terminate the switch.
	 * <!-- end-user-doc -->
	 * @param object the target of the switch.
	 * @return the result of interpreting the object as an instance of '<em>Load Case</em>'.
	 * @see #doSwitch(org.eclipse.emf.ecore.EObject) doSwitch(EObject)
	 * @generated
	 */
	public T caseLoadCase(LoadCase object) {
		return null;
	}

	/**
	 * Returns the result of interpreting the object as an instance of '<em>Circuit Load</em>'.
	 * <!-- begin-user-doc -->
	 * This implementation returns null;
	 * returning a non-null result will terminate the switch.
	 * <!-- end-user-doc -->
	 * @param object the target of the switch.
	 * @return the result of interpreting the object as an instance of '<em>Circuit Load</em>'.
	 * @see #doSwitch(org.eclipse.emf.ecore.EObject) doSwitch(EObject)
	 * @generated
	 */
	public T caseCircuitLoad(CircuitLoad object) {
		return null;
	}

	/**
	 * Returns the result of interpreting the object as an instance of '<em>Current Load</em>'.
	 * <!-- begin-user-doc -->
	 * This implementation returns null;
	 * returning a non-null result will terminate the switch.
	 * <!-- end-user-doc -->
	 * @param object the target of the switch.
	 * @return the result of interpreting the object as an instance of '<em>Current Load</em>'.
	 * @see #doSwitch(org.eclipse.emf.ecore.EObject) doSwitch(EObject)
	 * @generated
	 */
	public T caseCurrentLoad(CurrentLoad object) {
		return null;
	}

	/**
	 * Returns the result of interpreting the object as an instance of '<em>Power Load</em>'.
	 * <!-- begin-user-doc -->
	 * This implementation returns null;
	 * returning a non-null result will terminate the switch.
	 * <!-- end-user-doc -->
	 * @param object the target of the switch.
	 * @return the result of interpreting the object as an instance of '<em>Power Load</em>'.
	 * @see #doSwitch(org.eclipse.emf.ecore.EObject) doSwitch(EObject)
	 * @generated
	 */
	public T casePowerLoad(PowerLoad object) {
		return null;
	}

	/**
	 * Returns the result of interpreting the object as an instance of '<em>Sequence Load</em>'.
	 * <!-- begin-user-doc -->
	 * This implementation returns null;
	 * returning a non-null result will terminate the switch.
	 * <!-- end-user-doc -->
	 * @param object the target of the switch.
	 * @return the result of interpreting the object as an instance of '<em>Sequence Load</em>'.
	 * @see #doSwitch(org.eclipse.emf.ecore.EObject) doSwitch(EObject)
	 * @generated
	 */
	public T caseSequenceLoad(SequenceLoad object) {
		return null;
	}

	/**
	 * Returns the result of interpreting the object as an instance of '<em>Phasor Load</em>'.
	 * <!-- begin-user-doc -->
	 * This implementation returns null;
	 * returning a non-null result will terminate the switch.
	 * <!-- end-user-doc -->
	 * @param object the target of the switch.
	 * @return the result of interpreting the object as an instance of '<em>Phasor Load</em>'.
	 * @see #doSwitch(org.eclipse.emf.ecore.EObject) doSwitch(EObject)
	 * @generated
	 */
	public T casePhasorLoad(PhasorLoad object) {
		return null;
	}

	/**
	 * Returns the result of interpreting the object as an instance of '<em>Phase Phasor</em>'.
	 * <!-- begin-user-doc -->
	 * This implementation returns null;
	 * returning a non-null result will terminate the switch.
	 * <!-- end-user-doc -->
	 * @param object the target of the switch.
	 * @return the result of interpreting the object as an instance of '<em>Phase Phasor</em>'.
	 * @see #doSwitch(org.eclipse.emf.ecore.EObject) doSwitch(EObject)
	 * @generated
	 */
	public T casePhasePhasor(PhasePhasor object) {
		return null;
	}

	/**
	 * Returns the result of interpreting the object as an instance of '<em>Profile Station</em>'.
	 * <!-- begin-user-doc -->
	 * This implementation returns null;
	 * returning a non-null result will terminate the switch.
	 * <!-- end-user-doc -->
	 * @param object the target of the switch.
	 * @return the result of interpreting the object as an instance of '<em>Profile Station</em>'.
	 * @see #doSwitch(org.eclipse.emf.ecore.EObject) doSwitch(EObject)
	 * @generated
	 */
	public T caseProfileStation(ProfileStation object) {
		return null;
	}

	/**
	 * Returns the result of interpreting the object as an instance of '<em>Field Limit</em>'.
	 * <!-- begin-user-doc -->
	 * This implementation returns null;
	 * returning a non-null result will terminate the switch.
	 * <!-- end-user-doc -->
	 * @param object the target of the switch.
	 * @return the result of interpreting the object as an instance of '<em>Field Limit</em>'.
	 * @see #doSwitch(org.eclipse.emf.ecore.EObject) doSwitch(EObject)
	 * @generated
	 */
	public T caseFieldLimit(FieldLimit object) {
		return null;
	}

	/**
	 * Returns the result of interpreting the object as an instance of '<em>Survey</em>'.
	 * <!-- begin-user-doc -->
	 * This implementation returns null;
	 * returning a non-null result will terminate the switch.
	 * <!-- end-user-doc -->
	 * @param object the target of the switch.
	 * @return the result of interpreting the object as an instance of '<em>Survey</em>'.
	 * @see #doSwitch(org.eclipse.emf.ecore.EObject) doSwitch(EObject)
	 * @generated
	 */
	public T caseSurvey(Survey object) {
		return null;
	}

	/**
	 * Returns the result of interpreting the object as an instance of '<em>Survey Reading</em>'.
	 * <!-- begin-user-doc -->
	 * This implementation returns null;
	 * returning a non-null result will terminate the switch.
	 * <!-- end-user-doc -->
	 * @param object the target of the switch.
	 * @return the result of interpreting the object as an instance of '<em>Survey Reading</em>'.
	 * @see #doSwitch(org.eclipse.emf.ecore.EObject) doSwitch(EObject)
	 * @generated
	 */
	public T caseSurveyReading(SurveyReading object) {
		return null;
	}

	/**
	 * Returns the result of interpreting the object as an instance of '<em>EObject</em>'.
	 * <!-- begin-user-doc -->
	 * This implementation returns null;
	 * returning a non-null result will terminate the switch, but this is the last case anyway.
	 * <!-- end-user-doc -->
	 * @param object the target of the switch.
	 * @return the result of interpreting the object as an instance of '<em>EObject</em>'.
	 * @see #doSwitch(org.eclipse.emf.ecore.EObject)
	 * @generated
	 */
	@Override
	public T defaultCase(EObject object) {
		return null;
	}

} //SpanfieldSwitch
