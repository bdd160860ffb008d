/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.study.internal;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import spanfield.solver.geometry.Position;
import spanfield.study.internal.StudyData.CaseData;
import spanfield.study.internal.StudyData.LineData;

/** The wires of a study in space: one state for every wind swing that its load cases have. Immutable once built. */
public final class StudyGeometry {

    private final List<GeometryProblem> problems = new ArrayList<>();
    private final List<Position[]> bases = new ArrayList<>();
    private final Map<Double, GeometryState> states = new LinkedHashMap<>();
    private final double earthPlane;

    /** Builds the geometry; {@link #problems} tells what could not be built, and then there are no states. */
    StudyGeometry(StudyData data) {
        List<StrungConductor> conductors = new ArrayList<>();
        for (LineData line : data.lines()) {
            LineBuilder builder = new LineBuilder(line, data.plan(), problems);
            bases.add(builder.bases());
            conductors.addAll(builder.conductors());
        }
        earthPlane = EarthPlane.elevation(bases, data.plan());
        if (!problems.isEmpty()) {
            return;
        }
        conductors.sort(Comparator.comparingInt((StrungConductor c) -> c.line().index()).thenComparing(c -> c.phase().attachment()));
        // Calm air comes first: the checks run there even where every load case has wind.
        states.put(0.0, new GeometryState(conductors, data.plan(), 0));
        for (CaseData loadCase : data.cases()) {
            states.computeIfAbsent(swing(loadCase.info().windSwingRadians()), s -> new GeometryState(conductors, data.plan(), s));
        }
    }

    /** What could not be built. */
    List<GeometryProblem> problems() {
        return List.copyOf(problems);
    }

    /** Bases of the structures of a line. */
    Position[] bases(int line) {
        return bases.get(line).clone();
    }

    /** Elevation of the earth plane in metres. */
    double earthPlane() {
        return earthPlane;
    }

    /** All states, calm air first. */
    List<GeometryState> states() {
        return List.copyOf(states.values());
    }

    /** The state of a wind swing in radians. */
    GeometryState state(double swingRadians) {
        return states.get(swing(swingRadians));
    }

    /** Makes -0 the same as 0. */
    private static double swing(double radians) {
        return radians + 0.0;
    }
}
