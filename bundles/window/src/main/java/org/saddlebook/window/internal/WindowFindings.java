package org.saddlebook.window.internal;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.quantity.Constants;
import org.saddlebook.api.quantity.Unit;
import org.saddlebook.presentation.api.Rounding;

/** The window as findings: answer, intervals with their ends, limits, probability against temperature. */
final class WindowFindings {
    private static final int ROWS = 16;
    private static final double[] ROUND = {1, 2, 5, 10, 20, 25, 50, 100, 200, 500, 1000};

    private final Request request;
    private final Headroom headroom;
    private final Optional<Fitted> fitted;
    private final Optional<Thermo> thermo;
    private final double level;
    private final WindowSearch search;
    private final List<WindowSearch.Found> found;

    WindowFindings(
            Request request,
            Headroom headroom,
            Optional<Fitted> fitted,
            Optional<Thermo> thermo,
            double level,
            WindowSearch search,
            List<WindowSearch.Found> found) {
        this.request = request;
        this.headroom = headroom;
        this.fitted = fitted;
        this.thermo = thermo;
        this.level = level;
        this.search = search;
        this.found = List.copyOf(found);
    }

    Headroom headroom() {
        return headroom;
    }

    Held held() {
        return search.held();
    }

    List<WindowSearch.Found> found() {
        return found;
    }

    Request request() {
        return request;
    }

    Optional<Fitted> fitted() {
        return fitted;
    }

    /** The preferred law, where there is one. */
    Optional<BoundLaw> law() {
        return fitted.isPresent() ? Optional.of(fitted.get().laws().get(0)) : Optional.empty();
    }

    double level() {
        return level;
    }

    void write(Tree tree) {
        double[] kelvin = search.held().kelvin();
        tree.put("answer", answer());
        tree.put("level", level);
        tree.put(
                "range",
                new Tree()
                        .put("lower", Node.Quantity.of(kelvin[0], "K"))
                        .put("upper", Node.Quantity.of(kelvin[kelvin.length - 1], "K"))
                        .group());
        tree.put("draws", search.held().draws());
        List<Node> intervals = new ArrayList<>();
        for (WindowSearch.Found each : found) {
            intervals.add(interval(each));
        }
        tree.put("intervals", new Node.Items(intervals));
        int best = search.best();
        tree.put(
                "best",
                new Tree()
                        .put("temperature", temperature(kelvin[best]))
                        .put("probability", search.held().all()[best])
                        .group());
        tree.put("limits", limits());
        tree.put("probability", probability());
    }

    private String answer() {
        double[] kelvin = search.held().kelvin();
        String per = Rounding.percent(level);
        if (found.isEmpty()) {
            int best = search.best();
            return "At no temperature from " + Words.celsius(kelvin[0], kelvin[kelvin.length - 1])
                    + " do all limits hold with a probability of " + per + "; most probably at "
                    + Words.celsius(kelvin[best]) + ", with "
                    + Rounding.probability(search.held().all()[best]) + ".";
        }
        StringBuilder text = new StringBuilder("All stated limits hold from ");
        for (int i = 0; i < found.size(); i++) {
            WindowSearch.Found each = found.get(i);
            text.append(i == 0 ? "" : ", and from ")
                    .append(Words.celsius(each.lower().kelvin(), each.upper().kelvin()));
        }
        text.append(" with a probability of at least ").append(per).append(" at each temperature (pointwise); ");
        text.append(found.size() == 1 ? "everywhere in it at once with " : "everywhere in each at once with ");
        for (int i = 0; i < found.size(); i++) {
            text.append(i == 0 ? "" : ", ")
                    .append(Rounding.probability(found.get(i).throughout()));
        }
        return text.append('.').toString();
    }

    private Node interval(WindowSearch.Found each) {
        Tree tree = new Tree()
                .put("lower", temperature(each.lower().kelvin()))
                .put("upper", temperature(each.upper().kelvin()))
                .put("pointwiseProbability", level)
                .put("wholeIntervalProbability", each.throughout())
                .put("lowerEnd", end(each.lower()))
                .put("upperEnd", end(each.upper()));
        if (each.whole().isPresent()) {
            WindowSearch.Whole whole = each.whole().get();
            tree.put(
                    "whole",
                    new Tree()
                            .put("lower", whole(whole.lowerKelvin()))
                            .put("upper", whole(whole.upperKelvin()))
                            .put("probability", whole.probability())
                            .group());
        }
        return tree.group();
    }

    private Node whole(double kelvin) {
        List<String> cautions = new ArrayList<>(cautions(kelvin));
        cautions.remove(WindowCautions.POINTWISE);
        cautions.add(0, WindowCautions.WHOLE);
        return Node.Quantity.of(kelvin, "K").withCautions(cautions);
    }

    private Node end(WindowSearch.End end) {
        Tree tree = new Tree();
        switch (end.stop()) {
            case RANGE -> tree.put("binds", "nothing in the range looked at; the window may go on");
            case WALL -> tree.put("binds", "equipment");
            case LIMIT -> {
                Limit limit = headroom.limits().get(end.limit());
                tree.put("binds", limit.id());
                tree.put("title", limit.title());
                tree.put("failsThere", end.failing());
                sensitivity(tree, limit, end);
                tree.put("crossings", crossings(end));
            }
        }
        if (fitted.isPresent()) {
            tree.put("extrapolation", Node.Quantity.of(extrapolation(end.kelvin()), "K"));
        }
        return tree.group();
    }

    /** Where the probability is 1 − level, one half and level. */
    private Node crossings(WindowSearch.End end) {
        List<Node.Column> columns = List.of(
                new Node.Column("probability", "all hold with", "1"), new Node.Column("temperature", "at", "K"));
        List<List<Node>> rows = new ArrayList<>();
        double[][] pairs = {{level, end.kelvin()}, {0.5, end.even()}, {1 - level, end.doubtful()}};
        for (double[] pair : pairs) {
            if (!Double.isNaN(pair[1])) {
                // 1 − 0.95 is not exactly 0.05.
                rows.add(List.of(new Node.Scalar(Math.rint(pair[0] * 1e12) / 1e12), temperature(pair[1])));
            }
        }
        return new Node.Table(columns, rows);
    }

    /** Slope of the binding headroom, and how far the end moves when the limit is eased; first order. */
    private void sensitivity(Tree tree, Limit limit, WindowSearch.End end) {
        double kelvin = end.kelvin();
        double step = 0.05;
        double slope = (best(limit, kelvin + step) - best(limit, kelvin - step)) / (2 * step);
        if (!Double.isFinite(slope) || slope == 0) {
            return;
        }
        tree.put("headroomSlope", Node.Quantity.of(slope, Unit.JOULE_PER_MOLE_KELVIN.code()));
        double gain = Constants.GAS * kelvin * StrictMath.log(easing(limit));
        double shift = -gain / slope;
        if (Math.abs(shift) < kelvin / 2) {
            tree.put("shiftIfEased", Node.Quantity.of(shift, "K"));
            tree.put(
                    "easing",
                    "With " + easingText(limit) + " this end moves by about " + Rounding.significant(shift, 2) + " K.");
        }
    }

    private double best(Limit limit, double kelvin) {
        double lnRate =
                fitted.isPresent() ? fitted.get().laws().get(0).at(kelvin).lnRate() : Double.NaN;
        return headroom.form(headroom.limits().indexOf(limit), kelvin, lnRate, law())
                .base();
    }

    /** By which factor the limit is eased; its headroom grows by RT times the logarithm. */
    private static double easing(Limit limit) {
        if (limit instanceof Limit.Competing competing) {
            double s = competing.share();
            double t = 2 * s < 1 ? 2 * s : (1 + s) / 2;
            return t / (1 - t) / (s / (1 - s));
        }
        return limit instanceof Limit.Allowed ? 10 : 2;
    }

    private static String easingText(Limit limit) {
        return switch (limit.kind()) {
            case "allowed" -> "a tenth of the reaction quotient";
            case "competing" -> ((Limit.Competing) limit).share() < 0.5 ? "twice the share" : "half the main product";
            case "equilibrium" -> "half the odds of the conversion";
            case "hold" -> limit.course().isPresent() ? "half the progress over the course" : "half the time";
            default -> limit.course().isPresent() ? "twice the progress over the course" : "twice the time";
        };
    }

    private Node limits() {
        List<Node> items = new ArrayList<>();
        Held held = search.held();
        for (Limit limit : request.limits()) {
            Tree tree = new Tree()
                    .put("id", limit.id())
                    .put("kind", limit.kind())
                    .put("title", limit.title())
                    .put("statement", limit.statement());
            int index = headroom.limits().indexOf(limit);
            if (index >= 0) {
                alone(tree, held, index);
            }
            tree.put("binds", binds(limit));
            items.add(tree.group());
        }
        return new Node.Items(items);
    }

    /** Where this limit alone holds with the level: the coldest and hottest such temperature of the search. */
    private void alone(Tree tree, Held held, int index) {
        int first = -1;
        int last = -1;
        for (int t = 0; t < held.kelvin().length; t++) {
            if (held.alone()[t][index] >= level) {
                first = first < 0 ? t : first;
                last = t;
            }
        }
        if (first < 0) {
            tree.put("alone", "holds with " + Rounding.percent(level) + " at no temperature looked at");
        } else {
            tree.put("aloneFrom", temperature(held.kelvin()[first]));
            tree.put("aloneTo", temperature(held.kelvin()[last]));
        }
    }

    private String binds(Limit limit) {
        List<String> where = new ArrayList<>();
        for (WindowSearch.Found each : found) {
            if (binds(limit, each.lower())) {
                where.add("lower end");
            }
            if (binds(limit, each.upper())) {
                where.add("upper end");
            }
        }
        return where.isEmpty() ? "at no end" : String.join(", ", where);
    }

    private boolean binds(Limit limit, WindowSearch.End end) {
        if (end.stop() == WindowSearch.Stop.WALL) {
            return limit instanceof Limit.Equipment wall
                    && (wall.lowerKelvin().orElse(0) == end.kelvin()
                            || wall.upperKelvin().orElse(0) == end.kelvin());
        }
        return end.stop() == WindowSearch.Stop.LIMIT && headroom.limits().get(end.limit()) == limit;
    }

    /** Probability at round temperatures: of all limits and of each alone. */
    private Node probability() {
        Held held = search.held();
        double[] kelvin = held.kelvin();
        double span = kelvin[kelvin.length - 1] - kelvin[0];
        double step = ROUND[ROUND.length - 1];
        for (int i = ROUND.length - 1; i >= 0; i--) {
            step = span / ROUND[i] <= ROWS ? ROUND[i] : step;
        }
        double start = Constants.ZERO_CELSIUS + step * Math.ceil((kelvin[0] - Constants.ZERO_CELSIUS) / step);
        List<Node> rows = new ArrayList<>();
        for (int i = 0; start + i * step <= kelvin[kelvin.length - 1]; i++) {
            double at = start + i * step;
            rows.add(row(held, at));
        }
        return new Node.Items(rows);
    }

    private Node row(Held held, double at) {
        int high = 1;
        while (high < held.kelvin().length - 1 && held.kelvin()[high] < at) {
            high++;
        }
        double share = (at - held.kelvin()[high - 1]) / (held.kelvin()[high] - held.kelvin()[high - 1]);
        share = Math.max(0, Math.min(1, share));
        boolean allowed = request.equipment().holds(at);
        Tree tree = new Tree().put("temperature", Node.Quantity.of(at, "K"));
        tree.put("all", allowed ? between(held.all()[high - 1], held.all()[high], share) : 0);
        for (int i = 0; i < headroom.limits().size(); i++) {
            tree.put(headroom.limits().get(i).id(), between(held.alone()[high - 1][i], held.alone()[high][i], share));
        }
        if (request.limits().size() > headroom.limits().size()) {
            tree.put("equipment", allowed ? 1 : 0);
        }
        return tree.group();
    }

    private static double between(double low, double high, double share) {
        double value = low + share * (high - low);
        return Math.rint(value * 1e5) / 1e5;
    }

    private Node.Quantity temperature(double kelvin) {
        return Node.Quantity.of(kelvin, "K").withCautions(cautions(kelvin));
    }

    /** Distance outside the measured temperatures, K. */
    double extrapolation(double kelvin) {
        if (fitted.isEmpty()) {
            return 0;
        }
        return Math.max(
                0,
                Math.max(fitted.get().lowest() - kelvin, kelvin - fitted.get().highest()));
    }

    List<String> cautions(double kelvin) {
        List<String> ids = new ArrayList<>(List.of(WindowCautions.POINTWISE, WindowCautions.STATED_ONLY));
        if (extrapolation(kelvin) > 0 || (thermo.isPresent() && !thermo.get().covers(kelvin))) {
            ids.add("extrapolated");
        }
        addCommon(ids);
        return ids;
    }

    private void addCommon(List<String> ids) {
        boolean storage = false;
        boolean independent = false;
        boolean course = false;
        boolean sharp = thermo.isPresent() && thermo.get().exact();
        for (Limit limit : headroom.limits()) {
            storage |= limit instanceof Limit.Hold;
            course |= limit.course().isPresent();
            independent |= limit.stated().isPresent();
            sharp |= limit.stated().isPresent() && !limit.stated().get().uncertain();
        }
        if (fitted.isPresent()) {
            ids.add("same-mechanism");
        }
        ids.add("not-a-hazard-assessment");
        if (storage) {
            ids.add("storage-lower-bound");
        }
        if (course) {
            ids.add(WindowCautions.COURSE);
        }
        if (thermo.isPresent()) {
            ids.add("allowed-is-not-fast");
            ids.add("at-stated-composition");
            if (thermo.get().constant()) {
                ids.add("constant-heat-capacity");
            }
        }
        if (sharp) {
            ids.add(WindowCautions.NO_UNCERTAINTY);
        }
        if (independent || (thermo.isPresent() && fitted.isPresent())) {
            ids.add(WindowCautions.INDEPENDENT);
        }
        if (fitted.isPresent() && fitted.get().laws().size() > 1) {
            ids.add(WindowCautions.LAWS_DIFFER);
        }
        ids.add("parameters-do-not-transfer");
    }

    List<String> notes() {
        List<String> notes = new ArrayList<>();
        notes.add("Probabilities come from " + Rounding.shortest(search.held().draws())
                + " random draws of what is uncertain; repeating with another seed moves a probability near "
                + Rounding.percent(level) + " by about "
                + Rounding.significant(
                        Math.sqrt(level * (1 - level) / search.held().draws()), 1)
                + ".");
        for (Limit limit : headroom.limits()) {
            double[] kelvin = search.held().kelvin();
            if (limit.stated().isPresent()) {
                BarrierReader.implausible(limit.title(), limit.stated().get(), kelvin[kelvin.length - 1])
                        .ifPresent(notes::add);
            }
        }
        return notes;
    }
}
