/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.solver;

/** Constants of nature in SI units. */
public final class PhysicalConstants {

    /** Permeability of free space in henry per metre, the conventional value 4 pi 1e-7. */
    public static final double MU0 = 4e-7 * Math.PI;

    /** Permittivity of free space in farad per metre (CODATA 2018). */
    public static final double EPSILON0 = 8.8541878128e-12;

    /** Standard acceleration of free fall in metres per second squared (CGPM 1901). */
    public static final double STANDARD_GRAVITY = 9.80665;

    private PhysicalConstants() {
    }
}
