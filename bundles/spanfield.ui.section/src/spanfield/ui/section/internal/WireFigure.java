/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.ui.section.internal;

import org.eclipse.draw2d.Figure;
import org.eclipse.draw2d.Graphics;
import org.eclipse.draw2d.geometry.Point;
import org.eclipse.draw2d.geometry.Rectangle;
import org.eclipse.swt.graphics.Color;

/** A wire in section: a disc for a phase, with its label, or an open square for a shield wire. */
final class WireFigure extends Figure {

    private static final int RADIUS = 6;
    private static final int WIDTH = 34;

    private final String label;
    private final boolean shield;
    private final Color color;

    WireFigure(String label, boolean shield, Color color) {
        this.label = label;
        this.shield = shield;
        this.color = color;
        setOpaque(false);
    }

    /** Bounds of the figure about the place of the wire. */
    static Rectangle boundsAt(Point place) {
        return new Rectangle(place.x - RADIUS - 2, place.y - RADIUS - 3, WIDTH, 2 * RADIUS + 6);
    }

    @Override
    protected void paintFigure(Graphics g) {
        Rectangle r = getBounds();
        int x = r.x + RADIUS + 2;
        int y = r.y + RADIUS + 3;
        g.setForegroundColor(color);
        g.setBackgroundColor(color);
        if (shield) {
            g.setLineWidth(2);
            g.drawRectangle(x - RADIUS + 2, y - RADIUS + 2, 2 * RADIUS - 4, 2 * RADIUS - 4);
        } else {
            g.fillOval(x - RADIUS, y - RADIUS, 2 * RADIUS, 2 * RADIUS);
            g.setForegroundColor(getParent().getForegroundColor());
            g.drawString(label, x + RADIUS + 4, r.y + r.height / 2 - g.getFontMetrics().getHeight() / 2);
        }
    }
}
