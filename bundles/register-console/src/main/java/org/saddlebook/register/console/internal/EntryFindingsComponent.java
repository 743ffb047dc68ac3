package org.saddlebook.register.console.internal;

import java.io.IOException;
import org.osgi.framework.BundleContext;
import org.osgi.service.component.annotations.Activate;
import org.osgi.service.component.annotations.Component;
import org.saddlebook.api.problem.InputException;
import org.saddlebook.console.api.EntryFindings;
import org.saddlebook.console.api.Invocation;
import org.saddlebook.console.api.Options;
import org.saddlebook.register.api.Entry;
import org.saddlebook.register.api.PartEntry;
import org.saddlebook.register.api.Register;
import org.saddlebook.register.api.RegisterException;
import org.saddlebook.register.api.RegisterStoreFactory.Opening;

/** Hands the findings of an entry to verbs of other bundles. */
@Component
public final class EntryFindingsComponent implements EntryFindings {
    private final Services services;

    /** Services are looked up when findings are asked for. */
    @Activate
    public EntryFindingsComponent(BundleContext context) {
        this(Services.of(context));
    }

    EntryFindingsComponent(Services services) {
        this.services = services;
    }

    @Override
    public byte[] findings(long entry, Invocation invocation, Options options) throws InputException, IOException {
        return part(entry, PartNames.FINDINGS, invocation, options);
    }

    @Override
    public byte[] campaign(long entry, Invocation invocation, Options options) throws InputException, IOException {
        return part(entry, PartNames.CAMPAIGN, invocation, options);
    }

    private byte[] part(long entry, String name, Invocation invocation, Options options)
            throws InputException, IOException {
        try (Register register = Locations.open(services, invocation, options, Opening.EXISTING)) {
            Entry found = register.show(entry);
            PartEntry part = register.part(found, name)
                    .orElseThrow(() -> new RegisterException("Entry " + entry + " has no part " + name + "."));
            return register.read(part);
        }
    }
}
