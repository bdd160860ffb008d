/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
/** Return of current in the earth: complex images and the exact conducting half-space. */
package spanfield.solver.earth;
