/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.report.tests;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import spanfield.report.FieldUnit;
import spanfield.report.LengthUnit;
import spanfield.report.ProfileReport;
import spanfield.report.ReportOptions;
import spanfield.report.Units;
import spanfield.report.tests.support.ResultFixtures;
import spanfield.report.tests.support.Tables;
import spanfield.study.result.LateralProfile;
import spanfield.study.result.Phasor;
import spanfield.study.result.ProfileCase;

/** A lateral profile as text and CSV. */
class ProfileReportTest {

    private static final List<String> AXES = List.of("bx", "by", "bz");

    @Test
    void csv_holdsEveryPointOfEveryLoadCase() {
        LateralProfile profile = ResultFixtures.profile();
        for (Units units : List.of(Units.SI, new Units(FieldUnit.MILLIGAUSS, LengthUnit.FOOT))) {
            StringBuilder out = new StringBuilder();
            ProfileReport.csv(profile, units, out);
            List<Map<String, String>> rows = Tables.csv(out.toString());
            assertEquals(profile.size() * profile.cases().size(), rows.size());
            int at = 0;
            for (ProfileCase profileCase : profile.cases()) {
                for (int i = 0; i < profile.size(); i++) {
                    assertRow(rows.get(at++), profile, profileCase, i, units);
                }
            }
        }
    }

    private static void assertRow(Map<String, String> row, LateralProfile profile, ProfileCase profileCase, int i, Units units) {
        String length = "_" + units.length().code();
        String field = "_" + units.field().code();
        assertEquals(profileCase.loadCase().id(), row.get("load_case_id"));
        assertEquals(units.length().fromMetres(profile.offsetsMetres()[i]), Double.parseDouble(row.get("offset" + length)));
        assertEquals(units.length().fromMetres(profile.groundElevationsMetres()[i]), Double.parseDouble(row.get("ground_elevation" + length)));
        assertEquals(units.field().fromTesla(profileCase.series().value(i).resultantTesla()), Double.parseDouble(row.get("resultant" + field)));
        assertEquals(units.field().fromTesla(profileCase.series().value(i).modelErrorTesla()), Double.parseDouble(row.get("model_error" + field)));
        for (int c = 0; c < 3; c++) {
            Phasor phasor = profileCase.series().component(c, i);
            assertEquals(units.field().fromTesla(phasor.real()), Double.parseDouble(row.get(AXES.get(c) + "_real" + field)));
            assertEquals(units.field().fromTesla(phasor.imaginary()), Double.parseDouble(row.get(AXES.get(c) + "_imaginary" + field)));
        }
    }

    @Test
    void text_showsThePointsWithTheEdgesAmongThem() {
        LateralProfile profile = ResultFixtures.profile(ResultFixtures.EDGE_LIMIT);
        List<List<String>> cells = Tables.aligned(ProfileReport.text(profile, ReportOptions.DEFAULT), "Greatest error");
        // 61 points; neither edge (-25 m, 25.4 m) is one of them
        assertEquals(profile.size() + 2, cells.size());
        double before = Double.NEGATIVE_INFINITY;
        for (List<String> row : cells) {
            double offset = Double.parseDouble(row.get(0));
            assertTrue(offset > before, "offsets rise");
            before = offset;
            double expected = 1e6 * ResultFixtures.field(0, offset).resultantTesla();
            // half a unit of the fourth digit
            assertEquals(expected, Double.parseDouble(row.get(2)), 5.0001e-4 * expected);
        }
        assertEquals(1, cells.stream().filter(row -> row.get(0).equals("-25.00") && row.get(7).equals("left edge")).count());
        assertEquals(1, cells.stream().filter(row -> row.get(0).equals("25.40") && row.get(7).equals("right edge")).count());
    }

    @Test
    void text_showsTheGreatestErrorsOfTheLoadCases() {
        List<String> middle = Tables.aligned(ProfileReport.text(ResultFixtures.profile(), ReportOptions.DEFAULT), "Greatest error").stream()
            .filter(row -> row.get(0).equals("0.00")).findFirst().orElseThrow();
        assertTrue(Double.parseDouble(middle.get(5)) >= 1e6 * ResultFixtures.field(0, 0).numericalErrorTesla());
        assertTrue(Double.parseDouble(middle.get(6)) >= 1e6 * ResultFixtures.field(0, 0).modelErrorTesla());
    }
}
