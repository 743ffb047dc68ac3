package org.saddlebook.desk.internal;

import org.saddlebook.desk.api.DeskContext;
import org.saddlebook.desk.api.DeskPanel;
import org.saddlebook.desk.api.DeskPanelProvider;

/** Makes the default panel of a section that no installed bundle has a panel for. */
final class DefaultPanelProvider implements DeskPanelProvider {
    private final String section;
    private final String title;
    private final Services services;

    DefaultPanelProvider(String section, String title, Services services) {
        this.section = section;
        this.title = title;
        this.services = services;
    }

    @Override
    public String id() {
        return section;
    }

    /** The sections of the product keep their place in the walk also when their panel is not installed. */
    @Override
    public int order() {
        return switch (section) {
            case "runs" -> RUNS;
            case "barrier" -> BARRIER;
            case "spontaneity" -> SPONTANEITY;
            case "window" -> WINDOW;
            default -> OTHERS;
        };
    }

    @Override
    public DeskPanel create(DeskContext context) {
        return new DefaultPanel(section, title, context, services);
    }
}
