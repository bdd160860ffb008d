/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.model.tests.support;

import java.util.Random;
import spanfield.model.Attachment;
import spanfield.model.AttachmentRole;
import spanfield.model.CatenaryStringing;
import spanfield.model.Circuit;
import spanfield.model.Conductor;
import spanfield.model.CurrentLoad;
import spanfield.model.EdgePoint;
import spanfield.model.FieldLimit;
import spanfield.model.Line;
import spanfield.model.LoadCase;
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

/** Valid studies for tests: one small and plain, and random ones from a seed. Invented data. */
public final class SampleStudies {

    private static final SpanfieldFactory F = SpanfieldFactory.eINSTANCE;

    private SampleStudies() {
    }

    /** A flat three-phase line with one shield wire over level ground: no finding of any severity. */
    public static Study flat() {
        Study study = StudyFiles.newStudy();
        study.setName("Flat");
        study.setEarthResistivityOhmMetres(100.0);
        study.getCorridor().getEdges().add(edge(0, -20, 20));
        Conductor conductor = conductor(study, "Phase conductor", 0.028, 8e-5);
        Conductor shield = conductor(study, "Shield conductor", 0.011, 1e-3);
        StructureType type = F.createStructureType();
        type.setName("Tower");
        type.getAttachments().add(attachment("left", -8, 20, 2, AttachmentRole.PHASE));
        type.getAttachments().add(attachment("middle", 0, 20, 2, AttachmentRole.PHASE));
        type.getAttachments().add(attachment("right", 8, 20, 2, AttachmentRole.PHASE));
        type.getAttachments().add(attachment("peak", 0, 26, 0, AttachmentRole.SHIELD));
        study.getStructureTypes().add(type);
        Line line = line(study, "Line", type, -300, 0, 300);
        Circuit circuit = circuit(line, "Circuit", conductor, "left", "middle", "right");
        ShieldWire wire = F.createShieldWire();
        wire.setName("Peak wire");
        wire.setConductor(shield);
        wire.setAttachment("peak");
        line.getShieldWires().add(wire);
        loadCase(study, "Rating", circuit, 500);
        ProfileStation station = F.createProfileStation();
        station.setName("Mid-span");
        station.setStationMetres(150);
        station.setFromOffsetMetres(-60);
        station.setToOffsetMetres(60);
        study.getStations().add(station);
        FieldLimit limit = F.createFieldLimit();
        limit.setName("Own limit");
        limit.setLevel(1e-4);
        study.getLimits().add(limit);
        StudyIds.assignMissing(study);
        return study;
    }

    /** A valid random study: one to three lines of one or two circuits, bundles, spans, heights, slopes, loads and stations at random. */
    public static Study random(long seed) {
        Random random = new Random(seed);
        Study study = StudyFiles.newStudy();
        study.setName("Random " + seed);
        study.setFrequencyHertz(random.nextBoolean() ? 50 : 60);
        study.setEarthResistivityOhmMetres(Math.pow(10, 1 + 2 * random.nextDouble()));
        study.getCorridor().getEdges().add(edge(0, -40 - random.nextInt(20), 40 + random.nextInt(20)));
        study.getCorridor().setCrossSlope(0.1 * (random.nextDouble() - 0.5));
        Conductor conductor = conductor(study, "Phase conductor", 0.018 + 0.014 * random.nextDouble(), 8e-5);
        Conductor shield = conductor(study, "Shield conductor", 0.011, 1e-3);
        int lines = 1 + random.nextInt(3);
        for (int i = 0; i < lines; i++) {
            randomLine(study, random, i, (i - (lines - 1) / 2.0) * 35, conductor, shield);
        }
        for (int c = 0; c < 1 + random.nextInt(3); c++) {
            LoadCase loadCase = F.createLoadCase();
            loadCase.setName("Case " + c);
            study.getLines().forEach(line -> line.getCircuits().forEach(circuit -> loadCase.getLoads().add(load(circuit, 50 + random.nextInt(1500)))));
            study.getLoadCases().add(loadCase);
        }
        ProfileStation station = F.createProfileStation();
        station.setName("Station");
        station.setStationMetres(random.nextDouble() * 300);
        station.setFromOffsetMetres(-80);
        station.setToOffsetMetres(80);
        station.setSpacingMetres(4);
        study.getStations().add(station);
        StudyIds.assignMissing(study);
        return study;
    }

    private static void randomLine(Study study, Random random, int number, double offset, Conductor conductor, Conductor shield) {
        StructureType type = F.createStructureType();
        type.setName("Tower " + number);
        int circuits = 1 + random.nextInt(2);
        double height = 24 + 12 * random.nextDouble();
        for (int c = 0; c < circuits; c++) {
            double x = circuits == 1 ? 0 : c == 0 ? -6 : 6;
            for (int p = 0; p < 3; p++) {
                double dx = circuits == 1 ? (p - 1) * 8 : random.nextDouble();
                double z = circuits == 1 ? height : height + p * 6.5;
                type.getAttachments().add(attachment("c" + c + "p" + p, x + dx, z, 1 + random.nextDouble(), AttachmentRole.PHASE));
            }
        }
        type.getAttachments().add(attachment("peak", 0, height + 22, 0, AttachmentRole.SHIELD));
        study.getStructureTypes().add(type);
        int spans = 2 + random.nextInt(4);
        double[] stations = new double[spans + 1];
        stations[0] = -100 - random.nextInt(200);
        for (int i = 1; i <= spans; i++) {
            stations[i] = stations[i - 1] + 180 + random.nextInt(160);
        }
        Line line = line(study, "Line " + number, type, stations);
        line.getStructures().forEach(structure -> structure.setOffsetMetres(offset));
        for (int c = 0; c < circuits; c++) {
            Circuit circuit = circuit(line, "Circuit " + number + "." + c, conductor, "c" + c + "p0", "c" + c + "p1", "c" + c + "p2");
            circuit.setBundleCount(1 + random.nextInt(4));
            circuit.setBundleSpacingMetres(circuit.getBundleCount() == 1 ? 0 : 0.4);
        }
        ShieldWire wire = F.createShieldWire();
        wire.setName("Shield " + number);
        wire.setConductor(shield);
        wire.setAttachment("peak");
        line.getShieldWires().add(wire);
    }

    public static EdgePoint edge(double station, double left, double right) {
        EdgePoint edge = F.createEdgePoint();
        edge.setStationMetres(station);
        edge.setLeftOffsetMetres(left);
        edge.setRightOffsetMetres(right);
        return edge;
    }

    public static Conductor conductor(Study study, String name, double diameter, double resistance) {
        Conductor conductor = F.createConductor();
        conductor.setName(name);
        conductor.setDiameterMetres(diameter);
        conductor.setLowResistanceOhmsPerMetre(resistance);
        conductor.setMassKilogramsPerMetre(1.6);
        study.getConductors().add(conductor);
        return conductor;
    }

    public static Attachment attachment(String name, double offset, double height, double insulator, AttachmentRole role) {
        Attachment attachment = F.createAttachment();
        attachment.setName(name);
        attachment.setOffsetMetres(offset);
        attachment.setHeightMetres(height);
        attachment.setInsulatorLengthMetres(insulator);
        attachment.setRole(role);
        return attachment;
    }

    /** A line of one structure type at the given stations, strung with a constant of 1500 m. */
    public static Line line(Study study, String name, StructureType type, double... stations) {
        Line line = F.createLine();
        line.setName(name);
        for (int i = 0; i < stations.length; i++) {
            Structure structure = F.createStructure();
            structure.setName(name + " " + (i + 1));
            structure.setType(type);
            structure.setStationMetres(stations[i]);
            line.getStructures().add(structure);
        }
        StringingSection section = F.createStringingSection();
        CatenaryStringing stringing = F.createCatenaryStringing();
        stringing.setCatenaryConstantMetres(1500);
        section.setPhaseStringing(stringing);
        line.getSections().add(section);
        study.getLines().add(line);
        return line;
    }

    /** A circuit with the phases A, B, C on the given attachments. */
    public static Circuit circuit(Line line, String name, Conductor conductor, String... attachments) {
        Circuit circuit = F.createCircuit();
        circuit.setName(name);
        circuit.setConductor(conductor);
        circuit.setNominalVoltageVolts(220e3);
        double[] angles = {0, -120, 120};
        for (int i = 0; i < attachments.length; i++) {
            Phase phase = F.createPhase();
            phase.setLabel(String.valueOf((char) ('A' + i)));
            phase.setAngleDegrees(angles[i]);
            phase.setAttachment(attachments[i]);
            circuit.getPhases().add(phase);
        }
        line.getCircuits().add(circuit);
        return circuit;
    }

    public static CurrentLoad load(Circuit circuit, double amperes) {
        CurrentLoad load = F.createCurrentLoad();
        load.setCircuit(circuit);
        load.setCurrentAmperes(amperes);
        return load;
    }

    public static LoadCase loadCase(Study study, String name, Circuit circuit, double amperes) {
        LoadCase loadCase = F.createLoadCase();
        loadCase.setName(name);
        loadCase.getLoads().add(load(circuit, amperes));
        study.getLoadCases().add(loadCase);
        return loadCase;
    }
}
