package org.saddlebook.desk.internal;

import java.awt.AWTError;
import java.awt.GraphicsEnvironment;
import java.awt.HeadlessException;
import java.io.IOException;
import java.nio.file.Path;
import java.util.List;
import org.osgi.framework.BundleContext;
import org.saddlebook.console.api.Invocation;

/** Where the first class of a window is loaded: not before somebody asks for the desk. */
final class DeskStart {
    private DeskStart() {}

    static void run(BundleContext context, Invocation invocation, List<Path> inputs) throws IOException {
        try {
            if (GraphicsEnvironment.isHeadless()) {
                throw noScreen("none was found");
            }
            new DeskRun(context, invocation).run(inputs);
        } catch (HeadlessException | AWTError e) {
            throw noScreen(e.getMessage());
        }
    }

    private static IOException noScreen(String reason) {
        return new IOException("the desk needs a screen: " + reason
                + ". On a computer without one use the other commands; `saddlebook help` lists them.");
    }
}
