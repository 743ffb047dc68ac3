package org.saddlebook.barrier.internal;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.TreeSet;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.task.Cancelled;

/**
 * Leaves out one temperature at a time, fits each law to the rest and predicts the mean of ln k there: how well a law
 * carries to a temperature that it has not seen. At the ends that is an extrapolation by one step.
 */
final class LeaveOneOut {
    private LeaveOneOut() {}

    /** Fits a law again to other measurements. */
    @FunctionalInterface
    interface Refit {
        LawOutcome fit(String id, Measurements data) throws Cancelled;
    }

    /** A row for each temperature and the root mean square, a column for each law; empty where no law can spare one. */
    static Optional<Node.Table> table(List<FittedLaw> laws, Refit refit) throws Cancelled {
        if (laws.isEmpty()) {
            return Optional.empty();
        }
        Measurements data = laws.get(0).data();
        TreeSet<Double> temperatures = new TreeSet<>();
        for (double kelvin : data.kelvin()) {
            temperatures.add(kelvin);
        }
        List<Node.Column> columns = new ArrayList<>();
        columns.add(new Node.Column("leftOut", "Left out", ""));
        for (FittedLaw law : laws) {
            columns.add(new Node.Column(law.id(), "Error in ln k, " + law.title(), "1"));
        }
        double[] squares = new double[laws.size()];
        int[] counts = new int[laws.size()];
        List<List<Node>> rows = new ArrayList<>();
        for (double kelvin : temperatures) {
            Measurements rest = data.without(kelvin);
            List<Node> row = new ArrayList<>();
            row.add(new Node.Text(Words.kelvin(kelvin)));
            for (int i = 0; i < laws.size(); i++) {
                FittedLaw law = laws.get(i);
                boolean enough = rest.distinctTemperatures() >= law.parameters().size() && rest.size() > 0;
                LawOutcome outcome = enough ? refit.fit(law.id(), rest) : null;
                if (outcome instanceof FittedLaw again) {
                    double error = meanError(data, kelvin, again);
                    squares[i] += error * error;
                    counts[i]++;
                    row.add(new Node.Scalar(error));
                } else {
                    row.add(new Node.Text(""));
                }
            }
            rows.add(row);
        }
        List<Node> last = new ArrayList<>();
        last.add(new Node.Text("root mean square"));
        boolean any = false;
        for (int i = 0; i < laws.size(); i++) {
            boolean all = counts[i] == temperatures.size();
            any |= all;
            last.add(all ? new Node.Scalar(Math.sqrt(squares[i] / counts[i])) : new Node.Text(""));
        }
        rows.add(last);
        return any ? Optional.of(new Node.Table(columns, rows)) : Optional.empty();
    }

    private static double meanError(Measurements data, double kelvin, FittedLaw law) {
        double[] parameters = law.fit().parameters();
        double[] unused = new double[parameters.length];

        double sum = 0;
        int count = 0;
        for (int i = 0; i < data.size(); i++) {
            if (data.kelvin(i) == kelvin) {
                sum += data.lnRate(i) - data.lnRate(law.law(), i, parameters, unused);
                count++;
            }
        }
        return sum / count;
    }
}
