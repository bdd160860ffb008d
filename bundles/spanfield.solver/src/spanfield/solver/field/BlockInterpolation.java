/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.solver.field;

/**
 * Interpolation of a smooth vector function over the box of a block of points on a tensor grid of Chebyshev nodes, in barycentric form
 * (Berrut and Trefethen, SIAM Review 46, 2004). Exact to about rho^-n with n nodes in a direction, where rho belongs to the ellipse that
 * touches the nearest singularity.
 */
final class BlockInterpolation {

    private final double[][] nodes = new double[3][];
    private final double[][] weights = new double[3][];

    /**
     * @param low      least coordinates of the box, X, Y, Z
     * @param high     greatest coordinates
     * @param distance distance of the nearest singularity from the box, in every direction
     * @param relative wanted error relative to the function's size
     */
    BlockInterpolation(double[] low, double[] high, double distance, double relative) {
        for (int axis = 0; axis < 3; axis++) {
            double half = (high[axis] - low[axis]) / 2;
            double middle = (high[axis] + low[axis]) / 2;
            int n = 1;
            if (half > 1e-9) {
                double y = distance / half;
                n = 1 + (int) Math.ceil(Math.log(4 / relative) / Math.log(y + Math.sqrt(1 + y * y)));
            }
            nodes[axis] = new double[n];
            weights[axis] = new double[n];
            for (int i = 0; i < n; i++) {
                double angle = Math.PI * (2 * i + 1) / (2 * n);
                nodes[axis][i] = n == 1 ? middle : middle + half * Math.cos(angle);
                weights[axis][i] = (i % 2 == 0 ? 1 : -1) * Math.sin(angle);
            }
        }
    }

    /** Number of nodes of the tensor grid. */
    int size() {
        return nodes[0].length * nodes[1].length * nodes[2].length;
    }

    /** Coordinate of a node. */
    double coordinate(int node, int axis) {
        int nz = nodes[2].length;
        int ny = nodes[1].length;
        return switch (axis) {
            case 0 -> nodes[0][node / (ny * nz)];
            case 1 -> nodes[1][node / nz % ny];
            default -> nodes[2][node % nz];
        };
    }

    /** Cardinal values of all nodes at a point: the interpolated value is their scalar product with the values at the nodes. */
    double[] cardinals(double x, double y, double z) {
        double[] cx = cardinals(0, x);
        double[] cy = cardinals(1, y);
        double[] cz = cardinals(2, z);
        double[] all = new double[size()];
        int at = 0;
        for (double a : cx) {
            for (double b : cy) {
                for (double c : cz) {
                    all[at++] = a * b * c;
                }
            }
        }
        return all;
    }

    private double[] cardinals(int axis, double t) {
        int n = nodes[axis].length;
        double[] values = new double[n];
        if (n == 1) {
            values[0] = 1;
            return values;
        }
        double sum = 0;
        for (int i = 0; i < n; i++) {
            double difference = t - nodes[axis][i];
            if (difference == 0) {
                java.util.Arrays.fill(values, 0);
                values[i] = 1;
                return values;
            }
            values[i] = weights[axis][i] / difference;
            sum += values[i];
        }
        for (int i = 0; i < n; i++) {
            values[i] /= sum;
        }
        return values;
    }
}
