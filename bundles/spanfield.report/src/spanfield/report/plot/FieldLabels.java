/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.report.plot;

import java.awt.Font;
import java.awt.FontMetrics;
import java.awt.Graphics2D;
import java.awt.geom.Line2D;
import java.awt.geom.Path2D;
import java.awt.geom.Rectangle2D;
import java.util.ArrayList;
import java.util.List;
import org.jfree.chart.annotations.AbstractXYAnnotation;
import org.jfree.chart.axis.ValueAxis;
import org.jfree.chart.plot.PlotRenderingInfo;
import org.jfree.chart.plot.XYPlot;
import org.jfree.chart.ui.RectangleEdge;
import org.jfree.data.xy.XYDataset;

/**
 * Limit lines and the labels of limits and edges in the field plot. Drawn as one annotation, since a label is placed with a view of all
 * the others and of the curves.
 */
final class FieldLabels extends AbstractXYAnnotation {

    private static final long serialVersionUID = 1L;

    private static final Font FONT = PlotStyle.font(Font.PLAIN, 11.5f);
    private static final double GAP = 5;
    private static final double MARK = 4.5;

    /** How much of its length a limit line at the edges extends over each edge, in pixels. */
    private static final double EDGE_REACH = 26;

    private final transient List<LimitLine> limits;
    private final transient List<EdgeLine> edges;

    /**
     * A limit as drawn.
     *
     * @param label label, units included
     * @param level level on the range axis
     * @param from  first offset of the line on the domain axis
     * @param to    last offset of the line
     * @param marks offsets at which the limit holds, where it holds at single offsets only
     */
    record LimitLine(String label, double level, double from, double to, List<Double> marks) {
    }

    /**
     * An edge of the right-of-way as drawn.
     *
     * @param label  label, units included
     * @param offset offset on the domain axis
     * @param left   whether it is the left edge
     */
    record EdgeLine(String label, double offset, boolean left) {
    }

    FieldLabels(List<LimitLine> limits, List<EdgeLine> edges) {
        this.limits = List.copyOf(limits);
        this.edges = List.copyOf(edges);
    }

    /** From data to drawing coordinates. */
    private record Scale(Rectangle2D area, ValueAxis domain, ValueAxis range) {

        double x(double value) {
            return domain.valueToJava2D(value, area, RectangleEdge.BOTTOM);
        }

        double y(double value) {
            return range.valueToJava2D(value, area, RectangleEdge.LEFT);
        }
    }

    @Override
    public void draw(Graphics2D g2, XYPlot plot, Rectangle2D dataArea, ValueAxis domainAxis, ValueAxis rangeAxis, int rendererIndex,
        PlotRenderingInfo info) {
        Scale scale = new Scale(dataArea, domainAxis, rangeAxis);
        LabelPlacer placer = new LabelPlacer(dataArea);
        avoidCurves(placer, plot.getDataset(), scale);
        for (LimitLine limit : limits) {
            placer.avoid(new Line2D.Double(scale.x(limit.from()), scale.y(limit.level()), scale.x(limit.to()), scale.y(limit.level())));
        }
        for (EdgeLine edge : edges) {
            placer.avoid(new Line2D.Double(scale.x(edge.offset()), dataArea.getMinY(), scale.x(edge.offset()), dataArea.getMaxY()));
        }
        g2.setFont(FONT);
        limits.forEach(limit -> drawLine(g2, limit, scale));
        edges.forEach(edge -> label(g2, edge.label(), placer.place(edgePlaces(g2.getFontMetrics(), edge, scale))));
        limits.forEach(limit -> label(g2, limit.label(), placer.place(limitPlaces(g2.getFontMetrics(), limit, scale))));
    }

    private static void avoidCurves(LabelPlacer placer, XYDataset data, Scale scale) {
        for (int s = 0; s < data.getSeriesCount(); s++) {
            for (int i = 1; i < data.getItemCount(s); i++) {
                placer.avoid(new Line2D.Double(scale.x(data.getXValue(s, i - 1)), scale.y(data.getYValue(s, i - 1)),
                    scale.x(data.getXValue(s, i)), scale.y(data.getYValue(s, i))));
            }
        }
    }

    private static void drawLine(Graphics2D g2, LimitLine limit, Scale scale) {
        double y = scale.y(limit.level());
        g2.setPaint(PlotStyle.INK);
        g2.setStroke(PlotStyle.limitStroke());
        g2.draw(new Line2D.Double(scale.x(limit.from()), y, scale.x(limit.to()), y));
        for (double mark : limit.marks()) {
            double x = scale.x(mark);
            g2.fill(diamond(x, y));
            g2.setStroke(PlotStyle.edgeStroke());
            g2.draw(new Line2D.Double(x - EDGE_REACH, y, x + EDGE_REACH, y));
        }
    }

    private static Path2D diamond(double x, double y) {
        Path2D path = new Path2D.Double();
        path.moveTo(x - MARK, y);
        path.lineTo(x, y - MARK);
        path.lineTo(x + MARK, y);
        path.lineTo(x, y + MARK);
        path.closePath();
        return path;
    }

    /** Outside the right-of-way at the top first, then inside, then further down. */
    private static List<Rectangle2D> edgePlaces(FontMetrics metrics, EdgeLine edge, Scale scale) {
        double width = Labels.width(edge.label(), FONT);
        double x = scale.x(edge.offset());
        double left = x - GAP - width;
        double right = x + GAP;
        List<Rectangle2D> places = new ArrayList<>();
        for (double down = GAP; down < scale.area().getHeight() / 2; down += metrics.getHeight()) {
            double y = scale.area().getMinY() + down;
            places.add(new Rectangle2D.Double(edge.left() ? left : right, y, width, metrics.getHeight()));
            places.add(new Rectangle2D.Double(edge.left() ? right : left, y, width, metrics.getHeight()));
        }
        return places;
    }

    /** On the line near its right end first, then beneath, then along the line to its left end. */
    private static List<Rectangle2D> limitPlaces(FontMetrics metrics, LimitLine limit, Scale scale) {
        double width = Labels.width(limit.label(), FONT);
        double y = scale.y(limit.level());
        double first = Math.max(scale.area().getMinX(), scale.x(limit.from())) + GAP;
        double last = Math.min(scale.area().getMaxX(), scale.x(limit.to())) - GAP - width;
        List<Rectangle2D> places = new ArrayList<>();
        for (int step = 0; step <= STEPS; step++) {
            double x = last + (first - last) * step / STEPS;
            places.add(new Rectangle2D.Double(x, y - metrics.getHeight() - 1.5, width, metrics.getHeight()));
            places.add(new Rectangle2D.Double(x, y + 1.5, width, metrics.getHeight()));
        }
        return places;
    }

    private static final int STEPS = 12;

    private static void label(Graphics2D g2, String text, Rectangle2D place) {
        Labels.draw(g2, text, place, FONT, PlotStyle.INK);
    }
}
