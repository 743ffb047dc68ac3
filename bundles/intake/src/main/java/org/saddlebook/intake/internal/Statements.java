package org.saddlebook.intake.internal;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.saddlebook.api.campaign.Campaign;
import org.saddlebook.api.problem.InputException;
import org.saddlebook.api.problem.Problem;
import org.saddlebook.api.reader.Imported;
import org.saddlebook.json.api.NearSpelling;

/**
 * What the comment lines of a table say about the campaign. A line {@code key: value} with a key that is not known is
 * free text, unless the key looks like a misspelt one: that is an error, because a decision must not get lost.
 */
final class Statements {
    /** Keys of at most this length are near to many a word: a misspelt one is recognised by its value as well. */
    private static final int SHORT = 7;

    private final Campaign campaign;
    private final List<String> freeText;

    private Statements(Campaign campaign, List<String> freeText) {
        this.campaign = campaign;
        this.freeText = freeText;
    }

    /** The campaign with everything that was stated. */
    Campaign campaign() {
        return campaign;
    }

    /** Sentences that name the lines taken as free text. */
    List<String> freeText() {
        return freeText;
    }

    /**
     * Applies statements.
     *
     * @param before the campaign with its table, if it has one
     * @throws InputException with every statement that cannot be used
     */
    static Statements read(List<Imported.Directive> directives, Campaign before) throws InputException {
        Campaign campaign = before;
        List<String> unknown = new ArrayList<>();
        List<Problem> problems = new ArrayList<>();
        Map<Statement, Imported.Directive> seen = new LinkedHashMap<>();
        for (Imported.Directive directive : directives) {
            Optional<Statement> statement = Statement.of(directive.key());
            if (statement.isEmpty()) {
                Optional<Problem> misspelt = misspelt(directive, campaign);
                if (misspelt.isPresent()) {
                    problems.add(misspelt.get());
                } else {
                    unknown.add("\"" + directive.key() + "\"");
                }
                continue;
            }
            Imported.Directive first = seen.putIfAbsent(statement.get(), directive);
            if (first != null && !statement.get().repeatable()) {
                problems.add(repeated(first, directive));
                continue;
            }
            try {
                campaign = statement.get().apply(campaign, directive);
            } catch (InputException e) {
                problems.addAll(e.problems());
            }
        }
        if (!problems.isEmpty()) {
            throw new InputException(problems);
        }
        return new Statements(
                campaign,
                unknown.isEmpty()
                        ? List.of()
                        : List.of("Comment lines kept as free text: " + String.join(", ", unknown) + "."));
    }

    private static Problem repeated(Imported.Directive first, Imported.Directive second) {
        String line = first.place().line().isPresent()
                ? " in line " + first.place().line().getAsInt()
                : "";
        return new Problem(
                "repeated-statement",
                second.place(),
                "a second \"" + second.key() + "\"",
                "each statement once; the first stands" + line,
                "Remove one of the two lines.");
    }

    private static Optional<Problem> misspelt(Imported.Directive directive, Campaign campaign) {
        if (Statement.isUnrelated(directive.key())) {
            return Optional.empty();
        }
        Optional<String> near = NearSpelling.of(directive.key(), Statement.keysWithConsequences());
        if (near.isEmpty()) {
            return Optional.empty();
        }
        if (near.get().length() <= SHORT) {
            try {
                Statement.of(near.get()).orElseThrow().apply(campaign, directive);
            } catch (InputException e) {
                return Optional.empty();
            }
        }
        return Optional.of(new Problem(
                "misspelt-statement",
                directive.place(),
                "\"" + directive.key() + "\", which is not known",
                "a known statement, such as \"" + Statement.shown(near.get()) + "\"",
                "If you meant \"" + Statement.shown(near.get()) + "\", write it so; if it is a remark, write it without"
                        + " the colon."));
    }
}
