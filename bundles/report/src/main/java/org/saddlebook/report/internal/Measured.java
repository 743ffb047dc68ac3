package org.saddlebook.report.internal;

import java.util.Optional;
import org.saddlebook.api.campaign.Campaign;
import org.saddlebook.api.campaign.Choices;
import org.saddlebook.api.campaign.ErrorModel;
import org.saddlebook.api.campaign.RatePoint;
import org.saddlebook.api.campaign.RateTable;
import org.saddlebook.api.model.StandardState;
import org.saddlebook.presentation.api.QuantityText;
import org.saddlebook.presentation.api.Rounding;
import org.saddlebook.presentation.api.UnitText;

/** What was measured and what was decided about it. */
final class Measured {
    private Measured() {}

    static String html(Campaign campaign, Tools tools) {
        StringBuilder html = new StringBuilder();
        Optional<RateTable> table = campaign.rateTable();
        if (table.isPresent()) {
            html.append(Rail.html(table.get(), campaign.choices().targetsKelvin()));
            html.append(points(table.get()));
        } else {
            html.append("<p>This campaign holds no rate table.</p>\n");
        }
        html.append(decisions(campaign, table));
        return html.toString();
    }

    private static String points(RateTable table) {
        boolean named = table.points().stream().anyMatch(point -> !point.label().isEmpty());
        boolean sure = table.points().stream()
                .anyMatch(point -> point.rateUncertainty().isPresent());
        String unit = UnitText.forPeople(table.rateUnit().code());
        StringBuilder html = new StringBuilder("<div class=\"wide\"><table class=\"numbers\">\n<caption>");
        html.append(table.used().size())
                .append(" of ")
                .append(table.points().size())
                .append(" points used; as read from the source and as understood</caption>\n<thead><tr><td></td>");
        html.append(named ? Html.columnHead("run") : "");
        html.append(Html.columnHead("line")).append(Html.columnHead("temperature,<br/>as read"));
        html.append(Html.columnHead("<i>k</i>,<br/>as read")).append(Html.columnHead("temperature"));
        html.append(Html.columnHead("<i>k</i><br/><small>" + Html.text(unit) + "</small>"));
        html.append(sure ? Html.columnHead("standard<br/>uncertainty") : "");
        html.append(Html.columnHead("standing")).append("</tr></thead>\n<tbody>\n");
        for (RatePoint point : table.points()) {
            html.append(row(point, table, named, sure));
        }
        return html.append("</tbody></table></div>\n").toString();
    }

    private static String row(RatePoint point, RateTable table, boolean named, boolean sure) {
        boolean used = point.excluded().isEmpty();
        StringBuilder html = new StringBuilder(used ? "<tr>" : "<tr class=\"excluded\">");
        html.append(Html.element("td", "mark", Rail.mark(used)));
        html.append(named ? Html.rowHead(Html.text(point.label())) : "");
        html.append(Html.element(
                "td",
                point.asRead().line().isPresent()
                        ? Integer.toString(point.asRead().line().getAsInt())
                        : ""));
        html.append(Html.element("td", Html.text(point.asRead().temperature())));
        html.append(Html.element("td", Html.text(point.asRead().rate())));
        String kelvin = QuantityText.temperature(point.kelvin());
        if (point.kelvinUncertainty().isPresent()) {
            kelvin += ", u = " + Rounding.significant(point.kelvinUncertainty().getAsDouble(), 2) + "\u00a0K";
        }
        html.append(Html.element("td", Html.text(kelvin)));
        html.append(Html.element("td", Rounding.shortest(table.rateUnit().fromSi(point.rate()))));
        if (sure) {
            html.append(Html.element(
                    "td",
                    point.rateUncertainty().isPresent()
                            ? Rounding.significant(100 * point.rateUncertainty().getAsDouble() / point.rate(), 2)
                                    + "\u00a0%"
                            : "not stated"));
        }
        String standing = used ? "used" : "excluded: " + point.excluded().get();
        return html.append(Html.element("td", "standing", Html.text(standing)))
                .append("</tr>\n")
                .toString();
    }

    private static String decisions(Campaign campaign, Optional<RateTable> table) {
        Choices choices = campaign.choices();
        StringBuilder list = new StringBuilder();
        if (table.isPresent()) {
            String unit = UnitText.forPeople(table.get().rateUnit().code());
            list.append(Html.entry(
                    "rate constant",
                    "in " + Html.text(unit) + ", overall order "
                            + Rounding.shortest(table.get().order())));
        }
        list.append(Html.entry("error model", Html.text(errorModel(choices.errorModel()))));
        list.append(Html.entry(
                "standard state",
                choices.standard().map(Measured::standard).orElse("1\u00a0mol/L, assumed: nobody stated one")));
        list.append(Html.entry(
                "the constant stands for",
                switch (choices.constantKind()) {
                    case UNSTATED -> "not stated";
                    case ELEMENTARY -> "an elementary step";
                    case PSEUDO_ORDER -> "a step of pseudo-order";
                    case LUMPED -> "a combination of constants";
                }));
        list.append(Html.entry("coverage of intervals", Rounding.percent(choices.level())));
        if (choices.molecularity().isPresent()) {
            list.append(Html.entry(
                    "molecularity", Rounding.shortest(choices.molecularity().getAsDouble()) + ", stated"));
        }
        for (var held : new java.util.TreeMap<>(choices.fixed()).entrySet()) {
            list.append(Html.entry("held: " + Html.text(held.getKey()), Rounding.shortest(held.getValue())));
        }
        String html = "<dl>\n" + list + "</dl>\n";
        if (!campaign.notes().isEmpty()) {
            html += "<h3>Notes of the campaign</h3>\n<p class=\"notes\">" + Html.text(campaign.notes()) + "</p>\n";
        }
        return html;
    }

    private static String errorModel(Optional<ErrorModel> model) {
        if (model.isEmpty()) {
            return "not resolved";
        }
        return switch (model.get()) {
            case CONSTANT_RELATIVE ->
                "the same relative error for every point, of a size estimated from the scatter: least"
                        + " squares on ln k, intervals with Student’s t";
            case STATED ->
                "the stated standard uncertainties: weights (k/u)² on ln k, never rescaled, intervals with the"
                        + " normal quantile";
            case STATED_BOTH ->
                "the stated standard uncertainties of k and of the temperatures: weighted distance from the law,"
                        + " never rescaled, intervals with the normal quantile";
            case CONSTANT_ABSOLUTE ->
                "the same absolute error for every point, of a size estimated from the scatter: least squares on k"
                        + " itself, intervals with Student’s t";
        };
    }

    private static String standard(StandardState state) {
        return switch (state.kind()) {
            case CONCENTRATION -> Rounding.shortest(state.value() / 1000) + "\u00a0mol/L, stated";
            case PRESSURE -> Rounding.shortest(state.value() / 1e5) + "\u00a0bar, stated";
        };
    }
}
