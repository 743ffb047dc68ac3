package org.saddlebook.launcher.internal;

import org.apache.felix.framework.Logger;
import org.osgi.framework.Bundle;
import org.osgi.framework.ServiceReference;

/** Sends the framework's own messages to the log instead of the user's screen. */
final class FrameworkLog extends Logger {
    private final FaultLog log;

    FrameworkLog(FaultLog log) {
        this.log = log;
    }

    @Override
    @SuppressWarnings("rawtypes") // the overridden method has the raw type
    protected void doLog(Bundle bundle, ServiceReference reference, int level, String message, Throwable cause) {
        String text = bundle == null ? message : bundle.getSymbolicName() + ": " + message;
        if (cause == null) {
            log.write(text);
        } else {
            log.write(text, cause);
        }
    }
}
