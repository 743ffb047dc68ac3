package org.saddlebook.testkit.api;

import java.util.Objects;
import org.saddlebook.api.model.RateContext;

/**
 * A case in which a rate model is expected to work: a context, plausible parameters and the temperatures they hold for.
 * The array is copied in and out.
 */
public final class Example {
    private final RateContext context;
    private final double[] parameters;
    private final double lowestKelvin;
    private final double highestKelvin;

    private Example(RateContext context, double[] parameters, double lowestKelvin, double highestKelvin) {
        this.context = Objects.requireNonNull(context, "context");
        this.parameters = parameters.clone();
        if (!(lowestKelvin > 0) || !(highestKelvin > lowestKelvin) || Double.isInfinite(highestKelvin)) {
            throw new IllegalArgumentException(
                    "temperatures must be above 0 K and in order: " + lowestKelvin + ", " + highestKelvin);
        }
        this.lowestKelvin = lowestKelvin;
        this.highestKelvin = highestKelvin;
    }

    /**
     * An example over 250 K to 450 K.
     *
     * @param context what the model is bound to
     * @param parameters in the form handed to the model: SI values, logarithms of them for LOG parameters
     */
    public static Example of(RateContext context, double... parameters) {
        return new Example(context, parameters, 250, 450);
    }

    /** The same between these temperatures, K. */
    public Example between(double lowest, double highest) {
        return new Example(context, parameters, lowest, highest);
    }

    /** What the model is bound to. */
    public RateContext context() {
        return context;
    }

    /** Parameters in the form handed to the model, a copy. */
    public double[] parameters() {
        return parameters.clone();
    }

    /** Nineteen temperatures from the lowest to the highest, K. */
    public double[] kelvins() {
        double[] kelvins = new double[19];
        for (int i = 0; i < kelvins.length; i++) {
            kelvins[i] = lowestKelvin + (highestKelvin - lowestKelvin) * i / (kelvins.length - 1);
        }
        return kelvins;
    }

    @Override
    public String toString() {
        return "order " + context.order() + ", " + context.standard() + ", transmission " + context.transmission()
                + ", reference " + context.referenceKelvin() + " K, held " + context.fixed();
    }
}
