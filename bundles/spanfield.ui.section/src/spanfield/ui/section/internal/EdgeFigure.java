/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.ui.section.internal;

import org.eclipse.draw2d.Figure;
import org.eclipse.draw2d.Graphics;
import org.eclipse.draw2d.geometry.Rectangle;

/** An edge of the right-of-way: a post on the ground, with its label away from the corridor. */
final class EdgeFigure extends Figure {

    static final int WIDTH = 120;
    static final int HEIGHT = 130;

    private final String label;
    private final boolean left;

    EdgeFigure(String label, boolean left) {
        this.label = label;
        this.left = left;
        setOpaque(false);
    }

    private int post() {
        return left ? getBounds().right() - 7 : getBounds().x + 6;
    }

    @Override
    protected void paintFigure(Graphics g) {
        Rectangle r = getBounds();
        g.setForegroundColor(getParent().getForegroundColor());
        g.setLineWidth(2);
        g.drawLine(post(), r.y, post(), r.bottom());
        int width = org.eclipse.draw2d.FigureUtilities.getTextWidth(label, getFont());
        g.drawString(label, left ? post() - 6 - width : post() + 6, r.y);
    }

    @Override
    public boolean containsPoint(int x, int y) {
        return super.containsPoint(x, y) && Math.abs(x - post()) <= 6;
    }
}
