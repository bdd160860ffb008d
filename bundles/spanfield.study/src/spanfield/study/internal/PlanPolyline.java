/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.study.internal;

import java.util.Arrays;

/**
 * A polyline in plan whose first and last leg go on without end, with station and offset along it. Offsets are positive to the right,
 * seen along the legs. Immutable.
 */
public final class PlanPolyline {

    private final double[] x;
    private final double[] y;
    private final double[] station;
    private final double[] ux;
    private final double[] uy;

    /** Vertices [0, legs] with the first vertex a point of the first leg, and unit directions of the legs. */
    private PlanPolyline(double[] x, double[] y, double[] station, double[] ux, double[] uy) {
        this.x = x;
        this.y = y;
        this.station = station;
        this.ux = ux;
        this.uy = uy;
    }

    /** The straight line X = 0 with Y = station. */
    public static PlanPolyline straight() {
        return ofBends(new double[0], new double[0]);
    }

    /**
     * The line that starts as X = 0, Y = station, and changes its direction at bends.
     *
     * @param bendStations stations of the bends in metres, rising
     * @param deflections  change of direction at each bend in radians, positive to the right
     */
    public static PlanPolyline ofBends(double[] bendStations, double[] deflections) {
        int legs = bendStations.length + 1;
        double[][] a = new double[5][legs];
        double bearing = 0;
        a[4][0] = 1;
        for (int i = 1; i < legs; i++) {
            double from = i == 1 ? 0 : bendStations[i - 2];
            double along = bendStations[i - 1] - from;
            a[0][i] = a[0][i - 1] + along * a[3][i - 1];
            a[1][i] = a[1][i - 1] + along * a[4][i - 1];
            a[2][i] = bendStations[i - 1];
            bearing += deflections[i - 1];
            a[3][i] = Math.sin(bearing);
            a[4][i] = Math.cos(bearing);
        }
        return new PlanPolyline(a[0], a[1], a[2], a[3], a[4]);
    }

    /**
     * The line through vertices; its station is 0 at the first of them.
     *
     * @param px X of the vertices in metres, at least two, no two neighbours at the same place
     * @param py Y of the vertices in metres
     */
    public static PlanPolyline through(double[] px, double[] py) {
        int legs = px.length - 1;
        double[] ux = new double[legs];
        double[] uy = new double[legs];
        double[] station = new double[legs];
        for (int i = 0; i < legs; i++) {
            double length = Math.hypot(px[i + 1] - px[i], py[i + 1] - py[i]);
            ux[i] = (px[i + 1] - px[i]) / length;
            uy[i] = (py[i + 1] - py[i]) / length;
            if (i + 1 < legs) {
                station[i + 1] = station[i] + length;
            }
        }
        return new PlanPolyline(Arrays.copyOf(px, legs), Arrays.copyOf(py, legs), station, ux, uy);
    }

    /** Leg that holds a station; the later one at a vertex. */
    private int leg(double s) {
        int leg = 0;
        while (leg + 1 < station.length && s >= station[leg + 1]) {
            leg++;
        }
        return leg;
    }

    /**
     * Unit direction ahead at a station, components X, Y: that of the leg, at a vertex along the bisector of the two legs. The offset is laid
     * off at right angles to it.
     */
    public double[] direction(double s) {
        int leg = leg(s);
        if (leg > 0 && s == station[leg]) {
            double dx = ux[leg - 1] + ux[leg];
            double dy = uy[leg - 1] + uy[leg];
            double length = Math.hypot(dx, dy);
            return new double[] {dx / length, dy / length};
        }
        return new double[] {ux[leg], uy[leg]};
    }

    /** Plan coordinates X, Y of a station and offset in metres. */
    public double[] point(double s, double offset) {
        int leg = leg(s);
        double along = s - station[leg];
        double[] d = direction(s);
        return new double[] {x[leg] + along * ux[leg] + offset * d[1], y[leg] + along * uy[leg] - offset * d[0]};
    }

    /**
     * Station and offset of a plan point: those of the nearest point of the line, the offset being the distance to it with the sign of
     * the side. On the outer side of a bend every point of the wedge between the two normals has the station of the bend.
     */
    public double[] locate(double px, double py) {
        double best = Double.POSITIVE_INFINITY;
        double[] result = new double[2];
        for (int i = 0; i < station.length; i++) {
            double rx = px - x[i];
            double ry = py - y[i];
            double along = rx * ux[i] + ry * uy[i];
            double across = rx * uy[i] - ry * ux[i];
            boolean before = i > 0 && along < 0;
            boolean beyond = i + 1 < station.length && along > station[i + 1] - station[i];
            double clamped = before ? 0 : beyond ? station[i + 1] - station[i] : along;
            double distance = Math.hypot(across, along - clamped);
            if (distance < best) {
                best = distance;
                result[0] = station[i] + clamped;
                result[1] = before || beyond ? Math.copySign(distance, across) : across;
            }
        }
        return result;
    }

    /** Number of legs. */
    public int legCount() {
        return station.length;
    }
}
