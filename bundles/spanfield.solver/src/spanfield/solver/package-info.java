/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
/** The solver: physics of overhead lines in plain Java. */
package spanfield.solver;
