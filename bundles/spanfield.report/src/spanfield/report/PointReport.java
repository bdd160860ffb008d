/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.report;

import java.util.ArrayList;
import java.util.List;
import spanfield.report.TextTable.Align;
import spanfield.report.TextTable.Column;
import spanfield.study.FieldPoint;
import spanfield.study.result.FieldValue;
import spanfield.study.result.PointTable;
import spanfield.study.result.PointTable.PlacedPoint;
import spanfield.study.result.PointTable.PointCase;

/** The field at chosen points as text for people and as CSV for programs. */
public final class PointReport {

    private PointReport() {
    }

    /**
     * The table as text.
     *
     * @param names name of every point, in the order of the points; an empty list or empty names where they have none
     */
    public static String text(PointTable table, List<String> names, ReportOptions options) {
        StringBuilder out = new StringBuilder(ReportFrame.header("Magnetic field at points", table.evidence(), options)).append('\n');
        String length = options.lengthSymbol();
        boolean named = names.stream().anyMatch(name -> !name.isBlank());
        List<Column> leading = new ArrayList<>(List.of(new Column("", "Point", named ? Align.LEFT : Align.RIGHT),
            new Column("", "Station\n" + length, Align.DECIMAL), new Column("", "Offset\n" + length, Align.DECIMAL),
            new Column("", "Height\n" + length, Align.DECIMAL)));
        List<SeriesTable.Row> rows = new ArrayList<>();
        for (int i = 0; i < table.points().size(); i++) {
            int point = i;
            List<FieldValue> values = table.cases().stream().map(c -> c.series().value(point)).toList();
            rows.add(new SeriesTable.Row(leadingCells(table.points().get(i).point(), i, names, options), values, ""));
        }
        List<String> caseNames = table.cases().stream().map(c -> c.loadCase().name()).toList();
        out.append(SeriesTable.render(leading, caseNames, rows, options));
        boolean modelErrors = rows.stream().flatMap(row -> row.values().stream()).anyMatch(FieldValue::modelErrorKnown);
        out.append('\n').append(ReportFrame.errorLegend(table.evidence(), modelErrors, options));
        return out.append(ReportFrame.footer(table.evidence(), options)).toString();
    }

    private static List<String> leadingCells(FieldPoint point, int index, List<String> names, ReportOptions options) {
        return List.of(label(index, names), Numbers.length(options.length(point.stationMetres())),
            Numbers.length(options.length(point.offsetMetres())), Numbers.length(options.length(point.heightMetres())));
    }

    private static String label(int index, List<String> names) {
        return index < names.size() && !names.get(index).isBlank() ? names.get(index) : Integer.toString(index + 1);
    }

    /**
     * The table as CSV: a record for each point and load case, points in the order asked.
     *
     * @param names as for {@link #text}
     */
    public static void csv(PointTable table, List<String> names, Units units, Appendable out) {
        String length = "_" + units.length().code();
        List<String> header = new ArrayList<>(List.of("point", "station" + length, "offset" + length, "height" + length,
            "ground_elevation" + length, "plan_x" + length, "plan_y" + length, "load_case_id", "load_case"));
        header.addAll(FieldCsv.header(FieldCsv.VALUE_COLUMNS, units));
        header.addAll(FieldCsv.header(FieldCsv.COMPONENT_COLUMNS, units));
        CsvWriter writer = new CsvWriter(out, header);
        for (int i = 0; i < table.points().size(); i++) {
            for (PointCase pointCase : table.cases()) {
                List<Object> fields = new ArrayList<>();
                fields.add(label(i, names));
                fields.addAll(place(table.points().get(i), units));
                fields.addAll(List.of(pointCase.loadCase().id(), pointCase.loadCase().name()));
                fields.addAll(FieldCsv.value(pointCase.series().value(i), units));
                fields.addAll(FieldCsv.components(pointCase.series(), i, units));
                writer.record(fields);
            }
        }
    }

    private static List<Object> place(PlacedPoint placed, Units units) {
        LengthUnit unit = units.length();
        return List.of(unit.fromMetres(placed.point().stationMetres()), unit.fromMetres(placed.point().offsetMetres()),
            unit.fromMetres(placed.point().heightMetres()), unit.fromMetres(placed.groundElevationMetres()),
            unit.fromMetres(placed.xMetres()), unit.fromMetres(placed.yMetres()));
    }
}
