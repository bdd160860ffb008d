/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.study.result;

import java.util.List;

/**
 * The edge-of-right-of-way table of a study.
 *
 * @param rows     stations in the order of the study, within each the load cases in the order of the study
 * @param evidence how the values came about
 */
public record EdgeTable(List<EdgeRow> rows, Evidence evidence) {

    public EdgeTable {
        rows = List.copyOf(rows);
    }
}
