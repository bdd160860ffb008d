/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.solver.tests.published;

import static org.junit.jupiter.api.Assertions.assertEquals;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import spanfield.solver.geometry.CatenarySpan;
import spanfield.solver.geometry.Position;

/** Catenaries against texts on overhead lines. Lengths in the unit of the source: the catenary has no scale of its own. */
class CatenaryTest {

    private static CatenarySpan level(double span, double constant) {
        return CatenarySpan.ofConstant(new Position(0, 0, 100), new Position(0, span, 100), constant, 0);
    }

    /** CAT-01: Gonen, Electric Power Transmission System Engineering, 2nd ed., Example 13.1 (inputs; results recomputed): 5e-5 relative. */
    @Test
    void levelSpan_hasLengthSagAndTensions() {
        CatenarySpan span = level(500, 1600);
        final double relative = 5e-5;
        assertEquals(502.037, span.lengthMetres(), 502 * relative);
        assertEquals(19.571, span.midspanSagMetres(), 19.6 * relative);
        double weight = 4122.0 / 5280;
        assertEquals(1264.4, weight * (1600 + span.midspanSagMetres()), 1264 * relative);
        assertEquals(1249.1, weight * 1600, 1249 * relative);
    }

    /**
     * CAT-03b: the span of Wadhwa, Electrical Power Systems, Example 7.4 (300 m, heights 30 and 90, H = 2000 kg, 1 kg/m), with the exact catenary
     * (derived): 54.2611 m midway and the vertex 247.013 m outside. The book's 54.375 m and 250 m are those of the parabola.
     */
    @Test
    void unequalSupports_followExactCatenaryNotParabola() {
        CatenarySpan span = CatenarySpan.ofConstant(new Position(0, 0, 30), new Position(0, 300, 90), 2000, 0);
        final double printed = 0.001;
        assertEquals(54.2611, span.at(150).z(), printed);
        assertEquals(-247.013, span.vertexMetres(), printed);
        assertEquals(30, span.lowestPoint().z(), 1e-12);
    }

    /**
     * CAT-04: Grigsby (ed.), Electric Power Generation, Transmission and Distribution, ch. 14, Table 14.5, Drake: sag from span, weight and
     * listed tension. The table does not say whether the tension is horizontal: 0.4 % covers both readings.
     */
    @ParameterizedTest
    @CsvSource({"700,1.094,5429,12.36", "700,1.094,6300,10.65", "700,1.094,8161,8.22", "700,1.094,4330,15.52", "700,1.094,3728,18.04",
        "700,2.094,9224,13.93", "700,2.509,11318,13.61", "1000,1.094,7318,18.72", "1000,2.094,9990,26.30", "1000,2.509,12116,25.98"})
    void sagFromTension_matchesHandbookTable(double span, double weight, double tension, double sag) {
        assertEquals(sag, level(span, tension / weight).midspanSagMetres(), 0.004 * sag);
    }

    /** CAT-06: the worked example in the text of the same chapter (from memory), 600 ft, 6300 lb: constant, length; 1e-4 relative. */
    @Test
    void handbookExample_hasLengthAndSupportTension() {
        CatenarySpan span = level(600, 6300 / 1.094);
        assertEquals(5758.7, span.constantMetres(), 5758.7e-4);
        assertEquals(600.271, span.lengthMetres(), 0.06);
        assertEquals(6308.5, 6300 + 1.094 * span.midspanSagMetres(), 0.63);
    }

    /** CAT-07: Drake, 300 m, 28 kN, in the style of CIGRE TB 324 (from memory): constant, catenary sag, length, slack; 2e-5 relative. */
    @Test
    void drake300m_hasCatenarySag() {
        CatenarySpan span = level(300, 28000 / 15.97);
        assertEquals(1753.29, span.constantMetres(), 1753.29 * 2e-5);
        assertEquals(6.4204, span.midspanSagMetres(), 6.42 * 2e-5);
        assertEquals(300.3661, span.lengthMetres(), 300 * 2e-5);
        assertEquals(0.3661, span.lengthMetres() - 300, 0.0001);
        assertEquals(28102.5, 15.97 * (span.constantMetres() + span.midspanSagMetres()), 28102.5 * 2e-5);
    }

    /** The sag of a given constant gives back the constant: 1e-9 relative, the tolerance of the root finder. */
    @ParameterizedTest
    @CsvSource({"300,0,1500", "20,5,300", "1500,-200,900", "350,90,2200", "60,1,25000"})
    void sagAndConstant_areInverse(double length, double rise, double constant) {
        CatenarySpan span = CatenarySpan.ofConstant(new Position(0, 0, 50), new Position(0, length, 50 + rise), constant, 0);
        assertEquals(constant, CatenarySpan.constantForMidspanSag(length, rise, span.midspanSagMetres()), 1e-9 * constant);
    }
}
