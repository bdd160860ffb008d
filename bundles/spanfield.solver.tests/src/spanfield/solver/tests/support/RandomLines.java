/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.solver.tests.support;

import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import spanfield.solver.geometry.CatenarySpan;
import spanfield.solver.geometry.Position;
import spanfield.solver.geometry.Wire;
import spanfield.solver.geometry.WireEnd;
import spanfield.solver.geometry.WirePath;

/** Random wires for property tests, from fixed seeds: short and long, steep and level, swung, turning, dead-ended. */
public final class RandomLines {

    private RandomLines() {
    }

    /** A wire of one to five spans of 20 m to 1500 m. */
    public static Wire wire(Random random, String name) {
        int count = 1 + random.nextInt(5);
        double heading = random.nextDouble() * 2 * Math.PI;
        double swing = random.nextBoolean() ? 0 : Math.toRadians(random.nextDouble() * 80 - 40);
        Position at = new Position(random.nextDouble() * 40 - 20, random.nextDouble() * 40 - 20, 15 + random.nextDouble() * 40);
        List<CatenarySpan> spans = new ArrayList<>();
        for (int i = 0; i < count; i++) {
            double length = 20 * Math.pow(75, random.nextDouble());
            double rise = length * (random.nextDouble() - 0.5) * (random.nextInt(4) == 0 ? 1.5 : 0.2);
            Position next = new Position(at.x() + length * Math.sin(heading), at.y() + length * Math.cos(heading), at.z() + rise);
            double constant = random.nextInt(6) == 0 ? Double.POSITIVE_INFINITY : Math.max(length * 0.6, 300 * Math.pow(10, random.nextDouble()));
            spans.add(CatenarySpan.ofConstant(at, next, constant, Double.isInfinite(constant) ? 0 : swing));
            at = next;
            heading += random.nextInt(3) == 0 ? Math.toRadians(random.nextDouble() * 60 - 30) : 0;
        }
        WireEnd start = random.nextInt(4) == 0 ? WireEnd.ENDS : WireEnd.CONTINUES;
        WireEnd finish = random.nextInt(4) == 0 ? WireEnd.ENDS : WireEnd.CONTINUES;
        return new Wire(name, new WirePath(spans, start, finish), 0.015);
    }

    /** A point between 0.3 m and 5 km from a random place on the wire, evenly spread over the decades of distance. */
    public static Position pointNear(Random random, Wire wire) {
        CatenarySpan span = wire.path().spans().get(random.nextInt(wire.path().spans().size()));
        Position on = span.at(random.nextDouble() * span.horizontalLengthMetres());
        double distance = 0.3 * Math.pow(5000 / 0.3, random.nextDouble());
        double[] d = {random.nextGaussian(), random.nextGaussian(), random.nextGaussian()};
        double norm = Math.sqrt(d[0] * d[0] + d[1] * d[1] + d[2] * d[2]);
        return new Position(on.x() + d[0] / norm * distance, on.y() + d[1] / norm * distance, on.z() + d[2] / norm * distance);
    }
}
