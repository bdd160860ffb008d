/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.study.internal;

import java.util.IdentityHashMap;
import java.util.List;
import java.util.Map;
import spanfield.solver.earth.EarthModel;
import spanfield.solver.earth.EarthReturn;
import spanfield.solver.geometry.Wire;
import spanfield.study.internal.StudyData.CaseData;
import spanfield.study.internal.StudyData.StationData;
import spanfield.study.result.LeastClearance;

/** A sound study with its wires in space and the currents in them: everything a run needs, free of the model. Immutable. */
public final class PreparedStudy {

    private final StudyData data;
    private final StudyGeometry geometry;
    private final ParallelGroups groups;
    private final Map<GeometryState, Excitation> excitations;
    private final EarthReturn earth;

    private PreparedStudy(StudyData data, StudyGeometry geometry, ParallelGroups groups, Map<GeometryState, Excitation> excitations) {
        this.data = data;
        this.geometry = geometry;
        this.groups = groups;
        this.excitations = excitations;
        this.earth = data.earthModel() == EarthModel.NONE ? EarthReturn.none()
            : new EarthReturn(data.earthModel(), data.resistivity(), data.frequencyHertz(), geometry.earthPlane());
    }

    /** Prepares a study whose checks have found no error. */
    static PreparedStudy of(StudyData data, StudyGeometry geometry) {
        ParallelGroups groups = new ParallelGroups(data, geometry);
        Map<GeometryState, Excitation> excitations = new IdentityHashMap<>();
        geometry.states().forEach(state -> excitations.put(state, new Excitation(data, geometry, state, groups)));
        return new PreparedStudy(data, geometry, groups, excitations);
    }

    /** The same wires and currents with another earth model, accuracy, or choice of load cases and stations. */
    public PreparedStudy with(double relativeAccuracy, EarthModel earthModel, List<CaseData> cases, List<StationData> stations) {
        StudyData changed = new StudyData(data.id(), data.name(), data.frequencyHertz(), data.resistivity(), earthModel,
            data.impedanceFormula(), data.referenceHeight(), relativeAccuracy, data.plan(), data.lines(), List.copyOf(cases),
            List.copyOf(stations), data.limits(), data.electricLimits());
        return new PreparedStudy(changed, geometry, groups, excitations);
    }

    /** What was read from the model. */
    public StudyData data() {
        return data;
    }

    /** Elevation of the earth plane in metres. */
    public double earthPlane() {
        return geometry.earthPlane();
    }

    /** Single wires of a load case. */
    public List<Wire> wires(CaseData loadCase) {
        return state(loadCase).wires();
    }

    /** Single wires of a line in a load case. */
    public List<Wire> wires(CaseData loadCase, int line) {
        return state(loadCase).wires(line);
    }

    /** Least clearance of a line by its index, in the load case in which it is least; the first of equals. */
    public LeastClearance leastClearance(int line) {
        LeastClearance least = null;
        for (CaseData loadCase : data.cases()) {
            GeometryState state = state(loadCase);
            for (int i = 0; i < state.conductors().size(); i++) {
                least = state.conductors().get(i).line().index() == line ? lower(least, leastOf(state, i, loadCase)) : least;
            }
        }
        return least;
    }

    private static LeastClearance leastOf(GeometryState state, int conductor, CaseData loadCase) {
        StrungConductor strung = state.conductors().get(conductor);
        LeastClearance least = null;
        double along = 0;
        for (int span = 0; span < strung.spanCount(); span++) {
            GroundClearance c = state.clearance(conductor, span);
            least = lower(least, new LeastClearance(loadCase.info().id(), loadCase.info().name(), strung.name(),
                strung.line().structures().get(span).name(), strung.line().structures().get(span + 1).name(), c.metres(),
                along + c.distance(), c.place().z() - strung.bundleDrop()));
            along += state.centre(conductor).spans().get(span).horizontalLengthMetres();
        }
        return least;
    }

    private static LeastClearance lower(LeastClearance known, LeastClearance other) {
        return known == null || other.clearanceMetres() < known.clearanceMetres() ? other : known;
    }

    ParallelGroups groups() {
        return groups;
    }

    Excitation excitation(GeometryState state) {
        return excitations.get(state);
    }

    /** Earth of the reported field. */
    EarthReturn earth() {
        return earth;
    }

    GeometryState state(CaseData loadCase) {
        return geometry.state(loadCase.info().windSwingRadians());
    }
}
