/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.study.result;

import java.util.List;

/**
 * A row of the edge-of-right-of-way table: one station and one load case.
 *
 * <p>The greatest values are true maxima between the points of the profile, found to the offset resolution that the evidence states.
 * Resultant and major axis may have their maxima at different offsets. Maxima include the edges.
 *
 * @param station                    the station
 * @param loadCase                   the load case
 * @param leftEdge                   field at the left edge
 * @param rightEdge                  field at the right edge
 * @param greatestResultant          field where the resultant is greatest within the right-of-way
 * @param greatestMajorAxis          field where the major axis is greatest within the right-of-way
 * @param greatestResultantOfProfile field where the resultant is greatest on the profile and the right-of-way together
 * @param greatestMajorAxisOfProfile field where the major axis is greatest on the profile and the right-of-way together
 * @param comparisons                comparisons with every limit that applies at the station, in the order of the limits
 */
public record EdgeRow(StationInfo station, CaseInfo loadCase, PlacedField leftEdge, PlacedField rightEdge, PlacedField greatestResultant,
    PlacedField greatestMajorAxis, PlacedField greatestResultantOfProfile, PlacedField greatestMajorAxisOfProfile,
    List<LimitComparison> comparisons) {

    public EdgeRow {
        comparisons = List.copyOf(comparisons);
    }
}
