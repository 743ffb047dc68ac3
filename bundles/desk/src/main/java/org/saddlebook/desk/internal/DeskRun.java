package org.saddlebook.desk.internal;

import java.io.IOException;
import java.lang.reflect.InvocationTargetException;
import java.nio.file.Path;
import java.time.Clock;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.concurrent.CountDownLatch;
import java.util.concurrent.TimeUnit;
import java.util.concurrent.atomic.AtomicReference;
import javax.swing.SwingUtilities;
import org.osgi.framework.BundleContext;
import org.osgi.framework.InvalidSyntaxException;
import org.osgi.framework.ServiceEvent;
import org.osgi.framework.ServiceListener;
import org.saddlebook.api.service.Intake;
import org.saddlebook.console.api.Invocation;

/** One run of the desk, from its opening to its end. */
final class DeskRun {
    private static final long PATIENCE_SECONDS = 4;
    private static final long KEEPING_MILLISECONDS = 5000;
    private static final String CAPABILITIES = "(|(objectClass=org.saddlebook.api.model.RateModel)"
            + "(objectClass=org.saddlebook.api.analysis.Analysis))";

    private final BundleContext context;
    private final Path dataFolder;
    private final Path configFolder;
    private final Clock clock;
    private final String user;
    private final Services services;
    private final CountDownLatch left = new CountDownLatch(1);
    private final AtomicReference<Desk> desk = new AtomicReference<>();
    private final AtomicReference<DeskWindow> window = new AtomicReference<>();

    DeskRun(BundleContext context, Invocation invocation) {
        this(
                context,
                Services.of(context),
                invocation.dataFolder(),
                Path.of(Optional.ofNullable(context.getProperty("saddlebook.config"))
                        .orElse(invocation.dataFolder().toString())),
                invocation.clock(),
                invocation.user());
    }

    DeskRun(BundleContext context, Services services, Path dataFolder, Path configFolder, Clock clock, String user) {
        this.context = context;
        this.services = services;
        this.dataFolder = dataFolder;
        this.configFolder = configFolder;
        this.clock = clock;
        this.user = user;
    }

    /** Opens the window, waits until the user has left, keeps what is not saved. */
    void run(List<Path> inputs) throws IOException {
        DeskSettings settings = DeskSettings.in(configFolder);
        Optional<Recovery> recovery = recovery();
        Containment containment = new Containment(() -> Optional.ofNullable(desk.get()));
        EventWatch watch =
                new EventWatch(TimeUnit.SECONDS.toNanos(PATIENCE_SECONDS), containment::fault, containment::stalled);
        java.awt.Toolkit.getDefaultToolkit().getSystemEventQueue().push(watch);
        AtomicReference<PanelTracker> tracker = new AtomicReference<>();
        ServiceListener capabilities = event -> {
            if (event.getType() != ServiceEvent.MODIFIED) {
                SwingUtilities.invokeLater(this::capabilitiesChanged);
            }
        };
        try {
            onEventThread(() -> {
                Look.use(Look.ink(settings.theme()));
                PanelTracker panels = new PanelTracker(context, () -> SwingUtilities.invokeLater(this::panelsChanged));
                tracker.set(panels);
                Desk made = new Desk(
                        services,
                        settings,
                        clock,
                        user,
                        dataFolder,
                        recovery,
                        panels::contributions,
                        Look.ink(settings.theme()));
                desk.set(made);
                window.set(new DeskWindow(made, left::countDown));
                start(made, inputs, recovery);
                window.get().setVisible(true);
            });
            context.addServiceListener(capabilities, CAPABILITIES);
            try (AddedBundles added = new AddedBundles(context, dataFolder.resolve("bundles"), this::trouble)) {
                added.start();
                left.await();
            }
        } catch (InterruptedException e) {
            Thread.currentThread().interrupt();
        } catch (InvalidSyntaxException e) {
            throw new IllegalStateException("a constant filter", e);
        } finally {
            context.removeServiceListener(capabilities);
            end(settings, recovery, tracker.get());
            watch.close();
        }
    }

    private Optional<Recovery> recovery() {
        try {
            return Optional.of(Recovery.in(dataFolder));
        } catch (IOException e) {
            return Optional.empty(); // the window says so as soon as something would have to be kept
        }
    }

    /** What the desk opens with: what was asked for, what was left, else the demo. */
    private void start(Desk made, List<Path> inputs, Optional<Recovery> recovery) {
        if (recovery.isEmpty()) {
            made.view()
                    .notice(
                            "Unsaved work cannot be kept",
                            "The folder " + dataFolder + " cannot be written. Save often.",
                            List.of());
        }
        inputs.forEach(input -> made.files().open(input));
        made.background()
                .run(
                        "looking for unsaved work",
                        false,
                        progress -> recovery.isPresent()
                                ? recovery.get().left(services.need(Intake.class, "base"), user)
                                : Map.<String, Recovery.Left>of(),
                        found -> {
                            recovered(made, found);
                            if (found.isEmpty() && inputs.isEmpty()) {
                                made.files().openDemo();
                            }
                        },
                        fault -> made.workFailed("looking for unsaved work", fault));
    }

    private static void recovered(Desk made, Map<String, Recovery.Left> found) {
        found.forEach((key, campaign) -> {
            OpenCampaign open = made.open(key, campaign.state(), true);
            made.note(open, "taken up again: it was not saved when the desk ended");
        });
        if (!found.isEmpty()) {
            made.view()
                    .notice(
                            found.size() == 1
                                    ? "One campaign was not saved when the desk ended; here it is again."
                                    : found.size()
                                            + " campaigns were not saved when the desk ended; here they are again.",
                            "Nothing was lost. Save each where it belongs, or close it.",
                            List.of());
        }
    }

    private void panelsChanged() {
        Desk made = desk.get();
        if (made != null && made.view() != null) {
            made.shelf().sync();
        }
    }

    private boolean announced;

    /** Several services of one bundle come at once; one evaluation is enough. */
    private void capabilitiesChanged() {
        if (!announced) {
            announced = true;
            SwingUtilities.invokeLater(() -> {
                announced = false;
                Desk made = desk.get();
                if (made != null) {
                    made.capabilitiesChanged();
                }
            });
        }
    }

    private void trouble(String sentence) {
        SwingUtilities.invokeLater(() -> desk.get().view().notice("An added bundle", sentence, List.of()));
    }

    private void end(DeskSettings settings, Optional<Recovery> recovery, PanelTracker tracker) throws IOException {
        Desk made = desk.get();
        if (tracker != null) {
            tracker.close();
        }
        try {
            onEventThread(() -> {
                if (made != null) {
                    made.shelf().clear();
                    made.background().close();
                }
                if (window.get() != null) {
                    window.get().dispose();
                }
            });
        } catch (InterruptedException e) {
            Thread.currentThread().interrupt();
        }
        if (made != null) {
            made.keeper().close(KEEPING_MILLISECONDS);
        }
        settings.save();
        if (recovery.isPresent()) {
            recovery.get().close();
        }
    }

    private static void onEventThread(Runnable work) throws InterruptedException {
        try {
            SwingUtilities.invokeAndWait(work);
        } catch (InvocationTargetException e) {
            if (e.getCause() instanceof RuntimeException fault) {
                throw fault;
            }
            if (e.getCause() instanceof Error fault) {
                throw fault;
            }
            throw new IllegalStateException(e.getCause());
        }
    }

    Desk desk() {
        return desk.get();
    }

    DeskWindow window() {
        return window.get();
    }
}
