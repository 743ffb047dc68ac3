package org.saddlebook.spontaneity.internal;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.model.StandardState;
import org.saddlebook.api.quantity.Dimension;
import org.saddlebook.api.quantity.Unit;
import org.saddlebook.units.api.UnitException;
import org.saddlebook.units.api.Units;

/** Reads the campaign's settings of this section. Nothing is guessed: what is not understood is refused by name. */
final class StatementReader {
    private static final List<String> KEYS = List.of(
            "dH", "dS", "correlation", "covariance", "degreesOfFreedom", "range", "standardState", "equilibrium");

    /** Far beyond every reaction, J/mol or J/(mol K); keeps the arithmetic away from overflow. */
    private static final double LARGEST = 1e12;

    private final Node.Group settings;

    private StatementReader(Node.Group settings) {
        this.settings = settings;
    }

    /**
     * What was stated.
     *
     * @param settings settings of the section
     * @param campaignStandard standard state stated for the campaign; used when the section states none
     * @throws Refusal with a sentence for the user
     */
    static Stated read(Node settings, Optional<StandardState> campaignStandard) throws Refusal {
        if (!(settings instanceof Node.Group group)) {
            throw new Refusal("The settings of spontaneity are not a group; state dH and dS in it.");
        }
        return new StatementReader(group).stated(campaignStandard);
    }

    private Stated stated(Optional<StandardState> campaignStandard) throws Refusal {
        for (String key : settings.members().keySet()) {
            if (!KEYS.contains(key)) {
                throw new Refusal("The settings of spontaneity hold \"" + key + "\", which is not known; expected "
                        + String.join(", ", KEYS) + ".");
            }
        }
        Node.Quantity enthalpy = quantity("dH", "an enthalpy of reaction", "kJ/mol");
        Node.Quantity entropy = quantity("dS", "an entropy of reaction", "J/(mol.K)");
        Unit energyUnit = unit("dH", enthalpy, Dimension.MOLAR_ENERGY, "kJ/mol");
        Unit entropyUnit = unit("dS", entropy, Dimension.MOLAR_ENTROPY, "J/(mol.K)");
        OptionalDouble enthalpyUncertainty = uncertainty("dH", enthalpy, energyUnit);
        OptionalDouble entropyUncertainty = uncertainty("dS", entropy, entropyUnit);
        OptionalDouble lower = OptionalDouble.empty();
        OptionalDouble upper = OptionalDouble.empty();
        if (settings.get("range").isPresent()) {
            if (!(settings.get("range").get() instanceof Node.Group range)
                    || range.get("lower").isEmpty()
                    || range.get("upper").isEmpty()) {
                throw new Refusal("The range of temperatures needs lower and upper.");
            }
            lower = OptionalDouble.of(temperature(range.get("lower").get()));
            upper = OptionalDouble.of(temperature(range.get("upper").get()));
            if (!(lower.getAsDouble() < upper.getAsDouble())) {
                throw new Refusal("The lower end of the range of temperatures must lie below its upper end.");
            }
        }
        Optional<StandardState> standard = standard();
        return new Stated(
                finite("dH", energyUnit.toSi(enthalpy.value().getAsDouble())),
                enthalpyUncertainty,
                finite("dS", entropyUnit.toSi(entropy.value().getAsDouble())),
                entropyUncertainty,
                covariance(enthalpyUncertainty, entropyUncertainty),
                degreesOfFreedom(),
                lower,
                upper,
                standard.isPresent() ? standard : campaignStandard);
    }

    private Node.Quantity quantity(String key, String what, String example) throws Refusal {
        Optional<Node> node = settings.get(key);
        if (node.isEmpty()) {
            throw new Refusal(key + " is missing: a sign case needs both dH and dS; state " + what
                    + " in a unit such as " + example + ".");
        }
        if (!(node.get() instanceof Node.Quantity quantity)) {
            throw new Refusal(key + " has no unit; state " + what + " with a unit such as " + example + ".");
        }
        if (quantity.value().isEmpty()) {
            throw new Refusal(key + " has no value; state " + what + ".");
        }
        if (quantity.standardFactor().isPresent() || quantity.interval().isPresent()) {
            throw new Refusal("The uncertainty of " + key
                    + " must be a standard uncertainty in its unit; a factor or an interval is not understood here.");
        }
        return quantity;
    }

    private static Unit unit(String key, Node.Quantity quantity, Dimension dimension, String example) throws Refusal {
        try {
            return Units.parse(quantity.unit(), dimension, example);
        } catch (UnitException wrong) {
            throw new Refusal("The unit of " + key + " cannot be used: " + sentence(wrong));
        }
    }

    private static OptionalDouble uncertainty(String key, Node.Quantity quantity, Unit unit) throws Refusal {
        if (quantity.standardUncertainty().isEmpty()) {
            return OptionalDouble.empty();
        }
        double stated = quantity.standardUncertainty().getAsDouble();
        if (!(stated >= 0)) {
            throw new Refusal("The standard uncertainty of " + key + " must not be negative.");
        }
        return OptionalDouble.of(finite("The standard uncertainty of " + key, stated * unit.factor()));
    }

    private OptionalDouble covariance(OptionalDouble first, OptionalDouble second) throws Refusal {
        OptionalDouble correlation = scalar("correlation");
        OptionalDouble covariance = scalar("covariance");
        if (correlation.isEmpty() && covariance.isEmpty()) {
            return OptionalDouble.empty();
        }
        if (correlation.isPresent() && covariance.isPresent()) {
            throw new Refusal("Both correlation and covariance of dH and dS are stated; state one of them.");
        }
        if (first.isEmpty() || second.isEmpty()) {
            throw new Refusal("A correlation of dH and dS needs the standard uncertainty of both.");
        }
        double largest = first.getAsDouble() * second.getAsDouble();
        double value = correlation.isPresent() ? correlation.getAsDouble() * largest : covariance.getAsDouble();
        boolean possible = correlation.isPresent()
                ? Math.abs(correlation.getAsDouble()) <= 1
                : Math.abs(covariance.getAsDouble()) <= largest * (1 + 1e-12);
        if (!possible) {
            throw new Refusal(
                    correlation.isPresent()
                            ? "The correlation of dH and dS must lie between -1 and 1."
                            : "The covariance of dH and dS is larger than their standard uncertainties allow: its size is"
                                    + " at most their product, in (J/mol)(J/(mol K)).");
        }
        // A covariance rounded a little beyond the limit would make a variance of ΔG negative.
        return OptionalDouble.of(Math.max(-largest, Math.min(largest, value)));
    }

    private OptionalDouble degreesOfFreedom() throws Refusal {
        OptionalDouble stated = scalar("degreesOfFreedom");
        if (stated.isPresent() && !(stated.getAsDouble() > 0)) {
            throw new Refusal("The degrees of freedom must be positive.");
        }
        return stated;
    }

    private OptionalDouble scalar(String key) throws Refusal {
        Optional<Node> node = settings.get(key);
        if (node.isEmpty()) {
            return OptionalDouble.empty();
        }
        if (!(node.get() instanceof Node.Scalar scalar)) {
            throw new Refusal("The " + key + " must be a plain number.");
        }
        return OptionalDouble.of(scalar.value());
    }

    private Optional<StandardState> standard() throws Refusal {
        Optional<Node> node = settings.get("standardState");
        if (node.isEmpty()) {
            return Optional.empty();
        }
        if (!(node.get() instanceof Node.Text text)) {
            throw new Refusal("The standard state must be a text such as \"1 bar\".");
        }
        try {
            return Optional.of(Units.standardState(text.value()));
        } catch (UnitException wrong) {
            throw new Refusal("The standard state cannot be used: " + sentence(wrong));
        }
    }

    /** A plain number is in K, as every plain number in a campaign is in SI. */
    private static double temperature(Node node) throws Refusal {
        double kelvin;
        if (node instanceof Node.Scalar scalar) {
            kelvin = scalar.value();
        } else if (node instanceof Node.Quantity quantity && quantity.value().isPresent()) {
            try {
                kelvin =
                        Units.temperature(quantity.unit()).toSi(quantity.value().getAsDouble());
            } catch (UnitException wrong) {
                throw new Refusal("The unit of the range of temperatures cannot be used: " + sentence(wrong));
            }
        } else {
            throw new Refusal("An end of the range of temperatures must be a temperature.");
        }
        if (!(kelvin > 0 && kelvin <= Temperatures.HOTTEST)) {
            throw new Refusal("The range of temperatures must lie above 0 K and at most at 100000 K.");
        }
        return kelvin;
    }

    private static String sentence(UnitException wrong) {
        String text = "found " + wrong.found() + ", expected " + wrong.expected() + "; " + wrong.remedy();
        return text.endsWith(".") ? text : text + ".";
    }

    private static double finite(String what, double value) throws Refusal {
        if (!(Math.abs(value) <= LARGEST)) {
            throw new Refusal(what + " is beyond anything a reaction can have; check the number and its unit.");
        }
        return value;
    }
}
