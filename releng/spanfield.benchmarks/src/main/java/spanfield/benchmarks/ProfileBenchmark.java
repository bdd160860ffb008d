/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.benchmarks;

import java.util.List;
import java.util.concurrent.TimeUnit;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Fork;
import org.openjdk.jmh.annotations.Measurement;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.annotations.Warmup;
import spanfield.solver.Progress;
import spanfield.solver.earth.EarthModel;
import spanfield.solver.earth.EarthReturn;
import spanfield.solver.field.Accuracy;
import spanfield.solver.field.MagneticFieldSolver;
import spanfield.solver.field.ObservationPoints;
import spanfield.solver.geometry.Wire;

/** Work A: a lateral profile of 401 points, eight wires of seven spans, with earth, to 1e-6. */
@State(Scope.Benchmark)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.MILLISECONDS)
@Warmup(iterations = 5, time = 1)
@Measurement(iterations = 7, time = 1)
@Fork(1)
public class ProfileBenchmark {

    private final List<Wire> wires = Corridor.wires();
    private final ObservationPoints points = ObservationPoints.lateral(-100, 100, 401, 0, 1);
    private final EarthReturn earth = new EarthReturn(EarthModel.EXACT_HALF_SPACE, 100, 60, 0);

    @Benchmark
    public Object oneThread() {
        return MagneticFieldSolver.sequential().solve(wires, points, earth, Accuracy.DEFAULT, Progress.NONE);
    }

    @Benchmark
    public Object allThreads() {
        return MagneticFieldSolver.parallel().solve(wires, points, earth, Accuracy.DEFAULT, Progress.NONE);
    }

    @Benchmark
    public Object freeSpaceOneThread() {
        return MagneticFieldSolver.sequential().solve(wires, points, EarthReturn.none(), Accuracy.DEFAULT, Progress.NONE);
    }

    /** The reference to compare with: the same integrals by the adaptive quadrature of Commons Math. */
    @Benchmark
    public double commonsMathAdaptive() {
        return AdaptiveReference.sum(wires, points, earth);
    }
}
