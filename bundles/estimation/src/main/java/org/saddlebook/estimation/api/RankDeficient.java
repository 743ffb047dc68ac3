package org.saddlebook.estimation.api;

import java.util.function.Function;

/**
 * The data do not determine the parameters: too few observations, identical abscissae, columns that repeat each other.
 *
 * @param rank number of independent combinations the data determine
 * @param parameterCount number of parameters asked for
 * @param reason a sentence naming what is missing
 */
public record RankDeficient(int rank, int parameterCount, String reason) implements LinearOutcome {
    @Override
    public <T> T fold(
            Function<? super LinearFit, ? extends T> fitted, Function<? super RankDeficient, ? extends T> deficient) {
        return deficient.apply(this);
    }
}
