/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.study.internal;

import java.util.Arrays;
import java.util.TreeSet;
import spanfield.study.CorridorPlan;
import spanfield.study.CorridorPlan.Edges;
import spanfield.study.result.StationGeometry.WireAtStation;
import spanfield.study.result.StationInfo;

/**
 * Offsets at which the field is computed at a station: those of the profile, both edges, corners of the ground, and enough in
 * between to see every maximum.
 * Immutable.
 */
final class StationPoints {

    /**
     * Points are at most this part of the distance to the nearest wire apart. The field varies over lengths of that distance; between points
     * so close a maximum rises by at most about one in twenty over the greater of its neighbours.
     */
    private static final double STEP_PER_DISTANCE = 0.25;

    /** Distance over clearance: on a slope of 45 degrees a wire is nearer than it is high. */
    private static final double DISTANCE_PER_CLEARANCE = Math.sqrt(0.5);

    /** Smallest step in metres: wires that come nearer to the profile than 20 cm are not looked at more closely. */
    private static final double LEAST_STEP_METRES = 0.05;

    /** Offsets nearer than this, in metres, are one point. */
    private static final double SAME_METRES = 1e-9;

    private final double[] offsets;
    private final int[] profile;
    private final int left;
    private final int right;

    /** @param clearance least clearance in metres of any wire above the height of the points */
    StationPoints(StationInfo station, CorridorPlan plan, double clearance) {
        Edges edges = plan.edges(station.stationMetres());
        double[] asked = ProfileGrid.offsets(station);
        TreeSet<Double> all = new TreeSet<>();
        Arrays.stream(asked).forEach(o -> add(all, o));
        add(all, edges.leftOffsetMetres());
        add(all, edges.rightOffsetMetres());
        // The field along the profile has a corner where the ground has one, and a maximum may sit in it.
        double first = all.first();
        double last = all.last();
        Arrays.stream(plan.groundCorners()).filter(o -> o > first && o < last).forEach(o -> add(all, o));
        divide(all, Math.max(LEAST_STEP_METRES, STEP_PER_DISTANCE * DISTANCE_PER_CLEARANCE * clearance));
        offsets = all.stream().mapToDouble(Double::doubleValue).toArray();
        profile = Arrays.stream(asked).mapToInt(this::indexOf).toArray();
        left = indexOf(edges.leftOffsetMetres());
        right = indexOf(edges.rightOffsetMetres());
    }

    /** Divides every interval that is wider than a step. */
    private static void divide(TreeSet<Double> all, double step) {
        Double before = null;
        for (double offset : all.toArray(Double[]::new)) {
            if (before != null) {
                int parts = (int) Math.ceil((offset - before) / step);
                for (int i = 1; i < parts; i++) {
                    all.add(before + (offset - before) * i / parts);
                }
            }
            before = offset;
        }
    }

    private static void add(TreeSet<Double> all, double offset) {
        Double below = all.floor(offset);
        Double above = all.ceiling(offset);
        if ((below == null || offset - below > SAME_METRES) && (above == null || above - offset > SAME_METRES)) {
            all.add(offset + 0.0);
        }
    }

    private int indexOf(double offset) {
        int i = Arrays.binarySearch(offsets, offset + 0.0);
        if (i >= 0) {
            return i;
        }
        int after = -i - 1;
        boolean takeAfter = after < offsets.length && (after == 0 || offsets[after] - offset < offset - offsets[after - 1]);
        return takeAfter ? after : after - 1;
    }

    /** Offsets of the profile and where wires cross its plane: the points that may lie in a wire. */
    static double[] withCrossings(StationInfo station, GeometryState state, CorridorPlan plan) {
        TreeSet<Double> all = new TreeSet<>();
        Arrays.stream(ProfileGrid.offsets(station)).forEach(all::add);
        Edges edges = plan.edges(station.stationMetres());
        for (WireAtStation wire : StationCrossings.of(station, state, plan).wires()) {
            for (double side : new double[] {-1, 0, 1}) {
                all.add(wire.offsetMetres() + side * wire.bundleRadiusMetres());
            }
        }
        double least = Math.min(station.fromOffsetMetres(), edges.leftOffsetMetres());
        double greatest = Math.max(station.toOffsetMetres(), edges.rightOffsetMetres());
        all.add(edges.leftOffsetMetres());
        all.add(edges.rightOffsetMetres());
        return all.stream().filter(o -> o >= least && o <= greatest).mapToDouble(Double::doubleValue).toArray();
    }

    /** All offsets in metres, rising. */
    double[] offsets() {
        return offsets;
    }

    /** Indices of the profile's points. */
    int[] profile() {
        return profile;
    }

    /** Index of the left edge. */
    int left() {
        return left;
    }

    /** Index of the right edge. */
    int right() {
        return right;
    }
}
