package org.saddlebook.desk.internal;

import java.util.List;
import java.util.Optional;
import java.util.function.Function;
import java.util.function.Supplier;
import javax.swing.JComponent;
import org.saddlebook.desk.api.DeskAction;
import org.saddlebook.desk.api.DeskPanel;
import org.saddlebook.desk.api.DeskState;
import org.saddlebook.desk.api.Reading;

/** One panel behind a guard: whatever it throws costs only its own stratum. Event thread only, but for {@link #read}. */
final class PanelHost {
    private final Contribution contribution;
    private final PanelContext context;
    private final Runnable failed;
    private Optional<DeskPanel> panel = Optional.empty();
    private Optional<String> failure = Optional.empty();
    private Optional<JComponent> body = Optional.empty();
    private Optional<JComponent> strip = Optional.empty();
    private String title;
    private String sentence = "";
    private volatile DeskPanel reader;

    /**
     * A host; the panel is made by {@link #start}.
     *
     * @param failed called when the panel has failed
     */
    PanelHost(Contribution contribution, PanelContext context, Runnable failed) {
        this.contribution = contribution;
        this.context = context;
        this.failed = failed;
        title = contribution.id();
    }

    /** A host for a panel that is not even made. */
    static PanelHost setAside(Contribution contribution, PanelContext context, String reason) {
        PanelHost host = new PanelHost(contribution, context, () -> {});
        host.failure = Optional.of(reason);
        return host;
    }

    Contribution contribution() {
        return contribution;
    }

    PanelContext context() {
        return context;
    }

    /** Makes the panel and shows the state. */
    void start(DeskState state) {
        Optional<DeskPanel> made =
                guard("being made", () -> contribution.provider().create(context), null);
        if (made.isEmpty()) {
            return;
        }
        panel = made;
        reader = made.get();
        title = call("giving its title", DeskPanel::title, title);
        show(state);
        strip = guard("making its strip", made.get()::strip, null);
    }

    void show(DeskState state) {
        context.showing(state);
        panel.ifPresent(p -> guard(
                "showing the campaign",
                () -> {
                    p.show(state);
                    return true;
                },
                false));
        refresh();
    }

    /** Asks for what may have changed. */
    void refresh() {
        sentence = call("giving its sentence", DeskPanel::sentence, "");
    }

    String title() {
        return title;
    }

    String sentence() {
        return failure.orElse(sentence);
    }

    Optional<String> failure() {
        return failure;
    }

    Optional<JComponent> strip() {
        return failure.isPresent() ? Optional.empty() : strip;
    }

    /** The body, made when first asked for. */
    Optional<JComponent> body() {
        if (body.isEmpty() && panel.isPresent()) {
            body = guard("making its body", panel.get()::body, null);
        }
        return failure.isPresent() ? Optional.empty() : body;
    }

    List<String> account() {
        return call("giving its account", DeskPanel::account, List.of());
    }

    List<DeskAction> gaps() {
        return call("naming gaps", DeskPanel::gaps, List.of());
    }

    List<DeskAction> actions() {
        return call("naming actions", DeskPanel::actions, List.of());
    }

    Optional<DeskAction> lastStep() {
        return call("naming the last step", DeskPanel::lastStep, Optional.empty());
    }

    /** Readings at the hairline; off the event thread, where a fault costs only the readings. */
    List<Reading> read(DeskState state, double kelvin) {
        DeskPanel asked = reader;
        if (asked == null) {
            return List.of();
        }
        try {
            return List.copyOf(asked.read(state, kelvin));
        } catch (RuntimeException | LinkageError | StackOverflowError | AssertionError e) {
            return List.of(new Reading(title, "no reading: " + describe(e)));
        }
    }

    private <T> T call(String what, Function<DeskPanel, T> question, T otherwise) {
        return panel.flatMap(p -> guard(what, () -> question.apply(p), otherwise))
                .orElse(otherwise);
    }

    private <T> Optional<T> guard(String what, Supplier<T> work, T otherwise) {
        if (failure.isPresent()) {
            return Optional.ofNullable(otherwise);
        }
        try {
            T result = work.get();
            if (result == null) {
                throw new IllegalStateException("nothing came back");
            }
            return Optional.of(result);
        } catch (RuntimeException | LinkageError | StackOverflowError | AssertionError e) {
            fail(what, e);
            return Optional.ofNullable(otherwise);
        }
    }

    /** The panel has failed: it is asked nothing more, and its place says why. */
    void fail(String what, Throwable fault) {
        if (failure.isEmpty()) {
            Faults.log(fault); // goes to the fault log
            stop("The panel " + contribution.id() + " of " + contribution.bundle() + " failed while " + what + ": "
                    + describe(fault) + ".");
        }
    }

    /** The panel is stopped for this reason. */
    void stop(String reason) {
        failure = Optional.of(reason);
        close();
        failed.run();
    }

    private static String describe(Throwable fault) {
        String message = fault.getMessage();
        String type = fault.getClass().getSimpleName();
        return message == null || message.isBlank() ? type : type + ", " + message;
    }

    /** Lets go of the panel. */
    void close() {
        Optional<DeskPanel> last = panel;
        panel = Optional.empty();
        reader = null;
        body = Optional.empty();
        strip = Optional.empty();
        context.close();
        if (last.isPresent()) {
            try {
                last.get().close();
            } catch (RuntimeException | LinkageError | StackOverflowError | AssertionError e) {
                Faults.log(e); // goes to the fault log; nobody needs the panel any more
            }
        }
    }
}
