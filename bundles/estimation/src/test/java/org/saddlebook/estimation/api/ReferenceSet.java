package org.saddlebook.estimation.api;

import java.io.BufferedReader;
import java.io.IOException;
import java.io.InputStream;
import java.io.InputStreamReader;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import java.util.Properties;

/** A certified regression set: NIST Statistical Reference Datasets, data and certificate as copied to the resources. */
final class ReferenceSet {
    private final Properties certificate;
    private final double[] y;
    private final double[][] x;

    private ReferenceSet(Properties certificate, double[] y, double[][] x) {
        this.certificate = certificate;
        this.y = y;
        this.x = x;
    }

    static ReferenceSet read(String kind, String name) {
        String base = "/reference/" + kind + "/" + name;
        Properties certificate = new Properties();
        List<double[]> rows = new ArrayList<>();
        try (InputStream properties = ReferenceSet.class.getResourceAsStream(base + ".properties");
                BufferedReader table = new BufferedReader(new InputStreamReader(
                        ReferenceSet.class.getResourceAsStream(base + ".csv"), StandardCharsets.UTF_8))) {
            certificate.load(properties);
            table.readLine();
            for (String line = table.readLine(); line != null; line = table.readLine()) {
                if (!line.isBlank()) {
                    rows.add(numbers(line.strip().replace(',', ' ')));
                }
            }
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
        double[] y = new double[rows.size()];
        double[][] x = new double[rows.size()][];
        for (int i = 0; i < y.length; i++) {
            double[] row = rows.get(i);
            y[i] = row[0];
            x[i] = java.util.Arrays.copyOfRange(row, 1, row.length);
        }
        return new ReferenceSet(certificate, y, x);
    }

    private static double[] numbers(String text) {
        String[] parts = text.strip().split(" +", -1);
        double[] result = new double[parts.length];
        for (int i = 0; i < parts.length; i++) {
            result[i] = Double.parseDouble(parts[i]);
        }
        return result;
    }

    /** Decimal digits in which a computed number agrees with the certified one, at most 15. */
    static double digits(double computed, double certified) {
        double error = Math.abs(computed - certified);
        if (error == 0) {
            return 15;
        }
        double scale = certified == 0 ? 1 : Math.abs(certified);
        double digits = -Math.log10(error / scale);
        return Double.isNaN(digits) ? Double.NEGATIVE_INFINITY : Math.min(15, digits);
    }

    static double digits(double[] computed, double[] certified) {
        double fewest = 15;
        for (int j = 0; j < certified.length; j++) {
            fewest = Math.min(fewest, digits(computed[j], certified[j]));
        }
        return fewest;
    }

    static double[] standardDeviations(Fit fit) {
        double[] result = new double[fit.parameterCount()];
        double[][] covariance = fit.unscaledCovariance();
        for (int j = 0; j < result.length; j++) {
            result[j] = Math.sqrt(fit.residualVariance() * covariance[j][j]);
        }
        return result;
    }

    String name() {
        return certificate.getProperty("name");
    }

    String level() {
        return certificate.getProperty("level");
    }

    double[] response() {
        return y.clone();
    }

    double[][] predictors() {
        return x;
    }

    double[] abscissae() {
        double[] result = new double[x.length];
        for (int i = 0; i < result.length; i++) {
            result[i] = x[i][0];
        }
        return result;
    }

    double[] certified(String key) {
        return numbers(certificate.getProperty(key));
    }

    double certifiedNumber(String key) {
        return certified(key)[0];
    }
}
