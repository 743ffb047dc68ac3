package org.saddlebook.spontaneity.internal;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Locale;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.saddlebook.api.campaign.Campaign;
import org.saddlebook.api.findings.Interval;
import org.saddlebook.api.findings.Layer;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.findings.Section;
import org.saddlebook.api.model.StandardState;
import org.saddlebook.thermo.data.api.CuratedSet;

class SpontaneityTest {
    private static Node.Quantity h(double value, double u) {
        return Node.Quantity.of(value, "kJ/mol", u);
    }

    private static Node.Quantity s(double value, double u) {
        return Node.Quantity.of(value, "J/(mol.K)", u);
    }

    @ParameterizedTest
    @CsvSource({
        "-60, 100, exergonic at every temperature",
        "-60, -100, below the crossover",
        "60, 100, above the crossover",
        "60, -100, at no temperature"
    })
    void namesTheFourCases(double enthalpy, double entropy, String expected) throws Exception {
        Node.Group body = Settings.of(h(enthalpy, 2), s(entropy, 4)).body();
        assertEquals(expected, Settings.text(body, "case"));
        assertEquals(List.of(new Node.Text(expected)), Settings.items(body, "possibleCases"));
        boolean crosses = enthalpy * entropy > 0;
        assertEquals(crosses ? "bounded" : "no crossover above 0 K", Settings.text(body, "crossoverOutcome"));
        assertEquals(crosses ? 1 : 0, Settings.items(body, "crossovers").size());
    }

    @Test
    void namesTheCasesThatRemainWhenAnEntropyMayHaveEitherSign() throws Exception {
        Node.Group body = Settings.of(h(-60, 2), s(3, 4)).body();
        assertEquals("not determined", Settings.text(body, "case"));
        assertEquals(
                List.of(new Node.Text("exergonic at every temperature"), new Node.Text("below the crossover")),
                Settings.items(body, "possibleCases"));
        assertTrue(Settings.quantity(body, "dS").cautions().contains("uncertain-sign"));
        assertFalse(Settings.quantity(body, "dH").cautions().contains("uncertain-sign"));
        assertEquals("unbounded", Settings.text(body, "crossoverOutcome"));
        Node.Quantity crossover = Settings.crossover(body);
        assertEquals(Interval.Kind.AT_LEAST, crossover.interval().orElseThrow().kind());
        assertTrue(crossover.cautions().contains("undetermined"), "no tidy number where the set is open");
        assertTrue(crossover.standardUncertainty().isEmpty());
    }

    @Test
    void leavesAllFourOpenWhenNeitherSignIsKnown() throws Exception {
        Node.Group body = Settings.of(h(0.5, 2), s(-1, 4)).body();
        assertEquals(4, Settings.items(body, "possibleCases").size());
        assertEquals("not determined", Settings.text(body, "crossoverOutcome"));
        assertEquals(
                Interval.Kind.EVERYTHING,
                Settings.crossover(body).interval().orElseThrow().kind());
    }

    @Test
    void treatsExactZerosAsWhatTheyAre() throws Exception {
        Node zeroS = Node.Quantity.of(0, "J/(mol.K)");
        Node.Group constant =
                Settings.of(Node.Quantity.of(-10, "kJ/mol"), zeroS).body();
        assertEquals("exergonic at every temperature", Settings.text(constant, "case"));
        assertEquals("no crossover above 0 K", Settings.text(constant, "crossoverOutcome"));
        Node.Group nothing = Settings.of(Node.Quantity.of(0, "kJ/mol"), zeroS).body();
        assertEquals("zero at every temperature", Settings.text(nothing, "case"));
        assertEquals(List.of(), Settings.items(nothing, "crossovers"));
        Node.Group onlyEnthalpy = Settings.of(h(10, 1), zeroS).body();
        assertEquals("no crossover above 0 K", Settings.text(onlyEnthalpy, "crossoverOutcome"));
        Node.Group perhaps = Settings.of(h(1, 1), zeroS).body();
        assertEquals("not determined", Settings.text(perhaps, "crossoverOutcome"));
    }

    @Test
    void usesStudentsDistributionWhenDegreesOfFreedomAreStated() throws Exception {
        Node.Group body =
                Settings.of(h(62, 1), s(160, 2)).with("degreesOfFreedom", 4).body();
        Interval interval = Settings.quantity(body, "dH").interval().orElseThrow();
        assertEquals("t", interval.method());
        // 2.776 is Student's t at 97.5 % with 4 degrees of freedom (standard tables).
        assertEquals(62_000 + 2.776 * 1000, interval.upper().getAsDouble(), 1);
    }

    @Test
    void givesTheSameInAnyUnit() throws Exception {
        Node.Group one =
                Settings.of(h(62, 1.8), s(160, 5)).with("correlation", 0.5).body();
        Node.Group two = Settings.of(
                        Node.Quantity.of(62 / 4.184, "kcal/mol", 1.8 / 4.184),
                        Node.Quantity.of(0.16, "kJ/(mol.K)", 0.005))
                .with("covariance", 0.5 * 1800 * 5)
                .body();
        Node.Quantity first = Settings.crossover(one);
        Node.Quantity second = Settings.crossover(two);
        assertEquals(1, second.value().getAsDouble() / first.value().getAsDouble(), 1e-12);
        assertEquals(
                1,
                second.interval().orElseThrow().upper().getAsDouble()
                        / first.interval().orElseThrow().upper().getAsDouble(),
                1e-12);
    }

    @Test
    void saysWhatItTookForGranted() throws Exception {
        Section section =
                Settings.of(h(62, 1.8), Node.Quantity.of(160, "J/(mol.K)")).section();
        assertTrue(section.cautions().containsKey(SpontaneityCautions.NO_UNCERTAINTY));
        assertTrue(section.cautions().containsKey(SpontaneityCautions.NO_STANDARD_STATE));
        assertTrue(section.cautions().containsKey("allowed-is-not-fast"));
        assertTrue(section.cautions().containsKey("at-stated-composition"));
        assertFalse(section.cautions().containsKey("assumed-independent"), "only one of them is uncertain");
        Section both = Settings.of(h(62, 1.8), s(160, 5)).section();
        assertTrue(both.cautions().containsKey("assumed-independent"));
        Section correlated =
                Settings.of(h(62, 1.8), s(160, 5)).with("correlation", 0).section();
        assertFalse(correlated.cautions().containsKey("assumed-independent"));
    }

    @Test
    void printsTheStandardStateWhereOneIsStated() throws Exception {
        Campaign campaign = Settings.of(h(62, 1.8), s(160, 5)).campaign();
        Campaign bar = campaign.withChoices(campaign.choices().withStandard(StandardState.ONE_BAR));
        Section section = Settings.section(bar);
        assertEquals("1 bar", Settings.text((Node.Group) section.body(), "standardState"));
        assertFalse(section.cautions().containsKey(SpontaneityCautions.NO_STANDARD_STATE));
        Node.Group own = Settings.of(h(62, 1.8), s(160, 5))
                .with("standardState", new Node.Text("1 mol/L"))
                .body();
        assertEquals("1 mol/L", Settings.text(own, "standardState"));
    }

    @ParameterizedTest
    @CsvSource({"62, 160_000", "62, 0.16", "0.062, 160", "-62, 3000"})
    void doubtsSizesThatLookLikeMixedUnits(String enthalpy, String entropy) throws Exception {
        Section section = Settings.of(
                        Node.Quantity.of(Double.parseDouble(enthalpy), "kJ/mol"),
                        Node.Quantity.of(Double.parseDouble(entropy.replace("_", "")), "J/(mol.K)"))
                .section();
        assertTrue(section.cautions().containsKey(SpontaneityCautions.UNITS_DOUBTFUL));
    }

    @Test
    void drawsLineBandAndCrossover() throws Exception {
        Node.Group body = Settings.of(h(62, 1.8), s(160, 5)).body();
        Node.Figure figure = (Node.Figure) Settings.items(body, "figures").get(0);
        assertEquals(
                List.of(
                        Layer.Kind.CONFIDENCE_BAND,
                        Layer.Kind.HORIZONTAL_MARK,
                        Layer.Kind.LINE,
                        Layer.Kind.VERTICAL_MARK),
                figure.layers().stream().map(Layer::kind).toList());
        assertEquals(387.5, figure.layers().get(3).x()[0], 1e-9);
        Layer line = figure.layers().get(2);
        assertEquals(62 - line.x()[0] * 0.16, line.y()[0], 1e-9);
        assertTrue(figure.cautions().contains("allowed-is-not-fast"));
    }

    @Test
    void looksAtTheTemperaturesAskedFor() throws Exception {
        Campaign campaign = Settings.of(h(62, 1.8), s(160, 5)).campaign();
        Campaign asked = campaign.withChoices(campaign.choices().withTargetsKelvin(List.of(611.5, 1e300)));
        Node.Group body = (Node.Group) Settings.section(asked).body();
        assertTrue(Settings.items(body, "dG").stream()
                .map(row -> Settings.quantity((Node.Group) row, "temperature"))
                .anyMatch(kelvin -> kelvin.value().getAsDouble() == 611.5));
        assertTrue(Settings.items(body, "notes").contains(new Node.Text("Temperatures above 100000 K are left out.")));
    }

    @Test
    void neverSaysThatSomethingIsSafe() throws Exception {
        for (Settings settings : List.of(
                Settings.of(h(-62, 1.8), s(160, 5)),
                Settings.of(h(62, 1.8), s(-160, 5)),
                Settings.of(h(0, 1.8), s(0, 5)))) {
            assertFalse(settings.section().toString().toLowerCase(Locale.ROOT).contains("safe"));
        }
    }

    @Test
    void staysSilentWithoutSettings() {
        assertFalse(new SpontaneityComponent(List.of(CuratedSet.source())).appliesTo(Campaign.titled("invented")));
        assertTrue(new SpontaneityComponent(List.of(CuratedSet.source()))
                .appliesTo(Settings.of(h(1, 1), s(1, 1)).campaign()));
    }

    @Test
    void refusesByName() throws Exception {
        refused("dS is missing", new Settings().with("dH", h(62, 1.8)));
        refused("dH is missing", new Settings().with("dS", s(160, 5)));
        refused("dH has no unit", Settings.of(new Node.Scalar(62), s(160, 5)));
        refused("unit of dH", Settings.of(Node.Quantity.of(62, "kJ"), s(160, 5)));
        refused("unit of dS", Settings.of(h(62, 1), Node.Quantity.of(160, "J/mol")));
        refused("unit of dS", Settings.of(h(62, 1), Node.Quantity.of(160, "furlong")));
        refused("between -1 and 1", Settings.of(h(62, 1), s(160, 5)).with("correlation", 1.01));
        refused(
                "covariance of dH and dS is larger",
                Settings.of(h(62, 1), s(160, 5)).with("covariance", -5001));
        refused(
                "state one of them",
                Settings.of(h(62, 1), s(160, 5)).with("covariance", 0).with("correlation", 0));
        refused(
                "needs the standard uncertainty of both",
                Settings.of(h(62, 1), Node.Quantity.of(160, "J/(mol.K)")).with("correlation", 0.5));
        refused("degrees of freedom", Settings.of(h(62, 1), s(160, 5)).with("degreesOfFreedom", 0));
        refused("\"corelation\"", Settings.of(h(62, 1), s(160, 5)).with("corelation", 0.5));
        refused("lower end", Settings.of(h(62, 1), s(160, 5)).range(new Node.Scalar(400), new Node.Scalar(300)));
        refused("above 0 K", Settings.of(h(62, 1), s(160, 5)).range(new Node.Scalar(-1), new Node.Scalar(300)));
        refused(
                "unit of the range",
                Settings.of(h(62, 1), s(160, 5)).range(Node.Quantity.of(300, "s"), new Node.Scalar(300)));
        refused("lower and upper", Settings.of(h(62, 1), s(160, 5)).with("range", new Node.Group(Map.of())));
        refused("standard state", Settings.of(h(62, 1), s(160, 5)).with("standardState", new Node.Text("1 kg")));
        refused("beyond anything", Settings.of(h(1e300, 1), s(160, 5)));
        refused(
                "standard uncertainty in its unit",
                Settings.of(h(62, 1).withInterval(Interval.between(1, 2, 0.95, "stated")), s(160, 5)));
    }

    @Test
    void refusesSettingsThatAreNoGroup() throws Exception {
        Section section =
                Settings.section(Campaign.titled("invented").withSetting("spontaneity", new Node.Text("62 kJ/mol")));
        assertEquals(Section.Outcome.REFUSED, section.outcome());
    }

    private static void refused(String words, Settings settings) throws Exception {
        Section section = settings.section();
        assertEquals(Section.Outcome.REFUSED, section.outcome(), words);
        String reason = Settings.text((Node.Group) section.body(), "reason");
        assertTrue(reason.contains(words), reason);
        assertTrue(reason.endsWith("."), reason);
    }
}
