/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.study.tests.invariant;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import org.apache.commons.math3.complex.Complex;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import spanfield.model.Bonding;
import spanfield.model.ImpedanceFormula;
import spanfield.model.Line;
import spanfield.model.LoadCase;
import spanfield.model.SequenceLoad;
import spanfield.model.ShieldWire;
import spanfield.model.SpanfieldFactory;
import spanfield.model.StructureType;
import spanfield.solver.PhysicalConstants;
import spanfield.solver.Progress;
import spanfield.solver.earth.EarthModel;
import spanfield.solver.earth.EarthReturn;
import spanfield.solver.line.ParallelWiresField;
import spanfield.study.FieldPoint;
import spanfield.study.StudyRun;
import spanfield.study.StudySnapshot;
import spanfield.study.result.CurrentTable;
import spanfield.study.result.CurrentTable.CurrentSplit;
import spanfield.study.result.CurrentTable.ShieldCurrent.Origin;
import spanfield.study.result.EdgeTable;
import spanfield.study.result.FieldValue;
import spanfield.study.result.Notice;
import spanfield.study.result.Phasor;
import spanfield.study.tests.support.Runs;
import spanfield.study.tests.support.StudyMaker;

/** Earth return and shield wires through the whole chain, against formulas for straight wires written out here. */
class EarthAndShieldTest {

    /** Relative; straight wires against the sum of straight-wire formulas: quadrature to 1e-9, interpolation of earth terms, sag of 1e-9 m. */
    private static final double STRAIGHT = 1e-7;

    private static final double RHO = 100;

    /** A straight flat line with one shield wire, 100 ohm m, 50 Hz. */
    private static StudyMaker straightLine(Bonding bonding) {
        StudyMaker m = new StudyMaker();
        m.study.setEarthResistivityOhmMetres(RHO);
        m.study.setRelativeAccuracy(1e-9);
        StructureType type = m.type("portal");
        StudyMaker.attach(type, "L", -7, 15);
        StudyMaker.attach(type, "M", 0, 15);
        StudyMaker.attach(type, "R", 7, 15);
        StudyMaker.attach(type, "S", 4, 22);
        Line line = m.line("line", type, StudyMaker.sag(StudyMaker.STRAIGHT_SAG), 0, -600, -300, 0, 300, 600);
        StudyMaker.load(m.loadCase("rating"), m.circuit(line, "circuit", 132e3, "L", "M", "R"), 800, 15);
        m.shield(line, "shield", "S", bonding);
        m.station("s", 0, -60, 60, 10);
        return m;
    }

    private static Complex complex(Phasor p) {
        return new Complex(p.real(), p.imaginary());
    }

    @ParameterizedTest
    @EnumSource(value = EarthModel.class, names = {"COMPLEX_IMAGES", "EXACT_HALF_SPACE"})
    void straightLine_hasTheFieldOfStraightWiresWithEarth(EarthModel model) {
        StudySnapshot snapshot = StudySnapshot.of(straightLine(Bonding.BONDED).study).withEarthModel(model);
        List<FieldPoint> points = new ArrayList<>();
        for (double x : new double[] {-300, -40, 0, 9, 70, 1000}) {
            points.add(new FieldPoint(20, x, 1));
        }
        var table = new StudyRun().points(snapshot, points, Progress.NONE);
        CurrentTable currents = table.evidence().currents().get(0);
        List<Double> offsets = List.of(-7.0, 0.0, 7.0, 4.0);
        List<Double> heights = List.of(15.0, 15.0, 15.0, 22.0);
        Complex[] amperes = new Complex[4];
        for (int i = 0; i < 3; i++) {
            amperes[i] = complex(currents.circuits().get(0).phases().get(i).amperes());
        }
        amperes[3] = complex(currents.shieldWires().get(0).amperes());
        for (int i = 0; i < points.size(); i++) {
            FieldValue value = table.cases().get(0).series().value(i);
            double[] b = new double[2];
            EarthModel other = model == EarthModel.COMPLEX_IMAGES ? EarthModel.EXACT_HALF_SPACE : EarthModel.COMPLEX_IMAGES;
            for (EarthModel each : new EarthModel[] {model, other}) {
                Complex[] field = ParallelWiresField.at(points.get(i).offsetMetres(), 1, offsets, heights, amperes, new EarthReturn(each, RHO, 50, 0));
                b[each == model ? 0 : 1] = Math.hypot(field[0].abs(), field[1].abs());
            }
            assertEquals(b[0], value.resultantTesla(), STRAIGHT * b[0], "resultant at " + points.get(i).offsetMetres() + " m");
            assertTrue(value.modelErrorTesla() >= Math.abs(b[0] - b[1]) - STRAIGHT * b[0], "model error at " + points.get(i).offsetMetres() + " m");
        }
    }

    /** Deri's impedances written out: Z_ij = j omega mu0/(2 pi) ln(sqrt((h_i + h_j + 2p)^2 + d^2) / D_ij). */
    private static Complex mutual(double xi, double hi, double xj, double hj, double distance) {
        double omega = 2 * Math.PI * 50;
        Complex p = new Complex(RHO).divide(new Complex(0, omega * PhysicalConstants.MU0)).sqrt();
        Complex sum = p.multiply(2).add(hi + hj);
        Complex root = sum.multiply(sum).add((xi - xj) * (xi - xj)).sqrt();
        return root.divide(distance).log().multiply(new Complex(0, omega * PhysicalConstants.MU0 / (2 * Math.PI)));
    }

    /** Relative; the same formula in another order of operations. */
    private static final double FORMULA = 1e-9;

    @Test
    void oneBondedShieldWire_carriesTheCurrentOfTheWrittenOutFormula() {
        EdgeTable table = Runs.table(straightLine(Bonding.BONDED).study);
        double radius = 0.011 / 2;
        Complex self = mutual(4, 22, 4, 22, radius * Math.exp(-0.25)).add(5e-4);
        Complex induced = Complex.ZERO;
        double[] x = {-7, 0, 7};
        double[] angle = {15, -105, 135};
        for (int i = 0; i < 3; i++) {
            Complex current = new Complex(800 * Math.cos(Math.toRadians(angle[i])), 800 * Math.sin(Math.toRadians(angle[i])));
            induced = induced.subtract(mutual(4, 22, x[i], 15, Math.hypot(4 - x[i], 7)).multiply(current));
        }
        Complex expected = induced.divide(self);
        Complex actual = complex(table.evidence().currents().get(0).shieldWires().get(0).amperes());
        assertEquals(0, actual.subtract(expected).abs(), FORMULA * expected.abs(), "amperes; expected " + expected + ", is " + actual);
    }

    @Test
    void meanHeightOfASaggedLine_entersTheImpedances() {
        StudyMaker m = straightLine(Bonding.BONDED);
        m.line().getSections().get(0).setPhaseStringing(StudyMaker.sag(6));
        m.line().getSections().get(0).setShieldStringing(StudyMaker.sag(3));
        StudyMaker lowered = straightLine(Bonding.BONDED);
        // mean height = attachment less two thirds of the sag
        lowered.study.getStructureTypes().get(0).getAttachments().forEach(a -> a.setHeightMetres(a.getHeightMetres() - (a.getName().equals("S") ? 2 : 4)));
        Phasor sagged = Runs.table(m.study).evidence().currents().get(0).shieldWires().get(0).amperes();
        Phasor level = Runs.table(lowered.study).evidence().currents().get(0).shieldWires().get(0).amperes();
        assertEquals(level.real(), sagged.real(), FORMULA * level.magnitude());
        assertEquals(level.imaginary(), sagged.imaginary(), FORMULA * level.magnitude());
    }

    @Test
    void bundle_inducesNearlyWhatASingleConductorDoes() {
        StudyMaker m = straightLine(Bonding.BONDED);
        Phasor single = Runs.table(m.study).evidence().currents().get(0).shieldWires().get(0).amperes();
        StudyMaker.bundle(m.circuit(), 4, 0.4);
        Phasor bundle = Runs.table(m.study).evidence().currents().get(0).shieldWires().get(0).amperes();
        // the square of the bundle's radius over the distance to the shield wire, (0.28 m / 8 m)^2 = 1e-3, and some cancellation
        assertEquals(0, single.plus(bundle.negated()).magnitude(), 5e-3 * single.magnitude(), "amperes of " + single.magnitude());
    }

    @Test
    void lineAtAnAngleToTheCorridor_hasTheShieldCurrentOfTheLineAlongIt() {
        List<Phasor> currents = new ArrayList<>();
        for (double degrees : new double[] {0, 30}) {
            StudyMaker m = straightLine(Bonding.BONDED);
            StructureType type = m.type("neighbour");
            StudyMaker.attach(type, "X", -5, 18);
            StudyMaker.attach(type, "Y", 0, 18);
            StudyMaker.attach(type, "Z", 5, 18);
            Line other = m.line("other", type, StudyMaker.sag(StudyMaker.STRAIGHT_SAG), 40, -600, 0, 600);
            StudyMaker.load(m.loadCase(), m.circuit(other, "second", 132e3, "X", "Y", "Z"), 1000, 0);
            double cos = Math.cos(Math.toRadians(degrees));
            double sin = Math.sin(Math.toRadians(degrees));
            for (Line line : m.study.getLines()) {
                for (var structure : line.getStructures()) {
                    double x = structure.getOffsetMetres();
                    double y = structure.getStationMetres();
                    structure.setOffsetMetres(x * cos + y * sin);
                    structure.setStationMetres(y * cos - x * sin);
                }
            }
            currents.add(Runs.table(m.study).evidence().currents().get(0).shieldWires().get(0).amperes());
        }
        assertEquals(0, currents.get(0).plus(currents.get(1).negated()).magnitude(), 1e-9 * currents.get(0).magnitude(), "amperes");
    }

    @Test
    void carsonsIntegral_changesTheShieldCurrentByAFewPerCentAtMost() {
        StudyMaker m = straightLine(Bonding.BONDED);
        Phasor deri = Runs.table(m.study).evidence().currents().get(0).shieldWires().get(0).amperes();
        m.study.setImpedanceFormula(ImpedanceFormula.CARSON);
        Phasor carson = Runs.table(m.study).evidence().currents().get(0).shieldWires().get(0).amperes();
        double difference = deri.plus(carson.negated()).magnitude() / carson.magnitude();
        // Deri et al. 1981 state about 2 % for mutual impedances at such distances; balanced phases make it less sharp
        assertTrue(difference > 1e-6 && difference < 0.05, "relative difference " + difference);
    }

    @Test
    void residualCurrent_splitsBetweenShieldWireAndEarth() {
        StudyMaker m = straightLine(Bonding.BONDED);
        SequenceLoad load = SpanfieldFactory.eINSTANCE.createSequenceLoad();
        load.setCircuit(m.circuit());
        load.setPositiveAmperes(800);
        load.setZeroAmperes(10);
        load.setZeroAngleDegrees(40);
        m.loadCase().getLoads().set(0, load);
        CurrentTable table = Runs.table(m.study).evidence().currents().get(0);
        CurrentSplit split = table.splits().get(0);
        assertEquals(30, split.phaseResidual().magnitude(), 1e-9, "amperes: three times the zero sequence");
        assertEquals(40, split.phaseResidual().angleDegrees(), 1e-9, "degrees");
        Phasor sum = split.phaseResidual().plus(split.shieldTotal()).plus(split.earth());
        assertEquals(0, sum.magnitude(), 1e-9, "amperes: what flows forth flows back");
        assertEquals(0, table.shieldWires().get(0).amperes().plus(split.shieldTotal().negated()).magnitude(), 1e-12);
        // the shield wire carries part of the residual current back
        StudyMaker balanced = straightLine(Bonding.BONDED);
        Phasor without = Runs.table(balanced.study).evidence().currents().get(0).splits().get(0).shieldTotal();
        assertTrue(split.shieldTotal().plus(without.negated()).magnitude() > 1);
    }

    @Test
    void shieldWireAcrossALongCrossing_isNotCoupledAndThatIsSaid() {
        StudyMaker m = straightLine(Bonding.BONDED);
        StructureType type = m.type("crossing");
        StudyMaker.attach(type, "X", 0, 40);
        StudyMaker.attach(type, "Y", 5, 40);
        StudyMaker.attach(type, "Z", 10, 40);
        Line crossing = m.line("crossing", type, StudyMaker.sag(2), -150, 140);
        StudyMaker.structure(crossing, type, 160, 150);
        StudyMaker.load(m.loadCase(), m.circuit(crossing, "other", 132e3, "X", "Y", "Z"), 2000, 0);
        EdgeTable with = Runs.table(m.study);
        EdgeTable without = Runs.table(straightLine(Bonding.BONDED).study);
        assertEquals(without.evidence().currents().get(0).shieldWires(), with.evidence().currents().get(0).shieldWires());
        assertEquals(2, with.evidence().currents().get(0).splits().size());
        assertTrue(with.evidence().notices().stream().anyMatch(n -> n.text().contains("not coupled")), with.evidence().notices().toString());
    }

    @Test
    void parallelLine_isCoupledWhicheverWayItIsDescribed() {
        List<Phasor> currents = new ArrayList<>();
        for (double sign : new double[] {1, -1}) {
            StudyMaker m = straightLine(Bonding.BONDED);
            StructureType type = m.type("neighbour");
            StudyMaker.attach(type, "X", sign * -5, 18);
            StudyMaker.attach(type, "Y", 0, 18);
            StudyMaker.attach(type, "Z", sign * 5, 18);
            Line other = m.line("other", type, StudyMaker.sag(StudyMaker.STRAIGHT_SAG), 40, sign * -600, 0, sign * 600);
            StudyMaker.load(m.loadCase(), m.circuit(other, "second", 132e3, "X", "Y", "Z"), 1000, 0);
            if (sign < 0) {
                m.loadCase().getLoads().get(1).setDirection(spanfield.model.FlowDirection.REVERSED);
            }
            EdgeTable table = Runs.table(m.study);
            assertEquals(1, table.evidence().currents().get(0).splits().size());
            currents.add(table.evidence().currents().get(0).shieldWires().get(0).amperes());
        }
        assertEquals(0, currents.get(0).plus(currents.get(1).negated()).magnitude(), 1e-9 * currents.get(0).magnitude(), "amperes");
        Phasor alone = Runs.table(straightLine(Bonding.BONDED).study).evidence().currents().get(0).shieldWires().get(0).amperes();
        assertTrue(currents.get(0).plus(alone.negated()).magnitude() > 1, "the neighbour induces some amperes more");
    }

    @Test
    void insulatedAndGivenShieldWires_carryWhatTheStudySays() {
        StudyMaker m = straightLine(Bonding.INSULATED);
        assertEquals(0, Runs.table(m.study).evidence().currents().get(0).shieldWires().get(0).amperes().magnitude(), 0);
        ShieldWire wire = m.line().getShieldWires().get(0);
        wire.setBonding(Bonding.GIVEN_CURRENT);
        wire.setGivenCurrentAmperes(12);
        wire.setGivenAngleDegrees(-30);
        EdgeTable table = Runs.table(m.study);
        var given = table.evidence().currents().get(0).shieldWires().get(0);
        assertEquals(Origin.GIVEN, given.origin());
        assertEquals(12, given.amperes().magnitude(), 1e-12);
        assertEquals(-30, given.amperes().angleDegrees(), 1e-12);
    }

    @Test
    void directCurrent_inducesNothingAndHasNoEarth() {
        StudyMaker m = straightLine(Bonding.BONDED);
        m.study.setFrequencyHertz(0);
        m.circuit().getPhases().remove(2);
        m.circuit().getPhases().get(1).setAngleDegrees(180);
        EdgeTable table = Runs.table(m.study);
        assertEquals(Origin.NOT_INDUCED, table.evidence().currents().get(0).shieldWires().get(0).origin());
        assertEquals(0, table.evidence().currents().get(0).shieldWires().get(0).amperes().magnitude(), 0);
        assertEquals(EarthModel.NONE, table.evidence().earthModel());
        assertFalse(table.rows().get(0).leftEdge().field().modelErrorKnown());
        assertTrue(table.evidence().notices().stream().anyMatch(n -> n.text().contains("Direct current")));
        // two poles: the field of two straight wires with opposite currents, Ampere's law. The load's angle of 15 degrees changes no magnitude.
        double x = -25;
        double dz = 14;
        Complex b = new Complex(-dz, x + 7).divide((x + 7) * (x + 7) + dz * dz).subtract(new Complex(-dz, x).divide(x * x + dz * dz));
        double expected = PhysicalConstants.MU0 / (2 * Math.PI) * 800 * b.abs();
        assertEquals(expected, table.rows().get(0).leftEdge().field().resultantTesla(), STRAIGHT * expected, "tesla");
    }

    @Test
    void residualCurrentWithoutEarthModel_isWarnedOf() {
        StudyMaker m = StudyMaker.plain();
        m.loadCase().getLoads().clear();
        StudyMaker.phasors(m.loadCase(), m.circuit(), 500, 0, 480, -120, 500, 120);
        List<Notice> notices = Runs.table(m.study).evidence().notices();
        assertTrue(notices.stream().anyMatch(n -> n.severity() == Notice.Severity.WARNING && n.text().contains("return outside the wires")),
            notices.toString());
    }

    @Test
    void greatResistivity_approachesNoEarth() {
        StudyMaker m = straightLine(Bonding.INSULATED);
        LoadCase loadCase = m.loadCase();
        loadCase.getLoads().clear();
        StudyMaker.phasors(loadCase, m.circuit(), 500, 0, 500, -120, 450, 120);
        m.study.setEarthResistivityOhmMetres(1e6);
        StudySnapshot resistive = StudySnapshot.of(m.study);
        List<FieldPoint> point = List.of(new FieldPoint(0, 12, 1));
        double far = new StudyRun().points(resistive, point, Progress.NONE).cases().get(0).series().value(0).resultantTesla();
        double none = new StudyRun().points(resistive.withEarthModel(EarthModel.NONE), point, Progress.NONE).cases().get(0).series().value(0)
            .resultantTesla();
        // Image depth 2|p| = 1e5 m: the image of the 50 A residual gives 1e-10 T beside some 1e-5 T.
        assertEquals(none, far, 1e-4 * none);
        assertTrue(none != far, "the earth has some effect");
    }
}
