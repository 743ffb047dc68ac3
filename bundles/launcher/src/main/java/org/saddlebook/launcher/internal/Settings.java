package org.saddlebook.launcher.internal;

import java.lang.module.ModuleDescriptor;
import java.nio.file.Path;
import java.util.HashMap;
import java.util.Map;

/** Settings of the framework and of its bundles. */
final class Settings {
    /** Packages of the class path that bundles see; they then exist once in the whole process. */
    private static final String SHARED = "com.fasterxml.jackson.core;"
            + "com.fasterxml.jackson.core.async;"
            + "com.fasterxml.jackson.core.base;"
            + "com.fasterxml.jackson.core.exc;"
            + "com.fasterxml.jackson.core.filter;"
            + "com.fasterxml.jackson.core.format;"
            + "com.fasterxml.jackson.core.io;"
            + "com.fasterxml.jackson.core.io.schubfach;"
            + "com.fasterxml.jackson.core.json;"
            + "com.fasterxml.jackson.core.json.async;"
            + "com.fasterxml.jackson.core.sym;"
            + "com.fasterxml.jackson.core.type;"
            + "com.fasterxml.jackson.core.util;version=2.21.8,"
            + "org.osgi.service.component;version=1.5.1,"
            + "org.osgi.service.component.propertytypes;version=1.5,"
            + "org.osgi.service.component.runtime;version=1.5,"
            + "org.osgi.service.component.runtime.dto;version=1.5,"
            + "org.osgi.util.promise;version=1.3.0,"
            + "org.osgi.util.function;version=1.2";

    /** Packages of the framework itself, as its own default states them. */
    private static final String FRAMEWORK = "org.osgi.framework;version=1.10,"
            + "org.osgi.framework.connect;version=1.0.0,"
            + "org.osgi.framework.dto;version=1.8,"
            + "org.osgi.framework.hooks.bundle;version=1.1,"
            + "org.osgi.framework.hooks.resolver;version=1.0,"
            + "org.osgi.framework.hooks.service;version=1.1,"
            + "org.osgi.framework.hooks.weaving;version=1.1,"
            + "org.osgi.framework.launch;version=1.2,"
            + "org.osgi.framework.namespace;version=1.2,"
            + "org.osgi.framework.startlevel;version=1.0,"
            + "org.osgi.framework.startlevel.dto;version=1.0,"
            + "org.osgi.framework.wiring;version=1.2,"
            + "org.osgi.framework.wiring.dto;version=1.3,"
            + "org.osgi.resource;version=1.0.1,"
            + "org.osgi.resource.dto;version=1.0.1,"
            + "org.osgi.service.packageadmin;version=1.2.1,"
            + "org.osgi.service.startlevel;version=1.1.1,"
            + "org.osgi.service.url;version=1.0.1,"
            + "org.osgi.service.resolver;version=1.1.1,"
            + "org.osgi.util.tracker;version=1.5.3,"
            + "org.osgi.dto;version=1.1.1,"
            + "org.osgi.service.condition;version=1.0";

    /** What the component runtime provides; it is part of the system bundle here, see {@link Launch}. */
    private static final String COMPONENTS = "osgi.extender;osgi.extender=\"osgi.component\";version:Version=\"1.5\","
            + "osgi.service;objectClass:List<String>="
            + "\"org.osgi.service.component.runtime.ServiceComponentRuntime\"";

    private Settings() {}

    /**
     * What the system bundle exports: the framework's packages and those of the Java platform proper, of whatever version
     * runs. The framework could work this out itself, but slowly, and together with every package of the tools.
     */
    static String systemPackages() {
        StringBuilder packages = new StringBuilder(16384).append(FRAMEWORK);
        for (Module module : ModuleLayer.boot().modules()) {
            String name = module.getName();
            if (name.startsWith("java.") || name.equals("jdk.unsupported") || name.equals("jdk.httpserver")) {
                for (ModuleDescriptor.Exports exported : module.getDescriptor().exports()) {
                    if (!exported.isQualified()) {
                        packages.append(',').append(exported.source());
                    }
                }
            }
        }
        return packages.toString();
    }

    /** The framework's configuration. */
    static Map<String, String> of(Path storage, Path home, Folders folders, Plan plan, Policy policy) {
        Map<String, String> settings = new HashMap<>();
        settings.put("org.osgi.framework.storage", storage.toString());
        settings.put("org.osgi.framework.system.packages", systemPackages());
        settings.put("org.osgi.framework.system.packages.extra", SHARED);
        settings.put("org.osgi.framework.system.capabilities.extra", COMPONENTS);
        settings.put("felix.resolver.parallelism", "1"); // two dozen bundles are resolved before threads have started
        settings.put("felix.cache.locking", "false"); // CacheSlot locks, and does so between processes of one user
        settings.put("felix.service.urlhandlers", "false"); // nobody needs them, and they cost start-up time
        settings.put("felix.log.level", "1");
        settings.put("ds.cache.metadata", "true"); // component descriptions are parsed at the first start only
        settings.put("ds.loglevel", "error");
        settings.put("saddlebook.home", home.toString());
        settings.put("saddlebook.data", folders.data().toString());
        settings.put("saddlebook.cache", folders.cache().toString());
        settings.put("saddlebook.config", folders.config().toString());
        settings.put("saddlebook.features", String.join(",", plan.features()));
        settings.put("saddlebook.features.off", String.join(",", plan.off()));
        if (!policy.register().isEmpty()) {
            settings.put("saddlebook.register", policy.register());
        }
        return settings;
    }
}
