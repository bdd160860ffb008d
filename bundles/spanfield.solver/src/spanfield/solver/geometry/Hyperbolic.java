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
        return u * (1 + q / 6 * (1 + q / 20 * (1 + q / 42 * (1 + q / 72 * (1 + q / 110 * (1 + q / 156))))));
    }

    /** cosh u - 1, without cancellation. */
    public static double coshLess1(double u) {
        if (Math.abs(u) > SERIES_REACH) {
            double e = Math.exp(u);
            return (e + 1 / e) / 2 - 1;
        }
        double q = u * u;
        return q / 2 * (1 + q / 12 * (1 + q / 30 * (1 + q / 56 * (1 + q / 90 * (1 + q / 132 * (1 + q / 182))))));
    }
}
