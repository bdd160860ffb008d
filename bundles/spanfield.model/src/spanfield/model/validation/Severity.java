/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.model.validation;

/** How much a finding matters. */
public enum Severity {
    /** The study cannot be computed. */
    ERROR,
    /** The study can be computed, but a result may mislead. */
    WARNING,
    /** Worth knowing. */
    INFO
}
