/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.ui.section.internal;

import java.util.ArrayList;
import java.util.List;
import org.eclipse.draw2d.Figure;
import org.eclipse.draw2d.Graphics;
import org.eclipse.draw2d.geometry.Point;
import org.eclipse.draw2d.geometry.PointList;
import org.eclipse.draw2d.geometry.Rectangle;
import org.eclipse.swt.graphics.Color;

/** One or more polylines: the ground (with earth below it), the reference height, the outline of a structure. */
final class PolylinesFigure extends Figure {

    private static final int REACH = 5;

    private final List<PointList> lines = new ArrayList<>();
    private final Color color;
    private final int style;
    private final int earthDepth;

    /**
     * @param style      line style of SWT
     * @param earthDepth pixels of earth that are filled below the line; 0 for none
     */
    PolylinesFigure(Color color, int style, int earthDepth) {
        this.color = color;
        this.style = style;
        this.earthDepth = earthDepth;
        setOpaque(false);
    }

    /** Sets the lines; bounds follow. */
    void setLines(List<PointList> fresh) {
        lines.clear();
        lines.addAll(fresh);
        Rectangle all = null;
        for (PointList line : lines) {
            all = all == null ? line.getBounds().getCopy() : all.union(line.getBounds());
        }
        if (all != null) {
            all.expand(REACH, REACH);
            all.height += earthDepth;
            setBounds(all);
        }
    }

    @Override
    protected void paintFigure(Graphics g) {
        g.setForegroundColor(color);
        g.setBackgroundColor(color);
        for (PointList line : lines) {
            if (earthDepth > 0) {
                PointList earth = line.getCopy();
                earth.addPoint(line.getLastPoint().x, getBounds().bottom());
                earth.addPoint(line.getFirstPoint().x, getBounds().bottom());
                g.setAlpha(50);
                g.fillPolygon(earth);
                g.setAlpha(255);
            }
            g.setLineWidth(earthDepth > 0 ? 2 : 1);
            g.setLineStyle(style);
            g.drawPolyline(line);
        }
    }

    /** Only the lines themselves can be hit, so that what lies between them stays reachable. */
    @Override
    public boolean containsPoint(int x, int y) {
        if (!super.containsPoint(x, y)) {
            return false;
        }
        for (PointList line : lines) {
            for (int i = 1; i < line.size(); i++) {
                if (distance(line.getPoint(i - 1), line.getPoint(i), x, y) <= REACH) {
                    return true;
                }
            }
        }
        return false;
    }

    private static double distance(Point a, Point b, int x, int y) {
        double dx = b.x - a.x;
        double dy = b.y - a.y;
        double square = dx * dx + dy * dy;
        double t = square == 0 ? 0 : Math.max(0, Math.min(1, ((x - a.x) * dx + (y - a.y) * dy) / square));
        return Math.hypot(x - a.x - t * dx, y - a.y - t * dy);
    }
}
