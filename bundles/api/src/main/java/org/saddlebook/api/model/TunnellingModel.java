package org.saddlebook.api.model;

import java.util.Collection;
import java.util.Optional;
import org.osgi.annotation.versioning.ConsumerType;

/**
 * A tunnelling correction. Register an implementation as an OSGi service; every law that rests on transition-state theory
 * takes it up through {@link TransitionState}. Stateless.
 */
@ConsumerType
public interface TunnellingModel {
    /** Stable id, a lower-case word: {@code wigner}. Add-ons prefix their own name. */
    String id();

    /** What people read about it. */
    ModelDescription description();

    /**
     * The coefficient for a stated barrier.
     *
     * @throws Inapplicable when a value it needs is not stated, or makes no sense; the message is a sentence
     */
    Transmission of(Tunnelling stated) throws Inapplicable;

    /**
     * A context with its stated tunnelling resolved; the context itself when it states none.
     *
     * @throws Inapplicable when no installed correction has the stated id, or it refuses what is stated
     */
    static RateContext resolve(RateContext context, Collection<TunnellingModel> installed) throws Inapplicable {
        Optional<Tunnelling> stated = context.tunnelling();
        if (stated.isEmpty()) {
            return context;
        }
        for (TunnellingModel model : installed) {
            if (model.id().equals(stated.get().modelId())) {
                return context.withTransmission(model.of(stated.get()));
            }
        }
        throw new Inapplicable("The tunnelling correction " + stated.get().modelId()
                + " is not installed; wigner, bell and eckart are in the feature tunnelling.");
    }
}
