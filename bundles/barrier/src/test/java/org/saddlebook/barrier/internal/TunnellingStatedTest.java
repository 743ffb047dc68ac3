package org.saddlebook.barrier.internal;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.saddlebook.api.campaign.Choices;
import org.saddlebook.api.campaign.RateTable;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.findings.Section;
import org.saddlebook.api.model.Inapplicable;
import org.saddlebook.api.model.TunnellingModel;
import org.saddlebook.barrier.api.FittedLaws;
import org.saddlebook.model.eyring.internal.Eyring;
import org.saddlebook.tunnelling.internal.Bell;
import org.saddlebook.tunnelling.internal.Eckart;
import org.saddlebook.tunnelling.internal.Wigner;

/** A stated tunnelling correction on its way through the analysis and back from its findings. */
class TunnellingStatedTest {
    private static final double GAS = 8.31446261815324;
    private static final List<TunnellingModel> CORRECTIONS = List.of(new Wigner(), new Bell(), new Eckart());

    private static RateTable table() {
        double[] kelvin = {300, 315, 330, 345, 360};
        double[] k = new double[kelvin.length];
        for (int i = 0; i < k.length; i++) {
            k[i] = 1e10 * StrictMath.exp(-70_000 / (GAS * kelvin[i])) * (1 + 0.01 * (i % 2));
        }
        return Bench.firstOrder(kelvin, k);
    }

    private static Section section(Node.Group tunnelling, List<TunnellingModel> corrections) throws Exception {
        var installed = Bench.models();
        Choices choices =
                Choices.defaults().withModels(List.of("arrhenius", "eyring")).withTargetsKelvin(List.of(298.15));
        return new BarrierEvaluation(
                        Bench.campaign(table(), choices, installed)
                                .withSetting(
                                        "barrier",
                                        new Tree().put("tunnelling", tunnelling).group()),
                        installed,
                        () -> corrections,
                        Bench.TASK)
                .section();
    }

    private static Node.Group stated(String model, double perCentimetre) {
        return new Tree()
                .put("model", model)
                .put("wavenumber", Node.Quantity.of(perCentimetre, "1/cm"))
                .group();
    }

    @Test
    void movesTheBarrierButNotTheRates() throws Exception {
        Node.Group plain = (Node.Group) Bench.section(
                        table(),
                        Choices.defaults()
                                .withModels(List.of("arrhenius", "eyring"))
                                .withTargetsKelvin(List.of(298.15)))
                .body();
        Node.Group with =
                (Node.Group) section(stated("wigner", 1000), CORRECTIONS).body();
        double before = Bench.parameter(plain, "eyring", "dH").value().orElseThrow();
        double after = Bench.parameter(with, "eyring", "dH").value().orElseThrow();
        // d ln κ/dT is negative, so the same slope of ln k belongs to a higher barrier, by about R T times 2(κ − 1)/κ.
        assertTrue(after > before + 1500 && after < before + 3500, before + " to " + after);
        assertEquals(
                1,
                Bench.derived(with, "eyring", "k").value().orElseThrow()
                        / Bench.derived(plain, "eyring", "k").value().orElseThrow(),
                0.01);
        Node.Group said = TreeReader.group(TreeReader.group(with, "context"), "tunnelling");
        Node.Group row = (Node.Group) TreeReader.items(said, "coefficients").get(1);
        // 1000i cm-1 at 298.15 K: 1.97029999756 (table of Wigner factors in the bundle tunnelling).
        assertEquals(1.97029999756, TreeReader.number(row, "kappa"), 1e-11);
        assertFalse(Bench.parameter(with, "eyring", "dS").cautions().contains("assumed-transmission"));
        assertTrue(Bench.parameter(plain, "eyring", "dS").cautions().contains("assumed-transmission"));
    }

    @Test
    void bellIsRefusedWhereAPointLiesBeyondItsLimit() throws Exception {
        Node.Group body =
                (Node.Group) section(stated("bell", 1500), CORRECTIONS).body();
        Node.Group eyring = Bench.model(body, "eyring");
        assertEquals("refused", TreeReader.text(eyring, "outcome"));
        assertTrue(TreeReader.text(eyring, "reason").contains("u reaches 2 pi"), TreeReader.text(eyring, "reason"));
        // A law that needs no transition state goes on, without what would need one.
        Node.Group arrhenius = Bench.model(body, "arrhenius");
        assertEquals("fitted", TreeReader.text(arrhenius, "outcome"));
        assertTrue(TreeReader.group(arrhenius, "derived").get("dS").isEmpty());
    }

    @Test
    void namesTheFeatureWhenTheCorrectionIsNotInstalled() throws Exception {
        Node.Group body =
                (Node.Group) section(stated("wigner", 1000), List.of()).body();
        assertTrue(TreeReader.text(Bench.model(body, "eyring"), "reason").contains("in the feature tunnelling"));
    }

    @Test
    void predictsTheSameFromFindingsReadBack() throws Exception {
        Section section = section(stated("wigner", 1000), CORRECTIONS);
        Node.Group row = (Node.Group)
                TreeReader.items((Node.Group) section.body(), "predictions").get(1);
        FittedLaws laws = FittedLaws.of(section, () -> CORRECTIONS);
        Node.Group again = new StoredLaws(laws).predict("eyring", new Eyring(), 298.15);
        assertEquals(
                1,
                TreeReader.quantity(again, "k").value().orElseThrow()
                        / TreeReader.quantity(row, "k").value().orElseThrow(),
                1e-12);
        FittedLaws unresolved = FittedLaws.of(section);
        assertEquals("wigner", unresolved.context().tunnelling().orElseThrow().modelId());
        try {
            new StoredLaws(unresolved).predict("eyring", new Eyring(), 298.15);
            throw new AssertionError("bound without its correction");
        } catch (Inapplicable expected) {
            assertTrue(expected.getMessage().contains("wigner"));
        }
    }

    @Test
    void refusesASettingItDoesNotKnow() throws Exception {
        Section section = section(
                new Tree()
                        .put("model", "wigner")
                        .put("depth", Node.Quantity.of(1, "J/mol"))
                        .group(),
                CORRECTIONS);
        assertEquals(Section.Outcome.REFUSED, section.outcome());
    }
}
