/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.solver.field;

import java.util.Arrays;

/**
 * Interpolation of functions that are smooth over a row of points on Chebyshev nodes along the row, in barycentric form (Berrut and
 * Trefethen, SIAM Review 46, 2004). Sources that are far away in units of the row's length are evaluated at the nodes only. With n nodes
 * the error is about rho^-n of the function's size, where rho belongs to the ellipse about the row that touches the nearest singularity.
 */
final class RowInterpolation {

    /** Sources farther away than this many half-lengths of the row are interpolated in any case. */
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
    private final double reach;

    private RowInterpolation(PointBlock block, int n, double half, double reach) {
        this.half = half;
        this.reach = reach;
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
        double[] t = new double[block.count];
        for (int i = 0; i < t.length; i++) {
            t[i] = parameter(block, i);
        }
        fillCardinals(t, position, weight);
    }

    /**
     * The interpolation for a block, or null where the points are no straight row or too few.
     *
     * @param relative wanted error of the sources relative to their size
     * @param distance least distance of the sources from the row, in half-lengths of the row
     */
    static RowInterpolation of(PointBlock block, double relative, double distance) {
        int n = nodesNeeded(relative, distance);
        return n > WORTHWHILE * block.count ? null : ofNodes(block, n, distance);
    }

    private static RowInterpolation ofNodes(PointBlock block, int n, double distance) {
        if (n > PointBlock.CAPACITY) {
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
        return new RowInterpolation(block, n, length / 2, distance * length / 2);
    }

    /** Rows for one block by their number of nodes, in steps of {@value #STEP}, so that sources share them. A worker's scratch. */
    static final class Choice {

        private static final int STEP = 3;

        private final RowInterpolation[] rows = new RowInterpolation[PointBlock.CAPACITY / STEP + 1];
        private boolean none;

        /** As {@link RowInterpolation#of}, with at least the nodes needed. Always for the same block. */
        RowInterpolation of(PointBlock block, double relative, double distance) {
            int n = nodesNeeded(relative, distance);
            int place = (n + STEP - 1) / STEP;
            if (none || place * STEP > WORTHWHILE * block.count) {
                return null;
            }
            if (rows[place] == null) {
                rows[place] = ofNodes(block, place * STEP, distance);
                none = rows[place] == null;
            }
            return rows[place];
        }
    }

    private static int nodesNeeded(double relative, double distance) {
        double n = 2 + Math.ceil(Math.log(4 / (1 - SHORT_OF) / relative) / Math.log(ellipse(SHORT_OF * distance)));
        return (int) Math.max(2, Math.min(n, 1e6));
    }

    /**
     * The interpolation for a block that reaches as many of some sources as it can: those of which the distances are given, and everything
     * beyond {@value #FAR} half-lengths. Null where the points are no straight row or too few.
     *
     * @param distances least distance of each source in metres, any sign
     */
    static RowInterpolation reaching(PointBlock block, double relative, double[] distances) {
        double half = halfLength(block);
        double least = FAR;
        for (double distance : distances) {
            double y = distance / half;
            if (y > 0 && y < least && nodesNeeded(relative, y) <= WORTHWHILE * block.count) {
                least = y;
            }
        }
        return of(block, relative, least);
    }

    /** Whether sources at a distance in metres from every point are interpolated to the wanted error. */
    boolean reaches(double distance) {
        return distance >= reach;
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

    /** Cardinal functions in barycentric form, by loops over the points. */
    private void fillCardinals(double[] t, double[] position, double[] weight) {
        double[] sum = new double[t.length];
        for (int k = 0; k < position.length; k++) {
            double[] row = cardinals[k];
            double p = position[k];
            double w = weight[k];
            for (int i = 0; i < t.length; i++) {
                row[i] = w / (t[i] - p);
            }
            for (int i = 0; i < t.length; i++) {
                sum[i] += row[i];
            }
        }
        for (double[] row : cardinals) {
            for (int i = 0; i < t.length; i++) {
                row[i] /= sum[i];
            }
        }
        for (int i = 0; i < t.length; i++) {
            if (!Double.isFinite(sum[i])) {
                for (int k = 0; k < position.length; k++) {
                    cardinals[k][i] = t[i] == position[k] ? 1 : 0;
                }
            }
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
        spread(Arrays.copyOf(nodes.sumX, nodes.count), block.sumX);
        spread(Arrays.copyOf(nodes.sumY, nodes.count), block.sumY);
        spread(Arrays.copyOf(nodes.sumZ, nodes.count), block.sumZ);
    }

    /** One sum a loop, so that the compiler uses vector instructions; see PointBlock.accumulate. */
    private static void addPair(double[] first, double[] second, double a, double b, double[] sum, int count) {
        for (int i = 0; i < count; i++) {
            sum[i] += first[i] * a + second[i] * b;
        }
    }

    /** Adds values at the nodes, interpolated to the points, to {@code target}, [point]. */
    void spread(double[] values, double[] target) {
        int count = cardinals[0].length;
        int k = 0;
        for (; k + 1 < values.length; k += 2) {
            addPair(cardinals[k], cardinals[k + 1], values[k], values[k + 1], target, count);
        }
        if (k < values.length) {
            addPair(cardinals[k], cardinals[k], values[k], 0, target, count);
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
