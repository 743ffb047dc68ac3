package org.saddlebook.reaction.series.internal;

import java.util.Optional;

/**
 * The weighted line of one reaction, {@code ln k = ȳ + b (x − x̄)}, x = 1/T; x̄ and ȳ are weighted means, so that height and
 * slope are uncorrelated.
 *
 * @param weight sum of the weights, W
 * @param meanX x̄, 1/K
 * @param meanY ȳ
 * @param spread weighted sum of squares of x about x̄, Sxx
 * @param slope b, K
 * @param rss weighted residual sum of squares
 * @param n number of points
 */
record ReactionLine(double weight, double meanX, double meanY, double spread, double slope, double rss, int n) {
    /**
     * The line of one reaction.
     *
     * @param weights one for each point
     * @return empty for fewer than two temperatures
     */
    static Optional<ReactionLine> of(Reaction reaction, double[] weights) {
        double w = 0;
        double x = 0;
        double y = 0;
        int n = reaction.size();
        for (int i = 0; i < n; i++) {
            w += weights[i];
            x += weights[i] / reaction.kelvin(i);
            y += weights[i] * reaction.lnRate(i);
        }
        x /= w;
        y /= w;
        double sxx = 0;
        double sxy = 0;
        for (int i = 0; i < n; i++) {
            double dx = 1 / reaction.kelvin(i) - x;
            sxx += weights[i] * dx * dx;
            sxy += weights[i] * dx * (reaction.lnRate(i) - y);
        }
        if (n < 2 || !(reaction.highest() - reaction.lowest() > 1e-9 * reaction.highest())) {
            return Optional.empty();
        }
        double slope = sxy / sxx;
        double rss = 0;
        for (int i = 0; i < n; i++) {
            double r = reaction.lnRate(i) - y - slope * (1 / reaction.kelvin(i) - x);
            rss += weights[i] * r * r;
        }
        return Optional.of(new ReactionLine(w, x, y, sxx, slope, rss, n));
    }

    /** ln k at x = 1/T. */
    double at(double x) {
        return meanY + slope * (x - meanX);
    }

    /** Unscaled variance of {@link #at}. */
    double variance(double x) {
        double dx = x - meanX;
        return 1 / weight + dx * dx / spread;
    }
}
