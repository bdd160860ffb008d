/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.solver.geometry;

import java.util.Objects;
import spanfield.solver.SolverInputException;

/**
 * A round wire: one filament along its axis. Subconductors of a bundle are separate wires.
 *
 * <p>The filament is wrong at distances of the order of the radius, where strands and skin effect show; field points within the radius
 * are refused.
 *
 * @param name         for messages
 * @param path         axis of the wire
 * @param radiusMetres outer radius in metres, positive, at most 1
 */
public record Wire(String name, WirePath path, double radiusMetres) {

    /** Refuses a radius that is not positive or above 1 m. */
    public Wire {
        Objects.requireNonNull(name);
        Objects.requireNonNull(path);
        SolverInputException.requireWithin("radius in metres of wire '" + name + "'", radiusMetres, Double.MIN_NORMAL, 1);
    }
}
