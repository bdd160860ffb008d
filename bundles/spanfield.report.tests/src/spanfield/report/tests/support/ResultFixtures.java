/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.report.tests.support;

import java.util.ArrayList;
import java.util.List;
import spanfield.model.FieldMeasure;
import spanfield.model.LimitBasis;
import spanfield.model.LimitPlace;
import spanfield.solver.earth.EarthModel;
import spanfield.solver.line.ImpedanceFormula;
import spanfield.study.FieldPoint;
import spanfield.study.result.CaseInfo;
import spanfield.study.result.CurrentTable;
import spanfield.study.result.EdgeRow;
import spanfield.study.result.EdgeTable;
import spanfield.study.result.Evidence;
import spanfield.study.result.FieldSeries;
import spanfield.study.result.FieldValue;
import spanfield.study.result.LateralProfile;
import spanfield.study.result.LimitComparison;
import spanfield.study.result.LimitComparison.Where;
import spanfield.study.result.LimitInfo;
import spanfield.study.result.MethodNote;
import spanfield.study.result.Notice;
import spanfield.study.result.Phasor;
import spanfield.study.result.PlacedField;
import spanfield.study.result.PointTable;
import spanfield.study.result.ProfileCase;
import spanfield.study.result.StationGeometry;
import spanfield.study.result.StationInfo;

/**
 * Results built by hand, for tests of what reports do with them. The field has the shape of a flat line's and no claim to be one: reports
 * must carry any numbers.
 */
public final class ResultFixtures {

    public static final double LEFT_EDGE = -25;
    public static final double RIGHT_EDGE = 25.4;
    public static final StationInfo STATION = new StationInfo("mid-2", "Mid-span 2-3", 175, -60, 60, 2);
    public static final CaseInfo RATING = new CaseInfo("rating", "Rating", "thermal rating", 0);
    public static final CaseInfo PEAK = new CaseInfo("peak", "Peak", "winter peak", 0);
    public static final CaseInfo WIND = new CaseInfo("wind", "Typical, wind", "average", Math.toRadians(15));
    public static final LimitInfo EDGE_LIMIT = new LimitInfo("edge-20", "Planning level", FieldMeasure.RESULTANT, 20e-6, LimitPlace.EDGE,
        "Company standard", "2020", "peak load", LimitBasis.USER);
    public static final LimitInfo HIGH_LIMIT = new LimitInfo("public-200", "General public", FieldMeasure.RESULTANT, 200e-6,
        LimitPlace.EVERYWHERE, "", "", "", LimitBasis.FROM_MEMORY);
    public static final LimitInfo MAJOR_LIMIT = new LimitInfo("major-12", "Major-axis level", FieldMeasure.MAJOR_AXIS, 12e-6,
        LimitPlace.WITHIN, "", "", "", LimitBasis.USER);
    public static final String DIGEST = "0123456789abcdef".repeat(4);

    private ResultFixtures() {
    }

    /** Load cases of the fixtures with the factor of their field. */
    private static final List<CaseInfo> CASES = List.of(RATING, PEAK, WIND);
    private static final double[] FACTORS = {1, 0.62, 0.31};

    /** A field that falls to both sides of the middle, in tesla. */
    public static FieldValue field(int loadCase, double offset) {
        double shift = loadCase == 2 ? 3 : 0;
        double t = (offset - shift) / 11;
        double resultant = 41.237654321e-6 * FACTORS[loadCase] / (1 + 0.6 * t * t + 0.4 * t * t * t * t);
        return new FieldValue(resultant, 0.95 * resultant, Math.sqrt(1 - 0.95 * 0.95) * resultant, 3.4e-7 * resultant,
            1.3e-3 * resultant + 2e-9);
    }

    /** The same field without an earth model: its model error is unknown. */
    public static FieldValue withoutModelError(FieldValue value) {
        return new FieldValue(value.resultantTesla(), value.majorAxisTesla(), value.minorAxisTesla(), value.numericalErrorTesla(), Double.NaN);
    }

    public static PlacedField placed(int loadCase, double offset) {
        return new PlacedField(offset, field(loadCase, offset));
    }

    public static EdgeRow row(int loadCase, List<LimitInfo> limits) {
        double middle = loadCase == 2 ? 3 : 0;
        PlacedField left = placed(loadCase, LEFT_EDGE);
        PlacedField right = placed(loadCase, RIGHT_EDGE);
        PlacedField greatest = placed(loadCase, middle);
        List<LimitComparison> comparisons = new ArrayList<>();
        for (LimitInfo limit : limits) {
            if (limit.place() == LimitPlace.EDGE) {
                comparisons.add(compare(limit, Where.LEFT_EDGE, left));
                comparisons.add(compare(limit, Where.RIGHT_EDGE, right));
            } else {
                comparisons.add(compare(limit, limit.place() == LimitPlace.WITHIN ? Where.GREATEST_WITHIN : Where.GREATEST_OF_PROFILE, greatest));
            }
        }
        // The major axis is greatest elsewhere than the resultant, so that a report that confuses the two is found out.
        PlacedField major = placed(loadCase, middle + 1.5);
        return new EdgeRow(STATION, CASES.get(loadCase), left, right, greatest, major, greatest, major, comparisons);
    }

    private static LimitComparison compare(LimitInfo limit, Where where, PlacedField placed) {
        return new LimitComparison(limit, where, placed.offsetMetres(), placed.field().tesla(limit.measure()), placed.field().uncertaintyTesla());
    }

    public static EdgeTable edgeTable(LimitInfo... limits) {
        return new EdgeTable(List.of(row(0, List.of(limits)), row(1, List.of(limits)), row(2, List.of(limits))), evidence());
    }

    public static LateralProfile profile(LimitInfo... limits) {
        int count = (int) Math.round((STATION.toOffsetMetres() - STATION.fromOffsetMetres()) / STATION.spacingMetres()) + 1;
        double[] offsets = new double[count];
        double[] ground = new double[count];
        for (int i = 0; i < count; i++) {
            offsets[i] = STATION.fromOffsetMetres() + i * STATION.spacingMetres();
            ground[i] = 102 + 0.04 * offsets[i];
        }
        List<ProfileCase> cases = new ArrayList<>();
        for (int c = 0; c < CASES.size(); c++) {
            cases.add(new ProfileCase(CASES.get(c), series(c, offsets), row(c, List.of(limits)), geometry(CASES.get(c).windSwingRadians())));
        }
        return new LateralProfile(STATION, offsets, ground, LEFT_EDGE, RIGHT_EDGE, 1, cases, List.of(limits), evidence());
    }

    public static FieldSeries series(int loadCase, double[] offsets) {
        FieldValue[] values = new FieldValue[offsets.length];
        Phasor[][] components = new Phasor[3][offsets.length];
        for (int i = 0; i < offsets.length; i++) {
            values[i] = field(loadCase, offsets[i]);
            double b = values[i].resultantTesla();
            components[0][i] = new Phasor(0.6 * b, 0.1 * b);
            components[1][i] = new Phasor(0.01 * b, -0.02 * b);
            components[2][i] = new Phasor(-0.5 * b, 0.3 * b);
        }
        return new FieldSeries(values, components);
    }

    public static StationGeometry geometry(double swing) {
        List<StationGeometry.WireAtStation> wires = new ArrayList<>();
        double shift = 8 * Math.sin(swing);
        String[] phases = {"A", "B", "C"};
        for (int i = 0; i < 3; i++) {
            double offset = 6.5 * (i - 1) + shift;
            wires.add(new StationGeometry.WireAtStation("North", "north-1", "North 1", phases[i], false, offset, 113.2, 11.2, 2, 0.2));
        }
        for (int side = -1; side <= 1; side += 2) {
            wires.add(new StationGeometry.WireAtStation("North", "shield", "Shield", "", true, 4.2 * side + 0.5 * shift, 121.5, 19.5, 1, 0));
        }
        return new StationGeometry(STATION, swing, wires,
            List.of(new StationGeometry.Clearance("North", "north-1", "North 1", 10.85, -6.5)));
    }

    public static PointTable pointTable() {
        List<PointTable.PlacedPoint> points = List.of(new PointTable.PlacedPoint(new FieldPoint(175, 0, 1), 0, 175, 102),
            new PointTable.PlacedPoint(new FieldPoint(180.5, -33.25, 1.5), -33.25, 180.5, 100.67));
        double[] offsets = {0, -33.25};
        List<PointTable.PointCase> cases = new ArrayList<>();
        for (int c = 0; c < CASES.size(); c++) {
            cases.add(new PointTable.PointCase(CASES.get(c), series(c, offsets)));
        }
        return new PointTable(points, cases, evidence());
    }

    public static Evidence evidence() {
        return evidence(EarthModel.EXACT_HALF_SPACE, 100);
    }

    public static Evidence evidence(EarthModel model, double resistivity) {
        return new Evidence("0.1.0", "north", "Line North, \"new\" route", DIGEST, 50, model, resistivity, 102, ImpedanceFormula.COMPLEX_DEPTH, 1,
            1e-6, 3.4e-7, 0.005, List.of(new MethodNote("Field", "Biot-Savart law along the exact catenaries.", "J. D. Jackson, 3rd ed.")),
            CASES.stream().map(ResultFixtures::currents).toList(), List.of(geometry(0), geometry(WIND.windSwingRadians())),
            List.of(Notice.warning("Line 'North' ends in the corridor."), Notice.information("Footing resistances are left out.")),
            List.of("Live lines can kill."));
    }

    private static CurrentTable currents(CaseInfo loadCase) {
        return new CurrentTable(loadCase, List.of(), List.of(new CurrentTable.ShieldCurrent("North", "shield", "Shield",
            CurrentTable.ShieldCurrent.Origin.INDUCED, new Phasor(-12.5, 21.25))),
            List.of(new CurrentTable.CurrentSplit(List.of("North"), new Phasor(30, 0), new Phasor(-12.5, 21.25))));
    }
}
