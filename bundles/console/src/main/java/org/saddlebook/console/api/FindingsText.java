package org.saddlebook.console.api;

import java.io.PrintStream;
import java.util.List;
import org.saddlebook.api.findings.Findings;
import org.saddlebook.console.internal.Summary;

/** Findings as text for a terminal, the same for every verb. */
public final class FindingsText {
    private FindingsText() {}

    /**
     * Prints every section and the cautions it uses.
     *
     * @param understood sentences on how the input was read
     */
    public static void print(PrintStream out, List<String> understood, Findings findings) {
        new Summary(out).print(understood, findings);
    }
}
