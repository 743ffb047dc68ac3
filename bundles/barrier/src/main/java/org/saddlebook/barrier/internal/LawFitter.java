package org.saddlebook.barrier.internal;

import java.util.ArrayList;
import java.util.List;
import org.saddlebook.api.model.Inapplicable;
import org.saddlebook.api.model.Parameter;
import org.saddlebook.api.model.RateContext;
import org.saddlebook.api.model.RateFunction;
import org.saddlebook.api.model.RateModel;
import org.saddlebook.estimation.api.Fit;
import org.saddlebook.estimation.api.LinearLeastSquares;

/** Fits one rate model to measurements and checks that the model keeps its promises. */
final class LawFitter {
    private LawFitter() {}

    /**
     * Fits a model.
     *
     * @param check called now and then; throws when the user cancels
     */
    static LawOutcome fit(RateModel model, RateContext context, Measurements data, Runnable check) {
        LawOutcome outcome = ordinary(model, context, data, check);
        // Orthogonal regression knows one abscissa: with more conditions the temperatures' errors stay in the weights.
        return data.uncertainTemperatures() && model.conditions().isEmpty() && outcome instanceof FittedLaw fitted
                ? BothErrorsFitter.fit(fitted, check)
                : outcome;
    }

    private static LawOutcome ordinary(RateModel model, RateContext context, Measurements data, Runnable check) {
        String id = model.id();
        String title = model.description().title();
        RateFunction law;
        try {
            law = model.bind(context);
        } catch (Inapplicable inapplicable) {
            return new LawOutcome.NotFitted(id, title, LawOutcome.Kind.REFUSED, inapplicable.getMessage());
        }
        int p = law.parameters().size();
        boolean conditions = !model.conditions().isEmpty();
        int distinct = conditions ? data.distinctPoints() : data.distinctTemperatures();
        if (distinct < p) {
            return new LawOutcome.NotFitted(
                    id,
                    title,
                    LawOutcome.Kind.UNDETERMINED,
                    "The law has " + p + " parameters (" + symbols(law.parameters()) + ") and needs as many different"
                            + (conditions ? " points; the table has " : " temperatures; the table has ") + distinct
                            + ".");
        }
        if (law.linear() && data.response() == Measurements.Response.LN_RATE) {
            return linear(id, title, law, data);
        }
        List<double[]> starts;
        if (law.linear()) {
            // The straight fit of ln k is where the search on k itself begins.
            LawOutcome straight = linear(id, title, law, data);
            if (!(straight instanceof FittedLaw fitted)) {
                return straight;
            }
            starts = List.of(fitted.fit().parameters());
        } else {
            starts = law.starts(data.kelvin(), data.conditions(), data.lnRate());
        }
        return NonlinearFitter.fit(id, title, law, data, starts, check);
    }

    /** The law with the shifts that common errors cause, by fits to displaced measurements. */
    static FittedLaw withShared(
            FittedLaw law, RateModel model, RateContext context, List<SharedErrors.Cause> causes, Runnable check) {
        List<SharedShift> shifts = new ArrayList<>();
        for (SharedErrors.Cause cause : causes) {
            LawOutcome above = fit(model, context, law.data().displaced(cause, 1), check);
            LawOutcome below = fit(model, context, law.data().displaced(cause, -1), check);
            if (!(above instanceof FittedLaw high) || !(below instanceof FittedLaw low)) {
                throw new IllegalStateException("no fit to measurements displaced by the " + cause.title());
            }
            shifts.add(SharedShift.of(high, low, cause));
        }
        return law.withShared(shifts);
    }

    private static LawOutcome linear(String id, String title, RateFunction law, Measurements data) {
        int n = data.size();
        int p = law.parameters().size();
        double[][] design = new double[n][p];
        double[] response = new double[n];
        double[] zero = new double[p];
        for (int i = 0; i < n; i++) {
            double offset = data.lnRate(law, i, zero.clone(), design[i]);
            String broken = notFinite(law, data.kelvin(i), offset, design[i]);
            if (!broken.isEmpty()) {
                return new LawOutcome.NotFitted(id, title, LawOutcome.Kind.FAILED, broken);
            }
            response[i] = data.lnRate(i) - offset;
        }
        return LinearLeastSquares.fit(design, response, data.weightsOnLogarithm())
                .fold(
                        fit -> {
                            for (int i = 0; i < n; i++) {
                                String bent = GradientCheck.straight(law, data, i, fit.parameters(), design[i]);
                                if (!bent.isEmpty()) {
                                    return new LawOutcome.NotFitted(id, title, LawOutcome.Kind.FAILED, bent);
                                }
                            }
                            return checked(id, title, law, data, fit);
                        },
                        deficient ->
                                new LawOutcome.NotFitted(id, title, LawOutcome.Kind.UNDETERMINED, deficient.reason()));
    }

    /** The fitted law, or a failure when value and gradient contradict each other at the estimate. */
    static LawOutcome checked(String id, String title, RateFunction law, Measurements data, Fit fit) {
        double[] p = fit.parameters();
        for (int i = 0; i < data.size(); i++) {
            String broken = GradientCheck.at(law, data, i, p);
            if (!broken.isEmpty()) {
                return new LawOutcome.NotFitted(id, title, LawOutcome.Kind.FAILED, broken);
            }
        }
        return new FittedLaw(id, title, law, fit, data, List.of());
    }

    static String notFinite(RateFunction law, double kelvin, double value, double[] gradient) {
        String at = " at " + Words.kelvin(kelvin);
        if (!Double.isFinite(value)) {
            return "The law returned no finite ln k" + at + ".";
        }
        for (int j = 0; j < gradient.length; j++) {
            if (!Double.isFinite(gradient[j])) {
                return "The law returned no finite derivative with respect to "
                        + law.parameters().get(j).symbol() + at + ".";
            }
        }
        return "";
    }

    private static String symbols(List<Parameter> parameters) {
        StringBuilder text = new StringBuilder();
        for (Parameter parameter : parameters) {
            text.append(text.isEmpty() ? "" : ", ").append(parameter.symbol());
        }
        return text.toString();
    }
}
