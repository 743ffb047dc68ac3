package org.saddlebook.tunnelling.internal;

import java.util.Map;
import java.util.concurrent.ConcurrentHashMap;
import org.saddlebook.api.model.Transmission;
import org.saddlebook.api.model.Tunnelling;

/**
 * The coefficient of an Eckart barrier. Values are kept by temperature: a fit asks for those of its points again and again,
 * and each costs an integral. What is kept is what would be computed, so nobody can tell.
 */
final class EckartCoefficient implements Transmission {
    private static final int KEPT = 4096;

    private final Tunnelling stated;
    private final EckartIntegral integral;
    private final Map<Double, EckartIntegral.Value> kept = new ConcurrentHashMap<>();

    EckartCoefficient(Tunnelling stated, EckartIntegral integral) {
        this.stated = stated;
        this.integral = integral;
    }

    @Override
    public Tunnelling stated() {
        return stated;
    }

    @Override
    public boolean defined(double kelvin) {
        return true;
    }

    @Override
    public String limit() {
        return "";
    }

    @Override
    public double lnCoefficient(double kelvin) {
        return at(kelvin).lnCoefficient();
    }

    @Override
    public double slope(double kelvin) {
        return at(kelvin).slope();
    }

    private EckartIntegral.Value at(double kelvin) {
        EckartIntegral.Value value = kept.get(kelvin);
        if (value == null) {
            value = integral.at(kelvin);
            if (kept.size() < KEPT) {
                kept.put(kelvin, value);
            }
        }
        return value;
    }
}
