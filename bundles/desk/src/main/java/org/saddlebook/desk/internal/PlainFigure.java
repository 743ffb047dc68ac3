package org.saddlebook.desk.internal;

import java.awt.Dimension;
import java.awt.Graphics;
import java.awt.Graphics2D;
import java.awt.RenderingHints;
import java.awt.image.BufferedImage;
import java.io.ByteArrayInputStream;
import java.util.Map;
import java.util.Optional;
import javax.imageio.ImageIO;
import javax.swing.JPanel;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.service.FigureRenderer;
import org.saddlebook.desk.api.DeskContext;

/** A figure as the report draws it, made in the background; without the bundle that draws figures, its title. */
final class PlainFigure extends JPanel {
    private static final long serialVersionUID = 1L;

    private transient Optional<BufferedImage> image = Optional.empty();
    private final transient DeskContext context;
    private String instead = "";

    PlainFigure(Node.Figure figure, Map<String, String> cautions, DeskContext context, Services services) {
        this.context = context;
        setOpaque(false);
        getAccessibleContext().setAccessibleName("Figure: " + figure.title());
        Optional<FigureRenderer> renderer = services.find(FigureRenderer.class);
        if (renderer.isEmpty()) {
            instead = figure.title() + ": the feature report, which draws figures, is not installed.";
            return;
        }
        context.run(
                "drawing " + figure.title(),
                progress -> ImageIO.read(new ByteArrayInputStream(renderer.get().png(figure, cautions, 2))),
                drawn -> {
                    image = Optional.of(drawn);
                    repaint();
                });
    }

    @Override
    public Dimension getPreferredSize() {
        return new Dimension(400, 300);
    }

    @Override
    protected void paintComponent(Graphics graphics) {
        Graphics2D g = (Graphics2D) graphics.create();
        Prose.smooth(g);
        if (image.isPresent()) {
            BufferedImage drawn = image.get();
            double scale = Math.min(getWidth() / (double) drawn.getWidth(), getHeight() / (double) drawn.getHeight());
            g.setRenderingHint(RenderingHints.KEY_INTERPOLATION, RenderingHints.VALUE_INTERPOLATION_BICUBIC);
            g.drawImage(drawn, 0, 0, (int) (drawn.getWidth() * scale), (int) (drawn.getHeight() * scale), null);
        } else {
            g.setColor(context.ink().faint());
            g.setFont(context.ink().font(0.92, false));
            g.drawString(instead, 0, 20);
        }
        g.dispose();
    }
}
