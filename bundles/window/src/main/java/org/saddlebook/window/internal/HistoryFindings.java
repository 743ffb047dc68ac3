package org.saddlebook.window.internal;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.saddlebook.api.findings.Interval;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.quantity.Constants;
import org.saddlebook.api.quantity.Unit;

/**
 * What a course of temperature did: the equivalent age {@code ∫k(T(t))dt / k(T_ref)} and the mean kinetic temperature, the
 * constant one at which the same time gives the same {@code ∫k dt}. With an activation energy E it is
 * {@code (E/R) / −ln⟨exp(−E/(RT))⟩}, the mean taken over time (J. D. Haynes, J. Pharm. Sci. 60 (1971) 927). Intervals are of
 * first order in the parameters of the preferred law.
 */
final class HistoryFindings {
    /** A step of integration spans at most so many kelvin; with five points of Gauss it is exact to many digits. */
    private static final double STEP = 5;

    private static final double[] NODES = {0, 0.5384693101056831, 0.906179845938664};
    private static final double[] WEIGHTS = {0.5688888888888889, 0.47862867049936647, 0.23692688505618908};

    private final History history;
    private final double[] kelvin;
    private final double[] seconds;

    HistoryFindings(History history) {
        this.history = history;
        List<double[]> points = new ArrayList<>();
        for (int i = 1; i < history.seconds().length; i++) {
            double span = history.seconds()[i] - history.seconds()[i - 1];
            double from = history.kelvin()[i - 1];
            double to = history.kelvin()[i];
            if (history.steps() || from == to) {
                points.add(new double[] {from, span});
            } else {
                ramp(points, from, to, span);
            }
        }
        kelvin = new double[points.size()];
        seconds = new double[points.size()];
        for (int i = 0; i < kelvin.length; i++) {
            kelvin[i] = points.get(i)[0];
            seconds[i] = points.get(i)[1];
        }
    }

    /** Five points of Gauss and Legendre in each step (Abramowitz and Stegun, table 25.4). */
    private static void ramp(List<double[]> points, double from, double to, double span) {
        int steps = (int) Math.ceil(Math.abs(to - from) / STEP);
        for (int s = 0; s < steps; s++) {
            double middle = from + (to - from) * (s + 0.5) / steps;
            double half = (to - from) / (2.0 * steps);
            for (int n = 0; n < NODES.length; n++) {
                double weight = WEIGHTS[n] * span / (2.0 * steps);
                points.add(new double[] {middle + half * NODES[n], weight});
                if (n > 0) {
                    points.add(new double[] {middle - half * NODES[n], weight});
                }
            }
        }
    }

    /** Mean kinetic temperature for a constant activation energy, K. */
    double meanKinetic(double activationEnergy) {
        double scale = activationEnergy / Constants.GAS;
        double reference = history.highest();
        double sum = 0;
        for (int i = 0; i < kelvin.length; i++) {
            sum += seconds[i] * StrictMath.exp(scale * (1 / reference - 1 / kelvin[i]));
        }
        return 1 / (1 / reference - StrictMath.log(sum / history.duration()) / scale);
    }

    /**
     * ∫k dt under one law.
     *
     * @param lnSum ln of the integral, SI
     * @param gradient with respect to the parameters
     * @param sensor with respect to the shared errors
     */
    @SuppressWarnings("ArrayRecordComponent") // compared by nobody; handed over inside this package only
    private record Sum(double lnSum, double[] gradient, double[] sensor) {}

    private Sum sum(BoundLaw law) {
        double[] ln = new double[kelvin.length];
        BoundLaw.At[] at = new BoundLaw.At[kelvin.length];
        double most = Double.NEGATIVE_INFINITY;
        for (int i = 0; i < ln.length; i++) {
            at[i] = law.at(kelvin[i]);
            ln[i] = at[i].lnRate() + StrictMath.log(seconds[i]);
            most = Math.max(most, ln[i]);
        }
        double sum = 0;
        double[] gradient = new double[at[0].gradient().length];
        double[] sensor = new double[at[0].sensor().length];
        for (int i = 0; i < ln.length; i++) {
            double share = StrictMath.exp(ln[i] - most);
            sum += share;
            for (int j = 0; j < gradient.length; j++) {
                gradient[j] += share * at[i].gradient()[j];
            }
            for (int j = 0; j < sensor.length; j++) {
                sensor[j] += share * at[i].sensor()[j];
            }
        }
        for (int j = 0; j < gradient.length; j++) {
            gradient[j] /= sum;
        }
        for (int j = 0; j < sensor.length; j++) {
            sensor[j] /= sum;
        }
        return new Sum(most + StrictMath.log(sum), gradient, sensor);
    }

    /** The constant temperature of the same mean k, between the coldest and the hottest, K. */
    private double meanKinetic(BoundLaw law, double lnMean) {
        double low = history.lowest();
        double high = history.highest();
        boolean rising = law.at(high).lnRate() >= law.at(low).lnRate();
        for (int i = 0; i < 80; i++) {
            double middle = (low + high) / 2;
            if ((law.at(middle).lnRate() < lnMean) == rising) {
                low = middle;
            } else {
                high = middle;
            }
        }
        return (low + high) / 2;
    }

    Node.Group node(Rates rates, Optional<RateLaw> law) {
        Sum sum = sum(rates.best());
        double reference = history.referenceKelvin();
        List<String> cautions = cautions(rates, "storage-lower-bound");
        Unit unit = Words.timeUnit(history.duration());
        Tree tree = new Tree()
                .put("title", history.title())
                .put("duration", Node.Quantity.of(history.duration() / unit.factor(), unit.code()))
                .put("lowest", Node.Quantity.of(history.lowest(), "K"))
                .put("highest", Node.Quantity.of(history.highest(), "K"))
                .put("meanTemperature", Node.Quantity.of(history.meanKelvin(), "K"))
                .put("meanKineticTemperature", meanKinetic(rates, sum).withCautions(cautions));
        double at = history.meanKelvin();
        double energy = history.activationEnergy()
                .orElse(Constants.GAS * at * at * rates.best().slope(at));
        tree.put("activationEnergy", Node.Quantity.of(energy, "J/mol"));
        tree.put("activationEnergyFrom", history.activationEnergy().isPresent() ? "stated" : "fitted law");
        tree.put("referenceTemperature", Node.Quantity.of(reference, "K"));
        Rates.Spread age = age(rates, sum, reference);
        Unit ageUnit = Words.timeUnit(StrictMath.exp(age.value()));
        List<String> both = WindowCautions.with(
                cautions, rates.extrapolation(reference) > 0 ? new String[] {"extrapolated"} : new String[0]);
        tree.put("equivalentAge", rates.quantity(age, ageUnit.factor(), ageUnit.code(), both));
        tree.put("equivalentAgeAtMost", rates.atMost(age, ageUnit.factor(), ageUnit.code(), both));
        if (law.isPresent() && law.get().irreversible()) {
            tree.put("conversion", conversion(rates, sum, law.get()).withCautions(cautions));
        }
        if (rates.laws().size() > 1) {
            tree.put("byLaw", byLaw(rates, reference, ageUnit));
        }
        return tree.group();
    }

    private Node.Quantity meanKinetic(Rates rates, Sum sum) {
        if (history.activationEnergy().isPresent()) {
            return Node.Quantity.of(meanKinetic(history.activationEnergy().getAsDouble()), "K");
        }
        double value = meanKinetic(rates.best(), sum.lnSum() - StrictMath.log(history.duration()));
        BoundLaw.At at = rates.best().at(value);
        double slope = rates.best().slope(value);
        double[] gradient = new double[at.gradient().length];
        for (int i = 0; i < gradient.length; i++) {
            gradient[i] = (sum.gradient()[i] - at.gradient()[i]) / slope;
        }
        double[] sensor = new double[at.sensor().length];
        for (int i = 0; i < sensor.length; i++) {
            sensor[i] = (sum.sensor()[i] - at.sensor()[i]) / slope;
        }
        Rates.Spread spread = rates.spread(value, gradient, sensor);
        return Node.Quantity.of(value, "K", spread.standard())
                .withInterval(Interval.between(
                        value - spread.below()[0], value + spread.above()[0], rates.level(), spread.method()));
    }

    private static Rates.Spread age(Rates rates, Sum sum, double reference) {
        BoundLaw.At at = rates.best().at(reference);
        double[] gradient = sum.gradient().clone();
        double[] sensor = sum.sensor().clone();
        for (int i = 0; i < gradient.length; i++) {
            gradient[i] -= at.gradient()[i];
        }
        for (int i = 0; i < sensor.length; i++) {
            sensor[i] -= at.sensor()[i];
        }
        return rates.spread(sum.lnSum() - at.lnRate(), gradient, sensor);
    }

    private static Node.Quantity conversion(Rates rates, Sum sum, RateLaw law) {
        Rates.Spread ln = rates.spread(sum.lnSum(), sum.gradient(), sum.sensor());
        return new Node.Quantity(
                OptionalDouble.of(law.conversion(StrictMath.exp(ln.value()))),
                "1",
                OptionalDouble.empty(),
                OptionalDouble.empty(),
                Optional.of(Interval.between(
                        law.conversion(StrictMath.exp(ln.value() - ln.below()[0])),
                        law.conversion(StrictMath.exp(ln.value() + ln.above()[0])),
                        rates.level(),
                        ln.method())),
                List.of());
    }

    private Node.Items byLaw(Rates rates, double reference, Unit unit) {
        List<Node> items = new ArrayList<>();
        for (BoundLaw law : rates.laws()) {
            Sum sum = sum(law);
            double mean = meanKinetic(law, sum.lnSum() - StrictMath.log(history.duration()));
            double age = StrictMath.exp(sum.lnSum() - law.at(reference).lnRate());
            items.add(new Tree()
                    .put("law", law.title())
                    .put("meanKineticTemperature", Node.Quantity.of(mean, "K"))
                    .put("equivalentAge", Node.Quantity.of(age / unit.factor(), unit.code()))
                    .group());
        }
        return new Node.Items(items);
    }

    private List<String> cautions(Rates rates, String more) {
        double far = rates.extrapolation(history.lowest()) > 0 ? history.lowest() : history.highest();
        return rates.cautions(far, more);
    }
}
