package org.saddlebook.evaluation.internal;

import java.io.IOException;
import java.net.URI;
import java.nio.file.Files;
import java.nio.file.Path;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.HexFormat;
import java.util.List;
import java.util.TreeMap;
import java.util.function.UnaryOperator;
import org.osgi.framework.Bundle;
import org.osgi.framework.Constants;
import org.osgi.framework.ServiceReference;
import org.osgi.framework.wiring.BundleWire;
import org.osgi.framework.wiring.BundleWiring;
import org.saddlebook.api.findings.Contributor;
import org.saddlebook.api.model.RateModel;

/** Collects the bundles that took part: those named and whatever they are wired to, the framework itself left out. */
final class Contributors {
    private final TreeMap<String, Contributor> found = new TreeMap<>();
    private final UnaryOperator<String> known;

    /**
     * Collects.
     *
     * @param known hash of a bundle by its location, where somebody keeps it; empty where nobody does
     */
    Contributors(UnaryOperator<String> known) {
        this.known = known;
    }

    /** Adds a bundle and what it is wired to. */
    void add(Bundle bundle) {
        if (bundle.getBundleId() == 0) {
            return;
        }
        String key = bundle.getSymbolicName() + " " + bundle.getVersion();
        if (found.containsKey(key)) {
            return;
        }
        found.put(
                key,
                new Contributor(bundle.getSymbolicName(), bundle.getVersion().toString(), hash(bundle.getLocation())));
        BundleWiring wiring = bundle.adapt(BundleWiring.class);
        if (wiring != null) {
            for (BundleWire wire : wiring.getRequiredWires(null)) {
                add(wire.getProvider().getBundle());
            }
        }
    }

    /**
     * Adds an analysis' bundle and the owners of the services it holds, such as sources of data: what they say is in its
     * section, although nothing but the service registry joins them. Rate models are left to the caller, because holding one
     * does not mean that it was asked for.
     */
    void addWithServices(Bundle analysis) {
        add(analysis);
        ServiceReference<?>[] used = analysis.getServicesInUse();
        if (used == null) {
            return;
        }
        for (ServiceReference<?> reference : used) {
            Bundle owner = reference.getBundle();
            if (owner != null && !isRateModel(reference)) {
                add(owner);
            }
        }
    }

    private static boolean isRateModel(ServiceReference<?> reference) {
        if (reference.getProperty(Constants.OBJECTCLASS) instanceof String[] types) {
            for (String type : types) {
                if (type.equals(RateModel.class.getName())) {
                    return true;
                }
            }
        }
        return false;
    }

    /** The bundles by symbolic name. */
    List<Contributor> list() {
        return List.copyOf(found.values());
    }

    /** SHA-256 of the file behind a bundle location; empty when the location is not a file. */
    private String hash(String location) {
        String kept = known.apply(location);
        if (!kept.isEmpty()) {
            return kept;
        }
        String file = location.startsWith("reference:") ? location.substring("reference:".length()) : location;
        if (!file.startsWith("file:")) {
            return "";
        }
        try {
            Path path = Path.of(URI.create(file));
            return HexFormat.of().formatHex(MessageDigest.getInstance("SHA-256").digest(Files.readAllBytes(path)));
        } catch (IOException | IllegalArgumentException | NoSuchAlgorithmException unreadable) {
            return "";
        }
    }
}
