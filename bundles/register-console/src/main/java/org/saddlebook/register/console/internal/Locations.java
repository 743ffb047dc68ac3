package org.saddlebook.register.console.internal;

import java.nio.file.InvalidPathException;
import java.nio.file.Path;
import java.util.Optional;
import org.saddlebook.api.problem.InputException;
import org.saddlebook.console.api.Invocation;
import org.saddlebook.console.api.Options;
import org.saddlebook.register.api.Register;
import org.saddlebook.register.api.RegisterException;
import org.saddlebook.register.api.RegisterStoreFactory.Opening;
import org.saddlebook.register.api.Registers;

/**
 * Which register is meant: {@code --register}, else where the administrator's policy says (setting {@code
 * saddlebook.register}), else the environment variable {@code SADDLEBOOK_REGISTER}, else the user's own.
 */
final class Locations {
    /** The option. */
    static final String OPTION = "--register";

    /** What the option means, for help. */
    static final String HELP = """
            --register PATH   the register's file; without it the one that the administrator set, or the environment
                              variable SADDLEBOOK_REGISTER names, or your own""";

    private Locations() {}

    static Register open(Services services, Invocation invocation, Options options, Opening opening)
            throws InputException, RegisterException {
        Registers registers = services.need(Registers.class, "register");
        return registers.open(location(services, invocation, options), opening, invocation.clock());
    }

    static String location(Services services, Invocation invocation, Options options) throws InputException {
        Optional<String> given = options.value(OPTION);
        if (given.isPresent()) {
            return absolute(invocation.workingFolder(), given.get());
        }
        return location(services, invocation.workingFolder(), invocation.dataFolder());
    }

    /** The register meant when nobody names one. */
    static String location(Services services, Path workingFolder, Path dataFolder) throws InputException {
        for (String name : new String[] {"saddlebook.register", "SADDLEBOOK_REGISTER"}) {
            Optional<String> set = services.setting(name).filter(text -> !text.isBlank());
            if (set.isPresent()) {
                return absolute(workingFolder, set.get());
            }
        }
        return dataFolder.resolve("register").resolve("saddlebook.register").toString();
    }

    private static String absolute(Path workingFolder, String typed) throws InputException {
        if (typed.contains("://")) {
            return typed; // an address, for a store of another kind
        }
        return path(workingFolder, typed, OPTION).toString();
    }

    /** The path of a typed name, seen from the working folder. */
    static Path path(Invocation invocation, String typed, String argument) throws InputException {
        return path(invocation.workingFolder(), typed, argument);
    }

    private static Path path(Path workingFolder, String typed, String argument) throws InputException {
        try {
            if (!typed.isBlank()) {
                return workingFolder.resolve(Path.of(typed));
            }
        } catch (InvalidPathException e) {
            // refused below, like an empty name
        }
        throw Options.wrong(
                "no-file-name",
                argument,
                "\"" + typed + "\"",
                "a file name",
                "Name a file; remove a character that no file name can have.");
    }

    /** The actor: {@code --as}, else the account's name. */
    static String actor(Invocation invocation, Options options) throws InputException {
        String actor = options.value("--as").orElse(invocation.user());
        if (actor.isBlank()) {
            throw Options.wrong("no-name", "--as", "nothing", "a name", "Write who is acting after --as.");
        }
        return actor;
    }

    /** The number of an entry. */
    static long number(String typed) throws InputException {
        try {
            long number = Long.parseLong(typed);
            if (number >= 1) {
                return number;
            }
        } catch (NumberFormatException e) {
            // refused below, like a number below 1
        }
        throw Options.wrong(
                "no-entry-number",
                "N",
                "\"" + typed + "\"",
                "the number of an entry, from 1",
                "`saddlebook register list` shows the numbers.");
    }
}
