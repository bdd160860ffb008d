/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.study.internal;

import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;
import spanfield.solver.earth.EarthModel;
import spanfield.solver.earth.EarthReturn;
import spanfield.solver.geometry.CatenarySpan;
import spanfield.solver.geometry.Wire;
import spanfield.solver.geometry.WireEnd;
import spanfield.study.GeometryRule;
import spanfield.study.internal.StudyData.ElementData;
import spanfield.study.internal.StudyData.LineData;
import spanfield.study.internal.StudyData.StationData;
import spanfield.study.internal.WireDistances.Near;

/** The rules of {@link GeometryRule} on wires in space, for every wind swing of the study. One method for each rule. */
public final class GeometryChecks {

    /**
     * Usual least clearance of phases to the ground: this many metres, and {@link #CLEARANCE_PER_VOLT} more. A screening convention in the
     * form of EN 50341-1 (5 m plus an electrical clearance; from memory). It only raises a warning: local codes decide.
     */
    static final double USUAL_CLEARANCE_METRES = 5;

    /** Addition to the usual clearance in metres per volt of nominal voltage: 6 mm per kV. */
    static final double CLEARANCE_PER_VOLT = 6e-6;

    /**
     * Usual least distance of wires from each other: this many metres, and {@link #DISTANCE_PER_VOLT} more. A screening convention near
     * the phase-to-phase clearances of EN 50341-1 (from memory). It only raises a warning.
     */
    static final double USUAL_DISTANCE_METRES = 0.1;

    /** Addition to the usual distance in metres per volt of the higher nominal voltage: 7.5 mm per kV. */
    static final double DISTANCE_PER_VOLT = 7.5e-6;

    /** Least mean height in metres above the earth plane that line theory is used with. */
    static final double LEAST_MEAN_HEIGHT_METRES = 0.1;

    private final StudyData data;
    private final StudyGeometry geometry;
    private final List<GeometryProblem> problems = new ArrayList<>();
    private final Set<String> reported = new LinkedHashSet<>();

    private GeometryChecks(StudyData data, StudyGeometry geometry) {
        this.data = data;
        this.geometry = geometry;
    }

    /** Everything the rules find, building problems included. */
    public static List<GeometryProblem> check(StudyData data, StudyGeometry geometry) {
        if (!geometry.problems().isEmpty()) {
            return geometry.problems();
        }
        GeometryChecks checks = new GeometryChecks(data, geometry);
        for (GeometryState state : geometry.states()) {
            checks.wiresAboveGround(state);
            checks.wiresApart(state);
            checks.pointsOutsideWires(state);
            checks.earthPlaneBelowWires(state);
            checks.earthImageDefined(state);
        }
        data.lines().forEach(checks::currentPathClosed);
        return List.copyOf(checks.problems);
    }

    /** Reports a rule once for an object and pair, at the first swing at which it does not hold: calm air comes first. */
    private void report(GeometryRule rule, String key, String subject, String message) {
        if (reported.add(rule + "|" + key + "|" + subject)) {
            problems.add(new GeometryProblem(rule, key, message));
        }
    }

    private static String wind(GeometryState state) {
        return state.swing() == 0 ? "" : Messages.text("wind", Math.toDegrees(state.swing()));
    }

    /** Span_WiresAboveGround and Span_ClearanceUsual. */
    private void wiresAboveGround(GeometryState state) {
        for (int i = 0; i < state.conductors().size(); i++) {
            StrungConductor conductor = state.conductors().get(i);
            for (int span = 0; span < conductor.spanCount(); span++) {
                judgeClearance(state, conductor, span, state.clearance(i, span));
            }
        }
    }

    private void judgeClearance(GeometryState state, StrungConductor conductor, int span, GroundClearance least) {
        ElementData element = conductor.element();
        double usual = USUAL_CLEARANCE_METRES + CLEARANCE_PER_VOLT * element.nominalVoltage();
        String place = Messages.text("spanPlace", conductor.spanName(span), least.distance(), conductor.line().structures().get(span).name(),
            wind(state));
        if (least.metres() <= element.conductor().radius()) {
            report(GeometryRule.SPAN_WIRES_ABOVE_GROUND, element.key(), conductor.name() + span, least.metres() < 0
                ? Messages.text("Span_WiresAboveGround", conductor.name(), -least.metres(), place)
                : Messages.text("Span_WiresAboveGround.touches", conductor.name(), place));
        } else if (!element.shield() && least.metres() < usual) {
            report(GeometryRule.SPAN_CLEARANCE_USUAL, element.key(), conductor.name() + span,
                Messages.text("Span_ClearanceUsual", conductor.name(), least.metres(), place, usual));
        }
    }

    /** Wires_Apart and Wires_DistanceUsual. */
    private void wiresApart(GeometryState state) {
        List<StrungConductor> all = state.conductors();
        List<Near> near = new WireDistances(state).near((i, j) -> usualDistance(all.get(i), all.get(j)) + radii(all.get(i), all.get(j)));
        for (Near pair : near) {
            StrungConductor first = all.get(pair.first());
            StrungConductor second = all.get(pair.second());
            double gap = pair.metres() - radii(first, second);
            String subject = first.element().key() + first.name() + second.element().key() + second.name();
            String where = first.spanName(pair.firstSpan()) + wind(state);
            if (gap <= 0) {
                report(GeometryRule.WIRES_APART, first.element().key(), subject, Messages.text("Wires_Apart", first.name(), second.name(), where));
            } else {
                report(GeometryRule.WIRES_DISTANCE_USUAL, first.element().key(), subject,
                    Messages.text("Wires_DistanceUsual", first.name(), second.name(), gap, where, usualDistance(first, second)));
            }
        }
    }

    private static double usualDistance(StrungConductor a, StrungConductor b) {
        return USUAL_DISTANCE_METRES + DISTANCE_PER_VOLT * Math.max(a.element().nominalVoltage(), b.element().nominalVoltage());
    }

    /** What the two bundles or wires take up themselves: the circles round their subconductors. */
    private static double radii(StrungConductor a, StrungConductor b) {
        return a.element().bundleRadius() + a.element().conductor().radius() + b.element().bundleRadius() + b.element().conductor().radius();
    }

    /** Station_PointsOutsideWires: no point of a profile on or in a wire, where the wire crosses the plane of the profile. */
    private void pointsOutsideWires(GeometryState state) {
        PointsInWires inside = new PointsInWires(state);
        for (StationData station : data.stations()) {
            ProfileGrid grid = ProfileGrid.of(station.info().stationMetres(), StationPoints.withCrossings(station.info(), state, data.plan()),
                data.plan(), data.referenceHeight());
            for (int i = 0; i < grid.size(); i++) {
                Wire wire = inside.wireAt(grid.position(i));
                if (wire != null) {
                    report(GeometryRule.STATION_POINTS_OUTSIDE_WIRES, station.key(), "",
                        Messages.text("Station_PointsOutsideWires", station.info().name(), grid.offset(i), wire.name(), wind(state)));
                    break;
                }
            }
        }
    }

    /** Study_EarthPlaneBelowWires: line theory and the half-space integral need positive mean heights. */
    private void earthPlaneBelowWires(GeometryState state) {
        if (Double.isNaN(data.resistivity()) || data.frequencyHertz() == 0) {
            return;
        }
        int[] owner = state.conductorOfWire();
        for (int i = 0; i < owner.length; i++) {
            StrungConductor conductor = state.conductors().get(owner[i]);
            double height = state.wires().get(i).path().meanElevationMetres() - geometry.earthPlane();
            if (!(height > LEAST_MEAN_HEIGHT_METRES)) {
                report(GeometryRule.STUDY_EARTH_PLANE_BELOW_WIRES, conductor.line().key(), "",
                    Messages.text("Study_EarthPlaneBelowWires", conductor.line().name(), -height, geometry.earthPlane()));
            }
        }
    }

    /** Study_EarthImageDefined. */
    private void earthImageDefined(GeometryState state) {
        if (data.earthModel() == EarthModel.NONE) {
            return;
        }
        double lowest = Double.POSITIVE_INFINITY;
        for (StationData station : data.stations()) {
            lowest = Math.min(lowest, ProfileGrid.of(station.info(), data.plan(), data.referenceHeight()).lowest());
        }
        double sum = imageHeightSum(data, geometry.earthPlane(), state, lowest);
        if (!(sum > 0)) {
            report(GeometryRule.STUDY_EARTH_IMAGE_DEFINED, "study", "",
                Messages.text("Study_EarthImageDefined", lowest, geometry.earthPlane()));
        }
    }

    /** Sum of the heights of the lowest wire and a point above the plane, plus twice Re p, in metres: images exist where it is positive. */
    static double imageHeightSum(StudyData data, double plane, GeometryState state, double pointElevation) {
        double lowestWire = Double.POSITIVE_INFINITY;
        for (Wire wire : state.wires()) {
            for (CatenarySpan span : wire.path().spans()) {
                lowestWire = Math.min(lowestWire, span.lowestPoint().z());
            }
        }
        EarthReturn earth = new EarthReturn(data.earthModel(), data.resistivity(), data.frequencyHertz(), plane);
        return pointElevation + lowestWire - 2 * plane + 2 * earth.complexDepth().getReal();
    }

    /** Line_CurrentPathClosed. */
    private void currentPathClosed(LineData line) {
        if (line.start() == WireEnd.ENDS || line.finish() == WireEnd.ENDS) {
            boolean both = line.start() == WireEnd.ENDS && line.finish() == WireEnd.ENDS;
            String where = both ? Messages.text("Line_CurrentPathClosed.both")
                : line.start() == WireEnd.ENDS ? Messages.text("Line_CurrentPathClosed.first") : Messages.text("Line_CurrentPathClosed.last");
            report(GeometryRule.LINE_CURRENT_PATH_CLOSED, line.key(), "", Messages.text("Line_CurrentPathClosed", line.name(), where));
        }
    }
}
