package org.saddlebook.data.checks.internal;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.saddlebook.api.findings.Node;
import org.saddlebook.presentation.api.Rounding;

/**
 * Rows with the same k to the last digit. Replicates agree by chance now and then: with digits that resolve δ of the
 * logarithm and a scatter s, two replicates do so with probability δ/(2s√π). The rule speaks when so many agreements as
 * there are would come about by chance in fewer than one table out of two thousand (Poisson, over all pairs of the table).
 */
final class DuplicatedRows implements Rule {
    private static final double CHANCE = 0.0005;

    /** Scatter that replicates have at least, where the table shows less because of the copies themselves. */
    private static final double SMALLEST_SCATTER = 0.005;

    private static final int MANY = 400;

    @Override
    public String id() {
        return "duplicated-rows";
    }

    @Override
    public String title() {
        return "rows that are copies of others";
    }

    @Override
    public Outcome examine(Subject subject) {
        List<Row> rows = subject.rows();
        Optional<Line> line = subject.line();
        if (line.isEmpty()) {
            return new Outcome.NotExamined("it needs three rows at two temperatures");
        }
        if (rows.size() > MANY) {
            return new Outcome.NotExamined("the table has more than " + MANY + " rows");
        }
        double scatter = Math.max(SMALLEST_SCATTER, line.get().scatter());
        double slope = line.get().fit().parameters()[1];
        double expected = 0;
        List<Row[]> equal = new ArrayList<>();
        for (int i = 0; i < rows.size(); i++) {
            for (int j = i + 1; j < rows.size(); j++) {
                Row a = rows.get(i);
                Row b = rows.get(j);
                double apart = slope * (1 / a.kelvin() - 1 / b.kelvin());
                double z = apart / (scatter * Math.sqrt(2));
                double density = StrictMath.exp(-0.5 * z * z) / (2 * scatter * Math.sqrt(Math.PI));
                expected += Math.min(1, resolution(a) * density);
                if (Double.compare(a.lnRate(), b.lnRate()) == 0) {
                    equal.add(new Row[] {a, b});
                }
            }
        }
        if (equal.isEmpty() || !(poissonAtLeast(equal.size(), expected) < CHANCE)) {
            return new Outcome.Nothing();
        }
        return new Outcome.Found(List.of(finding(equal, expected)));
    }

    private static Finding finding(List<Row[]> equal, double expected) {
        StringBuilder sentence = new StringBuilder();
        List<Integer> numbers = new ArrayList<>();
        List<String> pairs = new ArrayList<>();
        for (Row[] pair : equal) {
            String where = pair[0].kelvin() == pair[1].kelvin() ? "" : ", at different temperatures";
            pairs.add(Say.rows(List.of(pair)) + where);
            for (Row row : pair) {
                if (!numbers.contains(row.number())) {
                    numbers.add(row.number());
                }
            }
        }
        int shown = Math.min(4, pairs.size());
        sentence.append("The same k to the last digit stands in ")
                .append(String.join("; ", pairs.subList(0, shown)))
                .append(pairs.size() > shown ? "; and in " + (pairs.size() - shown) + " more pairs" : "")
                .append(". By chance, with this scatter and these digits, ")
                .append(Rounding.significant(expected, 2))
                .append(" such pairs would be expected in the whole table. Were they measured, or copied?");
        Map<String, Node> evidence = new LinkedHashMap<>();
        evidence.put("pairs", new Node.Scalar(equal.size()));
        evidence.put("pairsByChance", new Node.Scalar(expected));
        return new Finding(sentence.toString(), numbers, evidence);
    }

    /** Width of the interval of ln k that is written with the same digits. */
    private static double resolution(Row row) {
        String text = row.point().asRead().rate();
        int digits = 3;
        try {
            BigDecimal read = new BigDecimal(text.strip().replace(',', '.').replace("−", "-"));
            digits = Math.max(1, Math.min(17, read.precision()));
            double leading = read.unscaledValue().abs().doubleValue();
            return leading > 0 ? 1 / leading : 1;
        } catch (NumberFormatException notPlain) {
            return StrictMath.pow(10, 1 - digits) / 3;
        }
    }

    private static double poissonAtLeast(int count, double mean) {
        double term = StrictMath.exp(-mean);
        double below = 0;
        for (int i = 0; i < count; i++) {
            below += term;
            term *= mean / (i + 1);
        }
        return count == 1 ? -StrictMath.expm1(-mean) : Math.max(0, 1 - below);
    }
}
