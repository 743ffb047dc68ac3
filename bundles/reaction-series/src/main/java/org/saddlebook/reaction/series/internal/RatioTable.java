package org.saddlebook.reaction.series.internal;

import java.util.List;
import java.util.Locale;
import java.util.Optional;

/**
 * Ratios against temperature.
 *
 * @param title for people
 * @param kind what the ratio is of
 * @param numerator name of what stands above
 * @param denominator name of what stands below
 * @param points in order of the source, at least one
 */
record RatioTable(String title, Kind kind, String numerator, String denominator, List<Point> points) {
    RatioTable {
        points = List.copyOf(points);
    }

    /** What a ratio is of; the words of the column heads. */
    enum Kind {
        /** Two products, k1/k2. */
        RATIO("ratio"),
        /** Enantiomers, major over minor as {@code 97:3} or as a number. */
        ENANTIOMERIC_RATIO("er"),
        /** Enantiomeric excess; the ratio is (1 + ee)/(1 − ee). */
        ENANTIOMERIC_EXCESS("ee"),
        /** Kinetic isotope effect, light over heavy. */
        ISOTOPE_EFFECT("kie");

        private final String word;

        Kind(String word) {
            this.word = word;
        }

        String word() {
            return word;
        }

        static Optional<Kind> of(String word) {
            String lower = word.toLowerCase(Locale.ROOT);
            for (Kind kind : values()) {
                if (kind.word.equals(lower)) {
                    return Optional.of(kind);
                }
            }
            return switch (lower) {
                case "selectivity", "product ratio", "r" -> Optional.of(RATIO);
                case "kh/kd", "isotope effect" -> Optional.of(ISOTOPE_EFFECT);
                default -> Optional.empty();
            };
        }
    }

    /**
     * One ratio.
     *
     * @param kelvin temperature, K
     * @param lnRatio ln of the ratio
     * @param lnUncertainty standard uncertainty of it; 0 when not stated
     * @param line physical line in the source, from 1
     */
    record Point(double kelvin, double lnRatio, double lnUncertainty, int line) {}

    /** Whether every point states its uncertainty. */
    boolean stated() {
        for (Point point : points) {
            if (!(point.lnUncertainty() > 0)) {
                return false;
            }
        }
        return true;
    }
}
