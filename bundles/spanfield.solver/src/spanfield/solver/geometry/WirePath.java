/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.solver.geometry;

import java.util.List;
import spanfield.solver.SolverInputException;
import spanfield.solver.SolverInputException.Reason;

/**
 * A wire as a chain of spans and what it does beyond both ends. The order of the spans is the positive direction of current.
 *
 * @param spans  at least one; each span starts exactly where the one before ends
 * @param start  what the wire does before the first span
 * @param finish what the wire does after the last span
 */
public record WirePath(List<CatenarySpan> spans, WireEnd start, WireEnd finish) {

    /** Greatest gap between the end of a span and the start of the next, in metres: rounding of coordinates. */
    public static final double GREATEST_GAP_METRES = 1e-9;

    public WirePath {
        spans = List.copyOf(spans);
        if (spans.isEmpty()) {
            throw new SolverInputException(Reason.SIZE_MISMATCH, "A wire needs at least one span");
        }
        for (int i = 1; i < spans.size(); i++) {
            double gap = spans.get(i - 1).end().distanceTo(spans.get(i).start());
            if (gap > GREATEST_GAP_METRES) {
                throw new SolverInputException(Reason.NOT_CONTIGUOUS,
                    "Span " + (i + 1) + " starts " + gap + " m away from the end of span " + i);
            }
        }
    }

    /** A wire of one span which continues beyond both ends. */
    public static WirePath of(CatenarySpan span) {
        return new WirePath(List.of(span), WireEnd.CONTINUES, WireEnd.CONTINUES);
    }

    /** First attachment. */
    public Position first() {
        return spans.get(0).start();
    }

    /** Last attachment. */
    public Position last() {
        return spans.get(spans.size() - 1).end();
    }

    /** Length-weighted mean elevation of the modelled spans in metres. */
    public double meanElevationMetres() {
        double sum = 0;
        double total = 0;
        for (CatenarySpan span : spans) {
            sum += span.meanElevationMetres() * span.horizontalLengthMetres();
            total += span.horizontalLengthMetres();
        }
        return sum / total;
    }

    /**
     * The straight line in plan that stands for the wire where theory needs an infinite straight one: through the length-weighted mean
     * of the span middles, along the vector from the first to the last attachment. Components: point X, point Y, direction X, Y (unit).
     */
    public double[] meanPlanLine() {
        double total = 0;
        double x = 0;
        double y = 0;
        for (CatenarySpan span : spans) {
            double weight = span.horizontalLengthMetres();
            double[] down = span.depthDirection();
            double sag = 2.0 / 3 * span.midspanSagMetres();
            x += weight * ((span.start().x() + span.end().x()) / 2 + sag * down[0]);
            y += weight * ((span.start().y() + span.end().y()) / 2 + sag * down[1]);
            total += weight;
        }
        double dx = last().x() - first().x();
        double dy = last().y() - first().y();
        double length = Math.hypot(dx, dy);
        if (length < CatenarySpan.LEAST_LENGTH_METRES) {
            dx = last().x() - spans.get(spans.size() - 1).start().x();
            dy = last().y() - spans.get(spans.size() - 1).start().y();
            length = Math.hypot(dx, dy);
        }
        return new double[] {x / total, y / total, dx / length, dy / length};
    }

    /** Greatest angle in plan between any span and {@link #meanPlanLine}, in radians: 0 for a wire without turns. */
    public double greatestTurnRadians() {
        double[] line = meanPlanLine();
        double greatest = 0;
        for (CatenarySpan span : spans) {
            double[] t = span.chordDirection();
            double cross = line[2] * t[1] - line[3] * t[0];
            double dot = line[2] * t[0] + line[3] * t[1];
            greatest = Math.max(greatest, Math.abs(Math.atan2(cross, dot)));
        }
        return greatest;
    }
}
