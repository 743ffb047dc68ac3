package org.saddlebook.desk.internal;

import java.util.Optional;
import org.osgi.framework.BundleContext;
import org.osgi.framework.ServiceReference;
import org.saddlebook.api.problem.InputException;
import org.saddlebook.api.problem.Place;
import org.saddlebook.api.problem.Problem;

/** Services and settings, looked up at the moment they are needed: bundles come and go while the desk runs. */
interface Services {
    /** The best service of a type; empty when none is installed. */
    <S> Optional<S> find(Class<S> type);

    /** A setting of the launcher or, where it has none, of the environment. */
    Optional<String> setting(String name);

    /** The services of a running framework. */
    static Services of(BundleContext context) {
        return new Services() {
            @Override
            public <S> Optional<S> find(Class<S> type) {
                ServiceReference<S> reference = context.getServiceReference(type);
                return reference == null ? Optional.empty() : Optional.ofNullable(context.getService(reference));
            }

            @Override
            public Optional<String> setting(String name) {
                String set = context.getProperty(name);
                return Optional.ofNullable(set == null ? System.getenv(name) : set);
            }
        };
    }

    /**
     * The best service of a type.
     *
     * @param feature the feature that brings it
     * @throws InputException none is installed; the message says which feature to install
     */
    default <S> S need(Class<S> type, String feature) throws InputException {
        Optional<S> service = find(type);
        if (service.isEmpty()) {
            throw new InputException(new Problem(
                    "not-installed",
                    Place.of("this installation"),
                    "nothing that provides " + type.getSimpleName(),
                    "the feature " + feature,
                    "Install the feature " + feature + "."));
        }
        return service.get();
    }
}
