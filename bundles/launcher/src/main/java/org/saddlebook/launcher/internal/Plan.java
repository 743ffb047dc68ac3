package org.saddlebook.launcher.internal;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.DirectoryStream;
import java.nio.file.Files;
import java.nio.file.NoSuchFileException;
import java.nio.file.Path;
import java.nio.file.attribute.BasicFileAttributes;
import java.util.ArrayList;
import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Random;

/**
 * Which bundles one run starts, in which order.
 *
 * @param product bundles of the installed features, each once
 * @param added bundles that the user added and the policy allows
 * @param features short names of the features that are on
 * @param off short names of the features that the policy switches off
 * @param troubles name of a bundle or feature to a sentence on what is wrong with it
 * @param key names this set of bundles, as they are on the disk now
 */
record Plan(
        List<Path> product,
        List<Added> added,
        List<String> features,
        List<String> off,
        Map<String, String> troubles,
        String key) {
    /**
     * A bundle that the user added.
     *
     * @param file its file
     * @param bytes its content: what was checked is what is installed
     */
    @SuppressWarnings("ArrayRecordComponent") // compared by nobody; the bytes can be large
    record Added(Path file, byte[] bytes) {
        /** Its file name. */
        String name() {
            return file.getFileName().toString();
        }

        /** Under what location the framework knows it: the file, so that its hash can be told later. */
        String location() {
            return file.toUri().toString();
        }
    }

    Plan {
        product = List.copyOf(product);
        added = List.copyOf(added);
        features = List.copyOf(features);
        off = List.copyOf(off);
        troubles = Collections.unmodifiableMap(new LinkedHashMap<>(troubles));
    }

    /**
     * Reads features and folders.
     *
     * @param home the product's folder
     * @param userBundles folder of the user's own bundles; need not exist
     * @param verb first word of the command, empty for none; features that it does not need are left alone
     * @param shuffle seed of a random order of installation; null for the order of the feature files. Findings must not
     *     depend on it
     */
    static Plan of(Path home, Path userBundles, Policy policy, String verb, Long shuffle) throws IOException, Refused {
        Map<String, String> troubles = new LinkedHashMap<>();
        Map<String, Coordinates> byArtifact = new LinkedHashMap<>();
        Map<String, String> namedIn = new LinkedHashMap<>();
        List<String> names = new ArrayList<>();
        List<String> off = new ArrayList<>();
        for (Path file : sorted(home.resolve("features"), ".json")) {
            Feature feature;
            try {
                feature = FeatureReader.read("features/" + file.getFileName(), Files.readAllBytes(file));
            } catch (Refused e) {
                troubles.put(file.getFileName().toString(), e.getMessage() + " The feature stays off.");
                continue;
            }
            String name = feature.shortName().substring("features/".length());
            if (policy.featuresOff().contains(name)) {
                off.add(name);
                continue;
            }
            names.add(name);
            if (!feature.neededBy(verb)) {
                continue;
            }
            for (Coordinates bundle : feature.bundles()) {
                Coordinates other = byArtifact.putIfAbsent(bundle.artifact(), bundle);
                if (other != null && !other.equals(bundle)) {
                    troubles.put(
                            bundle.artifact(),
                            feature.file() + " names " + bundle + ", but " + namedIn.get(bundle.artifact()) + " names "
                                    + other + ", which is used. Install features of one version only.");
                }
                namedIn.putIfAbsent(bundle.artifact(), feature.file());
            }
        }
        if (names.isEmpty()) {
            throw Refused.at(
                    home.resolve("features").toString(),
                    "no feature that can be used",
                    "feature files such as base.json",
                    "Install the product again.");
        }
        StringBuilder key = new StringBuilder(4096);
        key.append(home).append('\n').append(shuffle).append('\n');
        List<Path> jars = new ArrayList<>();
        Map<String, List<String>> missing = new LinkedHashMap<>();
        for (Coordinates bundle : byArtifact.values()) {
            Path jar = home.resolve("bundles").resolve(bundle.fileName());
            try {
                BasicFileAttributes attributes = Files.readAttributes(jar, BasicFileAttributes.class);
                key.append(bundle.fileName()).append(' ');
                key.append(attributes.size()).append(' ');
                key.append(attributes.lastModifiedTime().toMillis()).append('\n');
                jars.add(jar);
            } catch (NoSuchFileException e) {
                missing.computeIfAbsent(namedIn.get(bundle.artifact()), feature -> new ArrayList<>())
                        .add("bundles/" + bundle.fileName());
            }
        }
        missing.forEach((feature, files) -> troubles.put(
                feature,
                feature + " names what is not there: " + String.join(", ", files) + ". Put the files back or delete "
                        + feature + "."));
        List<Added> added = added(userBundles, policy, troubles, key);
        if (shuffle != null) {
            Collections.shuffle(jars, new Random(shuffle));
            Collections.shuffle(added, new Random(shuffle));
        }
        return new Plan(
                jars, added, names, off, troubles, Digests.sha256(key.toString().getBytes(StandardCharsets.UTF_8)));
    }

    private static List<Added> added(Path userBundles, Policy policy, Map<String, String> troubles, StringBuilder key)
            throws IOException {
        List<Added> added = new ArrayList<>();
        for (Path file : sorted(userBundles, ".jar")) {
            String name = file.getFileName().toString();
            byte[] bytes;
            try {
                bytes = Files.readAllBytes(file);
            } catch (IOException e) {
                troubles.put(name, "the added bundle " + name + " cannot be read: " + e.getMessage());
                continue;
            }
            String reason = policy.forbids(bytes);
            if (reason.isEmpty()) {
                added.add(new Added(file, bytes));
                key.append(name).append(' ').append(Digests.sha256(bytes)).append('\n');
            } else {
                troubles.put(name, "the added bundle " + name + " is not started: " + reason + ".");
            }
        }
        return added;
    }

    private static List<Path> sorted(Path folder, String ending) throws IOException {
        List<Path> files = new ArrayList<>();
        if (Files.isDirectory(folder)) {
            try (DirectoryStream<Path> stream = Files.newDirectoryStream(folder)) {
                for (Path file : stream) { // not by a pattern: compiling it costs more than the whole reading
                    if (file.toString().endsWith(ending)) {
                        files.add(file);
                    }
                }
            }
            Collections.sort(files);
        }
        return files;
    }
}
