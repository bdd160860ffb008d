/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.solver.geometry;

/** What a wire does beyond its first or last attachment. */
public enum WireEnd {
    /** It goes on as a straight, horizontal, endless filament from the last attachment, along the last span's direction in plan. */
    CONTINUES,
    /** It ends. The current path is open there, and an open path has no unique Biot-Savart field: results carry a warning. */
    ENDS
}
