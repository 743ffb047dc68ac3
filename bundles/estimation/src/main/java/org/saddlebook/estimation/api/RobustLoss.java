package org.saddlebook.estimation.api;

/**
 * How much a residual counts, as a function of its size in units of the robust scale. Immutable.
 *
 * <p>Huber (Ann. Math. Statist. 35 (1964) 73) never forgets a point, so its fit is unique; Tukey's bisquare (Beaton and
 * Tukey, Technometrics 16 (1974) 147) gives points far out no say at all. The default constants keep 95 % of the precision of
 * least squares on normal errors.
 */
public final class RobustLoss {
    private static final double HUBER = 1.345;
    private static final double BISQUARE = 4.685;

    private final boolean redescending;
    private final double tuning;

    private RobustLoss(boolean redescending, double tuning) {
        if (!(tuning > 0 && tuning < Double.POSITIVE_INFINITY)) {
            throw new IllegalArgumentException("tuning constant is " + tuning + "; a positive number is needed");
        }
        this.redescending = redescending;
        this.tuning = tuning;
    }

    /** Huber with constant 1.345. */
    public static RobustLoss huber() {
        return huber(HUBER);
    }

    /** Huber with another constant k: quadratic up to k scales, linear beyond. */
    public static RobustLoss huber(double k) {
        return new RobustLoss(false, k);
    }

    /** Tukey's bisquare with constant 4.685. */
    public static RobustLoss bisquare() {
        return bisquare(BISQUARE);
    }

    /** Tukey's bisquare with another constant c: no weight beyond c scales. */
    public static RobustLoss bisquare(double c) {
        return new RobustLoss(true, c);
    }

    /** The constant. */
    public double tuning() {
        return tuning;
    }

    /**
     * Weight of a residual, {@code psi(u) / u}.
     *
     * @param u residual over scale
     * @return from 0 to 1
     */
    public double weight(double u) {
        double share = Math.abs(u) / tuning;
        if (redescending) {
            double rest = share < 1 ? 1 - share * share : 0;
            return rest * rest;
        }
        return share <= 1 ? 1 : 1 / share;
    }

    /** Derivative of {@code psi} at u. */
    public double slope(double u) {
        double share = u / tuning;
        double square = share * share;
        if (redescending) {
            return square < 1 ? (1 - square) * (1 - 5 * square) : 0;
        }
        return square <= 1 ? 1 : 0;
    }

    @Override
    public String toString() {
        return redescending ? "bisquare" : "Huber";
    }
}
