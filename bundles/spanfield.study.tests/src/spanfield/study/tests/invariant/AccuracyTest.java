/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.study.tests.invariant;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import spanfield.model.Bonding;
import spanfield.model.GroundPoint;
import spanfield.model.Line;
import spanfield.model.ShieldWire;
import spanfield.model.SpanfieldFactory;
import spanfield.model.StructureType;
import spanfield.solver.Progress;
import spanfield.study.FieldPoint;
import spanfield.study.StudyInputException;
import spanfield.study.StudyRun;
import spanfield.study.StudySnapshot;
import spanfield.study.result.EdgeRow;
import spanfield.study.result.EdgeTable;
import spanfield.study.result.FieldValue;
import spanfield.study.result.LateralProfile;
import spanfield.study.result.PointTable;
import spanfield.study.result.StationInfo;
import spanfield.study.tests.support.RandomStudies;
import spanfield.study.tests.support.Runs;
import spanfield.study.tests.support.StudyMaker;

/** Error bounds hold, asked accuracies are reached, maxima are maxima, and nothing is ever not a number. */
class AccuracyTest {

    private static List<FieldPoint> points(long seed) {
        Random random = new Random(seed);
        List<FieldPoint> points = new ArrayList<>();
        for (int i = 0; i < 25; i++) {
            points.add(new FieldPoint(-900 + 1800 * random.nextDouble(), -400 + 800 * random.nextDouble(), 4 * random.nextDouble()));
        }
        return points;
    }

    @ParameterizedTest
    @ValueSource(longs = {31, 32, 33, 34, 35, 36, 37, 38, 39, 40, 41, 42})
    void randomStudies_areFiniteAndTheirErrorBoundsHold(long seed) {
        StudySnapshot snapshot = StudySnapshot.of(RandomStudies.of(seed).study);
        StudyRun run = new StudyRun();
        PointTable coarse = run.points(snapshot.withAccuracy(1e-3), points(seed), Progress.NONE);
        PointTable fine = run.points(snapshot.withAccuracy(1e-10), points(seed), Progress.NONE);
        for (int c = 0; c < coarse.cases().size(); c++) {
            for (int i = 0; i < coarse.points().size(); i++) {
                FieldValue a = coarse.cases().get(c).series().value(i);
                FieldValue b = fine.cases().get(c).series().value(i);
                assertTrue(a.resultantTesla() > 0 && Double.isFinite(a.resultantTesla()), "resultant at point " + i);
                assertTrue(Double.isFinite(a.majorAxisTesla()) && Double.isFinite(a.minorAxisTesla()), "axes at point " + i);
                assertTrue(a.majorAxisTesla() <= a.resultantTesla() * (1 + 1e-12), "major axis at most the resultant, but for rounding");
                assertTrue(Double.isFinite(a.modelErrorTesla()) == a.modelErrorKnown(), "model error");
                assertEquals(b.resultantTesla(), a.resultantTesla(), a.numericalErrorTesla() + b.numericalErrorTesla(), "bound at point " + i);
                assertEquals(b.majorAxisTesla(), a.majorAxisTesla(), a.numericalErrorTesla() + b.numericalErrorTesla(), "bound at point " + i);
            }
        }
    }

    @ParameterizedTest
    @ValueSource(doubles = {1e-3, 1e-6, 1e-9})
    void askedAccuracy_isReached(double relative) {
        for (long seed = 51; seed < 55; seed++) {
            EdgeTable table = new StudyRun().edgeTable(StudySnapshot.of(RandomStudies.of(seed).study).withAccuracy(relative), Progress.NONE);
            assertEquals(relative, table.evidence().accuracyAsked(), 0);
            assertTrue(table.evidence().accuracyReached() <= relative, "reached " + table.evidence().accuracyReached());
            for (EdgeRow row : table.rows()) {
                assertTrue(row.greatestResultant().field().numericalErrorTesla() <= relative * row.greatestResultant().field().resultantTesla());
            }
        }
    }

    @Test
    void accuracyFarAwayWherePhasesCancel_isReachedByRefinement() {
        StudyMaker m = new StudyMaker();
        StructureType type = m.type("tower");
        for (int i = 0; i < 3; i++) {
            StudyMaker.attach(type, "L" + i, -6, 34 - 8 * i);
            StudyMaker.attach(type, "R" + i, 6, 34 - 8 * i);
        }
        Line line = m.line("line", type, StudyMaker.sag(8), 0, -600, -300, 0, 300, 600);
        // low-reactance phasing: the field falls with the cube of the distance
        StudyMaker.load(m.loadCase("rating"), m.circuit(line, "left", 132e3, "L0", "L1", "L2"), 500, 0);
        StudyMaker.load(m.loadCase(), m.circuit(line, "right", 132e3, "R2", "R1", "R0"), 500, 0);
        m.station("s", 150, -50, 50, 5);
        StudySnapshot snapshot = StudySnapshot.of(m.study).withAccuracy(1e-8);
        StudyRun run = new StudyRun();
        PointTable table = run.points(snapshot, List.of(new FieldPoint(150, 0, 1), new FieldPoint(150, 700, 1), new FieldPoint(150, -1500, 1)),
            Progress.NONE);
        assertTrue(run.solveCount() > 1, "one solve is not enough here, or this test tests nothing");
        assertTrue(table.evidence().accuracyReached() <= 1e-8, "reached " + table.evidence().accuracyReached());
    }

    /** Relative; as PLACE, for wires 2 m away: 3 (0.0005 m / 2 m)^2 = 2e-7, and the dense profile's own 3 (0.005 m / 2 m)^2 = 2e-5. */
    private static final double NEAR_PLACE = 2e-5;

    @Test
    void greatestOfSeveralPeaks_isFoundWhereverTheCoarsePointsLie() {
        Random random = new Random(77);
        for (int trial = 0; trial < 25; trial++) {
            StudyMaker m = new StudyMaker();
            m.study.setReferenceHeightMetres(8);
            StructureType type = m.type("wide");
            // wires 2 m above the points and far apart: a peak under each, all three within about half a per cent, the middle wire hung a
            // little higher for that
            for (int i = 0; i < 3; i++) {
                StudyMaker.attach(type, "T" + i, 12 * i - 12, (i == 1 ? 10.033 : 10) + 0.01 * random.nextDouble());
            }
            Line line = m.line("line", type, StudyMaker.sag(StudyMaker.STRAIGHT_SAG), 0, -300, 0, 300);
            StudyMaker.load(m.loadCase("rating"), m.circuit(line, "circuit", 33e3, "T0", "T1", "T2"), 500, 0);
            double shift = 2 * random.nextDouble();
            m.station("s", 0, -20 + shift, 20 + shift, 19.7);
            StudySnapshot snapshot = StudySnapshot.of(m.study);
            StudyRun run = new StudyRun();
            double found = run.edgeTable(snapshot, Progress.NONE).rows().get(0).greatestResultant().field().resultantTesla();
            double[] dense = run.profile(snapshot, StationInfo.at(0, -25, 25, 0.01), Progress.NONE).cases().get(0).series().resultantsTesla();
            double greatest = java.util.Arrays.stream(dense).max().orElseThrow();
            assertEquals(greatest, found, NEAR_PLACE * greatest, "trial " + trial);
            assertTrue(found >= greatest * (1 - PLACE * 9), "trial " + trial);
        }
    }

    @Test
    void narrowPeakBetweenCoarsePoints_isNotMissed() {
        StudyMaker m = StudyMaker.plain();
        // a wire with 20 A only 0.3 m above the points: 13 microtesla within a quarter of a metre of it, beside some 8 of the line
        StudyMaker.attach(m.study.getStructureTypes().get(0), "S", 14.1, 1.3);
        ShieldWire low = m.shield(m.line(), "low", "S", Bonding.GIVEN_CURRENT);
        low.setGivenCurrentAmperes(20);
        m.line().getSections().get(0).setShieldStringing(StudyMaker.sag(StudyMaker.STRAIGHT_SAG));
        m.study.getStations().get(0).setSpacingMetres(25);
        EdgeRow row = Runs.table(m.study).rows().get(0);
        assertEquals(14.1, row.greatestResultant().offsetMetres(), 0.1, "metres; the line's field moves the peak a little");
        // mu0 I / (2 pi d) of the wire, less at most what the line adds there against it
        assertTrue(row.greatestResultant().field().resultantTesla() > 2e-7 * 20 / 0.3 - 6e-6, row.greatestResultant().toString());
    }

    @Test
    void accuracyBeyondDoublePrecision_isSaidNotToBeReached() {
        StudySnapshot snapshot = StudySnapshot.of(StudyMaker.plain().study).withAccuracy(1e-12);
        // 5 km away the balanced phases cancel to a thousandth of each
        PointTable table = new StudyRun().points(snapshot, List.of(new FieldPoint(150, 5000, 1)), Progress.NONE);
        assertTrue(table.evidence().accuracyReached() > 1e-12, "reached " + table.evidence().accuracyReached());
        assertTrue(table.evidence().notices().stream().anyMatch(n -> n.text().contains("numerical error bound")), table.evidence().notices().toString());
    }

    /** Relative; the place of a maximum is found to 1 mm: low by about 3 (0.0005 m / 6 m)^2 = 2e-8, and twice that near corners. */
    private static final double PLACE = 1e-7;

    @ParameterizedTest
    @ValueSource(longs = {61, 62, 63, 64, 65})
    void greatestValue_isNotExceededOnADenseProfile(long seed) {
        StudyMaker m = RandomStudies.of(seed);
        m.study.getStations().clear();
        m.station("coarse", 120, -60, 60, 40);
        StudySnapshot snapshot = StudySnapshot.of(m.study);
        StudyRun run = new StudyRun();
        LateralProfile dense = run.profile(snapshot, StationInfo.at(120, -25, 25, 0.02), Progress.NONE);
        EdgeTable table = run.edgeTable(snapshot, Progress.NONE);
        for (int c = 0; c < table.rows().size(); c++) {
            EdgeRow row = table.rows().get(c);
            double[] resultants = dense.cases().get(c).series().resultantsTesla();
            double[] majors = dense.cases().get(c).series().majorAxesTesla();
            double greatest = 0;
            double greatestMajor = 0;
            for (int i = 0; i < resultants.length; i++) {
                greatest = Math.max(greatest, resultants[i]);
                greatestMajor = Math.max(greatestMajor, majors[i]);
            }
            double found = row.greatestResultant().field().resultantTesla();
            assertTrue(found >= greatest * (1 - PLACE), "found " + found + " T, there is " + greatest + " T");
            assertTrue(row.greatestMajorAxis().field().majorAxisTesla() >= greatestMajor * (1 - PLACE), "major axis");
            // and it is a value of the profile: the field there, computed by itself, is the same
            FieldPoint place = new FieldPoint(120, row.greatestResultant().offsetMetres(), m.study.getReferenceHeightMetres());
            FieldValue alone = run.points(snapshot, List.of(place), Progress.NONE).cases().get(c).series().value(0);
            assertEquals(alone.resultantTesla(), found, alone.numericalErrorTesla() + row.greatestResultant().field().numericalErrorTesla());
        }
    }

    @Test
    void greatestValueOfTheProfile_mayLieOutsideTheRightOfWay() {
        StudyMaker m = StudyMaker.plain();
        m.study.getCorridor().getEdges().get(0).setLeftOffsetMetres(10);
        EdgeRow row = Runs.table(m.study).rows().get(0);
        assertEquals(10, row.greatestResultant().offsetMetres(), 0, "metres; the field falls from the edge outwards");
        assertTrue(row.greatestResultantOfProfile().field().resultantTesla() > 1.2 * row.greatestResultant().field().resultantTesla());
        assertTrue(Math.abs(row.greatestResultantOfProfile().offsetMetres()) < 6);
    }

    @Test
    void profile_hasItsOffsetsItsGroundAndItsEdges() {
        StudyMaker m = StudyMaker.plain();
        m.study.getCorridor().setCrossSlope(0.1);
        m.study.getStations().get(0).setSpacingMetres(30);
        StudySnapshot snapshot = StudySnapshot.of(m.study);
        LateralProfile profile = new StudyRun().profile(snapshot, snapshot.stations().get(0), Progress.NONE);
        org.junit.jupiter.api.Assertions.assertArrayEquals(new double[] {-50, -20, 10, 40, 50}, profile.offsetsMetres(), 0);
        org.junit.jupiter.api.Assertions.assertArrayEquals(new double[] {-5, -2, 1, 4, 5}, profile.groundElevationsMetres(), 1e-15);
        assertEquals(-25, profile.leftEdgeOffsetMetres(), 0);
        assertEquals(25, profile.rightEdgeOffsetMetres(), 0);
        FieldValue alone = Runs.points(m.study, List.of(new FieldPoint(150, 10, 1))).cases().get(0).series().value(0);
        Runs.assertSame(alone, profile.cases().get(0).series().value(2), 1e-12, "point of the profile");
    }

    @Test
    void maximumInACornerOfTheGround_isFoundThere() {
        StudyMaker m = StudyMaker.plain();
        // a ridge at 2.345 m: points come nearest to the wires there
        for (double[] point : new double[][] {{-30, 0}, {2.345, 6}, {30, 0}}) {
            GroundPoint g = SpanfieldFactory.eINSTANCE.createGroundPoint();
            g.setOffsetMetres(point[0]);
            g.setElevationMetres(point[1]);
            m.study.getCorridor().getGroundPoints().add(g);
        }
        m.line().getStructures().forEach(s -> s.setHeightAdjustmentMetres(2));
        assertEquals(2.345, Runs.table(m.study).rows().get(0).greatestResultant().offsetMetres(), 0);
    }

    @Test
    void pointsThatCannotBeComputed_areNamedAllAtOnce() {
        StudySnapshot snapshot = StudySnapshot.of(StudyMaker.plain().study);
        List<FieldPoint> points = List.of(new FieldPoint(150, 0, 1), new FieldPoint(150, 0, -0.5), new FieldPoint(Double.NaN, 0, 1),
            new FieldPoint(0, 6, 16.005), new FieldPoint(0, 6, 16.5));
        StudyInputException refused = assertThrows(StudyInputException.class, () -> new StudyRun().points(snapshot, points, Progress.NONE));
        assertEquals(List.of(1, 2, 3), refused.pointProblems().stream().map(p -> p.index()).toList());
        assertTrue(refused.pointProblems().get(0).message().contains("below the ground"), refused.getMessage());
        assertTrue(refused.pointProblems().get(2).message().contains("conductor"), refused.pointProblems().get(2).message());
    }

    @Test
    void noPoints_giveAnEmptyTable() {
        PointTable table = new StudyRun().points(StudySnapshot.of(StudyMaker.plain().study), List.of(), Progress.NONE);
        assertEquals(0, table.points().size());
        assertEquals(0, table.cases().get(0).series().size());
        assertFalse(Double.isNaN(table.evidence().accuracyReached()));
    }

    @Test
    void manyPoints_areSolvedInPartsWithTheSameResult() {
        StudySnapshot snapshot = StudySnapshot.of(StudyMaker.plain().study);
        List<FieldPoint> points = new ArrayList<>();
        for (int i = 0; i < 5000; i++) {
            points.add(new FieldPoint(150, -50 + 0.02 * i, 1));
        }
        PointTable many = new StudyRun().points(snapshot, points, Progress.NONE);
        PointTable few = new StudyRun().points(snapshot, points.subList(4990, 5000), Progress.NONE);
        for (int i = 0; i < 10; i++) {
            Runs.assertSame(few.cases().get(0).series().value(i), many.cases().get(0).series().value(4990 + i), 0, "point " + i);
        }
    }
}
