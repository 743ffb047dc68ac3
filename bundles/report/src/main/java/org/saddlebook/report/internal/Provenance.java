package org.saddlebook.report.internal;

import java.time.Instant;
import java.util.List;
import org.saddlebook.api.campaign.Campaign;
import org.saddlebook.api.campaign.HistoryEntry;
import org.saddlebook.api.campaign.SourcePart;
import org.saddlebook.api.findings.Contributor;
import org.saddlebook.api.findings.Findings;

/** Where the numbers come from: sources, decisions, software. */
final class Provenance {
    private Provenance() {}

    static String html(Campaign campaign, Findings findings, List<String> lost) {
        StringBuilder html = new StringBuilder("<dl>\n");
        html.append(Html.entry("digest of the campaign", code(findings.campaignDigest())));
        html.append(Html.entry("seed", Long.toString(campaign.choices().seed())));
        html.append(
                Html.entry(
                        "constants",
                        "<i>k</i><sub>B</sub>, <i>h</i>, <i>N</i><sub>A</sub> exact, SI of 2019 (BIPM, SI Brochure, 9th edition)"));
        html.append("</dl>\n");
        html.append(sources(campaign.sources()));
        html.append(history(campaign.history()));
        html.append(software(findings.contributors()));
        for (String sentence : lost) {
            html.append(Html.element("p", "lost", Html.text(sentence))).append('\n');
        }
        return html.toString();
    }

    private static String sources(List<SourcePart> sources) {
        StringBuilder rows = new StringBuilder();
        for (SourcePart source : sources) {
            rows.append("<tr>").append(Html.rowHead(Html.text(source.path())));
            rows.append(Html.element("td", source.size() + "\u00a0bytes"));
            rows.append(Html.element("td", source.reader().isEmpty() ? "kept, not read" : Html.text(source.reader())));
            rows.append(Html.element("td", code(source.sha256()))).append("</tr>\n");
        }
        return table("Source files", List.of("file", "size", "read by", "SHA-256"), rows);
    }

    private static String history(List<HistoryEntry> history) {
        StringBuilder rows = new StringBuilder();
        for (HistoryEntry entry : history) {
            rows.append("<tr>").append(Html.rowHead(Html.text(seconds(entry.when()))));
            rows.append(Html.element("td", Html.text(entry.who())));
            rows.append(Html.element("td", Html.text(entry.what())));
            rows.append(Html.element("td", Html.text(entry.oldValue())));
            rows.append(Html.element("td", Html.text(entry.newValue())));
            rows.append(Html.element("td", Html.text(entry.reason()))).append("</tr>\n");
        }
        return table("Decisions and changes", List.of("when (UTC)", "who", "what", "before", "after", "reason"), rows);
    }

    private static String seconds(Instant when) {
        String text = when.toString();
        int point = text.indexOf('.');
        return (point < 0 ? text.replace("Z", "") : text.substring(0, point)).replace('T', ' ');
    }

    private static String software(List<Contributor> contributors) {
        StringBuilder rows = new StringBuilder();
        for (Contributor contributor : contributors) {
            rows.append("<tr>").append(Html.rowHead(Html.text(contributor.name())));
            rows.append(Html.element("td", Html.text(contributor.version())));
            rows.append(Html.element("td", contributor.sha256().isEmpty() ? "not at hand" : code(contributor.sha256())))
                    .append("</tr>\n");
        }
        return table("Software that took part", List.of("bundle", "version", "SHA-256"), rows);
    }

    private static String code(String digest) {
        return "<code>" + Html.text(digest) + "</code>";
    }

    private static String table(String caption, List<String> heads, StringBuilder rows) {
        if (rows.length() == 0) {
            return "";
        }
        StringBuilder html = new StringBuilder("<div class=\"wide\"><table class=\"plain\">\n");
        html.append(Html.element("caption", caption)).append("\n<thead><tr>");
        heads.forEach(head -> html.append(Html.columnHead(head)));
        return html.append("</tr></thead>\n<tbody>\n")
                .append(rows)
                .append("</tbody></table></div>\n")
                .toString();
    }
}
