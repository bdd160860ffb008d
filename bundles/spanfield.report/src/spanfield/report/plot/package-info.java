/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
/** Plots of results, drawn without a display. Kept apart from the tables so that these start without loading a chart library. */
package spanfield.report.plot;
