package org.saddlebook.model.falloff.internal;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import org.saddlebook.api.model.Conditions;
import org.saddlebook.api.quantity.Constants;

/**
 * Starting values of a falloff law: reduced pressures over six powers of ten at the middle of the points and energies around
 * that of the plane through ln k against 1/T and ln [M], each with the size that suits the points. Depends on no unit.
 */
final class FalloffStarts {
    private static final double[] REDUCED = {1e-3, 1e-2, 0.1, 1, 10, 100, 1e3};
    private static final double[] ENERGIES = {-0.3, 0, 0.3};
    private static final int STARTS = 5;

    private final FalloffLaw law;
    private final double[] kelvin;
    private final List<Conditions> at;
    private final double[] lnRate;

    FalloffStarts(FalloffLaw law, double[] kelvin, List<Conditions> at, double[] lnRate) {
        this.law = law;
        this.kelvin = kelvin;
        this.at = at;
        this.lnRate = lnRate;
    }

    List<double[]> of() {
        int n = kelvin.length;
        double[] lnThirdBody = new double[n];
        double meanX = 0;
        double meanM = 0;
        double meanY = 0;
        for (int i = 0; i < n; i++) {
            OptionalDouble thirdBody = at.get(i).thirdBody(kelvin[i]);
            if (thirdBody.isEmpty()) {
                return List.of();
            }
            lnThirdBody[i] = StrictMath.log(thirdBody.getAsDouble());
            meanX += 1 / (Constants.GAS * kelvin[i]) / n;
            meanM += lnThirdBody[i] / n;
            meanY += lnRate[i] / n;
        }
        double energy = energy(meanX, lnThirdBody, meanM, meanY);
        double size = Math.max(Math.abs(energy), 1 / meanX);
        double centre = 1 / (Constants.GAS * meanX);
        List<double[]> starts = new ArrayList<>();
        List<Double> misfits = new ArrayList<>();
        for (double reduced : REDUCED) {
            double lnReduced = StrictMath.log(reduced);
            for (double low : ENERGIES) {
                for (double high : ENERGIES) {
                    double lowEnergy = energy + low * size;
                    double highEnergy = energy + high * size;
                    double[] p = law.with(centre, lnReduced - meanM, lowEnergy, 0, highEnergy);
                    double shift = 0;
                    double squares = 0;
                    double[] unused = new double[p.length];
                    for (int i = 0; i < n; i++) {
                        double rest = lnRate[i] - law.lnRate(kelvin[i], at.get(i), p, unused);
                        shift += rest / n;
                        squares += rest * rest;
                    }
                    double misfit = squares - n * shift * shift;
                    int place = 0;
                    while (place < starts.size() && misfits.get(place) <= misfit) {
                        place++;
                    }
                    starts.add(place, law.with(centre, shift + lnReduced - meanM, lowEnergy, shift, highEnergy));
                    misfits.add(place, misfit);
                }
            }
        }
        return List.copyOf(starts.subList(0, STARTS));
    }

    /** Energy of the plane through the points, from ln k against 1/(RT) and ln [M]; at one [M] that of the line. */
    private double energy(double meanX, double[] lnThirdBody, double meanM, double meanY) {
        double sxx = 0;
        double sxm = 0;
        double smm = 0;
        double sxy = 0;
        double smy = 0;
        for (int i = 0; i < kelvin.length; i++) {
            double x = 1 / (Constants.GAS * kelvin[i]) - meanX;
            double m = lnThirdBody[i] - meanM;
            double y = lnRate[i] - meanY;
            sxx += x * x;
            sxm += x * m;
            smm += m * m;
            sxy += x * y;
            smy += m * y;
        }
        double determinant = sxx * smm - sxm * sxm;
        if (determinant > 1e-9 * sxx * smm) {
            return -(sxy * smm - smy * sxm) / determinant;
        }
        return sxx > 0 ? -sxy / sxx : 0;
    }
}
