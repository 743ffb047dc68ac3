package org.saddlebook.data.checks.internal;

import java.math.BigDecimal;
import java.math.MathContext;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.OptionalInt;
import java.util.Random;
import org.saddlebook.api.campaign.Campaign;
import org.saddlebook.api.campaign.RatePoint;
import org.saddlebook.api.campaign.RateTable;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.quantity.Constants;
import org.saddlebook.api.quantity.Unit;
import org.saddlebook.units.api.UnitException;
import org.saddlebook.units.api.Units;

/**
 * Invented campaigns as laboratories have them: ΔS‡ from −180 to +80 J/(mol K), k that runs take seconds to days, four to
 * ten whole-number temperatures, often replicated, scatter of 1 to 10 %, now and then a run three times as bad, in half of
 * the campaigns a heat capacity of activation (standard deviation 200 J/(mol K)), order 1 or 2, three or four digits.
 */
final class Simulated {
    private final Random random;
    private final double order;
    private final Unit unit;
    private final List<double[]> rows = new ArrayList<>(); // T, ln k in the unit
    private int digits;
    private double energy;
    private double lnRateAtCentre;
    private double centre;
    private boolean stated;
    private double scatter;

    Simulated(Random random) {
        this.random = random;
        order = random.nextInt(3) == 0 ? 2 : 1;
        try {
            unit = Units.parse(order == 2 ? "L/(mol.s)" : "s-1");
        } catch (UnitException impossible) {
            throw new IllegalStateException(impossible);
        }
        draw();
    }

    private void draw() {
        int temperatures = 4 + random.nextInt(7);
        double step = new double[] {5, 5, 8, 10, 10, 15, 20}[random.nextInt(7)];
        double lowest = 273.15 + 5 * (random.nextInt(24) - 2);
        List<Double> kelvin = new ArrayList<>();
        for (int i = 0; i < temperatures; i++) {
            double wobble = random.nextInt(3) == 0 ? random.nextInt(3) - 1 : 0;
            int replicates = random.nextInt(3) == 0 ? 1 + random.nextInt(3) : 1;
            for (int j = 0; j < replicates; j++) {
                kelvin.add(lowest + i * step + wobble);
            }
        }
        if (random.nextInt(3) == 0) {
            Collections.shuffle(kelvin, random);
        } else if (random.nextInt(3) == 0) {
            Collections.reverse(kelvin);
        }
        centre = lowest + step * (temperatures - 1) / 2;
        double entropy = -180 + 260 * random.nextDouble();
        // Half-life from 20 s to two days at the centre (for order 2 at 0.1 mol/L).
        double lnLife = StrictMath.log(20) + random.nextDouble() * StrictMath.log(8640);
        lnRateAtCentre = StrictMath.log(StrictMath.log(2)) - lnLife + (order == 2 ? StrictMath.log(10) : 0);
        double gibbs =
                Constants.GAS * centre * (Constants.LN_BOLTZMANN_OVER_PLANCK + StrictMath.log(centre) - lnRateAtCentre);
        double enthalpy = Math.max(15_000, gibbs + centre * entropy);
        energy = enthalpy + Constants.GAS * centre;
        double heatCapacity = random.nextBoolean() ? 200 * random.nextGaussian() : 0;
        scatter = new double[] {0.01, 0.02, 0.02, 0.03, 0.05, 0.05, 0.1}[random.nextInt(7)];
        stated = random.nextInt(4) == 0;
        digits = 3 + random.nextInt(2);
        for (double t : kelvin) {
            double x = 1 / t - 1 / centre;
            double error = scatter * random.nextGaussian() * (random.nextInt(33) == 0 ? 3 : 1);
            rows.add(new double[] {
                t,
                lnRateAtCentre
                        - energy / Constants.GAS * x
                        + heatCapacity / Constants.GAS * (StrictMath.log(t / centre) + centre / t - 1)
                        + error
            });
        }
    }

    int size() {
        return rows.size();
    }

    double order() {
        return order;
    }

    /** Multiplies k of rows from to before to. */
    Simulated shiftRates(int from, int to, double lnFactor) {
        for (int i = from; i < to; i++) {
            rows.get(i)[1] += lnFactor;
        }
        return this;
    }

    /** Writes temperatures of rows on another scale than they are read on. */
    Simulated shiftTemperatures(int from, int to, TemperatureMixUps.Scale scale) {
        for (int i = from; i < to; i++) {
            // The number meant is read on the wrong scale.
            rows.get(i)[0] = scale.read().toSi(scale.meant().fromSi(rows.get(i)[0]));
        }
        return this;
    }

    boolean readable() {
        for (double[] row : rows) {
            if (!(row[0] > 0)) {
                return false;
            }
        }
        return true;
    }

    /** Copies some rows behind the last. */
    Simulated copyRows(int from, int to) {
        for (int i = from; i < to; i++) {
            rows.add(rows.get(i).clone());
        }
        return this;
    }

    /** The campaign with a reference: two laboratories apart by 10 % in k and 2 % in Ea. */
    Campaign campaignWithReference(double energyFactor) {
        double other = energy * (1 + 0.02 * random.nextGaussian());
        double lnPrefactor = lnRateAtCentre + 0.1 * random.nextGaussian() + other / (Constants.GAS * centre);
        Node.Group reference = new Node.Group(Map.of(
                "Ea", Node.Quantity.of(other / energyFactor, "J/mol"),
                "A", Node.Quantity.of(StrictMath.exp(lnPrefactor), unit.code())));
        return campaign().withSetting(DataChecksEvaluation.SECTION, new Node.Group(Map.of("reference", reference)));
    }

    Campaign campaign() {
        List<RatePoint> points = new ArrayList<>();
        for (int i = 0; i < rows.size(); i++) {
            BigDecimal rate = new BigDecimal(StrictMath.exp(rows.get(i)[1])).round(new MathContext(digits));
            double value = unit.toSi(rate.doubleValue());
            points.add(new RatePoint(
                    rows.get(i)[0],
                    value,
                    OptionalDouble.empty(),
                    stated ? OptionalDouble.of(value * scatter) : OptionalDouble.empty(),
                    "",
                    Optional.empty(),
                    new RatePoint.AsRead(OptionalInt.of(i + 2), "", rate.toString())));
        }
        return Campaign.titled("invented").withRateTable(new RateTable(unit, order, points));
    }
}
