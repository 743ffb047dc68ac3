package org.saddlebook.desk.components.api;

import java.awt.Dimension;
import java.awt.Graphics;
import java.awt.Graphics2D;
import java.awt.RenderingHints;
import java.awt.image.BufferedImage;
import javax.accessibility.AccessibleContext;
import javax.accessibility.AccessibleRole;
import javax.swing.JComponent;
import org.saddlebook.desk.api.DeskContext;
import org.saddlebook.desk.api.Ink;
import org.saddlebook.desk.api.TemperatureScale;

/** Marks of a folded stratum, each at its temperature on the rail. */
public final class RailStrip extends JComponent {
    private static final long serialVersionUID = 1L;

    /** Draws the marks. */
    @FunctionalInterface
    public interface Painter {
        /**
         * Draws.
         *
         * @param g smoothed, clipped to the strip
         * @param scale where temperatures lie in the strip
         * @param ink colours
         * @param width of the strip, points
         * @param height of the strip, points
         */
        void paint(Graphics2D g, TemperatureScale scale, Ink ink, int width, int height);
    }

    private final transient DeskContext context;
    private final transient Painter painter;
    private transient BufferedImage drawn;

    /**
     * A strip.
     *
     * @param name accessible name; what the marks are
     * @param height preferred height, points
     */
    public RailStrip(String name, int height, DeskContext context, Painter painter) {
        this.context = context;
        this.painter = painter;
        setFocusable(false);
        setOpaque(false);
        setPreferredSize(new Dimension(100, height));
        getAccessibleContext().setAccessibleName(name);
        context.onScale(this::repaint);
    }

    @Override
    protected void paintComponent(Graphics graphics) {
        if (getWidth() <= 0) {
            return;
        }
        Graphics2D g = (Graphics2D) graphics.create();
        try {
            double scale = Math.max(1, g.getTransform().getScaleX());
            int wide = (int) Math.ceil(getWidth() * scale);
            int high = (int) Math.ceil(getHeight() * scale);
            if (drawn == null || drawn.getWidth() != wide || drawn.getHeight() != high) {
                drawn = draw(wide, high, scale);
            }
            g.drawImage(drawn, 0, 0, getWidth(), getHeight(), null);
        } finally {
            g.dispose();
        }
    }

    /** The marks as a picture: the hairline crosses the strip at every move of the mouse, and the marks stay as they are. */
    private BufferedImage draw(int wide, int high, double scale) {
        BufferedImage picture = new BufferedImage(wide, high, BufferedImage.TYPE_INT_ARGB_PRE);
        Graphics2D g = picture.createGraphics();
        try {
            g.scale(scale, scale);
            g.setFont(getFont());
            g.setRenderingHint(RenderingHints.KEY_ANTIALIASING, RenderingHints.VALUE_ANTIALIAS_ON);
            g.setRenderingHint(RenderingHints.KEY_TEXT_ANTIALIASING, RenderingHints.VALUE_TEXT_ANTIALIAS_ON);
            g.setRenderingHint(RenderingHints.KEY_STROKE_CONTROL, RenderingHints.VALUE_STROKE_PURE);
            painter.paint(g, context.scale(this), context.ink(), getWidth(), getHeight());
        } finally {
            g.dispose();
        }
        return picture;
    }

    /** Asked for by the panel when it shows something else: the marks are drawn anew. */
    @Override
    public void repaint() {
        drawn = null;
        super.repaint();
    }

    @Override
    public AccessibleContext getAccessibleContext() {
        if (accessibleContext == null) {
            accessibleContext = new AccessibleStrip();
        }
        return accessibleContext;
    }

    private final class AccessibleStrip extends AccessibleJComponent {
        private static final long serialVersionUID = 1L;

        @Override
        public AccessibleRole getAccessibleRole() {
            return AccessibleRole.CANVAS;
        }
    }
}
