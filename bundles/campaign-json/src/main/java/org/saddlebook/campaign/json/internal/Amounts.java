package org.saddlebook.campaign.json.internal;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.saddlebook.api.model.StandardState;
import org.saddlebook.api.problem.InputException;
import org.saddlebook.api.quantity.Dimension;
import org.saddlebook.api.quantity.Unit;
import org.saddlebook.json.api.JsonCursor;
import org.saddlebook.json.api.JsonNumber;
import org.saddlebook.json.api.JsonString;
import org.saddlebook.units.api.Converter;
import org.saddlebook.units.api.Measured;
import org.saddlebook.units.api.Numerals;
import org.saddlebook.units.api.UnitException;
import org.saddlebook.units.api.Units;

/**
 * Values with units as a person may write them in a campaign: {@code {"value": 25, "unit": "degC"}}, the string
 * {@code "25degC"}, or a plain number where the file says which unit plain numbers have. Never a number without a unit.
 */
final class Amounts {
    private static final List<String> KEYS = List.of("value", "unit", "standardUncertainty");

    private Amounts() {}

    /**
     * A value in SI.
     *
     * @param si the value; finite
     * @param uncertainty standard uncertainty, positive; absent when not stated
     * @param unit the unit it was stated in
     */
    record Amount(double si, OptionalDouble uncertainty, Unit unit) {}

    /** What a unit must be one of. */
    enum Kind {
        /** A temperature: {@code C} is degrees Celsius. */
        TEMPERATURE,
        /** A rate constant. */
        RATE,
        /** Anything. */
        ANY
    }

    static Unit unit(JsonCursor at, Kind kind) throws InputException {
        String text = at.text();
        try {
            return switch (kind) {
                case TEMPERATURE -> Units.temperature(text);
                case RATE -> Units.rateConstant(text);
                case ANY -> Units.parse(text);
            };
        } catch (UnitException e) {
            throw new InputException(e.at(at.place()));
        }
    }

    /** A temperature above 0 K. */
    static Amount temperature(JsonCursor at, Optional<Unit> plain) throws InputException {
        Amount amount;
        if (at.value() instanceof JsonString text) {
            try {
                amount = new Amount(Units.kelvin(text.value()), OptionalDouble.empty(), Unit.KELVIN);
            } catch (UnitException e) {
                throw new InputException(e.at(at.place()));
            }
        } else {
            amount = amount(at, plain, Kind.TEMPERATURE, "{\"value\": 25, \"unit\": \"degC\"}");
        }
        if (!(amount.si() > 0)) {
            throw at.problem(
                    "below-absolute-zero", described(at), "a temperature above 0 K", "Check the number and its unit.");
        }
        return amount;
    }

    /** A rate constant above zero. */
    static Amount rate(JsonCursor at, Optional<Unit> plain) throws InputException {
        Amount amount;
        if (at.value() instanceof JsonString text) {
            amount = measured(at, text.value());
        } else {
            amount = amount(at, plain, Kind.RATE, "{\"value\": 0.012, \"unit\": \"1/s\"}");
        }
        if (!(amount.si() > 0)) {
            throw at.problem(
                    "not-positive",
                    described(at),
                    "a rate constant above zero",
                    "Correct it, or give the point an \"excluded\" reason and a value above zero, or leave it out.");
        }
        return amount;
    }

    /** A value of any dimension, with its unit. */
    static Amount any(JsonCursor at, String example) throws InputException {
        return amount(at, Optional.empty(), Kind.ANY, example);
    }

    /** A standard state: {@code "1 bar"} or {@code {"value": 1, "unit": "bar"}}. */
    static StandardState standardState(JsonCursor at) throws InputException {
        String expected = "a standard concentration or pressure, for example \"1 mol/L\" or \"1 bar\"";
        if (at.value() instanceof JsonString text) {
            try {
                return Units.standardState(text.value());
            } catch (UnitException e) {
                throw new InputException(e.at(at.place()));
            }
        }
        Amount amount = amount(at, Optional.empty(), Kind.ANY, "\"1 mol/L\"");
        Dimension dimension = amount.unit().dimension();
        boolean pressure = dimension.equals(Dimension.PRESSURE);
        if (!(pressure || dimension.equals(Dimension.CONCENTRATION)) || !(amount.si() > 0)) {
            throw at.problem("wrong-value", described(at), expected, "State a concentration or a pressure above zero.");
        }
        return new StandardState(
                pressure ? StandardState.Kind.PRESSURE : StandardState.Kind.CONCENTRATION, amount.si());
    }

    /** An uncertainty in SI: of the difference, so that the offset of a temperature unit plays no part. */
    static double uncertainty(JsonCursor at, Optional<Unit> plain) throws InputException {
        if (plain.isEmpty()) {
            throw withoutUnit(at, "{\"value\": ..., \"unit\": ..., \"standardUncertainty\": ...}");
        }
        double u = at.number();
        double si = isSi(plain.get()) ? u : Converter.of(plain.get()).differenceToSi(Numerals.shortest(u));
        if (!(si > 0) || Double.isInfinite(si)) {
            throw at.wrongValue("a standard uncertainty above zero; leave the key out when it is not known");
        }
        return si;
    }

    private static Amount measured(JsonCursor at, String text) throws InputException {
        try {
            Measured measured = Units.measured(text);
            if (Units.rateOrder(measured.unit()).isEmpty()) {
                throw at.problem("wrong-dimension", at.quoted(), "a rate constant", "Check the unit.");
            }
            return new Amount(
                    Converter.of(measured.unit()).toSi(Numerals.shortest(measured.value())),
                    measured.uncertaintySi(),
                    measured.unit());
        } catch (UnitException e) {
            throw new InputException(e.at(at.place()));
        }
    }

    private static Amount amount(JsonCursor at, Optional<Unit> plain, Kind kind, String example) throws InputException {
        if (at.value() instanceof JsonNumber number) {
            if (plain.isEmpty()) {
                throw withoutUnit(at, example);
            }
            return new Amount(toSi(at, plain.get(), number.value()), OptionalDouble.empty(), plain.get());
        }
        if (!at.isObject()) {
            throw at.wrongType("a value with its unit, for example " + example);
        }
        at.onlyKeys(KEYS);
        Unit unit = unit(at.member("unit"), kind);
        double si = toSi(at, unit, at.member("value").number());
        Optional<JsonCursor> u = at.optional("standardUncertainty");
        return new Amount(
                si,
                u.isPresent() ? OptionalDouble.of(uncertainty(u.get(), Optional.of(unit))) : OptionalDouble.empty(),
                unit);
    }

    private static double toSi(JsonCursor at, Unit unit, double value) throws InputException {
        double si = isSi(unit) ? value : Converter.of(unit).toSi(Numerals.shortest(value));
        if (!Double.isFinite(si)) {
            throw at.problem(
                    "not-finite", described(at), "a finite number in SI units", "Check the number and its unit.");
        }
        return si;
    }

    private static boolean isSi(Unit unit) {
        return unit.factor() == 1 && unit.offset() == 0;
    }

    private static InputException withoutUnit(JsonCursor at, String example) {
        return at.problem(
                "missing-unit",
                at.quoted() + ", a number without a unit",
                "a value with its unit, for example " + example,
                "Write the unit with the number, or say under \"rateTable.units\" which units plain numbers have.");
    }

    /** The value here for a message, also where it stands in an object. */
    private static String described(JsonCursor at) throws InputException {
        if (!at.isObject()) {
            return at.quoted();
        }
        return at.member("value").quoted() + " " + at.member("unit").text();
    }
}
