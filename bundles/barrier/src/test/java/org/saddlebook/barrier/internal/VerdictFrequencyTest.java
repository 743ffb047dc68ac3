package org.saddlebook.barrier.internal;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Path;
import java.security.SecureRandom;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import java.util.Set;
import java.util.SplittableRandom;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;

/** How often each verdict of the comparison falls when it is known whether the law is straight. */
class VerdictFrequencyTest {
    private static final Path SAMPLE = Path.of("target", "checks", "verdicts-sample.md");
    private static final Path TABLE = Path.of("target", "checks", "verdicts.md");

    /** What came out of the campaigns of one kind. */
    private static final class Count {
        private final int n;
        private final double scatter;
        private final double heatCapacity;
        private final int all;
        private int straight;
        private int curved;
        private int criterion;
        private int criterionThere;

        Count(int n, double scatter, double heatCapacity, int all) {
            this.n = n;
            this.scatter = scatter;
            this.heatCapacity = heatCapacity;
            this.all = all;
        }

        String row() {
            return "| " + (heatCapacity == 0 ? "straight" : "ΔCp‡ −300") + " | " + (scatter == 0.05 ? "5 %" : "0.2 %")
                    + " | " + n + " | " + SimulatedCampaigns.percent(straight, all) + " | "
                    + SimulatedCampaigns.percent(curved, all) + " | "
                    + SimulatedCampaigns.percent(all - straight - curved, all) + " | "
                    + (criterionThere == 0 ? "absent" : SimulatedCampaigns.percent(criterion, criterionThere)) + " |";
        }
    }

    private static List<Count> run(int campaigns, long seed) {
        List<Count> counts = new ArrayList<>();
        for (double heatCapacity : new double[] {0, -300}) {
            for (double scatter : new double[] {0.05, 0.002}) {
                for (int n : new int[] {5, 6, 8, 12}) {
                    Count count = new Count(n, scatter, heatCapacity, campaigns);
                    SplittableRandom random = new SplittableRandom(seed + 1000L * counts.size());
                    for (int i = 0; i < campaigns; i++) {
                        one(count, random);
                    }
                    counts.add(count);
                }
            }
        }
        return counts;
    }

    private static void one(Count count, SplittableRandom random) {
        var points =
                SimulatedCampaigns.runs(SimulatedCampaigns.even(count.n), count.scatter, count.heatCapacity, random);
        FittedLaw line = SimulatedCampaigns.fit("arrhenius", points);
        FittedLaw bent = SimulatedCampaigns.fit("modified-arrhenius", points);
        Set<String> left = new Comparison(List.of(line, bent), 0.95, List.of(SimulatedCampaigns.TARGET)).candidates();
        count.straight += left.equals(Set.of("arrhenius")) ? 1 : 0;
        count.curved += left.equals(Set.of("modified-arrhenius")) ? 1 : 0;
        OptionalDouble ofLine = new FitStatistics(line).aicc();
        OptionalDouble ofBent = new FitStatistics(bent).aicc();
        if (ofLine.isPresent() && ofBent.isPresent()) {
            count.criterionThere++;
            count.criterion += ofLine.getAsDouble() < ofBent.getAsDouble() ? 1 : 0;
        }
    }

    private static void write(Path path, List<Count> counts, int campaigns, long seed) throws IOException {
        List<String> rows = new ArrayList<>();
        counts.forEach(count -> rows.add(count.row()));
        SimulatedCampaigns.write(
                path,
                "Which law: how often each verdict falls",
                campaigns + " campaigns for each row, seed " + seed
                        + ": 100 kJ/mol, n even temperatures from 40 to 80 °C, lognormal scatter, target 25 °C. Per cent of"
                        + " campaigns. The last column is what the criterion alone would have said.",
                "| truth | scatter | n | straight suffices | curved | cannot be told apart | AICc lower for the straight law |",
                rows);
    }

    private static void check(List<Count> counts, double margin, long seed) {
        for (Count count : counts) {
            String what = count.row() + " seed " + seed;
            if (count.scatter == 0.05) {
                // Hardly ever: only where s happens to be so small that the interval excludes curvature that matters.
                assertTrue(count.straight <= 0.02 * count.all, what);
            }
            if (count.heatCapacity == 0) {
                // A 95 % interval excludes the truth in 5 % of campaigns.
                assertTrue(count.curved <= (0.05 + margin) * count.all, what);
            }
            if (count.heatCapacity == 0 && count.scatter == 0.002 && count.n == 12) {
                assertTrue(count.straight > 0.5 * count.all, what);
            }
            if (count.heatCapacity != 0 && count.scatter == 0.002) {
                assertEquals(0, count.straight, what);
            }
            if (count.heatCapacity != 0 && count.scatter == 0.05 && count.n == 6) {
                assertTrue(count.criterion > 0.97 * count.criterionThere, what);
            }
        }
    }

    @Test
    void aSampleOfNewCampaignsIsJudgedAsStated() throws IOException {
        long seed = new SecureRandom().nextInt(1_000_000_000);
        System.out.println("verdicts sample, seed " + seed);
        List<Count> counts = run(1000, seed);
        write(SAMPLE, counts, 1000, seed);
        check(counts, 0.05, seed);
    }

    @Test
    @Tag("long")
    void noCampaignIsCalledStraightOnTheStrengthOfTheCriterion() throws IOException {
        long seed = 20_260_403;
        List<Count> counts = run(20_000, seed);
        write(TABLE, counts, 20_000, seed);
        check(counts, 0.01, seed);
    }
}
