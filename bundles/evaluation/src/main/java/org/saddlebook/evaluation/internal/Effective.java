package org.saddlebook.evaluation.internal;

import java.math.BigDecimal;
import java.math.MathContext;
import java.util.ArrayList;
import java.util.Collection;
import java.util.List;
import java.util.Optional;
import java.util.TreeSet;
import org.saddlebook.api.campaign.Campaign;
import org.saddlebook.api.campaign.Choices;
import org.saddlebook.api.campaign.ErrorModel;
import org.saddlebook.api.campaign.RatePoint;
import org.saddlebook.api.campaign.RateTable;
import org.saddlebook.api.model.RateModel;
import org.saddlebook.api.problem.InputException;
import org.saddlebook.api.problem.Place;
import org.saddlebook.api.problem.Problem;

/** Folds defaults into a campaign, so that nothing is left to decide when findings are computed. */
final class Effective {
    private Effective() {}

    /**
     * The effective campaign.
     *
     * @param installed ids of the installed rate models, all of which are fitted when none is asked for by name
     */
    static Campaign of(Campaign campaign, List<String> installed) throws InputException {
        return of(campaign, installed, installed);
    }

    /**
     * Ids of the models that are fitted when none is asked for by name: those that do not wait for a request and, of laws
     * that depend on a condition, those whose conditions the table states with more than one value. A law that needs what
     * no point states is not worth a refusal that nobody asked for.
     */
    static List<String> unasked(Campaign campaign, Collection<RateModel> installed) {
        List<String> ids = new ArrayList<>();
        for (RateModel model : installed) {
            boolean fits = !model.onRequest();
            for (String condition : model.conditions()) {
                fits &= campaign.rateTable().isPresent()
                        && campaign.rateTable().get().varies(condition);
            }
            if (fits) {
                ids.add(model.id());
            }
        }
        return ids;
    }

    /**
     * The effective campaign.
     *
     * @param installed ids of the installed rate models
     * @param unasked ids of those that are fitted when none is asked for by name
     */
    static Campaign of(Campaign campaign, List<String> installed, List<String> unasked) throws InputException {
        List<Problem> problems = new ArrayList<>();
        Choices choices = campaign.choices();
        TreeSet<String> known = new TreeSet<>(installed);
        for (String asked : choices.models()) {
            if (!known.contains(asked)) {
                problems.add(new Problem(
                        "model-not-installed",
                        Place.of("--model"),
                        asked,
                        known.isEmpty()
                                ? "an installed rate model; none is installed"
                                : "one of " + String.join(", ", known),
                        "Name an installed model, or install the bundle that provides this one; one of ours would be in the"
                                + " feature model-" + asked + "."));
            }
        }
        Choices resolved =
                choices.withModels(List.copyOf(new TreeSet<>(choices.models().isEmpty() ? unasked : choices.models())));
        if (campaign.rateTable().isPresent()) {
            RateTable table = campaign.rateTable().get();
            resolved = resolved.withErrorModel(errorModel(campaign.title(), choices, table, problems));
            if (choices.molecularity().isPresent() && choices.molecularity().getAsDouble() != table.order()) {
                problems.add(new Problem(
                        "molecularity-against-unit",
                        Place.of(campaign.title()),
                        "molecularity " + number(choices.molecularity().getAsDouble()),
                        "order " + number(table.order()) + ", from the unit "
                                + table.rateUnit().code(),
                        "Correct the stated molecularity or the unit of k."));
            }
        }
        if (!problems.isEmpty()) {
            throw new InputException(problems);
        }
        return campaign.withChoices(resolved);
    }

    private static ErrorModel errorModel(String title, Choices choices, RateTable table, List<Problem> problems) {
        List<RatePoint> used = table.used();
        Optional<RatePoint> without =
                used.stream().filter(point -> point.rateUncertainty().isEmpty()).findFirst();
        Optional<RatePoint> untempered = used.stream()
                .filter(point -> point.kelvinUncertainty().isEmpty())
                .findFirst();
        if (choices.errorModel().isEmpty()) {
            return used.isEmpty() || without.isPresent()
                    ? ErrorModel.CONSTANT_RELATIVE
                    : untempered.isPresent() ? ErrorModel.STATED : ErrorModel.STATED_BOTH;
        }
        ErrorModel asked = choices.errorModel().get();
        if (asked.isStated() && without.isPresent()) {
            problems.add(missing(title, without.get(), "u(k)", "a rate constant", asked));
        }
        if (asked == ErrorModel.STATED_BOTH && untempered.isPresent()) {
            problems.add(missing(title, untempered.get(), "u(T)", "a temperature", asked));
        }
        return asked;
    }

    private static Problem missing(String title, RatePoint point, String column, String what, ErrorModel asked) {
        return new Problem(
                "uncertainty-missing",
                new Place(title, point.asRead().line(), Optional.of(column)),
                what + " without a stated uncertainty",
                column + " for every used point, as the error model “" + asked.key() + "” needs",
                "State " + column + " for every row, exclude the row with a reason, or choose the error model "
                        + (asked == ErrorModel.STATED_BOTH && column.equals("u(T)")
                                ? "stated."
                                : "constant-relative."));
    }

    /** Digits that do not depend on the Java version. */
    private static String number(double value) {
        return new BigDecimal(value)
                .round(new MathContext(12))
                .stripTrailingZeros()
                .toPlainString();
    }
}
