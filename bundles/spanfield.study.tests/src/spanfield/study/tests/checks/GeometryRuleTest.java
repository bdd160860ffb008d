/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.study.tests.checks;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertSame;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Arrays;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import java.util.stream.Collectors;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import spanfield.model.ClearanceStringing;
import spanfield.model.EarthModel;
import spanfield.model.ElevationPoint;
import spanfield.model.GroundPoint;
import spanfield.model.Line;
import spanfield.model.LineEnd;
import spanfield.model.SpanfieldFactory;
import spanfield.model.StructureType;
import spanfield.model.validation.Finding;
import spanfield.model.validation.Severity;
import spanfield.study.GeometryRule;
import spanfield.study.InvalidStudyException;
import spanfield.study.StudyCheck;
import spanfield.study.StudyRun;
import spanfield.study.StudySnapshot;
import spanfield.study.tests.support.RandomStudies;
import spanfield.study.tests.support.Runs;
import spanfield.study.tests.support.StudyMaker;

/** Each rule about wires in space, broken alone. */
class GeometryRuleTest {

    private StudyMaker m;

    @BeforeEach
    void soundStudy() {
        m = StudyMaker.plain();
        m.study.setEarthResistivityOhmMetres(100.0);
        assertEquals(List.of(), StudyCheck.check(m.study));
    }

    /** The rule is the only one that does not hold; its finding has the severity of the rule and points at an object. */
    private Finding assertOnly(GeometryRule rule) {
        List<Finding> findings = StudyCheck.check(m.study);
        Set<String> rules = findings.stream().map(Finding::rule).collect(Collectors.toSet());
        assertEquals(Set.of(rule.ruleName()), rules, findings.toString());
        Finding first = findings.get(0);
        assertEquals(rule.severity(), first.severity());
        assertTrue(first.object() != null, "points at an object");
        assertTrue(first.message().endsWith(".") && !first.message().contains("NaN"), first.message());
        if (rule.severity() == Severity.ERROR) {
            InvalidStudyException refused = assertThrows(InvalidStudyException.class, () -> StudySnapshot.of(m.study));
            assertEquals(findings, refused.findings());
        } else {
            StudySnapshot snapshot = StudySnapshot.of(m.study);
            assertTrue(snapshot.notices().stream().anyMatch(n -> n.text().equals(first.message())), "results carry the warning");
        }
        return first;
    }

    @Test
    void structureThatFacesBackwards() {
        m.line().getStructures().get(2).setTurnDegrees(180.0);
        Finding finding = assertOnly(GeometryRule.STRUCTURE_FACES_ALONG_LINE);
        assertSame(m.line().getStructures().get(2), finding.object());
    }

    @Test
    void lineThatFoldsBack() {
        m.line().getStructures().get(4).setStationMetres(100);
        m.line().getStructures().get(4).setOffsetMetres(30);
        List<Finding> findings = StudyCheck.check(m.study);
        // the model warns of the order of the structures as well; its rule knows no corridor bends and stops at 100 degrees
        assertEquals(Set.of(GeometryRule.STRUCTURE_TURN_NOT_FOLDING_BACK.ruleName(), "Line_StructuresInOrder"),
            findings.stream().map(Finding::rule).collect(Collectors.toSet()));
        assertTrue(findings.get(0).isError());
        assertSame(m.line().getStructures().get(3), findings.get(0).object());
    }

    @Test
    void attachmentUnderGround() {
        m.line().getStructures().get(1).setBaseElevationMetres(-20.0);
        Finding finding = assertOnly(GeometryRule.STRUCTURE_WIRES_ABOVE_GROUND);
        assertSame(m.line().getStructures().get(1), finding.object());
    }

    @Test
    void catenaryConstantTooSmallForTheSpan() {
        m.line().getSections().get(0).setPhaseStringing(StudyMaker.constant(90));
        Finding finding = assertOnly(GeometryRule.STRINGING_CONSTANT_FITS_SPANS);
        assertSame(m.line().getSections().get(0).getPhaseStringing(), finding.object());
    }

    @Test
    void catenaryConstantTooSmallForTheRise() {
        // 300 m of level span hang well with c = 150 m, but the last one rises by 1400 m
        m.line().getStructures().get(4).setBaseElevationMetres(1400.0);
        m.line().getStructures().forEach(s -> s.setHeightAdjustmentMetres(100));
        m.line().getSections().get(0).setPhaseStringing(StudyMaker.constant(150));
        assertOnly(GeometryRule.STRINGING_CONSTANT_FITS_SPANS);
    }

    @Test
    void sagGreaterThanAnyWireCanHave() {
        m.line().getSections().get(0).setPhaseStringing(StudyMaker.sag(300));
        assertOnly(GeometryRule.STRINGING_SAG_FITS_SPAN);
    }

    @Test
    void clearanceAboveTheAttachments() {
        ClearanceStringing rule = SpanfieldFactory.eINSTANCE.createClearanceStringing();
        rule.setClearanceMetres(16.5);
        m.line().getSections().get(0).setPhaseStringing(rule);
        Finding finding = assertOnly(GeometryRule.STRINGING_CLEARANCE_REACHABLE);
        assertTrue(finding.message().contains("even straight wires come as near as 16 m"), finding.message());
    }

    @Test
    void wireThroughTheGround() {
        m.line().getSections().get(0).setPhaseStringing(StudyMaker.sag(17));
        // beside it, nothing else: the shallow ends keep the points of the profile clear of wires
        Finding finding = assertOnly(GeometryRule.SPAN_WIRES_ABOVE_GROUND);
        assertTrue(finding.message().contains("1 m below the ground"), finding.message());
        assertTrue(finding.message().contains("150 m from"), finding.message());
    }

    @Test
    void wireThroughAHillBetweenSurveyedPoints() {
        for (double[] point : new double[][] {{-100, 0}, {20, 0}, {40, 14}, {60, 0}}) {
            ElevationPoint e = SpanfieldFactory.eINSTANCE.createElevationPoint();
            e.setStationMetres(point[0]);
            e.setElevationMetres(point[1]);
            m.study.getCorridor().getCentrelineElevations().add(e);
        }
        Finding finding = assertOnly(GeometryRule.SPAN_WIRES_ABOVE_GROUND);
        assertTrue(finding.message().contains("40 m from"), finding.message());
    }

    @Test
    void clearanceLowerThanUsual() {
        m.line().getSections().get(0).setPhaseStringing(StudyMaker.sag(11));
        Finding finding = assertOnly(GeometryRule.SPAN_CLEARANCE_USUAL);
        // 5 m and 6 mm for each of 132 kV
        assertTrue(finding.message().contains("as near as 5 m") && finding.message().contains("5.792 m is usual"), finding.message());
    }

    @Test
    void clearanceLowerThanUsualOnlyInWind() {
        GroundPoint low = SpanfieldFactory.eINSTANCE.createGroundPoint();
        low.setOffsetMetres(8);
        GroundPoint high = SpanfieldFactory.eINSTANCE.createGroundPoint();
        high.setOffsetMetres(10);
        high.setElevationMetres(7);
        m.study.getCorridor().getGroundPoints().addAll(List.of(low, high));
        m.loadCase().setWindSwingDegrees(50);
        Finding finding = assertOnly(GeometryRule.SPAN_CLEARANCE_USUAL);
        assertTrue(finding.message().contains("with a wind swing of 50 degrees"), finding.message());
    }

    @Test
    void wiresThatRunIntoEachOther() {
        // exceptions let the middle phase of a second circuit sag through the lower wires
        StructureType type = m.study.getStructureTypes().get(0);
        StudyMaker.attach(type, "U", -6, 20);
        StudyMaker.attach(type, "V", 0, 24);
        StudyMaker.attach(type, "W", 6, 24);
        StudyMaker.load(m.loadCase(), m.circuit(m.line(), "second", 132e3, "U", "V", "W"), 100, 0);
        var slack = SpanfieldFactory.eINSTANCE.createWireStringing();
        slack.getWires().add(m.line().getCircuits().get(1));
        slack.setStringing(StudyMaker.sag(10));
        m.line().getSections().get(0).getExceptions().add(slack);
        // 20 - 10 = 16 - 6: the two wires on offset -6 meet at mid-span
        Finding finding = assertOnly(GeometryRule.WIRES_APART);
        assertTrue(finding.message().contains("phase A"), finding.message());
    }

    @Test
    void crossingLineThroughWires() {
        // the middle wire meets the others a quarter of the way along a span of 300 m, where 6 m of sag leave 4.5 m; its neighbours stay clear
        crossing(16 - 4.5, 40);
        assertOnly(GeometryRule.WIRES_APART);
    }

    @Test
    void crossingLineNearWires() {
        // a quarter of the way along a span of 300 m and 6 m of sag the wire hangs 4.5 m low; 0.6 m above it
        crossing(16 - 4.5 + 0.6, 2);
        Finding finding = assertOnly(GeometryRule.WIRES_DISTANCE_USUAL);
        // 0.1 m and 7.5 mm for each of 132 kV
        assertTrue(finding.message().contains("1.09 m is usual"), finding.message());
        assertEquals(3 * 3, StudyCheck.check(m.study).size(), "each of three wires with each of three");
    }

    @Test
    void crossingLineFarAbove_isSound() {
        crossing(16, 2);
        assertEquals(List.of(), StudyCheck.check(m.study));
    }

    /** A straight level line across, its middle wire at station 75. */
    private void crossing(double height, double spacing) {
        StructureType type = m.type("crossing");
        for (int i = 0; i < 3; i++) {
            StudyMaker.attach(type, "X" + i, spacing * (i - 1), height);
        }
        Line line = m.line("crossing", type, StudyMaker.sag(StudyMaker.STRAIGHT_SAG), -80, 75);
        StudyMaker.structure(line, type, 75, 80);
        StudyMaker.load(m.loadCase(), m.circuit(line, "across", 33e3, "X0", "X1", "X2"), 100, 0);
    }

    @Test
    void profilePointInAWire() {
        m.study.setReferenceHeightMetres(10);
        // mid-span of the wires at -6, 0 and 6 m is 10 m high; the points of the profile are 5 m apart, one of them at 0
        Finding finding = assertOnly(GeometryRule.STATION_POINTS_OUTSIDE_WIRES);
        assertSame(m.study.getStations().get(0), finding.object());
    }

    @Test
    void wireBetweenTwoPointsOfTheProfile() {
        m.study.setReferenceHeightMetres(10);
        m.study.getStations().get(0).setFromOffsetMetres(2.5);
        m.study.getStations().get(0).setToOffsetMetres(22.5);
        assertOnly(GeometryRule.STATION_POINTS_OUTSIDE_WIRES);
    }

    @Test
    void deadEnd() {
        m.line().setStartEnd(LineEnd.DEAD_END);
        Finding finding = assertOnly(GeometryRule.LINE_CURRENT_PATH_CLOSED);
        assertSame(m.line(), finding.object());
    }

    @Test
    void lineFarBelowTheEarthPlane() {
        // 1.2 km of line at 0 and as much at 200 m: the plane lies in between
        ElevationPoint low = SpanfieldFactory.eINSTANCE.createElevationPoint();
        low.setStationMetres(700);
        ElevationPoint high = SpanfieldFactory.eINSTANCE.createElevationPoint();
        high.setStationMetres(800);
        high.setElevationMetres(200);
        m.study.getCorridor().getCentrelineElevations().addAll(List.of(low, high));
        Line other = m.line("upper", m.study.getStructureTypes().get(0), StudyMaker.sag(6), 0, 1000, 1300, 1600, 1900, 2200);
        other.getStructures().forEach(s -> s.setOffsetMetres(200));
        StudyMaker.load(m.loadCase(), m.circuit(other, "second", 132e3, "L", "M", "R"), 100, 0);
        // the tail of the lower line, which the checks of clearance leave alone, passes under the upper one
        Finding finding = assertOnly(GeometryRule.STUDY_EARTH_PLANE_BELOW_WIRES);
        assertSame(m.line(), finding.object());
    }

    @Test
    void profilePointsBelowEveryImage() {
        m.study.setEarthResistivityOhmMetres(0.01);
        GroundPoint edge = SpanfieldFactory.eINSTANCE.createGroundPoint();
        edge.setOffsetMetres(12);
        GroundPoint pit = SpanfieldFactory.eINSTANCE.createGroundPoint();
        pit.setOffsetMetres(45);
        pit.setElevationMetres(-60);
        m.study.getCorridor().getGroundPoints().addAll(List.of(edge, pit));
        assertOnly(GeometryRule.STUDY_EARTH_IMAGE_DEFINED);
    }

    @Test
    void everyRule_isTestedHere() {
        Set<GeometryRule> tested = new HashSet<>(List.of(GeometryRule.STRUCTURE_FACES_ALONG_LINE, GeometryRule.STRUCTURE_TURN_NOT_FOLDING_BACK,
            GeometryRule.STRUCTURE_WIRES_ABOVE_GROUND, GeometryRule.STRINGING_CONSTANT_FITS_SPANS, GeometryRule.STRINGING_SAG_FITS_SPAN,
            GeometryRule.STRINGING_CLEARANCE_REACHABLE, GeometryRule.SPAN_WIRES_ABOVE_GROUND, GeometryRule.SPAN_CLEARANCE_USUAL,
            GeometryRule.WIRES_APART, GeometryRule.WIRES_DISTANCE_USUAL, GeometryRule.STATION_POINTS_OUTSIDE_WIRES,
            GeometryRule.LINE_CURRENT_PATH_CLOSED, GeometryRule.STUDY_EARTH_PLANE_BELOW_WIRES, GeometryRule.STUDY_EARTH_IMAGE_DEFINED));
        assertEquals(new HashSet<>(Arrays.asList(GeometryRule.values())), tested);
        assertEquals(GeometryRule.values().length, Arrays.stream(GeometryRule.values()).map(GeometryRule::ruleName).distinct().count());
    }

    @Test
    void errorsOfTheModel_keepGeometryFromBeingBuilt() {
        m.line().getSections().get(0).setPhaseStringing(StudyMaker.sag(17));
        m.circuit().getPhases().get(0).setAttachment("nowhere");
        List<Finding> findings = StudyCheck.check(m.study);
        assertTrue(findings.stream().anyMatch(f -> f.rule().startsWith("Wire_AttachmentExists")), findings.toString());
        assertFalse(findings.stream().anyMatch(f -> f.rule().equals(GeometryRule.SPAN_WIRES_ABOVE_GROUND.ruleName())), findings.toString());
    }

    @Test
    void linesJoinedEndToEnd_areNotSaidToRunIntoEachOther() {
        StructureType type = m.study.getStructureTypes().get(0);
        m.line().setFinishEnd(LineEnd.DEAD_END);
        Line next = m.line("next", type, StudyMaker.sag(6), 0, 600, 900, 1200);
        next.setStartEnd(LineEnd.DEAD_END);
        StudyMaker.load(m.loadCase(), m.circuit(next, "goes on", 132e3, "L", "M", "R"), 500, 0);
        Set<String> rules = StudyCheck.check(m.study).stream().map(Finding::rule).collect(Collectors.toSet());
        assertEquals(Set.of(GeometryRule.LINE_CURRENT_PATH_CLOSED.ruleName()), rules);
        // and the field is that of the unbroken line, where every wire counts by its true path: with complex images
        StudyMaker whole = StudyMaker.plain();
        whole.study.setEarthResistivityOhmMetres(100.0);
        whole.study.setEarthModel(EarthModel.COMPLEX_IMAGES);
        m.study.setEarthModel(EarthModel.COMPLEX_IMAGES);
        StudyMaker.structure(whole.line(), whole.study.getStructureTypes().get(0), 900, 0);
        StudyMaker.structure(whole.line(), whole.study.getStructureTypes().get(0), 1200, 0);
        var expected = Runs.table(whole.study).rows().get(0).leftEdge().field();
        var joined = Runs.table(m.study).rows().get(0).leftEdge().field();
        Runs.assertSame(expected, joined, 1e-9, "joined");
    }

    @Test
    void randomStudies_areCheckedWithoutAnErrorOfOurOwn() {
        for (long seed = 100; seed < 140; seed++) {
            List<Finding> findings = StudyCheck.check(RandomStudies.of(seed).study);
            assertTrue(findings.stream().noneMatch(Finding::isError), "seed " + seed + ": " + findings);
        }
    }

    @Test
    void everythingFound_isReportedAtOnce() {
        m.line().getSections().get(0).setPhaseStringing(StudyMaker.sag(17));
        m.line().setFinishEnd(LineEnd.DEAD_END);
        InvalidStudyException refused = assertThrows(InvalidStudyException.class, () -> StudySnapshot.of(m.study));
        assertEquals(3 * 4 + 1, refused.findings().size(), "three phases in four spans, and the dead end");
        assertTrue(refused.findings().get(0).isError() && !refused.findings().get(12).isError(), "errors first");
        assertTrue(refused.getMessage().startsWith("The study has 12 errors."), refused.getMessage());
        assertEquals(0, new StudyRun().solveCount());
    }
}
