package org.saddlebook.spontaneity.internal;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.saddlebook.api.campaign.Campaign;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.findings.Section;
import org.saddlebook.thermo.data.api.SpeciesSource;

/** The section consistency: forward and reverse rate constants against K, and thermodynamic cycles. */
final class ConsistencyEvaluation {
    static final String SECTION = "consistency";
    static final String TITLE = "Forward, reverse and K";

    private ConsistencyEvaluation() {}

    /** The section; refused with a reason when what was stated cannot be evaluated. */
    static Section section(Campaign campaign, List<SpeciesSource> sources) {
        Map<String, Node> body = new LinkedHashMap<>();
        List<Node> notes = new ArrayList<>();
        List<Node> figures = new ArrayList<>();
        try {
            SettingsReader settings = new SettingsReader(
                    campaign.settings().get(SECTION),
                    "the settings of consistency",
                    List.of("forward", "reverse", "cycles"));
            double level = campaign.choices().level();
            if (settings.node("reverse").isPresent()) {
                RateSeries forward = forward(campaign, settings.node("forward"));
                RateSeries reverse =
                        RateSeries.read("reverse", settings.node("reverse").get());
                EquilibriumSource equilibrium = EquilibriumSource.of(campaign, sources);
                body.put("rates", new RatesAgainstK(forward, reverse, equilibrium, level).node(notes, figures));
            } else if (settings.node("forward").isPresent()
                    || settings.node("cycles").isEmpty()) {
                throw new Refusal(
                        "The settings of consistency need reverse rate constants to compare with, or cycles.");
            }
            if (settings.node("cycles").isPresent()) {
                body.put(
                        "cycles",
                        new Cycles(CycleSteps.read(settings.node("cycles").get()), level).node(notes));
            }
        } catch (Refusal refusal) {
            return Section.refused(SECTION, TITLE, refusal.getMessage());
        }
        body.put("notes", new Node.Items(notes));
        body.put("figures", new Node.Items(figures));
        Node.Group group = new Node.Group(body);
        Map<String, String> cautions = new LinkedHashMap<>();
        CautionTexts.collect(group, cautions);
        return Section.done(SECTION, TITLE, group, cautions);
    }

    private static RateSeries forward(Campaign campaign, Optional<Node> stated) throws Refusal {
        if (stated.isPresent()) {
            return RateSeries.read("forward", stated.get());
        }
        return RateSeries.of(
                "forward",
                campaign.rateTable()
                        .orElseThrow(
                                () -> new Refusal(
                                        "The settings of consistency need forward rate constants; the campaign has no rate table.")));
    }
}
