/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.report;

import java.util.List;
import java.util.Locale;
import spanfield.model.validation.Finding;
import spanfield.model.validation.Severity;

/** Findings about a study as text for people and as CSV for programs. */
public final class CheckReport {

    private CheckReport() {
    }

    /**
     * The findings of one study, then their count.
     *
     * @param studyFile name of the study file
     */
    public static String text(String studyFile, List<Finding> findings) {
        StringBuilder out = new StringBuilder(studyFile).append('\n');
        for (Finding finding : findings) {
            out.append(Prose.wrap(label(finding.severity()), " ".repeat(LABEL_WIDTH), finding.message()));
            out.append(Prose.wrap(" ".repeat(LABEL_WIDTH), " ".repeat(LABEL_WIDTH), "in " + finding.place() + "  [" + finding.rule() + "]"));
        }
        return out.append(summary(findings)).append('\n').toString();
    }

    private static final int LABEL_WIDTH = 11;

    private static String label(Severity severity) {
        String word = severity == Severity.ERROR ? "  ERROR" : severity == Severity.WARNING ? "  warning" : "  note";
        return word + " ".repeat(LABEL_WIDTH - word.length());
    }

    /** The count of findings in a sentence. */
    public static String summary(List<Finding> findings) {
        String counts = count(findings, Severity.ERROR, "error") + ", " + count(findings, Severity.WARNING, "warning") + ", "
            + count(findings, Severity.INFO, "note");
        boolean sound = findings.stream().noneMatch(Finding::isError);
        return "  " + counts + (sound ? ": the study can be computed." : ": correct the errors; nothing is computed before.");
    }

    private static String count(List<Finding> findings, Severity severity, String word) {
        long count = findings.stream().filter(finding -> finding.severity() == severity).count();
        return count + " " + word + (count == 1 ? "" : "s");
    }

    /** The header of the CSV of findings. */
    public static CsvWriter csv(Appendable out) {
        return new CsvWriter(out, List.of("study_file", "severity", "rule", "place", "message"));
    }

    /** Adds the findings of one study to a CSV. */
    public static void csv(String studyFile, List<Finding> findings, CsvWriter writer) {
        findings.forEach(finding -> writer.record(List.of(studyFile, finding.severity().name().toLowerCase(Locale.ROOT), finding.rule(),
            finding.place(), finding.message())));
    }
}
