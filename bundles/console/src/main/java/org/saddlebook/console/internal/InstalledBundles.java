package org.saddlebook.console.internal;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;
import java.util.function.Function;
import java.util.function.Supplier;
import org.osgi.framework.Bundle;
import org.osgi.framework.BundleContext;
import org.osgi.framework.ServiceReference;

/** The bundles of this run and what the launcher says about them. */
final class InstalledBundles {
    private final BundleContext context;
    private final Services services;

    InstalledBundles(BundleContext context) {
        this.context = context;
        this.services = new Services(context);
    }

    /** Every bundle but the framework, by name. */
    List<Bundle> all() {
        List<Bundle> bundles = new ArrayList<>();
        for (Bundle bundle : context.getBundles()) {
            if (bundle.getBundleId() != 0) {
                bundles.add(bundle);
            }
        }
        bundles.sort(Comparator.comparing(bundle -> String.valueOf(bundle.getSymbolicName())));
        return bundles;
    }

    /** Whether a bundle belongs to the product; otherwise the user added it. */
    boolean ofProduct(Bundle bundle) {
        Optional<Path> file = BundleFile.pathOf(bundle);
        String home = services.setting("saddlebook.home", "");
        return home.isEmpty() || file.isEmpty() || file.get().startsWith(Path.of(home));
    }

    /** The bundle of the product with this symbolic name. */
    Optional<Bundle> productBundle(String symbolicName) {
        for (Bundle bundle : all()) {
            if (symbolicName.equals(bundle.getSymbolicName()) && ofProduct(bundle)) {
                return Optional.of(bundle);
            }
        }
        return Optional.empty();
    }

    /** Name of a bundle or feature to what is wrong with it. */
    Map<String, String> troubles() {
        Map<String, String> troubles = new TreeMap<>();
        for (ServiceReference<?> reference : services.references(Supplier.class, "(saddlebook.entry=troubles)")) {
            if (context.getService(reference) instanceof Supplier<?> supplier
                    && supplier.get() instanceof Map<?, ?> map) {
                map.forEach((name, sentence) -> troubles.put(String.valueOf(name), String.valueOf(sentence)));
            }
        }
        return troubles;
    }

    /** Why the policy of this machine forbids a bundle; empty when it does not. */
    @SuppressWarnings("unchecked") // the launcher registers a function of bytes to text under this property
    String forbidden(byte[] bytes) {
        for (ServiceReference<?> reference : services.references(Function.class, "(saddlebook.entry=policy)")) {
            if (context.getService(reference) instanceof Function<?, ?> function) {
                return String.valueOf(((Function<byte[], Object>) function).apply(bytes));
            }
        }
        return "";
    }

    /** The state in a word. */
    static String state(Bundle bundle) {
        return switch (bundle.getState()) {
            case Bundle.ACTIVE, Bundle.STARTING -> "active";
            case Bundle.RESOLVED -> "resolved";
            case Bundle.INSTALLED -> "not resolved";
            default -> "stopped";
        };
    }
}
