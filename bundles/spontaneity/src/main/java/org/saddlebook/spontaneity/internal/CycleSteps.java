package org.saddlebook.spontaneity.internal;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.quantity.Constants;
import org.saddlebook.api.quantity.Dimension;
import org.saddlebook.api.quantity.Unit;
import org.saddlebook.units.api.UnitException;
import org.saddlebook.units.api.Units;

/**
 * Steps of cycles with ln of their equilibrium constants in SI, each with the power of concentration in its unit, which must cancel
 * around every cycle.
 *
 * @param kelvin the temperature of all constants, K
 * @param names of the steps
 * @param lnK of the steps; in (mol/m3)^power
 * @param power of concentration in each unit
 * @param uncertainty standard uncertainties of ln K; empty where not stated
 * @param cycles for each cycle how often each step is gone, negative against its direction
 */
@SuppressWarnings("ArrayRecordComponent") // compared by nobody; handed over inside this package only
record CycleSteps(
        double kelvin,
        List<String> names,
        double[] lnK,
        double[] power,
        OptionalDouble[] uncertainty,
        List<double[]> cycles) {
    private static final List<String> FORMS = List.of("K", "lnK", "pK", "dG", "forward");
    private static final double LN_10 = StrictMath.log(10);
    private static final double LN_1000 = StrictMath.log(1000);

    static CycleSteps read(Node node) throws Refusal {
        SettingsReader settings = new SettingsReader(node, "the cycles", List.of("temperature", "steps", "closures"));
        double kelvin = settings.kelvin("temperature");
        if (settings.node("steps").isEmpty()) {
            throw new Refusal(
                    "The cycles need steps: name to K, lnK, pK, dG, or forward and reverse, each with u of ln K.");
        }
        Map<String, Node> steps =
                new SettingsReader(settings.node("steps").get(), "the steps of the cycles", List.of()).members();
        List<String> names = new ArrayList<>(steps.keySet());
        int n = names.size();
        double[] ln = new double[n];
        double[] power = new double[n];
        OptionalDouble[] u = new OptionalDouble[n];
        for (int i = 0; i < n; i++) {
            String place = "the step " + names.get(i);
            SettingsReader one = new SettingsReader(
                    steps.get(names.get(i)), place, List.of("K", "lnK", "pK", "dG", "forward", "reverse", "u"));
            double[] value = value(one, place, kelvin);
            ln[i] = value[0];
            power[i] = value[1];
            u[i] = uncertainty(one, place, value[2]);
        }
        List<double[]> cycles = cycles(settings, names);
        for (double[] cycle : cycles) {
            double left = 0;
            for (int i = 0; i < n; i++) {
                left += cycle[i] * power[i];
            }
            if (Math.abs(left) > 1e-9) {
                throw new Refusal("The cycle " + text(names, cycle)
                        + " does not close in its units: concentration to the power " + Words.number(left)
                        + " is left over. State K with its unit, and check the directions.");
            }
        }
        return new CycleSteps(kelvin, List.copyOf(names), ln, power, u, cycles);
    }

    /** ln K in SI, power of concentration, and standard uncertainty of ln K that a quantity carries, NaN for none. */
    private static double[] value(SettingsReader one, String place, double kelvin) throws Refusal {
        List<String> found = new ArrayList<>();
        for (String form : FORMS) {
            if (one.node(form).isPresent()) {
                found.add(form);
            }
        }
        if (found.size() != 1) {
            throw new Refusal("In " + place + " there must be one of K, lnK, pK, dG, or forward with reverse.");
        }
        return switch (found.get(0)) {
            case "lnK" -> new double[] {one.scalar("lnK").orElseThrow(), 0, Double.NaN};
            case "pK" -> new double[] {-one.scalar("pK").orElseThrow() * LN_10, 0, Double.NaN};
            case "dG" -> ofGibbs(one.quantity("dG", Dimension.MOLAR_ENERGY, "kJ/mol"), Constants.GAS * kelvin);
            case "K" -> constant(one.node("K").get(), place);
            default -> ratio(one, place);
        };
    }

    private static double[] ofGibbs(SettingsReader.Si gibbs, double rt) {
        double u = gibbs.uncertainty().isPresent() ? gibbs.uncertainty().getAsDouble() / rt : Double.NaN;
        return new double[] {-gibbs.value() / rt, 0, u};
    }

    private static double[] ratio(SettingsReader one, String place) throws Refusal {
        if (one.node("reverse").isEmpty()) {
            throw new Refusal("In " + place + " forward needs reverse beside it: both rate constants with units.");
        }
        double[] f = rate(one.node("forward").orElseThrow(), place + ", forward");
        double[] r = rate(one.node("reverse").get(), place + ", reverse");
        return new double[] {f[0] - r[0], r[1] - f[1], Math.sqrt(f[2] * f[2] + r[2] * r[2])};
    }

    private static double[] constant(Node node, String place) throws Refusal {
        if (node instanceof Node.Scalar scalar) {
            return new double[] {positive(scalar.value(), place), 0, Double.NaN};
        }
        if (!(node instanceof Node.Quantity quantity) || quantity.value().isEmpty()) {
            throw new Refusal("In " + place + " K must be a number, or a value with a unit such as mol/L.");
        }
        try {
            Unit unit = Units.parse(quantity.unit());
            double power = unit.dimension().amount();
            if (!unit.dimension().equals(Dimension.CONCENTRATION.power(power))) {
                throw new Refusal("In " + place + " the unit of K must be a power of concentration; found "
                        + quantity.unit() + ".");
            }
            double value = quantity.value().getAsDouble();
            return new double[] {positive(unit.toSi(value), place), power, relative(quantity, value)};
        } catch (UnitException wrong) {
            throw new Refusal("In " + place + " the unit of K cannot be used: found " + wrong.found() + ", expected "
                    + wrong.expected() + ".");
        }
    }

    /** ln k in SI, order, relative uncertainty. */
    private static double[] rate(Node node, String place) throws Refusal {
        if (!(node instanceof Node.Quantity quantity) || quantity.value().isEmpty()) {
            throw new Refusal("In " + place + " a rate constant with its unit is expected, such as 1/s.");
        }
        try {
            Unit unit = Units.rateConstant(quantity.unit());
            double value = quantity.value().getAsDouble();
            double order = Units.rateOrder(unit).orElseThrow();
            return new double[] {positive(unit.toSi(value), place), order, relative(quantity, value)};
        } catch (UnitException wrong) {
            throw new Refusal("In " + place + " the unit cannot be used: found " + wrong.found() + ", expected "
                    + wrong.expected() + ".");
        }
    }

    private static double relative(Node.Quantity quantity, double value) {
        return quantity.standardUncertainty().isPresent()
                ? quantity.standardUncertainty().getAsDouble() / Math.abs(value)
                : Double.NaN;
    }

    private static double positive(double value, String place) throws Refusal {
        if (!(value > 0 && value < Double.POSITIVE_INFINITY)) {
            throw new Refusal("In " + place + " the constant must be above zero.");
        }
        return StrictMath.log(value);
    }

    private static OptionalDouble uncertainty(SettingsReader one, String place, double carried) throws Refusal {
        OptionalDouble stated = one.scalar("u");
        if (stated.isEmpty()) {
            return Double.isNaN(carried) ? OptionalDouble.empty() : OptionalDouble.of(carried);
        }
        if (!Double.isNaN(carried)) {
            throw new Refusal("In " + place + " the uncertainty is stated twice: with the value, and as u.");
        }
        if (!(stated.getAsDouble() > 0)) {
            throw new Refusal("In " + place + " u must be above zero: the standard uncertainty of ln K.");
        }
        return stated;
    }

    private static List<double[]> cycles(SettingsReader settings, List<String> names) throws Refusal {
        if (settings.node("closures").isEmpty()
                || !(settings.node("closures").get() instanceof Node.Items items)
                || items.items().isEmpty()) {
            throw new Refusal(
                    "The cycles need closures: for each cycle step to how often it is gone, negative against its"
                            + " direction.");
        }
        List<double[]> cycles = new ArrayList<>();
        for (int c = 0; c < items.items().size(); c++) {
            String place = "closure " + (c + 1);
            SettingsReader reader = new SettingsReader(items.items().get(c), place, names);
            double[] cycle = new double[names.size()];
            boolean any = false;
            for (String step : reader.members().keySet()) {
                double times = reader.scalar(step).orElse(0);
                if (!(Math.abs(times) > 0 && Math.abs(times) <= 1000)) {
                    throw new Refusal(
                            "In " + place + " the step " + step + " must be gone a number of times other than zero.");
                }
                cycle[names.indexOf(step)] = times;
                any = true;
            }
            if (!any) {
                throw new Refusal("In " + place + " there is no step.");
            }
            cycles.add(cycle);
        }
        return List.copyOf(cycles);
    }

    /** What to add to ln K of a step so that concentrations count in mol/L, as people write them. */
    double perLitre(int step) {
        return power[step] == 0 ? 0 : -power[step] * LN_1000;
    }

    String text(int cycle) {
        return text(names, cycles.get(cycle));
    }

    private static String text(List<String> names, double[] cycle) {
        StringBuilder text = new StringBuilder();
        for (int i = 0; i < cycle.length; i++) {
            if (cycle[i] != 0) {
                text.append(text.length() == 0 ? "" : " · ").append(names.get(i));
                if (cycle[i] != 1) {
                    text.append('^').append(Words.number(cycle[i]));
                }
            }
        }
        return text.toString();
    }
}
