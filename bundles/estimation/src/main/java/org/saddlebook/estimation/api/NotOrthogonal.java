package org.saddlebook.estimation.api;

import java.util.Objects;
import java.util.function.Function;

/** Why there is no fit with errors in both variables. */
public final class NotOrthogonal implements OrthogonalOutcome {
    /** The kinds of trouble. */
    public enum Kind {
        /** A point is exact in both coordinates: its weight would be infinite. */
        EXACT_POINT,
        /** The points do not determine every parameter: too few, or all at one abscissa. */
        NOT_DETERMINED,
        /** No start reached a minimum. */
        NOT_CONVERGED
    }

    private final Kind kind;
    private final String reason;
    private final double[] bestParameters;

    NotOrthogonal(Kind kind, String reason, double[] bestParameters) {
        this.kind = Objects.requireNonNull(kind, "kind");
        this.reason = Objects.requireNonNull(reason, "reason");
        this.bestParameters = bestParameters.clone();
    }

    /** The kind. */
    public Kind kind() {
        return kind;
    }

    /** A sentence naming what is missing. */
    public String reason() {
        return reason;
    }

    /** The best parameters met, which are no estimate; empty when none were tried. */
    public double[] bestParameters() {
        return bestParameters.clone();
    }

    @Override
    public <T> T fold(
            Function<? super OrthogonalFit, ? extends T> fitted, Function<? super NotOrthogonal, ? extends T> refused) {
        return refused.apply(this);
    }

    @Override
    public String toString() {
        return "NotOrthogonal: " + kind + ", " + reason;
    }
}
