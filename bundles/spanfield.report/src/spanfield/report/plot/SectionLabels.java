/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.report.plot;

import java.awt.Font;
import java.awt.FontMetrics;
import java.awt.Graphics2D;
import java.awt.geom.Ellipse2D;
import java.awt.geom.Path2D;
import java.awt.geom.Rectangle2D;
import java.util.List;
import org.jfree.chart.annotations.AbstractXYAnnotation;
import org.jfree.chart.axis.ValueAxis;
import org.jfree.chart.plot.PlotRenderingInfo;
import org.jfree.chart.plot.XYPlot;
import org.jfree.chart.ui.RectangleEdge;

/** Ground line and wires in the section beneath the field plot. */
final class SectionLabels extends AbstractXYAnnotation {

    private static final long serialVersionUID = 1L;

    private static final Font FONT = PlotStyle.font(Font.PLAIN, 10.5f);
    private static final double RADIUS = 3.4;

    /** Room between a label and a wire at its side, so that it is clear to which of two wires a label belongs. */
    private static final double CLEARANCE = 2.5;

    private final transient List<Wire> wires;
    private final double[] offsets;
    private final double[] ground;

    /**
     * A wire as drawn, in the units of the axes.
     *
     * @param label  label beside the wire, empty for none
     * @param offset offset
     * @param level  elevation
     * @param phase  true for a phase, drawn full; false for a shield wire, drawn as a square
     * @param still  false for a wire swung by the wind, drawn hollow
     */
    record Wire(String label, double offset, double level, boolean phase, boolean still) {
    }

    SectionLabels(List<Wire> wires, double[] offsets, double[] ground) {
        this.wires = List.copyOf(wires);
        this.offsets = offsets.clone();
        this.ground = ground.clone();
    }

    @Override
    public void draw(Graphics2D g2, XYPlot plot, Rectangle2D dataArea, ValueAxis domainAxis, ValueAxis rangeAxis, int rendererIndex,
        PlotRenderingInfo info) {
        drawGround(g2, dataArea, domainAxis, rangeAxis);
        LabelPlacer placer = new LabelPlacer(dataArea);
        g2.setFont(FONT);
        FontMetrics metrics = g2.getFontMetrics();
        for (Wire wire : wires) {
            double x = domainAxis.valueToJava2D(wire.offset(), dataArea, RectangleEdge.BOTTOM);
            double y = rangeAxis.valueToJava2D(wire.level(), dataArea, RectangleEdge.LEFT);
            drawWire(g2, wire, x, y);
            double keepOff = RADIUS + (wire.phase() ? CLEARANCE : 0);
            placer.avoid(new Rectangle2D.Double(x - keepOff, y - RADIUS, 2 * keepOff, 2 * RADIUS));
        }
        for (Wire wire : wires) {
            double x = domainAxis.valueToJava2D(wire.offset(), dataArea, RectangleEdge.BOTTOM);
            double y = rangeAxis.valueToJava2D(wire.level(), dataArea, RectangleEdge.LEFT);
            drawLabel(g2, wire, placer, metrics, x, y);
        }
    }

    private void drawGround(Graphics2D g2, Rectangle2D area, ValueAxis domain, ValueAxis range) {
        Path2D line = new Path2D.Double();
        Path2D earth = new Path2D.Double();
        earth.moveTo(domain.valueToJava2D(offsets[0], area, RectangleEdge.BOTTOM), area.getMaxY());
        for (int i = 0; i < offsets.length; i++) {
            double x = domain.valueToJava2D(offsets[i], area, RectangleEdge.BOTTOM);
            double y = range.valueToJava2D(ground[i], area, RectangleEdge.LEFT);
            earth.lineTo(x, y);
            if (i == 0) {
                line.moveTo(x, y);
            } else {
                line.lineTo(x, y);
            }
        }
        earth.lineTo(domain.valueToJava2D(offsets[offsets.length - 1], area, RectangleEdge.BOTTOM), area.getMaxY());
        earth.closePath();
        g2.setPaint(PlotStyle.GROUND_FILL);
        g2.fill(earth);
        g2.setPaint(PlotStyle.GROUND_LINE);
        g2.setStroke(PlotStyle.edgeStroke());
        g2.draw(line);
    }

    private static void drawWire(Graphics2D g2, Wire wire, double x, double y) {
        g2.setStroke(PlotStyle.thinStroke());
        g2.setPaint(wire.still() ? PlotStyle.INK : PlotStyle.SOFT_INK);
        java.awt.Shape shape = wire.phase() ? new Ellipse2D.Double(x - RADIUS, y - RADIUS, 2 * RADIUS, 2 * RADIUS)
            : new Rectangle2D.Double(x - RADIUS + 0.6, y - RADIUS + 0.6, 2 * RADIUS - 1.2, 2 * RADIUS - 1.2);
        if (wire.still() && wire.phase()) {
            g2.fill(shape);
        } else {
            g2.draw(shape);
        }
    }

    private static void drawLabel(Graphics2D g2, Wire wire, LabelPlacer placer, FontMetrics metrics, double x, double y) {
        if (wire.label().isEmpty()) {
            return;
        }
        for (Rectangle2D place : places(Labels.width(wire.label(), FONT), metrics.getAscent(), x, y)) {
            if (placer.takeIfFree(place)) {
                g2.setPaint(PlotStyle.INK);
                g2.drawString(wire.label(), (float) place.getX(), (float) place.getMaxY() - 1);
                return;
            }
        }
    }

    /** Right of the wire, left of it, above, beneath. */
    private static List<Rectangle2D> places(double width, double height, double x, double y) {
        double away = RADIUS + 2;
        double beside = RADIUS + CLEARANCE;
        return List.of(new Rectangle2D.Double(x + beside, y - height / 2, width, height),
            new Rectangle2D.Double(x - beside - width, y - height / 2, width, height),
            new Rectangle2D.Double(x - width / 2, y - away - height, width, height),
            new Rectangle2D.Double(x - width / 2, y + away, width, height));
    }
}
