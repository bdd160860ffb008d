/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.solver.field;

import java.util.List;
import spanfield.solver.SolverInputException;
import spanfield.solver.SolverInputException.Reason;
import spanfield.solver.earth.EarthReturn;
import spanfield.solver.earth.HalfSpaceIntegral;
import spanfield.solver.geometry.CatenarySpan;
import spanfield.solver.geometry.Wire;

/** Earth terms of all wires at a block of points: complex images, and the difference of the exact half-space to the image. */
final class EarthField {

    /** Real numbers for a wire: Re and Im of X, Y, Z. */
    static final int VALUES = 6;

    /** Least height sum in metres at which the half-space integral is evaluated where the ground lies below the earth plane. */
    static final double LEAST_HEIGHT_SUM = 0.5;

    private final HalfSpaceIntegral halfSpace;
    private final EarthReturn earth;
    private final ImageField[] images;
    private final double[][] planLines;
    private final double[] heights;
    private final double distance;
    private final double relative;

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
        this.heights = new double[wires.size()];
        for (int w = 0; w < images.length; w++) {
            images[w] = new ImageField(wires.get(w), earth, lowestSum, relative);
            planLines[w] = wires.get(w).path().meanPlanLine();
            heights[w] = wires.get(w).path().meanElevationMetres() - earth.planeElevationMetres();
        }
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
        double[] low = {block.x[0], block.y[0], block.z[0]};
        double[] high = low.clone();
        for (int i = 1; i < block.count; i++) {
            double[] p = {block.x[i], block.y[i], block.z[i]};
            for (int axis = 0; axis < 3; axis++) {
                low[axis] = Math.min(low[axis], p[axis]);
                high[axis] = Math.max(high[axis], p[axis]);
            }
        }
        BlockInterpolation grid = new BlockInterpolation(low, high, distance, relative);
        double quadrature = 0;
        for (ImageField image : images) {
            quadrature = Math.max(quadrature, image.error());
        }
        if (grid.size() + 1 < block.count) {
            double[][] interpolated = interpolate(block, grid);
            double deviation = deviation(block, interpolated);
            double allowed = 20 * relative * 2 / distance;
            if (deviation <= allowed) {
                error[0] = quadrature + 4 * deviation + relative * 2 / distance;
                return interpolated;
            }
        }
        double[][] direct = new double[block.count][images.length * VALUES];
        for (int i = 0; i < block.count; i++) {
            evaluate(block.x[i], block.y[i], block.z[i], direct[i]);
        }
        error[0] = quadrature;
        return direct;
    }

    private double[][] interpolate(PointBlock block, BlockInterpolation grid) {
        double[][] values = new double[grid.size()][images.length * VALUES];
        for (int node = 0; node < values.length; node++) {
            evaluate(grid.coordinate(node, 0), grid.coordinate(node, 1), grid.coordinate(node, 2), values[node]);
        }
        double[][] result = new double[block.count][images.length * VALUES];
        for (int i = 0; i < block.count; i++) {
            double[] cardinals = grid.cardinals(block.x[i], block.y[i], block.z[i]);
            double[] sum = result[i];
            for (int node = 0; node < values.length; node++) {
                double c = cardinals[node];
                double[] v = values[node];
                for (int j = 0; j < sum.length; j++) {
                    sum[j] += c * v[j];
                }
            }
        }
        return result;
    }

    /** Greatest component by which interpolation misses direct evaluation, at the first point: the ends are where it is worst. */
    private double deviation(PointBlock block, double[][] interpolated) {
        double[] direct = new double[images.length * VALUES];
        evaluate(block.x[0], block.y[0], block.z[0], direct);
        double greatest = 0;
        for (int j = 0; j < direct.length; j++) {
            greatest = Math.max(greatest, Math.abs(direct[j] - interpolated[0][j]));
        }
        return greatest;
    }

    private void evaluate(double x, double y, double z, double[] out) {
        for (int w = 0; w < images.length; w++) {
            images[w].addTo(x, y, z, out, w * VALUES);
        }
    }

    /**
     * Exact half-space less complex image of a wire's mean straight line at a point, in tesla per ampere.
     *
     * @param out receives Re and Im of X, Y, Z
     */
    void difference(int wire, double x, double y, double z, double[] scratch, double[] out) {
        double[] line = planLines[wire];
        // offset to the right of the wire's direction (dx, dy): right = (dy, -dx)
        double lateral = (x - line[0]) * line[3] - (y - line[1]) * line[2];
        double heightSum = Math.max(heights[wire] + z - earth.planeElevationMetres(), LEAST_HEIGHT_SUM);
        halfSpace.difference(lateral, heightSum, scratch);
        out[0] = scratch[0] * line[3];
        out[1] = scratch[1] * line[3];
        out[2] = -scratch[0] * line[2];
        out[3] = -scratch[1] * line[2];
        out[4] = scratch[2];
        out[5] = scratch[3];
    }
}
