/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.study.internal;

import java.util.ArrayList;
import java.util.List;
import spanfield.solver.geometry.CatenarySpan;
import spanfield.solver.geometry.Position;
import spanfield.solver.geometry.WirePath;
import spanfield.study.internal.StudyData.LineData;

/**
 * Lines that run parallel enough to be coupled by line theory. Two lines are coupled when their mean directions in plan, without regard to
 * the sense, differ by at most {@link #GREATEST_ANGLE_DEGREES}; a line joins the first group with all of whose lines that holds.
 */
final class ParallelGroups {

    /**
     * Greatest angle in degrees between lines that are taken as parallel. At 10 degrees the induced voltage of truly parallel lines,
     * proportional to the cosine, is 1.5 % less; the growing distance matters more, so that the figure is a convention.
     */
    static final double GREATEST_ANGLE_DEGREES = 10;

    /** Samples along a span for its mean offset from the reference line. */
    private static final int SAMPLES = 8;

    /**
     * Lines that are coupled.
     *
     * @param lines     indices of the lines, in the order of the study
     * @param signs     +1 for a line that runs in the sense of the first, -1 against it
     * @param reference axis of the first line, from which offsets are measured
     */
    record Group(List<Integer> lines, List<Integer> signs, PlanPolyline reference) {

        /** Whether a line belongs to the group. */
        boolean contains(int line) {
            return lines.contains(line);
        }

        /** +1 or -1. */
        int sign(int line) {
            return signs.get(lines.indexOf(line));
        }
    }

    /** Two lines that are not coupled, and the angle between them in degrees, 0 to 90. */
    record Uncoupled(String first, String second, double angleDegrees) {
    }

    private final List<Group> groups = new ArrayList<>();
    private final List<Uncoupled> uncoupled = new ArrayList<>();

    ParallelGroups(StudyData data, StudyGeometry geometry) {
        List<double[]> directions = new ArrayList<>();
        for (LineData line : data.lines()) {
            directions.add(direction(geometry.bases(line.index())));
        }
        for (LineData line : data.lines()) {
            join(line.index(), directions, geometry);
        }
        for (int i = 0; i < directions.size(); i++) {
            for (int j = i + 1; j < directions.size(); j++) {
                if (!groupOf(i).contains(j)) {
                    uncoupled.add(new Uncoupled(data.lines().get(i).name(), data.lines().get(j).name(),
                        angle(directions.get(i), directions.get(j))));
                }
            }
        }
    }

    private void join(int line, List<double[]> directions, StudyGeometry geometry) {
        double[] own = directions.get(line);
        for (Group group : groups) {
            if (group.lines.stream().allMatch(other -> angle(own, directions.get(other)) <= GREATEST_ANGLE_DEGREES)) {
                group.lines.add(line);
                double[] first = directions.get(group.lines.get(0));
                group.signs.add(first[0] * own[0] + first[1] * own[1] < 0 ? -1 : 1);
                return;
            }
        }
        Position[] bases = geometry.bases(line);
        double[] x = new double[bases.length];
        double[] y = new double[bases.length];
        for (int i = 0; i < bases.length; i++) {
            x[i] = bases[i].x();
            y[i] = bases[i].y();
        }
        groups.add(new Group(new ArrayList<>(List.of(line)), new ArrayList<>(List.of(1)), PlanPolyline.through(x, y)));
    }

    /** Vector from the first to the last structure; of the last span where the line closes upon itself. */
    private static double[] direction(Position[] bases) {
        Position last = bases[bases.length - 1];
        Position first = last.planDistanceTo(bases[0]) < CatenarySpan.LEAST_LENGTH_METRES ? bases[bases.length - 2] : bases[0];
        double length = first.planDistanceTo(last);
        return new double[] {(last.x() - first.x()) / length, (last.y() - first.y()) / length};
    }

    private static double angle(double[] a, double[] b) {
        return Math.toDegrees(Math.atan2(Math.abs(a[0] * b[1] - a[1] * b[0]), Math.abs(a[0] * b[0] + a[1] * b[1])));
    }

    List<Group> groups() {
        return groups;
    }

    /** Pairs of lines that are not coupled. */
    List<Uncoupled> uncoupled() {
        return uncoupled;
    }

    Group groupOf(int line) {
        return groups.stream().filter(g -> g.contains(line)).findFirst().orElseThrow();
    }

    /**
     * Mean offset in metres of a wire from the reference line of its group, weighted by length: along the chords, shifted by two thirds of
     * the sag in the direction in which it swings.
     */
    static double meanOffset(WirePath path, PlanPolyline reference) {
        double sum = 0;
        double total = 0;
        for (CatenarySpan span : path.spans()) {
            double[] down = span.depthDirection();
            double sag = 2.0 / 3 * span.midspanSagMetres();
            for (int i = 0; i < SAMPLES; i++) {
                double t = (i + 0.5) / SAMPLES;
                double x = span.start().x() + t * (span.end().x() - span.start().x()) + sag * down[0];
                double y = span.start().y() + t * (span.end().y() - span.start().y()) + sag * down[1];
                sum += span.horizontalLengthMetres() * reference.locate(x, y)[1] / SAMPLES;
            }
            total += span.horizontalLengthMetres();
        }
        return sum / total;
    }
}
