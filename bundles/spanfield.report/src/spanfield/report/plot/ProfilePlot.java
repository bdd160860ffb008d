/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.report.plot;

import java.awt.Font;
import java.awt.Graphics2D;
import java.awt.RenderingHints;
import java.awt.geom.Rectangle2D;
import java.awt.image.BufferedImage;
import java.io.IOException;
import java.io.OutputStream;
import javax.imageio.ImageIO;
import org.jfree.chart.JFreeChart;
import spanfield.study.result.LateralProfile;

/**
 * The plot of a lateral profile: the field against the offset for every load case, the edges of the right-of-way, the limits, and beneath
 * it the section with the ground and the wires. The same profile and options always give the same picture on the same machine; the text
 * of an SVG stays text and takes the fonts of whoever shows it.
 *
 * <p>Limits are drawn if they speak of the drawn measure and fit on the scale; the others are named beneath the plot.
 *
 * <p>Needs fonts but no display.
 */
public final class ProfilePlot {

    /** Width of the drawing in its own units, the pixels of the smallest sensible picture. */
    public static final int WIDTH = 960;

    /** Narrowest PNG in pixels. */
    public static final int LEAST_WIDTH_PIXELS = 320;

    /** Widest PNG in pixels: fits the memory of the command. */
    public static final int GREATEST_WIDTH_PIXELS = 10_000;

    private final JFreeChart chart;
    private final String title;
    private final int height;

    /** A plot of a profile; nothing is drawn yet. */
    public ProfilePlot(LateralProfile profile, PlotOptions options) {
        title = profile.evidence().studyName();
        ProfileChart builder = new ProfileChart(profile, options);
        this.chart = builder.chart();
        this.height = builder.height();
    }

    /** Height of the drawing in the units of {@link #WIDTH}. */
    public int height() {
        return height;
    }

    /** Draws on any graphics, scaled to fill the area. */
    public void draw(Graphics2D g2, Rectangle2D area) {
        Graphics2D scaled = (Graphics2D) g2.create();
        try {
            scaled.translate(area.getX(), area.getY());
            scaled.scale(area.getWidth() / WIDTH, area.getHeight() / height);
            scaled.setRenderingHint(RenderingHints.KEY_FRACTIONALMETRICS, RenderingHints.VALUE_FRACTIONALMETRICS_ON);
            chart.draw(scaled, new Rectangle2D.Double(0, 0, WIDTH, height));
        } finally {
            scaled.dispose();
        }
    }

    /**
     * Writes a PNG.
     *
     * @param widthPixels width, {@link #LEAST_WIDTH_PIXELS} to {@link #GREATEST_WIDTH_PIXELS}; the height follows
     * @throws IllegalArgumentException when the width is out of range
     */
    public void png(OutputStream out, int widthPixels) throws IOException {
        if (widthPixels < LEAST_WIDTH_PIXELS || widthPixels > GREATEST_WIDTH_PIXELS) {
            throw new IllegalArgumentException("a picture of " + widthPixels + " pixels; choose " + LEAST_WIDTH_PIXELS + " to "
                + GREATEST_WIDTH_PIXELS);
        }
        int heightPixels = (int) Math.round((double) widthPixels * height / WIDTH);
        BufferedImage image = new BufferedImage(widthPixels, heightPixels, BufferedImage.TYPE_INT_RGB);
        Graphics2D g2 = image.createGraphics();
        g2.setPaint(java.awt.Color.WHITE);
        g2.fillRect(0, 0, widthPixels, heightPixels);
        draw(g2, new Rectangle2D.Double(0, 0, widthPixels, heightPixels));
        g2.dispose();
        // The cache on the disk would leave files behind when the command is stopped.
        ImageIO.setUseCache(false);
        if (!ImageIO.write(image, "png", out)) {
            throw new IOException("the Java runtime has no writer for PNG");
        }
    }

    /**
     * Writes the plot as a PDF of one page, with texts as outlines.
     *
     * @param out stays open
     */
    public void pdf(OutputStream out) throws IOException {
        PdfPage.write(WIDTH, height, title, graphics -> chart.draw(graphics, new Rectangle2D.Double(0, 0, WIDTH, height)), out);
    }

    /** Writes an SVG 1.1 in UTF-8. */
    public void svg(OutputStream out) throws IOException {
        SvgPage page = new SvgPage(WIDTH, height);
        chart.draw(page.graphics(), new Rectangle2D.Double(0, 0, WIDTH, height));
        page.write(out);
    }

    static Font captionFont() {
        return PlotStyle.font(Font.PLAIN, 10.5f);
    }
}
