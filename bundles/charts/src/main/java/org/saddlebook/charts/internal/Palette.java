package org.saddlebook.charts.internal;

import java.awt.BasicStroke;
import java.awt.Color;
import java.util.List;

/** Inks, fills and line patterns. Everything is told apart by shape or pattern; colour only helps. */
final class Palette {
    static final Color INK = new Color(0x1F2A30);
    static final Color PLUM = new Color(0x6B2D5C);
    static final Color PETROL = new Color(0x1F7A80);
    static final Color OCHRE = new Color(0xC98A1B);
    static final Color LICHEN = new Color(0xC9CFA8);
    static final Color RAIL = new Color(0xE8EBD9);
    static final Color PAPER = new Color(0xFBF8F1);

    private static final List<Color> LINES = List.of(PLUM, PETROL, INK, OCHRE);

    private static final List<BasicStroke> PATTERNS = List.of(
            stroke(2f),
            stroke(2f, 7, 4),
            stroke(2.2f, 1.6f, 3.4f),
            stroke(2f, 9, 3, 2, 3),
            stroke(2.6f, 14, 4),
            stroke(2.2f, 4, 3));

    static final BasicStroke HAIR = stroke(0.6f);
    static final BasicStroke FINE = stroke(1f);
    static final BasicStroke FIRM = stroke(1.5f);
    static final BasicStroke WALL = stroke(3f);
    static final BasicStroke OUTLINE = stroke(0.9f, 3, 2.5f);

    private Palette() {}

    static Color line(int index) {
        return LINES.get(index % LINES.size());
    }

    static BasicStroke pattern(int index) {
        return PATTERNS.get(index % PATTERNS.size());
    }

    private static BasicStroke stroke(float width, float... dash) {
        return dash.length == 0
                ? new BasicStroke(width, BasicStroke.CAP_BUTT, BasicStroke.JOIN_ROUND)
                : new BasicStroke(width, BasicStroke.CAP_BUTT, BasicStroke.JOIN_ROUND, 1f, dash, 0f);
    }
}
