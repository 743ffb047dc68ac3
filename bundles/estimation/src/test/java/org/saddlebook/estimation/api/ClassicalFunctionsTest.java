package org.saddlebook.estimation.api;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertInstanceOf;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import java.util.stream.Stream;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/**
 * The classical least-squares functions of J. J. Moré, B. S. Garbow and K. E. Hillstrom, ACM Trans. Math. Softw. 7 (1981) 17,
 * from their standard starts and from ten times them, through the public API alone. Functions, data and minima written down
 * from memory; a sum of squares that agrees to the printed six digits supports each of them.
 */
@Tag("validation")
class ClassicalFunctionsTest {
    private interface Residual {
        Dual at(int i, Dual[] x);
    }

    /** A function; {@code minima} are the sums of squares at its known minima. */
    @SuppressWarnings("ArrayRecordComponent") // carries a fixture
    private record Case(String name, double factor, int m, double[] start, double[] minima, Residual residual) {
        @Override
        public String toString() {
            return name + (factor == 1 ? "" : " from " + factor + " times its start");
        }
    }

    private static final double[] BARD = {.14, .18, .22, .25, .29, .32, .35, .39, .37, .58, .73, .96, 1.34, 2.10, 4.39};
    private static final double[] KOWALIK = {.1957, .1947, .1735, .1600, .0844, .0627, .0456, .0342, .0323, .0235, .0246
    };
    private static final double[] KOWALIK_U = {4, 2, 1, .5, .25, .167, .125, .1, .0833, .0714, .0625};
    private static final double[] GAUSSIAN = {
        .0009, .0044, .0175, .0540, .1295, .2420, .3521, .3989, .3521, .2420, .1295, .0540, .0175, .0044, .0009
    };
    private static final double[] MEYER = {
        34780, 28610, 23650, 19630, 16370, 13720, 11540, 9744, 8261, 7030, 6005, 5147, 4427, 3820, 3307, 2872
    };
    private static final double[] OSBORNE_1 = {
        .844, .908, .932, .936, .925, .908, .881, .850, .818, .784, .751, .718, .685, .658, .628, .603, .580, .558,
        .538, .522, .506, .490, .478, .467, .457, .448, .438, .431, .424, .420, .414, .411, .406
    };
    private static final double[] OSBORNE_2 = {
        1.366, 1.191, 1.112, 1.013, .991, .885, .831, .847, .786, .725, .746, .679, .608, .655, .616, .606, .602, .626,
        .651, .724, .649, .649, .694, .644, .624, .661, .612, .558, .533, .495, .500, .423, .395, .375, .372, .391,
        .396, .405, .428, .429, .523, .562, .607, .653, .672, .708, .633, .668, .645, .632, .591, .559, .597, .625,
        .739, .710, .729, .720, .636, .581, .428, .292, .162, .098, .054
    };

    private static double[] at(double... numbers) {
        return numbers;
    }

    private static Dual gaussian(Dual amplitude, Dual rate, Dual centre, double t) {
        return amplitude.times(centre.plus(-t).squared().times(rate).times(-1).exp());
    }

    private static Dual helical(int i, Dual[] x) {
        if (i == 0) {
            double turn = x[0].value() < 0 ? 0.5 : 0;
            Dual angle = x[1].over(x[0]).arctan().times(1 / (2 * Math.PI)).plus(turn);
            return x[2].minus(angle.times(10)).times(10);
        }
        return i == 1 ? x[0].squared().plus(x[1].squared()).sqrt().plus(-1).times(10) : x[2];
    }

    private static Dual freudenstein(int i, Dual[] x) {
        return i == 0
                ? x[0].plus(-13)
                        .plus(x[1].times(-1).plus(5).times(x[1]).plus(-2).times(x[1]))
                : x[0].plus(-29).plus(x[1].plus(1).times(x[1]).plus(-14).times(x[1]));
    }

    private static Dual wood(int i, Dual[] x) {
        return switch (i) {
            case 0 -> x[1].minus(x[0].squared()).times(10);
            case 1 -> x[0].times(-1).plus(1);
            case 2 -> x[3].minus(x[2].squared()).times(Math.sqrt(90));
            case 3 -> x[2].times(-1).plus(1);
            case 4 -> x[1].plus(x[3]).plus(-2).times(Math.sqrt(10));
            default -> x[1].minus(x[3]).times(1 / Math.sqrt(10));
        };
    }

    private static Dual biggs(int i, Dual[] x) {
        double t = (i + 1) / 10.0;
        double y = StrictMath.exp(-t) - 5 * StrictMath.exp(-10 * t) + 3 * StrictMath.exp(-4 * t);
        return x[2].times(x[0].times(-t).exp())
                .minus(x[3].times(x[1].times(-t).exp()))
                .plus(x[5].times(x[4].times(-t).exp()))
                .plus(-y);
    }

    private static Dual watson(int i, Dual[] x) {
        if (i == 29) {
            return x[0];
        }
        if (i == 30) {
            return x[1].minus(x[0].squared()).plus(-1);
        }
        double t = (i + 1) / 29.0;
        Dual first = x[1];
        Dual second = x[0];
        double power = 1;
        for (int j = 1; j < x.length; j++) {
            first = j == 1 ? first : first.plus(x[j].times(j * power));
            power *= t;
            second = second.plus(x[j].times(power));
        }
        return first.minus(second.squared()).plus(-1);
    }

    private static Dual osborne2(int i, Dual[] x) {
        double t = i / 10.0;
        return x[0].times(x[4].times(-t).exp())
                .plus(gaussian(x[1], x[5], x[8], t))
                .plus(gaussian(x[2], x[6], x[9], t))
                .plus(gaussian(x[3], x[7], x[10], t))
                .plus(-OSBORNE_2[i]);
    }

    /** Cases whose nearest minimum determines no parameters. */
    private static final Set<String> NOWHERE = Set.of(
            "Freudenstein and Roth",
            "Freudenstein and Roth from 10.0 times its start",
            "Jennrich and Sampson",
            "Beale from 10.0 times its start",
            "Bard from 10.0 times its start");

    static Stream<Case> determined() {
        return cases().filter(problem -> !leadsNowhere(problem));
    }

    static Stream<Case> cases() {
        List<Case> all = new ArrayList<>();
        for (double f : new double[] {1, 10}) {
            add(
                    all,
                    "Rosenbrock",
                    f,
                    2,
                    at(-1.2, 1),
                    at(0),
                    (i, x) -> i == 0
                            ? x[1].minus(x[0].squared()).times(10)
                            : x[0].times(-1).plus(1));
            add(all, "Freudenstein and Roth", f, 2, at(0.5, -2), at(0, 48.98425), ClassicalFunctionsTest::freudenstein);
            add(all, "Beale", f, 3, at(1, 1), at(0, 0.45201), (i, x) -> {
                Dual power = x[1];
                for (int j = 0; j < i; j++) {
                    power = power.times(x[1]);
                }
                return x[0].times(power.times(-1).plus(1)).plus(-new double[] {1.5, 2.25, 2.625}[i]);
            });
            add(all, "Helical valley", f, 3, at(-1, 0, 0), at(0), ClassicalFunctionsTest::helical);
            add(all, "Wood", f, 6, at(-3, -1, -3, -1), at(0), ClassicalFunctionsTest::wood);
            add(all, "Bard", f, 15, at(1, 1, 1), at(8.21487e-3, 17.4286), (i, x) -> {
                double u = i + 1;
                double v = 15 - i;
                double w = Math.min(u, v);
                return x[0].plus(x[0].times(0).plus(u).over(x[1].times(v).plus(x[2].times(w))))
                        .plus(-BARD[i]);
            });
            add(all, "Kowalik and Osborne", f, 11, at(.25, .39, .415, .39), at(3.07505e-4, 1.02734e-3), (i, x) -> {
                double u = KOWALIK_U[i];
                Dual top = x[0].times(x[1].times(u).plus(u * u));
                Dual bottom = x[2].times(u).plus(x[3]).plus(u * u);
                return top.over(bottom).plus(-KOWALIK[i]);
            });
        }
        add(
                all,
                "Powell badly scaled",
                1,
                2,
                at(0, 1),
                at(0),
                (i, x) -> i == 0
                        ? x[0].times(x[1]).times(1e4).plus(-1)
                        : x[0].times(-1).exp().plus(x[1].times(-1).exp()).plus(-1.0001));
        add(all, "Brown badly scaled", 1, 3, at(1, 1), at(0), (i, x) -> switch (i) {
            case 0 -> x[0].plus(-1e6);
            case 1 -> x[1].plus(-2e-6);
            default -> x[0].times(x[1]).plus(-2);
        });
        add(
                all,
                "Jennrich and Sampson",
                1,
                10,
                at(0.3, 0.4),
                at(124.362),
                (i, x) -> x[0].times(i + 1)
                        .exp()
                        .plus(x[1].times(i + 1).exp())
                        .times(-1)
                        .plus(2 + 2 * (i + 1)));
        add(
                all,
                "Gaussian",
                1,
                15,
                at(0.4, 1, 0),
                at(1.12793e-8),
                (i, x) -> gaussian(x[0], x[1].times(0.5), x[2], (7 - i) / 2.0).plus(-GAUSSIAN[i]));
        add(
                all,
                "Meyer",
                1,
                16,
                at(0.02, 4000, 250),
                at(87.9458),
                (i, x) ->
                        x[0].times(x[1].over(x[2].plus(45 + 5 * (i + 1))).exp()).plus(-MEYER[i]));
        add(all, "Box in three dimensions", 1, 10, at(0, 10, 20), at(0), (i, x) -> {
            double t = 0.1 * (i + 1);
            return x[0].times(-t)
                    .exp()
                    .minus(x[1].times(-t).exp())
                    .minus(x[2].times(StrictMath.exp(-t) - StrictMath.exp(-10 * t)));
        });
        add(all, "Brown and Dennis", 1, 20, at(25, 5, -5, -1), at(85822.2), (i, x) -> {
            double t = (i + 1) / 5.0;
            Dual first = x[0].plus(x[1].times(t)).plus(-StrictMath.exp(t));
            Dual second = x[2].plus(x[3].times(StrictMath.sin(t))).plus(-StrictMath.cos(t));
            return first.squared().plus(second.squared());
        });
        add(
                all,
                "Osborne 1",
                1,
                33,
                at(.5, 1.5, -1, .01, .02),
                at(5.46489e-5),
                (i, x) -> x[0].plus(x[1].times(x[3].times(-10.0 * i).exp()))
                        .plus(x[2].times(x[4].times(-10.0 * i).exp()))
                        .plus(-OSBORNE_1[i]));
        add(
                all,
                "Biggs, six exponentials",
                1,
                13,
                at(1, 2, 1, 1, 1, 1),
                at(0, 5.65565e-3),
                ClassicalFunctionsTest::biggs);
        add(
                all,
                "Osborne 2",
                1,
                65,
                at(1.3, .65, .65, .7, .6, 3, 5, 7, 2, 4.5, 5.5),
                at(4.01377e-2),
                ClassicalFunctionsTest::osborne2);
        add(all, "Watson, 6", 1, 31, new double[6], at(2.28767e-3), ClassicalFunctionsTest::watson);
        add(all, "Watson, 9", 1, 31, new double[9], at(1.39976e-6), ClassicalFunctionsTest::watson);
        add(all, "Watson, 12", 1, 31, new double[12], at(4.72238e-10), ClassicalFunctionsTest::watson);
        return all.stream();
    }

    private static void add(
            List<Case> all, String name, double factor, int m, double[] start, double[] minima, Residual residual) {
        double[] from = start.clone();
        for (int j = 0; j < from.length; j++) {
            from[j] *= factor;
        }
        all.add(new Case(name, factor, m, from, minima, residual));
    }

    private static ResponseFunction function(Case problem) {
        return new ResponseFunction() {
            @Override
            public int observations() {
                return problem.m();
            }

            @Override
            public int parameterCount() {
                return problem.start().length;
            }

            @Override
            public void evaluate(double[] p, double[] values, double[][] jacobian) {
                Dual[] x = Dual.variables(p);
                for (int i = 0; i < values.length; i++) {
                    Dual f = problem.residual().at(i, x);
                    values[i] = f.value();
                    for (int j = 0; j < p.length; j++) {
                        jacobian[i][j] = f.slope(j);
                    }
                }
            }
        };
    }

    @ParameterizedTest
    @MethodSource("determined")
    void endsAtAKnownMinimum(Case problem) {
        NonlinearOutcome outcome = NonlinearLeastSquares.fit(
                function(problem),
                new double[problem.m()],
                null,
                List.of(problem.start()),
                NonlinearOptions.defaults());
        NonlinearFit fit = assertInstanceOf(
                NonlinearFit.class,
                outcome,
                () -> problem + ": " + outcome.fold(f -> "", missed -> missed.reason(), rank -> rank.reason()));
        double sum = fit.residualSumOfSquares();
        double nearest = Double.POSITIVE_INFINITY;
        for (double minimum : problem.minima()) {
            nearest = Math.min(nearest, Math.abs(sum - minimum) / Math.max(minimum, 1e-12));
        }
        assertTrue(nearest < 1e-5, problem + ": " + sum);
    }

    /** Where the minimum that is met has a singular Jacobian, or lies at infinity: the sums are the known ones. */
    static Stream<Case> undetermined() {
        return cases().filter(ClassicalFunctionsTest::leadsNowhere);
    }

    private static boolean leadsNowhere(Case problem) {
        return NOWHERE.contains(problem.toString());
    }

    @ParameterizedTest
    @MethodSource("undetermined")
    void aMinimumThatDeterminesNothingIsNoFit(Case problem) {
        double[] reached = NonlinearLeastSquares.fit(
                        function(problem),
                        new double[problem.m()],
                        null,
                        List.of(problem.start()),
                        NonlinearOptions.defaults())
                .fold(fit -> new double[0], NotConverged::bestParameters, NonlinearRankDeficient::bestParameters);
        assertEquals(problem.start().length, reached.length, problem + " is no fit");
        double sum = 0;
        Dual[] x = Dual.variables(reached);
        for (int i = 0; i < problem.m(); i++) {
            sum += problem.residual().at(i, x).value()
                    * problem.residual().at(i, x).value();
        }
        double nearest = Double.POSITIVE_INFINITY;
        for (double minimum : problem.minima()) {
            nearest = Math.min(nearest, Math.abs(sum - minimum) / Math.max(minimum, 1e-12));
        }
        assertTrue(nearest < 1e-3, problem + ": " + sum + " at " + java.util.Arrays.toString(reached));
    }

    @Test
    void aMinimumWithoutASlopeIsNamedNotDetermined() {
        // Powell's singular function: at its minimum, the origin, the Jacobian has rank 2 of 4.
        Case powell = new Case("Powell singular", 1, 4, at(3, -1, 0, 1), at(0), (i, x) -> switch (i) {
            case 0 -> x[0].plus(x[1].times(10));
            case 1 -> x[2].minus(x[3]).times(Math.sqrt(5));
            case 2 -> x[1].minus(x[2].times(2)).squared();
            default -> x[0].minus(x[3]).squared().times(Math.sqrt(10));
        });
        NonlinearOutcome outcome = NonlinearLeastSquares.fit(
                function(powell), new double[4], null, List.of(powell.start()), NonlinearOptions.defaults());
        double[] reached = outcome.fold(
                NonlinearFit::parameters, NotConverged::bestParameters, NonlinearRankDeficient::bestParameters);
        for (double parameter : reached) {
            assertEquals(0, parameter, 1e-3);
        }
    }
}
