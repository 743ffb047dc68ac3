package org.saddlebook.data.checks.api;

import java.util.List;
import java.util.Optional;
import org.saddlebook.estimation.api.StudentT;

/**
 * Whether the difference between a measured rate constant and a reference is one of the known mix-ups. Three explanations
 * are weighed (Bayes): they agree; they differ for a reason of their own (another solvent, catalyst or ionic strength: ln
 * of the ratio normal with standard deviation 2); one of the mix-ups happened. Prior shares 0.88, 0.02 and 0.10.
 */
public final class ShiftTest {
    /** Posterior probability from which a mix-up is reported: more likely than not. */
    public static final double REPORTED = 0.5;

    private static final double AGREE = 0.88;
    private static final double OTHER = 0.02;
    private static final double MIXED = 0.10;
    private static final double OTHER_SPREAD = 2;

    /** Two laboratories hardly agree better, ln. */
    private static final double SMALLEST = 0.02;

    private ShiftTest() {}

    /**
     * A mix-up that explains a difference.
     *
     * @param mixUp the mix-up of the measured value
     * @param probability posterior probability that one of the mix-ups happened
     */
    public record Explained(MixUp mixUp, double probability) {}

    /**
     * Weighs the explanations.
     *
     * @param lnRatio ln of (measured / reference) at one temperature
     * @param uncertainty standard uncertainty of it, both sides included
     * @param degreesOfFreedom of the uncertainty; infinity where it is stated
     * @param mixUps mix-ups of the measured value
     * @return the likeliest mix-up where they together are more probable than {@link #REPORTED}
     * @throws IllegalArgumentException when a number is NaN or the uncertainty not above zero
     */
    public static Optional<Explained> explain(
            double lnRatio, double uncertainty, double degreesOfFreedom, List<MixUp> mixUps) {
        if (!Double.isFinite(lnRatio) || !(uncertainty > 0) || !(degreesOfFreedom > 0)) {
            throw new IllegalArgumentException("ln ratio " + lnRatio + " with uncertainty " + uncertainty + " on "
                    + degreesOfFreedom + " degrees of freedom");
        }
        // The normal density with the width that t has at 95 %: close enough for odds of nine to one.
        double wide = StudentT.quantile(0.975, degreesOfFreedom) / StudentT.quantile(0.975, Double.POSITIVE_INFINITY);
        double u = Math.max(SMALLEST, uncertainty) * wide;
        double clean =
                AGREE * density(lnRatio, u) + OTHER * density(lnRatio, Math.sqrt(OTHER_SPREAD * OTHER_SPREAD + u * u));
        double mixed = 0;
        double best = 0;
        MixUp likeliest = null;
        for (MixUp mixUp : mixUps) {
            double weight = MIXED / mixUps.size() * density(lnRatio + mixUp.lnFactor(), u);
            mixed += weight;
            if (weight > best) {
                best = weight;
                likeliest = mixUp;
            }
        }
        double probability = mixed / (mixed + clean);
        if (likeliest == null || !(probability > REPORTED)) {
            return Optional.empty();
        }
        return Optional.of(new Explained(likeliest, probability));
    }

    private static double density(double x, double sd) {
        double z = x / sd;
        return StrictMath.exp(-0.5 * z * z) / sd;
    }
}
