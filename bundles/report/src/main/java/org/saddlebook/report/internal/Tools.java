package org.saddlebook.report.internal;

import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.TreeSet;
import org.saddlebook.api.campaign.Campaign;
import org.saddlebook.api.findings.Findings;
import org.saddlebook.api.findings.Node;
import org.saddlebook.presentation.api.QuantityText;
import org.saddlebook.report.api.ReportTools;

/** The tools handed to a part; remembers which cautions it used, so that their texts can follow in the margin. */
final class Tools implements ReportTools {
    private final Campaign campaign;
    private final Findings findings;
    private final CautionNumbers numbers;
    private final FigureShelf shelf;
    private final String section;
    private final Set<Integer> used = new TreeSet<>();

    Tools(Campaign campaign, Findings findings, CautionNumbers numbers, FigureShelf shelf, String section) {
        this.campaign = campaign;
        this.findings = findings;
        this.numbers = numbers;
        this.shelf = shelf;
        this.section = section;
    }

    /** The margin: the full text of every caution used, under its number. */
    String margin() {
        if (used.isEmpty()) {
            return "";
        }
        StringBuilder html = new StringBuilder("<aside class=\"account\" aria-label=\"Cautions\">\n");
        for (int number : used) {
            html.append("<p class=\"note\" id=\"")
                    .append(anchor(number))
                    .append("\"><b>")
                    .append(number)
                    .append("</b> ")
                    .append(Html.text(numbers.text(number)))
                    .append("</p>\n");
        }
        return html.append("</aside>\n").toString();
    }

    private String anchor(int number) {
        return "caution-" + section + "-" + number;
    }

    @Override
    public Campaign campaign() {
        return campaign;
    }

    @Override
    public Findings findings() {
        return findings;
    }

    @Override
    public String text(String text) {
        return Html.text(text);
    }

    @Override
    public String quantity(Node.Quantity quantity) {
        return withInterval(QuantityText.of(quantity), quantity);
    }

    @Override
    public String temperature(Node.Quantity quantity) {
        return withInterval(QuantityText.temperature(quantity), quantity);
    }

    private String withInterval(String text, Node.Quantity quantity) {
        Optional<String> interval = QuantityText.interval(quantity);
        String html = Html.element("span", "number", Html.text(text));
        if (interval.isPresent() && !QuantityText.isUndetermined(quantity)) {
            html += " "
                    + Html.element(
                            "span", "interval", "(" + Html.text(interval.get().replace(" %", "\u00a0%")) + ")");
        }
        return html + cautions(quantity.cautions());
    }

    @Override
    public String cautions(List<String> ids) {
        Set<Integer> found = numbers.numbers(ids);
        if (found.isEmpty()) {
            return "";
        }
        used.addAll(found);
        StringBuilder html = new StringBuilder("<sup class=\"ear\" title=\"see the cautions beside\">");
        boolean first = true;
        for (int number : found) {
            html.append(first ? "" : " ")
                    .append("<a href=\"#")
                    .append(anchor(number))
                    .append("\">")
                    .append(number)
                    .append("</a>");
            first = false;
        }
        return html.append("</sup>").toString();
    }

    @Override
    public String figure(Node.Figure figure) {
        used.addAll(numbers.numbers(figure.cautions()));
        return shelf.html(section, figure, numbers.texts());
    }

    @Override
    public String node(String key, Node node) {
        return DefaultPart.node(key, node, this);
    }
}
