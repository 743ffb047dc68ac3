package org.saddlebook.console.api;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;
import org.saddlebook.api.campaign.Campaign;
import org.saddlebook.api.campaign.Choices;
import org.saddlebook.api.campaign.ErrorModel;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.model.StandardState;
import org.saddlebook.api.problem.InputException;
import org.saddlebook.api.problem.Place;
import org.saddlebook.api.problem.Problem;
import org.saddlebook.api.reader.ReadingRule;
import org.saddlebook.units.api.UnitException;
import org.saddlebook.units.api.Units;

/**
 * The options that say how to evaluate, the same for every verb that evaluates. What is given takes the place of the same
 * choice in the campaign; what is not given leaves it alone.
 */
public final class EvaluateOptions {
    /** The options, for the synopsis of a verb. */
    public static final String SYNOPSIS = "[--at T]... [--model ID]... [--standard STATE] [--seed N]"
            + " [--errors constant-relative|stated|stated-both|constant-absolute] [--level P] [--interval METHOD]..."
            + " [--read KEY=VALUE]...";

    /** What each means, for the help of a verb; lines of plain text. */
    public static final String HELP = """
            --at T            predict k at this temperature, such as 298.15K, 25degC or 77degF; may be repeated
            --model ID        fit this model only; may be repeated. `saddlebook models` lists what is installed
            --standard STATE  standard state of entropies, such as 1mol/L or 1bar
            --seed N          seed of random numbers, 0 to 9007199254740991
            --errors MODEL    constant-relative: one relative error, estimated from the scatter
                              stated: the uncertainties in the table
                              stated-both: also the uncertainties of the temperatures in the table
                              constant-absolute: one error of k itself, estimated from the scatter
            --level P         coverage probability of intervals, above 0.5 and below 1
            --interval METHOD further intervals beside the usual ones; may be repeated. How often 95 % intervals held the
                              truth, for n points of a straight law with 5 % scatter (20,000 campaigns each):
                              t: the usual ones; 95 % at any n
                              profile: 95 % at any n
                              monte-carlo: 95 % at any n
                              bootstrap-residual: 85 % at n = 5, 90 % at 8, 92 % at 12
                              bootstrap-case: 90 % at n = 5, 91 % at 8 and 12
                              bootstrap-parametric: 86 % at n = 5, 90 % at 8, 92 % at 12
                              every bootstrap is refused below n = 12 unless the table states
                              "# bootstrap of few points: accepted"
            --read KEY=VALUE  settle how a table is read, such as decimal=comma, unit.T=degC or sheet=Rates;
                              may be repeated""";

    private static final List<String> INTERVAL_METHODS =
            List.of("t", "profile", "monte-carlo", "bootstrap-residual", "bootstrap-case", "bootstrap-parametric");

    private static final List<String> VALUED =
            List.of("--at", "--model", "--standard", "--seed", "--errors", "--level", "--interval", "--read");

    private final Options options;
    private final List<Double> targetsKelvin;
    private final List<String> models;
    private final Optional<StandardState> standard;
    private final Optional<Long> seed;
    private final Optional<ErrorModel> errors;
    private final Optional<Double> level;
    private final List<Node> intervals;
    private final ReadingRule readingRule;

    private EvaluateOptions(Options options) throws InputException {
        this.options = options;
        targetsKelvin = new ArrayList<>();
        List<Problem> problems = new ArrayList<>();
        for (String text : options.values("--at")) {
            try {
                targetsKelvin.add(Units.kelvin(text));
            } catch (UnitException e) {
                problems.add(e.at(Place.of("--at")));
            }
        }
        if (!problems.isEmpty()) {
            throw new InputException(problems);
        }
        models = options.values("--model");
        standard = standard(options.value("--standard"));
        seed = seed(options.value("--seed"));
        errors = errors(options.value("--errors"));
        level = level(options.value("--level"));
        intervals = intervals(options.values("--interval"));
        readingRule = readingRule(options.values("--read"));
    }

    /** Options of evaluation alone. */
    public static EvaluateOptions parse(List<String> arguments) throws InputException {
        return parse(arguments, List.of(), List.of());
    }

    /**
     * Options of evaluation together with a verb's own.
     *
     * @param switches the verb's own options without a value, with their dashes
     * @param valued the verb's own options with a value, with their dashes
     * @throws InputException when an option is unknown, lacks its value, or has one that cannot be
     */
    public static EvaluateOptions parse(List<String> arguments, List<String> switches, List<String> valued)
            throws InputException {
        List<String> all = new ArrayList<>(VALUED);
        all.addAll(valued);
        return new EvaluateOptions(Options.parse(arguments, switches, all));
    }

    /** Words and the verb's own options. */
    public Options others() {
        return options;
    }

    /** Ids of the models asked for by name; empty for none. */
    public List<String> models() {
        return models;
    }

    /** How a table is to be read, where the reader is not to find out by itself. */
    public ReadingRule readingRule() {
        return readingRule;
    }

    /** The campaign with what was given put in place. */
    public Campaign foldInto(Campaign campaign) {
        Choices choices = campaign.choices();
        if (!targetsKelvin.isEmpty()) {
            choices = choices.withTargetsKelvin(targetsKelvin);
        }
        if (!models.isEmpty()) {
            choices = choices.withModels(models);
        }
        if (standard.isPresent()) {
            choices = choices.withStandard(standard.get());
        }
        if (seed.isPresent()) {
            choices = choices.withSeed(seed.get());
        }
        if (errors.isPresent()) {
            choices = choices.withErrorModel(errors.get());
        }
        if (level.isPresent()) {
            choices = choices.withLevel(level.get());
        }
        Campaign chosen = choices.equals(campaign.choices()) ? campaign : campaign.withChoices(choices);
        return intervals.isEmpty() ? chosen : withIntervals(chosen);
    }

    private Campaign withIntervals(Campaign campaign) {
        Map<String, Node> members = new LinkedHashMap<>();
        if (campaign.settings().get("barrier") instanceof Node.Group group) {
            members.putAll(group.members());
        }
        members.put("intervals", new Node.Items(intervals));
        return campaign.withSetting("barrier", new Node.Group(members));
    }

    private static List<Node> intervals(List<String> texts) throws InputException {
        List<Node> methods = new ArrayList<>();
        for (String text : texts) {
            if (!INTERVAL_METHODS.contains(text)) {
                throw wrong("--interval", text, "one of " + String.join(", ", INTERVAL_METHODS));
            }
            methods.add(new Node.Text(text));
        }
        return methods;
    }

    private static ReadingRule readingRule(List<String> texts) throws InputException {
        if (texts.isEmpty()) {
            return ReadingRule.AUTOMATIC;
        }
        Map<String, String> rule = new TreeMap<>();
        for (String text : texts) {
            int sign = text.indexOf('=');
            if (sign <= 0 || sign == text.length() - 1) {
                throw wrong("--read", text, "a key and a value, such as decimal=comma");
            }
            rule.put(text.substring(0, sign).strip(), text.substring(sign + 1).strip());
        }
        return new ReadingRule(rule);
    }

    private static Optional<StandardState> standard(Optional<String> text) throws InputException {
        if (text.isEmpty()) {
            return Optional.empty();
        }
        try {
            return Optional.of(Units.standardState(text.get()));
        } catch (UnitException e) {
            throw new InputException(e.at(Place.of("--standard")));
        }
    }

    private static Optional<Long> seed(Optional<String> text) throws InputException {
        if (text.isEmpty()) {
            return Optional.empty();
        }
        try {
            long number = Long.parseLong(text.get());
            if (number >= 0 && number <= Choices.LARGEST_SEED) {
                return Optional.of(number);
            }
        } catch (NumberFormatException e) {
            // refused below, like a number out of range
        }
        throw wrong("--seed", text.get(), "a whole number from 0 to " + Choices.LARGEST_SEED);
    }

    private static Optional<ErrorModel> errors(Optional<String> text) throws InputException {
        if (text.isEmpty()) {
            return Optional.empty();
        }
        List<String> keys = new ArrayList<>();
        for (ErrorModel model : ErrorModel.values()) {
            if (model.key().equals(text.get())) {
                return Optional.of(model);
            }
            keys.add(model.key());
        }
        throw wrong("--errors", text.get(), "one of " + String.join(", ", keys));
    }

    private static Optional<Double> level(Optional<String> text) throws InputException {
        if (text.isEmpty()) {
            return Optional.empty();
        }
        try {
            double number = Double.parseDouble(text.get());
            if (number > 0.5 && number < 1) {
                return Optional.of(number);
            }
        } catch (NumberFormatException e) {
            // refused below, like a number out of range
        }
        throw wrong("--level", text.get(), "a number above 0.5 and below 1, such as 0.95");
    }

    private static InputException wrong(String option, String found, String expected) {
        return Options.wrong(
                "wrong-value", option, "\"" + found + "\"", expected, "Write " + expected + " after " + option + ".");
    }
}
