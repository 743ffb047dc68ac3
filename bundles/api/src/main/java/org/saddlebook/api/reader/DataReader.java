package org.saddlebook.api.reader;

import org.osgi.annotation.versioning.ConsumerType;
import org.saddlebook.api.problem.InputException;
import org.saddlebook.api.task.Cancelled;
import org.saddlebook.api.task.Task;

/** Reads one kind of file at import. Register an implementation as an OSGi service. */
@ConsumerType
public interface DataReader {
    /** Stable id, for example {@code delimited-text}. */
    String id();

    /** How sure the reader is that the file is its kind: 0 not at all, 100 certain. Never throws. */
    int confidence(SourceHead head);

    /**
     * Reads the file.
     *
     * @throws InputException with every problem found; never a guess in place of a problem
     */
    Imported read(Source source, ReadingRule rule, Task task) throws InputException, Cancelled;
}
