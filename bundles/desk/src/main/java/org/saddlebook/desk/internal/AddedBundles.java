package org.saddlebook.desk.internal;

import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.nio.file.ClosedWatchServiceException;
import java.nio.file.DirectoryStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardWatchEventKinds;
import java.nio.file.WatchKey;
import java.nio.file.WatchService;
import java.util.ArrayList;
import java.util.List;
import java.util.function.Consumer;
import java.util.function.Function;
import org.osgi.framework.Bundle;
import org.osgi.framework.BundleContext;
import org.osgi.framework.BundleException;
import org.osgi.framework.InvalidSyntaxException;
import org.osgi.framework.ServiceReference;

/**
 * Watches the folder of the user's own bundles: what the command {@code bundles add} puts there starts in the running desk,
 * what {@code bundles remove} takes away is uninstalled. The administrator's policy decides as it does at the start.
 */
final class AddedBundles implements AutoCloseable {
    private final BundleContext context;
    private final Path folder;
    private final Consumer<String> trouble;
    private final Thread thread = new Thread(this::watch, "desk added bundles");
    private volatile WatchService service;

    /**
     * A watch, not yet started.
     *
     * @param trouble receives a sentence about a bundle that does not start; on any thread
     */
    AddedBundles(BundleContext context, Path folder, Consumer<String> trouble) {
        this.context = context;
        this.folder = folder;
        this.trouble = trouble;
        thread.setDaemon(true);
    }

    void start() {
        thread.start();
    }

    private void watch() {
        try {
            Files.createDirectories(folder);
            service = folder.getFileSystem().newWatchService();
            folder.register(
                    service,
                    StandardWatchEventKinds.ENTRY_CREATE,
                    StandardWatchEventKinds.ENTRY_DELETE,
                    StandardWatchEventKinds.ENTRY_MODIFY);
            while (true) {
                WatchKey key = service.take();
                key.pollEvents();
                compare();
                if (!key.reset()) {
                    return;
                }
            }
        } catch (IOException e) {
            trouble.accept("The folder " + folder + " cannot be watched (" + e.getMessage()
                    + "): added bundles start with the next desk.");
        } catch (InterruptedException | ClosedWatchServiceException e) {
            // The desk is closing.
        }
    }

    /** Brings the framework in line with the folder. */
    void compare() throws IOException {
        List<Path> files = new ArrayList<>();
        try (DirectoryStream<Path> entries = Files.newDirectoryStream(folder)) {
            for (Path entry : entries) {
                if (entry.toString().endsWith(".jar")) {
                    files.add(entry);
                }
            }
        }
        String prefix = folder.toUri().toString();
        for (Bundle bundle : context.getBundles()) {
            String location = bundle.getLocation();
            if (location.startsWith(prefix) && !files.contains(folder.resolve(location.substring(prefix.length())))) {
                uninstall(bundle);
            }
        }
        for (Path file : files) {
            if (context.getBundle(file.toUri().toString()) == null) {
                install(file);
            }
        }
    }

    private void uninstall(Bundle bundle) {
        try {
            bundle.uninstall();
        } catch (BundleException e) {
            trouble.accept("The bundle " + bundle.getSymbolicName() + " could not be stopped: " + e.getMessage());
        }
    }

    private void install(Path file) {
        try {
            byte[] bytes = Files.readAllBytes(file);
            String forbidden = policy().apply(bytes);
            if (!forbidden.isEmpty()) {
                trouble.accept("The added bundle " + file.getFileName() + " is not started: " + forbidden + ".");
                return;
            }
            Bundle bundle = context.installBundle(file.toUri().toString(), new ByteArrayInputStream(bytes));
            if (productHas(bundle)) {
                bundle.uninstall();
                trouble.accept("The added bundle " + file.getFileName() + " has the name of a bundle of the product, "
                        + bundle.getSymbolicName() + ", and is not started.");
                return;
            }
            bundle.start(Bundle.START_TRANSIENT);
        } catch (IOException | BundleException | RuntimeException e) {
            trouble.accept("The added bundle " + file.getFileName() + " did not start: " + e.getMessage());
        }
    }

    private boolean productHas(Bundle added) {
        for (Bundle bundle : context.getBundles()) {
            if (bundle != added
                    && bundle.getSymbolicName() != null
                    && bundle.getSymbolicName().equals(added.getSymbolicName())) {
                return true;
            }
        }
        return added.getSymbolicName() == null;
    }

    /** What the policy of the launcher forbids; under another launcher nothing. */
    @SuppressWarnings({"unchecked", "rawtypes"}) // what the launcher registers under this property
    private Function<byte[], String> policy() {
        try {
            for (ServiceReference<Function> reference :
                    context.getServiceReferences(Function.class, "(saddlebook.entry=policy)")) {
                Function<byte[], String> check = (Function<byte[], String>) context.getService(reference);
                if (check != null) {
                    return check;
                }
            }
        } catch (InvalidSyntaxException e) {
            throw new IllegalStateException("a constant filter", e);
        }
        return bytes -> "";
    }

    @Override
    public void close() throws IOException {
        thread.interrupt();
        if (service != null) {
            service.close();
        }
    }
}
