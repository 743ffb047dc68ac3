package org.saddlebook.console.internal;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/** Says which of the product's features this installation does not have. */
final class NotInstalled {
    /** Features of the product beside the base, as the distribution ships them. */
    private static final List<String> FEATURES = List.of(
            "reader-text",
            "reader-sheet",
            "model-arrhenius",
            "model-eyring",
            "model-modified-arrhenius",
            "model-eyring-heat-capacity",
            "model-parallel-channels",
            "model-shifted-origin",
            "model-falloff",
            "tunnelling",
            "data-checks",
            "spontaneity",
            "window",
            "reaction-series",
            "report",
            "register");

    private NotInstalled() {}

    /** One sentence; empty when everything is there or the launcher did not say what is. */
    static Optional<String> notice(Services services) {
        String installed = services.setting("saddlebook.features", "");
        if (installed.isEmpty()) {
            return Optional.empty();
        }
        List<String> there = List.of(installed.split(",", -1));
        List<String> missing = new ArrayList<>();
        for (String feature : FEATURES) {
            if (!there.contains(feature)) {
                missing.add(feature);
            }
        }
        if (missing.isEmpty()) {
            return Optional.empty();
        }
        String off = services.setting("saddlebook.features.off", "");
        return Optional.of("Not installed here: " + String.join(", ", missing) + "."
                + (off.isEmpty()
                        ? ""
                        : " Switched off by the policy of this machine: " + off.replace(",", ", ") + "."));
    }
}
