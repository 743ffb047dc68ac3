package org.saddlebook.desk.internal;

import java.awt.Component;
import java.nio.file.Path;
import java.time.Clock;
import java.time.Instant;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.UUID;
import java.util.function.Consumer;
import java.util.function.Supplier;
import org.saddlebook.api.campaign.Campaign;
import org.saddlebook.api.campaign.HistoryEntry;
import org.saddlebook.api.findings.Findings;
import org.saddlebook.api.problem.InputException;
import org.saddlebook.api.reader.ReadingRule;
import org.saddlebook.api.service.Evaluation;
import org.saddlebook.api.service.Intake;
import org.saddlebook.desk.api.Change;
import org.saddlebook.desk.api.DeskState;
import org.saddlebook.desk.api.Ink;
import org.saddlebook.desk.api.Reading;
import org.saddlebook.presentation.api.ProblemText;

/** The desk without its window: which campaigns are open, what happens to them, who is told. Event thread only. */
final class Desk {
    private final Services services;
    private final DeskSettings settings;
    private final Clock clock;
    private final String user;
    private final Path dataFolder;
    private final RailModel rail = new RailModel();
    private final List<OpenCampaign> campaigns = new ArrayList<>();
    private final Background background;
    private final Keeper keeper;
    private final PanelShelf shelf;
    private final DeskFiles files;
    private final HairlineReader hairlineReader;
    private Optional<OpenCampaign> current = Optional.empty();
    private DeskView view;
    private Ink ink;

    /**
     * A desk; tell it its window before anything else.
     *
     * @param recovery where unsaved work is kept; empty when that is not possible
     */
    Desk(
            Services services,
            DeskSettings settings,
            Clock clock,
            String user,
            Path dataFolder,
            Optional<Recovery> recovery,
            Supplier<List<Contribution>> installed,
            Ink ink) {
        this.services = services;
        this.settings = settings;
        this.clock = clock;
        this.user = user;
        this.dataFolder = dataFolder;
        this.ink = ink;
        background = new Background(() -> view().workChanged());
        keeper = new Keeper(recovery, services, this::keepFailed);
        shelf = new PanelShelf(this, installed);
        files = new DeskFiles(this);
        hairlineReader = new HairlineReader(this);
        rail.onHairline(hairlineReader::moved);
    }

    void view(DeskView window) {
        view = window;
    }

    DeskView view() {
        return view;
    }

    Services services() {
        return services;
    }

    DeskSettings settings() {
        return settings;
    }

    Clock clock() {
        return clock;
    }

    String user() {
        return user;
    }

    Path dataFolder() {
        return dataFolder;
    }

    RailModel rail() {
        return rail;
    }

    Background background() {
        return background;
    }

    Keeper keeper() {
        return keeper;
    }

    PanelShelf shelf() {
        return shelf;
    }

    DeskFiles files() {
        return files;
    }

    Ink ink() {
        return ink;
    }

    Optional<Component> strata() {
        return view.strata();
    }

    /** Time for people: whole seconds. */
    Instant now() {
        return Instant.ofEpochSecond(clock.instant().getEpochSecond());
    }

    List<OpenCampaign> campaigns() {
        return List.copyOf(campaigns);
    }

    Optional<OpenCampaign> current() {
        return current;
    }

    /** Opens a campaign and brings it into view. */
    OpenCampaign open(DeskState state, boolean unsaved) {
        return open(UUID.randomUUID().toString(), state, unsaved);
    }

    OpenCampaign open(String key, DeskState state, boolean unsaved) {
        OpenCampaign campaign = new OpenCampaign(key, state);
        if (unsaved) {
            campaign.markUnsaved();
            keeper.keep(campaign);
        }
        campaigns.add(campaign);
        show(campaign);
        return campaign;
    }

    /** Brings a campaign into view; it is evaluated when it was not yet. */
    void show(OpenCampaign campaign) {
        current = Optional.of(campaign);
        rail.fit(campaign.state());
        shelf.show(campaign);
        if (!campaign.state().current()) {
            evaluate(campaign);
        }
        view.campaignsChanged();
        view.accountChanged();
        hairlineReader.moved();
    }

    /** Closes a campaign for good. */
    void close(OpenCampaign campaign) {
        int at = campaigns.indexOf(campaign);
        campaign.stopEvaluating();
        campaigns.remove(campaign);
        keeper.drop(campaign.key());
        if (current.isPresent() && current.get() == campaign) {
            if (campaigns.isEmpty()) {
                openEmpty();
            } else {
                show(campaigns.get(Math.max(0, at - 1)));
            }
        }
        view.campaignsChanged();
    }

    /** A desk without a campaign shows an empty one, whose strata say how to fill them. */
    void openEmpty() {
        open(DeskState.of(Campaign.titled("No campaign yet")), false);
    }

    /** Whether a campaign holds nothing at all. */
    static boolean isEmpty(OpenCampaign campaign) {
        Campaign c = campaign.state().campaign();
        return c.sources().isEmpty()
                && c.rateTable().isEmpty()
                && c.settings().isEmpty()
                && c.history().isEmpty();
    }

    /** The empty campaign has served when a real one is there. */
    void dropEmpty() {
        for (OpenCampaign campaign : List.copyOf(campaigns)) {
            if (campaigns.size() > 1 && isEmpty(campaign)) {
                campaigns.remove(campaign);
            }
        }
    }

    void change(OpenCampaign campaign, Change change) {
        if (campaign.apply(change, user, now())) {
            changed(campaign);
        }
    }

    void undo() {
        current.filter(c -> c.undoable().isPresent()).ifPresent(campaign -> {
            campaign.undo(user, now());
            changed(campaign);
        });
    }

    void redo() {
        current.filter(c -> c.redoable().isPresent()).ifPresent(campaign -> {
            campaign.redo(user, now());
            changed(campaign);
        });
    }

    private void changed(OpenCampaign campaign) {
        keeper.keep(campaign);
        evaluate(campaign);
        told(campaign);
    }

    /** Reads the table anew; what cannot be read leaves a campaign that has a table as it is, and says why. */
    void reread(OpenCampaign campaign, ReadingRule rule, String what) {
        DeskState before = campaign.state();
        background.run(
                "reading the table again",
                true,
                progress -> Reread.again(services.need(Intake.class, "base"), before, rule, user, progress),
                after -> {
                    if (after.problems().isEmpty()) {
                        HistoryEntry entry = new HistoryEntry(user, now(), "table read again", "", what, "");
                        campaign.step(what, after, entry);
                        changed(campaign);
                    } else if (PanelShelf.unread(before)) {
                        campaign.learn(after);
                        keeper.keep(campaign);
                        told(campaign);
                    } else {
                        view.notice("The table stays as it was", ProblemText.of(after.problems()), List.of());
                    }
                },
                fault -> workFailed("reading the table again", fault));
    }

    private record Evaluated(Campaign effective, Findings findings) {}

    /** Evaluates in the background, after stopping an evaluation that has become worthless. */
    void evaluate(OpenCampaign campaign) {
        DeskState state = campaign.state();
        if (PanelShelf.unread(state)) {
            return;
        }
        long edition = campaign.edition();
        Campaign content = state.campaign();
        campaign.evaluating(background.run(
                "evaluating",
                true,
                progress -> {
                    Evaluation evaluation = services.need(Evaluation.class, "base");
                    Campaign effective = evaluation.effective(content);
                    return new Evaluated(effective, evaluation.evaluate(effective, progress));
                },
                result -> {
                    if (campaign.edition() == edition) {
                        campaign.learn(campaign.state().withFindings(result.effective(), result.findings()));
                        campaign.account().cautions(result.findings(), clock.instant());
                        told(campaign);
                    }
                },
                fault -> {
                    if (campaign.edition() != edition) {
                        return;
                    }
                    if (fault instanceof InputException wrong) {
                        campaign.learn(campaign.state().withProblems(wrong.problems()));
                        told(campaign);
                    }
                    workFailed("evaluating", fault);
                }));
    }

    /** Tells panels and window about a campaign's new state. */
    void told(OpenCampaign campaign) {
        if (current.isPresent() && current.get() == campaign) {
            rail.fit(campaign.state());
            shelf.tell(campaign);
            view.accountChanged();
            hairlineReader.moved();
        }
        view.campaignsChanged();
    }

    /** Models, analyses or readers came or went: what was found is no longer what would be found. */
    void capabilitiesChanged() {
        for (OpenCampaign campaign : campaigns) {
            campaign.learn(stale(campaign.state()));
        }
        current.ifPresent(this::evaluate);
        view.campaignsChanged();
    }

    private static DeskState stale(DeskState state) {
        return PanelShelf.unread(state) ? state : state.withCampaign(state.campaign());
    }

    void note(OpenCampaign campaign, String sentence) {
        campaign.account().note(sentence, clock.instant());
        view.accountChanged();
    }

    void ask(String question, String start, Consumer<String> answer) {
        view.ask(question, start, answer);
    }

    void workFailed(String what, Throwable fault) {
        if (fault instanceof InputException wrong) {
            view.notice("Not done: " + what, ProblemText.of(wrong.problems()), List.of());
            return;
        }
        if (!(fault instanceof java.io.IOException)) {
            Faults.log(fault); // goes to the fault log
        }
        String message = fault.getMessage();
        view.notice(
                "Not done: " + what,
                message == null || message.isBlank() ? fault.getClass().getSimpleName() : message,
                List.of());
    }

    private void keepFailed(Throwable fault) {
        workFailed("keeping unsaved work for recovery", fault);
    }

    void refresh(String id) {
        shelf.refresh(id);
    }

    void unfold(String id) {
        shelf.openId(id);
        view.strataTold();
    }

    /** Takes other colours; panels are made again. */
    void ink(Ink chosen) {
        ink = chosen;
        view.inkChanged();
        current.ifPresent(shelf::show);
    }

    /** Has the hairline read anew: what lies under it may have changed. */
    void readHairline() {
        hairlineReader.moved();
    }

    void readings(double kelvin, List<Reading> readings) {
        view.readings(kelvin, readings);
    }

    /** Moves the hairline by so many kelvin. */
    void nudge(double kelvin) {
        OptionalDouble at = rail.hairline();
        if (at.isPresent()) {
            rail.move(at.getAsDouble() + kelvin);
        }
    }
}
