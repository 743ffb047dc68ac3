package org.saddlebook.barrier.internal;

import java.util.List;
import org.saddlebook.api.model.RateFunction;

/** Fits a law by search; arrives with the non-linear engine. */
final class NonlinearFitter {
    private NonlinearFitter() {}

    static LawOutcome fit(
            String id, String title, RateFunction law, Measurements data, List<double[]> starts, Runnable check) {
        check.run();
        return new LawOutcome.NotFitted(
                id,
                title,
                LawOutcome.Kind.FAILED,
                "No search yet for " + law.parameters().size() + " parameters, " + data.size() + " points, "
                        + starts.size() + " starts.");
    }
}
