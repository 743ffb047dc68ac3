package org.saddlebook.benchmarks;

import java.util.concurrent.TimeUnit;
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
import org.openjdk.jmh.infra.Blackhole;
import org.saddlebook.estimation.api.LinearFit;
import org.saddlebook.estimation.api.LinearLeastSquares;
import org.saddlebook.estimation.api.StudentT;

/**
 * Fits of eight points with covariance and t intervals: a straight line and a three-parameter law in temperature, weighted
 * and not. Invented numbers; another response is taken each time so that nothing can be folded away.
 */
@State(Scope.Thread)
@BenchmarkMode(Mode.Throughput)
@OutputTimeUnit(TimeUnit.SECONDS)
@Warmup(iterations = 3, time = 2)
@Measurement(iterations = 5, time = 2)
@Fork(1)
public class LineFitBenchmark {
    private static final int POINTS = 8;
    private static final int RESPONSES = 64;

    private final double[][] line = new double[POINTS][];
    private final double[][] curved = new double[POINTS][];
    private final double[][] responses = new double[RESPONSES][POINTS];
    private final double[] weights = new double[POINTS];
    private int next;

    /** Fills the tables. */
    @Setup
    public void fill() {
        for (int i = 0; i < POINTS; i++) {
            double kelvin = 300 + 7.5 * i;
            line[i] = new double[] {1, 1 / kelvin - 1 / 325.0};
            curved[i] = new double[] {1, StrictMath.log(kelvin / 325), 1 / kelvin - 1 / 325.0};
            weights[i] = 400 + 35 * i;
            for (int r = 0; r < RESPONSES; r++) {
                responses[r][i] = 25 - 9000 / kelvin + 0.02 * StrictMath.sin(17.0 * i + 5.0 * r);
            }
        }
    }

    private double[] response() {
        next = (next + 1) % RESPONSES;
        return responses[next];
    }

    /** Eight points, two parameters, equal weights. */
    @Benchmark
    public void straightLine(Blackhole sink) {
        intervals(line, null, sink);
    }

    /** Eight points, two parameters, stated weights. */
    @Benchmark
    public void weightedStraightLine(Blackhole sink) {
        intervals(line, weights, sink);
    }

    /** Eight points, three parameters, equal weights. */
    @Benchmark
    public void threeParameters(Blackhole sink) {
        intervals(curved, null, sink);
    }

    private void intervals(double[][] design, double[] weightsOrNull, Blackhole sink) {
        if (LinearLeastSquares.fit(design, response(), weightsOrNull) instanceof LinearFit fit) {
            double[] parameters = fit.parameters();
            double[][] covariance = fit.unscaledCovariance();
            double variance = fit.residualVariance();
            double quantile = StudentT.quantile(0.975, fit.degreesOfFreedom());
            for (int j = 0; j < parameters.length; j++) {
                double half = quantile * Math.sqrt(variance * covariance[j][j]);
                sink.consume(parameters[j] - half);
                sink.consume(parameters[j] + half);
            }
            sink.consume(covariance);
        } else {
            throw new IllegalStateException("eight distinct temperatures determine the law");
        }
    }
}
