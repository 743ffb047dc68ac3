package org.saddlebook.barrier.internal;

import java.util.ArrayList;
import java.util.List;
import org.saddlebook.api.campaign.ErrorModel;
import org.saddlebook.api.campaign.RatePoint;
import org.saddlebook.api.campaign.RateTable;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.model.Parameter;
import org.saddlebook.api.model.RateContext;
import org.saddlebook.api.model.RateModel;
import org.saddlebook.api.quantity.Unit;

/** The same data under each error model they allow, side by side: what moves, and by how much. */
final class ErrorModelComparison {
    private final RateTable table;
    private final double level;
    private final List<Double> targets;

    ErrorModelComparison(RateTable table, double level, List<Double> targets) {
        this.table = table;
        this.level = level;
        this.targets = targets;
    }

    /** A table with a row for each error model; models that the data do not allow are left out. */
    Node.Table of(RateModel model, RateContext context, Unit rateUnit, Runnable check) {
        List<Node.Column> columns = new ArrayList<>();
        columns.add(new Node.Column("errorModel", "Error model", ""));
        List<List<Node>> rows = new ArrayList<>();
        for (ErrorModel errorModel : ErrorModel.values()) {
            if (!allowed(errorModel)) {
                continue;
            }
            LawOutcome outcome = LawFitter.fit(model, context, Measurements.of(table, errorModel), check);
            if (!(outcome instanceof FittedLaw law)) {
                continue;
            }
            Quantities quantities = new Quantities(level, law.degreesOfFreedom());
            List<Node> row = new ArrayList<>();
            row.add(new Node.Text(errorModel.key()));
            for (int i = 0; i < law.parameters().size(); i++) {
                Parameter parameter = law.parameters().get(i);
                row.add(quantities.of(law.parameter(i), parameter.scale(), parameter.unit(), List.of()));
                if (rows.isEmpty()) {
                    columns.add(new Node.Column(
                            parameter.symbol(),
                            parameter.symbol(),
                            parameter.unit().code()));
                }
            }
            for (double kelvin : targets) {
                row.add(quantities.of(law.lnRate(kelvin), Parameter.Scale.LOG, rateUnit, List.of("same-mechanism")));
                if (rows.isEmpty()) {
                    columns.add(new Node.Column(
                            "k" + (columns.size() - law.parameters().size()),
                            "k at " + Words.kelvin(kelvin),
                            rateUnit.code()));
                }
            }
            rows.add(row);
        }
        return new Node.Table(columns, rows);
    }

    private boolean allowed(ErrorModel errorModel) {
        for (RatePoint point : table.used()) {
            if ((errorModel.isStated() && point.rateUncertainty().isEmpty())
                    || (errorModel == ErrorModel.STATED_BOTH
                            && point.kelvinUncertainty().isEmpty())) {
                return false;
            }
        }
        return true;
    }
}
