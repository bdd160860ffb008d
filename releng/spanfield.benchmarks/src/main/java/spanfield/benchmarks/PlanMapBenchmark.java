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
import spanfield.solver.earth.EarthReturn;
import spanfield.solver.field.Accuracy;
import spanfield.solver.field.MagneticFieldSolver;
import spanfield.solver.field.ObservationPoints;
import spanfield.solver.geometry.Wire;

/** Work B: a plan map of 500 by 500 points over 200 m by 600 m, eight wires of seven spans, in free space, to 1e-6. */
@State(Scope.Benchmark)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.MILLISECONDS)
@Warmup(iterations = 3, time = 2)
@Measurement(iterations = 7, time = 2)
@Fork(value = 1, jvmArgsAppend = "-Xmx2g")
public class PlanMapBenchmark {

    private static final int SIDE = 500;

    private final List<Wire> wires = Corridor.wires();
    private final ObservationPoints points = grid();

    private static ObservationPoints grid() {
        double[][] c = new double[3][SIDE * SIDE];
        for (int i = 0; i < SIDE * SIDE; i++) {
            c[0][i] = -100 + 200.0 * (i % SIDE) / (SIDE - 1);
            c[1][i] = -300 + 600.0 * (i / SIDE) / (SIDE - 1);
            c[2][i] = 1;
        }
        return ObservationPoints.of(c[0], c[1], c[2]);
    }

    @Benchmark
    public Object oneThread() {
        return MagneticFieldSolver.sequential().solve(wires, points, EarthReturn.none(), Accuracy.DEFAULT, Progress.NONE);
    }

    @Benchmark
    public Object allThreads() {
        return MagneticFieldSolver.parallel().solve(wires, points, EarthReturn.none(), Accuracy.DEFAULT, Progress.NONE);
    }
}
