package org.saddlebook.reaction.series.internal;

import java.util.ArrayList;
import java.util.List;
import org.saddlebook.api.campaign.RatePoint;
import org.saddlebook.api.campaign.RateTable;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.findings.Section;
import org.saddlebook.api.quantity.Unit;
import org.saddlebook.units.api.UnitException;
import org.saddlebook.units.api.Units;

/** The invented tables of {@code demo-data/series} and {@code demo-data/ratios}, and access to findings. */
final class Data {
    static final Reaction PLAIN =
            reaction("plain", "h-1", new double[][] {{40, 0.0191}, {50, 0.0578}, {60, 0.152}, {70, 0.399}, {80, 1.03}});
    static final Reaction ZINC =
            reaction("zinc", "h-1", new double[][] {{35, 0.0296}, {45, 0.077}, {55, 0.187}, {65, 0.455}, {75, 1.06}});
    static final Reaction TIN =
            reaction("tin", "h-1", new double[][] {{30, 0.0353}, {40, 0.0872}, {50, 0.207}, {60, 0.472}, {70, 1.03}});
    static final String EXCESS = """
            # title: Terpene epoxide, ring opening
            # numerator: R
            # denominator: S
            T (degC),ee (%),u(ee) (%)
            -40,65.7,0.8
            -20,54.8,0.8
            0,41.2,0.8
            20,31.0,0.8
            40,19.4,0.8
            """;

    private Data() {}

    static Reaction reaction(String name, String unit, double[][] celsiusAndRate) {
        try {
            Unit parsed = Units.parse(unit);
            List<RatePoint> points = new ArrayList<>();
            for (double[] row : celsiusAndRate) {
                RatePoint point = RatePoint.of(row[0] + 273.15, parsed.toSi(row[1]));
                points.add(row.length > 2 ? point.withRateUncertainty(parsed.toSi(row[2])) : point);
            }
            return Reaction.of(
                    name, new RateTable(parsed, Units.rateOrder(parsed).getAsDouble(), points));
        } catch (UnitException wrong) {
            throw new AssertionError(wrong);
        }
    }

    static Node.Group body(Section section) {
        if (section.outcome() != Section.Outcome.DONE) {
            throw new AssertionError(section.body().toString());
        }
        return (Node.Group) section.body();
    }

    static Node.Group item(Node.Group group, String list, int i) {
        return (Node.Group) ((Node.Items) group.get(list).orElseThrow()).items().get(i);
    }

    static double number(Node.Group group, String key) {
        return ((Node.Scalar) group.get(key).orElseThrow()).value();
    }

    static Node.Quantity quantity(Node.Group group, String key) {
        return (Node.Quantity) group.get(key).orElseThrow();
    }

    static String text(Node.Group group, String key) {
        return ((Node.Text) group.get(key).orElseThrow()).value();
    }
}
