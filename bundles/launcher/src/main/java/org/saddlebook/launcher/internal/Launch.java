package org.saddlebook.launcher.internal;

import java.io.IOException;
import java.io.PrintStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Clock;
import java.util.ArrayList;
import java.util.Collection;
import java.util.Hashtable;
import java.util.List;
import java.util.Map;
import java.util.function.Function;
import java.util.function.Supplier;
import java.util.function.ToIntFunction;
import java.util.function.UnaryOperator;
import org.apache.felix.framework.FrameworkFactory;
import org.apache.felix.scr.impl.Activator;
import org.osgi.framework.BundleActivator;
import org.osgi.framework.BundleContext;
import org.osgi.framework.BundleException;
import org.osgi.framework.InvalidSyntaxException;
import org.osgi.framework.ServiceReference;
import org.osgi.framework.launch.Framework;

/**
 * One run of the product: framework up, console called, framework down.
 *
 * <p>The console is whatever bundle registers a {@code ToIntFunction<String[]>} with the property
 * {@code saddlebook.entry=console}; launcher and bundles share nothing but types of the platform.
 */
final class Launch {
    /** Exit code for arguments, installation or policy that cannot be used. */
    static final int BAD_INPUT = 2;

    /** Exit code for a fault inside the program. */
    static final int INTERNAL_FAULT = 3;

    private static final long STOP_LIMIT_MILLISECONDS = 10_000;

    private final Path home;
    private final Folders folders;
    private final Policy policy;
    private final FaultLog log;
    private final PrintStream err;

    Launch(Path home, Folders folders, Policy policy, FaultLog log, PrintStream err) {
        this.home = home;
        this.folders = folders;
        this.policy = policy;
        this.log = log;
        this.err = err;
    }

    /** Runs the console with these arguments and returns its exit code. */
    int run(String[] arguments, Long shuffle) throws IOException, Refused, BundleException, InterruptedException {
        return run(List.<String[]>of(arguments), shuffle);
    }

    /**
     * Runs the commands of the file {@code lib/training} one after the other, so that a class archive made of this
     * process holds what common commands need. What they print is nobody's concern.
     */
    int train() throws IOException, Refused, BundleException, InterruptedException {
        List<String[]> commands = new ArrayList<>();
        Path scratch = Files.createTempDirectory("saddlebook-training-");
        for (String line : Files.readAllLines(home.resolve("lib").resolve("training"))) {
            if (!line.isBlank()) {
                String[] arguments = line.strip().split(" ", -1);
                for (int i = 0; i < arguments.length; i++) {
                    arguments[i] =
                            arguments[i].replace("{home}", home.toString()).replace("{scratch}", scratch.toString());
                }
                commands.add(arguments);
            }
        }
        try {
            return run(commands, null);
        } finally {
            CacheSlot.delete(scratch);
        }
    }

    /** The verb that all commands share; empty when they do not, or have none. */
    private static String verb(List<String[]> commands) {
        String verb = null;
        for (String[] command : commands) {
            String first = command.length == 0 ? "" : command[0];
            if (verb != null && !verb.equals(first)) {
                return "";
            }
            verb = first;
        }
        return verb == null ? "" : verb;
    }

    private int run(List<String[]> commands, Long shuffle)
            throws IOException, Refused, BundleException, InterruptedException {
        Plan plan = Plan.of(home, folders.userBundles(), policy, verb(commands), shuffle);
        try (CacheSlot slot = CacheSlot.take(folders.cache().resolve("framework"), plan.key())) {
            Framework framework;
            try {
                framework = started(plan, slot);
            } catch (BundleException | RuntimeException e) {
                if (!slot.filled()) {
                    throw e;
                }
                log.write("The framework's cache is damaged and is made anew", e);
                slot.spoil();
                try (CacheSlot once = CacheSlot.temporary(plan.key())) {
                    return run(commands, plan, started(plan, once), once);
                }
            }
            return run(commands, plan, framework, slot);
        }
    }

    private Framework started(Plan plan, CacheSlot slot) throws BundleException {
        Map<String, Object> settings =
                new java.util.HashMap<>(Settings.of(slot.storage(), home, folders, plan, policy));
        settings.put("felix.log.logger", new FrameworkLog(log));
        // Component runtime from the class path, started with the framework: its classes then come ready-made from the
        // class archive, which those of bundles do only in part. That is a tenth of the time to start.
        List<BundleActivator> activators = new ArrayList<>(); // the framework adds to it
        activators.add(new Activator());
        settings.put("felix.systembundle.activators", activators);
        Framework framework = new FrameworkFactory().newFramework(settings);
        framework.init();
        framework.start();
        return framework;
    }

    private int run(List<String[]> commands, Plan plan, Framework framework, CacheSlot slot)
            throws IOException, BundleException, InterruptedException {
        try {
            House house = new House(framework, plan, log);
            BundleContext context = framework.getBundleContext();
            context.registerService(Clock.class, Clock.systemUTC(), null);
            context.registerService(Supplier.class, house::troubles, entry("troubles"));
            Function<byte[], String> check = policy::forbids;
            context.registerService(Function.class, check, entry("policy"));
            KnownHashes hashes = new KnownHashes(slot.file("hashes"));
            context.registerService(UnaryOperator.class, hashes, entry("hashes"));
            house.open();
            if (!slot.filled()) {
                hashes.keep(plan.product());
                slot.markFilled();
            }
            for (String sentence : house.troubles().values()) {
                err.println("saddlebook: " + sentence);
            }
            ToIntFunction<String[]> console = console(context);
            if (console == null) {
                err.println(
                        "saddlebook: the bundle with the command line did not start; install the feature base again."
                                + " Details are in " + log.file());
                return INTERNAL_FAULT;
            }
            int code = 0;
            for (String[] command : commands) {
                code = console.applyAsInt(command);
            }
            return code;
        } finally {
            // The component runtime keeps what it parsed when it stops. Later runs end at once: what a command promised
            // is on the disk when it returns. Added bundles may count on being stopped.
            if (!slot.filled() || !plan.added().isEmpty()) {
                framework.stop();
                framework.waitForStop(STOP_LIMIT_MILLISECONDS);
            }
        }
    }

    @SuppressWarnings("JdkObsolete") // the framework takes a Dictionary, and this is the only one
    private static Hashtable<String, Object> entry(String name) {
        Hashtable<String, Object> properties = new Hashtable<>();
        properties.put("saddlebook.entry", name);
        return properties;
    }

    @SuppressWarnings({"unchecked", "rawtypes"}) // the registry knows raw classes only
    private static ToIntFunction<String[]> console(BundleContext context) {
        try {
            Collection<ServiceReference<ToIntFunction>> found =
                    context.getServiceReferences(ToIntFunction.class, "(saddlebook.entry=console)");
            return found.isEmpty()
                    ? null
                    : (ToIntFunction<String[]>)
                            context.getService(found.iterator().next());
        } catch (InvalidSyntaxException e) {
            throw new IllegalStateException("a constant filter", e);
        }
    }
}
