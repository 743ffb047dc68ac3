package org.saddlebook.charts.internal;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.saddlebook.api.findings.Axis;
import org.saddlebook.api.findings.Layer;
import org.saddlebook.api.findings.Node;

/** Figures with invented numbers, of the kinds that analyses draw. */
final class SampleFigures {
    private static final double R = 8.31446261815324;

    static final Map<String, String> CAUTIONS = cautions();

    private SampleFigures() {}

    private static Map<String, String> cautions() {
        Map<String, String> cautions = new LinkedHashMap<>();
        cautions.put("assumed-standard-state", "No standard state was stated: 1 mol/L is assumed.");
        cautions.put(
                "extrapolated",
                "Outside the measured temperatures. The interval holds only if the law holds there too; the data cannot show that, "
                        + "and no number of repeats at the measured temperatures will.");
        cautions.put("same-mechanism", "Assumes the same mechanism as in the measured range.");
        return cautions;
    }

    static double lnRate(double kelvin) {
        return 24.2 - 84000 / (R * kelvin);
    }

    /** ln k against 1/T: two laws with bands, points, one excluded, a prediction. */
    static Node.Figure barrier() {
        double[] kelvin = {293.15, 303.15, 313.15, 323.15, 333.15};
        double[] scatter = {0.05, -0.09, 0.03, 0.06, -0.04};
        double[] y = new double[kelvin.length];
        double[] low = new double[kelvin.length];
        double[] high = new double[kelvin.length];
        for (int i = 0; i < y.length; i++) {
            y[i] = lnRate(kelvin[i]) + scatter[i];
            low[i] = y[i] - 0.15;
            high[i] = y[i] + 0.15;
        }
        int n = 61;
        double[] x = new double[n];
        double[] line = new double[n];
        double[] bandLow = new double[n];
        double[] bandHigh = new double[n];
        double[] runLow = new double[n];
        double[] runHigh = new double[n];
        double[] curved = new double[n];
        double[] curvedLow = new double[n];
        double[] curvedHigh = new double[n];
        for (int i = 0; i < n; i++) {
            x[i] = 273.15 + i * 1.25;
            line[i] = lnRate(x[i]);
            double off = (1 / x[i] - 1 / 313.15) / 2e-4;
            double u = 0.12 * Math.sqrt(0.2 + off * off);
            bandLow[i] = line[i] - 3 * u;
            bandHigh[i] = line[i] + 3 * u;
            double run = Math.sqrt(9 * u * u + 0.09);
            runLow[i] = line[i] - run;
            runHigh[i] = line[i] + run;
            curved[i] = line[i] - 0.06 * off * off;
            curvedLow[i] = curved[i] - 5 * u;
            curvedHigh[i] = curved[i] + 5 * u;
        }
        List<Layer> layers = new ArrayList<>();
        layers.add(new Layer(Layer.Kind.NEW_RUN_BAND, "Arrhenius", x, line, runLow, runHigh));
        layers.add(new Layer(Layer.Kind.CONFIDENCE_BAND, "Arrhenius", x, line, bandLow, bandHigh));
        layers.add(new Layer(Layer.Kind.CONFIDENCE_BAND, "modified Arrhenius", x, curved, curvedLow, curvedHigh));
        layers.add(Layer.of(Layer.Kind.LINE, "Arrhenius", x, line));
        layers.add(Layer.of(Layer.Kind.LINE, "Eyring", x, shifted(line, 0.02)));
        layers.add(Layer.of(Layer.Kind.LINE, "modified Arrhenius", x, curved));
        layers.add(new Layer(Layer.Kind.MEASURED, "", kelvin, y, low, high));
        layers.add(Layer.of(Layer.Kind.EXCLUDED, "", new double[] {338.15}, new double[] {lnRate(338.15) - 0.8}));
        layers.add(new Layer(
                Layer.Kind.PREDICTED,
                "",
                new double[] {278.15},
                new double[] {lnRate(278.15)},
                new double[] {lnRate(278.15) - 0.5},
                new double[] {lnRate(278.15) + 0.5}));
        return new Node.Figure(
                "rate-constants",
                "Rate constants and laws",
                new Axis("temperature", "K", Axis.Scale.RECIPROCAL_TEMPERATURE),
                new Axis("ln(k / L mol⁻¹ s⁻¹)", "1", Axis.Scale.LINEAR),
                layers,
                List.of("extrapolated", "same-mechanism"));
    }

    /** k on a logarithmic axis, one law. */
    static Node.Figure logarithmic() {
        double[] x = new double[31];
        double[] k = new double[31];
        double[] low = new double[31];
        double[] high = new double[31];
        for (int i = 0; i < x.length; i++) {
            x[i] = 290 + i * 2;
            k[i] = Math.exp(lnRate(x[i]));
            double f = Math.exp(0.1 + 0.3 * Math.abs(i - 12) / 12.0);
            low[i] = k[i] / f;
            high[i] = k[i] * f;
        }
        return new Node.Figure(
                "k",
                "Rate constant against temperature",
                new Axis("temperature", "K", Axis.Scale.RECIPROCAL_TEMPERATURE),
                new Axis("k", "L/(mol.s)", Axis.Scale.LOGARITHMIC),
                List.of(
                        new Layer(Layer.Kind.CONFIDENCE_BAND, "Eyring", x, k, low, high),
                        Layer.of(Layer.Kind.LINE, "Eyring", x, k),
                        Layer.of(Layer.Kind.MEASURED, "", new double[] {303.15, 323.15, 343.15}, new double[] {
                            Math.exp(lnRate(303.15)), Math.exp(lnRate(323.15) + 0.1), Math.exp(lnRate(343.15))
                        })),
                List.of());
    }

    /** Gibbs energy against temperature, with a zero line and a crossover. */
    static Node.Figure gibbs() {
        double[] x = new double[41];
        double[] g = new double[41];
        double[] low = new double[41];
        double[] high = new double[41];
        for (int i = 0; i < x.length; i++) {
            x[i] = 280 + i * 2.5;
            g[i] = -47000 + 133 * x[i];
            low[i] = g[i] - 900 - 20 * Math.abs(x[i] - 300);
            high[i] = g[i] + 900 + 20 * Math.abs(x[i] - 300);
        }
        return new Node.Figure(
                "gibbs-energy",
                "Gibbs energy of reaction at the stated composition, from enthalpy and entropy that do not change with temperature",
                new Axis("temperature", "K", Axis.Scale.LINEAR),
                new Axis("ΔG", "J/mol", Axis.Scale.LINEAR),
                List.of(
                        new Layer(Layer.Kind.CONFIDENCE_BAND, "ΔG", x, g, low, high),
                        Layer.of(Layer.Kind.LINE, "ΔG", x, g),
                        Layer.of(
                                Layer.Kind.HORIZONTAL_MARK, "neither side prevails", new double[] {300}, new double[] {0
                                }),
                        Layer.of(Layer.Kind.VERTICAL_MARK, "crossover 353 K", new double[] {353.4}, new double[] {0}),
                        Layer.of(Layer.Kind.VERTICAL_MARK, "350 K", new double[] {350}, new double[] {0})),
                List.of("assumed-standard-state"));
    }

    /** Six lines that end close together. */
    static Node.Figure crowded() {
        List<Layer> layers = new ArrayList<>();
        for (int i = 0; i < 6; i++) {
            layers.add(Layer.of(
                    Layer.Kind.LINE,
                    "law number " + (i + 1) + (i == 3 ? " with a rather long name" : ""),
                    new double[] {0, 5, 10},
                    new double[] {i, 3 + i * 0.3, 10 + i * 0.1}));
        }
        return new Node.Figure(
                "crowded",
                "Names kept apart",
                new Axis("time", "min", Axis.Scale.LINEAR),
                new Axis("concentration", "mol/L", Axis.Scale.LINEAR),
                layers,
                List.of());
    }

    static double[] shifted(double[] values, double by) {
        double[] result = values.clone();
        for (int i = 0; i < result.length; i++) {
            result[i] += by;
        }
        return result;
    }

    static List<Node.Figure> all() {
        return List.of(barrier(), logarithmic(), gibbs(), crowded());
    }
}
