package org.saddlebook.barrier.internal;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.SplittableRandom;
import org.saddlebook.api.campaign.ErrorModel;
import org.saddlebook.api.campaign.RatePoint;
import org.saddlebook.api.campaign.RateTable;
import org.saddlebook.api.model.RateContext;

/** Campaigns drawn from a known law: 100 kJ/mol at 60 degrees Celsius, even temperatures from 40 to 80, lognormal scatter. */
final class SimulatedCampaigns {
    static final double GAS = 8.31446261815324;
    static final double COLD = 313.15;
    static final double HOT = 353.15;
    static final double TARGET = 298.15;
    static final double MIDDLE = 333.15;

    private SimulatedCampaigns() {}

    /** ln k of the law; a heat capacity of activation bends it about the middle. */
    static double truth(double kelvin, double heatCapacity) {
        double u = kelvin / MIDDLE;
        return -7 - 100_000 / GAS * (1 / kelvin - 1 / MIDDLE) + heatCapacity / GAS * (StrictMath.log(u) + 1 / u - 1);
    }

    static double[] even(int n) {
        double[] kelvin = new double[n];
        for (int i = 0; i < n; i++) {
            kelvin[i] = COLD + (HOT - COLD) * i / (n - 1);
        }
        return kelvin;
    }

    static List<RatePoint> runs(double[] kelvin, double scatter, double heatCapacity, SplittableRandom random) {
        List<RatePoint> points = new ArrayList<>();
        for (double t : kelvin) {
            points.add(RatePoint.of(t, StrictMath.exp(truth(t, heatCapacity) + scatter * random.nextGaussian())));
        }
        return points;
    }

    static FittedLaw fit(String id, List<RatePoint> points) {
        return (FittedLaw) LawFitter.fit(
                Bench.models().get(id).model(),
                RateContext.of(Bench.PER_SECOND, 1),
                Measurements.of(new RateTable(Bench.PER_SECOND, 1, points), ErrorModel.CONSTANT_RELATIVE),
                () -> {});
    }

    /** A fragment of the checks: heading, sentences, table. */
    static void write(Path path, String heading, String text, String head, List<String> rows) throws IOException {
        StringBuilder out = new StringBuilder("## " + heading + "\n\n" + text + "\n\n" + head + "\n|");
        for (int i = 1; i < head.chars().filter(c -> c == '|').count(); i++) {
            out.append("---|");
        }
        out.append('\n');
        for (String row : rows) {
            out.append(row).append('\n');
        }
        Files.createDirectories(path.getParent());
        Files.write(path, out.toString().getBytes(StandardCharsets.UTF_8));
    }

    static String percent(int part, int whole) {
        return String.format(Locale.ROOT, "%.1f", 100.0 * part / whole);
    }
}
