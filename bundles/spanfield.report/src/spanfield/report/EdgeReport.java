/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.report;

import java.util.ArrayList;
import java.util.Collection;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import spanfield.model.FieldMeasure;
import spanfield.report.TextTable.Align;
import spanfield.report.TextTable.Column;
import spanfield.study.result.EdgeRow;
import spanfield.study.result.EdgeTable;
import spanfield.study.result.Evidence;
import spanfield.study.result.FieldValue;
import spanfield.study.result.LimitComparison;
import spanfield.study.result.PlacedField;
import spanfield.study.result.StationGeometry;
import spanfield.study.result.StationInfo;

/** The edge-of-right-of-way table as text for people and as CSV for programs. */
public final class EdgeReport {

    private EdgeReport() {
    }

    /**
     * The table as text: header, a block for each station with the values and the comparison with the limits, then what the values rest on.
     */
    public static String text(EdgeTable table, ReportOptions options) {
        StringBuilder out = new StringBuilder(ReportFrame.header("Magnetic field at the edges of the right-of-way", table.evidence(), options));
        LimitTable limits = LimitTable.of(table.rows(), options);
        ReportFrame.entry(out, "Limits", LimitTable.summary(table.rows(), options));
        for (List<EdgeRow> rows : byStation(table.rows())) {
            out.append('\n').append(stationBlock(rows, table.evidence(), options));
            out.append(limits.block(rows));
        }
        out.append('\n').append(ReportFrame.errorLegend(table.evidence(), modelErrors(table.rows()), options));
        out.append(limits.legend());
        return out.append(ReportFrame.footer(table.evidence(), options)).toString();
    }

    private static Collection<List<EdgeRow>> byStation(List<EdgeRow> rows) {
        Map<StationInfo, List<EdgeRow>> stations = new LinkedHashMap<>();
        rows.forEach(row -> stations.computeIfAbsent(row.station(), key -> new ArrayList<>()).add(row));
        return stations.values();
    }

    /** Station, clearances and values of the load cases at one station. */
    static String stationBlock(List<EdgeRow> rows, Evidence evidence, ReportOptions options) {
        EdgeRow first = rows.get(0);
        String unit = " " + options.lengthSymbol();
        StringBuilder out = new StringBuilder(Terms.station(first.station(), options.units()))
            .append(": left edge ").append(Numbers.brief(options.length(first.leftEdge().offsetMetres()), Numbers.LENGTH_DECIMALS)).append(unit)
            .append(", right edge ").append(Numbers.brief(options.length(first.rightEdge().offsetMetres()), Numbers.LENGTH_DECIMALS))
            .append(unit).append('\n');
        out.append(clearances(first.station(), evidence, options));
        return out.append(valueTable(rows, options)).toString();
    }

    /** How low the circuits hang at the station, for each swing of the wires. */
    private static String clearances(StationInfo station, Evidence evidence, ReportOptions options) {
        StringBuilder out = new StringBuilder();
        for (StationGeometry geometry : evidence.geometry()) {
            List<StationGeometry.Clearance> circuits = geometry.station().equals(station) ? circuits(geometry) : List.of();
            if (circuits.isEmpty()) {
                continue;
            }
            boolean ambiguous = circuits.stream().map(StationGeometry.Clearance::element).distinct().count() < circuits.size();
            String wind = geometry.windSwingRadians() == 0 ? ""
                : " (wires swung by " + Numbers.brief(Math.toDegrees(geometry.windSwingRadians()), 2) + options.style().degrees() + ")";
            List<String> parts = new ArrayList<>();
            circuits.forEach(c -> parts.add((ambiguous ? c.line() + " " : "") + c.element() + " "
                + Numbers.length(options.length(c.clearanceMetres())) + " " + options.lengthSymbol()));
            out.append(Prose.wrap("", "  ", "Lowest conductor above ground here" + wind + ": " + String.join(", ", parts)));
        }
        return out.toString();
    }

    private static List<StationGeometry.Clearance> circuits(StationGeometry geometry) {
        List<String> shieldWires = geometry.wires().stream().filter(StationGeometry.WireAtStation::shieldWire)
            .map(StationGeometry.WireAtStation::elementId).toList();
        return geometry.clearances().stream().filter(clearance -> !shieldWires.contains(clearance.elementId())).toList();
    }

    private static String valueTable(List<EdgeRow> rows, ReportOptions options) {
        boolean modelErrors = modelErrors(rows);
        List<Column> columns = new ArrayList<>(List.of(new Column("", "Load case", Align.LEFT)));
        for (String group : List.of("Left edge", "Right edge", "Greatest within the edges")) {
            columns.addAll(valueColumns(group, modelErrors, options));
        }
        columns.add(new Column("Greatest within the edges", "at\n" + options.lengthSymbol(), Align.DECIMAL));
        TextTable table = new TextTable(columns);
        for (EdgeRow row : rows) {
            PlacedField greatest = greatest(row, options.measure());
            List<String> cells = new ArrayList<>(List.of(row.loadCase().name()));
            cells.addAll(valueCells(row.leftEdge().field(), modelErrors, options));
            cells.addAll(valueCells(row.rightEdge().field(), modelErrors, options));
            cells.addAll(valueCells(greatest.field(), modelErrors, options));
            cells.add(Numbers.length(options.length(greatest.offsetMetres())));
            table.row(cells);
        }
        return table.render();
    }

    /** Columns of one field value: value, numerical error and, where there is one, error of the earth model. */
    static List<Column> valueColumns(String group, boolean modelErrors, ReportOptions options) {
        String pm = options.style().plusMinus();
        List<Column> columns = new ArrayList<>();
        columns.add(new Column(group, options.fieldSymbol(), Align.DECIMAL));
        columns.add(new Column(group, "numerical\n" + pm + options.fieldSymbol(), Align.RIGHT));
        if (modelErrors) {
            columns.add(new Column(group, "earth\n" + pm + options.fieldSymbol(), Align.DECIMAL));
        }
        return columns;
    }

    /** Cells of {@link #valueColumns}. */
    static List<String> valueCells(FieldValue value, boolean modelErrors, ReportOptions options) {
        List<String> cells = new ArrayList<>();
        cells.add(Numbers.field(options.field(value.tesla(options.measure()))));
        cells.add(Numbers.bound(options.field(value.numericalErrorTesla())));
        if (modelErrors) {
            cells.add(Numbers.bound(options.field(value.modelErrorTesla())));
        }
        return cells;
    }

    static PlacedField greatest(EdgeRow row, FieldMeasure measure) {
        return measure == FieldMeasure.MAJOR_AXIS ? row.greatestMajorAxis() : row.greatestResultant();
    }

    static boolean modelErrors(List<EdgeRow> rows) {
        return rows.stream().anyMatch(row -> row.leftEdge().field().modelErrorKnown());
    }

    /**
     * The table as CSV: a record for each station and load case, with both measures. Columns of the comparison with limits repeat for every
     * limit of the table and carry its identifier; they are empty where a limit does not apply.
     */
    public static void csv(EdgeTable table, Units units, Appendable out) {
        List<String> limits = table.rows().stream().flatMap(row -> row.comparisons().stream()).map(c -> c.limit().id()).distinct().toList();
        CsvWriter writer = new CsvWriter(out, csvHeader(limits, units));
        for (EdgeRow row : table.rows()) {
            List<Object> fields = new ArrayList<>(List.of(row.station().id(), row.station().name(),
                units.length().fromMetres(row.station().stationMetres()), row.loadCase().id(), row.loadCase().name(), row.loadCase().basis()));
            for (PlacedField placed : csvPlaces(row)) {
                fields.add(units.length().fromMetres(placed.offsetMetres()));
                fields.addAll(csvValue(placed.field(), units));
            }
            limits.forEach(limit -> fields.addAll(csvLimit(row, limit, units)));
            fields.add(table.evidence().earthModel());
            fields.add(table.evidence().studyDigest());
            writer.record(fields);
        }
    }

    private static List<PlacedField> csvPlaces(EdgeRow row) {
        return List.of(row.leftEdge(), row.rightEdge(), row.greatestResultant(), row.greatestMajorAxis());
    }

    private static List<String> csvHeader(List<String> limits, Units units) {
        String length = "_" + units.length().code();
        String field = "_" + units.field().code();
        List<String> header = new ArrayList<>(List.of("station_id", "station", "station" + length, "load_case_id", "load_case", "load_basis"));
        for (String place : List.of("left_edge", "right_edge", "greatest_resultant", "greatest_major_axis")) {
            header.add(place + "_offset" + length);
            FieldCsv.VALUE_COLUMNS.forEach(column -> header.add(place + "_" + column + field));
        }
        for (String limit : limits) {
            header.add("limit_" + limit + "_level" + field);
            header.add("limit_" + limit + "_measure");
            for (LimitComparison.Where where : LimitComparison.Where.values()) {
                header.add("limit_" + limit + "_margin_" + where.name().toLowerCase(java.util.Locale.ROOT) + field);
            }
            header.add("limit_" + limit + "_verdict");
        }
        header.addAll(List.of("earth_model", "study_sha256"));
        return header;
    }

    private static List<Object> csvValue(FieldValue value, Units units) {
        return FieldCsv.value(value, units);
    }

    private static List<Object> csvLimit(EdgeRow row, String limit, Units units) {
        List<LimitComparison> comparisons = row.comparisons().stream().filter(c -> c.limit().id().equals(limit)).toList();
        List<Object> fields = new ArrayList<>();
        if (comparisons.isEmpty()) {
            fields.addAll(List.of("", ""));
        } else {
            fields.add(units.field().fromTesla(comparisons.get(0).limit().levelTesla()));
            fields.add(FieldCsv.name(comparisons.get(0).limit().measure()));
        }
        for (LimitComparison.Where where : LimitComparison.Where.values()) {
            fields.add(comparisons.stream().filter(c -> c.where() == where).findFirst()
                .map(c -> units.field().fromTesla(c.marginTesla())).orElse(Double.NaN));
        }
        fields.add(comparisons.isEmpty() ? "" : LimitTable.verdict(comparisons).name().toLowerCase(java.util.Locale.ROOT));
        return fields;
    }
}
