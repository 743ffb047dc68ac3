package org.saddlebook.console.internal;

import org.osgi.framework.BundleContext;
import org.osgi.framework.Version;
import org.osgi.service.component.annotations.Activate;
import org.osgi.service.component.annotations.Component;
import org.saddlebook.console.api.ExitCode;
import org.saddlebook.console.api.Invocation;
import org.saddlebook.console.api.Verb;

/** Prints the version. */
@Component(property = Verb.NAME_PROPERTY + "=version")
public final class VersionVerb implements Verb {
    private final BundleContext context;

    /** The product's version is that of this bundle: all are released together. */
    @Activate
    public VersionVerb(BundleContext context) {
        this.context = context;
    }

    @Override
    public String name() {
        return "version";
    }

    @Override
    public String synopsis() {
        return "";
    }

    @Override
    public String summary() {
        return "prints the version of the product and of Java";
    }

    @Override
    public String help() {
        return "";
    }

    @Override
    public int run(Invocation invocation) {
        invocation.out().println("saddlebook " + text(context.getBundle().getVersion()));
        invocation
                .out()
                .println("Java " + System.getProperty("java.version") + " (" + System.getProperty("java.vendor") + "), "
                        + System.getProperty("os.name") + " " + System.getProperty("os.arch"));
        return ExitCode.DONE;
    }

    /** {@code 0.1.0}, without a qualifier. */
    static String text(Version version) {
        return version.getMajor() + "." + version.getMinor() + "." + version.getMicro();
    }
}
