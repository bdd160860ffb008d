/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.report.tests;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static spanfield.report.tests.support.ResultFixtures.EDGE_LIMIT;
import static spanfield.report.tests.support.ResultFixtures.HIGH_LIMIT;
import static spanfield.report.tests.support.ResultFixtures.MAJOR_LIMIT;

import java.awt.GraphicsEnvironment;
import java.awt.image.BufferedImage;
import java.io.ByteArrayInputStream;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import javax.imageio.ImageIO;
import javax.xml.parsers.DocumentBuilderFactory;
import org.junit.jupiter.api.Test;
import org.w3c.dom.Document;
import org.w3c.dom.Element;
import org.w3c.dom.NodeList;
import spanfield.model.FieldMeasure;
import spanfield.model.LimitBasis;
import spanfield.model.LimitPlace;
import spanfield.report.FieldUnit;
import spanfield.report.LengthUnit;
import spanfield.report.Units;
import spanfield.report.plot.PlotOptions;
import spanfield.report.plot.ProfilePlot;
import spanfield.report.tests.support.ResultFixtures;
import spanfield.study.result.LateralProfile;
import spanfield.study.result.LimitInfo;

/** Pictures of a lateral profile, made without a display. */
class ProfilePlotTest {

    private static byte[] svg(LateralProfile profile, PlotOptions options) throws IOException {
        ByteArrayOutputStream out = new ByteArrayOutputStream();
        new ProfilePlot(profile, options).svg(out);
        return out.toByteArray();
    }

    private static Document parse(byte[] svg) throws Exception {
        DocumentBuilderFactory factory = DocumentBuilderFactory.newInstance();
        factory.setFeature("http://apache.org/xml/features/nonvalidating/load-external-dtd", false);
        return factory.newDocumentBuilder().parse(new ByteArrayInputStream(svg));
    }

    private static List<String> texts(Document document) {
        NodeList nodes = document.getElementsByTagName("text");
        List<String> texts = new ArrayList<>();
        for (int i = 0; i < nodes.getLength(); i++) {
            texts.add(nodes.item(i).getTextContent());
        }
        return texts;
    }

    private static void assertText(List<String> texts, String part) {
        assertTrue(texts.stream().anyMatch(text -> text.contains(part)), () -> "'" + part + "' is not in " + texts);
    }

    /** Value of a presentation attribute, which the generator may have put on the element or on a group around it. */
    private static String inherited(Element element, String attribute) {
        for (Element at = element; at != null; at = at.getParentNode() instanceof Element parent ? parent : null) {
            if (!at.getAttribute(attribute).isEmpty()) {
                return at.getAttribute(attribute);
            }
        }
        return "";
    }

    /** Strokes (colour and dashes) of the curves: paths with many points. */
    private static Set<String> curves(Document document, int points) {
        NodeList nodes = document.getElementsByTagName("path");
        Set<String> strokes = new HashSet<>();
        for (int i = 0; i < nodes.getLength(); i++) {
            Element path = (Element) nodes.item(i);
            long segments = path.getAttribute("d").chars().filter(c -> c == 'L').count();
            if (segments == points - 1 && inherited(path, "fill").equals("none") && !inherited(path, "stroke").equals("rgb(107,90,69)")) {
                strokes.add(inherited(path, "stroke") + " / " + inherited(path, "stroke-dasharray"));
            }
        }
        return strokes;
    }

    /** The PDF is opened again and drawn: one page in the proportions of the plot, with the same ink at the same places as the PNG. */
    @Test
    void pdf_isOnePageThatLooksLikeThePng() throws Exception {
        ProfilePlot plot = new ProfilePlot(ResultFixtures.profile(EDGE_LIMIT), PlotOptions.DEFAULT);
        ByteArrayOutputStream pdf = new ByteArrayOutputStream();
        plot.pdf(pdf);
        ByteArrayOutputStream png = new ByteArrayOutputStream();
        plot.png(png, ProfilePlot.WIDTH);
        java.awt.image.BufferedImage expected = ImageIO.read(new ByteArrayInputStream(png.toByteArray()));
        try (org.apache.pdfbox.pdmodel.PDDocument document = org.apache.pdfbox.Loader.loadPDF(pdf.toByteArray())) {
            assertEquals(1, document.getNumberOfPages());
            float scale = expected.getWidth() / document.getPage(0).getMediaBox().getWidth();
            java.awt.image.BufferedImage drawn = new org.apache.pdfbox.rendering.PDFRenderer(document).renderImage(0, scale);
            assertEquals(expected.getWidth(), drawn.getWidth(), 1);
            assertEquals(expected.getHeight(), drawn.getHeight(), 1);
            int cells = 0;
            int alike = 0;
            for (int x = 0; x + 20 < drawn.getWidth() && x + 20 < expected.getWidth(); x += 20) {
                for (int y = 0; y + 20 < drawn.getHeight() && y + 20 < expected.getHeight(); y += 20) {
                    cells++;
                    alike += Math.abs(ink(expected, x, y) - ink(drawn, x, y)) < INK_TOLERANCE ? 1 : 0;
                }
            }
            assertTrue(alike > 0.97 * cells, alike + " of " + cells + " cells look alike");
        }
        ByteArrayOutputStream again = new ByteArrayOutputStream();
        new ProfilePlot(ResultFixtures.profile(EDGE_LIMIT), PlotOptions.DEFAULT).pdf(again);
        assertEquals(pdf.size(), again.size());
        org.junit.jupiter.api.Assertions.assertArrayEquals(pdf.toByteArray(), again.toByteArray(), "the same plot is the same file");
    }

    /** Difference of mean darkness of a cell of 20 by 20 pixels, 0 to 1: anti-aliasing and hinting of texts differ between the two. */
    private static final double INK_TOLERANCE = 0.06;

    private static double ink(java.awt.image.BufferedImage image, int x, int y) {
        double sum = 0;
        for (int i = 0; i < 20; i++) {
            for (int j = 0; j < 20; j++) {
                java.awt.Color color = new java.awt.Color(image.getRGB(x + i, y + j));
                sum += 1 - (color.getRed() + color.getGreen() + color.getBlue()) / 765.0;
            }
        }
        return sum / 400;
    }

    @Test
    void svg_labelsEdgesLimitsAxesAndLoadCases() throws Exception {
        List<String> texts = texts(parse(svg(ResultFixtures.profile(EDGE_LIMIT, HIGH_LIMIT, MAJOR_LIMIT), PlotOptions.DEFAULT)));
        for (String part : List.of("Line North, \"new\" route", "Left edge \u221225 m", "Right edge 25.4 m", "Planning level: 20 \u00b5T, at the edges",
            "Limit above the scale: General public: 200 \u00b5T", "Limit not drawn (it speaks of the major semi-axis): Major-axis level: 12 \u00b5T",
            "Magnetic field, resultant, \u00b5T RMS", "Offset from the centreline, m", "Elevation, m", "Rating:  left edge 2.792",
            "Peak:  left edge 1.731", "Typical, wind (wires swung by 15\u00b0):", "greatest within 41.24 \u00b5T at 0 m",
            "Station 'Mid-span 2-3' at 175 m", "0123456789abcdef", "local codes and licensed practice decide")) {
            assertText(texts, part);
        }
        for (String phase : List.of("A", "B", "C")) {
            assertTrue(texts.contains(phase), () -> phase + " is not in " + texts);
        }
    }

    @Test
    void svg_drawsEveryLoadCaseInAColourAndADashOfItsOwn() throws Exception {
        LateralProfile profile = ResultFixtures.profile(EDGE_LIMIT);
        Set<String> curves = curves(parse(svg(profile, PlotOptions.DEFAULT)), profile.size());
        assertEquals(profile.cases().size(), curves.size(), curves.toString());
        assertEquals(curves.size(), curves.stream().map(curve -> curve.split(" / ")[0]).distinct().count(), "colours: " + curves);
        assertEquals(curves.size(), curves.stream().map(curve -> curve.split(" / ", -1)[1]).distinct().count(), "dashes: " + curves);
    }

    private static LimitInfo limit(double microtesla, LimitPlace place) {
        return new LimitInfo("at-" + microtesla, "Level", FieldMeasure.RESULTANT, microtesla * 1e-6, place, "", "", "", LimitBasis.USER);
    }

    /** Heights in the drawing of the long dash-dotted lines, from bottom to top. */
    private static List<Double> limitLines(Document document) {
        NodeList nodes = document.getElementsByTagName("line");
        List<Double> heights = new ArrayList<>();
        for (int i = 0; i < nodes.getLength(); i++) {
            Element line = (Element) nodes.item(i);
            if (inherited(line, "stroke-dasharray").equals("14,3,3,3")) {
                heights.add(Double.valueOf(line.getAttribute("y1")));
            }
        }
        heights.sort(java.util.Comparator.reverseOrder());
        return heights;
    }

    /** Heights of the tick labels with a text. */
    private static double tick(Document document, String label) {
        NodeList nodes = document.getElementsByTagName("text");
        List<Double> heights = new ArrayList<>();
        for (int i = 0; i < nodes.getLength(); i++) {
            Element text = (Element) nodes.item(i);
            if (text.getTextContent().equals(label) && text.getAttribute("text-anchor").isEmpty()) {
                heights.add(Double.valueOf(text.getAttribute("y")));
            }
        }
        return heights.stream().min(Double::compare).orElseThrow();
    }

    @Test
    void svg_drawsEveryLimitAtItsLevel() throws Exception {
        Document document = parse(svg(ResultFixtures.profile(limit(10, LimitPlace.EDGE), limit(20, LimitPlace.WITHIN), limit(35, LimitPlace.EVERYWHERE),
            HIGH_LIMIT), PlotOptions.DEFAULT));
        List<Double> lines = limitLines(document);
        assertEquals(3, lines.size(), lines.toString());
        double perMicrotesla = (tick(document, "10") - tick(document, "35")) / 25;
        // coordinates in the SVG have two decimals, tick labels are placed to a pixel
        assertEquals(10 * perMicrotesla, lines.get(0) - lines.get(1), 1);
        assertEquals(15 * perMicrotesla, lines.get(1) - lines.get(2), 1);
    }

    @Test
    void svg_hasOtherUnitsAndMeasure() throws Exception {
        PlotOptions options = new PlotOptions(new Units(FieldUnit.MILLIGAUSS, LengthUnit.FOOT), FieldMeasure.MAJOR_AXIS);
        List<String> texts = texts(parse(svg(ResultFixtures.profile(EDGE_LIMIT, MAJOR_LIMIT), options)));
        for (String part : List.of("Left edge \u221282.02 ft", "Magnetic field, major semi-axis, mG RMS", "Offset from the centreline, ft",
            "Major-axis level: 120 mG, within the right-of-way", "Limit not drawn (it speaks of the resultant): Planning level: 200 mG")) {
            assertText(texts, part);
        }
    }

    @Test
    void svg_hasASizeAndScales() throws Exception {
        ProfilePlot plot = new ProfilePlot(ResultFixtures.profile(), PlotOptions.DEFAULT);
        Element root = parse(svg(ResultFixtures.profile(), PlotOptions.DEFAULT)).getDocumentElement();
        assertEquals("0 0 " + ProfilePlot.WIDTH + " " + plot.height(), root.getAttribute("viewBox"));
        assertEquals(Integer.toString(ProfilePlot.WIDTH), root.getAttribute("width"));
    }

    @Test
    void pictures_areTheSameEveryTime() throws Exception {
        assertArrayEquals(svg(ResultFixtures.profile(EDGE_LIMIT), PlotOptions.DEFAULT), svg(ResultFixtures.profile(EDGE_LIMIT), PlotOptions.DEFAULT));
        assertArrayEquals(png(ResultFixtures.profile(EDGE_LIMIT), 640), png(ResultFixtures.profile(EDGE_LIMIT), 640));
    }

    private static byte[] png(LateralProfile profile, int width) throws IOException {
        ByteArrayOutputStream out = new ByteArrayOutputStream();
        new ProfilePlot(profile, PlotOptions.DEFAULT).png(out, width);
        return out.toByteArray();
    }

    @Test
    void png_hasTheWidthAskedForAndTheColoursOfTheCurves() throws Exception {
        for (int width : new int[] {640, 1920}) {
            BufferedImage image = ImageIO.read(new ByteArrayInputStream(png(ResultFixtures.profile(EDGE_LIMIT), width)));
            assertEquals(width, image.getWidth());
            Set<Integer> colours = new HashSet<>();
            for (int x = 0; x < width; x++) {
                for (int y = 0; y < image.getHeight(); y++) {
                    colours.add(image.getRGB(x, y) & 0xffffff);
                }
            }
            assertTrue(colours.contains(0xffffff), "paper");
            assertTrue(colours.contains(0x1f32b3), "first load case");
            assertTrue(colours.contains(0xf57302), "second load case");
            assertTrue(colours.contains(0x0ca583), "third load case");
        }
    }

    @Test
    void png_showsTheEdgesAsLinesFromTopToBottomOfTheFieldPlot() throws Exception {
        BufferedImage image = ImageIO.read(new ByteArrayInputStream(png(ResultFixtures.profile(), 960)));
        // Columns that are nearly black over at least a third of the height: the two edges, and nothing else of that darkness.
        List<Integer> dark = new ArrayList<>();
        for (int x = 0; x < image.getWidth(); x++) {
            int count = 0;
            for (int y = 0; y < image.getHeight(); y++) {
                count += (image.getRGB(x, y) & 0xff) < 0x60 && (image.getRGB(x, y) >> 16 & 0xff) < 0x60 ? 1 : 0;
            }
            if (count > image.getHeight() / 3) {
                dark.add(x);
            }
        }
        assertTrue(!dark.isEmpty() && dark.get(dark.size() - 1) - dark.get(0) > 300, "dark columns: " + dark);
    }

    @Test
    void png_ofAnAbsurdWidth_isRefused() {
        assertThrows(IllegalArgumentException.class, () -> png(ResultFixtures.profile(), 10));
        assertThrows(IllegalArgumentException.class, () -> png(ResultFixtures.profile(), 100_000));
    }

    @Test
    void plots_needNoDisplay() {
        assertTrue(GraphicsEnvironment.isHeadless(), "the tests run with java.awt.headless=true");
    }
}
