package org.saddlebook.data.checks.internal;

import org.saddlebook.api.quantity.Constants;

/**
 * The entropies of activation that chemistry shows, at 1 mol/L, and what the line of a table gives. Reported values lie
 * between about −200 and +100 J/(mol K) (common practice, no source); the rules leave a margin around that.
 */
final class EntropyRange {
    static final double USUAL_LOWEST = -200;
    static final double USUAL_HIGHEST = 100;
    static final double LOWEST = -260;
    static final double HIGHEST = 170;

    private static final double MOLAR = 1000;

    private EntropyRange() {}

    /**
     * ΔS‡ at 1 mol/L from A and order m: {@code A = e (kB Tc/h) c°^(1−m) exp(ΔS‡/R)} (Gold Book, entropy of activation),
     * J/(mol K).
     */
    static double entropy(Subject subject, Line line) {
        return Constants.GAS
                * (line.lnPrefactor()
                        - 1
                        - Constants.LN_BOLTZMANN_OVER_PLANCK
                        - StrictMath.log(line.centreKelvin())
                        - (1 - subject.table().order()) * StrictMath.log(MOLAR));
    }

    /** Half-width of its interval at a level, J/(mol K). */
    static double halfWidth(Line line, double level) {
        return Constants.GAS * line.quantile(level) * line.lnPrefactorUncertainty();
    }
}
