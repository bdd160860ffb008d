/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.study.result;

/**
 * The field at an offset of a station, at the reference height.
 *
 * @param offsetMetres offset in metres, positive to the right
 * @param field        the field there
 */
public record PlacedField(double offsetMetres, FieldValue field) {
}
