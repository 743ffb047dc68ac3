package org.saddlebook.register.console.api;

import java.io.IOException;
import java.nio.file.Path;
import java.util.List;
import org.osgi.annotation.versioning.ProviderType;
import org.saddlebook.api.campaign.Campaign;
import org.saddlebook.api.findings.Findings;
import org.saddlebook.api.problem.InputException;
import org.saddlebook.api.service.Intake;
import org.saddlebook.api.service.Progress;
import org.saddlebook.api.task.Cancelled;
import org.saddlebook.register.api.Entry;
import org.saddlebook.register.api.PartFile;
import org.saddlebook.register.api.Register;

/** Joins evaluation and register. Off the event thread. */
@ProviderType
public interface EntryWork {
    /**
     * The register meant when nobody names one: where the administrator's policy says, else where the environment says,
     * else the user's own.
     *
     * @param workingFolder relative settings are seen from here
     * @param dataFolder the user's data folder
     */
    String location(Path workingFolder, Path dataFolder) throws InputException;

    /** Whether there is anything worth entering: at least one analysis has findings. */
    boolean hasResult(Findings findings);

    /**
     * The files of an entry: effective campaign, findings, report where one can be written, and sources.
     *
     * @param sources source files with their bytes
     * @param effective the campaign that the findings belong to
     */
    List<PartFile> parts(List<Intake.Part> sources, Campaign effective, Findings findings) throws InputException;

    /** Evaluates an entry again with what is installed, and compares. */
    Recomputed recompute(Register register, Entry entry, Progress progress)
            throws InputException, Cancelled, IOException;
}
