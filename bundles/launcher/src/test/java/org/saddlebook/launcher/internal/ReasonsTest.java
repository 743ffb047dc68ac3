package org.saddlebook.launcher.internal;

import static org.junit.jupiter.api.Assertions.assertEquals;

import org.junit.jupiter.api.Test;
import org.osgi.framework.BundleException;

class ReasonsTest {
    @Test
    void aMissingPackageIsNamedAtItsRoot() {
        // As Apache Felix 7.0.5 words it: the bundle asked for waits for another one, which lacks a package.
        String message = "Unable to resolve a [8](R 8.0): missing requirement [a [8](R 8.0)] osgi.wiring.package;"
                + " (&(osgi.wiring.package=b.api)(version>=1.0.0)(!(version>=2.0.0))) [caused by: Unable to resolve b"
                + " [3](R 3.0): missing requirement [b [3](R 3.0)] osgi.wiring.package;"
                + " (osgi.wiring.package=nowhere.to.be.found)]";
        assertEquals(
                "it needs the package nowhere.to.be.found, which no installed bundle provides in a fitting version",
                Reasons.of(new BundleException(message)));
    }

    @Test
    void theRootOfAnExceptionIsNamed() {
        assertEquals(
                "the cause (IllegalStateException)",
                Reasons.of(new BundleException("Activator start error", new IllegalStateException("the cause\nmore"))));
        assertEquals("StackOverflowError", Reasons.of(new StackOverflowError()));
    }
}
