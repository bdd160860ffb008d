/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.solver.field;

/**
 * A run of neighbouring observation points and the field that is being summed at them, as arrays: the inner loops run over the points,
 * so that the compiler can use vector instructions. A worker's scratch, not shared.
 *
 * <p>Sums are in 1/m: without the factor mu0/(4 pi).
 */
final class PointBlock {

    /** Points in a block: long enough for vector loops, short enough to stay in the first-level cache and near each other. */
    static final int CAPACITY = 64;

    final double[] x;
    final double[] y;
    final double[] z;
    final double[] sumX;
    final double[] sumY;
    final double[] sumZ;
    private final double[] cubeA;
    private final double[] cubeB;
    private final double[] inverse;
    /** Scratch of the panel test: sum of the distances to both ends of a panel, [point]. */
    final double[] reach;
    int first;
    int count;

    PointBlock() {
        this(CAPACITY);
    }

    PointBlock(int capacity) {
        x = new double[capacity];
        y = new double[capacity];
        z = new double[capacity];
        sumX = new double[capacity];
        sumY = new double[capacity];
        sumZ = new double[capacity];
        reach = new double[capacity];
        cubeA = new double[capacity];
        cubeB = new double[capacity];
        inverse = new double[capacity];
    }

    void load(ObservationPoints points, int from, int to) {
        first = from;
        count = to - from;
        points.copy(from, to, x, y, z);
    }

    void clearSums() {
        java.util.Arrays.fill(sumX, 0, count, 0);
        java.util.Arrays.fill(sumY, 0, count, 0);
        java.util.Arrays.fill(sumZ, 0, count, 0);
    }

    /**
     * Adds dl x R / |R|^3 of every node at every point, R from node to point.
     *
     * <p>Two nodes a pass, in loops that each write one array: the compiler cannot know that the sums are different arrays, and leaves a loop
     * that writes several of them without vector instructions. The cubes of both distances share one division, the slowest operation here:
     * 1/a = b/(a b).
     */
    void accumulate(SourceNodes s) {
        int k = 0;
        for (; k + 1 < s.count; k += 2) {
            int l = k + 1;
            cubes(x, y, z, cubeA, count, s.x[k], s.y[k], s.z[k]);
            cubes(x, y, z, cubeB, count, s.x[l], s.y[l], s.z[l]);
            inverses(cubeA, cubeB, inverse, count);
            addPair(y, z, cubeA, cubeB, inverse, sumX, count, s.y[k], s.z[k], s.dy[k], s.dz[k], s.y[l], s.z[l], s.dy[l], s.dz[l]);
            addPair(z, x, cubeA, cubeB, inverse, sumY, count, s.z[k], s.x[k], s.dz[k], s.dx[k], s.z[l], s.x[l], s.dz[l], s.dx[l]);
            addPair(x, y, cubeA, cubeB, inverse, sumZ, count, s.x[k], s.y[k], s.dx[k], s.dy[k], s.x[l], s.y[l], s.dx[l], s.dy[l]);
        }
        if (k < s.count) {
            addOne(s, k);
        }
    }

    /** |R|^3 from a node to every point. */
    private static void cubes(double[] x, double[] y, double[] z, double[] cube, int count, double nx, double ny, double nz) {
        for (int i = 0; i < count; i++) {
            double rx = x[i] - nx;
            double ry = y[i] - ny;
            double rz = z[i] - nz;
            double square = rx * rx + ry * ry + rz * rz;
            cube[i] = square * Math.sqrt(square);
        }
    }

    private static void inverses(double[] a, double[] b, double[] inverse, int count) {
        for (int i = 0; i < count; i++) {
            inverse[i] = 1 / (a[i] * b[i]);
        }
    }

    /** One component of the cross products of nodes a and b: (du rv - dv ru) / |R|^3, where u and v follow the component cyclically. */
    private static void addPair(double[] u, double[] v, double[] cubeA, double[] cubeB, double[] inverse, double[] sum, int count,
        double au, double av, double adu, double adv, double bu, double bv, double bdu, double bdv) {
        for (int i = 0; i < count; i++) {
            sum[i] += inverse[i] * ((adu * (v[i] - av) - adv * (u[i] - au)) * cubeB[i] + (bdu * (v[i] - bv) - bdv * (u[i] - bu)) * cubeA[i]);
        }
    }

    private void addOne(SourceNodes s, int k) {
        for (int i = 0; i < count; i++) {
            double rx = x[i] - s.x[k];
            double ry = y[i] - s.y[k];
            double rz = z[i] - s.z[k];
            double square = rx * rx + ry * ry + rz * rz;
            double f = 1 / (square * Math.sqrt(square));
            sumX[i] += (s.dy[k] * rz - s.dz[k] * ry) * f;
            sumY[i] += (s.dz[k] * rx - s.dx[k] * rz) * f;
            sumZ[i] += (s.dx[k] * ry - s.dy[k] * rx) * f;
        }
    }

    /** Fills {@link #reach} with |r - A| + |r - B| for the ends of a panel. */
    void measureReach(double ax, double ay, double az, double bx, double by, double bz) {
        measureReach(x, y, z, reach, count, ax, ay, az, bx, by, bz);
    }

    private static void measureReach(double[] x, double[] y, double[] z, double[] reach, int count,
        double ax, double ay, double az, double bx, double by, double bz) {
        for (int i = 0; i < count; i++) {
            double px = x[i] - ax;
            double py = y[i] - ay;
            double pz = z[i] - az;
            double qx = x[i] - bx;
            double qy = y[i] - by;
            double qz = z[i] - bz;
            reach[i] = Math.sqrt(px * px + py * py + pz * pz) + Math.sqrt(qx * qx + qy * qy + qz * qz);
        }
    }
}
