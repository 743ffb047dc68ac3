package org.saddlebook.charts.internal;

import java.awt.Graphics2D;
import java.awt.geom.Path2D;
import java.util.List;

/** The sheet of paper under a figure: its folded corner and the notes of its cautions. */
final class Leaf {
    static final int MARGIN = 16;
    static final int NOTE_SIZE = 11;
    static final int FOLD = 22;

    private static final int NOTE_LINE = 15;

    private final int width;
    private final Palette palette;
    private final List<Notes.Note> notes;

    Leaf(int width, Palette palette, List<Notes.Note> notes) {
        this.width = width;
        this.palette = palette;
        this.notes = List.copyOf(notes);
    }

    /** Height of the written notes. */
    int notesHeight() {
        int lines = 0;
        for (Notes.Note note : notes) {
            lines += Lettering.wrap(note.text(), NOTE_SIZE, noteRoom()).size() * NOTE_LINE + 12;
        }
        return lines;
    }

    /** Room at the right of the title that the corner and its numbers take. */
    double cornerRoom() {
        return FOLD + Math.max(40, 10 + Lettering.width(noteNumbers(), NOTE_SIZE, true));
    }

    void paper(Graphics2D g, int height) {
        double fold = notes.isEmpty() ? 0 : FOLD;
        Path2D page = new Path2D.Double();
        page.moveTo(0, 0);
        page.lineTo(width - fold, 0);
        page.lineTo(width, fold);
        page.lineTo(width, height);
        page.lineTo(0, height);
        page.closePath();
        g.setPaint(palette.paper());
        g.fill(page);
        if (!notes.isEmpty()) {
            Path2D ear = new Path2D.Double();
            ear.moveTo(width - fold, 0);
            ear.lineTo(width - fold, fold);
            ear.lineTo(width, fold);
            ear.closePath();
            g.setPaint(palette.lichen());
            g.fill(ear);
            g.setPaint(palette.ink());
            g.setStroke(Palette.FINE);
            g.draw(ear);
            Lettering.draw(
                    g, noteNumbers(), width - fold - 6, 16, Lettering.Anchor.END, NOTE_SIZE, true, palette.ink());
        }
    }

    private String noteNumbers() {
        StringBuilder numbers = new StringBuilder();
        for (Notes.Note note : notes) {
            numbers.append(numbers.length() == 0 ? "" : " ").append(note.number());
        }
        return numbers.toString();
    }

    void notes(Graphics2D g, double top) {
        double y = top;
        for (Notes.Note note : notes) {
            List<String> lines = Lettering.wrap(note.text(), NOTE_SIZE, noteRoom());
            double high = lines.size() * NOTE_LINE + 6;
            Path2D strip = new Path2D.Double();
            strip.moveTo(MARGIN, y);
            strip.lineTo(width - MARGIN - 9, y);
            strip.lineTo(width - MARGIN, y + 9);
            strip.lineTo(width - MARGIN, y + high);
            strip.lineTo(MARGIN, y + high);
            strip.closePath();
            g.setPaint(palette.rail());
            g.fill(strip);
            String number = Integer.toString(note.number());
            Lettering.draw(g, number, MARGIN + 24, y + NOTE_LINE, Lettering.Anchor.END, NOTE_SIZE, true, palette.ink());
            for (String line : lines) {
                y += NOTE_LINE;
                Lettering.draw(g, line, MARGIN + 34, y, Lettering.Anchor.START, NOTE_SIZE, false, palette.ink());
            }
            y += 12;
        }
    }

    private double noteRoom() {
        return width - 2 * MARGIN - 34 - 14;
    }
}
