package org.saddlebook.thermo.data.api;

import org.saddlebook.thermo.data.internal.CuratedSource;

/** The curated set without a framework: for programs and tests that do not look up services. */
public final class CuratedSet {
    private CuratedSet() {}

    /** The same source that is registered as a service. */
    public static SpeciesSource source() {
        return new CuratedSource();
    }
}
