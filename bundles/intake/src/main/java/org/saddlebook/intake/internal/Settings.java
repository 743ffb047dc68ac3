package org.saddlebook.intake.internal;

import java.util.LinkedHashMap;
import java.util.Map;
import org.saddlebook.api.campaign.Campaign;
import org.saddlebook.api.findings.Node;

/** Statements that are settings of a section. */
final class Settings {
    private Settings() {}

    /** The campaign with one more member in the section's settings. */
    static Campaign put(Campaign before, String section, String key, Node value) {
        Map<String, Node> members = new LinkedHashMap<>();
        if (before.settings().get(section) instanceof Node.Group group) {
            members.putAll(group.members());
        }
        members.put(key, value);
        return before.withSetting(section, new Node.Group(members));
    }
}
