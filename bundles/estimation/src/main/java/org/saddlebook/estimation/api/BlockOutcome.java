package org.saddlebook.estimation.api;

import java.util.function.Function;

/** How a fit with blocks ended. */
public sealed interface BlockOutcome permits BlockFit, NotBlocked {
    /** Applies the function of the case that holds. */
    <T> T fold(Function<? super BlockFit, ? extends T> fitted, Function<? super NotBlocked, ? extends T> refused);
}
