/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.report.tests;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.junit.jupiter.api.Test;
import spanfield.report.TextTable;
import spanfield.report.TextTable.Align;
import spanfield.report.TextTable.Column;

/** Aligned text. */
class TextTableTest {

    private static TextTable table() {
        TextTable table = new TextTable(List.of(new Column("", "Name", Align.LEFT), new Column("Left edge", "value\n\u00b5T", Align.DECIMAL),
            new Column("Left edge", "error", Align.RIGHT)));
        table.row(List.of("a", "12.34", "1e-7"));
        table.row(List.of("long name", "0.1234", "2.5e-12"));
        table.row(List.of("c", "123", ""));
        return table;
    }

    @Test
    void decimals_standInOneColumn() {
        List<String> lines = table().render().lines().toList();
        int point = lines.get(4).indexOf('.');
        assertEquals(point, lines.get(5).indexOf("0.1234") + 1);
        assertEquals(point, lines.get(6).indexOf("123") + 3);
    }

    @Test
    void headings_standOverTheirColumns() {
        List<String> lines = table().render().lines().toList();
        assertTrue(lines.get(0).contains("Left edge"));
        assertTrue(lines.get(1).strip().equals("value"));
        assertTrue(lines.get(2).startsWith("Name"));
        assertTrue(lines.get(3).startsWith("---------"));
        assertEquals(lines.get(2).indexOf("error") + 5, lines.get(3).length());
    }

    @Test
    void lines_haveNoTrailingBlanks() {
        table().render().lines().forEach(line -> assertEquals(line.stripTrailing(), line));
    }

    @Test
    void wideGroupHeading_widensItsColumns() {
        TextTable table = new TextTable(List.of(new Column("A heading wider than what it spans", "x", Align.RIGHT), new Column("", "y", Align.RIGHT)));
        table.row(List.of("1", "2"));
        List<String> lines = table.render().lines().toList();
        assertEquals("A heading wider than what it spans".length(), lines.get(3).indexOf('1') + 1);
    }

    @Test
    void rowOfAnotherLength_isRefused() {
        assertThrows(IllegalArgumentException.class, () -> table().row(List.of("a")));
    }
}
