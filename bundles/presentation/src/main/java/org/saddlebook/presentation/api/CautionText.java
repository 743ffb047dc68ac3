package org.saddlebook.presentation.api;

import java.util.Collection;
import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Set;

/**
 * The cautions that several bundles use, id to full text, in one place. A bundle with a caution of its own writes it into
 * its section beside these. To add one here: one line in the list.
 */
public final class CautionText {
    private static final Map<String, String> TEXTS = list();

    private CautionText() {}

    private static Map<String, String> list() {
        Map<String, String> t = new LinkedHashMap<>();
        // What was assumed.
        t.put(
                "assumed-standard-state",
                "No standard state was stated: 1 mol/L is assumed. Entropies and Gibbs energies of activation change with it unless the step is of first order.");
        t.put(
                "assumed-transmission",
                "The transmission coefficient is taken as 1; tunnelling and recrossing, where they matter, are absorbed in the entropy of activation.");
        t.put(
                "assumed-error-model",
                "No uncertainties were stated: the same relative error is assumed for every rate constant and its size is estimated from the scatter.");
        t.put(
                "assumed-order",
                "The order is taken from the unit of the rate constant alone; nothing in the data confirms it.");
        // Predictions.
        t.put(
                "extrapolated",
                "Outside the measured temperatures. The interval holds only if the law holds there too; the data cannot show that.");
        t.put(
                "same-mechanism",
                "Assumes the same mechanism as in the measured range. A hidden path that is less steep makes cold reactions faster, a steeper one makes hot reactions faster than predicted.");
        t.put(
                "not-a-hazard-assessment",
                "Not a hazard assessment. Runaway, gas evolution, accumulation and heat removal at scale need calorimetry and licensed practice; local codes prevail. Where speed is the danger, use the upper bound of the rate.");
        t.put(
                "storage-lower-bound",
                "For storage, shelf life, food, drugs and explosives use the lower bound of the time, the regulatory procedure that applies and confirmation in real time. A hidden path that is less steep makes lifetimes at low temperature too long.");
        t.put(
                "parameters-do-not-transfer",
                "Another catalyst, impurity, solvent or vessel is another reaction: the parameters do not transfer.");
        t.put(
                "new-run-as-stated",
                "A new run is taken to be as uncertain as the table states for its runs on average.");
        // How much the data carry.
        t.put("undetermined", "The data do not determine this number; only the interval has a meaning.");
        t.put("few-temperatures", "Fewer than four temperatures: curvature and a wrong point can hardly be seen.");
        t.put(
                "three-points",
                "Three points leave one degree of freedom: the intervals are very wide, and a single wrong point cannot be recognised.");
        t.put(
                "no-scale-estimate",
                "As many parameters as points: nothing is left to estimate the scatter from, so no uncertainty can be given.");
        t.put("narrow-range", "The temperatures span less than 20 K: slope and intercept are poorly separated.");
        t.put(
                "one-temperature-carries-slope",
                "One temperature carries most of the slope: an error there passes almost undiminished into the barrier.");
        t.put(
                "residual-curvature",
                "The residuals curve along the temperature: the law may not hold over the whole range.");
        t.put(
                "scatter-exceeds-stated",
                "The scatter is larger than the stated uncertainties allow. They were not rescaled: the intervals are too narrow unless the reason is found.");
        t.put(
                "scatter-below-stated",
                "The scatter is smaller than the stated uncertainties let expect: they may be too large, or the points not independent.");
        t.put(
                "thermometer-not-included",
                "A common error of the thermometer is not included; it shifts every point together and does not show in the scatter.");
        t.put(
                "runs-share-blocks",
                "Runs of one block (stock, batch or day) share an error. The intervals of the laws take them as independent; the table of blocks does not.");
        t.put(
                "cannot-be-told-apart",
                "These data cannot tell the laws apart. That is no evidence for the simpler one.");
        t.put("criterion-absent", "Too few points for this criterion.");
        // Plausibility.
        t.put(
                "negative-activation-energy",
                "The rate falls with temperature. Look for a fast equilibrium before the step, deactivation, evaporation or mass transfer before reading a barrier.");
        t.put(
                "low-activation-energy",
                "A barrier this low often means mass transfer or diffusion, not a chemical step.");
        t.put(
                "implausible-prefactor",
                "The pre-exponential factor lies outside what a single step of this order usually shows (common practice, no source). Check units and range.");
        t.put("above-frequency-limit", "A rate constant lies above kB T/h: check its unit.");
        t.put(
                "entropy-not-interpretable",
                "The constant is of pseudo-order or combines several steps: its entropy of activation says nothing about one transition state.");
        t.put(
                "entropy-at-one-molar",
                "For an order of two and more the sign of the entropy of activation depends on the standard concentration; read it at 1 mol/L only.");
        t.put(
                "entropy-and-solvent",
                "Changes of solvation enter the entropy of activation and can outweigh the structure of the transition state.");
        // Thermodynamics.
        t.put(
                "allowed-is-not-fast",
                "Allowed does not mean fast or complete: a negative ΔG says nothing about speed, and a positive one only that products do not prevail.");
        t.put(
                "at-stated-composition",
                "Holds at the stated composition and standard states only; another composition moves ΔG by RT ln Q.");
        t.put(
                "constant-heat-capacity",
                "ΔH and ΔS are taken as independent of temperature; a heat capacity of reaction moves the crossover, the more the farther away it lies.");
        t.put(
                "assumed-independent",
                "No covariance of ΔH and ΔS was stated: they are taken as independent. When both come from one measurement, the interval is usually too wide.");
        t.put("uncertain-sign", "The interval includes zero: the sign is not determined.");
        t.put(
                "crossover-outside-data",
                "The crossover lies outside the temperatures at which ΔH and ΔS are known to hold.");
        return t;
    }

    /**
     * The full text of a standard caution; throws {@link IllegalArgumentException} for an id that is not one.
     *
     * @param id for example {@code extrapolated}
     */
    public static String of(String id) {
        String text = TEXTS.get(id);
        if (text == null) {
            throw new IllegalArgumentException("not a standard caution: " + id);
        }
        return text;
    }

    /** Id to full text, in the order of the ids, each once; throws like {@link #of}. */
    public static Map<String, String> texts(Collection<String> ids) {
        Map<String, String> texts = new LinkedHashMap<>();
        for (String id : ids) {
            texts.put(id, of(id));
        }
        return texts;
    }

    /** Every standard caution's id. */
    public static Set<String> ids() {
        return Collections.unmodifiableSet(TEXTS.keySet());
    }
}
