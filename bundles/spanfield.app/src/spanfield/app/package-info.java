/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
/** The Spanfield application: window, menus, perspective, start view and the wizard for new studies. */
package spanfield.app;
