package org.saddlebook.reader.text.internal;

import java.util.List;
import java.util.Locale;
import org.saddlebook.reader.text.internal.Heading.Kind;

/**
 * Reads headings: a name, then a unit as {@code (unit)}, {@code [unit]}, {@code / unit}, {@code _unit}, {@code , unit},
 * {@code in unit} or {@code  unit}. Upper and lower case are alike in names, except {@code U(...)}, which is an expanded
 * uncertainty (JCGM 100:2008, 6.2.1), and in units they differ.
 */
final class HeadingParser {
    /** A name and its kind; longer names stand before those they begin with. */
    private record Name(String text, Kind kind) {}

    private static final Name[] NAMES = {
        new Name("u_rel(k)", Kind.RELATIVE_RATE_UNCERTAINTY),
        new Name("urel(k)", Kind.RELATIVE_RATE_UNCERTAINTY),
        new Name("u_r(k)", Kind.RELATIVE_RATE_UNCERTAINTY),
        new Name("ur(k)", Kind.RELATIVE_RATE_UNCERTAINTY),
        new Name("u(k)/k", Kind.RELATIVE_RATE_UNCERTAINTY),
        new Name("u(k) / k", Kind.RELATIVE_RATE_UNCERTAINTY),
        new Name("u(kobs)", Kind.RATE_UNCERTAINTY),
        new Name("u(k_obs)", Kind.RATE_UNCERTAINTY),
        new Name("u(k1)", Kind.RATE_UNCERTAINTY),
        new Name("u(k2)", Kind.RATE_UNCERTAINTY),
        new Name("u(k)", Kind.RATE_UNCERTAINTY),
        new Name("u_k", Kind.RATE_UNCERTAINTY),
        new Name("u(t)", Kind.TEMPERATURE_UNCERTAINTY),
        new Name("u(θ)", Kind.TEMPERATURE_UNCERTAINTY),
        new Name("u(ϑ)", Kind.TEMPERATURE_UNCERTAINTY),
        new Name("u_t", Kind.TEMPERATURE_UNCERTAINTY),
        new Name("temperature", Kind.TEMPERATURE),
        new Name("temp.", Kind.TEMPERATURE),
        new Name("temp", Kind.TEMPERATURE),
        new Name("t", Kind.TEMPERATURE),
        new Name("θ", Kind.TEMPERATURE),
        new Name("ϑ", Kind.TEMPERATURE),
        new Name("rate constant", Kind.RATE),
        new Name("rate_constant", Kind.RATE),
        new Name("rate coefficient", Kind.RATE),
        new Name("rate_coefficient", Kind.RATE),
        new Name("k(obs)", Kind.RATE),
        new Name("k_obs", Kind.RATE),
        new Name("k obs", Kind.RATE),
        new Name("kobs", Kind.RATE),
        new Name("k(t)", Kind.RATE),
        new Name("k1", Kind.RATE),
        new Name("k2", Kind.RATE),
        new Name("k", Kind.RATE),
        new Name("[m]", Kind.THIRD_BODY),
        new Name("third-body concentration", Kind.THIRD_BODY),
        new Name("third body concentration", Kind.THIRD_BODY),
        new Name("third-body", Kind.THIRD_BODY),
        new Name("third body", Kind.THIRD_BODY),
        new Name("total pressure", Kind.PRESSURE),
        new Name("pressure", Kind.PRESSURE),
        new Name("p", Kind.PRESSURE),
        new Name("label", Kind.LABEL),
        new Name("run", Kind.LABEL),
        new Name("block", Kind.BLOCK),
        new Name("batch", Kind.BLOCK),
        new Name("stock", Kind.BLOCK),
        new Name("day", Kind.BLOCK),
        new Name("excluded", Kind.EXCLUDED),
    };

    private static final String[] LOGARITHMS = {"ln", "log10", "log_10", "log", "lg"};
    private static final String[] RECIPROCALS = {
        "1/t", "1000/t", "10^3/t", "10³/t", "1e3/t", "reciprocaltemp", "inversetemp", "t^-1", "t⁻¹"
    };
    /** Words and their beginnings that speak of an uncertainty without saying which. */
    private static final List<String> UNCLEAR_WORDS =
            List.of("u", "uk", "ut", "s", "sk", "sd", "se", "std", "err", "kerr", "unc", "ci", "dk", "σ", "δ", "δk");

    private static final String[] UNCLEAR_BEGINNINGS = {
        "uncert", "error", "deviat", "stdev", "stddev", "stderr", "sigma", "confid"
    };

    private static final Heading UNCLEAR = new Heading(Kind.UNCLEAR_UNCERTAINTY, null, true);

    private HeadingParser() {}

    static Heading parse(String heading) {
        String text = TextDocument.collapse(heading).replace('µ', 'μ');
        String lower = text.toLowerCase(Locale.ROOT);
        Heading transformed = transformed(text, lower.replace(" ", ""));
        if (transformed != null) {
            return transformed;
        }
        for (Name name : NAMES) {
            if (lower.startsWith(name.text()) && isMeant(text, name)) {
                Heading read = rest(text.substring(name.text().length()), name.kind());
                if (read != null) {
                    // "k error" is not k in units of error.
                    boolean value = read.kind() == Kind.TEMPERATURE || read.kind() == Kind.RATE;
                    return value && !read.certain() && mentionsUncertainty(lower) ? UNCLEAR : read;
                }
            }
        }
        return mentionsUncertainty(lower) ? UNCLEAR : Heading.OTHER;
    }

    /** Whether a word before the unit speaks of an uncertainty. */
    private static boolean mentionsUncertainty(String lower) {
        int start = 0;
        for (int i = 0; i <= lower.length(); i++) {
            boolean letter = i < lower.length() && Character.isLetter(lower.charAt(i));
            if (!letter) {
                // "u(k)" and "s (k)" are functions; "note / s" and "time (s)" have a unit.
                String word = lower.substring(start, i);
                boolean alone = word.length() > 2 || start == 0;
                if ((alone && UNCLEAR_WORDS.contains(word)) || beginsUnclear(word)) {
                    return true;
                }
                if (i < lower.length() && lower.charAt(i) == '±') {
                    return true;
                }
                start = i + 1;
            }
        }
        return false;
    }

    private static boolean beginsUnclear(String word) {
        for (String beginning : UNCLEAR_BEGINNINGS) {
            if (word.startsWith(beginning)) {
                return true;
            }
        }
        return false;
    }

    /** A capital U is an expanded uncertainty; u(k)/K is a unit, not a ratio. */
    private static boolean isMeant(String text, Name name) {
        return !name.text().startsWith("u")
                || (text.charAt(0) == 'u'
                        && (!name.text().endsWith("k")
                                || text.charAt(name.text().length() - 1) == 'k'));
    }

    private static Heading transformed(String text, String dense) {
        for (String reciprocal : RECIPROCALS) {
            if (dense.startsWith(reciprocal) && !(dense + " ").startsWith(reciprocal + "ime")) {
                return new Heading(Kind.RECIPROCAL_TEMPERATURE, null, true);
            }
        }
        for (String logarithm : LOGARITHMS) {
            if (dense.startsWith(logarithm)) {
                String argument = dense.substring(logarithm.length());
                if (argument.startsWith("k") || argument.startsWith("(k") || argument.startsWith("_k")) {
                    return new Heading(Kind.LOGARITHM_OF_RATE, null, true);
                }
            }
        }
        boolean power = dense.startsWith("10^") || dense.startsWith("10*") || dense.startsWith("1e");
        boolean superscript =
                dense.startsWith("10") && text.length() > 2 && "⁻⁰¹²³⁴⁵⁶⁷⁸⁹".indexOf(dense.charAt(2)) >= 0;
        if (power || superscript) {
            int end = 2;
            while (end < dense.length() && "^*+-−0123456789⁻⁰¹²³⁴⁵⁶⁷⁸⁹·×x".indexOf(dense.charAt(end)) >= 0) {
                end++;
            }
            if (dense.startsWith("k", end)) {
                return new Heading(Kind.SCALED_RATE, null, true);
            }
        }
        return null;
    }

    /** What follows the name; null when the name was only the beginning of another word. */
    private static Heading rest(String rest, Kind kind) {
        String text = rest.strip();
        if (text.isEmpty()) {
            return new Heading(kind, null, true);
        }
        char first = text.charAt(0);
        if (first == '(' || first == '[') {
            return closesAtEnd(text)
                    ? new Heading(kind, text.substring(1, text.length() - 1).strip(), true)
                    : null;
        }
        if (first == '/') {
            return new Heading(kind, text.substring(1).strip(), true);
        }
        if (kind == Kind.RATE && "×x·*".indexOf(first) >= 0 && text.contains("10")) {
            return new Heading(Kind.SCALED_RATE, null, true);
        }
        if (first == '_') {
            return new Heading(kind, text.substring(1).replace('_', ' ').strip(), false);
        }
        if (first == ',') {
            return new Heading(kind, text.substring(1).strip(), false);
        }
        if (first == '°') {
            return new Heading(kind, text, false);
        }
        if (text.startsWith("in ")) {
            return new Heading(kind, text.substring(3).strip(), false);
        }
        return rest.charAt(0) == ' ' ? new Heading(kind, text, false) : null;
    }

    /** Whether the bracket at the start is closed by the last character. */
    private static boolean closesAtEnd(String text) {
        char open = text.charAt(0);
        char close = open == '(' ? ')' : ']';
        int depth = 0;
        for (int i = 0; i < text.length(); i++) {
            if (text.charAt(i) == open) {
                depth++;
            } else if (text.charAt(i) == close) {
                depth--;
                if (depth == 0) {
                    return i == text.length() - 1;
                }
            }
        }
        return false;
    }
}
