package org.saddlebook.spontaneity.internal;

import java.util.ArrayList;
import java.util.List;
import org.saddlebook.presentation.api.CautionText;

/** The cautions of the section: shared ones by id, and some of its own. */
final class SpontaneityCautions {
    static final String NO_UNCERTAINTY = "spontaneity-no-uncertainty";
    static final String NO_STANDARD_STATE = "spontaneity-no-standard-state";
    static final String SPECIES_UNCERTAINTY = "spontaneity-species-uncertainty";
    static final String SPECIES_INDEPENDENT = "spontaneity-species-independent";
    static final String JUMP = "spontaneity-jump";
    static final String IDEAL = "spontaneity-ideal";
    static final String UNITS_DOUBTFUL = "spontaneity-units-doubtful";

    /** Beyond this size an entropy of reaction is more likely a slip of unit (common practice, no source), J/(mol K). */
    private static final double LARGEST_ENTROPY = 2000;

    /** A crossover outside these, K, usually means that J and kJ were mixed (common practice, no source). */
    private static final double COLDEST_CROSSOVER = 10;

    private static final double HOTTEST_CROSSOVER = 20_000;

    private SpontaneityCautions() {}

    /** The full text of a caution used in the section. */
    static String text(String id) {
        return switch (id) {
            case NO_UNCERTAINTY ->
                "No standard uncertainty of ΔH or of ΔS was stated: that one is taken as exact, and every interval is too narrow.";
            case NO_STANDARD_STATE ->
                "No standard state was stated: ΔS, ΔG and the crossover hold for the one that the source of ΔS uses, and change with it when the number of molecules changes.";
            case UNITS_DOUBTFUL ->
                "The size of ΔS, or of the crossover, is unusual for a reaction (common practice, no source): check whether J and kJ were mixed.";
            case SPECIES_UNCERTAINTY ->
                "The data of at least one species state no uncertainty: it is taken as exact, and every interval is too narrow.";
            case SPECIES_INDEPENDENT ->
                "The uncertainties of the species are taken as independent, and as the same at every temperature.";
            case IDEAL ->
                "Gases and solutions are taken as ideal, pure phases as pure, and no other reaction as taking part; at high pressure or ionic strength the composition at equilibrium is another.";
            case JUMP ->
                "ΔG changes sign in a jump where two sets of data of one species meet: no temperature of equilibrium is found there, look at the data.";
            case ConsistencyCautions.REVERSIBLE ->
                "kf/kr = K holds for elementary steps, and for overall laws only where the law is proven to be reversible in this form at equilibrium; the factor 1 − Q/K belongs to the elementary step.";
            case ConsistencyCautions.INDEPENDENT ->
                "Rate constants of both directions and K are taken as measured independently; errors that they share, such as one thermometer or one stock solution, are not in the test.";
            default -> CautionText.of(id);
        };
    }

    /** For ΔH and for ΔS. */
    static List<String> ofStated(Stated stated, boolean uncertain, boolean openSign) {
        List<String> ids = new ArrayList<>();
        if (openSign) {
            ids.add("uncertain-sign");
        }
        if (!uncertain) {
            ids.add(NO_UNCERTAINTY);
        }
        if (doubtful(stated)) {
            ids.add(UNITS_DOUBTFUL);
        }
        return ids;
    }

    /** For every ΔG. */
    static List<String> ofGibbs(Stated stated, boolean openSign) {
        List<String> ids = new ArrayList<>();
        if (openSign) {
            ids.add("uncertain-sign");
        }
        ids.add("allowed-is-not-fast");
        ids.add("at-stated-composition");
        addCommon(stated, ids);
        return ids;
    }

    /** For the crossover. */
    static List<String> ofCrossover(Stated stated, Crossover crossover) {
        List<String> ids = new ArrayList<>();
        if (crossover.outcome() == Crossover.Outcome.UNBOUNDED
                || crossover.outcome() == Crossover.Outcome.UNDETERMINED) {
            ids.add("undetermined");
        }
        if (crossover.kelvin().isPresent()
                && stated.lowerKelvin().isPresent()
                && !(crossover.kelvin().getAsDouble() >= stated.lowerKelvin().getAsDouble()
                        && crossover.kelvin().getAsDouble()
                                <= stated.upperKelvin().getAsDouble())) {
            ids.add("crossover-outside-data");
        }
        ids.add("at-stated-composition");
        addCommon(stated, ids);
        return ids;
    }

    /** Adds the cautions of every number that rests on these ΔH and ΔS. */
    static void addCommon(Stated stated, List<String> ids) {
        ids.add("constant-heat-capacity");
        if (stated.standard().isEmpty()) {
            ids.add(NO_STANDARD_STATE);
        }
        if (stated.assumedIndependent()) {
            ids.add("assumed-independent");
        }
        if (stated.enthalpyUncertainty().isEmpty()
                || stated.entropyUncertainty().isEmpty()) {
            ids.add(NO_UNCERTAINTY);
        }
        if (doubtful(stated)) {
            ids.add(UNITS_DOUBTFUL);
        }
    }

    private static boolean doubtful(Stated stated) {
        if (Math.abs(stated.entropy()) > LARGEST_ENTROPY) {
            return true;
        }
        double size = Math.abs(stated.enthalpy() / stated.entropy());
        // A crossover at the edge of zero is no slip of unit when the sign itself is open.
        boolean clear =
                Math.abs(stated.entropy()) > 2 * stated.entropyUncertainty().orElse(0)
                        && Math.abs(stated.enthalpy())
                                > 2 * stated.enthalpyUncertainty().orElse(0);
        return clear && (size < COLDEST_CROSSOVER || (size > HOTTEST_CROSSOVER && Double.isFinite(size)));
    }
}
