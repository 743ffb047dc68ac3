package org.saddlebook.desk.api;

import org.osgi.annotation.versioning.ConsumerType;

/**
 * Makes the panel of one stratum. Register an implementation as an OSGi service; the stratum appears at once and goes with
 * the service.
 *
 * <p>The desk makes a panel for the campaign in view, and may close it and make it again at any time (another campaign is
 * chosen, light changes to dark): a panel keeps nothing that matters.
 */
@ConsumerType
public interface DeskPanelProvider {
    /** Place of the panel that shows what was imported. */
    int MEASURED = 100;

    /** Place of the panel of single experiments. */
    int RUNS = 200;

    /** Place of the panel of rate laws. */
    int BARRIER = 300;

    /** Place of the panel of Gibbs energies. */
    int SPONTANEITY = 400;

    /** Place of the panel of the operating window. */
    int WINDOW = 500;

    /** Place of panels of sections that no provider claims. */
    int OTHERS = 800;

    /** Place of the register, at the end of the walk. */
    int REGISTER = 900;

    /**
     * Id of the section of findings that it shows, or a word of its own when it shows none ({@code measured}). A section
     * that some provider claims gets no default panel. Of two providers with one id the higher ranking service is used.
     */
    String id();

    /** Place in the walk from top to bottom: {@link #MEASURED} to {@link #REGISTER}; equal ones are ordered by id. */
    int order();

    /**
     * Makes a panel.
     *
     * @param context the desk as this panel sees it; useless once the panel is closed
     */
    DeskPanel create(DeskContext context);
}
