package org.saddlebook.api.service;

import java.nio.file.Path;
import java.util.List;
import org.osgi.annotation.versioning.ProviderType;
import org.saddlebook.api.campaign.Campaign;
import org.saddlebook.api.problem.InputException;
import org.saddlebook.api.reader.ReadingRule;
import org.saddlebook.api.task.Cancelled;

/** Opens what a user points at: a campaign folder, a {@code campaign.json}, or a table that an installed reader knows. */
@ProviderType
public interface Intake {
    /**
     * What was opened.
     *
     * @param campaign the campaign
     * @param parts the source files with their bytes, in the order of the campaign's sources
     * @param understood sentences that say how a table was read; empty for a campaign.json
     */
    record Opened(Campaign campaign, List<Part> parts, List<String> understood) {
        /** Copies the lists. */
        public Opened {
            parts = List.copyOf(parts);
            understood = List.copyOf(understood);
        }
    }

    /**
     * A file with its bytes.
     *
     * @param name relative path
     * @param bytes content; do not change
     */
    @SuppressWarnings("ArrayRecordComponent") // compared by nobody; the bytes can be large
    record Part(String name, byte[] bytes) {}

    /**
     * Opens an input.
     *
     * @param who recorded in the history when a table is imported
     */
    Opened open(Path input, ReadingRule rule, String who, Progress progress) throws InputException, Cancelled;
}
