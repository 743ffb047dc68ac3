package org.saddlebook.launcher.internal;

import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.NoSuchFileException;
import java.nio.file.Path;
import java.util.List;
import java.util.TreeSet;

/**
 * What the administrator of a machine allows. Without a policy file everything is allowed.
 *
 * @param file where it was read from; null when there is none
 * @param bundles which user-added bundles may start
 * @param sha256 hashes of the bundles that may start when only listed ones may
 * @param signers SHA-256 fingerprints of certificates whose signed bundles may start when only listed ones may
 * @param featuresOff short names of features that stay off
 * @param register where the register is; empty for the user's own
 */
record Policy(
        Path file,
        UserBundles bundles,
        List<String> sha256,
        List<String> signers,
        List<String> featuresOff,
        String register) {
    /** Which user-added bundles may start. */
    enum UserBundles {
        /** All of them. */
        ANY,
        /** Those named by hash or signer. */
        LISTED,
        /** None. */
        NONE
    }

    /** Nothing is restricted. */
    static final Policy OPEN = new Policy(null, UserBundles.ANY, List.of(), List.of(), List.of(), "");

    Policy {
        sha256 = List.copyOf(sha256);
        signers = List.copyOf(signers);
        featuresOff = List.copyOf(featuresOff);
    }

    /**
     * Reads a policy file.
     *
     * @return the open policy when there is no such file
     * @throws Refused the file is there but cannot be understood: then nothing starts, because nobody knows what it forbids
     */
    static Policy read(Path file) throws Refused {
        byte[] bytes;
        try {
            bytes = Files.readAllBytes(file);
        } catch (NoSuchFileException e) {
            return OPEN;
        } catch (IOException e) {
            throw new Refused(file + ": the policy of this machine cannot be read (" + e.getMessage()
                    + "). Ask the administrator to make it readable for every user.");
        }
        Reading reading = new Reading();
        StrictJson.readObject(
                file.toString(), bytes, json -> json.members("a policy", key -> reading.member(json, key)));
        return new Policy(
                file, reading.bundles, reading.sha256, reading.signers, reading.featuresOff, reading.register);
    }

    /** Both policies at once: whatever one of them forbids is forbidden; the first one's register wins. */
    Policy and(Policy second) {
        if (second.file == null) {
            return this;
        }
        if (file == null) {
            return second;
        }
        TreeSet<String> off = new TreeSet<>(featuresOff);
        off.addAll(second.featuresOff);
        boolean firstLists = bundles == UserBundles.LISTED;
        boolean secondLists = second.bundles == UserBundles.LISTED;
        UserBundles both = bundles.compareTo(second.bundles) >= 0 ? bundles : second.bundles;
        List<String> hashes = firstLists ? sha256 : second.sha256;
        List<String> keys = firstLists ? signers : second.signers;
        if (firstLists && secondLists) {
            hashes = hashes.stream().filter(second.sha256::contains).toList();
            keys = keys.stream().filter(second.signers::contains).toList();
        }
        return new Policy(file, both, hashes, keys, List.copyOf(off), register.isEmpty() ? second.register : register);
    }

    /**
     * Why a user-added bundle may not start.
     *
     * @param bytes the bundle's bytes, the very ones that would be installed
     * @return empty when it may
     */
    String forbids(byte[] bytes) {
        if (bundles == UserBundles.ANY) {
            return "";
        }
        if (bundles == UserBundles.NONE) {
            return "the policy of this machine (" + file + ") allows no added bundles";
        }
        String hash = Digests.sha256(bytes);
        if (sha256.contains(hash)) {
            return "";
        }
        if (!signers.isEmpty()) {
            try {
                for (String signer : Signatures.signersOfAll(new ByteArrayInputStream(bytes))) {
                    if (signers.contains(signer)) {
                        return "";
                    }
                }
            } catch (IOException | SecurityException e) {
                return "its signature does not verify (" + e.getMessage() + ")";
            }
        }
        return "the policy of this machine (" + file + ") does not list it; its SHA-256 is " + hash;
    }

    private static final class Reading {
        private UserBundles bundles = UserBundles.ANY;
        private List<String> sha256 = List.of();
        private List<String> signers = List.of();
        private List<String> featuresOff = List.of();
        private String register = "";

        void member(StrictJson json, String key) throws IOException, Refused {
            switch (key) {
                case "schema" -> {
                    String schema = json.text(key);
                    if (!schema.equals("saddlebook-policy/1")) {
                        throw json.refused("schema \"" + schema + "\"", "saddlebook-policy/1", "Correct the schema.");
                    }
                }
                case "userBundles" -> json.members(key, member -> userBundles(json, member));
                case "features" ->
                    json.members(key, member -> {
                        if (!member.equals("off")) {
                            throw unknown(json, member, "off");
                        }
                        featuresOff = json.texts("features.off");
                    });
                case "register" -> register = json.text(key);
                default -> throw unknown(json, key, "schema, userBundles, features, register");
            }
        }

        private void userBundles(StrictJson json, String key) throws IOException, Refused {
            switch (key) {
                case "allow" ->
                    bundles = switch (json.text(key)) {
                        case "any" -> UserBundles.ANY;
                        case "listed" -> UserBundles.LISTED;
                        case "none" -> UserBundles.NONE;
                        default ->
                            throw json.refused(
                                    "\"" + json.text(key) + "\"", "any, listed or none", "Correct userBundles.allow.");
                    };
                case "sha256" -> sha256 = fingerprints(json, key);
                case "signers" -> signers = fingerprints(json, key);
                default -> throw unknown(json, key, "allow, sha256, signers");
            }
        }

        private static List<String> fingerprints(StrictJson json, String key) throws IOException, Refused {
            List<String> all = json.texts("userBundles." + key);
            for (String text : all) {
                if (!text.matches("[0-9a-f]{64}")) {
                    throw json.refused(
                            "\"" + text + "\"",
                            "64 hexadecimal digits in lower case",
                            "Copy the SHA-256 as `saddlebook bundles list` prints it.");
                }
            }
            return all;
        }

        private static Refused unknown(StrictJson json, String key, String known) {
            return json.refused("the key \"" + key + "\"", "one of " + known, "Correct its spelling or remove it.");
        }
    }
}
