/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.solver.field;

import spanfield.solver.geometry.CatenarySpan;

/** The constant vectors of a span, r(s) = r0 + s t + depth(s) e, as plain fields for the inner loops. */
final class SpanVectors {

    final double x0;
    final double y0;
    final double z0;
    final double tx;
    final double ty;
    final double tz;
    final double ex;
    final double ey;
    final double ez;

    /** Place of the span in its wire. */
    final int index;

    SpanVectors(CatenarySpan span, int index) {
        this.index = index;
        x0 = span.start().x();
        y0 = span.start().y();
        z0 = span.start().z();
        double[] t = span.chordDirection();
        tx = t[0];
        ty = t[1];
        tz = t[2];
        double[] e = span.depthDirection();
        ex = e[0];
        ey = e[1];
        ez = e[2];
    }
}
