package org.saddlebook.estimation.api;

import java.util.function.Function;

/** How a fit with errors in both variables ended. */
public sealed interface OrthogonalOutcome permits OrthogonalFit, NotOrthogonal {
    /** Applies the function of the case that holds. */
    <T> T fold(
            Function<? super OrthogonalFit, ? extends T> fitted, Function<? super NotOrthogonal, ? extends T> refused);
}
