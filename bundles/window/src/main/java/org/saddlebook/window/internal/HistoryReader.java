package org.saddlebook.window.internal;

import java.util.OptionalDouble;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.quantity.Constants;
import org.saddlebook.api.quantity.Dimension;
import org.saddlebook.api.quantity.Unit;
import org.saddlebook.units.api.UnitException;
import org.saddlebook.units.api.Units;

/** Reads a course of temperature: pairs of time and temperature in stated units. */
final class HistoryReader {
    private static final int MOST_POINTS = 100_000;

    private HistoryReader() {}

    static History read(Node node) throws Refusal {
        Reading at = Reading.of(node, "history");
        at.only("title", "timeUnit", "temperatureUnit", "points", "interpolation", "reference", "activationEnergy");
        Unit time;
        Unit temperature;
        try {
            time = Units.parse(at.text("timeUnit", "the unit of its times"), Reading.TIME, "h");
            temperature = Units.temperature(at.text("temperatureUnit", "the unit of its temperatures"));
        } catch (UnitException wrong) {
            throw new Refusal("A unit in the history cannot be used: " + Reading.sentence(wrong));
        }
        if (!(at.node("points", "pairs of time and temperature") instanceof Node.Matrix points)
                || points.columns() != 2
                || points.rows() < 2) {
            throw new Refusal("\"points\" in the history must be at least two pairs of time and temperature,"
                    + " such as [[0, 20], [5, 40]].");
        }
        if (points.rows() > MOST_POINTS) {
            throw new Refusal("The history has more than 100000 points.");
        }
        double[] seconds = new double[points.rows()];
        double[] kelvin = new double[points.rows()];
        for (int i = 0; i < seconds.length; i++) {
            seconds[i] = time.toSi(points.get(i, 0));
            kelvin[i] = temperature.toSi(points.get(i, 1));
            if (!(kelvin[i] > 0 && kelvin[i] <= 100_000)) {
                throw new Refusal(
                        "Point " + (i + 1) + " of the history does not lie above 0 K and at most at" + " 100000 K.");
            }
            if (i > 0 && !(seconds[i] > seconds[i - 1])) {
                throw new Refusal("Point " + (i + 1) + " of the history is not later than the one before it.");
            }
        }
        String interpolation = at.textOr("interpolation", "linear");
        if (!interpolation.equals("linear") && !interpolation.equals("steps")) {
            throw new Refusal("The interpolation in the history is \"" + interpolation
                    + "\", which is not known; expected linear or steps.");
        }
        OptionalDouble energy = OptionalDouble.empty();
        if (at.has("activationEnergy")) {
            energy = OptionalDouble.of(
                    at.quantity("activationEnergy", Dimension.MOLAR_ENERGY, "the activation energy", "kJ/mol")
                            .si());
            if (!(energy.getAsDouble() > 0 && energy.getAsDouble() <= 1e7)) {
                throw new Refusal("The activationEnergy in the history must be above zero and at most 10000 kJ/mol.");
            }
        }
        double reference = at.has("reference")
                ? at.kelvin("reference", "the temperature at which the age is stated")
                : Constants.REFERENCE_KELVIN;
        return new History(
                at.textOr("title", "temperature history"),
                seconds,
                kelvin,
                interpolation.equals("steps"),
                reference,
                energy);
    }
}
