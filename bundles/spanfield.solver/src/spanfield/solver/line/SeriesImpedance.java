/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.solver.line;

import java.util.List;
import org.apache.commons.math3.complex.Complex;
import spanfield.solver.PhysicalConstants;
import spanfield.solver.SolverInputException;
import spanfield.solver.SolverInputException.Reason;
import spanfield.solver.earth.CarsonIntegral;
import spanfield.solver.earth.EarthReturn;

/**
 * Series impedances per metre of parallel conductors with return in the earth.
 *
 * <p>Z_ii = r_i + j omega mu0/(2 pi) ln(2 h_i / GMR_i) + earth, Z_ij = j omega mu0/(2 pi) ln(D'_ij / D_ij) + earth, D' the distance to the
 * image; the earth term is that of the {@link ImpedanceFormula}. With complex depth, image and earth merge to
 * ln(2 (h_i + p) / GMR_i) and ln(sqrt((h_i + h_j + 2p)^2 + d^2) / D_ij). Homogeneous earth, long line, no displacement current.
 */
public final class SeriesImpedance {

    private SeriesImpedance() {
    }

    /**
     * The impedance matrix, [conductor][conductor] in ohm per metre, symmetric.
     *
     * @param earth active; its model does not matter here
     */
    public static Complex[][] matrix(List<LineConductor> conductors, EarthReturn earth, ImpedanceFormula formula) {
        int n = conductors.size();
        Complex[][] z = new Complex[n][n];
        for (int i = 0; i < n; i++) {
            for (int j = 0; j <= i; j++) {
                z[i][j] = element(conductors.get(i), conductors.get(j), i == j, earth, formula);
                z[j][i] = z[i][j];
            }
        }
        return z;
    }

    private static Complex element(LineConductor a, LineConductor b, boolean self, EarthReturn earth, ImpedanceFormula formula) {
        double distance = self ? a.geometricMeanRadiusMetres() : a.distanceTo(b);
        if (!(distance > 0)) {
            throw new SolverInputException(Reason.ZERO_LENGTH, "Conductors '" + a.name() + "' and '" + b.name() + "' lie at the same place");
        }
        double omega = 2 * Math.PI * earth.frequencyHertz();
        double factor = omega * PhysicalConstants.MU0 / (2 * Math.PI);
        double resistance = self ? a.resistanceOhmsPerMetre() : 0;
        double x = a.offsetMetres() - b.offsetMetres();
        double heightSum = a.meanHeightMetres() + b.meanHeightMetres();
        Complex j = new Complex(0, factor);
        return switch (formula) {
            case COMPLEX_DEPTH -> {
                Complex depth = earth.complexDepth().multiply(2).add(heightSum);
                yield depth.multiply(depth).add(x * x).sqrt().divide(distance).log().multiply(j).add(resistance);
            }
            case CARSON -> new CarsonIntegral(earth).value(x, heightSum).multiply(2)
                .add(Math.log(Math.hypot(x, heightSum) / distance)).multiply(j).add(resistance);
            case MODIFIED_CARSON -> new Complex(resistance + omega * PhysicalConstants.MU0 / 8,
                factor * Math.log(returnDepthMetres(earth) / distance));
        };
    }

    /**
     * Equivalent depth of the earth return in metres, 2 exp(1/2 - gamma) / sqrt(2 pi mu0) sqrt(rho / f) = 658.9 sqrt(rho / f) (Carson 1926,
     * first terms of the series; texts print 658.5 or 658.9).
     */
    public static double returnDepthMetres(EarthReturn earth) {
        final double eulerGamma = 0.57721566490153286061;
        double factor = 2 * Math.exp(0.5 - eulerGamma) / Math.sqrt(2 * Math.PI * PhysicalConstants.MU0);
        return factor * Math.sqrt(earth.resistivityOhmMetres() / earth.frequencyHertz());
    }

    /**
     * Kron reduction: eliminates the conductors beyond the first {@code kept}, which are at earth potential.
     *
     * @return matrix of the kept conductors, Z_pp - Z_ps Z_ss^-1 Z_sp
     */
    public static Complex[][] kronReduce(Complex[][] z, int kept) {
        Complex[][] induced = ComplexLinearSystem.solve(block(z, kept, z.length, kept, z.length), block(z, kept, z.length, 0, kept));
        Complex[][] reduced = block(z, 0, kept, 0, kept);
        for (int i = 0; i < kept; i++) {
            for (int j = 0; j < kept; j++) {
                for (int s = kept; s < z.length; s++) {
                    reduced[i][j] = reduced[i][j].subtract(z[i][s].multiply(induced[s - kept][j]));
                }
            }
        }
        return reduced;
    }

    static Complex[][] block(Complex[][] z, int fromRow, int toRow, int fromColumn, int toColumn) {
        Complex[][] part = new Complex[toRow - fromRow][toColumn - fromColumn];
        for (int i = 0; i < part.length; i++) {
            System.arraycopy(z[fromRow + i], fromColumn, part[i], 0, part[i].length);
        }
        return part;
    }
}
