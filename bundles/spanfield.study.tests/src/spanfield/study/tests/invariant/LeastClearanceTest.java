/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.study.tests.invariant;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;
import spanfield.model.Line;
import spanfield.model.LoadCase;
import spanfield.model.StructureType;
import spanfield.solver.geometry.Wire;
import spanfield.study.StudySnapshot;
import spanfield.study.result.LeastClearance;
import spanfield.study.tests.support.StudyMaker;

/** Where a line comes nearest to the ground, against heights worked out by hand. */
class LeastClearanceTest {

    /** Metres; heights near a minimum depend on its place to second order only. */
    private static final double HEIGHT = 1e-9;

    /** Metres; the place of a flat minimum is known to about the square root of the precision of its height. */
    private static final double PLACE = 1e-3;

    private static LeastClearance least(StudyMaker m, int line) {
        return StudySnapshot.of(m.study).leastClearance(line).orElseThrow();
    }

    @Test
    void levelLine_isLowestAtMidSpan() {
        StudyMaker m = StudyMaker.plain();
        LeastClearance least = least(m, 0);
        assertEquals(16 - 6, least.clearanceMetres(), HEIGHT);
        assertEquals(10, least.elevationMetres(), HEIGHT);
        assertEquals(150, least.alongMetres() % 300, PLACE);
        assertEquals("rating", least.loadCase());
        assertTrue(least.wire().endsWith("of 'circuit'"), least.wire());
    }

    @Test
    void raisedGround_isFoundInItsSpanAndCountedAlongTheLine() {
        StudyMaker m = StudyMaker.plain();
        for (double[] ground : new double[][] {{-600, 0}, {0, 0}, {150, 2}, {300, 0}, {600, 0}}) {
            var point = spanfield.model.SpanfieldFactory.eINSTANCE.createElevationPoint();
            point.setStationMetres(ground[0]);
            point.setElevationMetres(ground[1]);
            m.study.getCorridor().getCentrelineElevations().add(point);
        }
        LeastClearance least = least(m, 0);
        assertEquals(10 - 2, least.clearanceMetres(), HEIGHT);
        assertEquals(600 + 150, least.alongMetres(), PLACE);
        assertEquals("line-3", least.fromStructure());
        assertEquals("line-4", least.toStructure());
    }

    @Test
    void linesSideBySide_keepTheirOwnWires() {
        StudyMaker m = StudyMaker.plain();
        StructureType tall = m.type("tall");
        StudyMaker.attach(tall, "L", -6, 30);
        StudyMaker.attach(tall, "M", 0, 30);
        StudyMaker.attach(tall, "R", 6, 30);
        // so near that the outer wires of either stand within the reach of the other's structures
        Line second = m.line("second", tall, StudyMaker.sag(4), 5, -600, -300, 0, 300, 600);
        m.circuit(second, "upper", 132e3, "L", "M", "R");
        StudySnapshot snapshot = StudySnapshot.of(m.study);
        assertEquals(2, snapshot.lineCount());
        assertEquals(16 - 6, snapshot.leastClearance(0).orElseThrow().clearanceMetres(), HEIGHT);
        assertEquals(30 - 4, snapshot.leastClearance(1).orElseThrow().clearanceMetres(), HEIGHT);
        for (int line = 0; line < 2; line++) {
            String name = m.study.getLines().get(line).getName();
            assertEquals(3, snapshot.wires("rating", line).size());
            for (Wire wire : snapshot.wires("rating", line)) {
                assertTrue(wire.name().startsWith(name + ": "), wire.name());
            }
        }
        assertThrows(IndexOutOfBoundsException.class, () -> snapshot.leastClearance(2));
        assertThrows(IndexOutOfBoundsException.class, () -> snapshot.wires("rating", -1));
    }

    @Test
    void windUphill_countsThoughItsCaseIsNotTheFirst() {
        StudyMaker m = StudyMaker.plain();
        m.study.getCorridor().setCrossSlope(-0.5);
        LoadCase wind = m.loadCase("wind");
        StudyMaker.load(wind, m.circuit(), 500, 0);
        wind.setWindSwingDegrees(-30);
        LeastClearance least = least(m, 0);
        // the left phase, 6 m up the slope, swings up it: 16 m - 3 m of ground, less the sag's share towards the slope
        double swing = Math.toRadians(30);
        assertEquals(16 - 3 - 6 * (Math.cos(swing) + 0.5 * Math.sin(swing)), least.clearanceMetres(), HEIGHT);
        assertEquals("wind", least.loadCase());
        wind.setWindSwingDegrees(30);
        assertEquals("rating", least(m, 0).loadCase());
        assertEquals(16 - 3 - 6, least(m, 0).clearanceMetres(), HEIGHT);
    }

    @Test
    void bundle_countsItsLowestSubconductors() {
        StudyMaker m = StudyMaker.plain();
        StudyMaker.bundle(m.circuit(), 4, 0.4);
        assertEquals(16 - 6 - 0.2, least(m, 0).clearanceMetres(), HEIGHT);
        assertEquals(9.8, least(m, 0).elevationMetres(), HEIGHT);
    }
}
