package org.saddlebook.intake.internal;

import java.util.LinkedHashMap;
import java.util.Map;
import org.saddlebook.api.campaign.Campaign;
import org.saddlebook.api.findings.Node;

/** Statements on the reaction's enthalpy and entropy, as settings of section {@code spontaneity}. */
final class Thermodynamics {
    private static final String SECTION = "spontaneity";

    private Thermodynamics() {}

    /** The campaign with one more member in the section's settings. */
    static Campaign put(Campaign before, String key, Node value) {
        Map<String, Node> members = new LinkedHashMap<>();
        if (before.settings().get(SECTION) instanceof Node.Group group) {
            members.putAll(group.members());
        }
        members.put(key, value);
        return before.withSetting(SECTION, new Node.Group(members));
    }
}
