package org.saddlebook.desk.measured.internal;

import org.osgi.service.component.annotations.Activate;
import org.osgi.service.component.annotations.Component;
import org.osgi.service.component.annotations.Reference;
import org.saddlebook.desk.api.DeskContext;
import org.saddlebook.desk.api.DeskPanel;
import org.saddlebook.desk.api.DeskPanelProvider;
import org.saddlebook.desk.components.api.DeskComponents;

/** The stratum of what was measured. */
@Component
public final class MeasuredProvider implements DeskPanelProvider {
    private final DeskComponents components;

    /** Makes its tables from these components. */
    @Activate
    public MeasuredProvider(@Reference DeskComponents components) {
        this.components = components;
    }

    @Override
    public String id() {
        return "measured";
    }

    @Override
    public int order() {
        return MEASURED;
    }

    @Override
    public DeskPanel create(DeskContext context) {
        return new MeasuredPanel(context, components);
    }
}
