/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.solver.field;

import org.apache.commons.math3.complex.Complex;
import spanfield.solver.earth.EarthReturn;
import spanfield.solver.geometry.CatenarySpan;
import spanfield.solver.geometry.Wire;
import spanfield.solver.geometry.WireEnd;
import spanfield.solver.geometry.WirePath;

/**
 * Field of the complex image of one wire, without the factor mu0/(4 pi): the element at (X, Y, Z) has an image at
 * (X, Y, 2 Zg - Z - 2p) which carries the opposite current along the mirrored path (dX, dY, -dZ); the Biot-Savart integrand is continued
 * analytically to the complex height (Deri, Tevan, Semlyen, Castanheira, IEEE Trans. PAS-100 no. 8, 1981), principal branch of
 * (R.R)^(3/2). One set of nodes serves all points: the image is at least 2 Re p away from every one.
 */
final class ImageField {

    /** Share of the tolerance that one span may use. */
    private static final double SPANS_THAT_MATTER = 8;

    private final WirePath path;
    private final SourceNodes nodes = new SourceNodes();
    private final double planeTwice;
    private final double depthRe;
    private final double depthIm;
    private final double error;

    /**
     * @param leastHeightSum least sum of heights above the plane over all points and the wire, in metres; more than -2 Re p
     * @param relative       accuracy relative to 2 over the distance of the image
     */
    ImageField(Wire wire, EarthReturn earth, double leastHeightSum, double relative) {
        this.path = wire.path();
        Complex p = earth.complexDepth();
        this.depthRe = 2 * p.getReal();
        this.depthIm = 2 * p.getImaginary();
        this.planeTwice = 2 * earth.planeElevationMetres();
        double distance = leastHeightSum + depthRe;
        double bound = 0;
        for (CatenarySpan span : path.spans()) {
            bound += addSpan(span, distance, relative);
        }
        this.error = bound;
    }

    /** Equal parts of a span, each with the rule it needs: the nearest singularity is at least {@code distance} off the real axis. */
    private double addSpan(CatenarySpan span, double distance, double relative) {
        SpanVectors v = new SpanVectors(span, 0);
        double length = span.horizontalLengthMetres();
        for (int parts = 1;; parts++) {
            double half = length / parts / 2;
            double y = distance / half;
            double rho = Math.sqrt(1 + y * y) + y;
            double scale = FilamentField.ERROR_FACTOR * 2 * half / (distance * distance);
            double allowed = Math.min(0, Math.log(relative * 2 / distance / SPANS_THAT_MATTER / scale));
            double rate = FilamentField.PATH_RATE * half / span.constantMetres();
            int n = FilamentField.nodesNeeded(allowed, rho, rate);
            if (n <= GaussRules.GREATEST) {
                for (int i = 0; i < parts; i++) {
                    nodes.add(span, v, length * i / parts, length * (i + 1) / parts, n);
                }
                return parts * scale * Math.exp(FilamentField.logError(n, rho, rate));
            }
        }
    }

    /** Bound of the quadrature error at any point, in 1/m. */
    double error() {
        return error;
    }

    /** Adds Re and Im of X, Y, Z of the image field at a point to out[at .. at+5], in 1/m. */
    void addTo(double x, double y, double z, double[] out, int at) {
        double reXsum = 0;
        double imXsum = 0;
        double reYsum = 0;
        double imYsum = 0;
        double reZsum = 0;
        double imZsum = 0;
        double b = depthIm;
        for (int k = 0; k < nodes.count; k++) {
            double rx = x - nodes.x[k];
            double ry = y - nodes.y[k];
            double rz = z + nodes.z[k] - planeTwice + depthRe;
            double qr = rx * rx + ry * ry + rz * rz - b * b;
            double qi = 2 * rz * b;
            double m = Math.sqrt(qr * qr + qi * qi);
            double sr = Math.sqrt((m + Math.abs(qr)) / 2);
            double si = qi / (2 * sr);
            if (qr < 0) {
                double t = Math.abs(si);
                si = Math.copySign(sr, qi);
                sr = t;
            }
            // f = -1 / (q s): the image carries the opposite current
            double dr = qr * sr - qi * si;
            double di = qr * si + qi * sr;
            double d = -1 / (dr * dr + di * di);
            double fr = dr * d;
            double fi = -di * d;
            double dx = nodes.dx[k];
            double dy = nodes.dy[k];
            double dz = -nodes.dz[k];
            double cx = dy * rz - dz * ry;
            double cy = dz * rx - dx * rz;
            double cz = dx * ry - dy * rx;
            reXsum += cx * fr - dy * b * fi;
            imXsum += cx * fi + dy * b * fr;
            reYsum += cy * fr + dx * b * fi;
            imYsum += cy * fi - dx * b * fr;
            reZsum += cz * fr;
            imZsum += cz * fi;
        }
        out[at] += reXsum;
        out[at + 1] += imXsum;
        out[at + 2] += reYsum;
        out[at + 3] += imYsum;
        out[at + 4] += reZsum;
        out[at + 5] += imZsum;
        addTails(x, y, z, out, at);
    }

    private void addTails(double x, double y, double z, double[] out, int at) {
        if (path.start() == WireEnd.CONTINUES) {
            CatenarySpan first = path.spans().get(0);
            double[] t = first.chordDirection();
            tail(x - first.start().x(), y - first.start().y(), z + first.start().z() - planeTwice, -t[0], -t[1], 1, out, at);
        }
        if (path.finish() == WireEnd.CONTINUES) {
            CatenarySpan last = path.spans().get(path.spans().size() - 1);
            double[] t = last.chordDirection();
            tail(x - last.end().x(), y - last.end().y(), z + last.end().z() - planeTwice, t[0], t[1], -1, out, at);
        }
    }

    /** Complex form of the semi-infinite filament, see FilamentField.tail; sign includes the opposite current of the image. */
    private void tail(double rx, double ry, double heightSum, double ux, double uy, double sign, double[] out, int at) {
        Complex rz = new Complex(heightSum + depthRe, depthIm);
        double a = ux * rx + uy * ry;
        double lateral = ux * ry - uy * rx;
        Complex across = rz.multiply(rz).add(lateral * lateral);
        Complex r = across.add(a * a).sqrt();
        Complex f = a > 0 ? r.add(a).divide(r.multiply(across)) : r.multiply(r.subtract(a)).reciprocal();
        f = f.multiply(sign);
        Complex vertical = f.multiply(rz);
        out[at] += uy * vertical.getReal();
        out[at + 1] += uy * vertical.getImaginary();
        out[at + 2] -= ux * vertical.getReal();
        out[at + 3] -= ux * vertical.getImaginary();
        out[at + 4] += lateral * f.getReal();
        out[at + 5] += lateral * f.getImaginary();
    }
}
