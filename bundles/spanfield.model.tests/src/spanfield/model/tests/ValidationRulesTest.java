/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.model.tests;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Random;
import java.util.ResourceBundle;
import java.util.Set;
import java.util.TreeSet;
import java.util.function.Consumer;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import org.eclipse.emf.common.util.EList;
import org.eclipse.emf.ecore.EAttribute;
import org.eclipse.emf.ecore.EObject;
import org.eclipse.emf.ecore.EReference;
import org.eclipse.emf.ecore.EStructuralFeature;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import spanfield.model.AlignmentBend;
import spanfield.model.AttachmentRole;
import spanfield.model.Circuit;
import spanfield.model.Conductor;
import spanfield.model.FieldQuantity;
import spanfield.model.GroundPoint;
import spanfield.model.Line;
import spanfield.model.PhasePhasor;
import spanfield.model.PhasorLoad;
import spanfield.model.PowerLoad;
import spanfield.model.SequenceLoad;
import spanfield.model.ShieldWire;
import spanfield.model.SpanfieldFactory;
import spanfield.model.SpanfieldPackage;
import spanfield.model.StringingSection;
import spanfield.model.Structure;
import spanfield.model.Study;
import spanfield.model.TensionStringing;
import spanfield.model.WireStringing;
import spanfield.model.tests.support.SampleStudies;
import spanfield.model.validation.Finding;
import spanfield.model.validation.Ranges;
import spanfield.model.validation.Severity;
import spanfield.model.validation.StudyValidation;

/** Every rule of the validation: a valid study is broken in one way, and exactly that is found. */
class ValidationRulesTest {

    private static final SpanfieldFactory F = SpanfieldFactory.eINSTANCE;
    private static final SpanfieldPackage P = SpanfieldPackage.eINSTANCE;

    /** Rule (with the variant of its message) to the one change that breaks it. */
    private static final Map<String, Consumer<Study>> BREAKS = new LinkedHashMap<>();

    private static Line line(Study study) {
        return study.getLines().get(0);
    }

    private static Circuit circuit(Study study) {
        return line(study).getCircuits().get(0);
    }

    private static ShieldWire shield(Study study) {
        return line(study).getShieldWires().get(0);
    }

    static {
        BREAKS.put("Attachment_WireAboveBase", s -> s.getStructureTypes().get(0).getAttachments().get(0).setInsulatorLengthMetres(20));
        BREAKS.put("Catalogue_EntryUsed", s -> SampleStudies.conductor(s, "Unused", 0.02, 1e-4));
        BREAKS.put("Circuit_BundleSpacingFits", s -> circuit(s).setBundleCount(2));
        BREAKS.put("Circuit_PhaseLabelsUnique", s -> circuit(s).getPhases().get(1).setLabel("A"));
        BREAKS.put("Circuit_PhaseLabelsUnique.missing", s -> circuit(s).getPhases().get(1).setLabel(" "));
        BREAKS.put("Circuit_PhasesOnDifferentAttachments", s -> circuit(s).getPhases().get(1).setAttachment("left"));
        BREAKS.put("Circuit_ThreePhaseAngles", s -> circuit(s).getPhases().get(1).setAngleDegrees(-110));
        BREAKS.put("Conductor_RadiusFits", s -> s.getConductors().get(0).setGeometricMeanRadiusMetres(0.02));
        BREAKS.put("Conductor_TemperaturesInOrder", s -> {
            s.getConductors().get(0).setHighResistanceOhmsPerMetre(1e-4);
            s.getConductors().get(0).setHighTemperatureCelsius(20);
        });
        BREAKS.put("Corridor_EdgesInOrder", s -> s.getCorridor().getEdges().get(0).setLeftOffsetMetres(20));
        BREAKS.put("Corridor_SlopeOrPoints", s -> {
            s.getCorridor().setCrossSlope(0.1);
            s.getCorridor().getGroundPoints().add(F.createGroundPoint());
        });
        BREAKS.put("Corridor_StationsIncrease", s -> s.getCorridor().getEdges().add(SampleStudies.edge(0, -20, 20)));
        BREAKS.put("FieldLimit_QuantityComputed", s -> s.getLimits().get(0).setQuantity(FieldQuantity.ELECTRIC));
        BREAKS.put("Line_AttachmentUsedOnce", s -> {
            Circuit second = SampleStudies.circuit(line(s), "Second", s.getConductors().get(0), "left");
            s.getLoadCases().get(0).getLoads().add(SampleStudies.load(second, 5));
        });
        BREAKS.put("Line_HasTwoStructures", s -> {
            line(s).getStructures().remove(2);
            line(s).getStructures().remove(1);
            s.getStations().get(0).setStationMetres(-300);
        });
        BREAKS.put("Line_HasWires", s -> {
            Line bare = SampleStudies.line(s, "Bare", s.getStructureTypes().get(0), 0, 200);
            bare.getStructures().forEach(structure -> structure.setOffsetMetres(200));
        });
        BREAKS.put("Line_SectionsCoverSpans", s -> line(s).getSections().get(0).setTo(line(s).getStructures().get(1)));
        BREAKS.put("Line_SectionsCoverSpans.twice", s -> {
            StringingSection second = F.createStringingSection();
            second.setFrom(line(s).getStructures().get(1));
            second.setPhaseStringing(F.createCatenaryStringing());
            ((spanfield.model.CatenaryStringing) second.getPhaseStringing()).setCatenaryConstantMetres(1200);
            line(s).getSections().add(second);
        });
        BREAKS.put("Line_StructuresApart", s -> line(s).getStructures().get(1).setStationMetres(-300));
        BREAKS.put("Line_StructuresInOrder", s -> {
            line(s).getStructures().get(1).setStationMetres(300);
            line(s).getStructures().get(2).setStationMetres(0);
        });
        BREAKS.put("LoadCase_CircuitLoadedOnce", s -> s.getLoadCases().get(0).getLoads().add(SampleStudies.load(circuit(s), 5)));
        BREAKS.put("LoadCase_EveryCircuitLoaded", s -> {
            s.getStructureTypes().get(0).getAttachments().add(SampleStudies.attachment("extra", 14, 20, 2, AttachmentRole.PHASE));
            SampleStudies.circuit(line(s), "Second", s.getConductors().get(0), "extra");
        });
        BREAKS.put("LoadCase_NotEmpty", s -> s.getLoadCases().get(0).getLoads().clear());
        BREAKS.put("PhasorLoad_PhasesKnown", s -> phasors(s, "A", "D"));
        BREAKS.put("PhasorLoad_PhasesKnown.twice", s -> phasors(s, "A", "A"));
        BREAKS.put("PowerLoad_HasVoltage", s -> {
            circuit(s).setNominalVoltageVolts(0);
            PowerLoad load = F.createPowerLoad();
            load.setCircuit(circuit(s));
            load.setActivePowerWatts(1e8);
            s.getLoadCases().get(0).getLoads().set(0, load);
        });
        BREAKS.put("ProfileStation_OffsetsInOrder", s -> s.getStations().get(0).setToOffsetMetres(-60));
        BREAKS.put("ProfileStation_PointCount", s -> {
            s.getStations().get(0).setFromOffsetMetres(-2000);
            s.getStations().get(0).setSpacingMetres(0.1);
        });
        BREAKS.put("ProfileStation_WithinLines", s -> s.getStations().get(0).setStationMetres(301));
        BREAKS.put("Reference_Present", s -> circuit(s).setConductor(null));
        BREAKS.put("Reference_WithinStudy", s -> circuit(s).setConductor(SampleStudies.flat().getConductors().get(0)));
        BREAKS.put("Section_FromBeforeTo", s -> {
            line(s).getSections().get(0).setFrom(line(s).getStructures().get(2));
            line(s).getSections().get(0).setTo(line(s).getStructures().get(0));
        });
        BREAKS.put("Section_StructuresOfLine", s -> {
            Line other = SampleStudies.line(s, "Other", s.getStructureTypes().get(0), 0, 200);
            SampleStudies.circuit(other, "Other circuit", s.getConductors().get(0), "left", "middle", "right");
            s.getLoadCases().get(0).getLoads().add(SampleStudies.load(other.getCircuits().get(0), 5));
            line(s).getSections().get(0).setFrom(other.getStructures().get(0));
        });
        BREAKS.put("Section_WiresOfLine", s -> {
            Line other = SampleStudies.line(s, "Other", s.getStructureTypes().get(0), 0, 200);
            SampleStudies.circuit(other, "Other circuit", s.getConductors().get(0), "left", "middle", "right");
            s.getLoadCases().get(0).getLoads().add(SampleStudies.load(other.getCircuits().get(0), 5));
            WireStringing exception = F.createWireStringing();
            exception.setStringing(F.createCatenaryStringing());
            ((spanfield.model.CatenaryStringing) exception.getStringing()).setCatenaryConstantMetres(900);
            exception.getWires().add(other.getCircuits().get(0));
            line(s).getSections().get(0).getExceptions().add(exception);
        });
        BREAKS.put("SequenceLoad_ThreePhases", s -> {
            circuit(s).getPhases().remove(2);
            SequenceLoad load = F.createSequenceLoad();
            load.setCircuit(circuit(s));
            s.getLoadCases().get(0).getLoads().set(0, load);
        });
        BREAKS.put("ShieldWire_BondedHasEarth", s -> {
            s.setEarthResistivityOhmMetres(null);
            s.setEarthModel(spanfield.model.EarthModel.NONE);
        });
        BREAKS.put("ShieldWire_BondedHasResistance", s -> s.getConductors().get(1).setLowResistanceOhmsPerMetre(null));
        BREAKS.put("Stringing_TensionHasMass", s -> {
            TensionStringing tension = F.createTensionStringing();
            tension.setHorizontalTensionNewtons(2e4);
            line(s).getSections().get(0).setPhaseStringing(tension);
            s.getConductors().get(0).setMassKilogramsPerMetre(null);
        });
        BREAKS.put("StructureType_AttachmentNamesUnique", s -> s.getStructureTypes().get(0).getAttachments()
            .add(SampleStudies.attachment("left", 15, 20, 2, AttachmentRole.PHASE)));
        BREAKS.put("StructureType_AttachmentNamesUnique.missing", s -> s.getStructureTypes().get(0).getAttachments()
            .add(SampleStudies.attachment("", 15, 20, 2, AttachmentRole.PHASE)));
        BREAKS.put("StructureType_AttachmentsApart", s -> s.getStructureTypes().get(0).getAttachments()
            .add(SampleStudies.attachment("again", -8, 20, 2, AttachmentRole.PHASE)));
        BREAKS.put("Study_DirectCurrentAngles", s -> {
            s.setFrequencyHertz(0);
            circuit(s).getPhases().remove(2);
            circuit(s).getPhases().get(1).setAngleDegrees(170);
        });
        BREAKS.put("Study_EarthHasResistivity", s -> {
            s.setEarthResistivityOhmMetres(null);
            shield(s).setBonding(spanfield.model.Bonding.INSULATED);
        });
        BREAKS.put("Study_HasLine", s -> {
            s.getLines().clear();
            s.getConductors().clear();
            s.getStructureTypes().clear();
        });
        BREAKS.put("Study_HasLoadCase", s -> s.getLoadCases().clear());
        BREAKS.put("Study_HasStation", s -> s.getStations().clear());
        BREAKS.put("Study_NamesUnique", s -> SampleStudies.loadCase(s, "Rating", circuit(s), 3));
        BREAKS.put("Study_NamesUnique.missing", s -> s.getStations().get(0).setName(""));
        BREAKS.put("Value_WithinRange", s -> s.setReferenceHeightMetres(Double.NaN));
        BREAKS.put("Wire_AttachmentExists", s -> circuit(s).getPhases().get(0).setAttachment("nowhere"));
        BREAKS.put("Wire_AttachmentExists.missing", s -> circuit(s).getPhases().get(0).setAttachment(null));
        BREAKS.put("Wire_AttachmentRoleFits", s -> s.getStructureTypes().get(0).getAttachments().get(3).setRole(AttachmentRole.PHASE));
    }

    private static void phasors(Study study, String... labels) {
        PhasorLoad load = F.createPhasorLoad();
        load.setCircuit(circuit(study));
        for (String label : labels) {
            PhasePhasor phasor = F.createPhasePhasor();
            phasor.setPhase(label);
            load.getPhasors().add(phasor);
        }
        study.getLoadCases().get(0).getLoads().set(0, load);
    }

    static Stream<String> rules() {
        return BREAKS.keySet().stream();
    }

    @Test
    void validStudies_haveNoFinding() {
        assertEquals(List.of(), StudyValidation.validate(SampleStudies.flat()));
        for (long seed = 0; seed < 40; seed++) {
            assertEquals(List.of(), StudyValidation.validate(SampleStudies.random(seed)), "seed " + seed);
        }
    }

    @ParameterizedTest
    @MethodSource("rules")
    void brokenRule_isFoundAlone(String rule) {
        Study study = SampleStudies.flat();
        BREAKS.get(rule).accept(study);
        List<Finding> findings = StudyValidation.validate(study);
        Set<String> names = findings.stream().map(Finding::rule).collect(Collectors.toCollection(TreeSet::new));
        if (rule.equals("Study_HasLine")) {
            // without lines the loads have lost their circuits too
            names.remove("Reference_WithinStudy");
        } else if (rule.startsWith("Reference_")) {
            // the conductor that is no longer referred to is unused
            names.remove("Catalogue_EntryUsed");
        }
        assertEquals(Set.of(rule), names, findings.toString());
        for (Finding finding : findings) {
            assertFalse(finding.message().contains("{"), finding.message());
            assertFalse(finding.message().contains("null"), finding.message());
            assertTrue(finding.message().endsWith("."), finding.message());
            assertFalse(finding.place().isBlank());
        }
    }

    @Test
    void everyMessage_belongsToATestedRule() {
        Set<String> keys = new TreeSet<>(ResourceBundle.getBundle("spanfield.model.validation.messages", Locale.ROOT,
            StudyValidation.class.getClassLoader()).keySet());
        assertEquals(new TreeSet<>(BREAKS.keySet()), keys);
    }

    @Test
    void everyNumber_hasARange() {
        List<String> without = new ArrayList<>();
        P.getEClassifiers().stream().filter(c -> c instanceof org.eclipse.emf.ecore.EClass).map(c -> (org.eclipse.emf.ecore.EClass) c)
            .flatMap(c -> c.getEAttributes().stream()).filter(a -> Number.class.isAssignableFrom(box(a.getEAttributeType().getInstanceClass())))
            .filter(a -> Ranges.of(a) == null).forEach(a -> without.add(a.getEContainingClass().getName() + "." + a.getName()));
        assertEquals(List.of(), without);
    }

    private static Class<?> box(Class<?> type) {
        return type == double.class ? Double.class : type == int.class ? Integer.class : type;
    }

    /** Each number of the flat study set to NaN, infinities and absurd values gives an error and nothing throws. */
    @Test
    void nanInfiniteAndAbsurdNumbers_areErrors() {
        List<EObject> objects = new ArrayList<>();
        Study study = SampleStudies.flat();
        study.eAllContents().forEachRemaining(objects::add);
        objects.add(study);
        int checked = 0;
        for (EObject object : objects) {
            for (EAttribute attribute : object.eClass().getEAllAttributes()) {
                if (attribute.getEAttributeType().getInstanceClass() != double.class && attribute.getEAttributeType().getInstanceClass() != Double.class) {
                    continue;
                }
                Object before = object.eGet(attribute);
                for (double bad : new double[] {Double.NaN, Double.POSITIVE_INFINITY, Double.NEGATIVE_INFINITY, 1e300, -1e300}) {
                    object.eSet(attribute, bad);
                    assertTrue(StudyValidation.validate(study).stream().anyMatch(f -> f.isError() && f.object() == object && f.feature() == attribute),
                        attribute.getName() + " = " + bad);
                    checked++;
                }
                object.eSet(attribute, before);
            }
        }
        assertTrue(checked > 300, "numbers checked: " + checked);
        assertEquals(List.of(), StudyValidation.validate(study));
    }

    /** Whatever is removed or scrambled, validation answers with findings and never throws. */
    @Test
    void mutilatedStudies_neverMakeValidationThrow() {
        Random random = new Random(4);
        for (int t = 0; t < 600; t++) {
            Study study = SampleStudies.random(t % 20);
            for (int k = 0; k < 1 + random.nextInt(6); k++) {
                mutilate(study, random);
            }
            for (Finding finding : StudyValidation.validate(study)) {
                assertTrue(finding.severity() != null && !finding.message().isBlank());
            }
        }
    }

    private static void mutilate(Study study, Random random) {
        List<EObject> objects = new ArrayList<>();
        objects.add(study);
        study.eAllContents().forEachRemaining(objects::add);
        EObject object = objects.get(random.nextInt(objects.size()));
        List<EStructuralFeature> features = object.eClass().getEAllStructuralFeatures();
        EStructuralFeature feature = features.get(random.nextInt(features.size()));
        if (feature.isMany()) {
            EList<?> list = (EList<?>) object.eGet(feature);
            if (!list.isEmpty()) {
                list.remove(random.nextInt(list.size()));
            }
        } else if (feature instanceof EReference) {
            object.eSet(feature, null);
        } else if (feature.getEType().getInstanceClass() == String.class) {
            object.eSet(feature, random.nextBoolean() ? null : "x");
        } else {
            object.eUnset(feature);
        }
    }

    @Test
    void findings_areSortedBySeverityAndNamePlaces() {
        Study study = SampleStudies.flat();
        SampleStudies.conductor(study, "Unused", 0.02, 1e-4);
        circuit(study).getPhases().get(1).setAttachment("left");
        List<Finding> findings = StudyValidation.validate(study);
        assertEquals(Severity.ERROR, findings.get(0).severity());
        assertEquals(Severity.INFO, findings.get(findings.size() - 1).severity());
        assertEquals("line 'Line' > circuit 'Circuit' > phase 'B'", findings.get(0).place());
    }

    @Test
    void exampleOfEveryBend_isAccepted() {
        Study study = SampleStudies.flat();
        AlignmentBend bend = F.createAlignmentBend();
        bend.setStationMetres(100);
        bend.setDeflectionDegrees(30);
        study.getCorridor().getBends().add(bend);
        GroundPoint point = F.createGroundPoint();
        point.setOffsetMetres(5);
        study.getCorridor().getGroundPoints().add(point);
        Structure angle = line(study).getStructures().get(1);
        angle.setTurnDegrees(15.0);
        Conductor conductor = study.getConductors().get(0);
        conductor.setEmissivity(0.5);
        assertEquals(List.of(), StudyValidation.validate(study));
    }
}
