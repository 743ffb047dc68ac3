package org.saddlebook.testkit.api;

import java.io.IOException;
import java.net.URL;
import java.net.URLClassLoader;
import java.nio.file.Path;
import java.util.jar.JarFile;
import org.saddlebook.api.model.RateModel;

/** Loads the rate model of a bundle outside any framework, for contract tests of built jars. */
public final class BundleLoader {
    private BundleLoader() {}

    /**
     * A new instance of the rate model whose component the bundle declares. The class sees the api and the JDK.
     *
     * @param jar a bundle with one declared component; must stay where it is
     * @throws IOException when the jar cannot be read
     * @throws IllegalArgumentException when it declares no component that is a rate model
     */
    public static RateModel rateModel(Path jar) throws IOException {
        String component;
        try (JarFile file = new JarFile(jar.toFile())) {
            component = file.getManifest().getMainAttributes().getValue("Service-Component");
        }
        if (component == null || !component.endsWith(".xml")) {
            throw new IllegalArgumentException(jar.getFileName() + " declares no component");
        }
        String className = component.substring(component.lastIndexOf('/') + 1, component.length() - ".xml".length());
        // The loader stays open on purpose: the model may load further classes for as long as it is used.
        URLClassLoader loader = new URLClassLoader(new URL[] {jar.toUri().toURL()}, RateModel.class.getClassLoader());
        try {
            return (RateModel)
                    loader.loadClass(className).getDeclaredConstructor().newInstance();
        } catch (ReflectiveOperationException | ClassCastException unfit) {
            throw new IllegalArgumentException(jar.getFileName() + " holds no rate model " + className, unfit);
        }
    }
}
