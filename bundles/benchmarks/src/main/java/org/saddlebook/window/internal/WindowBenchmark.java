package org.saddlebook.window.internal;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.SplittableRandom;
import java.util.concurrent.TimeUnit;
import java.util.function.IntFunction;
import java.util.random.RandomGenerator;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Fork;
import org.openjdk.jmh.annotations.Measurement;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.Setup;
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.annotations.Warmup;
import org.saddlebook.api.model.FittedModel;
import org.saddlebook.api.model.Inapplicable;
import org.saddlebook.api.model.RateContext;
import org.saddlebook.api.quantity.Dimension;
import org.saddlebook.api.quantity.Unit;
import org.saddlebook.api.task.Cancelled;
import org.saddlebook.api.task.Task;
import org.saddlebook.barrier.api.FittedLaws;
import org.saddlebook.barrier.api.NewRun;
import org.saddlebook.model.arrhenius.internal.Arrhenius;
import org.saddlebook.spontaneity.api.EquilibriumExtent;
import org.saddlebook.spontaneity.api.EquilibriumStart;

/**
 * An operating window of 20,000 draws at 200 temperatures on one core: drawing, probability, ends, whole-interval
 * probability. Lies in the package of what it measures, which exports nothing. Invented numbers.
 */
@State(Scope.Thread)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.MILLISECONDS)
@Warmup(iterations = 3, time = 2)
@Measurement(iterations = 5, time = 2)
@Fork(1)
public class WindowBenchmark {
    private static final int DRAWS = 20_000;

    private BoundLaw law;
    private Headroom irreversible;
    private Headroom reversible;
    private Headroom equilibrium;
    private Headroom course;
    private Headroom reversibleCourse;
    private Task task;

    /** Binds a law of five invented points. */
    @Setup
    public void bind() throws Inapplicable {
        RateContext context = RateContext.of(new Unit("1/s", Dimension.rateConstant(1), 1, 0), 1);
        double[][] covariance = {{0.36, 990}, {990, 2.7233e6}};
        FittedModel fitted = new FittedModel(
                "arrhenius",
                context,
                List.of("A", "Ea"),
                new double[] {24.5, 90_000},
                covariance,
                OptionalDouble.of(3));
        law = new BoundLaw(
                new FittedLaws.FittedLawView("arrhenius", "Arrhenius", fitted, NewRun.UNKNOWN, List.of()),
                new Arrhenius().bind(context),
                false);
        Thermo thermo = new Thermo(
                -60_000, -165, new double[][] {{2.25e6, 5400}, {5400, 16}}, OptionalDouble.empty(), new double[0][]);
        StatedBarrier barrier = new StatedBarrier(
                null, 120_000, 32, new double[] {4e6, 0.5, 1000}, OptionalDouble.empty(), 1, true, false);
        Limit allowed = new Limit.Allowed("allowed", "allowed", "", 1);
        Limit clean = new Limit.Competing("competing", "clean", "", 0.02, barrier);
        RateLaw back = new RateLaw(RateLaw.Kind.REVERSIBLE_FIRST, 1, 1, 1);
        irreversible = new Headroom(
                List.of(allowed, new Limit.Time("time", "time", "", 0.95, 36_000, RateLaw.FIRST), clean),
                Optional.of(thermo));
        reversible = new Headroom(
                List.of(allowed, new Limit.Time("time", "time", "", 0.6, 36_000, back), clean), Optional.of(thermo));
        EquilibriumStart start = new EquilibriumStart(
                new EquilibriumExtent(
                        List.of(
                                new EquilibriumExtent.Member(-1, 1, EquilibriumExtent.Kind.SOLUTE),
                                new EquilibriumExtent.Member(1, 0, EquilibriumExtent.Kind.SOLUTE),
                                new EquilibriumExtent.Member(1, 0.1, EquilibriumExtent.Kind.SOLUTE)),
                        0,
                        1,
                        2),
                0);
        equilibrium = new Headroom(
                List.of(
                        new Limit.Equilibrium("equilibrium", "equilibrium", "", 0.6),
                        new Limit.Time("time", "time", "", 0.95, 36_000, RateLaw.FIRST),
                        clean),
                Optional.of(thermo),
                Optional.of(start));
        double hour = 3600;
        Course batch = new Course(
                new double[] {0, hour, 8 * hour, 10 * hour},
                new double[] {293.15, 0, 0, 293.15},
                new boolean[] {false, true, true, false},
                false);
        course = new Headroom(
                List.of(
                        allowed,
                        new Limit.Time("time", "time", "", 0.95, 10 * hour, RateLaw.FIRST, Optional.of(batch)),
                        clean),
                Optional.of(thermo));
        reversibleCourse = new Headroom(
                List.of(allowed, new Limit.Time("time", "time", "", 0.6, 10 * hour, back, Optional.of(batch)), clean),
                Optional.of(thermo));
        task = new OneCore();
    }

    /** Three limits that are linear in what is uncertain. */
    @Benchmark
    public Object linearLimits() throws Cancelled {
        return window(irreversible);
    }

    /** The same with a reversible rate law. */
    @Benchmark
    public Object reversibleLaw() throws Cancelled {
        return window(reversible);
    }

    /** The equilibrium conversion from a stated start in place of ΔG. */
    @Benchmark
    public Object equilibriumConversion() throws Cancelled {
        return window(equilibrium);
    }

    /** The rate integrated over a batch: heating, holding, cooling. */
    @Benchmark
    public Object courseOfTemperature() throws Cancelled {
        return window(course);
    }

    /** A reversible reaction followed through the same batch. */
    @Benchmark
    public Object reversibleCourse() throws Cancelled {
        return window(reversibleCourse);
    }

    private Object window(Headroom headroom) throws Cancelled {
        Limit.Equipment walls = Limit.Equipment.none();
        Draws draws = Draws.make(headroom, walls, List.of(law), new double[] {1}, DRAWS, task);
        return new WindowSearch(draws, walls, 290, 400, 0.95, task).intervals();
    }

    /** A task that does everything in turn. */
    private static final class OneCore implements Task {
        @Override
        public void progress(double fraction, String doing) {
            // Nobody looks.
        }

        @Override
        public void check() {
            // Nobody cancels.
        }

        @Override
        public RandomGenerator random(String stream) {
            return new SplittableRandom(stream.hashCode());
        }

        @Override
        public <T> List<T> parts(int count, IntFunction<T> part) {
            List<T> results = new ArrayList<>();
            for (int i = 0; i < count; i++) {
                results.add(part.apply(i));
            }
            return results;
        }
    }
}
