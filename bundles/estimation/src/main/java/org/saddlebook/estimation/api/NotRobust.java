package org.saddlebook.estimation.api;

import java.util.Objects;
import java.util.function.Function;

/**
 * Why there is no robust fit.
 *
 * @param kind the kind of trouble
 * @param reason a sentence naming what is missing
 */
public record NotRobust(Kind kind, String reason) implements RobustOutcome {
    /** The kinds of trouble. */
    public enum Kind {
        /** The observations, or those that were left any weight, do not determine every parameter. */
        NOT_DETERMINED,
        /** Half of the residuals are zero or rounding: the scale is zero and every other point an outlier. */
        NO_SCALE,
        /** The weights went on changing. */
        NOT_CONVERGED
    }

    /** Checks that nothing is missing. */
    public NotRobust {
        Objects.requireNonNull(kind, "kind");
        Objects.requireNonNull(reason, "reason");
    }

    @Override
    public <T> T fold(
            Function<? super RobustFit, ? extends T> fitted, Function<? super NotRobust, ? extends T> refused) {
        return refused.apply(this);
    }
}
