package org.saddlebook.campaign.json.internal;

import org.saddlebook.api.model.Conditions;
import org.saddlebook.api.problem.InputException;
import org.saddlebook.api.quantity.Dimension;
import org.saddlebook.json.api.JsonCursor;

/** Units of the conditions that are known; those of add-ons are plain numbers in SI. */
final class ConditionUnits {
    private ConditionUnits() {}

    /** The SI unit a known condition is written in; empty for one of an add-on. */
    static String si(String name) {
        return switch (name) {
            case Conditions.THIRD_BODY -> "mol/m3";
            case Conditions.PRESSURE -> "Pa";
            default -> "";
        };
    }

    /** The value of a condition in SI, above zero. */
    static double value(JsonCursor at, String name) throws InputException {
        double value;
        if (si(name).isEmpty()) {
            value = at.number();
        } else {
            boolean pressure = name.equals(Conditions.PRESSURE);
            Amounts.Amount amount = Amounts.any(
                    at,
                    pressure
                            ? "{\"value\": 1, \"unit\": \"bar\"}"
                            : "{\"value\": 2.4e19, \"unit\": \"molecule cm-3\"}");
            Dimension dimension = pressure ? Dimension.PRESSURE : Dimension.CONCENTRATION;
            if (!amount.unit().dimension().equals(dimension)) {
                throw at.problem(
                        "wrong-dimension",
                        "the unit " + amount.unit().code(),
                        pressure ? "a pressure" : "a concentration",
                        "Correct the unit.");
            }
            value = amount.si();
        }
        if (!(value > 0) || Double.isInfinite(value)) {
            throw at.problem(
                    "not-positive", "a " + name + " that is not above zero", "a value above zero", "Correct it.");
        }
        return value;
    }
}
