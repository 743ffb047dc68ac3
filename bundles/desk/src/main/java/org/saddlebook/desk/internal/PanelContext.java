package org.saddlebook.desk.internal;

import java.awt.Component;
import java.awt.Point;
import java.nio.file.Path;
import java.time.Clock;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.Consumer;
import java.util.function.DoubleConsumer;
import javax.swing.SwingUtilities;
import org.saddlebook.api.campaign.Campaign;
import org.saddlebook.api.reader.ReadingRule;
import org.saddlebook.api.service.Intake;
import org.saddlebook.desk.api.Change;
import org.saddlebook.desk.api.DeskContext;
import org.saddlebook.desk.api.DeskState;
import org.saddlebook.desk.api.DeskTask;
import org.saddlebook.desk.api.Ink;
import org.saddlebook.desk.api.TemperatureScale;
import org.saddlebook.desk.api.Work;

/**
 * What one panel sees of the desk. When the panel is closed it lets go of everything, so that a panel which somebody holds
 * on to holds neither the desk nor a campaign.
 */
final class PanelContext implements DeskContext {
    private static final DeskTask NOTHING = new DeskTask() {
        @Override
        public void cancel() {}

        @Override
        public boolean ended() {
            return true;
        }
    };

    private final String id;
    private final Ink ink;
    private final Clock clock;
    private final String user;
    private final Path dataFolder;
    private final List<Runnable> scaleListeners = new ArrayList<>();
    private final List<DoubleConsumer> hairlineListeners = new ArrayList<>();
    private final List<DeskTask> tasks = new ArrayList<>();
    private DeskState state;
    private Optional<Desk> desk;
    private Optional<OpenCampaign> campaign;

    PanelContext(String id, Desk desk, OpenCampaign campaign) {
        this.id = id;
        this.desk = Optional.of(desk);
        this.campaign = Optional.of(campaign);
        state = campaign.state();
        ink = desk.ink();
        clock = desk.clock();
        user = desk.user();
        dataFolder = desk.dataFolder();
    }

    void showing(DeskState shown) {
        state = shown;
    }

    void scaleChanged() {
        List.copyOf(scaleListeners).forEach(Runnable::run);
    }

    void hairlineMoved(double kelvin) {
        List.copyOf(hairlineListeners).forEach(listener -> listener.accept(kelvin));
    }

    boolean closed() {
        return desk.isEmpty();
    }

    void close() {
        desk = Optional.empty();
        campaign = Optional.empty();
        state = DeskState.of(Campaign.titled(""));
        scaleListeners.clear();
        hairlineListeners.clear();
        tasks.forEach(DeskTask::cancel);
        tasks.clear();
    }

    @Override
    public DeskState state() {
        return state;
    }

    @Override
    public void change(Change change) {
        campaign.ifPresent(open -> desk.orElseThrow().change(open, change));
    }

    @Override
    public void reread(ReadingRule rule, String what) {
        campaign.ifPresent(open -> desk.orElseThrow().reread(open, rule, what));
    }

    @Override
    public void open(Intake.Opened opened) {
        desk.ifPresent(d -> d.open(Reread.opened(opened, ReadingRule.AUTOMATIC), false));
    }

    @Override
    public void note(String sentence) {
        campaign.ifPresent(open -> desk.orElseThrow().note(open, sentence));
    }

    @Override
    public void ask(String question, String start, Consumer<String> answer) {
        desk.ifPresent(d -> d.ask(question, start, text -> {
            if (!closed()) {
                answer.accept(text);
            }
        }));
    }

    @Override
    public <T> DeskTask run(String what, Work<T> work, Consumer<T> done) {
        if (closed()) {
            return NOTHING;
        }
        tasks.removeIf(DeskTask::ended);
        DeskTask task = desk.orElseThrow()
                .background()
                .run(
                        what,
                        true,
                        work,
                        result -> {
                            if (!closed()) {
                                done.accept(result);
                            }
                        },
                        fault -> desk.ifPresent(d -> d.workFailed(what, fault)));
        tasks.add(task);
        return task;
    }

    @Override
    public void refresh() {
        desk.ifPresent(d -> d.refresh(id));
    }

    @Override
    public void unfold() {
        desk.ifPresent(d -> d.unfold(id));
    }

    @Override
    public TemperatureScale scale(Component component) {
        if (closed()) {
            return new TemperatureScale(273.15, 373.15, 0, 1);
        }
        Desk d = desk.orElseThrow();
        Optional<Component> strata = d.strata();
        if (strata.isPresent() && SwingUtilities.isDescendingFrom(component, strata.get())) {
            Point origin = SwingUtilities.convertPoint(component, 0, 0, strata.get());
            return d.rail().scale().shifted(origin.x);
        }
        return d.rail().scale();
    }

    @Override
    public void onScale(Runnable changed) {
        if (!closed()) {
            scaleListeners.add(changed);
        }
    }

    @Override
    public OptionalDouble hairline() {
        return desk.isPresent() ? desk.get().rail().hairline() : OptionalDouble.empty();
    }

    @Override
    public void moveHairline(double kelvin) {
        desk.ifPresent(d -> d.rail().move(kelvin));
    }

    @Override
    public void onHairline(DoubleConsumer moved) {
        if (!closed()) {
            hairlineListeners.add(moved);
        }
    }

    @Override
    public Ink ink() {
        return ink;
    }

    @Override
    public Clock clock() {
        return clock;
    }

    @Override
    public String user() {
        return user;
    }

    @Override
    public Path dataFolder() {
        return dataFolder;
    }

    @Override
    public Optional<String> setting(String name) {
        return desk.flatMap(d -> d.services().setting(name));
    }
}
