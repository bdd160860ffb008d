/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.study.tests.invariant;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static spanfield.study.tests.support.Runs.assertSame;
import static spanfield.study.tests.support.Runs.assertSameGreatest;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import spanfield.model.AlignmentBend;
import spanfield.model.CurrentLoad;
import spanfield.model.ElevationPoint;
import spanfield.model.PowerLoad;
import spanfield.model.SequenceLoad;
import spanfield.model.SpanfieldFactory;
import spanfield.model.Study;
import spanfield.model.io.StudyFiles;
import spanfield.study.result.EdgeRow;
import spanfield.study.result.EdgeTable;
import spanfield.study.tests.support.RandomStudies;
import spanfield.study.tests.support.Runs;
import spanfield.study.tests.support.StudyMaker;
import spanfield.study.tests.support.Transforms;

/** What may be done to a study without changing its field, or changing it in a known way. */
class SymmetryTest {

    /**
     * Relative; allowance beside the error bounds for what the transformations themselves round (coordinates of 1e3 m to 1e-13 m, currents
     * by sine and cosine) and for the place of a maximum, which is found to a millimetre: 3 (0.0005 m / 6 m)^2 = 2e-8.
     */
    private static final double ROUNDING = 1e-7;

    @ParameterizedTest
    @ValueSource(longs = {1, 2, 3, 4, 5, 6, 7, 8})
    void mirroredStudy_givesTheMirroredTable(long seed) {
        Study study = RandomStudies.of(seed).study;
        EdgeTable straight = Runs.table(study);
        EdgeTable mirrored = Runs.table(Transforms.mirrored(study));
        for (int i = 0; i < straight.rows().size(); i++) {
            EdgeRow a = straight.rows().get(i);
            EdgeRow b = mirrored.rows().get(i);
            assertSame(a.leftEdge().field(), b.rightEdge().field(), ROUNDING, "left edge");
            assertSame(a.rightEdge().field(), b.leftEdge().field(), ROUNDING, "right edge");
            assertEquals(a.leftEdge().offsetMetres(), -b.rightEdge().offsetMetres(), 1e-9, "offset of the edge in metres");
            assertSameGreatest(a, b, ROUNDING, "greatest");
        }
    }

    @ParameterizedTest
    @ValueSource(longs = {11, 12, 13, 14, 15, 16})
    void lineDescribedFromItsOtherEnd_givesTheSameTable(long seed) {
        Study study = RandomStudies.of(seed).study;
        assertSame(Runs.table(study), Runs.table(Transforms.describedBackwards(study)), ROUNDING, "seed " + seed);
    }

    @ParameterizedTest
    @ValueSource(longs = {21, 22, 23, 24})
    void reversedFlows_giveTheSameTable(long seed) {
        Study study = RandomStudies.of(seed).study;
        assertSame(Runs.table(study), Runs.table(Transforms.reversedFlows(study)), ROUNDING, "seed " + seed);
    }

    @Test
    void commonAngleOfAllLoads_changesNothing() {
        StudyMaker m = StudyMaker.plain();
        m.study.setEarthResistivityOhmMetres(100.0);
        EdgeTable before = Runs.table(m.study);
        ((CurrentLoad) m.loadCase().getLoads().get(0)).setAngleDegrees(73);
        assertSame(before, Runs.table(m.study), ROUNDING, "rotated");
    }

    @Test
    void phasesMovedOnCyclically_giveTheSameTable() {
        StudyMaker m = StudyMaker.plain();
        m.study.setEarthResistivityOhmMetres(100.0);
        EdgeTable before = Runs.table(m.study);
        String[] moved = {"M", "R", "L"};
        for (int i = 0; i < 3; i++) {
            m.circuit().getPhases().get(i).setAttachment(moved[i]);
        }
        assertSame(before, Runs.table(m.study), ROUNDING, "cyclic");
    }

    @Test
    void loadByPower_isTheLoadByItsCurrent() {
        StudyMaker m = StudyMaker.plain();
        EdgeTable byCurrent = Runs.table(m.study);
        // |S| = sqrt(3) V I with V = 132 kV and I = 500 A, at a power factor angle of 25 degrees lagging
        double apparent = Math.sqrt(3) * 132e3 * 500;
        PowerLoad power = SpanfieldFactory.eINSTANCE.createPowerLoad();
        power.setCircuit(m.circuit());
        power.setActivePowerWatts(apparent * Math.cos(Math.toRadians(25)));
        power.setReactivePowerVars(apparent * Math.sin(Math.toRadians(25)));
        m.loadCase().getLoads().set(0, power);
        EdgeTable byPower = Runs.table(m.study);
        assertSame(byCurrent, byPower, ROUNDING, "power");
        assertEquals(-25, byPower.evidence().currents().get(0).circuits().get(0).phases().get(0).amperes().angleDegrees(), 1e-9,
            "lagging current of phase A in degrees");
    }

    @Test
    void loadBySequences_isTheLoadByItsPhaseCurrents() {
        StudyMaker m = StudyMaker.plain();
        SequenceLoad load = SpanfieldFactory.eINSTANCE.createSequenceLoad();
        load.setCircuit(m.circuit());
        load.setPositiveAmperes(400);
        load.setPositiveAngleDegrees(10);
        load.setNegativeAmperes(60);
        load.setNegativeAngleDegrees(-30);
        load.setZeroAmperes(20);
        load.setZeroAngleDegrees(50);
        m.loadCase().getLoads().set(0, load);
        var phases = Runs.table(m.study).evidence().currents().get(0).circuits().get(0).phases();
        // Fortescue 1918: the positive sequence turns by -120 and +120 degrees from A to B and C, the negative the other way
        double[][] turns = {{0, 0}, {-120, 120}, {120, -120}};
        for (int i = 0; i < 3; i++) {
            double real = 400 * cos(10 + turns[i][0]) + 60 * cos(-30 + turns[i][1]) + 20 * cos(50);
            double imaginary = 400 * cos(10 + turns[i][0] - 90) + 60 * cos(-30 + turns[i][1] - 90) + 20 * cos(50 - 90);
            assertEquals(real, phases.get(i).amperes().real(), 1e-9, "amperes, phase " + phases.get(i).phase());
            assertEquals(imaginary, phases.get(i).amperes().imaginary(), 1e-9, "amperes, phase " + phases.get(i).phase());
        }
    }

    private static double cos(double degrees) {
        return Math.cos(Math.toRadians(degrees));
    }

    @Test
    void currentTwice_givesFieldTwice() {
        StudyMaker m = StudyMaker.plain();
        EdgeTable once = Runs.table(m.study);
        ((CurrentLoad) m.loadCase().getLoads().get(0)).setCurrentAmperes(1000);
        EdgeTable twice = Runs.table(m.study);
        assertEquals(2 * once.rows().get(0).leftEdge().field().resultantTesla(), twice.rows().get(0).leftEdge().field().resultantTesla(),
            1e-12 * once.rows().get(0).leftEdge().field().resultantTesla(), "tesla; a factor of two is exact but for rounding of sums");
    }

    @Test
    void bendFarBehind_turnsTheStudyAsAWhole() {
        StudyMaker m = StudyMaker.plain();
        m.study.getCorridor().setCrossSlope(0.03);
        m.study.setEarthResistivityOhmMetres(100.0);
        EdgeTable straight = Runs.table(m.study);
        Study bent = StudyFiles.copy(m.study);
        AlignmentBend bend = SpanfieldFactory.eINSTANCE.createAlignmentBend();
        bend.setStationMetres(-5000);
        bend.setDeflectionDegrees(37);
        bent.getCorridor().getBends().add(bend);
        assertSame(straight, Runs.table(bent), ROUNDING, "bent");
    }

    @Test
    void everythingHigher_changesNothing() {
        StudyMaker m = StudyMaker.plain();
        m.study.setEarthResistivityOhmMetres(100.0);
        EdgeTable low = Runs.table(m.study);
        ElevationPoint e = SpanfieldFactory.eINSTANCE.createElevationPoint();
        e.setElevationMetres(1234.5);
        m.study.getCorridor().getCentrelineElevations().add(e);
        EdgeTable high = Runs.table(m.study);
        assertSame(low, high, ROUNDING, "lifted");
        assertEquals(1234.5, high.evidence().earthPlaneMetres(), 1e-9, "earth plane in metres");
    }

    @Test
    void lineMovedAlong_withItsStation_changesNothing() {
        StudyMaker m = StudyMaker.plain();
        EdgeTable before = Runs.table(m.study);
        m.line().getStructures().forEach(s -> s.setStationMetres(s.getStationMetres() + 777));
        m.study.getStations().forEach(s -> s.setStationMetres(s.getStationMetres() + 777));
        assertSame(before, Runs.table(m.study), ROUNDING, "moved");
    }
}
