package org.saddlebook.thermo.data.api;

import java.util.ArrayList;
import java.util.List;
import java.util.Objects;
import java.util.Optional;
import java.util.OptionalDouble;
import org.saddlebook.api.quantity.Constants;
import org.saddlebook.reaction.api.Species;

/** What one source knows of one species in one phase. Immutable; grows by {@code with} methods. */
public final class SpeciesData {
    private final Species species;
    private final String source;
    private final String reference;
    private final List<Segment> segments;
    private final boolean heatCapacityKnown;
    private final OptionalDouble enthalpyUncertainty;
    private final OptionalDouble entropyUncertainty;
    private final String uncertaintyReference;

    private SpeciesData(
            Species species,
            String source,
            String reference,
            List<Segment> segments,
            boolean heatCapacityKnown,
            OptionalDouble enthalpyUncertainty,
            OptionalDouble entropyUncertainty,
            String uncertaintyReference) {
        this.species = Objects.requireNonNull(species, "species");
        this.source = Objects.requireNonNull(source, "source");
        this.reference = Objects.requireNonNull(reference, "reference");
        this.segments = List.copyOf(segments);
        this.heatCapacityKnown = heatCapacityKnown;
        this.enthalpyUncertainty = checked(enthalpyUncertainty);
        this.entropyUncertainty = checked(entropyUncertainty);
        this.uncertaintyReference = Objects.requireNonNull(uncertaintyReference, "uncertaintyReference");
        if (this.segments.isEmpty()) {
            throw new IllegalArgumentException("a species needs at least one segment: " + species.text());
        }
        for (int i = 1; i < this.segments.size(); i++) {
            if (!(this.segments.get(i).lowerKelvin() >= this.segments.get(i - 1).upperKelvin())) {
                throw new IllegalArgumentException("segments overlap or are out of order: " + species.text());
            }
        }
    }

    private static OptionalDouble checked(OptionalDouble u) {
        if (u.isPresent() && !(u.getAsDouble() >= 0 && u.getAsDouble() < Double.POSITIVE_INFINITY)) {
            throw new IllegalArgumentException("a standard uncertainty must not be negative: " + u.getAsDouble());
        }
        return u;
    }

    /**
     * Functions of temperature.
     *
     * @param species the species; its phase is stated
     * @param source id of the kind of data within the source, for example {@code shomate}
     * @param reference the publication, for people
     * @param segments in rising order of temperature; they may touch or leave gaps, not overlap
     */
    public static SpeciesData of(Species species, String source, String reference, List<Segment> segments) {
        return new SpeciesData(
                species, source, reference, segments, true, OptionalDouble.empty(), OptionalDouble.empty(), "");
    }

    /**
     * Values at 298.15 K alone; the heat capacity is not known.
     *
     * @param enthalpy ΔfH°(298.15 K), J/mol
     * @param entropy S°(298.15 K), J/(mol K)
     */
    public static SpeciesData constants(
            Species species, String source, String reference, double enthalpy, double entropy) {
        double t = Constants.REFERENCE_KELVIN;
        return new SpeciesData(
                species,
                source,
                reference,
                List.of(new PowerSegment(t, t, new double[PowerSegment.POWERS], enthalpy, entropy)),
                false,
                OptionalDouble.empty(),
                OptionalDouble.empty(),
                "");
    }

    /** The same with standard uncertainties of ΔfH°, J/mol, and S°, J/(mol K), taken to hold at every temperature. */
    public SpeciesData withUncertainties(OptionalDouble enthalpy, OptionalDouble entropy) {
        return withUncertainties(enthalpy, entropy, "");
    }

    /**
     * The same with uncertainties that another publication states.
     *
     * @param from where they are from, for people; empty for the same publication as the values
     */
    public SpeciesData withUncertainties(OptionalDouble enthalpy, OptionalDouble entropy, String from) {
        return new SpeciesData(species, source, reference, segments, heatCapacityKnown, enthalpy, entropy, from);
    }

    /** The same with other words about its origin, for example the file it was read from. */
    public SpeciesData withReference(String newReference) {
        return new SpeciesData(
                species,
                source,
                newReference,
                segments,
                heatCapacityKnown,
                enthalpyUncertainty,
                entropyUncertainty,
                uncertaintyReference);
    }

    /** The species with its phase. */
    public Species species() {
        return species;
    }

    /** Kind of data within its source. */
    public String source() {
        return source;
    }

    /** The publication. */
    public String reference() {
        return reference;
    }

    /** The segments in rising order. */
    public List<Segment> segments() {
        return segments;
    }

    /** Whether the heat capacity is known; when not, H and S are known at 298.15 K only. */
    public boolean heatCapacityKnown() {
        return heatCapacityKnown;
    }

    /** Standard uncertainty of the enthalpy of formation, J/mol. */
    public OptionalDouble enthalpyUncertainty() {
        return enthalpyUncertainty;
    }

    /** Standard uncertainty of the entropy, J/(mol K). */
    public OptionalDouble entropyUncertainty() {
        return entropyUncertainty;
    }

    /** Where the uncertainties are from; empty for the publication of the values. */
    public String uncertaintyReference() {
        return uncertaintyReference;
    }

    /** Lower end of validity, K. */
    public double lowerKelvin() {
        return segments.get(0).lowerKelvin();
    }

    /** Upper end of validity, K. */
    public double upperKelvin() {
        return segments.get(segments.size() - 1).upperKelvin();
    }

    /** The segment that holds at a temperature, the upper one at a joint; empty outside the range and in a gap. */
    public Optional<Segment> segment(double kelvin) {
        for (int i = segments.size() - 1; i >= 0; i--) {
            if (segments.get(i).contains(kelvin)) {
                return Optional.of(segments.get(i));
            }
        }
        return Optional.empty();
    }

    /** The segment that holds, or else the one whose range ends nearest: for extrapolation that is flagged. */
    public Segment nearest(double kelvin) {
        Segment best = segments.get(0);
        double least = Double.POSITIVE_INFINITY;
        for (Segment one : segments) {
            double distance = Math.max(0, Math.max(one.lowerKelvin() - kelvin, kelvin - one.upperKelvin()));
            if (distance <= least) {
                best = one;
                least = distance;
            }
        }
        return best;
    }

    /** How the segments meet, in rising order; one fewer than there are segments. */
    public List<Joint> joints() {
        List<Joint> joints = new ArrayList<>();
        for (int i = 1; i < segments.size(); i++) {
            joints.add(Joint.between(segments.get(i - 1), segments.get(i)));
        }
        return joints;
    }
}
