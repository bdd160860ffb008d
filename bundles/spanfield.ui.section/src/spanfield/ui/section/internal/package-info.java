/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
/** Not API: parts, figures and gestures of the cross-section. Figures receive numbers and texts, never model objects. */
package spanfield.ui.section.internal;
