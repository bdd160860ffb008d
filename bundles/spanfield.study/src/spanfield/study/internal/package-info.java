/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
/** Inside of the study: reading the model, building geometry and excitations, and solving. Not an API. */
package spanfield.study.internal;
