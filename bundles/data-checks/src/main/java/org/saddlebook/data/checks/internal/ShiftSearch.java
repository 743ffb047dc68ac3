package org.saddlebook.data.checks.internal;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import org.saddlebook.data.checks.api.MixUp;

/**
 * Weighs every explanation of a table: nothing wrong; one row off for a reason of its own; a block of rows shifted by a
 * mix-up of k; a block, or all of it, with temperatures on another scale. Many explanations are tried, so each gets only
 * its share of the small prior probability of a mistake: that is the correction for multiple comparisons.
 */
final class ShiftSearch {
    private static final double CLEAN = 0.75;
    private static final double ODD_ROW = 0.05;
    private static final double MIXED_RATE = 0.15;
    private static final double MIXED_TEMPERATURE = 0.05;

    /** Sizes of an odd row, ln, and how common they are: half as common per 0.2 (common practice, no source). */
    private static final double[] ODD = {0.15, 0.3, 0.45, 0.6, 0.8, 1.1, 1.5, 2.2, 3};

    private static final double ODD_HALF = 0.2;

    /** Rate constants below this are rare, K, and how rare (common practice, no source). */
    private static final double COLD = 150;

    private static final double COLD_SHARE = 0.03;

    private final List<Row> rows;
    private final double[] kelvin;
    private final double[] lnRate;
    private final double[] lnUncertaintyOrNull;
    private final List<Explanation> explanations = new ArrayList<>();
    private double lnCold;
    private double reference = Double.NEGATIVE_INFINITY;

    /**
     * One explanation by a mistake.
     *
     * @param block rows it concerns; null for the whole table
     * @param mixUp mix-up of k; null for one of temperatures
     * @param scale mix-up of temperatures; null for one of k
     * @param lnWeight ln of prior times evidence
     */
    record Explanation(Blocks block, MixUp mixUp, TemperatureMixUps.Scale scale, double lnWeight) {
        boolean wholeTable() {
            return block == null;
        }
    }

    private final double lnInnocent;

    ShiftSearch(Subject subject) {
        rows = subject.rows();
        int n = rows.size();
        kelvin = new double[n];
        lnRate = new double[n];
        boolean stated = true;
        double[] uncertainty = new double[n];
        for (int i = 0; i < n; i++) {
            Row row = rows.get(i);
            kelvin[i] = row.kelvin();
            lnRate[i] = row.lnRate();
            stated &= row.lnUncertainty().isPresent();
            uncertainty[i] = row.lnUncertainty().orElse(1);
        }
        lnUncertaintyOrNull = stated ? uncertainty : null;
        Evidence asRead = new Evidence(kelvin, lnUncertaintyOrNull);
        double innocent = Double.NEGATIVE_INFINITY;
        if (asRead.usable()) {
            double[] line = asRead.project(lnRate);
            double squared = Evidence.dot(line, line);
            double along = asRead.alongCurve(line);
            double clean = asRead.ln(squared, along);
            asRead.negligibleBelow(clean);
            innocent = StrictMath.log(CLEAN) + clean;
            lnCold = lnCold(kelvin);
            innocent = lnCold + sum(innocent, oddRows(asRead, line, squared, along));
            List<Blocks> blocks = Blocks.of(rows);
            rateBlocks(asRead, line, squared, along, blocks, subject.mixUps());
            temperatureBlocks(blocks);
        }
        lnInnocent = innocent;
    }

    private static double lnCold(double[] kelvin) {
        for (double each : kelvin) {
            if (each < COLD) {
                return StrictMath.log(COLD_SHARE);
            }
        }
        return 0;
    }

    private double oddRows(Evidence evidence, double[] line, double squared, double along) {
        double total = Double.NEGATIVE_INFINITY;
        double shares = 0;
        for (double size : ODD) {
            shares += StrictMath.pow(2, -size / ODD_HALF);
        }
        double lnRow = StrictMath.log(ODD_ROW / (2 * rows.size() * shares));
        for (int i = 0; i < rows.size(); i++) {
            double[] unit = new double[rows.size()];
            unit[i] = 1;
            double[] z = evidence.project(unit);
            double zz = Evidence.dot(z, z);
            double zLine = Evidence.dot(z, line);
            double zCurve = evidence.alongCurve(z);
            for (double size : ODD) {
                double lnPrior = lnRow - size / ODD_HALF * StrictMath.log(2);
                for (int sign = -1; sign <= 1; sign += 2) {
                    double c = sign * size;
                    total = sum(total, lnPrior + evidence.ln(squared + 2 * c * zLine + c * c * zz, along + c * zCurve));
                }
            }
        }
        return total;
    }

    private void rateBlocks(
            Evidence evidence, double[] line, double squared, double along, List<Blocks> blocks, List<MixUp> mixUps) {
        for (Blocks block : blocks) {
            double[] unit = new double[rows.size()];
            for (int i = 0; i < unit.length; i++) {
                unit[i] = block.member()[i] ? 1 : 0;
            }
            double[] z = evidence.project(unit);
            double zz = Evidence.dot(z, z);
            double zLine = Evidence.dot(z, line);
            double zCurve = evidence.alongCurve(z);
            double lnPrior = lnCold + StrictMath.log(MIXED_RATE / mixUps.size()) + lnShare(block, blocks);
            for (MixUp mixUp : mixUps) {
                double c = mixUp.lnFactor();
                add(new Explanation(
                        block,
                        mixUp,
                        null,
                        lnPrior + evidence.ln(squared + 2 * c * zLine + c * c * zz, along + c * zCurve)));
            }
        }
    }

    private void temperatureBlocks(List<Blocks> blocks) {
        List<TemperatureMixUps.Scale> scales = TemperatureMixUps.all();
        double lnPrior = StrictMath.log(MIXED_TEMPERATURE / scales.size());
        for (TemperatureMixUps.Scale scale : scales) {
            boolean[] everything = new boolean[rows.size()];
            java.util.Arrays.fill(everything, true);
            // A quarter of the share for the table as a whole.
            temperature(null, everything, scale, lnPrior + StrictMath.log(0.25));
            for (Blocks block : blocks) {
                temperature(block, block.member(), scale, lnPrior + StrictMath.log(0.375) + lnShare(block, blocks));
                if (2 * block.size() != rows.size() || rows.size() > 2) {
                    boolean[] others = block.member().clone();
                    for (int i = 0; i < others.length; i++) {
                        others[i] = !others[i];
                    }
                    temperature(
                            new Blocks(others, rows.size() - block.size()),
                            others,
                            scale,
                            lnPrior + StrictMath.log(0.375) + lnShare(block, blocks));
                }
            }
        }
    }

    private void temperature(Blocks block, boolean[] member, TemperatureMixUps.Scale scale, double lnPrior) {
        double[] mended = kelvin.clone();
        for (int i = 0; i < mended.length; i++) {
            if (member[i]) {
                mended[i] = scale.mend(kelvin[i]);
                if (Double.isNaN(mended[i])) {
                    return;
                }
            }
        }
        Evidence evidence = new Evidence(mended, lnUncertaintyOrNull);
        if (!evidence.usable()) {
            return;
        }
        double[] line = evidence.project(lnRate);
        add(new Explanation(
                block,
                null,
                scale,
                lnCold(mended) + lnPrior + evidence.ln(Evidence.dot(line, line), evidence.alongCurve(line))));
    }

    /** Half of the prior goes to single rows, half to longer blocks. */
    private double lnShare(Blocks block, List<Blocks> blocks) {
        int single = 0;
        for (Blocks each : blocks) {
            single += each.size() == 1 ? 1 : 0;
        }
        int same = block.size() == 1 ? single : blocks.size() - single;
        return StrictMath.log(0.5 / same);
    }

    private void add(Explanation explanation) {
        if (Double.isFinite(explanation.lnWeight())) {
            explanations.add(explanation);
            reference = Math.max(reference, explanation.lnWeight());
        }
    }

    /** Probability that a mistake of this kind happened, given that the explanations are exhaustive. */
    double probability(java.util.function.Predicate<Explanation> kind) {
        double top = Math.max(reference, lnInnocent);
        if (!Double.isFinite(top)) {
            return 0;
        }
        double total = StrictMath.exp(lnInnocent - top);
        double mine = 0;
        for (Explanation explanation : explanations) {
            double weight = StrictMath.exp(explanation.lnWeight() - top);
            total += weight;
            mine += kind.test(explanation) ? weight : 0;
        }
        return mine / total;
    }

    /** The likeliest explanations of a kind, best first. */
    List<Explanation> best(java.util.function.Predicate<Explanation> kind, int count) {
        List<Explanation> sorted = new ArrayList<>();
        for (Explanation explanation : explanations) {
            if (kind.test(explanation)) {
                sorted.add(explanation);
            }
        }
        sorted.sort(Comparator.comparingDouble((Explanation e) -> -e.lnWeight()));
        return List.copyOf(sorted.subList(0, Math.min(count, sorted.size())));
    }

    private static double sum(double a, double b) {
        double top = Math.max(a, b);
        return Double.isFinite(top) ? top + StrictMath.log(StrictMath.exp(a - top) + StrictMath.exp(b - top)) : top;
    }
}
