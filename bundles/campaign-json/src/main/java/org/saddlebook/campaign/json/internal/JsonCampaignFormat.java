package org.saddlebook.campaign.json.internal;

import org.osgi.service.component.annotations.Activate;
import org.osgi.service.component.annotations.Component;
import org.saddlebook.api.campaign.Campaign;
import org.saddlebook.api.findings.Findings;
import org.saddlebook.api.problem.InputException;
import org.saddlebook.api.service.CampaignFormat;
import org.saddlebook.json.api.CanonicalJson;
import org.saddlebook.json.api.JsonDocument;
import org.saddlebook.json.api.PrettyJson;
import org.saddlebook.json.api.Sha256;

/** Campaigns and findings as JSON. */
@Component(service = CampaignFormat.class)
public final class JsonCampaignFormat implements CampaignFormat {
    /** Made by the framework or a test; keeps nothing. */
    @Activate
    public JsonCampaignFormat() {}

    @Override
    public byte[] campaign(Campaign campaign) {
        return PrettyJson.bytes(CampaignJson.write(campaign));
    }

    @Override
    public Campaign readCampaign(String name, byte[] json) throws InputException {
        return CampaignJson.read(JsonDocument.read(name, json));
    }

    @Override
    public byte[] findings(Findings findings) {
        return PrettyJson.bytes(FindingsJson.write(findings));
    }

    @Override
    public Findings readFindings(String name, byte[] json) throws InputException {
        return FindingsJson.read(JsonDocument.read(name, json));
    }

    @Override
    public String digest(Campaign campaign) {
        return Sha256.of(
                CanonicalJson.bytes(CampaignJson.writeWithoutHistory(campaign).build()));
    }
}
