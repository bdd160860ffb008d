/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.study.internal;

import java.util.ArrayList;
import java.util.List;
import java.util.TreeSet;
import spanfield.model.FieldMeasure;
import spanfield.solver.Progress;
import spanfield.study.internal.FieldComputer.CaseField;
import spanfield.study.internal.StudyData.CaseData;
import spanfield.study.result.FieldValue;
import spanfield.study.result.PlacedField;

/**
 * Finds the greatest field along a profile between its points. Every local maximum of the points that comes near the greatest is a
 * candidate; the intervals beside it are divided and computed again, for all load cases, measures and ranges together, until they are
 * narrower than the resolution.
 */
final class MaximumSearch {

    /**
     * Offset resolution in metres, far below what a survey can tell. A maximum whose place is off by half of it is low by about
     * 3 (0.0005 / d)^2 of itself at a distance d from the wires: 2e-8 at 6 m.
     */
    static final double RESOLUTION_METRES = 0.001;

    /** A local maximum of the points below this part of the greatest cannot hide the true one, see {@link StationPoints}. */
    private static final double CANDIDATE_PART = 0.9;

    /** Parts into which the interval on each side of a candidate is divided in a round. */
    private static final int PARTS = 8;

    private static final int MOST_ROUNDS = 12;

    private final FieldComputer computer;
    private final PreparedStudy study;
    private final GeometryState state;
    private final double station;

    /** A maximum that is sought: which load case and measure, in which range of offsets. */
    private static final class Search {
        final int loadCase;
        final FieldMeasure measure;
        final double from;
        final double to;
        final List<double[]> brackets = new ArrayList<>();
        PlacedField best;

        Search(int loadCase, FieldMeasure measure, double from, double to) {
            this.loadCase = loadCase;
            this.measure = measure;
            this.from = from;
            this.to = to;
        }

        boolean holds(double offset) {
            return offset >= from && offset <= to;
        }

        double value(FieldValue field) {
            return field.tesla(measure);
        }
    }

    private final List<Search> searches = new ArrayList<>();

    MaximumSearch(FieldComputer computer, PreparedStudy study, GeometryState state, double station) {
        this.computer = computer;
        this.study = study;
        this.state = state;
        this.station = station;
    }

    /** Asks for a maximum within a range of offsets; answers come in the order of the questions. */
    void want(int loadCase, FieldMeasure measure, double from, double to) {
        searches.add(new Search(loadCase, measure, from, to));
    }

    /**
     * Finds all the maxima that were asked for.
     *
     * @param offsets offsets that are already computed, rising
     * @param fields  fields there, by load case
     */
    List<PlacedField> find(double[] offsets, List<CaseField> fields, List<CaseData> cases, Progress progress) {
        searches.forEach(s -> narrow(s, offsets, fields));
        for (int round = 0; round < MOST_ROUNDS; round++) {
            TreeSet<Double> wanted = new TreeSet<>();
            searches.forEach(s -> s.brackets.forEach(b -> divide(b, wanted)));
            if (wanted.isEmpty()) {
                break;
            }
            double[] finer = wanted.stream().mapToDouble(Double::doubleValue).toArray();
            ProfileGrid grid = ProfileGrid.of(station, finer, study.data().plan(), study.data().referenceHeight());
            List<CaseField> computed = computer.fields(state, cases, grid.positions(), progress);
            searches.forEach(s -> narrow(s, finer, computed));
        }
        return searches.stream().map(s -> s.best).toList();
    }

    /** Offsets that divide a bracket, ends included. */
    private static void divide(double[] bracket, TreeSet<Double> wanted) {
        if (bracket[2] - bracket[0] <= 2 * RESOLUTION_METRES) {
            return;
        }
        for (int i = 0; i <= PARTS; i++) {
            wanted.add(bracket[0] + (bracket[1] - bracket[0]) * i / PARTS);
            wanted.add(bracket[1] + (bracket[2] - bracket[1]) * i / PARTS);
        }
    }

    /** Takes the greatest value of the points into account and brackets the candidates anew. */
    private static void narrow(Search search, double[] offsets, List<CaseField> fields) {
        FieldValue[] values = fields.get(search.loadCase).values();
        boolean first = search.best == null;
        for (int i = 0; i < offsets.length; i++) {
            if (search.holds(offsets[i]) && (search.best == null || search.value(values[i]) > search.value(search.best.field()))) {
                search.best = new PlacedField(offsets[i], values[i]);
            }
        }
        double threshold = Math.max(Double.MIN_VALUE, CANDIDATE_PART * search.value(search.best.field()));
        List<double[]> old = List.copyOf(search.brackets);
        search.brackets.clear();
        for (int i = 0; i < offsets.length; i++) {
            if (search.value(values[i]) >= threshold && (first || within(old, offsets[i])) && peak(search, offsets, values, i)) {
                double low = i > 0 && search.holds(offsets[i - 1]) ? offsets[i - 1] : offsets[i];
                double high = i + 1 < offsets.length && search.holds(offsets[i + 1]) ? offsets[i + 1] : offsets[i];
                search.brackets.add(new double[] {low, offsets[i], high});
            }
        }
    }

    private static boolean within(List<double[]> brackets, double offset) {
        return brackets.stream().anyMatch(b -> offset >= b[0] && offset <= b[2]);
    }

    /** Whether a point lies within the range and no neighbour within it is greater. */
    private static boolean peak(Search search, double[] offsets, FieldValue[] values, int i) {
        double value = search.value(values[i]);
        boolean leftLower = i == 0 || !search.holds(offsets[i - 1]) || search.value(values[i - 1]) <= value;
        boolean rightLower = i + 1 == offsets.length || !search.holds(offsets[i + 1]) || search.value(values[i + 1]) <= value;
        return search.holds(offsets[i]) && leftLower && rightLower;
    }
}
