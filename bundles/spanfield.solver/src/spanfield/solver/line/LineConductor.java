/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.solver.line;

import spanfield.solver.SolverInputException;

/**
 * One of several parallel conductors in line theory: an infinite straight wire at the mean height of the sagged one.
 *
 * @param name                      for messages
 * @param offsetMetres              mean offset across the line, in metres
 * @param meanHeightMetres          mean height above the earth plane in metres, positive
 * @param geometricMeanRadiusMetres geometric mean radius in metres, positive; of the bundle when the conductor stands for one
 * @param resistanceOhmsPerMetre    series resistance in ohm per metre, positive
 */
public record LineConductor(String name, double offsetMetres, double meanHeightMetres, double geometricMeanRadiusMetres,
    double resistanceOhmsPerMetre) {

    public LineConductor {
        SolverInputException.requireWithin("offset in metres of '" + name + "'", offsetMetres, -1e6, 1e6);
        SolverInputException.requireWithin("mean height above the earth plane in metres of '" + name + "'", meanHeightMetres, 1e-3, 1e4);
        SolverInputException.requireWithin("geometric mean radius in metres of '" + name + "'", geometricMeanRadiusMetres, 1e-6, 10);
        SolverInputException.requireWithin("resistance in ohm per metre of '" + name + "'", resistanceOhmsPerMetre, 1e-9, 10);
    }

    /** Distance across the line to another conductor, in metres. */
    double distanceTo(LineConductor other) {
        return Math.hypot(offsetMetres - other.offsetMetres, meanHeightMetres - other.meanHeightMetres);
    }
}
