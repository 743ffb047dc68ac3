package org.saddlebook.desk.internal;

import java.time.Instant;
import java.util.ArrayDeque;
import java.util.Deque;
import java.util.List;
import java.util.Optional;
import org.saddlebook.api.campaign.Campaign;
import org.saddlebook.api.campaign.HistoryEntry;
import org.saddlebook.desk.api.Change;
import org.saddlebook.desk.api.DeskState;
import org.saddlebook.desk.api.DeskTask;

/** A campaign that is open: its state, what can be undone, its account. Event thread only. */
final class OpenCampaign {
    private static final int MOST_STEPS = 200;

    /** Something that was done. */
    private record Step(String what, DeskState before, DeskState after) {}

    private final String key;
    private final AccountLog account = new AccountLog();
    private final Deque<Step> done = new ArrayDeque<>();
    private final Deque<Step> undone = new ArrayDeque<>();
    private DeskState state;
    private boolean unsaved;
    private boolean demo;
    private long edition;
    private Optional<DeskTask> evaluating = Optional.empty();

    /**
     * A campaign that was opened.
     *
     * @param key names it in the folder for recovery
     */
    OpenCampaign(String key, DeskState state) {
        this.key = key;
        this.state = state;
        account.decisions(state.campaign());
    }

    String key() {
        return key;
    }

    DeskState state() {
        return state;
    }

    AccountLog account() {
        return account;
    }

    /** Counts the changes of content: an evaluation of an older edition is worthless. */
    long edition() {
        return edition;
    }

    boolean unsaved() {
        return unsaved;
    }

    boolean demo() {
        return demo;
    }

    void markDemo() {
        demo = true;
    }

    void markUnsaved() {
        unsaved = true;
    }

    /** Takes a state that says more about the same content: findings, problems. */
    void learn(DeskState more) {
        state = more;
    }

    /** It was saved. */
    void saved(DeskState kept) {
        state = kept;
        unsaved = false;
    }

    /** Whether a change makes any difference; then it is done and kept for undo. */
    boolean apply(Change change, String who, Instant when) {
        Campaign before = state.campaign();
        Campaign after = change.edit().apply(before);
        if (after.equals(before)) {
            return false;
        }
        DeskState next = state.withCampaign(after);
        // What is wrong with a file stays wrong, whatever else changes.
        step(
                change.what(),
                PanelShelf.unread(state) ? next.withProblems(state.problems()) : next,
                entry(change, who, when));
        return true;
    }

    /** Does something that changes more than the campaign, such as reading the table anew. */
    void step(String what, DeskState after, HistoryEntry entry) {
        DeskState before = state;
        set(continued(after, before.campaign().history(), entry));
        done.push(new Step(what, before, state));
        if (done.size() > MOST_STEPS) {
            done.removeLast();
        }
        undone.clear();
    }

    /** What undo would take back; empty for nothing. */
    Optional<String> undoable() {
        return Optional.ofNullable(done.peek()).map(Step::what);
    }

    /** What redo would do again; empty for nothing. */
    Optional<String> redoable() {
        return Optional.ofNullable(undone.peek()).map(Step::what);
    }

    /** Takes the last step back; the history says so and keeps both lines. */
    void undo(String who, Instant when) {
        move(done, undone, true, who, when);
    }

    /** Does the last step that was taken back again. */
    void redo(String who, Instant when) {
        move(undone, done, false, who, when);
    }

    private void move(Deque<Step> from, Deque<Step> to, boolean back, String who, Instant when) {
        Step step = from.pop();
        DeskState target = back ? step.before() : step.after();
        String what = (back ? "undone: " : "done again: ") + step.what();
        set(continued(target, state.campaign().history(), new HistoryEntry(who, when, what, "", "", "")));
        to.push(step);
    }

    /** The state with the whole history so far and one more line: history is never shortened. */
    private static DeskState continued(DeskState target, List<HistoryEntry> history, HistoryEntry entry) {
        Campaign campaign = target.campaign();
        int known = campaign.history().size();
        for (HistoryEntry line : history.subList(Math.min(known, history.size()), history.size())) {
            campaign = campaign.withHistory(line);
        }
        DeskState next = target.withCampaign(campaign.withHistory(entry));
        return target.problems().isEmpty() ? next : next.withProblems(target.problems());
    }

    private void set(DeskState next) {
        state = next;
        unsaved = true;
        edition++;
        account.decisions(state.campaign());
    }

    private static HistoryEntry entry(Change change, String who, Instant when) {
        return new HistoryEntry(who, when, change.what(), change.oldValue(), change.newValue(), change.reason());
    }

    /** Remembers the evaluation under way, after stopping the one before. */
    void evaluating(DeskTask task) {
        stopEvaluating();
        evaluating = Optional.of(task);
    }

    void stopEvaluating() {
        evaluating.ifPresent(DeskTask::cancel);
        evaluating = Optional.empty();
    }
}
