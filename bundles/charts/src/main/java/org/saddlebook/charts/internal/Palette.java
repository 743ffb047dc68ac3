package org.saddlebook.charts.internal;

import java.awt.BasicStroke;
import java.awt.Color;
import java.util.List;

/** Inks, fills and line patterns. Everything is told apart by shape or pattern; colour only helps. */
final class Palette {
    /** For paper and the light desk. */
    static final Palette LIGHT = new Palette(0x1F2A30, 0x6B2D5C, 0x1F7A80, 0xC98A1B, 0xC9CFA8, 0xE8EBD9, 0xFBF8F1);

    /** For the dark desk: lifted until each ink has the contrast it has on paper. */
    static final Palette DARK = new Palette(0xE9E4D8, 0xD08FBE, 0x5FBCC2, 0xDDA94A, 0x464E37, 0x262C25, 0x181D20);

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

    private final Color ink;
    private final Color lichen;
    private final Color rail;
    private final Color paper;
    private final List<Color> lines;

    private Palette(int ink, int plum, int petrol, int ochre, int lichen, int rail, int paper) {
        this.ink = new Color(ink);
        this.lichen = new Color(lichen);
        this.rail = new Color(rail);
        this.paper = new Color(paper);
        this.lines = List.of(new Color(plum), new Color(petrol), this.ink, new Color(ochre));
    }

    /** Text, axes, measured points. */
    Color ink() {
        return ink;
    }

    /** The folded corner of cautions. */
    Color lichen() {
        return lichen;
    }

    /** The ground of rail, floor and notes. */
    Color rail() {
        return rail;
    }

    /** The sheet. */
    Color paper() {
        return paper;
    }

    /** Ink of a line by its order among the lines. */
    Color line(int index) {
        return lines.get(index % lines.size());
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
