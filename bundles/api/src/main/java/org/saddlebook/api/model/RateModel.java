package org.saddlebook.api.model;

import org.osgi.annotation.versioning.ConsumerType;

/**
 * A law for the temperature dependence of a rate constant. Register an implementation as an OSGi service and the engine
 * gives it estimation, intervals, comparison, prediction, figures and its place in report and desk.
 *
 * <p>Implementations are stateless: the same context gives the same function.
 */
@ConsumerType
public interface RateModel {
    /** Stable id in lower case with hyphens, full words: {@code modified-arrhenius}. Add-ons prefix their own name. */
    String id();

    /** What people read about the law. */
    ModelDescription description();

    /**
     * The law for rate constants of one context.
     *
     * @throws Inapplicable when the law has no meaning in this context
     */
    RateFunction bind(RateContext context) throws Inapplicable;
}
