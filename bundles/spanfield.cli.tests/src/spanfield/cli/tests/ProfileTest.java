/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.cli.tests;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import javax.imageio.ImageIO;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import spanfield.cli.ExitCode;
import spanfield.cli.tests.support.Cli;
import spanfield.cli.tests.support.Cli.Outcome;
import spanfield.cli.tests.support.StudyOnDisk;
import spanfield.solver.Progress;
import spanfield.study.StudyRun;
import spanfield.study.StudySnapshot;
import spanfield.study.result.LateralProfile;
import spanfield.study.result.StationInfo;

/** The verb profile: table and pictures. */
class ProfileTest {

    @TempDir
    private Path folder;

    private static LateralProfile expected(int station) {
        StudySnapshot snapshot = StudySnapshot.of(StudyOnDisk.study());
        return new StudyRun().profile(snapshot, snapshot.stations().get(station), Progress.NONE);
    }

    private static void assertProfile(LateralProfile profile, List<Map<String, String>> rows) {
        assertEquals(profile.size() * profile.cases().size(), rows.size());
        for (int i = 0; i < profile.size(); i++) {
            assertEquals(profile.offsetsMetres()[i], Double.parseDouble(rows.get(i).get("offset_m")));
            assertEquals(1e6 * profile.cases().get(0).series().value(i).resultantTesla(), Double.parseDouble(rows.get(i).get("resultant_uT")));
        }
    }

    @Test
    void firstStation_isTakenAndSaidToBe() {
        Outcome outcome = Cli.run("profile", StudyOnDisk.sound(folder), "--format", "csv");
        assertEquals(ExitCode.DONE, outcome.code());
        assertTrue(outcome.err().contains("the profile is that of the first station; --station chooses another: "), outcome.err());
        assertProfile(expected(0), Cli.csv(outcome.out()));
    }

    @Test
    void station_byNameOrIdentifier() {
        Path study = StudyOnDisk.sound(folder);
        for (String station : List.of("Mid-span 2-3", "profilestation-mid-span-2-3", "MID-SPAN 2-3")) {
            assertProfile(expected(1), Cli.csv(Cli.run("profile", study, "--format", "csv", "--station", station).done().out()));
        }
    }

    @Test
    void station_byPosition_borrowsTheExtentOfTheNearest() {
        Path study = StudyOnDisk.sound(folder);
        StudySnapshot snapshot = StudySnapshot.of(StudyOnDisk.study());
        LateralProfile profile = new StudyRun().profile(snapshot, StationInfo.at(-30.48, -40, 50, 5), Progress.NONE);
        assertProfile(profile, Cli.csv(Cli.run("profile", study, "--format", "csv", "--station", "-30.48").done().out()));
        List<Map<String, String>> feet = Cli.csv(Cli.run("profile", study, "--format", "csv", "--station", "-100", "--length", "ft").done().out());
        assertEquals(-100, Double.parseDouble(feet.get(0).get("station_ft")), 1e-12);
        assertEquals(1e6 * profile.cases().get(0).series().value(3).resultantTesla(), Double.parseDouble(feet.get(3).get("resultant_uT")), 1e-12);
    }

    @Test
    void pictures_areWrittenBesideTheTable() throws IOException {
        Path svg = folder.resolve("p.svg");
        Path png = folder.resolve("p.png");
        Path pdf = folder.resolve("p.pdf");
        Path csv = folder.resolve("p.csv");
        Cli.run("profile", StudyOnDisk.sound(folder), "--station", "Mid-span", "--format", "csv", "--output", csv, "--svg", svg, "--pdf", pdf, "--png", png,
            "--width", "800", "--units", "mG").done();
        assertTrue(Files.readString(pdf, java.nio.charset.StandardCharsets.ISO_8859_1).startsWith("%PDF-"));
        String drawing = Files.readString(svg);
        for (String part : List.of("Left edge \u221220 m", "Right edge 20 m", "Edge limit: 20 mG", "Rating:", "Peak:", "Typical:", "mG RMS")) {
            assertTrue(drawing.contains(part), part);
        }
        assertEquals(800, ImageIO.read(png.toFile()).getWidth());
        assertEquals(75, Cli.csv(Files.readString(csv)).size());
    }

    @Test
    void text_holdsSummaryPointsAndEdges() {
        String text = Cli.run("profile", StudyOnDisk.sound(folder), "--station", "Mid-span").done().out();
        for (String part : List.of("Lateral profile of the magnetic field", "Station 'Mid-span' at 150 m", "left edge", "right edge", "Cautions")) {
            assertTrue(text.contains(part), text);
        }
    }

    @Test
    void twoOutputsInOneFile_areRefused() {
        Path file = folder.resolve("same");
        Outcome outcome = Cli.run("profile", StudyOnDisk.sound(folder), "--svg", file, "--png", folder.resolve("./same"));
        assertEquals(ExitCode.BAD_ARGUMENTS, outcome.code());
        assertTrue(outcome.err().contains("is named for two outputs"), outcome.err());
        assertFalse(Files.exists(file));
    }

    @Test
    void stationInAConductor_isRefused() {
        var study = StudyOnDisk.study();
        // The wires hang at 18 m at the structures: a reference height of 18 m puts the profile at a structure into them.
        study.setReferenceHeightMetres(18);
        study.getStations().forEach(station -> station.setSpacingMetres(4));
        Outcome outcome = Cli.run("profile", StudyOnDisk.save(study, folder, "high.spanfield"), "--station", "0");
        assertEquals(ExitCode.BAD_ARGUMENTS, outcome.code(), outcome.err());
        assertTrue(outcome.err().contains("lies in"), outcome.err());
    }
}
