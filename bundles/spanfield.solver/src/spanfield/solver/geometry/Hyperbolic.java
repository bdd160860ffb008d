/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.solver.geometry;

/**
 * Hyperbolic functions for catenaries, where arguments are nearly always below one half: series there, exact to double precision (the next
 * term is 0.5^15 / 15! = 2e-17), exponentials beyond. Much faster than the strictly reproducible library functions.
 */
public final class Hyperbolic {

    private static final double SERIES_REACH = 0.5;

    private Hyperbolic() {
    }

    /** sinh u. */
    public static double sinh(double u) {
        if (Math.abs(u) > SERIES_REACH) {
            double e = Math.exp(u);
            return (e - 1 / e) / 2;
        }
        double q = u * u;
        return u * (1 + q * (1.0 / 6 + q * (1.0 / 120 + q * (1.0 / 5040 + q * (1.0 / 362880 + q * (1.0 / 39916800 + q * (1.0 / 6227020800L)))))));
    }

    /** cosh u - 1, without cancellation. */
    public static double coshLess1(double u) {
        if (Math.abs(u) > SERIES_REACH) {
            double e = Math.exp(u);
            return (e + 1 / e) / 2 - 1;
        }
        double q = u * u;
        return q * (0.5 + q * (1.0 / 24 + q * (1.0 / 720 + q * (1.0 / 40320 + q * (1.0 / 3628800 + q * (1.0 / 479001600 + q * (1.0 / 87178291200L)))))));
    }
}
