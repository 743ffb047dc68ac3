package org.saddlebook.spontaneity.internal;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.saddlebook.api.campaign.Campaign;
import org.saddlebook.api.findings.Findings;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.findings.Section;
import org.saddlebook.testkit.api.ImmediateTask;
import org.saddlebook.thermo.data.api.CuratedSet;
import org.saddlebook.thermo.data.api.SpeciesFiles;
import org.saddlebook.thermo.data.api.SpeciesSource;

/** Each thing a person may get wrong about a reaction has its own message, which says what to do. */
class BadInputTest {
    private static final String SHOMATE_WITH_A_GAP = """
            species;lower_K;upper_K;A;B;C;D;E;F;G
            Xe(g);298;600;20.786;0;0;0;0;-6.197;169.68
            Xe(g);900;2000;20.786;0;0;0;0;-6.197;169.68
            Xe(l);165;2000;40;0;0;0;0;-24;150
            """;

    private static Section section(List<SpeciesSource> sources, Object... pairs) throws Exception {
        Settings settings = new Settings();
        for (int i = 0; i < pairs.length; i += 2) {
            settings.with(
                    (String) pairs[i], pairs[i + 1] instanceof Node node ? node : new Node.Text((String) pairs[i + 1]));
        }
        Campaign campaign = settings.campaign();
        return new SpontaneityComponent(sources)
                .analyse(campaign, new Findings("invented", "", List.of(), Map.of()), ImmediateTask.seeded(1));
    }

    private static void refused(String words, Object... pairs) throws Exception {
        refused(List.of(CuratedSet.source()), words, pairs);
    }

    private static void refused(List<SpeciesSource> sources, String words, Object... pairs) throws Exception {
        Section section = section(sources, pairs);
        assertEquals(Section.Outcome.REFUSED, section.outcome(), words);
        String reason = Settings.text((Node.Group) section.body(), "reason");
        assertTrue(reason.contains(words), reason);
        assertFalse(reason.contains("Exception"), reason);
    }

    private static Node range(double lower, double upper) {
        return new Node.Group(Map.of("lower", new Node.Scalar(lower), "upper", new Node.Scalar(upper)));
    }

    @Test
    void anUnbalancedEquation() throws Exception {
        refused("H: 2 on the left, 4 on the right", "reaction", "H2(g) + O2(g) = 2 H2O(g)");
    }

    @Test
    void anUnknownElement() throws Exception {
        refused("\"Qx\" at character", "reaction", "Qx2(g) = 2 Qx(g)");
    }

    @Test
    void aWrongPhase() throws Exception {
        refused(
                "no installed source has data of N2(s), but of N2(g)".replaceFirst("no", "No"),
                "reaction",
                "N2(s) = N2(g)");
        refused("found", "reaction", "N2(q) = N2(g)");
    }

    @Test
    void aTemperatureOutsideTheData() throws Exception {
        refused(
                "is known from",
                "reaction",
                "CO(g) + H2O(g) = CO2(g) + H2(g)",
                "source",
                "shomate",
                "range",
                range(300, 5000));
    }

    @Test
    void aGapBetweenRanges() throws Exception {
        List<SpeciesSource> sources =
                List.of(SpeciesFiles.source("lab", "The laboratory", Map.of("lab.csv", SHOMATE_WITH_A_GAP)));
        refused(sources, "Xe(g) have a gap from 600 K to 900 K; state a range", "reaction", "Xe(l) = Xe(g)");
        Section beside = section(sources, "reaction", "Xe(l) = Xe(g)", "range", range(300, 590));
        assertEquals(Section.Outcome.DONE, beside.outcome());
    }

    @Test
    void aNegativeTemperature() throws Exception {
        refused("must lie above 0 K", "reaction", "N2O4(g) = 2 NO2(g)", "range", range(-20, 400));
    }

    @Test
    void aQuotientThatIsNotPositive() throws Exception {
        refused("must be above zero", "reaction", "N2O4(g) = 2 NO2(g)", "composition", new Node.Scalar(0));
        refused("must be above zero", "reaction", "N2O4(g) = 2 NO2(g)", "composition", new Node.Scalar(-3));
    }

    @Test
    void aMissingSpecies() throws Exception {
        refused("No installed source has data of Kr(g); state dHf and S", "reaction", "Kr(g) = Kr(l)");
    }

    @Test
    void kilojoulesForJoules() throws Exception {
        Node joules = new Node.Group(Map.of(
                "Kr(g)",
                new Node.Group(
                        Map.of("dHf", Node.Quantity.of(0, "kJ/mol"), "S", Node.Quantity.of(164.1, "kJ/(mol.K)")))));
        refused("check whether J and kJ were mixed", "reaction", "Kr(g) = Kr(l)", "species", joules);
        Section doubted = section(
                List.of(),
                "dH",
                Node.Quantity.of(-92.2, "kJ/mol", 0.4),
                "dS",
                Node.Quantity.of(-198.1, "kJ/(mol.K)", 0.3));
        assertTrue(doubted.cautions().containsKey("spontaneity-units-doubtful"));
    }

    @Test
    void aBrokenFileOfTheLaboratory() throws Exception {
        List<SpeciesSource> sources = List.of(SpeciesFiles.source(
                "lab", "The laboratory", Map.of("lab.csv", SHOMATE_WITH_A_GAP.replace("169.68", "169,68"))));
        refused(sources, "The species source lab cannot be used. lab.csv, line 2", "reaction", "Xe(l) = Xe(g)");
    }
}
