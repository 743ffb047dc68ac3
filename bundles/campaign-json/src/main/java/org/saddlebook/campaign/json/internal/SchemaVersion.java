package org.saddlebook.campaign.json.internal;

import org.saddlebook.api.problem.InputException;
import org.saddlebook.json.api.JsonCursor;

/** The first thing read of a document: what it is, and in which version. */
final class SchemaVersion {
    private SchemaVersion() {}

    /**
     * Refuses documents of other kinds and versions.
     *
     * @param kind {@code campaign} or {@code findings}
     * @param schema the schema that is read
     */
    static void require(JsonCursor root, String kind, String schema) throws InputException {
        if (!root.object().has("schema")) {
            throw root.problem(
                    "missing-key",
                    "no key \"schema\"",
                    "\"schema\": \"" + schema + "\"",
                    "Check that this is a " + kind + " file; one written by hand starts with this line.");
        }
        JsonCursor at = root.member("schema");
        String found = at.text();
        if (found.equals(schema)) {
            return;
        }
        String remedy;
        if (found.startsWith("saddlebook/" + kind + "/")) {
            remedy = "This version of Saddlebook reads version 1 of " + kind
                    + " files; open it with the version that wrote it, or with a newer one.";
        } else if (found.startsWith("saddlebook/")) {
            remedy = "This file is something else; name a " + kind + " file.";
        } else {
            remedy = "Check that this is a " + kind + " file.";
        }
        throw at.problem("unknown-schema", "\"" + found + "\"", "\"" + schema + "\"", remedy);
    }
}
