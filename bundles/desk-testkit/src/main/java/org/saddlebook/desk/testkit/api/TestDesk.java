package org.saddlebook.desk.testkit.api;

import java.awt.Component;
import java.awt.Container;
import java.nio.file.Path;
import java.time.Clock;
import java.time.Instant;
import java.time.ZoneOffset;
import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Deque;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.Consumer;
import java.util.function.DoubleConsumer;
import org.saddlebook.api.reader.ReadingRule;
import org.saddlebook.api.service.Intake;
import org.saddlebook.api.service.Progress;
import org.saddlebook.desk.api.Change;
import org.saddlebook.desk.api.DeskContext;
import org.saddlebook.desk.api.DeskPanel;
import org.saddlebook.desk.api.DeskState;
import org.saddlebook.desk.api.DeskTask;
import org.saddlebook.desk.api.Ink;
import org.saddlebook.desk.api.TemperatureScale;
import org.saddlebook.desk.api.Work;

/** A desk without a window: work is done at once, changes are applied, everything said is kept for the test. */
public final class TestDesk implements DeskContext {
    private static final double LEFT = 170;
    private static final double RIGHT = 52;

    private final Path folder;
    private final boolean dark;
    private final Deque<String> answers = new ArrayDeque<>();
    private final List<String> questions = new ArrayList<>();
    private final List<Change> changes = new ArrayList<>();
    private final List<String> notes = new ArrayList<>();
    private final List<String> work = new ArrayList<>();
    private final List<ReadingRule> rules = new ArrayList<>();
    private final List<Intake.Opened> opened = new ArrayList<>();
    private final List<Exception> faults = new ArrayList<>();
    private final Map<String, String> settings = new HashMap<>();
    private DeskState state;
    private Optional<DeskPanel> panel = Optional.empty();
    private OptionalDouble hairline = OptionalDouble.empty();
    private double low = 273.15;
    private double high = 383.15;

    /**
     * A desk.
     *
     * @param folder the user's data folder
     * @param dark whether it is the dark desk
     */
    public TestDesk(DeskState state, Path folder, boolean dark) {
        this.state = state;
        this.folder = folder;
        this.dark = dark;
    }

    /** The panel that sees changes. */
    public void attach(DeskPanel attached) {
        panel = Optional.of(attached);
        attached.show(state);
    }

    /** Shows the panel another state. */
    public void show(DeskState shown) {
        state = shown;
        panel.ifPresent(p -> p.show(shown));
    }

    /** The ends of the rail, K. */
    public void rail(double lowKelvin, double highKelvin) {
        low = lowKelvin;
        high = highKelvin;
    }

    /** What is answered to the next question; without one the user turns away. */
    public void answer(String text) {
        answers.add(text);
    }

    /** A setting of the launcher. */
    public void set(String name, String value) {
        settings.put(name, value);
    }

    /** The questions asked, oldest first. */
    public List<String> questions() {
        return List.copyOf(questions);
    }

    /** The changes made, oldest first. */
    public List<Change> changes() {
        return List.copyOf(changes);
    }

    /** The lines added to the account. */
    public List<String> notes() {
        return List.copyOf(notes);
    }

    /** What was done in the background. */
    public List<String> works() {
        return List.copyOf(work);
    }

    /** The rules that the table was to be read by again. */
    public List<ReadingRule> rules() {
        return List.copyOf(rules);
    }

    /** The campaigns opened beside this one. */
    public List<Intake.Opened> opened() {
        return List.copyOf(opened);
    }

    /** What went wrong in the background. */
    public List<Exception> faults() {
        return List.copyOf(faults);
    }

    @Override
    public DeskState state() {
        return state;
    }

    @Override
    public void change(Change change) {
        changes.add(change);
        show(state.withCampaign(change.edit().apply(state.campaign())));
    }

    @Override
    public void reread(ReadingRule rule, String what) {
        rules.add(rule);
        notes.add(what);
    }

    @Override
    public void open(Intake.Opened campaign) {
        opened.add(campaign);
    }

    @Override
    public void note(String sentence) {
        notes.add(sentence);
    }

    @Override
    public void ask(String question, String start, Consumer<String> answer) {
        questions.add(question);
        String given = answers.poll();
        if (given != null) {
            answer.accept(given);
        }
    }

    @Override
    public <T> DeskTask run(String what, Work<T> job, Consumer<T> done) {
        work.add(what);
        try {
            done.accept(job.run(Progress.NONE));
        } catch (Exception e) { // whatever work throws is its result here
            faults.add(e);
        }
        return new DeskTask() {
            @Override
            public void cancel() {
                // It has ended.
            }

            @Override
            public boolean ended() {
                return true;
            }
        };
    }

    @Override
    public void refresh() {
        // Nothing is kept that could be old.
    }

    @Override
    public void unfold() {
        // Always open.
    }

    @Override
    public TemperatureScale scale(Component component) {
        int x = 0;
        int width = component.getWidth();
        Component here = component;
        for (Container holder = component.getParent(); holder != null; holder = holder.getParent()) {
            // A page that was laid out by itself is wider than the place around it, which has no size yet.
            x += holder.getWidth() > 0 ? here.getX() : 0;
            width = Math.max(width, holder.getWidth());
            here = holder;
        }
        return new TemperatureScale(low, high, LEFT, Math.max(400, width) - RIGHT).shifted(x);
    }

    @Override
    public void onScale(Runnable changed) {
        // It never changes.
    }

    @Override
    public OptionalDouble hairline() {
        return hairline;
    }

    @Override
    public void moveHairline(double kelvin) {
        hairline = OptionalDouble.of(kelvin);
    }

    @Override
    public void onHairline(DoubleConsumer moved) {
        // Moved by nobody but panels.
    }

    @Override
    public Ink ink() {
        return Ink.of(dark);
    }

    @Override
    public Clock clock() {
        return Clock.fixed(Instant.parse("2026-03-02T09:12:00Z"), ZoneOffset.UTC);
    }

    @Override
    public String user() {
        return "tester";
    }

    @Override
    public Path dataFolder() {
        return folder;
    }

    @Override
    public Optional<String> setting(String name) {
        return Optional.ofNullable(settings.get(name));
    }
}
