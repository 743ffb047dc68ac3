package org.saddlebook.barrier.api;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.Supplier;
import org.saddlebook.api.campaign.ErrorModel;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.findings.Section;
import org.saddlebook.api.model.FittedModel;
import org.saddlebook.api.model.Inapplicable;
import org.saddlebook.api.model.RateContext;
import org.saddlebook.api.model.TunnellingModel;
import org.saddlebook.api.quantity.Unit;
import org.saddlebook.barrier.internal.ContextNode;
import org.saddlebook.barrier.internal.TreeReader;
import org.saddlebook.units.api.UnitException;
import org.saddlebook.units.api.Units;

/**
 * The fitted laws of a section {@code barrier}, read back from findings: whoever has the findings needs neither the
 * measurements nor the bundles of then. Temperatures in K.
 */
public final class FittedLaws {
    /** Marks a member of the basis that stands for the natural logarithm of the parameter's SI value. */
    public static final String LOGARITHM = "ln ";

    private final RateContext context;
    private final boolean conditionsAssumed;
    private final double lowestKelvin;
    private final double highestKelvin;
    private final double centreKelvin;
    private final double level;
    private final boolean stated;
    private final boolean targetOnSameSensor;
    private final List<FittedLawView> laws;
    private final List<String> candidates;

    /**
     * One fitted law.
     *
     * @param id id of the rate model
     * @param title name of the law
     * @param fitted estimates, covariance, degrees of freedom
     * @param newRun how one more run would scatter
     * @param sharedErrors errors common to all runs, as the findings state them; the covariance includes them
     */
    public record FittedLawView(String id, String title, FittedModel fitted, NewRun newRun, List<Node> sharedErrors) {
        /** Copies the list. */
        public FittedLawView {
            sharedErrors = List.copyOf(sharedErrors);
        }

        /**
         * Covariance from errors common to all runs alone, whose quantiles are normal; the rest of the covariance has the
         * fit's degrees of freedom. In the order of the basis, zero where none is stated.
         */
        public double[][] sharedCovariance() {
            int size = fitted.basis().size();
            double[][] covariance = new double[size][size];
            for (Node each : sharedErrors) {
                List<Node> shift = TreeReader.items((Node.Group) each, "shift");
                for (int i = 0; i < size; i++) {
                    for (int j = 0; j < size; j++) {
                        covariance[i][j] += ((Node.Scalar) shift.get(i)).value() * ((Node.Scalar) shift.get(j)).value();
                    }
                }
            }
            return covariance;
        }
    }

    private FittedLaws(Node.Group body, Supplier<List<TunnellingModel>> corrections) {
        Node.Group surroundings = TreeReader.group(body, "context");
        context = resolved(ContextNode.read(surroundings), corrections);
        conditionsAssumed =
                surroundings.get("conditionsAssumed").orElse(null) instanceof Node.Flag flag && flag.value();
        Node.Group table = TreeReader.group(body, "table");
        lowestKelvin = kelvin(table, "lowest");
        highestKelvin = kelvin(table, "highest");
        centreKelvin = kelvin(table, "centre");
        level = TreeReader.number(body, "level");
        stated = ErrorModel.of(TreeReader.text(body, "errorModel")).isStated();
        targetOnSameSensor = body.get("targets").isPresent()
                && TreeReader.text(body, "targets").equals("same-sensor");
        List<FittedLawView> read = new ArrayList<>();
        for (Node model : TreeReader.items(body, "models")) {
            if (model instanceof Node.Group group
                    && TreeReader.text(group, "outcome").equals("fitted")) {
                read.add(law(group));
            }
        }
        laws = List.copyOf(read);
        List<String> ids = new ArrayList<>();
        if (body.get("comparison").isPresent()) {
            for (Node id : TreeReader.items(TreeReader.group(body, "comparison"), "candidates")) {
                ids.add(((Node.Text) id).value());
            }
        }
        candidates = List.copyOf(ids);
    }

    /**
     * The laws of a section.
     *
     * @throws IllegalArgumentException when the section is not one that the barrier analysis wrote, or was refused
     */
    public static FittedLaws of(Section barrier) {
        return of(barrier, List::of);
    }

    /**
     * The laws of a section, with stated tunnelling applied.
     *
     * @param corrections the installed tunnelling corrections, asked for only when the section states one; where the right
     *     one is missing, laws of transition-state theory refuse to be bound
     * @throws IllegalArgumentException as {@link #of(Section)}
     */
    public static FittedLaws of(Section barrier, Supplier<List<TunnellingModel>> corrections) {
        if (!(barrier.body() instanceof Node.Group group)) {
            throw new IllegalArgumentException("the section is no group");
        }
        return new FittedLaws(group, corrections);
    }

    private static RateContext resolved(RateContext context, Supplier<List<TunnellingModel>> corrections) {
        if (context.tunnelling().isEmpty()) {
            return context;
        }
        try {
            return TunnellingModel.resolve(context, corrections.get());
        } catch (Inapplicable missing) {
            return context;
        }
    }

    /** Every fitted law, in order of the findings. */
    public List<FittedLawView> laws() {
        return laws;
    }

    /** The fitted law with this id. */
    public Optional<FittedLawView> law(String id) {
        return laws.stream().filter(law -> law.id().equals(id)).findFirst();
    }

    /** Ids of the laws that the comparison left standing; more than one when they cannot be told apart. */
    public List<String> candidates() {
        return candidates;
    }

    /** The first law left standing that has a covariance, else the first that has one; empty when none has. */
    public Optional<FittedLawView> preferred() {
        return laws.stream()
                .filter(law -> law.fitted().hasCovariance() && candidates.contains(law.id()))
                .findFirst()
                .or(() -> laws.stream()
                        .filter(law -> law.fitted().hasCovariance())
                        .findFirst());
    }

    /** The context every law was bound to, without held parameters. */
    public RateContext context() {
        return context;
    }

    /** Whether nobody stated the conditions of the context: a law that depends on them must not predict. */
    public boolean conditionsAssumed() {
        return conditionsAssumed;
    }

    /** Lowest measured temperature that was used, K. */
    public double lowestKelvin() {
        return lowestKelvin;
    }

    /** Highest measured temperature that was used, K. */
    public double highestKelvin() {
        return highestKelvin;
    }

    /** Centre of the table, K: where slope and intercept are uncorrelated. */
    public double centreKelvin() {
        return centreKelvin;
    }

    /** Coverage probability of the section's intervals. */
    public double level() {
        return level;
    }

    /** Whether the covariance rests on stated uncertainties (normal quantiles), not on the scatter (t quantiles). */
    public boolean stated() {
        return stated;
    }

    /** Whether target temperatures are read on the thermometer of the measurements; else they are true ones. */
    public boolean targetOnSameSensor() {
        return targetOnSameSensor;
    }

    private FittedLawView law(Node.Group group) {
        String id = TreeReader.text(group, "id");
        Node.Group parameters = TreeReader.group(group, "parameters");
        List<String> symbols = new ArrayList<>();
        List<Node> basis = TreeReader.items(group, "basis");
        double[] values = new double[basis.size()];
        double[] factors = new double[values.length];
        for (int i = 0; i < values.length; i++) {
            String name = ((Node.Text) basis.get(i)).value();
            boolean logarithm = name.startsWith(LOGARITHM);
            String symbol = logarithm ? name.substring(LOGARITHM.length()) : name;
            Node.Quantity quantity = TreeReader.quantity(parameters, symbol);
            Unit unit = unit(quantity.unit());
            double si = unit.toSi(quantity.value()
                    .orElseThrow(() -> new IllegalArgumentException(
                            "parameter “" + symbol + "” of " + id + " is beyond the range of numbers")));
            symbols.add(symbol);
            values[i] = logarithm ? StrictMath.log(si) : si;
            factors[i] = logarithm ? 1 : unit.factor();
        }
        double[][] covariance = new double[0][];
        if (group.get("covariance").isPresent()) {
            covariance = TreeReader.member(TreeReader.group(group, "covariance"), "matrix", Node.Matrix.class)
                    .toArray();
            for (int i = 0; i < covariance.length; i++) {
                for (int j = 0; j < covariance.length; j++) {
                    covariance[i][j] *= factors[i] * factors[j];
                }
            }
        }
        NewRun newRun = new NewRun(
                group.get("newRunScatter").isPresent()
                        ? OptionalDouble.of(TreeReader.number(group, "newRunScatter"))
                        : OptionalDouble.empty(),
                si(group, "newRunRate"),
                si(group, "newRunKelvin"));
        double dof = TreeReader.number(TreeReader.group(group, "statistics"), "dof");
        FittedModel fitted = new FittedModel(
                id, held(group), symbols, values, covariance, stated ? OptionalDouble.empty() : OptionalDouble.of(dof));
        List<Node> shared = group.get("sharedErrors").isPresent() ? TreeReader.items(group, "sharedErrors") : List.of();
        return new FittedLawView(id, TreeReader.text(group, "title"), fitted, newRun, shared);
    }

    private static OptionalDouble si(Node.Group group, String key) {
        if (group.get(key).isEmpty()) {
            return OptionalDouble.empty();
        }
        Node.Quantity quantity = TreeReader.quantity(group, key);
        return OptionalDouble.of(
                quantity.value().orElseThrow() * unit(quantity.unit()).factor());
    }

    /** The context with the parameters that were held in this fit. */
    private RateContext held(Node.Group group) {
        RateContext own = context;
        if (group.get("held").isPresent()) {
            Node.Group held = TreeReader.group(group, "held");
            for (String symbol : held.members().keySet()) {
                own = own.withFixed(symbol, TreeReader.number(held, symbol));
            }
        }
        return own;
    }

    private static double kelvin(Node.Group table, String key) {
        return TreeReader.quantity(table, key).value().orElseThrow();
    }

    private static Unit unit(String code) {
        try {
            return Units.parse(code);
        } catch (UnitException unreadable) {
            throw new IllegalArgumentException(unreadable.getMessage(), unreadable);
        }
    }
}
