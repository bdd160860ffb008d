/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.cli.tests;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import spanfield.cli.ExitCode;
import spanfield.cli.tests.support.Cli;
import spanfield.cli.tests.support.Cli.Outcome;
import spanfield.cli.tests.support.StudyOnDisk;
import spanfield.solver.Progress;
import spanfield.study.FieldPoint;
import spanfield.study.StudyRun;
import spanfield.study.StudySnapshot;
import spanfield.study.result.PointTable;

/** The verb points: CSV in, field out; bad rows are reported with their lines. */
class PointsTest {

    @TempDir
    private Path folder;

    private static final PointTable EXPECTED = new StudyRun().points(StudySnapshot.of(StudyOnDisk.study()),
        List.of(new FieldPoint(150, -20, 1), new FieldPoint(150, 7.5, 1.5)), Progress.NONE);

    private Outcome points(String csv) {
        return Cli.runWithInput(csv, "points", StudyOnDisk.sound(folder), "--at", "-", "--format", "csv");
    }

    private static void assertExpected(Outcome outcome) {
        List<Map<String, String>> rows = Cli.csv(outcome.done().out());
        assertEquals(6, rows.size());
        for (int p = 0; p < 2; p++) {
            for (int c = 0; c < 3; c++) {
                Map<String, String> row = rows.get(3 * p + c);
                assertEquals(EXPECTED.cases().get(c).loadCase().id(), row.get("load_case_id"));
                assertEquals(1e6 * EXPECTED.cases().get(c).series().value(p).resultantTesla(), Double.parseDouble(row.get("resultant_uT")));
                assertEquals(1e6 * EXPECTED.cases().get(c).series().component(2, p).imaginary(), Double.parseDouble(row.get("bz_imaginary_uT")));
            }
        }
    }

    @ParameterizedTest
    @ValueSource(strings = {
        "station_m,offset_m,height_m\n150,-20,1\n150,7.5,1.5\n",
        "station_m,offset_m,height_m\r\n150,-20,1\r\n150,7.5,1.5\r\n",
        "station_m,offset_m,height_m\r150,-20,1\r150,7.5,1.5",
        "\ufeffstation_m,offset_m,height_m\n150,-20,1\n150,7.5,1.5",
        "\"station_m\",\"offset_m\",\"height_m\"\n\"150\",\"-20\",\"1\"\n \"150\" ,\"7.5\",1.5\n",
        "height_m,station_m,offset_m\n1,150,-20\n1.5,150,7.5\n",
        "Station_m, Offset_M ,height_m\n 150 , -20 , 1 \n+1.5e2,7.50,.15e1\n",
        "station_m,offset_m,height_m\n\n150,-20,1\n   \n150,7.5,1.5\n\n\n"})
    void everyWayToWriteTheSamePoints_isRead(String csv) {
        assertExpected(points(csv));
    }

    @Test
    void file_isReadLikeStandardInput() throws IOException {
        Path file = Files.writeString(folder.resolve("points.csv"), "station_m,offset_m,height_m\n150,-20,1\n150,7.5,1.5\n");
        assertExpected(Cli.run("points", StudyOnDisk.sound(folder), "--at", file, "--format", "csv"));
    }

    @Test
    void feet_areConverted() {
        Map<String, String> row = Cli.csv(points("station_ft,offset_m,height_ft\n100,-20,3.28\n").done().out()).get(0);
        // 100 ft are 30.48 m exactly; the tolerance is that of a few roundings of double precision
        assertEquals(30.48, Double.parseDouble(row.get("station_m")), 1e-13);
        assertEquals(0.999744, Double.parseDouble(row.get("height_m")), 1e-13);
    }

    @Test
    void names_goThrough() {
        Outcome outcome = Cli.runWithInput("name,station_m,offset_m,height_m\n\"gate, \"\"old\"\"\",150,-20,1\n,150,7.5,1.5\n", "points",
            StudyOnDisk.sound(folder), "--at", "-");
        assertTrue(outcome.done().out().contains("\ngate, \"old\" "), outcome.out());
    }

    @Test
    void otherColumns_areIgnoredAndSaidToBe() {
        Outcome outcome = points("id,station_m,offset_m,height_m,Remark\n7,150,-20,1,x\n8,150,7.5,1.5,\n");
        assertEquals(ExitCode.DONE, outcome.code());
        assertEquals("spanfield: columns of standard input that are not used: id, Remark", outcome.err().strip());
    }

    private void assertRefused(String csv, String... messages) {
        Outcome outcome = points(csv);
        assertEquals(ExitCode.FILE, outcome.code(), outcome.err());
        assertEquals("", outcome.out());
        assertEquals(List.of(messages), outcome.err().lines().map(line -> line.replace("spanfield: ", "")).toList());
    }

    @Test
    void emptyInput_isRefused() {
        assertRefused("", "standard input is empty; its first line must be a header such as station_m,offset_m,height_m");
        assertRefused("\n \n", "standard input is empty; its first line must be a header such as station_m,offset_m,height_m");
        assertRefused("station_m,offset_m,height_m\n", "standard input has a header but no points; add a row for each point");
    }

    @Test
    void header_mustHaveEveryColumnWithItsUnit() {
        assertRefused("station_m,offset_m\n1,2\n", "standard input, line 1: the header has no column height_m (or height_ft)");
        assertRefused("\nstation,offset_m,height_m\n1,2,3\n",
            "standard input, line 2: the header has the column 'station' without a unit; name it station_m or station_ft");
        assertRefused("station_km,offset_m,height_m\n1,2,3\n",
            "standard input, line 1: the header has the column 'station_km' with the unknown unit 'km'; name it station_m or station_ft");
        assertRefused("station_m,station_ft,offset_m,height_m\n1,2,3,4\n",
            "standard input, line 1: the header has two columns for the station; keep one");
        assertRefused("station_m;offset_m;height_m\n1;2;3\n",
            "standard input, line 1: the header is not separated by commas; separate columns by commas, and write numbers with a decimal dot");
    }

    @Test
    void badRows_areReportedWithTheirLines() {
        assertRefused("station_m,offset_m,height_m\n150,0,1\n150,x,1\n150,0\n150,,1\n150,NaN,1e999\n1d,0x10,1\n",
            "standard input, line 3: the offset 'x' is not a number",
            "standard input, line 4: has 2 fields where the header has 3",
            "standard input, line 5: the offset is missing",
            "standard input, line 6: the offset 'NaN' is not a number",
            "standard input, line 6: the height '1e999' is not a number",
            "standard input, line 7: the station '1d' is not a number",
            "standard input, line 7: the offset '0x10' is not a number");
    }

    @Test
    void manyBadRows_areCounted() {
        Outcome outcome = points("station_m,offset_m,height_m\n" + "a,0,1\n".repeat(25));
        assertEquals(11, outcome.err().lines().count());
        assertTrue(outcome.err().endsWith("spanfield: and 15 more bad rows\n"), outcome.err());
    }

    @Test
    void lines_areThoseThatAnEditorShows() {
        for (String end : List.of("\n", "\r\n", "\r")) {
            String header = "station_m,offset_m,height_m" + end;
            assertRefused(header + "150,0,1" + end + end + "150,x,1" + end, "standard input, line 4: the offset 'x' is not a number");
            Outcome below = points(header + end + end + "150,0,1" + end + "150,0,-1" + end);
            assertTrue(below.err().startsWith("spanfield: standard input, line 5: "), below.err());
        }
    }

    @Test
    void lines_areCountedThroughQuotedBreaks() {
        assertRefused("name,station_m,offset_m,height_m\n\"two\nlines\",150,0,1\nb,150,x,1\n", "standard input, line 4: the offset 'x' is not a number");
    }

    @Test
    void brokenQuotes_areRefused() {
        assertRefused("name,station_m,offset_m,height_m\n\"open,150,0,1\n", "standard input, line 2: a quote is opened and not closed");
        assertRefused("name,station_m,offset_m,height_m\n\"a\"b,150,0,1\n",
            "standard input, line 2: text follows a closing quote; double the quotes within a field");
    }

    @Test
    void textThatIsNotUtf8_isRefused() throws IOException {
        Path file = Files.write(folder.resolve("points.csv"), "name,station_m,offset_m,height_m\nM\u00fchle,1,2,3\n".getBytes(StandardCharsets.ISO_8859_1));
        Outcome outcome = Cli.run("points", StudyOnDisk.sound(folder), "--at", file);
        assertEquals(ExitCode.FILE, outcome.code());
        assertTrue(outcome.err().contains("is not UTF-8 text; save it as CSV in UTF-8"), outcome.err());
    }

    @Test
    void pointsThatCannotBeComputed_areReportedWithTheirLines() {
        Outcome outcome = points("station_m,offset_m,height_m\n150,0,1\n150,0,-1\n0,0,18\n");
        assertEquals(ExitCode.FILE, outcome.code());
        List<String> lines = outcome.err().lines().toList();
        assertEquals(2, lines.size(), outcome.err());
        assertTrue(lines.get(0).startsWith("spanfield: standard input, line 3: ") && lines.get(0).contains("below the ground"), outcome.err());
        assertTrue(lines.get(1).startsWith("spanfield: standard input, line 4: ") && lines.get(1).contains("lies in"), outcome.err());
    }

    @Test
    void missingFile_isReported() {
        Outcome outcome = Cli.run("points", StudyOnDisk.sound(folder), "--at", folder.resolve("none.csv"));
        assertEquals(ExitCode.FILE, outcome.code());
        assertTrue(outcome.err().contains("there is no file '"), outcome.err());
        Outcome directory = Cli.run("points", StudyOnDisk.sound(folder), "--at", folder);
        assertEquals(ExitCode.FILE, directory.code());
        assertTrue(directory.err().contains("is a folder"), directory.err());
    }
}
