/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
/** From the model of a study to solver input and immutable results. */
package spanfield.study;
