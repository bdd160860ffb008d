/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.report.plot;

import java.awt.Color;
import java.awt.Font;
import java.awt.Graphics2D;
import java.awt.font.FontRenderContext;
import java.awt.geom.Rectangle2D;

/** Text on a drawing. */
final class Labels {

    /** Lets lines shine through a little, so that a covered line is not taken for an interrupted one. */
    private static final Color PAPER = new Color(255, 255, 255, 205);

    private Labels() {
    }

    /** Text in a rectangle as high as a line of the font, on nearly white paper. */
    static void draw(Graphics2D g2, String text, Rectangle2D place, Font font, Color colour) {
        g2.setPaint(PAPER);
        g2.fill(place);
        g2.setFont(font);
        g2.setPaint(colour);
        g2.drawString(text, (float) place.getX(), (float) place.getY() + g2.getFontMetrics(font).getAscent());
    }

    /**
     * Width of text as it is drawn at any scale. The metrics of a graphics would round every letter to whole pixels, some per cent too wide
     * for an SVG.
     */
    static double width(String text, Font font) {
        return font.getStringBounds(text, UNROUNDED).getWidth();
    }

    private static final FontRenderContext UNROUNDED = new FontRenderContext(null, true, true);

    /** A number as text with a true minus sign. */
    static String minus(String number) {
        return number.startsWith("-") ? "\u2212" + number.substring(1) : number;
    }
}
