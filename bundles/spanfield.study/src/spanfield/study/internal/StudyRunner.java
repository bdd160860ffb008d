/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.study.internal;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import spanfield.solver.Progress;
import spanfield.solver.earth.EarthModel;
import spanfield.solver.geometry.Position;
import spanfield.solver.geometry.Wire;
import spanfield.study.CorridorPlan;
import spanfield.study.CorridorPlan.PlanPoint;
import spanfield.study.FieldPoint;
import spanfield.study.StudyInputException;
import spanfield.study.StudyInputException.PointProblem;
import spanfield.study.internal.FieldComputer.CaseField;
import spanfield.study.internal.StudyData.CaseData;
import spanfield.study.internal.StudyData.StationData;
import spanfield.study.result.CaseInfo;
import spanfield.study.result.EdgeRow;
import spanfield.study.result.EdgeTable;
import spanfield.study.result.Evidence;
import spanfield.study.result.FieldSeries;
import spanfield.study.result.FieldValue;
import spanfield.study.result.LateralProfile;
import spanfield.study.result.Notice;
import spanfield.study.result.Phasor;
import spanfield.study.result.PointTable;
import spanfield.study.result.PointTable.PlacedPoint;
import spanfield.study.result.PointTable.PointCase;
import spanfield.study.result.ProfileCase;
import spanfield.study.result.StationGeometry;
import spanfield.study.result.StationInfo;

/** Runs a prepared study: tables, profiles, points. Thread-safe. */
public final class StudyRunner {

    /** Points that are solved together: neighbours in the list need not be neighbours in space, so that memory sets the number. */
    private static final int CHUNK = 2048;

    /** Greatest magnitude of a station, offset or height of a chosen point in metres. */
    private static final double GREATEST_COORDINATE_METRES = 1e5;

    private final CoefficientStore store;

    /** A runner that remembers coefficients in a store. */
    public StudyRunner(CoefficientStore store) {
        this.store = store;
    }

    /** The edge-of-right-of-way table for all stations and load cases. */
    public EdgeTable edgeTable(PreparedStudy study, StudyIdentity identity, Progress progress) {
        List<StationData> stations = study.data().stations();
        List<EdgeRow> rows = new ArrayList<>();
        List<StationRun> runs = new ArrayList<>();
        for (int i = 0; i < stations.size(); i++) {
            progress.check();
            StationRun run = new StationRun(study, store, stations.get(i).info(),
                new PartProgress(progress, i / (double) stations.size(), (i + 1.0) / stations.size()));
            run.cases().stream().map(ProfileCase::summary).forEach(rows::add);
            runs.add(run);
        }
        return new EdgeTable(rows, evidence(study, identity, runs));
    }

    /** The lateral profile at a station. */
    public LateralProfile profile(PreparedStudy study, StudyIdentity identity, StationInfo station, Progress progress) {
        requireComputable(study, station);
        StationRun run = new StationRun(study, store, station, progress);
        CorridorPlan plan = study.data().plan();
        double[] offsets = ProfileGrid.offsets(station);
        double[] ground = Arrays.stream(offsets).map(o -> plan.groundElevation(station.stationMetres(), o)).toArray();
        CorridorPlan.Edges edges = plan.edges(station.stationMetres());
        return new LateralProfile(station, offsets, ground, edges.leftOffsetMetres(), edges.rightOffsetMetres(),
            study.data().referenceHeight(), run.cases(), study.data().limits(), evidence(study, identity, List.of(run)));
    }

    private static Evidence evidence(PreparedStudy study, StudyIdentity identity, List<StationRun> runs) {
        double worst = runs.stream().mapToDouble(StationRun::worstRatio).max().orElse(0);
        double lowest = runs.stream().mapToDouble(StationRun::lowestPoint).min().orElse(Double.POSITIVE_INFINITY);
        List<StationGeometry> geometry = runs.stream().flatMap(r -> r.geometries().stream()).toList();
        return new EvidenceWriter(study, identity).write(worst, MaximumSearch.RESOLUTION_METRES, geometry, lowest);
    }

    /** A station that is not in the study was not checked with it. */
    private static void requireComputable(PreparedStudy study, StationInfo station) {
        ProfileGrid grid = ProfileGrid.of(station, study.data().plan(), study.data().referenceHeight());
        for (GeometryState state : states(study)) {
            PointsInWires inside = new PointsInWires(state);
            ProfileGrid all = ProfileGrid.of(station.stationMetres(), StationPoints.withCrossings(station, state, study.data().plan()),
                study.data().plan(), study.data().referenceHeight());
            for (int i = 0; i < all.size(); i++) {
                Wire wire = inside.wireAt(all.position(i));
                if (wire != null) {
                    throw new StudyInputException(Messages.text("profilePointInWire", station.stationMetres(), all.offset(i), wire.name()));
                }
            }
            if (!imageDefined(study, state, grid.lowest())) {
                throw new StudyInputException(Messages.text("profileBelowImages", station.stationMetres()));
            }
        }
    }

    private static List<GeometryState> states(PreparedStudy study) {
        return study.data().cases().stream().map(study::state).distinct().toList();
    }

    private static boolean imageDefined(PreparedStudy study, GeometryState state, double elevation) {
        return study.data().earthModel() == EarthModel.NONE
            || GeometryChecks.imageHeightSum(study.data(), study.earthPlane(), state, elevation) > 0;
    }

    /**
     * The study under another earth model.
     *
     * @throws StudyInputException where the study lacks what the model needs, or a station lies below every image
     */
    public static PreparedStudy withEarthModel(PreparedStudy study, EarthModel model) {
        if (model != EarthModel.NONE && study.data().frequencyHertz() == 0) {
            throw new StudyInputException(Messages.text("directCurrentHasNoEarth"));
        }
        if (model != EarthModel.NONE && Double.isNaN(study.data().resistivity())) {
            throw new StudyInputException(Messages.text("earthNeedsResistivity"));
        }
        PreparedStudy changed = study.with(study.data().relativeAccuracy(), model, study.data().cases(), study.data().stations());
        for (StationData station : study.data().stations()) {
            double lowest = ProfileGrid.of(station.info(), study.data().plan(), study.data().referenceHeight()).lowest();
            if (!states(changed).stream().allMatch(state -> imageDefined(changed, state, lowest))) {
                throw new StudyInputException(Messages.text("stationBelowImages", station.info().name()));
            }
        }
        return changed;
    }

    /** What keeps chosen points from being computed. */
    public List<PointProblem> problems(PreparedStudy study, List<FieldPoint> points) {
        List<PointProblem> problems = new ArrayList<>();
        List<GeometryState> states = states(study);
        List<PointsInWires> inside = states.stream().map(PointsInWires::new).toList();
        for (int i = 0; i < points.size(); i++) {
            String problem = problem(study, states, inside, points.get(i));
            if (problem != null) {
                problems.add(new PointProblem(i, problem));
            }
        }
        return problems;
    }

    private static String problem(PreparedStudy study, List<GeometryState> states, List<PointsInWires> inside, FieldPoint point) {
        if (!(Math.abs(point.stationMetres()) <= GREATEST_COORDINATE_METRES && Math.abs(point.offsetMetres()) <= GREATEST_COORDINATE_METRES
            && point.heightMetres() <= GREATEST_COORDINATE_METRES)) {
            return Messages.text("point.outOfRange", point.stationMetres(), point.offsetMetres(), point.heightMetres(), GREATEST_COORDINATE_METRES);
        }
        if (point.heightMetres() < 0) {
            return Messages.text("point.belowGround", point.stationMetres(), point.offsetMetres(), point.heightMetres());
        }
        Position p = position(study.data().plan(), point).position();
        for (int s = 0; s < states.size(); s++) {
            Wire wire = inside.get(s).wireAt(p);
            if (wire != null) {
                return Messages.text("point.inWire", point.stationMetres(), point.offsetMetres(), point.heightMetres(), wire.name());
            }
            if (!imageDefined(study, states.get(s), p.z())) {
                return Messages.text("point.belowImages", point.stationMetres(), point.offsetMetres(), point.heightMetres());
            }
        }
        return null;
    }

    private record Placed(PlacedPoint point, Position position) {
    }

    private static Placed position(CorridorPlan plan, FieldPoint point) {
        PlanPoint p = plan.planPoint(point.stationMetres(), point.offsetMetres());
        double ground = plan.groundElevation(point.stationMetres(), point.offsetMetres());
        return new Placed(new PlacedPoint(point, p.x(), p.y(), ground), new Position(p.x(), p.y(), ground + point.heightMetres()));
    }

    /** The field at chosen points. */
    public PointTable points(PreparedStudy study, StudyIdentity identity, List<FieldPoint> points, Progress progress) {
        List<PointProblem> problems = problems(study, points);
        if (!problems.isEmpty()) {
            throw new StudyInputException(problems);
        }
        List<Placed> placed = points.stream().map(p -> position(study.data().plan(), p)).toList();
        Position[] positions = placed.stream().map(Placed::position).toArray(Position[]::new);
        Map<CaseData, FieldSeries> series = series(study, positions, progress);
        List<PointCase> cases = study.data().cases().stream().map(c -> new PointCase(c.info(), series.get(c))).toList();
        double worst = cases.stream().mapToDouble(c -> worstRatio(c.series())).max().orElse(0);
        double lowest = Arrays.stream(positions).mapToDouble(Position::z).min().orElse(Double.POSITIVE_INFINITY);
        return new PointTable(placed.stream().map(Placed::point).toList(), cases,
            new EvidenceWriter(study, identity).write(worst, Double.NaN, List.of(), lowest));
    }

    private static double worstRatio(FieldSeries series) {
        double worst = 0;
        for (int i = 0; i < series.size(); i++) {
            worst = Math.max(worst, FieldComputer.ratio(series.value(i)));
        }
        return worst;
    }

    private Map<CaseData, FieldSeries> series(PreparedStudy study, Position[] positions, Progress progress) {
        Map<GeometryState, List<CaseData>> byState = new LinkedHashMap<>();
        study.data().cases().forEach(c -> byState.computeIfAbsent(study.state(c), s -> new ArrayList<>()).add(c));
        Map<CaseData, FieldSeries> result = new LinkedHashMap<>();
        int steps = byState.size() * Math.max(1, (positions.length + CHUNK - 1) / CHUNK);
        int done = 0;
        for (Map.Entry<GeometryState, List<CaseData>> entry : byState.entrySet()) {
            Collector collector = new Collector(entry.getValue().size(), positions.length);
            for (int from = 0; from < positions.length; from += CHUNK) {
                progress.check();
                Position[] chunk = Arrays.copyOfRange(positions, from, Math.min(positions.length, from + CHUNK));
                PartProgress part = new PartProgress(progress, done / (double) steps, (done + 1.0) / steps);
                collector.add(from, new FieldComputer(study, store).fields(entry.getKey(), entry.getValue(), chunk, part.silent()));
                progress.report(++done / (double) steps);
            }
            for (int c = 0; c < entry.getValue().size(); c++) {
                result.put(entry.getValue().get(c), collector.series(c));
            }
        }
        return result;
    }

    /** Puts the chunks of a long list of points together. */
    private static final class Collector {

        private final FieldValue[][] values;
        private final Phasor[][][] components;

        Collector(int cases, int points) {
            values = new FieldValue[cases][points];
            components = new Phasor[cases][3][points];
        }

        void add(int from, List<CaseField> fields) {
            for (int c = 0; c < values.length; c++) {
                FieldValue[] chunk = fields.get(c).values();
                System.arraycopy(chunk, 0, values[c], from, chunk.length);
                for (int axis = 0; axis < 3; axis++) {
                    System.arraycopy(fields.get(c).components()[axis], 0, components[c][axis], from, chunk.length);
                }
            }
        }

        FieldSeries series(int loadCase) {
            return new FieldSeries(values[loadCase], components[loadCase]);
        }
    }

    /** Load cases of a study, as results name them. */
    public static List<CaseInfo> caseInfos(PreparedStudy study) {
        return study.data().cases().stream().map(CaseData::info).toList();
    }

    /** What the reader of every result of the study must know. */
    public static List<Notice> notices(PreparedStudy study, StudyIdentity identity) {
        return new EvidenceWriter(study, identity).notices(Double.POSITIVE_INFINITY);
    }
}
