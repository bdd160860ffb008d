/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
/** Rules that a study must keep, run by EMF's Diagnostician: every finding says what is wrong, where, and what to do. */
package spanfield.model.validation;
