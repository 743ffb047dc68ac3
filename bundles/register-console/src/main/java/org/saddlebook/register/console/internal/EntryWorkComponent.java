package org.saddlebook.register.console.internal;

import java.io.IOException;
import java.nio.file.Path;
import java.util.List;
import org.osgi.framework.BundleContext;
import org.osgi.service.component.annotations.Activate;
import org.osgi.service.component.annotations.Component;
import org.saddlebook.api.campaign.Campaign;
import org.saddlebook.api.findings.Findings;
import org.saddlebook.api.problem.InputException;
import org.saddlebook.api.service.Intake;
import org.saddlebook.api.service.Progress;
import org.saddlebook.api.task.Cancelled;
import org.saddlebook.register.api.Entry;
import org.saddlebook.register.api.PartFile;
import org.saddlebook.register.api.Register;
import org.saddlebook.register.console.api.EntryWork;
import org.saddlebook.register.console.api.Recomputed;

/** Hands on what the verbs do. */
@Component
public final class EntryWorkComponent implements EntryWork {
    private final Services services;

    /** Services are looked up when work is done. */
    @Activate
    public EntryWorkComponent(BundleContext context) {
        this(Services.of(context));
    }

    EntryWorkComponent(Services services) {
        this.services = services;
    }

    @Override
    public String location(Path workingFolder, Path dataFolder) throws InputException {
        return Locations.location(services, workingFolder, dataFolder);
    }

    @Override
    public boolean hasResult(Findings findings) {
        return EntryParts.hasResult(findings);
    }

    @Override
    public List<PartFile> parts(List<Intake.Part> sources, Campaign effective, Findings findings)
            throws InputException {
        return EntryParts.of(services, sources, effective, findings);
    }

    @Override
    public Recomputed recompute(Register register, Entry entry, Progress progress)
            throws InputException, Cancelled, IOException {
        return Recomputation.of(services, register, entry, progress);
    }
}
