package org.saddlebook.launcher.internal;

import java.io.ByteArrayInputStream;
import java.io.InputStream;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.concurrent.ExecutionException;
import java.util.concurrent.FutureTask;
import java.util.concurrent.TimeUnit;
import java.util.concurrent.TimeoutException;
import org.osgi.framework.Bundle;
import org.osgi.framework.BundleContext;
import org.osgi.framework.BundleException;
import org.osgi.framework.hooks.resolver.ResolverHookFactory;
import org.osgi.framework.launch.Framework;
import org.osgi.framework.wiring.FrameworkWiring;

/** Installs and starts the bundles of a plan in a framework; a bundle that fails is noted and the rest goes on. */
final class House {
    private static final long START_LIMIT_SECONDS = 20;

    private final Framework framework;
    private final Plan plan;
    private final FaultLog log;
    private final Map<String, String> troubles;

    House(Framework framework, Plan plan, FaultLog log) {
        this.framework = framework;
        this.plan = plan;
        this.log = log;
        this.troubles = new LinkedHashMap<>(plan.troubles());
    }

    /** Name of a bundle or feature to a sentence on what is wrong with it. */
    Map<String, String> troubles() {
        return troubles;
    }

    /** Installs what is not in the cache yet, resolves everything and starts what has something to start. */
    void open() {
        BundleContext context = framework.getBundleContext();
        List<Bundle> product = new ArrayList<>();
        for (Path jar : plan.product()) {
            String location = KnownHashes.location(jar);
            Bundle bundle = context.getBundle(location);
            try {
                product.add(bundle == null ? context.installBundle(location) : bundle);
            } catch (BundleException e) {
                note(jar.getFileName().toString(), "cannot be installed", e);
            }
        }
        List<Bundle> added = added(context, product);
        if (!added.isEmpty()) {
            context.registerService(ResolverHookFactory.class, triggers -> new ProductFirst(product), null);
        }
        FrameworkWiring wiring = framework.adapt(FrameworkWiring.class);
        wiring.resolveBundles(product);
        if (!added.isEmpty()) {
            wiring.resolveBundles(added);
        }
        for (Bundle bundle : product) {
            start(bundle);
        }
        for (Bundle bundle : added) {
            startWithLimit(bundle);
        }
    }

    private List<Bundle> added(BundleContext context, List<Bundle> product) {
        List<Bundle> bundles = new ArrayList<>();
        for (Plan.Added added : plan.added()) {
            try {
                Bundle bundle = context.getBundle(added.location());
                if (bundle == null) {
                    InputStream bytes = new ByteArrayInputStream(added.bytes());
                    bundle = context.installBundle(added.location(), bytes);
                }
                if (bundle.getSymbolicName() == null) {
                    bundle.uninstall();
                    troubles.put(added.name(), "the added file " + added.name() + " is not an OSGi bundle.");
                } else if (named(product, bundle.getSymbolicName())) {
                    bundle.uninstall();
                    troubles.put(
                            added.name(),
                            "the added bundle " + added.name() + " has the name of a bundle of the product, "
                                    + bundle.getSymbolicName() + ", and is not started.");
                } else {
                    bundles.add(bundle);
                }
            } catch (BundleException e) {
                note(added.name(), "cannot be installed", e);
            }
        }
        return bundles;
    }

    private static boolean named(List<Bundle> bundles, String name) {
        for (Bundle bundle : bundles) {
            if (name.equals(bundle.getSymbolicName())) {
                return true;
            }
        }
        return false;
    }

    private void start(Bundle bundle) {
        try {
            if (bundle.getState() == Bundle.INSTALLED || hasSomethingToStart(bundle)) {
                // Transient: what is started is decided anew at each start, never by what an older run left behind.
                bundle.start(Bundle.START_TRANSIENT);
            }
        } catch (BundleException | RuntimeException | LinkageError e) {
            note(bundle.getSymbolicName(), "did not start", e);
        }
    }

    /** A foreign activator may hang: it then loses its own bundle only. */
    private void startWithLimit(Bundle bundle) {
        FutureTask<Void> task = new FutureTask<>(() -> start(bundle), null);
        Thread thread = new Thread(task, "start " + bundle.getSymbolicName());
        thread.setDaemon(true);
        thread.start();
        try {
            task.get(START_LIMIT_SECONDS, TimeUnit.SECONDS);
        } catch (TimeoutException e) {
            troubles.put(
                    bundle.getSymbolicName(),
                    "the bundle " + bundle.getSymbolicName() + " did not start within " + START_LIMIT_SECONDS
                            + " seconds and is left alone.");
        } catch (ExecutionException e) {
            note(bundle.getSymbolicName(), "did not start", e.getCause());
        } catch (InterruptedException e) {
            Thread.currentThread().interrupt();
        }
    }

    private static boolean hasSomethingToStart(Bundle bundle) {
        var headers = bundle.getHeaders("");
        return headers.get("Fragment-Host") == null
                && (headers.get("Service-Component") != null || headers.get("Bundle-Activator") != null);
    }

    private synchronized void note(String bundle, String what, Throwable cause) {
        log.write("The bundle " + bundle + " " + what, cause);
        troubles.put(bundle, "the bundle " + bundle + " " + what + ": " + Reasons.of(cause) + ".");
    }
}
