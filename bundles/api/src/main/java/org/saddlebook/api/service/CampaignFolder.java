package org.saddlebook.api.service;

import java.io.IOException;
import java.nio.file.Path;
import org.osgi.annotation.versioning.ProviderType;
import org.saddlebook.api.problem.InputException;

/** Keeps a campaign as a folder: {@code campaign.json} and, beside it, the files it was read from. */
@ProviderType
public interface CampaignFolder {
    /**
     * Writes a campaign. The folder appears complete or not at all; opened again it gives the same campaign.
     *
     * @param opened the campaign and its parts
     * @param folder where; must not exist, or be empty, or hold an earlier save of a campaign, which is replaced
     * @throws InputException when the folder holds anything else
     * @throws IOException when it could not be written; the message is a sentence for the user
     */
    void save(Intake.Opened opened, Path folder) throws IOException, InputException;
}
