/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.study.internal;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import spanfield.model.FieldMeasure;
import spanfield.model.LimitPlace;
import spanfield.solver.Progress;
import spanfield.study.internal.FieldComputer.CaseField;
import spanfield.study.internal.StudyData.CaseData;
import spanfield.study.result.CaseInfo;
import spanfield.study.result.EdgeRow;
import spanfield.study.result.FieldSeries;
import spanfield.study.result.FieldValue;
import spanfield.study.result.LimitComparison;
import spanfield.study.result.LimitComparison.Where;
import spanfield.study.result.LimitInfo;
import spanfield.study.result.Phasor;
import spanfield.study.result.PlacedField;
import spanfield.study.result.ProfileCase;
import spanfield.study.result.StationGeometry;
import spanfield.study.result.StationInfo;

/** Computes everything at one station: the profile, the edges, and the greatest values, for every load case. */
final class StationRun {

    /** Maxima that are sought for a load case. */
    private static final int MAXIMA = 4;

    private final PreparedStudy study;
    private final FieldComputer computer;
    private final StationInfo station;
    private final Map<CaseData, ProfileCase> results = new LinkedHashMap<>();
    private final List<StationGeometry> geometries = new ArrayList<>();
    private double worstRatio;
    private double lowestPoint = Double.POSITIVE_INFINITY;

    StationRun(PreparedStudy study, CoefficientStore store, StationInfo station, Progress progress) {
        this.study = study;
        this.computer = new FieldComputer(study, store);
        this.station = station;
        Map<GeometryState, List<CaseData>> byState = new LinkedHashMap<>();
        study.data().cases().forEach(c -> byState.computeIfAbsent(study.state(c), s -> new ArrayList<>()).add(c));
        int done = 0;
        for (Map.Entry<GeometryState, List<CaseData>> entry : byState.entrySet()) {
            compute(entry.getKey(), entry.getValue(),
                new PartProgress(progress, done / (double) byState.size(), (done + 1.0) / byState.size()));
            done++;
            progress.report(done / (double) byState.size());
        }
    }

    /** Results of the load cases in the order of the study. */
    List<ProfileCase> cases() {
        return study.data().cases().stream().map(results::get).toList();
    }

    /** Wires at the station, for each swing of the load cases. */
    List<StationGeometry> geometries() {
        return geometries;
    }

    /** Greatest ratio of error bound to resultant at the station. */
    double worstRatio() {
        return worstRatio;
    }

    /** Elevation of the lowest field point in metres. */
    double lowestPoint() {
        return lowestPoint;
    }

    private void compute(GeometryState state, List<CaseData> cases, PartProgress progress) {
        double above = state.leastClearance() - study.data().referenceHeight();
        StationPoints points = new StationPoints(station, study.data().plan(), Math.max(0, above));
        ProfileGrid grid = ProfileGrid.of(station.stationMetres(), points.offsets(), study.data().plan(), study.data().referenceHeight());
        lowestPoint = Math.min(lowestPoint, grid.lowest());
        List<CaseField> fields = computer.fields(state, cases, grid.positions(), progress.silent());
        progress.report(0.5);
        List<PlacedField> maxima = maxima(state, cases, points, fields, progress);
        StationGeometry geometry = StationCrossings.of(station, state, study.data().plan());
        geometries.add(geometry);
        for (int c = 0; c < cases.size(); c++) {
            List<PlacedField> own = maxima.subList(MAXIMA * c, MAXIMA * (c + 1));
            CaseInfo info = cases.get(c).info();
            results.put(cases.get(c), new ProfileCase(info, series(points, fields.get(c)), row(info, points, fields.get(c), own), geometry));
            worstRatio = Math.max(worstRatio, fields.get(c).worstRatio());
            own.forEach(m -> worstRatio = Math.max(worstRatio, FieldComputer.ratio(m.field())));
        }
    }

    /** The maxima of each load case: resultant and major axis within the right-of-way, then of the whole profile. */
    private List<PlacedField> maxima(GeometryState state, List<CaseData> cases, StationPoints points, List<CaseField> fields,
        PartProgress progress) {
        MaximumSearch search = new MaximumSearch(computer, study, state, station.stationMetres());
        double left = points.offsets()[points.left()];
        double right = points.offsets()[points.right()];
        for (int c = 0; c < cases.size(); c++) {
            search.want(c, FieldMeasure.RESULTANT, left, right);
            search.want(c, FieldMeasure.MAJOR_AXIS, left, right);
            search.want(c, FieldMeasure.RESULTANT, Double.NEGATIVE_INFINITY, Double.POSITIVE_INFINITY);
            search.want(c, FieldMeasure.MAJOR_AXIS, Double.NEGATIVE_INFINITY, Double.POSITIVE_INFINITY);
        }
        return search.find(points.offsets(), fields, cases, progress.silent());
    }

    private static FieldSeries series(StationPoints points, CaseField field) {
        int[] profile = points.profile();
        FieldValue[] values = new FieldValue[profile.length];
        Phasor[][] components = new Phasor[3][profile.length];
        for (int i = 0; i < profile.length; i++) {
            values[i] = field.values()[profile[i]];
            for (int c = 0; c < 3; c++) {
                components[c][i] = field.components()[c][profile[i]];
            }
        }
        return new FieldSeries(values, components);
    }

    private EdgeRow row(CaseInfo loadCase, StationPoints points, CaseField field, List<PlacedField> maxima) {
        PlacedField left = new PlacedField(points.offsets()[points.left()], field.values()[points.left()]);
        PlacedField right = new PlacedField(points.offsets()[points.right()], field.values()[points.right()]);
        List<LimitComparison> comparisons = new ArrayList<>();
        for (LimitInfo limit : study.data().limits()) {
            boolean major = limit.measure() == FieldMeasure.MAJOR_AXIS;
            if (limit.place() == LimitPlace.EDGE) {
                comparisons.add(compare(limit, Where.LEFT_EDGE, left));
                comparisons.add(compare(limit, Where.RIGHT_EDGE, right));
            } else if (limit.place() == LimitPlace.WITHIN) {
                comparisons.add(compare(limit, Where.GREATEST_WITHIN, maxima.get(major ? 1 : 0)));
            } else {
                comparisons.add(compare(limit, Where.GREATEST_OF_PROFILE, maxima.get(major ? 3 : 2)));
            }
        }
        return new EdgeRow(station, loadCase, left, right, maxima.get(0), maxima.get(1), maxima.get(2), maxima.get(3), comparisons);
    }

    private static LimitComparison compare(LimitInfo limit, Where where, PlacedField placed) {
        return new LimitComparison(limit, where, placed.offsetMetres(), placed.field().tesla(limit.measure()), placed.field().uncertaintyTesla());
    }
}
