/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.report;

import java.util.ArrayList;
import java.util.List;
import spanfield.report.TextTable.Align;
import spanfield.report.TextTable.Column;
import spanfield.study.result.FieldValue;

/**
 * Field values of several load cases side by side, a row for each point, in blocks of as many load cases as fit on a page. The errors are
 * the greatest of the block's load cases.
 */
final class SeriesTable {

    /** Load cases side by side: keeps the table within about 110 characters for names of usual length. */
    static final int CASES_IN_BLOCK = 5;

    /**
     * A point.
     *
     * @param leading cells before the values
     * @param values  field of every load case
     * @param remark  cell after the values
     */
    record Row(List<String> leading, List<FieldValue> values, String remark) {
    }

    private SeriesTable() {
    }

    /** The rows as text, a table for each block of load cases. */
    static String render(List<Column> leading, List<String> caseNames, List<Row> rows, ReportOptions options) {
        StringBuilder out = new StringBuilder();
        for (int from = 0; from < caseNames.size(); from += CASES_IN_BLOCK) {
            int to = Math.min(from + CASES_IN_BLOCK, caseNames.size());
            out.append(from > 0 ? "\n" : "").append(block(leading, caseNames.subList(from, to), rows, from, options));
        }
        return out.toString();
    }

    private static String block(List<Column> leading, List<String> names, List<Row> rows, int from, ReportOptions options) {
        boolean modelErrors = rows.stream().flatMap(row -> row.values().stream()).anyMatch(FieldValue::modelErrorKnown);
        boolean remarks = rows.stream().anyMatch(row -> !row.remark().isEmpty());
        String unit = options.fieldSymbol();
        List<Column> columns = new ArrayList<>(leading);
        names.forEach(name -> columns.add(new Column("", name + "\n" + unit, Align.DECIMAL)));
        columns.add(new Column("Greatest error", "numerical\n" + options.style().plusMinus() + unit, Align.RIGHT));
        if (modelErrors) {
            columns.add(new Column("Greatest error", "earth\n" + options.style().plusMinus() + unit, Align.DECIMAL));
        }
        if (remarks) {
            columns.add(new Column("", "", Align.LEFT));
        }
        TextTable table = new TextTable(columns);
        rows.forEach(row -> table.row(cells(row, row.values().subList(from, from + names.size()), modelErrors, remarks, options)));
        return table.render();
    }

    private static List<String> cells(Row row, List<FieldValue> values, boolean modelErrors, boolean remarks, ReportOptions options) {
        List<String> cells = new ArrayList<>(row.leading());
        values.forEach(value -> cells.add(Numbers.field(options.field(value.tesla(options.measure())))));
        cells.add(Numbers.bound(options.field(values.stream().mapToDouble(FieldValue::numericalErrorTesla).max().orElse(0))));
        if (modelErrors) {
            cells.add(Numbers.bound(options.field(values.stream().mapToDouble(FieldValue::modelErrorTesla).max().orElse(0))));
        }
        if (remarks) {
            cells.add(row.remark());
        }
        return cells;
    }
}
