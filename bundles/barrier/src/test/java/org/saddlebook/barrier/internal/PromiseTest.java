package org.saddlebook.barrier.internal;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Path;
import java.security.SecureRandom;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Locale;
import java.util.OptionalDouble;
import java.util.SplittableRandom;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.saddlebook.api.campaign.RatePoint;

/** Whether the next measurement narrows the interval as promised, and gains over even spacing what theory says. */
class PromiseTest {
    private static final Path SAMPLE = Path.of("target", "checks", "next-measurement-sample.md");
    private static final Path TABLE = Path.of("target", "checks", "next-measurement.md");
    private static final int MORE = 6;

    private record Outcome(
            int n, boolean equalCost, double median, double low, double high, double theory, double simulated) {
        String row() {
            return String.format(
                    Locale.ROOT,
                    "| %d | %s | %.3f | %.2f to %.2f | %.3f | %.3f |",
                    n,
                    equalCost ? "equal" : "half-life",
                    median,
                    low,
                    high,
                    theory,
                    simulated);
        }
    }

    private static NextMeasurement next(FittedLaw law, boolean equalCost) {
        return new NextMeasurement(
                law,
                0.95,
                1e-6,
                false,
                new NextMeasurement.Allowed(
                        OptionalDouble.of(SimulatedCampaigns.COLD),
                        OptionalDouble.of(SimulatedCampaigns.HOT),
                        equalCost));
    }

    private static double halfWidth(FittedLaw law) {
        return law.lnRate(SimulatedCampaigns.TARGET).halfWidth(0.95, law.degreesOfFreedom());
    }

    private static Outcome run(int n, boolean equalCost, int campaigns, SplittableRandom random) {
        double[] ratios = new double[campaigns];
        double chosenSquares = 0;
        double evenSquares = 0;
        double theory = 0;
        double truth = SimulatedCampaigns.truth(SimulatedCampaigns.TARGET, 0);
        for (int i = 0; i < campaigns; i++) {
            List<RatePoint> first = SimulatedCampaigns.runs(SimulatedCampaigns.even(n), 0.05, 0, random);
            FittedLaw law = SimulatedCampaigns.fit("arrhenius", first);
            NextMeasurement next = next(law, equalCost);
            NextMeasurement.Plan plan = next.plan(SimulatedCampaigns.TARGET);
            double[] there = new double[plan.repeats()];
            Arrays.fill(there, plan.kelvin());
            ratios[i] = halfWidth(with(first, there, random)) / plan.halfWidth();
            double[] chosen = next.sequence(SimulatedCampaigns.TARGET, MORE);
            FittedLaw byPlan = with(first, chosen, random);
            FittedLaw byEven = with(first, SimulatedCampaigns.even(MORE), random);
            chosenSquares += square(byPlan.lnRate(SimulatedCampaigns.TARGET).value() - truth);
            evenSquares += square(byEven.lnRate(SimulatedCampaigns.TARGET).value() - truth);
            theory = Math.sqrt(unscaled(byEven) / unscaled(byPlan));
        }
        Arrays.sort(ratios);
        return new Outcome(
                n,
                equalCost,
                ratios[campaigns / 2],
                ratios[campaigns / 20],
                ratios[campaigns - 1 - campaigns / 20],
                theory,
                Math.sqrt(evenSquares / chosenSquares));
    }

    private static double unscaled(FittedLaw law) {
        double[] gradient = new double[2];
        law.law().lnRate(SimulatedCampaigns.TARGET, law.fit().parameters(), gradient);
        return law.fit().predictionVariance(gradient);
    }

    private static FittedLaw with(List<RatePoint> first, double[] more, SplittableRandom random) {
        List<RatePoint> all = new ArrayList<>(first);
        all.addAll(SimulatedCampaigns.runs(more, 0.05, 0, random));
        return SimulatedCampaigns.fit("arrhenius", all);
    }

    private static double square(double x) {
        return x * x;
    }

    private static List<Outcome> all(int campaigns, long seed) {
        List<Outcome> outcomes = new ArrayList<>();
        for (boolean equalCost : new boolean[] {true, false}) {
            for (int n : new int[] {4, 5, 6, 8}) {
                outcomes.add(run(n, equalCost, campaigns, new SplittableRandom(seed + outcomes.size())));
            }
        }
        return outcomes;
    }

    private static void write(Path path, List<Outcome> outcomes, int campaigns, long seed) throws IOException {
        List<String> rows = new ArrayList<>();
        outcomes.forEach(outcome -> rows.add(outcome.row()));
        SimulatedCampaigns.write(
                path,
                "Next measurement: promise and gain",
                campaigns + " campaigns for each row, seed " + seed
                        + ": Arrhenius law of 100 kJ/mol, n even temperatures from 40 to 80 °C, 5 % scatter, target 25 °C,"
                        + " further runs between 40 and 80 °C. The half-width after the runs that were advised over the"
                        + " promised one; and by what factor the standard error after six further runs is smaller than with"
                        + " six evenly spaced ones, as the information matrix has it and as simulated.",
                "| n | cost of a run | realised over promised, median | 5 to 95 % | gain by theory | gain simulated |",
                rows);
    }

    private static void check(List<Outcome> outcomes, double margin, long seed) {
        for (Outcome outcome : outcomes) {
            String what = outcome.row() + " seed " + seed;
            assertTrue(outcome.median() > 0.9 && outcome.median() < 1.1, what);
            assertTrue(outcome.theory() > 1, what);
            assertEquals(outcome.theory(), outcome.simulated(), margin * outcome.theory(), what);
        }
    }

    @Test
    void aSampleOfNewCampaignsKeepsThePromise() throws IOException {
        long seed = new SecureRandom().nextInt(1_000_000_000);
        System.out.println("next measurement sample, seed " + seed);
        List<Outcome> outcomes = all(1000, seed);
        write(SAMPLE, outcomes, 1000, seed);
        // A ratio of two standard deviations of 1,000 each has a standard error of 3 %.
        check(outcomes, 0.2, seed);
    }

    @Test
    @Tag("long")
    void twentyThousandCampaignsKeepThePromise() throws IOException {
        long seed = 20_260_404;
        List<Outcome> outcomes = all(20_000, seed);
        write(TABLE, outcomes, 20_000, seed);
        check(outcomes, 0.04, seed);
    }
}
