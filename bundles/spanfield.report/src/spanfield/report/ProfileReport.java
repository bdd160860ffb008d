/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.report;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import spanfield.report.TextTable.Align;
import spanfield.report.TextTable.Column;
import spanfield.study.result.EdgeRow;
import spanfield.study.result.FieldValue;
import spanfield.study.result.LateralProfile;
import spanfield.study.result.PlacedField;
import spanfield.study.result.ProfileCase;

/** A lateral profile as text for people and as CSV for programs. */
public final class ProfileReport {

    /** Points nearer to an edge than this, in metres, are the edge: far below any survey, far above rounding. */
    private static final double SAME_OFFSET_METRES = 1e-6;

    private ProfileReport() {
    }

    /** The profile as text: header, edges and greatest values, the points with the edges among them, then what the values rest on. */
    public static String text(LateralProfile profile, ReportOptions options) {
        List<EdgeRow> summaries = profile.cases().stream().map(ProfileCase::summary).toList();
        LimitTable limits = LimitTable.of(summaries, options);
        StringBuilder out = new StringBuilder(ReportFrame.header("Lateral profile of the magnetic field", profile.evidence(), options));
        ReportFrame.entry(out, "Limits", LimitTable.summary(summaries, options));
        out.append('\n').append(EdgeReport.stationBlock(summaries, profile.evidence(), options)).append(limits.block(summaries));
        String length = options.lengthSymbol();
        List<Column> leading = List.of(new Column("", "Offset\n" + length, Align.DECIMAL), new Column("", "Ground\n" + length, Align.DECIMAL));
        List<String> names = profile.cases().stream().map(c -> c.loadCase().name()).toList();
        out.append('\n').append(SeriesTable.render(leading, names, rows(profile, options), options));
        out.append('\n').append(ReportFrame.errorLegend(profile.evidence(), EdgeReport.modelErrors(summaries), options)).append(limits.legend());
        return out.append(ReportFrame.footer(profile.evidence(), options)).toString();
    }

    /** A row with the offset it belongs to, so that the edges can be sorted in. */
    private record PlacedRow(double offsetMetres, SeriesTable.Row row) {
    }

    private static List<SeriesTable.Row> rows(LateralProfile profile, ReportOptions options) {
        double[] offsets = profile.offsetsMetres();
        double[] ground = profile.groundElevationsMetres();
        List<PlacedRow> rows = new ArrayList<>();
        for (int i = 0; i < offsets.length; i++) {
            int point = i;
            List<FieldValue> values = profile.cases().stream().map(c -> c.series().value(point)).toList();
            rows.add(row(offsets[i], Numbers.length(options.length(ground[i])), values, edgeName(profile, offsets[i]), options));
        }
        addEdge(rows, profile, true, options);
        addEdge(rows, profile, false, options);
        rows.sort(Comparator.comparingDouble(PlacedRow::offsetMetres));
        return rows.stream().map(PlacedRow::row).toList();
    }

    private static PlacedRow row(double offset, String ground, List<FieldValue> values, String remark, ReportOptions options) {
        return new PlacedRow(offset, new SeriesTable.Row(List.of(Numbers.length(options.length(offset)), ground), values, remark));
    }

    private static String edgeName(LateralProfile profile, double offset) {
        if (Math.abs(offset - profile.leftEdgeOffsetMetres()) < SAME_OFFSET_METRES) {
            return "left edge";
        }
        return Math.abs(offset - profile.rightEdgeOffsetMetres()) < SAME_OFFSET_METRES ? "right edge" : "";
    }

    /** Adds the row of an edge that is not a point of the profile. */
    private static void addEdge(List<PlacedRow> rows, LateralProfile profile, boolean left, ReportOptions options) {
        double edge = left ? profile.leftEdgeOffsetMetres() : profile.rightEdgeOffsetMetres();
        if (rows.stream().anyMatch(row -> Math.abs(row.offsetMetres() - edge) < SAME_OFFSET_METRES)) {
            return;
        }
        List<FieldValue> values = profile.cases().stream().map(ProfileCase::summary)
            .map(summary -> left ? summary.leftEdge() : summary.rightEdge()).map(PlacedField::field).toList();
        rows.add(row(edge, "", values, left ? "left edge" : "right edge", options));
    }

    /** The profile as CSV: a record for each load case and point, with both measures, the plan components and the errors. */
    public static void csv(LateralProfile profile, Units units, Appendable out) {
        String length = "_" + units.length().code();
        List<String> header = new ArrayList<>(List.of("station_id", "station", "station" + length, "load_case_id", "load_case",
            "offset" + length, "ground_elevation" + length));
        header.addAll(FieldCsv.header(FieldCsv.VALUE_COLUMNS, units));
        header.addAll(FieldCsv.header(FieldCsv.COMPONENT_COLUMNS, units));
        CsvWriter writer = new CsvWriter(out, header);
        double[] offsets = profile.offsetsMetres();
        double[] ground = profile.groundElevationsMetres();
        for (ProfileCase profileCase : profile.cases()) {
            for (int i = 0; i < offsets.length; i++) {
                List<Object> fields = new ArrayList<>(List.of(profile.station().id(), profile.station().name(),
                    units.length().fromMetres(profile.station().stationMetres()), profileCase.loadCase().id(), profileCase.loadCase().name(),
                    units.length().fromMetres(offsets[i]), units.length().fromMetres(ground[i])));
                fields.addAll(FieldCsv.value(profileCase.series().value(i), units));
                fields.addAll(FieldCsv.components(profileCase.series(), i, units));
                writer.record(fields);
            }
        }
    }
}
