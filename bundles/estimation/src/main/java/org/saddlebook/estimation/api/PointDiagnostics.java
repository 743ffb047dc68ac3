package org.saddlebook.estimation.api;

import java.util.OptionalDouble;

/**
 * What one observation does to a fit.
 *
 * @param row index of the observation
 * @param leverage its diagonal element h of the hat matrix, 0 to 1
 * @param studentised {@code r sqrt(w) / (s sqrt(1 - h))}; empty where the fit passes through the point whatever it is, or
 *     there is no scatter
 * @param deletedStudentised the same with s from the fit without it, a t variable with n - p - 1 degrees of freedom; empty
 *     also when that leaves none
 * @param cook distance the parameters move, in units of their covariance and number, when it is left out
 */
public record PointDiagnostics(
        int row, double leverage, OptionalDouble studentised, OptionalDouble deletedStudentised, OptionalDouble cook) {}
