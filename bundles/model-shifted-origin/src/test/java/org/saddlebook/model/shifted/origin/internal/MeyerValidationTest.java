package org.saddlebook.model.shifted.origin.internal;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.util.List;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.saddlebook.api.model.Inapplicable;
import org.saddlebook.api.model.RateContext;
import org.saddlebook.api.model.RateFunction;
import org.saddlebook.api.quantity.Dimension;
import org.saddlebook.api.quantity.Unit;
import org.saddlebook.estimation.api.NonlinearFit;
import org.saddlebook.estimation.api.NonlinearLeastSquares;
import org.saddlebook.estimation.api.NonlinearOptions;
import org.saddlebook.estimation.api.ResponseFunction;

/** The law, its gradient and its own starts on a certified set of the same form: lnA = ln b1, B = −b2, Tinf = −b3. */
@Tag("validation")
class MeyerValidationTest {
    private static final Unit PER_SECOND = new Unit("1/s", Dimension.rateConstant(1), 1, 0);

    @Test
    void findsTheCertifiedParametersOfMgh10FromItsOwnStarts() throws IOException, Inapplicable {
        double[][] columns = columns();
        double[] y = columns[0];
        double[] x = columns[1];
        double[] lnY = new double[y.length];
        for (int i = 0; i < y.length; i++) {
            lnY[i] = StrictMath.log(y[i]);
        }
        RateFunction law = new ShiftedOrigin().bind(RateContext.of(PER_SECOND, 1));
        ResponseFunction response = new ResponseFunction() {
            @Override
            public int observations() {
                return x.length;
            }

            @Override
            public int parameterCount() {
                return 3;
            }

            @Override
            public void evaluate(double[] p, double[] values, double[][] jacobian) {
                for (int i = 0; i < x.length; i++) {
                    values[i] = StrictMath.exp(law.lnRate(x[i], p, jacobian[i]));
                    for (int j = 0; j < 3; j++) {
                        jacobian[i][j] *= values[i];
                    }
                }
            }
        };
        NonlinearFit fit = (NonlinearFit)
                NonlinearLeastSquares.fit(response, y, null, law.starts(x.clone(), lnY), NonlinearOptions.defaults());
        double[] p = fit.parameters();
        // Nine digits of the certified values; those of b1 are of b1 itself, not of its logarithm.
        assertEquals(1, StrictMath.exp(p[0]) / 5.6096364710E-03, 1e-9);
        assertEquals(1, -p[1] / 6.1813463463E+03, 1e-9);
        assertEquals(1, -p[2] / 3.4522363462E+02, 1e-9);
    }

    private static double[][] columns() throws IOException {
        try (InputStream stream = MeyerValidationTest.class.getResourceAsStream("/reference/MGH10.csv")) {
            List<String> lines = new String(stream.readAllBytes(), StandardCharsets.UTF_8)
                    .lines()
                    .filter(line -> !line.startsWith("#") && !line.isBlank())
                    .toList();
            double[][] columns = new double[2][lines.size()];
            for (int i = 0; i < lines.size(); i++) {
                String[] cells = lines.get(i).split(",", -1);
                columns[0][i] = Double.parseDouble(cells[0]);
                columns[1][i] = Double.parseDouble(cells[1]);
            }
            return columns;
        }
    }
}
