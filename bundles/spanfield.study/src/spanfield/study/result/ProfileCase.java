/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.study.result;

/**
 * One load case of a lateral profile.
 *
 * @param loadCase the load case
 * @param series   the field at the points of the profile
 * @param summary  edges, greatest values and comparisons with limits
 * @param geometry wires at the station in the wind swing of the load case
 */
public record ProfileCase(CaseInfo loadCase, FieldSeries series, EdgeRow summary, StationGeometry geometry) {
}
