package org.saddlebook.api.service;

import java.util.List;
import org.osgi.annotation.versioning.ProviderType;
import org.saddlebook.api.campaign.Campaign;
import org.saddlebook.api.findings.Findings;

/** Makes findings readable. */
@ProviderType
public interface ReportWriter {
    /** The files of a report: {@code report.html} first, figures beside it. A function of the arguments alone. */
    List<Intake.Part> report(Campaign campaign, Findings findings);
}
