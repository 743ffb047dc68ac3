package org.saddlebook.reader.sheet.internal;

import java.io.IOException;
import java.util.List;
import org.saddlebook.api.task.Cancelled;
import org.saddlebook.api.task.Task;

/** One format of spreadsheets. */
interface Office {
    /**
     * The sheets of a file.
     *
     * @throws IOException when it is not of this format or damaged
     */
    List<Grid> sheets(byte[] bytes, Task task) throws IOException, Cancelled;
}
