package org.saddlebook.desk.internal;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.Optional;

/** Notes when a result was painted for the first time, for whoever measures the start and names a file for it. */
final class StartMark {
    /** Property that names the file. */
    static final String PROPERTY = "saddlebook.desk.mark";

    private Optional<Path> file =
            Optional.ofNullable(System.getProperty(PROPERTY)).map(Path::of);

    /** The strata were painted; with a result or without. */
    void painted(boolean withResult) {
        if (withResult && file.isPresent()) {
            Path target = file.get();
            file = Optional.empty();
            java.awt.Toolkit.getDefaultToolkit().sync();
            byte[] time = Long.toString(System.currentTimeMillis()).getBytes(StandardCharsets.US_ASCII);
            try {
                DeskSettings.write(target, time);
            } catch (IOException e) {
                Faults.log(e);
            }
        }
    }
}
