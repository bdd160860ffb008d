/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.report;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import spanfield.report.TextTable.Align;
import spanfield.report.TextTable.Column;
import spanfield.study.result.EdgeRow;
import spanfield.study.result.LimitComparison;
import spanfield.study.result.LimitComparison.Verdict;
import spanfield.study.result.LimitComparison.Where;
import spanfield.study.result.LimitInfo;

/** Comparison with limits in text: limits are numbered L1, L2 ... in the order of the study and explained once. */
final class LimitTable {

    private static final int PERCENT_DIGITS = 3;

    private final Map<LimitInfo, String> marks;
    private final ReportOptions options;

    private LimitTable(Map<LimitInfo, String> marks, ReportOptions options) {
        this.marks = marks;
        this.options = options;
    }

    static LimitTable of(List<EdgeRow> rows, ReportOptions options) {
        Map<LimitInfo, String> marks = new LinkedHashMap<>();
        for (EdgeRow row : rows) {
            row.comparisons().forEach(c -> marks.computeIfAbsent(c.limit(), key -> "L" + (marks.size() + 1)));
        }
        return new LimitTable(marks, options);
    }

    /** The comparison at one station; empty without limits. */
    String block(List<EdgeRow> rows) {
        List<Where> places = new ArrayList<>();
        for (Where where : Where.values()) {
            if (rows.stream().flatMap(row -> row.comparisons().stream()).anyMatch(c -> c.where() == where)) {
                places.add(where);
            }
        }
        if (places.isEmpty()) {
            return "";
        }
        TextTable table = new TextTable(columns(places));
        marks.keySet().forEach(limit -> rows.forEach(row -> addRow(table, limit, row, places)));
        return "\n" + table.render();
    }

    private List<Column> columns(List<Where> places) {
        String group = "Margin (limit less value), " + options.fieldSymbol();
        List<Column> columns = new ArrayList<>(List.of(
            new Column("", "Limit", Align.LEFT),
            new Column("", options.fieldSymbol(), Align.RIGHT),
            new Column("", "Load case", Align.LEFT)));
        places.forEach(where -> columns.add(new Column(group, heading(where), Align.DECIMAL)));
        columns.add(new Column("", "Highest,\n% of limit", Align.DECIMAL));
        columns.add(new Column("", "Verdict", Align.LEFT));
        return columns;
    }

    private static String heading(Where where) {
        return switch (where) {
            case LEFT_EDGE -> "left edge";
            case RIGHT_EDGE -> "right edge";
            case GREATEST_WITHIN -> "greatest\nwithin edges";
            case GREATEST_OF_PROFILE -> "greatest\nof profile";
        };
    }

    private void addRow(TextTable table, LimitInfo limit, EdgeRow row, List<Where> places) {
        List<LimitComparison> comparisons = row.comparisons().stream().filter(c -> c.limit().equals(limit)).toList();
        if (comparisons.isEmpty()) {
            return;
        }
        List<String> cells = new ArrayList<>(List.of(marks.get(limit), Numbers.stated(options.field(limit.levelTesla())), row.loadCase().name()));
        for (Where where : places) {
            cells.add(comparisons.stream().filter(c -> c.where() == where).findFirst()
                .map(c -> Numbers.field(options.field(c.marginTesla()))).orElse(""));
        }
        double highest = comparisons.stream().mapToDouble(LimitComparison::fractionOfLevel).max().orElse(Double.NaN);
        cells.add(Numbers.significant(100 * highest, PERCENT_DIGITS));
        cells.add(word(verdict(comparisons)));
        table.row(cells);
    }

    /** How all comparisons went, in a sentence: how many are not below, and which comes nearest to or goes furthest above its limit. */
    static String summary(List<EdgeRow> rows, ReportOptions options) {
        List<LimitComparison> all = rows.stream().flatMap(row -> row.comparisons().stream()).toList();
        if (all.isEmpty()) {
            return "none applies";
        }
        long above = all.stream().filter(c -> c.verdict() == Verdict.ABOVE).count();
        long undecided = all.stream().filter(c -> c.verdict() == Verdict.UNDECIDED).count();
        String counts = above == 0 && undecided == 0 ? "all " + all.size() + " compared values lie below their limits"
            : above + " of " + all.size() + " compared values lie ABOVE their limits" + (undecided == 0 ? "" : ", " + undecided + " undecided");
        LimitComparison worst = all.stream().max(Comparator.comparingDouble(LimitComparison::fractionOfLevel)).orElseThrow();
        EdgeRow row = rows.stream().filter(r -> r.comparisons().stream().anyMatch(c -> c == worst)).findFirst().orElseThrow();
        return counts + "; highest: " + Numbers.significant(100 * worst.fractionOfLevel(), PERCENT_DIGITS) + " % of '" + worst.limit().name()
            + "', " + place(worst.where()) + ", " + row.loadCase().name() + ", " + Terms.station(row.station(), options.units());
    }

    private static String place(Where where) {
        return switch (where) {
            case LEFT_EDGE -> "left edge";
            case RIGHT_EDGE -> "right edge";
            case GREATEST_WITHIN -> "greatest within the edges";
            case GREATEST_OF_PROFILE -> "greatest of the profile";
        };
    }

    /** The worst verdict of comparisons with one limit. */
    static Verdict verdict(List<LimitComparison> comparisons) {
        List<Verdict> order = List.of(Verdict.BELOW, Verdict.UNDECIDED, Verdict.ABOVE);
        return comparisons.stream().map(LimitComparison::verdict).max(Comparator.comparingInt(order::indexOf)).orElseThrow();
    }

    private static String word(Verdict verdict) {
        return switch (verdict) {
            case BELOW -> "below";
            case UNDECIDED -> "undecided";
            case ABOVE -> "ABOVE";
        };
    }

    /** What the marks mean; says so where there are no limits. */
    String legend() {
        if (marks.isEmpty()) {
            return "\nNo limit of the study applies here.\n";
        }
        StringBuilder out = new StringBuilder("\nLimits\n");
        marks.forEach((limit, mark) -> out.append(Prose.wrap(mark + "  ", "    ", Terms.limit(limit, options))));
        out.append(Prose.wrap("", "", "'undecided': the errors stated above do not let it be told. Verdicts follow from the full numbers, not "
            + "from the rounded ones. Local codes and licensed practice decide which limit holds."));
        return out.toString();
    }
}
