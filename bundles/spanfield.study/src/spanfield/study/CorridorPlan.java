/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.study;

import java.util.Arrays;
import java.util.Comparator;
import java.util.List;
import java.util.function.ToDoubleFunction;
import spanfield.model.Corridor;
import spanfield.study.internal.PlanPolyline;

/**
 * A corridor in plan and its ground: stations and offsets, plan coordinates, ground elevations, and the edges of the right-of-way.
 * Immutable.
 *
 * <p>Axes: plan X, Y and elevation Z. The centreline starts as X = 0, Y = station, so that on a straight corridor X is the offset and Y the
 * station exactly; it turns at bends. Offsets are laid off at right angles to the centreline, at a bend along the bisector of the two
 * legs; they are plain distances there, not stretched to the corner of the two parallels.
 *
 * <p>Plan points are given the station of the nearest point of the centreline. On the inner side of a bend the two legs compete; where the
 * centreline rises or falls, the ground has a small step along the bisector there.
 */
public final class CorridorPlan {

    private final PlanPolyline centreline;
    private final double[][] elevations;
    private final double[][] section;
    private final double crossSlope;
    private final double[][] edges;

    /**
     * A station and an offset.
     *
     * @param stationMetres station in metres
     * @param offsetMetres  offset in metres, positive to the right
     */
    public record CorridorPosition(double stationMetres, double offsetMetres) {
    }

    /**
     * A point in plan.
     *
     * @param x plan coordinate X in metres
     * @param y plan coordinate Y in metres
     */
    public record PlanPoint(double x, double y) {
    }

    /**
     * Offsets of the edges of the right-of-way.
     *
     * @param leftOffsetMetres  left edge in metres
     * @param rightOffsetMetres right edge in metres, greater than the left
     */
    public record Edges(double leftOffsetMetres, double rightOffsetMetres) {
    }

    /**
     * A plan from tables; each table is copied.
     *
     * @param bendStations stations of the bends in metres, rising
     * @param deflections  deflection of each bend in radians, positive to the right
     * @param elevations   ground along the centreline: stations in metres, rising, and elevations in metres; none: elevation 0
     * @param section      cross-section of the ground: offsets in metres, rising, and elevations relative to the centreline in metres; none:
     *                     the cross slope
     * @param crossSlope   rise of the ground per metre of offset to the right, where there is no cross-section
     * @param edges        stations in metres, rising, left and right edge offsets in metres; at least one
     */
    public CorridorPlan(double[] bendStations, double[] deflections, double[][] elevations, double[][] section, double crossSlope,
        double[][] edges) {
        this.centreline = PlanPolyline.ofBends(bendStations, deflections);
        this.elevations = copy(elevations);
        this.section = copy(section);
        this.crossSlope = crossSlope;
        this.edges = copy(edges);
    }

    /** The plan of a modelled corridor with at least one edge point. Points may be in any order. */
    public static CorridorPlan of(Corridor corridor) {
        double[][] bends = table(corridor.getBends(), b -> b.getStationMetres(), b -> Math.toRadians(b.getDeflectionDegrees()));
        double[][] elevations = table(corridor.getCentrelineElevations(), e -> e.getStationMetres(), e -> e.getElevationMetres());
        double[][] section = table(corridor.getGroundPoints(), g -> g.getOffsetMetres(), g -> g.getElevationMetres());
        double[][] edges = table(corridor.getEdges(), e -> e.getStationMetres(), e -> e.getLeftOffsetMetres(), e -> e.getRightOffsetMetres());
        return new CorridorPlan(bends[0], bends[1], elevations, section, corridor.getCrossSlope(), edges);
    }

    @SafeVarargs
    private static <T> double[][] table(List<T> rows, ToDoubleFunction<T>... columns) {
        List<T> sorted = rows.stream().sorted(Comparator.comparingDouble(columns[0])).toList();
        double[][] result = new double[columns.length][];
        for (int c = 0; c < columns.length; c++) {
            result[c] = sorted.stream().mapToDouble(columns[c]).toArray();
        }
        return result;
    }

    private static double[][] copy(double[][] table) {
        return Arrays.stream(table).map(double[]::clone).toArray(double[][]::new);
    }

    /** Plan coordinates of a station and offset in metres. */
    public PlanPoint planPoint(double stationMetres, double offsetMetres) {
        double[] p = centreline.point(stationMetres, offsetMetres);
        return new PlanPoint(p[0], p[1]);
    }

    /** Station and offset of plan coordinates: those of the nearest point of the centreline. */
    public CorridorPosition locate(double x, double y) {
        double[] p = centreline.locate(x, y);
        return new CorridorPosition(p[0], p[1]);
    }

    /** Unit direction of increasing station in plan, components X, Y; at a bend along the bisector. */
    public double[] direction(double stationMetres) {
        return centreline.direction(stationMetres);
    }

    /** Elevation of the ground in metres at a station and offset: centreline elevation plus cross-section. */
    public double groundElevation(double stationMetres, double offsetMetres) {
        double centre = elevations[0].length == 0 ? 0 : interpolate(elevations[0], elevations[1], stationMetres);
        double across = section[0].length == 0 ? crossSlope * offsetMetres : interpolate(section[0], section[1], offsetMetres);
        return centre + across;
    }

    /** Elevation of the ground in metres at plan coordinates. */
    public double groundElevationAt(double x, double y) {
        double[] p = centreline.locate(x, y);
        return groundElevation(p[0], p[1]);
    }

    /** Edges of the right-of-way at a station: linear between the given stations, constant beyond. */
    public Edges edges(double stationMetres) {
        return new Edges(interpolate(edges[0], edges[1], stationMetres), interpolate(edges[0], edges[2], stationMetres));
    }

    /** Offsets in metres at which the ground's cross-section has corners, rising, as a new array; empty for a cross slope. */
    public double[] groundCorners() {
        return section[0].clone();
    }

    /** Whether the centreline has bends. */
    public boolean bent() {
        return centreline.legCount() > 1;
    }

    /** Linear between points, constant beyond the outermost; at least one point. */
    private static double interpolate(double[] at, double[] value, double x) {
        int last = at.length - 1;
        if (x <= at[0]) {
            return value[0];
        }
        if (x >= at[last]) {
            return value[last];
        }
        int i = Arrays.binarySearch(at, x);
        if (i >= 0) {
            return value[i];
        }
        int right = -i - 1;
        double part = (x - at[right - 1]) / (at[right] - at[right - 1]);
        return value[right - 1] + part * (value[right] - value[right - 1]);
    }
}
