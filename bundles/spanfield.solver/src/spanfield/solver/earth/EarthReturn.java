/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.solver.earth;

import java.util.Objects;
import org.apache.commons.math3.complex.Complex;
import spanfield.solver.PhysicalConstants;
import spanfield.solver.SolverInputException;

/**
 * The earth of a study: homogeneous, flat, of the permeability of free space, displacement currents neglected (good at power
 * frequencies up to resistivities of 1e5 ohm metres at distances below tens of kilometres).
 *
 * @param model                 how the earth enters the field
 * @param resistivityOhmMetres  1e-3 to 1e7; ignored for {@link EarthModel#NONE}
 * @param frequencyHertz        0 to 1e4; at 0 the earth has no effect on the field
 * @param planeElevationMetres  elevation of the earth plane
 */
public record EarthReturn(EarthModel model, double resistivityOhmMetres, double frequencyHertz, double planeElevationMetres) {

    /** Least admissible resistivity in ohm metres, below that of any soil or water by far. */
    public static final double LEAST_RESISTIVITY = 1e-3;

    /** Greatest admissible resistivity in ohm metres. */
    public static final double GREATEST_RESISTIVITY = 1e7;

    /** Greatest admissible frequency in hertz. */
    public static final double GREATEST_FREQUENCY = 1e4;

    private static final EarthReturn WITHOUT = new EarthReturn(EarthModel.NONE, Double.NaN, 0, 0);

    public EarthReturn {
        Objects.requireNonNull(model);
        if (model != EarthModel.NONE) {
            SolverInputException.requireWithin("earth resistivity in ohm metres", resistivityOhmMetres, LEAST_RESISTIVITY, GREATEST_RESISTIVITY);
            SolverInputException.requireWithin("frequency in hertz", frequencyHertz, 0, GREATEST_FREQUENCY);
            SolverInputException.requireWithin("elevation of the earth plane in metres", planeElevationMetres, -1e5, 1e5);
        }
    }

    /** No earth effect. */
    public static EarthReturn none() {
        return WITHOUT;
    }

    /** Whether the earth changes the field at all: false for {@link EarthModel#NONE} and for direct current. */
    public boolean active() {
        return model != EarthModel.NONE && frequencyHertz > 0;
    }

    /**
     * Complex depth p = sqrt(rho / (j omega mu0)) in metres, Re p &gt; 0, Im p &lt; 0 (Deri et al. 1981, eq. 3): half of the depth at which
     * the image lies below the mirror image. Defined when {@link #active()}.
     */
    public Complex complexDepth() {
        if (!active()) {
            throw new IllegalStateException("no complex depth without an active earth");
        }
        double magnitude = Math.sqrt(resistivityOhmMetres / (2 * Math.PI * frequencyHertz * PhysicalConstants.MU0));
        return new Complex(magnitude * Math.sqrt(0.5), -magnitude * Math.sqrt(0.5));
    }
}
