/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.study.tests.support;

import java.util.Random;
import spanfield.model.AlignmentBend;
import spanfield.model.Bonding;
import spanfield.model.Circuit;
import spanfield.model.EarthModel;
import spanfield.model.ElevationPoint;
import spanfield.model.GroundPoint;
import spanfield.model.Line;
import spanfield.model.LoadCase;
import spanfield.model.SpanfieldFactory;
import spanfield.model.Structure;
import spanfield.model.StructureType;

/** Random but sound studies: one or two lines with bundles, shield wires, turns, slopes, wind and unbalance. Invented data. */
public final class RandomStudies {

    private static final SpanfieldFactory F = SpanfieldFactory.eINSTANCE;

    private final Random random;
    private final StudyMaker maker = new StudyMaker();

    private RandomStudies(long seed) {
        this.random = new Random(seed);
    }

    /** The study of a seed. */
    public static StudyMaker of(long seed) {
        RandomStudies r = new RandomStudies(seed);
        r.fill();
        return r.maker;
    }

    private double between(double least, double greatest) {
        return least + (greatest - least) * random.nextDouble();
    }

    private void fill() {
        if (random.nextInt(4) > 0) {
            maker.study.setEarthResistivityOhmMetres(Math.pow(10, between(0.5, 4)));
            maker.study.setEarthModel(random.nextBoolean() ? EarthModel.EXACT_HALF_SPACE : EarthModel.COMPLEX_IMAGES);
        }
        maker.study.setFrequencyHertz(random.nextBoolean() ? 50 : 60);
        ground();
        int lines = 1 + random.nextInt(2);
        for (int i = 0; i < lines; i++) {
            addLine(i);
        }
        for (int i = 0; i < 2; i++) {
            addCase(i);
        }
        maker.station("span", between(-200, 500), -60, 60, between(1, 7));
        maker.station("structure", 0, -45, 70, 5);
    }

    private void ground() {
        var corridor = maker.study.getCorridor();
        if (random.nextBoolean()) {
            corridor.setCrossSlope(between(-0.05, 0.05));
        } else {
            for (double offset : new double[] {-40, -5, 5, 40}) {
                GroundPoint g = F.createGroundPoint();
                g.setOffsetMetres(offset);
                g.setElevationMetres(between(-2, 2));
                corridor.getGroundPoints().add(g);
            }
        }
        for (double station : new double[] {-800, -200, 400, 1000}) {
            ElevationPoint e = F.createElevationPoint();
            e.setStationMetres(station);
            e.setElevationMetres(100 + between(-4, 4));
            corridor.getCentrelineElevations().add(e);
        }
        if (random.nextInt(3) == 0) {
            AlignmentBend bend = F.createAlignmentBend();
            bend.setStationMetres(between(250, 350));
            bend.setDeflectionDegrees(between(-25, 25));
            corridor.getBends().add(bend);
        }
    }

    private void addLine(int index) {
        StructureType type = maker.type("type" + index);
        boolean twoCircuits = random.nextBoolean();
        double shift = between(4, 6);
        StudyMaker.attach(type, "L1", -shift, between(20, 22));
        StudyMaker.attach(type, "L2", -shift - 2, between(26, 28));
        StudyMaker.attach(type, "L3", -shift, between(32, 34));
        StudyMaker.attach(type, "R1", shift, between(20, 22));
        StudyMaker.attach(type, "R2", shift + 2, between(26, 28));
        StudyMaker.attach(type, "R3", shift, between(32, 34));
        StudyMaker.attach(type, "S1", 0, 40);
        double offset = index == 0 ? between(-5, 0) : between(28, 34);
        Line line = maker.line("line" + index, type, StudyMaker.sag(between(4, 9)), offset, -600, -330, 0, 280, 600);
        for (Structure structure : line.getStructures()) {
            structure.setOffsetMetres(offset + between(-2, 2));
            structure.setHeightAdjustmentMetres(between(-1, 3));
        }
        StudyMaker.bundle(maker.circuit(line, "left" + index, 132e3, "L1", "L2", "L3"), 1 + random.nextInt(4), 0.4);
        if (twoCircuits) {
            StudyMaker.bundle(maker.circuit(line, "right" + index, 132e3, "R1", "R2", "R3"), 1 + random.nextInt(2), 0.3);
        }
        boolean bonded = maker.study.getEarthResistivityOhmMetres() != null && random.nextInt(3) > 0;
        maker.shield(line, "peak" + index, "S1", bonded ? Bonding.BONDED : Bonding.INSULATED);
    }

    private void addCase(int index) {
        LoadCase loadCase = maker.loadCase("case" + index);
        loadCase.setWindSwingDegrees(index == 0 ? 0 : between(-30, 30));
        for (Line line : maker.study.getLines()) {
            for (Circuit circuit : line.getCircuits()) {
                if (random.nextBoolean()) {
                    StudyMaker.load(loadCase, circuit, between(100, 2000), between(-30, 30));
                } else {
                    double i = between(100, 2000);
                    StudyMaker.phasors(loadCase, circuit, i * between(0.9, 1.1), 0, i, -120 + between(-5, 5), i, 120);
                }
            }
        }
    }
}
