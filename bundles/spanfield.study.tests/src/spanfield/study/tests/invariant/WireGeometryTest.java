/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.study.tests.invariant;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import spanfield.model.Bonding;
import spanfield.model.ClearanceStringing;
import spanfield.model.Line;
import spanfield.model.LineEnd;
import spanfield.model.SpanfieldFactory;
import spanfield.model.StringingSection;
import spanfield.model.Structure;
import spanfield.model.StructureType;
import spanfield.model.Study;
import spanfield.model.TensionStringing;
import spanfield.model.WireStringing;
import spanfield.solver.geometry.CatenarySpan;
import spanfield.solver.geometry.Position;
import spanfield.solver.geometry.Wire;
import spanfield.solver.geometry.WireEnd;
import spanfield.study.StudySnapshot;
import spanfield.study.result.StationGeometry;
import spanfield.study.result.StationGeometry.WireAtStation;
import spanfield.study.tests.support.Runs;
import spanfield.study.tests.support.StudyMaker;

/** Where wires hang, against positions and catenaries worked out by hand. */
class WireGeometryTest {

    /** Metres; coordinates of some hundred metres in double precision, and roots found to 1e-12 of them. */
    private static final double ROUNDING = 1e-9;

    private static Wire wire(Study study, String part) {
        return StudySnapshot.of(study).wires(study.getLoadCases().get(0).getId()).stream().filter(w -> w.name().contains(part)).findFirst()
            .orElseThrow(() -> new AssertionError("no wire " + part));
    }

    private static void assertAt(double x, double y, double z, Position actual) {
        assertEquals(x, actual.x(), ROUNDING, "X of " + actual);
        assertEquals(y, actual.y(), ROUNDING, "Y of " + actual);
        assertEquals(z, actual.z(), ROUNDING, "Z of " + actual);
    }

    @Test
    void attachment_hangsByItsInsulatorBelowItsHeight() {
        StudyMaker m = StudyMaker.plain();
        m.study.getStructureTypes().get(0).getAttachments().get(2).setInsulatorLengthMetres(1.5);
        Structure second = m.line().getStructures().get(1);
        second.setHeightAdjustmentMetres(3);
        second.setBaseElevationMetres(0.25);
        second.setOffsetMetres(2);
        Wire c = wire(m.study, "phase C");
        double length = Math.hypot(2, 300);
        assertAt(6 * 300 / length, -600 - 6 * 2 / length, 14.5, c.path().first());
        Position at = c.path().spans().get(1).start();
        assertEquals(16 - 1.5 + 3 + 0.25, at.z(), ROUNDING);
        // the structure stands 2 m to the right and faces along the bisector of its spans, which lean by the same angle to either side
        assertEquals(8, at.x(), ROUNDING);
        assertEquals(-300, at.y(), ROUNDING);
    }

    @Test
    void endStructure_facesAlongItsSpan() {
        StudyMaker m = StudyMaker.plain();
        m.line().getStructures().get(0).setOffsetMetres(-40);
        // the first span leans: from (-40, -600) to (0, -300)
        double length = Math.hypot(40, 300);
        Wire c = wire(m.study, "phase C");
        assertAt(-40 + 6 * 300 / length, -600 - 6 * 40 / length, 16, c.path().first());
    }

    @Test
    void angleStructure_facesAlongTheBisectorUnlessItsTurnIsGiven() {
        StudyMaker m = StudyMaker.plain();
        m.line().getStructures().get(3).setOffsetMetres(60);
        m.line().getStructures().get(4).setOffsetMetres(120);
        double half = Math.atan2(60, 300) / 2;
        Wire c = wire(m.study, "phase C");
        assertAt(6 * Math.cos(half), -6 * Math.sin(half), 16, c.path().spans().get(2).start());
        m.line().getStructures().get(2).setTurnDegrees(0.0);
        assertAt(6, 0, 16, wire(m.study, "phase C").path().spans().get(2).start());
        m.line().getStructures().get(2).setTurnDegrees(10.0);
        double ten = Math.toRadians(10);
        assertAt(6 * Math.cos(ten), -6 * Math.sin(ten), 16, wire(m.study, "phase C").path().spans().get(2).start());
    }

    @Test
    void bundles_areRegularPolygonsOnALevelSideAndStayParallelThroughTurns() {
        StudyMaker m = StudyMaker.plain();
        m.line().getStructures().get(3).setOffsetMetres(90);
        m.line().getStructures().get(4).setOffsetMetres(180);
        for (int count : new int[] {2, 3, 4}) {
            StudyMaker.bundle(m.circuit(), count, 0.4);
            List<Wire> wires = StudySnapshot.of(m.study).wires("rating").stream().filter(w -> w.name().contains("phase A")).toList();
            assertEquals(count, wires.size());
            double lowest = Double.POSITIVE_INFINITY;
            for (int k = 0; k < count; k++) {
                lowest = Math.min(lowest, wires.get(k).path().first().z());
                double gap = wires.get(k).path().first().distanceTo(wires.get((k + 1) % count).path().first());
                assertEquals(0.4, gap, ROUNDING, "side of the polygon of " + count);
            }
            double level = lowest;
            assertEquals(2, wires.stream().filter(w -> Math.abs(w.path().first().z() - level) < ROUNDING).count(), "level side");
            double height = wires.stream().mapToDouble(w -> w.path().first().z()).average().orElseThrow();
            assertEquals(16, height, ROUNDING, "centre on the attachment");
            for (Wire wire : wires) {
                for (int i = 0; i < 4; i++) {
                    double[] own = wire.path().spans().get(i).chordDirection();
                    double[] first = wires.get(0).path().spans().get(i).chordDirection();
                    assertEquals(0, own[0] * first[1] - own[1] * first[0], 1e-12, "sine of the angle between subconductors");
                }
            }
        }
    }

    @Test
    void sag_holdsInTheLongestSpanAndTheOthersShareItsConstant() {
        StudyMaker m = StudyMaker.plain();
        m.line().getStructures().get(4).setStationMetres(700);
        List<CatenarySpan> spans = wire(m.study, "phase B").path().spans();
        assertEquals(6, spans.get(3).midspanSagMetres(), ROUNDING);
        for (CatenarySpan span : spans) {
            assertEquals(spans.get(3).constantMetres(), span.constantMetres(), 0);
        }
        // level span: sag = c (cosh(S / 2c) - 1)
        double c = spans.get(3).constantMetres();
        assertEquals(6, c * (Math.cosh(400 / (2 * c)) - 1), 1e-8, "metres; the closed form cancels");
    }

    @Test
    void tension_givesTheConstantOfItsConductor() {
        StudyMaker m = StudyMaker.plain();
        TensionStringing tension = SpanfieldFactory.eINSTANCE.createTensionStringing();
        tension.setHorizontalTensionNewtons(28000);
        m.line().getSections().get(0).setPhaseStringing(tension);
        // H / (m g) with the standard acceleration of free fall
        assertEquals(28000 / (1.6 * 9.80665), wire(m.study, "phase B").path().spans().get(0).constantMetres(), 1e-9);
    }

    @ParameterizedTest
    @ValueSource(doubles = {7, 9.5, 12})
    void clearance_isMetSomewhereAndNowhereUndercut(double clearance) {
        StudyMaker m = StudyMaker.plain();
        m.study.getCorridor().setCrossSlope(-0.1);
        m.line().getStructures().get(3).setStationMetres(350);
        m.line().getStructures().get(1).setHeightAdjustmentMetres(4);
        StudyMaker.bundle(m.circuit(), 4, 0.4);
        ClearanceStringing rule = SpanfieldFactory.eINSTANCE.createClearanceStringing();
        rule.setClearanceMetres(clearance);
        m.line().getSections().get(0).setPhaseStringing(rule);
        StudySnapshot snapshot = StudySnapshot.of(m.study);
        double least = Double.POSITIVE_INFINITY;
        double constant = Double.NaN;
        for (Wire wire : snapshot.wires("rating")) {
            for (CatenarySpan span : wire.path().spans()) {
                assertTrue(Double.isNaN(constant) || constant == span.constantMetres(), "one constant for all");
                constant = span.constantMetres();
                for (int i = 0; i <= 20000; i++) {
                    Position p = span.at(span.horizontalLengthMetres() * i / 20000.0);
                    least = Math.min(least, p.z() - snapshot.plan().groundElevationAt(p.x(), p.y()));
                }
            }
        }
        // samples 2 cm apart along a curve of constant above 200 m: less than 1e-6 m is missed between them
        assertEquals(clearance, least, 1e-6, "metres");
    }

    @Test
    void shieldWiresWithoutARuleOfTheirOwn_shareTheConstantOfPhasesStrungByClearance() {
        StudyMaker m = StudyMaker.plain();
        StudyMaker.attach(m.study.getStructureTypes().get(0), "S", 0, 22);
        m.shield(m.line(), "shield", "S", Bonding.INSULATED);
        ClearanceStringing rule = SpanfieldFactory.eINSTANCE.createClearanceStringing();
        rule.setClearanceMetres(8);
        m.line().getSections().get(0).setPhaseStringing(rule);
        assertEquals(wire(m.study, "phase A").path().spans().get(0).constantMetres(), wire(m.study, "shield").path().spans().get(0).constantMetres(), 0);
    }

    @Test
    void sectionsAndExceptions_stringEachWireByItsOwnRule() {
        StudyMaker m = StudyMaker.plain();
        StudyMaker.attach(m.study.getStructureTypes().get(0), "S", 0, 22);
        var shield = m.shield(m.line(), "shield", "S", Bonding.INSULATED);
        StringingSection first = m.line().getSections().get(0);
        first.setPhaseStringing(StudyMaker.constant(1000));
        first.setTo(m.line().getStructures().get(2));
        StringingSection second = SpanfieldFactory.eINSTANCE.createStringingSection();
        second.setFrom(m.line().getStructures().get(2));
        second.setPhaseStringing(StudyMaker.constant(1500));
        second.setShieldStringing(StudyMaker.constant(2000));
        m.line().getSections().add(second);
        WireStringing exception = SpanfieldFactory.eINSTANCE.createWireStringing();
        exception.getWires().add(shield);
        exception.setStringing(StudyMaker.constant(2500));
        first.getExceptions().add(exception);
        assertEquals(List.of(1000.0, 1000.0, 1500.0, 1500.0), constants(wire(m.study, "phase A")));
        assertEquals(List.of(2500.0, 2500.0, 2000.0, 2000.0), constants(wire(m.study, "shield")));
    }

    private static List<Double> constants(Wire wire) {
        return wire.path().spans().stream().map(CatenarySpan::constantMetres).toList();
    }

    @Test
    void wind_swingsTheBellyToTheRightAlongIncreasingStation() {
        for (double sign : new double[] {1, -1}) {
            StudyMaker m = StudyMaker.plain();
            m.loadCase().setWindSwingDegrees(30);
            if (sign < 0) {
                List<Structure> backwards = new ArrayList<>(m.line().getStructures());
                java.util.Collections.reverse(backwards);
                m.line().getStructures().clear();
                m.line().getStructures().addAll(backwards);
            }
            CatenarySpan span = wire(m.study, "phase B").path().spans().get(1);
            Position belly = span.at(span.horizontalLengthMetres() / 2);
            assertEquals(6 * Math.sin(Math.toRadians(30)), belly.x(), ROUNDING, "to the right, whichever way the line is described");
            assertEquals(16 - 6 * Math.cos(Math.toRadians(30)), belly.z(), ROUNDING);
        }
    }

    @Test
    void lineEnds_areThoseOfTheStudy() {
        StudyMaker m = StudyMaker.plain();
        m.line().setFinishEnd(LineEnd.DEAD_END);
        Wire wire = wire(m.study, "phase A");
        assertEquals(WireEnd.CONTINUES, wire.path().start());
        assertEquals(WireEnd.ENDS, wire.path().finish());
    }

    @Test
    void earthPlane_isTheLengthWeightedMeanGroundUnderTheSpans() {
        StudyMaker m = StudyMaker.plain();
        m.study.getCorridor().setCrossSlope(0.1);
        StructureType type = m.type("other");
        for (int i = 0; i < 3; i++) {
            StudyMaker.attach(type, "T" + i, 4 * i, 20);
        }
        // 1200 m of line on the centreline at level 0, 300 m at offset 50 and level 5
        Line other = m.line("other", type, StudyMaker.sag(3), 50, 0, 300);
        StudyMaker.load(m.loadCase(), m.circuit(other, "second", 132e3, "T0", "T1", "T2"), 100, 0);
        assertEquals(5 * 300 / 1500.0, StudySnapshot.of(m.study).earthPlaneMetres(), ROUNDING);
    }

    @Test
    void wiresAtAStation_areWhereTheCatenaryIs() {
        StudyMaker m = StudyMaker.plain();
        m.study.getCorridor().setCrossSlope(0.05);
        StationGeometry geometry = Runs.table(m.study).evidence().geometry().get(0);
        assertEquals(3, geometry.wires().size());
        for (WireAtStation wire : geometry.wires()) {
            assertEquals(List.of(-6.0, 0.0, 6.0).get("ABC".indexOf(wire.phase())), wire.offsetMetres(), ROUNDING);
            // mid-span of a level span; bases follow the ground on the centreline, which is at 0
            assertEquals(16 - 6, wire.elevationMetres(), ROUNDING);
            assertEquals(10 - 0.05 * wire.offsetMetres(), wire.heightMetres(), ROUNDING);
        }
        assertEquals(1, geometry.clearances().size());
        assertEquals(10 - 0.05 * 6, geometry.clearances().get(0).clearanceMetres(), ROUNDING);
        assertEquals(6, geometry.clearances().get(0).offsetMetres(), ROUNDING);
    }

    @Test
    void clearanceAtAStation_isThatOfTheLowestSubconductor() {
        StudyMaker m = StudyMaker.plain();
        StudyMaker.bundle(m.circuit(), 4, 0.4);
        StationGeometry geometry = Runs.table(m.study).evidence().geometry().get(0);
        assertEquals(10 - 0.2, geometry.clearances().get(0).clearanceMetres(), ROUNDING, "half a side below the centre");
        assertEquals(0.2 * Math.sqrt(2), geometry.wires().get(0).bundleRadiusMetres(), ROUNDING);
    }

    @Test
    void wiresAtAStationBeyondTheStructures_areOnTheirTails() {
        StudyMaker m = StudyMaker.plain();
        m.study.getStations().get(0).setStationMetres(800);
        StationGeometry geometry = Runs.table(m.study).evidence().geometry().get(0);
        assertEquals(3, geometry.wires().size());
        geometry.wires().forEach(w -> assertEquals(16, w.elevationMetres(), ROUNDING));
        m.study.getStations().get(0).setStationMetres(300);
        geometry = Runs.table(m.study).evidence().geometry().get(0);
        assertEquals(3, geometry.wires().size(), "at a structure each wire counts once");
    }
}
