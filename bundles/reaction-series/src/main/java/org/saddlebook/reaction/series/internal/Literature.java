package org.saddlebook.reaction.series.internal;

import java.util.Locale;
import java.util.Map;
import java.util.TreeMap;
import org.saddlebook.api.problem.InputException;
import org.saddlebook.api.quantity.Constants;
import org.saddlebook.api.quantity.Dimension;
import org.saddlebook.api.quantity.Unit;
import org.saddlebook.console.api.Options;
import org.saddlebook.units.api.DecimalSign;
import org.saddlebook.units.api.Measured;
import org.saddlebook.units.api.Numerals;
import org.saddlebook.units.api.UnitException;
import org.saddlebook.units.api.Units;

/**
 * A rate expression of the literature in evaluated-data form: {@code k = A (T/K)^n exp(−E/(RT))}, with the factor of
 * uncertainty {@code f(T) = f(298) exp|g (1/T − 1/298)|} (JPL Publication 19-5, 2020, section 1: one standard deviation).
 *
 * @param lnPrefactor ln of A in SI
 * @param exponent n
 * @param energyKelvin E/R, K
 * @param factor f(298); 1 when not stated
 * @param spread g, K; 0 when not stated
 * @param source where it is from; may be empty
 */
record Literature(
        double lnPrefactor, double exponent, double energyKelvin, double factor, double spread, String source) {
    private static final double REFERENCE = 298;
    private static final String OPTION = "--literature";
    private static final String EXPECTED =
            "an expression such as \"A = 2.45e-12 cm3/({molecule}.s), E/R = 1775 K, f298 = 1.1, g = 100 K, from ...\"";

    /** ln k in SI. */
    double lnRate(double kelvin) {
        return lnPrefactor + exponent * StrictMath.log(kelvin) - energyKelvin / kelvin;
    }

    /** ln of f(T): the standard uncertainty of ln k; 0 when not stated. */
    double lnFactor(double kelvin) {
        return StrictMath.log(factor) + Math.abs(spread * (1 / kelvin - 1 / REFERENCE));
    }

    /** Local activation energy, J/mol: {@code R (E/R + n T)}. */
    double energy(double kelvin) {
        return Constants.GAS * (energyKelvin + exponent * kelvin);
    }

    boolean stated() {
        return factor > 1;
    }

    /**
     * Reads an expression.
     *
     * @param order order of the rate constants it is compared with
     */
    static Literature parse(String text, double order) throws InputException {
        Map<String, String> values = new TreeMap<>();
        String source = "";
        String rest = text.strip();
        while (!rest.isEmpty()) {
            if (rest.toLowerCase(Locale.ROOT).startsWith("from ")) {
                source = rest.substring("from ".length()).strip();
                break;
            }
            int comma = rest.indexOf(',');
            String item = (comma < 0 ? rest : rest.substring(0, comma)).strip();
            int equals = item.indexOf('=');
            if (equals < 0
                    || values.put(
                                    item.substring(0, equals).strip(),
                                    item.substring(equals + 1).strip())
                            != null) {
                throw wrong(
                        "\"" + item + "\"", "Write each number once as name = value, the source last after \"from\".");
            }
            rest = comma < 0 ? "" : rest.substring(comma + 1).strip();
        }
        for (String key : values.keySet()) {
            if (!java.util.List.of("A", "n", "E/R", "Ea", "f298", "f(298)", "g").contains(key)) {
                throw wrong("\"" + key + "\"", "Known are A, n, E/R or Ea, f298, g, and from.");
            }
        }
        if (!values.containsKey("A") || values.containsKey("E/R") == values.containsKey("Ea")) {
            throw wrong("\"" + text + "\"", "State A, and either E/R or Ea, each with its unit.");
        }
        double prefactor = quantity(values.get("A"), Dimension.rateConstant(order), "A");
        double energy = values.containsKey("Ea")
                ? quantity(values.get("Ea"), Dimension.MOLAR_ENERGY, "Ea") / Constants.GAS
                : quantity(values.get("E/R"), Dimension.TEMPERATURE, "E/R");
        String f = values.containsKey("f298") ? values.get("f298") : values.getOrDefault("f(298)", "1");
        double factor = number(f, "f298");
        if (!(prefactor > 0)) {
            throw wrong("A = " + values.get("A"), "A must be above zero.");
        }
        if (!(factor >= 1)) {
            throw wrong("f298 = " + f, "f(298) is a factor of at least 1.");
        }
        double spread = values.containsKey("g") ? quantity(values.get("g"), Dimension.TEMPERATURE, "g") : 0;
        return new Literature(
                StrictMath.log(prefactor), number(values.getOrDefault("n", "0"), "n"), energy, factor, spread, source);
    }

    private static double number(String text, String key) throws InputException {
        try {
            double value = Numerals.parse(text, DecimalSign.POINT).doubleValue();
            if (Double.isFinite(value)) {
                return value;
            }
        } catch (UnitException e) {
            // refused below, like a number beyond the range
        }
        throw wrong(key + " = " + text, key + " is a plain number.");
    }

    private static double quantity(String text, Dimension dimension, String key) throws InputException {
        try {
            Measured measured = Units.measured(text);
            Unit unit = measured.unit();
            if (unit.dimension().equals(dimension) && unit.offset() == 0) {
                return unit.toSi(measured.value());
            }
            throw wrong(
                    key + " = " + text + ", a " + Units.name(unit.dimension()),
                    key + " must be a " + Units.name(dimension)
                            + ", as the rate constants it is compared with ask for.");
        } catch (UnitException e) {
            throw new InputException(e.at(org.saddlebook.api.problem.Place.of(OPTION)));
        }
    }

    private static InputException wrong(String found, String remedy) {
        return Options.wrong("wrong-expression", OPTION, found, EXPECTED, remedy);
    }
}
