/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.report.tests.support;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/** Reads tables back, independently of the code that wrote them. */
public final class Tables {

    private Tables() {
    }

    /** Records of RFC 4180 text as maps from heading to field. Fails on anything that RFC 4180 does not allow. */
    public static List<Map<String, String>> csv(String text) {
        List<List<String>> records = records(text);
        List<Map<String, String>> rows = new ArrayList<>();
        for (List<String> record : records.subList(1, records.size())) {
            if (record.size() != records.get(0).size()) {
                throw new AssertionError("a record of " + record.size() + " fields under " + records.get(0).size() + " headings");
            }
            Map<String, String> row = new LinkedHashMap<>();
            for (int i = 0; i < record.size(); i++) {
                if (row.put(records.get(0).get(i), record.get(i)) != null) {
                    throw new AssertionError("two columns '" + records.get(0).get(i) + "'");
                }
            }
            rows.add(row);
        }
        return rows;
    }

    private static List<List<String>> records(String text) {
        List<List<String>> records = new ArrayList<>();
        List<String> record = new ArrayList<>();
        StringBuilder field = new StringBuilder();
        boolean quoted = false;
        for (int i = 0; i < text.length(); i++) {
            char c = text.charAt(i);
            if (quoted) {
                if (c != '"') {
                    field.append(c);
                } else if (i + 1 < text.length() && text.charAt(i + 1) == '"') {
                    field.append('"');
                    i++;
                } else {
                    quoted = false;
                }
            } else if (c == '"') {
                quoted = true;
            } else if (c == ',' || c == '\r') {
                record.add(field.toString());
                field.setLength(0);
                if (c == '\r') {
                    if (text.charAt(++i) != '\n') {
                        throw new AssertionError("a carriage return without a line feed");
                    }
                    records.add(record);
                    record = new ArrayList<>();
                }
            } else if (c == '\n') {
                throw new AssertionError("a line feed without a carriage return");
            } else {
                field.append(c);
            }
        }
        if (quoted || field.length() > 0 || !record.isEmpty()) {
            throw new AssertionError("the last record is not ended");
        }
        return records;
    }

    /**
     * Cells of the first aligned table behind a marker: the line of dashes tells the columns, every cell must stay within its column and
     * the blanks between columns must be blank.
     */
    public static List<List<String>> aligned(String text, String marker) {
        List<String> lines = text.substring(text.indexOf(marker)).lines().toList();
        int rule = 0;
        while (!lines.get(rule).matches("-+( +-+)+")) {
            rule++;
        }
        List<List<String>> rows = new ArrayList<>();
        for (int i = rule + 1; i < lines.size() && !lines.get(i).isBlank(); i++) {
            rows.add(cells(lines.get(rule), lines.get(i)));
        }
        return rows;
    }

    private static List<String> cells(String rule, String line) {
        List<String> cells = new ArrayList<>();
        int at = 0;
        while (at < rule.length()) {
            int end = at;
            boolean dash = rule.charAt(at) == '-';
            while (end < rule.length() && (rule.charAt(end) == '-') == dash) {
                end++;
            }
            String cell = at >= line.length() ? "" : line.substring(at, Math.min(end, line.length()));
            if (dash) {
                cells.add(cell.strip());
            } else if (!cell.isBlank()) {
                throw new AssertionError("text between the columns: '" + cell + "' in: " + line);
            }
            at = end;
        }
        if (line.length() > rule.length()) {
            throw new AssertionError("text beyond the columns: " + line);
        }
        return cells;
    }
}
