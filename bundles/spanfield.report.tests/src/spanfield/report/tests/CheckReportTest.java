/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.report.tests;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import spanfield.model.validation.Finding;
import spanfield.model.validation.Severity;
import spanfield.report.CheckReport;
import spanfield.report.tests.support.Tables;

/** Findings as text and CSV. */
class CheckReportTest {

    private static final Finding ERROR = new Finding(Severity.ERROR, "Circuit_PhasesDiffer", "Two phases, \"A\" and B. Move one.", "line 'N'", null, null);
    private static final Finding WARNING = new Finding(Severity.WARNING, "Line_Closed", "The line ends.", "line 'M'", null, null);

    @Test
    void text_showsMessagePlaceRuleAndCount() {
        String text = CheckReport.text("a.spanfield", List.of(ERROR, WARNING));
        for (String part : List.of("a.spanfield", "ERROR", "Two phases, \"A\" and B. Move one.", "in line 'N'", "[Circuit_PhasesDiffer]",
            "1 error, 1 warning, 0 notes: correct the errors; nothing is computed before.")) {
            assertTrue(text.contains(part), text);
        }
        assertTrue(CheckReport.text("a", List.of(WARNING)).contains("0 errors, 1 warning, 0 notes: the study can be computed."));
    }

    @Test
    void csv_readsBack() {
        StringBuilder out = new StringBuilder();
        CheckReport.csv("a.spanfield", List.of(ERROR), CheckReport.csv(out));
        Map<String, String> row = Tables.csv(out.toString()).get(0);
        assertEquals("error", row.get("severity"));
        assertEquals(ERROR.message(), row.get("message"));
        assertEquals(ERROR.rule(), row.get("rule"));
    }
}
