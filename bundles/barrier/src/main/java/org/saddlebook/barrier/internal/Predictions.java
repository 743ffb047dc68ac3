package org.saddlebook.barrier.internal;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.model.Parameter;
import org.saddlebook.api.quantity.Unit;
import org.saddlebook.barrier.api.NewRun;

/**
 * Rows of {@code barrier.predictions}: k at a temperature with the interval of the mean and that of a new run. The
 * interval is that of exp(mean ln k), from the full covariance.
 *
 * @param rateUnit unit k is given in
 * @param lowestKelvin lowest measured temperature, K
 * @param highestKelvin highest measured temperature, K
 * @param level coverage probability
 * @param targetOnSameSensor whether targets are read on the thermometer of the measurements
 */
record Predictions(Unit rateUnit, double lowestKelvin, double highestKelvin, double level, boolean targetOnSameSensor) {
    /**
     * One row.
     *
     * @param lnRate ln k in SI with its variance
     * @param newRun how one more run would scatter
     * @param slope d ln k/dT there, 1/K
     * @param degreesOfFreedom of the scale; empty for normal quantiles
     * @param assumedScatter whether the scatter of a new run is taken over from the stated uncertainties
     */
    Node.Group row(
            double kelvin,
            String model,
            FittedLaw.Estimate lnRate,
            NewRun newRun,
            double slope,
            OptionalDouble degreesOfFreedom,
            boolean assumedScatter) {
        double outside = Math.max(0, Math.max(lowestKelvin - kelvin, kelvin - highestKelvin));
        List<String> cautions = new ArrayList<>();
        if (lnRate.variance().isEmpty()) {
            cautions.add("no-scale-estimate");
        }
        if (outside > 0) {
            cautions.add("extrapolated");
        }
        cautions.add("same-mechanism");
        cautions.add("not-a-hazard-assessment");
        if (kelvin < lowestKelvin) {
            cautions.add("storage-lower-bound");
        }
        Quantities quantities = new Quantities(level, degreesOfFreedom);
        Tree tree = new Tree()
                .put("temperature", Node.Quantity.of(kelvin, "K"))
                .put("model", model)
                .put("k", quantities.of(lnRate, Parameter.Scale.LOG, rateUnit, cautions));
        if (lnRate.variance().isPresent()) {
            List<String> more = new ArrayList<>(cautions);
            if (assumedScatter) {
                more.add("new-run-as-stated");
            }
            OptionalDouble onLogarithm = newRun.onLogarithm(slope);
            if (onLogarithm.isPresent()) {
                double scatter = onLogarithm.getAsDouble();
                FittedLaw.Estimate wider = new FittedLaw.Estimate(
                        lnRate.value(),
                        OptionalDouble.of(lnRate.variance().getAsDouble() + scatter * scatter),
                        lnRate.sharedVariance());
                tree.put("kNewRun", quantities.of(wider, Parameter.Scale.LOG, rateUnit, more));
            } else if (newRun.rate().isPresent()) {
                tree.put("kNewRun", quantities.newRun(lnRate, newRun.rate().getAsDouble(), rateUnit, more));
            }
        }
        return tree.put("extrapolation", Node.Quantity.of(outside, "K")).group();
    }

    Node.Group row(double kelvin, FittedLaw law) {
        return row(
                kelvin,
                law.id(),
                law.lnRate(kelvin, targetOnSameSensor),
                law.newRun(),
                law.slope(kelvin),
                law.degreesOfFreedom(),
                law.data().stated());
    }
}
