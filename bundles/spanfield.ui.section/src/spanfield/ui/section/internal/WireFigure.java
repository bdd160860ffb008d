/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.ui.section.internal;

import org.eclipse.draw2d.Figure;
import org.eclipse.draw2d.FigureUtilities;
import org.eclipse.draw2d.Graphics;
import org.eclipse.draw2d.geometry.Point;
import org.eclipse.draw2d.geometry.Rectangle;
import org.eclipse.swt.graphics.Color;

/** A wire in section: a disc for a phase, with its label, or an open square for a shield wire. */
final class WireFigure extends Figure {

    private static final int RADIUS = 6;
    private static final int GAP = 4;

    private final String label;
    private final boolean shield;
    private final Color color;

    WireFigure(String label, boolean shield, Color color) {
        this.label = label;
        this.shield = shield;
        this.color = color;
        setOpaque(false);
    }

    /** Puts the figure about the place of the wire, with room for its label. The figure has a parent by then, for its font. */
    void setPlace(Point place) {
        int half = label.isEmpty() ? RADIUS + 3 : Math.max(RADIUS + 3, FigureUtilities.getFontMetrics(getFont()).getHeight() / 2 + 1);
        int text = label.isEmpty() ? 0 : GAP + FigureUtilities.getTextWidth(label, getFont());
        setBounds(new Rectangle(place.x - RADIUS - 2, place.y - half, 2 * RADIUS + 4 + text, 2 * half));
    }

    @Override
    protected void paintFigure(Graphics g) {
        Rectangle r = getBounds();
        int x = r.x + RADIUS + 2;
        int y = r.y + r.height / 2;
        g.setForegroundColor(color);
        g.setBackgroundColor(color);
        if (shield) {
            g.setLineWidth(2);
            g.drawRectangle(x - RADIUS + 2, y - RADIUS + 2, 2 * RADIUS - 4, 2 * RADIUS - 4);
        } else {
            g.fillOval(x - RADIUS, y - RADIUS, 2 * RADIUS, 2 * RADIUS);
            g.setForegroundColor(getParent().getForegroundColor());
            g.drawString(label, x + RADIUS + GAP, r.y + r.height / 2 - g.getFontMetrics().getHeight() / 2);
        }
    }
}
