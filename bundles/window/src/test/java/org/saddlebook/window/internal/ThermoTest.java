package org.saddlebook.window.internal;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.findings.Section;

/** ΔG read from the section spontaneity, with a constant heat capacity against Kirchhoff's integrals. Invented numbers. */
class ThermoTest {
    private static final double DH = -50_000;
    private static final double DS = -120;
    private static final double DCP = -200;
    private static final double THETA = 298.15;

    private static double entropy(double kelvin) {
        return DS + DCP * StrictMath.log(kelvin / THETA);
    }

    private static double gibbs(double kelvin) {
        return DH + DCP * (kelvin - THETA) - kelvin * entropy(kelvin);
    }

    private static Section section(int rows) {
        List<Node> items = new ArrayList<>();
        for (int i = 0; i < rows; i++) {
            double kelvin = 260 + 140.0 * i / (rows - 1);
            items.add(Bench.group(
                    "temperature", Node.Quantity.of(kelvin, "K"),
                    "dG", Node.Quantity.of(gibbs(kelvin), "J/mol", 500),
                    "dS", Node.Quantity.of(entropy(kelvin), "J/(mol.K)", 2)));
        }
        Node body = Bench.group(
                "dH", Node.Quantity.of(DH, "J/mol", 400),
                "dS", Node.Quantity.of(DS, "J/(mol.K)", 2),
                "dCp", Node.Quantity.of(DCP, "J/(mol.K)"),
                "dG", new Node.Items(items));
        return Section.done("spontaneity", "Spontaneity", body, Map.of());
    }

    @Test
    void betweenRowsGibbsEnergyFollowsTheHeatCapacity() throws Refusal {
        Thermo thermo = Thermo.of(section(12));
        assertFalse(thermo.constant());
        for (double kelvin = 260; kelvin <= 400; kelvin += 0.7) {
            assertEquals(gibbs(kelvin), thermo.gibbs(kelvin), 0.05, "at " + kelvin);
        }
    }

    @Test
    void outsideTheRowsItGoesOnStraightAndSaysSo() throws Refusal {
        Thermo thermo = Thermo.of(section(12));
        assertEquals(gibbs(400) - 20 * entropy(400), thermo.gibbs(420), 1e-6);
        assertEquals(gibbs(260) + 20 * entropy(260), thermo.gibbs(240), 1e-6);
        assertFalse(thermo.covers(420));
        assertTrue(thermo.covers(330));
    }

    @Test
    void aSectionWithoutEnthalpyIsRefused() {
        Section refused = Section.refused("spontaneity", "Spontaneity", "no");
        assertThrows(Refusal.class, () -> Thermo.of(refused));
    }
}
