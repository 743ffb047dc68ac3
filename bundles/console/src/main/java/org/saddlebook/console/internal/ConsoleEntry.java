package org.saddlebook.console.internal;

import java.io.BufferedOutputStream;
import java.io.FileDescriptor;
import java.io.FileOutputStream;
import java.io.PrintStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.time.Clock;
import java.util.List;
import java.util.function.ToIntFunction;
import org.osgi.framework.BundleContext;
import org.osgi.service.component.annotations.Activate;
import org.osgi.service.component.annotations.Component;
import org.saddlebook.console.api.ExitCode;
import org.saddlebook.console.api.Invocation;

/** Where the launcher enters: wires the process's streams to a verb. */
@Component(service = ToIntFunction.class, property = "saddlebook.entry=console")
public final class ConsoleEntry implements ToIntFunction<String[]> {
    private final Services services;

    /** Services are looked up when a verb is known. */
    @Activate
    public ConsoleEntry(BundleContext context) {
        services = new Services(context);
    }

    @Override
    public int applyAsInt(String[] arguments) {
        // Not System.out: what a library prints there must not end up between findings.
        PrintStream out = new PrintStream(
                new BufferedOutputStream(new FileOutputStream(FileDescriptor.out), 1 << 16),
                false,
                StandardCharsets.UTF_8);
        PrintStream err = new PrintStream(new FileOutputStream(FileDescriptor.err), true, StandardCharsets.UTF_8);
        List<String> rest =
                arguments.length == 0 ? List.of() : List.of(arguments).subList(1, arguments.length);
        Invocation invocation = new ConsoleInvocation(
                rest,
                out,
                err,
                new ConsoleProgress(err, Thread.currentThread()),
                services.find(Clock.class).orElseGet(Clock::systemUTC),
                System.getProperty("user.name", "unknown"),
                Path.of("").toAbsolutePath(),
                Path.of(services.setting("saddlebook.data", "saddlebook-data")));
        int code = new Dispatcher(new Verbs(services)).run(arguments.length == 0 ? "" : arguments[0], invocation);
        if (out.checkError()) { // flushes
            err.println("saddlebook: standard output could not be written to the end (disk full, or its reader went"
                    + " away); the output is incomplete.");
            return code == ExitCode.DONE ? ExitCode.BAD_INPUT : code;
        }
        return code;
    }
}
