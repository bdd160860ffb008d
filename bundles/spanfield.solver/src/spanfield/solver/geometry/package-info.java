/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
/**
 * Wires in space: catenary spans, chains of spans, and what they do beyond their ends. Axes: X offset (positive to the right),
 * Y station (ahead), Z elevation (up); metres and radians throughout.
 */
package spanfield.solver.geometry;
