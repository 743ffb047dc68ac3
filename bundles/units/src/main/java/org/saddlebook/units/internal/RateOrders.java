package org.saddlebook.units.internal;

import java.util.OptionalDouble;
import org.saddlebook.api.quantity.Dimension;

/** Overall orders of rate constants from their dimension, concentration^(1 - order) per time. */
public final class RateOrders {
    private static final double TOLERANCE = 1e-9;

    private RateOrders() {}

    /** The overall order, at least 0; absent when the dimension is not that of a rate constant. */
    public static OptionalDouble order(Dimension dimension) {
        double order = 1 - dimension.amount();
        if (!(order >= 0)) {
            return OptionalDouble.empty();
        }
        Dimension wanted = Dimension.rateConstant(order);
        return near(dimension.mass(), wanted.mass())
                        && near(dimension.length(), wanted.length())
                        && near(dimension.time(), wanted.time())
                        && near(dimension.temperature(), wanted.temperature())
                ? OptionalDouble.of(order)
                : OptionalDouble.empty();
    }

    /**
     * The same dimension, or exactly {@code Dimension.rateConstant(order)} when it is that up to rounding: 3 times 0.3
     * is not 0.9 in doubles, and the rate table compares dimensions exactly.
     */
    static Dimension snapped(Dimension dimension) {
        OptionalDouble order = order(dimension);
        return order.isPresent() ? Dimension.rateConstant(order.getAsDouble()) : dimension;
    }

    /** Whether the dimension is that of a rate constant stated per pressure instead of per concentration. */
    public static boolean isPerPressure(Dimension dimension) {
        return !(Math.abs(dimension.mass()) < TOLERANCE)
                && near(dimension.amount(), 0)
                && near(dimension.temperature(), 0)
                && near(dimension.length(), -dimension.mass())
                && near(dimension.time(), -1 - 2 * dimension.mass());
    }

    private static boolean near(double one, double other) {
        return Math.abs(one - other) < TOLERANCE;
    }
}
