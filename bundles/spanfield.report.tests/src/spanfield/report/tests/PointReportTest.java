/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.report.tests;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import spanfield.report.FieldUnit;
import spanfield.report.LengthUnit;
import spanfield.report.PointReport;
import spanfield.report.ReportOptions;
import spanfield.report.Units;
import spanfield.report.tests.support.ResultFixtures;
import spanfield.report.tests.support.Tables;
import spanfield.study.result.PointTable;

/** The field at points as text and CSV. */
class PointReportTest {

    @Test
    void csv_holdsEveryPointAndLoadCase() {
        PointTable table = ResultFixtures.pointTable();
        Units units = new Units(FieldUnit.MILLIGAUSS, LengthUnit.FOOT);
        StringBuilder out = new StringBuilder();
        PointReport.csv(table, List.of("gate, north", ""), units, out);
        List<Map<String, String>> rows = Tables.csv(out.toString());
        assertEquals(6, rows.size());
        Map<String, String> row = rows.get(4);
        assertEquals("2", row.get("point"));
        assertEquals("peak", row.get("load_case_id"));
        assertEquals(LengthUnit.FOOT.fromMetres(-33.25), Double.parseDouble(row.get("offset_ft")));
        assertEquals(LengthUnit.FOOT.fromMetres(1.5), Double.parseDouble(row.get("height_ft")));
        assertEquals(LengthUnit.FOOT.fromMetres(180.5), Double.parseDouble(row.get("plan_y_ft")));
        assertEquals(LengthUnit.FOOT.fromMetres(100.67), Double.parseDouble(row.get("ground_elevation_ft")));
        assertEquals(FieldUnit.MILLIGAUSS.fromTesla(table.cases().get(1).series().value(1).majorAxisTesla()),
            Double.parseDouble(row.get("major_axis_mG")));
        assertEquals("gate, north", rows.get(0).get("point"));
    }

    @Test
    void text_numbersPointsWithoutNames() {
        List<List<String>> cells = Tables.aligned(PointReport.text(ResultFixtures.pointTable(), List.of("gate", ""), ReportOptions.DEFAULT), "Greatest error");
        assertEquals(List.of("gate", "175.00", "0.00", "1.00", "41.24"), cells.get(0).subList(0, 5));
        assertEquals(List.of("2", "180.50", "-33.25", "1.50"), cells.get(1).subList(0, 4));
    }
}
