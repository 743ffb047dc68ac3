package org.saddlebook.charts.internal;

import java.awt.Color;
import java.awt.Font;
import java.awt.Graphics2D;
import java.util.ArrayList;
import java.util.List;

/**
 * Text in figures. Room is reserved by a table of widths and not by asking a font, so that a figure is laid out alike on
 * every machine; the table is that of the widest common sans serif, so that text drawn in another one is never cut.
 */
final class Lettering {
    /** Where a text stands in relation to its coordinate. */
    enum Anchor {
        START("start", 0),
        MIDDLE("middle", 0.5),
        END("end", 1);

        final String key;
        final double share;

        Anchor(String key, double share) {
            this.key = key;
            this.share = share;
        }
    }

    /** Advance widths of U+0020 to U+007E in thousandths of the font size, measured on DejaVu Sans 2.37. */
    private static final int[] WIDTHS = {
        318, 401, 460, 838, 636, 950, 780, 275, 390, 390, 500, 838, 318, 361, 318, 337,
        636, 636, 636, 636, 636, 636, 636, 636, 636, 636, 337, 337, 838, 838, 838, 531,
        1000, 684, 686, 698, 770, 632, 575, 775, 752, 295, 295, 656, 557, 863, 748, 787,
        603, 787, 695, 635, 611, 732, 684, 989, 685, 611, 685, 390, 337, 390, 838, 500,
        500, 613, 635, 550, 635, 615, 352, 635, 634, 278, 278, 579, 278, 974, 634, 612,
        635, 635, 411, 521, 392, 634, 592, 818, 592, 592, 525, 636, 337, 636, 838
    };

    private static final int OTHER = 840;

    private static final double BOLD = 1.1;

    private Lettering() {}

    static double width(String text, int size, boolean bold) {
        int sum = 0;
        for (int i = 0; i < text.length(); i++) {
            sum += width(text.charAt(i));
        }
        return sum * size * (bold ? BOLD : 1) / 1000;
    }

    private static int width(char c) {
        if (c >= ' ' && c <= '~') {
            return WIDTHS[c - ' '];
        }
        if (c == '\u00a0') {
            return WIDTHS[0];
        }
        boolean raised = (c >= '⁰' && c <= '⁾') || c == '¹' || c == '²' || c == '³';
        return raised ? 530 : OTHER;
    }

    /** Lines no wider than {@code room}; a single word that is wider stands alone. */
    static List<String> wrap(String text, int size, double room) {
        List<String> lines = new ArrayList<>();
        StringBuilder line = new StringBuilder();
        int start = 0;
        while (start < text.length()) {
            int space = text.indexOf(' ', start);
            int end = space < 0 ? text.length() : space;
            String word = text.substring(start, end);
            start = end + 1;
            if (word.isEmpty()) {
                continue;
            }
            if (line.length() > 0 && width(line + " " + word, size, false) > room) {
                lines.add(line.toString());
                line.setLength(0);
            }
            line.append(line.length() > 0 ? " " : "").append(word);
        }
        if (line.length() > 0) {
            lines.add(line.toString());
        }
        return lines;
    }

    static void draw(Graphics2D g, String text, double x, double y, Anchor anchor, int size, boolean bold, Color ink) {
        if (text.isEmpty()) {
            return;
        }
        if (g instanceof SvgPaper paper) {
            paper.text(text, x, y, anchor.key, size, bold, ink);
            return;
        }
        g.setFont(new Font(Font.SANS_SERIF, bold ? Font.BOLD : Font.PLAIN, size));
        g.setColor(ink);
        double wide = g.getFontMetrics().getStringBounds(text, g).getWidth();
        g.drawString(text, (float) (x - anchor.share * wide), (float) y);
    }
}
