package org.saddlebook.campaign.json.internal;

import org.saddlebook.api.problem.InputException;
import org.saddlebook.json.api.JsonArray;
import org.saddlebook.json.api.JsonCursor;
import org.saddlebook.json.api.JsonNumber;
import org.saddlebook.json.api.JsonString;
import org.saddlebook.json.api.JsonValue;

/**
 * Numbers of quantities. JSON has no infinity; one that a computation ran into is written as the string
 * {@code "Infinity"} or {@code "-Infinity"}, so that one such number does not take all findings with it.
 */
final class Numbers {
    private static final String INFINITY = "Infinity";
    private static final String MINUS_INFINITY = "-Infinity";

    private Numbers() {}

    static JsonValue write(double value) {
        if (Double.isInfinite(value)) {
            return new JsonString(value > 0 ? INFINITY : MINUS_INFINITY);
        }
        return new JsonNumber(value);
    }

    static double read(JsonCursor at) throws InputException {
        if (at.value() instanceof JsonString text) {
            if (text.value().equals(INFINITY)) {
                return Double.POSITIVE_INFINITY;
            }
            if (text.value().equals(MINUS_INFINITY)) {
                return Double.NEGATIVE_INFINITY;
            }
        }
        return at.number();
    }

    static double[] array(JsonCursor at) throws InputException {
        if (!(at.value() instanceof JsonArray array)) {
            throw at.wrongType("an array of numbers");
        }
        double[] numbers = new double[array.items().size()];
        for (int i = 0; i < numbers.length; i++) {
            if (!(array.items().get(i) instanceof JsonNumber number)) {
                throw at.items().get(i).wrongType("a number");
            }
            numbers[i] = number.value();
        }
        return numbers;
    }
}
