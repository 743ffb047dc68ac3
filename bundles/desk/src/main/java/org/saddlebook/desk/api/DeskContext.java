package org.saddlebook.desk.api;

import java.awt.Component;
import java.nio.file.Path;
import java.time.Clock;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.Consumer;
import java.util.function.DoubleConsumer;
import org.osgi.annotation.versioning.ProviderType;
import org.saddlebook.api.reader.ReadingRule;
import org.saddlebook.api.service.Intake;

/**
 * The desk as one panel sees it. Each panel has its own; what was registered through it is released when the panel is
 * closed, and calls after that do nothing. Every method is called on the event thread.
 */
@ProviderType
public interface DeskContext {
    /** The state last shown. */
    DeskState state();

    /** Changes the campaign; the new state arrives by {@link DeskPanel#show}, soon without and later with new findings. */
    void change(Change change);

    /**
     * Reads the campaign's table again by another rule, as a change that can be undone. Exclusions, choices and settings
     * stay where they still apply; what is wrong appears as problems of the state.
     *
     * @param rule the new rule; options are the reader's, for example {@code unit.T}
     * @param what what was decided, for example {@code temperature read as °C}
     */
    void reread(ReadingRule rule, String what);

    /** Opens another campaign beside this one, for example out of a register. */
    void open(Intake.Opened opened);

    /** Adds a line to the running account. */
    void note(String sentence);

    /**
     * Asks for a line of text in the panel's own place, for example the reason of an exclusion.
     *
     * @param question the question, a sentence
     * @param start text to start with
     * @param answer receives the answer, which is not blank; not called when the user turns away
     */
    void ask(String question, String start, Consumer<String> answer);

    /**
     * Works in the background; progress and cancel are shown by the desk. What goes wrong is shown in the panel's place.
     *
     * @param what what is done, a short phrase, for example {@code recomputing entry 12}
     * @param work the work, off the event thread
     * @param done receives the result on the event thread; not called when the panel was closed meanwhile
     */
    <T> DeskTask run(String what, Work<T> work, Consumer<T> done);

    /** Asks the panel again for its sentence, account, gaps and last step, after it changed by itself. */
    void refresh();

    /** Opens the panel's stratum. */
    void unfold();

    /** Where temperatures lie, in the coordinates of a component that is on screen; ask again after {@link #onScale}. */
    TemperatureScale scale(Component component);

    /** Calls this when the temperature scale has changed (range or width), until the panel is closed. */
    void onScale(Runnable changed);

    /** The hairline, K; empty while it is hidden. */
    OptionalDouble hairline();

    /** Moves the hairline; kept within the scale. */
    void moveHairline(double kelvin);

    /** Calls this with K when the hairline has moved, until the panel is closed. The line itself is drawn by the desk. */
    void onHairline(DoubleConsumer moved);

    /** Colours and letters. The panel is made again when they change. */
    Ink ink();

    /** The clock. */
    Clock clock();

    /** Who is at the desk. */
    String user();

    /** The user's data folder. */
    Path dataFolder();

    /** A setting of the launcher or, where it has none, of the environment. */
    Optional<String> setting(String name);
}
