package org.saddlebook.register.internal;

import java.time.Clock;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import org.osgi.service.component.annotations.Activate;
import org.osgi.service.component.annotations.Component;
import org.osgi.service.component.annotations.Reference;
import org.osgi.service.component.annotations.ReferencePolicyOption;
import org.saddlebook.register.api.Register;
import org.saddlebook.register.api.RegisterException;
import org.saddlebook.register.api.RegisterStoreFactory;
import org.saddlebook.register.api.Registers;

/** Opens registers in whichever installed store takes the location. */
@Component
public final class RegistersService implements Registers {
    private final List<RegisterStoreFactory> factories;

    /** With these stores. */
    @Activate
    public RegistersService(
            @Reference(policyOption = ReferencePolicyOption.GREEDY) List<RegisterStoreFactory> factories) {
        this.factories = new ArrayList<>(factories);
        this.factories.sort(Comparator.comparing(RegisterStoreFactory::id));
    }

    @Override
    public Register open(String location, RegisterStoreFactory.Opening opening, Clock clock) throws RegisterException {
        List<String> ids = new ArrayList<>();
        for (RegisterStoreFactory factory : factories) {
            if (factory.accepts(location)) {
                return new StoredRegister(factory.open(location, opening), clock);
            }
            ids.add(factory.id());
        }
        throw new RegisterException("No installed store takes the register \"" + location + "\"; installed: "
                + (ids.isEmpty() ? "none" : String.join(", ", ids))
                + ". Add the bundle that keeps registers there, for example register-sqlite for files.");
    }
}
