/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.study.internal;

import org.apache.commons.math3.analysis.UnivariateFunction;
import org.apache.commons.math3.optim.MaxEval;
import org.apache.commons.math3.optim.nonlinear.scalar.GoalType;
import org.apache.commons.math3.optim.univariate.BrentOptimizer;
import org.apache.commons.math3.optim.univariate.SearchInterval;
import org.apache.commons.math3.optim.univariate.UnivariateObjectiveFunction;
import spanfield.solver.geometry.CatenarySpan;
import spanfield.solver.geometry.Position;
import spanfield.study.CorridorPlan;

/**
 * Least height of a span above the ground: of the axis of its lowest subconductors, above the ground straight beneath them.
 *
 * @param metres   least height in metres; negative below ground
 * @param distance horizontal distance from the start of the span in metres
 * @param place    bundle centre there
 */
record GroundClearance(double metres, double distance, Position place) {

    /** Samples of a span before refinement: the ground is piecewise linear, the wire smooth, so that the dip in between is single. */
    private static final int SAMPLES = 48;

    /** Place of the minimum is refined to this part of the span; the height is then exact to its square, far below a millimetre. */
    private static final double RELATIVE_PLACE = 1e-8;

    /**
     * Finds the least clearance of a span.
     *
     * @param span      path of the bundle's centre
     * @param drop      depth of the lowest subconductors below the centre in metres
     * @param halfWidth half the level distance of the lowest subconductors in metres
     */
    static GroundClearance of(CatenarySpan span, double drop, double halfWidth, CorridorPlan plan) {
        UnivariateFunction height = s -> height(span.at(s), span, drop, halfWidth, plan);
        double step = span.horizontalLengthMetres() / SAMPLES;
        int least = 0;
        double value = Double.POSITIVE_INFINITY;
        for (int i = 0; i <= SAMPLES; i++) {
            double sample = height.value(Math.min(i * step, span.horizontalLengthMetres()));
            if (sample < value) {
                value = sample;
                least = i;
            }
        }
        double from = Math.max(0, least - 1) * step;
        double to = Math.min(Math.min(SAMPLES, least + 1) * step, span.horizontalLengthMetres());
        var refined = new BrentOptimizer(RELATIVE_PLACE, RELATIVE_PLACE * step).optimize(new MaxEval(200), GoalType.MINIMIZE,
            new UnivariateObjectiveFunction(height), new SearchInterval(from, to));
        double s = refined.getValue() < value ? refined.getPoint() : Math.min(least * step, span.horizontalLengthMetres());
        return new GroundClearance(Math.min(value, refined.getValue()), s, span.at(s));
    }

    private static double height(Position p, CatenarySpan span, double drop, double halfWidth, CorridorPlan plan) {
        if (halfWidth == 0) {
            return p.z() - drop - plan.groundElevationAt(p.x(), p.y());
        }
        double[] t = span.chordDirection();
        double ground = Math.max(plan.groundElevationAt(p.x() + halfWidth * t[1], p.y() - halfWidth * t[0]),
            plan.groundElevationAt(p.x() - halfWidth * t[1], p.y() + halfWidth * t[0]));
        return p.z() - drop - ground;
    }
}
