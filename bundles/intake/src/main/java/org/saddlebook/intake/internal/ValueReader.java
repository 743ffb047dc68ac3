package org.saddlebook.intake.internal;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import org.saddlebook.api.campaign.Campaign;
import org.saddlebook.api.campaign.Choices;
import org.saddlebook.api.campaign.ConstantKind;
import org.saddlebook.api.campaign.ErrorModel;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.model.StandardState;
import org.saddlebook.api.problem.InputException;
import org.saddlebook.api.problem.Problem;
import org.saddlebook.api.quantity.Dimension;
import org.saddlebook.api.quantity.Unit;
import org.saddlebook.api.reader.Imported.Directive;
import org.saddlebook.json.api.NumberText;
import org.saddlebook.units.api.Converter;
import org.saddlebook.units.api.DecimalSign;
import org.saddlebook.units.api.Measured;
import org.saddlebook.units.api.Numerals;
import org.saddlebook.units.api.UnitException;
import org.saddlebook.units.api.Units;

/** Values of statements; each throws an {@link InputException} with the line of the statement. */
final class ValueReader {
    private static final Dimension ENERGY_TIMES_ENTROPY = Dimension.MOLAR_ENERGY.times(Dimension.MOLAR_ENTROPY);

    private ValueReader() {}

    static String text(Directive directive) throws InputException {
        if (directive.value().isEmpty()) {
            throw wrong(directive, "a text after the colon", "Write the text, or remove the line.");
        }
        return directive.value();
    }

    static StandardState standardState(Directive directive) throws InputException {
        try {
            return Units.standardState(directive.value());
        } catch (UnitException e) {
            throw new InputException(e.at(directive.place()));
        }
    }

    static double kelvin(Directive directive, String text) throws InputException {
        try {
            return Units.kelvin(text);
        } catch (UnitException e) {
            throw new InputException(e.at(directive.place()));
        }
    }

    /** Temperatures separated by semicolons or commas, added to those that are there. */
    static List<Double> targets(Directive directive, Campaign campaign) throws InputException {
        List<Double> targets = new ArrayList<>(campaign.choices().targetsKelvin());
        for (String item : items(directive)) {
            targets.add(kelvin(directive, item));
        }
        return targets;
    }

    static List<String> words(Directive directive) throws InputException {
        return items(directive);
    }

    static List<String> items(Directive directive) throws InputException {
        List<String> items = new ArrayList<>();
        int start = 0;
        String text = directive.value();
        for (int i = 0; i <= text.length(); i++) {
            if (i == text.length() || text.charAt(i) == ';' || text.charAt(i) == ',') {
                String item = text.substring(start, i).strip();
                if (item.isEmpty()) {
                    throw wrong(directive, "items separated by semicolons or commas", "Remove the empty item.");
                }
                items.add(item);
                start = i + 1;
            }
        }
        return items;
    }

    /** The order; one that disagrees with the unit of the table is refused. */
    static double order(Directive directive, Campaign campaign) throws InputException {
        double order = number(directive, directive.value());
        if (!(order >= 0)) {
            throw wrong(directive, "an order, for example 1 or 2", "Correct the number.");
        }
        if (campaign.rateTable().isPresent() && campaign.rateTable().get().order() != order) {
            throw new InputException(new Problem(
                    "order-against-unit",
                    directive.place(),
                    directive.key() + " " + directive.value(),
                    "order " + NumberText.of(campaign.rateTable().get().order()) + ", which the unit "
                            + campaign.rateTable().get().rateUnit().code() + " of the rate constants has",
                    "Correct the statement or the unit in the header."));
        }
        return order;
    }

    static double positive(Directive directive) throws InputException {
        double value = number(directive, directive.value());
        if (!(value > 0)) {
            throw wrong(directive, "a number above zero", "Correct the number.");
        }
        return value;
    }

    static double level(Directive directive) throws InputException {
        String text = directive.value();
        boolean percent = text.endsWith("%");
        double value = number(directive, percent ? text.substring(0, text.length() - 1) : text);
        double level = percent ? Numerals.shortest(value).movePointLeft(2).doubleValue() : value;
        if (!(level > 0.5 && level < 1)) {
            throw wrong(
                    directive,
                    "a coverage probability between 0.5 and 1, for example 0.95 or 95 %",
                    "Correct the number.");
        }
        return level;
    }

    static long seed(Directive directive) throws InputException {
        double value = number(directive, directive.value());
        if (!(value >= 0 && value <= Choices.LARGEST_SEED) || value != Math.rint(value)) {
            throw wrong(directive, "a whole number from 0 to " + Choices.LARGEST_SEED, "Correct the number.");
        }
        return (long) value;
    }

    static ConstantKind constantKind(Directive directive) throws InputException {
        try {
            return ConstantKind.of(directive.value());
        } catch (IllegalArgumentException e) {
            throw wrong(directive, "one of elementary, pseudo-order, lumped, unstated", "Choose one of these words.");
        }
    }

    static ErrorModel errorModel(Directive directive) throws InputException {
        try {
            return ErrorModel.of(directive.value());
        } catch (IllegalArgumentException e) {
            throw wrong(
                    directive,
                    "one of constant-relative, stated, stated-both, constant-absolute",
                    "Choose one of these words.");
        }
    }

    /** A difference of temperatures, as a quantity in K. */
    static Node difference(Directive directive) throws InputException {
        Measured measured = measured(directive, Dimension.TEMPERATURE, "a difference of temperatures", "0.3 K");
        if (!(measured.value() > 0)) {
            throw wrong(directive, "a difference above zero, for example 0.3 K", "Correct the number.");
        }
        return Node.Quantity.of(Converter.of(measured.unit()).differenceToSi(Numerals.shortest(measured.value())), "K");
    }

    /** A fraction between 0 and 1, as a number or in percent. */
    static Node fraction(Directive directive) throws InputException {
        String text = directive.value();
        boolean percent = text.endsWith("%");
        double value =
                number(directive, percent ? text.substring(0, text.length() - 1).strip() : text);
        double fraction = percent ? Numerals.shortest(value).movePointLeft(2).doubleValue() : value;
        if (!(fraction > 0 && fraction < 1)) {
            throw wrong(directive, "a fraction between 0 and 1, for example 0.02 or 2 %", "Correct the number.");
        }
        return new Node.Scalar(fraction);
    }

    /** One of a few words. */
    static Node word(Directive directive, List<String> words) throws InputException {
        if (!words.contains(directive.value())) {
            throw wrong(directive, "one of " + String.join(", ", words), "Choose one of these words.");
        }
        return new Node.Text(directive.value());
    }

    /** The third body as a concentration in mol/m3 or a pressure in Pa. */
    static Node thirdBody(Directive directive) throws InputException {
        try {
            Measured measured = Units.measured(directive.value());
            Dimension dimension = measured.unit().dimension();
            boolean pressure = dimension.equals(Dimension.PRESSURE);
            if ((!pressure && !dimension.equals(Dimension.CONCENTRATION)) || !(measured.value() > 0)) {
                throw wrong(
                        directive,
                        "a concentration or a pressure above zero, for example 2.4e19 molecule cm-3 or 1 bar",
                        "Correct the value and its unit.");
            }
            return Node.Quantity.of(si(measured), pressure ? "Pa" : "mol/m3");
        } catch (UnitException e) {
            throw new InputException(e.at(directive.place()));
        }
    }

    /** Some of a few words. */
    static Node wordsOf(Directive directive, List<String> known) throws InputException {
        List<Node> words = new ArrayList<>();
        for (String word : items(directive)) {
            if (!known.contains(word)) {
                throw wrong(directive, "some of " + String.join(", ", known), "Choose among these words.");
            }
            words.add(new Node.Text(word));
        }
        return new Node.Items(words);
    }

    /** A whole number. */
    static Node count(Directive directive, int least, int most) throws InputException {
        double value = number(directive, directive.value());
        if (!(value >= least && value <= most) || value != Math.rint(value)) {
            throw wrong(directive, "a whole number from " + least + " to " + most, "Correct the number.");
        }
        return new Node.Scalar(value);
    }

    static Node energy(Directive directive) throws InputException {
        return quantity(directive, Dimension.MOLAR_ENERGY, "a molar energy", "-92.2 +- 0.4 kJ/mol", "J/mol");
    }

    static Node entropy(Directive directive) throws InputException {
        return quantity(directive, Dimension.MOLAR_ENTROPY, "a molar entropy", "-198.8 +- 0.5 J/(mol.K)", "J/(mol.K)");
    }

    /** Covariance of dH and dS in (J/mol)(J/(mol K)). */
    static Node covariance(Directive directive) throws InputException {
        Measured measured = measured(directive, ENERGY_TIMES_ENTROPY, "a covariance", "350 J2/(mol2.K)");
        return new Node.Scalar(si(measured));
    }

    static Node correlation(Directive directive) throws InputException {
        double value = number(directive, directive.value());
        if (!(Math.abs(value) <= 1)) {
            throw wrong(directive, "a correlation from -1 to 1", "Correct the number.");
        }
        return new Node.Scalar(value);
    }

    static Node viscosity(Directive directive) throws InputException {
        return above(directive, new Dimension(1, -1, -1, 0, 0), "a dynamic viscosity", "0.89 mPa.s", "Pa.s");
    }

    static Node length(Directive directive) throws InputException {
        return above(directive, new Dimension(0, 1, 0, 0, 0), "a length", "0.4 nm", "m");
    }

    static Node molarMass(Directive directive) throws InputException {
        return above(directive, new Dimension(1, 0, 0, 0, -1), "a molar mass", "20 g/mol", "kg/mol");
    }

    private static Node above(Directive directive, Dimension dimension, String what, String example, String unit)
            throws InputException {
        Node.Quantity quantity = (Node.Quantity) quantity(directive, dimension, what, example, unit);
        if (!(quantity.value().orElse(0) > 0)) {
            throw wrong(directive, what + " above zero, for example " + example, "Correct the number.");
        }
        return quantity;
    }

    private static Node quantity(Directive directive, Dimension dimension, String what, String example, String unit)
            throws InputException {
        Measured measured = measured(directive, dimension, what, example);
        OptionalDouble uncertainty = measured.uncertainty();
        if (uncertainty.isEmpty()) {
            return Node.Quantity.of(si(measured), unit);
        }
        BigDecimal stated = Numerals.shortest(uncertainty.getAsDouble());
        return Node.Quantity.of(
                si(measured), unit, Converter.of(measured.unit()).differenceToSi(stated));
    }

    /** Rounded once, so that the same amount in kJ and J gives the same double. */
    static double si(Measured measured) {
        return Converter.of(measured.unit()).toSi(Numerals.shortest(measured.value()));
    }

    private static Measured measured(Directive directive, Dimension dimension, String what, String example)
            throws InputException {
        try {
            Measured measured = Units.measured(directive.value());
            Unit unit = measured.unit();
            if (!unit.dimension().equals(dimension)) {
                throw new InputException(new Problem(
                        "wrong-dimension",
                        directive.place(),
                        "\"" + directive.value() + "\", a " + Units.name(unit.dimension()),
                        what + ", for example " + example,
                        "Correct the unit."));
            }
            return measured;
        } catch (UnitException e) {
            throw new InputException(e.at(directive.place()));
        }
    }

    private static double number(Directive directive, String text) throws InputException {
        try {
            return Numerals.parse(text, DecimalSign.POINT).doubleValue();
        } catch (UnitException e) {
            throw new InputException(e.at(directive.place()));
        }
    }

    static InputException wrong(Directive directive, String expected, String remedy) {
        return new InputException(new Problem(
                "wrong-value",
                directive.place(),
                "\"" + directive.key() + ": " + directive.value() + "\"",
                expected,
                remedy));
    }
}
