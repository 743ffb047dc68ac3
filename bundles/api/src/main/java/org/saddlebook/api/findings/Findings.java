package org.saddlebook.api.findings;

import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.Optional;

/**
 * Everything computed from one campaign: a function of the effective campaign and of the contributing bundles. Holds no
 * clock, host, user or path.
 *
 * @param campaignTitle title of the campaign
 * @param campaignDigest SHA-256 of the effective campaign without its history, lower-case hexadecimal
 * @param contributors the bundles that took part, by symbolic name
 * @param sections section id to section, in the order in which the analyses ran
 */
public record Findings(
        String campaignTitle, String campaignDigest, List<Contributor> contributors, Map<String, Section> sections) {
    /** Copies the collections. */
    public Findings {
        Objects.requireNonNull(campaignTitle, "campaignTitle");
        Objects.requireNonNull(campaignDigest, "campaignDigest");
        contributors = List.copyOf(contributors);
        sections = Collections.unmodifiableMap(new LinkedHashMap<>(sections));
    }

    /** The section with this id. */
    public Optional<Section> section(String id) {
        return Optional.ofNullable(sections.get(id));
    }

    /** Every caution used, id to text, in order of first use. */
    public Map<String, String> cautions() {
        Map<String, String> all = new LinkedHashMap<>();
        sections.values().forEach(section -> section.cautions().forEach(all::putIfAbsent));
        return Collections.unmodifiableMap(all);
    }
}
