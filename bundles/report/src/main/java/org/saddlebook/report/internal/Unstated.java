package org.saddlebook.report.internal;

import java.util.ArrayList;
import java.util.List;
import org.saddlebook.api.campaign.Campaign;
import org.saddlebook.api.campaign.ConstantKind;
import org.saddlebook.api.campaign.RatePoint;
import org.saddlebook.api.findings.Findings;

/**
 * What a defensible record holds and this report does not state. Follows the lists of ISO/IEC 17025:2017, 7.8.2 and IUPAC's
 * "Good reporting practice" (doi:10.1515/pac-2020-0403), shortened; it names gaps and fills none.
 */
final class Unstated {
    private Unstated() {}

    static List<String> of(Campaign campaign, Findings findings) {
        List<String> gaps = new ArrayList<>();
        List<RatePoint> used = campaign.rateTable().map(table -> table.used()).orElse(List.of());
        if (used.stream().anyMatch(point -> point.kelvinUncertainty().isEmpty())) {
            gaps.add("The uncertainty of the temperatures, and whether it is common to all runs.");
        }
        gaps.add("Thermometer: kind, calibration and its date, and where in the vessel the temperature was measured.");
        if (used.stream().anyMatch(point -> point.rateUncertainty().isEmpty())) {
            gaps.add("Uncertainties of single rate constants.");
        }
        gaps.add(
                "How each rate constant was obtained: rate law, evidence for the order, conversion covered, treatment of end value"
                        + " and baseline.");
        if (campaign.choices().standard().isEmpty()) {
            gaps.add("The standard state; one was assumed.");
        }
        if (campaign.choices().constantKind() == ConstantKind.UNSTATED) {
            gaps.add("Whether the constant is that of an elementary step, of pseudo-order or a combination.");
        }
        gaps.add("Sample, batch and purity; solvent, pressure, pH and ionic strength; catalyst and its loading.");
        gaps.add("Laboratory, place and performer, dates of measurement, method and deviations from it.");
        if (campaign.rateTable().isPresent()
                && used.size() < campaign.rateTable().get().points().size()) {
            gaps.add("The result with the excluded points taken back in, for comparison.");
        }
        if (campaign.sources().isEmpty()) {
            gaps.add("The source files the numbers were read from.");
        }
        if (findings.section("spontaneity").isEmpty()) {
            gaps.add("Whether the reaction is allowed at all: no enthalpy and entropy of reaction were given.");
        }
        gaps.add("Signatures. They are kept in the register with name, time and meaning, never inside a report.");
        return gaps;
    }

    static String html(Campaign campaign, Findings findings) {
        StringBuilder html = new StringBuilder(
                "<p>A record that others rely on states these things. This report cannot: they were not given"
                        + (campaign.notes().isEmpty() ? "" : ", unless the notes of the campaign hold them")
                        + ".</p>\n<ul class=\"gaps\">\n");
        for (String gap : of(campaign, findings)) {
            html.append(Html.element("li", Html.text(gap))).append('\n');
        }
        return html.append(
                        "</ul>\n<p class=\"small\">The report supports a laboratory’s rules on records. It does not make a"
                                + " laboratory comply with them.</p>\n")
                .toString();
    }
}
