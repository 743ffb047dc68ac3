package org.saddlebook.estimation.api;

import java.util.Objects;
import java.util.function.Function;

/**
 * Why the scatter cannot be parted into blocks and rest.
 *
 * @param reason a sentence naming what is missing
 */
public record NotBlocked(String reason) implements BlockOutcome {
    /** Checks that there is a reason. */
    public NotBlocked {
        Objects.requireNonNull(reason, "reason");
    }

    @Override
    public <T> T fold(
            Function<? super BlockFit, ? extends T> fitted, Function<? super NotBlocked, ? extends T> refused) {
        return refused.apply(this);
    }
}
