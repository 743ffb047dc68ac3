package org.saddlebook.window.internal;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.quantity.Unit;
import org.saddlebook.units.api.UnitException;
import org.saddlebook.units.api.Units;

/** Reads the course of temperature of a limit: pairs of time and temperature, or time and {@code "set"}. */
final class CourseReader {
    private static final int MOST_POINTS = 100_000;

    /** Ramps between a stated and the set temperature are integrated anew for every temperature of the window. */
    private static final int MOST_RAMPS = 40;

    /** A reversible law is followed step by step, draw by draw. */
    private static final int MOST_REVERSIBLE = 40;

    private static final String SET = "set";

    private CourseReader() {}

    static Course read(Reading holder, boolean reversible) throws Refusal {
        String place = "course in the " + holder.place();
        Reading at = Reading.of(holder.node("course", "times and temperatures"), place);
        at.only("timeUnit", "temperatureUnit", "points", "interpolation");
        Unit time;
        Unit temperature;
        try {
            time = Units.parse(at.text("timeUnit", "the unit of its times"), Reading.TIME, "h");
            temperature = Units.temperature(at.text("temperatureUnit", "the unit of its temperatures"));
        } catch (UnitException wrong) {
            throw new Refusal("A unit in the " + place + " cannot be used: " + Reading.sentence(wrong));
        }
        String interpolation = at.textOr("interpolation", "linear");
        if (!interpolation.equals("linear") && !interpolation.equals("steps")) {
            throw new Refusal("The interpolation in the " + place + " is \"" + interpolation
                    + "\", which is not known; expected linear or steps.");
        }
        List<Node[]> pairs = pairs(at.node("points", "pairs of time and temperature"), place);
        double[] seconds = new double[pairs.size()];
        double[] value = new double[pairs.size()];
        boolean[] follows = new boolean[pairs.size()];
        int ramps = 0;
        for (int i = 0; i < seconds.length; i++) {
            String point = "Point " + (i + 1) + " of the " + place;
            if (!(pairs.get(i)[0] instanceof Node.Scalar when)) {
                throw new Refusal(point + " has no number as its time.");
            }
            seconds[i] = time.toSi(when.value());
            if (i > 0 && !(seconds[i] > seconds[i - 1])) {
                throw new Refusal(point + " is not later than the one before it.");
            }
            if (pairs.get(i)[1] instanceof Node.Scalar stated) {
                value[i] = temperature.toSi(stated.value());
                if (!(value[i] > 0 && value[i] <= 100_000)) {
                    throw new Refusal(point + " does not lie above 0 K and at most at 100000 K.");
                }
            } else {
                follows[i] = true;
                value[i] = offset(pairs.get(i)[1], point);
            }
            ramps += i > 0 && follows[i] != follows[i - 1] ? 1 : 0;
        }
        if (interpolation.equals("linear") && ramps > MOST_RAMPS) {
            throw new Refusal("The " + place + " goes more than " + MOST_RAMPS
                    + " times between stated and set temperatures; state the plan with fewer points.");
        }
        if (reversible && seconds.length - 1 > MOST_REVERSIBLE) {
            throw new Refusal("The " + place + " has more than " + MOST_REVERSIBLE
                    + " stretches, too many for a reversible rate law; state it with fewer points.");
        }
        return new Course(seconds, value, follows, interpolation.equals("steps"));
    }

    /** {@code set}, {@code set+5}, {@code set-2.5}: kelvin above the temperature of the window. */
    private static double offset(Node node, String point) throws Refusal {
        if (node instanceof Node.Text word && word.value().startsWith(SET)) {
            String rest = word.value().substring(SET.length()).replace(" ", "");
            try {
                double offset = rest.isEmpty() ? 0 : new BigDecimal(rest).doubleValue();
                boolean signed = rest.isEmpty() || rest.startsWith("+") || rest.startsWith("-");
                if (signed && Math.abs(offset) <= 1000) {
                    return offset;
                }
            } catch (NumberFormatException notANumber) {
                // Refused below with what was expected.
            }
        }
        throw new Refusal(point + " has neither a number nor \"set\" (or such as \"set+5\") as its temperature; \"set\""
                + " stands for the temperature of the window.");
    }

    private static List<Node[]> pairs(Node points, String place) throws Refusal {
        List<Node[]> pairs = new ArrayList<>();
        if (points instanceof Node.Matrix matrix && matrix.columns() == 2) {
            for (int i = 0; i < matrix.rows(); i++) {
                pairs.add(new Node[] {new Node.Scalar(matrix.get(i, 0)), new Node.Scalar(matrix.get(i, 1))});
            }
        } else if (points instanceof Node.Items items) {
            for (Node item : items.items()) {
                pairs.add(pair(item, place));
            }
        }
        if (pairs.size() < 2) {
            throw new Refusal("\"points\" in the " + place + " must be at least two pairs of time and temperature,"
                    + " such as [[0, 20], [1, \"set\"], [6, \"set\"]].");
        }
        if (pairs.size() > MOST_POINTS) {
            throw new Refusal("The " + place + " has more than 100000 points.");
        }
        return pairs;
    }

    private static Node[] pair(Node item, String place) throws Refusal {
        if (item instanceof Node.Items two && two.items().size() == 2) {
            return new Node[] {two.items().get(0), two.items().get(1)};
        }
        if (item instanceof Node.Matrix matrix && matrix.rows() == 1 && matrix.columns() == 2) {
            return new Node[] {new Node.Scalar(matrix.get(0, 0)), new Node.Scalar(matrix.get(0, 1))};
        }
        throw new Refusal("\"points\" in the " + place + " holds something that is no pair of time and temperature.");
    }
}
