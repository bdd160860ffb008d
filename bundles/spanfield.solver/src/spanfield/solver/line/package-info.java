/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
/**
 * Line theory per unit length: series impedances with earth return, currents that phases induce in shield wires, current phasors from
 * loads, and the field of infinite straight wires as the engineer's two-dimensional reference. Phasors are RMS, time factor
 * exp(+j omega t); impedances in ohm per metre.
 */
package spanfield.solver.line;
