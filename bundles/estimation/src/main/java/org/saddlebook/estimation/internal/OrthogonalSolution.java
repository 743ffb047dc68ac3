package org.saddlebook.estimation.internal;

/**
 * A curve and its adjusted points. Arrays are shared inside the bundle and not changed once here.
 *
 * @param parameters of the curve
 * @param adjusted abscissae of the adjusted points
 * @param abscissaResiduals observed minus adjusted abscissae
 * @param ordinateResiduals observed minus adjusted ordinates
 * @param weights one over the variance of the distance from the linearised curve
 * @param chiSquared sum of the squared weighted distances
 * @param local the linearised problem
 */
@SuppressWarnings("ArrayRecordComponent") // internal carrier; the public type copies
public record OrthogonalSolution(
        double[] parameters,
        double[] adjusted,
        double[] abscissaResiduals,
        double[] ordinateResiduals,
        double[] weights,
        double chiSquared,
        LinearSolution local) {}
