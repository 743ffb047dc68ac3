package org.saddlebook.thermo.data.api;

import java.util.List;
import org.osgi.annotation.versioning.ConsumerType;
import org.saddlebook.reaction.api.Species;

/**
 * A collection of thermodynamic data. Register an implementation as an OSGi service; a laboratory adds its own data this
 * way. Sources are asked in order of id, the curated set of this
 * bundle last. Implementations are thread-safe and give the same answer
 * every time.
 */
@ConsumerType
public interface SpeciesSource {
    /** Id in settings and findings, lower case with hyphens. */
    String id();

    /** Title for people. */
    String title();

    /**
     * What is known of a species, the preferred data first; empty when nothing is.
     *
     * @param species its formula as written; without a phase, data of every phase are wanted, without a modification those
     *     of every modification
     */
    List<SpeciesData> find(Species species);
}
