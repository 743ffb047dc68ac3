package org.saddlebook.desk.register.internal;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.OptionalLong;
import org.saddlebook.api.campaign.Campaign;
import org.saddlebook.api.findings.Findings;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.findings.Section;
import org.saddlebook.api.problem.InputException;
import org.saddlebook.api.service.CampaignFormat;
import org.saddlebook.api.service.Intake;
import org.saddlebook.api.service.Progress;
import org.saddlebook.api.task.Cancelled;
import org.saddlebook.desk.api.DeskContext;
import org.saddlebook.desk.api.DeskState;
import org.saddlebook.desk.components.api.Nodes;
import org.saddlebook.register.api.Draft;
import org.saddlebook.register.api.Entry;
import org.saddlebook.register.api.PartEntry;
import org.saddlebook.register.api.PartFile;
import org.saddlebook.register.api.Receipt;
import org.saddlebook.register.api.Register;
import org.saddlebook.register.api.RegisterException;
import org.saddlebook.register.api.RegisterStoreFactory.Opening;
import org.saddlebook.register.api.Registers;
import org.saddlebook.register.api.Verification;
import org.saddlebook.register.console.api.EntryWork;
import org.saddlebook.register.console.api.Recomputed;

/** What the panel asks of the register; each call opens it and closes it again. Off the event thread. */
final class RegisterAccess {
    /** Of so many entries, the newest, the findings are read for the list. */
    private static final int READ = 60;

    private static final String CAMPAIGN = "campaign.json";
    private static final String FINDINGS = "findings.json";
    private static final String SOURCES = "sources/";

    private final Registers registers;
    private final EntryWork work;
    private final CampaignFormat format;

    RegisterAccess(Registers registers, EntryWork work, CampaignFormat format) {
        this.registers = registers;
        this.work = work;
        this.format = format;
    }

    boolean hasResult(Findings findings) {
        return work.hasResult(findings);
    }

    private String location(DeskContext context) throws InputException {
        return work.location(Path.of("").toAbsolutePath(), context.dataFolder());
    }

    private Register open(DeskContext context, Opening opening) throws InputException, RegisterException {
        return registers.open(location(context), opening, context.clock());
    }

    /** Every entry, newest first; none where there is no register yet. */
    List<EntryRow> list(DeskContext context, Progress progress) throws InputException, Cancelled, IOException {
        String location = location(context);
        if (!location.contains("://") && !Files.exists(Path.of(location))) {
            return List.of();
        }
        List<EntryRow> rows = new ArrayList<>();
        try (Register register = open(context, Opening.EXISTING)) {
            List<Entry> entries = register.list();
            for (int i = entries.size() - 1; i >= 0; i--) {
                progress.check();
                boolean read = entries.size() - i <= READ;
                rows.add(read ? row(register, entries.get(i)) : bare(entries.get(i)));
            }
        }
        return rows;
    }

    private static EntryRow bare(Entry entry) {
        return new EntryRow(entry, Optional.empty(), Optional.empty());
    }

    private EntryRow row(Register register, Entry entry) throws IOException {
        try {
            Optional<Node> barrier =
                    findings(register, entry).section("barrier").map(Section::body);
            if (barrier.isEmpty()) {
                return bare(entry);
            }
            return new EntryRow(
                    entry,
                    range(barrier.get(), "table", "lowest", "highest"),
                    range(barrier.get(), "honestRange", "lower", "upper"));
        } catch (InputException e) {
            // An entry of another kind is listed without bars.
            return bare(entry);
        }
    }

    private static Optional<EntryRow.Range> range(Node body, String group, String low, String high) {
        OptionalDouble from = Nodes.number(body, group, low);
        OptionalDouble to = Nodes.number(body, group, high);
        return from.isPresent() && to.isPresent()
                ? Optional.of(new EntryRow.Range(from.getAsDouble(), to.getAsDouble()))
                : Optional.empty();
    }

    /** The findings of an entry. */
    Findings findings(DeskContext context, long number) throws InputException, IOException {
        try (Register register = open(context, Opening.EXISTING)) {
            return findings(register, register.show(number));
        }
    }

    private Findings findings(Register register, Entry entry) throws InputException, IOException {
        return format.readFindings("entry " + entry.number(), read(register, entry, FINDINGS));
    }

    private static byte[] read(Register register, Entry entry, String name) throws IOException {
        Optional<PartEntry> part = register.part(entry, name);
        if (part.isEmpty()) {
            throw new RegisterException("Entry " + entry.number() + " has no part " + name + ".");
        }
        return register.read(part.get());
    }

    /** An entry as a campaign to work on: its effective campaign and its sources. */
    Intake.Opened opened(DeskContext context, long number) throws InputException, IOException {
        try (Register register = open(context, Opening.EXISTING)) {
            Entry entry = register.show(number);
            Campaign campaign = format.readCampaign("entry " + number, read(register, entry, CAMPAIGN));
            List<Intake.Part> parts = new ArrayList<>();
            for (PartEntry part : entry.record().parts()) {
                if (part.name().startsWith(SOURCES)) {
                    parts.add(new Intake.Part(part.name(), register.read(part)));
                }
            }
            return new Intake.Opened(campaign, parts, List.of("Opened from entry " + number + " of the register."));
        }
    }

    /**
     * Enters the state shown.
     *
     * @param supersedes the entry whose place it takes; empty for none
     */
    Receipt enter(
            DeskContext context,
            DeskState state,
            String meaning,
            String reason,
            OptionalLong supersedes,
            Progress progress)
            throws InputException, Cancelled, IOException {
        Campaign effective = state.effective().orElseThrow();
        Findings findings = state.findings().orElseThrow();
        List<PartFile> parts = work.parts(state.parts(), effective, findings);
        progress.check(); // from here on it is entered, and no cancel can leave half of it
        Draft draft = supersedes.isPresent()
                ? Draft.superseding(context.user(), effective.title(), supersedes.getAsLong())
                : Draft.entered(context.user(), effective.title());
        try (Register register = open(context, supersedes.isPresent() ? Opening.EXISTING : Opening.CREATE)) {
            if (supersedes.isPresent()) {
                register.show(supersedes.getAsLong());
            }
            return register.enter(draft.withMeaning(meaning).withReason(reason), parts);
        }
    }

    /** Reads everything again. */
    Verification verify(DeskContext context, Progress progress) throws InputException, Cancelled, IOException {
        try (Register register = open(context, Opening.EXISTING)) {
            return register.verify(List.of(), progress);
        }
    }

    /** Evaluates an entry again. */
    Recomputed recompute(DeskContext context, long number, Progress progress)
            throws InputException, Cancelled, IOException {
        try (Register register = open(context, Opening.EXISTING)) {
            return work.recompute(register, register.show(number), progress);
        }
    }
}
