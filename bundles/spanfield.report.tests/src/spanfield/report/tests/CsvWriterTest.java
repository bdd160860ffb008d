/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.report.tests;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.util.Arrays;
import java.util.List;
import java.util.Map;
import java.util.Random;
import org.junit.jupiter.api.Test;
import spanfield.report.CsvWriter;
import spanfield.report.tests.support.Tables;

/** RFC 4180 (Shafranovich 2005), section 2: records end with CRLF (1), fields with comma, quote or break are quoted (6), quotes doubled (7). */
class CsvWriterTest {

    @Test
    void fields_areQuotedWhereRfc4180AsksForIt() {
        StringBuilder out = new StringBuilder();
        new CsvWriter(out, List.of("a", "b")).record(List.of("x,\"y\"", "line\nbreak"));
        assertEquals("a,b\r\n\"x,\"\"y\"\"\",\"line\nbreak\"\r\n", out.toString());
    }

    @Test
    void numbers_readBackTheSame() {
        Random random = new Random(5);
        StringBuilder out = new StringBuilder();
        CsvWriter writer = new CsvWriter(out, List.of("value"));
        double[] values = random.doubles(2000).map(d -> (d - 0.5) * Math.pow(10, random.nextInt(40) - 20)).toArray();
        for (double value : values) {
            writer.record(List.of(value));
        }
        List<Map<String, String>> rows = Tables.csv(out.toString());
        for (int i = 0; i < values.length; i++) {
            assertEquals(values[i], Double.parseDouble(rows.get(i).get("value")));
        }
    }

    @Test
    void numbersThatDoNotExist_areEmpty_andZeroHasNoSign() {
        StringBuilder out = new StringBuilder();
        new CsvWriter(out, List.of("a", "b", "c")).record(Arrays.asList(Double.NaN, null, -0.0));
        assertEquals("a,b,c\r\n,,0.0\r\n", out.toString());
    }

    @Test
    void recordOfAnotherLength_isRefused() {
        assertThrows(IllegalArgumentException.class, () -> new CsvWriter(new StringBuilder(), List.of("a")).record(List.of(1.0, 2.0)));
    }
}
