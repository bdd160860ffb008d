/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.study.result;

/**
 * A method that took part in a result.
 *
 * @param topic  what it is for
 * @param text   the method in a sentence or two
 * @param source publication or standard
 */
public record MethodNote(String topic, String text, String source) {
}
