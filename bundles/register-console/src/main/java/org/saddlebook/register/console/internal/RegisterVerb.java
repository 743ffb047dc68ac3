package org.saddlebook.register.console.internal;

import java.io.IOException;
import java.io.PrintStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import org.osgi.framework.BundleContext;
import org.osgi.service.component.annotations.Activate;
import org.osgi.service.component.annotations.Component;
import org.saddlebook.api.problem.InputException;
import org.saddlebook.api.task.Cancelled;
import org.saddlebook.console.api.ExitCode;
import org.saddlebook.console.api.Invocation;
import org.saddlebook.console.api.Options;
import org.saddlebook.console.api.Verb;
import org.saddlebook.json.api.JsonCursor;
import org.saddlebook.json.api.JsonDocument;
import org.saddlebook.json.api.PrettyJson;
import org.saddlebook.register.api.Checkpoint;
import org.saddlebook.register.api.Digest;
import org.saddlebook.register.api.Draft;
import org.saddlebook.register.api.Entry;
import org.saddlebook.register.api.LogRecord;
import org.saddlebook.register.api.PartEntry;
import org.saddlebook.register.api.Receipt;
import org.saddlebook.register.api.Register;
import org.saddlebook.register.api.RegisterDamagedException;
import org.saddlebook.register.api.RegisterStoreFactory.Opening;
import org.saddlebook.register.api.Verification;

/** Looks into the register, checks it, computes an entry again, takes one out, withdraws one. */
@Component(property = Verb.NAME_PROPERTY + "=register")
public final class RegisterVerb implements Verb {
    private final Services services;

    /** Services are looked up when the verb runs. */
    @Activate
    public RegisterVerb(BundleContext context) {
        this(Services.of(context));
    }

    RegisterVerb(Services services) {
        this.services = services;
    }

    @Override
    public String name() {
        return "register";
    }

    @Override
    public String synopsis() {
        return "list [--json] | show N [--json] | verify [--checkpoint FILE]... | recompute N |"
                + " export N --out FOLDER|FILE.zip | withdraw N --reason TEXT [--as NAME]   [--register PATH]";
    }

    @Override
    public String summary() {
        return "lists, shows, verifies, recomputes, exports and withdraws entries";
    }

    @Override
    public String help() {
        return """
                list              every entry with its status; --json prints an array
                show N            entry N with its parts and all that was recorded about it
                verify            reads every record and part again and names each difference
                --checkpoint FILE a checkpoint.json kept outside: the register must still contain that state
                recompute N       evaluates entry N with what is installed and compares the findings
                export N          writes record, parts, proof and signature sheet, readable without this program
                --out             a new folder, or a new file ending in .zip
                withdraw N        records that entry N is withdrawn; it stays readable
                --reason TEXT     why
                --as NAME         who does it; without it the name of your account
                """
                + Locations.HELP
                + "\n\nExit codes: 0 done; 1 a model of the entry is not installed; 2 arguments or register wrong;"
                + " 3 internal fault; 4 verify or recompute found a difference; 130 cancelled.";
    }

    @Override
    public int run(Invocation invocation) throws InputException, Cancelled, IOException {
        List<String> rest = new ArrayList<>(invocation.arguments());
        String what = rest.isEmpty() ? "" : rest.remove(0);
        return switch (what) {
            case "list" -> list(invocation, options(rest, List.of("--json"), List.of()));
            case "show" -> show(invocation, options(rest, List.of("--json"), List.of()));
            case "verify" -> verify(invocation, options(rest, List.of(), List.of("--checkpoint")));
            case "recompute" -> recompute(invocation, options(rest, List.of(), List.of()));
            case "export" -> export(invocation, options(rest, List.of(), List.of("--out")));
            case "withdraw" -> withdraw(invocation, options(rest, List.of(), List.of("--reason", "--as")));
            default ->
                throw Options.wrong(
                        "unknown-argument",
                        "register",
                        what.isEmpty() ? "nothing after register" : "\"" + what + "\"",
                        "list, show, verify, recompute, export or withdraw",
                        "`saddlebook help register` says what each does.");
        };
    }

    private static Options options(List<String> arguments, List<String> switches, List<String> valued)
            throws InputException {
        List<String> all = new ArrayList<>(valued);
        all.add(Locations.OPTION);
        return Options.parse(arguments, switches, all);
    }

    private Register open(Invocation invocation, Options options) throws InputException, IOException {
        return Locations.open(services, invocation, options, Opening.EXISTING);
    }

    private static void noWord(Options options) throws InputException {
        if (!options.words().isEmpty()) {
            throw Options.wrong(
                    "superfluous-argument",
                    options.words().get(0),
                    "\"" + options.words().get(0) + "\"",
                    "nothing",
                    "Leave it out.");
        }
    }

    private int list(Invocation invocation, Options options) throws InputException, IOException {
        noWord(options);
        PrintStream out = invocation.out();
        try (Register register = open(invocation, options)) {
            List<Entry> entries = register.list();
            if (options.has("--json")) {
                out.write(PrettyJson.bytes(EntryJson.list(entries)));
                return ExitCode.DONE;
            }
            for (Entry entry : entries) {
                LogRecord record = entry.record();
                out.println(record.number() + "  " + record.time().toString().substring(0, 10) + "  "
                        + Text.status(entry) + "  " + Text.line(record.actor()) + "  " + Text.line(record.title()));
            }
            out.println(entries.size() == 1 ? "1 entry" : entries.size() + " entries");
        }
        return ExitCode.DONE;
    }

    private int show(Invocation invocation, Options options) throws InputException, IOException {
        long number = Locations.number(options.word("N"));
        PrintStream out = invocation.out();
        try (Register register = open(invocation, options)) {
            Entry entry = register.show(number);
            if (options.has("--json")) {
                out.write(PrettyJson.bytes(EntryJson.entry(entry)));
                return ExitCode.DONE;
            }
            LogRecord record = entry.record();
            out.println("Entry " + record.number() + ": " + Text.line(record.title()));
            out.println("Status     " + Text.status(entry));
            out.println("Entered    on " + record.time() + " by " + Text.line(record.actor()));
            if (!record.meaning().isEmpty()) {
                out.println("Meaning    " + Text.line(record.meaning()));
            }
            if (!record.reason().isEmpty()) {
                out.println("Reason     " + Text.line(record.reason()));
            }
            if (record.target().isPresent()) {
                out.println("Supersedes entry " + record.target().getAsLong());
            }
            out.println("Leaf hash  " + entry.receipt().leaf());
            out.println("Root hash  " + entry.receipt().head().root() + " over "
                    + Text.count(entry.receipt().head().size(), "record") + ", when it was entered");
            out.println("Parts");
            for (PartEntry part : record.parts()) {
                out.println("  " + part.sha256() + "  " + part.name() + "  " + part.size() + " bytes");
            }
            for (LogRecord later : entry.about()) {
                out.println("Later      " + Text.sentence(later));
            }
        }
        return ExitCode.DONE;
    }

    private int verify(Invocation invocation, Options options) throws InputException, Cancelled, IOException {
        noWord(options);
        List<Checkpoint> kept = new ArrayList<>();
        for (String typed : options.values("--checkpoint")) {
            kept.add(checkpoint(Locations.path(invocation, typed, "--checkpoint")));
        }
        PrintStream out = invocation.out();
        try (Register register = open(invocation, options)) {
            Verification verification = register.verify(kept, invocation.progress());
            for (Verification.Difference difference : verification.differences()) {
                out.println(difference.code() + ": " + Text.line(difference.message()));
            }
            out.println(Text.count(verification.records(), "record") + " and "
                    + Text.count(verification.parts(), "part") + " ("
                    + verification.bytes() + " bytes) read in " + register.location());
            if (verification.unreferenced() > 0) {
                out.println("Stored parts that belong to no record: " + verification.unreferenced()
                        + ", left behind by a process" + " that died before it had entered; harmless.");
            }
            if (!verification.agrees()) {
                out.println("Differences: " + verification.differences().size());
                return ExitCode.DIFFERENCE;
            }
            out.println("Everything agrees. Root hash " + verification.head().root() + " over "
                    + Text.count(verification.head().size(), "record"));
            return ExitCode.DONE;
        } catch (RegisterDamagedException e) {
            out.println("store-damaged: " + Text.line(e.getMessage()));
            return ExitCode.DIFFERENCE;
        }
    }

    private static Checkpoint checkpoint(Path file) throws InputException, IOException {
        JsonCursor root =
                JsonDocument.read(file.toString(), Files.readAllBytes(file)).cursor();
        JsonCursor schema = root.member("schema");
        if (!schema.text().equals(Checkpoint.SCHEMA)) {
            throw schema.wrongValue("\"" + Checkpoint.SCHEMA + "\"");
        }
        JsonCursor hash = root.member("root");
        try {
            return new Checkpoint(root.member("size").wholeNumber(), new Digest(hash.text()));
        } catch (IllegalArgumentException e) {
            throw hash.wrongValue("64 lower-case hexadecimal digits");
        }
    }

    private int recompute(Invocation invocation, Options options) throws InputException, Cancelled, IOException {
        long number = Locations.number(options.word("N"));
        try (Register register = open(invocation, options)) {
            return new Recompute(services, invocation).run(register, register.show(number));
        }
    }

    private int export(Invocation invocation, Options options) throws InputException, IOException {
        long number = Locations.number(options.word("N"));
        String out = options.value("--out")
                .orElseThrow(() -> Options.wrong(
                        "missing-option",
                        "--out",
                        "no --out",
                        "--out FOLDER or --out FILE.zip",
                        "Say where to write."));
        Path target = Locations.path(invocation, out, "--out");
        try (Register register = open(invocation, options)) {
            ExportWriter.write(register.export(number), target);
            invocation
                    .out()
                    .println("Exported entry " + number + " to " + target + "; its README.txt says how to check it.");
        }
        return ExitCode.DONE;
    }

    private int withdraw(Invocation invocation, Options options) throws InputException, IOException {
        long number = Locations.number(options.word("N"));
        Draft draft = Draft.withdrawn(
                Locations.actor(invocation, options),
                number,
                options.value("--reason").orElse(""));
        try (Register register = open(invocation, options)) {
            Receipt receipt = register.append(draft);
            invocation.out().println("Entry " + number + " is withdrawn by record " + receipt.number() + ".");
            invocation
                    .out()
                    .println("Root hash  " + receipt.head().root() + " over "
                            + Text.count(receipt.head().size(), "record"));
        }
        return ExitCode.DONE;
    }
}
