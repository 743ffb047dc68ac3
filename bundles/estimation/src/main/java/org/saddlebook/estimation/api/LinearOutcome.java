package org.saddlebook.estimation.api;

import java.util.function.Function;

/** How a linear fit ended. */
public sealed interface LinearOutcome permits LinearFit, RankDeficient {
    /** Applies the function of the case that holds. */
    <T> T fold(Function<? super LinearFit, ? extends T> fitted, Function<? super RankDeficient, ? extends T> deficient);
}
