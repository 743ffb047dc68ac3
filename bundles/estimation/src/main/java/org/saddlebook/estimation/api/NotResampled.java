package org.saddlebook.estimation.api;

import java.util.Objects;
import java.util.function.Function;

/**
 * Why there are no resamples.
 *
 * @param reason a sentence naming what is missing
 */
public record NotResampled(String reason) implements ResampleOutcome {
    /** Checks that there is a reason. */
    public NotResampled {
        Objects.requireNonNull(reason, "reason");
    }

    @Override
    public <T> T fold(
            Function<? super Resamples, ? extends T> resampled, Function<? super NotResampled, ? extends T> refused) {
        return refused.apply(this);
    }
}
