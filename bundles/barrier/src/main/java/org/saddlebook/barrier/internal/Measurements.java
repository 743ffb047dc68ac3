package org.saddlebook.barrier.internal;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import java.util.TreeSet;
import org.saddlebook.api.campaign.ErrorModel;
import org.saddlebook.api.campaign.RatePoint;
import org.saddlebook.api.campaign.RateTable;
import org.saddlebook.api.model.Conditions;
import org.saddlebook.api.model.RateFunction;

/** The used points of a rate table with their weights, as flat arrays in order of the table. */
final class Measurements {
    /** What is fitted. */
    enum Response {
        /** ln k. */
        LN_RATE("ln k"),
        /** k itself: above this relative uncertainty the logarithm of a measured k is too skew for its weights. */
        RATE("k");

        private final String text;

        Response(String text) {
            this.text = text;
        }

        String text() {
            return text;
        }
    }

    /** Relative uncertainty above which k itself is fitted; see {@link Response#RATE}. */
    private static final double LARGEST_RELATIVE_UNCERTAINTY = 0.2;

    private final ErrorModel errorModel;
    private final Response response;
    private final List<RatePoint> points;
    private final double[] kelvin;
    private final double[] lnRate;
    private final double[] stated;
    private final double[] kelvinStated;
    private final double[] relative;
    private final double[] weights;

    private Measurements(
            ErrorModel errorModel,
            Response response,
            List<RatePoint> points,
            double[] kelvin,
            double[] lnRate,
            double[] stated,
            double[] kelvinStated) {
        this.errorModel = errorModel;
        this.response = response;
        this.points = points;
        this.kelvin = kelvin;
        this.lnRate = lnRate;
        this.stated = stated;
        this.kelvinStated = kelvinStated;
        relative = kelvinStated.length == 0 ? stated : withTemperatures();
        weights = new double[relative.length];
        for (int i = 0; i < weights.length; i++) {
            // On k the weight is 1/u(k)^2; u(k) = relative * k, and the response is k in units of exp(lnRate[0]).
            double u = response == Response.RATE ? relative[i] * StrictMath.exp(lnRate[i] - lnRate[0]) : relative[i];
            weights[i] = 1 / (u * u);
        }
    }

    /** The used points under an error model; the table has at least one, and stated errors where the model needs them. */
    static Measurements of(RateTable table, ErrorModel errorModel) {
        List<RatePoint> used = table.used();
        int n = used.size();
        double[] kelvin = new double[n];
        double[] lnRate = new double[n];
        double[] relative = new double[errorModel.isStated() ? n : 0];
        double[] kelvinStated = new double[errorModel == ErrorModel.STATED_BOTH ? n : 0];
        double largest = 0;
        for (int i = 0; i < n; i++) {
            RatePoint point = used.get(i);
            kelvin[i] = point.kelvin();
            lnRate[i] = StrictMath.log(point.rate());
            if (relative.length > 0) {
                relative[i] = point.rateUncertainty().orElseThrow() / point.rate();
                largest = Math.max(largest, relative[i]);
            }
            if (kelvinStated.length > 0) {
                kelvinStated[i] = point.kelvinUncertainty().orElseThrow();
            }
        }
        Response response = largest > LARGEST_RELATIVE_UNCERTAINTY || errorModel == ErrorModel.CONSTANT_ABSOLUTE
                ? Response.RATE
                : Response.LN_RATE;
        return new Measurements(errorModel, response, used, kelvin, lnRate, relative, kelvinStated);
    }

    /** The same without the points at one temperature, fitted to the same response. */
    Measurements without(double leftOutKelvin) {
        List<RatePoint> kept = new ArrayList<>();
        int[] rows = new int[kelvin.length];
        int count = 0;
        for (int i = 0; i < kelvin.length; i++) {
            if (kelvin[i] != leftOutKelvin) {
                kept.add(points.get(i));
                rows[count++] = i;
            }
        }
        return new Measurements(
                errorModel,
                response,
                kept,
                pick(kelvin, rows, count),
                pick(lnRate, rows, count),
                pick(stated, rows, count),
                pick(kelvinStated, rows, count));
    }

    private static double[] pick(double[] values, int[] rows, int count) {
        double[] picked = new double[values.length == 0 ? 0 : count];
        for (int i = 0; i < picked.length; i++) {
            picked[i] = values[rows[i]];
        }
        return picked;
    }

    /**
     * Relative uncertainties of k that an uncertain temperature adds to: {@code u(T) |d ln k/dT|} with the slope of a
     * straight line of ln k in 1/T.
     */
    private double[] withTemperatures() {
        double sum = 0;
        double x = 0;
        double y = 0;
        for (int i = 0; i < kelvin.length; i++) {
            double weight = 1 / (stated[i] * stated[i]);
            sum += weight;
            x += weight / kelvin[i];
            y += weight * lnRate[i];
        }
        double xx = 0;
        double xy = 0;
        for (int i = 0; i < kelvin.length; i++) {
            double weight = 1 / (stated[i] * stated[i]);
            double distance = 1 / kelvin[i] - x / sum;
            xx += weight * distance * distance;
            xy += weight * distance * (lnRate[i] - y / sum);
        }
        double slope = xx > 0 ? xy / xx : 0;
        double[] result = new double[kelvin.length];
        for (int i = 0; i < result.length; i++) {
            double fromTemperature = slope / (kelvin[i] * kelvin[i]) * kelvinStated[i];
            result[i] = Math.sqrt(stated[i] * stated[i] + fromTemperature * fromTemperature);
        }
        return result;
    }

    /** Whether the temperatures have stated uncertainties of their own. */
    boolean uncertainTemperatures() {
        return kelvinStated.length > 0;
    }

    /** Stated standard uncertainty of the temperature of point i, K. */
    double kelvinUncertainty(int i) {
        return kelvinStated[i];
    }

    /** Stated relative standard uncertainty of k of point i alone, without that of its temperature. */
    double statedUncertainty(int i) {
        return stated[i];
    }

    /** The point as measured. */
    RatePoint point(int i) {
        return points.get(i);
    }

    /** The same as a common error would have shown them: temperatures and ln k displaced, {@code sign} +1 or -1. */
    Measurements displaced(SharedErrors.Cause cause, int sign) {
        double[] shown = new double[kelvin.length];
        double[] ln = new double[kelvin.length];
        for (int i = 0; i < shown.length; i++) {
            shown[i] = cause.shifted(kelvin[i], sign);
            ln[i] = lnRate[i] + sign * cause.lnRateShift();
        }
        return new Measurements(errorModel, response, points, shown, ln, stated, kelvinStated);
    }

    int size() {
        return kelvin.length;
    }

    /** What else each point was measured at. */
    List<Conditions> conditions() {
        List<Conditions> conditions = new ArrayList<>(points.size());
        for (RatePoint point : points) {
            conditions.add(point.conditions());
        }
        return conditions;
    }

    /** ln k of a law at the temperature and conditions of point i, with its gradient. */
    double lnRate(RateFunction law, int i, double[] p, double[] gradient) {
        return law.lnRate(kelvin[i], points.get(i).conditions(), p, gradient);
    }

    /** How many points differ in temperature or in another condition. */
    int distinctPoints() {
        Set<List<Object>> distinct = new HashSet<>();
        for (int i = 0; i < kelvin.length; i++) {
            distinct.add(List.of(kelvin[i], points.get(i).conditions()));
        }
        return distinct.size();
    }

    ErrorModel errorModel() {
        return errorModel;
    }

    /** Whether the size of the errors is known, not estimated from the scatter. */
    boolean stated() {
        return errorModel.isStated();
    }

    Response response() {
        return response;
    }

    /**
     * SI size of one unit of the fitted response: 1 for ln k; k is fitted in units of the first one, so that its size cannot
     * matter.
     */
    double responseUnit() {
        return response == Response.RATE ? StrictMath.exp(lnRate[0]) : 1;
    }

    double kelvin(int i) {
        return kelvin[i];
    }

    double[] kelvin() {
        return kelvin.clone();
    }

    /** ln of the SI rate constants. */
    double[] lnRate() {
        return lnRate.clone();
    }

    double lnRate(int i) {
        return lnRate[i];
    }

    /** Stated relative uncertainty of point i, that of its temperature included; 0 where none is stated. */
    double relativeUncertainty(int i) {
        return relative.length == 0 ? 0 : relative[i];
    }

    /** Weights of the response; null where all are 1. */
    double[] weights() {
        return weights.length == 0 ? null : weights.clone();
    }

    /** Weights on ln k, whatever the response; null where all are 1. */
    double[] weightsOnLogarithm() {
        if (errorModel == ErrorModel.CONSTANT_RELATIVE) {
            return null;
        }
        double[] result = new double[kelvin.length];
        for (int i = 0; i < result.length; i++) {
            result[i] = weightOnLogarithm(i);
        }
        return result;
    }

    double lowestKelvin() {
        double lowest = kelvin[0];
        for (double t : kelvin) {
            lowest = Math.min(lowest, t);
        }
        return lowest;
    }

    double highestKelvin() {
        double highest = kelvin[0];
        for (double t : kelvin) {
            highest = Math.max(highest, t);
        }
        return highest;
    }

    int distinctTemperatures() {
        TreeSet<Double> distinct = new TreeSet<>();
        for (double t : kelvin) {
            distinct.add(t);
        }
        return distinct.size();
    }

    /**
     * The centre of the table, K: {@code 1/T0 = sum(w/T)/sum(w)} with the weights on ln k, where slope and intercept are
     * uncorrelated.
     */
    double centreKelvin() {
        double sum = 0;
        double total = 0;
        for (int i = 0; i < kelvin.length; i++) {
            double weight = weightOnLogarithm(i);
            sum += weight / kelvin[i];
            total += weight;
        }
        return total / sum;
    }

    /** Share of the spread in 1/T that the heaviest single temperature contributes, 0 to 1; 0 without any spread. */
    double heaviestShareOfSlope() {
        double centre = 1 / centreKelvin();
        double total = 0;
        double heaviest = 0;
        for (double distinct :
                new TreeSet<>(java.util.Arrays.stream(kelvin).boxed().toList())) {
            double own = 0;
            for (int i = 0; i < kelvin.length; i++) {
                if (kelvin[i] == distinct) {
                    double distance = 1 / kelvin[i] - centre;
                    own += weightOnLogarithm(i) * distance * distance;
                }
            }
            total += own;
            heaviest = Math.max(heaviest, own);
        }
        return total > 0 ? heaviest / total : 0;
    }

    /** Standard deviation in ln k of one more run as stated: the root mean square of the stated ones. */
    double typicalRelativeUncertainty() {
        return rootMeanSquare(stated);
    }

    /** Standard uncertainty of the temperature of one more run: the root mean square of the stated ones, K; 0 for none. */
    double typicalKelvinUncertainty() {
        return rootMeanSquare(kelvinStated);
    }

    private static double rootMeanSquare(double[] values) {
        double sum = 0;
        for (double u : values) {
            sum += u * u;
        }
        return values.length == 0 ? 0 : Math.sqrt(sum / values.length);
    }

    private double weightOnLogarithm(int i) {
        if (errorModel == ErrorModel.CONSTANT_ABSOLUTE) {
            // u(ln k) = u/k: only ratios of weights matter.
            return StrictMath.exp(2 * (lnRate[i] - lnRate[0]));
        }
        return relative.length == 0 ? 1 : 1 / (relative[i] * relative[i]);
    }
}
