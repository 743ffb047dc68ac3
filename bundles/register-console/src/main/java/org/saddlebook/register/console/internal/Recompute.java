package org.saddlebook.register.console.internal;

import java.io.IOException;
import java.io.PrintStream;
import java.util.List;
import org.saddlebook.api.problem.InputException;
import org.saddlebook.api.task.Cancelled;
import org.saddlebook.console.api.ExitCode;
import org.saddlebook.console.api.Invocation;
import org.saddlebook.register.api.Entry;
import org.saddlebook.register.api.Register;
import org.saddlebook.register.console.api.Recomputed;

/** Prints what came of evaluating a stored entry again. */
final class Recompute {
    private static final int SHOWN = 20;

    private final Services services;
    private final Invocation invocation;

    Recompute(Services services, Invocation invocation) {
        this.services = services;
        this.invocation = invocation;
    }

    int run(Register register, Entry entry) throws InputException, Cancelled, IOException {
        Recomputed done = Recomputation.of(services, register, entry, invocation.progress());
        PrintStream out = invocation.out();
        String which = "Entry " + entry.number();
        if (done.agreement() == Recomputed.Agreement.NOT_POSSIBLE) {
            List<String> models = done.absentModels();
            invocation
                    .err()
                    .println("saddlebook: entry " + entry.number() + " cannot be recomputed: it was"
                            + " evaluated with "
                            + (models.size() == 1 ? "the model " : "the models ")
                            + String.join(", ", models) + ", not installed here. Install the bundle and try again.");
            return ExitCode.REFUSED;
        }
        if (done.agreement() == Recomputed.Agreement.IDENTICAL) {
            out.println(which + " gives the same findings, bit for bit, with the same bundles.");
            return ExitCode.DONE;
        }
        if (!done.otherBundles().isEmpty()) {
            out.println(which + " was evaluated with other bundles:");
            for (Recomputed.OtherBundle other : done.otherBundles()) {
                out.println("  " + Text.line(other.name()) + ": then " + Text.line(other.then()) + ", now "
                        + Text.line(other.now()));
            }
        }
        if (done.agreement() == Recomputed.Agreement.AGREES) {
            out.println(
                    "The findings agree: every number within the larger of 1e-9 of its value and 1e-6 of its standard"
                            + " uncertainty, everything else equal.");
            return ExitCode.DONE;
        }
        if (done.agreement() == Recomputed.Agreement.WRITTEN_DIFFERENTLY) {
            out.println(which + " gives findings whose values are all equal, in other bytes: the file is written"
                    + " differently.");
            return ExitCode.DIFFERENCE;
        }
        List<Recomputed.Difference> moved = done.differences();
        out.println("These values differ (" + moved.size() + "):");
        for (Recomputed.Difference value : moved.subList(0, Math.min(SHOWN, moved.size()))) {
            out.println("  " + Text.line(value.place()) + ": then " + Text.line(value.then()) + ", now "
                    + Text.line(value.now()));
        }
        if (moved.size() > SHOWN) {
            out.println("  and " + (moved.size() - SHOWN) + " more");
        }
        return ExitCode.DIFFERENCE;
    }
}
