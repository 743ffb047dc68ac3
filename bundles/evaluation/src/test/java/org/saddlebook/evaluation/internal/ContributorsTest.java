package org.saddlebook.evaluation.internal;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.lang.reflect.Proxy;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.osgi.framework.Bundle;
import org.osgi.framework.ServiceReference;
import org.osgi.framework.Version;
import org.saddlebook.api.findings.Contributor;
import org.saddlebook.api.model.RateModel;

/** Who is named as having taken part. */
class ContributorsTest {
    @Test
    void namesTheOwnersOfTheServicesAnAnalysisHoldsButNoModelNobodyAskedFor() {
        Bundle source = bundle("lab.species", 2);
        Bundle model = bundle("lab.model", 3);
        Bundle analysis = bundle(
                "lab.analysis",
                4,
                service(source, "org.saddlebook.thermo.data.api.SpeciesSource"),
                service(model, RateModel.class.getName()));
        Contributors contributors = new Contributors(location -> "hash of " + location);
        contributors.addWithServices(analysis);
        assertEquals(
                List.of(
                        new Contributor("lab.analysis", "1.0.0", "hash of lab.analysis"),
                        new Contributor("lab.species", "1.0.0", "hash of lab.species")),
                contributors.list());
    }

    @Test
    void anAnalysisWithoutServicesIsNamedAlone() {
        Contributors contributors = new Contributors(location -> "");
        contributors.addWithServices(bundle("lab.analysis", 4));
        contributors.addWithServices(bundle("the framework", 0));
        assertEquals(List.of(new Contributor("lab.analysis", "1.0.0", "")), contributors.list());
    }

    private static Bundle bundle(String name, long id, ServiceReference<?>... used) {
        return (Bundle) Proxy.newProxyInstance(
                ContributorsTest.class.getClassLoader(),
                new Class<?>[] {Bundle.class},
                (self, method, given) -> switch (method.getName()) {
                    case "getBundleId" -> id;
                    case "getSymbolicName", "getLocation" -> name;
                    case "getVersion" -> new Version(1, 0, 0);
                    case "getServicesInUse" -> used.length == 0 ? null : used;
                    default -> null;
                });
    }

    private static ServiceReference<?> service(Bundle owner, String type) {
        return (ServiceReference<?>) Proxy.newProxyInstance(
                ContributorsTest.class.getClassLoader(),
                new Class<?>[] {ServiceReference.class},
                (self, method, given) -> switch (method.getName()) {
                    case "getBundle" -> owner;
                    case "getProperty" -> new String[] {type};
                    default -> null;
                });
    }
}
