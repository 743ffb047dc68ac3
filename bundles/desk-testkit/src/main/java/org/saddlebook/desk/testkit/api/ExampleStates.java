package org.saddlebook.desk.testkit.api;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.util.List;
import org.saddlebook.api.campaign.Campaign;
import org.saddlebook.api.findings.Findings;
import org.saddlebook.api.problem.InputException;
import org.saddlebook.api.service.CampaignFormat;
import org.saddlebook.api.service.Intake;
import org.saddlebook.campaign.json.internal.JsonCampaignFormat;
import org.saddlebook.desk.api.DeskState;

/**
 * Campaigns with findings, for panels to show. They are invented (see demo-data) and were evaluated once by the product;
 * tests show them and compare no number with anything.
 */
public final class ExampleStates {
    private ExampleStates() {}

    /** A ring closure with barrier, spontaneity and operating window. */
    public static DeskState ringClosure() {
        return of("ring-closure");
    }

    /** The campaign format. */
    public static CampaignFormat format() {
        return new JsonCampaignFormat();
    }

    private static DeskState of(String name) {
        try {
            byte[] campaignBytes = read(name + ".campaign.json");
            Campaign campaign = format().readCampaign(name, campaignBytes);
            Findings findings = format().readFindings(name, read(name + ".findings.json"));
            return DeskState.of(campaign)
                    .withFindings(campaign, findings)
                    .withSources(
                            List.of(new Intake.Part("campaign.json", campaignBytes)),
                            List.of(),
                            org.saddlebook.api.reader.ReadingRule.AUTOMATIC);
        } catch (InputException e) {
            throw new IllegalStateException("the example " + name + " cannot be read: " + e.problems(), e);
        }
    }

    private static byte[] read(String name) {
        try (InputStream in = ExampleStates.class.getResourceAsStream(name)) {
            if (in == null) {
                throw new IllegalStateException("no example " + name);
            }
            return in.readAllBytes();
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }
}
