package org.saddlebook.benchmarks;

import java.util.List;
import java.util.SplittableRandom;
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
import org.saddlebook.estimation.api.Bootstrap;
import org.saddlebook.estimation.api.BootstrapKind;
import org.saddlebook.estimation.api.CurveFunction;
import org.saddlebook.estimation.api.Fit;
import org.saddlebook.estimation.api.MeasuredPoints;
import org.saddlebook.estimation.api.NonlinearFit;
import org.saddlebook.estimation.api.NonlinearLeastSquares;
import org.saddlebook.estimation.api.NonlinearOptions;
import org.saddlebook.estimation.api.OrthogonalRegression;
import org.saddlebook.estimation.api.ProfileLikelihood;
import org.saddlebook.estimation.api.RandomStreams;
import org.saddlebook.estimation.api.ResampleOptions;
import org.saddlebook.estimation.api.Resamples;
import org.saddlebook.estimation.api.ResponseFunction;
import org.saddlebook.estimation.api.Scale;

/** Intervals and fits beyond plain least squares, on eight points and one thread. Invented numbers. */
@State(Scope.Thread)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.MICROSECONDS)
@Warmup(iterations = 3, time = 2)
@Measurement(iterations = 5, time = 2)
@Fork(1)
public class UncertaintyBenchmark {
    private static final int POINTS = 8;
    private static final int RESPONSES = 64;

    private final double[] kelvin = new double[POINTS];
    private final double[] inverse = new double[POINTS];
    private final double[] inverseDeviation = new double[POINTS];
    private final double[] deviation = new double[POINTS];
    private final double[][] design = new double[POINTS][];
    private final double[][] responses = new double[RESPONSES][POINTS];
    private final double[][] rates = new double[RESPONSES][POINTS];
    private final double[][] weights = new double[RESPONSES][POINTS];
    private final RandomStreams streams = name -> new SplittableRandom(name.hashCode());
    private final ResponseFunction law = new Law();
    private final CurveFunction line = new Line();
    private int next;

    /** Fills the tables. */
    @Setup
    public void fill() {
        for (int i = 0; i < POINTS; i++) {
            kelvin[i] = 300 + 7.5 * i;
            inverse[i] = 1000 / kelvin[i];
            inverseDeviation[i] = 0.3 * inverse[i] / kelvin[i];
            deviation[i] = 0.03;
            design[i] = new double[] {1, StrictMath.log(kelvin[i] / 325), 1 / kelvin[i] - 1 / 325.0};
            for (int r = 0; r < RESPONSES; r++) {
                double noise = 0.02 * StrictMath.sin(17.0 * i + 5.0 * r);
                responses[r][i] = 25 - 9 * inverse[i] + noise;
                rates[r][i] = StrictMath.exp(-9000 * design[i][2] + noise);
                weights[r][i] = 1 / (rates[r][i] * rates[r][i]);
            }
        }
    }

    private int turn() {
        next = (next + 1) % RESPONSES;
        return next;
    }

    /** The line with errors in both variables: parameters and covariance. */
    @Benchmark
    public Object lineWithErrorsInBoth() {
        MeasuredPoints points = MeasuredPoints.of(inverse, responses[turn()], inverseDeviation, deviation);
        return ((Fit) OrthogonalRegression.fitLine(points)).unscaledCovariance();
    }

    /** The same by the general method, from one start. */
    @Benchmark
    public Object curveWithErrorsInBoth() {
        MeasuredPoints points = MeasuredPoints.of(inverse, responses[turn()], inverseDeviation, deviation);
        NonlinearOptions quick = NonlinearOptions.defaults().withThorough(false);
        return ((Fit) OrthogonalRegression.fit(line, points, List.of(new double[] {20, -8}), quick))
                .unscaledCovariance();
    }

    /** Fit of a three-parameter law to k, and the profile interval of each parameter. */
    @Benchmark
    public void fitAndThreeProfiles(Blackhole sink) {
        int r = turn();
        NonlinearOptions options = NonlinearOptions.defaults();
        NonlinearFit fit = (NonlinearFit)
                NonlinearLeastSquares.fit(law, rates[r], weights[r], List.of(new double[] {0, 0, 9000}), options);
        for (int j = 0; j < 3; j++) {
            sink.consume(ProfileLikelihood.of(fit, law, rates[r], weights[r], j, 0.95, Scale.ESTIMATED, options));
        }
    }

    /** 10,000 residual resamples of a three-parameter law, percentile and BCa interval of each parameter. */
    @Benchmark
    public void residualBootstrap(Blackhole sink) {
        bootstrap(BootstrapKind.RESIDUAL, sink);
    }

    /** The same, drawing whole observations. */
    @Benchmark
    public void caseBootstrap(Blackhole sink) {
        bootstrap(BootstrapKind.CASE, sink);
    }

    /** The same with normal errors. */
    @Benchmark
    public void parametricBootstrap(Blackhole sink) {
        bootstrap(BootstrapKind.PARAMETRIC_ESTIMATED, sink);
    }

    private void bootstrap(BootstrapKind kind, Blackhole sink) {
        Resamples resamples = (Resamples)
                Bootstrap.linear(kind, design, responses[turn()], null, ResampleOptions.defaults(), streams);
        for (int j = 0; j < 3; j++) {
            sink.consume(resamples.percentile(Resamples.parameter(j), 0.95));
            sink.consume(resamples.bca(Resamples.parameter(j), 0.95));
        }
    }

    private static final class Line implements CurveFunction {
        @Override
        public int parameterCount() {
            return 2;
        }

        @Override
        public double value(double x, double[] p, double[] gradient) {
            gradient[0] = 1;
            gradient[1] = x;
            gradient[2] = p[1];
            return p[0] + p[1] * x;
        }
    }

    private final class Law implements ResponseFunction {
        @Override
        public int observations() {
            return POINTS;
        }

        @Override
        public int parameterCount() {
            return 3;
        }

        @Override
        public void evaluate(double[] p, double[] values, double[][] jacobian) {
            for (int i = 0; i < POINTS; i++) {
                double[] row = design[i];
                double k = StrictMath.exp(p[0] + p[1] * row[1] - p[2] * row[2]);
                values[i] = k;
                jacobian[i][0] = k;
                jacobian[i][1] = k * row[1];
                jacobian[i][2] = -k * row[2];
            }
        }
    }
}
