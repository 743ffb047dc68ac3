package org.saddlebook.desk.internal;

import java.awt.AWTEvent;
import java.io.IOException;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.TimeUnit;
import java.util.function.Supplier;
import javax.swing.SwingUtilities;

/** Finds whose fault it is when something throws on the event thread or keeps it, and lets only that panel pay for it. */
final class Containment {
    private final Supplier<Optional<Desk>> desk;

    /**
     * Containment for a desk.
     *
     * @param desk the desk, once there is one; asked on any thread
     */
    Containment(Supplier<Optional<Desk>> desk) {
        this.desk = desk;
    }

    /** On the event thread: something threw there. */
    void fault(Throwable fault, AWTEvent event) {
        Optional<Desk> made = desk.get();
        Optional<String> owner = made.flatMap(
                d -> EventWatch.packageIn(fault.getStackTrace(), d.shelf().packages()));
        if (owner.isPresent()) {
            for (PanelHost host : made.orElseThrow().shelf().ofPackage(owner.get())) {
                host.fail("answering " + event.getClass().getSimpleName(), fault);
            }
            return;
        }
        Faults.log(fault);
        made.ifPresent(d -> d.view()
                .notice(
                        "Something went wrong inside the desk",
                        fault.getClass().getSimpleName() + (fault.getMessage() == null ? "" : ": " + fault.getMessage())
                                + ". What you did last may not have worked; everything else goes on.",
                        List.of()));
    }

    /** On the watcher's thread: the event thread has been busy for long. */
    void stalled(StackTraceElement[] stack, long nanoseconds) {
        Optional<Desk> made = desk.get();
        Optional<String> owner =
                made.flatMap(d -> EventWatch.packageIn(stack, d.shelf().packages()));
        if (owner.isEmpty()) {
            return;
        }
        Desk d = made.orElseThrow();
        List<PanelHost> hosts = d.shelf().ofPackage(owner.get());
        for (PanelHost host : hosts) {
            d.settings().setAside(host.contribution().id(), true);
        }
        try {
            d.settings().save(); // should it never come back, the next start does without it
        } catch (IOException e) {
            Faults.log(e); // nothing else can be done from here
        }
        SwingUtilities.invokeLater(() -> cameBack(d, hosts, nanoseconds));
    }

    /** The event thread is free again: the culprit is folded, with the choice of another try. */
    private static void cameBack(Desk desk, List<PanelHost> hosts, long nanoseconds) {
        String seconds = nanoseconds < TimeUnit.SECONDS.toNanos(2)
                ? "a second"
                : TimeUnit.NANOSECONDS.toSeconds(nanoseconds) + " seconds";
        for (PanelHost host : hosts) {
            if (host.failure().isEmpty()) {
                host.stop("The panel " + host.contribution().id() + " of "
                        + host.contribution().bundle() + " kept the desk from answering for more than " + seconds
                        + " and was stopped.");
            }
        }
        desk.files().saveSettings();
    }
}
