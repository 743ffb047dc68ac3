package org.saddlebook.console.internal;

import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;
import org.osgi.framework.ServiceReference;
import org.saddlebook.console.api.Verb;

/** The verbs that are installed. */
final class Verbs {
    private final Services services;

    Verbs(Services services) {
        this.services = services;
    }

    /** The verb of this name. One that carries its name as a service property is the only one loaded. */
    Optional<Verb> find(String name) {
        for (ServiceReference<Verb> reference : services.references(Verb.class, null)) {
            Object property = reference.getProperty(Verb.NAME_PROPERTY);
            if (property == null || property.equals(name)) {
                Optional<Verb> verb = services.get(reference);
                if (verb.isPresent() && verb.get().name().equals(name)) {
                    return verb;
                }
            }
        }
        return Optional.empty();
    }

    /** All of them by name; of two with one name the one that {@link #find} gives. */
    Map<String, Verb> all() {
        Map<String, Verb> verbs = new TreeMap<>();
        for (ServiceReference<Verb> reference : services.references(Verb.class, null)) {
            services.get(reference).ifPresent(verb -> verbs.putIfAbsent(verb.name(), verb));
        }
        return verbs;
    }
}
