package org.saddlebook.barrier.internal;

import java.util.ArrayList;
import java.util.List;
import org.saddlebook.estimation.api.BootstrapKind;

/** Ways to an interval beside Student's t; {@code key} is the word used in files and on the command line. */
enum IntervalMethod {
    /** Follows the sum of squares. */
    PROFILE("profile", Coverage.PROFILE),
    /** Draws residuals anew. */
    BOOTSTRAP_RESIDUAL("bootstrap-residual", Coverage.RESIDUAL),
    /** Draws whole points anew. */
    BOOTSTRAP_CASE("bootstrap-case", Coverage.CASE),
    /** Draws normal errors anew. */
    BOOTSTRAP_PARAMETRIC("bootstrap-parametric", Coverage.PARAMETRIC),
    /** Draws the parameters jointly. */
    MONTE_CARLO("monte-carlo", Coverage.MONTE_CARLO);

    private final String key;
    private final String coverage;

    IntervalMethod(String key, String coverage) {
        this.key = key;
        this.coverage = coverage;
    }

    String key() {
        return key;
    }

    /** How often it holds the truth, a sentence with numbers. */
    String coverage() {
        return coverage;
    }

    boolean isBootstrap() {
        return this == BOOTSTRAP_RESIDUAL || this == BOOTSTRAP_CASE || this == BOOTSTRAP_PARAMETRIC;
    }

    /** What a bootstrap draws anew. */
    BootstrapKind kind(boolean stated) {
        return switch (this) {
            case BOOTSTRAP_RESIDUAL -> BootstrapKind.RESIDUAL;
            case BOOTSTRAP_CASE -> BootstrapKind.CASE;
            case BOOTSTRAP_PARAMETRIC -> stated ? BootstrapKind.PARAMETRIC_STATED : BootstrapKind.PARAMETRIC_ESTIMATED;
            default -> throw new IllegalStateException(key + " is no bootstrap");
        };
    }

    /** The method with this word; throws {@link IllegalArgumentException} with a sentence for another one. */
    static IntervalMethod of(String key) {
        List<String> known = new ArrayList<>();
        known.add("t");
        for (IntervalMethod method : values()) {
            if (method.key.equals(key)) {
                return method;
            }
            known.add(method.key);
        }
        throw new IllegalArgumentException(
                "The setting barrier.intervals must name " + String.join(", ", known) + "; found " + key + ".");
    }
}
