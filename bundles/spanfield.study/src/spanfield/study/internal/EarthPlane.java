/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.study.internal;

import java.util.List;
import spanfield.solver.geometry.Position;
import spanfield.study.CorridorPlan;

/** The one earth plane of a study: mean ground level under the modelled spans, weighted by their length in plan. */
final class EarthPlane {

    /** Samples of a span: the ground is piecewise linear, so that the mean is off by the curvature of a few corners only. */
    private static final int SAMPLES = 100;

    private EarthPlane() {
    }

    /**
     * Elevation of the plane in metres.
     *
     * @param bases bases of the structures of each line
     */
    static double elevation(List<Position[]> bases, CorridorPlan plan) {
        double first = plan.groundElevationAt(bases.get(0)[0].x(), bases.get(0)[0].y());
        double sum = 0;
        double total = 0;
        for (Position[] line : bases) {
            for (int i = 1; i < line.length; i++) {
                double length = line[i - 1].planDistanceTo(line[i]);
                sum += length * meanAbove(first, line[i - 1], line[i], plan);
                total += length;
            }
        }
        return first + sum / total;
    }

    /** Mean of the ground less a reference level along a chord in plan, by the midpoint rule; exact on level ground. */
    private static double meanAbove(double level, Position a, Position b, CorridorPlan plan) {
        double sum = 0;
        for (int i = 0; i < SAMPLES; i++) {
            double t = (i + 0.5) / SAMPLES;
            sum += plan.groundElevationAt(a.x() + t * (b.x() - a.x()), a.y() + t * (b.y() - a.y())) - level;
        }
        return sum / SAMPLES;
    }
}
