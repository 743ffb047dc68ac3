package org.saddlebook.estimation.api;

import java.util.function.Function;

/** How resampling ended. */
public sealed interface ResampleOutcome permits Resamples, NotResampled {
    /** Applies the function of the case that holds. */
    <T> T fold(Function<? super Resamples, ? extends T> resampled, Function<? super NotResampled, ? extends T> refused);
}
