package org.saddlebook.console.internal;

import java.io.IOException;
import java.io.PrintStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import org.osgi.framework.Bundle;
import org.osgi.framework.BundleContext;
import org.saddlebook.console.api.ExitCode;

/** {@code bundles check}: the product's files against the hashes of its build, and whether every bundle resolves. */
final class BundleCheck {
    private final Services services;
    private final InstalledBundles installed;

    BundleCheck(BundleContext context, InstalledBundles installed) {
        this.services = new Services(context);
        this.installed = installed;
    }

    int print(PrintStream out, PrintStream err) throws IOException {
        List<String> changed = changed();
        for (String sentence : changed) {
            err.println("saddlebook: " + sentence);
        }
        List<String> troubles = new ArrayList<>(installed.troubles().values());
        for (Bundle bundle : installed.all()) {
            if (bundle.getState() == Bundle.INSTALLED
                    && !installed.troubles().containsKey(String.valueOf(bundle.getSymbolicName()))) {
                troubles.add("the bundle " + bundle.getSymbolicName() + " lacks something it needs.");
            }
        }
        for (String sentence : troubles) {
            err.println("saddlebook: " + sentence);
        }
        int bundles = installed.all().size();
        if (changed.isEmpty() && troubles.isEmpty()) {
            out.println(bundles + " bundles, all as they were built and all resolved.");
            return ExitCode.DONE;
        }
        out.println(bundles + " bundles; " + changed.size() + " files differ from the build, " + troubles.size()
                + " bundles or features have a problem.");
        return changed.isEmpty() ? ExitCode.REFUSED : ExitCode.DIFFERENCE;
    }

    /** Sentences on files of the product whose bytes are not those of the build. */
    List<String> changed() throws IOException {
        List<String> sentences = new ArrayList<>();
        String home = services.setting("saddlebook.home", "");
        Path sums = Path.of(home).resolve("SHA256SUMS");
        if (home.isEmpty() || !Files.exists(sums)) {
            sentences.add("the product has no file SHA256SUMS; its files cannot be compared with the build.");
            return sentences;
        }
        Map<String, String> expected = new TreeMap<>();
        for (String line : Files.readAllLines(sums, StandardCharsets.UTF_8)) {
            int gap = line.indexOf("  ");
            if (gap == 64) {
                expected.put(line.substring(gap + 2), line.substring(0, gap));
            }
        }
        for (Map.Entry<String, String> entry : expected.entrySet()) {
            Path file = Path.of(home).resolve(entry.getKey());
            // A laboratory may leave features out: a missing file is no change.
            if (Files.exists(file) && !BundleFile.sha256(file).equals(entry.getValue())) {
                sentences.add(entry.getKey() + " differs from the build; install the product again.");
            }
        }
        for (Bundle bundle : installed.all()) {
            if (installed.ofProduct(bundle)) {
                String name = "bundles/"
                        + BundleFile.pathOf(bundle)
                                .map(path -> path.getFileName().toString())
                                .orElse("");
                if (!expected.containsKey(name)) {
                    sentences.add(name + " is not a file of the build.");
                }
            }
        }
        return sentences;
    }
}
