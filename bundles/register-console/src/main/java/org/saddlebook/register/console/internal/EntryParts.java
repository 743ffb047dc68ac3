package org.saddlebook.register.console.internal;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.saddlebook.api.campaign.Campaign;
import org.saddlebook.api.findings.Findings;
import org.saddlebook.api.findings.Section;
import org.saddlebook.api.problem.InputException;
import org.saddlebook.api.service.CampaignFormat;
import org.saddlebook.api.service.Intake;
import org.saddlebook.api.service.ReportWriter;
import org.saddlebook.register.api.PartFile;

/** What an entry consists of. */
final class EntryParts {
    private EntryParts() {}

    static boolean hasResult(Findings findings) {
        for (Section section : findings.sections().values()) {
            if (section.outcome() == Section.Outcome.DONE) {
                return true;
            }
        }
        return false;
    }

    static List<PartFile> of(Services services, List<Intake.Part> sources, Campaign effective, Findings findings)
            throws InputException {
        CampaignFormat format = services.need(CampaignFormat.class, "base");
        List<PartFile> parts = new ArrayList<>();
        parts.add(part(PartNames.CAMPAIGN, format.campaign(effective)));
        parts.add(part(PartNames.FINDINGS, format.findings(findings)));
        Optional<ReportWriter> writer = services.find(ReportWriter.class);
        if (writer.isPresent()) {
            for (Intake.Part file : writer.get().report(effective, findings)) {
                parts.add(part(file.name(), file.bytes()));
            }
        }
        List<String> names = PartNames.ofSources(sources);
        for (int i = 0; i < names.size(); i++) {
            parts.add(part(names.get(i), sources.get(i).bytes()));
        }
        return parts;
    }

    private static PartFile part(String name, byte[] bytes) {
        return PartFile.of(name, PartNames.type(name), bytes);
    }
}
