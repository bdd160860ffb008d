/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.study.tests.support;

import spanfield.model.Attachment;
import spanfield.model.AttachmentRole;
import spanfield.model.Bonding;
import spanfield.model.CatenaryStringing;
import spanfield.model.Circuit;
import spanfield.model.Conductor;
import spanfield.model.CurrentLoad;
import spanfield.model.EdgePoint;
import spanfield.model.FieldLimit;
import spanfield.model.Line;
import spanfield.model.LoadCase;
import spanfield.model.Phase;
import spanfield.model.PhasePhasor;
import spanfield.model.PhasorLoad;
import spanfield.model.ProfileStation;
import spanfield.model.SagStringing;
import spanfield.model.ShieldWire;
import spanfield.model.SpanfieldFactory;
import spanfield.model.Stringing;
import spanfield.model.StringingSection;
import spanfield.model.Structure;
import spanfield.model.StructureType;
import spanfield.model.Study;
import spanfield.model.io.StudyFiles;

/** Builds small studies for tests. Invented data. Every maker starts from a corridor of 50 m without resistivity at 50 Hz. */
public final class StudyMaker {

    /** Sag in metres of wires that are to be straight: below it nothing is seen. */
    public static final double STRAIGHT_SAG = 1e-9;

    private static final SpanfieldFactory F = SpanfieldFactory.eINSTANCE;
    private static final double[] ANGLES = {0, -120, 120};

    /** The study. */
    public final Study study = StudyFiles.newStudy();

    /** The catalogue's phase conductor: 28.62 mm, 0.05 ohm/km, 1.6 kg/m. */
    public final Conductor conductor = conductor("conductor", 0.02862, 5e-5, 1.6);

    /** The catalogue's shield wire: 11 mm, 0.5 ohm/km, 0.6 kg/m. */
    public final Conductor shieldConductor = conductor("shield", 0.011, 5e-4, 0.6);

    public StudyMaker() {
        study.setId("study");
        study.setName("Test study");
        study.getConductors().add(conductor);
        EdgePoint edge = F.createEdgePoint();
        edge.setLeftOffsetMetres(-25);
        edge.setRightOffsetMetres(25);
        study.getCorridor().getEdges().add(edge);
    }

    private static Conductor conductor(String id, double diameter, double resistance, double mass) {
        Conductor c = F.createConductor();
        c.setId(id);
        c.setName(id);
        c.setDiameterMetres(diameter);
        c.setLowResistanceOhmsPerMetre(resistance);
        c.setMassKilogramsPerMetre(mass);
        return c;
    }

    /** A structure type without attachments. */
    public StructureType type(String id) {
        StructureType type = F.createStructureType();
        type.setId(id);
        type.setName(id);
        study.getStructureTypes().add(type);
        return type;
    }

    /** Adds an attachment for a phase, or a shield wire when its name starts with S. */
    public static Attachment attach(StructureType type, String name, double offset, double height) {
        Attachment a = F.createAttachment();
        a.setName(name);
        a.setOffsetMetres(offset);
        a.setHeightMetres(height);
        a.setRole(name.startsWith("S") ? AttachmentRole.SHIELD : AttachmentRole.PHASE);
        type.getAttachments().add(a);
        return a;
    }

    /** A line with structures of one type at stations, on one offset, with one section strung as given. */
    public Line line(String id, StructureType type, Stringing stringing, double offset, double... stations) {
        Line line = F.createLine();
        line.setId(id);
        line.setName(id);
        for (double station : stations) {
            structure(line, type, station, offset);
        }
        StringingSection section = F.createStringingSection();
        section.setPhaseStringing(stringing);
        line.getSections().add(section);
        study.getLines().add(line);
        return line;
    }

    /** Adds a structure at the end of a line. */
    public static Structure structure(Line line, StructureType type, double station, double offset) {
        Structure s = F.createStructure();
        s.setId(line.getId() + "-" + (line.getStructures().size() + 1));
        s.setName(s.getId());
        s.setType(type);
        s.setStationMetres(station);
        s.setOffsetMetres(offset);
        line.getStructures().add(s);
        return s;
    }

    /** A three-phase circuit: phases A, B, C on attachments in this order. */
    public Circuit circuit(Line line, String id, double volts, String... attachments) {
        Circuit circuit = F.createCircuit();
        circuit.setId(id);
        circuit.setName(id);
        circuit.setConductor(conductor);
        circuit.setNominalVoltageVolts(volts);
        for (int i = 0; i < attachments.length; i++) {
            Phase phase = F.createPhase();
            phase.setLabel("ABC".substring(i, i + 1));
            phase.setAngleDegrees(ANGLES[i]);
            phase.setAttachment(attachments[i]);
            circuit.getPhases().add(phase);
        }
        line.getCircuits().add(circuit);
        return circuit;
    }

    /** Makes a circuit's phases bundles. */
    public static void bundle(Circuit circuit, int count, double spacing) {
        circuit.setBundleCount(count);
        circuit.setBundleSpacingMetres(spacing);
    }

    /** A shield wire on an attachment. */
    public ShieldWire shield(Line line, String id, String attachment, Bonding bonding) {
        if (!study.getConductors().contains(shieldConductor)) {
            study.getConductors().add(shieldConductor);
        }
        ShieldWire wire = F.createShieldWire();
        wire.setId(id);
        wire.setName(id);
        wire.setConductor(shieldConductor);
        wire.setAttachment(attachment);
        wire.setBonding(bonding);
        line.getShieldWires().add(wire);
        return wire;
    }

    /** A load case without loads. */
    public LoadCase loadCase(String id) {
        LoadCase loadCase = F.createLoadCase();
        loadCase.setId(id);
        loadCase.setName(id);
        study.getLoadCases().add(loadCase);
        return loadCase;
    }

    /** Adds a balanced load. */
    public static CurrentLoad load(LoadCase loadCase, Circuit circuit, double amperes, double degrees) {
        CurrentLoad load = F.createCurrentLoad();
        load.setCircuit(circuit);
        load.setCurrentAmperes(amperes);
        load.setAngleDegrees(degrees);
        loadCase.getLoads().add(load);
        return load;
    }

    /** Adds a load by the current of each phase: magnitude and angle in degrees, by turns. */
    public static PhasorLoad phasors(LoadCase loadCase, Circuit circuit, double... values) {
        PhasorLoad load = F.createPhasorLoad();
        load.setCircuit(circuit);
        for (int i = 0; i < circuit.getPhases().size(); i++) {
            PhasePhasor phasor = F.createPhasePhasor();
            phasor.setPhase(circuit.getPhases().get(i).getLabel());
            phasor.setCurrentAmperes(values[2 * i]);
            phasor.setAngleDegrees(values[2 * i + 1]);
            load.getPhasors().add(phasor);
        }
        loadCase.getLoads().add(load);
        return load;
    }

    /** A profile station. */
    public ProfileStation station(String id, double station, double from, double to, double spacing) {
        ProfileStation s = F.createProfileStation();
        s.setId(id);
        s.setName(id);
        s.setStationMetres(station);
        s.setFromOffsetMetres(from);
        s.setToOffsetMetres(to);
        s.setSpacingMetres(spacing);
        study.getStations().add(s);
        return s;
    }

    /** A limit at the edges in microtesla. */
    public FieldLimit limit(String id, double microtesla) {
        FieldLimit limit = F.createFieldLimit();
        limit.setId(id);
        limit.setName(id);
        limit.setLevel(microtesla * 1e-6);
        study.getLimits().add(limit);
        return limit;
    }

    /** Stringing by sag. */
    public static SagStringing sag(double metres) {
        SagStringing s = F.createSagStringing();
        s.setSagMetres(metres);
        return s;
    }

    /** Stringing by catenary constant. */
    public static CatenaryStringing constant(double metres) {
        CatenaryStringing s = F.createCatenaryStringing();
        s.setCatenaryConstantMetres(metres);
        return s;
    }

    /**
     * A sound study without findings: one flat 132 kV line of five structures 300 m apart, phases at -6, 0, 6 m and 16 m high, sag 6 m, one load
     * case of 500 A and a profile at mid-span.
     */
    public static StudyMaker plain() {
        StudyMaker m = new StudyMaker();
        StructureType type = m.type("portal");
        attach(type, "L", -6, 16);
        attach(type, "M", 0, 16);
        attach(type, "R", 6, 16);
        Line line = m.line("line", type, sag(6), 0, -600, -300, 0, 300, 600);
        Circuit circuit = m.circuit(line, "circuit", 132e3, "L", "M", "R");
        load(m.loadCase("rating"), circuit, 500, 0);
        m.station("mid-span", 150, -50, 50, 5);
        return m;
    }

    /** The first line. */
    public Line line() {
        return study.getLines().get(0);
    }

    /** The first circuit of the first line. */
    public Circuit circuit() {
        return line().getCircuits().get(0);
    }

    /** The first load case. */
    public LoadCase loadCase() {
        return study.getLoadCases().get(0);
    }
}
