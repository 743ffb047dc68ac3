package org.saddlebook.api.service;

import java.util.List;
import org.osgi.annotation.versioning.ProviderType;
import org.saddlebook.api.findings.Findings;

/** Writes the numbers of findings as tables for other programs. */
@ProviderType
public interface TableWriter {
    /** The files, named below {@code tables/}. A function of the argument alone. */
    List<Intake.Part> tables(Findings findings);
}
