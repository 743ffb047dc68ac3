package org.saddlebook.barrier.internal;

import java.util.ArrayList;
import java.util.List;
import org.saddlebook.api.campaign.Choices;
import org.saddlebook.api.campaign.ConstantKind;
import org.saddlebook.api.model.RateContext;
import org.saddlebook.api.model.StandardState;
import org.saddlebook.api.quantity.Constants;

/** What should make a reader pause. It warns and never changes a number. */
final class Plausibility {
    /** Usual limits of a unimolecular pre-exponential factor, 1/s (common practice, no source). */
    private static final double LOWEST_PREFACTOR = 1e8;

    private static final double HIGHEST_PREFACTOR = 1e17;

    /** Range below which slope and intercept are poorly separated, K (common practice, no source). */
    private static final double NARROW_RANGE = 20;

    private static final int FEW_TEMPERATURES = 4;

    /** Share of the slope above which one temperature carries it (common practice, no source). */
    private static final double HEAVY_SHARE = 0.6;

    private final RateContext context;
    private final Choices choices;
    private final Measurements data;
    private final SharedErrors shared;

    Plausibility(RateContext context, Choices choices, Measurements data, SharedErrors shared) {
        this.context = context;
        this.choices = choices;
        this.data = data;
        this.shared = shared;
    }

    /** Cautions for the whole table. */
    List<String> table() {
        List<String> cautions = new ArrayList<>();
        if (data.distinctTemperatures() < FEW_TEMPERATURES) {
            cautions.add("few-temperatures");
        }
        if (data.highestKelvin() - data.lowestKelvin() < NARROW_RANGE) {
            cautions.add("narrow-range");
        }
        if (data.heaviestShareOfSlope() > HEAVY_SHARE) {
            cautions.add("one-temperature-carries-slope");
        }
        if (!data.stated()) {
            cautions.add("assumed-error-model");
        }
        if (BlockCheck.named(data)) {
            cautions.add("runs-share-blocks");
        }
        if (!shared.hasThermometer()) {
            cautions.add("thermometer-not-included");
        }
        if (context.order() == 1) {
            double limit = Constants.LN_BOLTZMANN_OVER_PLANCK;
            for (int i = 0; i < data.size(); i++) {
                if (data.lnRate(i) > limit + StrictMath.log(data.kelvin(i))) {
                    cautions.add("above-frequency-limit");
                    break;
                }
            }
        }
        return cautions;
    }

    /** Cautions for a parameter or derived quantity, from its symbol and its value in SI or the logarithm of it. */
    List<String> quantity(String symbol, FittedLaw law, FittedLaw.Estimate estimate) {
        List<String> cautions = new ArrayList<>();
        if (estimate.variance().isEmpty()) {
            cautions.add("no-scale-estimate");
        } else if (!data.stated() && law.fit().degreesOfFreedom() == 1) {
            cautions.add("three-points");
        }
        switch (symbol) {
            case "Ea", "E" -> {
                if (estimate.value() < 0) {
                    cautions.add("negative-activation-energy");
                }
            }
            case "A" -> {
                if (context.order() == 1
                        && (estimate.value() < StrictMath.log(LOWEST_PREFACTOR)
                                || estimate.value() > StrictMath.log(HIGHEST_PREFACTOR))) {
                    cautions.add("implausible-prefactor");
                }
            }
            case "dS" -> {
                standardState(cautions);
                if (!interpretable()) {
                    cautions.add("entropy-not-interpretable");
                } else if (context.order() > 1) {
                    cautions.add("entropy-at-one-molar");
                }
                if (choices.transmission() == 1 && context.transmissionLaw().isEmpty()) {
                    cautions.add("assumed-transmission");
                }
            }
            case "dG" -> standardState(cautions);
            default -> {
                // Quantities of other laws carry the cautions of the table alone.
            }
        }
        return cautions;
    }

    /**
     * What the sign of the entropy of activation may say, as a sentence. A hint is given only for a constant stated to be
     * of an elementary step, for order 2 and above only at 1 mol/L, and only when the interval excludes zero. The reading
     * itself is common practice without a source.
     *
     * @param entropy entropy of activation, J/(mol K), with its variance
     */
    String hint(FittedLaw law, FittedLaw.Estimate entropy, double level) {
        if (!interpretable()) {
            return "No reading of the entropy of activation: the constant is stated to be "
                    + choices.constantKind().key() + ", not of one step.";
        }
        if (choices.constantKind() == ConstantKind.UNSTATED) {
            return "No reading of the entropy of activation: it is not stated that the constant belongs to an elementary"
                    + " step.";
        }
        if (context.order() > 1 && !context.standard().equals(StandardState.ONE_MOLAR)) {
            return "No reading of the entropy of activation: for order 2 and above its sign is read at 1 mol/L only.";
        }
        if (entropy.variance().isEmpty()) {
            return "No reading of the entropy of activation: it has no uncertainty here.";
        }
        double halfWidth = law.quantile(level) * Math.sqrt(entropy.variance().getAsDouble());
        if (!(Math.abs(entropy.value()) > halfWidth)) {
            return "No reading of the entropy of activation: its interval includes zero.";
        }
        String at = context.order() > 1 ? " at 1 mol/L" : "";
        return entropy.value() < 0
                ? "The entropy of activation is negative" + at
                        + ": a hint, no proof, of a transition state more ordered than the reactants, as in association."
                        + " Changes of solvation can do the same."
                : "The entropy of activation is positive" + at
                        + ": a hint, no proof, of a looser transition state than the reactants, as in dissociation."
                        + " Changes of solvation can do the same.";
    }

    private boolean interpretable() {
        return choices.constantKind() != ConstantKind.PSEUDO_ORDER && choices.constantKind() != ConstantKind.LUMPED;
    }

    private void standardState(List<String> cautions) {
        if (choices.standard().isEmpty()) {
            cautions.add("assumed-standard-state");
        }
    }
}
