package org.saddlebook.thermo.data.api;

/**
 * Where two segments of one species meet: values above minus values below.
 *
 * @param kind what the differences mean
 * @param lowerKelvin end of the lower segment, K
 * @param upperKelvin start of the upper segment, K; the same unless there is a gap
 * @param enthalpy jump of H, J/mol; 0 for a gap
 * @param entropy jump of S, J/(mol K); 0 for a gap
 * @param gibbs jump of H − TS, J/mol; 0 for a gap
 */
public record Joint(Kind kind, double lowerKelvin, double upperKelvin, double enthalpy, double entropy, double gibbs) {
    /** Jumps of H below this are those of rounding and of fitting apart (common practice, no source), J/mol. */
    static final double SMALL_ENTHALPY = 100;

    /** The Gibbs energy is continuous at any phase change; a larger jump than this is a fault of the data, J/mol. */
    static final double SMALL_GIBBS = 100;

    /** What a joint is. */
    public enum Kind {
        /** The segments continue each other. */
        SMOOTH,
        /** The Gibbs energy continues, the enthalpy jumps: a phase change. */
        PHASE_CHANGE,
        /** The Gibbs energy jumps: the segments do not belong together. */
        BROKEN,
        /** Nothing is known between the segments. */
        GAP
    }

    static Joint between(Segment below, Segment above) {
        double lower = below.upperKelvin();
        double upper = above.lowerKelvin();
        if (upper > lower) {
            return new Joint(Kind.GAP, lower, upper, 0, 0, 0);
        }
        double enthalpy = above.enthalpy(upper) - below.enthalpy(upper);
        double entropy = above.entropy(upper) - below.entropy(upper);
        double gibbs = enthalpy - upper * entropy;
        Kind kind = !(Math.abs(gibbs) <= SMALL_GIBBS)
                ? Kind.BROKEN
                : Math.abs(enthalpy) <= SMALL_ENTHALPY ? Kind.SMOOTH : Kind.PHASE_CHANGE;
        return new Joint(kind, upper, upper, enthalpy, entropy, gibbs);
    }
}
