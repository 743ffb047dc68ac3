package org.saddlebook.spontaneity.internal;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.SplittableRandom;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.saddlebook.api.campaign.Campaign;
import org.saddlebook.api.findings.Interval;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.findings.Section;
import org.saddlebook.api.quantity.Constants;
import org.saddlebook.reaction.api.Species;
import org.saddlebook.thermo.data.api.PowerSegment;
import org.saddlebook.thermo.data.api.SpeciesData;

class ReactionTest {
    private static Settings reaction(String equation) {
        return new Settings().with("reaction", new Node.Text(equation));
    }

    private static Node group(Object... entries) {
        Map<String, Node> members = new LinkedHashMap<>();
        for (int i = 0; i < entries.length; i += 2) {
            members.put((String) entries[i], (Node) entries[i + 1]);
        }
        return new Node.Group(members);
    }

    private static Node kilojoules(double value) {
        return Node.Quantity.of(value, "kJ/mol");
    }

    private static Node entropy(double value) {
        return Node.Quantity.of(value, "J/(mol.K)");
    }

    @Test
    void givesTheWholeRangeOfTheData() throws Exception {
        Section section = reaction("N2(g) + 3 H2(g) = 2 NH3(g)").section();
        Node.Group body = (Node.Group) section.body();
        assertEquals(Section.Outcome.DONE, section.outcome());
        assertEquals("below the crossover", Settings.text(body, "case"));
        assertEquals("bounded", Settings.text(body, "crossoverOutcome"));
        Node.Quantity crossover = Settings.crossover(body);
        Interval interval = crossover.interval().orElseThrow();
        assertEquals(Interval.Kind.BETWEEN, interval.kind());
        assertTrue(interval.lower().getAsDouble() < crossover.value().getAsDouble());
        // u(dfH(NH3)) of 350 J/mol, twice, over 214 J/(mol K): 3.3 K.
        assertEquals(3.3, crossover.standardUncertainty().getAsDouble(), 0.1);
        assertEquals(2, Settings.items(body, "signs").size());
        assertEquals(
                "negative",
                Settings.text((Node.Group) Settings.items(body, "signs").get(0), "sign"));
        assertEquals(List.of(new Node.Text("crossing")), Settings.items(body, "crossoverKinds"));
        assertTrue(section.cautions().containsKey(SpontaneityCautions.SPECIES_INDEPENDENT));
        assertFalse(section.cautions().containsKey("constant-heat-capacity"));
        assertTrue(section.cautions().containsKey("allowed-is-not-fast"));
    }

    @Test
    void saysWhichDataItUsed() throws Exception {
        Node.Group body = reaction("N2O4(g) = 2 NO2(g)").body();
        Node.Group first = (Node.Group) Settings.items(body, "data").get(0);
        assertEquals("N2O4(g)", Settings.text(first, "species"));
        assertEquals("curated, janaf", Settings.text(first, "source"));
        assertTrue(Settings.text(first, "reference").contains("NIST-JANAF"));
    }

    @Test
    void usesHeatCapacitiesStatedInTheCampaign() throws Exception {
        Node.Group body = reaction("2 CO(g) = C2O2(g)")
                .with(
                        "species",
                        group(
                                "C2O2(g)",
                                group("dHf", kilojoules(-300), "S", entropy(250), "Cp", entropy(60)),
                                "CO(g)",
                                group("dHf", kilojoules(-110), "S", entropy(200), "Cp", entropy(29))))
                .body();
        // ΔH = -80 kJ/mol, ΔS = -150 J/(mol K), ΔCp = 2 J/(mol K); by hand: T* from ΔH + ΔCp (T - 298.15) = T (ΔS + ΔCp
        // ln).
        double t = Settings.crossover(body).value().getAsDouble();
        assertEquals(-80_000 + 2 * (t - 298.15), t * (-150 + 2 * StrictMath.log(t / 298.15)), 1e-6);
        assertTrue(Settings.crossover(body).cautions().contains(SpontaneityCautions.SPECIES_UNCERTAINTY));
    }

    @Test
    void fallsBackToConstantsWhereAHeatCapacityIsNotKnown() throws Exception {
        Section section = reaction("H2O(l) = H+(aq) + OH-(aq)")
                .with("source", new Node.Text("codata"))
                .section();
        Node.Group body = (Node.Group) section.body();
        // CODATA key values: 55.815 kJ/mol, -80.85 J/(mol K).
        assertEquals(55_815, Settings.quantity(body, "dH").value().getAsDouble(), 1e-6);
        assertEquals(-80.85, Settings.quantity(body, "dS").value().getAsDouble(), 1e-9);
        assertTrue(section.cautions().containsKey("constant-heat-capacity"));
        assertEquals("1 bar", Settings.text(body, "standardState"));
        Node.Group salt = reaction("AgCl(s) = Ag+(aq) + Cl-(aq)")
                .with("composition", group("Ag+", Node.Quantity.of(1e-6, "mol/L"), "Cl-", new Node.Scalar(1e-6)))
                .body();
        assertEquals(2 * StrictMath.log(1e-6), ((Node.Scalar) salt.get("lnQ").orElseThrow()).value(), 1e-12);
        double h = Settings.quantity(salt, "dH").value().getAsDouble();
        double s = Settings.quantity(salt, "dS").value().getAsDouble();
        Node.Quantity there =
                (Node.Quantity) Settings.items(salt, "crossoversAtComposition").get(0);
        assertEquals(
                h / (s - Constants.GAS * 2 * StrictMath.log(1e-6)),
                there.value().getAsDouble(),
                1e-9);
    }

    @Test
    void movesGibbsEnergyWithComposition() throws Exception {
        Campaign campaign = reaction("N2(g) + 3 H2(g) = 2 NH3(g)")
                .with(
                        "composition",
                        group(
                                "N2", Node.Quantity.of(50, "bar"),
                                "H2(g)", Node.Quantity.of(15, "MPa"),
                                "NH3", Node.Quantity.of(10, "atm")))
                .campaign();
        Node.Group body = (Node.Group)
                Settings.section(campaign.withChoices(campaign.choices().withTargetsKelvin(List.of(700.0))))
                        .body();
        double lnQ = 2 * StrictMath.log(10.1325) - StrictMath.log(50) - 3 * StrictMath.log(150);
        assertEquals(lnQ, ((Node.Scalar) body.get("lnQ").orElseThrow()).value(), 1e-12);
        for (Node node : Settings.items(body, "dG")) {
            Node.Group row = (Node.Group) node;
            double t = Settings.quantity(row, "temperature").value().getAsDouble();
            assertEquals(
                    Settings.quantity(row, "dG").value().getAsDouble() + Constants.GAS * t * lnQ,
                    Settings.quantity(row, "dGAtComposition").value().getAsDouble(),
                    1e-6);
            assertEquals(
                    -Settings.quantity(row, "dG").value().getAsDouble() / (Constants.GAS * t),
                    Settings.quantity(row, "lnK").value().getAsDouble(),
                    1e-12);
        }
        double there = ((Node.Quantity)
                        Settings.items(body, "crossoversAtComposition").get(0))
                .value()
                .getAsDouble();
        assertTrue(there > 600, "pressure lifts the crossover: " + there);
    }

    private static ReactionFunction invented(double[] cp, double h, double s, double uH, double uS) throws Exception {
        return ReactionFunction.of(
                List.of(new Participant(
                        1,
                        SpeciesData.of(
                                        Species.parse("H2(g)"),
                                        "x",
                                        "x",
                                        List.of(PowerSegment.from298(200, 1500, cp, h, s)))
                                .withUncertainties(java.util.OptionalDouble.of(uH), java.util.OptionalDouble.of(uS)),
                        "x")),
                200,
                1500);
    }

    @Test
    void namesACrossoverThatOnlyTouches() throws Exception {
        double[] cp = {0, 0, 60, 0, 0, 0, 0};
        // ΔH is zero at 500 K, where ΔG/T has its only turning point; ΔS is chosen so that ΔG is zero there too.
        double h = -60 * (500 - 298.15);
        double s = -60 * StrictMath.log(500 / 298.15);
        List<Root> touching = CrossoverSearch.roots(invented(cp, h, s, 0, 0));
        assertEquals(1, touching.size());
        assertEquals(Root.Kind.TANGENT, touching.get(0).kind());
        assertEquals(500, touching.get(0).kelvin(), 1e-6);
        assertEquals(2, CrossoverSearch.roots(invented(cp, h, s - 1e-4, 0, 0)).size());
        assertEquals(0, CrossoverSearch.roots(invented(cp, h, s + 1e-4, 0, 0)).size());
    }

    @Test
    void findsNoneWhereEverythingIsZero() throws Exception {
        assertEquals(List.of(), CrossoverSearch.roots(invented(new double[7], 0, 0, 0, 0)));
    }

    /** With a heat capacity the set still covers at the level: ΔH and ΔS are drawn, the set is built from what was drawn. */
    @Test
    void theSetAroundACrossoverCovers() throws Exception {
        double[] cp = {0, 0, -60, 0.03, 0, 0, 0};
        double truth =
                CrossoverSearch.roots(invented(cp, 60_000, 160, 0, 0)).get(0).kelvin();
        SplittableRandom random = new SplittableRandom(11);
        int held = 0;
        int campaigns = 2000;
        for (int i = 0; i < campaigns; i++) {
            ReactionFunction drawn =
                    invented(cp, 60_000 + 900 * random.nextGaussian(), 160 + 2 * random.nextGaussian(), 900, 2);
            double g = drawn.gibbs(truth);
            List<Root> roots = CrossoverSearch.roots(drawn);
            Interval interval =
                    new CrossoverSet(drawn, 1.959964).around(roots.get(0).kelvin(), 0.95);
            boolean inside = truth >= interval.lower().orElse(0)
                    && truth <= interval.upper().orElse(Double.POSITIVE_INFINITY);
            assertEquals(Math.abs(g) <= 1.959964 * drawn.uncertaintyOfGibbs(truth), inside, "one connected set here");
            held += inside ? 1 : 0;
        }
        // Five standard deviations of the count.
        assertEquals(0.95, (double) held / campaigns, 5 * Math.sqrt(0.95 * 0.05 / campaigns));
    }

    @Test
    void namesPhaseChangesAndJumps() throws Exception {
        double[] cp = {0, 0, 10, 0, 0, 0, 0};
        PowerSegment below = PowerSegment.from298(200, 500, cp, 5000, 8);
        PowerSegment above = PowerSegment.from298(500, 900, cp, 3000, 8);
        SpeciesData data = SpeciesData.of(Species.parse("H2(g)"), "x", "x", List.of(below, above));
        List<Root> roots = CrossoverSearch.roots(ReactionFunction.of(List.of(new Participant(1, data, "x")), 200, 900));
        assertEquals(Root.Kind.JUMP, roots.get(0).kind());
        assertEquals(500, roots.get(0).kelvin());
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "N2(g) + 3 H2(g) = 3 NH3(g) | H: 6 on the left, 9 on the right; N: 2 on the left, 3 on the right",
                "N2(g) + 3 H2(g) | an arrow or = between the sides",
                "N2(g) + 3 Hx(g) = 2 NH3(g) | \"Hx\" at character 11",
                "Xe(g) + F2(g) = XeF2(g) | No installed source has data of Xe(g)",
                "N2(s) = N2(g) | No installed source has data of N2(s), but of N2(g)",
                "H2 + 1/2 O2 = H2O | write the phase of H2O in the equation",
                "N2(g) = N2(g) | the same species on both sides"
            })
    void refusesEquationsByName(String equation, String words) throws Exception {
        refused(words, reaction(equation));
    }

    @Test
    void refusesSettingsByName() throws Exception {
        String water = "H2(g) + 1/2 O2(g) = H2O(g)";
        refused("goes beyond the data: ", reaction(water).range(new Node.Scalar(300), new Node.Scalar(9000)));
        refused("lower end", reaction(water).range(new Node.Scalar(400), new Node.Scalar(300)));
        refused("above 0 K", reaction(water).range(new Node.Scalar(-4), new Node.Scalar(300)));
        refused("\"dH\", which is not known", reaction(water).with("dH", kilojoules(1)));
        refused("has no data of H2(g); found in", reaction(water).with("source", new Node.Text("nowhere")));
        refused("standard pressure of 1 bar", reaction(water).with("standardState", new Node.Text("1 mol/L")));
        refused("lacks O2(g)", reaction(water).with("composition", group("H2", new Node.Scalar(1))));
        refused(
                "must be above zero",
                reaction(water)
                        .with(
                                "composition",
                                group("H2", new Node.Scalar(0), "O2", new Node.Scalar(1), "H2O", new Node.Scalar(1))));
        refused("Q must be above zero", reaction(water).with("composition", new Node.Scalar(-1)));
        refused(
                "must be a partial pressure",
                reaction(water)
                        .with(
                                "composition",
                                group(
                                        "H2",
                                        Node.Quantity.of(1, "mol/L"),
                                        "O2",
                                        new Node.Scalar(1),
                                        "H2O",
                                        new Node.Scalar(1))));
        refused(
                "names a species that takes no part",
                reaction(water)
                        .with(
                                "composition",
                                group(
                                        "H2",
                                        new Node.Scalar(1),
                                        "O2",
                                        new Node.Scalar(1),
                                        "H2O",
                                        new Node.Scalar(1),
                                        "N2",
                                        new Node.Scalar(1))));
        refused(
                "the unit of dHf cannot be used",
                reaction("Xe(g) = Xe(l)").with("species", group("Xe(g)", group("dHf", entropy(1), "S", entropy(1)))));
        refused("S is missing", reaction("Xe(g) = Xe(l)").with("species", group("Xe(g)", group("dHf", kilojoules(1)))));
    }

    @Test
    void flagsExtrapolationThatWasAskedFor() throws Exception {
        Section section = reaction("H2(g) + 1/2 O2(g) = H2O(g)")
                .with("source", new Node.Text("janaf"))
                .range(new Node.Scalar(300), new Node.Scalar(3000))
                .with("extrapolate", new Node.Flag(true))
                .section();
        assertEquals(Section.Outcome.DONE, section.outcome());
        assertTrue(section.cautions().containsKey("extrapolated"));
    }

    private static void refused(String words, Settings settings) throws Exception {
        Section section = settings.section();
        assertEquals(Section.Outcome.REFUSED, section.outcome(), words);
        String reason = Settings.text((Node.Group) section.body(), "reason");
        assertTrue(reason.contains(words.strip()), reason);
    }
}
