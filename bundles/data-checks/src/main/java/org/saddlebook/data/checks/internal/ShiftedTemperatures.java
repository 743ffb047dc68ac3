package org.saddlebook.data.checks.internal;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.saddlebook.api.findings.Node;
import org.saddlebook.presentation.api.QuantityText;

/** Temperatures on another scale than read: in some rows, or in the whole table. */
final class ShiftedTemperatures implements Rule {
    private final boolean wholeTable;

    /**
     * The rule.
     *
     * @param wholeTable whether it speaks of the whole table (°C in 1/T), else of some of its rows
     */
    ShiftedTemperatures(boolean wholeTable) {
        this.wholeTable = wholeTable;
    }

    @Override
    public String id() {
        return wholeTable ? "celsius-in-reciprocal-temperature" : "shifted-temperatures";
    }

    @Override
    public String title() {
        return wholeTable
                ? "degrees Celsius or Fahrenheit taken for kelvin in 1/T"
                : "rows whose temperatures are on another scale";
    }

    @Override
    public Outcome examine(Subject subject) {
        if (subject.rows().size() < 4 || subject.distinctTemperatures() < 3) {
            return new Outcome.NotExamined("it needs four rows at three temperatures");
        }
        double probability = subject.shifts().probability(this::mine);
        if (!(probability > ShiftedRows.REPORTED)) {
            return new Outcome.Nothing();
        }
        ShiftSearch.Explanation best = subject.shifts().best(this::mine, 1).get(0);
        return new Outcome.Found(List.of(finding(subject, best, probability)));
    }

    private boolean mine(ShiftSearch.Explanation explanation) {
        return explanation.scale() != null && explanation.wholeTable() == wholeTable;
    }

    private static Finding finding(Subject subject, ShiftSearch.Explanation best, double probability) {
        List<Row> block = best.wholeTable() ? subject.rows() : best.block().of(subject.rows(), true);
        List<Row> mended = new ArrayList<>();
        for (Row row : subject.rows()) {
            mended.add(block.contains(row) ? at(row, best.scale().mend(row.kelvin())) : row);
        }
        Map<String, Node> evidence = new LinkedHashMap<>();
        StringBuilder sentence = new StringBuilder();
        Row first = block.get(0);
        if (best.wholeTable()) {
            sentence.append("The rate constants lie on a straight line against 1/T as if ");
        } else {
            sentence.append(Say.capital(Say.rows(block)))
                    .append(block.size() == 1 ? " comes" : " come")
                    .append(" onto the line of the others as if ");
        }
        sentence.append(best.scale().meaning())
                .append(": ")
                .append(QuantityText.temperature(first.kelvin()))
                .append(" would then be ")
                .append(QuantityText.temperature(best.scale().mend(first.kelvin())))
                .append(". ");
        Optional<Line> line = Line.through(mended);
        if (line.isPresent() && subject.line().isPresent()) {
            sentence.append("The scatter about a straight line would fall from ")
                    .append(Say.scatter(subject.line().get().scatter()))
                    .append(" to ")
                    .append(Say.scatter(line.get().scatter()))
                    .append(". ");
            evidence.put("scatterAsRead", new Node.Scalar(subject.line().get().scatter()));
            evidence.put("scatterMended", new Node.Scalar(line.get().scatter()));
        }
        sentence.append("Look at the scale in the source of ")
                .append(best.wholeTable() ? "the temperatures." : block.size() == 1 ? "that row." : "those rows.");
        evidence.put("mixUp", new Node.Text(best.scale().id()));
        evidence.put("probability", new Node.Scalar(probability));
        return new Finding(sentence.toString(), best.wholeTable() ? List.of() : Say.numbers(block), evidence);
    }

    static Row at(Row row, double kelvin) {
        return new Row(
                row.number(),
                new org.saddlebook.api.campaign.RatePoint(
                        kelvin,
                        row.point().rate(),
                        row.point().kelvinUncertainty(),
                        row.point().rateUncertainty(),
                        row.point().label(),
                        row.point().excluded(),
                        row.point().asRead()),
                row.lnRate(),
                row.lnUncertainty());
    }
}
