/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.solver.geometry;

import spanfield.solver.SolverInputException;

/**
 * A point in space.
 *
 * @param x offset in metres, positive to the right
 * @param y station in metres, positive ahead
 * @param z elevation in metres, positive up
 */
public record Position(double x, double y, double z) {

    /** Greatest admissible magnitude of a coordinate in metres: beyond it a corridor is not flat and coordinates are mistaken. */
    public static final double GREATEST_COORDINATE_METRES = 1e6;

    /** Refuses NaN, infinities and coordinates beyond {@link #GREATEST_COORDINATE_METRES}. */
    public Position {
        require("offset X in metres", x);
        require("station Y in metres", y);
        require("elevation Z in metres", z);
    }

    private static void require(String what, double value) {
        SolverInputException.requireWithin(what, value, -GREATEST_COORDINATE_METRES, GREATEST_COORDINATE_METRES);
    }

    /** Distance to another point in metres. */
    public double distanceTo(Position other) {
        return Math.sqrt((x - other.x) * (x - other.x) + (y - other.y) * (y - other.y) + (z - other.z) * (z - other.z));
    }

    /** Distance to another point in plan, in metres. */
    public double planDistanceTo(Position other) {
        return Math.hypot(x - other.x, y - other.y);
    }
}
