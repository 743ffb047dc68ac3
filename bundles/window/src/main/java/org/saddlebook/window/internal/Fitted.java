package org.saddlebook.window.internal;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;
import java.util.function.Supplier;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.findings.Section;
import org.saddlebook.api.model.RateFunction;
import org.saddlebook.api.model.TunnellingModel;
import org.saddlebook.api.quantity.Unit;
import org.saddlebook.api.task.Cancelled;
import org.saddlebook.api.task.Contained;
import org.saddlebook.api.task.Task;
import org.saddlebook.barrier.api.FittedLaws;
import org.saddlebook.presentation.api.Rounding;

/**
 * The laws of the section barrier that remain, bound and weighted.
 *
 * @param laws at least one; the preferred one first
 * @param weights as many, summing to 1
 * @param rateUnit unit of the rate constants
 * @param lowest coldest measured temperature, K
 * @param highest hottest measured temperature, K
 * @param notes what was left out, and why
 */
@SuppressWarnings("ArrayRecordComponent") // compared by nobody; handed over inside this package only
record Fitted(List<BoundLaw> laws, double[] weights, Unit rateUnit, double lowest, double highest, List<String> notes) {
    /**
     * Reads and binds.
     *
     * @throws Refusal when no law has a covariance or none can be bound
     */
    static Fitted of(
            Section barrier,
            Map<String, InstalledModel> installed,
            Supplier<List<TunnellingModel>> corrections,
            Task task)
            throws Refusal, Cancelled {
        if (barrier.outcome() != Section.Outcome.DONE) {
            throw new Refusal("The section barrier has no findings, and window needs its fitted laws.");
        }
        FittedLaws fitted;
        try {
            fitted = FittedLaws.of(barrier, corrections);
        } catch (IllegalArgumentException unreadable) {
            throw new Refusal("The section barrier cannot be read: " + unreadable.getMessage() + ".");
        }
        List<String> notes = new ArrayList<>();
        List<BoundLaw> laws = new ArrayList<>();
        for (FittedLaws.FittedLawView view : wanted(fitted)) {
            InstalledModel model = installed.get(view.id());
            if (model == null) {
                notes.add(view.title() + " is left out: its model is not installed.");
                continue;
            }
            if (fitted.conditionsAssumed() && !model.model().conditions().isEmpty()) {
                notes.add(view.title()
                        + " is left out: it depends on the third body, and none is stated for the window.");
                continue;
            }
            Contained<BoundLaw> bound = task.contain(model.culprit(), () -> {
                RateFunction function = model.model().bind(view.fitted().context());
                BoundLaw law = new BoundLaw(view, function, fitted.targetOnSameSensor());
                double lnRate = law.at(fitted.centreKelvin()).lnRate();
                if (!Double.isFinite(lnRate)) {
                    throw new IllegalStateException("ln k is not a finite number within the measured temperatures");
                }
                return law;
            });
            if (bound instanceof Contained.Answer<BoundLaw> answer) {
                laws.add(answer.value());
            } else if (bound instanceof Contained.Broke<BoundLaw> broke) {
                notes.add(view.title() + " is left out: " + broke.reason() + ".");
            }
        }
        if (laws.isEmpty()) {
            throw new Refusal("No fitted law has a covariance that window could use: measure at more temperatures"
                    + " or state uncertainties."
                    + (notes.isEmpty() ? "" : " " + String.join(" ", notes)));
        }
        double[] weights = weights(barrier, laws, notes);
        return new Fitted(
                List.copyOf(laws),
                weights,
                fitted.context().rateUnit(),
                fitted.lowestKelvin(),
                fitted.highestKelvin(),
                List.copyOf(notes));
    }

    /** The candidates that have a covariance, the preferred law first; the preferred alone when none is a candidate. */
    private static List<FittedLaws.FittedLawView> wanted(FittedLaws fitted) {
        List<FittedLaws.FittedLawView> wanted = new ArrayList<>();
        fitted.preferred().ifPresent(wanted::add);
        for (FittedLaws.FittedLawView view : fitted.laws()) {
            boolean known = !wanted.isEmpty() && view.id().equals(wanted.get(0).id());
            if (!known && view.fitted().hasCovariance() && fitted.candidates().contains(view.id())) {
                wanted.add(view);
            }
        }
        return wanted;
    }

    /** Akaike weights among the laws that remain (Burnham and Anderson 2002); equal ones where one of them has none. */
    private static double[] weights(Section barrier, List<BoundLaw> laws, List<String> notes) {
        double[] weights = new double[laws.size()];
        double sum = 0;
        boolean complete = true;
        for (int i = 0; i < weights.length; i++) {
            OptionalDouble weight = weight(barrier, laws.get(i).id());
            complete &= weight.isPresent();
            weights[i] = weight.orElse(0);
            sum += weights[i];
        }
        complete &= sum > 0;
        for (int i = 0; i < weights.length; i++) {
            weights[i] = complete ? weights[i] / sum : 1.0 / weights.length;
        }
        if (laws.size() > 1) {
            StringBuilder text = new StringBuilder("The draws are spread over the laws that cannot be told apart, ");
            text.append(complete ? "by Akaike weight: " : "equally, because not every one has an Akaike weight: ");
            for (int i = 0; i < weights.length; i++) {
                text.append(i == 0 ? "" : ", ")
                        .append(laws.get(i).title())
                        .append(' ')
                        .append(Rounding.decimals(weights[i], 2));
            }
            notes.add(text.append('.').toString());
        }
        return weights;
    }

    private static OptionalDouble weight(Section barrier, String id) {
        if (barrier.body() instanceof Node.Group body
                && body.get("comparison").orElse(null) instanceof Node.Group comparison
                && comparison.get("akaikeWeights").orElse(null) instanceof Node.Group weights
                && weights.get(id).orElse(null) instanceof Node.Scalar weight) {
            return OptionalDouble.of(weight.value());
        }
        return OptionalDouble.empty();
    }
}
