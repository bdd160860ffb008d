/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.study.internal;

import java.util.ArrayList;
import java.util.List;
import spanfield.solver.geometry.CatenarySpan;
import spanfield.solver.geometry.Position;
import spanfield.solver.geometry.Wire;
import spanfield.solver.geometry.WireEnd;
import spanfield.solver.geometry.WirePath;

/** Tells whether a point lies on or in a wire. */
final class PointsInWires {

    /** A point counts as inside up to this factor of the radius, so that what passes here also passes the solver's own test. */
    private static final double MARGIN = 1 + 1e-6;

    private static final int ROUNDS = 30;

    /** A span, or a tail where the span is null, with the box it stays in: least and greatest X, Y, Z. */
    private record Piece(Wire wire, CatenarySpan span, Position from, double ux, double uy, double[] box) {
    }

    private final List<Piece> pieces = new ArrayList<>();

    PointsInWires(GeometryState state) {
        for (Wire wire : state.wires()) {
            WirePath path = wire.path();
            path.spans().forEach(span -> pieces.add(new Piece(wire, span, null, 0, 0, box(span, wire.radiusMetres() * MARGIN))));
            if (path.start() == WireEnd.CONTINUES) {
                double[] t = path.spans().get(0).chordDirection();
                pieces.add(tail(wire, path.first(), -t[0], -t[1]));
            }
            if (path.finish() == WireEnd.CONTINUES) {
                double[] t = path.spans().get(path.spans().size() - 1).chordDirection();
                pieces.add(tail(wire, path.last(), t[0], t[1]));
            }
        }
    }

    /** Sag swings to the side by at most itself; half as much again covers inclined spans, which sag most beside mid-span. */
    private static double[] box(CatenarySpan span, double radius) {
        double side = radius + 1.5 * span.midspanSagMetres();
        Position a = span.start();
        Position b = span.end();
        return new double[] {Math.min(a.x(), b.x()) - side, Math.max(a.x(), b.x()) + side, Math.min(a.y(), b.y()) - side,
            Math.max(a.y(), b.y()) + side, span.lowestPoint().z() - radius, Math.max(a.z(), b.z()) + side};
    }

    private static Piece tail(Wire wire, Position from, double ux, double uy) {
        double radius = wire.radiusMetres() * MARGIN;
        double far = Double.POSITIVE_INFINITY;
        return new Piece(wire, null, from, ux, uy, new double[] {-far, far, -far, far, from.z() - radius, from.z() + radius});
    }

    /** The wire in which a point lies, or null. */
    Wire wireAt(Position p) {
        for (Piece piece : pieces) {
            double[] box = piece.box;
            if (p.z() >= box[4] && p.z() <= box[5] && p.x() >= box[0] && p.x() <= box[1] && p.y() >= box[2] && p.y() <= box[3]) {
                double distance = piece.span != null ? distance(piece.span, p) : tailDistance(piece.from, piece.ux, piece.uy, p);
                if (distance <= piece.wire.radiusMetres() * MARGIN) {
                    return piece.wire;
                }
            }
        }
        return null;
    }

    /** Distance of a point from a span in metres, by Newton steps along the tangent from the foot on the chord. */
    private static double distance(CatenarySpan span, Position p) {
        double[] t = span.chordDirection();
        double[] e = span.depthDirection();
        double length = span.horizontalLengthMetres();
        double s = Math.max(0, Math.min(length, (p.x() - span.start().x()) * t[0] + (p.y() - span.start().y()) * t[1]));
        double best = span.at(s).distanceTo(p);
        for (int round = 0; round < ROUNDS; round++) {
            Position q = span.at(s);
            double slope = span.depthSlope(s);
            double ux = t[0] + slope * e[0];
            double uy = t[1] + slope * e[1];
            double uz = t[2] + slope * e[2];
            double step = ((p.x() - q.x()) * ux + (p.y() - q.y()) * uy + (p.z() - q.z()) * uz) / (ux * ux + uy * uy + uz * uz);
            s = Math.max(0, Math.min(length, s + step));
            double distance = span.at(s).distanceTo(p);
            if (distance >= best) {
                break;
            }
            best = distance;
        }
        return best;
    }

    private static double tailDistance(Position from, double ux, double uy, Position p) {
        double length = Math.hypot(ux, uy);
        double rx = p.x() - from.x();
        double ry = p.y() - from.y();
        double along = Math.max(0, (rx * ux + ry * uy) / length);
        return Math.sqrt(Math.pow(rx - along * ux / length, 2) + Math.pow(ry - along * uy / length, 2) + Math.pow(p.z() - from.z(), 2));
    }
}
