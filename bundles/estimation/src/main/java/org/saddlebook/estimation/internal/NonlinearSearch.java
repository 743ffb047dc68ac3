package org.saddlebook.estimation.internal;

/** One start: descend with a long first step, then with shorter ones, polish each, keep the best. */
public final class NonlinearSearch {
    /** A long first step crosses plateaus, a short one stays in the valley of the start; both are needed. */
    private static final double[] FIRST_STEPS = {100, 1, 0.05};

    private NonlinearSearch() {}

    /**
     * Searches.
     *
     * @param problem what to minimise
     * @param start parameters
     * @param limit iterations of each attempt
     * @param thorough whether to go on when the first attempt converged
     */
    public static NonlinearAttempt from(NonlinearProblem problem, double[] start, int limit, boolean thorough) {
        NonlinearProblem.Point first = problem.at(problem.clip(start.clone()));
        if (!first.defined()) {
            return new NonlinearAttempt(
                    NonlinearAttempt.End.STALLED,
                    "the response is not defined at the start",
                    first.parameters,
                    new int[0],
                    first.residuals,
                    Double.NaN,
                    0,
                    null);
        }
        NonlinearAttempt best = null;
        for (double firstStep : FIRST_STEPS) {
            NonlinearAttempt attempt = attempt(problem, first, firstStep, limit);
            if (best == null || attempt.betterThan(best)) {
                best = attempt;
            }
            if (!thorough && attempt.end() == NonlinearAttempt.End.CONVERGED) {
                break;
            }
        }
        return best;
    }

    private static NonlinearAttempt attempt(
            NonlinearProblem problem, NonlinearProblem.Point start, double firstStep, int limit) {
        TrustRegion region = new TrustRegion(problem, start);
        region.descend(firstStep, limit);
        Polish polish = new Polish(problem, region.point());
        LinearSolution local = polish.local();
        NonlinearAttempt.End end;
        String reason;
        if (local == null) {
            end = NonlinearAttempt.End.STALLED;
            reason = "every parameter ended at a bound";
        } else if (local.rank() < polish.free().length) {
            end = NonlinearAttempt.End.DEFICIENT;
            reason = "where the residuals are smallest the observations determine only " + local.rank() + " of "
                    + polish.free().length + " parameters";
        } else if (polish.atMinimum()) {
            end = NonlinearAttempt.End.CONVERGED;
            reason = "";
        } else {
            end = NonlinearAttempt.End.STALLED;
            reason = region.complaint().isEmpty()
                    ? "the steps stopped improving before they became small"
                    : region.complaint();
        }
        double[] residuals = Neighbours.residuals(problem, polish.point());
        return new NonlinearAttempt(
                end,
                reason,
                polish.point().parameters,
                polish.free(),
                residuals,
                problem.sumOfSquares(residuals),
                region.iterations() + polish.iterations(),
                local);
    }
}
