package org.saddlebook.tunnelling.internal;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import org.saddlebook.api.model.Inapplicable;
import org.saddlebook.api.model.Tunnelling;
import org.saddlebook.api.quantity.Constants;

/** What the corrections compute from what is stated. */
final class Barrier {
    /** Speed of light in vacuum, m/s, exact (SI 2019; BIPM SI Brochure, 9th edition). */
    static final double LIGHT = 299_792_458;

    private Barrier() {}

    /**
     * {@code hcν̃/kB}, K: u is this divided by the temperature.
     *
     * @throws Inapplicable when no imaginary wavenumber is stated
     */
    static double characteristicKelvin(Tunnelling stated) throws Inapplicable {
        return Constants.PLANCK * LIGHT / Constants.BOLTZMANN * need(stated, Tunnelling.WAVENUMBER, "wavenumber");
    }

    /** A stated value in SI, or the sentence that asks for it. */
    static double need(Tunnelling stated, String name, String word) throws Inapplicable {
        OptionalDouble value = stated.get(name);
        if (value.isEmpty()) {
            throw new Inapplicable("The tunnelling correction " + stated.modelId() + " needs the " + word
                    + " of the barrier; state it as in \"# tunnelling: " + example(stated.modelId()) + "\".");
        }
        return value.getAsDouble();
    }

    /** Refuses values that a correction does not use: whoever stated them expects them to matter. */
    static void only(Tunnelling stated, List<String> used) throws Inapplicable {
        List<String> rest = new ArrayList<>(stated.values().keySet());
        rest.removeAll(used);
        if (!rest.isEmpty()) {
            throw new Inapplicable("The tunnelling correction " + stated.modelId()
                    + " does not depend on the height of the barrier; leave it out, or choose eckart.");
        }
    }

    private static String example(String id) {
        return id.equals(Eckart.ID) ? "eckart 1200i cm-1; forward 60 kJ/mol; reverse 80 kJ/mol" : id + " 1200i cm-1";
    }
}
