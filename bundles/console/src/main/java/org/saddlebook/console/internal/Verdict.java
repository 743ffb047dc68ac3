package org.saddlebook.console.internal;

import java.util.ArrayList;
import java.util.List;
import org.saddlebook.api.campaign.Campaign;
import org.saddlebook.api.findings.Findings;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.findings.Section;
import org.saddlebook.console.api.ExitCode;

/**
 * What the exit code says about findings: an undetermined parameter is a result, a model that was asked for by name and
 * refused is not.
 *
 * @param exitCode {@link ExitCode#DONE} or {@link ExitCode#REFUSED}
 * @param sentence why it is not 0; empty when it is
 */
record Verdict(int exitCode, String sentence) {
    private static final Verdict DONE = new Verdict(ExitCode.DONE, "");

    /**
     * Judges findings.
     *
     * @param asked ids of the models named on the command line
     */
    static Verdict of(Campaign campaign, Findings findings, List<String> asked) {
        if (campaign.rateTable().isEmpty()) {
            return findings.sections().isEmpty()
                    ? refused(
                            "nothing could be computed: the input holds neither a rate table nor anything else that an"
                                    + " installed analysis reads.")
                    : DONE;
        }
        Section barrier = findings.sections().get("barrier");
        if (barrier == null) {
            return refused("nothing could be fitted: no analysis of rate tables is installed.");
        }
        boolean fitted = false;
        List<String> missed = new ArrayList<>();
        for (Node model : Nodes.items(barrier.body(), "models")) {
            boolean found = Nodes.text(model, "outcome").equals("fitted");
            fitted |= found;
            String id = Nodes.text(model, "id");
            if (!found && asked.contains(id) && !Nodes.text(model, "outcome").equals("undetermined")) {
                missed.add(id + " (" + Nodes.text(model, "reason") + ")");
            }
        }
        if (!missed.isEmpty()) {
            return refused("refused: " + String.join("; ", missed));
        }
        if (!fitted) {
            String reason = Nodes.text(barrier.body(), "reason");
            return refused("nothing could be fitted" + (reason.isEmpty() ? "." : ": " + reason));
        }
        return DONE;
    }

    private static Verdict refused(String sentence) {
        return new Verdict(ExitCode.REFUSED, sentence);
    }
}
