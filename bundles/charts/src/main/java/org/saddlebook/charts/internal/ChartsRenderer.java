package org.saddlebook.charts.internal;

import java.awt.Graphics2D;
import java.awt.RenderingHints;
import java.awt.image.BufferedImage;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.util.Map;
import javax.imageio.ImageIO;
import org.osgi.service.component.annotations.Component;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.service.FigureRenderer;

/** Draws figures with JFreeChart, as SVG through Batik and as PNG through Java 2D. Stateless; needs no display. */
@Component
public final class ChartsRenderer implements FigureRenderer {
    @Override
    public byte[] svg(Node.Figure figure, Map<String, String> cautions) {
        Sheet sheet = new Sheet(figure, cautions);
        SvgPaper paper = new SvgPaper(Sheet.WIDTH, sheet.height());
        sheet.draw(paper);
        return paper.document(figure.title(), sheet.description());
    }

    @Override
    public byte[] png(Node.Figure figure, Map<String, String> cautions, double scale) {
        if (!(scale >= 1 && scale <= 8)) {
            throw new IllegalArgumentException("scale must lie between 1 and 8: " + scale);
        }
        Sheet sheet = new Sheet(figure, cautions);
        BufferedImage image = new BufferedImage(
                (int) Math.ceil(Sheet.WIDTH * scale),
                (int) Math.ceil(sheet.height() * scale),
                BufferedImage.TYPE_INT_RGB);
        Graphics2D g = image.createGraphics();
        try {
            g.setPaint(java.awt.Color.WHITE);
            g.fillRect(0, 0, image.getWidth(), image.getHeight());
            g.setRenderingHint(RenderingHints.KEY_ANTIALIASING, RenderingHints.VALUE_ANTIALIAS_ON);
            g.setRenderingHint(RenderingHints.KEY_TEXT_ANTIALIASING, RenderingHints.VALUE_TEXT_ANTIALIAS_ON);
            g.setRenderingHint(RenderingHints.KEY_FRACTIONALMETRICS, RenderingHints.VALUE_FRACTIONALMETRICS_ON);
            g.setRenderingHint(RenderingHints.KEY_STROKE_CONTROL, RenderingHints.VALUE_STROKE_PURE);
            g.scale(scale, scale);
            sheet.draw(g);
        } finally {
            g.dispose();
        }
        try {
            ByteArrayOutputStream out = new ByteArrayOutputStream();
            ImageIO.setUseCache(false);
            if (!ImageIO.write(image, "png", out)) {
                throw new IllegalStateException("this Java has no PNG writer");
            }
            return out.toByteArray();
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }
}
