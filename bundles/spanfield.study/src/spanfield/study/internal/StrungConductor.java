/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.study.internal;

import java.util.ArrayList;
import java.util.List;
import spanfield.solver.geometry.CatenarySpan;
import spanfield.solver.geometry.Position;
import spanfield.solver.geometry.Wire;
import spanfield.solver.geometry.WirePath;
import spanfield.study.CorridorPlan;
import spanfield.study.internal.StudyData.ElementData;
import spanfield.study.internal.StudyData.LineData;
import spanfield.study.internal.StudyData.PhaseData;

/**
 * A phase (with all its subconductors) or a shield wire along its line: where it is attached and how tightly it hangs, without wind.
 * Immutable.
 *
 * <p>Subconductors are corners of a regular polygon whose lowest side is level (a pair lies level), centred on the attachment. At a turn
 * the polygon is stretched along the bisector as a mitre is, so that the subconductors stay parallel. Wind tilts every subconductor
 * about its own chord; insulator strings and the polygon stay upright.
 */
final class StrungConductor {

    /** Below this cosine between a span and the direction of increasing station a span counts as crossing at right angles. */
    private static final double CROSSING_COSINE = 1e-9;

    private final LineData line;
    private final ElementData element;
    private final int phaseIndex;
    private final Position[] attachments;
    private final double[] constants;

    /**
     * @param attachments bundle centre on every structure of the line
     * @param constants   catenary constant in metres of every span
     */
    StrungConductor(LineData line, ElementData element, int phaseIndex, Position[] attachments, double[] constants) {
        this.line = line;
        this.element = element;
        this.phaseIndex = phaseIndex;
        this.attachments = attachments.clone();
        this.constants = constants.clone();
    }

    LineData line() {
        return line;
    }

    ElementData element() {
        return element;
    }

    PhaseData phase() {
        return element.phases().get(phaseIndex);
    }

    int phaseIndex() {
        return phaseIndex;
    }

    int spanCount() {
        return constants.length;
    }

    /** Name for messages, e.g. "phase A of 'North 1'". */
    String name() {
        return element.shield() ? Messages.text("shieldWire", element.name()) : Messages.text("phase", phase().label(), element.name());
    }

    /** Where a span is, for messages. */
    String spanName(int span) {
        return Messages.text("span", line.structures().get(span).name(), line.structures().get(span + 1).name(), line.name());
    }

    /** Path of the bundle's centre, swung. */
    WirePath centre(CorridorPlan plan, double swing) {
        return path(attachments, plan, swing);
    }

    /** The subconductors, or the one wire, swung. */
    List<Wire> wires(CorridorPlan plan, double swing) {
        List<Wire> wires = new ArrayList<>();
        double[][] across = mitredNormals(attachments);
        for (int k = 0; k < element.bundleCount(); k++) {
            double[] corner = corner(k);
            Position[] shifted = new Position[attachments.length];
            for (int i = 0; i < shifted.length; i++) {
                Position p = attachments[i];
                shifted[i] = new Position(p.x() + corner[0] * across[i][0], p.y() + corner[0] * across[i][1], p.z() + corner[1]);
            }
            String suffix = element.bundleCount() == 1 ? "" : " subconductor " + (k + 1);
            wires.add(new Wire(line.name() + ": " + name() + suffix, path(shifted, plan, swing), element.conductor().radius()));
        }
        return wires;
    }

    /** Corner of the bundle: across (right) and up, in metres. */
    private double[] corner(int k) {
        double radius = element.bundleRadius();
        if (radius == 0) {
            return new double[2];
        }
        double angle = Math.PI * ((2 * k + 1.0) / element.bundleCount() - 0.5);
        double up = element.bundleCount() == 2 ? 0 : radius * Math.sin(angle);
        return new double[] {radius * Math.cos(angle), up};
    }

    /** Depth of the lowest subconductors below the bundle's centre in metres. */
    double bundleDrop() {
        return element.bundleCount() < 3 ? 0 : element.bundleRadius() * Math.cos(Math.PI / element.bundleCount());
    }

    /** Half the level distance between the lowest subconductors in metres. */
    double bundleHalfWidth() {
        return element.bundleCount() < 2 ? 0 : element.bundleSpacing() / 2;
    }

    private WirePath path(Position[] points, CorridorPlan plan, double swing) {
        List<CatenarySpan> spans = new ArrayList<>();
        for (int i = 0; i < constants.length; i++) {
            double sign = swing == 0 ? 0 : swingSign(plan, points[i], points[i + 1]);
            spans.add(CatenarySpan.ofConstant(points[i], points[i + 1], constants[i], sign * swing));
        }
        return new WirePath(spans, line.start(), line.finish());
    }

    /** Swing counts to the right along increasing station: for a span that runs backwards its own right is the other side. */
    private static double swingSign(CorridorPlan plan, Position a, Position b) {
        double station = plan.locate((a.x() + b.x()) / 2, (a.y() + b.y()) / 2).stationMetres();
        double[] ahead = plan.direction(station);
        double along = ((b.x() - a.x()) * ahead[0] + (b.y() - a.y()) * ahead[1]) / a.planDistanceTo(b);
        return along < -CROSSING_COSINE ? -1 : 1;
    }

    /**
     * Vectors to the right at every vertex of a chain in plan, of unit length across each adjacent leg: (r1 + r2) / (1 + r1.r2) for unit
     * normals r1, r2 of the two legs.
     */
    static double[][] mitredNormals(Position[] points) {
        int n = points.length;
        double[][] result = new double[n][];
        double[] before = null;
        for (int i = 0; i < n; i++) {
            double[] after = i + 1 < n ? right(points[i], points[i + 1]) : before;
            double[] first = before == null ? after : before;
            double scale = 1 / (1 + first[0] * after[0] + first[1] * after[1]);
            result[i] = new double[] {scale * (first[0] + after[0]), scale * (first[1] + after[1])};
            before = after;
        }
        return result;
    }

    private static double[] right(Position a, Position b) {
        double length = a.planDistanceTo(b);
        return new double[] {(b.y() - a.y()) / length, -(b.x() - a.x()) / length};
    }
}
