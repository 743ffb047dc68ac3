package org.saddlebook.api.service;

import java.io.IOException;
import org.osgi.annotation.versioning.ProviderType;
import org.saddlebook.api.problem.InputException;

/** Findings that a register keeps, by the number of their entry. */
@ProviderType
public interface StoredFindings {
    /**
     * The findings of an entry, as they were entered: JSON that {@link CampaignFormat#readFindings} reads.
     *
     * @param entry number of the entry, from 1
     * @throws InputException there is no such entry, or it holds no findings
     * @throws IOException the register cannot be read
     */
    byte[] findings(long entry) throws InputException, IOException;
}
