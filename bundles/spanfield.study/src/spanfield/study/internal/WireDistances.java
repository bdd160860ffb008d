/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.study.internal;

import java.util.ArrayList;
import java.util.List;
import spanfield.solver.geometry.CatenarySpan;
import spanfield.solver.geometry.Position;
import spanfield.solver.geometry.WireEnd;
import spanfield.solver.geometry.WirePath;

/**
 * Least distances between the centres of conductors, span by span. Only pairs that may come within a given distance are measured.
 *
 * <p>Spans are sampled; a pair whose sampled boxes stay apart is left out, for the others the nearest samples are refined by alternating
 * projection onto the local tangent, which meets the distance to a small part of a millimetre for curves as flat as wires.
 */
final class WireDistances {

    private static final int SAMPLES = 32;

    /** Most rounds of refinement; a few are enough, since the tangents of wires turn slowly. */
    private static final int ROUNDS = 40;

    /** Refinement ends when both places move by less than this, in metres. */
    private static final double STILL_METRES = 1e-7;

    /** Ends of wires closer than this, in metres, are one joint. */
    private static final double JOINT_METRES = 1e-3;

    /** Two spans that come near each other. */
    record Near(int first, int firstSpan, int second, int secondSpan, double metres, Position place) {
    }

    private final GeometryState state;
    private final Sampled[][] samples;

    private record Sampled(CatenarySpan span, Position[] points, double[] low, double[] high) {
    }

    WireDistances(GeometryState state) {
        this.state = state;
        this.samples = new Sampled[state.conductors().size()][];
        for (int i = 0; i < samples.length; i++) {
            WirePath path = state.centre(i);
            samples[i] = path.spans().stream().map(WireDistances::sample).toArray(Sampled[]::new);
        }
    }

    private static Sampled sample(CatenarySpan span) {
        Position[] points = new Position[SAMPLES + 1];
        double[] low = {Double.POSITIVE_INFINITY, Double.POSITIVE_INFINITY, Double.POSITIVE_INFINITY};
        double[] high = {Double.NEGATIVE_INFINITY, Double.NEGATIVE_INFINITY, Double.NEGATIVE_INFINITY};
        for (int i = 0; i <= SAMPLES; i++) {
            Position p = span.at(span.horizontalLengthMetres() * i / SAMPLES);
            points[i] = p;
            double[] c = {p.x(), p.y(), p.z()};
            for (int axis = 0; axis < 3; axis++) {
                low[axis] = Math.min(low[axis], c[axis]);
                high[axis] = Math.max(high[axis], c[axis]);
            }
        }
        return new Sampled(span, points, low, high);
    }

    /** Distance within which pairs are wanted, by conductor indices. */
    interface Reach {
        /** Distance in metres below which the pair is of interest. */
        double metres(int first, int second);
    }

    /** The nearest approach of every pair of conductors that comes within reach; one entry for a pair. */
    List<Near> near(Reach reach) {
        List<Near> found = new ArrayList<>();
        for (int i = 0; i < samples.length; i++) {
            for (int j = i + 1; j < samples.length; j++) {
                Near nearest = nearest(i, j, reach.metres(i, j));
                if (nearest != null) {
                    found.add(nearest);
                }
            }
        }
        return found;
    }

    private Near nearest(int i, int j, double reach) {
        Near best = null;
        for (int a = 0; a < samples[i].length; a++) {
            for (int b = 0; b < samples[j].length; b++) {
                if (!apart(samples[i][a], samples[j][b], reach) && !joined(i, a, j, b)) {
                    Near near = measure(i, a, j, b);
                    if (near.metres <= reach && (best == null || near.metres < best.metres)) {
                        best = near;
                    }
                }
            }
        }
        return best;
    }

    /** Whether two wires that both end there are joined end to end: a line that goes on as another line. */
    private boolean joined(int i, int a, int j, int b) {
        WirePath first = state.centre(i);
        WirePath second = state.centre(j);
        boolean firstStart = a == 0 && first.start() == WireEnd.ENDS;
        boolean firstFinish = a == first.spans().size() - 1 && first.finish() == WireEnd.ENDS;
        boolean secondStart = b == 0 && second.start() == WireEnd.ENDS;
        boolean secondFinish = b == second.spans().size() - 1 && second.finish() == WireEnd.ENDS;
        return firstStart && secondStart && meet(first.first(), second.first())
            || firstStart && secondFinish && meet(first.first(), second.last())
            || firstFinish && secondStart && meet(first.last(), second.first())
            || firstFinish && secondFinish && meet(first.last(), second.last());
    }

    private static boolean meet(Position p, Position q) {
        return p.distanceTo(q) < JOINT_METRES;
    }

    private static boolean apart(Sampled a, Sampled b, double reach) {
        // Between samples a wire leaves the box of its samples by less than this: the depth of a span's part of 1/32, a thousandth of its sag.
        double slack = reach + (a.span.midspanSagMetres() + b.span.midspanSagMetres()) / (SAMPLES * SAMPLES);
        for (int axis = 0; axis < 3; axis++) {
            if (a.low[axis] > b.high[axis] + slack || b.low[axis] > a.high[axis] + slack) {
                return true;
            }
        }
        return false;
    }

    private Near measure(int i, int a, int j, int b) {
        Sampled first = samples[i][a];
        Sampled second = samples[j][b];
        int bestA = 0;
        int bestB = 0;
        double best = Double.POSITIVE_INFINITY;
        for (int p = 0; p <= SAMPLES; p++) {
            for (int q = 0; q <= SAMPLES; q++) {
                double d = square(first.points[p], second.points[q]);
                if (d < best) {
                    best = d;
                    bestA = p;
                    bestB = q;
                }
            }
        }
        return refine(new Near(i, a, j, b, Math.sqrt(best), first.points[bestA]), first.span, second.span,
            first.span.horizontalLengthMetres() * bestA / SAMPLES, second.span.horizontalLengthMetres() * bestB / SAMPLES);
    }

    private static Near refine(Near sampled, CatenarySpan first, CatenarySpan second, double fromS, double fromT) {
        Near best = sampled;
        double s = fromS;
        double t = fromT;
        for (int round = 0; round < ROUNDS; round++) {
            double[] next = step(first, s, second, t);
            boolean still = Math.abs(next[0] - s) + Math.abs(next[1] - t) < STILL_METRES;
            s = next[0];
            t = next[1];
            double distance = first.at(s).distanceTo(second.at(t));
            if (distance < best.metres) {
                best = new Near(sampled.first, sampled.firstSpan, sampled.second, sampled.secondSpan, distance, first.at(s));
            }
            if (still) {
                break;
            }
        }
        return best;
    }

    private static double square(Position p, Position q) {
        double dx = p.x() - q.x();
        double dy = p.y() - q.y();
        double dz = p.z() - q.z();
        return dx * dx + dy * dy + dz * dz;
    }

    /** One step of the nearest points of the two tangents, kept within the spans. */
    private static double[] step(CatenarySpan first, double s, CatenarySpan second, double t) {
        double[] u = tangent(first, s);
        double[] v = tangent(second, t);
        Position p = first.at(s);
        Position q = second.at(t);
        double[] w = {p.x() - q.x(), p.y() - q.y(), p.z() - q.z()};
        double uu = dot(u, u);
        double uv = dot(u, v);
        double vv = dot(v, v);
        double uw = dot(u, w);
        double vw = dot(v, w);
        double determinant = uu * vv - uv * uv;
        double ds;
        double dt;
        if (determinant > 1e-9 * uu * vv) {
            ds = (uv * vw - vv * uw) / determinant;
            dt = (uu * vw - uv * uw) / determinant;
        } else {
            ds = 0;
            dt = vw / vv;
        }
        return new double[] {clamp(s + ds, first.horizontalLengthMetres()), clamp(t + dt, second.horizontalLengthMetres())};
    }

    private static double clamp(double s, double length) {
        return Math.max(0, Math.min(length, s));
    }

    private static double[] tangent(CatenarySpan span, double s) {
        double[] t = span.chordDirection();
        double[] e = span.depthDirection();
        double slope = span.depthSlope(s);
        return new double[] {t[0] + slope * e[0], t[1] + slope * e[1], t[2] + slope * e[2]};
    }

    private static double dot(double[] a, double[] b) {
        return a[0] * b[0] + a[1] * b[1] + a[2] * b[2];
    }
}
