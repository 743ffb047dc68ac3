package org.saddlebook.spontaneity.internal;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.function.DoublePredicate;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.findings.Section;
import org.saddlebook.api.quantity.Constants;

/** Equilibrium tables against published values, and against fits of the same data made outside this project. */
@Tag("validation")
class TableValidationTest {
    private static Map<String, Node> table(String kind, String standard) {
        Map<String, Node> members = new LinkedHashMap<>();
        members.put("kind", new Node.Text(kind));
        members.put("standardState", new Node.Text(standard));
        return members;
    }

    private static Node row(Node temperature, String form, double value) {
        return new Node.Group(Map.of("temperature", temperature, form, new Node.Scalar(value)));
    }

    private static List<Node> rows(String file, String unit, String form, double scale, DoublePredicate value)
            throws Exception {
        List<Node> rows = new ArrayList<>();
        for (List<String> row : Reference.rows(file)) {
            double number = Double.parseDouble(row.get(1));
            if (value.test(number)) {
                rows.add(row(Node.Quantity.of(Double.parseDouble(row.get(0)), unit), form, number * scale));
            }
        }
        return rows;
    }

    private static Section section(Map<String, Node> table, List<Node> rows) throws Exception {
        Map<String, Node> all = new LinkedHashMap<>(table);
        all.put("rows", new Node.Items(rows));
        return new Settings().with("equilibriumTable", new Node.Group(all)).section();
    }

    private static Node.Group body(Map<String, Node> table, List<Node> rows) throws Exception {
        Section section = section(table, rows);
        assertEquals(Section.Outcome.DONE, section.outcome(), section.toString());
        return (Node.Group) section.body();
    }

    private static Node.Quantity of(Node.Group body, String fit, String key) {
        return Settings.quantity((Node.Group) body.get(fit).orElseThrow(), key);
    }

    private static void close(double expected, double relative, double actual) {
        assertEquals(expected, actual, Math.abs(expected) * relative);
    }

    private static void water(String file, int rows, double pK, double h, double uH, double cp, double uCp)
            throws Exception {
        List<Node> all = rows(file, "Cel", "pK", 1, x -> true).subList(0, rows);
        Node.Group body = body(table("molal", "1 mol/kg"), all);
        double rtLn10 = Constants.GAS * 298.15 * StrictMath.log(10);
        close(pK, 1e-6, of(body, "clarkeGlew", "dG").value().getAsDouble() / rtLn10);
        close(h * 1000, 1e-6, of(body, "clarkeGlew", "dH").value().getAsDouble());
        close(
                uH * 1000,
                1e-5,
                of(body, "clarkeGlew", "dH").standardUncertainty().getAsDouble());
        close(cp, 1e-6, of(body, "clarkeGlew", "dCp").value().getAsDouble());
        close(uCp, 1e-5, of(body, "clarkeGlew", "dCp").standardUncertainty().getAsDouble());
        assertEquals("needed", Settings.text(body, "heatCapacityVerdict"), "leaving the heat capacity out is detected");
        assertEquals("molal", Settings.text(body, "constantKind"));
        assertEquals("1 mol/kg", Settings.text(body, "standardState"));
    }

    @Test
    void givesTheIonisationOfWater() throws Exception {
        water("water_pKw.csv", 13, 13.99542, 55.84382, 0.03543965, -219.3441, 3.999764);
        water("water_pKw.csv", 21, 13.99846, 55.76277, 0.07438873, -190.3418, 3.040101);
        water("water_pKw_emf.csv", 13, 13.99621, 56.53037, 0.01880746, -197.8602, 2.122634);
    }

    @Test
    void missesTheEnthalpyOfWaterAt25CelsiusWithoutAHeatCapacity() throws Exception {
        Node.Group body = body(table("molal", "1 mol/kg"), rows("water_pKw.csv", "Cel", "pK", 1, x -> true));
        double straight = of(body, "vantHoff", "dH").value().getAsDouble();
        double bent = of(body, "clarkeGlew", "dH").value().getAsDouble();
        // CODATA key values: 55.815 kJ/mol.
        assertEquals(55_815, bent, 60);
        assertTrue(Math.abs(straight - 55_815) > 3000, "van 't Hoff gives the mean over 0 to 100 degC: " + straight);
    }

    @Test
    void givesTheDissociationOfDinitrogenTetroxide() throws Exception {
        Node.Group body = body(table("Kp", "1 atm"), rows("n2o4_Kp_measured.csv", "K", "K", 1, x -> true));
        close(61_052.16, 1e-6, of(body, "vantHoff", "dH").value().getAsDouble());
        close(171.4421, 1e-5, of(body, "vantHoff", "dH").standardUncertainty().getAsDouble());
        close(188.5859, 1e-6, of(body, "vantHoff", "dS").value().getAsDouble());
        assertEquals("1 atm", Settings.text(body, "standardState"));
        assertEquals("not tested", Settings.text(body, "heatCapacityVerdict"), "three rows leave nothing to test with");
    }

    @Test
    void givesTheSynthesisOfAmmonia() throws Exception {
        Node.Group body = body(table("Kp", "1 atm"), rows("ammonia_Kp_10atm.csv", "K", "K", 1, x -> true));
        close(-51_685.78, 1e-6, of(body, "vantHoff", "dH").value().getAsDouble());
        close(486.316, 1e-5, of(body, "vantHoff", "dH").standardUncertainty().getAsDouble());
    }

    @Test
    void givesTheBoilingPointOfMercuryFromVapourPressures() throws Exception {
        mercury(0.2, 628.9073, 630.1012, -9.461148);
        mercury(5, 629.6216, 629.8588, -4.888941);
    }

    private static void mercury(double above, double straight, double bent, double cp) throws Exception {
        List<Node> rows = rows("mercury_vapour_pressure.csv", "Cel", "K", 1 / 760.0, pressure -> pressure > above);
        Node.Group body = body(table("Kp", "1 atm"), rows);
        assertEquals(
                straight,
                Settings.crossover((Node.Group) body.get("vantHoff").orElseThrow())
                        .value()
                        .getAsDouble(),
                1e-3);
        assertEquals(
                bent,
                Settings.crossover((Node.Group) body.get("clarkeGlew").orElseThrow())
                        .value()
                        .getAsDouble(),
                1e-3);
        close(cp, 1e-5, of(body, "clarkeGlew", "dCp").value().getAsDouble());
        assertEquals(straight, Settings.crossover(body).value().getAsDouble(), 1e-3, "in the usual keys too");
    }

    /** By hand: Kc = Kp (p°/(c° R T))^Δν, so that the slope of ln Kc is ΔU = ΔH − Δν R T. */
    @Test
    void turnsKcOfGasesIntoKp() throws Exception {
        List<Node> rows = new ArrayList<>();
        for (double t = 300; t <= 360; t += 10) {
            double lnKp = -57_000 / (Constants.GAS * t) + 175 / Constants.GAS;
            rows.add(row(new Node.Scalar(t), "lnK", lnKp - StrictMath.log(1000 * Constants.GAS * t / 1e5)));
        }
        Map<String, Node> gas = table("Kc", "1 mol/L");
        gas.put("reaction", new Node.Text("N2O4(g) = 2 NO2(g)"));
        Node.Group body = body(gas, rows);
        close(57_000, 1e-9, of(body, "vantHoff", "dH").value().getAsDouble());
        close(175, 1e-9, of(body, "vantHoff", "dS").value().getAsDouble());
        assertEquals("1 bar", Settings.text(body, "standardState"));
        Node.Group solution = body(table("Kc", "1 mol/L"), rows);
        double slope = of(solution, "vantHoff", "dH").value().getAsDouble();
        assertEquals(57_000 - Constants.GAS * 329, slope, 20, "the slope of ln Kc is that of the energy");
    }

    @Test
    void weighsACalorimetricEnthalpyAgainstTheConstants() throws Exception {
        List<Node> rows = new ArrayList<>();
        for (double t = 290; t <= 310; t += 5) {
            double lnK = -50_000 / (Constants.GAS * t) + 120 / Constants.GAS;
            rows.add(new Node.Group(Map.of(
                    "temperature", new Node.Scalar(t), "lnK", new Node.Scalar(lnK), "u", new Node.Scalar(0.05))));
        }
        Map<String, Node> joint = table("molal", "1 mol/kg");
        Node.Group alone = body(joint, rows);
        double h = of(alone, "vantHoff", "dH").value().getAsDouble();
        double u = of(alone, "vantHoff", "dH").standardUncertainty().getAsDouble();
        joint.put("dH", Node.Quantity.of(53, "kJ/mol", 2));
        Node.Group both = body(joint, rows);
        // The weighted mean of two independent values (JCGM 100:2008, H.10 by hand).
        double w = 1 / (u * u);
        double v = 1 / (2000.0 * 2000.0);
        close(
                (h * w + 53_000 * v) / (w + v),
                1e-9,
                of(both, "vantHoff", "dH").value().getAsDouble());
        close(
                Math.sqrt(1 / (w + v)),
                1e-9,
                of(both, "vantHoff", "dH").standardUncertainty().getAsDouble());
    }

    @Test
    void refusesByName() throws Exception {
        List<Node> good = rows("water_pKw.csv", "Cel", "pK", 1, x -> true);
        refused("must say its kind", table("K", "1 bar"), good);
        refused("Kp cannot have the standard state 1 mol/L", table("Kp", "1 mol/L"), good);
        refused("Kc cannot have the standard state 1 bar", table("Kc", "1 bar"), good);
        refused("has the standard state 1 mol/kg", table("molal", "1 mol/L"), good);
        refused("leave standardState out", table("Kx", "1 bar"), good);
        Map<String, Node> unstated = table("Kp", "");
        unstated.remove("standardState");
        refused("Kp has a number only in a standard state", unstated, good);
        refused("at least two", table("Kp", "1 bar"), good.subList(0, 1));
        refused("do not determine", table("Kp", "1 bar"), List.of(good.get(0), good.get(0), good.get(0)));
        refused("K must be above zero", table("Kp", "1 bar"), List.of(good.get(0), row(new Node.Scalar(300), "K", 0)));
        refused("above 0 K", table("Kp", "1 bar"), List.of(good.get(0), row(new Node.Scalar(-3), "K", 1)));
        refused(
                "one of K, lnK and pK",
                table("Kp", "1 bar"),
                List.of(good.get(0), new Node.Group(Map.of("temperature", new Node.Scalar(300)))));
        Map<String, Node> heat = table("Kp", "1 bar");
        heat.put("dH", Node.Quantity.of(53, "kJ/mol", 2));
        refused("no way to weigh", heat, good);
    }

    private static void refused(String words, Map<String, Node> table, List<Node> rows) throws Exception {
        Section section = section(table, rows);
        assertEquals(Section.Outcome.REFUSED, section.outcome(), words);
        String reason = Settings.text((Node.Group) section.body(), "reason");
        assertTrue(reason.contains(words), reason);
    }
}
