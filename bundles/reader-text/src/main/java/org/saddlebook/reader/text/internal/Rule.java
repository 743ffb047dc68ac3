package org.saddlebook.reader.text.internal;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import org.saddlebook.api.problem.Place;
import org.saddlebook.api.reader.ReadingRule;
import org.saddlebook.units.api.DecimalSign;

/**
 * The options of a reading rule that this reader knows. Each settles what would be found out otherwise, or supplies what
 * the file does not say.
 */
final class Rule {
    private static final List<String> KEYS =
            List.of("decimal", "encoding", "separator", "unit.T", "unit.k", "unit.u(T)", "unit.u(k)");
    private static final List<String> ENCODINGS = List.of("utf-8", "utf-16le", "utf-16be", "windows-1252");

    private final ReadingRule rule;
    private final Separator separator;
    private final DecimalSign decimal;

    Rule(ReadingRule rule, Problems problems) {
        this.rule = rule;
        this.separator = separator(problems);
        this.decimal = decimal(problems);
        checkEncoding(problems);
        List<String> keys = new ArrayList<>(rule.options().keySet());
        Collections.sort(keys);
        for (String key : keys) {
            if (!KEYS.contains(key)) {
                add(problems, key, "the option \"" + key + "\"", "one of " + String.join(", ", KEYS));
            }
        }
    }

    /** Prescribed encoding; empty when the reader is to find it. */
    String encoding() {
        return rule.get("encoding").orElse("");
    }

    /** Prescribed separator, or null. */
    Separator separator() {
        return separator;
    }

    /** Prescribed decimal sign, or null. */
    DecimalSign decimal() {
        return decimal;
    }

    /** Unit for a column whose heading has none, or null. */
    String unit(Heading.Kind kind) {
        return rule.get("unit." + kind.key()).orElse(null);
    }

    static Place place(String key) {
        return new Place("reading rule", java.util.OptionalInt.empty(), java.util.Optional.of(key));
    }

    private Separator separator(Problems problems) {
        String value = rule.get("separator").orElse("");
        for (Separator candidate : Separator.values()) {
            if (candidate.key().equals(value)) {
                return candidate;
            }
        }
        if (!value.isEmpty()) {
            add(problems, "separator", "\"" + value + "\"", "tab, semicolon, comma, wide-space or space");
        }
        return null;
    }

    private DecimalSign decimal(Problems problems) {
        String value = rule.get("decimal").orElse("");
        if (!value.isEmpty() && !value.equals("point") && !value.equals("comma")) {
            add(problems, "decimal", "\"" + value + "\"", "point or comma");
        }
        return value.equals("point") ? DecimalSign.POINT : value.equals("comma") ? DecimalSign.COMMA : null;
    }

    private void checkEncoding(Problems problems) {
        String value = encoding();
        if (!value.isEmpty() && !ENCODINGS.contains(value)) {
            add(problems, "encoding", "\"" + value + "\"", "one of " + String.join(", ", ENCODINGS));
        }
    }

    private static void add(Problems problems, String key, String found, String expected) {
        problems.add("reading-rule", place(key), found, expected, "correct the reading rule or leave the option out");
    }
}
