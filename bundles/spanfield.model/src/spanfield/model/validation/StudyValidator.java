/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.model.validation;

import java.text.MessageFormat;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.HashSet;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.ResourceBundle;
import java.util.Set;
import org.eclipse.emf.common.util.BasicDiagnostic;
import org.eclipse.emf.common.util.Diagnostic;
import org.eclipse.emf.common.util.DiagnosticChain;
import org.eclipse.emf.ecore.EAttribute;
import org.eclipse.emf.ecore.EClass;
import org.eclipse.emf.ecore.EDataType;
import org.eclipse.emf.ecore.EObject;
import org.eclipse.emf.ecore.EReference;
import org.eclipse.emf.ecore.EStructuralFeature;
import org.eclipse.emf.ecore.EValidator;
import spanfield.model.AlignmentBend;
import spanfield.model.Attachment;
import spanfield.model.AttachmentRole;
import spanfield.model.Bonding;
import spanfield.model.Circuit;
import spanfield.model.CircuitLoad;
import spanfield.model.Conductor;
import spanfield.model.Corridor;
import spanfield.model.EarthModel;
import spanfield.model.EdgePoint;
import spanfield.model.ElevationPoint;
import spanfield.model.FieldLimit;
import spanfield.model.FieldQuantity;
import spanfield.model.GroundPoint;
import spanfield.model.Line;
import spanfield.model.LoadCase;
import spanfield.model.NamedElement;
import spanfield.model.Phase;
import spanfield.model.PhasePhasor;
import spanfield.model.PhasorLoad;
import spanfield.model.PowerLoad;
import spanfield.model.ProfileStation;
import spanfield.model.SequenceLoad;
import spanfield.model.ShieldWire;
import spanfield.model.SpanfieldPackage;
import spanfield.model.Stringing;
import spanfield.model.StringingSection;
import spanfield.model.StrungElement;
import spanfield.model.Structure;
import spanfield.model.StructureType;
import spanfield.model.Study;
import spanfield.model.TensionStringing;
import spanfield.model.WireStringing;

/**
 * The rules of a study that need no sagged geometry. Each rule is a method named after what should hold; its messages stand in
 * messages.properties under the same name. Never throws on any model, however broken.
 */
public final class StudyValidator implements EValidator {

    /** Source of the diagnostics. */
    public static final String SOURCE = "spanfield.model";

    /** Most points of a profile: 10 cm over two kilometres. */
    public static final int MOST_PROFILE_POINTS = 20001;

    /** Shortest admissible span in metres. */
    public static final double LEAST_SPAN_METRES = 1;

    /** Turn between spans, in degrees, beyond which the structures are probably not in the order of the line. */
    private static final double PROBABLE_DISORDER_DEGREES = 100;

    private static final double PHASE_ANGLE_TOLERANCE_DEGREES = 1e-6;

    private static final SpanfieldPackage P = SpanfieldPackage.eINSTANCE;
    private static final ResourceBundle MESSAGES = ResourceBundle.getBundle("spanfield.model.validation.messages", Locale.ROOT,
        StudyValidator.class.getClassLoader());

    @Override
    public boolean validate(EObject object, DiagnosticChain diagnostics, Map<Object, Object> context) {
        return validate(object.eClass(), object, diagnostics, context);
    }

    @Override
    public boolean validate(EClass type, EObject object, DiagnosticChain chain, Map<Object, Object> context) {
        Rules rules = new Rules(chain);
        rules.Value_WithinRange(object);
        rules.Reference_Present(object);
        rules.check(object);
        return rules.sound;
    }

    @Override
    public boolean validate(EDataType type, Object value, DiagnosticChain diagnostics, Map<Object, Object> context) {
        return true;
    }

    /** Text of a message; keys are rule names. */
    static String message(String key, Object... arguments) {
        return new MessageFormat(MESSAGES.getString(key), Locale.ROOT).format(arguments);
    }

    /** The rules, bound to where their findings go. */
    private static final class Rules {

        private final DiagnosticChain chain;
        private boolean sound = true;

        Rules(DiagnosticChain chain) {
            this.chain = chain;
        }

        private void report(int severity, String rule, EObject object, EStructuralFeature feature, Object... arguments) {
            if (severity == Diagnostic.ERROR) {
                sound = false;
            }
            Object[] texts = new Object[arguments.length];
            for (int i = 0; i < texts.length; i++) {
                texts[i] = arguments[i] instanceof Double number ? number(number) : String.valueOf(arguments[i]);
            }
            if (chain != null) {
                chain.add(new BasicDiagnostic(severity, SOURCE, 0, message(rule, texts), new Object[] {object, feature, rule}));
            }
        }

        private void error(String rule, EObject object, EStructuralFeature feature, Object... arguments) {
            report(Diagnostic.ERROR, rule, object, feature, arguments);
        }

        private void warning(String rule, EObject object, EStructuralFeature feature, Object... arguments) {
            report(Diagnostic.WARNING, rule, object, feature, arguments);
        }

        private static String number(double value) {
            return value == Math.rint(value) && Math.abs(value) < 1e7 ? Long.toString((long) value) : Double.toString(value);
        }

        void check(EObject object) {
            if (object instanceof Study study) {
                checkStudy(study);
            } else if (object instanceof Corridor corridor) {
                checkCorridor(corridor);
            } else if (object instanceof Conductor conductor) {
                checkConductor(conductor);
            } else if (object instanceof StructureType type) {
                checkStructureType(type);
            } else if (object instanceof Line line) {
                checkLine(line);
            } else if (object instanceof Circuit circuit) {
                checkCircuit(circuit);
            } else if (object instanceof ShieldWire wire) {
                checkShieldWire(wire);
            } else if (object instanceof LoadCase loadCase) {
                checkLoadCase(loadCase);
            } else if (object instanceof CircuitLoad load) {
                checkLoad(load);
            } else if (object instanceof ProfileStation station) {
                checkStation(station);
            } else if (object instanceof FieldLimit limit) {
                FieldLimit_QuantityComputed(limit);
            }
        }

        void Value_WithinRange(EObject object) {
            for (EAttribute attribute : object.eClass().getEAllAttributes()) {
                Ranges.Range range = Ranges.of(attribute);
                if (range == null || !(object.eGet(attribute) instanceof Number value)) {
                    continue;
                }
                if (!range.contains(value.doubleValue())) {
                    error("Value_WithinRange", object, attribute, Places.name(object), Places.words(attribute.getName()), value.doubleValue(),
                        range.openLow() ? "above " + number(range.least()) : "at least " + number(range.least()), number(range.greatest()),
                        range.unit().isEmpty() ? "" : " " + range.unit());
                }
            }
        }

        void Reference_Present(EObject object) {
            for (EReference reference : object.eClass().getEAllReferences()) {
                if (reference.getLowerBound() < 1) {
                    continue;
                }
                Object value = object.eGet(reference, false);
                if (value == null || value instanceof List<?> list && list.isEmpty()) {
                    error("Reference_Present", object, reference, Places.name(object), Places.words(reference.getName()));
                } else if (!reference.isContainment() && !(value instanceof List<?>) && study((EObject) value) != study(object)) {
                    error("Reference_WithinStudy", object, reference, Places.name(object), Places.words(reference.getName()));
                }
            }
        }

        private static Study study(EObject object) {
            EObject at = object;
            while (at != null && !(at instanceof Study)) {
                at = at.eContainer();
            }
            return (Study) at;
        }

        // study

        private void checkStudy(Study study) {
            Study_HasLine(study);
            Study_HasLoadCase(study);
            Study_HasStation(study);
            Study_NamesUnique(study);
            Study_DirectCurrentAngles(study);
            Study_EarthHasResistivity(study);
            Catalogue_EntryUsed(study);
        }

        private void Study_HasLine(Study study) {
            if (study.getLines().isEmpty()) {
                error("Study_HasLine", study, P.getStudy_Lines());
            }
        }

        private void Study_HasLoadCase(Study study) {
            if (study.getLoadCases().isEmpty()) {
                error("Study_HasLoadCase", study, P.getStudy_LoadCases());
            }
        }

        private void Study_HasStation(Study study) {
            if (study.getStations().isEmpty()) {
                error("Study_HasStation", study, P.getStudy_Stations());
            }
        }

        private void Study_NamesUnique(Study study) {
            List<NamedElement> circuits = new ArrayList<>();
            study.getLines().forEach(line -> circuits.addAll(line.getCircuits()));
            for (List<? extends NamedElement> list : List.of(study.getLines(), circuits, study.getLoadCases(), study.getStations(),
                study.getConductors(), study.getStructureTypes())) {
                Set<String> names = new HashSet<>();
                for (NamedElement element : list) {
                    if (element.getName() == null || element.getName().isBlank()) {
                        warning("Study_NamesUnique.missing", element, P.getNamedElement_Name(), Places.name(element));
                    } else if (!names.add(element.getName().strip())) {
                        warning("Study_NamesUnique", element, P.getNamedElement_Name(), Places.name(element));
                    }
                }
            }
        }

        private void Study_DirectCurrentAngles(Study study) {
            if (study.getFrequencyHertz() != 0) {
                return;
            }
            for (Line line : study.getLines()) {
                for (Circuit circuit : line.getCircuits()) {
                    for (Phase phase : circuit.getPhases()) {
                        if (Math.abs(Math.sin(Math.toRadians(phase.getAngleDegrees()))) > 1e-9) {
                            error("Study_DirectCurrentAngles", phase, P.getPhase_AngleDegrees(), Places.path(phase), phase.getAngleDegrees());
                        }
                    }
                }
            }
        }

        private void Study_EarthHasResistivity(Study study) {
            if (study.getEarthResistivityOhmMetres() == null && study.getEarthModel() != EarthModel.NONE && study.getFrequencyHertz() > 0) {
                warning("Study_EarthHasResistivity", study, P.getStudy_EarthResistivityOhmMetres());
            }
        }

        private void Catalogue_EntryUsed(Study study) {
            Set<Object> used = new HashSet<>();
            for (Line line : study.getLines()) {
                line.getStructures().forEach(structure -> used.add(structure.getType()));
                line.getCircuits().forEach(circuit -> used.add(circuit.getConductor()));
                line.getShieldWires().forEach(wire -> used.add(wire.getConductor()));
            }
            List<NamedElement> entries = new ArrayList<>(study.getConductors());
            entries.addAll(study.getStructureTypes());
            for (NamedElement entry : entries) {
                if (!used.contains(entry)) {
                    report(Diagnostic.INFO, "Catalogue_EntryUsed", entry, null, Places.name(entry));
                }
            }
        }

        // corridor

        private void checkCorridor(Corridor corridor) {
            Corridor_EdgesInOrder(corridor);
            Corridor_StationsIncrease(corridor);
            Corridor_SlopeOrPoints(corridor);
        }

        private void Corridor_EdgesInOrder(Corridor corridor) {
            for (EdgePoint edge : corridor.getEdges()) {
                if (!(edge.getLeftOffsetMetres() < edge.getRightOffsetMetres())) {
                    error("Corridor_EdgesInOrder", edge, P.getEdgePoint_LeftOffsetMetres(), edge.getStationMetres(), edge.getLeftOffsetMetres(),
                        edge.getRightOffsetMetres());
                }
            }
        }

        private void Corridor_StationsIncrease(Corridor corridor) {
            increasing(corridor.getEdges().stream().map(EdgePoint::getStationMetres).toList(), corridor.getEdges(), P.getEdgePoint_StationMetres());
            increasing(corridor.getGroundPoints().stream().map(GroundPoint::getOffsetMetres).toList(), corridor.getGroundPoints(),
                P.getGroundPoint_OffsetMetres());
            increasing(corridor.getCentrelineElevations().stream().map(ElevationPoint::getStationMetres).toList(),
                corridor.getCentrelineElevations(), P.getElevationPoint_StationMetres());
            increasing(corridor.getBends().stream().map(AlignmentBend::getStationMetres).toList(), corridor.getBends(),
                P.getAlignmentBend_StationMetres());
        }

        private void increasing(List<Double> values, List<? extends EObject> objects, EStructuralFeature feature) {
            for (int i = 1; i < values.size(); i++) {
                if (!(values.get(i) > values.get(i - 1))) {
                    error("Corridor_StationsIncrease", objects.get(i), feature, Places.name(objects.get(i)), Places.words(feature.getName()),
                        values.get(i), values.get(i - 1));
                }
            }
        }

        private void Corridor_SlopeOrPoints(Corridor corridor) {
            if (corridor.getCrossSlope() != 0 && !corridor.getGroundPoints().isEmpty()) {
                warning("Corridor_SlopeOrPoints", corridor, P.getCorridor_CrossSlope());
            }
        }

        // catalogues

        private void checkConductor(Conductor conductor) {
            Conductor_RadiusFits(conductor);
            Conductor_TemperaturesInOrder(conductor);
        }

        private void Conductor_RadiusFits(Conductor conductor) {
            Double gmr = conductor.getGeometricMeanRadiusMetres();
            if (gmr != null && gmr > conductor.getDiameterMetres() / 2) {
                error("Conductor_RadiusFits", conductor, P.getConductor_GeometricMeanRadiusMetres(), Places.name(conductor), gmr,
                    conductor.getDiameterMetres() / 2);
            }
        }

        private void Conductor_TemperaturesInOrder(Conductor conductor) {
            if (conductor.getLowResistanceOhmsPerMetre() != null && conductor.getHighResistanceOhmsPerMetre() != null
                && !(conductor.getLowTemperatureCelsius() < conductor.getHighTemperatureCelsius())) {
                error("Conductor_TemperaturesInOrder", conductor, P.getConductor_LowTemperatureCelsius(), Places.name(conductor),
                    conductor.getLowTemperatureCelsius(), conductor.getHighTemperatureCelsius());
            }
        }

        private void checkStructureType(StructureType type) {
            StructureType_AttachmentNamesUnique(type);
            StructureType_AttachmentsApart(type);
            for (Attachment attachment : type.getAttachments()) {
                Attachment_WireAboveBase(attachment);
            }
        }

        private void StructureType_AttachmentNamesUnique(StructureType type) {
            Set<String> names = new HashSet<>();
            for (Attachment attachment : type.getAttachments()) {
                if (attachment.getName() == null || attachment.getName().isBlank()) {
                    error("StructureType_AttachmentNamesUnique.missing", attachment, P.getAttachment_Name(), Places.name(type));
                } else if (!names.add(attachment.getName())) {
                    error("StructureType_AttachmentNamesUnique", attachment, P.getAttachment_Name(), Places.name(type), attachment.getName());
                }
            }
        }

        private void StructureType_AttachmentsApart(StructureType type) {
            List<Attachment> all = type.getAttachments();
            for (int i = 0; i < all.size(); i++) {
                for (int j = 0; j < i; j++) {
                    double dx = all.get(i).getOffsetMetres() - all.get(j).getOffsetMetres();
                    double dz = wireHeight(all.get(i)) - wireHeight(all.get(j));
                    if (Math.hypot(dx, dz) < 0.01) {
                        error("StructureType_AttachmentsApart", all.get(i), P.getAttachment_OffsetMetres(), Places.name(type),
                            all.get(j).getName(), all.get(i).getName());
                    }
                }
            }
        }

        private static double wireHeight(Attachment attachment) {
            return attachment.getHeightMetres() - attachment.getInsulatorLengthMetres();
        }

        private void Attachment_WireAboveBase(Attachment attachment) {
            if (wireHeight(attachment) <= 0) {
                error("Attachment_WireAboveBase", attachment, P.getAttachment_InsulatorLengthMetres(), Places.path(attachment),
                    attachment.getInsulatorLengthMetres(), attachment.getHeightMetres());
            }
        }

        // lines

        private void checkLine(Line line) {
            Line_HasTwoStructures(line);
            Line_HasWires(line);
            Line_StructuresApart(line);
            Line_StructuresInOrder(line);
            Line_SectionsCoverSpans(line);
            Line_AttachmentUsedOnce(line);
            Stringing_TensionHasMass(line);
            Section_WiresOfLine(line);
        }

        private void Line_HasTwoStructures(Line line) {
            if (line.getStructures().size() == 1) {
                error("Line_HasTwoStructures", line, P.getLine_Structures(), Places.name(line));
            }
        }

        private void Line_HasWires(Line line) {
            if (line.getCircuits().isEmpty() && line.getShieldWires().isEmpty()) {
                error("Line_HasWires", line, P.getLine_Circuits(), Places.name(line));
            }
        }

        private void Line_StructuresApart(Line line) {
            List<Structure> all = line.getStructures();
            for (int i = 1; i < all.size(); i++) {
                double length = Math.hypot(all.get(i).getStationMetres() - all.get(i - 1).getStationMetres(),
                    all.get(i).getOffsetMetres() - all.get(i - 1).getOffsetMetres());
                if (!(length >= LEAST_SPAN_METRES)) {
                    error("Line_StructuresApart", all.get(i), P.getStructure_StationMetres(), Places.name(all.get(i - 1)),
                        Places.name(all.get(i)), Places.name(line), length, LEAST_SPAN_METRES);
                }
            }
        }

        private void Line_StructuresInOrder(Line line) {
            List<Structure> all = line.getStructures();
            for (int i = 2; i < all.size(); i++) {
                double before = heading(all.get(i - 2), all.get(i - 1));
                double after = heading(all.get(i - 1), all.get(i));
                double turn = Math.abs(Math.toDegrees(Math.IEEEremainder(after - before, 2 * Math.PI)));
                if (turn > PROBABLE_DISORDER_DEGREES) {
                    warning("Line_StructuresInOrder", all.get(i), P.getStructure_StationMetres(), Places.name(line),
                        Places.name(all.get(i - 1)), (double) Math.round(turn));
                }
            }
        }

        private static double heading(Structure from, Structure to) {
            return Math.atan2(to.getOffsetMetres() - from.getOffsetMetres(), to.getStationMetres() - from.getStationMetres());
        }

        private void Line_SectionsCoverSpans(Line line) {
            int spans = line.getStructures().size() - 1;
            if (spans < 1 || line.getSections().isEmpty()) {
                return;
            }
            int[] covered = new int[spans];
            for (StringingSection section : line.getSections()) {
                int from = section.getFrom() == null ? 0 : line.getStructures().indexOf(section.getFrom());
                int to = section.getTo() == null ? spans : line.getStructures().indexOf(section.getTo());
                if (from < 0 || to < 0) {
                    error("Section_StructuresOfLine", section, P.getStringingSection_From(), Places.name(section), Places.name(line));
                    return;
                }
                if (from >= to) {
                    error("Section_FromBeforeTo", section, P.getStringingSection_To(), Places.name(section), Places.name(line));
                    return;
                }
                for (int i = from; i < to; i++) {
                    covered[i]++;
                }
            }
            for (int i = 0; i < spans; i++) {
                if (covered[i] != 1) {
                    error(covered[i] == 0 ? "Line_SectionsCoverSpans" : "Line_SectionsCoverSpans.twice", line, P.getLine_Sections(), Places.name(line),
                        Places.name(line.getStructures().get(i)), Places.name(line.getStructures().get(i + 1)));
                }
            }
        }

        private void Line_AttachmentUsedOnce(Line line) {
            Map<String, EObject> users = new HashMap<>();
            for (Circuit circuit : line.getCircuits()) {
                for (Phase phase : circuit.getPhases()) {
                    use(line, users, phase.getAttachment(), phase, P.getPhase_Attachment());
                }
            }
            for (ShieldWire wire : line.getShieldWires()) {
                use(line, users, wire.getAttachment(), wire, P.getShieldWire_Attachment());
            }
        }

        private void use(Line line, Map<String, EObject> users, String attachment, EObject user, EStructuralFeature feature) {
            if (attachment == null || attachment.isBlank()) {
                return;
            }
            EObject other = users.putIfAbsent(attachment, user);
            if (other != null) {
                String rule = other.eContainer() == user.eContainer() && user instanceof Phase ? "Circuit_PhasesOnDifferentAttachments"
                    : "Line_AttachmentUsedOnce";
                error(rule, user, feature, Places.path(user), Places.path(other), attachment);
            }
        }

        private void Stringing_TensionHasMass(Line line) {
            for (StringingSection section : line.getSections()) {
                tensionHasMass(section.getPhaseStringing(), line.getCircuits());
                tensionHasMass(section.getShieldStringing() == null ? section.getPhaseStringing() : section.getShieldStringing(), line.getShieldWires());
                for (WireStringing exception : section.getExceptions()) {
                    tensionHasMass(exception.getStringing(), exception.getWires());
                }
            }
        }

        private void tensionHasMass(Stringing stringing, List<? extends StrungElement> wires) {
            if (!(stringing instanceof TensionStringing)) {
                return;
            }
            Set<Conductor> reported = new LinkedHashSet<>();
            for (StrungElement wire : wires) {
                Conductor conductor = wire.getConductor();
                if (conductor != null && conductor.getMassKilogramsPerMetre() == null && reported.add(conductor)) {
                    error("Stringing_TensionHasMass", stringing, P.getTensionStringing_HorizontalTensionNewtons(), Places.path(stringing),
                        Places.name(conductor));
                }
            }
        }

        private void Section_WiresOfLine(Line line) {
            for (StringingSection section : line.getSections()) {
                for (WireStringing exception : section.getExceptions()) {
                    for (StrungElement wire : exception.getWires()) {
                        if (wire.eContainer() != line) {
                            error("Section_WiresOfLine", exception, P.getWireStringing_Wires(), Places.path(exception), Places.name(wire),
                                Places.name(line));
                        }
                    }
                }
            }
        }

        private void checkCircuit(Circuit circuit) {
            Circuit_PhaseLabelsUnique(circuit);
            for (Phase phase : circuit.getPhases()) {
                attachmentExists((Line) container(circuit, Line.class), phase.getAttachment(), AttachmentRole.PHASE, phase, P.getPhase_Attachment());
            }
            Circuit_BundleSpacingFits(circuit);
            Circuit_ThreePhaseAngles(circuit);
        }

        private static EObject container(EObject object, Class<? extends EObject> type) {
            return type.isInstance(object.eContainer()) ? object.eContainer() : null;
        }

        private void Circuit_PhaseLabelsUnique(Circuit circuit) {
            Set<String> labels = new HashSet<>();
            for (Phase phase : circuit.getPhases()) {
                if (phase.getLabel() == null || phase.getLabel().isBlank()) {
                    error("Circuit_PhaseLabelsUnique.missing", phase, P.getPhase_Label(), Places.name(circuit));
                } else if (!labels.add(phase.getLabel())) {
                    error("Circuit_PhaseLabelsUnique", phase, P.getPhase_Label(), Places.name(circuit), phase.getLabel());
                }
            }
        }

        /** Rules Wire_AttachmentExists and Wire_AttachmentRoleFits. */
        private void attachmentExists(Line line, String name, AttachmentRole role, EObject wire, EStructuralFeature feature) {
            if (name == null || name.isBlank()) {
                error("Wire_AttachmentExists.missing", wire, feature, Places.path(wire));
                return;
            }
            if (line == null) {
                return;
            }
            Set<StructureType> types = new LinkedHashSet<>();
            line.getStructures().forEach(structure -> types.add(structure.getType()));
            types.remove(null);
            for (StructureType type : types) {
                Attachment found = type.getAttachments().stream().filter(a -> name.equals(a.getName())).findFirst().orElse(null);
                if (found == null) {
                    error("Wire_AttachmentExists", wire, feature, Places.path(wire), name, Places.name(type));
                } else if (found.getRole() != role) {
                    warning("Wire_AttachmentRoleFits", wire, feature, Places.path(wire), name, Places.name(type),
                        found.getRole() == AttachmentRole.SHIELD ? "shield wires" : "phases");
                }
            }
        }

        private void Circuit_BundleSpacingFits(Circuit circuit) {
            if (circuit.getBundleCount() > 1 && circuit.getConductor() != null
                && !(circuit.getBundleSpacingMetres() > circuit.getConductor().getDiameterMetres())) {
                error("Circuit_BundleSpacingFits", circuit, P.getCircuit_BundleSpacingMetres(), Places.name(circuit),
                    circuit.getBundleSpacingMetres(), circuit.getConductor().getDiameterMetres());
            }
        }

        private void Circuit_ThreePhaseAngles(Circuit circuit) {
            if (circuit.getPhases().size() != 3) {
                return;
            }
            List<Double> angles = circuit.getPhases().stream().map(p -> ((p.getAngleDegrees() % 360) + 360) % 360).sorted().toList();
            double[] expected = {0, 120, 240};
            for (int i = 0; i < 3; i++) {
                if (Math.abs(angles.get(i) - expected[i]) > PHASE_ANGLE_TOLERANCE_DEGREES) {
                    warning("Circuit_ThreePhaseAngles", circuit, P.getCircuit_Phases(), Places.name(circuit));
                    return;
                }
            }
        }

        private void checkShieldWire(ShieldWire wire) {
            attachmentExists((Line) container(wire, Line.class), wire.getAttachment(), AttachmentRole.SHIELD, wire, P.getShieldWire_Attachment());
            Study study = study(wire);
            if (wire.getBonding() != Bonding.BONDED || study == null || study.getFrequencyHertz() == 0) {
                return;
            }
            ShieldWire_BondedHasResistance(wire);
            ShieldWire_BondedHasEarth(wire, study);
        }

        private void ShieldWire_BondedHasResistance(ShieldWire wire) {
            if (wire.getConductor() != null && wire.getConductor().getLowResistanceOhmsPerMetre() == null) {
                error("ShieldWire_BondedHasResistance", wire, P.getStrungElement_Conductor(), Places.name(wire), Places.name(wire.getConductor()));
            }
        }

        private void ShieldWire_BondedHasEarth(ShieldWire wire, Study study) {
            if (study.getEarthResistivityOhmMetres() == null) {
                error("ShieldWire_BondedHasEarth", wire, P.getShieldWire_Bonding(), Places.name(wire));
            }
        }

        // loads

        private void checkLoadCase(LoadCase loadCase) {
            LoadCase_NotEmpty(loadCase);
            LoadCase_CircuitLoadedOnce(loadCase);
            LoadCase_EveryCircuitLoaded(loadCase);
        }

        private void LoadCase_NotEmpty(LoadCase loadCase) {
            if (loadCase.getLoads().isEmpty()) {
                error("LoadCase_NotEmpty", loadCase, P.getLoadCase_Loads(), Places.name(loadCase));
            }
        }

        private void LoadCase_CircuitLoadedOnce(LoadCase loadCase) {
            Set<Circuit> loaded = new HashSet<>();
            for (CircuitLoad load : loadCase.getLoads()) {
                if (load.getCircuit() != null && !loaded.add(load.getCircuit())) {
                    error("LoadCase_CircuitLoadedOnce", load, P.getCircuitLoad_Circuit(), Places.name(loadCase), Places.name(load.getCircuit()));
                }
            }
        }

        private void LoadCase_EveryCircuitLoaded(LoadCase loadCase) {
            Study study = study(loadCase);
            if (study == null || loadCase.getLoads().isEmpty()) {
                return;
            }
            Set<Circuit> loaded = new HashSet<>();
            loadCase.getLoads().forEach(load -> loaded.add(load.getCircuit()));
            for (Line line : study.getLines()) {
                for (Circuit circuit : line.getCircuits()) {
                    if (!loaded.contains(circuit)) {
                        warning("LoadCase_EveryCircuitLoaded", loadCase, P.getLoadCase_Loads(), Places.name(loadCase), Places.name(circuit));
                    }
                }
            }
        }

        private void checkLoad(CircuitLoad load) {
            Circuit circuit = load.getCircuit();
            if (circuit == null) {
                return;
            }
            if (load instanceof PowerLoad power) {
                PowerLoad_HasVoltage(power, circuit);
            } else if (load instanceof SequenceLoad) {
                SequenceLoad_ThreePhases(load, circuit);
            } else if (load instanceof PhasorLoad phasors) {
                PhasorLoad_PhasesKnown(phasors, circuit);
            }
        }

        private void PowerLoad_HasVoltage(PowerLoad load, Circuit circuit) {
            if (load.getVoltageVolts() == null && !(circuit.getNominalVoltageVolts() >= 1)) {
                error("PowerLoad_HasVoltage", load, P.getPowerLoad_VoltageVolts(), Places.path(load), Places.name(circuit));
            }
        }

        private void SequenceLoad_ThreePhases(CircuitLoad load, Circuit circuit) {
            Set<String> labels = new HashSet<>();
            circuit.getPhases().forEach(phase -> labels.add(phase.getLabel()));
            if (circuit.getPhases().size() != 3 || !labels.equals(Set.of("A", "B", "C"))) {
                error("SequenceLoad_ThreePhases", load, P.getCircuitLoad_Circuit(), Places.path(load), Places.name(circuit));
            }
        }

        private void PhasorLoad_PhasesKnown(PhasorLoad load, Circuit circuit) {
            Set<String> seen = new HashSet<>();
            for (PhasePhasor phasor : load.getPhasors()) {
                boolean known = circuit.getPhases().stream().anyMatch(phase -> phase.getLabel() != null && phase.getLabel().equals(phasor.getPhase()));
                if (!known) {
                    error("PhasorLoad_PhasesKnown", phasor, P.getPhasePhasor_Phase(), Places.path(load), phasor.getPhase(), Places.name(circuit));
                } else if (!seen.add(phasor.getPhase())) {
                    error("PhasorLoad_PhasesKnown.twice", phasor, P.getPhasePhasor_Phase(), Places.path(load), phasor.getPhase());
                }
            }
        }

        // stations and limits

        private void checkStation(ProfileStation station) {
            ProfileStation_OffsetsInOrder(station);
            ProfileStation_PointCount(station);
            ProfileStation_WithinLines(station);
        }

        private void ProfileStation_OffsetsInOrder(ProfileStation station) {
            if (!(station.getFromOffsetMetres() < station.getToOffsetMetres())) {
                error("ProfileStation_OffsetsInOrder", station, P.getProfileStation_FromOffsetMetres(), Places.name(station),
                    station.getFromOffsetMetres(), station.getToOffsetMetres());
            }
        }

        private void ProfileStation_PointCount(ProfileStation station) {
            double count = (station.getToOffsetMetres() - station.getFromOffsetMetres()) / station.getSpacingMetres() + 1;
            if (count > MOST_PROFILE_POINTS) {
                error("ProfileStation_PointCount", station, P.getProfileStation_SpacingMetres(), Places.name(station), Math.ceil(count),
                    (double) MOST_PROFILE_POINTS);
            }
        }

        private void ProfileStation_WithinLines(ProfileStation station) {
            Study study = study(station);
            if (study == null || study.getLines().isEmpty()) {
                return;
            }
            double least = Double.POSITIVE_INFINITY;
            double greatest = Double.NEGATIVE_INFINITY;
            for (Line line : study.getLines()) {
                for (Structure structure : line.getStructures()) {
                    least = Math.min(least, structure.getStationMetres());
                    greatest = Math.max(greatest, structure.getStationMetres());
                }
            }
            if (station.getStationMetres() < least || station.getStationMetres() > greatest) {
                warning("ProfileStation_WithinLines", station, P.getProfileStation_StationMetres(), Places.name(station),
                    station.getStationMetres(), least, greatest);
            }
        }

        private void FieldLimit_QuantityComputed(FieldLimit limit) {
            if (limit.getQuantity() == FieldQuantity.ELECTRIC) {
                report(Diagnostic.INFO, "FieldLimit_QuantityComputed", limit, P.getFieldLimit_Quantity(), Places.name(limit));
            }
        }
    }
}
