package org.saddlebook.desk.spontaneity.internal;

import org.osgi.service.component.annotations.Activate;
import org.osgi.service.component.annotations.Component;
import org.osgi.service.component.annotations.Reference;
import org.saddlebook.desk.api.DeskContext;
import org.saddlebook.desk.api.DeskPanel;
import org.saddlebook.desk.api.DeskPanelProvider;
import org.saddlebook.desk.components.api.DeskComponents;

/** The stratum of Gibbs energies. */
@Component
public final class SpontaneityProvider implements DeskPanelProvider {
    private final DeskComponents components;

    /** Makes its figures and tables from these components. */
    @Activate
    public SpontaneityProvider(@Reference DeskComponents components) {
        this.components = components;
    }

    @Override
    public String id() {
        return "spontaneity";
    }

    @Override
    public int order() {
        return SPONTANEITY;
    }

    @Override
    public DeskPanel create(DeskContext context) {
        return new SpontaneityPanel(context, components);
    }
}
