package org.saddlebook.spontaneity.internal;

import java.util.List;
import java.util.Optional;
import java.util.concurrent.TimeUnit;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Fork;
import org.openjdk.jmh.annotations.Measurement;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Param;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.Setup;
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.annotations.Warmup;
import org.saddlebook.api.quantity.Constants;
import org.saddlebook.reaction.api.Equation;
import org.saddlebook.reaction.api.ReactionException;
import org.saddlebook.thermo.data.api.CuratedSet;

/**
 * One reaction, the synthesis of ammonia, at 1,000 temperatures: ΔH, ΔS, ΔG and ln K, from each kind of data. Lies in the
 * package of what it measures, which exports nothing.
 */
@State(Scope.Thread)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.MICROSECONDS)
@Warmup(iterations = 3, time = 1)
@Measurement(iterations = 5, time = 1)
@Fork(1)
public class ReactionBenchmark {
    private static final int COUNT = 1000;

    /** Kind of species data. */
    @Param({"janaf", "shomate", "nasa-9"})
    public String source;

    private ReactionFunction function;
    private double[] kelvin;

    /** Resolves the species. */
    @Setup
    public void resolve() throws ReactionException, Refusal {
        function = ReactionFunction.of(
                SpeciesResolver.resolve(
                        Equation.parseBalanced("N2(g) + 3 H2(g) = 2 NH3(g)"),
                        List.of(CuratedSet.source()),
                        Optional.of(source),
                        Optional.empty()),
                298.15,
                1400);
        kelvin = new double[COUNT];
        for (int i = 0; i < COUNT; i++) {
            kelvin[i] = 298.15 + (1400 - 298.15) * i / (COUNT - 1);
        }
    }

    /** Everything the table of the findings holds. */
    @Benchmark
    public double[] functions() {
        double[] gibbs = function.at(kelvin)[2];
        for (int i = 0; i < COUNT; i++) {
            gibbs[i] /= -Constants.GAS * kelvin[i];
        }
        return gibbs;
    }
}
