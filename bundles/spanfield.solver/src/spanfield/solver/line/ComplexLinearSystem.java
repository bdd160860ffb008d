/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.solver.line;

import org.apache.commons.math3.complex.Complex;
import org.apache.commons.math3.linear.Array2DRowRealMatrix;
import org.apache.commons.math3.linear.LUDecomposition;
import org.apache.commons.math3.linear.RealMatrix;
import spanfield.solver.SolverInputException;
import spanfield.solver.SolverInputException.Reason;

/** Solves A X = B for complex matrices through the real system [[Re A, -Im A], [Im A, Re A]] of twice the size (Commons Math LU). */
final class ComplexLinearSystem {

    private ComplexLinearSystem() {
    }

    static Complex[][] solve(Complex[][] a, Complex[][] b) {
        int n = a.length;
        int m = b.length == 0 ? 0 : b[0].length;
        Complex[][] x = new Complex[n][m];
        if (n == 0 || m == 0) {
            return x;
        }
        RealMatrix real = new Array2DRowRealMatrix(2 * n, 2 * n);
        RealMatrix right = new Array2DRowRealMatrix(2 * n, m);
        for (int i = 0; i < n; i++) {
            for (int j = 0; j < n; j++) {
                real.setEntry(i, j, a[i][j].getReal());
                real.setEntry(i, n + j, -a[i][j].getImaginary());
                real.setEntry(n + i, j, a[i][j].getImaginary());
                real.setEntry(n + i, n + j, a[i][j].getReal());
            }
            for (int j = 0; j < m; j++) {
                right.setEntry(i, j, b[i][j].getReal());
                right.setEntry(n + i, j, b[i][j].getImaginary());
            }
        }
        // Impedances per metre are small numbers: the threshold for a singular pivot is relative to them.
        LUDecomposition lu = new LUDecomposition(real, 1e-14 * real.getNorm());
        if (!lu.getSolver().isNonSingular()) {
            throw new SolverInputException(Reason.SINGULAR_SYSTEM, "The impedances of the shield wires form a singular system: two wires coincide");
        }
        RealMatrix solution = lu.getSolver().solve(right);
        for (int i = 0; i < n; i++) {
            for (int j = 0; j < m; j++) {
                x[i][j] = new Complex(solution.getEntry(i, j), solution.getEntry(n + i, j));
            }
        }
        return x;
    }
}
