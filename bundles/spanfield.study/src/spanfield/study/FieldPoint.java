/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.study;

/**
 * A point at which the field is wanted, in corridor coordinates.
 *
 * @param stationMetres station in metres
 * @param offsetMetres  offset in metres, positive to the right
 * @param heightMetres  height above the local ground in metres, not negative
 */
public record FieldPoint(double stationMetres, double offsetMetres, double heightMetres) {
}
