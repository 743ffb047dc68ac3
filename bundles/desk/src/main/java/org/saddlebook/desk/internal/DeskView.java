package org.saddlebook.desk.internal;

import java.awt.Component;
import java.util.List;
import java.util.Optional;
import java.util.function.Consumer;
import org.saddlebook.desk.api.DeskAction;
import org.saddlebook.desk.api.Reading;

/** What the desk tells its window. Event thread only. */
interface DeskView {
    /** Another campaign is in view, or the title, what is saved, what can be undone has changed. */
    void campaignsChanged();

    /** Strata came, went or failed. */
    void strataChanged();

    /** Sentences, gaps, the last step or which stratum is open have changed. */
    void strataTold();

    /** The account has new lines, or is another one. */
    void accountChanged();

    /** Background work started, got on or ended. */
    void workChanged();

    /** The hairline was read. */
    void readings(double kelvin, List<Reading> readings);

    /** Shows a message until it is put away; with things to do about it. */
    void notice(String title, String text, List<DeskAction> remedies);

    /** Asks for a line of text. */
    void ask(String question, String start, Consumer<String> answer);

    /** Asks for a file or folder. */
    void askPath(PathQuestion question);

    /** Colours have changed. */
    void inkChanged();

    /** What temperatures are placed in. */
    Optional<Component> strata();

    /** Goes away. */
    void leave();
}
