/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.solver.field;

import java.util.concurrent.atomic.AtomicReferenceArray;
import java.util.stream.IntStream;
import spanfield.solver.SolverInputException;
import spanfield.solver.SolverInputException.Reason;
import spanfield.solver.geometry.CatenarySpan;
import spanfield.solver.geometry.Position;
import spanfield.solver.geometry.Wire;
import spanfield.solver.geometry.WireEnd;
import spanfield.solver.geometry.WirePath;

/**
 * Free-space field of one wire at a block of points by the Biot-Savart law along its true path, without the factor mu0/(4 pi).
 *
 * <p>Method. Each span is cut into panels, and each panel gets the Gauss-Legendre rule that it needs. The integrand of a panel between A
 * and B is analytic within the ellipse with foci A and B through the observation point (for a straight panel the singularities lie on
 * it), so with e = (|r-A| + |r-B|) / |B-A| and rho = e + sqrt(e^2 - 1) the rule with n nodes errs by about rho^(-2n) (Davis and Rabinowitz,
 * Methods of Numerical Integration, 1984, section 4.6). The least e over the block decides. Where the largest rule does not reach the
 * tolerance, the panel is cut on both sides of the foot of the nearest point; the outer parts may then be about ten times as long as
 * they are near. Far away, where rho is large, the shape of the path itself needs nodes: it grows like exp(rate) towards
 * larger ellipses, and the best ellipse up to the singularity counts. The sag within a panel moves the singularities a little: the
 * reach is shortened by it.
 *
 * <p>The bound that comes back is the sum over the panels of {@value #ERROR_FACTOR} |AB| / (|r-A| |r-B|) rho^(-2n) at the worst point of
 * the block, and a term for rounded coordinates. The factor covers the largest ratio of true error to this form seen over random
 * geometries; the tests hold the bound against brute force.
 */
final class FilamentField {

    /** Factor of the error form; see the class text. Tests compare bound and true error over random geometries. */
    static final double ERROR_FACTOR = 30;

    /**
     * Rate of the exponentials of the path in the integrand, in units of half panel over catenary constant: the integrand far away is a
     * product of the depth and its slope.
     */
    static final double PATH_RATE = 4;

    /** Share of the tolerance that one panel may use: a wire rarely has more panels than this that matter. */
    private static final double PANELS_THAT_MATTER = 10;

    /** Half-length of the panel beside the nearest point, in units of the point's distance: e = 1.17, where 16 to 20 nodes reach 1e-7. */
    private static final double NEAR_PANEL = 1.6;

    /** Least share of a panel that a cut may leave on a side. */
    private static final double LEAST_SHARE = 0.04;

    private final Wire wire;
    private final SpanVectors[] vectors;
    private final double[] sags;
    /** Nodes on whole spans, [span * (greatest rule + 1) + number of nodes]; never changed once set. */
    private final AtomicReferenceArray<SourceNodes> wholeSpans;
    private final double scaleLength;
    private final double greatestCoordinate;

    FilamentField(Wire wire) {
        this.wire = wire;
        this.vectors = IntStream.range(0, wire.path().spans().size()).mapToObj(i -> new SpanVectors(wire.path().spans().get(i), i)).toArray(SpanVectors[]::new);
        this.wholeSpans = new AtomicReferenceArray<>(vectors.length * (GaussRules.GREATEST + 1));
        this.sags = wire.path().spans().stream().mapToDouble(CatenarySpan::greatestDepthMetres).toArray();
        this.greatestCoordinate = wire.path().spans().stream().flatMapToDouble(span -> java.util.stream.DoubleStream.of(
            span.start().x(), span.start().y(), span.start().z(), span.end().x(), span.end().y(), span.end().z())).map(Math::abs).max().orElse(0);
        boolean finite = wire.path().start() == WireEnd.ENDS && wire.path().finish() == WireEnd.ENDS;
        this.scaleLength = finite ? wire.path().spans().stream().mapToDouble(CatenarySpan::lengthMetres).sum() : Double.POSITIVE_INFINITY;
    }

    /**
     * Sums the field of the wire at the points of the block into its sums.
     *
     * @param row      interpolation along the block for what is far away; null to evaluate everything at every point
     * @param relative accuracy relative to the field of a long straight wire at the distance of the block
     * @return bound of the quadrature error of the vector sum at any point of the block, in 1/m
     */
    double addTo(PointBlock block, RowInterpolation row, SourceNodes nodes, double relative) {
        double distance = farthest(block);
        double tolerance = relative * Math.min(2 / distance, scaleLength / (distance * distance)) / PANELS_THAT_MATTER;
        nodes.clear();
        double error = 0;
        WirePath path = wire.path();
        boolean anyFar = false;
        for (int i = 0; i < vectors.length; i++) {
            if (row != null && row.reaches(spanDistance(block, i))) {
                anyFar = true;
                continue;
            }
            CatenarySpan span = path.spans().get(i);
            error += panels(block, nodes, span, vectors[i], 0, span.horizontalLengthMetres(), tolerance);
        }
        block.accumulate(nodes);
        error += rounding(nodes.nearest);
        boolean startFar = row != null && row.reaches(tailDistance(row, true));
        boolean finishFar = row != null && row.reaches(tailDistance(row, false));
        addTails(block, !startFar, !finishFar);
        return anyFar || startFar || finishFar ? error + addFar(block, row, nodes, tolerance, startFar, finishFar) : error;
    }

    /** Far spans and tails: summed at the nodes of the row, and interpolated to its points. */
    private double addFar(PointBlock block, RowInterpolation row, SourceNodes nodes, double tolerance, boolean startFar, boolean finishFar) {
        PointBlock far = row.nodes;
        far.clearSums();
        nodes.clear();
        double error = 0;
        double size = 0;
        for (int i = 0; i < vectors.length; i++) {
            double distance = spanDistance(block, i);
            if (row.reaches(distance)) {
                CatenarySpan span = wire.path().spans().get(i);
                double length = span.horizontalLengthMetres();
                error += panels(far, nodes, span, vectors[i], 0, length, tolerance);
                size += Math.min(length / (distance * distance), 2 / distance) * row.error(distance);
            }
        }
        far.accumulate(nodes);
        addTails(far, startFar, finishFar);
        if (startFar) {
            size += row.error(tailDistance(row, true)) / tailDistance(row, true);
        }
        if (finishFar) {
            size += row.error(tailDistance(row, false)) / tailDistance(row, false);
        }
        row.spread(block);
        // interpolation passes errors at the nodes on, magnified by its Lebesgue constant, about 3 for these numbers of nodes
        return 3 * (error + rounding(nodes.nearest)) + size;
    }

    private void addTails(PointBlock block, boolean start, boolean finish) {
        WirePath path = wire.path();
        if (start && path.start() == WireEnd.CONTINUES) {
            SpanVectors v = vectors[0];
            tail(block, v.x0, v.y0, v.z0, -v.tx, -v.ty, -1);
        }
        if (finish && path.finish() == WireEnd.CONTINUES) {
            SpanVectors v = vectors[vectors.length - 1];
            tail(block, path.last().x(), path.last().y(), path.last().z(), v.tx, v.ty, 1);
        }
    }

    /** Lower bound of the distance of a span to any point of a row, whose first and last point are its ends. */
    private double spanDistance(PointBlock row, int i) {
        SpanVectors v = vectors[i];
        CatenarySpan span = wire.path().spans().get(i);
        double length = span.horizontalLengthMetres();
        int last = row.count - 1;
        double chord = segmentDistance((row.x[0] + row.x[last]) / 2, (row.y[0] + row.y[last]) / 2, (row.z[0] + row.z[last]) / 2,
            v.x0, v.y0, v.z0, v.x0 + length * v.tx, v.y0 + length * v.ty, v.z0 + length * v.tz);
        return chord - sags[i] - RowInterpolation.halfLength(row);
    }

    /** Lower bound of the distance of the wire's spans to any point of a row; not positive where the row may come near. */
    double distanceBelow(PointBlock row) {
        double least = Double.POSITIVE_INFINITY;
        for (int i = 0; i < vectors.length; i++) {
            least = Math.min(least, spanDistance(row, i));
        }
        return least;
    }

    /** Lower bound of the distance of the tail before the first or after the last attachment to any point of a row. */
    private double tailDistance(RowInterpolation row, boolean start) {
        PointBlock n = row.nodes;
        int last = n.count - 1;
        Position from = start ? wire.path().first() : wire.path().last();
        double x = (n.x[0] + n.x[last]) / 2 - from.x();
        double y = (n.y[0] + n.y[last]) / 2 - from.y();
        double z = (n.z[0] + n.z[last]) / 2 - from.z();
        SpanVectors v = start ? vectors[0] : vectors[vectors.length - 1];
        double sign = start ? -1 : 1;
        double along = Math.max(0, sign * (v.tx * x + v.ty * y));
        x -= sign * along * v.tx;
        y -= sign * along * v.ty;
        return Math.sqrt(x * x + y * y + z * z) - row.halfLength();
    }

    /**
     * Bound of the error that rounded coordinates make: a shift of the wire by some units in the last place of the greatest coordinate,
     * seen from the nearest point.
     */
    private double rounding(double nearest) {
        double shift = 64 * Math.ulp(greatestCoordinate);
        return 2 * shift / (nearest * nearest);
    }

    /**
     * Factor by which balanced currents may cancel at the block: min(1, (length / distance)^2), not above 1. With two balanced circuits
     * of low-reactance arrangement the resultant is that much smaller than the field of one wire.
     */
    double cancellation(PointBlock block, double length) {
        double ratio = length / farthest(block);
        return Math.min(1, ratio * ratio);
    }

    /** Upper bound of the distance of any point of the block to the wire: that of the first point, and the width of the block. */
    double farthest(PointBlock block) {
        return Math.max(distanceAbove(block.x[0], block.y[0], block.z[0]) + width(block), wire.radiusMetres());
    }

    /**
     * Upper bound of the distance of a point to the spans of the wire in metres, good to a few per cent for usual slopes: the distance to the
     * wire where the foot of the point on the nearest chord is. The distance to the chord itself would not do: beside the chord of a
     * sagged span it is far too small, and a tolerance taken from it far too wide.
     */
    double distanceAbove(double x, double y, double z) {
        double nearest = Double.POSITIVE_INFINITY;
        int best = 0;
        for (int i = 0; i < vectors.length; i++) {
            SpanVectors v = vectors[i];
            double length = wire.path().spans().get(i).horizontalLengthMetres();
            double distance = segmentDistance(x, y, z, v.x0, v.y0, v.z0, v.x0 + length * v.tx, v.y0 + length * v.ty, v.z0 + length * v.tz);
            if (distance < nearest) {
                nearest = distance;
                best = i;
            }
        }
        SpanVectors v = vectors[best];
        CatenarySpan span = wire.path().spans().get(best);
        double along = ((x - v.x0) * v.tx + (y - v.y0) * v.ty + (z - v.z0) * v.tz) / (v.tx * v.tx + v.ty * v.ty + v.tz * v.tz);
        double s = Math.max(0, Math.min(span.horizontalLengthMetres(), along));
        double depth = span.depthMetres(s);
        double dx = x - v.x0 - s * v.tx - depth * v.ex;
        double dy = y - v.y0 - s * v.ty - depth * v.ey;
        double dz = z - v.z0 - s * v.tz - depth * v.ez;
        return Math.sqrt(dx * dx + dy * dy + dz * dz);
    }

    static double width(PointBlock block) {
        double widest = 0;
        for (int i = 1; i < block.count; i++) {
            double dx = block.x[i] - block.x[0];
            double dy = block.y[i] - block.y[0];
            double dz = block.z[i] - block.z[0];
            widest = Math.max(widest, dx * dx + dy * dy + dz * dz);
        }
        return Math.sqrt(widest);
    }

    /** Cuts the part of a span into panels, adds their nodes, and returns the sum of the error bounds. */
    private double panels(PointBlock block, SourceNodes nodes, CatenarySpan span, SpanVectors v, double from, double to, double tolerance) {
        double fromDepth = span.depthMetres(from);
        double toDepth = span.depthMetres(to);
        double ax = v.x0 + from * v.tx + fromDepth * v.ex;
        double ay = v.y0 + from * v.ty + fromDepth * v.ey;
        double az = v.z0 + from * v.tz + fromDepth * v.ez;
        double bx = v.x0 + to * v.tx + toDepth * v.ex;
        double by = v.y0 + to * v.ty + toDepth * v.ey;
        double bz = v.z0 + to * v.tz + toDepth * v.ez;
        double length = Math.sqrt((bx - ax) * (bx - ax) + (by - ay) * (by - ay) + (bz - az) * (bz - az));
        double bulge = Math.abs(span.depthMetres((from + to) / 2) - (fromDepth + toDepth) / 2);
        block.measureReach(ax, ay, az, bx, by, bz);
        int nearest = nearest(block);
        double e = (block.reach[nearest] - 2 * bulge) / length;
        double x = block.x[nearest];
        double y = block.y[nearest];
        double z = block.z[nearest];
        double toA = Math.sqrt((x - ax) * (x - ax) + (y - ay) * (y - ay) + (z - az) * (z - az));
        double toB = block.reach[nearest] - toA;
        if (e > 1) {
            double rho = e + Math.sqrt((e - 1) * (e + 1));
            double scale = ERROR_FACTOR * length / (toA * toB);
            double allowed = Math.log(tolerance / scale);
            double rate = PATH_RATE * (to - from) / 2 / span.constantMetres();
            int n = nodesNeeded(allowed, rho, rate);
            if (n <= GaussRules.GREATEST) {
                refuseInside(block, ax, ay, az, bx, by, bz, length * Math.sqrt((e - 1) * (e + 1)));
                if (to - from == span.horizontalLengthMetres()) {
                    nodes.addAll(wholeSpan(span, v, n));
                } else {
                    nodes.add(span, v, from, to, n);
                }
                nodes.nearest = Math.min(nodes.nearest, length / 2 * Math.sqrt((e - 1) * (e + 1)));
                return scale * Math.exp(logError(n, rho, rate));
            }
        }
        double along = ((x - ax) * (bx - ax) + (y - ay) * (by - ay) + (z - az) * (bz - az)) / (length * length);
        double distance = segmentDistance(x, y, z, ax, ay, az, bx, by, bz);
        if (distance <= wire.radiusMetres() && length < wire.radiusMetres() / 2) {
            throw inside(block, nearest, distance);
        }
        double first = from + (to - from) * (along - NEAR_PANEL * distance / length);
        double second = from + (to - from) * (along + NEAR_PANEL * distance / length);
        double margin = LEAST_SHARE * (to - from);
        boolean cutFirst = first > from + margin && first < to - margin;
        // a point on the chord itself makes both cuts one
        boolean cutSecond = second > from + margin && second < to - margin && !(cutFirst && second - first < margin);
        if (!cutFirst && !cutSecond) {
            double middle = (from + to) / 2;
            return panels(block, nodes, span, v, from, middle, tolerance) + panels(block, nodes, span, v, middle, to, tolerance);
        }
        double error = 0;
        double begin = from;
        if (cutFirst) {
            error += panels(block, nodes, span, v, from, first, tolerance);
            begin = first;
        }
        if (cutSecond) {
            error += panels(block, nodes, span, v, begin, second, tolerance);
            begin = second;
        }
        return error + panels(block, nodes, span, v, begin, to, tolerance);
    }

    /** Nodes of the rule with n nodes on a whole span, computed once. Threads that come at the same time compute the same. */
    private SourceNodes wholeSpan(CatenarySpan span, SpanVectors v, int n) {
        int place = v.index * (GaussRules.GREATEST + 1) + n;
        SourceNodes nodes = wholeSpans.get(place);
        if (nodes == null) {
            nodes = new SourceNodes();
            nodes.add(span, v, 0, span.horizontalLengthMetres(), n);
            wholeSpans.set(place, nodes);
        }
        return nodes;
    }

    /** Least number of nodes whose error form stays below exp(allowed), or one more than the greatest rule has. */
    static int nodesNeeded(double allowed, double rho, double rate) {
        double logRho = Math.log(rho);
        int n = Math.max(GaussRules.LEAST, (int) Math.ceil(-allowed / (2 * logRho)));
        while (n <= GaussRules.GREATEST && logError(n, rho, logRho, rate) > allowed) {
            n++;
        }
        return Math.min(n, GaussRules.GREATEST + 1);
    }

    /** Logarithm of the least of exp(rate (r + 1/r) / 2) r^(-2n) over the ellipses r up to rho. */
    static double logError(int n, double rho, double rate) {
        return logError(n, rho, Math.log(rho), rate);
    }

    private static double logError(int n, double rho, double logRho, double rate) {
        if (rho * rate <= 4 * n) {
            return rate * (rho + 1 / rho) / 2 - 2 * n * logRho;
        }
        double r = 4 * n / rate;
        return rate * (r + 1 / r) / 2 - 2 * n * Math.log(r);
    }

    private static int nearest(PointBlock block) {
        int nearest = 0;
        for (int i = 1; i < block.count; i++) {
            if (block.reach[i] < block.reach[nearest]) {
                nearest = i;
            }
        }
        return nearest;
    }

    private void refuseInside(PointBlock block, double ax, double ay, double az, double bx, double by, double bz, double clearance) {
        if (clearance > 4 * wire.radiusMetres()) {
            return;
        }
        for (int i = 0; i < block.count; i++) {
            double distance = segmentDistance(block.x[i], block.y[i], block.z[i], ax, ay, az, bx, by, bz);
            if (distance <= wire.radiusMetres()) {
                throw inside(block, i, distance);
            }
        }
    }

    private SolverInputException inside(PointBlock block, int point, double distance) {
        return new SolverInputException(Reason.POINT_INSIDE_CONDUCTOR, "The field point at X " + block.x[point] + " m, Y " + block.y[point]
            + " m, Z " + block.z[point] + " m lies " + distance + " m from the axis of wire '" + wire.name() + "', whose radius is "
            + wire.radiusMetres() + " m; move the point out of the conductor");
    }

    private static double segmentDistance(double x, double y, double z, double ax, double ay, double az, double bx, double by, double bz) {
        double dx = bx - ax;
        double dy = by - ay;
        double dz = bz - az;
        double along = ((x - ax) * dx + (y - ay) * dy + (z - az) * dz) / (dx * dx + dy * dy + dz * dz);
        double t = Math.max(0, Math.min(1, along));
        double px = x - ax - t * dx;
        double py = y - ay - t * dy;
        double pz = z - az - t * dz;
        return Math.sqrt(px * px + py * py + pz * pz);
    }

    /**
     * Field of the straight, horizontal, semi-infinite filament from P along u: u x r (1 + a/R) / rho^2 with r from P to the point, R its
     * length, a = u . r and rho^2 = R^2 - a^2. For a &lt; 0 the form 1/(R (R - a)) does not cancel.
     *
     * @param sign +1 when the current flows outwards, -1 when it comes in
     */
    private void tail(PointBlock block, double px, double py, double pz, double ux, double uy, double sign) {
        for (int i = 0; i < block.count; i++) {
            double rx = block.x[i] - px;
            double ry = block.y[i] - py;
            double rz = block.z[i] - pz;
            double a = ux * rx + uy * ry;
            double cx = uy * rz;
            double cy = -ux * rz;
            double cz = ux * ry - uy * rx;
            double across = cx * cx + cy * cy + cz * cz;
            double r = Math.sqrt(a * a + across);
            if (a > 0 && across <= wire.radiusMetres() * wire.radiusMetres()) {
                throw inside(block, i, Math.sqrt(across));
            }
            double f = sign * (a > 0 ? (r + a) / (r * across) : 1 / (r * (r - a)));
            block.sumX[i] += cx * f;
            block.sumY[i] += cy * f;
            block.sumZ[i] += cz * f;
        }
    }
}
