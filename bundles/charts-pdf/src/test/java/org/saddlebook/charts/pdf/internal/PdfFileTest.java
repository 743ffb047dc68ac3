package org.saddlebook.charts.pdf.internal;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.awt.Color;
import java.awt.Graphics2D;
import java.awt.image.BufferedImage;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import org.apache.pdfbox.Loader;
import org.apache.pdfbox.pdmodel.PDDocument;
import org.apache.pdfbox.rendering.PDFRenderer;
import org.junit.jupiter.api.Test;
import org.saddlebook.api.findings.Axis;
import org.saddlebook.api.findings.Layer;
import org.saddlebook.api.findings.Node;
import org.saddlebook.charts.api.FigureDrawing;
import org.saddlebook.charts.api.FigureLook;
import org.saddlebook.charts.internal.ChartsRenderer;

class PdfFileTest {
    private static final FigureDrawing DRAWING = new ChartsRenderer()
            .draw(
                    new Node.Figure(
                            "f",
                            "A line with ΔH‡ (invented)",
                            new Axis("temperature", "K", Axis.Scale.RECIPROCAL_TEMPERATURE),
                            new Axis("ln(k / s⁻¹)", "1", Axis.Scale.LINEAR),
                            List.of(
                                    Layer.of(Layer.Kind.LINE, "law", new double[] {290, 310, 330}, new double[] {
                                        -9, -7, -5
                                    }),
                                    Layer.of(Layer.Kind.MEASURED, "measured", new double[] {300, 320}, new double[] {
                                        -8, -6
                                    })),
                            List.of("c")),
                    Map.of("c", "A caution that travels with the figure."),
                    FigureLook.PAPER);

    @Test
    void looksLikeTheSheetWhenAnotherProgramReadsIt() throws Exception {
        byte[] pdf = new PdfFile().bytes(DRAWING);
        Files.write(Files.createDirectories(Path.of("target")).resolve("figure.pdf"), pdf);
        BufferedImage sheet = new BufferedImage(DRAWING.width(), DRAWING.height(), BufferedImage.TYPE_INT_RGB);
        Graphics2D g = sheet.createGraphics();
        g.setPaint(Color.WHITE);
        g.fillRect(0, 0, sheet.getWidth(), sheet.getHeight());
        DRAWING.paint(g);
        g.dispose();
        try (PDDocument document = Loader.loadPDF(pdf)) {
            assertEquals(1, document.getNumberOfPages());
            assertEquals(
                    "A line with ΔH‡ (invented)",
                    document.getDocumentInformation().getTitle());
            assertTrue(document.getDocumentInformation().getSubject().contains("A caution that travels"));
            BufferedImage page = new PDFRenderer(document).renderImage(0, 1);
            assertEquals(DRAWING.width(), page.getWidth());
            assertEquals(DRAWING.height(), page.getHeight());
            double apart = 0;
            double inked = 0;
            for (int y = 0; y < page.getHeight(); y++) {
                for (int x = 0; x < page.getWidth(); x++) {
                    double here = new Color(sheet.getRGB(x, y)).getGreen();
                    apart += Math.abs(here - new Color(page.getRGB(x, y)).getGreen());
                    inked += here < 128 ? 1 : 0;
                }
            }
            // Smoothing of edges differs; shapes in another place would differ by whole strokes.
            assertTrue(inked > 1000, "ink on the sheet: " + inked);
            assertTrue(apart / (page.getWidth() * page.getHeight()) < 8, "mean difference " + apart);
        }
    }

    @Test
    void givesTheSameBytesForTheSameFigure() throws Exception {
        assertArrayEquals(new PdfFile().bytes(DRAWING), new PdfFile().bytes(DRAWING));
    }
}
