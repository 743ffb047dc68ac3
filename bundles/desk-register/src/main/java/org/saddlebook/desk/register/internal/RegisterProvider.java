package org.saddlebook.desk.register.internal;

import org.osgi.service.component.annotations.Activate;
import org.osgi.service.component.annotations.Component;
import org.osgi.service.component.annotations.Reference;
import org.saddlebook.api.service.CampaignFormat;
import org.saddlebook.desk.api.DeskContext;
import org.saddlebook.desk.api.DeskPanel;
import org.saddlebook.desk.api.DeskPanelProvider;
import org.saddlebook.desk.components.api.DeskComponents;
import org.saddlebook.register.api.Registers;
import org.saddlebook.register.console.api.EntryWork;

/** The stratum of the register. */
@Component
public final class RegisterProvider implements DeskPanelProvider {
    private final DeskComponents components;
    private final RegisterAccess access;

    /** Opens the register through these services, each time anew. */
    @Activate
    public RegisterProvider(
            @Reference DeskComponents components,
            @Reference Registers registers,
            @Reference EntryWork work,
            @Reference CampaignFormat format) {
        this.components = components;
        this.access = new RegisterAccess(registers, work, format);
    }

    @Override
    public String id() {
        return "register";
    }

    @Override
    public int order() {
        return REGISTER;
    }

    @Override
    public DeskPanel create(DeskContext context) {
        return new RegisterPanel(context, components, access);
    }
}
