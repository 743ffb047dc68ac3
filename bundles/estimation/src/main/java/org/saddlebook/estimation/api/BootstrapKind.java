package org.saddlebook.estimation.api;

/** What is drawn anew. */
public enum BootstrapKind {
    /**
     * Residuals: each {@code r sqrt(w) / sqrt(1 - h)}, h its leverage, less their mean; drawn with replacement onto the fitted
     * values (A. C. Davison and D. V. Hinkley, Bootstrap Methods and their Application (1997), 6.2.3). Keeps the design.
     */
    RESIDUAL("residual"),
    /** Whole observations, with replacement; samples that do not determine the parameters are drawn again and counted. */
    CASE("case"),
    /** Normal errors with the variances the weights state. */
    PARAMETRIC_STATED("parametric-stated"),
    /** Normal errors with the residual variance. */
    PARAMETRIC_ESTIMATED("parametric-estimated");

    private final String id;

    BootstrapKind(String id) {
        this.id = id;
    }

    /** The word for it in stream names. */
    public String id() {
        return id;
    }
}
