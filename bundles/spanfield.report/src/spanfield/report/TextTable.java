/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.report;

import java.util.ArrayList;
import java.util.List;

/**
 * A table in aligned text. Columns are as wide as their content; headings may have several lines and may share a group heading. Nothing is
 * cut off. Lines have no trailing blanks and end with a line feed.
 */
public final class TextTable {

    /** How the cells of a column are aligned. */
    public enum Align {
        /** At the left side. */
        LEFT,
        /** At the right side. */
        RIGHT,
        /** At the decimal point; cells without one end where the point would stand. */
        DECIMAL
    }

    /**
     * A column.
     *
     * @param group   heading shared with neighbours of the same group; empty for none
     * @param heading heading, lines separated by line feeds
     * @param align   alignment of the cells
     */
    public record Column(String group, String heading, Align align) {
    }

    private static final String GAP = "  ";

    private final List<Column> columns;
    private final List<List<String>> rows = new ArrayList<>();

    /** A table without rows. */
    public TextTable(List<Column> columns) {
        this.columns = List.copyOf(columns);
    }

    /**
     * Adds a row.
     *
     * @throws IllegalArgumentException when the number of cells is not that of the columns
     */
    public void row(List<String> cells) {
        if (cells.size() != columns.size()) {
            throw new IllegalArgumentException("a row of " + cells.size() + " cells in a table of " + columns.size() + " columns");
        }
        rows.add(List.copyOf(cells));
    }

    /** Number of rows. */
    public int size() {
        return rows.size();
    }

    /** The table as text. */
    public String render() {
        List<List<String>> aligned = alignDecimals();
        int[] widths = widths(aligned);
        widenForGroups(widths);
        StringBuilder out = new StringBuilder();
        appendGroups(out, widths);
        appendHeadings(out, widths);
        appendLine(out, rule(widths));
        for (List<String> row : aligned) {
            appendLine(out, line(row, widths));
        }
        return out.toString();
    }

    /** Pads cells of decimal columns on the right so that right-aligning them aligns the points. */
    private List<List<String>> alignDecimals() {
        int[] after = new int[columns.size()];
        for (List<String> row : rows) {
            for (int c = 0; c < after.length; c++) {
                after[c] = Math.max(after[c], behindPoint(row.get(c)));
            }
        }
        List<List<String>> result = new ArrayList<>();
        for (List<String> row : rows) {
            List<String> cells = new ArrayList<>();
            for (int c = 0; c < after.length; c++) {
                boolean decimal = columns.get(c).align() == Align.DECIMAL && !row.get(c).isEmpty();
                cells.add(decimal ? row.get(c) + " ".repeat(after[c] - behindPoint(row.get(c))) : row.get(c));
            }
            result.add(cells);
        }
        return result;
    }

    /** Number of characters from the decimal point on; 0 without a point. */
    private static int behindPoint(String cell) {
        int point = cell.indexOf('.');
        return point < 0 ? 0 : width(cell) - point;
    }

    private int[] widths(List<List<String>> aligned) {
        int[] widths = new int[columns.size()];
        for (int c = 0; c < widths.length; c++) {
            for (String line : columns.get(c).heading().split("\n", -1)) {
                widths[c] = Math.max(widths[c], width(line));
            }
            for (List<String> row : aligned) {
                widths[c] = Math.max(widths[c], width(row.get(c)));
            }
        }
        return widths;
    }

    /** A group heading that is wider than its columns widens them evenly. */
    private void widenForGroups(int[] widths) {
        for (int from = 0; from < widths.length; from = groupEnd(from)) {
            int missing = width(columns.get(from).group()) - groupWidth(widths, from);
            int count = groupEnd(from) - from;
            for (int i = 0; i < missing; i++) {
                widths[from + i % count]++;
            }
        }
    }

    private int groupEnd(int from) {
        int to = from + 1;
        String group = columns.get(from).group();
        while (!group.isEmpty() && to < columns.size() && columns.get(to).group().equals(group)) {
            to++;
        }
        return to;
    }

    private int groupWidth(int[] widths, int from) {
        int total = 0;
        for (int c = from; c < groupEnd(from); c++) {
            total += widths[c] + (c > from ? GAP.length() : 0);
        }
        return total;
    }

    private void appendGroups(StringBuilder out, int[] widths) {
        if (columns.stream().allMatch(column -> column.group().isEmpty())) {
            return;
        }
        StringBuilder line = new StringBuilder();
        for (int from = 0; from < widths.length; from = groupEnd(from)) {
            if (from > 0) {
                line.append(gap(from));
            }
            line.append(centred(columns.get(from).group(), groupWidth(widths, from)));
        }
        appendLine(out, line.toString());
    }

    /** A group heading in the middle of dashes, so that its extent can be seen. */
    private static String centred(String text, int width) {
        if (text.isEmpty()) {
            return " ".repeat(width);
        }
        int rest = width - width(text);
        if (rest < 4) {
            return " ".repeat(rest / 2) + text + " ".repeat(rest - rest / 2);
        }
        int left = (rest - 2) / 2;
        return "-".repeat(left) + " " + text + " " + "-".repeat(rest - 2 - left);
    }

    private void appendHeadings(StringBuilder out, int[] widths) {
        int lines = columns.stream().mapToInt(column -> column.heading().split("\n", -1).length).max().orElse(0);
        for (int l = 0; l < lines; l++) {
            List<String> cells = new ArrayList<>();
            for (Column column : columns) {
                String[] heading = column.heading().split("\n", -1);
                int at = l - (lines - heading.length);
                cells.add(at < 0 ? "" : heading[at]);
            }
            appendLine(out, line(cells, widths));
        }
    }

    private String rule(int[] widths) {
        StringBuilder line = new StringBuilder();
        for (int c = 0; c < widths.length; c++) {
            line.append(c > 0 ? gap(c) : "").append("-".repeat(widths[c]));
        }
        return line.toString();
    }

    private String line(List<String> cells, int[] widths) {
        StringBuilder line = new StringBuilder();
        for (int c = 0; c < widths.length; c++) {
            String fill = " ".repeat(widths[c] - width(cells.get(c)));
            line.append(c > 0 ? gap(c) : "");
            line.append(columns.get(c).align() == Align.LEFT ? cells.get(c) + fill : fill + cells.get(c));
        }
        return line.toString();
    }

    /** Groups stand a little apart. */
    private String gap(int column) {
        return columns.get(column).group().equals(columns.get(column - 1).group()) ? GAP : GAP + " ";
    }

    private static void appendLine(StringBuilder out, String line) {
        out.append(line.stripTrailing()).append('\n');
    }

    private static int width(String text) {
        return text.codePointCount(0, text.length());
    }
}
