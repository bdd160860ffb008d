/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.study.result;

import java.util.List;
import spanfield.study.FieldPoint;

/**
 * The field at chosen points.
 *
 * @param points   the points, in the order asked, each with its plan position
 * @param cases    the field of each load case at the points
 * @param evidence how the values came about
 */
public record PointTable(List<PlacedPoint> points, List<PointCase> cases, Evidence evidence) {

    public PointTable {
        points = List.copyOf(points);
        cases = List.copyOf(cases);
    }

    /**
     * A point with its place in the plan.
     *
     * @param point                 the point as asked
     * @param xMetres               plan coordinate X in metres (the offset on a straight corridor)
     * @param yMetres               plan coordinate Y in metres (the station on a straight corridor)
     * @param groundElevationMetres elevation of the ground at the point in metres
     */
    public record PlacedPoint(FieldPoint point, double xMetres, double yMetres, double groundElevationMetres) {
    }

    /**
     * The field of one load case.
     *
     * @param loadCase the load case
     * @param series   the field, [point] in the order of the points
     */
    public record PointCase(CaseInfo loadCase, FieldSeries series) {
    }
}
