/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
/** Pages of the study editor that show the corridor to scale: the cross-section, in which it is edited, and the elevation along the line. */
package spanfield.ui.section;
