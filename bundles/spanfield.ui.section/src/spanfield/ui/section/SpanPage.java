/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.ui.section;

import java.util.ArrayList;
import java.util.List;
import org.eclipse.emf.ecore.EObject;
import org.eclipse.jface.layout.GridDataFactory;
import org.eclipse.jface.layout.GridLayoutFactory;
import org.eclipse.swt.SWT;
import org.eclipse.swt.graphics.Color;
import org.eclipse.swt.graphics.GC;
import org.eclipse.swt.graphics.RGB;
import org.eclipse.swt.graphics.Rectangle;
import org.eclipse.swt.layout.RowLayout;
import org.eclipse.swt.widgets.Canvas;
import org.eclipse.swt.widgets.Combo;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Control;
import org.eclipse.swt.widgets.Label;
import spanfield.model.Line;
import spanfield.model.Structure;
import spanfield.report.Numbers;
import spanfield.report.Units;
import spanfield.solver.geometry.CatenarySpan;
import spanfield.solver.geometry.Position;
import spanfield.solver.geometry.Wire;
import spanfield.study.CorridorPlan;
import spanfield.study.StudySnapshot;
import spanfield.study.result.LeastClearance;
import spanfield.ui.common.AxisScale;
import spanfield.ui.common.DisplayUnits;
import spanfield.ui.common.StudyComputation;
import spanfield.ui.common.StudyPage;

/** Elevation along a line: every wire as its catenary, the ground below it, and where the clearance is least. */
public final class SpanPage extends StudyPage {

    private static final int SAMPLES = 40;

    private Canvas canvas;
    private Combo lines;
    private Label least;
    private StudySnapshot snapshot;

    /** A wire along the line: chainage, elevation, ground elevation of each sample. */
    private record Course(List<double[]> points) {
    }

    private List<Course> courses = List.of();
    private List<String> structures = List.of();
    private LeastClearance lowest;

    @Override
    public Control createControl(Composite parent) {
        Composite page = new Composite(parent, SWT.NONE);
        GridLayoutFactory.fillDefaults().margins(6, 6).applyTo(page);
        Composite bar = new Composite(page, SWT.NONE);
        RowLayout row = new RowLayout(SWT.HORIZONTAL);
        row.center = true;
        bar.setLayout(row);
        new Label(bar, SWT.NONE).setText("Line");
        lines = new Combo(bar, SWT.READ_ONLY);
        lines.addListener(SWT.Selection, event -> rebuild());
        least = new Label(page, SWT.WRAP);
        GridDataFactory.fillDefaults().grab(true, false).applyTo(least);
        canvas = new Canvas(page, SWT.DOUBLE_BUFFERED);
        canvas.setBackground(parent.getDisplay().getSystemColor(SWT.COLOR_LIST_BACKGROUND));
        canvas.setForeground(parent.getDisplay().getSystemColor(SWT.COLOR_LIST_FOREGROUND));
        canvas.addPaintListener(event -> paint(event.gc));
        GridDataFactory.fillDefaults().grab(true, true).applyTo(canvas);
        modelChanged();
        return page;
    }

    @Override
    public void modelChanged() {
        String[] names = document().study().getLines().stream().map(line -> String.valueOf(line.getName())).toArray(String[]::new);
        int before = Math.max(0, lines.getSelectionIndex());
        if (!java.util.Arrays.equals(names, lines.getItems())) {
            lines.setItems(names);
            lines.select(Math.min(before, names.length - 1));
            rebuild();
        }
    }

    @Override
    public void computed(StudyComputation.Outcome outcome) {
        if (outcome.snapshot() != null && outcome.snapshot() != snapshot || outcome.snapshot() == null && outcome.state() == StudyComputation.State.INVALID) {
            snapshot = outcome.snapshot();
            rebuild();
        }
    }

    private void rebuild() {
        courses = new ArrayList<>();
        structures = List.of();
        int line = lines.getSelectionIndex();
        // The newest results may be older than the study: they count only where they still have the line.
        boolean known = snapshot != null && line >= 0 && line < Math.min(snapshot.lineCount(), document().study().getLines().size());
        lowest = known ? snapshot.leastClearance(line).orElse(null) : null;
        if (lowest != null) {
            snapshot.wires(lowest.caseId(), line).forEach(wire -> courses.add(course(wire, snapshot.plan())));
            structures = document().study().getLines().get(line).getStructures().stream().map(s -> String.valueOf(s.getName())).toList();
        }
        least.setText(lowest == null ? "" : leastText(lowest, snapshot.cases().size() > 1));
        least.requestLayout();
        canvas.redraw();
    }

    private static String leastText(LeastClearance lowest, boolean several) {
        Units units = DisplayUnits.get();
        String unit = " " + units.length().code();
        return "Least clearance " + Numbers.length(units.length().fromMetres(lowest.clearanceMetres())) + unit + ": " + lowest.wire() + ", "
            + Numbers.fixed(units.length().fromMetres(lowest.alongMetres()), 0) + unit + " along the line, " + lowest.fromStructure() + " to "
            + lowest.toStructure() + (several ? "; the least of all load cases, in '" + lowest.loadCase() + "'" : "");
    }

    private static Course course(Wire wire, CorridorPlan plan) {
        List<double[]> points = new ArrayList<>();
        double along = 0;
        for (CatenarySpan span : wire.path().spans()) {
            for (int i = 0; i <= SAMPLES; i++) {
                double s = span.horizontalLengthMetres() * i / SAMPLES;
                Position p = span.at(s);
                points.add(new double[] {along + s, p.z(), plan.groundElevationAt(p.x(), p.y())});
            }
            along += span.horizontalLengthMetres();
        }
        return new Course(points);
    }

    private void paint(GC gc) {
        Rectangle area = canvas.getClientArea();
        gc.setAntialias(SWT.ON);
        gc.setForeground(canvas.getForeground());
        if (courses.isEmpty()) {
            gc.drawText("No wires to show. Findings lists what keeps the study from being computed.", 12, 12, true);
            return;
        }
        int line = gc.getFontMetrics().getHeight();
        double length = 0;
        double bottom = Double.POSITIVE_INFINITY;
        double top = Double.NEGATIVE_INFINITY;
        for (Course course : courses) {
            for (double[] p : course.points()) {
                length = Math.max(length, p[0]);
                bottom = Math.min(bottom, p[2]);
                top = Math.max(top, p[1]);
            }
        }
        Rectangle plot = new Rectangle(4 * line, 2 * line, area.width - 5 * line, area.height - 5 * line);
        if (plot.width < 50 || plot.height < 50) {
            return;
        }
        double range = top - bottom + 6;
        Frame frame = new Frame(plot, length, bottom - 3, range);
        drawAxes(gc, frame, line);
        RGB background = canvas.getBackground().getRGB();
        boolean dark = background.red + background.green + background.blue < 384;
        gc.setForeground(new Color(dark ? new RGB(190, 160, 120) : new RGB(120, 95, 60)));
        gc.setLineWidth(2);
        gc.drawPolyline(frame.path(courses.get(0).points(), 2));
        gc.setLineWidth(1);
        gc.setForeground(new Color(dark ? new RGB(140, 180, 255) : new RGB(30, 78, 140)));
        for (Course course : courses) {
            gc.drawPolyline(frame.path(course.points(), 1));
        }
        drawStructures(gc, frame);
        drawLeast(gc, frame, line);
    }

    /** Where lengths along the line and elevations fall in the plot; heights are exaggerated to fill it. */
    private record Frame(Rectangle plot, double length, double bottom, double range) {

        int x(double along) {
            return (int) Math.round(plot.x + plot.width * along / length);
        }

        int y(double elevation) {
            return (int) Math.round(plot.y + plot.height * (1 - (elevation - bottom) / range));
        }

        int[] path(List<double[]> points, int column) {
            int[] path = new int[2 * points.size()];
            for (int i = 0; i < points.size(); i++) {
                path[2 * i] = x(points.get(i)[0]);
                path[2 * i + 1] = y(points.get(i)[column]);
            }
            return path;
        }
    }

    private void drawAxes(GC gc, Frame frame, int line) {
        Units units = DisplayUnits.get();
        gc.setForeground(canvas.getForeground());
        gc.drawRectangle(frame.plot());
        AxisScale up = new AxisScale(units.length().fromMetres(frame.bottom()), units.length().fromMetres(frame.bottom() + frame.range()),
            frame.plot().y + frame.plot().height, frame.plot().y, false);
        for (double tick : up.ticks(6)) {
            gc.drawText(Numbers.stated(tick), 4, up.toPixel(tick) - line / 2, true);
        }
        AxisScale across = new AxisScale(0, units.length().fromMetres(frame.length()), frame.plot().x, frame.plot().x + frame.plot().width, false);
        for (double tick : across.ticks(8)) {
            String text = Numbers.stated(tick);
            gc.drawText(text, across.toPixel(tick) - gc.textExtent(text).x / 2, frame.plot().y + frame.plot().height + 4, true);
        }
        gc.drawText("Elevation, " + units.length().code() + " (heights exaggerated)", 4, 4, true);
        String title = "Length along the line, " + units.length().code();
        gc.drawText(title, frame.plot().x + (frame.plot().width - gc.textExtent(title).x) / 2, frame.plot().y + frame.plot().height + line + 6, true);
    }

    private void drawStructures(GC gc, Frame frame) {
        gc.setForeground(canvas.getForeground());
        Course course = courses.get(0);
        for (int i = 0; i < structures.size(); i++) {
            int number = i;
            double[] at = course.points().get(sample(number, course));
            double top = courses.stream().mapToDouble(c -> c.points().get(sample(number, c))[1]).max().orElse(at[1]);
            gc.drawLine(frame.x(at[0]), frame.y(at[2]), frame.x(at[0]), frame.y(top));
            String name = structures.get(i);
            gc.drawText(name, Math.min(frame.x(at[0]) + 3, frame.plot().x + frame.plot().width - gc.textExtent(name).x), frame.plot().y + 2, true);
        }
    }

    /** A dimension from the lowest wire to the ground beneath it, with its length. */
    private void drawLeast(GC gc, Frame frame, int line) {
        Units units = DisplayUnits.get();
        int x = frame.x(lowest.alongMetres());
        int top = frame.y(lowest.elevationMetres());
        int foot = frame.y(lowest.elevationMetres() - lowest.clearanceMetres());
        int tick = line / 4;
        gc.setForeground(canvas.getForeground());
        gc.setLineStyle(SWT.LINE_DASH);
        gc.drawLine(x, top, x, foot);
        gc.setLineStyle(SWT.LINE_SOLID);
        gc.drawLine(x - tick, top, x + tick, top);
        gc.drawLine(x - tick, foot, x + tick, foot);
        String text = Numbers.length(units.length().fromMetres(lowest.clearanceMetres())) + " " + units.length().code();
        int width = gc.textExtent(text).x;
        boolean fits = x + tick + width < frame.plot().x + frame.plot().width;
        gc.drawText(text, fits ? x + tick : x - tick - width, (top + foot - line) / 2, true);
    }

    /** Sample of a course at a structure. */
    private static int sample(int structure, Course course) {
        return Math.min(course.points().size() - 1, structure * (SAMPLES + 1));
    }

    @Override
    public boolean reveal(EObject object) {
        Line line = object instanceof Line own ? own : object instanceof Structure structure && structure.eContainer() instanceof Line own ? own : null;
        if (line != null) {
            lines.select(document().study().getLines().indexOf(line));
            rebuild();
        }
        return line != null;
    }

    /** The least clearance that is shown, or null. */
    public LeastClearance least() {
        return lowest;
    }

    @Override
    public void setFocus() {
        canvas.setFocus();
    }
}
