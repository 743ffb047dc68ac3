package org.saddlebook.desk.internal;

import java.awt.BasicStroke;
import java.awt.FontMetrics;
import java.awt.Graphics2D;
import java.awt.geom.Rectangle2D;
import java.util.ArrayList;
import java.util.List;
import org.saddlebook.api.quantity.Constants;
import org.saddlebook.desk.api.Ink;
import org.saddlebook.desk.api.Reading;
import org.saddlebook.presentation.api.Rounding;

/** The small plate under the hairline: temperature, and what each stratum reads there, in two lines. */
final class ReadingPlate {
    private static final int PAD = 8;
    private static final String GAP = "     ";

    private ReadingPlate() {}

    /** The lines of the plate. */
    static List<String> lines(double kelvin, List<Reading> readings, FontMetrics metrics, int room) {
        List<String> lines = new ArrayList<>();
        String line =
                Rounding.decimals(kelvin - Constants.ZERO_CELSIUS, 1) + " °C   " + Rounding.decimals(kelvin, 1) + " K";
        for (Reading reading : readings) {
            String next = reading.name() + " = " + reading.text();
            boolean full = metrics.stringWidth(line + GAP + next) > Math.min(room, 520);
            if (full && lines.size() < 2) {
                lines.add(line);
                line = next;
            } else {
                line = line + GAP + next;
            }
        }
        lines.add(line);
        return lines;
    }

    /** Draws it around x, kept between 0 and width. */
    static void paint(Graphics2D g, Ink ink, double kelvin, List<Reading> readings, double x, int y, int width) {
        g.setFont(ink.font(0.92, false));
        FontMetrics metrics = g.getFontMetrics();
        List<String> lines = lines(kelvin, readings, metrics, width - 60);
        int wide = 0;
        for (String line : lines) {
            wide = Math.max(wide, metrics.stringWidth(line));
        }
        double boxWide = wide + 2.0 * PAD;
        double left = Math.max(6, Math.min(x - boxWide / 2, width - boxWide - 6));
        double high = lines.size() * metrics.getHeight() + 6.0;
        Rectangle2D box = new Rectangle2D.Double(left, y, boxWide, high);
        g.setColor(ink.sheet());
        g.fill(box);
        g.setColor(ink.ink());
        g.setStroke(new BasicStroke(1f));
        g.draw(box);
        int base = y + 3 + metrics.getAscent();
        for (String line : lines) {
            g.drawString(line, (float) (left + PAD), base);
            base += metrics.getHeight();
        }
    }
}
