package org.saddlebook.barrier.internal;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.ToDoubleFunction;
import org.saddlebook.api.findings.Interval;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.model.Parameter;
import org.saddlebook.api.quantity.Unit;
import org.saddlebook.api.task.Cancelled;
import org.saddlebook.api.task.Task;
import org.saddlebook.estimation.api.Bootstrap;
import org.saddlebook.estimation.api.LinearFit;
import org.saddlebook.estimation.api.MonteCarlo;
import org.saddlebook.estimation.api.NonlinearFit;
import org.saddlebook.estimation.api.NotResampled;
import org.saddlebook.estimation.api.ProfileInterval;
import org.saddlebook.estimation.api.ProfileLikelihood;
import org.saddlebook.estimation.api.ProfileLimit;
import org.saddlebook.estimation.api.ResampleOptions;
import org.saddlebook.estimation.api.ResampleOutcome;
import org.saddlebook.estimation.api.Resamples;
import org.saddlebook.estimation.api.Scale;

/** The intervals that were asked for, beside the usual ones and never in their place, each with its measured coverage. */
final class OtherIntervals {
    private final IntervalRequest request;
    private final Unit rateUnit;
    private final double level;
    private final List<Double> targets;
    private final Task task;
    private final List<List<Node>> rows = new ArrayList<>();
    private final List<String> notes = new ArrayList<>();

    OtherIntervals(IntervalRequest request, Unit rateUnit, double level, List<Double> targetsKelvin, Task task) {
        this.request = request;
        this.rateUnit = rateUnit;
        this.level = level;
        this.targets = targetsKelvin;
        this.task = task;
    }

    /** Table and sentences; empty when nothing was asked for. */
    Optional<Node.Group> node(List<FittedLaw> laws) throws Cancelled {
        if (request.methods().isEmpty()) {
            return Optional.empty();
        }
        int done = 0;
        for (FittedLaw law : laws) {
            for (IntervalMethod method : request.methods()) {
                task.progress(
                        (double) done / (request.methods().size() * laws.size()), method.key() + ", " + law.title());
                task.check();
                rows(method, law);
                done++;
            }
        }
        for (IntervalMethod method : request.methods()) {
            note(method.key() + ": " + method.coverage());
        }
        if (request.methods().contains(IntervalMethod.PROFILE)) {
            note("profile: of parameters; k at a temperature has none.");
        }
        notes.add("t: " + Coverage.T);
        boolean shared = false;
        for (FittedLaw law : laws) {
            shared |= !law.shared().isEmpty();
        }
        if (shared) {
            notes.add("Errors common to all runs are not in these intervals, but are in those of the laws above.");
        }
        Tree tree = new Tree();
        if (!rows.isEmpty()) {
            tree.put(
                    "table",
                    new Node.Table(
                            List.of(
                                    new Node.Column("model", "Law", ""),
                                    new Node.Column("quantity", "Quantity", ""),
                                    new Node.Column("method", "Method", ""),
                                    new Node.Column("interval", "Interval", "")),
                            rows));
        }
        return Optional.of(tree.put("notes", Tree.texts(notes)).group());
    }

    private void rows(IntervalMethod method, FittedLaw law) throws Cancelled {
        String name = method.key() + ", " + law.title() + ": ";
        if (law.scale().isEmpty()) {
            notes.add(name + "no degree of freedom is left to estimate the scatter from.");
        } else if (law.fit() instanceof DistanceFit && method != IntervalMethod.MONTE_CARLO) {
            notes.add(name + "not offered with errors in both variables.");
        } else if (method.isBootstrap() && law.data().size() < IntervalRequest.FEWEST_POINTS && !request.fewPoints()) {
            note(method.key() + ": refused for " + law.data().size() + " points; below " + IntervalRequest.FEWEST_POINTS
                    + " it covers far less than it says. State “bootstrap of few points: accepted” to have it all the"
                    + " same.");
        } else {
            try {
                if (method == IntervalMethod.PROFILE) {
                    profile(law);
                } else {
                    resampled(method, law);
                }
            } catch (CancelCheck.Stopped stopped) {
                throw new Cancelled();
            }
        }
    }

    private void note(String text) {
        if (!notes.contains(text)) {
            notes.add(text);
        }
    }

    private Scale scale(FittedLaw law) {
        return law.data().stated() ? Scale.STATED : Scale.ESTIMATED;
    }

    private void profile(FittedLaw law) {
        for (int j = 0; j < law.parameters().size(); j++) {
            ProfileInterval interval = profile(law, j);
            Parameter parameter = law.parameters().get(j);
            OptionalDouble lower = end(law, parameter, interval.lower());
            OptionalDouble upper = end(law, parameter, interval.upper());
            row(
                    law,
                    Words.symbol(parameter.symbol()),
                    "profile",
                    interval.estimate(),
                    parameter.scale(),
                    parameter.unit(),
                    lower,
                    upper);
        }
    }

    private ProfileInterval profile(FittedLaw law, int parameter) {
        if (law.fit() instanceof LinearFit linear) {
            return ProfileLikelihood.of(linear, parameter, level, scale(law));
        }
        NonlinearFitter.Problem problem = NonlinearFitter.problem(law.law(), law.data(), new CancelCheck(task));
        return ProfileLikelihood.of(
                (NonlinearFit) law.fit(),
                problem.function(),
                problem.response(),
                law.data().weights(),
                parameter,
                level,
                scale(law),
                problem.options());
    }

    private OptionalDouble end(FittedLaw law, Parameter parameter, ProfileLimit limit) {
        if (limit instanceof ProfileLimit.At at) {
            return OptionalDouble.of(at.value());
        }
        String reason = limit instanceof ProfileLimit.Open open ? open.reason() : ((ProfileLimit.Lost) limit).reason();
        notes.add("profile, " + law.title() + ", " + Words.symbol(parameter.symbol()) + ": one end is open, " + reason
                + ".");
        return OptionalDouble.empty();
    }

    private void resampled(IntervalMethod method, FittedLaw law) {
        ResampleOptions options = ResampleOptions.defaults()
                .withResamples(request.resamples())
                .withStream("barrier/" + method.key() + "/" + law.id())
                .withCheck(new CancelCheck(task));
        ResampleOutcome outcome = draw(method, law, options);
        if (outcome instanceof NotResampled refused) {
            notes.add(method.key() + ", " + law.title() + ": " + refused.reason() + ".");
            return;
        }
        Resamples resamples = (Resamples) outcome;
        if (resamples.redrawn() > 0) {
            notes.add(method.key() + ", " + law.title() + ": " + resamples.redrawn()
                    + " samples did not determine the parameters and were drawn again.");
        }
        for (int j = 0; j < law.parameters().size(); j++) {
            Parameter parameter = law.parameters().get(j);
            rows(
                    method,
                    law,
                    resamples,
                    Words.symbol(parameter.symbol()),
                    Resamples.parameter(j),
                    parameter.scale(),
                    parameter.unit());
        }
        double[] unused = new double[law.parameters().size()];
        for (double kelvin : targets) {
            if (!law.defined(kelvin)) {
                continue;
            }
            rows(
                    method,
                    law,
                    resamples,
                    "k at " + Words.kelvin(kelvin),
                    p -> law.law().lnRate(kelvin, p.clone(), unused),
                    Parameter.Scale.LOG,
                    rateUnit);
        }
    }

    private ResampleOutcome draw(IntervalMethod method, FittedLaw law, ResampleOptions options) {
        if (method == IntervalMethod.MONTE_CARLO) {
            return MonteCarlo.draw(law.fit(), scale(law), options, task::random);
        }
        Optional<LinearForm> form = LinearForm.of(law);
        if (form.isPresent()) {
            return Bootstrap.linear(
                    method.kind(law.data().stated()),
                    form.get().design(),
                    form.get().response(),
                    form.get().weightsOrNull(),
                    options,
                    task::random);
        }
        NonlinearFitter.Problem problem = NonlinearFitter.problem(law.law(), law.data(), new CancelCheck(task));
        return Bootstrap.nonlinear(
                method.kind(law.data().stated()),
                (NonlinearFit) law.fit(),
                problem.function(),
                problem.response(),
                law.data().weights(),
                problem.options(),
                options,
                task::random);
    }

    private void rows(
            IntervalMethod method,
            FittedLaw law,
            Resamples resamples,
            String quantity,
            ToDoubleFunction<double[]> function,
            Parameter.Scale scale,
            Unit unit) {
        double estimate = function.applyAsDouble(law.fit().parameters());
        org.saddlebook.estimation.api.Interval percentile = resamples.percentile(function, level);
        row(
                law,
                quantity,
                method.key() + ", percentile",
                estimate,
                scale,
                unit,
                OptionalDouble.of(percentile.lower()),
                OptionalDouble.of(percentile.upper()));
        if (method.isBootstrap()) {
            Optional<org.saddlebook.estimation.api.Interval> bca = resamples.bca(function, level);
            if (bca.isPresent()) {
                row(
                        law,
                        quantity,
                        method.key() + ", BCa",
                        estimate,
                        scale,
                        unit,
                        OptionalDouble.of(bca.get().lower()),
                        OptionalDouble.of(bca.get().upper()));
            }
        }
    }

    private void row(
            FittedLaw law,
            String quantity,
            String method,
            double estimate,
            Parameter.Scale scale,
            Unit unit,
            OptionalDouble lower,
            OptionalDouble upper) {
        OptionalDouble low = shown(lower, scale, unit);
        OptionalDouble high = shown(upper, scale, unit);
        OptionalDouble value = shown(OptionalDouble.of(estimate), scale, unit);
        Interval interval = low.isPresent() && high.isPresent()
                ? Interval.between(low.getAsDouble(), high.getAsDouble(), level, method)
                : low.isPresent()
                        ? new Interval(Interval.Kind.AT_LEAST, level, low, OptionalDouble.empty(), method)
                        : high.isPresent()
                                ? new Interval(Interval.Kind.AT_MOST, level, OptionalDouble.empty(), high, method)
                                : Interval.everything(level, method);
        rows.add(List.of(
                new Node.Text(law.title()),
                new Node.Text(quantity),
                new Node.Text(method),
                new Node.Quantity(
                        value,
                        unit.code(),
                        OptionalDouble.empty(),
                        OptionalDouble.empty(),
                        Optional.of(interval),
                        List.of())));
    }

    /** In the unit shown; absent beyond the range of a double. */
    private static OptionalDouble shown(OptionalDouble value, Parameter.Scale scale, Unit unit) {
        if (value.isEmpty()) {
            return value;
        }
        double number = scale == Parameter.Scale.LOG
                ? StrictMath.exp(value.getAsDouble()) / unit.factor()
                : unit.fromSi(value.getAsDouble());
        boolean representable = Double.isFinite(number) && (scale != Parameter.Scale.LOG || number > 0);
        return representable ? OptionalDouble.of(number) : OptionalDouble.empty();
    }
}
