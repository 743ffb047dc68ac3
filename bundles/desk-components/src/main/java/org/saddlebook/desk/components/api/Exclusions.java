package org.saddlebook.desk.components.api;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.saddlebook.api.campaign.Campaign;
import org.saddlebook.api.campaign.RatePoint;
import org.saddlebook.api.campaign.RateTable;
import org.saddlebook.api.findings.Layer;
import org.saddlebook.charts.api.FigurePoint;
import org.saddlebook.desk.api.Change;
import org.saddlebook.desk.api.DeskContext;
import org.saddlebook.presentation.api.Rounding;

/** Leaving measured points out and taking them in again: a person's decision, with a reason, from wherever it is made. */
public final class Exclusions {
    private Exclusions() {}

    /** Asks for a reason and excludes a point of the campaign's table, or uses an excluded one again. */
    public static void toggle(DeskContext context, int index) {
        List<RatePoint> points = points(context.state().campaign());
        if (index < 0 || index >= points.size()) {
            return;
        }
        RatePoint point = points.get(index);
        if (point.excluded().isPresent()) {
            context.change(new Change(
                    name(point) + " used again",
                    "excluded: " + point.excluded().get(),
                    "used",
                    "",
                    campaign -> with(campaign, index, point.include())));
        } else {
            context.ask(
                    "Why is " + name(point) + " excluded? The reason stays with the campaign.",
                    "",
                    reason -> context.change(new Change(
                            name(point) + " excluded",
                            "used",
                            "excluded",
                            reason,
                            campaign -> with(campaign, index, point.exclude(reason)))));
        }
    }

    /** The index in the table of a point in a figure whose layers hold the used or the excluded points in its order. */
    public static int index(Campaign campaign, FigurePoint drawn) {
        if (drawn.kind() != Layer.Kind.MEASURED && drawn.kind() != Layer.Kind.EXCLUDED) {
            return -1;
        }
        boolean excluded = drawn.kind() == Layer.Kind.EXCLUDED;
        List<RatePoint> points = points(campaign);
        int seen = 0;
        for (int i = 0; i < points.size(); i++) {
            if (points.get(i).excluded().isPresent() == excluded && seen++ == drawn.index()) {
                // A figure of another state would name another point.
                return points.get(i).kelvin() == drawn.x() ? i : -1;
            }
        }
        return -1;
    }

    /** What is known about a drawn point beyond its values: the run's name and why it is excluded. */
    public static String describe(Campaign campaign, FigurePoint drawn) {
        int index = index(campaign, drawn);
        if (index < 0) {
            return "";
        }
        RatePoint point = points(campaign).get(index);
        String run = point.label().isEmpty() ? "" : "run " + point.label();
        String reason = point.excluded().map(why -> "excluded: " + why).orElse("");
        return run.isEmpty() || reason.isEmpty() ? run + reason : run + ", " + reason;
    }

    private static List<RatePoint> points(Campaign campaign) {
        Optional<RateTable> table = campaign.rateTable();
        return table.isPresent() ? table.get().points() : List.of();
    }

    /** How people name a point. */
    public static String name(RatePoint point) {
        return (point.label().isEmpty() ? "the point" : "run " + point.label()) + " at " + celsius(point.kelvin());
    }

    /** A temperature in °C, to a hundredth. */
    public static String celsius(double kelvin) {
        return Rounding.shortest(Math.rint((kelvin - 273.15) * 100) / 100) + "\u00a0°C";
    }

    private static Campaign with(Campaign campaign, int index, RatePoint point) {
        RateTable table = campaign.rateTable().orElseThrow();
        List<RatePoint> points = new ArrayList<>(table.points());
        points.set(index, point);
        return campaign.withRateTable(table.withPoints(points));
    }
}
