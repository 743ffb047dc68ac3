package org.saddlebook.console.api;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import org.saddlebook.api.problem.InputException;
import org.saddlebook.api.problem.Place;
import org.saddlebook.api.problem.Problem;
import org.saddlebook.json.api.NearSpelling;

/**
 * A command line taken apart: words, switches ({@code --json}) and options with a value ({@code --out DIR} or {@code
 * --out=DIR}). After {@code --} everything is a word. What is not known is refused, with the argument as place.
 */
public final class Options {
    private final List<String> words;
    private final Set<String> switches;
    private final Map<String, List<String>> values;

    private Options(List<String> words, Set<String> switches, Map<String, List<String>> values) {
        this.words = List.copyOf(words);
        this.switches = switches;
        this.values = values;
    }

    /**
     * Takes arguments apart.
     *
     * @param arguments as typed
     * @param switches options without a value, with their dashes
     * @param valued options with a value, with their dashes
     * @throws InputException with every unknown option, missing and superfluous value
     */
    public static Options parse(List<String> arguments, List<String> switches, List<String> valued)
            throws InputException {
        List<String> words = new ArrayList<>();
        Set<String> set = new LinkedHashSet<>();
        Map<String, List<String>> values = new LinkedHashMap<>();
        List<Problem> problems = new ArrayList<>();
        boolean onlyWords = false;
        for (int i = 0; i < arguments.size(); i++) {
            String argument = arguments.get(i);
            if (onlyWords || !argument.startsWith("-") || argument.equals("-")) {
                words.add(argument);
                continue;
            }
            if (argument.equals("--")) {
                onlyWords = true;
                continue;
            }
            int equals = argument.indexOf('=');
            String name = equals < 0 ? argument : argument.substring(0, equals);
            if (valued.contains(name)) {
                List<String> given = values.computeIfAbsent(name, key -> new ArrayList<>());
                if (equals >= 0) {
                    given.add(argument.substring(equals + 1));
                } else if (i + 1 < arguments.size() && !isOption(arguments.get(i + 1))) {
                    given.add(arguments.get(++i));
                } else {
                    problems.add(problem(
                            "missing-value",
                            name,
                            "nothing after " + name,
                            "a value",
                            "Write the value after " + name + ", or " + name
                                    + "=VALUE when it begins with two dashes."));
                }
            } else if (switches.contains(name) && equals < 0) {
                set.add(name);
            } else {
                problems.add(unknown(argument, name, switches, valued));
            }
        }
        if (!problems.isEmpty()) {
            throw new InputException(problems);
        }
        return new Options(words, set, values);
    }

    private static boolean isOption(String argument) {
        return argument.startsWith("--");
    }

    private static Problem unknown(String argument, String name, List<String> switches, List<String> valued) {
        if (switches.contains(name)) {
            return problem("superfluous-value", name, argument, name + " alone", "Leave the value out.");
        }
        List<String> known = new ArrayList<>(switches);
        known.addAll(valued);
        Optional<String> near = NearSpelling.of(name, known);
        return problem(
                "unknown-option",
                argument,
                argument,
                known.isEmpty() ? "no option" : "one of " + String.join(", ", known),
                near.isPresent() ? "Did you mean " + near.get() + "?" : "Leave it out; --help says what there is.");
    }

    private static Problem problem(String code, String place, String found, String expected, String remedy) {
        return new Problem(code, Place.of(place), found, expected, remedy);
    }

    /** A refusal of the value of an option, or of a word. */
    public static InputException wrong(String code, String argument, String found, String expected, String remedy) {
        return new InputException(problem(code, argument, found, expected, remedy));
    }

    /** What is no option, in order. */
    public List<String> words() {
        return words;
    }

    /** The only word.
     *
     * @param what it is, as in the synopsis, for example {@code INPUT}
     * @throws InputException when there is none, or more than one
     */
    public String word(String what) throws InputException {
        if (words.isEmpty()) {
            throw wrong("missing-argument", what, "nothing", what, "Name it: --help shows how.");
        }
        if (words.size() > 1) {
            throw wrong(
                    "superfluous-argument",
                    words.get(1),
                    "\"" + words.get(1) + "\" after " + what,
                    "one " + what,
                    "Leave it out; put quotation marks around a name that contains a space.");
        }
        return words.get(0);
    }

    /** Whether a switch is given. */
    public boolean has(String name) {
        return switches.contains(name);
    }

    /** Every value given for an option, in order. */
    public List<String> values(String name) {
        return List.copyOf(values.getOrDefault(name, List.of()));
    }

    /**
     * The value of an option that may be given once.
     *
     * @throws InputException when it is given twice
     */
    public Optional<String> value(String name) throws InputException {
        List<String> given = values(name);
        if (given.size() > 1) {
            throw wrong(
                    "repeated-option",
                    name,
                    name + " " + given.size() + " times",
                    name + " once",
                    "Keep the one that you mean.");
        }
        return given.isEmpty() ? Optional.empty() : Optional.of(given.get(0));
    }
}
