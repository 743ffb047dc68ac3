package org.saddlebook.window.internal;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * What the settings of the section ask for.
 *
 * @param limits the limits in order; may be empty when only predictions are asked for
 * @param lowerKelvin lower end of the temperatures looked at, K; empty to choose one
 * @param upperKelvin upper end, K; empty to choose one
 * @param draws number of random draws
 * @param law rate law of the fitted reaction; empty when it is not known, and then no times are given
 * @param conversions conversions for the table of times
 * @param history recorded or planned temperatures; empty for none
 */
record Request(
        List<Limit> limits,
        OptionalDouble lowerKelvin,
        OptionalDouble upperKelvin,
        int draws,
        Optional<RateLaw> law,
        List<Double> conversions,
        Optional<History> history) {
    Request {
        limits = List.copyOf(limits);
        conversions = List.copyOf(conversions);
    }

    boolean needsBarrier() {
        for (Limit limit : limits) {
            if (limit.needsBarrier()) {
                return true;
            }
        }
        return history.isPresent();
    }

    Optional<Limit> needingThermodynamics() {
        for (Limit limit : limits) {
            if (limit.needsThermodynamics()) {
                return Optional.of(limit);
            }
        }
        return Optional.empty();
    }

    boolean asksForEquilibrium() {
        for (Limit limit : limits) {
            if (limit instanceof Limit.Equilibrium) {
                return true;
            }
        }
        return false;
    }

    Limit.Equipment equipment() {
        double low = 0;
        double high = Double.POSITIVE_INFINITY;
        String lowTitle = "";
        String highTitle = "";
        for (Limit limit : limits) {
            if (limit instanceof Limit.Equipment wall) {
                if (wall.lowerKelvin().orElse(0) > low) {
                    low = wall.lowerKelvin().getAsDouble();
                    lowTitle = wall.lowerTitle();
                }
                if (wall.upperKelvin().orElse(Double.POSITIVE_INFINITY) < high) {
                    high = wall.upperKelvin().getAsDouble();
                    highTitle = wall.upperTitle();
                }
            }
        }
        return new Limit.Equipment(
                "equipment",
                "equipment",
                "",
                low > 0 ? OptionalDouble.of(low) : OptionalDouble.empty(),
                high < Double.POSITIVE_INFINITY ? OptionalDouble.of(high) : OptionalDouble.empty(),
                lowTitle,
                highTitle);
    }
}
