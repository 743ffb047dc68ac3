package org.saddlebook.launcher.internal;

import java.io.FileDescriptor;
import java.io.FileOutputStream;
import java.io.PrintStream;
import java.net.URISyntaxException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.time.Clock;
import java.util.Map;

/** Where the start script enters. */
public final class Main {
    /** Exit code of a run that the user cancelled. */
    private static final int CANCELLED = 130;

    private static final long PATIENCE_MILLISECONDS = 10_000;

    private final Thread worker;
    private boolean finished;
    private boolean cancelled;

    private Main(Thread worker) {
        this.worker = worker;
    }

    /** Runs the product and ends the process with the exit code of the console. */
    public static void main(String[] arguments) {
        Main main = new Main(Thread.currentThread());
        // Ctrl-C: work is asked to stop by an interrupt and gets time to remove what is half written.
        Runtime.getRuntime().addShutdownHook(new Thread(main::cancel, "cancel"));
        int code = guarded(arguments);
        if (main.finish()) {
            System.exit(code);
        }
    }

    private static int guarded(String[] arguments) {
        PrintStream err = new PrintStream(new FileOutputStream(FileDescriptor.err), true, StandardCharsets.UTF_8);
        Folders folders = Folders.of(System.getProperty("os.name"), System.getenv(), System.getProperty("user.home"));
        FaultLog log = new FaultLog(folders.cache(), Clock.systemUTC());
        PrintStream quiet = log.stream();
        System.setOut(quiet);
        System.setErr(quiet);
        try {
            Policy policy = policy(folders, System.getenv());
            Long shuffle = Long.getLong("saddlebook.shuffle");
            Launch launch = new Launch(home(), folders, policy, log, err);
            return Boolean.getBoolean("saddlebook.training") ? launch.train() : launch.run(arguments, shuffle);
        } catch (Refused e) {
            err.println("saddlebook: " + e.getMessage());
            return Launch.BAD_INPUT;
        } catch (Exception | Error e) { // nothing may reach the user as a stack trace
            log.write("The run ended by a fault", e);
            err.println("saddlebook: internal fault: " + Reasons.of(e) + ". Details are in " + log.file());
            return Launch.INTERNAL_FAULT;
        }
    }

    /** The machine's policy, made stricter by the file that SADDLEBOOK_POLICY names; it can never be made weaker. */
    private static Policy policy(Folders folders, Map<String, String> environment) throws Refused {
        Policy machine = Policy.read(folders.policy());
        String more = environment.get("SADDLEBOOK_POLICY");
        return more == null || more.isEmpty() ? machine : machine.and(Policy.read(Path.of(more)));
    }

    /** The product's folder: the one above the folder of this jar. */
    private static Path home() throws URISyntaxException {
        String given = System.getProperty("saddlebook.home");
        if (given != null) {
            return Path.of(given).toAbsolutePath().normalize();
        }
        Path jar = Path.of(
                Main.class.getProtectionDomain().getCodeSource().getLocation().toURI());
        return jar.getParent().getParent();
    }

    /** Notes the regular end; false when a cancel came first and ends the process itself. */
    private synchronized boolean finish() {
        finished = !cancelled;
        return finished;
    }

    private synchronized boolean startCancel() {
        cancelled = !finished;
        return cancelled;
    }

    private void cancel() {
        if (!startCancel()) {
            return;
        }
        worker.interrupt();
        try {
            worker.join(PATIENCE_MILLISECONDS);
        } catch (InterruptedException e) {
            Thread.currentThread().interrupt();
        }
        Runtime.getRuntime().halt(CANCELLED);
    }
}
