/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.solver.line;

import java.util.List;
import org.apache.commons.math3.complex.Complex;
import spanfield.solver.PhysicalConstants;
import spanfield.solver.SolverInputException;
import spanfield.solver.SolverInputException.Reason;
import spanfield.solver.earth.EarthModel;
import spanfield.solver.earth.EarthReturn;
import spanfield.solver.earth.HalfSpaceIntegral;

/**
 * Field of infinite, straight, level, parallel wires in the plane across them: the formula behind most hand calculations
 * (B = mu0 I / (2 pi d) of each wire, added as phasors), with the earth terms for straight wires. A second, independent method beside the
 * solver for sagged wires: wrong by the sag, by turns, and near structures.
 */
public final class ParallelWiresField {

    private ParallelWiresField() {
    }

    /**
     * Field phasor in tesla RMS at a point, components X (right) and Z (up).
     *
     * @param offsets   offsets of the wires in metres
     * @param heights   heights of the wires above the earth plane in metres
     * @param amperes   current phasors, positive away from the viewer who sees X to the right
     * @param earth     earth; its plane elevation is taken as 0
     */
    public static Complex[] at(double x, double z, List<Double> offsets, List<Double> heights, Complex[] amperes, EarthReturn earth) {
        if (offsets.size() != amperes.length || heights.size() != amperes.length) {
            throw new SolverInputException(Reason.SIZE_MISMATCH, "Offsets, heights and currents differ in number");
        }
        Complex bx = Complex.ZERO;
        Complex bz = Complex.ZERO;
        double[] out = new double[4];
        for (int i = 0; i < amperes.length; i++) {
            double dx = x - offsets.get(i);
            double dz = z - heights.get(i);
            double f = PhysicalConstants.MU0 / (2 * Math.PI) / (dx * dx + dz * dz);
            bx = bx.add(amperes[i].multiply(f * dz));
            bz = bz.subtract(amperes[i].multiply(f * dx));
            if (earth.active()) {
                HalfSpaceIntegral integral = new HalfSpaceIntegral(earth);
                if (earth.model() == EarthModel.EXACT_HALF_SPACE) {
                    integral.exact(dx, z + heights.get(i), out);
                } else {
                    integral.image(dx, z + heights.get(i), out);
                }
                bx = bx.add(amperes[i].multiply(new Complex(out[0], out[1])));
                bz = bz.add(amperes[i].multiply(new Complex(out[2], out[3])));
            }
        }
        return new Complex[] {bx, bz};
    }
}
