/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.solver.earth;

/** How the return of current in the earth enters the magnetic field. */
public enum EarthModel {
    /** Not at all: wires in free space. */
    NONE,
    /** Images in a complex depth (Deri, Tevan, Semlyen, Castanheira, IEEE Trans. PAS-100 no. 8, 1981). An approximation. */
    COMPLEX_IMAGES,
    /** Exact integral of the homogeneous conducting half-space (Carson 1926, Wait 1961) for each wire's mean straight line. */
    EXACT_HALF_SPACE
}
