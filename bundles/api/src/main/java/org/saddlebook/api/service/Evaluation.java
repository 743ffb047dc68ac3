package org.saddlebook.api.service;

import org.osgi.annotation.versioning.ProviderType;
import org.saddlebook.api.campaign.Campaign;
import org.saddlebook.api.findings.Findings;
import org.saddlebook.api.problem.InputException;
import org.saddlebook.api.task.Cancelled;

/** Evaluates campaigns with the analyses and models that are installed. */
@ProviderType
public interface Evaluation {
    /**
     * The effective campaign: defaults, error model and the set of models resolved, so that findings are a function of it
     * and of the contributing bundles alone.
     *
     * @throws InputException when a model asked for by name is not installed or choices contradict the data
     */
    Campaign effective(Campaign campaign) throws InputException;

    /**
     * Findings of an effective campaign. A failing analysis loses only its own section.
     *
     * @param progress receives progress; its {@code check} cancels
     */
    Findings evaluate(Campaign effective, Progress progress) throws Cancelled;
}
