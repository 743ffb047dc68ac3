package org.saddlebook.desk.internal;

import java.awt.Component;
import java.awt.Container;
import java.awt.Toolkit;
import java.nio.file.Path;
import java.time.Clock;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.concurrent.Callable;
import java.util.concurrent.CopyOnWriteArrayList;
import java.util.concurrent.CountDownLatch;
import java.util.concurrent.TimeUnit;
import java.util.concurrent.atomic.AtomicReference;
import javax.swing.SwingUtilities;
import org.saddlebook.api.campaign.Campaign;
import org.saddlebook.api.findings.Findings;
import org.saddlebook.api.findings.Section;
import org.saddlebook.api.service.Evaluation;
import org.saddlebook.api.service.Progress;
import org.saddlebook.desk.api.DeskPanelProvider;
import org.saddlebook.desk.api.DeskState;
import org.saddlebook.desk.api.Ink;

/** The shell in a real window, around an evaluation that finds what a test wants and around the panels of a test. */
final class Shell implements AutoCloseable {
    private static final long PATIENCE_SECONDS = 30;

    private final List<Contribution> installed = new CopyOnWriteArrayList<>();
    private final EventWatch watch;
    private Map<String, Section> sections = Map.of();
    private Desk desk;
    private DeskWindow window;

    Shell(Path folder) throws Exception {
        this(folder, TimeUnit.SECONDS.toNanos(20));
    }

    Shell(Path folder, long watchNanoseconds) throws Exception {
        Containment containment = new Containment(() -> Optional.ofNullable(desk));
        watch = new EventWatch(watchNanoseconds, containment::fault, containment::stalled);
        Toolkit.getDefaultToolkit().getSystemEventQueue().push(watch);
        onEventThread(() -> {
            Look.use(Ink.of(false));
            desk = new Desk(
                    new FakeServices(),
                    DeskSettings.in(folder),
                    Clock.systemUTC(),
                    "ada",
                    folder,
                    Optional.empty(),
                    () -> List.copyOf(installed),
                    Ink.of(false));
            window = new DeskWindow(desk, () -> {});
            desk.open(DeskState.of(Campaign.titled("Made up")), false);
            window.setVisible(true);
            return true;
        });
    }

    private final class FakeServices implements Services {
        @Override
        public <S> Optional<S> find(Class<S> type) {
            return type == Evaluation.class ? Optional.of(type.cast(new FakeEvaluation())) : Optional.empty();
        }

        @Override
        public Optional<String> setting(String name) {
            return Optional.empty();
        }
    }

    private final class FakeEvaluation implements Evaluation {
        @Override
        public Campaign effective(Campaign campaign) {
            return campaign;
        }

        @Override
        public Findings evaluate(Campaign effective, Progress progress) {
            return new Findings(effective.title(), "none", List.of(), sections);
        }
    }

    Desk desk() {
        return desk;
    }

    DeskWindow window() {
        return window;
    }

    EventWatch watch() {
        return watch;
    }

    /** What the next evaluation finds. */
    void finds(Section section) throws Exception {
        sections = Map.of(section.id(), section);
        onEventThread(() -> {
            desk.capabilitiesChanged();
            return true;
        });
    }

    void install(DeskPanelProvider provider) throws Exception {
        installed.add(new Contribution(provider.id(), provider.order(), "made.up.bundle 1.0.0", provider));
        sync();
    }

    void uninstall(String id) throws Exception {
        installed.removeIf(contribution -> contribution.id().equals(id));
        sync();
    }

    private void sync() throws Exception {
        onEventThread(() -> {
            desk.shelf().sync();
            return true;
        });
    }

    <T> T onEventThread(Callable<T> work) throws Exception {
        AtomicReference<T> result = new AtomicReference<>();
        AtomicReference<Exception> fault = new AtomicReference<>();
        SwingUtilities.invokeAndWait(() -> {
            try {
                result.set(work.call());
            } catch (Exception e) {
                fault.set(e);
            }
        });
        if (fault.get() != null) {
            throw fault.get();
        }
        return result.get();
    }

    void awaitThat(String what, Callable<Boolean> condition) throws Exception {
        long end = System.nanoTime() + TimeUnit.SECONDS.toNanos(PATIENCE_SECONDS);
        CountDownLatch never = new CountDownLatch(1);
        while (!onEventThread(condition)) {
            if (System.nanoTime() > end || never.await(10, TimeUnit.MILLISECONDS)) {
                throw new AssertionError("waited in vain for " + what + "; on screen: " + onEventThread(this::texts));
            }
        }
    }

    void shows(String text) throws Exception {
        awaitThat("the text " + text, () -> texts().contains(text));
    }

    String texts() {
        StringBuilder text = new StringBuilder();
        collect(window.getRootPane(), text);
        return text.toString();
    }

    private static void collect(Component component, StringBuilder text) {
        if (component.isShowing()) {
            var accessible = component.getAccessibleContext();
            if (accessible != null && accessible.getAccessibleName() != null) {
                text.append(accessible.getAccessibleName()).append('\n');
            }
            if (component instanceof Container container) {
                for (Component child : container.getComponents()) {
                    collect(child, text);
                }
            }
        }
    }

    @Override
    public void close() {
        SwingUtilities.invokeLater(() -> {
            desk.shelf().clear();
            desk.background().close();
            window.dispose();
        });
        desk.keeper().close(1000);
        watch.close();
    }
}
