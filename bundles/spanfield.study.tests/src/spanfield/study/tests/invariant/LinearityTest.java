/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.study.tests.invariant;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.Future;
import java.util.concurrent.atomic.AtomicInteger;
import org.junit.jupiter.api.Test;
import spanfield.model.CurrentLoad;
import spanfield.model.LoadCase;
import spanfield.solver.Progress;
import spanfield.solver.SolverCancelledException;
import spanfield.study.FieldPoint;
import spanfield.study.StudyRun;
import spanfield.study.StudySnapshot;
import spanfield.study.result.EdgeTable;
import spanfield.study.result.FieldSeries;
import spanfield.study.result.PointTable;
import spanfield.study.tests.support.RandomStudies;
import spanfield.study.tests.support.StudyMaker;

/** Load cases are sums over coefficients: superposition, what is remembered, cancellation, threads. */
class LinearityTest {

    /** Relative; sums of a dozen phasors in another order, in double precision. */
    private static final double ROUNDING = 1e-12;

    private static final List<FieldPoint> POINTS = List.of(new FieldPoint(150, -20, 1), new FieldPoint(150, 3, 1), new FieldPoint(40, 60, 2),
        new FieldPoint(-330, 0, 0));

    @Test
    void fieldOfTheSumOfTwoLoads_isTheSumOfTheirFields() {
        StudyMaker m = StudyMaker.plain();
        m.study.setEarthResistivityOhmMetres(30.0);
        m.study.getLoadCases().clear();
        StudyMaker.phasors(m.loadCase("first"), m.circuit(), 400, 10, 0, 0, 100, 90);
        StudyMaker.phasors(m.loadCase("second"), m.circuit(), 0, 0, 250, -120, 100, -90);
        StudyMaker.phasors(m.loadCase("sum"), m.circuit(), 400, 10, 250, -120, 0, 0);
        PointTable table = new StudyRun().points(StudySnapshot.of(m.study), POINTS, Progress.NONE);
        FieldSeries a = table.cases().get(0).series();
        FieldSeries b = table.cases().get(1).series();
        FieldSeries sum = table.cases().get(2).series();
        for (int i = 0; i < POINTS.size(); i++) {
            double scale = a.value(i).resultantTesla() + b.value(i).resultantTesla();
            for (int c = 0; c < 3; c++) {
                assertEquals(a.component(c, i).real() + b.component(c, i).real(), sum.component(c, i).real(), ROUNDING * scale);
                assertEquals(a.component(c, i).imaginary() + b.component(c, i).imaginary(), sum.component(c, i).imaginary(), ROUNDING * scale);
            }
        }
    }

    @Test
    void loadCasesOfTheSameWind_shareOneSolve() {
        StudyMaker m = StudyMaker.plain();
        for (int i = 0; i < 5; i++) {
            StudyMaker.load(m.loadCase("more" + i), m.circuit(), 100 * (i + 1), 10 * i);
        }
        StudyRun run = new StudyRun();
        run.points(StudySnapshot.of(m.study), POINTS, Progress.NONE);
        assertEquals(1, run.solveCount());
    }

    @Test
    void changedLoadsAndPhaseOrder_areComputedFromWhatIsRemembered() {
        StudyMaker m = StudyMaker.plain();
        m.study.setEarthResistivityOhmMetres(100.0);
        StudyRun run = new StudyRun();
        run.points(StudySnapshot.of(m.study), POINTS, Progress.NONE);
        long solves = run.solveCount();
        ((CurrentLoad) m.loadCase().getLoads().get(0)).setCurrentAmperes(321);
        m.circuit().getPhases().get(0).setAttachment("R");
        m.circuit().getPhases().get(2).setAttachment("L");
        StudySnapshot changed = StudySnapshot.of(m.study);
        PointTable remembered = run.points(changed, POINTS, Progress.NONE);
        assertEquals(solves, run.solveCount(), "solves");
        PointTable fresh = new StudyRun().points(changed, POINTS, Progress.NONE);
        assertArrayEquals(fresh.cases().get(0).series().resultantsTesla(), remembered.cases().get(0).series().resultantsTesla(), 0);
    }

    @Test
    void changedSag_isComputedAnew() {
        StudyMaker m = StudyMaker.plain();
        StudyRun run = new StudyRun();
        PointTable before = run.points(StudySnapshot.of(m.study), POINTS, Progress.NONE);
        m.line().getSections().get(0).setPhaseStringing(StudyMaker.sag(5));
        PointTable after = run.points(StudySnapshot.of(m.study), POINTS, Progress.NONE);
        assertEquals(2, run.solveCount());
        assertNotEquals(before.cases().get(0).series().value(0).resultantTesla(), after.cases().get(0).series().value(0).resultantTesla());
    }

    @Test
    void snapshot_doesNotFollowTheModel() {
        StudyMaker m = StudyMaker.plain();
        StudySnapshot snapshot = StudySnapshot.of(m.study);
        double before = new StudyRun().points(snapshot, POINTS, Progress.NONE).cases().get(0).series().value(0).resultantTesla();
        ((CurrentLoad) m.loadCase().getLoads().get(0)).setCurrentAmperes(5);
        m.line().getSections().clear();
        m.study.getStations().clear();
        assertEquals(before, new StudyRun().points(snapshot, POINTS, Progress.NONE).cases().get(0).series().value(0).resultantTesla(), 0);
        assertEquals(1, snapshot.stations().size());
    }

    @Test
    void digest_isThatOfTheSavedStudyAndFollowsEveryChange() {
        StudyMaker m = StudyMaker.plain();
        String digest = StudySnapshot.of(m.study).digest();
        assertEquals(64, digest.length());
        assertEquals(digest, StudySnapshot.of(m.study).digest());
        ((CurrentLoad) m.loadCase().getLoads().get(0)).setCurrentAmperes(501);
        assertNotEquals(digest, StudySnapshot.of(m.study).digest());
    }

    @Test
    void cancellation_endsTheRunAndHarmsNothing() {
        StudySnapshot snapshot = StudySnapshot.of(RandomStudies.of(3).study);
        StudyRun run = new StudyRun();
        AtomicInteger asked = new AtomicInteger();
        Progress cancelling = new Progress() {
            @Override
            public void report(double fraction) {
                assertTrue(fraction >= 0 && fraction <= 1);
            }

            @Override
            public boolean cancelled() {
                return asked.incrementAndGet() > 3;
            }
        };
        assertThrows(SolverCancelledException.class, () -> run.edgeTable(snapshot, cancelling));
        EdgeTable afterwards = run.edgeTable(snapshot, Progress.NONE);
        EdgeTable fresh = new StudyRun().edgeTable(snapshot, Progress.NONE);
        assertEquals(fresh.rows(), afterwards.rows());
    }

    @Test
    void progress_neverFallsAndEndsAtOne() {
        List<Double> reports = new ArrayList<>();
        Progress listener = new Progress() {
            @Override
            public synchronized void report(double fraction) {
                reports.add(fraction);
            }

            @Override
            public boolean cancelled() {
                return false;
            }
        };
        new StudyRun().edgeTable(StudySnapshot.of(RandomStudies.of(3).study), listener);
        for (int i = 1; i < reports.size(); i++) {
            assertTrue(reports.get(i) >= reports.get(i - 1), "report " + i + " of " + reports);
        }
        assertEquals(1, reports.get(reports.size() - 1), 1e-12);
    }

    @Test
    void runsInSeveralThreads_giveTheSameResult() throws Exception {
        StudySnapshot snapshot = StudySnapshot.of(RandomStudies.of(4).study);
        StudyRun run = new StudyRun();
        ExecutorService threads = Executors.newFixedThreadPool(4);
        try {
            List<Future<EdgeTable>> futures = new ArrayList<>();
            for (int i = 0; i < 8; i++) {
                futures.add(threads.submit(() -> run.edgeTable(snapshot, Progress.NONE)));
            }
            EdgeTable expected = new StudyRun().edgeTable(snapshot, Progress.NONE);
            for (Future<EdgeTable> future : futures) {
                assertEquals(expected.rows(), future.get().rows());
            }
        } finally {
            threads.shutdownNow();
        }
    }

    @Test
    void caseWithoutLoads_hasNoField() {
        StudyMaker m = StudyMaker.plain();
        LoadCase off = m.loadCase("off");
        StudyMaker.load(off, m.circuit(), 0, 0);
        EdgeTable table = new StudyRun().edgeTable(StudySnapshot.of(m.study), Progress.NONE);
        assertEquals(0, table.rows().get(1).greatestResultant().field().resultantTesla(), 0);
        assertEquals(0, table.rows().get(1).greatestResultant().field().numericalErrorTesla(), 0);
    }
}
