/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.report.plot;

import java.awt.Color;
import java.awt.Font;
import java.awt.RenderingHints;
import java.awt.geom.Line2D;
import java.text.DecimalFormat;
import java.text.DecimalFormatSymbols;
import java.text.NumberFormat;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Locale;
import java.util.stream.DoubleStream;
import org.jfree.chart.JFreeChart;
import org.jfree.chart.LegendItem;
import org.jfree.chart.LegendItemCollection;
import org.jfree.chart.axis.NumberAxis;
import org.jfree.chart.block.BlockBorder;
import org.jfree.chart.block.ColumnArrangement;
import org.jfree.chart.plot.CombinedDomainXYPlot;
import org.jfree.chart.plot.DatasetRenderingOrder;
import org.jfree.chart.plot.IntervalMarker;
import org.jfree.chart.plot.ValueMarker;
import org.jfree.chart.plot.XYPlot;
import org.jfree.chart.renderer.xy.XYLineAndShapeRenderer;
import org.jfree.chart.text.TextUtils;
import org.jfree.chart.title.LegendTitle;
import org.jfree.chart.title.TextTitle;
import org.jfree.chart.ui.HorizontalAlignment;
import org.jfree.chart.ui.Layer;
import org.jfree.chart.ui.RectangleEdge;
import org.jfree.chart.ui.RectangleInsets;
import org.jfree.chart.ui.VerticalAlignment;
import org.jfree.data.xy.DefaultXYDataset;
import spanfield.model.FieldMeasure;
import spanfield.model.LimitPlace;
import spanfield.report.Numbers;
import spanfield.report.Terms;
import spanfield.report.TextStyle;
import spanfield.report.Units;
import spanfield.study.result.CaseInfo;
import spanfield.study.result.EdgeRow;
import spanfield.study.result.Evidence;
import spanfield.study.result.FieldValue;
import spanfield.study.result.LateralProfile;
import spanfield.study.result.LimitInfo;
import spanfield.study.result.PlacedField;
import spanfield.study.result.ProfileCase;
import spanfield.study.result.StationGeometry;

/** Builds the chart of a lateral profile. */
final class ProfileChart {

    /** A limit this many times above the greatest value would squeeze the curves: it is named beneath the plot instead. */
    private static final double GREATEST_LIMIT_RATIO = 2.5;

    /** Free space above the highest curve or limit, for the labels. */
    private static final double HEADROOM = 1.14;

    private static final int BODY_HEIGHT = 560;
    private static final int LEGEND_LINE_HEIGHT = 19;
    private static final int CAPTION_LINE_HEIGHT = 15;
    private static final int FIELD_WEIGHT = 7;
    private static final int SECTION_WEIGHT = 3;

    private final LateralProfile profile;
    private final Units units;
    private final FieldMeasure measure;
    private final List<String> captions = new ArrayList<>();

    ProfileChart(LateralProfile profile, PlotOptions options) {
        this.profile = profile;
        this.units = options.units();
        this.measure = options.measure();
    }

    /** Height that the chart needs, in the units of the drawing's width. Valid after {@link #chart()}. */
    int height() {
        return BODY_HEIGHT + LEGEND_LINE_HEIGHT * profile.cases().size() + CAPTION_LINE_HEIGHT * captionLines();
    }

    /** Long captions wrap. */
    private int captionLines() {
        return captions.stream().mapToInt(caption -> 1 + caption.length() / CAPTION_CHARACTERS).sum();
    }

    JFreeChart chart() {
        // Otherwise the library draws turned text as outlines, and the labels of the range axes would be no text in an SVG.
        TextUtils.setUseDrawRotatedStringWorkaround(false);
        NumberAxis offsets = axis("Offset from the centreline, " + length() + " (positive to the right, looking ahead)");
        offsets.setRange(x(firstOffset()), x(lastOffset()));
        CombinedDomainXYPlot plot = new CombinedDomainXYPlot(offsets);
        plot.setGap(14);
        plot.add(fieldPlot(), FIELD_WEIGHT);
        plot.add(sectionPlot(), SECTION_WEIGHT);
        JFreeChart chart = new JFreeChart(null, JFreeChart.DEFAULT_TITLE_FONT, plot, false);
        chart.setBackgroundPaint(Color.WHITE);
        chart.setPadding(new RectangleInsets(10, 12, 8, 18));
        chart.getRenderingHints().put(RenderingHints.KEY_STROKE_CONTROL, RenderingHints.VALUE_STROKE_PURE);
        addTitles(chart);
        addCaptions(chart);
        chart.addSubtitle(legend());
        return chart;
    }

    /** The edges are always on the drawing, with a little room, even when the profile does not reach them. */
    private double firstOffset() {
        return Math.min(profile.station().fromOffsetMetres(), profile.leftEdgeOffsetMetres() - EDGE_ROOM * width());
    }

    private double lastOffset() {
        return Math.max(profile.station().toOffsetMetres(), profile.rightEdgeOffsetMetres() + EDGE_ROOM * width());
    }

    private double width() {
        return profile.rightEdgeOffsetMetres() - profile.leftEdgeOffsetMetres();
    }

    /** Room beside an edge as a part of the width of the right-of-way. */
    private static final double EDGE_ROOM = 0.02;

    private double x(double metres) {
        return units.length().fromMetres(metres);
    }

    private double y(double tesla) {
        return units.field().fromTesla(tesla);
    }

    private String length() {
        return units.length().code();
    }

    private String field() {
        return units.field().symbol();
    }

    private static String brief(double value) {
        return Labels.minus(Numbers.brief(value, Numbers.LENGTH_DECIMALS));
    }

    private static NumberAxis axis(String label) {
        NumberAxis axis = new NumberAxis(label);
        DecimalFormatSymbols symbols = DecimalFormatSymbols.getInstance(Locale.ROOT);
        symbols.setMinusSign('\u2212');
        NumberFormat format = new DecimalFormat("0.######", symbols);
        axis.setNumberFormatOverride(format);
        axis.setLabelFont(PlotStyle.font(Font.PLAIN, 12.5f));
        axis.setTickLabelFont(PlotStyle.font(Font.PLAIN, 11.5f));
        axis.setLabelPaint(PlotStyle.INK);
        axis.setTickLabelPaint(PlotStyle.INK);
        axis.setAxisLinePaint(PlotStyle.SOFT_INK);
        axis.setTickMarkPaint(PlotStyle.SOFT_INK);
        return axis;
    }

    private XYPlot fieldPlot() {
        NumberAxis axis = axis("Magnetic field, " + Terms.measure(measure) + ", " + field() + " RMS");
        double top = top();
        axis.setRange(0, top > 0 ? top * HEADROOM : 1);
        DefaultXYDataset data = new DefaultXYDataset();
        XYLineAndShapeRenderer renderer = new XYLineAndShapeRenderer(true, false);
        renderer.setDrawSeriesLineAsPath(true);
        double[] offsets = scaledOffsets();
        for (int c = 0; c < profile.cases().size(); c++) {
            data.addSeries(c, new double[][] {offsets, values(profile.cases().get(c))});
            renderer.setSeriesPaint(c, PlotStyle.seriesColour(c));
            renderer.setSeriesStroke(c, PlotStyle.seriesStroke(c));
        }
        XYPlot plot = new XYPlot(data, null, axis, renderer);
        decorate(plot);
        plot.addAnnotation(new FieldLabels(limitLines(top), edgeLines()));
        return plot;
    }

    private double[] scaledOffsets() {
        return DoubleStream.of(profile.offsetsMetres()).map(this::x).toArray();
    }

    private double[] values(ProfileCase profileCase) {
        double[] values = new double[profile.size()];
        for (int i = 0; i < values.length; i++) {
            values[i] = y(profileCase.series().value(i).tesla(measure));
        }
        return values;
    }

    /** Highest value or limit that the scale must hold, in the field unit. */
    private double top() {
        double greatest = profile.cases().stream().flatMapToDouble(c -> DoubleStream.of(values(c))).max().orElse(0);
        double limit = profile.limits().stream().filter(this::drawn).mapToDouble(l -> y(l.levelTesla()))
            .filter(level -> level <= GREATEST_LIMIT_RATIO * greatest).max().orElse(0);
        return Math.max(greatest, limit);
    }

    private boolean drawn(LimitInfo limit) {
        return limit.measure() == measure;
    }

    private void decorate(XYPlot plot) {
        plot.setBackgroundPaint(Color.WHITE);
        plot.setDomainGridlinePaint(PlotStyle.GRID);
        plot.setRangeGridlinePaint(PlotStyle.GRID);
        plot.setDomainGridlineStroke(PlotStyle.thinStroke());
        plot.setRangeGridlineStroke(PlotStyle.thinStroke());
        plot.setOutlinePaint(PlotStyle.SOFT_INK);
        plot.setDatasetRenderingOrder(DatasetRenderingOrder.FORWARD);
        plot.setAxisOffset(RectangleInsets.ZERO_INSETS);
        addEdges(plot);
    }

    private void addEdges(XYPlot plot) {
        double left = x(profile.leftEdgeOffsetMetres());
        double right = x(profile.rightEdgeOffsetMetres());
        IntervalMarker band = new IntervalMarker(left, right, PlotStyle.RIGHT_OF_WAY);
        band.setAlpha(1);
        plot.addDomainMarker(band, Layer.BACKGROUND);
        for (double edge : new double[] {left, right}) {
            ValueMarker marker = new ValueMarker(edge, PlotStyle.INK, PlotStyle.edgeStroke());
            marker.setAlpha(1);
            plot.addDomainMarker(marker, Layer.FOREGROUND);
        }
    }

    private List<FieldLabels.EdgeLine> edgeLines() {
        return List.of(edgeLine("Left edge ", profile.leftEdgeOffsetMetres(), true), edgeLine("Right edge ", profile.rightEdgeOffsetMetres(), false));
    }

    private FieldLabels.EdgeLine edgeLine(String name, double metres, boolean left) {
        return new FieldLabels.EdgeLine(name + brief(x(metres)) + " " + length(), x(metres), left);
    }

    private List<FieldLabels.LimitLine> limitLines(double top) {
        List<FieldLabels.LimitLine> lines = new ArrayList<>();
        for (LimitInfo limit : profile.limits()) {
            String text = limit.name() + ": " + Numbers.stated(y(limit.levelTesla())) + " " + field() + ", " + Terms.place(limit.place());
            if (!drawn(limit)) {
                captions.add("Limit not drawn (it speaks of the " + Terms.measure(limit.measure()) + "): " + text);
            } else if (y(limit.levelTesla()) > top) {
                captions.add("Limit above the scale: " + text);
            } else {
                lines.add(limitLine(limit, text));
            }
        }
        lines.sort(Comparator.comparingDouble(FieldLabels.LimitLine::level).reversed());
        return lines;
    }

    private FieldLabels.LimitLine limitLine(LimitInfo limit, String text) {
        double left = x(profile.leftEdgeOffsetMetres());
        double right = x(profile.rightEdgeOffsetMetres());
        boolean within = limit.place() == LimitPlace.WITHIN;
        double from = within ? left : x(firstOffset());
        double to = within ? right : x(lastOffset());
        List<Double> marks = limit.place() == LimitPlace.EDGE ? List.of(left, right) : List.of();
        return new FieldLabels.LimitLine(text, y(limit.levelTesla()), from, to, marks);
    }

    private XYPlot sectionPlot() {
        double[] ground = DoubleStream.of(profile.groundElevationsMetres()).map(this::x).toArray();
        List<SectionLabels.Wire> wires = wires();
        double low = DoubleStream.of(ground).min().orElse(0);
        double high = Math.max(DoubleStream.of(ground).max().orElse(0), wires.stream().mapToDouble(SectionLabels.Wire::level).max().orElse(0));
        double room = Math.max(high - low, x(1));
        NumberAxis axis = axis("Elevation, " + length());
        axis.setRange(low - 0.12 * room, high + 0.12 * room);
        XYPlot plot = new XYPlot(new DefaultXYDataset(), null, axis, new XYLineAndShapeRenderer(true, false));
        decorate(plot);
        plot.addAnnotation(new SectionLabels(wires, scaledOffsets(), ground));
        return plot;
    }

    /** Wires of the first load case, and of every other load case in which the wind swings them elsewhere. */
    private List<SectionLabels.Wire> wires() {
        List<SectionLabels.Wire> wires = new ArrayList<>();
        List<Double> swings = new ArrayList<>();
        for (ProfileCase profileCase : profile.cases()) {
            StationGeometry geometry = profileCase.geometry();
            if (swings.contains(geometry.windSwingRadians())) {
                continue;
            }
            boolean first = swings.isEmpty();
            swings.add(geometry.windSwingRadians());
            geometry.wires().forEach(wire -> wires.add(new SectionLabels.Wire(first ? wire.phase() : "", x(wire.offsetMetres()),
                x(wire.elevationMetres()), !wire.shieldWire(), first)));
        }
        if (swings.size() > 1) {
            captions.add("Section: wires of load case '" + profile.cases().get(0).loadCase().name()
                + "' drawn full, the same wires in the wind swing of other load cases hollow.");
        }
        return wires;
    }

    private void addTitles(JFreeChart chart) {
        Evidence evidence = profile.evidence();
        String name = evidence.studyName().isBlank() ? evidence.studyId() : evidence.studyName();
        chart.addSubtitle(0, title(name, PlotStyle.font(Font.BOLD, 16f), RectangleEdge.TOP));
        String line = Terms.station(profile.station(), units) + "   \u00b7   " + brief(x(profile.referenceHeightMetres())) + " " + length()
            + " above ground   \u00b7   " + Terms.frequency(evidence) + "   \u00b7   earth: " + Terms.earth(evidence, TextStyle.UNICODE);
        TextTitle subtitle = title(line, PlotStyle.font(Font.PLAIN, 12f), RectangleEdge.TOP);
        subtitle.setPadding(2, 0, 8, 0);
        chart.addSubtitle(1, subtitle);
    }

    private static TextTitle title(String text, Font font, RectangleEdge edge) {
        TextTitle title = new TextTitle(text, font, PlotStyle.INK, edge, HorizontalAlignment.LEFT, VerticalAlignment.CENTER,
            RectangleInsets.ZERO_INSETS);
        return title;
    }

    /** Captions stand at the very bottom: what is not drawn, how sure the values are, where they come from. */
    private void addCaptions(JFreeChart chart) {
        captions.add(errors());
        Evidence evidence = profile.evidence();
        captions.add("Computed by Spanfield " + evidence.softwareVersion() + " from study " + evidence.studyId() + ", SHA-256 "
            + evidence.studyDigest().substring(0, Math.min(DIGEST_LENGTH, evidence.studyDigest().length()))
            + "\u2026. For screening and planning: local codes and licensed practice decide.");
        for (int i = captions.size() - 1; i >= 0; i--) {
            chart.addSubtitle(title(captions.get(i), ProfilePlot.captionFont(), RectangleEdge.BOTTOM));
        }
    }

    private static final int DIGEST_LENGTH = 16;

    private String errors() {
        double numerical = 0;
        double model = 0;
        boolean known = false;
        for (ProfileCase profileCase : profile.cases()) {
            for (int i = 0; i < profile.size(); i++) {
                FieldValue value = profileCase.series().value(i);
                numerical = Math.max(numerical, value.numericalErrorTesla());
                known |= value.modelErrorKnown();
                model = value.modelErrorKnown() ? Math.max(model, value.modelErrorTesla()) : model;
            }
        }
        String text = "Greatest numerical error \u00b1" + Numbers.bound(y(numerical)) + " " + field();
        return known ? text + "; greatest difference between the two earth models " + Numbers.bound(y(model)) + " " + field() + "."
            : text + "; no earth model is active.";
    }

    private LegendTitle legend() {
        LegendItemCollection items = new LegendItemCollection();
        for (int c = 0; c < profile.cases().size(); c++) {
            items.add(new LegendItem(legendText(profile.cases().get(c)), null, null, null, new Line2D.Double(-26, 0, 26, 0),
                PlotStyle.seriesStroke(c), PlotStyle.seriesColour(c)));
        }
        LegendTitle legend = new LegendTitle(() -> items, new ColumnArrangement(HorizontalAlignment.LEFT, VerticalAlignment.TOP, 0, 1),
            new ColumnArrangement(HorizontalAlignment.LEFT, VerticalAlignment.TOP, 0, 1));
        legend.setItemFont(PlotStyle.font(Font.PLAIN, 12f));
        legend.setItemPaint(PlotStyle.INK);
        legend.setPosition(RectangleEdge.BOTTOM);
        legend.setHorizontalAlignment(HorizontalAlignment.LEFT);
        legend.setFrame(BlockBorder.NONE);
        legend.setBackgroundPaint(Color.WHITE);
        legend.setItemLabelPadding(new RectangleInsets(1, 6, 1, 6));
        legend.setPadding(4, 0, 6, 0);
        return legend;
    }

    /** Name and main values of a load case; a name that leaves no room for the values is shortened. */
    private String legendText(ProfileCase profileCase) {
        EdgeRow row = profileCase.summary();
        PlacedField greatest = measure == FieldMeasure.MAJOR_AXIS ? row.greatestMajorAxis() : row.greatestResultant();
        String values = ":  left edge " + value(row.leftEdge()) + ",  right edge " + value(row.rightEdge()) + ",  greatest within "
            + value(greatest) + " " + field() + " at " + brief(x(greatest.offsetMetres())) + " " + length();
        CaseInfo info = profileCase.loadCase();
        String swing = info.windSwingRadians() == 0 ? "" : " (wires swung by " + brief(Math.toDegrees(info.windSwingRadians())) + "\u00b0)";
        return shortened(info.name(), LEGEND_CHARACTERS - values.length() - swing.length()) + swing + values;
    }

    private static String shortened(String text, int characters) {
        return text.length() <= characters ? text : text.substring(0, characters - 1) + "\u2026";
    }

    /** Characters of a line of the legend and of a caption that surely fit. */
    private static final int LEGEND_CHARACTERS = 115;
    private static final int CAPTION_CHARACTERS = 140;

    private String value(PlacedField placed) {
        return Numbers.field(y(placed.field().tesla(measure)));
    }
}
