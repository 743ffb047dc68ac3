package org.saddlebook.estimation.api;

/**
 * Runs of equal sign in a sequence of residuals.
 *
 * @param runs number of runs
 * @param positive residuals above zero
 * @param negative residuals below zero
 * @param probabilityOfSoFew probability of this number of runs or fewer if the order means nothing: small when neighbours lean
 *     to the same side, as under an overlooked curvature or drift
 * @param probabilityOfSoMany probability of this number of runs or more
 */
public record RunsTest(int runs, int positive, int negative, double probabilityOfSoFew, double probabilityOfSoMany) {}
