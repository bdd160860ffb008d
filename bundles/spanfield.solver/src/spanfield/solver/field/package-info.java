/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
/**
 * Magnetic field of sagged wires: transfer coefficients (tesla per ampere) of every wire at every point, their linear combination with
 * current phasors, and the scalar measures of the result. Phasors are RMS with time factor exp(+j omega t).
 */
package spanfield.solver.field;
