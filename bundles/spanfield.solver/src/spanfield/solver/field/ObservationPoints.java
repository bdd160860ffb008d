/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.solver.field;

import spanfield.solver.SolverInputException;
import spanfield.solver.SolverInputException.Reason;
import spanfield.solver.geometry.Position;

/**
 * Points at which the field is wanted, stored as three arrays. Neighbours in the arrays should be neighbours in space: the solver works
 * on runs of consecutive points, and a run that is wide needs finer quadrature. Immutable.
 */
public final class ObservationPoints {

    private final double[] x;
    private final double[] y;
    private final double[] z;

    private ObservationPoints(double[] x, double[] y, double[] z) {
        this.x = x;
        this.y = y;
        this.z = z;
    }

    /**
     * Points from their coordinates in metres; the arrays are copied.
     *
     * @param x offsets, [point]
     * @param y stations, [point]
     * @param z elevations, [point]
     */
    public static ObservationPoints of(double[] x, double[] y, double[] z) {
        if (x.length != y.length || x.length != z.length) {
            throw new SolverInputException(Reason.SIZE_MISMATCH,
                "Coordinates of observation points differ in number: " + x.length + ", " + y.length + ", " + z.length);
        }
        for (int i = 0; i < x.length; i++) {
            new Position(x[i], y[i], z[i]);
        }
        return new ObservationPoints(x.clone(), y.clone(), z.clone());
    }

    /** Points from positions. */
    public static ObservationPoints of(Position... positions) {
        double[][] c = new double[3][positions.length];
        for (int i = 0; i < positions.length; i++) {
            c[0][i] = positions[i].x();
            c[1][i] = positions[i].y();
            c[2][i] = positions[i].z();
        }
        return new ObservationPoints(c[0], c[1], c[2]);
    }

    /** Evenly spaced points across the line at a station, at one elevation. */
    public static ObservationPoints lateral(double fromX, double toX, int count, double station, double elevation) {
        double[][] c = new double[3][count];
        for (int i = 0; i < count; i++) {
            c[0][i] = count == 1 ? fromX : fromX + (toX - fromX) * i / (count - 1);
            c[1][i] = station;
            c[2][i] = elevation;
        }
        return of(c[0], c[1], c[2]);
    }

    /** Number of points. */
    public int size() {
        return x.length;
    }

    /** Offset of a point in metres. */
    public double x(int point) {
        return x[point];
    }

    /** Station of a point in metres. */
    public double y(int point) {
        return y[point];
    }

    /** Elevation of a point in metres. */
    public double z(int point) {
        return z[point];
    }

    /** A point as a position. */
    public Position position(int point) {
        return new Position(x[point], y[point], z[point]);
    }

    /** Copies the coordinates of the points from {@code from} to {@code to} (exclusive) into the starts of three arrays. */
    void copy(int from, int to, double[] targetX, double[] targetY, double[] targetZ) {
        System.arraycopy(x, from, targetX, 0, to - from);
        System.arraycopy(y, from, targetY, 0, to - from);
        System.arraycopy(z, from, targetZ, 0, to - from);
    }
}
