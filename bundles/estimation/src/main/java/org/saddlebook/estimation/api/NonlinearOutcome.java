package org.saddlebook.estimation.api;

import java.util.function.Function;

/** How a non-linear fit ended. */
public sealed interface NonlinearOutcome permits NonlinearFit, NotConverged, NonlinearRankDeficient {
    /** Applies the function of the case that holds. */
    <T> T fold(
            Function<? super NonlinearFit, ? extends T> fitted,
            Function<? super NotConverged, ? extends T> notConverged,
            Function<? super NonlinearRankDeficient, ? extends T> deficient);
}
