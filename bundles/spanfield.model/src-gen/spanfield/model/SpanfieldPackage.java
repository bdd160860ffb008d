/**
 * Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0
 */
package spanfield.model;

import org.eclipse.emf.ecore.EAttribute;
import org.eclipse.emf.ecore.EClass;
import org.eclipse.emf.ecore.EEnum;
import org.eclipse.emf.ecore.EPackage;
import org.eclipse.emf.ecore.EReference;

/**
 * <!-- begin-user-doc -->
 * The <b>Package</b> for the model.
 * It contains accessors for the meta objects to represent
 * <ul>
 *   <li>each class,</li>
 *   <li>each feature of each class,</li>
 *   <li>each operation of each class,</li>
 *   <li>each enum,</li>
 *   <li>and each data type</li>
 * </ul>
 * <!-- end-user-doc -->
 * <!-- begin-model-doc -->
 * Model of a corridor study. All quantities are in SI units (angles in degrees, temperatures in degrees Celsius), named in each attribute and its documentation. Axes: offset positive to the right, station ahead, elevation up. Phasors are RMS with time factor exp(+j omega t).
 * <!-- end-model-doc -->
 * @see spanfield.model.SpanfieldFactory
 * @model kind="package"
 * @generated
 */
public interface SpanfieldPackage extends EPackage {
	/**
	 * The package name.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	String eNAME = "model";

	/**
	 * The package namespace URI.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	String eNS_URI = "urn:spanfield:study:1";

	/**
	 * The package namespace name.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	String eNS_PREFIX = "spanfield";

	/**
	 * The singleton instance of the package.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	SpanfieldPackage eINSTANCE = spanfield.model.impl.SpanfieldPackageImpl.init();

	/**
	 * The meta object id for the '{@link spanfield.model.impl.NamedElementImpl <em>Named Element</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see spanfield.model.impl.NamedElementImpl
	 * @see spanfield.model.impl.SpanfieldPackageImpl#getNamedElement()
	 * @generated
	 */
	int NAMED_ELEMENT = 0;

	/**
	 * The feature id for the '<em><b>Id</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int NAMED_ELEMENT__ID = 0;

	/**
	 * The feature id for the '<em><b>Name</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int NAMED_ELEMENT__NAME = 1;

	/**
	 * The feature id for the '<em><b>Notes</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int NAMED_ELEMENT__NOTES = 2;

	/**
	 * The number of structural features of the '<em>Named Element</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int NAMED_ELEMENT_FEATURE_COUNT = 3;

	/**
	 * The number of operations of the '<em>Named Element</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int NAMED_ELEMENT_OPERATION_COUNT = 0;

	/**
	 * The meta object id for the '{@link spanfield.model.impl.StudyImpl <em>Study</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see spanfield.model.impl.StudyImpl
	 * @see spanfield.model.impl.SpanfieldPackageImpl#getStudy()
	 * @generated
	 */
	int STUDY = 1;

	/**
	 * The feature id for the '<em><b>Id</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int STUDY__ID = NAMED_ELEMENT__ID;

	/**
	 * The feature id for the '<em><b>Name</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int STUDY__NAME = NAMED_ELEMENT__NAME;

	/**
	 * The feature id for the '<em><b>Notes</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int STUDY__NOTES = NAMED_ELEMENT__NOTES;

	/**
	 * The feature id for the '<em><b>Author</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int STUDY__AUTHOR = NAMED_ELEMENT_FEATURE_COUNT + 0;

	/**
	 * The feature id for the '<em><b>Organisation</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int STUDY__ORGANISATION = NAMED_ELEMENT_FEATURE_COUNT + 1;

	/**
	 * The feature id for the '<em><b>Date</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int STUDY__DATE = NAMED_ELEMENT_FEATURE_COUNT + 2;

	/**
	 * The feature id for the '<em><b>Frequency Hertz</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int STUDY__FREQUENCY_HERTZ = NAMED_ELEMENT_FEATURE_COUNT + 3;

	/**
	 * The feature id for the '<em><b>Earth Resistivity Ohm Metres</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int STUDY__EARTH_RESISTIVITY_OHM_METRES = NAMED_ELEMENT_FEATURE_COUNT + 4;

	/**
	 * The feature id for the '<em><b>Earth Model</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int STUDY__EARTH_MODEL = NAMED_ELEMENT_FEATURE_COUNT + 5;

	/**
	 * The feature id for the '<em><b>Impedance Formula</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int STUDY__IMPEDANCE_FORMULA = NAMED_ELEMENT_FEATURE_COUNT + 6;

	/**
	 * The feature id for the '<em><b>Reference Height Metres</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int STUDY__REFERENCE_HEIGHT_METRES = NAMED_ELEMENT_FEATURE_COUNT + 7;

	/**
	 * The feature id for the '<em><b>Relative Accuracy</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int STUDY__RELATIVE_ACCURACY = NAMED_ELEMENT_FEATURE_COUNT + 8;

	/**
	 * The feature id for the '<em><b>Corridor</b></em>' containment reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int STUDY__CORRIDOR = NAMED_ELEMENT_FEATURE_COUNT + 9;

	/**
	 * The feature id for the '<em><b>Conductors</b></em>' containment reference list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int STUDY__CONDUCTORS = NAMED_ELEMENT_FEATURE_COUNT + 10;

	/**
	 * The feature id for the '<em><b>Structure Types</b></em>' containment reference list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int STUDY__STRUCTURE_TYPES = NAMED_ELEMENT_FEATURE_COUNT + 11;

	/**
	 * The feature id for the '<em><b>Lines</b></em>' containment reference list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int STUDY__LINES = NAMED_ELEMENT_FEATURE_COUNT + 12;

	/**
	 * The feature id for the '<em><b>Load Cases</b></em>' containment reference list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int STUDY__LOAD_CASES = NAMED_ELEMENT_FEATURE_COUNT + 13;

	/**
	 * The feature id for the '<em><b>Stations</b></em>' containment reference list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int STUDY__STATIONS = NAMED_ELEMENT_FEATURE_COUNT + 14;

	/**
	 * The feature id for the '<em><b>Limits</b></em>' containment reference list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int STUDY__LIMITS = NAMED_ELEMENT_FEATURE_COUNT + 15;

	/**
	 * The feature id for the '<em><b>Surveys</b></em>' containment reference list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int STUDY__SURVEYS = NAMED_ELEMENT_FEATURE_COUNT + 16;

	/**
	 * The number of structural features of the '<em>Study</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int STUDY_FEATURE_COUNT = NAMED_ELEMENT_FEATURE_COUNT + 17;

	/**
	 * The number of operations of the '<em>Study</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int STUDY_OPERATION_COUNT = NAMED_ELEMENT_OPERATION_COUNT + 0;

	/**
	 * The meta object id for the '{@link spanfield.model.impl.CorridorImpl <em>Corridor</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see spanfield.model.impl.CorridorImpl
	 * @see spanfield.model.impl.SpanfieldPackageImpl#getCorridor()
	 * @generated
	 */
	int CORRIDOR = 2;

	/**
	 * The feature id for the '<em><b>Cross Slope</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int CORRIDOR__CROSS_SLOPE = 0;

	/**
	 * The feature id for the '<em><b>Edges</b></em>' containment reference list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int CORRIDOR__EDGES = 1;

	/**
	 * The feature id for the '<em><b>Ground Points</b></em>' containment reference list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int CORRIDOR__GROUND_POINTS = 2;

	/**
	 * The feature id for the '<em><b>Centreline Elevations</b></em>' containment reference list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int CORRIDOR__CENTRELINE_ELEVATIONS = 3;

	/**
	 * The feature id for the '<em><b>Bends</b></em>' containment reference list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int CORRIDOR__BENDS = 4;

	/**
	 * The number of structural features of the '<em>Corridor</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int CORRIDOR_FEATURE_COUNT = 5;

	/**
	 * The number of operations of the '<em>Corridor</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int CORRIDOR_OPERATION_COUNT = 0;

	/**
	 * The meta object id for the '{@link spanfield.model.impl.EdgePointImpl <em>Edge Point</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see spanfield.model.impl.EdgePointImpl
	 * @see spanfield.model.impl.SpanfieldPackageImpl#getEdgePoint()
	 * @generated
	 */
	int EDGE_POINT = 3;

	/**
	 * The feature id for the '<em><b>Station Metres</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int EDGE_POINT__STATION_METRES = 0;

	/**
	 * The feature id for the '<em><b>Left Offset Metres</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int EDGE_POINT__LEFT_OFFSET_METRES = 1;

	/**
	 * The feature id for the '<em><b>Right Offset Metres</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int EDGE_POINT__RIGHT_OFFSET_METRES = 2;

	/**
	 * The number of structural features of the '<em>Edge Point</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int EDGE_POINT_FEATURE_COUNT = 3;

	/**
	 * The number of operations of the '<em>Edge Point</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int EDGE_POINT_OPERATION_COUNT = 0;

	/**
	 * The meta object id for the '{@link spanfield.model.impl.GroundPointImpl <em>Ground Point</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see spanfield.model.impl.GroundPointImpl
	 * @see spanfield.model.impl.SpanfieldPackageImpl#getGroundPoint()
	 * @generated
	 */
	int GROUND_POINT = 4;

	/**
	 * The feature id for the '<em><b>Offset Metres</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int GROUND_POINT__OFFSET_METRES = 0;

	/**
	 * The feature id for the '<em><b>Elevation Metres</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int GROUND_POINT__ELEVATION_METRES = 1;

	/**
	 * The number of structural features of the '<em>Ground Point</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int GROUND_POINT_FEATURE_COUNT = 2;

	/**
	 * The number of operations of the '<em>Ground Point</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int GROUND_POINT_OPERATION_COUNT = 0;

	/**
	 * The meta object id for the '{@link spanfield.model.impl.ElevationPointImpl <em>Elevation Point</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see spanfield.model.impl.ElevationPointImpl
	 * @see spanfield.model.impl.SpanfieldPackageImpl#getElevationPoint()
	 * @generated
	 */
	int ELEVATION_POINT = 5;

	/**
	 * The feature id for the '<em><b>Station Metres</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int ELEVATION_POINT__STATION_METRES = 0;

	/**
	 * The feature id for the '<em><b>Elevation Metres</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int ELEVATION_POINT__ELEVATION_METRES = 1;

	/**
	 * The number of structural features of the '<em>Elevation Point</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int ELEVATION_POINT_FEATURE_COUNT = 2;

	/**
	 * The number of operations of the '<em>Elevation Point</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int ELEVATION_POINT_OPERATION_COUNT = 0;

	/**
	 * The meta object id for the '{@link spanfield.model.impl.AlignmentBendImpl <em>Alignment Bend</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see spanfield.model.impl.AlignmentBendImpl
	 * @see spanfield.model.impl.SpanfieldPackageImpl#getAlignmentBend()
	 * @generated
	 */
	int ALIGNMENT_BEND = 6;

	/**
	 * The feature id for the '<em><b>Station Metres</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int ALIGNMENT_BEND__STATION_METRES = 0;

	/**
	 * The feature id for the '<em><b>Deflection Degrees</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int ALIGNMENT_BEND__DEFLECTION_DEGREES = 1;

	/**
	 * The number of structural features of the '<em>Alignment Bend</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int ALIGNMENT_BEND_FEATURE_COUNT = 2;

	/**
	 * The number of operations of the '<em>Alignment Bend</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int ALIGNMENT_BEND_OPERATION_COUNT = 0;

	/**
	 * The meta object id for the '{@link spanfield.model.impl.ConductorImpl <em>Conductor</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see spanfield.model.impl.ConductorImpl
	 * @see spanfield.model.impl.SpanfieldPackageImpl#getConductor()
	 * @generated
	 */
	int CONDUCTOR = 7;

	/**
	 * The feature id for the '<em><b>Id</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int CONDUCTOR__ID = NAMED_ELEMENT__ID;

	/**
	 * The feature id for the '<em><b>Name</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int CONDUCTOR__NAME = NAMED_ELEMENT__NAME;

	/**
	 * The feature id for the '<em><b>Notes</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int CONDUCTOR__NOTES = NAMED_ELEMENT__NOTES;

	/**
	 * The feature id for the '<em><b>Diameter Metres</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int CONDUCTOR__DIAMETER_METRES = NAMED_ELEMENT_FEATURE_COUNT + 0;

	/**
	 * The feature id for the '<em><b>Geometric Mean Radius Metres</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int CONDUCTOR__GEOMETRIC_MEAN_RADIUS_METRES = NAMED_ELEMENT_FEATURE_COUNT + 1;

	/**
	 * The feature id for the '<em><b>Low Temperature Celsius</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int CONDUCTOR__LOW_TEMPERATURE_CELSIUS = NAMED_ELEMENT_FEATURE_COUNT + 2;

	/**
	 * The feature id for the '<em><b>Low Resistance Ohms Per Metre</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int CONDUCTOR__LOW_RESISTANCE_OHMS_PER_METRE = NAMED_ELEMENT_FEATURE_COUNT + 3;

	/**
	 * The feature id for the '<em><b>High Temperature Celsius</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int CONDUCTOR__HIGH_TEMPERATURE_CELSIUS = NAMED_ELEMENT_FEATURE_COUNT + 4;

	/**
	 * The feature id for the '<em><b>High Resistance Ohms Per Metre</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int CONDUCTOR__HIGH_RESISTANCE_OHMS_PER_METRE = NAMED_ELEMENT_FEATURE_COUNT + 5;

	/**
	 * The feature id for the '<em><b>Mass Kilograms Per Metre</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int CONDUCTOR__MASS_KILOGRAMS_PER_METRE = NAMED_ELEMENT_FEATURE_COUNT + 6;

	/**
	 * The feature id for the '<em><b>Area Square Metres</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int CONDUCTOR__AREA_SQUARE_METRES = NAMED_ELEMENT_FEATURE_COUNT + 7;

	/**
	 * The feature id for the '<em><b>Elastic Modulus Pascals</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int CONDUCTOR__ELASTIC_MODULUS_PASCALS = NAMED_ELEMENT_FEATURE_COUNT + 8;

	/**
	 * The feature id for the '<em><b>Thermal Expansion Per Kelvin</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int CONDUCTOR__THERMAL_EXPANSION_PER_KELVIN = NAMED_ELEMENT_FEATURE_COUNT + 9;

	/**
	 * The feature id for the '<em><b>Rated Strength Newtons</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int CONDUCTOR__RATED_STRENGTH_NEWTONS = NAMED_ELEMENT_FEATURE_COUNT + 10;

	/**
	 * The feature id for the '<em><b>Emissivity</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int CONDUCTOR__EMISSIVITY = NAMED_ELEMENT_FEATURE_COUNT + 11;

	/**
	 * The feature id for the '<em><b>Absorptivity</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int CONDUCTOR__ABSORPTIVITY = NAMED_ELEMENT_FEATURE_COUNT + 12;

	/**
	 * The number of structural features of the '<em>Conductor</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int CONDUCTOR_FEATURE_COUNT = NAMED_ELEMENT_FEATURE_COUNT + 13;

	/**
	 * The number of operations of the '<em>Conductor</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int CONDUCTOR_OPERATION_COUNT = NAMED_ELEMENT_OPERATION_COUNT + 0;

	/**
	 * The meta object id for the '{@link spanfield.model.impl.StructureTypeImpl <em>Structure Type</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see spanfield.model.impl.StructureTypeImpl
	 * @see spanfield.model.impl.SpanfieldPackageImpl#getStructureType()
	 * @generated
	 */
	int STRUCTURE_TYPE = 8;

	/**
	 * The feature id for the '<em><b>Id</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int STRUCTURE_TYPE__ID = NAMED_ELEMENT__ID;

	/**
	 * The feature id for the '<em><b>Name</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int STRUCTURE_TYPE__NAME = NAMED_ELEMENT__NAME;

	/**
	 * The feature id for the '<em><b>Notes</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int STRUCTURE_TYPE__NOTES = NAMED_ELEMENT__NOTES;

	/**
	 * The feature id for the '<em><b>Attachments</b></em>' containment reference list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int STRUCTURE_TYPE__ATTACHMENTS = NAMED_ELEMENT_FEATURE_COUNT + 0;

	/**
	 * The feature id for the '<em><b>Outline</b></em>' containment reference list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int STRUCTURE_TYPE__OUTLINE = NAMED_ELEMENT_FEATURE_COUNT + 1;

	/**
	 * The number of structural features of the '<em>Structure Type</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int STRUCTURE_TYPE_FEATURE_COUNT = NAMED_ELEMENT_FEATURE_COUNT + 2;

	/**
	 * The number of operations of the '<em>Structure Type</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int STRUCTURE_TYPE_OPERATION_COUNT = NAMED_ELEMENT_OPERATION_COUNT + 0;

	/**
	 * The meta object id for the '{@link spanfield.model.impl.AttachmentImpl <em>Attachment</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see spanfield.model.impl.AttachmentImpl
	 * @see spanfield.model.impl.SpanfieldPackageImpl#getAttachment()
	 * @generated
	 */
	int ATTACHMENT = 9;

	/**
	 * The feature id for the '<em><b>Name</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int ATTACHMENT__NAME = 0;

	/**
	 * The feature id for the '<em><b>Role</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int ATTACHMENT__ROLE = 1;

	/**
	 * The feature id for the '<em><b>Offset Metres</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int ATTACHMENT__OFFSET_METRES = 2;

	/**
	 * The feature id for the '<em><b>Height Metres</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int ATTACHMENT__HEIGHT_METRES = 3;

	/**
	 * The feature id for the '<em><b>Insulator Length Metres</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int ATTACHMENT__INSULATOR_LENGTH_METRES = 4;

	/**
	 * The number of structural features of the '<em>Attachment</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int ATTACHMENT_FEATURE_COUNT = 5;

	/**
	 * The number of operations of the '<em>Attachment</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int ATTACHMENT_OPERATION_COUNT = 0;

	/**
	 * The meta object id for the '{@link spanfield.model.impl.OutlineStrokeImpl <em>Outline Stroke</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see spanfield.model.impl.OutlineStrokeImpl
	 * @see spanfield.model.impl.SpanfieldPackageImpl#getOutlineStroke()
	 * @generated
	 */
	int OUTLINE_STROKE = 10;

	/**
	 * The feature id for the '<em><b>Points</b></em>' containment reference list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int OUTLINE_STROKE__POINTS = 0;

	/**
	 * The number of structural features of the '<em>Outline Stroke</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int OUTLINE_STROKE_FEATURE_COUNT = 1;

	/**
	 * The number of operations of the '<em>Outline Stroke</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int OUTLINE_STROKE_OPERATION_COUNT = 0;

	/**
	 * The meta object id for the '{@link spanfield.model.impl.OutlinePointImpl <em>Outline Point</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see spanfield.model.impl.OutlinePointImpl
	 * @see spanfield.model.impl.SpanfieldPackageImpl#getOutlinePoint()
	 * @generated
	 */
	int OUTLINE_POINT = 11;

	/**
	 * The feature id for the '<em><b>Offset Metres</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int OUTLINE_POINT__OFFSET_METRES = 0;

	/**
	 * The feature id for the '<em><b>Height Metres</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int OUTLINE_POINT__HEIGHT_METRES = 1;

	/**
	 * The number of structural features of the '<em>Outline Point</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int OUTLINE_POINT_FEATURE_COUNT = 2;

	/**
	 * The number of operations of the '<em>Outline Point</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int OUTLINE_POINT_OPERATION_COUNT = 0;

	/**
	 * The meta object id for the '{@link spanfield.model.impl.LineImpl <em>Line</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see spanfield.model.impl.LineImpl
	 * @see spanfield.model.impl.SpanfieldPackageImpl#getLine()
	 * @generated
	 */
	int LINE = 12;

	/**
	 * The feature id for the '<em><b>Id</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int LINE__ID = NAMED_ELEMENT__ID;

	/**
	 * The feature id for the '<em><b>Name</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int LINE__NAME = NAMED_ELEMENT__NAME;

	/**
	 * The feature id for the '<em><b>Notes</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int LINE__NOTES = NAMED_ELEMENT__NOTES;

	/**
	 * The feature id for the '<em><b>Structures</b></em>' containment reference list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int LINE__STRUCTURES = NAMED_ELEMENT_FEATURE_COUNT + 0;

	/**
	 * The feature id for the '<em><b>Sections</b></em>' containment reference list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int LINE__SECTIONS = NAMED_ELEMENT_FEATURE_COUNT + 1;

	/**
	 * The feature id for the '<em><b>Circuits</b></em>' containment reference list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int LINE__CIRCUITS = NAMED_ELEMENT_FEATURE_COUNT + 2;

	/**
	 * The feature id for the '<em><b>Shield Wires</b></em>' containment reference list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int LINE__SHIELD_WIRES = NAMED_ELEMENT_FEATURE_COUNT + 3;

	/**
	 * The feature id for the '<em><b>Start End</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int LINE__START_END = NAMED_ELEMENT_FEATURE_COUNT + 4;

	/**
	 * The feature id for the '<em><b>Finish End</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int LINE__FINISH_END = NAMED_ELEMENT_FEATURE_COUNT + 5;

	/**
	 * The number of structural features of the '<em>Line</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int LINE_FEATURE_COUNT = NAMED_ELEMENT_FEATURE_COUNT + 6;

	/**
	 * The number of operations of the '<em>Line</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int LINE_OPERATION_COUNT = NAMED_ELEMENT_OPERATION_COUNT + 0;

	/**
	 * The meta object id for the '{@link spanfield.model.impl.StructureImpl <em>Structure</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see spanfield.model.impl.StructureImpl
	 * @see spanfield.model.impl.SpanfieldPackageImpl#getStructure()
	 * @generated
	 */
	int STRUCTURE = 13;

	/**
	 * The feature id for the '<em><b>Id</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int STRUCTURE__ID = NAMED_ELEMENT__ID;

	/**
	 * The feature id for the '<em><b>Name</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int STRUCTURE__NAME = NAMED_ELEMENT__NAME;

	/**
	 * The feature id for the '<em><b>Notes</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int STRUCTURE__NOTES = NAMED_ELEMENT__NOTES;

	/**
	 * The feature id for the '<em><b>Type</b></em>' reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int STRUCTURE__TYPE = NAMED_ELEMENT_FEATURE_COUNT + 0;

	/**
	 * The feature id for the '<em><b>Station Metres</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int STRUCTURE__STATION_METRES = NAMED_ELEMENT_FEATURE_COUNT + 1;

	/**
	 * The feature id for the '<em><b>Offset Metres</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int STRUCTURE__OFFSET_METRES = NAMED_ELEMENT_FEATURE_COUNT + 2;

	/**
	 * The feature id for the '<em><b>Base Elevation Metres</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int STRUCTURE__BASE_ELEVATION_METRES = NAMED_ELEMENT_FEATURE_COUNT + 3;

	/**
	 * The feature id for the '<em><b>Height Adjustment Metres</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int STRUCTURE__HEIGHT_ADJUSTMENT_METRES = NAMED_ELEMENT_FEATURE_COUNT + 4;

	/**
	 * The feature id for the '<em><b>Turn Degrees</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int STRUCTURE__TURN_DEGREES = NAMED_ELEMENT_FEATURE_COUNT + 5;

	/**
	 * The number of structural features of the '<em>Structure</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int STRUCTURE_FEATURE_COUNT = NAMED_ELEMENT_FEATURE_COUNT + 6;

	/**
	 * The number of operations of the '<em>Structure</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int STRUCTURE_OPERATION_COUNT = NAMED_ELEMENT_OPERATION_COUNT + 0;

	/**
	 * The meta object id for the '{@link spanfield.model.impl.StringingSectionImpl <em>Stringing Section</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see spanfield.model.impl.StringingSectionImpl
	 * @see spanfield.model.impl.SpanfieldPackageImpl#getStringingSection()
	 * @generated
	 */
	int STRINGING_SECTION = 14;

	/**
	 * The feature id for the '<em><b>From</b></em>' reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int STRINGING_SECTION__FROM = 0;

	/**
	 * The feature id for the '<em><b>To</b></em>' reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int STRINGING_SECTION__TO = 1;

	/**
	 * The feature id for the '<em><b>Phase Stringing</b></em>' containment reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int STRINGING_SECTION__PHASE_STRINGING = 2;

	/**
	 * The feature id for the '<em><b>Shield Stringing</b></em>' containment reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int STRINGING_SECTION__SHIELD_STRINGING = 3;

	/**
	 * The feature id for the '<em><b>Exceptions</b></em>' containment reference list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int STRINGING_SECTION__EXCEPTIONS = 4;

	/**
	 * The number of structural features of the '<em>Stringing Section</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int STRINGING_SECTION_FEATURE_COUNT = 5;

	/**
	 * The number of operations of the '<em>Stringing Section</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int STRINGING_SECTION_OPERATION_COUNT = 0;

	/**
	 * The meta object id for the '{@link spanfield.model.impl.WireStringingImpl <em>Wire Stringing</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see spanfield.model.impl.WireStringingImpl
	 * @see spanfield.model.impl.SpanfieldPackageImpl#getWireStringing()
	 * @generated
	 */
	int WIRE_STRINGING = 15;

	/**
	 * The feature id for the '<em><b>Wires</b></em>' reference list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int WIRE_STRINGING__WIRES = 0;

	/**
	 * The feature id for the '<em><b>Stringing</b></em>' containment reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int WIRE_STRINGING__STRINGING = 1;

	/**
	 * The number of structural features of the '<em>Wire Stringing</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int WIRE_STRINGING_FEATURE_COUNT = 2;

	/**
	 * The number of operations of the '<em>Wire Stringing</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int WIRE_STRINGING_OPERATION_COUNT = 0;

	/**
	 * The meta object id for the '{@link spanfield.model.impl.StringingImpl <em>Stringing</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see spanfield.model.impl.StringingImpl
	 * @see spanfield.model.impl.SpanfieldPackageImpl#getStringing()
	 * @generated
	 */
	int STRINGING = 16;

	/**
	 * The number of structural features of the '<em>Stringing</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int STRINGING_FEATURE_COUNT = 0;

	/**
	 * The number of operations of the '<em>Stringing</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int STRINGING_OPERATION_COUNT = 0;

	/**
	 * The meta object id for the '{@link spanfield.model.impl.CatenaryStringingImpl <em>Catenary Stringing</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see spanfield.model.impl.CatenaryStringingImpl
	 * @see spanfield.model.impl.SpanfieldPackageImpl#getCatenaryStringing()
	 * @generated
	 */
	int CATENARY_STRINGING = 17;

	/**
	 * The feature id for the '<em><b>Catenary Constant Metres</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int CATENARY_STRINGING__CATENARY_CONSTANT_METRES = STRINGING_FEATURE_COUNT + 0;

	/**
	 * The number of structural features of the '<em>Catenary Stringing</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int CATENARY_STRINGING_FEATURE_COUNT = STRINGING_FEATURE_COUNT + 1;

	/**
	 * The number of operations of the '<em>Catenary Stringing</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int CATENARY_STRINGING_OPERATION_COUNT = STRINGING_OPERATION_COUNT + 0;

	/**
	 * The meta object id for the '{@link spanfield.model.impl.SagStringingImpl <em>Sag Stringing</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see spanfield.model.impl.SagStringingImpl
	 * @see spanfield.model.impl.SpanfieldPackageImpl#getSagStringing()
	 * @generated
	 */
	int SAG_STRINGING = 18;

	/**
	 * The feature id for the '<em><b>Sag Metres</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int SAG_STRINGING__SAG_METRES = STRINGING_FEATURE_COUNT + 0;

	/**
	 * The number of structural features of the '<em>Sag Stringing</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int SAG_STRINGING_FEATURE_COUNT = STRINGING_FEATURE_COUNT + 1;

	/**
	 * The number of operations of the '<em>Sag Stringing</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int SAG_STRINGING_OPERATION_COUNT = STRINGING_OPERATION_COUNT + 0;

	/**
	 * The meta object id for the '{@link spanfield.model.impl.TensionStringingImpl <em>Tension Stringing</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see spanfield.model.impl.TensionStringingImpl
	 * @see spanfield.model.impl.SpanfieldPackageImpl#getTensionStringing()
	 * @generated
	 */
	int TENSION_STRINGING = 19;

	/**
	 * The feature id for the '<em><b>Horizontal Tension Newtons</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int TENSION_STRINGING__HORIZONTAL_TENSION_NEWTONS = STRINGING_FEATURE_COUNT + 0;

	/**
	 * The number of structural features of the '<em>Tension Stringing</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int TENSION_STRINGING_FEATURE_COUNT = STRINGING_FEATURE_COUNT + 1;

	/**
	 * The number of operations of the '<em>Tension Stringing</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int TENSION_STRINGING_OPERATION_COUNT = STRINGING_OPERATION_COUNT + 0;

	/**
	 * The meta object id for the '{@link spanfield.model.impl.ClearanceStringingImpl <em>Clearance Stringing</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see spanfield.model.impl.ClearanceStringingImpl
	 * @see spanfield.model.impl.SpanfieldPackageImpl#getClearanceStringing()
	 * @generated
	 */
	int CLEARANCE_STRINGING = 20;

	/**
	 * The feature id for the '<em><b>Clearance Metres</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int CLEARANCE_STRINGING__CLEARANCE_METRES = STRINGING_FEATURE_COUNT + 0;

	/**
	 * The number of structural features of the '<em>Clearance Stringing</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int CLEARANCE_STRINGING_FEATURE_COUNT = STRINGING_FEATURE_COUNT + 1;

	/**
	 * The number of operations of the '<em>Clearance Stringing</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int CLEARANCE_STRINGING_OPERATION_COUNT = STRINGING_OPERATION_COUNT + 0;

	/**
	 * The meta object id for the '{@link spanfield.model.impl.StrungElementImpl <em>Strung Element</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see spanfield.model.impl.StrungElementImpl
	 * @see spanfield.model.impl.SpanfieldPackageImpl#getStrungElement()
	 * @generated
	 */
	int STRUNG_ELEMENT = 21;

	/**
	 * The feature id for the '<em><b>Id</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int STRUNG_ELEMENT__ID = NAMED_ELEMENT__ID;

	/**
	 * The feature id for the '<em><b>Name</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int STRUNG_ELEMENT__NAME = NAMED_ELEMENT__NAME;

	/**
	 * The feature id for the '<em><b>Notes</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int STRUNG_ELEMENT__NOTES = NAMED_ELEMENT__NOTES;

	/**
	 * The feature id for the '<em><b>Conductor</b></em>' reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int STRUNG_ELEMENT__CONDUCTOR = NAMED_ELEMENT_FEATURE_COUNT + 0;

	/**
	 * The number of structural features of the '<em>Strung Element</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int STRUNG_ELEMENT_FEATURE_COUNT = NAMED_ELEMENT_FEATURE_COUNT + 1;

	/**
	 * The number of operations of the '<em>Strung Element</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int STRUNG_ELEMENT_OPERATION_COUNT = NAMED_ELEMENT_OPERATION_COUNT + 0;

	/**
	 * The meta object id for the '{@link spanfield.model.impl.CircuitImpl <em>Circuit</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see spanfield.model.impl.CircuitImpl
	 * @see spanfield.model.impl.SpanfieldPackageImpl#getCircuit()
	 * @generated
	 */
	int CIRCUIT = 22;

	/**
	 * The feature id for the '<em><b>Id</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int CIRCUIT__ID = STRUNG_ELEMENT__ID;

	/**
	 * The feature id for the '<em><b>Name</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int CIRCUIT__NAME = STRUNG_ELEMENT__NAME;

	/**
	 * The feature id for the '<em><b>Notes</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int CIRCUIT__NOTES = STRUNG_ELEMENT__NOTES;

	/**
	 * The feature id for the '<em><b>Conductor</b></em>' reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int CIRCUIT__CONDUCTOR = STRUNG_ELEMENT__CONDUCTOR;

	/**
	 * The feature id for the '<em><b>Nominal Voltage Volts</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int CIRCUIT__NOMINAL_VOLTAGE_VOLTS = STRUNG_ELEMENT_FEATURE_COUNT + 0;

	/**
	 * The feature id for the '<em><b>Bundle Count</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int CIRCUIT__BUNDLE_COUNT = STRUNG_ELEMENT_FEATURE_COUNT + 1;

	/**
	 * The feature id for the '<em><b>Bundle Spacing Metres</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int CIRCUIT__BUNDLE_SPACING_METRES = STRUNG_ELEMENT_FEATURE_COUNT + 2;

	/**
	 * The feature id for the '<em><b>Phasing</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int CIRCUIT__PHASING = STRUNG_ELEMENT_FEATURE_COUNT + 3;

	/**
	 * The feature id for the '<em><b>Phases</b></em>' containment reference list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int CIRCUIT__PHASES = STRUNG_ELEMENT_FEATURE_COUNT + 4;

	/**
	 * The number of structural features of the '<em>Circuit</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int CIRCUIT_FEATURE_COUNT = STRUNG_ELEMENT_FEATURE_COUNT + 5;

	/**
	 * The number of operations of the '<em>Circuit</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int CIRCUIT_OPERATION_COUNT = STRUNG_ELEMENT_OPERATION_COUNT + 0;

	/**
	 * The meta object id for the '{@link spanfield.model.impl.PhaseImpl <em>Phase</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see spanfield.model.impl.PhaseImpl
	 * @see spanfield.model.impl.SpanfieldPackageImpl#getPhase()
	 * @generated
	 */
	int PHASE = 23;

	/**
	 * The feature id for the '<em><b>Label</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int PHASE__LABEL = 0;

	/**
	 * The feature id for the '<em><b>Angle Degrees</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int PHASE__ANGLE_DEGREES = 1;

	/**
	 * The feature id for the '<em><b>Attachment</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int PHASE__ATTACHMENT = 2;

	/**
	 * The number of structural features of the '<em>Phase</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int PHASE_FEATURE_COUNT = 3;

	/**
	 * The number of operations of the '<em>Phase</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int PHASE_OPERATION_COUNT = 0;

	/**
	 * The meta object id for the '{@link spanfield.model.impl.ShieldWireImpl <em>Shield Wire</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see spanfield.model.impl.ShieldWireImpl
	 * @see spanfield.model.impl.SpanfieldPackageImpl#getShieldWire()
	 * @generated
	 */
	int SHIELD_WIRE = 24;

	/**
	 * The feature id for the '<em><b>Id</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int SHIELD_WIRE__ID = STRUNG_ELEMENT__ID;

	/**
	 * The feature id for the '<em><b>Name</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int SHIELD_WIRE__NAME = STRUNG_ELEMENT__NAME;

	/**
	 * The feature id for the '<em><b>Notes</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int SHIELD_WIRE__NOTES = STRUNG_ELEMENT__NOTES;

	/**
	 * The feature id for the '<em><b>Conductor</b></em>' reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int SHIELD_WIRE__CONDUCTOR = STRUNG_ELEMENT__CONDUCTOR;

	/**
	 * The feature id for the '<em><b>Attachment</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int SHIELD_WIRE__ATTACHMENT = STRUNG_ELEMENT_FEATURE_COUNT + 0;

	/**
	 * The feature id for the '<em><b>Bonding</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int SHIELD_WIRE__BONDING = STRUNG_ELEMENT_FEATURE_COUNT + 1;

	/**
	 * The feature id for the '<em><b>Given Current Amperes</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int SHIELD_WIRE__GIVEN_CURRENT_AMPERES = STRUNG_ELEMENT_FEATURE_COUNT + 2;

	/**
	 * The feature id for the '<em><b>Given Angle Degrees</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int SHIELD_WIRE__GIVEN_ANGLE_DEGREES = STRUNG_ELEMENT_FEATURE_COUNT + 3;

	/**
	 * The number of structural features of the '<em>Shield Wire</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int SHIELD_WIRE_FEATURE_COUNT = STRUNG_ELEMENT_FEATURE_COUNT + 4;

	/**
	 * The number of operations of the '<em>Shield Wire</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int SHIELD_WIRE_OPERATION_COUNT = STRUNG_ELEMENT_OPERATION_COUNT + 0;

	/**
	 * The meta object id for the '{@link spanfield.model.impl.LoadCaseImpl <em>Load Case</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see spanfield.model.impl.LoadCaseImpl
	 * @see spanfield.model.impl.SpanfieldPackageImpl#getLoadCase()
	 * @generated
	 */
	int LOAD_CASE = 25;

	/**
	 * The feature id for the '<em><b>Id</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int LOAD_CASE__ID = NAMED_ELEMENT__ID;

	/**
	 * The feature id for the '<em><b>Name</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int LOAD_CASE__NAME = NAMED_ELEMENT__NAME;

	/**
	 * The feature id for the '<em><b>Notes</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int LOAD_CASE__NOTES = NAMED_ELEMENT__NOTES;

	/**
	 * The feature id for the '<em><b>Basis</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int LOAD_CASE__BASIS = NAMED_ELEMENT_FEATURE_COUNT + 0;

	/**
	 * The feature id for the '<em><b>Wind Swing Degrees</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int LOAD_CASE__WIND_SWING_DEGREES = NAMED_ELEMENT_FEATURE_COUNT + 1;

	/**
	 * The feature id for the '<em><b>Loads</b></em>' containment reference list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int LOAD_CASE__LOADS = NAMED_ELEMENT_FEATURE_COUNT + 2;

	/**
	 * The number of structural features of the '<em>Load Case</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int LOAD_CASE_FEATURE_COUNT = NAMED_ELEMENT_FEATURE_COUNT + 3;

	/**
	 * The number of operations of the '<em>Load Case</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int LOAD_CASE_OPERATION_COUNT = NAMED_ELEMENT_OPERATION_COUNT + 0;

	/**
	 * The meta object id for the '{@link spanfield.model.impl.CircuitLoadImpl <em>Circuit Load</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see spanfield.model.impl.CircuitLoadImpl
	 * @see spanfield.model.impl.SpanfieldPackageImpl#getCircuitLoad()
	 * @generated
	 */
	int CIRCUIT_LOAD = 26;

	/**
	 * The feature id for the '<em><b>Circuit</b></em>' reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int CIRCUIT_LOAD__CIRCUIT = 0;

	/**
	 * The feature id for the '<em><b>Direction</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int CIRCUIT_LOAD__DIRECTION = 1;

	/**
	 * The number of structural features of the '<em>Circuit Load</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int CIRCUIT_LOAD_FEATURE_COUNT = 2;

	/**
	 * The number of operations of the '<em>Circuit Load</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int CIRCUIT_LOAD_OPERATION_COUNT = 0;

	/**
	 * The meta object id for the '{@link spanfield.model.impl.CurrentLoadImpl <em>Current Load</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see spanfield.model.impl.CurrentLoadImpl
	 * @see spanfield.model.impl.SpanfieldPackageImpl#getCurrentLoad()
	 * @generated
	 */
	int CURRENT_LOAD = 27;

	/**
	 * The feature id for the '<em><b>Circuit</b></em>' reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int CURRENT_LOAD__CIRCUIT = CIRCUIT_LOAD__CIRCUIT;

	/**
	 * The feature id for the '<em><b>Direction</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int CURRENT_LOAD__DIRECTION = CIRCUIT_LOAD__DIRECTION;

	/**
	 * The feature id for the '<em><b>Current Amperes</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int CURRENT_LOAD__CURRENT_AMPERES = CIRCUIT_LOAD_FEATURE_COUNT + 0;

	/**
	 * The feature id for the '<em><b>Angle Degrees</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int CURRENT_LOAD__ANGLE_DEGREES = CIRCUIT_LOAD_FEATURE_COUNT + 1;

	/**
	 * The number of structural features of the '<em>Current Load</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int CURRENT_LOAD_FEATURE_COUNT = CIRCUIT_LOAD_FEATURE_COUNT + 2;

	/**
	 * The number of operations of the '<em>Current Load</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int CURRENT_LOAD_OPERATION_COUNT = CIRCUIT_LOAD_OPERATION_COUNT + 0;

	/**
	 * The meta object id for the '{@link spanfield.model.impl.PowerLoadImpl <em>Power Load</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see spanfield.model.impl.PowerLoadImpl
	 * @see spanfield.model.impl.SpanfieldPackageImpl#getPowerLoad()
	 * @generated
	 */
	int POWER_LOAD = 28;

	/**
	 * The feature id for the '<em><b>Circuit</b></em>' reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int POWER_LOAD__CIRCUIT = CIRCUIT_LOAD__CIRCUIT;

	/**
	 * The feature id for the '<em><b>Direction</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int POWER_LOAD__DIRECTION = CIRCUIT_LOAD__DIRECTION;

	/**
	 * The feature id for the '<em><b>Active Power Watts</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int POWER_LOAD__ACTIVE_POWER_WATTS = CIRCUIT_LOAD_FEATURE_COUNT + 0;

	/**
	 * The feature id for the '<em><b>Reactive Power Vars</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int POWER_LOAD__REACTIVE_POWER_VARS = CIRCUIT_LOAD_FEATURE_COUNT + 1;

	/**
	 * The feature id for the '<em><b>Voltage Volts</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int POWER_LOAD__VOLTAGE_VOLTS = CIRCUIT_LOAD_FEATURE_COUNT + 2;

	/**
	 * The number of structural features of the '<em>Power Load</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int POWER_LOAD_FEATURE_COUNT = CIRCUIT_LOAD_FEATURE_COUNT + 3;

	/**
	 * The number of operations of the '<em>Power Load</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int POWER_LOAD_OPERATION_COUNT = CIRCUIT_LOAD_OPERATION_COUNT + 0;

	/**
	 * The meta object id for the '{@link spanfield.model.impl.SequenceLoadImpl <em>Sequence Load</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see spanfield.model.impl.SequenceLoadImpl
	 * @see spanfield.model.impl.SpanfieldPackageImpl#getSequenceLoad()
	 * @generated
	 */
	int SEQUENCE_LOAD = 29;

	/**
	 * The feature id for the '<em><b>Circuit</b></em>' reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int SEQUENCE_LOAD__CIRCUIT = CIRCUIT_LOAD__CIRCUIT;

	/**
	 * The feature id for the '<em><b>Direction</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int SEQUENCE_LOAD__DIRECTION = CIRCUIT_LOAD__DIRECTION;

	/**
	 * The feature id for the '<em><b>Positive Amperes</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int SEQUENCE_LOAD__POSITIVE_AMPERES = CIRCUIT_LOAD_FEATURE_COUNT + 0;

	/**
	 * The feature id for the '<em><b>Positive Angle Degrees</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int SEQUENCE_LOAD__POSITIVE_ANGLE_DEGREES = CIRCUIT_LOAD_FEATURE_COUNT + 1;

	/**
	 * The feature id for the '<em><b>Negative Amperes</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int SEQUENCE_LOAD__NEGATIVE_AMPERES = CIRCUIT_LOAD_FEATURE_COUNT + 2;

	/**
	 * The feature id for the '<em><b>Negative Angle Degrees</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int SEQUENCE_LOAD__NEGATIVE_ANGLE_DEGREES = CIRCUIT_LOAD_FEATURE_COUNT + 3;

	/**
	 * The feature id for the '<em><b>Zero Amperes</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int SEQUENCE_LOAD__ZERO_AMPERES = CIRCUIT_LOAD_FEATURE_COUNT + 4;

	/**
	 * The feature id for the '<em><b>Zero Angle Degrees</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int SEQUENCE_LOAD__ZERO_ANGLE_DEGREES = CIRCUIT_LOAD_FEATURE_COUNT + 5;

	/**
	 * The number of structural features of the '<em>Sequence Load</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int SEQUENCE_LOAD_FEATURE_COUNT = CIRCUIT_LOAD_FEATURE_COUNT + 6;

	/**
	 * The number of operations of the '<em>Sequence Load</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int SEQUENCE_LOAD_OPERATION_COUNT = CIRCUIT_LOAD_OPERATION_COUNT + 0;

	/**
	 * The meta object id for the '{@link spanfield.model.impl.PhasorLoadImpl <em>Phasor Load</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see spanfield.model.impl.PhasorLoadImpl
	 * @see spanfield.model.impl.SpanfieldPackageImpl#getPhasorLoad()
	 * @generated
	 */
	int PHASOR_LOAD = 30;

	/**
	 * The feature id for the '<em><b>Circuit</b></em>' reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int PHASOR_LOAD__CIRCUIT = CIRCUIT_LOAD__CIRCUIT;

	/**
	 * The feature id for the '<em><b>Direction</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int PHASOR_LOAD__DIRECTION = CIRCUIT_LOAD__DIRECTION;

	/**
	 * The feature id for the '<em><b>Phasors</b></em>' containment reference list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int PHASOR_LOAD__PHASORS = CIRCUIT_LOAD_FEATURE_COUNT + 0;

	/**
	 * The number of structural features of the '<em>Phasor Load</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int PHASOR_LOAD_FEATURE_COUNT = CIRCUIT_LOAD_FEATURE_COUNT + 1;

	/**
	 * The number of operations of the '<em>Phasor Load</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int PHASOR_LOAD_OPERATION_COUNT = CIRCUIT_LOAD_OPERATION_COUNT + 0;

	/**
	 * The meta object id for the '{@link spanfield.model.impl.PhasePhasorImpl <em>Phase Phasor</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see spanfield.model.impl.PhasePhasorImpl
	 * @see spanfield.model.impl.SpanfieldPackageImpl#getPhasePhasor()
	 * @generated
	 */
	int PHASE_PHASOR = 31;

	/**
	 * The feature id for the '<em><b>Phase</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int PHASE_PHASOR__PHASE = 0;

	/**
	 * The feature id for the '<em><b>Current Amperes</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int PHASE_PHASOR__CURRENT_AMPERES = 1;

	/**
	 * The feature id for the '<em><b>Angle Degrees</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int PHASE_PHASOR__ANGLE_DEGREES = 2;

	/**
	 * The number of structural features of the '<em>Phase Phasor</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int PHASE_PHASOR_FEATURE_COUNT = 3;

	/**
	 * The number of operations of the '<em>Phase Phasor</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int PHASE_PHASOR_OPERATION_COUNT = 0;

	/**
	 * The meta object id for the '{@link spanfield.model.impl.ProfileStationImpl <em>Profile Station</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see spanfield.model.impl.ProfileStationImpl
	 * @see spanfield.model.impl.SpanfieldPackageImpl#getProfileStation()
	 * @generated
	 */
	int PROFILE_STATION = 32;

	/**
	 * The feature id for the '<em><b>Id</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int PROFILE_STATION__ID = NAMED_ELEMENT__ID;

	/**
	 * The feature id for the '<em><b>Name</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int PROFILE_STATION__NAME = NAMED_ELEMENT__NAME;

	/**
	 * The feature id for the '<em><b>Notes</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int PROFILE_STATION__NOTES = NAMED_ELEMENT__NOTES;

	/**
	 * The feature id for the '<em><b>Station Metres</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int PROFILE_STATION__STATION_METRES = NAMED_ELEMENT_FEATURE_COUNT + 0;

	/**
	 * The feature id for the '<em><b>From Offset Metres</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int PROFILE_STATION__FROM_OFFSET_METRES = NAMED_ELEMENT_FEATURE_COUNT + 1;

	/**
	 * The feature id for the '<em><b>To Offset Metres</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int PROFILE_STATION__TO_OFFSET_METRES = NAMED_ELEMENT_FEATURE_COUNT + 2;

	/**
	 * The feature id for the '<em><b>Spacing Metres</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int PROFILE_STATION__SPACING_METRES = NAMED_ELEMENT_FEATURE_COUNT + 3;

	/**
	 * The number of structural features of the '<em>Profile Station</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int PROFILE_STATION_FEATURE_COUNT = NAMED_ELEMENT_FEATURE_COUNT + 4;

	/**
	 * The number of operations of the '<em>Profile Station</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int PROFILE_STATION_OPERATION_COUNT = NAMED_ELEMENT_OPERATION_COUNT + 0;

	/**
	 * The meta object id for the '{@link spanfield.model.impl.FieldLimitImpl <em>Field Limit</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see spanfield.model.impl.FieldLimitImpl
	 * @see spanfield.model.impl.SpanfieldPackageImpl#getFieldLimit()
	 * @generated
	 */
	int FIELD_LIMIT = 33;

	/**
	 * The feature id for the '<em><b>Id</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int FIELD_LIMIT__ID = NAMED_ELEMENT__ID;

	/**
	 * The feature id for the '<em><b>Name</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int FIELD_LIMIT__NAME = NAMED_ELEMENT__NAME;

	/**
	 * The feature id for the '<em><b>Notes</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int FIELD_LIMIT__NOTES = NAMED_ELEMENT__NOTES;

	/**
	 * The feature id for the '<em><b>Quantity</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int FIELD_LIMIT__QUANTITY = NAMED_ELEMENT_FEATURE_COUNT + 0;

	/**
	 * The feature id for the '<em><b>Measure</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int FIELD_LIMIT__MEASURE = NAMED_ELEMENT_FEATURE_COUNT + 1;

	/**
	 * The feature id for the '<em><b>Level</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int FIELD_LIMIT__LEVEL = NAMED_ELEMENT_FEATURE_COUNT + 2;

	/**
	 * The feature id for the '<em><b>Place</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int FIELD_LIMIT__PLACE = NAMED_ELEMENT_FEATURE_COUNT + 3;

	/**
	 * The feature id for the '<em><b>Body</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int FIELD_LIMIT__BODY = NAMED_ELEMENT_FEATURE_COUNT + 4;

	/**
	 * The feature id for the '<em><b>Edition</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int FIELD_LIMIT__EDITION = NAMED_ELEMENT_FEATURE_COUNT + 5;

	/**
	 * The feature id for the '<em><b>Load Condition</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int FIELD_LIMIT__LOAD_CONDITION = NAMED_ELEMENT_FEATURE_COUNT + 6;

	/**
	 * The feature id for the '<em><b>Basis</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int FIELD_LIMIT__BASIS = NAMED_ELEMENT_FEATURE_COUNT + 7;

	/**
	 * The number of structural features of the '<em>Field Limit</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int FIELD_LIMIT_FEATURE_COUNT = NAMED_ELEMENT_FEATURE_COUNT + 8;

	/**
	 * The number of operations of the '<em>Field Limit</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int FIELD_LIMIT_OPERATION_COUNT = NAMED_ELEMENT_OPERATION_COUNT + 0;

	/**
	 * The meta object id for the '{@link spanfield.model.impl.SurveyImpl <em>Survey</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see spanfield.model.impl.SurveyImpl
	 * @see spanfield.model.impl.SpanfieldPackageImpl#getSurvey()
	 * @generated
	 */
	int SURVEY = 34;

	/**
	 * The feature id for the '<em><b>Id</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int SURVEY__ID = NAMED_ELEMENT__ID;

	/**
	 * The feature id for the '<em><b>Name</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int SURVEY__NAME = NAMED_ELEMENT__NAME;

	/**
	 * The feature id for the '<em><b>Notes</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int SURVEY__NOTES = NAMED_ELEMENT__NOTES;

	/**
	 * The feature id for the '<em><b>Date</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int SURVEY__DATE = NAMED_ELEMENT_FEATURE_COUNT + 0;

	/**
	 * The feature id for the '<em><b>Instrument</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int SURVEY__INSTRUMENT = NAMED_ELEMENT_FEATURE_COUNT + 1;

	/**
	 * The feature id for the '<em><b>Relative Uncertainty</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int SURVEY__RELATIVE_UNCERTAINTY = NAMED_ELEMENT_FEATURE_COUNT + 2;

	/**
	 * The feature id for the '<em><b>Readings</b></em>' containment reference list.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int SURVEY__READINGS = NAMED_ELEMENT_FEATURE_COUNT + 3;

	/**
	 * The number of structural features of the '<em>Survey</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int SURVEY_FEATURE_COUNT = NAMED_ELEMENT_FEATURE_COUNT + 4;

	/**
	 * The number of operations of the '<em>Survey</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int SURVEY_OPERATION_COUNT = NAMED_ELEMENT_OPERATION_COUNT + 0;

	/**
	 * The meta object id for the '{@link spanfield.model.impl.SurveyReadingImpl <em>Survey Reading</em>}' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see spanfield.model.impl.SurveyReadingImpl
	 * @see spanfield.model.impl.SpanfieldPackageImpl#getSurveyReading()
	 * @generated
	 */
	int SURVEY_READING = 35;

	/**
	 * The feature id for the '<em><b>Station Metres</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int SURVEY_READING__STATION_METRES = 0;

	/**
	 * The feature id for the '<em><b>Offset Metres</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int SURVEY_READING__OFFSET_METRES = 1;

	/**
	 * The feature id for the '<em><b>Height Metres</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int SURVEY_READING__HEIGHT_METRES = 2;

	/**
	 * The feature id for the '<em><b>Resultant Tesla</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int SURVEY_READING__RESULTANT_TESLA = 3;

	/**
	 * The number of structural features of the '<em>Survey Reading</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int SURVEY_READING_FEATURE_COUNT = 4;

	/**
	 * The number of operations of the '<em>Survey Reading</em>' class.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 * @ordered
	 */
	int SURVEY_READING_OPERATION_COUNT = 0;

	/**
	 * The meta object id for the '{@link spanfield.model.EarthModel <em>Earth Model</em>}' enum.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see spanfield.model.EarthModel
	 * @see spanfield.model.impl.SpanfieldPackageImpl#getEarthModel()
	 * @generated
	 */
	int EARTH_MODEL = 36;

	/**
	 * The meta object id for the '{@link spanfield.model.ImpedanceFormula <em>Impedance Formula</em>}' enum.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see spanfield.model.ImpedanceFormula
	 * @see spanfield.model.impl.SpanfieldPackageImpl#getImpedanceFormula()
	 * @generated
	 */
	int IMPEDANCE_FORMULA = 37;

	/**
	 * The meta object id for the '{@link spanfield.model.AttachmentRole <em>Attachment Role</em>}' enum.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see spanfield.model.AttachmentRole
	 * @see spanfield.model.impl.SpanfieldPackageImpl#getAttachmentRole()
	 * @generated
	 */
	int ATTACHMENT_ROLE = 38;

	/**
	 * The meta object id for the '{@link spanfield.model.LineEnd <em>Line End</em>}' enum.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see spanfield.model.LineEnd
	 * @see spanfield.model.impl.SpanfieldPackageImpl#getLineEnd()
	 * @generated
	 */
	int LINE_END = 39;

	/**
	 * The meta object id for the '{@link spanfield.model.Bonding <em>Bonding</em>}' enum.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see spanfield.model.Bonding
	 * @see spanfield.model.impl.SpanfieldPackageImpl#getBonding()
	 * @generated
	 */
	int BONDING = 40;

	/**
	 * The meta object id for the '{@link spanfield.model.Phasing <em>Phasing</em>}' enum.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see spanfield.model.Phasing
	 * @see spanfield.model.impl.SpanfieldPackageImpl#getPhasing()
	 * @generated
	 */
	int PHASING = 41;

	/**
	 * The meta object id for the '{@link spanfield.model.FlowDirection <em>Flow Direction</em>}' enum.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see spanfield.model.FlowDirection
	 * @see spanfield.model.impl.SpanfieldPackageImpl#getFlowDirection()
	 * @generated
	 */
	int FLOW_DIRECTION = 42;

	/**
	 * The meta object id for the '{@link spanfield.model.FieldQuantity <em>Field Quantity</em>}' enum.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see spanfield.model.FieldQuantity
	 * @see spanfield.model.impl.SpanfieldPackageImpl#getFieldQuantity()
	 * @generated
	 */
	int FIELD_QUANTITY = 43;

	/**
	 * The meta object id for the '{@link spanfield.model.FieldMeasure <em>Field Measure</em>}' enum.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see spanfield.model.FieldMeasure
	 * @see spanfield.model.impl.SpanfieldPackageImpl#getFieldMeasure()
	 * @generated
	 */
	int FIELD_MEASURE = 44;

	/**
	 * The meta object id for the '{@link spanfield.model.LimitPlace <em>Limit Place</em>}' enum.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see spanfield.model.LimitPlace
	 * @see spanfield.model.impl.SpanfieldPackageImpl#getLimitPlace()
	 * @generated
	 */
	int LIMIT_PLACE = 45;

	/**
	 * The meta object id for the '{@link spanfield.model.LimitBasis <em>Limit Basis</em>}' enum.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see spanfield.model.LimitBasis
	 * @see spanfield.model.impl.SpanfieldPackageImpl#getLimitBasis()
	 * @generated
	 */
	int LIMIT_BASIS = 46;


	/**
	 * Returns the meta object for class '{@link spanfield.model.NamedElement <em>Named Element</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Named Element</em>'.
	 * @see spanfield.model.NamedElement
	 * @generated
	 */
	EClass getNamedElement();

	/**
	 * Returns the meta object for the attribute '{@link spanfield.model.NamedElement#getId <em>Id</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Id</em>'.
	 * @see spanfield.model.NamedElement#getId()
	 * @see #getNamedElement()
	 * @generated
	 */
	EAttribute getNamedElement_Id();

	/**
	 * Returns the meta object for the attribute '{@link spanfield.model.NamedElement#getName <em>Name</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Name</em>'.
	 * @see spanfield.model.NamedElement#getName()
	 * @see #getNamedElement()
	 * @generated
	 */
	EAttribute getNamedElement_Name();

	/**
	 * Returns the meta object for the attribute '{@link spanfield.model.NamedElement#getNotes <em>Notes</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Notes</em>'.
	 * @see spanfield.model.NamedElement#getNotes()
	 * @see #getNamedElement()
	 * @generated
	 */
	EAttribute getNamedElement_Notes();

	/**
	 * Returns the meta object for class '{@link spanfield.model.Study <em>Study</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Study</em>'.
	 * @see spanfield.model.Study
	 * @generated
	 */
	EClass getStudy();

	/**
	 * Returns the meta object for the attribute '{@link spanfield.model.Study#getAuthor <em>Author</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Author</em>'.
	 * @see spanfield.model.Study#getAuthor()
	 * @see #getStudy()
	 * @generated
	 */
	EAttribute getStudy_Author();

	/**
	 * Returns the meta object for the attribute '{@link spanfield.model.Study#getOrganisation <em>Organisation</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Organisation</em>'.
	 * @see spanfield.model.Study#getOrganisation()
	 * @see #getStudy()
	 * @generated
	 */
	EAttribute getStudy_Organisation();

	/**
	 * Returns the meta object for the attribute '{@link spanfield.model.Study#getDate <em>Date</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Date</em>'.
	 * @see spanfield.model.Study#getDate()
	 * @see #getStudy()
	 * @generated
	 */
	EAttribute getStudy_Date();

	/**
	 * Returns the meta object for the attribute '{@link spanfield.model.Study#getFrequencyHertz <em>Frequency Hertz</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Frequency Hertz</em>'.
	 * @see spanfield.model.Study#getFrequencyHertz()
	 * @see #getStudy()
	 * @generated
	 */
	EAttribute getStudy_FrequencyHertz();

	/**
	 * Returns the meta object for the attribute '{@link spanfield.model.Study#getEarthResistivityOhmMetres <em>Earth Resistivity Ohm Metres</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Earth Resistivity Ohm Metres</em>'.
	 * @see spanfield.model.Study#getEarthResistivityOhmMetres()
	 * @see #getStudy()
	 * @generated
	 */
	EAttribute getStudy_EarthResistivityOhmMetres();

	/**
	 * Returns the meta object for the attribute '{@link spanfield.model.Study#getEarthModel <em>Earth Model</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Earth Model</em>'.
	 * @see spanfield.model.Study#getEarthModel()
	 * @see #getStudy()
	 * @generated
	 */
	EAttribute getStudy_EarthModel();

	/**
	 * Returns the meta object for the attribute '{@link spanfield.model.Study#getImpedanceFormula <em>Impedance Formula</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Impedance Formula</em>'.
	 * @see spanfield.model.Study#getImpedanceFormula()
	 * @see #getStudy()
	 * @generated
	 */
	EAttribute getStudy_ImpedanceFormula();

	/**
	 * Returns the meta object for the attribute '{@link spanfield.model.Study#getReferenceHeightMetres <em>Reference Height Metres</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Reference Height Metres</em>'.
	 * @see spanfield.model.Study#getReferenceHeightMetres()
	 * @see #getStudy()
	 * @generated
	 */
	EAttribute getStudy_ReferenceHeightMetres();

	/**
	 * Returns the meta object for the attribute '{@link spanfield.model.Study#getRelativeAccuracy <em>Relative Accuracy</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Relative Accuracy</em>'.
	 * @see spanfield.model.Study#getRelativeAccuracy()
	 * @see #getStudy()
	 * @generated
	 */
	EAttribute getStudy_RelativeAccuracy();

	/**
	 * Returns the meta object for the containment reference '{@link spanfield.model.Study#getCorridor <em>Corridor</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the containment reference '<em>Corridor</em>'.
	 * @see spanfield.model.Study#getCorridor()
	 * @see #getStudy()
	 * @generated
	 */
	EReference getStudy_Corridor();

	/**
	 * Returns the meta object for the containment reference list '{@link spanfield.model.Study#getConductors <em>Conductors</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the containment reference list '<em>Conductors</em>'.
	 * @see spanfield.model.Study#getConductors()
	 * @see #getStudy()
	 * @generated
	 */
	EReference getStudy_Conductors();

	/**
	 * Returns the meta object for the containment reference list '{@link spanfield.model.Study#getStructureTypes <em>Structure Types</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the containment reference list '<em>Structure Types</em>'.
	 * @see spanfield.model.Study#getStructureTypes()
	 * @see #getStudy()
	 * @generated
	 */
	EReference getStudy_StructureTypes();

	/**
	 * Returns the meta object for the containment reference list '{@link spanfield.model.Study#getLines <em>Lines</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the containment reference list '<em>Lines</em>'.
	 * @see spanfield.model.Study#getLines()
	 * @see #getStudy()
	 * @generated
	 */
	EReference getStudy_Lines();

	/**
	 * Returns the meta object for the containment reference list '{@link spanfield.model.Study#getLoadCases <em>Load Cases</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the containment reference list '<em>Load Cases</em>'.
	 * @see spanfield.model.Study#getLoadCases()
	 * @see #getStudy()
	 * @generated
	 */
	EReference getStudy_LoadCases();

	/**
	 * Returns the meta object for the containment reference list '{@link spanfield.model.Study#getStations <em>Stations</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the containment reference list '<em>Stations</em>'.
	 * @see spanfield.model.Study#getStations()
	 * @see #getStudy()
	 * @generated
	 */
	EReference getStudy_Stations();

	/**
	 * Returns the meta object for the containment reference list '{@link spanfield.model.Study#getLimits <em>Limits</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the containment reference list '<em>Limits</em>'.
	 * @see spanfield.model.Study#getLimits()
	 * @see #getStudy()
	 * @generated
	 */
	EReference getStudy_Limits();

	/**
	 * Returns the meta object for the containment reference list '{@link spanfield.model.Study#getSurveys <em>Surveys</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the containment reference list '<em>Surveys</em>'.
	 * @see spanfield.model.Study#getSurveys()
	 * @see #getStudy()
	 * @generated
	 */
	EReference getStudy_Surveys();

	/**
	 * Returns the meta object for class '{@link spanfield.model.Corridor <em>Corridor</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Corridor</em>'.
	 * @see spanfield.model.Corridor
	 * @generated
	 */
	EClass getCorridor();

	/**
	 * Returns the meta object for the attribute '{@link spanfield.model.Corridor#getCrossSlope <em>Cross Slope</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Cross Slope</em>'.
	 * @see spanfield.model.Corridor#getCrossSlope()
	 * @see #getCorridor()
	 * @generated
	 */
	EAttribute getCorridor_CrossSlope();

	/**
	 * Returns the meta object for the containment reference list '{@link spanfield.model.Corridor#getEdges <em>Edges</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the containment reference list '<em>Edges</em>'.
	 * @see spanfield.model.Corridor#getEdges()
	 * @see #getCorridor()
	 * @generated
	 */
	EReference getCorridor_Edges();

	/**
	 * Returns the meta object for the containment reference list '{@link spanfield.model.Corridor#getGroundPoints <em>Ground Points</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the containment reference list '<em>Ground Points</em>'.
	 * @see spanfield.model.Corridor#getGroundPoints()
	 * @see #getCorridor()
	 * @generated
	 */
	EReference getCorridor_GroundPoints();

	/**
	 * Returns the meta object for the containment reference list '{@link spanfield.model.Corridor#getCentrelineElevations <em>Centreline Elevations</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the containment reference list '<em>Centreline Elevations</em>'.
	 * @see spanfield.model.Corridor#getCentrelineElevations()
	 * @see #getCorridor()
	 * @generated
	 */
	EReference getCorridor_CentrelineElevations();

	/**
	 * Returns the meta object for the containment reference list '{@link spanfield.model.Corridor#getBends <em>Bends</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the containment reference list '<em>Bends</em>'.
	 * @see spanfield.model.Corridor#getBends()
	 * @see #getCorridor()
	 * @generated
	 */
	EReference getCorridor_Bends();

	/**
	 * Returns the meta object for class '{@link spanfield.model.EdgePoint <em>Edge Point</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Edge Point</em>'.
	 * @see spanfield.model.EdgePoint
	 * @generated
	 */
	EClass getEdgePoint();

	/**
	 * Returns the meta object for the attribute '{@link spanfield.model.EdgePoint#getStationMetres <em>Station Metres</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Station Metres</em>'.
	 * @see spanfield.model.EdgePoint#getStationMetres()
	 * @see #getEdgePoint()
	 * @generated
	 */
	EAttribute getEdgePoint_StationMetres();

	/**
	 * Returns the meta object for the attribute '{@link spanfield.model.EdgePoint#getLeftOffsetMetres <em>Left Offset Metres</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Left Offset Metres</em>'.
	 * @see spanfield.model.EdgePoint#getLeftOffsetMetres()
	 * @see #getEdgePoint()
	 * @generated
	 */
	EAttribute getEdgePoint_LeftOffsetMetres();

	/**
	 * Returns the meta object for the attribute '{@link spanfield.model.EdgePoint#getRightOffsetMetres <em>Right Offset Metres</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Right Offset Metres</em>'.
	 * @see spanfield.model.EdgePoint#getRightOffsetMetres()
	 * @see #getEdgePoint()
	 * @generated
	 */
	EAttribute getEdgePoint_RightOffsetMetres();

	/**
	 * Returns the meta object for class '{@link spanfield.model.GroundPoint <em>Ground Point</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Ground Point</em>'.
	 * @see spanfield.model.GroundPoint
	 * @generated
	 */
	EClass getGroundPoint();

	/**
	 * Returns the meta object for the attribute '{@link spanfield.model.GroundPoint#getOffsetMetres <em>Offset Metres</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Offset Metres</em>'.
	 * @see spanfield.model.GroundPoint#getOffsetMetres()
	 * @see #getGroundPoint()
	 * @generated
	 */
	EAttribute getGroundPoint_OffsetMetres();

	/**
	 * Returns the meta object for the attribute '{@link spanfield.model.GroundPoint#getElevationMetres <em>Elevation Metres</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Elevation Metres</em>'.
	 * @see spanfield.model.GroundPoint#getElevationMetres()
	 * @see #getGroundPoint()
	 * @generated
	 */
	EAttribute getGroundPoint_ElevationMetres();

	/**
	 * Returns the meta object for class '{@link spanfield.model.ElevationPoint <em>Elevation Point</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Elevation Point</em>'.
	 * @see spanfield.model.ElevationPoint
	 * @generated
	 */
	EClass getElevationPoint();

	/**
	 * Returns the meta object for the attribute '{@link spanfield.model.ElevationPoint#getStationMetres <em>Station Metres</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Station Metres</em>'.
	 * @see spanfield.model.ElevationPoint#getStationMetres()
	 * @see #getElevationPoint()
	 * @generated
	 */
	EAttribute getElevationPoint_StationMetres();

	/**
	 * Returns the meta object for the attribute '{@link spanfield.model.ElevationPoint#getElevationMetres <em>Elevation Metres</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Elevation Metres</em>'.
	 * @see spanfield.model.ElevationPoint#getElevationMetres()
	 * @see #getElevationPoint()
	 * @generated
	 */
	EAttribute getElevationPoint_ElevationMetres();

	/**
	 * Returns the meta object for class '{@link spanfield.model.AlignmentBend <em>Alignment Bend</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Alignment Bend</em>'.
	 * @see spanfield.model.AlignmentBend
	 * @generated
	 */
	EClass getAlignmentBend();

	/**
	 * Returns the meta object for the attribute '{@link spanfield.model.AlignmentBend#getStationMetres <em>Station Metres</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Station Metres</em>'.
	 * @see spanfield.model.AlignmentBend#getStationMetres()
	 * @see #getAlignmentBend()
	 * @generated
	 */
	EAttribute getAlignmentBend_StationMetres();

	/**
	 * Returns the meta object for the attribute '{@link spanfield.model.AlignmentBend#getDeflectionDegrees <em>Deflection Degrees</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Deflection Degrees</em>'.
	 * @see spanfield.model.AlignmentBend#getDeflectionDegrees()
	 * @see #getAlignmentBend()
	 * @generated
	 */
	EAttribute getAlignmentBend_DeflectionDegrees();

	/**
	 * Returns the meta object for class '{@link spanfield.model.Conductor <em>Conductor</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Conductor</em>'.
	 * @see spanfield.model.Conductor
	 * @generated
	 */
	EClass getConductor();

	/**
	 * Returns the meta object for the attribute '{@link spanfield.model.Conductor#getDiameterMetres <em>Diameter Metres</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Diameter Metres</em>'.
	 * @see spanfield.model.Conductor#getDiameterMetres()
	 * @see #getConductor()
	 * @generated
	 */
	EAttribute getConductor_DiameterMetres();

	/**
	 * Returns the meta object for the attribute '{@link spanfield.model.Conductor#getGeometricMeanRadiusMetres <em>Geometric Mean Radius Metres</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Geometric Mean Radius Metres</em>'.
	 * @see spanfield.model.Conductor#getGeometricMeanRadiusMetres()
	 * @see #getConductor()
	 * @generated
	 */
	EAttribute getConductor_GeometricMeanRadiusMetres();

	/**
	 * Returns the meta object for the attribute '{@link spanfield.model.Conductor#getLowTemperatureCelsius <em>Low Temperature Celsius</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Low Temperature Celsius</em>'.
	 * @see spanfield.model.Conductor#getLowTemperatureCelsius()
	 * @see #getConductor()
	 * @generated
	 */
	EAttribute getConductor_LowTemperatureCelsius();

	/**
	 * Returns the meta object for the attribute '{@link spanfield.model.Conductor#getLowResistanceOhmsPerMetre <em>Low Resistance Ohms Per Metre</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Low Resistance Ohms Per Metre</em>'.
	 * @see spanfield.model.Conductor#getLowResistanceOhmsPerMetre()
	 * @see #getConductor()
	 * @generated
	 */
	EAttribute getConductor_LowResistanceOhmsPerMetre();

	/**
	 * Returns the meta object for the attribute '{@link spanfield.model.Conductor#getHighTemperatureCelsius <em>High Temperature Celsius</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>High Temperature Celsius</em>'.
	 * @see spanfield.model.Conductor#getHighTemperatureCelsius()
	 * @see #getConductor()
	 * @generated
	 */
	EAttribute getConductor_HighTemperatureCelsius();

	/**
	 * Returns the meta object for the attribute '{@link spanfield.model.Conductor#getHighResistanceOhmsPerMetre <em>High Resistance Ohms Per Metre</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>High Resistance Ohms Per Metre</em>'.
	 * @see spanfield.model.Conductor#getHighResistanceOhmsPerMetre()
	 * @see #getConductor()
	 * @generated
	 */
	EAttribute getConductor_HighResistanceOhmsPerMetre();

	/**
	 * Returns the meta object for the attribute '{@link spanfield.model.Conductor#getMassKilogramsPerMetre <em>Mass Kilograms Per Metre</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Mass Kilograms Per Metre</em>'.
	 * @see spanfield.model.Conductor#getMassKilogramsPerMetre()
	 * @see #getConductor()
	 * @generated
	 */
	EAttribute getConductor_MassKilogramsPerMetre();

	/**
	 * Returns the meta object for the attribute '{@link spanfield.model.Conductor#getAreaSquareMetres <em>Area Square Metres</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Area Square Metres</em>'.
	 * @see spanfield.model.Conductor#getAreaSquareMetres()
	 * @see #getConductor()
	 * @generated
	 */
	EAttribute getConductor_AreaSquareMetres();

	/**
	 * Returns the meta object for the attribute '{@link spanfield.model.Conductor#getElasticModulusPascals <em>Elastic Modulus Pascals</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Elastic Modulus Pascals</em>'.
	 * @see spanfield.model.Conductor#getElasticModulusPascals()
	 * @see #getConductor()
	 * @generated
	 */
	EAttribute getConductor_ElasticModulusPascals();

	/**
	 * Returns the meta object for the attribute '{@link spanfield.model.Conductor#getThermalExpansionPerKelvin <em>Thermal Expansion Per Kelvin</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Thermal Expansion Per Kelvin</em>'.
	 * @see spanfield.model.Conductor#getThermalExpansionPerKelvin()
	 * @see #getConductor()
	 * @generated
	 */
	EAttribute getConductor_ThermalExpansionPerKelvin();

	/**
	 * Returns the meta object for the attribute '{@link spanfield.model.Conductor#getRatedStrengthNewtons <em>Rated Strength Newtons</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Rated Strength Newtons</em>'.
	 * @see spanfield.model.Conductor#getRatedStrengthNewtons()
	 * @see #getConductor()
	 * @generated
	 */
	EAttribute getConductor_RatedStrengthNewtons();

	/**
	 * Returns the meta object for the attribute '{@link spanfield.model.Conductor#getEmissivity <em>Emissivity</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Emissivity</em>'.
	 * @see spanfield.model.Conductor#getEmissivity()
	 * @see #getConductor()
	 * @generated
	 */
	EAttribute getConductor_Emissivity();

	/**
	 * Returns the meta object for the attribute '{@link spanfield.model.Conductor#getAbsorptivity <em>Absorptivity</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Absorptivity</em>'.
	 * @see spanfield.model.Conductor#getAbsorptivity()
	 * @see #getConductor()
	 * @generated
	 */
	EAttribute getConductor_Absorptivity();

	/**
	 * Returns the meta object for class '{@link spanfield.model.StructureType <em>Structure Type</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Structure Type</em>'.
	 * @see spanfield.model.StructureType
	 * @generated
	 */
	EClass getStructureType();

	/**
	 * Returns the meta object for the containment reference list '{@link spanfield.model.StructureType#getAttachments <em>Attachments</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the containment reference list '<em>Attachments</em>'.
	 * @see spanfield.model.StructureType#getAttachments()
	 * @see #getStructureType()
	 * @generated
	 */
	EReference getStructureType_Attachments();

	/**
	 * Returns the meta object for the containment reference list '{@link spanfield.model.StructureType#getOutline <em>Outline</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the containment reference list '<em>Outline</em>'.
	 * @see spanfield.model.StructureType#getOutline()
	 * @see #getStructureType()
	 * @generated
	 */
	EReference getStructureType_Outline();

	/**
	 * Returns the meta object for class '{@link spanfield.model.Attachment <em>Attachment</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Attachment</em>'.
	 * @see spanfield.model.Attachment
	 * @generated
	 */
	EClass getAttachment();

	/**
	 * Returns the meta object for the attribute '{@link spanfield.model.Attachment#getName <em>Name</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Name</em>'.
	 * @see spanfield.model.Attachment#getName()
	 * @see #getAttachment()
	 * @generated
	 */
	EAttribute getAttachment_Name();

	/**
	 * Returns the meta object for the attribute '{@link spanfield.model.Attachment#getRole <em>Role</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Role</em>'.
	 * @see spanfield.model.Attachment#getRole()
	 * @see #getAttachment()
	 * @generated
	 */
	EAttribute getAttachment_Role();

	/**
	 * Returns the meta object for the attribute '{@link spanfield.model.Attachment#getOffsetMetres <em>Offset Metres</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Offset Metres</em>'.
	 * @see spanfield.model.Attachment#getOffsetMetres()
	 * @see #getAttachment()
	 * @generated
	 */
	EAttribute getAttachment_OffsetMetres();

	/**
	 * Returns the meta object for the attribute '{@link spanfield.model.Attachment#getHeightMetres <em>Height Metres</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Height Metres</em>'.
	 * @see spanfield.model.Attachment#getHeightMetres()
	 * @see #getAttachment()
	 * @generated
	 */
	EAttribute getAttachment_HeightMetres();

	/**
	 * Returns the meta object for the attribute '{@link spanfield.model.Attachment#getInsulatorLengthMetres <em>Insulator Length Metres</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Insulator Length Metres</em>'.
	 * @see spanfield.model.Attachment#getInsulatorLengthMetres()
	 * @see #getAttachment()
	 * @generated
	 */
	EAttribute getAttachment_InsulatorLengthMetres();

	/**
	 * Returns the meta object for class '{@link spanfield.model.OutlineStroke <em>Outline Stroke</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Outline Stroke</em>'.
	 * @see spanfield.model.OutlineStroke
	 * @generated
	 */
	EClass getOutlineStroke();

	/**
	 * Returns the meta object for the containment reference list '{@link spanfield.model.OutlineStroke#getPoints <em>Points</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the containment reference list '<em>Points</em>'.
	 * @see spanfield.model.OutlineStroke#getPoints()
	 * @see #getOutlineStroke()
	 * @generated
	 */
	EReference getOutlineStroke_Points();

	/**
	 * Returns the meta object for class '{@link spanfield.model.OutlinePoint <em>Outline Point</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Outline Point</em>'.
	 * @see spanfield.model.OutlinePoint
	 * @generated
	 */
	EClass getOutlinePoint();

	/**
	 * Returns the meta object for the attribute '{@link spanfield.model.OutlinePoint#getOffsetMetres <em>Offset Metres</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Offset Metres</em>'.
	 * @see spanfield.model.OutlinePoint#getOffsetMetres()
	 * @see #getOutlinePoint()
	 * @generated
	 */
	EAttribute getOutlinePoint_OffsetMetres();

	/**
	 * Returns the meta object for the attribute '{@link spanfield.model.OutlinePoint#getHeightMetres <em>Height Metres</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Height Metres</em>'.
	 * @see spanfield.model.OutlinePoint#getHeightMetres()
	 * @see #getOutlinePoint()
	 * @generated
	 */
	EAttribute getOutlinePoint_HeightMetres();

	/**
	 * Returns the meta object for class '{@link spanfield.model.Line <em>Line</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Line</em>'.
	 * @see spanfield.model.Line
	 * @generated
	 */
	EClass getLine();

	/**
	 * Returns the meta object for the containment reference list '{@link spanfield.model.Line#getStructures <em>Structures</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the containment reference list '<em>Structures</em>'.
	 * @see spanfield.model.Line#getStructures()
	 * @see #getLine()
	 * @generated
	 */
	EReference getLine_Structures();

	/**
	 * Returns the meta object for the containment reference list '{@link spanfield.model.Line#getSections <em>Sections</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the containment reference list '<em>Sections</em>'.
	 * @see spanfield.model.Line#getSections()
	 * @see #getLine()
	 * @generated
	 */
	EReference getLine_Sections();

	/**
	 * Returns the meta object for the containment reference list '{@link spanfield.model.Line#getCircuits <em>Circuits</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the containment reference list '<em>Circuits</em>'.
	 * @see spanfield.model.Line#getCircuits()
	 * @see #getLine()
	 * @generated
	 */
	EReference getLine_Circuits();

	/**
	 * Returns the meta object for the containment reference list '{@link spanfield.model.Line#getShieldWires <em>Shield Wires</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the containment reference list '<em>Shield Wires</em>'.
	 * @see spanfield.model.Line#getShieldWires()
	 * @see #getLine()
	 * @generated
	 */
	EReference getLine_ShieldWires();

	/**
	 * Returns the meta object for the attribute '{@link spanfield.model.Line#getStartEnd <em>Start End</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Start End</em>'.
	 * @see spanfield.model.Line#getStartEnd()
	 * @see #getLine()
	 * @generated
	 */
	EAttribute getLine_StartEnd();

	/**
	 * Returns the meta object for the attribute '{@link spanfield.model.Line#getFinishEnd <em>Finish End</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Finish End</em>'.
	 * @see spanfield.model.Line#getFinishEnd()
	 * @see #getLine()
	 * @generated
	 */
	EAttribute getLine_FinishEnd();

	/**
	 * Returns the meta object for class '{@link spanfield.model.Structure <em>Structure</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Structure</em>'.
	 * @see spanfield.model.Structure
	 * @generated
	 */
	EClass getStructure();

	/**
	 * Returns the meta object for the reference '{@link spanfield.model.Structure#getType <em>Type</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the reference '<em>Type</em>'.
	 * @see spanfield.model.Structure#getType()
	 * @see #getStructure()
	 * @generated
	 */
	EReference getStructure_Type();

	/**
	 * Returns the meta object for the attribute '{@link spanfield.model.Structure#getStationMetres <em>Station Metres</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Station Metres</em>'.
	 * @see spanfield.model.Structure#getStationMetres()
	 * @see #getStructure()
	 * @generated
	 */
	EAttribute getStructure_StationMetres();

	/**
	 * Returns the meta object for the attribute '{@link spanfield.model.Structure#getOffsetMetres <em>Offset Metres</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Offset Metres</em>'.
	 * @see spanfield.model.Structure#getOffsetMetres()
	 * @see #getStructure()
	 * @generated
	 */
	EAttribute getStructure_OffsetMetres();

	/**
	 * Returns the meta object for the attribute '{@link spanfield.model.Structure#getBaseElevationMetres <em>Base Elevation Metres</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Base Elevation Metres</em>'.
	 * @see spanfield.model.Structure#getBaseElevationMetres()
	 * @see #getStructure()
	 * @generated
	 */
	EAttribute getStructure_BaseElevationMetres();

	/**
	 * Returns the meta object for the attribute '{@link spanfield.model.Structure#getHeightAdjustmentMetres <em>Height Adjustment Metres</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Height Adjustment Metres</em>'.
	 * @see spanfield.model.Structure#getHeightAdjustmentMetres()
	 * @see #getStructure()
	 * @generated
	 */
	EAttribute getStructure_HeightAdjustmentMetres();

	/**
	 * Returns the meta object for the attribute '{@link spanfield.model.Structure#getTurnDegrees <em>Turn Degrees</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Turn Degrees</em>'.
	 * @see spanfield.model.Structure#getTurnDegrees()
	 * @see #getStructure()
	 * @generated
	 */
	EAttribute getStructure_TurnDegrees();

	/**
	 * Returns the meta object for class '{@link spanfield.model.StringingSection <em>Stringing Section</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Stringing Section</em>'.
	 * @see spanfield.model.StringingSection
	 * @generated
	 */
	EClass getStringingSection();

	/**
	 * Returns the meta object for the reference '{@link spanfield.model.StringingSection#getFrom <em>From</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the reference '<em>From</em>'.
	 * @see spanfield.model.StringingSection#getFrom()
	 * @see #getStringingSection()
	 * @generated
	 */
	EReference getStringingSection_From();

	/**
	 * Returns the meta object for the reference '{@link spanfield.model.StringingSection#getTo <em>To</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the reference '<em>To</em>'.
	 * @see spanfield.model.StringingSection#getTo()
	 * @see #getStringingSection()
	 * @generated
	 */
	EReference getStringingSection_To();

	/**
	 * Returns the meta object for the containment reference '{@link spanfield.model.StringingSection#getPhaseStringing <em>Phase Stringing</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the containment reference '<em>Phase Stringing</em>'.
	 * @see spanfield.model.StringingSection#getPhaseStringing()
	 * @see #getStringingSection()
	 * @generated
	 */
	EReference getStringingSection_PhaseStringing();

	/**
	 * Returns the meta object for the containment reference '{@link spanfield.model.StringingSection#getShieldStringing <em>Shield Stringing</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the containment reference '<em>Shield Stringing</em>'.
	 * @see spanfield.model.StringingSection#getShieldStringing()
	 * @see #getStringingSection()
	 * @generated
	 */
	EReference getStringingSection_ShieldStringing();

	/**
	 * Returns the meta object for the containment reference list '{@link spanfield.model.StringingSection#getExceptions <em>Exceptions</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the containment reference list '<em>Exceptions</em>'.
	 * @see spanfield.model.StringingSection#getExceptions()
	 * @see #getStringingSection()
	 * @generated
	 */
	EReference getStringingSection_Exceptions();

	/**
	 * Returns the meta object for class '{@link spanfield.model.WireStringing <em>Wire Stringing</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Wire Stringing</em>'.
	 * @see spanfield.model.WireStringing
	 * @generated
	 */
	EClass getWireStringing();

	/**
	 * Returns the meta object for the reference list '{@link spanfield.model.WireStringing#getWires <em>Wires</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the reference list '<em>Wires</em>'.
	 * @see spanfield.model.WireStringing#getWires()
	 * @see #getWireStringing()
	 * @generated
	 */
	EReference getWireStringing_Wires();

	/**
	 * Returns the meta object for the containment reference '{@link spanfield.model.WireStringing#getStringing <em>Stringing</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the containment reference '<em>Stringing</em>'.
	 * @see spanfield.model.WireStringing#getStringing()
	 * @see #getWireStringing()
	 * @generated
	 */
	EReference getWireStringing_Stringing();

	/**
	 * Returns the meta object for class '{@link spanfield.model.Stringing <em>Stringing</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Stringing</em>'.
	 * @see spanfield.model.Stringing
	 * @generated
	 */
	EClass getStringing();

	/**
	 * Returns the meta object for class '{@link spanfield.model.CatenaryStringing <em>Catenary Stringing</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Catenary Stringing</em>'.
	 * @see spanfield.model.CatenaryStringing
	 * @generated
	 */
	EClass getCatenaryStringing();

	/**
	 * Returns the meta object for the attribute '{@link spanfield.model.CatenaryStringing#getCatenaryConstantMetres <em>Catenary Constant Metres</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Catenary Constant Metres</em>'.
	 * @see spanfield.model.CatenaryStringing#getCatenaryConstantMetres()
	 * @see #getCatenaryStringing()
	 * @generated
	 */
	EAttribute getCatenaryStringing_CatenaryConstantMetres();

	/**
	 * Returns the meta object for class '{@link spanfield.model.SagStringing <em>Sag Stringing</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Sag Stringing</em>'.
	 * @see spanfield.model.SagStringing
	 * @generated
	 */
	EClass getSagStringing();

	/**
	 * Returns the meta object for the attribute '{@link spanfield.model.SagStringing#getSagMetres <em>Sag Metres</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Sag Metres</em>'.
	 * @see spanfield.model.SagStringing#getSagMetres()
	 * @see #getSagStringing()
	 * @generated
	 */
	EAttribute getSagStringing_SagMetres();

	/**
	 * Returns the meta object for class '{@link spanfield.model.TensionStringing <em>Tension Stringing</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Tension Stringing</em>'.
	 * @see spanfield.model.TensionStringing
	 * @generated
	 */
	EClass getTensionStringing();

	/**
	 * Returns the meta object for the attribute '{@link spanfield.model.TensionStringing#getHorizontalTensionNewtons <em>Horizontal Tension Newtons</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Horizontal Tension Newtons</em>'.
	 * @see spanfield.model.TensionStringing#getHorizontalTensionNewtons()
	 * @see #getTensionStringing()
	 * @generated
	 */
	EAttribute getTensionStringing_HorizontalTensionNewtons();

	/**
	 * Returns the meta object for class '{@link spanfield.model.ClearanceStringing <em>Clearance Stringing</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Clearance Stringing</em>'.
	 * @see spanfield.model.ClearanceStringing
	 * @generated
	 */
	EClass getClearanceStringing();

	/**
	 * Returns the meta object for the attribute '{@link spanfield.model.ClearanceStringing#getClearanceMetres <em>Clearance Metres</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Clearance Metres</em>'.
	 * @see spanfield.model.ClearanceStringing#getClearanceMetres()
	 * @see #getClearanceStringing()
	 * @generated
	 */
	EAttribute getClearanceStringing_ClearanceMetres();

	/**
	 * Returns the meta object for class '{@link spanfield.model.StrungElement <em>Strung Element</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Strung Element</em>'.
	 * @see spanfield.model.StrungElement
	 * @generated
	 */
	EClass getStrungElement();

	/**
	 * Returns the meta object for the reference '{@link spanfield.model.StrungElement#getConductor <em>Conductor</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the reference '<em>Conductor</em>'.
	 * @see spanfield.model.StrungElement#getConductor()
	 * @see #getStrungElement()
	 * @generated
	 */
	EReference getStrungElement_Conductor();

	/**
	 * Returns the meta object for class '{@link spanfield.model.Circuit <em>Circuit</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Circuit</em>'.
	 * @see spanfield.model.Circuit
	 * @generated
	 */
	EClass getCircuit();

	/**
	 * Returns the meta object for the attribute '{@link spanfield.model.Circuit#getNominalVoltageVolts <em>Nominal Voltage Volts</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Nominal Voltage Volts</em>'.
	 * @see spanfield.model.Circuit#getNominalVoltageVolts()
	 * @see #getCircuit()
	 * @generated
	 */
	EAttribute getCircuit_NominalVoltageVolts();

	/**
	 * Returns the meta object for the attribute '{@link spanfield.model.Circuit#getBundleCount <em>Bundle Count</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Bundle Count</em>'.
	 * @see spanfield.model.Circuit#getBundleCount()
	 * @see #getCircuit()
	 * @generated
	 */
	EAttribute getCircuit_BundleCount();

	/**
	 * Returns the meta object for the attribute '{@link spanfield.model.Circuit#getBundleSpacingMetres <em>Bundle Spacing Metres</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Bundle Spacing Metres</em>'.
	 * @see spanfield.model.Circuit#getBundleSpacingMetres()
	 * @see #getCircuit()
	 * @generated
	 */
	EAttribute getCircuit_BundleSpacingMetres();

	/**
	 * Returns the meta object for the attribute '{@link spanfield.model.Circuit#getPhasing <em>Phasing</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Phasing</em>'.
	 * @see spanfield.model.Circuit#getPhasing()
	 * @see #getCircuit()
	 * @generated
	 */
	EAttribute getCircuit_Phasing();

	/**
	 * Returns the meta object for the containment reference list '{@link spanfield.model.Circuit#getPhases <em>Phases</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the containment reference list '<em>Phases</em>'.
	 * @see spanfield.model.Circuit#getPhases()
	 * @see #getCircuit()
	 * @generated
	 */
	EReference getCircuit_Phases();

	/**
	 * Returns the meta object for class '{@link spanfield.model.Phase <em>Phase</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Phase</em>'.
	 * @see spanfield.model.Phase
	 * @generated
	 */
	EClass getPhase();

	/**
	 * Returns the meta object for the attribute '{@link spanfield.model.Phase#getLabel <em>Label</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Label</em>'.
	 * @see spanfield.model.Phase#getLabel()
	 * @see #getPhase()
	 * @generated
	 */
	EAttribute getPhase_Label();

	/**
	 * Returns the meta object for the attribute '{@link spanfield.model.Phase#getAngleDegrees <em>Angle Degrees</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Angle Degrees</em>'.
	 * @see spanfield.model.Phase#getAngleDegrees()
	 * @see #getPhase()
	 * @generated
	 */
	EAttribute getPhase_AngleDegrees();

	/**
	 * Returns the meta object for the attribute '{@link spanfield.model.Phase#getAttachment <em>Attachment</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Attachment</em>'.
	 * @see spanfield.model.Phase#getAttachment()
	 * @see #getPhase()
	 * @generated
	 */
	EAttribute getPhase_Attachment();

	/**
	 * Returns the meta object for class '{@link spanfield.model.ShieldWire <em>Shield Wire</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Shield Wire</em>'.
	 * @see spanfield.model.ShieldWire
	 * @generated
	 */
	EClass getShieldWire();

	/**
	 * Returns the meta object for the attribute '{@link spanfield.model.ShieldWire#getAttachment <em>Attachment</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Attachment</em>'.
	 * @see spanfield.model.ShieldWire#getAttachment()
	 * @see #getShieldWire()
	 * @generated
	 */
	EAttribute getShieldWire_Attachment();

	/**
	 * Returns the meta object for the attribute '{@link spanfield.model.ShieldWire#getBonding <em>Bonding</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Bonding</em>'.
	 * @see spanfield.model.ShieldWire#getBonding()
	 * @see #getShieldWire()
	 * @generated
	 */
	EAttribute getShieldWire_Bonding();

	/**
	 * Returns the meta object for the attribute '{@link spanfield.model.ShieldWire#getGivenCurrentAmperes <em>Given Current Amperes</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Given Current Amperes</em>'.
	 * @see spanfield.model.ShieldWire#getGivenCurrentAmperes()
	 * @see #getShieldWire()
	 * @generated
	 */
	EAttribute getShieldWire_GivenCurrentAmperes();

	/**
	 * Returns the meta object for the attribute '{@link spanfield.model.ShieldWire#getGivenAngleDegrees <em>Given Angle Degrees</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Given Angle Degrees</em>'.
	 * @see spanfield.model.ShieldWire#getGivenAngleDegrees()
	 * @see #getShieldWire()
	 * @generated
	 */
	EAttribute getShieldWire_GivenAngleDegrees();

	/**
	 * Returns the meta object for class '{@link spanfield.model.LoadCase <em>Load Case</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Load Case</em>'.
	 * @see spanfield.model.LoadCase
	 * @generated
	 */
	EClass getLoadCase();

	/**
	 * Returns the meta object for the attribute '{@link spanfield.model.LoadCase#getBasis <em>Basis</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Basis</em>'.
	 * @see spanfield.model.LoadCase#getBasis()
	 * @see #getLoadCase()
	 * @generated
	 */
	EAttribute getLoadCase_Basis();

	/**
	 * Returns the meta object for the attribute '{@link spanfield.model.LoadCase#getWindSwingDegrees <em>Wind Swing Degrees</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Wind Swing Degrees</em>'.
	 * @see spanfield.model.LoadCase#getWindSwingDegrees()
	 * @see #getLoadCase()
	 * @generated
	 */
	EAttribute getLoadCase_WindSwingDegrees();

	/**
	 * Returns the meta object for the containment reference list '{@link spanfield.model.LoadCase#getLoads <em>Loads</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the containment reference list '<em>Loads</em>'.
	 * @see spanfield.model.LoadCase#getLoads()
	 * @see #getLoadCase()
	 * @generated
	 */
	EReference getLoadCase_Loads();

	/**
	 * Returns the meta object for class '{@link spanfield.model.CircuitLoad <em>Circuit Load</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Circuit Load</em>'.
	 * @see spanfield.model.CircuitLoad
	 * @generated
	 */
	EClass getCircuitLoad();

	/**
	 * Returns the meta object for the reference '{@link spanfield.model.CircuitLoad#getCircuit <em>Circuit</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the reference '<em>Circuit</em>'.
	 * @see spanfield.model.CircuitLoad#getCircuit()
	 * @see #getCircuitLoad()
	 * @generated
	 */
	EReference getCircuitLoad_Circuit();

	/**
	 * Returns the meta object for the attribute '{@link spanfield.model.CircuitLoad#getDirection <em>Direction</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Direction</em>'.
	 * @see spanfield.model.CircuitLoad#getDirection()
	 * @see #getCircuitLoad()
	 * @generated
	 */
	EAttribute getCircuitLoad_Direction();

	/**
	 * Returns the meta object for class '{@link spanfield.model.CurrentLoad <em>Current Load</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Current Load</em>'.
	 * @see spanfield.model.CurrentLoad
	 * @generated
	 */
	EClass getCurrentLoad();

	/**
	 * Returns the meta object for the attribute '{@link spanfield.model.CurrentLoad#getCurrentAmperes <em>Current Amperes</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Current Amperes</em>'.
	 * @see spanfield.model.CurrentLoad#getCurrentAmperes()
	 * @see #getCurrentLoad()
	 * @generated
	 */
	EAttribute getCurrentLoad_CurrentAmperes();

	/**
	 * Returns the meta object for the attribute '{@link spanfield.model.CurrentLoad#getAngleDegrees <em>Angle Degrees</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Angle Degrees</em>'.
	 * @see spanfield.model.CurrentLoad#getAngleDegrees()
	 * @see #getCurrentLoad()
	 * @generated
	 */
	EAttribute getCurrentLoad_AngleDegrees();

	/**
	 * Returns the meta object for class '{@link spanfield.model.PowerLoad <em>Power Load</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Power Load</em>'.
	 * @see spanfield.model.PowerLoad
	 * @generated
	 */
	EClass getPowerLoad();

	/**
	 * Returns the meta object for the attribute '{@link spanfield.model.PowerLoad#getActivePowerWatts <em>Active Power Watts</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Active Power Watts</em>'.
	 * @see spanfield.model.PowerLoad#getActivePowerWatts()
	 * @see #getPowerLoad()
	 * @generated
	 */
	EAttribute getPowerLoad_ActivePowerWatts();

	/**
	 * Returns the meta object for the attribute '{@link spanfield.model.PowerLoad#getReactivePowerVars <em>Reactive Power Vars</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Reactive Power Vars</em>'.
	 * @see spanfield.model.PowerLoad#getReactivePowerVars()
	 * @see #getPowerLoad()
	 * @generated
	 */
	EAttribute getPowerLoad_ReactivePowerVars();

	/**
	 * Returns the meta object for the attribute '{@link spanfield.model.PowerLoad#getVoltageVolts <em>Voltage Volts</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Voltage Volts</em>'.
	 * @see spanfield.model.PowerLoad#getVoltageVolts()
	 * @see #getPowerLoad()
	 * @generated
	 */
	EAttribute getPowerLoad_VoltageVolts();

	/**
	 * Returns the meta object for class '{@link spanfield.model.SequenceLoad <em>Sequence Load</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Sequence Load</em>'.
	 * @see spanfield.model.SequenceLoad
	 * @generated
	 */
	EClass getSequenceLoad();

	/**
	 * Returns the meta object for the attribute '{@link spanfield.model.SequenceLoad#getPositiveAmperes <em>Positive Amperes</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Positive Amperes</em>'.
	 * @see spanfield.model.SequenceLoad#getPositiveAmperes()
	 * @see #getSequenceLoad()
	 * @generated
	 */
	EAttribute getSequenceLoad_PositiveAmperes();

	/**
	 * Returns the meta object for the attribute '{@link spanfield.model.SequenceLoad#getPositiveAngleDegrees <em>Positive Angle Degrees</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Positive Angle Degrees</em>'.
	 * @see spanfield.model.SequenceLoad#getPositiveAngleDegrees()
	 * @see #getSequenceLoad()
	 * @generated
	 */
	EAttribute getSequenceLoad_PositiveAngleDegrees();

	/**
	 * Returns the meta object for the attribute '{@link spanfield.model.SequenceLoad#getNegativeAmperes <em>Negative Amperes</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Negative Amperes</em>'.
	 * @see spanfield.model.SequenceLoad#getNegativeAmperes()
	 * @see #getSequenceLoad()
	 * @generated
	 */
	EAttribute getSequenceLoad_NegativeAmperes();

	/**
	 * Returns the meta object for the attribute '{@link spanfield.model.SequenceLoad#getNegativeAngleDegrees <em>Negative Angle Degrees</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Negative Angle Degrees</em>'.
	 * @see spanfield.model.SequenceLoad#getNegativeAngleDegrees()
	 * @see #getSequenceLoad()
	 * @generated
	 */
	EAttribute getSequenceLoad_NegativeAngleDegrees();

	/**
	 * Returns the meta object for the attribute '{@link spanfield.model.SequenceLoad#getZeroAmperes <em>Zero Amperes</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Zero Amperes</em>'.
	 * @see spanfield.model.SequenceLoad#getZeroAmperes()
	 * @see #getSequenceLoad()
	 * @generated
	 */
	EAttribute getSequenceLoad_ZeroAmperes();

	/**
	 * Returns the meta object for the attribute '{@link spanfield.model.SequenceLoad#getZeroAngleDegrees <em>Zero Angle Degrees</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Zero Angle Degrees</em>'.
	 * @see spanfield.model.SequenceLoad#getZeroAngleDegrees()
	 * @see #getSequenceLoad()
	 * @generated
	 */
	EAttribute getSequenceLoad_ZeroAngleDegrees();

	/**
	 * Returns the meta object for class '{@link spanfield.model.PhasorLoad <em>Phasor Load</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Phasor Load</em>'.
	 * @see spanfield.model.PhasorLoad
	 * @generated
	 */
	EClass getPhasorLoad();

	/**
	 * Returns the meta object for the containment reference list '{@link spanfield.model.PhasorLoad#getPhasors <em>Phasors</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the containment reference list '<em>Phasors</em>'.
	 * @see spanfield.model.PhasorLoad#getPhasors()
	 * @see #getPhasorLoad()
	 * @generated
	 */
	EReference getPhasorLoad_Phasors();

	/**
	 * Returns the meta object for class '{@link spanfield.model.PhasePhasor <em>Phase Phasor</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Phase Phasor</em>'.
	 * @see spanfield.model.PhasePhasor
	 * @generated
	 */
	EClass getPhasePhasor();

	/**
	 * Returns the meta object for the attribute '{@link spanfield.model.PhasePhasor#getPhase <em>Phase</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Phase</em>'.
	 * @see spanfield.model.PhasePhasor#getPhase()
	 * @see #getPhasePhasor()
	 * @generated
	 */
	EAttribute getPhasePhasor_Phase();

	/**
	 * Returns the meta object for the attribute '{@link spanfield.model.PhasePhasor#getCurrentAmperes <em>Current Amperes</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Current Amperes</em>'.
	 * @see spanfield.model.PhasePhasor#getCurrentAmperes()
	 * @see #getPhasePhasor()
	 * @generated
	 */
	EAttribute getPhasePhasor_CurrentAmperes();

	/**
	 * Returns the meta object for the attribute '{@link spanfield.model.PhasePhasor#getAngleDegrees <em>Angle Degrees</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Angle Degrees</em>'.
	 * @see spanfield.model.PhasePhasor#getAngleDegrees()
	 * @see #getPhasePhasor()
	 * @generated
	 */
	EAttribute getPhasePhasor_AngleDegrees();

	/**
	 * Returns the meta object for class '{@link spanfield.model.ProfileStation <em>Profile Station</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Profile Station</em>'.
	 * @see spanfield.model.ProfileStation
	 * @generated
	 */
	EClass getProfileStation();

	/**
	 * Returns the meta object for the attribute '{@link spanfield.model.ProfileStation#getStationMetres <em>Station Metres</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Station Metres</em>'.
	 * @see spanfield.model.ProfileStation#getStationMetres()
	 * @see #getProfileStation()
	 * @generated
	 */
	EAttribute getProfileStation_StationMetres();

	/**
	 * Returns the meta object for the attribute '{@link spanfield.model.ProfileStation#getFromOffsetMetres <em>From Offset Metres</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>From Offset Metres</em>'.
	 * @see spanfield.model.ProfileStation#getFromOffsetMetres()
	 * @see #getProfileStation()
	 * @generated
	 */
	EAttribute getProfileStation_FromOffsetMetres();

	/**
	 * Returns the meta object for the attribute '{@link spanfield.model.ProfileStation#getToOffsetMetres <em>To Offset Metres</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>To Offset Metres</em>'.
	 * @see spanfield.model.ProfileStation#getToOffsetMetres()
	 * @see #getProfileStation()
	 * @generated
	 */
	EAttribute getProfileStation_ToOffsetMetres();

	/**
	 * Returns the meta object for the attribute '{@link spanfield.model.ProfileStation#getSpacingMetres <em>Spacing Metres</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Spacing Metres</em>'.
	 * @see spanfield.model.ProfileStation#getSpacingMetres()
	 * @see #getProfileStation()
	 * @generated
	 */
	EAttribute getProfileStation_SpacingMetres();

	/**
	 * Returns the meta object for class '{@link spanfield.model.FieldLimit <em>Field Limit</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Field Limit</em>'.
	 * @see spanfield.model.FieldLimit
	 * @generated
	 */
	EClass getFieldLimit();

	/**
	 * Returns the meta object for the attribute '{@link spanfield.model.FieldLimit#getQuantity <em>Quantity</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Quantity</em>'.
	 * @see spanfield.model.FieldLimit#getQuantity()
	 * @see #getFieldLimit()
	 * @generated
	 */
	EAttribute getFieldLimit_Quantity();

	/**
	 * Returns the meta object for the attribute '{@link spanfield.model.FieldLimit#getMeasure <em>Measure</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Measure</em>'.
	 * @see spanfield.model.FieldLimit#getMeasure()
	 * @see #getFieldLimit()
	 * @generated
	 */
	EAttribute getFieldLimit_Measure();

	/**
	 * Returns the meta object for the attribute '{@link spanfield.model.FieldLimit#getLevel <em>Level</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Level</em>'.
	 * @see spanfield.model.FieldLimit#getLevel()
	 * @see #getFieldLimit()
	 * @generated
	 */
	EAttribute getFieldLimit_Level();

	/**
	 * Returns the meta object for the attribute '{@link spanfield.model.FieldLimit#getPlace <em>Place</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Place</em>'.
	 * @see spanfield.model.FieldLimit#getPlace()
	 * @see #getFieldLimit()
	 * @generated
	 */
	EAttribute getFieldLimit_Place();

	/**
	 * Returns the meta object for the attribute '{@link spanfield.model.FieldLimit#getBody <em>Body</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Body</em>'.
	 * @see spanfield.model.FieldLimit#getBody()
	 * @see #getFieldLimit()
	 * @generated
	 */
	EAttribute getFieldLimit_Body();

	/**
	 * Returns the meta object for the attribute '{@link spanfield.model.FieldLimit#getEdition <em>Edition</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Edition</em>'.
	 * @see spanfield.model.FieldLimit#getEdition()
	 * @see #getFieldLimit()
	 * @generated
	 */
	EAttribute getFieldLimit_Edition();

	/**
	 * Returns the meta object for the attribute '{@link spanfield.model.FieldLimit#getLoadCondition <em>Load Condition</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Load Condition</em>'.
	 * @see spanfield.model.FieldLimit#getLoadCondition()
	 * @see #getFieldLimit()
	 * @generated
	 */
	EAttribute getFieldLimit_LoadCondition();

	/**
	 * Returns the meta object for the attribute '{@link spanfield.model.FieldLimit#getBasis <em>Basis</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Basis</em>'.
	 * @see spanfield.model.FieldLimit#getBasis()
	 * @see #getFieldLimit()
	 * @generated
	 */
	EAttribute getFieldLimit_Basis();

	/**
	 * Returns the meta object for class '{@link spanfield.model.Survey <em>Survey</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Survey</em>'.
	 * @see spanfield.model.Survey
	 * @generated
	 */
	EClass getSurvey();

	/**
	 * Returns the meta object for the attribute '{@link spanfield.model.Survey#getDate <em>Date</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Date</em>'.
	 * @see spanfield.model.Survey#getDate()
	 * @see #getSurvey()
	 * @generated
	 */
	EAttribute getSurvey_Date();

	/**
	 * Returns the meta object for the attribute '{@link spanfield.model.Survey#getInstrument <em>Instrument</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Instrument</em>'.
	 * @see spanfield.model.Survey#getInstrument()
	 * @see #getSurvey()
	 * @generated
	 */
	EAttribute getSurvey_Instrument();

	/**
	 * Returns the meta object for the attribute '{@link spanfield.model.Survey#getRelativeUncertainty <em>Relative Uncertainty</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Relative Uncertainty</em>'.
	 * @see spanfield.model.Survey#getRelativeUncertainty()
	 * @see #getSurvey()
	 * @generated
	 */
	EAttribute getSurvey_RelativeUncertainty();

	/**
	 * Returns the meta object for the containment reference list '{@link spanfield.model.Survey#getReadings <em>Readings</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the containment reference list '<em>Readings</em>'.
	 * @see spanfield.model.Survey#getReadings()
	 * @see #getSurvey()
	 * @generated
	 */
	EReference getSurvey_Readings();

	/**
	 * Returns the meta object for class '{@link spanfield.model.SurveyReading <em>Survey Reading</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for class '<em>Survey Reading</em>'.
	 * @see spanfield.model.SurveyReading
	 * @generated
	 */
	EClass getSurveyReading();

	/**
	 * Returns the meta object for the attribute '{@link spanfield.model.SurveyReading#getStationMetres <em>Station Metres</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Station Metres</em>'.
	 * @see spanfield.model.SurveyReading#getStationMetres()
	 * @see #getSurveyReading()
	 * @generated
	 */
	EAttribute getSurveyReading_StationMetres();

	/**
	 * Returns the meta object for the attribute '{@link spanfield.model.SurveyReading#getOffsetMetres <em>Offset Metres</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Offset Metres</em>'.
	 * @see spanfield.model.SurveyReading#getOffsetMetres()
	 * @see #getSurveyReading()
	 * @generated
	 */
	EAttribute getSurveyReading_OffsetMetres();

	/**
	 * Returns the meta object for the attribute '{@link spanfield.model.SurveyReading#getHeightMetres <em>Height Metres</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Height Metres</em>'.
	 * @see spanfield.model.SurveyReading#getHeightMetres()
	 * @see #getSurveyReading()
	 * @generated
	 */
	EAttribute getSurveyReading_HeightMetres();

	/**
	 * Returns the meta object for the attribute '{@link spanfield.model.SurveyReading#getResultantTesla <em>Resultant Tesla</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for the attribute '<em>Resultant Tesla</em>'.
	 * @see spanfield.model.SurveyReading#getResultantTesla()
	 * @see #getSurveyReading()
	 * @generated
	 */
	EAttribute getSurveyReading_ResultantTesla();

	/**
	 * Returns the meta object for enum '{@link spanfield.model.EarthModel <em>Earth Model</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for enum '<em>Earth Model</em>'.
	 * @see spanfield.model.EarthModel
	 * @generated
	 */
	EEnum getEarthModel();

	/**
	 * Returns the meta object for enum '{@link spanfield.model.ImpedanceFormula <em>Impedance Formula</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for enum '<em>Impedance Formula</em>'.
	 * @see spanfield.model.ImpedanceFormula
	 * @generated
	 */
	EEnum getImpedanceFormula();

	/**
	 * Returns the meta object for enum '{@link spanfield.model.AttachmentRole <em>Attachment Role</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for enum '<em>Attachment Role</em>'.
	 * @see spanfield.model.AttachmentRole
	 * @generated
	 */
	EEnum getAttachmentRole();

	/**
	 * Returns the meta object for enum '{@link spanfield.model.LineEnd <em>Line End</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for enum '<em>Line End</em>'.
	 * @see spanfield.model.LineEnd
	 * @generated
	 */
	EEnum getLineEnd();

	/**
	 * Returns the meta object for enum '{@link spanfield.model.Bonding <em>Bonding</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for enum '<em>Bonding</em>'.
	 * @see spanfield.model.Bonding
	 * @generated
	 */
	EEnum getBonding();

	/**
	 * Returns the meta object for enum '{@link spanfield.model.Phasing <em>Phasing</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for enum '<em>Phasing</em>'.
	 * @see spanfield.model.Phasing
	 * @generated
	 */
	EEnum getPhasing();

	/**
	 * Returns the meta object for enum '{@link spanfield.model.FlowDirection <em>Flow Direction</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for enum '<em>Flow Direction</em>'.
	 * @see spanfield.model.FlowDirection
	 * @generated
	 */
	EEnum getFlowDirection();

	/**
	 * Returns the meta object for enum '{@link spanfield.model.FieldQuantity <em>Field Quantity</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for enum '<em>Field Quantity</em>'.
	 * @see spanfield.model.FieldQuantity
	 * @generated
	 */
	EEnum getFieldQuantity();

	/**
	 * Returns the meta object for enum '{@link spanfield.model.FieldMeasure <em>Field Measure</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for enum '<em>Field Measure</em>'.
	 * @see spanfield.model.FieldMeasure
	 * @generated
	 */
	EEnum getFieldMeasure();

	/**
	 * Returns the meta object for enum '{@link spanfield.model.LimitPlace <em>Limit Place</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for enum '<em>Limit Place</em>'.
	 * @see spanfield.model.LimitPlace
	 * @generated
	 */
	EEnum getLimitPlace();

	/**
	 * Returns the meta object for enum '{@link spanfield.model.LimitBasis <em>Limit Basis</em>}'.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the meta object for enum '<em>Limit Basis</em>'.
	 * @see spanfield.model.LimitBasis
	 * @generated
	 */
	EEnum getLimitBasis();

	/**
	 * Returns the factory that creates the instances of the model.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the factory that creates the instances of the model.
	 * @generated
	 */
	SpanfieldFactory getSpanfieldFactory();

	/**
	 * <!-- begin-user-doc -->
	 * Defines literals for the meta objects that represent
	 * <ul>
	 *   <li>each class,</li>
	 *   <li>each feature of each class,</li>
	 *   <li>each operation of each class,</li>
	 *   <li>each enum,</li>
	 *   <li>and each data type</li>
	 * </ul>
	 * <!-- end-user-doc -->
	 * @generated
	 */
	interface Literals {
		/**
		 * The meta object literal for the '{@link spanfield.model.impl.NamedElementImpl <em>Named Element</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see spanfield.model.impl.NamedElementImpl
		 * @see spanfield.model.impl.SpanfieldPackageImpl#getNamedElement()
		 * @generated
		 */
		EClass NAMED_ELEMENT = eINSTANCE.getNamedElement();

		/**
		 * The meta object literal for the '<em><b>Id</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute NAMED_ELEMENT__ID = eINSTANCE.getNamedElement_Id();

		/**
		 * The meta object literal for the '<em><b>Name</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute NAMED_ELEMENT__NAME = eINSTANCE.getNamedElement_Name();

		/**
		 * The meta object literal for the '<em><b>Notes</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute NAMED_ELEMENT__NOTES = eINSTANCE.getNamedElement_Notes();

		/**
		 * The meta object literal for the '{@link spanfield.model.impl.StudyImpl <em>Study</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see spanfield.model.impl.StudyImpl
		 * @see spanfield.model.impl.SpanfieldPackageImpl#getStudy()
		 * @generated
		 */
		EClass STUDY = eINSTANCE.getStudy();

		/**
		 * The meta object literal for the '<em><b>Author</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute STUDY__AUTHOR = eINSTANCE.getStudy_Author();

		/**
		 * The meta object literal for the '<em><b>Organisation</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute STUDY__ORGANISATION = eINSTANCE.getStudy_Organisation();

		/**
		 * The meta object literal for the '<em><b>Date</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute STUDY__DATE = eINSTANCE.getStudy_Date();

		/**
		 * The meta object literal for the '<em><b>Frequency Hertz</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute STUDY__FREQUENCY_HERTZ = eINSTANCE.getStudy_FrequencyHertz();

		/**
		 * The meta object literal for the '<em><b>Earth Resistivity Ohm Metres</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute STUDY__EARTH_RESISTIVITY_OHM_METRES = eINSTANCE.getStudy_EarthResistivityOhmMetres();

		/**
		 * The meta object literal for the '<em><b>Earth Model</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute STUDY__EARTH_MODEL = eINSTANCE.getStudy_EarthModel();

		/**
		 * The meta object literal for the '<em><b>Impedance Formula</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute STUDY__IMPEDANCE_FORMULA = eINSTANCE.getStudy_ImpedanceFormula();

		/**
		 * The meta object literal for the '<em><b>Reference Height Metres</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute STUDY__REFERENCE_HEIGHT_METRES = eINSTANCE.getStudy_ReferenceHeightMetres();

		/**
		 * The meta object literal for the '<em><b>Relative Accuracy</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute STUDY__RELATIVE_ACCURACY = eINSTANCE.getStudy_RelativeAccuracy();

		/**
		 * The meta object literal for the '<em><b>Corridor</b></em>' containment reference feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EReference STUDY__CORRIDOR = eINSTANCE.getStudy_Corridor();

		/**
		 * The meta object literal for the '<em><b>Conductors</b></em>' containment reference list feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EReference STUDY__CONDUCTORS = eINSTANCE.getStudy_Conductors();

		/**
		 * The meta object literal for the '<em><b>Structure Types</b></em>' containment reference list feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EReference STUDY__STRUCTURE_TYPES = eINSTANCE.getStudy_StructureTypes();

		/**
		 * The meta object literal for the '<em><b>Lines</b></em>' containment reference list feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EReference STUDY__LINES = eINSTANCE.getStudy_Lines();

		/**
		 * The meta object literal for the '<em><b>Load Cases</b></em>' containment reference list feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EReference STUDY__LOAD_CASES = eINSTANCE.getStudy_LoadCases();

		/**
		 * The meta object literal for the '<em><b>Stations</b></em>' containment reference list feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EReference STUDY__STATIONS = eINSTANCE.getStudy_Stations();

		/**
		 * The meta object literal for the '<em><b>Limits</b></em>' containment reference list feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EReference STUDY__LIMITS = eINSTANCE.getStudy_Limits();

		/**
		 * The meta object literal for the '<em><b>Surveys</b></em>' containment reference list feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EReference STUDY__SURVEYS = eINSTANCE.getStudy_Surveys();

		/**
		 * The meta object literal for the '{@link spanfield.model.impl.CorridorImpl <em>Corridor</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see spanfield.model.impl.CorridorImpl
		 * @see spanfield.model.impl.SpanfieldPackageImpl#getCorridor()
		 * @generated
		 */
		EClass CORRIDOR = eINSTANCE.getCorridor();

		/**
		 * The meta object literal for the '<em><b>Cross Slope</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute CORRIDOR__CROSS_SLOPE = eINSTANCE.getCorridor_CrossSlope();

		/**
		 * The meta object literal for the '<em><b>Edges</b></em>' containment reference list feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EReference CORRIDOR__EDGES = eINSTANCE.getCorridor_Edges();

		/**
		 * The meta object literal for the '<em><b>Ground Points</b></em>' containment reference list feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EReference CORRIDOR__GROUND_POINTS = eINSTANCE.getCorridor_GroundPoints();

		/**
		 * The meta object literal for the '<em><b>Centreline Elevations</b></em>' containment reference list feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EReference CORRIDOR__CENTRELINE_ELEVATIONS = eINSTANCE.getCorridor_CentrelineElevations();

		/**
		 * The meta object literal for the '<em><b>Bends</b></em>' containment reference list feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EReference CORRIDOR__BENDS = eINSTANCE.getCorridor_Bends();

		/**
		 * The meta object literal for the '{@link spanfield.model.impl.EdgePointImpl <em>Edge Point</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see spanfield.model.impl.EdgePointImpl
		 * @see spanfield.model.impl.SpanfieldPackageImpl#getEdgePoint()
		 * @generated
		 */
		EClass EDGE_POINT = eINSTANCE.getEdgePoint();

		/**
		 * The meta object literal for the '<em><b>Station Metres</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute EDGE_POINT__STATION_METRES = eINSTANCE.getEdgePoint_StationMetres();

		/**
		 * The meta object literal for the '<em><b>Left Offset Metres</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute EDGE_POINT__LEFT_OFFSET_METRES = eINSTANCE.getEdgePoint_LeftOffsetMetres();

		/**
		 * The meta object literal for the '<em><b>Right Offset Metres</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute EDGE_POINT__RIGHT_OFFSET_METRES = eINSTANCE.getEdgePoint_RightOffsetMetres();

		/**
		 * The meta object literal for the '{@link spanfield.model.impl.GroundPointImpl <em>Ground Point</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see spanfield.model.impl.GroundPointImpl
		 * @see spanfield.model.impl.SpanfieldPackageImpl#getGroundPoint()
		 * @generated
		 */
		EClass GROUND_POINT = eINSTANCE.getGroundPoint();

		/**
		 * The meta object literal for the '<em><b>Offset Metres</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute GROUND_POINT__OFFSET_METRES = eINSTANCE.getGroundPoint_OffsetMetres();

		/**
		 * The meta object literal for the '<em><b>Elevation Metres</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute GROUND_POINT__ELEVATION_METRES = eINSTANCE.getGroundPoint_ElevationMetres();

		/**
		 * The meta object literal for the '{@link spanfield.model.impl.ElevationPointImpl <em>Elevation Point</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see spanfield.model.impl.ElevationPointImpl
		 * @see spanfield.model.impl.SpanfieldPackageImpl#getElevationPoint()
		 * @generated
		 */
		EClass ELEVATION_POINT = eINSTANCE.getElevationPoint();

		/**
		 * The meta object literal for the '<em><b>Station Metres</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute ELEVATION_POINT__STATION_METRES = eINSTANCE.getElevationPoint_StationMetres();

		/**
		 * The meta object literal for the '<em><b>Elevation Metres</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute ELEVATION_POINT__ELEVATION_METRES = eINSTANCE.getElevationPoint_ElevationMetres();

		/**
		 * The meta object literal for the '{@link spanfield.model.impl.AlignmentBendImpl <em>Alignment Bend</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see spanfield.model.impl.AlignmentBendImpl
		 * @see spanfield.model.impl.SpanfieldPackageImpl#getAlignmentBend()
		 * @generated
		 */
		EClass ALIGNMENT_BEND = eINSTANCE.getAlignmentBend();

		/**
		 * The meta object literal for the '<em><b>Station Metres</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute ALIGNMENT_BEND__STATION_METRES = eINSTANCE.getAlignmentBend_StationMetres();

		/**
		 * The meta object literal for the '<em><b>Deflection Degrees</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute ALIGNMENT_BEND__DEFLECTION_DEGREES = eINSTANCE.getAlignmentBend_DeflectionDegrees();

		/**
		 * The meta object literal for the '{@link spanfield.model.impl.ConductorImpl <em>Conductor</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see spanfield.model.impl.ConductorImpl
		 * @see spanfield.model.impl.SpanfieldPackageImpl#getConductor()
		 * @generated
		 */
		EClass CONDUCTOR = eINSTANCE.getConductor();

		/**
		 * The meta object literal for the '<em><b>Diameter Metres</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute CONDUCTOR__DIAMETER_METRES = eINSTANCE.getConductor_DiameterMetres();

		/**
		 * The meta object literal for the '<em><b>Geometric Mean Radius Metres</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute CONDUCTOR__GEOMETRIC_MEAN_RADIUS_METRES = eINSTANCE.getConductor_GeometricMeanRadiusMetres();

		/**
		 * The meta object literal for the '<em><b>Low Temperature Celsius</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute CONDUCTOR__LOW_TEMPERATURE_CELSIUS = eINSTANCE.getConductor_LowTemperatureCelsius();

		/**
		 * The meta object literal for the '<em><b>Low Resistance Ohms Per Metre</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute CONDUCTOR__LOW_RESISTANCE_OHMS_PER_METRE = eINSTANCE.getConductor_LowResistanceOhmsPerMetre();

		/**
		 * The meta object literal for the '<em><b>High Temperature Celsius</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute CONDUCTOR__HIGH_TEMPERATURE_CELSIUS = eINSTANCE.getConductor_HighTemperatureCelsius();

		/**
		 * The meta object literal for the '<em><b>High Resistance Ohms Per Metre</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute CONDUCTOR__HIGH_RESISTANCE_OHMS_PER_METRE = eINSTANCE.getConductor_HighResistanceOhmsPerMetre();

		/**
		 * The meta object literal for the '<em><b>Mass Kilograms Per Metre</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute CONDUCTOR__MASS_KILOGRAMS_PER_METRE = eINSTANCE.getConductor_MassKilogramsPerMetre();

		/**
		 * The meta object literal for the '<em><b>Area Square Metres</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute CONDUCTOR__AREA_SQUARE_METRES = eINSTANCE.getConductor_AreaSquareMetres();

		/**
		 * The meta object literal for the '<em><b>Elastic Modulus Pascals</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute CONDUCTOR__ELASTIC_MODULUS_PASCALS = eINSTANCE.getConductor_ElasticModulusPascals();

		/**
		 * The meta object literal for the '<em><b>Thermal Expansion Per Kelvin</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute CONDUCTOR__THERMAL_EXPANSION_PER_KELVIN = eINSTANCE.getConductor_ThermalExpansionPerKelvin();

		/**
		 * The meta object literal for the '<em><b>Rated Strength Newtons</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute CONDUCTOR__RATED_STRENGTH_NEWTONS = eINSTANCE.getConductor_RatedStrengthNewtons();

		/**
		 * The meta object literal for the '<em><b>Emissivity</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute CONDUCTOR__EMISSIVITY = eINSTANCE.getConductor_Emissivity();

		/**
		 * The meta object literal for the '<em><b>Absorptivity</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute CONDUCTOR__ABSORPTIVITY = eINSTANCE.getConductor_Absorptivity();

		/**
		 * The meta object literal for the '{@link spanfield.model.impl.StructureTypeImpl <em>Structure Type</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see spanfield.model.impl.StructureTypeImpl
		 * @see spanfield.model.impl.SpanfieldPackageImpl#getStructureType()
		 * @generated
		 */
		EClass STRUCTURE_TYPE = eINSTANCE.getStructureType();

		/**
		 * The meta object literal for the '<em><b>Attachments</b></em>' containment reference list feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EReference STRUCTURE_TYPE__ATTACHMENTS = eINSTANCE.getStructureType_Attachments();

		/**
		 * The meta object literal for the '<em><b>Outline</b></em>' containment reference list feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EReference STRUCTURE_TYPE__OUTLINE = eINSTANCE.getStructureType_Outline();

		/**
		 * The meta object literal for the '{@link spanfield.model.impl.AttachmentImpl <em>Attachment</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see spanfield.model.impl.AttachmentImpl
		 * @see spanfield.model.impl.SpanfieldPackageImpl#getAttachment()
		 * @generated
		 */
		EClass ATTACHMENT = eINSTANCE.getAttachment();

		/**
		 * The meta object literal for the '<em><b>Name</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute ATTACHMENT__NAME = eINSTANCE.getAttachment_Name();

		/**
		 * The meta object literal for the '<em><b>Role</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute ATTACHMENT__ROLE = eINSTANCE.getAttachment_Role();

		/**
		 * The meta object literal for the '<em><b>Offset Metres</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute ATTACHMENT__OFFSET_METRES = eINSTANCE.getAttachment_OffsetMetres();

		/**
		 * The meta object literal for the '<em><b>Height Metres</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute ATTACHMENT__HEIGHT_METRES = eINSTANCE.getAttachment_HeightMetres();

		/**
		 * The meta object literal for the '<em><b>Insulator Length Metres</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute ATTACHMENT__INSULATOR_LENGTH_METRES = eINSTANCE.getAttachment_InsulatorLengthMetres();

		/**
		 * The meta object literal for the '{@link spanfield.model.impl.OutlineStrokeImpl <em>Outline Stroke</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see spanfield.model.impl.OutlineStrokeImpl
		 * @see spanfield.model.impl.SpanfieldPackageImpl#getOutlineStroke()
		 * @generated
		 */
		EClass OUTLINE_STROKE = eINSTANCE.getOutlineStroke();

		/**
		 * The meta object literal for the '<em><b>Points</b></em>' containment reference list feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EReference OUTLINE_STROKE__POINTS = eINSTANCE.getOutlineStroke_Points();

		/**
		 * The meta object literal for the '{@link spanfield.model.impl.OutlinePointImpl <em>Outline Point</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see spanfield.model.impl.OutlinePointImpl
		 * @see spanfield.model.impl.SpanfieldPackageImpl#getOutlinePoint()
		 * @generated
		 */
		EClass OUTLINE_POINT = eINSTANCE.getOutlinePoint();

		/**
		 * The meta object literal for the '<em><b>Offset Metres</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute OUTLINE_POINT__OFFSET_METRES = eINSTANCE.getOutlinePoint_OffsetMetres();

		/**
		 * The meta object literal for the '<em><b>Height Metres</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute OUTLINE_POINT__HEIGHT_METRES = eINSTANCE.getOutlinePoint_HeightMetres();

		/**
		 * The meta object literal for the '{@link spanfield.model.impl.LineImpl <em>Line</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see spanfield.model.impl.LineImpl
		 * @see spanfield.model.impl.SpanfieldPackageImpl#getLine()
		 * @generated
		 */
		EClass LINE = eINSTANCE.getLine();

		/**
		 * The meta object literal for the '<em><b>Structures</b></em>' containment reference list feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EReference LINE__STRUCTURES = eINSTANCE.getLine_Structures();

		/**
		 * The meta object literal for the '<em><b>Sections</b></em>' containment reference list feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EReference LINE__SECTIONS = eINSTANCE.getLine_Sections();

		/**
		 * The meta object literal for the '<em><b>Circuits</b></em>' containment reference list feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EReference LINE__CIRCUITS = eINSTANCE.getLine_Circuits();

		/**
		 * The meta object literal for the '<em><b>Shield Wires</b></em>' containment reference list feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EReference LINE__SHIELD_WIRES = eINSTANCE.getLine_ShieldWires();

		/**
		 * The meta object literal for the '<em><b>Start End</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute LINE__START_END = eINSTANCE.getLine_StartEnd();

		/**
		 * The meta object literal for the '<em><b>Finish End</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute LINE__FINISH_END = eINSTANCE.getLine_FinishEnd();

		/**
		 * The meta object literal for the '{@link spanfield.model.impl.StructureImpl <em>Structure</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see spanfield.model.impl.StructureImpl
		 * @see spanfield.model.impl.SpanfieldPackageImpl#getStructure()
		 * @generated
		 */
		EClass STRUCTURE = eINSTANCE.getStructure();

		/**
		 * The meta object literal for the '<em><b>Type</b></em>' reference feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EReference STRUCTURE__TYPE = eINSTANCE.getStructure_Type();

		/**
		 * The meta object literal for the '<em><b>Station Metres</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute STRUCTURE__STATION_METRES = eINSTANCE.getStructure_StationMetres();

		/**
		 * The meta object literal for the '<em><b>Offset Metres</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute STRUCTURE__OFFSET_METRES = eINSTANCE.getStructure_OffsetMetres();

		/**
		 * The meta object literal for the '<em><b>Base Elevation Metres</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute STRUCTURE__BASE_ELEVATION_METRES = eINSTANCE.getStructure_BaseElevationMetres();

		/**
		 * The meta object literal for the '<em><b>Height Adjustment Metres</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute STRUCTURE__HEIGHT_ADJUSTMENT_METRES = eINSTANCE.getStructure_HeightAdjustmentMetres();

		/**
		 * The meta object literal for the '<em><b>Turn Degrees</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute STRUCTURE__TURN_DEGREES = eINSTANCE.getStructure_TurnDegrees();

		/**
		 * The meta object literal for the '{@link spanfield.model.impl.StringingSectionImpl <em>Stringing Section</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see spanfield.model.impl.StringingSectionImpl
		 * @see spanfield.model.impl.SpanfieldPackageImpl#getStringingSection()
		 * @generated
		 */
		EClass STRINGING_SECTION = eINSTANCE.getStringingSection();

		/**
		 * The meta object literal for the '<em><b>From</b></em>' reference feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EReference STRINGING_SECTION__FROM = eINSTANCE.getStringingSection_From();

		/**
		 * The meta object literal for the '<em><b>To</b></em>' reference feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EReference STRINGING_SECTION__TO = eINSTANCE.getStringingSection_To();

		/**
		 * The meta object literal for the '<em><b>Phase Stringing</b></em>' containment reference feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EReference STRINGING_SECTION__PHASE_STRINGING = eINSTANCE.getStringingSection_PhaseStringing();

		/**
		 * The meta object literal for the '<em><b>Shield Stringing</b></em>' containment reference feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EReference STRINGING_SECTION__SHIELD_STRINGING = eINSTANCE.getStringingSection_ShieldStringing();

		/**
		 * The meta object literal for the '<em><b>Exceptions</b></em>' containment reference list feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EReference STRINGING_SECTION__EXCEPTIONS = eINSTANCE.getStringingSection_Exceptions();

		/**
		 * The meta object literal for the '{@link spanfield.model.impl.WireStringingImpl <em>Wire Stringing</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see spanfield.model.impl.WireStringingImpl
		 * @see spanfield.model.impl.SpanfieldPackageImpl#getWireStringing()
		 * @generated
		 */
		EClass WIRE_STRINGING = eINSTANCE.getWireStringing();

		/**
		 * The meta object literal for the '<em><b>Wires</b></em>' reference list feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EReference WIRE_STRINGING__WIRES = eINSTANCE.getWireStringing_Wires();

		/**
		 * The meta object literal for the '<em><b>Stringing</b></em>' containment reference feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EReference WIRE_STRINGING__STRINGING = eINSTANCE.getWireStringing_Stringing();

		/**
		 * The meta object literal for the '{@link spanfield.model.impl.StringingImpl <em>Stringing</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see spanfield.model.impl.StringingImpl
		 * @see spanfield.model.impl.SpanfieldPackageImpl#getStringing()
		 * @generated
		 */
		EClass STRINGING = eINSTANCE.getStringing();

		/**
		 * The meta object literal for the '{@link spanfield.model.impl.CatenaryStringingImpl <em>Catenary Stringing</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see spanfield.model.impl.CatenaryStringingImpl
		 * @see spanfield.model.impl.SpanfieldPackageImpl#getCatenaryStringing()
		 * @generated
		 */
		EClass CATENARY_STRINGING = eINSTANCE.getCatenaryStringing();

		/**
		 * The meta object literal for the '<em><b>Catenary Constant Metres</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute CATENARY_STRINGING__CATENARY_CONSTANT_METRES = eINSTANCE.getCatenaryStringing_CatenaryConstantMetres();

		/**
		 * The meta object literal for the '{@link spanfield.model.impl.SagStringingImpl <em>Sag Stringing</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see spanfield.model.impl.SagStringingImpl
		 * @see spanfield.model.impl.SpanfieldPackageImpl#getSagStringing()
		 * @generated
		 */
		EClass SAG_STRINGING = eINSTANCE.getSagStringing();

		/**
		 * The meta object literal for the '<em><b>Sag Metres</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute SAG_STRINGING__SAG_METRES = eINSTANCE.getSagStringing_SagMetres();

		/**
		 * The meta object literal for the '{@link spanfield.model.impl.TensionStringingImpl <em>Tension Stringing</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see spanfield.model.impl.TensionStringingImpl
		 * @see spanfield.model.impl.SpanfieldPackageImpl#getTensionStringing()
		 * @generated
		 */
		EClass TENSION_STRINGING = eINSTANCE.getTensionStringing();

		/**
		 * The meta object literal for the '<em><b>Horizontal Tension Newtons</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute TENSION_STRINGING__HORIZONTAL_TENSION_NEWTONS = eINSTANCE.getTensionStringing_HorizontalTensionNewtons();

		/**
		 * The meta object literal for the '{@link spanfield.model.impl.ClearanceStringingImpl <em>Clearance Stringing</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see spanfield.model.impl.ClearanceStringingImpl
		 * @see spanfield.model.impl.SpanfieldPackageImpl#getClearanceStringing()
		 * @generated
		 */
		EClass CLEARANCE_STRINGING = eINSTANCE.getClearanceStringing();

		/**
		 * The meta object literal for the '<em><b>Clearance Metres</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute CLEARANCE_STRINGING__CLEARANCE_METRES = eINSTANCE.getClearanceStringing_ClearanceMetres();

		/**
		 * The meta object literal for the '{@link spanfield.model.impl.StrungElementImpl <em>Strung Element</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see spanfield.model.impl.StrungElementImpl
		 * @see spanfield.model.impl.SpanfieldPackageImpl#getStrungElement()
		 * @generated
		 */
		EClass STRUNG_ELEMENT = eINSTANCE.getStrungElement();

		/**
		 * The meta object literal for the '<em><b>Conductor</b></em>' reference feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EReference STRUNG_ELEMENT__CONDUCTOR = eINSTANCE.getStrungElement_Conductor();

		/**
		 * The meta object literal for the '{@link spanfield.model.impl.CircuitImpl <em>Circuit</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see spanfield.model.impl.CircuitImpl
		 * @see spanfield.model.impl.SpanfieldPackageImpl#getCircuit()
		 * @generated
		 */
		EClass CIRCUIT = eINSTANCE.getCircuit();

		/**
		 * The meta object literal for the '<em><b>Nominal Voltage Volts</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute CIRCUIT__NOMINAL_VOLTAGE_VOLTS = eINSTANCE.getCircuit_NominalVoltageVolts();

		/**
		 * The meta object literal for the '<em><b>Bundle Count</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute CIRCUIT__BUNDLE_COUNT = eINSTANCE.getCircuit_BundleCount();

		/**
		 * The meta object literal for the '<em><b>Bundle Spacing Metres</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute CIRCUIT__BUNDLE_SPACING_METRES = eINSTANCE.getCircuit_BundleSpacingMetres();

		/**
		 * The meta object literal for the '<em><b>Phasing</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute CIRCUIT__PHASING = eINSTANCE.getCircuit_Phasing();

		/**
		 * The meta object literal for the '<em><b>Phases</b></em>' containment reference list feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EReference CIRCUIT__PHASES = eINSTANCE.getCircuit_Phases();

		/**
		 * The meta object literal for the '{@link spanfield.model.impl.PhaseImpl <em>Phase</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see spanfield.model.impl.PhaseImpl
		 * @see spanfield.model.impl.SpanfieldPackageImpl#getPhase()
		 * @generated
		 */
		EClass PHASE = eINSTANCE.getPhase();

		/**
		 * The meta object literal for the '<em><b>Label</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute PHASE__LABEL = eINSTANCE.getPhase_Label();

		/**
		 * The meta object literal for the '<em><b>Angle Degrees</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute PHASE__ANGLE_DEGREES = eINSTANCE.getPhase_AngleDegrees();

		/**
		 * The meta object literal for the '<em><b>Attachment</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute PHASE__ATTACHMENT = eINSTANCE.getPhase_Attachment();

		/**
		 * The meta object literal for the '{@link spanfield.model.impl.ShieldWireImpl <em>Shield Wire</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see spanfield.model.impl.ShieldWireImpl
		 * @see spanfield.model.impl.SpanfieldPackageImpl#getShieldWire()
		 * @generated
		 */
		EClass SHIELD_WIRE = eINSTANCE.getShieldWire();

		/**
		 * The meta object literal for the '<em><b>Attachment</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute SHIELD_WIRE__ATTACHMENT = eINSTANCE.getShieldWire_Attachment();

		/**
		 * The meta object literal for the '<em><b>Bonding</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute SHIELD_WIRE__BONDING = eINSTANCE.getShieldWire_Bonding();

		/**
		 * The meta object literal for the '<em><b>Given Current Amperes</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute SHIELD_WIRE__GIVEN_CURRENT_AMPERES = eINSTANCE.getShieldWire_GivenCurrentAmperes();

		/**
		 * The meta object literal for the '<em><b>Given Angle Degrees</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute SHIELD_WIRE__GIVEN_ANGLE_DEGREES = eINSTANCE.getShieldWire_GivenAngleDegrees();

		/**
		 * The meta object literal for the '{@link spanfield.model.impl.LoadCaseImpl <em>Load Case</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see spanfield.model.impl.LoadCaseImpl
		 * @see spanfield.model.impl.SpanfieldPackageImpl#getLoadCase()
		 * @generated
		 */
		EClass LOAD_CASE = eINSTANCE.getLoadCase();

		/**
		 * The meta object literal for the '<em><b>Basis</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute LOAD_CASE__BASIS = eINSTANCE.getLoadCase_Basis();

		/**
		 * The meta object literal for the '<em><b>Wind Swing Degrees</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute LOAD_CASE__WIND_SWING_DEGREES = eINSTANCE.getLoadCase_WindSwingDegrees();

		/**
		 * The meta object literal for the '<em><b>Loads</b></em>' containment reference list feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EReference LOAD_CASE__LOADS = eINSTANCE.getLoadCase_Loads();

		/**
		 * The meta object literal for the '{@link spanfield.model.impl.CircuitLoadImpl <em>Circuit Load</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see spanfield.model.impl.CircuitLoadImpl
		 * @see spanfield.model.impl.SpanfieldPackageImpl#getCircuitLoad()
		 * @generated
		 */
		EClass CIRCUIT_LOAD = eINSTANCE.getCircuitLoad();

		/**
		 * The meta object literal for the '<em><b>Circuit</b></em>' reference feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EReference CIRCUIT_LOAD__CIRCUIT = eINSTANCE.getCircuitLoad_Circuit();

		/**
		 * The meta object literal for the '<em><b>Direction</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute CIRCUIT_LOAD__DIRECTION = eINSTANCE.getCircuitLoad_Direction();

		/**
		 * The meta object literal for the '{@link spanfield.model.impl.CurrentLoadImpl <em>Current Load</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see spanfield.model.impl.CurrentLoadImpl
		 * @see spanfield.model.impl.SpanfieldPackageImpl#getCurrentLoad()
		 * @generated
		 */
		EClass CURRENT_LOAD = eINSTANCE.getCurrentLoad();

		/**
		 * The meta object literal for the '<em><b>Current Amperes</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute CURRENT_LOAD__CURRENT_AMPERES = eINSTANCE.getCurrentLoad_CurrentAmperes();

		/**
		 * The meta object literal for the '<em><b>Angle Degrees</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute CURRENT_LOAD__ANGLE_DEGREES = eINSTANCE.getCurrentLoad_AngleDegrees();

		/**
		 * The meta object literal for the '{@link spanfield.model.impl.PowerLoadImpl <em>Power Load</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see spanfield.model.impl.PowerLoadImpl
		 * @see spanfield.model.impl.SpanfieldPackageImpl#getPowerLoad()
		 * @generated
		 */
		EClass POWER_LOAD = eINSTANCE.getPowerLoad();

		/**
		 * The meta object literal for the '<em><b>Active Power Watts</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute POWER_LOAD__ACTIVE_POWER_WATTS = eINSTANCE.getPowerLoad_ActivePowerWatts();

		/**
		 * The meta object literal for the '<em><b>Reactive Power Vars</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute POWER_LOAD__REACTIVE_POWER_VARS = eINSTANCE.getPowerLoad_ReactivePowerVars();

		/**
		 * The meta object literal for the '<em><b>Voltage Volts</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute POWER_LOAD__VOLTAGE_VOLTS = eINSTANCE.getPowerLoad_VoltageVolts();

		/**
		 * The meta object literal for the '{@link spanfield.model.impl.SequenceLoadImpl <em>Sequence Load</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see spanfield.model.impl.SequenceLoadImpl
		 * @see spanfield.model.impl.SpanfieldPackageImpl#getSequenceLoad()
		 * @generated
		 */
		EClass SEQUENCE_LOAD = eINSTANCE.getSequenceLoad();

		/**
		 * The meta object literal for the '<em><b>Positive Amperes</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute SEQUENCE_LOAD__POSITIVE_AMPERES = eINSTANCE.getSequenceLoad_PositiveAmperes();

		/**
		 * The meta object literal for the '<em><b>Positive Angle Degrees</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute SEQUENCE_LOAD__POSITIVE_ANGLE_DEGREES = eINSTANCE.getSequenceLoad_PositiveAngleDegrees();

		/**
		 * The meta object literal for the '<em><b>Negative Amperes</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute SEQUENCE_LOAD__NEGATIVE_AMPERES = eINSTANCE.getSequenceLoad_NegativeAmperes();

		/**
		 * The meta object literal for the '<em><b>Negative Angle Degrees</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute SEQUENCE_LOAD__NEGATIVE_ANGLE_DEGREES = eINSTANCE.getSequenceLoad_NegativeAngleDegrees();

		/**
		 * The meta object literal for the '<em><b>Zero Amperes</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute SEQUENCE_LOAD__ZERO_AMPERES = eINSTANCE.getSequenceLoad_ZeroAmperes();

		/**
		 * The meta object literal for the '<em><b>Zero Angle Degrees</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute SEQUENCE_LOAD__ZERO_ANGLE_DEGREES = eINSTANCE.getSequenceLoad_ZeroAngleDegrees();

		/**
		 * The meta object literal for the '{@link spanfield.model.impl.PhasorLoadImpl <em>Phasor Load</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see spanfield.model.impl.PhasorLoadImpl
		 * @see spanfield.model.impl.SpanfieldPackageImpl#getPhasorLoad()
		 * @generated
		 */
		EClass PHASOR_LOAD = eINSTANCE.getPhasorLoad();

		/**
		 * The meta object literal for the '<em><b>Phasors</b></em>' containment reference list feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EReference PHASOR_LOAD__PHASORS = eINSTANCE.getPhasorLoad_Phasors();

		/**
		 * The meta object literal for the '{@link spanfield.model.impl.PhasePhasorImpl <em>Phase Phasor</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see spanfield.model.impl.PhasePhasorImpl
		 * @see spanfield.model.impl.SpanfieldPackageImpl#getPhasePhasor()
		 * @generated
		 */
		EClass PHASE_PHASOR = eINSTANCE.getPhasePhasor();

		/**
		 * The meta object literal for the '<em><b>Phase</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute PHASE_PHASOR__PHASE = eINSTANCE.getPhasePhasor_Phase();

		/**
		 * The meta object literal for the '<em><b>Current Amperes</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute PHASE_PHASOR__CURRENT_AMPERES = eINSTANCE.getPhasePhasor_CurrentAmperes();

		/**
		 * The meta object literal for the '<em><b>Angle Degrees</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute PHASE_PHASOR__ANGLE_DEGREES = eINSTANCE.getPhasePhasor_AngleDegrees();

		/**
		 * The meta object literal for the '{@link spanfield.model.impl.ProfileStationImpl <em>Profile Station</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see spanfield.model.impl.ProfileStationImpl
		 * @see spanfield.model.impl.SpanfieldPackageImpl#getProfileStation()
		 * @generated
		 */
		EClass PROFILE_STATION = eINSTANCE.getProfileStation();

		/**
		 * The meta object literal for the '<em><b>Station Metres</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute PROFILE_STATION__STATION_METRES = eINSTANCE.getProfileStation_StationMetres();

		/**
		 * The meta object literal for the '<em><b>From Offset Metres</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute PROFILE_STATION__FROM_OFFSET_METRES = eINSTANCE.getProfileStation_FromOffsetMetres();

		/**
		 * The meta object literal for the '<em><b>To Offset Metres</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute PROFILE_STATION__TO_OFFSET_METRES = eINSTANCE.getProfileStation_ToOffsetMetres();

		/**
		 * The meta object literal for the '<em><b>Spacing Metres</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute PROFILE_STATION__SPACING_METRES = eINSTANCE.getProfileStation_SpacingMetres();

		/**
		 * The meta object literal for the '{@link spanfield.model.impl.FieldLimitImpl <em>Field Limit</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see spanfield.model.impl.FieldLimitImpl
		 * @see spanfield.model.impl.SpanfieldPackageImpl#getFieldLimit()
		 * @generated
		 */
		EClass FIELD_LIMIT = eINSTANCE.getFieldLimit();

		/**
		 * The meta object literal for the '<em><b>Quantity</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute FIELD_LIMIT__QUANTITY = eINSTANCE.getFieldLimit_Quantity();

		/**
		 * The meta object literal for the '<em><b>Measure</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute FIELD_LIMIT__MEASURE = eINSTANCE.getFieldLimit_Measure();

		/**
		 * The meta object literal for the '<em><b>Level</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute FIELD_LIMIT__LEVEL = eINSTANCE.getFieldLimit_Level();

		/**
		 * The meta object literal for the '<em><b>Place</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute FIELD_LIMIT__PLACE = eINSTANCE.getFieldLimit_Place();

		/**
		 * The meta object literal for the '<em><b>Body</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute FIELD_LIMIT__BODY = eINSTANCE.getFieldLimit_Body();

		/**
		 * The meta object literal for the '<em><b>Edition</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute FIELD_LIMIT__EDITION = eINSTANCE.getFieldLimit_Edition();

		/**
		 * The meta object literal for the '<em><b>Load Condition</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute FIELD_LIMIT__LOAD_CONDITION = eINSTANCE.getFieldLimit_LoadCondition();

		/**
		 * The meta object literal for the '<em><b>Basis</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute FIELD_LIMIT__BASIS = eINSTANCE.getFieldLimit_Basis();

		/**
		 * The meta object literal for the '{@link spanfield.model.impl.SurveyImpl <em>Survey</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see spanfield.model.impl.SurveyImpl
		 * @see spanfield.model.impl.SpanfieldPackageImpl#getSurvey()
		 * @generated
		 */
		EClass SURVEY = eINSTANCE.getSurvey();

		/**
		 * The meta object literal for the '<em><b>Date</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute SURVEY__DATE = eINSTANCE.getSurvey_Date();

		/**
		 * The meta object literal for the '<em><b>Instrument</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute SURVEY__INSTRUMENT = eINSTANCE.getSurvey_Instrument();

		/**
		 * The meta object literal for the '<em><b>Relative Uncertainty</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute SURVEY__RELATIVE_UNCERTAINTY = eINSTANCE.getSurvey_RelativeUncertainty();

		/**
		 * The meta object literal for the '<em><b>Readings</b></em>' containment reference list feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EReference SURVEY__READINGS = eINSTANCE.getSurvey_Readings();

		/**
		 * The meta object literal for the '{@link spanfield.model.impl.SurveyReadingImpl <em>Survey Reading</em>}' class.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see spanfield.model.impl.SurveyReadingImpl
		 * @see spanfield.model.impl.SpanfieldPackageImpl#getSurveyReading()
		 * @generated
		 */
		EClass SURVEY_READING = eINSTANCE.getSurveyReading();

		/**
		 * The meta object literal for the '<em><b>Station Metres</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute SURVEY_READING__STATION_METRES = eINSTANCE.getSurveyReading_StationMetres();

		/**
		 * The meta object literal for the '<em><b>Offset Metres</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute SURVEY_READING__OFFSET_METRES = eINSTANCE.getSurveyReading_OffsetMetres();

		/**
		 * The meta object literal for the '<em><b>Height Metres</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute SURVEY_READING__HEIGHT_METRES = eINSTANCE.getSurveyReading_HeightMetres();

		/**
		 * The meta object literal for the '<em><b>Resultant Tesla</b></em>' attribute feature.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @generated
		 */
		EAttribute SURVEY_READING__RESULTANT_TESLA = eINSTANCE.getSurveyReading_ResultantTesla();

		/**
		 * The meta object literal for the '{@link spanfield.model.EarthModel <em>Earth Model</em>}' enum.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see spanfield.model.EarthModel
		 * @see spanfield.model.impl.SpanfieldPackageImpl#getEarthModel()
		 * @generated
		 */
		EEnum EARTH_MODEL = eINSTANCE.getEarthModel();

		/**
		 * The meta object literal for the '{@link spanfield.model.ImpedanceFormula <em>Impedance Formula</em>}' enum.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see spanfield.model.ImpedanceFormula
		 * @see spanfield.model.impl.SpanfieldPackageImpl#getImpedanceFormula()
		 * @generated
		 */
		EEnum IMPEDANCE_FORMULA = eINSTANCE.getImpedanceFormula();

		/**
		 * The meta object literal for the '{@link spanfield.model.AttachmentRole <em>Attachment Role</em>}' enum.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see spanfield.model.AttachmentRole
		 * @see spanfield.model.impl.SpanfieldPackageImpl#getAttachmentRole()
		 * @generated
		 */
		EEnum ATTACHMENT_ROLE = eINSTANCE.getAttachmentRole();

		/**
		 * The meta object literal for the '{@link spanfield.model.LineEnd <em>Line End</em>}' enum.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see spanfield.model.LineEnd
		 * @see spanfield.model.impl.SpanfieldPackageImpl#getLineEnd()
		 * @generated
		 */
		EEnum LINE_END = eINSTANCE.getLineEnd();

		/**
		 * The meta object literal for the '{@link spanfield.model.Bonding <em>Bonding</em>}' enum.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see spanfield.model.Bonding
		 * @see spanfield.model.impl.SpanfieldPackageImpl#getBonding()
		 * @generated
		 */
		EEnum BONDING = eINSTANCE.getBonding();

		/**
		 * The meta object literal for the '{@link spanfield.model.Phasing <em>Phasing</em>}' enum.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see spanfield.model.Phasing
		 * @see spanfield.model.impl.SpanfieldPackageImpl#getPhasing()
		 * @generated
		 */
		EEnum PHASING = eINSTANCE.getPhasing();

		/**
		 * The meta object literal for the '{@link spanfield.model.FlowDirection <em>Flow Direction</em>}' enum.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see spanfield.model.FlowDirection
		 * @see spanfield.model.impl.SpanfieldPackageImpl#getFlowDirection()
		 * @generated
		 */
		EEnum FLOW_DIRECTION = eINSTANCE.getFlowDirection();

		/**
		 * The meta object literal for the '{@link spanfield.model.FieldQuantity <em>Field Quantity</em>}' enum.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see spanfield.model.FieldQuantity
		 * @see spanfield.model.impl.SpanfieldPackageImpl#getFieldQuantity()
		 * @generated
		 */
		EEnum FIELD_QUANTITY = eINSTANCE.getFieldQuantity();

		/**
		 * The meta object literal for the '{@link spanfield.model.FieldMeasure <em>Field Measure</em>}' enum.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see spanfield.model.FieldMeasure
		 * @see spanfield.model.impl.SpanfieldPackageImpl#getFieldMeasure()
		 * @generated
		 */
		EEnum FIELD_MEASURE = eINSTANCE.getFieldMeasure();

		/**
		 * The meta object literal for the '{@link spanfield.model.LimitPlace <em>Limit Place</em>}' enum.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see spanfield.model.LimitPlace
		 * @see spanfield.model.impl.SpanfieldPackageImpl#getLimitPlace()
		 * @generated
		 */
		EEnum LIMIT_PLACE = eINSTANCE.getLimitPlace();

		/**
		 * The meta object literal for the '{@link spanfield.model.LimitBasis <em>Limit Basis</em>}' enum.
		 * <!-- begin-user-doc -->
		 * <!-- end-user-doc -->
		 * @see spanfield.model.LimitBasis
		 * @see spanfield.model.impl.SpanfieldPackageImpl#getLimitBasis()
		 * @generated
		 */
		EEnum LIMIT_BASIS = eINSTANCE.getLimitBasis();

	}

} //SpanfieldPackage
