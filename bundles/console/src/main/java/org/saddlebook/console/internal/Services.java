package org.saddlebook.console.internal;

import java.util.ArrayList;
import java.util.Collection;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import org.osgi.framework.BundleContext;
import org.osgi.framework.InvalidSyntaxException;
import org.osgi.framework.ServiceReference;
import org.saddlebook.api.problem.InputException;
import org.saddlebook.api.problem.Place;
import org.saddlebook.api.problem.Problem;

/**
 * Services looked up at the moment they are needed: a verb that does not write a report never loads what reports need,
 * and a product without that feature still runs.
 */
final class Services {
    private final BundleContext context;

    Services(BundleContext context) {
        this.context = context;
    }

    /** The best service of a type; empty when none is installed. */
    <S> Optional<S> find(Class<S> type) {
        ServiceReference<S> reference = context.getServiceReference(type);
        return reference == null ? Optional.empty() : Optional.ofNullable(context.getService(reference));
    }

    /**
     * The best service of a type.
     *
     * @param feature the feature that brings it
     * @throws InputException none is installed; the message says which feature to install
     */
    <S> S need(Class<S> type, String feature) throws InputException {
        Optional<S> service = find(type);
        if (service.isEmpty()) {
            throw new InputException(new Problem(
                    "not-installed",
                    Place.of("this installation"),
                    "nothing that provides " + type.getSimpleName(),
                    "the feature " + feature,
                    "Install the feature " + feature + ": its file in the folder features and its bundles in the folder"
                            + " bundles of the product. `saddlebook bundles list` shows what is there."));
        }
        return service.get();
    }

    /** References to all services of a type, highest rank first, then oldest. */
    <S> List<ServiceReference<S>> references(Class<S> type, String filter) {
        try {
            Collection<ServiceReference<S>> found = context.getServiceReferences(type, filter);
            List<ServiceReference<S>> sorted = new ArrayList<>(found);
            sorted.sort(Comparator.reverseOrder());
            return sorted;
        } catch (InvalidSyntaxException e) {
            throw new IllegalStateException("a constant filter", e);
        }
    }

    /** The service behind a reference; empty when it went away or did not start. */
    <S> Optional<S> get(ServiceReference<S> reference) {
        return Optional.ofNullable(context.getService(reference));
    }

    /** A setting that the launcher made; {@code otherwise} when the console runs under another launcher. */
    String setting(String key, String otherwise) {
        String value = context.getProperty(key);
        return value == null ? otherwise : value;
    }

    /** Every bundle that is there. */
    List<org.osgi.framework.Bundle> bundles() {
        return List.of(context.getBundles());
    }
}
