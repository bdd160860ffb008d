/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.report.plot;

import de.rototor.pdfbox.graphics2d.PdfBoxGraphics2D;
import java.awt.Graphics2D;
import java.io.IOException;
import java.io.OutputStream;
import java.util.function.Consumer;
import org.apache.pdfbox.pdmodel.PDDocument;
import org.apache.pdfbox.pdmodel.PDPage;
import org.apache.pdfbox.pdmodel.PDPageContentStream;
import org.apache.pdfbox.pdmodel.common.PDRectangle;

/**
 * A drawing as a PDF of one page of its own size. Texts become outlines, so that they look the same everywhere; the SVG keeps them as text.
 */
final class PdfPage {

    /** Points (1/72 inch) for a unit of the drawing, whose 960 units fill the width of a landscape A4 sheet less its margins. */
    private static final float SCALE = 0.8f;

    private PdfPage() {
    }

    static void write(int width, int height, String title, Consumer<Graphics2D> drawing, OutputStream out) throws IOException {
        try (PDDocument document = new PDDocument()) {
            document.getDocumentInformation().setTitle(title);
            document.getDocumentInformation().setProducer("Spanfield");
            // The identifier is derived from a time unless it is set: the same drawing is to be the same file.
            document.setDocumentId(1L);
            PDPage page = new PDPage(new PDRectangle(width * SCALE, height * SCALE));
            document.addPage(page);
            PdfBoxGraphics2D graphics = new PdfBoxGraphics2D(document, width * SCALE, height * SCALE);
            try {
                graphics.scale(SCALE, SCALE);
                drawing.accept(graphics);
            } finally {
                graphics.dispose();
            }
            try (PDPageContentStream content = new PDPageContentStream(document, page)) {
                content.drawForm(graphics.getXFormObject());
            }
            document.save(out);
        }
    }
}
