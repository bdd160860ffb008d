/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.report.plot;

import java.awt.BasicStroke;
import java.awt.Color;
import java.awt.Font;
import java.awt.Stroke;
import java.util.List;

/**
 * Colours, strokes and fonts of plots.
 *
 * <p>The colours of the load cases were searched for the greatest least distance (CIE 1976 L*a*b*) between any two of them and black, as
 * seen with normal vision and with each of the three dichromacies (matrices of Machado, Oliveira, Fernandes 2009, from memory): 36 or more.
 * In print without colours the dash patterns tell the load cases apart.
 */
final class PlotStyle {

    static final Color INK = new Color(0x1a1a1a);
    static final Color SOFT_INK = new Color(0x505050);
    static final Color GRID = new Color(0xd9d9d9);
    /** Lets the grid shine through. */
    static final Color RIGHT_OF_WAY = new Color(0x5a, 0x78, 0x3c, 20);
    static final Color GROUND_LINE = new Color(0x6b5a45);
    static final Color GROUND_FILL = new Color(0xe9e2d8);

    private static final List<Color> SERIES =
        List.of(new Color(0x1f32b3), new Color(0xf57302), new Color(0x0ca583), new Color(0x8471b4), new Color(0x653b0d));

    private static final List<float[]> DASHES = List.of(new float[0], new float[] {9, 4}, new float[] {2.2f, 3.2f},
        new float[] {10, 3.5f, 2.2f, 3.5f}, new float[] {16, 5}, new float[] {10, 3, 2, 3, 2, 3});

    private static final float SERIES_WIDTH = 2f;

    private PlotStyle() {
    }

    static Color seriesColour(int series) {
        return SERIES.get(series % SERIES.size());
    }

    /** Five colours and six patterns: the first thirty load cases all look different. */
    static Stroke seriesStroke(int series) {
        float[] dash = DASHES.get(series % DASHES.size());
        return stroke(SERIES_WIDTH, dash);
    }

    static Stroke limitStroke() {
        return stroke(1.3f, new float[] {14, 3, 3, 3});
    }

    static Stroke edgeStroke() {
        return stroke(1.3f, new float[0]);
    }

    static Stroke thinStroke() {
        return stroke(0.8f, new float[0]);
    }

    private static Stroke stroke(float width, float[] dash) {
        return dash.length == 0 ? new BasicStroke(width, BasicStroke.CAP_BUTT, BasicStroke.JOIN_ROUND)
            : new BasicStroke(width, BasicStroke.CAP_BUTT, BasicStroke.JOIN_ROUND, 10, dash, 0);
    }

    static Font font(int style, float size) {
        return new Font(Font.SANS_SERIF, style, 12).deriveFont(size);
    }
}
