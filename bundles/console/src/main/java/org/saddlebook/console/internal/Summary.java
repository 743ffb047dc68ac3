package org.saddlebook.console.internal;

import java.io.PrintStream;
import java.util.List;
import org.saddlebook.api.findings.Findings;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.findings.Section;

/** Findings as text for a terminal: the barrier in a form of its own, every other section by its tree. */
public final class Summary {
    private final PrintStream out;
    private final CautionMarks marks = new CautionMarks();

    /** Prints to a stream. */
    public Summary(PrintStream out) {
        this.out = out;
    }

    /**
     * Prints everything.
     *
     * @param understood sentences on how the input was read
     */
    public void print(List<String> understood, Findings findings) {
        out.println(findings.campaignTitle());
        for (String sentence : understood) {
            Lines.wrapped(out, "  ", sentence);
        }
        for (Section section : findings.sections().values()) {
            out.println();
            out.println(section.title());
            if (section.outcome() != Section.Outcome.DONE) {
                Lines.wrapped(
                        out, "  ", Nodes.text(section.body(), "outcome") + ": " + Nodes.text(section.body(), "reason"));
            } else if (section.id().equals("barrier") && section.body() instanceof Node.Group body) {
                new BarrierSummary(out, marks).print(body);
            } else {
                new NodeSummary(out, marks).print(section.body(), 1);
            }
        }
        marks.print(out, findings.cautions());
        out.println();
    }
}
