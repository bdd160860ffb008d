/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.ui.common;

import java.util.List;
import java.util.function.Predicate;
import org.eclipse.swt.SWT;
import org.eclipse.swt.graphics.Color;
import org.eclipse.swt.graphics.GC;
import org.eclipse.swt.graphics.Point;
import org.eclipse.swt.graphics.RGB;
import org.eclipse.swt.graphics.Rectangle;
import org.eclipse.swt.widgets.Canvas;
import org.eclipse.swt.widgets.Composite;
import spanfield.model.FieldMeasure;
import spanfield.report.Numbers;
import spanfield.report.Units;
import spanfield.study.result.LateralProfile;
import spanfield.study.result.LimitInfo;
import spanfield.study.result.ProfileCase;

/**
 * Chart of a lateral profile: a curve for each load case with its own line style as well as colour, edges of the right-of-way, limits, and
 * a cursor that reads the values. Takes foreground and background from the theme; curves are light or dark to suit.
 */
public final class ProfileCanvas extends Canvas {

    /** Hues of the curves; their lightness follows the background. Blue, orange, green, purple, brown, teal. */
    private static final float[] HUES = {215, 25, 150, 290, 45, 185};
    private static final int[] STYLES = {SWT.LINE_SOLID, SWT.LINE_DASH, SWT.LINE_DOT, SWT.LINE_DASHDOT, SWT.LINE_DASHDOTDOT};
    /** Decades below the greatest value that a logarithmic axis shows. */
    private static final double DECADES = 1e-4;

    private final boolean compact;
    private LateralProfile profile;
    private Units units = Units.SI;
    private FieldMeasure measure = FieldMeasure.RESULTANT;
    private Predicate<String> shown = id -> true;
    private List<Reading> readings = List.of();
    private boolean logarithmic;
    private boolean stale;
    private int cursor = -1;
    private AxisScale across;
    private AxisScale up;

    /**
     * @param parent where the chart goes
     * @param small  whether the legend is left out, for a chart that accompanies something else
     */
    public ProfileCanvas(Composite parent, boolean small) {
        super(parent, SWT.DOUBLE_BUFFERED);
        compact = small;
        addPaintListener(event -> paint(event.gc));
        addListener(SWT.MouseMove, event -> moveCursor(event.x));
        addListener(SWT.MouseExit, event -> moveCursor(-1));
        addListener(SWT.KeyDown, event -> {
            if (event.keyCode == SWT.ARROW_LEFT || event.keyCode == SWT.ARROW_RIGHT) {
                int start = cursor < 0 && across != null ? across.toPixel(0) : cursor;
                moveCursor(start + (event.keyCode == SWT.ARROW_LEFT ? -1 : 1) * ((event.stateMask & SWT.SHIFT) == 0 ? 1 : 10));
            }
        });
        addListener(SWT.Traverse, event -> event.doit = true);
    }

    /**
     * Shows a profile.
     *
     * @param fresh the profile, or null when there is none
     * @param old   whether it belongs to an older state of the study
     */
    public void show(LateralProfile fresh, boolean old) {
        profile = fresh;
        stale = old;
        redraw();
    }

    /** Chooses what is drawn: units, measure, load cases by identifier, and the kind of the vertical axis. */
    public void configure(Units newUnits, FieldMeasure newMeasure, Predicate<String> cases, boolean log) {
        units = newUnits;
        measure = newMeasure;
        shown = cases;
        logarithmic = log;
        redraw();
    }

    /**
     * A measured value that lies over the curves.
     *
     * @param offsetMetres        offset in metres
     * @param tesla               resultant in tesla RMS
     * @param relativeUncertainty relative uncertainty of the reading
     */
    public record Reading(double offsetMetres, double tesla, double relativeUncertainty) {
    }

    /** Lays measured values over the curves; they are resultants, and are left out when the chart shows another measure. */
    public void overlay(List<Reading> measured) {
        readings = List.copyOf(measured);
        redraw();
    }

    private void moveCursor(int x) {
        if (x != cursor) {
            cursor = x;
            redraw();
        }
    }

    private List<ProfileCase> cases() {
        return profile.cases().stream().filter(c -> shown.test(c.loadCase().id())).toList();
    }

    private double value(ProfileCase c, int i) {
        return units.field().fromTesla(c.series().value(i).tesla(measure));
    }

    private void paint(GC gc) {
        Rectangle area = getClientArea();
        gc.setAntialias(SWT.ON);
        gc.setBackground(getBackground());
        gc.fillRectangle(area);
        gc.setForeground(getForeground());
        if (profile == null) {
            gc.drawText("No results. Findings lists what keeps the study from being computed.", 12, 12, true);
            return;
        }
        int line = gc.getFontMetrics().getHeight();
        int legend = compact ? 0 : (cases().size() + 1) * (line + 2) + 6;
        Rectangle plot = new Rectangle(gc.textExtent("00000.0").x + line + 14, line + 10, 0, 0);
        plot.width = area.width - plot.x - 14;
        plot.height = area.height - plot.y - 2 * line - 16 - legend;
        if (plot.width < 40 || plot.height < 40) {
            return;
        }
        scale(plot);
        drawGrid(gc, plot, line);
        drawEdges(gc, plot, line);
        drawLimits(gc, plot, line);
        drawCurves(gc, plot);
        if (!compact) {
            drawLegend(gc, plot, line, area);
        }
    }

    private void scale(Rectangle plot) {
        double[] offsets = profile.offsetsMetres();
        double greatest = 1e-9;
        for (ProfileCase c : cases()) {
            for (int i = 0; i < profile.size(); i++) {
                greatest = Math.max(greatest, value(c, i));
            }
        }
        for (Reading reading : readings) {
            greatest = Math.max(greatest, units.field().fromTesla(reading.tesla()) * (1 + reading.relativeUncertainty()));
        }
        across = new AxisScale(units.length().fromMetres(offsets[0]), units.length().fromMetres(offsets[offsets.length - 1]), plot.x,
            plot.x + plot.width, false);
        up = logarithmic ? new AxisScale(greatest * DECADES, greatest * 1.3, plot.y + plot.height, plot.y, true)
            : new AxisScale(0, AxisScale.niceEnd(greatest * 1.04), plot.y + plot.height, plot.y, false);
    }

    private void drawGrid(GC gc, Rectangle plot, int line) {
        Color faint = mix(0.85);
        // At least two: a short chart with nothing but zero on its axis cannot be read.
        for (double tick : up.ticks(Math.max(2, plot.height / (3 * line)))) {
            int y = up.toPixel(tick);
            gc.setForeground(faint);
            gc.drawLine(plot.x, y, plot.x + plot.width, y);
            gc.setForeground(getForeground());
            String text = Numbers.stated(tick);
            gc.drawText(text, plot.x - 6 - gc.textExtent(text).x, y - line / 2, true);
        }
        for (double tick : across.ticks(plot.width / (5 * line))) {
            int x = across.toPixel(tick);
            gc.setForeground(faint);
            gc.drawLine(x, plot.y, x, plot.y + plot.height);
            gc.setForeground(getForeground());
            String text = Numbers.stated(tick);
            gc.drawText(text, x - gc.textExtent(text).x / 2, plot.y + plot.height + 4, true);
        }
        gc.drawRectangle(plot);
        String title = (measure == FieldMeasure.MAJOR_AXIS ? "Major axis" : "Resultant") + ", " + units.field().symbol() + ", "
            + Numbers.stated(units.length().fromMetres(profile.referenceHeightMetres())) + " " + units.length().code() + " above ground"
            + (stale ? "   (being computed)" : "");
        gc.drawText(title, plot.x, plot.y - line - 4, true);
        String axis = "Offset, " + units.length().code() + " (positive to the right, looking ahead)";
        gc.drawText(axis, plot.x + (plot.width - gc.textExtent(axis).x) / 2, plot.y + plot.height + line + 6, true);
    }

    private void drawEdges(GC gc, Rectangle plot, int line) {
        gc.setForeground(getForeground());
        gc.setLineWidth(2);
        for (double offset : new double[] {profile.leftEdgeOffsetMetres(), profile.rightEdgeOffsetMetres()}) {
            double shownOffset = units.length().fromMetres(offset);
            int x = across.toPixel(shownOffset);
            if (x >= plot.x && x <= plot.x + plot.width) {
                gc.drawLine(x, plot.y, x, plot.y + plot.height);
                boolean left = offset == profile.leftEdgeOffsetMetres();
                String text = (left ? "Left edge " : "Right edge ") + Numbers.stated(shownOffset);
                Point size = gc.textExtent(text);
                gc.drawText(text, left ? x - size.x - 5 : x + 5, plot.y + 3, true);
            }
        }
        gc.setLineWidth(1);
    }

    private void drawLimits(GC gc, Rectangle plot, int line) {
        gc.setLineStyle(SWT.LINE_DASHDOT);
        for (LimitInfo limit : profile.limits()) {
            double level = units.field().fromTesla(limit.levelTesla());
            int y = up.toPixel(level);
            if (limit.measure() == measure && y >= plot.y && y <= plot.y + plot.height) {
                gc.drawLine(plot.x, y, plot.x + plot.width, y);
                String text = limit.name() + " " + Numbers.stated(level) + " " + units.field().symbol();
                // below the line where the labels of the edges stand above it
                gc.drawText(text, plot.x + plot.width - gc.textExtent(text).x - 4, y < plot.y + 2 * line + 4 ? y + 1 : y - line - 1, true);
            }
        }
        gc.setLineStyle(SWT.LINE_SOLID);
    }

    private void drawCurves(GC gc, Rectangle plot) {
        double[] offsets = profile.offsetsMetres();
        gc.setClipping(plot.x, plot.y, plot.width + 1, plot.height + 1);
        int number = 0;
        for (ProfileCase c : profile.cases()) {
            if (shown.test(c.loadCase().id())) {
                int[] path = new int[2 * offsets.length];
                for (int i = 0; i < offsets.length; i++) {
                    path[2 * i] = across.toPixel(units.length().fromMetres(offsets[i]));
                    path[2 * i + 1] = up.toPixel(value(c, i));
                }
                style(gc, number);
                gc.drawPolyline(path);
            }
            number++;
        }
        gc.setLineWidth(1);
        gc.setLineStyle(SWT.LINE_SOLID);
        gc.setForeground(getForeground());
        drawReadings(gc);
        if (cursor >= plot.x && cursor <= plot.x + plot.width) {
            gc.drawLine(cursor, plot.y, cursor, plot.y + plot.height);
        }
        gc.setClipping((Rectangle) null);
    }

    /** Measured values as crosses with bars of their uncertainty. */
    private void drawReadings(GC gc) {
        if (measure != FieldMeasure.RESULTANT) {
            return;
        }
        for (Reading reading : readings) {
            int x = across.toPixel(units.length().fromMetres(reading.offsetMetres()));
            double value = units.field().fromTesla(reading.tesla());
            int y = up.toPixel(value);
            gc.drawLine(x - 4, y - 4, x + 4, y + 4);
            gc.drawLine(x - 4, y + 4, x + 4, y - 4);
            gc.drawLine(x, up.toPixel(value * (1 - reading.relativeUncertainty())), x, up.toPixel(value * (1 + reading.relativeUncertainty())));
        }
    }

    private void style(GC gc, int number) {
        gc.setForeground(curveColor(number));
        gc.setLineWidth(2);
        gc.setLineStyle(STYLES[number % STYLES.length]);
    }

    private void drawLegend(GC gc, Rectangle plot, int line, Rectangle area) {
        int y = area.height - cases().size() * (line + 2) - 4;
        boolean reading = cursor >= plot.x && cursor <= plot.x + plot.width;
        double offset = reading ? units.length().toMetres(across.toValue(cursor)) : Double.NaN;
        gc.setForeground(getForeground());
        gc.drawText(reading ? "At " + Numbers.fixed(across.toValue(cursor), 1) + " " + units.length().code() + ":"
            : readings.isEmpty() ? "Move the pointer over the chart, or use the arrow keys, to read values."
            : "Crosses: " + readings.size() + " measured values with their uncertainty, not scaled to a load.", plot.x, y - line - 2, true);
        int number = 0;
        for (ProfileCase c : profile.cases()) {
            if (shown.test(c.loadCase().id())) {
                style(gc, number);
                gc.drawLine(plot.x, y + line / 2, plot.x + 3 * line, y + line / 2);
                gc.setLineWidth(1);
                gc.setLineStyle(SWT.LINE_SOLID);
                gc.setForeground(getForeground());
                String text = c.loadCase().name();
                if (reading) {
                    text += "   " + Numbers.field(interpolate(c, offset)) + " " + units.field().symbol();
                }
                gc.drawText(text, plot.x + 3 * line + 8, y, true);
                y += line + 2;
            }
            number++;
        }
    }

    /** Value between the points of the profile, linearly: for reading by eye. */
    private double interpolate(ProfileCase c, double offset) {
        double[] offsets = profile.offsetsMetres();
        int i = 1;
        while (i < offsets.length - 1 && offsets[i] < offset) {
            i++;
        }
        double share = Math.max(0, Math.min(1, (offset - offsets[i - 1]) / (offsets[i] - offsets[i - 1])));
        return (1 - share) * value(c, i - 1) + share * value(c, i);
    }

    private Color curveColor(int number) {
        boolean dark = brightness(getBackground().getRGB()) < 0.5;
        float hue = HUES[number % HUES.length];
        return new Color(dark ? new RGB(hue, 0.55f, 0.98f) : new RGB(hue, 0.85f, 0.68f));
    }

    private static double brightness(RGB rgb) {
        return (0.3 * rgb.red + 0.6 * rgb.green + 0.1 * rgb.blue) / 255;
    }

    /** A colour between foreground (0) and background (1). */
    private Color mix(double share) {
        RGB a = getForeground().getRGB();
        RGB b = getBackground().getRGB();
        return new Color((int) (a.red + share * (b.red - a.red)), (int) (a.green + share * (b.green - a.green)), (int) (a.blue + share * (b.blue - a.blue)));
    }
}
