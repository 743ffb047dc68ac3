package org.saddlebook.barrier.internal;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.saddlebook.api.campaign.Choices;
import org.saddlebook.api.findings.Layer;
import org.saddlebook.api.findings.Node;

class SideFiguresTest {
    /** F(0.95; 2, 3), from the upper critical values of the F distribution in the NIST/SEMATECH e-Handbook, 1.3.6.7.3. */
    private static final double F = 9.552;

    private static final double[] KELVIN = {313.15, 323.15, 333.15, 343.15, 353.15};
    private static final double[] RATE = {1.03e-5, 3.3e-5, 1.0e-4, 2.75e-4, 7.9e-4};

    private static final Node.Group BODY =
            Bench.body(Bench.firstOrder(KELVIN, RATE), Choices.defaults().withModels(List.of("arrhenius")));

    private static Node.Figure figure(String id) {
        for (Node item : TreeReader.items(BODY, "figures")) {
            if (item instanceof Node.Figure figure && figure.id().equals(id)) {
                return figure;
            }
        }
        throw new AssertionError("no figure " + id);
    }

    private static Layer layer(Node.Figure figure, Layer.Kind kind) {
        return figure.layers().stream()
                .filter(layer -> layer.kind() == kind)
                .findFirst()
                .orElseThrow();
    }

    @Test
    void theOrdinateIsTheLogarithmOfTheRateConstantOverTheTemperature() {
        double[] expected = new double[KELVIN.length];
        for (int i = 0; i < expected.length; i++) {
            expected[i] = StrictMath.log(RATE[i] / KELVIN[i]);
        }
        assertArrayEquals(
                expected,
                layer(figure("ln-rate-over-temperature"), Layer.Kind.MEASURED).y(),
                1e-12);
        assertEquals(
                "ln((k/T) / (s⁻¹ K⁻¹))", figure("ln-rate-over-temperature").y().label());
    }

    @Test
    void everyPointOfTheEdgeHasTheFormOfTheQuantileOfF() {
        Layer edge = layer(figure("joint-region"), Layer.Kind.LINE);
        Layer estimate = layer(figure("joint-region"), Layer.Kind.PREDICTED);
        Node.Matrix matrix = (Node.Matrix) TreeReader.group(Bench.model(BODY, "arrhenius"), "covariance")
                .get("matrix")
                .orElseThrow();
        double aa = matrix.get(0, 0);
        double ae = matrix.get(0, 1);
        double ee = matrix.get(1, 1);
        double determinant = aa * ee - ae * ae;
        for (int i = 0; i < edge.size(); i++) {
            double e = edge.x()[i] - estimate.x()[0];
            double a = edge.y()[i] - estimate.y()[0];
            double form = (ee * a * a - 2 * ae * a * e + aa * e * e) / determinant;
            assertEquals(2 * F, form, 0.002);
        }
        assertEquals("J/mol", figure("joint-region").x().unit());
    }
}
