/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.solver.field;

import java.util.List;
import org.apache.commons.math3.complex.Complex;
import spanfield.solver.PhysicalConstants;
import spanfield.solver.SolverInputException;
import spanfield.solver.SolverInputException.Reason;
import spanfield.solver.earth.EarthReturn;
import spanfield.solver.earth.HalfSpaceIntegral;
import spanfield.solver.geometry.CatenarySpan;
import spanfield.solver.geometry.Wire;
import spanfield.solver.geometry.WireEnd;
import spanfield.solver.geometry.WirePath;

/** Earth terms of all wires at a block of points: complex images, and the difference of the exact half-space to the image. */
final class EarthField {

    /** Real numbers for a wire: Re and Im of X, Y, Z. */
    static final int VALUES = 6;

    /** Least height sum in metres at which the half-space integral is evaluated where the ground lies below the earth plane. */
    static final double LEAST_HEIGHT_SUM = 0.5;

    /** Greatest number of points of a profile that is interpolated as a whole: its table of weights has that many columns. */
    private static final int GREATEST_WHOLE_ROW = 5000;

    /** Factor of kappa^2 zeta in the singular part of the difference, tesla metre per ampere: mu0/(2 pi) times 2 for the logarithm. */
    private static final double SINGULAR_PART = PhysicalConstants.MU0 / Math.PI;

    private final HalfSpaceIntegral halfSpace;
    private final EarthReturn earth;
    private final ImageField[] images;
    private final double[][] planLines;
    /** Along each mean line: where the wire starts and finishes, in metres from the line's point; infinite where it goes on. */
    private final double[][] extents;
    private final double[] heights;
    private final double distance;
    private final double relative;
    private final RowInterpolation whole;
    private final double[][] wholeImages;

    EarthField(List<Wire> wires, ObservationPoints points, EarthReturn earth, double relative) {
        this.earth = earth;
        this.relative = relative;
        this.halfSpace = new HalfSpaceIntegral(earth);
        double lowest = Double.POSITIVE_INFINITY;
        for (int i = 0; i < points.size(); i++) {
            lowest = Math.min(lowest, points.z(i));
        }
        double lowestSum = lowest + lowestWire(wires) - 2 * earth.planeElevationMetres();
        this.distance = lowestSum + 2 * earth.complexDepth().getReal();
        if (!(distance > 0)) {
            throw new SolverInputException(Reason.IMAGE_UNDEFINED, "A field point at elevation " + lowest + " m and a wire are together "
                + -lowestSum + " m below the earth plane at " + earth.planeElevationMetres() + " m: no complex image exists there. "
                + "Use another earth plane, or no earth model");
        }
        this.images = new ImageField[wires.size()];
        this.planLines = new double[wires.size()][];
        this.extents = new double[wires.size()][];
        this.heights = new double[wires.size()];
        for (int w = 0; w < images.length; w++) {
            images[w] = new ImageField(wires.get(w), earth, lowestSum, relative);
            planLines[w] = wires.get(w).path().meanPlanLine();
            extents[w] = extent(wires.get(w).path(), planLines[w]);
            heights[w] = wires.get(w).path().meanElevationMetres() - earth.planeElevationMetres();
        }
        this.whole = wholeRow(points);
        this.wholeImages = whole == null ? null : imagesAtNodes(whole);
    }

    /** One row of nodes for all points, where they are a profile that is short beside the distance of the images; null otherwise. */
    private RowInterpolation wholeRow(ObservationPoints points) {
        if (points.size() <= PointBlock.CAPACITY || points.size() > GREATEST_WHOLE_ROW) {
            return null;
        }
        PointBlock all = new PointBlock(points.size());
        all.load(points, 0, points.size());
        RowInterpolation row = imageRow(all);
        return row == null || row.error(distance) > relative ? null : row;
    }

    private RowInterpolation imageRow(PointBlock block) {
        return RowInterpolation.of(block, relative, Math.max(distance / RowInterpolation.halfLength(block), 1e-3));
    }

    private double[][] imagesAtNodes(RowInterpolation row) {
        double[][] values = new double[row.nodes.count][images.length * VALUES];
        for (int k = 0; k < values.length; k++) {
            evaluate(row.nodes.x[k], row.nodes.y[k], row.nodes.z[k], values[k]);
        }
        return values;
    }

    private static double[] extent(WirePath path, double[] line) {
        return new double[] {path.start() == WireEnd.CONTINUES ? Double.NEGATIVE_INFINITY : along(line, path.first().x(), path.first().y()),
            path.finish() == WireEnd.CONTINUES ? Double.POSITIVE_INFINITY : along(line, path.last().x(), path.last().y())};
    }

    /** Place of a point along a mean line, in metres from the line's point. */
    private static double along(double[] line, double x, double y) {
        return (x - line[0]) * line[2] + (y - line[1]) * line[3];
    }

    /**
     * Share of an endless wire's earth correction that a wire with ends has: the share that the part between the ends has in the Biot-Savart
     * field of the straight image, (sin t2 - sin t1)/2 seen from the point over the distance to the image. It is 1 for an endless wire, and
     * the shares of wires that are joined end to end add up to 1.
     */
    private double share(int wire, double x, double y, double lateral, double heightSum) {
        double[] extent = extents[wire];
        if (Double.isInfinite(extent[0]) && Double.isInfinite(extent[1])) {
            return 1;
        }
        Complex depth = earth.complexDepth().multiply(2);
        double distance = Math.hypot(lateral, depth.add(heightSum).abs());
        double t = along(planLines[wire], x, y);
        return (sine(extent[1] - t, distance) - sine(extent[0] - t, distance)) / 2;
    }

    private static double sine(double along, double distance) {
        return Double.isInfinite(along) ? Math.signum(along) : along / Math.hypot(along, distance);
    }

    private static double lowestWire(List<Wire> wires) {
        double lowest = Double.POSITIVE_INFINITY;
        for (Wire wire : wires) {
            for (CatenarySpan span : wire.path().spans()) {
                lowest = Math.min(lowest, span.lowestPoint().z());
            }
        }
        return lowest;
    }

    /**
     * Image field at the points of the block, [point][wire * 6 + value], in 1/m.
     *
     * @param error one element; receives the bound of the error of any wire's vector
     */
    double[][] images(PointBlock block, double[] error) {
        double quadrature = 0;
        for (ImageField image : images) {
            quadrature = Math.max(quadrature, image.error());
        }
        double[][] result = new double[block.count][images.length * VALUES];
        if (whole != null) {
            for (int i = 0; i < block.count; i++) {
                whole.interpolate(wholeImages, block.first + i, result[i]);
            }
            error[0] = 3 * quadrature + whole.error(distance) * 2 / distance;
            return result;
        }
        RowInterpolation row = imageRow(block);
        double interpolation = row == null ? Double.POSITIVE_INFINITY : row.error(distance);
        if (interpolation <= relative) {
            double[][] values = imagesAtNodes(row);
            for (int i = 0; i < block.count; i++) {
                row.interpolate(values, i, result[i]);
            }
            error[0] = 3 * quadrature + interpolation * 2 / distance;
            return result;
        }
        for (int i = 0; i < block.count; i++) {
            evaluate(block.x[i], block.y[i], block.z[i], result[i]);
        }
        error[0] = quadrature;
        return result;
    }

    /**
     * Exact half-space less complex image of a wire's mean straight line at the points of the block, in tesla per ampere: Re and Im of X, Y, Z,
     * [value][point].
     *
     * <p>The difference has a weak singularity where point and mirrored wire meet, kappa^2 zeta ln zeta; the row is interpolated where that
     * part is resolved to the wanted accuracy, and evaluated at every point elsewhere.
     *
     * @param rows   rows of nodes along the block
     * @param wanted accuracy in tesla per ampere
     * @param out    [6][at least the points of the block], overwritten
     * @return bound of the error of interpolation and of the half-space functions in tesla per ampere
     */
    double differences(int wire, PointBlock block, RowInterpolation.Choice rows, double wanted, double[][] out) {
        double[] scratch = new double[4];
        double gap = mirrorDistance(wire, block);
        double half = RowInterpolation.halfLength(block);
        double singular = SINGULAR_PART * Math.pow(earth.complexDepth().abs(), -2) * (gap + half);
        RowInterpolation row = gap > 0 ? rows.of(block, wanted / singular, gap / half) : null;
        if (row != null && singular * row.error(gap) <= wanted) {
            interpolateDifferences(wire, row, scratch, out);
            // errors at the nodes are passed on, magnified by the Lebesgue constant, about 3 for these numbers of nodes
            return singular * row.error(gap) + 3 * functionError(gap);
        }
        double nearest = Double.POSITIVE_INFINITY;
        for (int i = 0; i < block.count; i++) {
            difference(wire, block.x[i], block.y[i], block.z[i], scratch, out, i);
            nearest = Math.min(nearest, Math.hypot(lateral(wire, block.x[i], block.y[i]), heightSum(wire, block.z[i])));
        }
        return functionError(nearest);
    }

    /** Error of the half-space functions at a distance from the mirrored wire: |exact| is at most about mu0/(2 pi) times 2 / distance. */
    private static double functionError(double distance) {
        return HalfSpaceIntegral.relativeError() * PhysicalConstants.MU0 / Math.PI / distance;
    }

    private double heightSum(int wire, double z) {
        return Math.max(heights[wire] + z - earth.planeElevationMetres(), LEAST_HEIGHT_SUM);
    }

    private void interpolateDifferences(int wire, RowInterpolation row, double[] scratch, double[][] out) {
        double[][] values = new double[VALUES][row.nodes.count];
        for (int k = 0; k < row.nodes.count; k++) {
            difference(wire, row.nodes.x[k], row.nodes.y[k], row.nodes.z[k], scratch, values, k);
        }
        for (int v = 0; v < VALUES; v++) {
            java.util.Arrays.fill(out[v], 0);
            row.spread(values[v], out[v]);
        }
    }

    /** Lower bound of the distance of a block's points, a row, to the mirrored mean line of a wire; 0 where the height sum is not positive. */
    private double mirrorDistance(int wire, PointBlock block) {
        int last = block.count - 1;
        double x0 = lateral(wire, block.x[0], block.y[0]);
        double x1 = lateral(wire, block.x[last], block.y[last]);
        double across = x0 * x1 <= 0 ? 0 : Math.min(Math.abs(x0), Math.abs(x1));
        double up = heights[wire] - earth.planeElevationMetres() + Math.min(block.z[0], block.z[last]);
        return up < LEAST_HEIGHT_SUM ? 0 : Math.hypot(across, up);
    }

    /** Offset of a point to the right of a wire's mean line: right = (dy, -dx) for the direction (dx, dy). */
    private double lateral(int wire, double x, double y) {
        double[] line = planLines[wire];
        return (x - line[0]) * line[3] - (y - line[1]) * line[2];
    }

    private void evaluate(double x, double y, double z, double[] out) {
        for (int w = 0; w < images.length; w++) {
            images[w].addTo(x, y, z, out, w * VALUES);
        }
    }

    private void difference(int wire, double x, double y, double z, double[] scratch, double[][] out, int at) {
        double[] line = planLines[wire];
        double heightSum = heightSum(wire, z);
        double lateral = lateral(wire, x, y);
        halfSpace.difference(lateral, heightSum, scratch);
        double share = share(wire, x, y, lateral, heightSum);
        out[0][at] = share * scratch[0] * line[3];
        out[1][at] = share * scratch[1] * line[3];
        out[2][at] = -share * scratch[0] * line[2];
        out[3][at] = -share * scratch[1] * line[2];
        out[4][at] = share * scratch[2];
        out[5][at] = share * scratch[3];
    }
}
