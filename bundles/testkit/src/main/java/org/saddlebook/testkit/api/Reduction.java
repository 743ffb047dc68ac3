package org.saddlebook.testkit.api;

import java.util.List;
import org.saddlebook.api.model.Parameter;
import org.saddlebook.api.model.RateFunction;

/** How far a law with its extra parameter at the neutral value is from the best member of a simpler, linear law. */
final class Reduction {
    private Reduction() {}

    /**
     * The largest distance in ln k over the example's temperatures. The best member is found by orthogonalising the
     * simpler law's gradients (modified Gram–Schmidt, twice); the simpler law must be linear in its parameters.
     */
    static double distance(RateFunction law, RateFunction simpler, Example example) {
        if (!simpler.linear()) {
            throw new IllegalArgumentException("the simpler law must be linear in its parameters to be compared");
        }
        double[] kelvins = example.kelvins();
        double[] p = atNeutral(law.parameters(), example.parameters());
        int width = simpler.parameters().size();
        double[] zero = new double[width];
        double[] rest = new double[kelvins.length];
        double[][] columns = new double[width][kelvins.length];
        for (int i = 0; i < kelvins.length; i++) {
            double[] gradient = new double[width];
            double offset = simpler.lnRate(kelvins[i], zero, gradient);
            rest[i] = law.lnRate(kelvins[i], p, new double[p.length]) - offset;
            for (int j = 0; j < width; j++) {
                columns[j][i] = gradient[j];
            }
        }
        for (int j = 0; j < width; j++) {
            for (int pass = 0; pass < 2; pass++) {
                for (int earlier = 0; earlier < j; earlier++) {
                    remove(columns[earlier], columns[j]);
                }
                normalise(columns[j]);
            }
        }
        for (int pass = 0; pass < 2; pass++) {
            for (double[] column : columns) {
                remove(column, rest);
            }
        }
        double largest = 0;
        for (double value : rest) {
            largest = Math.max(largest, Math.abs(value));
        }
        return largest;
    }

    private static double[] atNeutral(List<Parameter> parameters, double[] p) {
        for (int i = 0; i < p.length; i++) {
            if (parameters.get(i).neutral().isPresent()) {
                p[i] = parameters.get(i).neutral().getAsDouble();
            }
        }
        return p;
    }

    private static void remove(double[] unit, double[] from) {
        double dot = 0;
        for (int i = 0; i < unit.length; i++) {
            dot += unit[i] * from[i];
        }
        for (int i = 0; i < unit.length; i++) {
            from[i] -= dot * unit[i];
        }
    }

    private static void normalise(double[] column) {
        double sum = 0;
        for (double value : column) {
            sum += value * value;
        }
        double length = Math.sqrt(sum);
        for (int i = 0; i < column.length; i++) {
            column[i] /= length;
        }
    }
}
