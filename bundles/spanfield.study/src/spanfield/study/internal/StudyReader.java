/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.study.internal;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.IdentityHashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.apache.commons.math3.complex.Complex;
import org.eclipse.emf.ecore.EObject;
import spanfield.model.Attachment;
import spanfield.model.Bonding;
import spanfield.model.CatenaryStringing;
import spanfield.model.Circuit;
import spanfield.model.CircuitLoad;
import spanfield.model.ClearanceStringing;
import spanfield.model.Conductor;
import spanfield.model.CurrentLoad;
import spanfield.model.FieldLimit;
import spanfield.model.FieldQuantity;
import spanfield.model.FlowDirection;
import spanfield.model.Line;
import spanfield.model.LineEnd;
import spanfield.model.LoadCase;
import spanfield.model.NamedElement;
import spanfield.model.Phase;
import spanfield.model.PhasorLoad;
import spanfield.model.PowerLoad;
import spanfield.model.ProfileStation;
import spanfield.model.SagStringing;
import spanfield.model.SequenceLoad;
import spanfield.model.ShieldWire;
import spanfield.model.Stringing;
import spanfield.model.StringingSection;
import spanfield.model.Structure;
import spanfield.model.StrungElement;
import spanfield.model.Study;
import spanfield.model.TensionStringing;
import spanfield.model.WireStringing;
import spanfield.solver.earth.EarthModel;
import spanfield.solver.geometry.WireEnd;
import spanfield.solver.line.ImpedanceFormula;
import spanfield.solver.line.PhaseCurrents;
import spanfield.study.CorridorPlan;
import spanfield.study.internal.StudyData.AttachmentData;
import spanfield.study.internal.StudyData.BondingData;
import spanfield.study.internal.StudyData.CaseData;
import spanfield.study.internal.StudyData.ConductorData;
import spanfield.study.internal.StudyData.ElementData;
import spanfield.study.internal.StudyData.ElementRef;
import spanfield.study.internal.StudyData.LineData;
import spanfield.study.internal.StudyData.PhaseData;
import spanfield.study.internal.StudyData.SectionData;
import spanfield.study.internal.StudyData.StationData;
import spanfield.study.internal.StudyData.StringingRule;
import spanfield.study.internal.StudyData.StructureData;
import spanfield.study.result.CaseInfo;
import spanfield.study.result.LimitInfo;
import spanfield.study.result.StationInfo;

/**
 * Reads a study that has no error findings of the model into {@link StudyData}. The only place beside the checks that touches the model;
 * it remembers which model object every key stands for, so that findings can point at it.
 */
public final class StudyReader {

    private final Map<String, EObject> objects = new HashMap<>();
    private final Map<StrungElement, ElementRef> refs = new IdentityHashMap<>();
    private final StudyData data;

    /** Reads the study on the calling thread. */
    public StudyReader(Study study) {
        List<LineData> lines = new ArrayList<>();
        for (Line line : study.getLines()) {
            lines.add(readLine(line, lines.size()));
        }
        List<CaseData> cases = new ArrayList<>();
        for (LoadCase loadCase : study.getLoadCases()) {
            cases.add(readCase(loadCase, cases.size()));
        }
        List<StationData> stations = new ArrayList<>();
        for (ProfileStation station : study.getStations()) {
            String key = remember("station/" + stations.size(), station);
            stations.add(new StationData(key, readStation(station, stations.size())));
        }
        remember("study", study);
        List<LimitInfo> limits = new ArrayList<>();
        study.getLimits().stream().filter(l -> l.getQuantity() == FieldQuantity.MAGNETIC).forEach(l -> limits.add(readLimit(l, limits.size())));
        Double resistivity = study.getEarthResistivityOhmMetres();
        data = new StudyData(text(study.getId()), nameOf(study), study.getFrequencyHertz(), orNaN(resistivity),
            earthModel(study, resistivity), formula(study), study.getReferenceHeightMetres(), study.getRelativeAccuracy(),
            CorridorPlan.of(study.getCorridor()), List.copyOf(lines), List.copyOf(cases), List.copyOf(stations), List.copyOf(limits),
            study.getLimits().size() - limits.size());
    }

    /** What was read. */
    public StudyData data() {
        return data;
    }

    /** The model object behind a key; the study for an unknown key. */
    public EObject object(String key) {
        return objects.getOrDefault(key, objects.get("study"));
    }

    private String remember(String key, EObject object) {
        objects.put(key, object);
        return key;
    }

    private static EarthModel earthModel(Study study, Double resistivity) {
        if (resistivity == null || study.getFrequencyHertz() == 0) {
            return EarthModel.NONE;
        }
        return switch (study.getEarthModel()) {
            case NONE -> EarthModel.NONE;
            case COMPLEX_IMAGES -> EarthModel.COMPLEX_IMAGES;
            case EXACT_HALF_SPACE -> EarthModel.EXACT_HALF_SPACE;
        };
    }

    private static ImpedanceFormula formula(Study study) {
        return switch (study.getImpedanceFormula()) {
            case COMPLEX_DEPTH -> ImpedanceFormula.COMPLEX_DEPTH;
            case CARSON -> ImpedanceFormula.CARSON;
        };
    }

    private LineData readLine(Line line, int index) {
        String key = remember("line/" + index, line);
        List<StructureData> structures = new ArrayList<>();
        for (Structure structure : line.getStructures()) {
            structures.add(readStructure(structure, key + "/structure/" + structures.size(), structures.size()));
        }
        List<ElementData> elements = new ArrayList<>();
        for (Circuit circuit : line.getCircuits()) {
            refs.put(circuit, new ElementRef(index, elements.size()));
            elements.add(readCircuit(circuit, key, elements.size()));
        }
        for (ShieldWire wire : line.getShieldWires()) {
            refs.put(wire, new ElementRef(index, elements.size()));
            elements.add(readShieldWire(wire, key, elements.size()));
        }
        List<SectionData> sections = new ArrayList<>();
        for (StringingSection section : line.getSections()) {
            sections.add(readSection(line, section, key + "/section/" + sections.size(), elements));
        }
        return new LineData(key, index, nameOf(line), List.copyOf(structures), List.copyOf(sections), List.copyOf(elements),
            end(line.getStartEnd()), end(line.getFinishEnd()));
    }

    private static WireEnd end(LineEnd end) {
        return end == LineEnd.DEAD_END ? WireEnd.ENDS : WireEnd.CONTINUES;
    }

    private StructureData readStructure(Structure structure, String key, int index) {
        remember(key, structure);
        Map<String, AttachmentData> attachments = new LinkedHashMap<>();
        for (Attachment a : structure.getType().getAttachments()) {
            double height = a.getHeightMetres() + structure.getHeightAdjustmentMetres() - a.getInsulatorLengthMetres();
            attachments.put(a.getName(), new AttachmentData(a.getOffsetMetres(), height));
        }
        Double turn = structure.getTurnDegrees();
        return new StructureData(key, nameOf(structure, "structure " + (index + 1)), structure.getStationMetres(),
            structure.getOffsetMetres(), orNaN(structure.getBaseElevationMetres()), turn == null ? Double.NaN : Math.toRadians(turn),
            Map.copyOf(attachments));
    }

    private ElementData readCircuit(Circuit circuit, String lineKey, int index) {
        String key = remember(lineKey + "/element/" + index, circuit);
        List<PhaseData> phases = new ArrayList<>();
        for (Phase phase : circuit.getPhases()) {
            remember(key + "/phase/" + phases.size(), phase);
            phases.add(new PhaseData(text(phase.getLabel()), Math.toRadians(phase.getAngleDegrees()), phase.getAttachment()));
        }
        return new ElementData(key, index, text(circuit.getId()), nameOf(circuit), readConductor(circuit.getConductor()),
            circuit.getBundleCount(), circuit.getBundleSpacingMetres(), circuit.getNominalVoltageVolts(), List.copyOf(phases), false,
            BondingData.NONE, Complex.ZERO);
    }

    private ElementData readShieldWire(ShieldWire wire, String lineKey, int index) {
        String key = remember(lineKey + "/element/" + index, wire);
        BondingData bonding = switch (wire.getBonding()) {
            case BONDED -> BondingData.BONDED;
            case INSULATED -> BondingData.INSULATED;
            case GIVEN_CURRENT -> BondingData.GIVEN;
        };
        Complex given = wire.getBonding() == Bonding.GIVEN_CURRENT
            ? PhaseCurrents.polar(wire.getGivenCurrentAmperes(), Math.toRadians(wire.getGivenAngleDegrees())) : Complex.ZERO;
        return new ElementData(key, index, text(wire.getId()), nameOf(wire), readConductor(wire.getConductor()), 1, 0, 0,
            List.of(new PhaseData("", 0, wire.getAttachment())), true, bonding, given);
    }

    private static ConductorData readConductor(Conductor conductor) {
        double radius = conductor.getDiameterMetres() / 2;
        Double gmr = conductor.getGeometricMeanRadiusMetres();
        boolean low = conductor.getLowResistanceOhmsPerMetre() != null;
        return new ConductorData(nameOf(conductor), radius, gmr == null ? radius * Math.exp(-0.25) : gmr,
            orNaN(low ? conductor.getLowResistanceOhmsPerMetre() : conductor.getHighResistanceOhmsPerMetre()),
            low ? conductor.getLowTemperatureCelsius() : conductor.getHighTemperatureCelsius(),
            orNaN(conductor.getMassKilogramsPerMetre()));
    }

    private SectionData readSection(Line line, StringingSection section, String key, List<ElementData> elements) {
        remember(key, section);
        int from = section.getFrom() == null ? 0 : line.getStructures().indexOf(section.getFrom());
        int to = section.getTo() == null ? line.getStructures().size() - 1 : line.getStructures().indexOf(section.getTo());
        StringingRule phases = readRule(section.getPhaseStringing(), key + "/phases");
        // The same rule object: strung by clearance, the shield wires share the constant of the phases and do not hang down to it themselves.
        StringingRule shields = section.getShieldStringing() == null ? phases : readRule(section.getShieldStringing(), key + "/shields");
        Map<Integer, StringingRule> rules = new HashMap<>();
        elements.forEach(e -> rules.put(e.index(), e.shield() ? shields : phases));
        for (WireStringing exception : section.getExceptions()) {
            StringingRule rule = readRule(exception.getStringing(), key + "/exception/" + section.getExceptions().indexOf(exception));
            exception.getWires().forEach(w -> rules.put(refs.get(w).element(), rule));
        }
        return new SectionData(key, from, to, Map.copyOf(rules));
    }

    private StringingRule readRule(Stringing stringing, String key) {
        remember(key, stringing);
        if (stringing instanceof CatenaryStringing s) {
            return new StringingRule(key, StringingRule.Kind.CONSTANT, s.getCatenaryConstantMetres());
        }
        if (stringing instanceof SagStringing s) {
            return new StringingRule(key, StringingRule.Kind.SAG, s.getSagMetres());
        }
        if (stringing instanceof TensionStringing s) {
            return new StringingRule(key, StringingRule.Kind.TENSION, s.getHorizontalTensionNewtons());
        }
        return new StringingRule(key, StringingRule.Kind.CLEARANCE, ((ClearanceStringing) stringing).getClearanceMetres());
    }

    private CaseData readCase(LoadCase loadCase, int index) {
        String key = remember("case/" + index, loadCase);
        String id = loadCase.getId() == null ? "case-" + (index + 1) : loadCase.getId();
        CaseInfo info = new CaseInfo(id, nameOf(loadCase, id), text(loadCase.getBasis()), Math.toRadians(loadCase.getWindSwingDegrees()));
        Map<ElementRef, Complex[]> currents = new HashMap<>();
        for (CircuitLoad load : loadCase.getLoads()) {
            Complex[] amperes = currents(load);
            currents.put(refs.get(load.getCircuit()),
                load.getDirection() == FlowDirection.REVERSED ? PhaseCurrents.reversed(amperes) : amperes);
        }
        return new CaseData(key, info, Map.copyOf(currents));
    }

    private static Complex[] currents(CircuitLoad load) {
        Circuit circuit = load.getCircuit();
        double[] angles = circuit.getPhases().stream().mapToDouble(p -> Math.toRadians(p.getAngleDegrees())).toArray();
        if (load instanceof CurrentLoad l) {
            return PhaseCurrents.balanced(l.getCurrentAmperes(), Math.toRadians(l.getAngleDegrees()), angles);
        }
        if (load instanceof PowerLoad l) {
            double volts = l.getVoltageVolts() == null ? circuit.getNominalVoltageVolts() : l.getVoltageVolts();
            return PhaseCurrents.ofPower(l.getActivePowerWatts(), l.getReactivePowerVars(), volts, angles);
        }
        return load instanceof SequenceLoad l ? sequenceCurrents(l) : phasorCurrents((PhasorLoad) load);
    }

    /** Sequence currents go to the phases by their labels A, B, C, in whatever order the file lists them. */
    private static Complex[] sequenceCurrents(SequenceLoad l) {
        Complex[] abc = PhaseCurrents.ofSequences(PhaseCurrents.polar(l.getZeroAmperes(), Math.toRadians(l.getZeroAngleDegrees())),
            PhaseCurrents.polar(l.getPositiveAmperes(), Math.toRadians(l.getPositiveAngleDegrees())),
            PhaseCurrents.polar(l.getNegativeAmperes(), Math.toRadians(l.getNegativeAngleDegrees())));
        return l.getCircuit().getPhases().stream().map(p -> abc["ABC".indexOf(p.getLabel())]).toArray(Complex[]::new);
    }

    private static Complex[] phasorCurrents(PhasorLoad load) {
        List<Phase> phases = load.getCircuit().getPhases();
        Complex[] result = new Complex[phases.size()];
        for (int i = 0; i < result.length; i++) {
            String label = phases.get(i).getLabel();
            result[i] = load.getPhasors().stream().filter(p -> p.getPhase().equals(label))
                .map(p -> PhaseCurrents.polar(p.getCurrentAmperes(), Math.toRadians(p.getAngleDegrees())))
                .findFirst().orElse(Complex.ZERO);
        }
        return result;
    }

    private static StationInfo readStation(ProfileStation station, int index) {
        String id = station.getId() == null ? "station-" + (index + 1) : station.getId();
        return new StationInfo(id, nameOf(station, id), station.getStationMetres(), station.getFromOffsetMetres(),
            station.getToOffsetMetres(), station.getSpacingMetres());
    }

    private static LimitInfo readLimit(FieldLimit limit, int index) {
        String id = limit.getId() == null ? "limit-" + (index + 1) : limit.getId();
        return new LimitInfo(id, nameOf(limit, id), limit.getMeasure(), limit.getLevel(), limit.getPlace(), text(limit.getBody()),
            text(limit.getEdition()), text(limit.getLoadCondition()), limit.getBasis());
    }

    private static double orNaN(Double value) {
        return value == null ? Double.NaN : value;
    }

    private static String text(String value) {
        return value == null ? "" : value;
    }

    private static String nameOf(NamedElement element) {
        return nameOf(element, text(element.getId()));
    }

    private static String nameOf(NamedElement element, String otherwise) {
        return element.getName() == null || element.getName().isBlank() ? otherwise : element.getName();
    }
}
