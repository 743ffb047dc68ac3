package org.saddlebook.units.internal;

import java.util.ArrayList;
import java.util.List;
import org.saddlebook.api.quantity.Dimension;
import org.saddlebook.api.quantity.Unit;
import org.saddlebook.units.api.ListedUnit;
import org.saddlebook.units.api.UnitException;

/** Unit texts to units, with the checks of dimension. */
public final class UnitReading {
    private UnitReading() {}

    /** Any unit. */
    public static Unit unit(String text) throws UnitException {
        Term term = UnitParser.parse(text);
        try {
            return term.unit();
        } catch (ArithmeticException e) {
            throw new UnitException(
                    "unit-syntax",
                    "\"" + text + "\", a size beyond any unit in use",
                    "a unit such as \"L/(mol.s)\"",
                    "check the exponents");
        }
    }

    /** A unit of one dimension. */
    public static Unit unit(String text, Dimension dimension, String example) throws UnitException {
        Unit unit = unit(text);
        if (!unit.dimension().equals(dimension)) {
            throw new UnitException(
                    "wrong-dimension",
                    "\"" + text + "\", a unit of " + Dimensions.name(unit.dimension()),
                    "a unit of " + Dimensions.name(dimension),
                    "state it in " + example);
        }
        return unit;
    }

    /** A unit of temperature, where {@code C} and {@code F} can be nothing but degrees. */
    public static Unit temperature(String text) throws UnitException {
        String plain = UnitText.plain(text);
        String named = plain.equals("C") || plain.equals("F") ? "deg" + plain : text;
        return unit(named, Dimension.TEMPERATURE, "K, °C or °F");
    }

    /** A unit of a rate constant of any order. */
    public static Unit rateConstant(String text) throws UnitException {
        Unit unit = unit(text);
        if (RateOrders.order(unit.dimension()).isPresent()) {
            return unit;
        }
        if (RateOrders.isPerPressure(unit.dimension())) {
            throw new UnitException(
                    "pressure-rate-constant",
                    "\"" + text + "\", a rate constant per pressure",
                    "a rate constant per concentration, for example \"L/(mol.s)\" or \"cm3/({molecule}.s)\"",
                    "multiply each value by (R T)^(order - 1) at its own temperature and state the result in"
                            + " concentration units");
        }
        throw new UnitException(
                "wrong-dimension",
                "\"" + text + "\", a unit of " + Dimensions.name(unit.dimension()),
                "a unit of a rate constant: 1/s, L/(mol.s), L2/(mol2.s), mol/(L.s)",
                "state the rate constant per time, with mol or {molecule} for each concentration it is divided by");
    }

    /** Every symbol that is understood. */
    public static List<ListedUnit> list() {
        List<ListedUnit> list = new ArrayList<>();
        for (Entry entry : Symbols.TABLE) {
            Unit unit = Term.of(entry.symbol(), Exponent.ONE).unit();
            list.add(new ListedUnit(
                    unit, entry.name(), Dimensions.name(unit.dimension()), entry.spellings(), entry.prefixes()));
            if (unit.code().equals("mol")) {
                // Not a symbol of its own: it is read as mol/L.
                list.add(new ListedUnit(
                        Term.of(entry.symbol(), Exponent.ONE)
                                .times(Symbols.LITRE, new Exponent(-1, 1))
                                .unit(),
                        "mole per litre",
                        Dimensions.name(Dimension.CONCENTRATION),
                        List.of("M", "mM", "µM", "nM", "pM", "fM", "molar"),
                        false));
            }
        }
        return list;
    }
}
