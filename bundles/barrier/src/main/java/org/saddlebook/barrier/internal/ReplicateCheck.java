package org.saddlebook.barrier.internal;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.saddlebook.api.findings.Node;
import org.saddlebook.estimation.api.LackOfFit;
import org.saddlebook.presentation.api.Rounding;

/** Lack of fit of each law against the scatter of runs repeated at the same temperature (Draper and Smith 1998, 2.2). */
final class ReplicateCheck {
    private static final double ALARM = 0.05;

    private final List<String> remarks = new ArrayList<>();

    /** What deserves a line in a summary; filled by {@link #node}. */
    List<String> remarks() {
        return remarks;
    }

    /** A row for each law; empty when no temperature was repeated. */
    Optional<Node.Group> node(List<FittedLaw> laws) {
        if (laws.isEmpty()
                || laws.get(0).data().distinctPoints() == laws.get(0).data().size()) {
            return Optional.empty();
        }
        List<List<Node>> rows = new ArrayList<>();
        List<String> notes = new ArrayList<>();
        for (FittedLaw law : laws) {
            LackOfFit.Outcome outcome =
                    LackOfFit.test(law.fit(), response(law.data()), law.weights(), groups(law.data()));
            if (outcome instanceof LackOfFit.Tested tested) {
                rows.add(List.of(
                        new Node.Text(law.title()),
                        new Node.Scalar(tested.f()),
                        new Node.Scalar(tested.lackFreedom()),
                        new Node.Scalar(tested.pureFreedom()),
                        new Node.Scalar(Math.sqrt(tested.pureSum() / tested.pureFreedom())),
                        new Node.Scalar(tested.pValue())));
                if (tested.pValue() < ALARM) {
                    String text = law.title()
                            + " misses the means at the single temperatures by more than repeated runs differ (lack of fit,"
                            + " p = " + Rounding.probability(tested.pValue()) + ").";
                    notes.add(text);
                    remarks.add(text);
                }
            } else {
                notes.add(
                        law.title() + ": no test of lack of fit, " + ((LackOfFit.NotTestable) outcome).reason() + ".");
            }
        }
        Tree tree = new Tree();
        if (!rows.isEmpty()) {
            tree.put(
                    "tests",
                    new Node.Table(
                            List.of(
                                    new Node.Column("model", "Law", ""),
                                    new Node.Column("f", "F", "1"),
                                    new Node.Column("lackFreedom", "Degrees of freedom, lack of fit", "1"),
                                    new Node.Column("pureFreedom", "Degrees of freedom, repeats", "1"),
                                    new Node.Column("pureDeviation", "Scatter of repeats", "1"),
                                    new Node.Column("pValue", "p", "1")),
                            rows));
            if (remarks.isEmpty()) {
                notes.add(
                        "No law misses the means at the single temperatures by more than repeated runs explain. Repeats"
                                + " from one stock on one day hide what differs between stocks and days.");
            }
        }
        return Optional.of(tree.put("notes", Tree.texts(notes)).group());
    }

    private static double[] response(Measurements data) {
        double[] response = data.lnRate();
        if (data.response() == Measurements.Response.RATE) {
            for (int i = 0; i < response.length; i++) {
                response[i] = StrictMath.exp(data.lnRate(i) - data.lnRate(0));
            }
        }
        return response;
    }

    private static int[] groups(Measurements data) {
        int[] groups = new int[data.size()];
        for (int i = 0; i < groups.length; i++) {
            int first = 0;
            while (data.kelvin(first) != data.kelvin(i)
                    || !data.point(first).conditions().equals(data.point(i).conditions())) {
                first++;
            }
            groups[i] = first;
        }
        return groups;
    }
}
