/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.report.tests;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static spanfield.report.tests.support.ResultFixtures.EDGE_LIMIT;
import static spanfield.report.tests.support.ResultFixtures.HIGH_LIMIT;
import static spanfield.report.tests.support.ResultFixtures.MAJOR_LIMIT;

import java.util.List;
import java.util.Map;
import java.util.stream.Collectors;
import org.junit.jupiter.api.Test;
import spanfield.model.FieldMeasure;
import spanfield.report.EdgeReport;
import spanfield.report.FieldUnit;
import spanfield.report.LengthUnit;
import spanfield.report.ReportOptions;
import spanfield.report.TextStyle;
import spanfield.report.Units;
import spanfield.report.tests.support.ResultFixtures;
import spanfield.report.tests.support.Tables;
import spanfield.solver.earth.EarthModel;
import spanfield.study.result.EdgeRow;
import spanfield.study.result.EdgeTable;
import spanfield.study.result.LimitComparison;
import spanfield.study.result.PlacedField;

/** The edge table as text and CSV. */
class EdgeReportTest {

    private static final Units AMERICAN = new Units(FieldUnit.MILLIGAUSS, LengthUnit.FOOT);

    /** Relative: half a unit of the fourth digit of a number that begins with 1. */
    private static final double FOUR_DIGITS = 5.0001e-4;

    private static ReportOptions options(Units units, FieldMeasure measure) {
        return new ReportOptions(units, measure, TextStyle.UNICODE, "north.spanfield");
    }

    private static List<Map<String, String>> csv(EdgeTable table, Units units) {
        StringBuilder out = new StringBuilder();
        EdgeReport.csv(table, units, out);
        return Tables.csv(out.toString());
    }

    private static double number(Map<String, String> row, String column) {
        assertTrue(row.containsKey(column), () -> column + " is not in " + row.keySet());
        return Double.parseDouble(row.get(column));
    }

    @Test
    void csv_holdsTheResultsToTheLastDigit() {
        EdgeTable table = ResultFixtures.edgeTable(EDGE_LIMIT, MAJOR_LIMIT);
        for (Units units : List.of(Units.SI, AMERICAN)) {
            List<Map<String, String>> rows = csv(table, units);
            assertEquals(table.rows().size(), rows.size());
            for (int i = 0; i < rows.size(); i++) {
                assertPlace(rows.get(i), "left_edge", table.rows().get(i).leftEdge(), units);
                assertPlace(rows.get(i), "right_edge", table.rows().get(i).rightEdge(), units);
                assertPlace(rows.get(i), "greatest_resultant", table.rows().get(i).greatestResultant(), units);
                assertPlace(rows.get(i), "greatest_major_axis", table.rows().get(i).greatestMajorAxis(), units);
            }
        }
    }

    private static void assertPlace(Map<String, String> row, String place, PlacedField expected, Units units) {
        String field = "_" + units.field().code();
        assertEquals(units.length().fromMetres(expected.offsetMetres()), number(row, place + "_offset_" + units.length().code()));
        assertEquals(units.field().fromTesla(expected.field().resultantTesla()), number(row, place + "_resultant" + field));
        assertEquals(units.field().fromTesla(expected.field().majorAxisTesla()), number(row, place + "_major_axis" + field));
        assertEquals(units.field().fromTesla(expected.field().minorAxisTesla()), number(row, place + "_minor_axis" + field));
        assertEquals(units.field().fromTesla(expected.field().numericalErrorTesla()), number(row, place + "_numerical_error" + field));
        assertEquals(units.field().fromTesla(expected.field().modelErrorTesla()), number(row, place + "_model_error" + field));
    }

    @Test
    void csv_holdsTheMarginOfEveryComparison() {
        EdgeTable table = ResultFixtures.edgeTable(EDGE_LIMIT, HIGH_LIMIT, MAJOR_LIMIT);
        List<Map<String, String>> rows = csv(table, Units.SI);
        for (int i = 0; i < rows.size(); i++) {
            for (LimitComparison comparison : table.rows().get(i).comparisons()) {
                String column = "limit_" + comparison.limit().id() + "_margin_" + comparison.where().name().toLowerCase() + "_uT";
                assertEquals(FieldUnit.MICROTESLA.fromTesla(comparison.marginTesla()), number(rows.get(i), column));
            }
            assertEquals("", rows.get(i).get("limit_edge-20_margin_greatest_within_uT"));
            assertEquals("below", rows.get(i).get("limit_edge-20_verdict"));
            assertEquals("major_axis", rows.get(i).get("limit_major-12_measure"));
        }
        assertEquals("above", rows.get(0).get("limit_major-12_verdict"));
    }

    @Test
    void csv_namesStationCaseAndStudy() {
        Map<String, String> row = csv(ResultFixtures.edgeTable(), Units.SI).get(2);
        assertEquals("mid-2", row.get("station_id"));
        assertEquals("175.0", row.get("station_m"));
        assertEquals("Typical, wind", row.get("load_case"));
        assertEquals("average", row.get("load_basis"));
        assertEquals(ResultFixtures.DIGEST, row.get("study_sha256"));
        assertEquals("EXACT_HALF_SPACE", row.get("earth_model"));
    }

    @Test
    void text_showsTheResultsInAlignedColumns() {
        EdgeTable table = ResultFixtures.edgeTable(EDGE_LIMIT);
        for (FieldMeasure measure : FieldMeasure.values()) {
            for (Units units : List.of(Units.SI, AMERICAN)) {
                List<List<String>> cells = Tables.aligned(EdgeReport.text(table, options(units, measure)), "Station 'Mid-span 2-3'");
                assertEquals(3, cells.size());
                for (int i = 0; i < cells.size(); i++) {
                    EdgeRow row = table.rows().get(i);
                    assertEquals(row.loadCase().name(), cells.get(i).get(0));
                    assertValue(cells.get(i).subList(1, 4), row.leftEdge(), measure, units);
                    assertValue(cells.get(i).subList(4, 7), row.rightEdge(), measure, units);
                    PlacedField greatest = measure == FieldMeasure.RESULTANT ? row.greatestResultant() : row.greatestMajorAxis();
                    assertValue(cells.get(i).subList(7, 10), greatest, measure, units);
                    // half of the last printed digit
                    assertEquals(units.length().fromMetres(greatest.offsetMetres()), Double.parseDouble(cells.get(i).get(10)), 0.005001);
                }
            }
        }
    }

    private static void assertValue(List<String> cells, PlacedField expected, FieldMeasure measure, Units units) {
        double value = units.field().fromTesla(expected.field().tesla(measure));
        assertEquals(value, Double.parseDouble(cells.get(0)), FOUR_DIGITS * value);
        assertTrue(Double.parseDouble(cells.get(1)) >= units.field().fromTesla(expected.field().numericalErrorTesla()));
        assertTrue(Double.parseDouble(cells.get(2)) >= units.field().fromTesla(expected.field().modelErrorTesla()));
    }

    @Test
    void text_showsMarginsAndVerdicts() {
        EdgeTable table = ResultFixtures.edgeTable(EDGE_LIMIT, HIGH_LIMIT, MAJOR_LIMIT);
        List<List<String>> cells = Tables.aligned(EdgeReport.text(table, options(Units.SI, FieldMeasure.RESULTANT)), "Margin (limit less value)");
        assertEquals(9, cells.size());
        double left = 1e6 * table.rows().get(0).comparisons().get(0).marginTesla();
        assertEquals(List.of("L1", "20", "Rating"), cells.get(0).subList(0, 3));
        assertEquals(left, Double.parseDouble(cells.get(0).get(3)), FOUR_DIGITS * left);
        assertEquals("below", cells.get(0).get(8));
        assertEquals("L3", cells.get(6).get(0));
        assertTrue(cells.get(6).get(5).startsWith("-"), "a limit that is exceeded has a negative margin");
        assertEquals("ABOVE", cells.get(6).get(8));
    }

    @Test
    void text_saysHowTheComparisonsWent() {
        String all = EdgeReport.text(ResultFixtures.edgeTable(EDGE_LIMIT), options(Units.SI, FieldMeasure.RESULTANT));
        assertTrue(all.contains("all 6 compared values lie below their limits"), all);
        String some = EdgeReport.text(ResultFixtures.edgeTable(EDGE_LIMIT, MAJOR_LIMIT), options(Units.SI, FieldMeasure.RESULTANT));
        assertTrue(some.contains("3 of 9 compared values lie ABOVE their limits"), some);
        String none = EdgeReport.text(ResultFixtures.edgeTable(), options(Units.SI, FieldMeasure.RESULTANT));
        assertTrue(none.contains("No limit of the study applies here."), none);
    }

    @Test
    void text_isUndecidedWhereTheErrorsDoNotLetItBeTold() {
        PlacedField left = ResultFixtures.placed(0, ResultFixtures.LEFT_EDGE);
        double near = left.field().resultantTesla() + 0.5 * left.field().uncertaintyTesla();
        var limit = new spanfield.study.result.LimitInfo("near", "Near", FieldMeasure.RESULTANT, near, spanfield.model.LimitPlace.EDGE, "", "", "",
            spanfield.model.LimitBasis.USER);
        String text = EdgeReport.text(ResultFixtures.edgeTable(limit), options(Units.SI, FieldMeasure.RESULTANT));
        assertEquals("undecided", Tables.aligned(text, "Margin (limit less value)").get(0).get(6));
        assertTrue(text.contains("0 of 6 compared values lie ABOVE their limits, 1 undecided"), text);
    }

    @Test
    void text_carriesStudyEvidenceAndCautions() {
        String text = EdgeReport.text(ResultFixtures.edgeTable(EDGE_LIMIT, HIGH_LIMIT), options(Units.SI, FieldMeasure.RESULTANT));
        for (String part : List.of("Line North, \"new\" route (north)", "north.spanfield", ResultFixtures.DIGEST, "50 Hz", "exact half-space, 100 \u03a9 m",
            "1 m above the local ground", "Spanfield 0.1.0", "asked 1e-6", "reached 3.4e-7", "Biot-Savart law along the exact catenaries",
            "WARNING: Line 'North' ends in the corridor.", "Footing resistances are left out.", "Live lines can kill.",
            "from memory: confirm it before use", "Company standard, 2020", "Lowest conductor above ground here: North 1 10.85 m")) {
            assertTrue(text.contains(part), () -> "'" + part + "' is missing in:\n" + text);
        }
    }

    @Test
    void text_showsWhereTheCurrentReturns() {
        String text = EdgeReport.text(ResultFixtures.edgeTable(), options(Units.SI, FieldMeasure.RESULTANT));
        List<String> rating = Tables.aligned(text, "Where the current returns").get(0);
        assertEquals(List.of("Rating", "North", "30.00", "0.0", "24.65", "120.5", "27.53", "-129.5"), rating);
        List<String> wire = Tables.aligned(text, "Shield wire  ").get(0);
        assertEquals(List.of("Shield", "North", "induced", "24.65", "120.5"), wire.subList(0, 5));
    }

    @Test
    void text_withoutEarthModel_hasNoEarthColumnAndSaysSo() {
        EdgeTable table = ResultFixtures.edgeTable();
        List<EdgeRow> rows = table.rows().stream().map(EdgeReportTest::withoutModel).toList();
        String text = EdgeReport.text(new EdgeTable(rows, ResultFixtures.evidence(EarthModel.NONE, Double.NaN)), options(Units.SI, FieldMeasure.RESULTANT));
        assertEquals(8, Tables.aligned(text, "Station 'Mid-span 2-3'").get(0).size());
        assertTrue(text.contains("No earth model is active"), text);
        assertTrue(text.contains("none (no current in the earth is modelled)"), text);
        assertFalse(text.contains("NaN"), text);
    }

    private static EdgeRow withoutModel(EdgeRow row) {
        PlacedField left = new PlacedField(row.leftEdge().offsetMetres(), ResultFixtures.withoutModelError(row.leftEdge().field()));
        return new EdgeRow(row.station(), row.loadCase(), left, left, left, left, left, left, List.of());
    }

    @Test
    void text_inAscii_hasNoOtherSigns() {
        EdgeTable table = ResultFixtures.edgeTable(EDGE_LIMIT);
        String text = EdgeReport.text(table, new ReportOptions(AMERICAN, FieldMeasure.RESULTANT, TextStyle.ASCII, "north.spanfield"));
        String other = text.codePoints().filter(c -> c > 126).mapToObj(Character::toString).collect(Collectors.joining());
        assertEquals("", other);
        assertTrue(EdgeReport.text(table, new ReportOptions(Units.SI, FieldMeasure.RESULTANT, TextStyle.ASCII, "")).contains("+-uT"));
    }

    @Test
    void text_fitsAPage() {
        String text = EdgeReport.text(ResultFixtures.edgeTable(EDGE_LIMIT, HIGH_LIMIT, MAJOR_LIMIT), options(AMERICAN, FieldMeasure.RESULTANT));
        text.lines().forEach(line -> assertTrue(line.length() <= 120, () -> line.length() + " characters: " + line));
    }

    @Test
    void report_isTheSameEveryTime() {
        assertEquals(EdgeReport.text(ResultFixtures.edgeTable(EDGE_LIMIT), ReportOptions.DEFAULT),
            EdgeReport.text(ResultFixtures.edgeTable(EDGE_LIMIT), ReportOptions.DEFAULT));
    }
}
