package org.saddlebook.charts.pdf.internal;

import de.rototor.pdfbox.graphics2d.PdfBoxGraphics2D;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import org.apache.pdfbox.pdmodel.PDDocument;
import org.apache.pdfbox.pdmodel.PDPage;
import org.apache.pdfbox.pdmodel.PDPageContentStream;
import org.apache.pdfbox.pdmodel.common.PDRectangle;
import org.osgi.service.component.annotations.Component;
import org.saddlebook.charts.api.FigureDrawing;
import org.saddlebook.charts.api.FigureFile;

/**
 * A figure on one page of its own size, as lines and outlines: letters are outlines too, so that a file needs no font and
 * looks the same everywhere. Title and description travel in the document's properties. The same figure gives the same
 * bytes.
 */
@Component
public final class PdfFile implements FigureFile {
    @Override
    public String extension() {
        return "pdf";
    }

    @Override
    public byte[] bytes(FigureDrawing drawing) throws IOException {
        try (PDDocument document = new PDDocument();
                ByteArrayOutputStream out = new ByteArrayOutputStream()) {
            // Otherwise the id in the trailer would be made from the clock.
            document.setDocumentId(0L);
            document.getDocumentInformation().setTitle(drawing.figure().title());
            document.getDocumentInformation().setSubject(drawing.description());
            PDPage page = new PDPage(new PDRectangle(drawing.width(), drawing.height()));
            document.addPage(page);
            PdfBoxGraphics2D g = new PdfBoxGraphics2D(document, drawing.width(), drawing.height());
            try {
                drawing.paint(g);
            } finally {
                g.dispose();
            }
            try (PDPageContentStream content = new PDPageContentStream(document, page)) {
                content.drawForm(g.getXFormObject());
            }
            document.save(out);
            return out.toByteArray();
        }
    }
}
