/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.study.internal;

import spanfield.study.GeometryRule;

/**
 * A rule that does not hold.
 *
 * @param rule    the rule
 * @param key     place in the model, see {@link StudyReader#object}
 * @param message what is wrong and what to do
 */
public record GeometryProblem(GeometryRule rule, String key, String message) {
}
