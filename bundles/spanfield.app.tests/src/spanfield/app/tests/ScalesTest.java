/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.app.tests;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.junit.jupiter.api.Test;
import spanfield.model.Circuit;
import spanfield.model.CurrentLoad;
import spanfield.model.FlowDirection;
import spanfield.model.PowerLoad;
import spanfield.model.SpanfieldFactory;
import spanfield.ui.common.AxisScale;
import spanfield.ui.results.LoadText;

/** Axes of charts, and loads as typed texts. */
class ScalesTest {

    /** Half a pixel, in units of the axis. */
    private static final double HALF_PIXEL = 0.5;

    @Test
    void axis_isInverseWithinHalfAPixel() {
        AxisScale linear = new AxisScale(-150, 150, 40, 640, false);
        AxisScale logarithmic = new AxisScale(1e-3, 30, 500, 20, true);
        for (double value : new double[] {-150, -31.4, 0, 99.9, 150}) {
            assertEquals(value, linear.toValue(linear.toPixel(value)), HALF_PIXEL * 300 / 600);
        }
        for (double value : new double[] {1e-3, 0.02, 1, 30}) {
            assertEquals(0, Math.log(logarithmic.toValue(logarithmic.toPixel(value)) / value), HALF_PIXEL * Math.log(3e4) / 480 + 1e-12);
        }
    }

    @Test
    void ticks_areRoundAndWithin() {
        assertEquals(List.of(-100.0, -50.0, 0.0, 50.0, 100.0), new AxisScale(-120, 120, 0, 500, false).ticks(5));
        assertEquals(List.of(0.01, 0.1, 1.0, 10.0), new AxisScale(0.005, 30, 0, 500, true).ticks(5).stream().map(t -> Math.round(t * 1e6) / 1e6).toList());
        assertEquals(40, AxisScale.niceEnd(34.5), 1e-12);
        assertEquals(0.05, AxisScale.niceStep(0.04), 1e-15);
        assertThrows(IllegalArgumentException.class, () -> new AxisScale(3, 3, 0, 1, false));
        assertThrows(IllegalArgumentException.class, () -> new AxisScale(0, 3, 0, 1, true));
    }

    @Test
    void loads_areTypedAndShownAlike() {
        Circuit circuit = SpanfieldFactory.eINSTANCE.createCircuit();
        for (String text : new String[] {"480 A", "480 A -12\u00b0", "42 MW 9 Mvar", "42 MW", "52 MW 6 Mvar reversed"}) {
            assertEquals(text, LoadText.of(LoadText.parse(text, circuit)));
        }
        CurrentLoad current = (CurrentLoad) LoadText.parse(" 320.5 a \u221215 ", circuit);
        assertEquals(320.5, current.getCurrentAmperes(), 0);
        assertEquals(-15, current.getAngleDegrees(), 0);
        PowerLoad power = (PowerLoad) LoadText.parse("10mw, -2mvar reversed", circuit);
        assertEquals(1e7, power.getActivePowerWatts(), 0);
        assertEquals(-2e6, power.getReactivePowerVars(), 0);
        assertEquals(FlowDirection.REVERSED, power.getDirection());
        assertEquals(null, LoadText.parse("  ", circuit));
        assertTrue(assertThrows(IllegalArgumentException.class, () -> LoadText.parse("much", circuit)).getMessage().contains("480 A"));
    }
}
