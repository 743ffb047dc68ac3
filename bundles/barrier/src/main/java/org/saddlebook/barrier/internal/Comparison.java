package org.saddlebook.barrier.internal;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;
import java.util.Set;
import org.saddlebook.api.findings.Node;
import org.saddlebook.presentation.api.Rounding;

/**
 * Which law do the data allow? A law with an extra parameter is preferred only when the interval of that parameter
 * excludes the value at which it is the simpler law; the simpler one only when the interval excludes every curvature that
 * would matter at the targets. Otherwise they cannot be told apart: an information criterion that favours the simpler law
 * is no evidence against curvature. Laws with equally many parameters are separated only by a difference of the criterion
 * that leaves the worse one essentially no support (Burnham and Anderson 2002, section 2.6).
 */
final class Comparison {
    /** Difference in k at a target below which curvature does not matter. */
    static final double TOLERANCE = 0.10;

    private static final double NO_SUPPORT = 10;

    private final List<FittedLaw> laws;
    private final List<FittedLaw> compared;
    private final double level;
    private final List<Double> targets;
    private final List<String> notes = new ArrayList<>();
    private final Set<String> remaining = new LinkedHashSet<>();

    /** Compares fitted laws; all were fitted to the same response. */
    Comparison(List<FittedLaw> laws, double level, List<Double> targets) {
        this.laws = List.copyOf(laws);
        this.level = level;
        this.targets = List.copyOf(targets);
        for (FittedLaw law : laws) {
            remaining.add(law.id());
        }
        compared = withoutTwins();
        for (FittedLaw larger : compared) {
            for (FittedLaw smaller : compared) {
                OptionalDouble value = Containment.valueAt(smaller, larger);
                if (value.isPresent()) {
                    judge(smaller, larger, value.getAsDouble());
                }
            }
        }
        separateBySupport();
    }

    /** Laws that are one curve in other parameters are compared once: to tell them apart would be a matter of words. */
    private List<FittedLaw> withoutTwins() {
        List<FittedLaw> different = new ArrayList<>();
        for (FittedLaw law : laws) {
            FittedLaw twin = null;
            for (FittedLaw earlier : different) {
                if (Containment.sameCurve(earlier, law)) {
                    twin = earlier;
                }
            }
            if (twin == null) {
                different.add(law);
            } else {
                remaining.remove(law.id());
                notes.add(law.title() + " and " + twin.title()
                        + " are the same curve in other parameters; the comparison goes on with " + twin.title() + ".");
            }
        }
        return different;
    }

    /** Ids of the laws that cannot be told apart; one when there is a decision. */
    Set<String> candidates() {
        return Set.copyOf(remaining);
    }

    /** Whether more than one law remains. */
    boolean undecided() {
        return remaining.size() > 1;
    }

    /** The comparison as a group. */
    Node.Group node() {
        Tree tree = new Tree();
        if (remaining.size() == 1) {
            tree.put("best", remaining.iterator().next());
        }
        tree.put("undecided", undecided());
        tree.put("candidates", Tree.texts(List.copyOf(remaining)));
        tree.put("akaikeWeights", new Node.Group(akaikeWeights()));
        List<String> said = new ArrayList<>(notes);
        if (undecided()) {
            said.add("These data cannot tell apart: " + titles(remaining)
                    + ". That is no evidence for the one with fewer parameters.");
        }
        return tree.put("notes", Tree.texts(said)).group();
    }

    private void judge(FittedLaw smaller, FittedLaw larger, double coincides) {
        int extra = larger.extraParameter();
        String symbol = larger.parameters().get(extra).symbol();
        FittedLaw.Estimate estimate = larger.parameter(extra);
        String pair = larger.title() + " against " + smaller.title() + ": ";
        if (estimate.variance().isEmpty()) {
            notes.add(pair + "no degree of freedom is left to judge " + symbol + ".");
            return;
        }
        if (estimate.variance().getAsDouble() == 0) {
            notes.add(pair + symbol + " ended at its bound, so the data give no sign of what " + larger.title()
                    + " has beyond " + smaller.title() + ".");
            return;
        }
        double halfWidth =
                larger.quantile(level) * Math.sqrt(estimate.variance().getAsDouble());
        // The printed value is where the laws coincide up to rounding of a fit to a fit.
        double shown = Math.rint(coincides * 1e6) / 1e6;
        String interval = "the " + Rounding.percent(level) + " interval of " + symbol + ", "
                + Rounding.interval(estimate.value() - halfWidth, estimate.value() + halfWidth) + ",";
        if (Math.abs(estimate.value() - coincides) > halfWidth) {
            remaining.remove(smaller.id());
            notes.add(pair + interval + " excludes " + Rounding.shortest(shown)
                    + ", where the two laws coincide: the data show curvature that " + smaller.title() + " lacks.");
            return;
        }
        if (targets.isEmpty()) {
            notes.add(pair + interval + " includes " + Rounding.shortest(shown)
                    + ", where the two laws coincide. State a target temperature to learn whether the curvature it"
                    + " leaves open would matter there.");
            return;
        }
        double largest = StrictMath.expm1(Containment.largestDifference(smaller, larger, halfWidth, targets));
        if (largest <= TOLERANCE) {
            remaining.remove(larger.id());
            notes.add(pair + "no curvature inside " + interval.substring(0, interval.length() - 1)
                    + ", would move k at the targets by more than " + Rounding.percent(TOLERANCE)
                    + "; " + smaller.title() + " suffices there.");
        } else if (Double.isInfinite(largest)) {
            notes.add(pair + interval + " includes " + Rounding.shortest(shown)
                    + ", where the two laws coincide, but at a target one of them has no value.");
        } else {
            notes.add(pair + interval + " includes " + Rounding.shortest(shown)
                    + ", where the two laws coincide, but also curvature that would move k at a target by a factor of up"
                    + " to " + Rounding.significant(1 + largest, 2) + ".");
        }
    }

    private void separateBySupport() {
        for (FittedLaw better : compared) {
            for (FittedLaw worse : compared) {
                OptionalDouble one = new FitStatistics(better).aicc();
                OptionalDouble other = new FitStatistics(worse).aicc();
                // A criterion may speak for the law with more parameters, never for the one with fewer.
                if (one.isPresent()
                        && other.isPresent()
                        && better.fit().parameterCount() >= worse.fit().parameterCount()
                        && remaining.contains(better.id())
                        && other.getAsDouble() - one.getAsDouble() > NO_SUPPORT
                        && remaining.remove(worse.id())) {
                    notes.add(better.title() + " against " + worse.title() + ": AICc is lower by "
                            + Rounding.significant(other.getAsDouble() - one.getAsDouble(), 2)
                            + ", which leaves " + worse.title() + " essentially no support.");
                }
            }
        }
    }

    /** Akaike weights of the laws that have the criterion, id to weight. */
    Map<String, Double> weights() {
        Map<String, Double> weights = new LinkedHashMap<>();
        akaikeWeights().forEach((id, weight) -> weights.put(id, ((Node.Scalar) weight).value()));
        return weights;
    }

    private Map<String, Node> akaikeWeights() {
        Map<String, Double> criteria = new LinkedHashMap<>();
        double lowest = Double.POSITIVE_INFINITY;
        for (FittedLaw law : compared) {
            OptionalDouble aicc = new FitStatistics(law).aicc();
            if (aicc.isPresent()) {
                criteria.put(law.id(), aicc.getAsDouble());
                lowest = Math.min(lowest, aicc.getAsDouble());
            } else {
                notes.add(law.title() + ": no AICc, " + absence(law) + "; it has no Akaike weight.");
            }
        }
        double sum = 0;
        for (Map.Entry<String, Double> entry : criteria.entrySet()) {
            double support = StrictMath.exp((lowest - entry.getValue()) / 2);
            entry.setValue(support);
            sum += support;
        }
        Map<String, Node> weights = new LinkedHashMap<>();
        for (Map.Entry<String, Double> entry : criteria.entrySet()) {
            weights.put(entry.getKey(), new Node.Scalar(entry.getValue() / sum));
        }
        return weights;
    }

    private static String absence(FittedLaw law) {
        int k = new FitStatistics(law).criterionParameters();
        return law.fit().observations() <= k + 1
                ? law.fit().observations() + " points are too few for " + k + " estimated quantities"
                : "the points show no scatter";
    }

    private String titles(Set<String> ids) {
        StringBuilder text = new StringBuilder();
        for (FittedLaw law : laws) {
            if (ids.contains(law.id())) {
                text.append(text.isEmpty() ? "" : ", ").append(law.title());
            }
        }
        return text.toString();
    }
}
