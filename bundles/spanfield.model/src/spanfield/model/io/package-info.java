/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
/** Study files: reading what may be broken or hostile, writing so that nothing is ever half-written. */
package spanfield.model.io;
