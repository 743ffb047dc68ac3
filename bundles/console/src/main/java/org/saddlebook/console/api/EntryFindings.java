package org.saddlebook.console.api;

import java.io.IOException;
import org.osgi.annotation.versioning.ProviderType;
import org.saddlebook.api.problem.InputException;

/** Findings that a register keeps, for verbs that take the number of an entry. */
@ProviderType
public interface EntryFindings {
    /** The option that names the register's file. */
    String OPTION = "--register";

    /**
     * The findings of an entry, as they were entered: JSON that {@code CampaignFormat.readFindings} reads.
     *
     * @param entry number of the entry, from 1
     * @param invocation the call, for its folders and clock
     * @param options its options; {@link #OPTION} among them names the register
     * @throws InputException there is no such register
     * @throws IOException there is no such entry, it holds no findings, or the register cannot be read; the message is a
     *     sentence for the user
     */
    byte[] findings(long entry, Invocation invocation, Options options) throws InputException, IOException;

    /**
     * The evaluated campaign of an entry, as it was entered: JSON that {@code CampaignFormat.readCampaign} reads.
     *
     * @param entry number of the entry, from 1
     * @param invocation the call, for its folders and clock
     * @param options its options; {@link #OPTION} among them names the register
     * @throws InputException there is no such register
     * @throws IOException there is no such entry, it holds no campaign, or the register cannot be read; the message is a
     *     sentence for the user
     */
    byte[] campaign(long entry, Invocation invocation, Options options) throws InputException, IOException;
}
