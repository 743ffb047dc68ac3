package org.saddlebook.launcher.internal;

import org.osgi.framework.BundleException;

/** Puts a framework's exceptions into words for people who do not know the framework. */
final class Reasons {
    private static final String PACKAGE = "(osgi.wiring.package=";
    private static final String PLATFORM = "(osgi.ee=";

    private Reasons() {}

    /** One phrase without a full stop. */
    static String of(Throwable cause) {
        String message = cause.getMessage() == null ? "" : cause.getMessage();
        if (cause instanceof BundleException && message.contains("missing requirement")) {
            // The last one is the root: the earlier ones are bundles that wait for it.
            int at = message.lastIndexOf(PACKAGE);
            if (at >= 0) {
                return "it needs the package " + upToParenthesis(message, at + PACKAGE.length())
                        + ", which no installed bundle provides in a fitting version";
            }
            if (message.contains(PLATFORM)) {
                return "it needs another version of Java than "
                        + Runtime.version().feature();
            }
            return "something it needs is not installed";
        }
        Throwable root = cause;
        while (root.getCause() != null) {
            root = root.getCause();
        }
        String text = root.getMessage();
        String name = root.getClass().getSimpleName();
        return text == null ? name : firstLine(text) + " (" + name + ")";
    }

    private static String upToParenthesis(String text, int from) {
        int end = text.indexOf(')', from);
        return end < 0 ? text.substring(from) : text.substring(from, end);
    }

    private static String firstLine(String text) {
        int end = text.indexOf('\n');
        return (end < 0 ? text : text.substring(0, end)).strip();
    }
}
