/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.study.internal;

import java.util.Arrays;
import spanfield.solver.geometry.Position;
import spanfield.study.CorridorPlan;
import spanfield.study.CorridorPlan.PlanPoint;
import spanfield.study.result.StationInfo;

/** Points across the corridor at a station, at a height above the local ground. Immutable. */
final class ProfileGrid {

    private final double station;
    private final double[] offsets;
    private final double[] ground;
    private final Position[] positions;

    private ProfileGrid(double station, double[] offsets, CorridorPlan plan, double height) {
        this.station = station;
        this.offsets = offsets;
        this.ground = new double[offsets.length];
        this.positions = new Position[offsets.length];
        for (int i = 0; i < offsets.length; i++) {
            PlanPoint p = plan.planPoint(station, offsets[i]);
            ground[i] = plan.groundElevation(station, offsets[i]);
            positions[i] = new Position(p.x(), p.y(), ground[i] + height);
        }
    }

    /** The points that a study asks for: from the first to the last offset, evenly spaced; the last point closes the range. */
    static ProfileGrid of(StationInfo station, CorridorPlan plan, double height) {
        return new ProfileGrid(station.stationMetres(), offsets(station), plan, height);
    }

    /** Points at chosen offsets, rising. */
    static ProfileGrid of(double station, double[] offsets, CorridorPlan plan, double height) {
        return new ProfileGrid(station, offsets.clone(), plan, height);
    }

    /** Offsets of a profile in metres. */
    static double[] offsets(StationInfo station) {
        double width = station.toOffsetMetres() - station.fromOffsetMetres();
        // A remainder below a millionth of the spacing is rounding, not a wish for one more point.
        int intervals = (int) Math.ceil(width / station.spacingMetres() - 1e-6);
        double[] offsets = new double[Math.max(1, intervals) + 1];
        for (int i = 0; i < offsets.length - 1; i++) {
            offsets[i] = station.fromOffsetMetres() + i * station.spacingMetres();
        }
        offsets[offsets.length - 1] = station.toOffsetMetres();
        return offsets;
    }

    int size() {
        return offsets.length;
    }

    double station() {
        return station;
    }

    double offset(int point) {
        return offsets[point];
    }

    double[] offsets() {
        return offsets.clone();
    }

    double[] ground() {
        return ground.clone();
    }

    Position position(int point) {
        return positions[point];
    }

    Position[] positions() {
        return positions.clone();
    }

    /** Elevation of the lowest point in metres. */
    double lowest() {
        return Arrays.stream(positions).mapToDouble(Position::z).min().orElseThrow();
    }
}
