/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.study.tests.checks;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.io.InputStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.jar.Manifest;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import spanfield.model.Bonding;
import spanfield.model.FieldLimit;
import spanfield.model.FieldMeasure;
import spanfield.model.FieldQuantity;
import spanfield.model.LimitPlace;
import spanfield.model.LineEnd;
import spanfield.model.io.StudyFiles;
import spanfield.solver.Progress;
import spanfield.solver.earth.EarthModel;
import spanfield.study.SoftwareVersion;
import spanfield.study.StudyInputException;
import spanfield.study.StudyRun;
import spanfield.study.StudySnapshot;
import spanfield.study.result.EdgeRow;
import spanfield.study.result.EdgeTable;
import spanfield.study.result.Evidence;
import spanfield.study.result.LimitComparison;
import spanfield.study.result.LimitComparison.Verdict;
import spanfield.study.result.LimitComparison.Where;
import spanfield.study.result.Notice;
import spanfield.study.tests.support.Runs;
import spanfield.study.tests.support.StudyMaker;

/** What results say about themselves, comparisons with limits, and chosen parts of a study. */
class EvidenceTest {

    private static StudyMaker earthed() {
        StudyMaker m = StudyMaker.plain();
        m.study.setEarthResistivityOhmMetres(100.0);
        return m;
    }

    private static boolean says(Evidence evidence, String words) {
        return evidence.notices().stream().map(Notice::text).anyMatch(t -> t.contains(words));
    }

    private static String method(Evidence evidence, String topic) {
        return evidence.methods().stream().filter(n -> n.topic().equals(topic)).map(n -> n.text() + " " + n.source()).findFirst().orElse("");
    }

    @Test
    void version_isThatOfTheBundle() throws IOException {
        Path manifest = Path.of("..", "spanfield.study", "META-INF", "MANIFEST.MF");
        try (InputStream in = Files.newInputStream(manifest)) {
            assertEquals(SoftwareVersion.VERSION + ".qualifier", new Manifest(in).getMainAttributes().getValue("Bundle-Version"));
        }
    }

    @Test
    void evidence_statesTheInputsOfTheStudy(@TempDir Path folder) throws Exception {
        StudyMaker m = earthed();
        Path file = folder.resolve("study.spanfield");
        StudyFiles.save(m.study, file);
        StudySnapshot snapshot = StudySnapshot.of(StudyFiles.load(file));
        Evidence e = new StudyRun().edgeTable(snapshot, Progress.NONE).evidence();
        assertEquals(SoftwareVersion.VERSION, e.softwareVersion());
        assertEquals("Test study", e.studyName());
        assertEquals(sha256(file), e.studyDigest(), "digest of the file as saved");
        assertEquals(50, e.frequencyHertz(), 0);
        assertEquals(100, e.earthResistivityOhmMetres(), 0);
        assertEquals(EarthModel.EXACT_HALF_SPACE, e.earthModel());
        assertEquals(1, e.referenceHeightMetres(), 0);
        assertEquals(1e-6, e.accuracyAsked(), 0);
        assertTrue(e.accuracyReached() > 0 && e.accuracyReached() <= 1e-6, "reached " + e.accuracyReached());
        assertTrue(e.offsetResolutionMetres() > 0);
        assertTrue(e.cautions().stream().anyMatch(c -> c.contains("Local codes")), "cautions");
        assertEquals(1, e.currents().size());
        assertEquals(1, e.geometry().size());
    }

    private static String sha256(Path file) throws Exception {
        byte[] digest = java.security.MessageDigest.getInstance("SHA-256").digest(Files.readAllBytes(file));
        StringBuilder text = new StringBuilder();
        for (byte b : digest) {
            text.append(String.format("%02x", b));
        }
        return text.toString();
    }

    @Test
    void everyMethod_namesItsSource() {
        StudyMaker m = earthed();
        StudyMaker.attach(m.study.getStructureTypes().get(0), "S", 0, 24);
        m.shield(m.line(), "shield", "S", Bonding.BONDED);
        Evidence e = Runs.table(m.study).evidence();
        assertTrue(e.methods().stream().noneMatch(n -> n.source().isBlank() || n.text().isBlank()));
        assertTrue(method(e, "Earth").contains("Carson"));
        assertTrue(method(e, "Shield wires").contains("Deri"));
        assertTrue(method(e, "Shield wires").contains("0.5 ohm/km at 20 degrees C"), method(e, "Shield wires"));
        assertTrue(method(e, "Shield wires").contains("footing resistances and line ends are left out"));
        assertTrue(method(e, "Measures").contains("IEEE Std 644"));
        Evidence images = new StudyRun().edgeTable(StudySnapshot.of(m.study).withEarthModel(EarthModel.COMPLEX_IMAGES), Progress.NONE).evidence();
        assertTrue(method(images, "Earth").contains("Deri") && !method(images, "Earth").contains("Carson"), method(images, "Earth"));
        assertEquals("", method(Runs.table(earthed().study).evidence(), "Shield wires"), "no shield wire, no method");
    }

    @Test
    void missingEarth_isSaid() {
        Evidence e = Runs.table(StudyMaker.plain().study).evidence();
        assertEquals(EarthModel.NONE, e.earthModel());
        assertTrue(Double.isNaN(e.earthResistivityOhmMetres()));
        assertTrue(says(e, "no model error can be estimated"));
        assertFalse(says(Runs.table(earthed().study).evidence(), "no model error can be estimated"));
    }

    @Test
    void deadEnd_isWarnedOfInEveryResult() {
        StudyMaker m = earthed();
        m.line().setFinishEnd(LineEnd.DEAD_END);
        Evidence e = Runs.table(m.study).evidence();
        assertTrue(e.notices().stream().anyMatch(n -> n.severity() == Notice.Severity.WARNING && n.text().contains("current path is open")));
        assertTrue(says(e, "has the share of the exact half-space correction"));
    }

    @Test
    void pointsFarBelowTheEarthPlane_areWarnedOf() {
        StudyMaker m = earthed();
        m.study.getCorridor().setCrossSlope(-0.45);
        m.study.getStations().get(0).setFromOffsetMetres(0);
        m.line().getStructures().forEach(s -> s.setHeightAdjustmentMetres(5));
        assertTrue(says(Runs.table(m.study).evidence(), "substitute height"));
        assertFalse(says(Runs.table(earthed().study).evidence(), "substitute height"));
    }

    @Test
    void limits_areComparedWhereTheyApply() {
        StudyMaker m = earthed();
        m.limit("edge", 1);
        FieldLimit within = m.limit("within", 100);
        within.setPlace(LimitPlace.WITHIN);
        within.setMeasure(FieldMeasure.MAJOR_AXIS);
        FieldLimit everywhere = m.limit("everywhere", 100);
        everywhere.setPlace(LimitPlace.EVERYWHERE);
        FieldLimit electric = m.limit("electric", 5e9);
        electric.setQuantity(FieldQuantity.ELECTRIC);
        EdgeTable table = Runs.table(m.study);
        EdgeRow row = table.rows().get(0);
        List<LimitComparison> all = row.comparisons();
        assertEquals(List.of(Where.LEFT_EDGE, Where.RIGHT_EDGE, Where.GREATEST_WITHIN, Where.GREATEST_OF_PROFILE),
            all.stream().map(LimitComparison::where).toList());
        assertEquals(row.leftEdge().field().resultantTesla(), all.get(0).valueTesla(), 0);
        assertEquals(-25, all.get(0).offsetMetres(), 0);
        assertEquals(row.greatestMajorAxis().field().majorAxisTesla(), all.get(2).valueTesla(), 0);
        assertEquals(row.greatestResultantOfProfile().field().resultantTesla(), all.get(3).valueTesla(), 0);
        assertEquals(Verdict.ABOVE, all.get(0).verdict());
        assertEquals(Verdict.BELOW, all.get(2).verdict());
        assertEquals(1e-6 - all.get(0).valueTesla(), all.get(0).marginTesla(), 1e-21);
        assertEquals(all.get(0).valueTesla() / 1e-6, all.get(0).fractionOfLevel(), 1e-12);
        assertTrue(says(table.evidence(), "electric field"));
    }

    @Test
    void limitWithinTheUncertainty_isUndecided() {
        StudyMaker m = earthed();
        double value = Runs.table(m.study).rows().get(0).leftEdge().field().resultantTesla();
        m.limit("edge", 1e6 * value);
        LimitComparison comparison = Runs.table(m.study).rows().get(0).comparisons().get(0);
        assertTrue(comparison.uncertaintyTesla() > 0);
        assertEquals(Verdict.UNDECIDED, comparison.verdict());
    }

    @Test
    void chosenCasesAndStations_areTheirRowsOfTheWholeTable() {
        StudyMaker m = earthed();
        StudyMaker.load(m.loadCase("second"), m.circuit(), 200, 0);
        m.station("structure", 0, -40, 40, 4);
        StudySnapshot whole = StudySnapshot.of(m.study);
        EdgeTable all = new StudyRun().edgeTable(whole, Progress.NONE);
        EdgeTable some = new StudyRun().edgeTable(whole.withCases(List.of("second")).withStations(List.of("structure")), Progress.NONE);
        assertEquals(4, all.rows().size());
        assertEquals(1, some.rows().size());
        EdgeRow expected = all.rows().get(3);
        assertEquals(expected.station(), some.rows().get(0).station());
        Runs.assertSame(expected.leftEdge().field(), some.rows().get(0).leftEdge().field(), 0, "left edge");
        Runs.assertSameGreatest(expected, some.rows().get(0), 1e-7, "place of the maximum found to 1 mm");
    }

    @Test
    void requestsThatCannotBeMet_sayWhatTheStudyHas() {
        StudySnapshot snapshot = StudySnapshot.of(StudyMaker.plain().study);
        String unknown = assertThrows(StudyInputException.class, () -> snapshot.withCases(List.of("peak"))).getMessage();
        assertEquals("The study has no load case 'peak'; it has rating.", unknown);
        assertTrue(assertThrows(StudyInputException.class, () -> snapshot.withStations(List.of("x"))).getMessage().contains("mid-span"));
        assertThrows(StudyInputException.class, () -> snapshot.withStations(List.of()));
        assertThrows(StudyInputException.class, () -> snapshot.withAccuracy(Double.NaN));
        assertThrows(StudyInputException.class, () -> snapshot.withAccuracy(0.5));
        assertTrue(assertThrows(StudyInputException.class, () -> snapshot.withEarthModel(EarthModel.EXACT_HALF_SPACE)).getMessage()
            .contains("resistivity"));
        assertThrows(StudyInputException.class, () -> spanfield.study.result.StationInfo.at(0, 10, -10, 1));
        assertThrows(StudyInputException.class, () -> spanfield.study.result.StationInfo.at(0, -10, 10, 1e-9));
        assertThrows(StudyInputException.class, () -> spanfield.study.result.StationInfo.at(Double.NaN, -10, 10, 1));
    }

    @Test
    void changesOnRequest_areSaidAndLeaveTheDigest() {
        StudySnapshot snapshot = StudySnapshot.of(earthed().study);
        StudySnapshot changed = snapshot.withEarthModel(EarthModel.NONE).withAccuracy(1e-4);
        Evidence e = new StudyRun().edgeTable(changed, Progress.NONE).evidence();
        assertTrue(says(e, "earth model was chosen on request"));
        assertTrue(says(e, "accuracy was asked as 0.0001 on request"));
        assertEquals(snapshot.digest(), e.studyDigest());
        assertEquals(EarthModel.NONE, e.earthModel());
        assertFalse(says(new StudyRun().edgeTable(snapshot, Progress.NONE).evidence(), "on request"));
    }

    @Test
    void windOfALoadCase_hasItsOwnGeometryInTheEvidence() {
        StudyMaker m = earthed();
        var windy = m.loadCase("windy");
        windy.setWindSwingDegrees(25);
        StudyMaker.load(windy, m.circuit(), 500, 0);
        EdgeTable table = Runs.table(m.study);
        assertEquals(2, table.evidence().geometry().size());
        assertNotEquals(table.evidence().geometry().get(0).wires().get(0).offsetMetres(), table.evidence().geometry().get(1).wires().get(0).offsetMetres());
    }
}
