package org.saddlebook.window.internal;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;
import org.saddlebook.api.campaign.Campaign;
import org.saddlebook.api.findings.Node;

/** Reads the campaign's settings of this section. Nothing is guessed: what is not understood is refused by name. */
final class RequestReader {
    private static final int DRAWS = 20_000;
    private static final int FEWEST_DRAWS = 1000;
    private static final int MOST_DRAWS = 1_000_000;

    private final Reading settings;
    private final OptionalDouble order;
    private final Optional<RateLaw> law;
    private final BarrierReader barriers;
    private final Set<String> ids = new HashSet<>();

    private final boolean startStated;

    private RequestReader(Reading settings, Campaign campaign) throws Refusal {
        this.settings = settings;
        startStated = campaign.settings().get("spontaneity") instanceof Node.Group spontaneity
                && spontaneity.get("equilibrium").isPresent();
        order = campaign.rateTable().isPresent()
                ? OptionalDouble.of(campaign.rateTable().get().order())
                : OptionalDouble.empty();
        law = law(settings, order);
        barriers = new BarrierReader(campaign.choices());
    }

    /**
     * What was asked for.
     *
     * @throws Refusal with a sentence for the user
     */
    static Request read(Campaign campaign) throws Refusal {
        Reading settings = Reading.of(campaign.settings().get(WindowEvaluation.SECTION), "settings of window");
        settings.only("limits", "range", "draws", "rateLaw", "conversions", "history");
        return new RequestReader(settings, campaign).request();
    }

    private Request request() throws Refusal {
        List<Limit> limits = new ArrayList<>();
        if (settings.has("limits")) {
            if (!(settings.group().get("limits").get() instanceof Node.Items items)
                    || items.items().isEmpty()) {
                throw new Refusal("\"limits\" in the settings of window must be a list of limits, at least one.");
            }
            int number = 0;
            for (Node item : items.items()) {
                number++;
                limits.add(limit(Reading.of(item, "limit " + number), number));
            }
        }
        if (limits.isEmpty() && !settings.has("history") && law.isEmpty()) {
            throw new Refusal("The settings of window ask for nothing; state limits, a rateLaw or a history.");
        }
        OptionalDouble lower = OptionalDouble.empty();
        OptionalDouble upper = OptionalDouble.empty();
        if (settings.has("range")) {
            Reading range = Reading.of(settings.group().get("range").get(), "range of temperatures");
            range.only("lower", "upper");
            lower = OptionalDouble.of(range.kelvin("lower", "the coldest temperature to look at"));
            upper = OptionalDouble.of(range.kelvin("upper", "the hottest temperature to look at"));
            if (!(lower.getAsDouble() < upper.getAsDouble())) {
                throw new Refusal("The lower end of the range of temperatures must lie below its upper end.");
            }
        }
        double draws = settings.has("draws") ? settings.number("draws", "how many random draws") : DRAWS;
        if (!(draws >= FEWEST_DRAWS && draws <= MOST_DRAWS) || draws != Math.rint(draws)) {
            throw new Refusal("\"draws\" in the settings of window must be a whole number from 1000 to 1000000.");
        }
        Optional<History> history = settings.has("history")
                ? Optional.of(HistoryReader.read(settings.group().get("history").get()))
                : Optional.empty();
        return new Request(limits, lower, upper, (int) draws, law, conversions(limits), history);
    }

    private Limit limit(Reading at, int number) throws Refusal {
        String kind = at.text("kind", "allowed, equilibrium, time, competing, hold or equipment");
        Reading named = new Reading(at.group(), "limit " + number + " (" + kind + ")");
        return switch (kind) {
            case "allowed" -> allowed(named);
            case "equilibrium" -> equilibrium(named);
            case "time" -> time(named);
            case "competing" -> competing(named);
            case "hold" -> hold(named);
            case "equipment" -> equipment(named);
            default ->
                throw new Refusal("Limit " + number + " has the kind \"" + kind
                        + "\", which is not known; expected allowed, equilibrium, time, competing, hold or equipment.");
        };
    }

    private Limit allowed(Reading at) throws Refusal {
        at.only("kind", "title", "reactionQuotient");
        double q = at.has("reactionQuotient") ? at.positive("reactionQuotient", "Q at the composition meant") : 1;
        String where = q == 1 ? "at standard composition (Q = 1)" : "at Q = " + Words.number(q);
        return new Limit.Allowed(id("allowed"), at.textOr("title", "allowed −ΔG"), "ΔG ≤ 0 " + where + ".", q);
    }

    private Limit equilibrium(Reading at) throws Refusal {
        at.only("kind", "title", "conversion");
        double x = at.share("conversion", "the conversion that equilibrium must allow");
        return new Limit.Equilibrium(
                id("equilibrium"),
                at.textOr("title", Words.percent(x) + " at equilibrium"),
                "Equilibrium " + (startStated ? "from the stated start" : "of A ⇌ B")
                        + " allows a conversion of at least " + Words.percent(x) + ".",
                x);
    }

    private Limit time(Reading at) throws Refusal {
        at.only("kind", "title", "conversion", "within", "course");
        double x = at.share("conversion", "the conversion to reach");
        if (at.has("course")) {
            return timeOfCourse(at, x);
        }
        Reading.Stated within = at.time("within", "the longest time");
        RateLaw own = ownLaw(at);
        reach(own, x, at);
        String title = Words.percent(x) + " within " + within.text();
        return new Limit.Time(
                id("time"),
                at.textOr("title", title),
                "Conversion of " + title + " (" + own.kind().word() + ").",
                x,
                within.si(),
                own);
    }

    private Limit timeOfCourse(Reading at, double x) throws Refusal {
        if (at.has("within")) {
            throw new Refusal("The " + at.place()
                    + " has both within and a course, which lasts as long as it lasts; state" + " one of them.");
        }
        RateLaw own = ownLaw(at);
        reach(own, x, at);
        Course course = CourseReader.read(at, !own.irreversible());
        return new Limit.Time(
                id("time"),
                at.textOr("title", Words.percent(x) + " after the course"),
                "Conversion of " + Words.percent(x) + " at the end of the stated course of temperature ("
                        + own.kind().word() + ").",
                x,
                course.duration(),
                own,
                Optional.of(course));
    }

    private Limit competing(Reading at) throws Refusal {
        at.only("kind", "title", "share", "barrier");
        double share = at.share("share", "the largest share that may be lost");
        double own = needOrder(at);
        StatedBarrier barrier =
                barriers.read(at.node("barrier", "dH and dS, or Ea and A, of the competing reaction"), at.place(), own);
        if (barrier.order() != own) {
            throw new Refusal("The barrier in the " + at.place() + " belongs to a rate constant of order "
                    + Words.number(barrier.order()) + ", the rate table to one of order " + Words.number(own)
                    + "; a share that does not depend on concentration needs equal orders.");
        }
        return new Limit.Competing(
                id("competing"),
                at.textOr("title", "by-product below " + Words.percent(share)),
                "The competing reaction takes at most " + Words.percent(share) + " of the reactant.",
                share,
                barrier);
    }

    private Limit hold(Reading at) throws Refusal {
        at.only("kind", "title", "conversion", "atLeast", "barrier", "rateLaw", "course");
        double x = at.share("conversion", "the share lost at the specification limit");
        if (at.has("course") == at.has("atLeast")) {
            throw new Refusal("The " + at.place()
                    + " needs atLeast, the shortest time, or a course of temperature; state one" + " of them.");
        }
        Optional<StatedBarrier> barrier = Optional.empty();
        RateLaw loss;
        if (at.has("barrier")) {
            StatedBarrier read = barriers.read(at.group().get("barrier").get(), at.place(), 1);
            barrier = Optional.of(read);
            loss = law(at, OptionalDouble.of(read.order()))
                    .orElseThrow(() -> new Refusal("The " + at.place()
                            + " needs a rateLaw with the initial concentration: its barrier is of order "
                            + Words.number(read.order()) + "."));
        } else {
            if (at.has("rateLaw")) {
                throw new Refusal("The " + at.place()
                        + " has a rateLaw but no barrier of its own; state the rateLaw beside the limits.");
            }
            loss = ownLaw(at);
        }
        if (!loss.irreversible()) {
            throw new Refusal("The " + at.place() + " cannot use a reversible rate law; state first, second or order.");
        }
        reach(loss, x, at);
        if (at.has("course")) {
            Course course = CourseReader.read(at, false);
            String over = "less than " + Words.percent(x) + " lost over the course";
            return new Limit.Hold(
                    id("hold"),
                    at.textOr("title", over),
                    "Stays so: " + over + " of temperature.",
                    x,
                    course.duration(),
                    loss,
                    barrier,
                    Optional.of(course));
        }
        Reading.Stated atLeast = at.time("atLeast", "the shortest time");
        String title = "less than " + Words.percent(x) + " lost in " + atLeast.text();
        return new Limit.Hold(
                id("hold"),
                at.textOr("title", title),
                "Stays so: " + title + ".",
                x,
                atLeast.si(),
                loss,
                barrier,
                Optional.empty());
    }

    private Limit equipment(Reading at) throws Refusal {
        at.only("kind", "title", "lower", "upper", "lowerTitle", "upperTitle");
        if (!at.has("lower") && !at.has("upper")) {
            throw new Refusal("The " + at.place() + " needs lower, upper or both: temperatures of its walls.");
        }
        OptionalDouble low = at.has("lower")
                ? OptionalDouble.of(at.kelvin("lower", "the coldest temperature of the equipment"))
                : OptionalDouble.empty();
        OptionalDouble high = at.has("upper")
                ? OptionalDouble.of(at.kelvin("upper", "the hottest temperature of the equipment"))
                : OptionalDouble.empty();
        if (low.isPresent() && high.isPresent() && !(low.getAsDouble() < high.getAsDouble())) {
            throw new Refusal("The lower wall in the " + at.place() + " must lie below the upper one.");
        }
        String title = at.textOr("title", "equipment");
        String says = (low.isPresent() ? "not below " + Words.celsius(low.getAsDouble()) : "")
                + (low.isPresent() && high.isPresent() ? ", " : "")
                + (high.isPresent() ? "not above " + Words.celsius(high.getAsDouble()) : "");
        return new Limit.Equipment(
                id("equipment"),
                title,
                "The equipment: " + says + ".",
                low,
                high,
                at.textOr("lowerTitle", title),
                at.textOr("upperTitle", title));
    }

    private List<Double> conversions(List<Limit> limits) throws Refusal {
        List<Double> wanted = new ArrayList<>();
        if (settings.has("conversions")) {
            if (!(settings.group().get("conversions").get() instanceof Node.Items items)) {
                throw new Refusal("\"conversions\" in the settings of window must be a list of numbers.");
            }
            for (Node item : items.items()) {
                if (!(item instanceof Node.Scalar scalar) || !(scalar.value() > 0 && scalar.value() < 1)) {
                    throw new Refusal("\"conversions\" in the settings of window must be numbers between 0 and 1.");
                }
                wanted.add(scalar.value());
            }
        } else {
            for (Limit limit : limits) {
                double x = limit instanceof Limit.Time time
                        ? time.conversion()
                        : limit instanceof Limit.Hold hold && hold.barrier().isEmpty() ? hold.conversion() : 0;
                if (x > 0 && !wanted.contains(x)) {
                    wanted.add(x);
                }
            }
        }
        for (double x : wanted) {
            if (law.isPresent() && !law.get().reaches(x)) {
                throw new Refusal("A conversion of " + Words.percent(x) + " needs more of the other reactant.");
            }
        }
        return wanted;
    }

    private static void reach(RateLaw law, double conversion, Reading at) throws Refusal {
        if (!law.reaches(conversion)) {
            throw new Refusal("The conversion in the " + at.place()
                    + " needs more of the other reactant than otherConcentration states.");
        }
    }

    private RateLaw ownLaw(Reading at) throws Refusal {
        double own = needOrder(at);
        return law.orElseThrow(() -> new Refusal("The " + at.place()
                + " needs a rateLaw with the initial concentration beside the limits: the rate table is of order "
                + Words.number(own) + "."));
    }

    private double needOrder(Reading at) throws Refusal {
        return order.orElseThrow(() ->
                new Refusal("The " + at.place() + " needs measured rate constants; the campaign has no rate table."));
    }

    /** The stated rate law, or first order where nothing else is possible; empty when it cannot be known. */
    private static Optional<RateLaw> law(Reading holder, OptionalDouble order) throws Refusal {
        if (!holder.has("rateLaw")) {
            return order.isPresent() && order.getAsDouble() == 1 ? Optional.of(RateLaw.FIRST) : Optional.empty();
        }
        Reading at = Reading.of(holder.group().get("rateLaw").get(), "rate law");
        at.only("kind", "order", "concentration", "otherConcentration");
        String word = at.text("kind", "first, second, order or reversible first");
        RateLaw.Kind kind = null;
        for (RateLaw.Kind each : RateLaw.Kind.values()) {
            kind = each.word().equals(word) ? each : kind;
        }
        if (kind == null) {
            throw new Refusal("The rate law has the kind \"" + word
                    + "\", which is not known; expected first, second, order or reversible first.");
        }
        double own = kind == RateLaw.Kind.SECOND ? 2 : kind == RateLaw.Kind.ORDER ? at.number("order", "n") : 1;
        if (!(own >= 0)) {
            throw new Refusal("The order in the rate law must not be negative.");
        }
        if (order.isPresent() && order.getAsDouble() != own) {
            throw new Refusal("The rate law is of order " + Words.number(own) + ", the rate constants are of order "
                    + Words.number(order.getAsDouble()) + " by their unit; state the law that fits.");
        }
        if (own == 1) {
            return Optional.of(new RateLaw(kind, 1, 1, 1));
        }
        double c = at.concentration("concentration", "the initial concentration of the reactant");
        double other = c;
        if (at.has("otherConcentration")) {
            if (kind != RateLaw.Kind.SECOND) {
                throw new Refusal("otherConcentration in the rate law belongs to the kind second.");
            }
            other = at.concentration("otherConcentration", "the initial concentration of the other reactant");
        }
        return Optional.of(new RateLaw(kind, own, c, other));
    }

    /** The kind itself, numbered from the second of its kind on. */
    private String id(String kind) {
        String id = kind;
        int number = 1;
        while (!ids.add(id)) {
            number++;
            id = kind + "-" + number;
        }
        return id;
    }
}
