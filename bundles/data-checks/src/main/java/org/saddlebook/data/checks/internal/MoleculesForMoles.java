package org.saddlebook.data.checks.internal;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.quantity.Constants;
import org.saddlebook.presentation.api.Rounding;

/**
 * A whole table counted in molecules instead of moles, or the reverse: {@code R ln(NA/1000)} = 398 J/(mol K) for each
 * concentration. The one mix-up of a whole table that shows without a reference, because no reaction lies so far out.
 */
final class MoleculesForMoles implements Rule {
    private static final double LEVEL = 0.998;

    @Override
    public String id() {
        return "molecules-for-moles";
    }

    @Override
    public String title() {
        return "a whole table per molecule instead of per mole";
    }

    @Override
    public Outcome examine(Subject subject) {
        if (subject.table().order() == 1) {
            return new Outcome.NotExamined("a constant of first order holds no concentration");
        }
        if (subject.line().isEmpty() || subject.line().get().degreesOfFreedom() < 1) {
            return new Outcome.NotExamined("it needs three rows at two temperatures");
        }
        Line line = subject.line().get();
        double entropy = EntropyRange.entropy(subject, line);
        double half = EntropyRange.halfWidth(line, LEVEL);
        double shift = (subject.table().order() - 1) * Constants.GAS * StrictMath.log(Constants.AVOGADRO / 1000);
        List<Finding> findings = new ArrayList<>();
        for (double sign = -1; sign <= 1; sign += 2) {
            double mended = entropy + sign * shift;
            boolean outside = entropy + half < EntropyRange.LOWEST || entropy - half > EntropyRange.HIGHEST;
            if (outside && mended > EntropyRange.USUAL_LOWEST && mended < EntropyRange.USUAL_HIGHEST) {
                Map<String, Node> evidence = new LinkedHashMap<>();
                evidence.put("dS", Node.Quantity.of(entropy, "J/(mol.K)"));
                evidence.put("dSMended", Node.Quantity.of(mended, "J/(mol.K)"));
                evidence.put("shift", Node.Quantity.of(sign * shift, "J/(mol.K)"));
                findings.add(new Finding(
                        "The table gives an entropy of activation of " + Rounding.significant(entropy, 3)
                                + " J/(mol K), beyond what any reaction shows. Shifted by "
                                + Rounding.significant(Math.abs(shift), 3) + " J/(mol K), which is what "
                                + (sign * shift > 0
                                        ? "cm³ molecule⁻¹ stated as L mol⁻¹"
                                        : "L mol⁻¹ stated as cm³ molecule⁻¹")
                                + " gives, it would be " + Rounding.significant(mended, 3)
                                + ". Look at the unit in the source.",
                        List.of(),
                        evidence));
            }
        }
        return Rule.of(findings);
    }
}
