/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.study;

import java.util.List;
import spanfield.solver.Progress;
import spanfield.study.StudyInputException.PointProblem;
import spanfield.study.internal.CoefficientStore;
import spanfield.study.internal.StudyRunner;
import spanfield.study.result.EdgeTable;
import spanfield.study.result.LateralProfile;
import spanfield.study.result.PointTable;
import spanfield.study.result.StationInfo;

/**
 * Computes results from snapshots. Keep one instance while a study is being worked on: it remembers the field per ampere of wires at points,
 * so that after a change of loads or of the phase order only sums are left to do. Results do not depend on what is remembered.
 *
 * <p>Thread-safe. Every method throws {@link spanfield.solver.SolverCancelledException} when the listener cancels, and
 * {@link spanfield.solver.SolverInputException} where the solver meets a point in a conductor between the points that were checked.
 */
public final class StudyRun {

    private final CoefficientStore store = new CoefficientStore();
    private final StudyRunner runner = new StudyRunner(store);

    /** The edge-of-right-of-way table: every station and load case of the snapshot. */
    public EdgeTable edgeTable(StudySnapshot snapshot, Progress progress) {
        return runner.edgeTable(snapshot.prepared(), snapshot.identity(), progress);
    }

    /**
     * The lateral profile at a station, for every load case of the snapshot.
     *
     * @param station one of the snapshot, or any other ({@link StationInfo#at})
     * @throws StudyInputException where a point of the profile cannot be computed
     */
    public LateralProfile profile(StudySnapshot snapshot, StationInfo station, Progress progress) {
        return runner.profile(snapshot.prepared(), snapshot.identity(), station, progress);
    }

    /**
     * The field at chosen points, for every load case of the snapshot.
     *
     * @throws StudyInputException with all points that cannot be computed, see {@link #problems}
     */
    public PointTable points(StudySnapshot snapshot, List<FieldPoint> points, Progress progress) {
        return runner.points(snapshot.prepared(), snapshot.identity(), points, progress);
    }

    /** What keeps points from being computed: below ground, in a conductor, not a number. Empty when all is well. */
    public List<PointProblem> problems(StudySnapshot snapshot, List<FieldPoint> points) {
        return runner.problems(snapshot.prepared(), points);
    }

    /** How often this instance had to compute coefficients: for tests of what is remembered. */
    public long solveCount() {
        return store.solves();
    }
}
