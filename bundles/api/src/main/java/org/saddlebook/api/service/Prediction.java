package org.saddlebook.api.service;

import java.util.List;
import org.osgi.annotation.versioning.ProviderType;
import org.saddlebook.api.findings.Findings;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.problem.InputException;

/** Predicts rate constants from findings alone, for a campaign of today or an entry of years ago. */
@ProviderType
public interface Prediction {
    /**
     * One row per temperature and fitted model, in the shape of {@code barrier.predictions[]}.
     *
     * @param models ids of models; empty for every fitted one
     * @throws InputException when the findings hold no such fitted model or the model is not installed
     */
    List<Node> predict(Findings findings, List<Double> kelvin, List<String> models) throws InputException;
}
