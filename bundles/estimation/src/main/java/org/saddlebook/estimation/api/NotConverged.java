package org.saddlebook.estimation.api;

import java.util.Objects;
import java.util.function.Function;

/** No start reached a minimum; what was best on the way is not an estimate. */
public final class NotConverged implements NonlinearOutcome {
    private final String reason;
    private final double[] bestParameters;

    NotConverged(String reason, double[] bestParameters) {
        this.reason = Objects.requireNonNull(reason, "reason");
        this.bestParameters = bestParameters.clone();
    }

    /** A sentence saying what stopped the best attempt. */
    public String reason() {
        return reason;
    }

    /** Parameters with the smallest residual sum of squares met. */
    public double[] bestParameters() {
        return bestParameters.clone();
    }

    @Override
    public <T> T fold(
            Function<? super NonlinearFit, ? extends T> fitted,
            Function<? super NotConverged, ? extends T> notConverged,
            Function<? super NonlinearRankDeficient, ? extends T> deficient) {
        return notConverged.apply(this);
    }

    @Override
    public String toString() {
        return "NotConverged: " + reason;
    }
}
