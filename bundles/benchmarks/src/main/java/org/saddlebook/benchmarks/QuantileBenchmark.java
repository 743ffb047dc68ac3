package org.saddlebook.benchmarks;

import java.util.concurrent.TimeUnit;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Fork;
import org.openjdk.jmh.annotations.Measurement;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Param;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.annotations.Warmup;
import org.saddlebook.estimation.api.StudentT;

/** Student's quantile for the degrees of freedom that small campaigns have. */
@State(Scope.Thread)
@BenchmarkMode(Mode.Throughput)
@OutputTimeUnit(TimeUnit.SECONDS)
@Warmup(iterations = 3, time = 1)
@Measurement(iterations = 5, time = 1)
@Fork(1)
public class QuantileBenchmark {
    /** Degrees of freedom. */
    @Param({"1", "3", "4", "6", "10.5", "100"})
    public double dof;

    private int count;

    /** A probability not asked for lately: the whole computation. */
    @Benchmark
    public double computed() {
        count = (count + 1) % 100_000;
        return StudentT.quantile(0.9 + 0.0000009 * count, dof);
    }

    /** The probability asked for before, as a series of fits does. */
    @Benchmark
    public double remembered() {
        return StudentT.quantile(0.975, dof);
    }
}
