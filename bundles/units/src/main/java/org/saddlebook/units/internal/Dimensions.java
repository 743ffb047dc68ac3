package org.saddlebook.units.internal;

import java.util.OptionalDouble;
import org.saddlebook.api.quantity.Dimension;
import org.saddlebook.units.api.Numerals;

/** Dimensions in words, for messages and lists. */
public final class Dimensions {
    private static final String[] BASE = {"kg", "m", "s", "K", "mol"};

    private Dimensions() {}

    /** What a unit of this dimension measures, for example "molar energy"; else a product of SI base units. */
    public static String name(Dimension dimension) {
        if (dimension.equals(Dimension.NONE)) {
            return "pure number";
        }
        if (dimension.equals(Dimension.TEMPERATURE)) {
            return "temperature";
        }
        if (dimension.equals(Dimension.MOLAR_ENERGY)) {
            return "molar energy";
        }
        if (dimension.equals(Dimension.MOLAR_ENTROPY)) {
            return "molar entropy or heat capacity";
        }
        if (dimension.equals(Dimension.CONCENTRATION)) {
            return "concentration";
        }
        if (dimension.equals(Dimension.PRESSURE)) {
            return "pressure";
        }
        if (dimension.equals(new Dimension(1, 2, -2, 0, 0))) {
            return "energy";
        }
        if (dimension.equals(new Dimension(0, 0, 1, 0, 0))) {
            return "time";
        }
        if (dimension.equals(new Dimension(0, 1, 0, 0, 0))) {
            return "length";
        }
        if (dimension.equals(new Dimension(0, 3, 0, 0, 0))) {
            return "volume";
        }
        if (dimension.equals(new Dimension(1, 0, 0, 0, 0))) {
            return "mass";
        }
        if (dimension.equals(new Dimension(0, 0, 0, 0, 1))) {
            return "amount of substance";
        }
        OptionalDouble order = RateOrders.order(dimension);
        if (order.isPresent()) {
            return "rate constant of order "
                    + Numerals.shortest(order.getAsDouble()).toPlainString();
        }
        if (RateOrders.isPerPressure(dimension)) {
            return "rate constant per pressure";
        }
        return base(dimension);
    }

    private static String base(Dimension dimension) {
        double[] exponents = {
            dimension.mass(), dimension.length(), dimension.time(), dimension.temperature(), dimension.amount()
        };
        StringBuilder text = new StringBuilder();
        for (int i = 0; i < exponents.length; i++) {
            if (exponents[i] != 0) {
                text.append(text.length() == 0 ? "" : " ").append(BASE[i]);
                if (exponents[i] != 1) {
                    text.append('^').append(Numerals.shortest(exponents[i]).toPlainString());
                }
            }
        }
        return text.toString();
    }
}
