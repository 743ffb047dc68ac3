package org.saddlebook.desk.internal;

import java.awt.Color;
import java.awt.Dimension;
import java.awt.FontMetrics;
import java.awt.Graphics;
import java.awt.Graphics2D;
import java.awt.RenderingHints;
import java.util.ArrayList;
import java.util.List;
import javax.accessibility.AccessibleContext;
import javax.accessibility.AccessibleRole;
import javax.swing.JComponent;

/** Text that wraps to its width; what does not fit its lines ends in an ellipsis and is whole in the tool tip. */
final class Prose extends JComponent {
    private static final long serialVersionUID = 1L;

    private final int mostLines;
    private String text = "";

    Prose(double scale, boolean bold, Color colour, int mostLines, org.saddlebook.desk.api.Ink ink) {
        this.mostLines = mostLines;
        setFont(ink.font(scale, bold));
        setForeground(colour);
    }

    void setText(String newText) {
        if (!newText.equals(text)) {
            text = newText;
            revalidate();
            repaint();
        }
    }

    String text() {
        return text;
    }

    /** Height of the text when it is this wide. */
    int heightAt(int width) {
        FontMetrics metrics = getFontMetrics(getFont());
        return lines(metrics, width).size() * metrics.getHeight();
    }

    /** Height of so many lines. */
    int heightOf(int lines) {
        return lines * getFontMetrics(getFont()).getHeight();
    }

    @Override
    public Dimension getPreferredSize() {
        if (isPreferredSizeSet()) {
            return super.getPreferredSize();
        }
        FontMetrics metrics = getFontMetrics(getFont());
        int width = getWidth() > 0 ? getWidth() : 260;
        return new Dimension(Math.min(width, metrics.stringWidth(text) + 2), heightAt(width));
    }

    @Override
    public Dimension getMinimumSize() {
        return new Dimension(20, getFontMetrics(getFont()).getHeight());
    }

    @Override
    public void setBounds(int x, int y, int width, int height) {
        boolean other = width != getWidth();
        super.setBounds(x, y, width, height);
        if (other) {
            // The height depends on the width; inside a layout under way the request would be lost.
            javax.swing.SwingUtilities.invokeLater(this::revalidate);
        }
    }

    @Override
    protected void paintComponent(Graphics graphics) {
        Graphics2D g = (Graphics2D) graphics.create();
        smooth(g);
        g.setFont(getFont());
        g.setColor(getForeground());
        FontMetrics metrics = g.getFontMetrics();
        int y = metrics.getAscent();
        boolean cut = false;
        int room = Math.max(1, Math.min(mostLines, getHeight() / metrics.getHeight()));
        List<String> lines = wrap(metrics, text, getWidth());
        for (int i = 0; i < lines.size() && i < room; i++) {
            boolean last = i == room - 1 && lines.size() > room;
            g.drawString(last ? ellipsis(metrics, lines, i) : lines.get(i), 0, y);
            cut |= last;
            y += metrics.getHeight();
        }
        g.dispose();
        String tip = cut ? text : null;
        if (tip == null ? getToolTipText() != null : !tip.equals(getToolTipText())) {
            javax.swing.SwingUtilities.invokeLater(() -> setToolTipText(tip));
        }
    }

    /** Smooth edges and letters as the screen likes them. */
    static void smooth(Graphics2D g) {
        g.setRenderingHint(RenderingHints.KEY_ANTIALIASING, RenderingHints.VALUE_ANTIALIAS_ON);
        g.setRenderingHint(RenderingHints.KEY_STROKE_CONTROL, RenderingHints.VALUE_STROKE_PURE);
        Object hints = java.awt.Toolkit.getDefaultToolkit().getDesktopProperty("awt.font.desktophints");
        if (hints instanceof java.util.Map<?, ?> map) {
            g.addRenderingHints(map);
        } else {
            g.setRenderingHint(RenderingHints.KEY_TEXT_ANTIALIASING, RenderingHints.VALUE_TEXT_ANTIALIAS_ON);
        }
    }

    /** As much of the line and what follows it as there is room for. */
    private String ellipsis(FontMetrics metrics, List<String> lines, int at) {
        String cut = lines.get(at) + " " + lines.get(at + 1);
        while (!cut.isEmpty() && metrics.stringWidth(cut + "…") > getWidth()) {
            cut = cut.substring(0, cut.length() - 1);
        }
        return cut.stripTrailing() + "…";
    }

    private List<String> lines(FontMetrics metrics, int width) {
        List<String> lines = wrap(metrics, text, width);
        return lines.subList(0, Math.min(mostLines, lines.size()));
    }

    /** Breaks at spaces and line feeds; a word wider than the width is broken where it must. */
    static List<String> wrap(FontMetrics metrics, String text, int width) {
        List<String> lines = new ArrayList<>();
        for (String paragraph : text.split("\n", -1)) {
            String line = "";
            for (String word : paragraph.split(" ", -1)) {
                String longer = line.isEmpty() ? word : line + " " + word;
                if (metrics.stringWidth(longer) <= width || width <= 0) {
                    line = longer;
                    continue;
                }
                if (!line.isEmpty()) {
                    lines.add(line);
                }
                line = word;
                while (metrics.stringWidth(line) > width && line.length() > 1) {
                    int end = line.length() - 1;
                    while (end > 1 && metrics.stringWidth(line.substring(0, end)) > width) {
                        end--;
                    }
                    lines.add(line.substring(0, end));
                    line = line.substring(end);
                }
            }
            lines.add(line);
        }
        return lines;
    }

    @Override
    public AccessibleContext getAccessibleContext() {
        if (accessibleContext == null) {
            accessibleContext = new AccessibleJComponent() {
                private static final long serialVersionUID = 1L;

                @Override
                public AccessibleRole getAccessibleRole() {
                    return AccessibleRole.LABEL;
                }

                @Override
                public String getAccessibleName() {
                    return text;
                }
            };
        }
        return accessibleContext;
    }
}
