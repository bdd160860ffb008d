/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
/**
 * The editor of studies: one document with one command stack, pages that other bundles contribute, and a computation in which the newest
 * request wins. Everything here runs on the user-interface thread except the computation itself, which works on immutable snapshots.
 */
package spanfield.ui.common;
