/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.solver.geometry;

import org.apache.commons.math3.analysis.solvers.BrentSolver;
import spanfield.solver.SolverInputException;
import spanfield.solver.SolverInputException.Reason;

/**
 * One span of a flexible wire: an exact catenary of constant c = H / w (horizontal tension over weight per length) between two
 * attachment points, in the vertical plane through them, or in that plane tilted about the chord by the swing angle.
 *
 * <p>With s the horizontal distance from the start, S the horizontal length, h the rise and
 * s_v = S/2 - c asinh(h / (2 c sinh(S / 2c))), the unswung curve is z(s) = z_v + c (cosh((s - s_v)/c) - 1) (any text on the mechanics
 * of overhead lines). Its depth below the chord is delta(s). Swing turns the depth, which points straight down, about the chord; so
 * r(s) = start + s t + delta(s) e with constant vectors t (along the chord, per horizontal metre) and e. Sag and constant are those of
 * the unswung plane. Positive swing moves the belly to the right, seen along the span.
 *
 * <p>The curve is wrong for a wire with bending stiffness near its clamps, and for point loads in the span. Immutable.
 */
public final class CatenarySpan {

    /** Shortest admissible horizontal length in metres. */
    public static final double LEAST_LENGTH_METRES = 0.01;

    /** Greatest admissible S / (2 c): beyond it the sag exceeds about 85 % of the span, and the constant is mistaken. */
    public static final double GREATEST_HALF_SPAN_RATIO = 1.5;

    /** Greatest admissible slope of the wire at a support: beyond it the constant is too small for the rise. */
    public static final double GREATEST_SLOPE = 10;

    /** Greatest admissible swing in radians. */
    public static final double GREATEST_SWING_RADIANS = Math.toRadians(85);

    private final Position start;
    private final Position end;
    private final double constant;
    private final double swing;
    private final double length;
    private final double rise;
    private final double vertex;
    private final double tx;
    private final double ty;
    private final double tz;
    private final double ex;
    private final double ey;
    private final double ez;

    private CatenarySpan(Position start, Position end, double constant, double swing) {
        this.start = start;
        this.end = end;
        this.constant = constant;
        this.swing = SolverInputException.requireWithin("swing angle in radians", swing, -GREATEST_SWING_RADIANS, GREATEST_SWING_RADIANS);
        this.length = start.planDistanceTo(end);
        this.rise = end.z() - start.z();
        if (length < LEAST_LENGTH_METRES) {
            throw new SolverInputException(Reason.ZERO_LENGTH, "The span from " + start + " to " + end + " has a horizontal length of "
                + length + " m; it must be at least " + LEAST_LENGTH_METRES + " m");
        }
        requireTaut();
        this.vertex = Double.isInfinite(constant) ? Double.NaN
            : length / 2 - constant * asinh(rise / (2 * constant * Hyperbolic.sinh(length / (2 * constant))));
        requireGentle();
        this.tx = (end.x() - start.x()) / length;
        this.ty = (end.y() - start.y()) / length;
        this.tz = rise / length;
        // The unit vector down, turned about the chord u by -swing: along u it stays, across u it turns towards u x z = the right.
        double norm = Math.sqrt(1 + tz * tz);
        double ux = tx / norm;
        double uy = ty / norm;
        double uz = tz / norm;
        double cos = Math.cos(swing);
        double sin = Math.sin(swing);
        this.ex = -(uz * ux * (1 - cos) - sin * uy);
        this.ey = -(uz * uy * (1 - cos) + sin * ux);
        this.ez = -(uz * uz * (1 - cos) + cos);
    }

    private void requireTaut() {
        if (!(constant > 0)) {
            throw new SolverInputException(Reason.VALUE_OUT_OF_RANGE, "The catenary constant is " + constant + " m; it must be positive");
        }
        double ratio = length / (2 * constant);
        if (ratio > GREATEST_HALF_SPAN_RATIO) {
            throw new SolverInputException(Reason.VALUE_OUT_OF_RANGE, "The catenary constant of " + constant + " m is too small for a span of "
                + length + " m; it must be at least " + length / (2 * GREATEST_HALF_SPAN_RATIO) + " m");
        }
    }

    private void requireGentle() {
        double steepest = Double.isInfinite(constant) ? Math.abs(rise / length)
            : Math.max(Math.abs(Hyperbolic.sinh(vertex / constant)), Math.abs(Hyperbolic.sinh((length - vertex) / constant)));
        if (steepest > GREATEST_SLOPE) {
            throw new SolverInputException(Reason.VALUE_OUT_OF_RANGE, "The catenary constant of " + constant + " m is too small for a rise of "
                + rise + " m over " + length + " m: the wire would leave a support with a slope of " + steepest
                + ", more than " + GREATEST_SLOPE);
        }
    }

    private static double asinh(double value) {
        double magnitude = Math.abs(value);
        return Math.copySign(Math.log1p(magnitude + magnitude * magnitude / (1 + Math.sqrt(magnitude * magnitude + 1))), value);
    }

    /**
     * A span of given catenary constant.
     *
     * @param constantMetres catenary constant c = H / w in metres; positive infinity for a straight wire
     * @param swingRadians   swing about the chord, positive to the right seen from start to end
     * @throws SolverInputException for coinciding ends, or a constant too small for the span or the rise
     */
    public static CatenarySpan ofConstant(Position start, Position end, double constantMetres, double swingRadians) {
        return new CatenarySpan(start, end, constantMetres, swingRadians);
    }

    /** A straight wire between two points. */
    public static CatenarySpan straight(Position start, Position end) {
        return new CatenarySpan(start, end, Double.POSITIVE_INFINITY, 0);
    }

    /**
     * A span of given sag at mid-span, measured vertically from the chord in the unswung plane; the constant is found by Brent's method.
     *
     * @param sagMetres positive; at most what {@link #GREATEST_HALF_SPAN_RATIO} allows
     */
    public static CatenarySpan ofMidspanSag(Position start, Position end, double sagMetres, double swingRadians) {
        return new CatenarySpan(start, end, constantForMidspanSag(start.planDistanceTo(end), end.z() - start.z(), sagMetres), swingRadians);
    }

    /**
     * Catenary constant in metres of the span whose sag at mid-span, vertically from the chord, is given.
     *
     * @param lengthMetres horizontal length
     * @param riseMetres   rise from start to end
     * @param sagMetres    sag, positive
     */
    public static double constantForMidspanSag(double lengthMetres, double riseMetres, double sagMetres) {
        double least = lengthMetres / (2 * GREATEST_HALF_SPAN_RATIO);
        double greatestSag = midspanSag(lengthMetres, riseMetres, least);
        if (!(sagMetres > 0 && sagMetres <= greatestSag)) {
            throw new SolverInputException(Reason.VALUE_OUT_OF_RANGE, "The sag is " + sagMetres + " m; in a span of " + lengthMetres
                + " m it must be positive and at most " + greatestSag + " m");
        }
        // The parabola S^2 / (8 D), lengthened for the inclined chord, gives the scale; the sag falls steadily with the constant.
        double guess = lengthMetres * Math.hypot(lengthMetres, riseMetres) / (8 * sagMetres);
        return new BrentSolver(1e-15, 1e-12, 1e-15).solve(500,
            c -> midspanSag(lengthMetres, riseMetres, c) - sagMetres, least, Math.max(8 * guess, 2 * least));
    }

    private static double midspanSag(double length, double rise, double constant) {
        double vertex = length / 2 - constant * asinh(rise / (2 * constant * Hyperbolic.sinh(length / (2 * constant))));
        return rise / 2 - climb(constant, vertex, length / 2);
    }

    /** z(s) - z(0) of the unswung catenary, in the product form that does not cancel for large constants. */
    private static double climb(double constant, double vertex, double s) {
        return 2 * constant * Hyperbolic.sinh((s - 2 * vertex) / (2 * constant)) * Hyperbolic.sinh(s / (2 * constant));
    }

    /** Attachment at the start. */
    public Position start() {
        return start;
    }

    /** Attachment at the end. */
    public Position end() {
        return end;
    }

    /** Catenary constant in metres; positive infinity for a straight wire. */
    public double constantMetres() {
        return constant;
    }

    /** Swing about the chord in radians, positive to the right. */
    public double swingRadians() {
        return swing;
    }

    /** Horizontal length in metres. */
    public double horizontalLengthMetres() {
        return length;
    }

    /** Rise from start to end in metres. */
    public double riseMetres() {
        return rise;
    }

    /** Horizontal distance of the catenary's vertex from the start in metres; may lie outside the span; NaN for a straight wire. */
    public double vertexMetres() {
        return vertex;
    }

    /** Exact length of the wire in metres: L^2 = h^2 + (2 c sinh(S / 2c))^2. Swing does not change it. */
    public double lengthMetres() {
        double level = Double.isInfinite(constant) ? length : 2 * constant * Hyperbolic.sinh(length / (2 * constant));
        return Math.hypot(rise, level);
    }

    /** Sag at mid-span in metres, vertically from the chord, in the unswung plane. */
    public double midspanSagMetres() {
        return depthMetres(length / 2);
    }

    /** Greatest depth below the chord in metres, in the unswung plane: where the wire runs parallel to the chord. */
    public double greatestDepthMetres() {
        return Double.isInfinite(constant) ? 0 : depthMetres(Math.max(0, Math.min(length, vertex + constant * asinh(tz))));
    }

    /** Depth below the chord in metres at the horizontal distance s from the start, in the unswung plane. */
    public double depthMetres(double s) {
        return Double.isInfinite(constant) ? 0 : tz * s - climb(constant, vertex, s);
    }

    /** Derivative of {@link #depthMetres} (dimensionless). */
    public double depthSlope(double s) {
        return Double.isInfinite(constant) ? 0 : tz - Hyperbolic.sinh((s - vertex) / constant);
    }

    /** Point of the wire at the horizontal distance s along the chord from the start, 0 to the horizontal length. */
    public Position at(double s) {
        double depth = depthMetres(s);
        return new Position(start.x() + s * tx + depth * ex, start.y() + s * ty + depth * ey, start.z() + s * tz + depth * ez);
    }

    /** Chord vector per horizontal metre, components X, Y, Z: r(s) = start + s t + depth(s) e. */
    public double[] chordDirection() {
        return new double[] {tx, ty, tz};
    }

    /** Direction in which the depth below the chord is laid off, components X, Y, Z: (0, 0, -1) without swing. */
    public double[] depthDirection() {
        return new double[] {ex, ey, ez};
    }

    /** Lowest point of the wire. */
    public Position lowestPoint() {
        if (Double.isInfinite(constant)) {
            return rise < 0 ? end : start;
        }
        // dz/ds = tz + ez (tz - sinh((s - s_v)/c)) = 0
        double s = vertex + constant * asinh(tz + tz / ez);
        return at(Math.max(0, Math.min(length, s)));
    }

    /**
     * Mean elevation of the wire in metres as line theory takes it: mean of the attachments less two thirds of the sag, the sag laid
     * off along the swung plane.
     */
    public double meanElevationMetres() {
        return (start.z() + end.z()) / 2 + 2.0 / 3 * midspanSagMetres() * ez;
    }

    @Override
    public String toString() {
        return "span " + start + " to " + end + ", constant " + constant + " m";
    }
}
