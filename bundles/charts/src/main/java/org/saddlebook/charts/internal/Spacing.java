package org.saddlebook.charts.internal;

import java.util.ArrayList;
import java.util.List;
import org.saddlebook.api.findings.Axis;
import org.saddlebook.presentation.api.Rounding;

/** How an axis turns values into positions: evenly, by logarithm, or as 1/T with the hot end on the right. */
enum Spacing {
    LINEAR {
        @Override
        double position(double value) {
            return value;
        }

        @Override
        double value(double position) {
            return position;
        }
    },
    LOGARITHMIC {
        @Override
        double position(double value) {
            return StrictMath.log10(value);
        }

        @Override
        double value(double position) {
            return StrictMath.pow(10, position);
        }

        @Override
        List<Tick> ticks(double low, double high, int most) {
            return decades(low, high, most);
        }
    },
    RECIPROCAL {
        @Override
        double position(double value) {
            return -1 / value;
        }

        @Override
        double value(double position) {
            return -1 / position;
        }
    };

    /**
     * A mark on an axis.
     *
     * @param value where
     * @param label what is written; empty for a mark without a number
     */
    record Tick(double value, String label) {}

    static Spacing of(Axis.Scale scale) {
        return switch (scale) {
            case LINEAR -> LINEAR;
            case LOGARITHMIC -> LOGARITHMIC;
            case RECIPROCAL_TEMPERATURE -> RECIPROCAL;
        };
    }

    /** Grows with the value. */
    abstract double position(double value);

    abstract double value(double position);

    boolean admits(double value) {
        return this == LINEAR || value > 0;
    }

    /** Round values from low to high, about as many as {@code most}, in order. */
    List<Tick> ticks(double low, double high, int most) {
        return even(low, high, most, 0);
    }

    /**
     * Round values on a scale shifted against the axis.
     *
     * @param shift number written = value − shift, for example 273.15 for degrees Celsius
     */
    static List<Tick> even(double low, double high, int most, double shift) {
        List<Tick> ticks = new ArrayList<>();
        double step = step((high - low) / most);
        int decimals = Math.max(0, (int) -Math.floor(StrictMath.log10(step) + 1e-9));
        double edge = (high - low) * 1e-9;
        long first = (long) Math.ceil((low - shift - edge) / step);
        for (long i = first; i * step <= high - shift + edge; i++) {
            double written = i * step;
            boolean plain = Math.abs(high - shift) < 1e6 && decimals <= 6;
            ticks.add(new Tick(
                    written + shift, plain ? Rounding.decimals(written, decimals) : Rounding.shortest(written)));
        }
        return ticks;
    }

    /** 1, 2 or 5 times a power of ten, at least {@code least}. */
    private static double step(double least) {
        double power = StrictMath.pow(10, Math.floor(StrictMath.log10(least)));
        for (double factor : new double[] {1, 2, 5}) {
            if (factor * power >= least * (1 - 1e-9)) {
                return factor * power;
            }
        }
        return 10 * power;
    }

    /** A bare power of ten needs no "1 ×" before it. */
    private static String decade(double value) {
        String text = Rounding.significant(value, 1);
        return text.startsWith("1 × ") ? text.substring(4) : text;
    }

    private static List<Tick> decades(double low, double high, int most) {
        List<Tick> ticks = new ArrayList<>();
        double span = StrictMath.log10(high / low);
        int first = (int) Math.floor(StrictMath.log10(low));
        int last = (int) Math.ceil(StrictMath.log10(high));
        int skip = (int) Math.ceil(span / most);
        for (int decade = first; decade <= last; decade++) {
            for (int digit = 1; digit <= 9; digit++) {
                double value = digit * StrictMath.pow(10, decade);
                if (value < low * (1 - 1e-9) || value > high * (1 + 1e-9)) {
                    continue;
                }
                boolean named = digit == 1
                        ? Math.floorMod(decade, skip) == 0
                        : span < 1 || (span < 2.2 && (digit == 2 || digit == 5));
                if (named || (skip == 1 && (span < 6 || digit == 1))) {
                    ticks.add(new Tick(value, named ? decade(value) : ""));
                }
            }
        }
        return ticks;
    }
}
