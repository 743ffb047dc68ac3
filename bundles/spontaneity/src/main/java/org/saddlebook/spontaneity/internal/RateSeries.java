package org.saddlebook.spontaneity.internal;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.saddlebook.api.campaign.RatePoint;
import org.saddlebook.api.campaign.RateTable;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.quantity.Constants;
import org.saddlebook.api.quantity.Unit;
import org.saddlebook.estimation.api.LinearFit;
import org.saddlebook.estimation.api.LinearLeastSquares;
import org.saddlebook.units.api.UnitException;
import org.saddlebook.units.api.Units;

/**
 * Rate constants of one direction.
 *
 * @param name forward or reverse, for messages
 * @param order overall order, by the unit
 * @param kelvin temperatures, K
 * @param lnRate ln of k in SI
 * @param uncertainty standard uncertainties of ln k; empty where not stated for every row
 */
record RateSeries(
        String name, double order, List<Double> kelvin, List<Double> lnRate, Optional<List<Double>> uncertainty) {

    /** The used points of the campaign's own table. */
    static RateSeries of(String name, RateTable table) {
        List<Double> t = new ArrayList<>();
        List<Double> ln = new ArrayList<>();
        List<Double> u = new ArrayList<>();
        for (RatePoint point : table.used()) {
            t.add(point.kelvin());
            ln.add(StrictMath.log(point.rate()));
            if (point.rateUncertainty().isPresent()) {
                u.add(point.rateUncertainty().getAsDouble() / point.rate());
            }
        }
        return new RateSeries(
                name,
                table.order(),
                List.copyOf(t),
                List.copyOf(ln),
                u.size() == t.size() ? Optional.of(u) : Optional.empty());
    }

    /** From the settings: {@code unit} and {@code rows} of temperature, k and, for all or none, u. */
    static RateSeries read(String name, Node node) throws Refusal {
        String place = "the " + name + " rates";
        SettingsReader settings = new SettingsReader(node, place, List.of("unit", "rows"));
        Unit unit;
        OptionalDouble order;
        try {
            unit = Units.rateConstant(settings.text("unit")
                    .orElseThrow(() -> new Refusal("In " + place + " the unit of k is missing, such as 1/s.")));
            order = Units.rateOrder(unit);
        } catch (UnitException wrong) {
            throw new Refusal("In " + place + " the unit of k cannot be used: found " + wrong.found() + ", expected "
                    + wrong.expected() + ".");
        }
        if (settings.node("rows").isEmpty()
                || !(settings.node("rows").get() instanceof Node.Items rows)
                || rows.items().isEmpty()) {
            throw new Refusal("In " + place + " rows are missing: temperature and k, and u for all or none.");
        }
        List<Double> t = new ArrayList<>();
        List<Double> ln = new ArrayList<>();
        List<Double> u = new ArrayList<>();
        for (int i = 0; i < rows.items().size(); i++) {
            String where = "row " + (i + 1) + " of " + place;
            SettingsReader row = new SettingsReader(rows.items().get(i), where, List.of("temperature", "k", "u"));
            t.add(row.kelvin("temperature"));
            double k = row.scalar("k").orElse(0);
            if (!(k > 0)) {
                throw new Refusal("In " + where + " k must be a plain number above zero, in the stated unit.");
            }
            ln.add(StrictMath.log(unit.toSi(k)));
            OptionalDouble one = row.scalar("u");
            if (one.isPresent()) {
                if (!(one.getAsDouble() > 0)) {
                    throw new Refusal("In " + where + " u must be above zero: the standard uncertainty of ln k.");
                }
                u.add(one.getAsDouble());
            }
        }
        if (!u.isEmpty() && u.size() < t.size()) {
            throw new Refusal("Some rows of " + place + " state u and some do not; state it for all or for none.");
        }
        return new RateSeries(
                name,
                order.orElseThrow(() -> new Refusal("In " + place + " the unit of k has no order.")),
                List.copyOf(t),
                List.copyOf(ln),
                u.isEmpty() ? Optional.empty() : Optional.of(List.copyOf(u)));
    }

    /**
     * The straight line of ln k against 1/T around a temperature.
     *
     * @param lnRate at the centre
     * @param energy R times minus the slope, J/mol
     * @param covariance of both
     * @param degreesOfFreedom of the scatter; empty where uncertainties were stated
     */
    @SuppressWarnings("ArrayRecordComponent") // compared by nobody; handed over inside this package only
    record Line(double lnRate, double energy, double[][] covariance, OptionalDouble degreesOfFreedom) {}

    /** The line; empty where two temperatures, or three rows without u, are missing. */
    Optional<Line> line(double theta) {
        int n = kelvin.size();
        double[][] design = new double[n][2];
        double[] response = new double[n];
        double[] weights = new double[n];
        for (int i = 0; i < n; i++) {
            design[i][0] = 1;
            design[i][1] = (1 / theta - 1 / kelvin.get(i)) / Constants.GAS;
            response[i] = lnRate.get(i);
            double u = uncertainty.isPresent() ? uncertainty.get().get(i) : 1;
            weights[i] = 1 / (u * u);
        }
        return LinearLeastSquares.fit(design, response, weights).fold(this::line, deficient -> Optional.empty());
    }

    private Optional<Line> line(LinearFit fit) {
        boolean stated = uncertainty.isPresent();
        if (!stated && fit.degreesOfFreedom() < 1) {
            return Optional.empty();
        }
        double scale = stated ? 1 : fit.residualVariance();
        double[][] covariance = fit.unscaledCovariance();
        for (double[] row : covariance) {
            for (int j = 0; j < row.length; j++) {
                row[j] *= scale;
            }
        }
        return Optional.of(new Line(
                fit.parameters()[0],
                fit.parameters()[1],
                covariance,
                stated ? OptionalDouble.empty() : OptionalDouble.of(fit.degreesOfFreedom())));
    }
}
