package org.saddlebook.register.console.internal;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import org.saddlebook.api.service.Intake;

/** Names and media types of the parts of an entry. */
final class PartNames {
    /** The effective campaign: everything that findings depend on, with history. */
    static final String CAMPAIGN = "campaign.json";

    /** The findings. */
    static final String FINDINGS = "findings.json";

    private static final String SOURCES = "sources/";

    private PartNames() {}

    /** Where the source files go: below {@code sources/}, where they may lie already. */
    static List<String> ofSources(List<Intake.Part> sources) {
        boolean there = true;
        for (Intake.Part source : sources) {
            there &= source.name().startsWith(SOURCES);
        }
        List<String> names = new ArrayList<>();
        for (Intake.Part source : sources) {
            names.add(there ? source.name() : SOURCES + source.name());
        }
        return names;
    }

    /** The media type by the end of the name. */
    static String type(String name) {
        int dot = name.lastIndexOf('.');
        return switch (name.substring(dot + 1).toLowerCase(Locale.ROOT)) {
            case "json" -> "application/json";
            case "html" -> "text/html";
            case "svg" -> "image/svg+xml";
            case "png" -> "image/png";
            case "pdf" -> "application/pdf";
            case "csv" -> "text/csv";
            case "txt" -> "text/plain";
            case "tsv", "tab" -> "text/tab-separated-values";
            default -> "application/octet-stream";
        };
    }
}
