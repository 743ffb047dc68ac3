package org.saddlebook.intake.internal;

import java.nio.file.Path;
import java.time.Clock;
import java.util.List;
import org.osgi.service.component.annotations.Activate;
import org.osgi.service.component.annotations.Component;
import org.osgi.service.component.annotations.Reference;
import org.osgi.service.component.annotations.ReferencePolicyOption;
import org.saddlebook.api.problem.InputException;
import org.saddlebook.api.reader.DataReader;
import org.saddlebook.api.reader.ReadingRule;
import org.saddlebook.api.service.CampaignFormat;
import org.saddlebook.api.service.Intake;
import org.saddlebook.api.service.Progress;
import org.saddlebook.api.task.Cancelled;

/** Offers {@link InputOpener} as the service. */
@Component(service = Intake.class)
public final class IntakeComponent implements Intake {
    private final InputOpener opener;

    /** Called by the framework. */
    @Activate
    public IntakeComponent(
            @Reference CampaignFormat format,
            @Reference Clock clock,
            @Reference(policyOption = ReferencePolicyOption.GREEDY) List<DataReader> readers) {
        opener = new InputOpener(format, new TableImport(readers, clock));
    }

    @Override
    public Opened open(Path input, ReadingRule rule, String who, Progress progress) throws InputException, Cancelled {
        return opener.open(input, rule, who, progress);
    }
}
