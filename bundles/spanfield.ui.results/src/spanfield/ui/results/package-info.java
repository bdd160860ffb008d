/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
/** Pages of the study editor that show results: lateral profile, edge table, and the loads that they depend on. */
package spanfield.ui.results;
