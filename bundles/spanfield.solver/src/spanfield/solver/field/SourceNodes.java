/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.solver.field;

import spanfield.solver.geometry.CatenarySpan;
import spanfield.solver.geometry.Hyperbolic;

/**
 * Quadrature nodes on wires: position and weighted path element of each, as arrays that grow. A worker's scratch, not shared.
 *
 * <p>Nodes of a panel come from one hyperbolic pair at the panel's middle and short series about it (addition theorem), not from a cosh
 * for each node.
 */
final class SourceNodes {

    double[] x = new double[64];
    double[] y = new double[64];
    double[] z = new double[64];
    double[] dx = new double[64];
    double[] dy = new double[64];
    double[] dz = new double[64];
    int count;
    /** Least semi-minor axis of the ellipses about the panels: a lower estimate of the distance from the wire to the nearest point. */
    double nearest;

    void clear() {
        count = 0;
        nearest = Double.POSITIVE_INFINITY;
    }

    /**
     * Adds the nodes of the Gauss rule with {@code n} nodes on the part of a span between the horizontal distances from and to.
     */
    void add(CatenarySpan span, SpanVectors v, double from, double to, int n) {
        reserve(n);
        double half = (to - from) / 2;
        double middle = (to + from) / 2;
        double c = span.constantMetres();
        boolean straight = Double.isInfinite(c);
        double theta = straight ? 0 : (middle - span.vertexMetres()) / c;
        double sinh = straight ? 0 : Hyperbolic.sinh(theta);
        double cosh = straight ? 1 : Math.sqrt(1 + sinh * sinh);
        double depth = span.depthMetres(middle);
        for (int i = 0; i < n; i++) {
            double step = half * GaussRules.node(n, i);
            double weight = half * GaussRules.weight(n, i);
            double d = depth;
            double slope = 0;
            if (!straight) {
                double u = step / c;
                double sinhU = Hyperbolic.sinh(u);
                double coshU1 = Hyperbolic.coshLess1(u);
                d = depth + v.tz * step - c * (cosh * coshU1 + sinh * sinhU);
                slope = v.tz - (sinh + sinh * coshU1 + cosh * sinhU);
            }
            double s = middle + step;
            x[count] = v.x0 + s * v.tx + d * v.ex;
            y[count] = v.y0 + s * v.ty + d * v.ey;
            z[count] = v.z0 + s * v.tz + d * v.ez;
            dx[count] = weight * (v.tx + slope * v.ex);
            dy[count] = weight * (v.ty + slope * v.ey);
            dz[count] = weight * (v.tz + slope * v.ez);
            count++;
        }
    }

    /** Adds copies of the nodes of another. */
    void addAll(SourceNodes other) {
        reserve(other.count);
        System.arraycopy(other.x, 0, x, count, other.count);
        System.arraycopy(other.y, 0, y, count, other.count);
        System.arraycopy(other.z, 0, z, count, other.count);
        System.arraycopy(other.dx, 0, dx, count, other.count);
        System.arraycopy(other.dy, 0, dy, count, other.count);
        System.arraycopy(other.dz, 0, dz, count, other.count);
        count += other.count;
    }

    private void reserve(int n) {
        if (count + n > x.length) {
            int size = Math.max(2 * x.length, count + n);
            x = java.util.Arrays.copyOf(x, size);
            y = java.util.Arrays.copyOf(y, size);
            z = java.util.Arrays.copyOf(z, size);
            dx = java.util.Arrays.copyOf(dx, size);
            dy = java.util.Arrays.copyOf(dy, size);
            dz = java.util.Arrays.copyOf(dz, size);
        }
    }
}
