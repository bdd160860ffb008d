/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
/** Not API: parts of the study editor. */
package spanfield.ui.common.internal;
