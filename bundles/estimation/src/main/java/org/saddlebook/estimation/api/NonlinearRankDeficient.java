package org.saddlebook.estimation.api;

import java.util.Objects;
import java.util.function.Function;

/** The smallest residual lies where the data no longer determine every parameter. */
public final class NonlinearRankDeficient implements NonlinearOutcome {
    private final int rank;
    private final String reason;
    private final double[] bestParameters;

    NonlinearRankDeficient(int rank, String reason, double[] bestParameters) {
        this.rank = rank;
        this.reason = Objects.requireNonNull(reason, "reason");
        this.bestParameters = bestParameters.clone();
    }

    /** Independent combinations of parameters the data determine there. */
    public int rank() {
        return rank;
    }

    /** Number of parameters. */
    public int parameterCount() {
        return bestParameters.length;
    }

    /** A sentence naming what is missing. */
    public String reason() {
        return reason;
    }

    /** One of the many parameter sets that fit equally well. */
    public double[] bestParameters() {
        return bestParameters.clone();
    }

    @Override
    public <T> T fold(
            Function<? super NonlinearFit, ? extends T> fitted,
            Function<? super NotConverged, ? extends T> notConverged,
            Function<? super NonlinearRankDeficient, ? extends T> deficient) {
        return deficient.apply(this);
    }

    @Override
    public String toString() {
        return "NonlinearRankDeficient: rank " + rank + " of " + parameterCount() + ", " + reason;
    }
}
