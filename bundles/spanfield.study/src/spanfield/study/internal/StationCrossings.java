/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.study.internal;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.apache.commons.math3.analysis.UnivariateFunction;
import org.apache.commons.math3.analysis.solvers.BrentSolver;
import spanfield.solver.geometry.CatenarySpan;
import spanfield.solver.geometry.Position;
import spanfield.solver.geometry.WireEnd;
import spanfield.solver.geometry.WirePath;
import spanfield.study.CorridorPlan;
import spanfield.study.CorridorPlan.PlanPoint;
import spanfield.study.result.StationGeometry;
import spanfield.study.result.StationGeometry.Clearance;
import spanfield.study.result.StationGeometry.WireAtStation;
import spanfield.study.result.StationInfo;

/** Finds where wires cross the vertical plane of a station's profile. */
final class StationCrossings {

    /** Crossings farther than this part of the profile's width beyond its ends are left out: they belong to other parts of a bent corridor. */
    private static final double MARGIN = 0.25;

    /** Accuracy of a crossing along the span in metres. */
    private static final double PLACE_TOLERANCE_METRES = 1e-9;

    private final StationInfo station;
    private final CorridorPlan plan;
    private final double[] ahead;
    private final PlanPoint centre;

    private StationCrossings(StationInfo station, CorridorPlan plan) {
        this.station = station;
        this.plan = plan;
        this.ahead = plan.direction(station.stationMetres());
        this.centre = plan.planPoint(station.stationMetres(), 0);
    }

    static StationGeometry of(StationInfo station, GeometryState state, CorridorPlan plan) {
        StationCrossings crossings = new StationCrossings(station, plan);
        List<WireAtStation> wires = new ArrayList<>();
        Map<String, Clearance> clearances = new LinkedHashMap<>();
        for (int i = 0; i < state.conductors().size(); i++) {
            StrungConductor conductor = state.conductors().get(i);
            for (Position p : crossings.crossings(state.centre(i))) {
                WireAtStation wire = crossings.wire(conductor, p);
                wires.add(wire);
                Clearance clearance = new Clearance(wire.line(), wire.elementId(), wire.element(),
                    wire.heightMetres() - conductor.bundleDrop(), wire.offsetMetres());
                clearances.merge(conductor.element().key(), clearance, (a, b) -> b.clearanceMetres() < a.clearanceMetres() ? b : a);
            }
        }
        return new StationGeometry(station, state.swing(), wires, List.copyOf(clearances.values()));
    }

    private WireAtStation wire(StrungConductor c, Position p) {
        double offset = offset(p);
        double ground = plan.groundElevation(station.stationMetres(), offset);
        return new WireAtStation(c.line().name(), c.element().id(), c.element().name(), c.phase().label(), c.element().shield(), offset, p.z(),
            p.z() - ground, c.element().bundleCount(), c.element().bundleRadius());
    }

    private List<Position> crossings(WirePath path) {
        List<Position> found = new ArrayList<>();
        if (path.start() == WireEnd.CONTINUES) {
            CatenarySpan first = path.spans().get(0);
            addTail(found, path.first(), -first.chordDirection()[0], -first.chordDirection()[1]);
        }
        for (int i = 0; i < path.spans().size(); i++) {
            addSpan(found, path.spans().get(i), i == 0);
        }
        if (path.finish() == WireEnd.CONTINUES) {
            double[] t = path.spans().get(path.spans().size() - 1).chordDirection();
            addTail(found, path.last(), t[0], t[1]);
        }
        double margin = MARGIN * (station.toOffsetMetres() - station.fromOffsetMetres());
        found.removeIf(p -> offset(p) < station.fromOffsetMetres() - margin || offset(p) > station.toOffsetMetres() + margin);
        return found;
    }

    private double offset(Position p) {
        return (p.x() - centre.x()) * ahead[1] - (p.y() - centre.y()) * ahead[0];
    }

    /** Distance of a point ahead of the plane in metres. */
    private double beyond(Position p) {
        return (p.x() - centre.x()) * ahead[0] + (p.y() - centre.y()) * ahead[1];
    }

    /**
     * A crossing at an attachment counts for the span that starts there, at the start of the line for the first. A span crosses at most
     * once: a swung wire that bulges through the plane and back is not drawn.
     */
    private void addSpan(List<Position> found, CatenarySpan span, boolean first) {
        double a = beyond(span.start());
        double b = beyond(span.end());
        if (a == 0 && first) {
            found.add(span.start());
        } else if (b == 0) {
            found.add(span.end());
        } else if (a * b < 0) {
            UnivariateFunction distance = s -> beyond(span.at(s));
            double s = new BrentSolver(1e-14, PLACE_TOLERANCE_METRES, 1e-12).solve(200, distance, 0, span.horizontalLengthMetres());
            found.add(span.at(s));
        }
    }

    /** A tail beyond the end of a wire, straight and level. */
    private void addTail(List<Position> found, Position from, double ux, double uy) {
        double speed = ux * ahead[0] + uy * ahead[1];
        double distance = speed == 0 ? -1 : -beyond(from) / speed;
        if (distance > 0 && distance < Position.GREATEST_COORDINATE_METRES / 2) {
            found.add(new Position(from.x() + distance * ux, from.y() + distance * uy, from.z()));
        }
    }
}
