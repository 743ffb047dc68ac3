package org.saddlebook.testkit.api;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Locale;
import java.util.Optional;
import java.util.concurrent.TimeUnit;
import org.junit.jupiter.api.extension.ConditionEvaluationResult;
import org.junit.jupiter.api.extension.ExecutionCondition;
import org.junit.jupiter.api.extension.ExtensionContext;

/** Finds or makes the screen that {@link NeedsScreen} asks for, once in a process. */
final class ScreenCondition implements ExecutionCondition {
    private static final int PATIENCE_SECONDS = 30;

    private static Optional<String> obstacle;

    @Override
    public ConditionEvaluationResult evaluateExecutionCondition(ExtensionContext context) {
        Optional<String> reason = obstacle();
        if (reason.isEmpty()) {
            return ConditionEvaluationResult.enabled("there is a screen");
        }
        if (System.getenv("SADDLEBOOK_NEEDS_SCREEN") != null) {
            throw new IllegalStateException("Window tests must run here, but " + reason.get());
        }
        System.out.println("Skipped: window test " + context.getDisplayName() + ", because " + reason.get());
        return ConditionEvaluationResult.disabled(reason.get());
    }

    private static synchronized Optional<String> obstacle() {
        if (obstacle == null) {
            obstacle = screen();
        }
        return obstacle;
    }

    private static Optional<String> screen() {
        String system = System.getProperty("os.name", "").toLowerCase(Locale.ROOT);
        if (system.startsWith("windows") || system.startsWith("mac")) {
            return Optional.empty();
        }
        String display = System.getenv("DISPLAY");
        if (display == null || display.isEmpty()) {
            return Optional.of("DISPLAY is not set.");
        }
        if (!display.equals(System.getenv("SADDLEBOOK_XVFB"))) {
            return Optional.empty(); // a screen of the user's own
        }
        return virtual(display);
    }

    private static Optional<String> virtual(String display) {
        Path socket = Path.of("/tmp/.X11-unix/X" + display.substring(1));
        try {
            // It ends by itself with its last client. Ended earlier, it would take this process down with a fault of
            // its own.
            Process server = new ProcessBuilder(
                            "Xvfb", display, "-screen", "0", "1366x768x24", "-nolisten", "tcp", "-terminate")
                    .redirectErrorStream(true)
                    .redirectOutput(ProcessBuilder.Redirect.DISCARD)
                    .start();
            long end = System.nanoTime() + TimeUnit.SECONDS.toNanos(PATIENCE_SECONDS);
            while (System.nanoTime() < end) {
                boolean ended = server.waitFor(50, TimeUnit.MILLISECONDS);
                if (Files.exists(socket)) {
                    return Optional.empty(); // also when another process has made it: then ours ends at once
                }
                if (ended) {
                    return Optional.of("Xvfb ended with exit code " + server.exitValue() + ".");
                }
            }
            return Optional.of("Xvfb did not come up.");
        } catch (IOException e) {
            return Optional.of("there is no screen, and no Xvfb to make one (package xvfb): " + e.getMessage());
        } catch (InterruptedException e) {
            Thread.currentThread().interrupt();
            return Optional.of("waiting for Xvfb was interrupted.");
        }
    }
}
