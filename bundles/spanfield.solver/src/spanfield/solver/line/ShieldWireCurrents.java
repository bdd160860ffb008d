/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.solver.line;

import java.util.ArrayList;
import java.util.List;
import org.apache.commons.math3.complex.Complex;
import spanfield.solver.SolverInputException;
import spanfield.solver.SolverInputException.Reason;
import spanfield.solver.earth.EarthReturn;

/**
 * Currents that parallel conductors induce in shield wires which are bonded to earth at every structure of a long line:
 * I_s = -Z_ss^-1 Z_sp I_p. Footing resistances and line ends are left out. A linear operator: computed once from the geometry, applied to
 * every load case and phase order. Immutable.
 */
public final class ShieldWireCurrents {

    private final Complex[][] operator;
    private final double residual;

    private ShieldWireCurrents(Complex[][] operator, double residual) {
        this.operator = operator;
        this.residual = residual;
    }

    /**
     * The operator for sources with known currents and bonded shield wires, all parallel to each other.
     *
     * @param sources phases, and shield wires with a given current
     * @param bonded  bonded shield wires
     * @param earth   when it is not active (direct current), nothing is induced
     */
    public static ShieldWireCurrents of(List<LineConductor> sources, List<LineConductor> bonded, EarthReturn earth, ImpedanceFormula formula) {
        int p = sources.size();
        int s = bonded.size();
        Complex[][] operator = new Complex[s][p];
        if (s == 0 || p == 0 || !earth.active()) {
            for (Complex[] row : operator) {
                java.util.Arrays.fill(row, Complex.ZERO);
            }
            return new ShieldWireCurrents(operator, 0);
        }
        List<LineConductor> all = new ArrayList<>(bonded);
        all.addAll(sources);
        Complex[][] z = SeriesImpedance.matrix(all, earth, formula);
        Complex[][] zss = SeriesImpedance.block(z, 0, s, 0, s);
        Complex[][] zsp = SeriesImpedance.block(z, 0, s, s, s + p);
        Complex[][] solution = ComplexLinearSystem.solve(zss, zsp);
        double residual = 0;
        for (int i = 0; i < s; i++) {
            for (int j = 0; j < p; j++) {
                Complex rest = zsp[i][j].negate();
                for (int k = 0; k < s; k++) {
                    rest = rest.add(zss[i][k].multiply(solution[k][j]));
                }
                residual = Math.max(residual, rest.abs() / zsp[i][j].abs());
                operator[i][j] = solution[i][j].negate();
            }
        }
        return new ShieldWireCurrents(operator, residual);
    }

    /** Current of a bonded wire per ampere of a source (dimensionless). */
    public Complex factor(int bonded, int source) {
        return operator[bonded][source];
    }

    /** Greatest relative residual of the linear system: evidence that it was solved. */
    public double residual() {
        return residual;
    }

    /**
     * Currents of the bonded wires in amperes RMS.
     *
     * @param sourceAmperes currents of the sources, in their order
     */
    public Complex[] apply(Complex[] sourceAmperes) {
        Complex[] result = new Complex[operator.length];
        for (int i = 0; i < result.length; i++) {
            if (operator[i].length != sourceAmperes.length) {
                throw new SolverInputException(Reason.SIZE_MISMATCH,
                    "There are " + operator[i].length + " sources, but " + sourceAmperes.length + " currents");
            }
            result[i] = Complex.ZERO;
            for (int j = 0; j < sourceAmperes.length; j++) {
                result[i] = result[i].add(operator[i][j].multiply(sourceAmperes[j]));
            }
        }
        return result;
    }
}
