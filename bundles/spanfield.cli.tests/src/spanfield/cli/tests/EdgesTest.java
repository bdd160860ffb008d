/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.cli.tests;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import spanfield.cli.Cancellation;
import spanfield.cli.tests.support.Cli;
import spanfield.cli.tests.support.Cli.Outcome;
import spanfield.cli.tests.support.StudyOnDisk;
import spanfield.model.LineEnd;
import spanfield.model.Study;
import spanfield.report.FieldUnit;
import spanfield.report.LengthUnit;
import spanfield.solver.Progress;
import spanfield.study.StudyRun;
import spanfield.study.StudySnapshot;
import spanfield.study.result.EdgeTable;

/** The verb edges gives what the study computes. */
class EdgesTest {

    @TempDir
    private Path folder;

    private static EdgeTable expected() {
        return new StudyRun().edgeTable(StudySnapshot.of(StudyOnDisk.study()), Progress.NONE);
    }

    @Test
    void csv_equalsTheResultsOfTheStudy() {
        EdgeTable table = expected();
        List<Map<String, String>> rows = Cli.csv(Cli.run("edges", StudyOnDisk.sound(folder), "--format", "csv").done().out());
        assertEquals(6, rows.size());
        for (int i = 0; i < rows.size(); i++) {
            assertEquals(table.rows().get(i).loadCase().id(), rows.get(i).get("load_case_id"));
            assertEquals(table.rows().get(i).station().id(), rows.get(i).get("station_id"));
            assertEquals(1e6 * table.rows().get(i).leftEdge().field().resultantTesla(), Double.parseDouble(rows.get(i).get("left_edge_resultant_uT")));
            assertEquals(1e6 * table.rows().get(i).greatestMajorAxis().field().majorAxisTesla(),
                Double.parseDouble(rows.get(i).get("greatest_major_axis_major_axis_uT")));
            assertEquals(1e6 * table.rows().get(i).rightEdge().field().modelErrorTesla(),
                Double.parseDouble(rows.get(i).get("right_edge_model_error_uT")));
            assertEquals(table.evidence().studyDigest(), rows.get(i).get("study_sha256"));
        }
    }

    @Test
    void units_convertExactly() {
        EdgeTable table = expected();
        List<Map<String, String>> rows =
            Cli.csv(Cli.run("edges", StudyOnDisk.sound(folder), "--format", "csv", "--units", "mG", "--length", "ft").done().out());
        for (int i = 0; i < rows.size(); i++) {
            assertEquals(FieldUnit.MILLIGAUSS.fromTesla(table.rows().get(i).rightEdge().field().resultantTesla()),
                Double.parseDouble(rows.get(i).get("right_edge_resultant_mG")));
            assertEquals(LengthUnit.FOOT.fromMetres(20), Double.parseDouble(rows.get(i).get("right_edge_offset_ft")));
            assertFalse(rows.get(i).keySet().stream().anyMatch(column -> column.endsWith("_uT") || column.endsWith("_m")), rows.get(i).keySet().toString());
        }
    }

    @Test
    void text_hasUnitsInItsHeadings() {
        String text = Cli.run("edges", StudyOnDisk.sound(folder), "--units", "mG", "--length", "ft").done().out();
        assertTrue(text.contains("RMS, in mG"), text);
        assertTrue(text.contains("left edge -65.62 ft, right edge 65.62 ft"), text);
        assertFalse(text.contains("\u00b5T"), text);
    }

    @Test
    void case_andStation_choose() {
        Path study = StudyOnDisk.sound(folder);
        List<Map<String, String>> rows = Cli.csv(Cli.run("edges", study, "--format", "csv", "--case", "typical", "--case", "loadcase-rating",
            "--station", "Mid-span 2-3").done().out());
        assertEquals(List.of("loadcase-rating", "loadcase-typical"), rows.stream().map(row -> row.get("load_case_id")).toList());
        assertEquals("profilestation-mid-span-2-3", rows.get(0).get("station_id"));
    }

    @Test
    void measure_choosesTheColumnOfTheText() {
        Path study = StudyOnDisk.sound(folder);
        String resultant = Cli.run("edges", study).done().out();
        String major = Cli.run("edges", study, "--measure", "major").done().out();
        assertTrue(resultant.contains("resultant of the magnetic flux density"), resultant);
        assertTrue(major.contains("major semi-axis of the magnetic flux density"), major);
        EdgeTable table = expected();
        assertTrue(major.contains(spanfield.report.Numbers.field(1e6 * table.rows().get(0).leftEdge().field().majorAxisTesla())), major);
    }

    @Test
    void earthAndAccuracy_areThoseAskedForAndSaidToBe() {
        Path study = StudyOnDisk.sound(folder);
        String none = Cli.run("edges", study, "--earth", "none").done().out();
        assertTrue(none.contains("none (no current in the earth is modelled)"), none);
        assertTrue(none.contains("The earth model was chosen on request"), none);
        String images = Cli.run("edges", study, "--earth", "images", "--accuracy", "1e-4").done().out();
        assertTrue(images.contains("complex images, 100"), images);
        assertTrue(images.contains("asked 0.0001 of the resultant"), images);
    }

    @Test
    void output_isTheSameInAFile() throws IOException {
        Path study = StudyOnDisk.sound(folder);
        for (String format : List.of("text", "csv")) {
            Path file = folder.resolve("edges." + format);
            String screen = Cli.run("edges", study, "--format", format).done().out();
            assertEquals("", Cli.run("edges", study, "--format", format, "--output", file).done().out());
            assertEquals(screen, Files.readString(file));
        }
    }

    @Test
    void text_inAnAsciiLocale_isAscii() {
        Outcome outcome = Cli.run(StandardCharsets.US_ASCII, new ByteArrayInputStream(new byte[0]), new Cancellation(), "edges", StudyOnDisk.sound(folder));
        assertEquals("", outcome.err());
        assertTrue(outcome.out().chars().allMatch(c -> c < 127), outcome.out());
        assertTrue(outcome.out().contains("in uT"), outcome.out());
    }

    @Test
    void warnings_goToStandardErrorWhereCsvHasNoPlaceForThem() {
        Study study = StudyOnDisk.study();
        study.getLines().get(0).setFinishEnd(LineEnd.DEAD_END);
        Path file = StudyOnDisk.save(study, folder, "end.spanfield");
        Outcome csv = Cli.run("edges", file, "--format", "csv");
        assertTrue(csv.err().startsWith("spanfield: warning: "), csv.err());
        Cli.csv(csv.out());
        assertTrue(Cli.run("edges", file).done().out().contains("- WARNING: "));
    }
}
