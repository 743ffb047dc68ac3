package org.saddlebook.testkit.api;

import java.io.ByteArrayOutputStream;
import java.io.File;
import java.io.IOException;
import java.io.OutputStream;
import java.io.StringWriter;
import java.io.UncheckedIOException;
import java.net.URI;
import java.net.URISyntaxException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.LocalDateTime;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.TreeSet;
import java.util.jar.Attributes;
import java.util.jar.JarEntry;
import java.util.jar.JarOutputStream;
import java.util.jar.Manifest;
import javax.tools.FileObject;
import javax.tools.ForwardingJavaFileManager;
import javax.tools.JavaCompiler;
import javax.tools.JavaFileManager;
import javax.tools.JavaFileObject;
import javax.tools.SimpleJavaFileObject;
import javax.tools.StandardJavaFileManager;
import javax.tools.ToolProvider;
import org.saddlebook.api.model.RateModel;

/**
 * Turns one Java source file with a rate model into an installable bundle, without a build tool: compiles it against the
 * api alone and writes manifest and component description. For tests and trials; it needs a JDK. Packages are imported as
 * far as the source names them in {@code import org.saddlebook.api...} lines.
 */
public final class BundleBuilder {
    private static final String API = "org.saddlebook.api.";

    /** 2020-01-01 in local time: a jar must not depend on when it was made. */
    private static final LocalDateTime ENTRY_TIME = LocalDateTime.of(2020, 1, 1, 0, 0);

    private final String symbolicName;
    private final String version;
    private final List<Path> libraries;

    private BundleBuilder(String symbolicName, String version, List<Path> libraries) {
        this.symbolicName = symbolicName;
        this.version = version;
        this.libraries = List.copyOf(libraries);
    }

    /** A bundle with this symbolic name, version 1.0.0. */
    public static BundleBuilder named(String symbolicName) {
        return new BundleBuilder(symbolicName, "1.0.0", List.of());
    }

    /** The same with this version. */
    public BundleBuilder withVersion(String newVersion) {
        return new BundleBuilder(symbolicName, newVersion, libraries);
    }

    /** The same, compiled with one more jar or folder of classes beside the api; it is not imported. */
    public BundleBuilder withLibrary(Path library) {
        List<Path> more = new ArrayList<>(libraries);
        more.add(library);
        return new BundleBuilder(symbolicName, version, more);
    }

    /**
     * Compiles the source and writes the bundle.
     *
     * @param className fully qualified name of the rate model in the source
     * @param source the Java source
     * @param jar file to write; an existing one is replaced
     * @throws IllegalArgumentException when the source does not compile; the message holds the compiler's
     * @throws IOException when the jar cannot be written
     */
    public void write(String className, String source, Path jar) throws IOException {
        Map<String, byte[]> classes = compile(className, source);
        Manifest manifest = new Manifest();
        Attributes main = manifest.getMainAttributes();
        main.put(Attributes.Name.MANIFEST_VERSION, "1.0");
        main.putValue("Bundle-ManifestVersion", "2");
        main.putValue("Bundle-SymbolicName", symbolicName);
        main.putValue("Bundle-Name", symbolicName);
        main.putValue("Bundle-Version", version);
        String imports = imports(source);
        if (!imports.isEmpty()) {
            main.putValue("Import-Package", imports);
        }
        String component = "OSGI-INF/" + className + ".xml";
        main.putValue("Service-Component", component);
        main.putValue(
                "Provide-Capability", "osgi.service;objectClass:List<String>=\"" + RateModel.class.getName() + "\"");
        main.putValue(
                "Require-Capability",
                "osgi.extender;filter:=\"(&(osgi.extender=osgi.component)(version>=1.3.0)(!(version>=2.0.0)))\"");
        try (OutputStream out = Files.newOutputStream(jar);
                JarOutputStream zip = new JarOutputStream(out)) {
            ByteArrayOutputStream head = new ByteArrayOutputStream();
            manifest.write(head);
            entry(zip, "META-INF/MANIFEST.MF", head.toByteArray());
            entry(zip, component, component(className).getBytes(StandardCharsets.UTF_8));
            for (Map.Entry<String, byte[]> one : classes.entrySet()) {
                entry(zip, one.getKey().replace('.', '/') + ".class", one.getValue());
            }
        }
    }

    private static void entry(JarOutputStream zip, String name, byte[] bytes) throws IOException {
        JarEntry entry = new JarEntry(name);
        entry.setTimeLocal(ENTRY_TIME);
        zip.putNextEntry(entry);
        zip.write(bytes);
        zip.closeEntry();
    }

    private static String component(String className) {
        return "<?xml version=\"1.0\" encoding=\"UTF-8\"?>\n"
                + "<scr:component xmlns:scr=\"http://www.osgi.org/xmlns/scr/v1.3.0\" name=\"" + className + "\">\n"
                + "  <service>\n    <provide interface=\"" + RateModel.class.getName() + "\"/>\n  </service>\n"
                + "  <implementation class=\"" + className + "\"/>\n</scr:component>\n";
    }

    private static String imports(String source) {
        TreeSet<String> packages = new TreeSet<>();
        for (String line : source.lines().toList()) {
            String text = line.trim();
            if (text.startsWith("import " + API)) {
                String name = text.substring("import ".length()).replace(";", "");
                packages.add(name.substring(0, name.indexOf('.', API.length())) + ";version=\"[1.0,2)\"");
            }
        }
        return String.join(",", packages);
    }

    private String classPath() {
        StringBuilder path = new StringBuilder(location(RateModel.class).toString());
        for (Path library : libraries) {
            path.append(File.pathSeparatorChar).append(library);
        }
        return path.toString();
    }

    /** The jar or folder that a class was loaded from. */
    static Path location(Class<?> type) {
        try {
            return Path.of(
                    type.getProtectionDomain().getCodeSource().getLocation().toURI());
        } catch (URISyntaxException notAFile) {
            throw new IllegalStateException(type + " is not in a file that a compiler can read", notAFile);
        }
    }

    private Map<String, byte[]> compile(String className, String source) throws IOException {
        JavaCompiler compiler = ToolProvider.getSystemJavaCompiler();
        if (compiler == null) {
            throw new IllegalStateException("no Java compiler: run on a JDK, not on a runtime alone");
        }
        Map<String, ByteArrayOutputStream> outputs = new LinkedHashMap<>();
        StringWriter messages = new StringWriter();
        try (StandardJavaFileManager standard =
                        compiler.getStandardFileManager(null, Locale.ROOT, StandardCharsets.UTF_8);
                JavaFileManager memory = new MemoryFiles(standard, outputs)) {
            List<String> options = List.of("--release", "17", "-classpath", classPath(), "-proc:none", "-nowarn");
            boolean done = compiler.getTask(
                            messages, memory, null, options, null, List.of(new SourceText(className, source)))
                    .call();
            if (!done) {
                throw new IllegalArgumentException(className + " does not compile:\n" + messages);
            }
        }
        Map<String, byte[]> classes = new LinkedHashMap<>();
        List<String> names = new ArrayList<>(outputs.keySet());
        names.sort(null);
        for (String name : names) {
            classes.put(name, outputs.get(name).toByteArray());
        }
        return classes;
    }

    private static final class SourceText extends SimpleJavaFileObject {
        private final String text;

        SourceText(String className, String text) {
            super(URI.create("string:///" + className.replace('.', '/') + ".java"), Kind.SOURCE);
            this.text = text;
        }

        @Override
        public CharSequence getCharContent(boolean ignoreEncodingErrors) {
            return text;
        }
    }

    private static final class MemoryFiles extends ForwardingJavaFileManager<StandardJavaFileManager> {
        private final Map<String, ByteArrayOutputStream> outputs;

        MemoryFiles(StandardJavaFileManager standard, Map<String, ByteArrayOutputStream> outputs) {
            super(standard);
            this.outputs = outputs;
        }

        @Override
        public JavaFileObject getJavaFileForOutput(
                Location location, String className, JavaFileObject.Kind kind, FileObject sibling) {
            return new SimpleJavaFileObject(
                    URI.create("mem:///" + className.replace('.', '/') + kind.extension), kind) {
                @Override
                public OutputStream openOutputStream() {
                    ByteArrayOutputStream bytes = new ByteArrayOutputStream();
                    outputs.put(className, bytes);
                    return bytes;
                }
            };
        }
    }

    /** Reads a text that lies beside a class. */
    static String resource(Class<?> beside, String name) {
        try (var stream = beside.getResourceAsStream(name)) {
            if (stream == null) {
                throw new IllegalStateException("missing resource " + name);
            }
            return new String(stream.readAllBytes(), StandardCharsets.UTF_8);
        } catch (IOException unreadable) {
            throw new UncheckedIOException(unreadable);
        }
    }
}
