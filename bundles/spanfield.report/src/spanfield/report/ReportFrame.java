/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.report;

import java.util.ArrayList;
import java.util.List;
import spanfield.report.TextTable.Align;
import spanfield.report.TextTable.Column;
import spanfield.study.result.CurrentTable;
import spanfield.study.result.Evidence;
import spanfield.study.result.MethodNote;
import spanfield.study.result.Notice;
import spanfield.study.result.Phasor;

/** What stands above and below the numbers of a report for people. */
final class ReportFrame {

    private static final int LABEL_WIDTH = 13;

    private ReportFrame() {
    }

    /**
     * The header: what was computed, of which study, and under which assumptions.
     *
     * @param title what the report is
     */
    static String header(String title, Evidence evidence, ReportOptions options) {
        StringBuilder out = new StringBuilder(title).append('\n').append("=".repeat(title.length())).append('\n');
        String name = evidence.studyName().isBlank() ? evidence.studyId() : evidence.studyName() + " (" + evidence.studyId() + ")";
        entry(out, "Study", name);
        if (!options.studyFile().isEmpty()) {
            entry(out, "File", options.studyFile());
        }
        entry(out, "SHA-256", evidence.studyDigest());
        entry(out, "Frequency", Terms.frequency(evidence));
        entry(out, "Earth", Terms.earth(evidence, options.style()));
        entry(out, "Height", Numbers.brief(options.length(evidence.referenceHeightMetres()), Numbers.LENGTH_DECIMALS) + " "
            + options.lengthSymbol() + " above the local ground");
        entry(out, "Field", Terms.measure(options.measure()) + " of the magnetic flux density, RMS, in " + options.fieldSymbol());
        entry(out, "Software", "Spanfield " + evidence.softwareVersion());
        return out.toString();
    }

    /** One more line of the header. */
    static void entry(StringBuilder out, String label, String text) {
        out.append(Prose.wrap(label + " ".repeat(LABEL_WIDTH - label.length()), " ".repeat(LABEL_WIDTH), text));
    }

    /** What the two kinds of plus-minus in the tables mean. */
    static String errorLegend(Evidence evidence, boolean modelErrors, ReportOptions options) {
        String pm = options.style().plusMinus();
        String numerical = "numerical " + pm + ": bound of the error of the computation itself, rounded up.";
        String earth = modelErrors
            ? " earth " + pm + ": difference between the two earth models, an estimate of what the choice of the earth model means."
            : " No earth model is active, so there is no estimate of what the choice of an earth model means.";
        return Prose.wrap("", "", numerical + earth + " Neither covers the input: loads, sags, ground levels, positions.");
    }

    /** The footer: currents, methods, notices, cautions. */
    static String footer(Evidence evidence, ReportOptions options) {
        StringBuilder out = new StringBuilder();
        out.append(currents(evidence, options));
        heading(out, "How the values came about");
        bullet(out, accuracy(evidence, options));
        evidence.methods().forEach(method -> bullet(out, method(method)));
        if (!evidence.notices().isEmpty()) {
            heading(out, "Notices");
            evidence.notices().forEach(notice -> bullet(out, notice(notice)));
        }
        if (!evidence.cautions().isEmpty()) {
            heading(out, "Cautions");
            evidence.cautions().forEach(caution -> bullet(out, caution));
        }
        return out.toString();
    }

    private static void heading(StringBuilder out, String text) {
        out.append('\n').append(text).append('\n');
    }

    private static void bullet(StringBuilder out, String text) {
        out.append(Prose.wrap("- ", "  ", text));
    }

    private static String accuracy(Evidence evidence, ReportOptions options) {
        String reached = "Numerical accuracy: asked " + Numbers.stated(evidence.accuracyAsked()) + " of the resultant, reached "
            + Numbers.bound(evidence.accuracyReached()) + ".";
        if (Double.isNaN(evidence.offsetResolutionMetres())) {
            return reached;
        }
        return reached + " Offsets of the greatest values are exact to "
            + Numbers.stated(options.length(evidence.offsetResolutionMetres())) + " " + options.lengthSymbol() + ".";
    }

    private static String method(MethodNote method) {
        String source = method.source().isBlank() ? "" : " [" + method.source() + "]";
        return method.topic() + ": " + method.text() + source;
    }

    private static String notice(Notice notice) {
        return notice.severity() == Notice.Severity.WARNING ? "WARNING: " + notice.text() : notice.text();
    }

    private static String currents(Evidence evidence, ReportOptions options) {
        if (evidence.currents().stream().allMatch(table -> table.splits().isEmpty())) {
            return "";
        }
        String degrees = options.style().degrees().strip();
        TextTable table = new TextTable(List.of(
            new Column("", "Load case", Align.LEFT),
            new Column("", "Lines", Align.LEFT),
            new Column("Sum of the phases", "A", Align.DECIMAL),
            new Column("Sum of the phases", degrees, Align.DECIMAL),
            new Column("Shield wires", "A", Align.DECIMAL),
            new Column("Shield wires", degrees, Align.DECIMAL),
            new Column("Earth", "A", Align.DECIMAL),
            new Column("Earth", degrees, Align.DECIMAL)));
        for (CurrentTable currents : evidence.currents()) {
            for (CurrentTable.CurrentSplit split : currents.splits()) {
                List<String> cells = new ArrayList<>(List.of(currents.loadCase().name(), String.join(", ", split.lines())));
                cells.addAll(current(split.phaseResidual()));
                cells.addAll(current(split.shieldTotal()));
                cells.addAll(current(split.earth()));
                table.row(cells);
            }
        }
        return "\nWhere the current returns (RMS, angle)\n" + table.render() + shieldWires(evidence, options);
    }

    /** Currents of the single shield wires, load cases side by side. */
    private static String shieldWires(Evidence evidence, ReportOptions options) {
        StringBuilder out = new StringBuilder();
        for (int from = 0; from < evidence.currents().size(); from += CASES_IN_BLOCK) {
            List<CurrentTable> block = evidence.currents().subList(from, Math.min(from + CASES_IN_BLOCK, evidence.currents().size()));
            if (!block.get(0).shieldWires().isEmpty()) {
                out.append('\n').append(shieldWireTable(block, options));
            }
        }
        return out.toString();
    }

    private static String shieldWireTable(List<CurrentTable> block, ReportOptions options) {
        List<Column> columns = new ArrayList<>(List.of(new Column("", "Shield wire", Align.LEFT), new Column("", "Line", Align.LEFT),
            new Column("", "Current", Align.LEFT)));
        for (CurrentTable table : block) {
            columns.add(new Column(table.loadCase().name(), "A", Align.DECIMAL));
            columns.add(new Column(table.loadCase().name(), options.style().degrees().strip(), Align.DECIMAL));
        }
        TextTable text = new TextTable(columns);
        for (int w = 0; w < block.get(0).shieldWires().size(); w++) {
            CurrentTable.ShieldCurrent wire = block.get(0).shieldWires().get(w);
            List<String> cells = new ArrayList<>(List.of(wire.shieldWire(), wire.line(), origin(wire.origin())));
            for (CurrentTable table : block) {
                cells.addAll(current(table.shieldWires().get(w).amperes()));
            }
            text.row(cells);
        }
        return text.render();
    }

    private static String origin(CurrentTable.ShieldCurrent.Origin origin) {
        return switch (origin) {
            case INDUCED -> "induced";
            case GIVEN -> "given";
            case INSULATED -> "none: insulated";
            case NOT_INDUCED -> "none is induced";
        };
    }

    /** Load cases side by side in the table of shield wires. */
    private static final int CASES_IN_BLOCK = 4;

    private static final int CURRENT_DIGITS = 4;

    /** Currents below this magnitude in amperes are rounding of balanced sums of hundreds of amperes, not currents: their angle means nothing. */
    private static final double LEAST_CURRENT_AMPERES = 1e-6;

    private static List<String> current(Phasor amperes) {
        if (amperes.magnitude() < LEAST_CURRENT_AMPERES) {
            return List.of("0", Numbers.NONE);
        }
        return List.of(Numbers.significant(amperes.magnitude(), CURRENT_DIGITS), Numbers.fixed(amperes.angleDegrees(), 1));
    }
}
