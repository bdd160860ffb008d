/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.cli.tests;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.ByteArrayInputStream;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.InputStream;
import java.io.OutputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import spanfield.cli.Cancellation;
import spanfield.cli.ExitCode;
import spanfield.cli.tests.support.Cli;
import spanfield.cli.tests.support.Cli.Outcome;
import spanfield.cli.tests.support.StudyOnDisk;

/** Exit codes, and what is and is not written. */
class FilesTest {

    @TempDir
    private Path folder;

    private List<String> names() throws IOException {
        try (Stream<Path> files = Files.list(folder)) {
            return files.map(file -> file.getFileName().toString()).sorted().toList();
        }
    }

    @Test
    void soundStudy_isChecked() {
        Outcome outcome = Cli.run("check", StudyOnDisk.sound(folder)).done();
        assertTrue(outcome.out().contains("0 errors"), outcome.out());
        assertTrue(outcome.out().contains("the study can be computed."), outcome.out());
    }

    @Test
    void check_listsEveryFindingOfEveryStudy() {
        Path sound = StudyOnDisk.sound(folder);
        Path bad = StudyOnDisk.withErrors(folder);
        Outcome outcome = Cli.run("check", bad, sound);
        assertEquals(ExitCode.STUDY_HAS_ERRORS, outcome.code());
        assertTrue(outcome.out().contains("2 errors"), outcome.out());
        assertTrue(outcome.out().contains("the study can be computed."), outcome.out());
        assertEquals("", outcome.err());
        Outcome csv = Cli.run("check", bad, "--format", "csv");
        assertEquals(ExitCode.STUDY_HAS_ERRORS, csv.code());
        assertEquals(2, csv.out().lines().filter(line -> line.contains(",error,")).count(), csv.out());
    }

    @Test
    void check_goesOnAfterAFileThatCannotBeRead() {
        Outcome outcome = Cli.run("check", folder.resolve("none.spanfield"), StudyOnDisk.withErrors(folder), StudyOnDisk.sound(folder));
        assertEquals(ExitCode.FILE, outcome.code());
        assertTrue(outcome.err().startsWith("spanfield: There is no file '"), outcome.err());
        assertTrue(outcome.out().contains("2 errors") && outcome.out().contains("0 errors"), outcome.out());
    }

    @Test
    void invalidStudy_computesAndWritesNothing() throws IOException {
        Path bad = StudyOnDisk.withErrors(folder);
        Path points = Files.writeString(folder.resolve("points.csv"), "station_m,offset_m,height_m\n0,0,1\n");
        Path old = Files.writeString(folder.resolve("old.csv"), "old");
        List<String> before = names();
        for (Object[] arguments : new Object[][] {{"edges", bad, "--output", old}, {"edges", bad, "--output", folder.resolve("new.csv")},
            {"profile", bad, "--svg", folder.resolve("new.svg"), "--png", old}, {"points", bad, "--at", points, "--output", folder.resolve("new.txt")}}) {
            Outcome outcome = Cli.run(arguments);
            assertEquals(ExitCode.STUDY_HAS_ERRORS, outcome.code());
            assertEquals("", outcome.out());
            assertTrue(outcome.err().startsWith("spanfield: the study has errors; nothing was computed or written"), outcome.err());
            assertTrue(outcome.err().contains("2 errors"), outcome.err());
            assertEquals(2, outcome.err().lines().filter(line -> line.startsWith("  ERROR")).count(), outcome.err());
            assertEquals(before, names());
            assertEquals("old", Files.readString(old));
        }
    }

    @Test
    void missingAndDamagedStudies_areFileErrors() throws IOException {
        Path damaged = Files.writeString(folder.resolve("damaged.spanfield"), "<?xml version=\"1.0\"?><half");
        for (Path file : List.of(folder.resolve("none.spanfield"), folder, damaged)) {
            Outcome outcome = Cli.run("edges", file);
            assertEquals(ExitCode.FILE, outcome.code(), outcome.err());
            assertEquals(1, outcome.err().lines().count(), outcome.err());
            assertEquals("", outcome.out());
        }
    }

    @Test
    void studyFile_isNeverOverwritten() throws IOException {
        Path study = StudyOnDisk.sound(folder);
        byte[] content = Files.readAllBytes(study);
        Path link = Files.createSymbolicLink(folder.resolve("link"), study);
        for (Path output : List.of(study, folder.resolve("./line.spanfield"), link)) {
            for (String option : List.of("--output", "--svg", "--png")) {
                Outcome outcome = Cli.run("profile", study, option, output);
                assertEquals(ExitCode.BAD_ARGUMENTS, outcome.code());
                assertTrue(outcome.err().contains("would overwrite a file that is read"), outcome.err());
                assertArrayEquals(content, Files.readAllBytes(study));
            }
        }
        assertEquals(ExitCode.BAD_ARGUMENTS, Cli.run("check", study, "--output", study).code());
    }

    @Test
    void pointsFile_isNeverOverwritten() throws IOException {
        Path points = Files.writeString(folder.resolve("points.csv"), "station_m,offset_m,height_m\n150,0,1\n");
        assertEquals(ExitCode.BAD_ARGUMENTS, Cli.run("points", StudyOnDisk.sound(folder), "--at", points, "--output", points).code());
        assertEquals("station_m,offset_m,height_m\n150,0,1\n", Files.readString(points));
    }

    @Test
    void outputThatCannotBe_isReportedBeforeComputing() throws IOException {
        Path study = StudyOnDisk.sound(folder);
        Outcome noFolder = Cli.run("edges", study, "--output", folder.resolve("none/edges.csv"));
        assertEquals(ExitCode.FILE, noFolder.code());
        assertTrue(noFolder.err().contains("there is no folder for --output"), noFolder.err());
        Outcome isFolder = Cli.run("edges", study, "--output", folder);
        assertEquals(ExitCode.BAD_ARGUMENTS, isFolder.code());
        assertTrue(isFolder.err().contains("is a folder"), isFolder.err());
        assertEquals(List.of("line.spanfield"), names());
    }

    @Test
    void output_replacesAnOldFileWholeAndLeavesNothingBeside() throws IOException {
        Path study = StudyOnDisk.sound(folder);
        Path output = Files.writeString(folder.resolve("edges.csv"), "old");
        Path link = Files.createSymbolicLink(folder.resolve("latest.csv"), output);
        Cli.run("edges", study, "--format", "csv", "--output", link).done();
        assertTrue(Files.isSymbolicLink(link), "a link stays a link");
        assertEquals(6, Cli.csv(Files.readString(output)).size());
        assertEquals(List.of("edges.csv", "latest.csv", "line.spanfield"), names());
    }

    @Test
    void cancelledComputation_writesNothing() throws IOException {
        Path study = StudyOnDisk.sound(folder);
        Path old = Files.writeString(folder.resolve("old.csv"), "old");
        for (String verb : List.of("edges", "profile")) {
            Cancellation cancellation = new Cancellation();
            cancellation.cancel();
            Outcome outcome = Cli.run(StandardCharsets.UTF_8, new ByteArrayInputStream(new byte[0]), cancellation, verb, study, "--station", "Mid-span",
                "--output", old);
            assertEquals(ExitCode.COMPUTATION, outcome.code());
            assertEquals("spanfield: cancelled; nothing was written\n", outcome.err());
            assertEquals("", outcome.out());
            assertEquals("old", Files.readString(old));
        }
    }

    @Test
    void mistakeInTheProgram_leavesALogAndNoStackTrace() throws IOException {
        InputStream broken = new InputStream() {
            @Override
            public int read() {
                throw new IllegalStateException("planted");
            }
        };
        Outcome outcome = Cli.run(StandardCharsets.UTF_8, broken, new Cancellation(), "points", StudyOnDisk.sound(folder), "--at", "-");
        assertEquals(ExitCode.INTERNAL, outcome.code());
        assertEquals(1, outcome.err().lines().count(), outcome.err());
        assertTrue(outcome.err().startsWith("spanfield: internal error (IllegalStateException); please report it with the log "), outcome.err());
        Path log = Path.of(outcome.err().strip().substring(outcome.err().indexOf("log ") + 4));
        String text = Files.readString(log);
        Files.delete(log);
        assertTrue(text.contains("planted") && text.contains("points"), text);
    }

    /** A standard output that fails. */
    private static OutputStream failing(String message) {
        return new OutputStream() {
            @Override
            public void write(int b) throws IOException {
                throw new IOException(message);
            }
        };
    }

    @Test
    void fullDisk_behindStandardOutput_isReported() {
        ByteArrayOutputStream err = new ByteArrayOutputStream();
        ExitCode code = Cli.run(StandardCharsets.UTF_8, new ByteArrayInputStream(new byte[0]), failing("No space left on device"), err, new Cancellation(),
            "edges", StudyOnDisk.sound(folder));
        assertEquals(ExitCode.FILE, code);
        assertEquals("spanfield: standard output cannot be written: No space left on device\n", err.toString(StandardCharsets.UTF_8));
    }

    @Test
    void readerThatHasGone_isNoFailure() {
        ByteArrayOutputStream err = new ByteArrayOutputStream();
        ExitCode code = Cli.run(StandardCharsets.UTF_8, new ByteArrayInputStream(new byte[0]), failing("Broken pipe"), err, new Cancellation(), "edges",
            StudyOnDisk.sound(folder));
        assertEquals(ExitCode.DONE, code);
        assertFalse(err.size() > 0, err.toString(StandardCharsets.UTF_8));
    }

    @Test
    void exitCodes_areThoseDocumented() {
        assertEquals(List.of(0, 1, 2, 3, 4, 5), Stream.of(ExitCode.values()).map(ExitCode::number).toList());
    }
}
