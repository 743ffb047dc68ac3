package org.saddlebook.report.internal;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.saddlebook.api.campaign.Campaign;
import org.saddlebook.api.findings.Findings;
import org.saddlebook.api.findings.Section;
import org.saddlebook.api.service.FigureRenderer;
import org.saddlebook.api.service.Intake;

/** Assembles the report: one page of strata, each with its name at the left and its cautions at the right. */
final class Page {
    private Page() {}

    /** The files of a report, {@code report.html} first. */
    static List<Intake.Part> files(
            Campaign campaign, Findings findings, Parts parts, Optional<FigureRenderer> renderer) {
        CautionNumbers numbers = new CautionNumbers(findings);
        FigureShelf shelf = new FigureShelf(renderer);
        StringBuilder body = new StringBuilder();
        Tools tools = new Tools(campaign, findings, numbers, shelf, "in-short");
        body.append(stratum("stratum short", "In short", InShort.html(findings, tools), tools));
        tools = new Tools(campaign, findings, numbers, shelf, "measured");
        // A comparison of several campaigns has none of its own.
        boolean own = !campaign.equals(Campaign.titled(campaign.title()))
                || findings.sections().isEmpty();
        body.append(own ? stratum("Measured", Measured.html(campaign, tools), tools) : "");
        for (Section section : findings.sections().values()) {
            tools = new Tools(campaign, findings, numbers, shelf, "section-" + section.id());
            body.append(stratum(section.title(), parts.html(section, tools), tools));
        }
        tools = new Tools(campaign, findings, numbers, shelf, "not-stated");
        body.append(own ? stratum("Not stated", Unstated.html(campaign, findings), tools) : "");
        body.append(stratum("How it was computed", Provenance.html(campaign, findings, parts.lost()), tools));
        List<Intake.Part> files = new ArrayList<>();
        files.add(new Intake.Part("report.html", page(findings, body).getBytes(StandardCharsets.UTF_8)));
        files.addAll(shelf.files());
        return files;
    }

    private static String page(Findings findings, StringBuilder body) {
        String title = Html.text(findings.campaignTitle().isEmpty() ? "Untitled campaign" : findings.campaignTitle());
        String digest = findings.campaignDigest();
        String shortDigest = digest.length() > 12 ? digest.substring(0, 12) : digest;
        return "<!DOCTYPE html>\n<html lang=\"en\">\n<head>\n<meta charset=\"utf-8\"/>\n"
                + "<meta name=\"viewport\" content=\"width=device-width, initial-scale=1\"/>\n<title>" + title
                + "</title>\n<style>\n" + style() + "</style>\n</head>\n<body>\n<header>\n<h1>" + title
                + "</h1>\n<p>Evaluated campaign <code>" + Html.text(shortDigest)
                + "</code>. Full precision stands in the findings; this page is for reading.</p>\n</header>\n<main>\n"
                + body
                + "</main>\n<footer>\n<p>End of the report.</p>\n</footer>\n</body>\n</html>\n";
    }

    private static String stratum(String name, String content, Tools tools) {
        return stratum("stratum", name, content, tools);
    }

    private static String stratum(String style, String name, String content, Tools tools) {
        if (content.isEmpty()) {
            return "";
        }
        // On paper and on narrow screens the cautions stand before what they belong to; wide ones put them in the
        // margin.
        return "<section class=\"" + style + "\">\n<h2>" + Html.text(name) + "</h2>\n" + tools.margin()
                + "<div class=\"content\">\n" + content + "</div>\n</section>\n";
    }

    private static String style() {
        try (InputStream css = Page.class.getResourceAsStream("report.css")) {
            if (css == null) {
                throw new IllegalStateException("report.css is missing from the bundle");
            }
            return new String(css.readAllBytes(), StandardCharsets.UTF_8);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }
}
