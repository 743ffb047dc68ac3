package org.saddlebook.console.internal;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.saddlebook.api.campaign.Campaign;
import org.saddlebook.api.campaign.RatePoint;
import org.saddlebook.api.campaign.RateTable;
import org.saddlebook.api.findings.Findings;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.findings.Section;
import org.saddlebook.api.quantity.Dimension;
import org.saddlebook.api.quantity.Unit;
import org.saddlebook.console.api.ExitCode;

class VerdictTest {
    private static final Campaign CAMPAIGN = Campaign.titled("t")
            .withRateTable(new RateTable(
                    new Unit("s-1", Dimension.rateConstant(1), 1, 0), 1, List.of(RatePoint.of(300, 1e-3))));

    private static Node model(String id, String outcome) {
        return new Node.Group(
                Map.of("id", new Node.Text(id), "outcome", new Node.Text(outcome), "reason", new Node.Text("because")));
    }

    private static Findings findings(Node... models) {
        Section section = Section.done(
                "barrier", "Barrier", new Node.Group(Map.of("models", new Node.Items(List.of(models)))), Map.of());
        return new Findings("t", "", List.of(), Map.of("barrier", section));
    }

    private static int code(Findings findings, String... asked) {
        return Verdict.of(CAMPAIGN, findings, List.of(asked)).exitCode();
    }

    @Test
    void oneFittedModelIsEnoughWhenNoneWasAskedFor() {
        assertEquals(ExitCode.DONE, code(findings(model("a", "fitted"), model("b", "failed"))));
    }

    @Test
    void aRefusedModelThatWasAskedForIsSaid() {
        Verdict verdict = Verdict.of(CAMPAIGN, findings(model("a", "fitted"), model("b", "refused")), List.of("b"));
        assertEquals(ExitCode.REFUSED, verdict.exitCode());
        assertTrue(verdict.sentence().contains("b (because)"));
    }

    @Test
    void anUndeterminedModelThatWasAskedForIsAResult() {
        assertEquals(ExitCode.DONE, code(findings(model("a", "fitted"), model("b", "undetermined")), "b"));
    }

    @Test
    void nothingFittedIsRefused() {
        assertEquals(ExitCode.REFUSED, code(findings(model("a", "undetermined"))));
        assertEquals(ExitCode.REFUSED, code(findings()));
        assertEquals(ExitCode.REFUSED, code(new Findings("t", "", List.of(), Map.of())));
    }

    @Test
    void aCampaignWithoutATableNeedsSomeSection() {
        Section other = Section.done("spontaneity", "S", new Node.Group(Map.of()), Map.of());
        Campaign none = Campaign.titled("t");
        assertEquals(
                ExitCode.DONE,
                Verdict.of(none, new Findings("t", "", List.of(), Map.of("spontaneity", other)), List.of())
                        .exitCode());
        assertEquals(
                ExitCode.REFUSED,
                Verdict.of(none, new Findings("t", "", List.of(), Map.of()), List.of())
                        .exitCode());
    }
}
