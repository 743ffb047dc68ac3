package org.saddlebook.api.model;

import java.util.Set;
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

    /**
     * The context with whatever the law holds unless somebody decided otherwise; the engine binds to this one and states
     * what is held. A law all of whose parameters a common campaign determines need not override it.
     */
    default RateContext completed(RateContext context) {
        return context;
    }

    /**
     * Names of the conditions that the law depends on beside the temperature, such as {@link Conditions#THIRD_BODY}. A
     * table that does not state them makes the engine refuse the law; its function takes them through {@link
     * RateFunction#lnRate(double, Conditions, double[], double[])}.
     */
    default Set<String> conditions() {
        return Set.of();
    }

    /**
     * Whether the law is fitted only when somebody asks for it by name. A law for special cases says so: every further law
     * that is fitted unasked makes it more likely that one of them fits by chance, and lengthens what everyone reads.
     */
    default boolean onRequest() {
        return false;
    }
}
