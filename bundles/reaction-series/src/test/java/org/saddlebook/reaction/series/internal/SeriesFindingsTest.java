package org.saddlebook.reaction.series.internal;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.saddlebook.api.findings.Interval;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.findings.Section;
import org.saddlebook.estimation.api.Fieller;

/** Outcomes of the comparison of reactions; invented numbers. */
class SeriesFindingsTest {
    private static Reaction simulated(
            String name, double energy, double lnAt, double atKelvin, double s, Random random) {
        double[][] rows = new double[6][];
        for (int i = 0; i < rows.length; i++) {
            double t = 30 + 8 * i;
            double x = 1 / (t + 273.15) - 1 / atKelvin;
            rows[i] = new double[] {t, StrictMath.exp(lnAt - energy / 8.314462618 * x + s * random.nextGaussian())};
        }
        return Data.reaction(name, "s-1", rows);
    }

    @Test
    void saysNotDistinguishableWhereItIsSo() {
        Random random = new Random(1);
        List<Reaction> same =
                List.of(simulated("a", 80_000, -7, 330, 0.05, random), simulated("b", 80_000, -7, 330, 0.05, random));
        Node.Group body = Data.body(SeriesFindings.section(same, List.of(), 0.95));
        Node.Group ratio = Data.item(body, "ratios", 0);
        assertEquals("not-distinguishable", Data.text(ratio, "outcome"));
        assertTrue(Data.text(ratio, "sentence").contains("not distinguishable"), Data.text(ratio, "sentence"));
        assertEquals("best determined", Data.text(ratio, "temperatureChosen"));
    }

    @Test
    void proposesAMixUpBetweenTwoTablesOfOneReaction() {
        Random random = new Random(2);
        List<Reaction> same = List.of(
                simulated("first", 80_000, -7, 330, 0.03, random),
                simulated("second", 80_000, -7 + StrictMath.log(60), 330, 0.03, random));
        Node.Group ratio = Data.item(Data.body(SeriesFindings.section(same, List.of(), 0.95)), "ratios", 0);
        assertEquals("unit-min-1", Data.text(ratio, "mixUp"));
        assertTrue(Data.text(ratio, "sentence").contains("34.0 J/(mol K)"), Data.text(ratio, "sentence"));
    }

    @Test
    void givesNoRatioWhereTheRangesDoNotOverlapUnlessAsked() {
        Reaction cold = Data.reaction("cold", "s-1", new double[][] {{0, 1e-4}, {10, 3e-4}, {20, 9e-4}});
        Reaction hot = Data.reaction("hot", "s-1", new double[][] {{40, 1e-4}, {50, 3.1e-4}, {60, 8.8e-4}});
        Node.Group ratio =
                Data.item(Data.body(SeriesFindings.section(List.of(cold, hot), List.of(), 0.95)), "ratios", 0);
        assertEquals("no-common-range", Data.text(ratio, "outcome"));
        Section asked = SeriesFindings.section(List.of(cold, hot), List.of(303.15), 0.95);
        Node.Quantity value = Data.quantity(Data.item(Data.body(asked), "ratios", 0), "ratio");
        assertEquals(List.of("extrapolated", "same-mechanism"), value.cautions());
        assertTrue(asked.cautions().containsKey("extrapolated"));
    }

    @Test
    void refusesWhatHasNoScatter() {
        Reaction two = Data.reaction("two", "s-1", new double[][] {{0, 1e-4}, {10, 3e-4}});
        Section section = SeriesFindings.section(List.of(two, two), List.of(), 0.95);
        assertEquals(Section.Outcome.REFUSED, section.outcome());
        Reaction stated = Data.reaction("stated", "s-1", new double[][] {{0, 1e-4, 1e-6}, {10, 3e-4, 3e-6}});
        assertEquals(
                Section.Outcome.DONE,
                SeriesFindings.section(List.of(stated, stated), List.of(), 0.95).outcome());
    }

    @Test
    void crossingOfTwoLinesIsFiellersSet() {
        Random random = new Random(3);
        for (int i = 0; i < 40; i++) {
            double energy = i % 2 == 0 ? 60_000 : 79_000;
            List<Reaction> two = List.of(
                    simulated("a", 80_000, -7, 350, 0.05, random), simulated("b", energy, -7, 350, 0.05, random));
            JointFit fit = JointFit.of(two).orElseThrow();
            Interval joint = new CommonPoint(fit.lines()).set(fit.scale().limit(0.95), 0.95);
            ReactionLine a = fit.lines().get(0);
            ReactionLine b = fit.lines().get(1);
            double s2 = fit.scale().variance();
            double slope = a.slope() - b.slope();
            double intercept = a.at(0) - b.at(0);
            double vSlope = s2 * (1 / a.spread() + 1 / b.spread());
            double vIntercept = s2 * (a.variance(0) + b.variance(0));
            double both = -s2 * (a.meanX() / a.spread() + b.meanX() / b.spread());
            Interval fieller = TemperatureSet.of(
                    Fieller.set(
                            -slope,
                            intercept,
                            vSlope,
                            -both,
                            vIntercept,
                            fit.scale().quantile(0.95)),
                    0.95);
            assertEquals(fieller.kind(), joint.kind(), fieller + " " + joint);
            if (fieller.lower().isPresent()) {
                assertEquals(fieller.lower().getAsDouble(), joint.lower().getAsDouble(), 1e-6 * 1000);
            }
            if (fieller.upper().isPresent()) {
                assertEquals(1, joint.upper().getAsDouble() / fieller.upper().getAsDouble(), 1e-6);
            }
        }
    }

    @Test
    void setsOfTheCommonTemperatureCoverAsStated() {
        Random random = new Random(4);
        int covered = 0;
        int campaigns = 600;
        for (int i = 0; i < campaigns; i++) {
            List<Reaction> three = new ArrayList<>();
            for (int r = 0; r < 3; r++) {
                three.add(simulated("r" + r, 70_000 + 8_000 * r, -5, 380, 0.05, random));
            }
            JointFit fit = JointFit.of(three).orElseThrow();
            CommonPoint point = new CommonPoint(fit.lines());
            covered +=
                    point.costAt(1.0 / 380) <= point.leastCost() + fit.scale().limit(0.95) ? 1 : 0;
        }
        // Binomial, three standard deviations.
        assertEquals(0.95, covered / (double) campaigns, 3 * Math.sqrt(0.95 * 0.05 / campaigns));
    }

    @Test
    void namesEverySetOfAnInversionTemperature() {
        assertEquals(Interval.Kind.BETWEEN, set(300, 1, 1, 0.0001).kind());
        assertEquals(Interval.Kind.NONE, set(-300, 1, 1, 0.0001).kind());
        assertEquals(Interval.Kind.EVERYTHING, set(1, 0.1, 100, 1).kind());
        assertEquals(Interval.Kind.AT_LEAST, set(300, 0.1, 25, 0.04).kind());
        assertEquals("not determined: the data exclude no temperature", Words.temperatures(set(1, 0.1, 100, 1)));
        assertEquals("none above 0 K", Words.temperatures(set(-300, 1, 1, 0.0001)));
    }

    private static Interval set(double a, double b, double vaa, double vbb) {
        return TemperatureSet.of(Fieller.set(a, b, vaa, 0, vbb, 2), 0.95);
    }

    @Test
    void drawsEveryReaction() {
        Node.Group body = Data.body(SeriesFindings.section(List.of(Data.PLAIN, Data.ZINC, Data.TIN), List.of(), 0.95));
        Node figure = ((Node.Items) body.get("figures").orElseThrow()).items().get(0);
        assertEquals(9, ((Node.Figure) figure).layers().size());
        assertTrue(Data.text(Data.item(body, "common", 2), "sentence").contains("bounded"));
    }
}
