package org.saddlebook.model.parallel.channels.internal;

import java.util.ArrayList;
import java.util.List;
import org.saddlebook.api.quantity.Constants;

/**
 * Starting values: pairs of activation energies around that of the straight line, each with the two amounts, not negative,
 * that suit the points best in relative terms. Depends on no unit.
 */
final class ChannelStarts {
    /** Distances of the two energies from that of the straight line, as parts of it. */
    private static final double[] BELOW = {0.02, 0.1, 0.25, 0.45, 0.7, 1, 1.6};

    private static final double[] ABOVE = {0.02, 0.1, 0.25, 0.5, 1, 2, 4};
    private static final int STARTS = 5;

    private ChannelStarts() {}

    static List<double[]> of(double[] kelvin, double[] lnRate) {
        int n = kelvin.length;
        double meanX = 0;
        double meanY = 0;
        for (int i = 0; i < n; i++) {
            meanX += 1 / kelvin[i] / n;
            meanY += lnRate[i] / n;
        }
        double sxx = 0;
        double sxy = 0;
        for (int i = 0; i < n; i++) {
            double x = 1 / kelvin[i] - meanX;
            sxx += x * x;
            sxy += x * (lnRate[i] - meanY);
        }
        double energy = sxx > 0 ? -Constants.GAS * sxy / sxx : 0;
        // A line without slope leaves the thermal energy as the measure.
        double size = Math.max(Math.abs(energy), Constants.GAS / meanX);
        List<double[]> starts = new ArrayList<>();
        List<Double> misfits = new ArrayList<>();
        for (double below : BELOW) {
            for (double above : ABOVE) {
                double low = energy - below * size;
                double high = energy + above * size;
                double[] amounts = new double[2];
                double misfit = amounts(kelvin, lnRate, meanX, meanY, low, high, amounts);
                if (!(amounts[0] > 0) || !(amounts[1] > 0)) {
                    continue;
                }
                double[] start = {
                    meanY + StrictMath.log(amounts[0]) + low / Constants.GAS * meanX,
                    low,
                    meanY + StrictMath.log(amounts[1]) + high / Constants.GAS * meanX,
                    high
                };
                int place = 0;
                while (place < starts.size() && misfits.get(place) <= misfit) {
                    place++;
                }
                starts.add(place, start);
                misfits.add(place, misfit);
            }
        }
        if (starts.isEmpty()) {
            // Concave points suit no sum of two channels: begin with two that are nearly one.
            double half = meanY - StrictMath.log(2);
            double low = energy - BELOW[0] * size;
            double high = energy + ABOVE[0] * size;
            starts.add(
                    new double[] {half + low / Constants.GAS * meanX, low, half + high / Constants.GAS * meanX, high});
        }
        return List.copyOf(starts.subList(0, Math.min(STARTS, starts.size())));
    }

    /**
     * The amounts of two exponentials, 1 at the centre each, that make {@code sum (1 − k(T)/k)²} smallest; its value.
     *
     * @param amounts receives them; one may be negative
     */
    private static double amounts(
            double[] kelvin, double[] lnRate, double meanX, double meanY, double low, double high, double[] amounts) {
        double s11 = 0;
        double s12 = 0;
        double s22 = 0;
        double s1 = 0;
        double s2 = 0;
        for (int i = 0; i < kelvin.length; i++) {
            double distance = (1 / kelvin[i] - meanX) / Constants.GAS;
            double first = StrictMath.exp(-low * distance - (lnRate[i] - meanY));
            double second = StrictMath.exp(-high * distance - (lnRate[i] - meanY));
            s11 += first * first;
            s12 += first * second;
            s22 += second * second;
            s1 += first;
            s2 += second;
        }
        double determinant = s11 * s22 - s12 * s12;
        amounts[0] = (s1 * s22 - s2 * s12) / determinant;
        amounts[1] = (s2 * s11 - s1 * s12) / determinant;
        return kelvin.length - amounts[0] * s1 - amounts[1] * s2;
    }
}
