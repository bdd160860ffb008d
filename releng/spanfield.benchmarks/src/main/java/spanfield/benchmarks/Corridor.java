/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.benchmarks;

import java.util.ArrayList;
import java.util.List;
import spanfield.solver.geometry.CatenarySpan;
import spanfield.solver.geometry.Position;
import spanfield.solver.geometry.Wire;
import spanfield.solver.geometry.WireEnd;
import spanfield.solver.geometry.WirePath;

/** The line of the benchmarks: two vertical circuits and two shield wires, eight wires of seven 300 m spans. */
final class Corridor {

    private Corridor() {
    }

    static List<Wire> wires() {
        double[] x = {-6, -6.5, -6, 6, 6.5, 6, -3, 3};
        double[] z = {38, 31, 24, 38, 31, 24, 45, 45};
        List<Wire> wires = new ArrayList<>();
        for (int w = 0; w < x.length; w++) {
            List<CatenarySpan> spans = new ArrayList<>();
            for (int i = -3; i <= 3; i++) {
                spans.add(CatenarySpan.ofConstant(new Position(x[w], 300 * i - 150, z[w]), new Position(x[w], 300 * i + 150, z[w]),
                    w < 6 ? 1500 : 1900, 0));
            }
            wires.add(new Wire("wire " + w, new WirePath(spans, WireEnd.CONTINUES, WireEnd.CONTINUES), 0.014));
        }
        return wires;
    }
}
