package org.saddlebook.register.console.internal;

import java.util.Optional;
import org.osgi.framework.BundleContext;
import org.osgi.framework.ServiceReference;
import org.saddlebook.api.problem.InputException;
import org.saddlebook.console.api.Options;

/** Services and settings, looked up at the moment they are needed. */
interface Services {
    /** The best service of a type; empty when none is installed. */
    <S> Optional<S> find(Class<S> type);

    /** A setting of the launcher or of the environment; empty when it is not set. */
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
                String set = context.getProperty(name); // framework first, then the system's properties
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
            throw Options.wrong(
                    "not-installed",
                    "this installation",
                    "nothing that provides " + type.getSimpleName(),
                    "the feature " + feature,
                    "Install the feature " + feature + ". `saddlebook bundles list` shows what is there.");
        }
        return service.get();
    }
}
