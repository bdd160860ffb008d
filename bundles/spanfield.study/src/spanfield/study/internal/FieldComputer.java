/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.study.internal;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import org.apache.commons.math3.complex.Complex;
import spanfield.solver.Progress;
import spanfield.solver.earth.EarthModel;
import spanfield.solver.earth.EarthReturn;
import spanfield.solver.field.Accuracy;
import spanfield.solver.field.FieldPhasors;
import spanfield.solver.field.TransferCoefficients;
import spanfield.solver.geometry.Position;
import spanfield.study.internal.StudyData.CaseData;
import spanfield.study.result.FieldValue;
import spanfield.study.result.Phasor;

/**
 * Fields of load cases at points, to the accuracy of the study: coefficients are computed once for all load cases of a geometry state; where
 * the error bound of any of them exceeds the asked part of its resultant, the coefficients of those points are computed again more finely.
 */
final class FieldComputer {

    /** Rounds of refinement. The first usually suffices; points in near-perfect cancellation end at what double precision gives. */
    private static final int ROUNDS = 3;

    /** Refinement aims at this part of the asked error, so that one round is enough. */
    private static final double AIM = 0.3;

    private final PreparedStudy study;
    private final CoefficientStore store;

    /** The field of one load case at every point. */
    record CaseField(CaseData loadCase, FieldValue[] values, Phasor[][] components) {

        /** Greatest ratio of error bound to resultant over the points. */
        double worstRatio() {
            return Arrays.stream(values).mapToDouble(FieldComputer::ratio).max().orElse(0);
        }
    }

    FieldComputer(PreparedStudy study, CoefficientStore store) {
        this.study = study;
        this.store = store;
    }

    /** Error bound over resultant; 0 where there is neither, infinite where there is an error without a field. */
    static double ratio(FieldValue value) {
        return value.numericalErrorTesla() == 0 ? 0 : value.numericalErrorTesla() / value.resultantTesla();
    }

    /**
     * Computes the fields of load cases that share a state.
     *
     * @return one field for each load case, in their order
     */
    List<CaseField> fields(GeometryState state, List<CaseData> cases, Position[] points, Progress progress) {
        List<CaseField> fields = new ArrayList<>();
        for (CaseData loadCase : cases) {
            fields.add(new CaseField(loadCase, new FieldValue[points.length], new Phasor[3][points.length]));
        }
        if (points.length == 0) {
            return fields;
        }
        double asked = study.data().relativeAccuracy();
        double relative = asked;
        int[] pending = indices(points.length);
        for (int round = 0; round <= ROUNDS && pending.length > 0; round++) {
            evaluate(state, fields, points, pending, relative, progress);
            if (relative <= Accuracy.FINEST) {
                break;
            }
            pending = Arrays.stream(pending).filter(point -> ratio(fields, point) > asked).toArray();
            double worst = Arrays.stream(pending).mapToDouble(point -> Math.min(ratio(fields, point), 1)).max().orElse(asked);
            relative = Math.max(Accuracy.FINEST, relative * AIM * asked / worst);
        }
        return fields;
    }

    /** Greatest ratio of the load cases at a point. */
    private static double ratio(List<CaseField> fields, int point) {
        return fields.stream().mapToDouble(f -> ratio(f.values[point])).max().orElse(0);
    }

    private static int[] indices(int count) {
        int[] all = new int[count];
        Arrays.setAll(all, i -> i);
        return all;
    }

    private void evaluate(GeometryState state, List<CaseField> fields, Position[] points, int[] which, double relative, Progress progress) {
        Position[] chosen = Arrays.stream(which).mapToObj(i -> points[i]).toArray(Position[]::new);
        TransferCoefficients coefficients = store.get(state, chosen, study.earth(), relative, progress);
        for (CaseField field : fields) {
            Complex[] amperes = study.excitation(state).amperes(field.loadCase);
            fill(field, coefficients, amperes, which);
        }
    }

    private static void fill(CaseField field, TransferCoefficients coefficients, Complex[] amperes, int[] which) {
        EarthReturn earth = coefficients.earth();
        FieldPhasors reported = coefficients.combine(amperes);
        FieldPhasors other = !earth.active() ? null : coefficients.combine(amperes,
            earth.model() == EarthModel.EXACT_HALF_SPACE ? EarthModel.COMPLEX_IMAGES : EarthModel.EXACT_HALF_SPACE);
        for (int i = 0; i < which.length; i++) {
            double resultant = reported.resultantTesla(i);
            double major = reported.majorAxisTesla(i);
            double model = other == null ? Double.NaN
                : Math.max(Math.abs(resultant - other.resultantTesla(i)), Math.abs(major - other.majorAxisTesla(i)));
            field.values[which[i]] = new FieldValue(resultant, major, reported.minorAxisTesla(i), reported.numericalErrorTesla(i), model);
            for (int c = 0; c < 3; c++) {
                field.components[c][which[i]] = Phasor.of(reported.component(c, i));
            }
        }
    }
}
