package org.saddlebook.estimation.internal;

/** Sums of products without cancellation. */
public final class Products {
    private Products() {}

    /** {@code a b - c d} to about one unit in the last place (Kahan; Jeannerod, Louvet &amp; Muller 2013). */
    public static double difference(double a, double b, double c, double d) {
        double w = c * d;
        double e = Math.fma(c, -d, w);
        return Math.fma(a, b, -w) + e;
    }
}
