/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.study.tests.invariant;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.Random;
import org.junit.jupiter.api.Test;
import spanfield.study.CorridorPlan;
import spanfield.study.CorridorPlan.CorridorPosition;
import spanfield.study.CorridorPlan.PlanPoint;

/** Stations and offsets, plan coordinates, ground and edges. */
class CorridorPlanTest {

    /** Metres; coordinates of some kilometres in double precision. */
    private static final double ROUNDING = 1e-9;

    private static final double[][] NOTHING = {{}, {}};
    private static final double[][] EDGES = {{0}, {-25}, {25}};

    private static CorridorPlan bent(double[] stations, double... degrees) {
        double[] radians = new double[degrees.length];
        for (int i = 0; i < degrees.length; i++) {
            radians[i] = Math.toRadians(degrees[i]);
        }
        return new CorridorPlan(stations, radians, NOTHING, NOTHING, 0, EDGES);
    }

    @Test
    void straightCorridor_hasOffsetAsXAndStationAsYExactly() {
        CorridorPlan plan = bent(new double[0]);
        Random random = new Random(5);
        for (int i = 0; i < 1000; i++) {
            double station = 2e4 * (random.nextDouble() - 0.5);
            double offset = 2e3 * (random.nextDouble() - 0.5);
            assertEquals(new PlanPoint(offset, station), plan.planPoint(station, offset));
            assertEquals(new CorridorPosition(station, offset), plan.locate(offset, station));
        }
    }

    @Test
    void bendToTheRight_turnsTheCentrelineClockwise() {
        CorridorPlan plan = bent(new double[] {100}, 90);
        PlanPoint ahead = plan.planPoint(130, 0);
        assertEquals(30, ahead.x(), ROUNDING);
        assertEquals(100, ahead.y(), ROUNDING);
        // looking along +X, right is -Y
        PlanPoint right = plan.planPoint(130, 7);
        assertEquals(30, right.x(), ROUNDING);
        assertEquals(93, right.y(), ROUNDING);
    }

    @Test
    void profileAtABend_runsAlongTheBisector() {
        CorridorPlan plan = bent(new double[] {100}, 40);
        PlanPoint right = plan.planPoint(100, 10);
        assertEquals(10 * Math.cos(Math.toRadians(20)), right.x(), ROUNDING);
        assertEquals(100 - 10 * Math.sin(Math.toRadians(20)), right.y(), ROUNDING);
        assertArrayEquals(new double[] {Math.sin(Math.toRadians(20)), Math.cos(Math.toRadians(20))}, plan.direction(100), 1e-15);
    }

    @Test
    void everyPlanPoint_hasTheStationAndOffsetItCameFrom() {
        CorridorPlan plan = bent(new double[] {-50, 200, 600}, 25, -60, 30);
        Random random = new Random(6);
        for (int i = 0; i < 2000; i++) {
            double station = -1000 + 2500 * random.nextDouble();
            // offsets stay short of where the normals of two legs cross: nearest bend's distance over tan(30 degrees)
            double clear = Math.min(Math.min(Math.abs(station + 50), Math.abs(station - 200)), Math.abs(station - 600));
            double offset = Math.min(60, 1.6 * clear) * (2 * random.nextDouble() - 1);
            PlanPoint p = plan.planPoint(station, offset);
            CorridorPosition back = plan.locate(p.x(), p.y());
            assertEquals(station, back.stationMetres(), ROUNDING, "station");
            assertEquals(offset, back.offsetMetres(), ROUNDING, "offset");
        }
    }

    @Test
    void outerWedgeOfABend_belongsToTheBend() {
        CorridorPlan plan = bent(new double[] {100}, 40);
        for (double degrees : new double[] {5, 20, 35}) {
            // left of a bend to the right: between the two normals
            double a = Math.toRadians(degrees);
            CorridorPosition p = plan.locate(-12 * Math.cos(a), 100 + 12 * Math.sin(a));
            assertEquals(100, p.stationMetres(), ROUNDING);
            assertEquals(-12, p.offsetMetres(), ROUNDING);
        }
    }

    @Test
    void distancesAlongALeg_areKept() {
        CorridorPlan plan = bent(new double[] {-50, 200, 600}, 25, -60, 30);
        for (double[] leg : new double[][] {{-500, -60}, {-40, 190}, {210, 590}, {610, 2000}}) {
            PlanPoint a = plan.planPoint(leg[0], -3);
            PlanPoint b = plan.planPoint(leg[1], -3);
            assertEquals(leg[1] - leg[0], Math.hypot(b.x() - a.x(), b.y() - a.y()), ROUNDING);
        }
    }

    @Test
    void ground_isCentrelinePlusCrossSection() {
        double[][] elevations = {{0, 100}, {50, 60}};
        double[][] section = {{-10, 0, 20}, {2, 0, -4}};
        CorridorPlan plan = new CorridorPlan(new double[0], new double[0], elevations, section, 0.7, EDGES);
        assertEquals(55 + 1, plan.groundElevation(50, -5), ROUNDING, "between points");
        assertEquals(50 + 2, plan.groundElevation(-300, -99), ROUNDING, "level beyond");
        assertEquals(60 - 4, plan.groundElevation(400, 1000), ROUNDING, "level beyond");
        assertEquals(plan.groundElevation(33, 4), plan.groundElevationAt(4, 33), 0);
        CorridorPlan sloped = new CorridorPlan(new double[0], new double[0], elevations, NOTHING, 0.1, EDGES);
        assertEquals(55 + 0.5, sloped.groundElevation(50, 5), ROUNDING);
    }

    @Test
    void edges_areLinearBetweenAndConstantBeyond() {
        double[][] edges = {{0, 100, 200}, {-20, -30, -10}, {20, 25, 25}};
        CorridorPlan plan = new CorridorPlan(new double[0], new double[0], NOTHING, NOTHING, 0, edges);
        assertEquals(new CorridorPlan.Edges(-25, 22.5), plan.edges(50));
        assertEquals(new CorridorPlan.Edges(-30, 25), plan.edges(100));
        assertEquals(new CorridorPlan.Edges(-20, 20), plan.edges(-1e4));
        assertEquals(new CorridorPlan.Edges(-10, 25), plan.edges(1e4));
    }
}
