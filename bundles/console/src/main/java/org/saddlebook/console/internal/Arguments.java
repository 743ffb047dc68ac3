package org.saddlebook.console.internal;

import java.util.ArrayList;
import java.util.List;
import org.saddlebook.api.problem.InputException;
import org.saddlebook.api.problem.Place;
import org.saddlebook.api.problem.Problem;

/** Checks of command lines that have no options of their own worth a parser. */
final class Arguments {
    private Arguments() {}

    /** A refusal of an argument. */
    static InputException wrong(String verb, String found, String expected, String remedy) {
        return new InputException(
                new Problem("argument", Place.of("the arguments of " + verb), found, expected, remedy));
    }

    /** Refuses anything. */
    static void none(String verb, List<String> arguments) throws InputException {
        if (!arguments.isEmpty()) {
            throw wrong(verb, "\"" + arguments.get(0) + "\"", "nothing", "Leave it out.");
        }
    }

    /** Takes a switch such as {@code --json} out of a copy of the arguments; the rest must be words. */
    static boolean takeSwitch(String verb, List<String> arguments, List<String> words, String known)
            throws InputException {
        boolean found = false;
        words.clear();
        for (String argument : new ArrayList<>(arguments)) {
            if (argument.equals(known)) {
                found = true;
            } else if (argument.startsWith("-")) {
                throw wrong(verb, "the option " + argument, known, "`saddlebook help " + verb + "` lists the options.");
            } else {
                words.add(argument);
            }
        }
        return found;
    }
}
