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

    final double[] x = new double[CAPACITY];
    final double[] y = new double[CAPACITY];
    final double[] z = new double[CAPACITY];
    final double[] sumX = new double[CAPACITY];
    final double[] sumY = new double[CAPACITY];
    final double[] sumZ = new double[CAPACITY];
    /** Scratch of the panel test: sum of the distances to both ends of a panel, [point]. */
    final double[] reach = new double[CAPACITY];
    int first;
    int count;

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

    /** Adds dl x R / |R|^3 of every node at every point, R from node to point. Two nodes a pass save loads and stores of the sums. */
    void accumulate(SourceNodes nodes) {
        int i = 0;
        for (; i + 1 < nodes.count; i += 2) {
            accumulatePair(nodes, i, i + 1);
        }
        if (i < nodes.count) {
            accumulateOne(nodes, i);
        }
    }

    private void accumulateOne(SourceNodes s, int k) {
        accumulate1(x, y, z, sumX, sumY, sumZ, count, s.x[k], s.y[k], s.z[k], s.dx[k], s.dy[k], s.dz[k]);
    }

    private void accumulatePair(SourceNodes s, int k, int l) {
        accumulate2(x, y, z, sumX, sumY, sumZ, count, s.x[k], s.y[k], s.z[k], s.dx[k], s.dy[k], s.dz[k],
            s.x[l], s.y[l], s.z[l], s.dx[l], s.dy[l], s.dz[l]);
    }

    private static void accumulate1(double[] x, double[] y, double[] z, double[] sumX, double[] sumY, double[] sumZ, int count,
        double nx, double ny, double nz, double dx, double dy, double dz) {
        for (int i = 0; i < count; i++) {
            double rx = x[i] - nx;
            double ry = y[i] - ny;
            double rz = z[i] - nz;
            double square = rx * rx + ry * ry + rz * rz;
            double f = 1 / (square * Math.sqrt(square));
            sumX[i] += (dy * rz - dz * ry) * f;
            sumY[i] += (dz * rx - dx * rz) * f;
            sumZ[i] += (dx * ry - dy * rx) * f;
        }
    }

    private static void accumulate2(double[] x, double[] y, double[] z, double[] sumX, double[] sumY, double[] sumZ, int count,
        double nx, double ny, double nz, double dx, double dy, double dz, double mx, double my, double mz, double ex, double ey, double ez) {
        for (int i = 0; i < count; i++) {
            double rx = x[i] - nx;
            double ry = y[i] - ny;
            double rz = z[i] - nz;
            double qx = x[i] - mx;
            double qy = y[i] - my;
            double qz = z[i] - mz;
            double square = rx * rx + ry * ry + rz * rz;
            double other = qx * qx + qy * qy + qz * qz;
            double f = 1 / (square * Math.sqrt(square));
            double g = 1 / (other * Math.sqrt(other));
            sumX[i] += (dy * rz - dz * ry) * f + (ey * qz - ez * qy) * g;
            sumY[i] += (dz * rx - dx * rz) * f + (ez * qx - ex * qz) * g;
            sumZ[i] += (dx * ry - dy * rx) * f + (ex * qy - ey * qx) * g;
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
