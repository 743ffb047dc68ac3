package org.saddlebook.console.internal;

import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.TreeSet;
import java.util.concurrent.ExecutionException;
import java.util.concurrent.FutureTask;
import java.util.concurrent.TimeUnit;
import java.util.concurrent.TimeoutException;
import org.osgi.framework.Bundle;
import org.osgi.framework.BundleContext;
import org.osgi.framework.BundleException;
import org.osgi.framework.ServiceReference;
import org.saddlebook.api.analysis.Analysis;
import org.saddlebook.api.model.RateModel;
import org.saddlebook.api.problem.InputException;
import org.saddlebook.api.reader.DataReader;
import org.saddlebook.console.api.ExitCode;
import org.saddlebook.console.api.Invocation;
import org.saddlebook.console.api.Options;
import org.saddlebook.console.api.Verb;

/** {@code bundles add}: a bundle is tried in the running framework before it is kept. */
final class BundleAddition {
    private static final long LARGEST_BUNDLE = 512L << 20;
    private static final long START_LIMIT_SECONDS = 20;

    private final BundleContext context;
    private final InstalledBundles installed;

    BundleAddition(BundleContext context, InstalledBundles installed) {
        this.context = context;
        this.installed = installed;
    }

    int add(Path file, Invocation invocation) throws InputException, IOException {
        if (Files.isDirectory(file) || Files.size(file) > LARGEST_BUNDLE) {
            throw Options.wrong("not-a-bundle", file.toString(), "no bundle", "a jar file", "Name a jar file.");
        }
        byte[] bytes = Files.readAllBytes(file);
        Optional<BundleFile> read = BundleFile.of(bytes);
        if (read.isEmpty()) {
            throw Options.wrong(
                    "not-a-bundle",
                    file.toString(),
                    "a file without an OSGi manifest",
                    "a jar with Bundle-ManifestVersion 2 and Bundle-SymbolicName",
                    "Build it as an OSGi bundle; the guide for rate models shows how.");
        }
        BundleFile bundle = read.get();
        if (installed.productBundle(bundle.symbolicName()).isPresent()) {
            return refuse(invocation, bundle.symbolicName() + " is the name of a bundle of the product.");
        }
        String forbidden = installed.forbidden(bytes);
        if (!forbidden.isEmpty()) {
            return refuse(invocation, forbidden + ".");
        }
        AddedBundles added = new AddedBundles(invocation.dataFolder());
        List<Path> older = added.named(bundle.symbolicName());
        String trouble = tried(bundle, bytes, invocation);
        if (!trouble.isEmpty()) {
            return refuse(invocation, trouble);
        }
        Path kept = added.put(bundle, bytes);
        invocation
                .out()
                .println((older.isEmpty() ? "Added " : "Replaced ") + bundle.symbolicName() + " " + bundle.version()
                        + " (" + kept + "), SHA-256 " + BundleFile.sha256(bytes) + ".");
        return ExitCode.DONE;
    }

    private static int refuse(Invocation invocation, String reason) {
        invocation.err().println("saddlebook: not added: " + reason);
        return ExitCode.REFUSED;
    }

    /** Installs, starts and removes the bundle again; says what it brings. Returns what is wrong; empty for nothing. */
    private String tried(BundleFile file, byte[] bytes, Invocation invocation) {
        for (Bundle other : installed.all()) {
            if (file.symbolicName().equals(other.getSymbolicName())) {
                uninstall(other); // its older self, for this run only
            }
        }
        Bundle bundle = null;
        try {
            bundle = context.installBundle("trial:" + file.symbolicName(), new ByteArrayInputStream(bytes));
            Bundle trial = bundle;
            FutureTask<String> task = new FutureTask<>(() -> start(trial));
            Thread thread = new Thread(task, "trial of " + file.symbolicName());
            thread.setDaemon(true);
            thread.start();
            String trouble = task.get(START_LIMIT_SECONDS, TimeUnit.SECONDS);
            if (!trouble.isEmpty()) {
                return trouble;
            }
            describe(bundle, invocation);
            return "";
        } catch (BundleException e) {
            return "it cannot be installed: " + firstLine(e);
        } catch (TimeoutException e) {
            return "it did not start within " + START_LIMIT_SECONDS + " seconds.";
        } catch (ExecutionException e) {
            return "it did not start: " + firstLine(e.getCause());
        } catch (InterruptedException e) {
            Thread.currentThread().interrupt();
            return "cancelled.";
        } finally {
            if (bundle != null) {
                uninstall(bundle);
            }
        }
    }

    private static String start(Bundle bundle) {
        try {
            bundle.start(Bundle.START_TRANSIENT);
            return "";
        } catch (BundleException e) {
            String missing = missingPackage(String.valueOf(e.getMessage()));
            return missing.isEmpty()
                    ? "it did not start: " + firstLine(e.getCause() == null ? e : e.getCause())
                    : "it needs " + missing + ", which nothing installed provides.";
        }
    }

    /** The package, and its versions, that the framework's message names; empty when it names none. */
    private static String missingPackage(String message) {
        String mark = "(osgi.wiring.package=";
        int at = message.lastIndexOf(mark);
        if (at < 0) {
            return "";
        }
        int end = message.indexOf(')', at);
        StringBuilder text = new StringBuilder("the package ")
                .append(message, at + mark.length(), Math.max(end, at + mark.length()));
        int from = message.indexOf("(version>=", end);
        int to = message.indexOf("(!(version>=", end);
        if (from == end + 1) {
            text.append(" from version ").append(message, from + 10, message.indexOf(')', from));
            if (to > 0) {
                text.append(" below ").append(message, to + 12, message.indexOf(')', to));
            }
        }
        return text.toString();
    }

    private void describe(Bundle bundle, Invocation invocation) {
        List<String> brings = new ArrayList<>();
        TreeSet<String> other = new TreeSet<>();
        ServiceReference<?>[] references = bundle.getRegisteredServices();
        for (ServiceReference<?> reference : references == null ? new ServiceReference<?>[0] : references) {
            Object service = context.getService(reference);
            if (service instanceof RateModel model) {
                brings.add(
                        "rate model " + model.id() + " (" + model.description().title() + ")");
            } else if (service instanceof DataReader reader) {
                brings.add("reader " + reader.id());
            } else if (service instanceof Analysis analysis) {
                brings.add("analysis " + analysis.section());
            } else if (service instanceof Verb verb) {
                brings.add("command " + verb.name());
            } else {
                for (String type : (String[]) reference.getProperty("objectClass")) {
                    other.add(type);
                }
            }
        }
        if (!other.isEmpty()) {
            brings.add("services " + String.join(", ", other));
        }
        invocation
                .out()
                .println(
                        brings.isEmpty()
                                ? bundle.getSymbolicName() + " contributes nothing that Saddlebook looks for."
                                : bundle.getSymbolicName() + " contributes: " + String.join("; ", brings) + ".");
    }

    private static void uninstall(Bundle bundle) {
        try {
            bundle.uninstall();
        } catch (BundleException | RuntimeException e) {
            return; // a trial that cannot be undone ends with this process
        }
    }

    private static String firstLine(Throwable cause) {
        String text = String.valueOf(cause.getMessage());
        int end = text.indexOf('\n');
        return (end < 0 ? text : text.substring(0, end)) + " ("
                + cause.getClass().getSimpleName() + ").";
    }
}
