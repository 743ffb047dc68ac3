package org.saddlebook.charts.api;

import java.io.IOException;
import org.osgi.annotation.versioning.ConsumerType;

/** A format that figures are saved in. Register an implementation as an OSGi service. */
@ConsumerType
public interface FigureFile {
    /** File name extension without the dot, lower case; also its name for people, in capitals. */
    String extension();

    /** The figure as the bytes of a file. */
    byte[] bytes(FigureDrawing drawing) throws IOException;
}
