package org.saddlebook.estimation.api;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertInstanceOf;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.junit.jupiter.api.Test;

class ProfileLikelihoodTest {
    private static final double[] X = {0.1, 0.5, 1, 1.5, 2, 3, 4, 6};

    private static final ReferenceModels.Curve SATURATION = (x, p, g) -> {
        g[0] = x / (p[1] + x);
        g[1] = -p[0] * x / ((p[1] + x) * (p[1] + x));
        return p[0] * g[0];
    };
    private static final ReferenceModels.Curve LINE = (x, p, g) -> {
        g[0] = 1;
        g[1] = x;
        return p[0] + p[1] * x;
    };

    private static double[] values(ReferenceModels.Curve curve, double noise, double... p) {
        double[] y = new double[X.length];
        for (int i = 0; i < y.length; i++) {
            y[i] = curve.value(X[i], p, new double[p.length]) + noise * StrictMath.sin(23.0 * i + 1);
        }
        return y;
    }

    private static ProfileInterval profile(
            ReferenceModels.Curve curve, double[] y, int parameter, Scale scale, NonlinearOptions options) {
        ResponseFunction function = ReferenceModels.over(X, 2, curve);
        NonlinearFit fit = assertInstanceOf(
                NonlinearFit.class,
                NonlinearLeastSquares.fit(function, y, null, List.of(new double[] {1, 1}), options));
        return ProfileLikelihood.of(fit, function, y, null, parameter, 0.95, scale, options);
    }

    private static double at(ProfileLimit limit) {
        return assertInstanceOf(ProfileLimit.At.class, limit).value();
    }

    @Test
    void ofALinearResponseIsTheStudentIntervalByEitherWay() {
        double[] y = values(LINE, 0.1, 3, -0.7);
        double[][] design = new double[X.length][];
        for (int i = 0; i < X.length; i++) {
            design[i] = new double[] {1, X[i]};
        }
        LinearFit fit = assertInstanceOf(LinearFit.class, LinearLeastSquares.fit(design, y, null));
        for (Scale scale : Scale.values()) {
            for (int j = 0; j < 2; j++) {
                double q = scale == Scale.STATED ? Normal.quantile(0.975) : StudentT.quantile(0.975, 6);
                double s2 = scale == Scale.STATED ? 1 : fit.residualVariance();
                double half = q * Math.sqrt(s2 * fit.unscaledCovariance()[j][j]);
                ProfileInterval direct = ProfileLikelihood.of(fit, j, 0.95, scale);
                assertEquals(fit.parameters()[j] - half, at(direct.lower()), 1e-14);
                assertEquals(fit.parameters()[j] + half, at(direct.upper()), 1e-14);
                ProfileInterval followed = profile(LINE, y, j, scale, NonlinearOptions.defaults());
                assertEquals(at(direct.lower()), at(followed.lower()), 1e-9);
                assertEquals(at(direct.upper()), at(followed.upper()), 1e-9);
            }
        }
    }

    @Test
    void doesNotDependOnTheChoiceOfParameters() {
        double[] y = values(SATURATION, 0.3, 5, 2);
        ProfileInterval plain = profile(SATURATION, y, 1, Scale.ESTIMATED, NonlinearOptions.defaults());
        ReferenceModels.Curve logarithmic = (x, p, g) -> {
            double k = StrictMath.exp(p[1]);
            g[0] = x / (k + x);
            g[1] = -p[0] * x * k / ((k + x) * (k + x));
            return p[0] * g[0];
        };
        ProfileInterval log = profile(logarithmic, y, 1, Scale.ESTIMATED, NonlinearOptions.defaults());
        assertEquals(at(plain.lower()), StrictMath.exp(at(log.lower())), 1e-8 * at(plain.lower()));
        assertEquals(at(plain.upper()), StrictMath.exp(at(log.upper())), 1e-8 * at(plain.upper()));
    }

    @Test
    void aSideWithoutLimitIsOpen() {
        // So much scatter that the saturation cannot be told from a straight line: the half-saturation may be anything
        // above.
        double[] y = values(SATURATION, 0.8, 12, 12);
        ProfileInterval interval = profile(SATURATION, y, 1, Scale.ESTIMATED, NonlinearOptions.defaults());
        assertTrue(at(interval.lower()) < 12);
        ProfileLimit.Open open = assertInstanceOf(ProfileLimit.Open.class, interval.upper(), interval.toString());
        assertTrue(open.tried() > 1e4);
    }

    @Test
    void aBoundBeforeTheLimitIsOpenThere() {
        double[] y = values(SATURATION, 0.3, 5, 2);
        NonlinearOptions bounded =
                NonlinearOptions.defaults().withBounds(new double[] {0, 0}, new double[] {100, 2.05});
        ProfileInterval interval = profile(SATURATION, y, 1, Scale.ESTIMATED, bounded);
        ProfileLimit.Open open = assertInstanceOf(ProfileLimit.Open.class, interval.upper(), interval.toString());
        assertEquals(2.05, open.tried(), 0);
        assertInstanceOf(ProfileLimit.At.class, interval.lower());
    }

    @Test
    void anotherMinimumMetOnTheWayIsReportedNotHidden() {
        // Three roots of p^3 - p = 0.3, of which the second observation prefers the largest; the fit is begun at
        // another.
        ResponseFunction function = new ResponseFunction() {
            @Override
            public int observations() {
                return 2;
            }

            @Override
            public int parameterCount() {
                return 1;
            }

            @Override
            public void evaluate(double[] p, double[] values, double[][] jacobian) {
                values[0] = p[0] * p[0] * p[0] - p[0];
                jacobian[0][0] = 3 * p[0] * p[0] - 1;
                values[1] = 0.1 * p[0];
                jacobian[1][0] = 0.1;
            }
        };
        double[] y = {0.3, 0.11};
        double[] weights = {4, 4};
        NonlinearOptions inner = NonlinearOptions.defaults().withBounds(new double[] {-0.5}, new double[] {0});
        NonlinearFit fit = assertInstanceOf(
                NonlinearFit.class,
                NonlinearLeastSquares.fit(function, y, weights, List.of(new double[] {-0.3}), inner));
        ProfileInterval interval =
                ProfileLikelihood.of(fit, function, y, weights, 0, 0.95, Scale.STATED, NonlinearOptions.defaults());
        ProfileLimit.Lost lost = assertInstanceOf(ProfileLimit.Lost.class, interval.upper(), interval.toString());
        assertEquals("a smaller sum of squares lies there: the fit is not at its minimum", lost.reason());
    }

    @Test
    void zeroScatterGivesAnIntervalOfNoWidth() {
        double[] y = values(LINE, 0, 3, -0.5);
        ProfileInterval interval = profile(LINE, y, 1, Scale.ESTIMATED, NonlinearOptions.defaults());
        assertEquals(-0.5, at(interval.lower()), 1e-12);
        assertEquals(-0.5, at(interval.upper()), 1e-12);
    }

    @Test
    void aScaleToEstimateNeedsADegreeOfFreedom() {
        LinearFit fit = assertInstanceOf(
                LinearFit.class, LinearLeastSquares.fit(new double[][] {{1, 0}, {1, 1}}, new double[] {1, 2}, null));
        assertThrows(IllegalStateException.class, () -> ProfileLikelihood.of(fit, 0, 0.95, Scale.ESTIMATED));
        assertInstanceOf(
                ProfileLimit.At.class,
                ProfileLikelihood.of(fit, 0, 0.95, Scale.STATED).lower());
    }
}
