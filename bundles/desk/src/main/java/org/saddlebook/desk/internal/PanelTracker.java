package org.saddlebook.desk.internal;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeMap;
import org.osgi.framework.Bundle;
import org.osgi.framework.BundleContext;
import org.osgi.framework.ServiceReference;
import org.osgi.util.tracker.ServiceTracker;
import org.osgi.util.tracker.ServiceTrackerCustomizer;
import org.saddlebook.desk.api.DeskPanelProvider;

/** The panels that are installed, kept up to date while bundles come and go. */
final class PanelTracker implements ServiceTrackerCustomizer<DeskPanelProvider, DeskPanelProvider>, AutoCloseable {
    private final BundleContext context;
    private final Runnable changed;
    private final ServiceTracker<DeskPanelProvider, DeskPanelProvider> tracker;
    private final Map<ServiceReference<DeskPanelProvider>, Contribution> known = new TreeMap<>();

    /**
     * Starts looking.
     *
     * @param changed called on any thread when a provider came or went
     */
    PanelTracker(BundleContext context, Runnable changed) {
        this.context = context;
        this.changed = changed;
        tracker = new ServiceTracker<>(context, DeskPanelProvider.class, this);
        tracker.open();
    }

    /** The providers in use, from top to bottom. */
    synchronized List<Contribution> contributions() {
        List<Contribution> ranked = new ArrayList<>(known.values());
        java.util.Collections.reverse(ranked); // references sort from low to high rank
        Set<String> seen = new HashSet<>();
        List<Contribution> list = new ArrayList<>();
        for (Contribution contribution : ranked) {
            if (seen.add(contribution.id())) {
                list.add(contribution);
            }
        }
        list.sort(Comparator.comparingInt(Contribution::order).thenComparing(Contribution::id));
        return list;
    }

    @Override
    public DeskPanelProvider addingService(ServiceReference<DeskPanelProvider> reference) {
        DeskPanelProvider provider;
        Contribution contribution;
        Bundle bundle = reference.getBundle();
        String name = bundle == null ? "a bundle that is gone" : bundle.getSymbolicName() + " " + bundle.getVersion();
        try {
            provider = context.getService(reference);
            if (provider == null) {
                return null;
            }
            contribution = new Contribution(provider.id(), provider.order(), name, provider);
        } catch (RuntimeException | LinkageError e) {
            Faults.log(e); // goes to the fault log; without an id there is no place to show it
            return null;
        }
        synchronized (this) {
            known.put(reference, contribution);
        }
        changed.run();
        return provider;
    }

    @Override
    public void modifiedService(ServiceReference<DeskPanelProvider> reference, DeskPanelProvider provider) {
        changed.run();
    }

    @Override
    public void removedService(ServiceReference<DeskPanelProvider> reference, DeskPanelProvider provider) {
        synchronized (this) {
            known.remove(reference);
        }
        context.ungetService(reference);
        changed.run();
    }

    @Override
    public void close() {
        tracker.close();
    }
}
