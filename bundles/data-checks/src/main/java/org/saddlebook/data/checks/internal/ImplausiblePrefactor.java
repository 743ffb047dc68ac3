package org.saddlebook.data.checks.internal;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.saddlebook.api.findings.Node;
import org.saddlebook.presentation.api.Rounding;

/** A pre-exponential factor beyond what steps of any kind show, with its whole interval. */
final class ImplausiblePrefactor implements Rule {
    private static final double LEVEL = 0.998;

    @Override
    public String id() {
        return "implausible-prefactor";
    }

    @Override
    public String title() {
        return "a pre-exponential factor beyond what reactions show";
    }

    @Override
    public Outcome examine(Subject subject) {
        if (subject.line().isEmpty() || subject.line().get().degreesOfFreedom() < 1) {
            return new Outcome.NotExamined("it needs three rows at two temperatures");
        }
        Line line = subject.line().get();
        double entropy = EntropyRange.entropy(subject, line);
        double half = EntropyRange.halfWidth(line, LEVEL);
        if (!(entropy + half < EntropyRange.LOWEST) && !(entropy - half > EntropyRange.HIGHEST)) {
            return new Outcome.Nothing();
        }
        Map<String, Node> evidence = new LinkedHashMap<>();
        evidence.put("dS", Node.Quantity.of(entropy, "J/(mol.K)"));
        evidence.put("halfWidth", Node.Quantity.of(half, "J/(mol.K)"));
        String sentence = "The pre-exponential factor corresponds to an entropy of activation of "
                + Rounding.significant(entropy, 3) + " J/(mol K) at 1 mol/L (99.8 %: "
                + Rounding.interval(entropy - half, entropy + half)
                + "); single steps are reported between about −200 and +100 (common practice). Units, the order, or"
                + " temperatures may be other than stated; a lumped constant may also give this.";
        return new Outcome.Found(List.of(new Finding(sentence, List.of(), evidence)));
    }
}
