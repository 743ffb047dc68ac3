package org.saddlebook.desk.window.internal;

import org.osgi.service.component.annotations.Activate;
import org.osgi.service.component.annotations.Component;
import org.osgi.service.component.annotations.Reference;
import org.saddlebook.desk.api.DeskContext;
import org.saddlebook.desk.api.DeskPanel;
import org.saddlebook.desk.api.DeskPanelProvider;
import org.saddlebook.desk.components.api.DeskComponents;

/** The stratum of the operating window. */
@Component
public final class WindowProvider implements DeskPanelProvider {
    private final DeskComponents components;

    /** Makes its figures and tables from these components. */
    @Activate
    public WindowProvider(@Reference DeskComponents components) {
        this.components = components;
    }

    @Override
    public String id() {
        return "window";
    }

    @Override
    public int order() {
        return WINDOW;
    }

    @Override
    public DeskPanel create(DeskContext context) {
        return new WindowPanel(context, components);
    }
}
