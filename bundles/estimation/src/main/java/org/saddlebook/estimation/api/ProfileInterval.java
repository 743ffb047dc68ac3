package org.saddlebook.estimation.api;

/**
 * A profile-likelihood interval of one parameter.
 *
 * @param estimate of the parameter
 * @param lower end below
 * @param upper end above
 * @param quantile q: the interval holds every value whose best sum of squares exceeds the smallest by at most q^2 scales
 */
public record ProfileInterval(double estimate, ProfileLimit lower, ProfileLimit upper, double quantile) {}
