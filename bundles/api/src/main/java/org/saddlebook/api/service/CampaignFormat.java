package org.saddlebook.api.service;

import org.osgi.annotation.versioning.ProviderType;
import org.saddlebook.api.campaign.Campaign;
import org.saddlebook.api.findings.Findings;
import org.saddlebook.api.problem.InputException;

/** Campaigns and findings as JSON, UTF-8, with a schema version; every older version stays readable. */
@ProviderType
public interface CampaignFormat {
    /** A campaign as JSON for people to read, ending in a line feed. */
    byte[] campaign(Campaign campaign);

    /**
     * Reads a campaign.
     *
     * @param name file name for messages
     */
    Campaign readCampaign(String name, byte[] json) throws InputException;

    /** Findings as JSON for people to read, ending in a line feed; a function of the findings alone. */
    byte[] findings(Findings findings);

    /**
     * Reads findings.
     *
     * @param name file name for messages
     */
    Findings readFindings(String name, byte[] json) throws InputException;

    /** SHA-256 over the canonical form (RFC 8785) of the campaign without its history, lower-case hexadecimal. */
    String digest(Campaign campaign);
}
