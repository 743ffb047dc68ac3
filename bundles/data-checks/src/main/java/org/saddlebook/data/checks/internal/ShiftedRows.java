package org.saddlebook.data.checks.internal;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.quantity.Constants;
import org.saddlebook.data.checks.api.MixUp;
import org.saddlebook.estimation.api.LinearFit;
import org.saddlebook.estimation.api.LinearLeastSquares;
import org.saddlebook.estimation.api.StudentT;
import org.saddlebook.presentation.api.Rounding;

/** Rows, or a file's worth of rows, whose k is off by the factor of a mix-up of units or logarithms. */
final class ShiftedRows implements Rule {
    /** Posterior probability from which it speaks: more likely than not. */
    static final double REPORTED = 0.5;

    private static final double LEVEL = 0.95;

    /** An interval wider than this, ln, says nothing in a sentence; the evidence keeps it. */
    private static final double WIDEST = 3;

    @Override
    public String id() {
        return "shifted-rows";
    }

    @Override
    public String title() {
        return "rows shifted by a mix-up of units or logarithms";
    }

    @Override
    public Outcome examine(Subject subject) {
        if (subject.rows().size() < 4 || subject.distinctTemperatures() < 3) {
            return new Outcome.NotExamined("it needs four rows at three temperatures");
        }
        double probability = subject.shifts().probability(ShiftedRows::mine);
        if (!(probability > REPORTED)) {
            return new Outcome.Nothing();
        }
        List<ShiftSearch.Explanation> best = subject.shifts().best(ShiftedRows::mine, 8);
        return new Outcome.Found(List.of(finding(subject, best, probability)));
    }

    private static boolean mine(ShiftSearch.Explanation explanation) {
        return explanation.mixUp() != null;
    }

    private static Finding finding(Subject subject, List<ShiftSearch.Explanation> explanations, double probability) {
        ShiftSearch.Explanation best = explanations.get(0);
        MixUp mixUp = best.mixUp();
        List<Row> block = best.block().of(subject.rows(), true);
        List<Row> others = best.block().of(subject.rows(), false);
        StringBuilder sentence = new StringBuilder();
        Map<String, Node> evidence = new LinkedHashMap<>();
        Optional<LinearFit> offset = offset(subject, best.block());
        sentence.append(Say.capital(Say.rows(block))).append(block.size() == 1 ? " lies " : " lie ");
        if (offset.isPresent() && offset.get().degreesOfFreedom() > 0) {
            double found = offset.get().parameters()[2];
            double half = StudentT.quantile(0.5 + LEVEL / 2, offset.get().degreesOfFreedom())
                    * Math.sqrt(offset.get().unscaledCovariance()[2][2]
                            * offset.get().residualVariance());
            sentence.append(Say.lowerOrHigher(found)).append(" than the line through the other rows");
            if (half < WIDEST) {
                sentence.append(" (95 %: ")
                        .append(Say.factor(Math.abs(found) - half))
                        .append(" to ")
                        .append(Say.factor(Math.abs(found) + half))
                        .append(")");
            }
            evidence.put("lnOffset", new Node.Scalar(found));
            evidence.put("lnOffsetHalfWidth", new Node.Scalar(half));
            evidence.put(
                    "scatterWithout", new Node.Scalar(Math.sqrt(offset.get().residualVariance())));
        } else {
            sentence.append("off the line through the other rows");
        }
        sentence.append(", as if ")
                .append(mixUp.meaning())
                .append(" (a factor of ")
                .append(Say.factor(Math.abs(mixUp.lnFactor())))
                .append(", ")
                .append(Rounding.significant(Math.abs(mixUp.entropyShift()), 3))
                .append(" J/(mol K) in an entropy). ");
        Optional<Line> mended = Line.through(mend(subject.rows(), best));
        if (mended.isPresent() && subject.line().isPresent()) {
            sentence.append("With that factor the scatter about a straight line falls from ")
                    .append(Say.scatter(subject.line().get().scatter()))
                    .append(" to ")
                    .append(Say.scatter(mended.get().scatter()))
                    .append(". ");
            evidence.put("scatterAsRead", new Node.Scalar(subject.line().get().scatter()));
            evidence.put("scatterMended", new Node.Scalar(mended.get().scatter()));
        }
        List<String> rivals = rivals(subject, explanations);
        if (!rivals.isEmpty()) {
            sentence.append("Fits nearly as well: ")
                    .append(String.join("; ", rivals))
                    .append(". ");
        }
        if (2 * block.size() == others.size() + block.size()) {
            sentence.append("Which half is the wrong one the data cannot say. ");
        }
        sentence.append("Look at the source of ")
                .append(block.size() == 1 ? "that row" : "those rows")
                .append('.');
        evidence.put("mixUp", new Node.Text(mixUp.id()));
        evidence.put("lnFactor", new Node.Scalar(mixUp.lnFactor()));
        evidence.put("probability", new Node.Scalar(probability));
        return new Finding(sentence.toString(), Say.numbers(block), evidence);
    }

    /** Other explanations within a factor of ten of the best, at most two. */
    private static List<String> rivals(Subject subject, List<ShiftSearch.Explanation> explanations) {
        List<String> rivals = new ArrayList<>();
        double best = explanations.get(0).lnWeight();
        for (ShiftSearch.Explanation rival : explanations.subList(1, explanations.size())) {
            if (rival.lnWeight() > best - StrictMath.log(10) && rivals.size() < 2) {
                rivals.add(Say.rows(rival.block().of(subject.rows(), true)) + " as if "
                        + rival.mixUp().meaning());
            }
        }
        return rivals;
    }

    private static Optional<LinearFit> offset(Subject subject, Blocks block) {
        int n = subject.rows().size();
        double[][] design = new double[n][];
        double[] response = new double[n];
        double centre = subject.line().map(Line::centreKelvin).orElse(Constants.REFERENCE_KELVIN);
        for (int i = 0; i < n; i++) {
            Row row = subject.rows().get(i);
            design[i] = new double[] {1, 1 / row.kelvin() - 1 / centre, block.member()[i] ? 1 : 0};
            response[i] = row.lnRate();
        }
        return LinearLeastSquares.fit(design, response, Line.weights(subject.rows()))
                .fold(Optional::of, deficient -> Optional.empty());
    }

    private static List<Row> mend(List<Row> rows, ShiftSearch.Explanation explanation) {
        List<Row> mended = new ArrayList<>();
        for (int i = 0; i < rows.size(); i++) {
            Row row = rows.get(i);
            mended.add(
                    explanation.block().member()[i]
                            ? new Row(
                                    row.number(),
                                    row.point(),
                                    row.lnRate() + explanation.mixUp().lnFactor(),
                                    row.lnUncertainty())
                            : row);
        }
        return mended;
    }
}
