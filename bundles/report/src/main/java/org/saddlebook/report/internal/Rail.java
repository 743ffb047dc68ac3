package org.saddlebook.report.internal;

import java.util.ArrayList;
import java.util.List;
import org.saddlebook.api.campaign.RatePoint;
import org.saddlebook.api.campaign.RateTable;
import org.saddlebook.presentation.api.Rounding;

/**
 * The campaign on its temperature rail, spaced as 1/T: measured points as hourglasses, excluded ones hollow with a slash,
 * targets as open flat bars. Small enough to be written by hand, so that it is there without a renderer of figures.
 */
final class Rail {
    private static final int WIDTH = 720;
    private static final int LEFT = 14;
    private static final int RIGHT = 706;

    private Rail() {}

    static String html(RateTable table, List<Double> targets) {
        double low = Double.POSITIVE_INFINITY;
        double high = 0;
        List<Double> all = new ArrayList<>(targets);
        for (RatePoint point : table.points()) {
            all.add(point.kelvin());
        }
        for (double kelvin : all) {
            low = Math.min(low, kelvin);
            high = Math.max(high, kelvin);
        }
        double room = Math.max((1 / low - 1 / high) * 0.05, 0.005 / high);
        double from = 1 / low + room;
        double to = 1 / high - Math.min(room, 0.5 / high);
        StringBuilder svg = new StringBuilder("<svg xmlns=\"http://www.w3.org/2000/svg\" class=\"rail\" viewBox=\"0 0 ")
                .append(WIDTH)
                .append(
                        " 84\" role=\"img\" aria-label=\"Temperatures of the campaign\"><title>Temperatures of the campaign, spaced as"
                                + " 1/T: measured, excluded and predicted</title>");
        svg.append("<rect x=\"0\" y=\"34\" width=\"720\" height=\"44\" fill=\"#e8ebd9\"/>");
        svg.append("<path d=\"M0 56H720\" stroke=\"#1f2a30\" stroke-width=\"1.5\"/>");
        ticks(svg, 1 / from, 1 / to, 0, from, to);
        ticks(svg, 1 / from, 1 / to, 273.15, from, to);
        svg.append("<text x=\"4\" y=\"48\" class=\"scale\">K</text><text x=\"4\" y=\"73\" class=\"scale\">°C</text>");
        for (double kelvin : targets) {
            svg.append("<rect x=\"")
                    .append(number(at(kelvin, from, to) - 8))
                    .append("\" y=\"18\" width=\"16\" height=\"5\""
                            + " fill=\"#fbf8f1\" stroke=\"#1f2a30\" stroke-width=\"1.5\"/>");
        }
        for (int pass = 0; pass < 2; pass++) {
            for (RatePoint point : table.points()) {
                if (point.excluded().isEmpty() == (pass == 0)) {
                    hourglass(svg, at(point.kelvin(), from, to), 20.5, pass == 0);
                }
            }
        }
        return "<figure class=\"figure\">" + svg + "</svg></figure>\n";
    }

    /** The mark of a point in a row of a table. */
    static String mark(boolean used) {
        StringBuilder svg = new StringBuilder(
                        "<svg xmlns=\"http://www.w3.org/2000/svg\" class=\"mark\" viewBox=\"0 0 18 14\""
                                + " role=\"img\" aria-label=\"")
                .append(used ? "used" : "excluded")
                .append("\">");
        hourglass(svg, 9, 7, used);
        return svg.append("</svg>").toString();
    }

    private static void hourglass(StringBuilder svg, double x, double y, boolean used) {
        String path = "M" + number(x - 4.5) + " " + number(y - 5.5) + "H" + number(x + 4.5) + "L" + number(x - 4.5)
                + " " + number(y + 5.5) + "H" + number(x + 4.5) + "Z";
        if (used) {
            svg.append("<path d=\"").append(path).append("\" fill=\"#1f2a30\"/>");
        } else {
            String slash =
                    "M" + number(x - 7.5) + " " + number(y + 4.5) + "L" + number(x + 7.5) + " " + number(y - 4.5);
            svg.append("<path d=\"").append(path).append(slash).append("\" fill=\"#fbf8f1\" stroke=\"#1f2a30\"/>");
        }
    }

    private static void ticks(StringBuilder svg, double low, double high, double shift, double from, double to) {
        int step = step(high - low);
        double free = 30;
        for (int written = (int) Math.ceil((low - shift) / step) * step; written <= high - shift; written += step) {
            double x = at(written + shift, from, to);
            boolean kelvin = shift == 0;
            svg.append("<path d=\"M")
                    .append(number(x))
                    .append(kelvin ? " 51V56" : " 56V61")
                    .append("\" stroke=\"#1f2a30\"/>");
            if (x - 14 > free && x + 14 < WIDTH) {
                svg.append("<text x=\"")
                        .append(number(x))
                        .append("\" y=\"")
                        .append(kelvin ? 48 : 73)
                        .append("\" text-anchor=\"middle\">")
                        .append(Rounding.decimals(written, 0))
                        .append("</text>");
                free = x + 14;
            }
        }
    }

    private static int step(double range) {
        for (int step : new int[] {1, 2, 5, 10, 20, 50, 100, 200, 500}) {
            if (range / step <= 14) {
                return step;
            }
        }
        return (int) Math.ceil(range / 10);
    }

    private static double at(double kelvin, double from, double to) {
        return LEFT + (RIGHT - LEFT) * (from - 1 / kelvin) / (from - to);
    }

    /** A coordinate, to a tenth of a unit. */
    private static String number(double value) {
        return Rounding.decimals(value, 1).replace('−', '-');
    }
}
