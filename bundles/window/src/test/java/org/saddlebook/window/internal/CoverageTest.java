package org.saddlebook.window.internal;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.SplittableRandom;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.saddlebook.api.campaign.Campaign;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.findings.Section;
import org.saddlebook.presentation.api.Rounding;
import org.saddlebook.testkit.api.ImmediateTask;

/**
 * Simulated campaigns with known truth: the temperature at which all limits hold with probability p lies beyond the true end
 * of the window in a share p of campaigns. A window with a cold end set by time and a hot one by ΔG; invented numbers.
 */
class CoverageTest {
    private static final double LN_A = 24.5;
    private static final double EA = 90_000;
    private static final double DH = -60_000;
    private static final double DS = -165;
    private static final double UH = 1500;
    private static final double US = 4;
    private static final double R = 0.9;
    private static final double SCATTER = 0.05;
    private static final double[] KELVIN = {313.15, 323.15, 333.15, 343.15, 353.15};
    private static final int QUICK = 300;
    private static final int LONG = 20_000;

    /** True ends: 95 % within 10 h; ΔG = 0. */
    private static final double TRUE_LOWER = EA / Bench.R / (LN_A - StrictMath.log(-StrictMath.log(0.05) / 36_000));

    private static final double TRUE_UPPER = DH / DS;

    /** In what share of campaigns the end at 95, 50 and 5 % lies inside the true window. */
    @SuppressWarnings("ArrayRecordComponent") // compared by nobody
    private record Shares(double[] lower, double[] upper, double whole) {}

    @Test
    void endsAreMissedAtTheStatedRate() {
        Shares shares = simulate(QUICK, 2000, 20);
        // Five standard deviations of the count, and the grain of 2000 draws.
        check(shares, 5 * Math.sqrt(0.25 / QUICK), 5 * Math.sqrt(0.05 * 0.95 / QUICK) + 0.005);
    }

    @Test
    @Tag("long")
    void endsAreMissedAtTheStatedRateWithinOnePerCent() throws IOException {
        Shares shares = simulate(LONG, 4000, 21);
        StringBuilder page = new StringBuilder("## Ends of the operating window\n\n")
                .append(LONG)
                .append(" simulated campaigns of five runs (scatter 5 %, scale estimated), ΔH and ΔS with stated")
                .append(" uncertainties; cold end by time, hot end by ΔG. Share of campaigns in which the end at a")
                .append(" probability lies inside the true window; the probability itself is expected.\n\n")
                .append("| probability | cold end | hot end |\n|---|---|---|\n");
        double[] levels = {0.95, 0.5, 0.05};
        for (int i = 0; i < levels.length; i++) {
            page.append("| ")
                    .append(Rounding.decimals(levels[i], 2))
                    .append(" | ")
                    .append(Rounding.decimals(shares.lower()[i], 4))
                    .append(" | ")
                    .append(Rounding.decimals(shares.upper()[i], 4))
                    .append(" |\n");
        }
        page.append("\nWhole interval inside the true window: ")
                .append(Rounding.decimals(shares.whole(), 4))
                .append(" (two independent ends: 0.9025 expected).\n");
        Path file = Path.of("target", "checks", "window.md");
        Files.createDirectories(file.getParent());
        Files.writeString(file, page, StandardCharsets.UTF_8);
        check(shares, 0.01, 0.01);
        assertEquals(0.9025, shares.whole(), 0.01);
    }

    private static void check(Shares shares, double atHalf, double atEnds) {
        double[] levels = {0.95, 0.5, 0.05};
        for (int i = 0; i < levels.length; i++) {
            double bound = i == 1 ? atHalf : atEnds;
            assertEquals(levels[i], shares.lower()[i], bound, "cold end at " + levels[i]);
            assertEquals(levels[i], shares.upper()[i], bound, "hot end at " + levels[i]);
        }
    }

    private static Shares simulate(int campaigns, int draws, long seed) {
        SplittableRandom random = new SplittableRandom(seed);
        Bench bench = Bench.arrhenius();
        double[] lower = new double[3];
        double[] upper = new double[3];
        double whole = 0;
        for (int c = 0; c < campaigns; c++) {
            double[] errors = new double[KELVIN.length];
            for (int i = 0; i < errors.length; i++) {
                errors[i] = SCATTER * random.nextGaussian();
            }
            double first = random.nextGaussian();
            double second = R * first + Math.sqrt(1 - R * R) * random.nextGaussian();
            Campaign campaign = Bench.campaign("1/s", LN_A, EA, KELVIN, errors)
                    .withSetting(
                            "spontaneity",
                            Bench.group(
                                    "dH", Bench.quantity(DH + UH * first, "J/mol", UH),
                                    "dS", Bench.quantity(DS + US * second, "J/(mol.K)", US),
                                    "correlation", R))
                    .withSetting(
                            "window",
                            Bench.group(
                                    "limits",
                                    List.of(
                                            Bench.group("kind", "time", "conversion", 0.95, "within", "10 h"),
                                            Bench.group("kind", "allowed")),
                                    "range",
                                    Bench.group("lower", "290 K", "upper", "420 K"),
                                    "draws",
                                    draws));
            Section section = bench.window(campaign, ImmediateTask.seeded(c));
            Node interval = Bench.at(section.body(), "intervals", 0);
            boolean both = true;
            both &= count(interval, "lowerEnd", lower, 1);
            both &= count(interval, "upperEnd", upper, -1);
            whole += both ? 1.0 / campaigns : 0;
        }
        for (int i = 0; i < 3; i++) {
            lower[i] /= campaigns;
            upper[i] /= campaigns;
        }
        return new Shares(lower, upper, whole);
    }

    /** Counts the ends that lie inside the true window; whether the one at the level does. */
    private static boolean count(Node interval, String end, double[] counts, int sign) {
        Node.Table crossings = (Node.Table) Bench.at(interval, end, "crossings");
        assertEquals(3, crossings.rows().size(), "every crossing must lie in the range");
        double truth = sign > 0 ? TRUE_LOWER : TRUE_UPPER;
        boolean first = false;
        for (int i = 0; i < 3; i++) {
            boolean inside = sign * (Bench.number(crossings.rows().get(i).get(1)) - truth) >= 0;
            counts[i] += inside ? 1 : 0;
            first |= i == 0 && inside;
        }
        return first;
    }
}
