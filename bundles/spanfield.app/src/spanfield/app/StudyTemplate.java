/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.app;

import spanfield.model.Attachment;
import spanfield.model.AttachmentRole;
import spanfield.model.CatenaryStringing;
import spanfield.model.Circuit;
import spanfield.model.Conductor;
import spanfield.model.CurrentLoad;
import spanfield.model.EdgePoint;
import spanfield.model.Line;
import spanfield.model.LoadCase;
import spanfield.model.OutlinePoint;
import spanfield.model.OutlineStroke;
import spanfield.model.Phase;
import spanfield.model.ProfileStation;
import spanfield.model.ShieldWire;
import spanfield.model.SpanfieldFactory;
import spanfield.model.StringingSection;
import spanfield.model.Structure;
import spanfield.model.StructureType;
import spanfield.model.Study;
import spanfield.model.io.StudyFiles;
import spanfield.model.io.StudyIds;

/**
 * Starting points for new studies: a structure of our own with plausible dimensions, a conductor with typical values, three spans, a load
 * case and a station at mid-span. Every number is there to be changed.
 */
public enum StudyTemplate {

    /** Three phases side by side. */
    FLAT("One circuit, flat", "Three phases at one height, two shield wires", 16, 22,
        new double[][] {{-8, 22}, {0, 22}, {8, 22}}, new double[][] {{-5, 28}, {5, 28}}),
    /** Three phases in a triangle. */
    DELTA("One circuit, delta", "Two phases below, one above, one shield wire", 20, 20,
        new double[][] {{-6, 22}, {3.6, 28}, {6, 22}}, new double[][] {{0, 34}}),
    /** Two circuits, each with its phases one above the other. */
    DOUBLE_VERTICAL("Two circuits, vertical", "Three phases one above the other on each side, one shield wire", 25, 25,
        new double[][] {{-5.5, 36}, {-6, 29}, {-5.7, 22}, {5.5, 36}, {6, 29}, {5.7, 22}}, new double[][] {{0, 43}}),
    /** Nothing but the corridor. */
    EMPTY("Empty corridor", "Only the right-of-way; lines are added afterwards", 25, 25, new double[0][], new double[0][]);

    private static final SpanfieldFactory F = SpanfieldFactory.eINSTANCE;
    private static final double INSULATOR = 2;
    private static final double SPAN = 300;
    private static final double CONSTANT = 1500;
    private static final double[] ANGLES = {0, -120, 120};

    private final String title;
    private final String description;
    private final double left;
    private final double right;
    private final double[][] phases;
    private final double[][] shields;

    StudyTemplate(String title, String description, double left, double right, double[][] phases, double[][] shields) {
        this.title = title;
        this.description = description;
        this.left = left;
        this.right = right;
        this.phases = phases;
        this.shields = shields;
    }

    /** Name for the user. */
    public String title() {
        return title;
    }

    /** What it holds, in a few words. */
    public String description() {
        return description;
    }

    /**
     * A new study from the template.
     *
     * @param name      name of the study
     * @param frequency frequency in hertz
     * @param volts     nominal voltage in volts
     * @param amperes   current of the load case in amperes
     */
    public Study create(String name, double frequency, double volts, double amperes) {
        Study study = StudyFiles.newStudy();
        study.setName(name);
        study.setFrequencyHertz(frequency);
        study.setEarthResistivityOhmMetres(100.0);
        EdgePoint edge = F.createEdgePoint();
        edge.setLeftOffsetMetres(-left);
        edge.setRightOffsetMetres(right);
        study.getCorridor().getEdges().add(edge);
        if (phases.length > 0) {
            addLine(study, volts, amperes);
        }
        StudyIds.assignMissing(study);
        return study;
    }

    private void addLine(Study study, double volts, double amperes) {
        Conductor conductor = conductor(study, "ACSR 28.1 mm (typical)", 0.0281, 7.3e-5, 1.63);
        Conductor shield = conductor(study, "Shield wire 11 mm (typical)", 0.011, 1.2e-3, 0.48);
        StructureType type = structureType(study);
        Line line = F.createLine();
        line.setName("Line 1");
        for (int i = -1; i <= 2; i++) {
            Structure structure = F.createStructure();
            structure.setName("S" + (i + 2));
            structure.setType(type);
            structure.setStationMetres(SPAN * (i - 0.5));
            line.getStructures().add(structure);
        }
        StringingSection section = F.createStringingSection();
        CatenaryStringing stringing = F.createCatenaryStringing();
        stringing.setCatenaryConstantMetres(CONSTANT);
        section.setPhaseStringing(stringing);
        line.getSections().add(section);
        LoadCase loadCase = F.createLoadCase();
        loadCase.setName("Rating");
        loadCase.setBasis("Rating");
        for (int c = 0; c < phases.length / 3; c++) {
            Circuit circuit = circuit(line, c, conductor, volts);
            CurrentLoad load = F.createCurrentLoad();
            load.setCircuit(circuit);
            load.setCurrentAmperes(amperes);
            loadCase.getLoads().add(load);
        }
        for (int i = 0; i < shields.length; i++) {
            ShieldWire wire = F.createShieldWire();
            wire.setName("Shield wire " + (i + 1));
            wire.setConductor(shield);
            wire.setAttachment("shield " + (i + 1));
            line.getShieldWires().add(wire);
        }
        study.getLines().add(line);
        study.getLoadCases().add(loadCase);
        study.getStations().add(station("Mid-span", 0));
        study.getStations().add(station("At structure S3", SPAN / 2));
    }

    private static ProfileStation station(String name, double at) {
        ProfileStation station = F.createProfileStation();
        station.setName(name);
        station.setStationMetres(at);
        return station;
    }

    private static Conductor conductor(Study study, String name, double diameter, double resistance, double mass) {
        Conductor conductor = F.createConductor();
        conductor.setName(name);
        conductor.setNotes("Typical values to start from; put in the maker's data.");
        conductor.setDiameterMetres(diameter);
        conductor.setLowResistanceOhmsPerMetre(resistance);
        conductor.setMassKilogramsPerMetre(mass);
        study.getConductors().add(conductor);
        return conductor;
    }

    private StructureType structureType(Study study) {
        StructureType type = F.createStructureType();
        type.setName("Structure for " + title.toLowerCase(java.util.Locale.ROOT));
        double top = 0;
        for (int i = 0; i < phases.length; i++) {
            type.getAttachments().add(attachment("phase " + (i + 1), phases[i], INSULATOR, AttachmentRole.PHASE));
            top = Math.max(top, phases[i][1]);
            stroke(type, new double[][] {{0, phases[i][1]}, phases[i]});
        }
        for (int i = 0; i < shields.length; i++) {
            type.getAttachments().add(attachment("shield " + (i + 1), shields[i], 0, AttachmentRole.SHIELD));
            stroke(type, new double[][] {{0, top}, shields[i]});
        }
        stroke(type, new double[][] {{-3, 0}, {-0.8, top}, {0.8, top}, {3, 0}});
        study.getStructureTypes().add(type);
        return type;
    }

    private static void stroke(StructureType type, double[][] points) {
        OutlineStroke stroke = F.createOutlineStroke();
        for (double[] p : points) {
            OutlinePoint point = F.createOutlinePoint();
            point.setOffsetMetres(p[0]);
            point.setHeightMetres(p[1]);
            stroke.getPoints().add(point);
        }
        type.getOutline().add(stroke);
    }

    private static Attachment attachment(String name, double[] place, double insulator, AttachmentRole role) {
        Attachment attachment = F.createAttachment();
        attachment.setName(name);
        attachment.setOffsetMetres(place[0]);
        attachment.setHeightMetres(place[1]);
        attachment.setInsulatorLengthMetres(insulator);
        attachment.setRole(role);
        return attachment;
    }

    private static Circuit circuit(Line line, int number, Conductor conductor, double volts) {
        Circuit circuit = F.createCircuit();
        circuit.setName("Circuit " + (number + 1));
        circuit.setConductor(conductor);
        circuit.setNominalVoltageVolts(volts);
        for (int p = 0; p < 3; p++) {
            Phase phase = F.createPhase();
            phase.setLabel(String.valueOf((char) ('A' + p)));
            phase.setAngleDegrees(ANGLES[p]);
            phase.setAttachment("phase " + (3 * number + p + 1));
            circuit.getPhases().add(phase);
        }
        line.getCircuits().add(circuit);
        return circuit;
    }
}
