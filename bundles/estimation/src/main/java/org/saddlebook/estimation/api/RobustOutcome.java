package org.saddlebook.estimation.api;

import java.util.function.Function;

/** How a robust fit ended. */
public sealed interface RobustOutcome permits RobustFit, NotRobust {
    /** Applies the function of the case that holds. */
    <T> T fold(Function<? super RobustFit, ? extends T> fitted, Function<? super NotRobust, ? extends T> refused);
}
