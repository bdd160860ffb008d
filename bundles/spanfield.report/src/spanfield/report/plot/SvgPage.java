/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.report.plot;

import java.awt.Dimension;
import java.awt.Graphics2D;
import java.io.IOException;
import java.io.OutputStream;
import java.io.OutputStreamWriter;
import java.io.Writer;
import java.nio.charset.StandardCharsets;
import javax.xml.parsers.DocumentBuilderFactory;
import javax.xml.parsers.ParserConfigurationException;
import org.apache.batik.svggen.SVGGeneratorContext;
import org.apache.batik.svggen.SVGGraphics2D;
import org.w3c.dom.Document;
import org.w3c.dom.Element;

/** A page of vector graphics whose text stays text. */
final class SvgPage {

    private static final String NAMESPACE = "http://www.w3.org/2000/svg";

    /** Decimals of coordinates: a hundredth of a pixel cannot be seen. */
    private static final int DECIMALS = 2;

    private final int width;
    private final int height;
    private final SVGGraphics2D graphics;

    SvgPage(int width, int height) {
        this.width = width;
        this.height = height;
        SVGGeneratorContext context = SVGGeneratorContext.createDefault(document());
        context.setPrecision(DECIMALS);
        context.setComment("Spanfield");
        this.graphics = new SVGGraphics2D(context, false);
        graphics.setSVGCanvasSize(new Dimension(width, height));
    }

    private static Document document() {
        try {
            return DocumentBuilderFactory.newInstance().newDocumentBuilder().getDOMImplementation().createDocument(NAMESPACE, "svg", null);
        } catch (ParserConfigurationException impossible) {
            throw new IllegalStateException("the Java runtime cannot make an empty XML document", impossible);
        }
    }

    Graphics2D graphics() {
        return graphics;
    }

    void write(OutputStream out) throws IOException {
        Element root = graphics.getRoot();
        root.setAttribute("viewBox", "0 0 " + width + " " + height);
        Writer writer = new OutputStreamWriter(out, StandardCharsets.UTF_8);
        graphics.stream(root, writer, false, false);
        writer.flush();
    }
}
