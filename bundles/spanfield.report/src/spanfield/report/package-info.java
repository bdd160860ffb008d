/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
/** Tables, comma-separated values and plots, made without a display. */
package spanfield.report;
