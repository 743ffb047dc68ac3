package org.saddlebook.estimation.internal;

/**
 * A mutable double-double number: the unevaluated sum of two doubles, about 31 decimal digits (Dekker 1971; Hida, Li
 * &amp; Bailey 2001). Mutable so that inner loops allocate nothing.
 */
public final class Wide {
    /** Leading part. */
    double hi;
    /** Trailing part, at most half a unit in the last place of the leading one. */
    double lo;

    double value() {
        return hi + lo;
    }

    Wide set(double high, double low) {
        hi = high;
        lo = low;
        return this;
    }

    Wide add(double high, double low) {
        double s = hi + high;
        double b = s - hi;
        double e = (hi - (s - b)) + (high - b);
        double t = lo + low;
        b = t - lo;
        double f = (lo - (t - b)) + (low - b);
        e += t;
        double s1 = s + e;
        e = e - (s1 - s) + f;
        hi = s1 + e;
        lo = e - (hi - s1);
        return this;
    }

    /** Adds the product of two double-doubles. */
    Wide addProduct(double ah, double al, double bh, double bl) {
        double p = ah * bh;
        double e = Math.fma(ah, bh, -p) + (ah * bl + al * bh);
        return add(p, e);
    }

    Wide multiply(double high, double low) {
        double p = hi * high;
        double e = Math.fma(hi, high, -p) + (hi * low + lo * high);
        hi = p + e;
        lo = e - (hi - p);
        return this;
    }

    Wide divide(double high, double low) {
        double q1 = hi / high;
        if (q1 == 0) {
            return set(q1, 0);
        }
        addProduct(-q1, 0, high, low);
        double q2 = hi / high;
        addProduct(-q2, 0, high, low);
        double q3 = hi / high;
        return set(q1, 0).add(q2, 0).add(q3, 0);
    }

    /** Square root of a number that is not negative (Karp &amp; Markstein 1997). */
    Wide squareRoot() {
        if (!(hi > 0)) {
            return set(0, 0);
        }
        double root = Math.sqrt(hi);
        addProduct(-root, 0, root, 0);
        double correction = hi / (2 * root);
        return set(root, 0).add(correction, 0);
    }
}
