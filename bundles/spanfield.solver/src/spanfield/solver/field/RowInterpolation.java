/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.solver.field;

/**
 * Interpolation of functions that are smooth over a row of points on Chebyshev nodes along the row, in barycentric form (Berrut and
 * Trefethen, SIAM Review 46, 2004). Sources that are far away in units of the row's length are evaluated at the nodes only. With n nodes
 * the error is about rho^-n of the function's size, where rho belongs to the ellipse about the row that touches the nearest singularity.
 */
final class RowInterpolation {

    /** Sources farther away than this many half-lengths of the row are interpolated. */
    static final double FAR = 6;

    /** Part of the way to the singularity at which the growth of a function is taken. */
    private static final double SHORT_OF = 0.85;

    /** Points that are this close to the straight line, in units of the row's length, count as a row. */
    private static final double STRAIGHTNESS = 1e-12;

    /** Share of a block's points above which nodes do not pay. */
    private static final double WORTHWHILE = 0.5;

    /** The nodes, as points at which fields can be summed. */
    final PointBlock nodes = new PointBlock();
    private final double[][] cardinals;
    private final double half;

    private RowInterpolation(PointBlock block, int n, double half) {
        this.half = half;
        int last = block.count - 1;
        double[] position = new double[n];
        double[] weight = new double[n];
        for (int k = 0; k < n; k++) {
            double angle = Math.PI * (2 * k + 1) / (2 * n);
            position[k] = Math.cos(angle);
            weight[k] = (k % 2 == 0 ? 1 : -1) * Math.sin(angle);
            double share = (1 + position[k]) / 2;
            nodes.x[k] = block.x[0] + share * (block.x[last] - block.x[0]);
            nodes.y[k] = block.y[0] + share * (block.y[last] - block.y[0]);
            nodes.z[k] = block.z[0] + share * (block.z[last] - block.z[0]);
        }
        nodes.count = n;
        cardinals = new double[n][block.count];
        for (int i = 0; i < block.count; i++) {
            fillCardinals(i, parameter(block, i), position, weight);
        }
    }

    /**
     * The interpolation for a block, or null where the points are no straight row or too few.
     *
     * @param relative wanted error of the sources relative to their size
     * @param distance least distance of the sources from the row, in half-lengths of the row
     */
    static RowInterpolation of(PointBlock block, double relative, double distance) {
        int n = 2 + (int) Math.ceil(Math.log(4 / (1 - SHORT_OF) / relative) / Math.log(ellipse(SHORT_OF * distance)));
        if (n > WORTHWHILE * block.count || n > PointBlock.CAPACITY) {
            return null;
        }
        int last = block.count - 1;
        double length = Math.sqrt(square(block.x[last] - block.x[0], block.y[last] - block.y[0], block.z[last] - block.z[0]));
        if (!(length > 0)) {
            return null;
        }
        for (int i = 1; i < last; i++) {
            double t = parameter(block, i);
            double share = (1 + t) / 2;
            double off = square(block.x[i] - block.x[0] - share * (block.x[last] - block.x[0]),
                block.y[i] - block.y[0] - share * (block.y[last] - block.y[0]), block.z[i] - block.z[0] - share * (block.z[last] - block.z[0]));
            if (!(Math.abs(t) <= 1) || off > STRAIGHTNESS * length * length) {
                return null;
            }
        }
        return new RowInterpolation(block, n, length / 2);
    }

    private static double square(double x, double y, double z) {
        return x * x + y * y + z * z;
    }

    /** Place of a point along the row: -1 at the first, 1 at the last. */
    private static double parameter(PointBlock block, int i) {
        int last = block.count - 1;
        double dx = block.x[last] - block.x[0];
        double dy = block.y[last] - block.y[0];
        double dz = block.z[last] - block.z[0];
        double along = (block.x[i] - block.x[0]) * dx + (block.y[i] - block.y[0]) * dy + (block.z[i] - block.z[0]) * dz;
        return 2 * along / square(dx, dy, dz) - 1;
    }

    private void fillCardinals(int point, double t, double[] position, double[] weight) {
        double sum = 0;
        for (int k = 0; k < position.length; k++) {
            double difference = t - position[k];
            if (difference == 0) {
                for (double[] row : cardinals) {
                    row[point] = 0;
                }
                cardinals[k][point] = 1;
                return;
            }
            cardinals[k][point] = weight[k] / difference;
            sum += cardinals[k][point];
        }
        for (double[] row : cardinals) {
            row[point] /= sum;
        }
    }

    /** Half-length of a block in metres, from its first point to its last. */
    static double halfLength(PointBlock block) {
        int last = block.count - 1;
        return Math.sqrt(square(block.x[last] - block.x[0], block.y[last] - block.y[0], block.z[last] - block.z[0])) / 2;
    }

    /** Half-length of the row in metres. */
    double halfLength() {
        return half;
    }

    /**
     * Relative error of a function whose nearest singularity is at a distance from every point of the row: 4 M rho^-n over an ellipse that
     * stays short of the singularity, where the function has grown to M times its size on the row.
     */
    double error(double distance) {
        return 4 / (1 - SHORT_OF) * Math.pow(ellipse(SHORT_OF * distance / half), -nodes.count);
    }

    private static double ellipse(double y) {
        return y + Math.sqrt(1 + y * y);
    }

    /** Adds the interpolated sums at the nodes to the sums of the block. */
    void spread(PointBlock block) {
        for (int k = 0; k < nodes.count; k++) {
            add(cardinals[k], nodes.sumX[k], block.sumX, block.count);
            add(cardinals[k], nodes.sumY[k], block.sumY, block.count);
            add(cardinals[k], nodes.sumZ[k], block.sumZ, block.count);
        }
    }

    private static void add(double[] cardinal, double value, double[] target, int count) {
        for (int i = 0; i < count; i++) {
            target[i] += cardinal[i] * value;
        }
    }

    /** Interpolates values at the nodes, [node][value], at a point; the result is added to {@code target}. */
    void interpolate(double[][] values, int point, double[] target) {
        for (int k = 0; k < nodes.count; k++) {
            double c = cardinals[k][point];
            double[] row = values[k];
            for (int j = 0; j < target.length; j++) {
                target[j] += c * row[j];
            }
        }
    }
}
