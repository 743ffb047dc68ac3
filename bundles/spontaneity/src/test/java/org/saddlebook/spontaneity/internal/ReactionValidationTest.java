package org.saddlebook.spontaneity.internal;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.SplittableRandom;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.quantity.Constants;
import org.saddlebook.reaction.api.Equation;
import org.saddlebook.reaction.api.Fraction;
import org.saddlebook.reaction.api.Species;
import org.saddlebook.thermo.data.api.CuratedSet;
import org.saddlebook.thermo.data.api.PowerSegment;
import org.saddlebook.thermo.data.api.SpeciesData;

/** Reactions of the curated set against the NIST-JANAF tables combined outside this project. */
@Tag("validation")
class ReactionValidationTest {
    private static final Map<String, String> EQUATIONS = Map.of(
            "ammonia_synthesis", "N2(g) + 3 H2(g) = 2 NH3(g)",
            "water_gas_shift", "CO(g) + H2O(g) = CO2(g) + H2(g)",
            "n2o4_dissociation", "N2O4(g) = 2 NO2(g)",
            "water_formation", "H2(g) + 1/2 O2(g) = H2O(g)",
            "no2_from_elements", "N2(g) + 2 O2(g) = 2 NO2(g)",
            "ozone_decomposition", "2 O3(g) = 3 O2(g)",
            "calcium_hydroxide_dehydration", "Ca(OH)2(s) = CaO(s) + H2O(g)",
            "mercury_vaporisation", "Hg(l) = Hg(g)");

    static List<List<String>> reactions() throws IOException {
        return Reference.rows("reaction_summary.csv");
    }

    private static ReactionFunction function(String equation, double lower, double upper) throws Exception {
        return function(equation, Optional.of("janaf"), lower, upper);
    }

    private static ReactionFunction function(String equation, Optional<String> source, double lower, double upper)
            throws Exception {
        return ReactionFunction.of(
                SpeciesResolver.resolve(
                        Equation.parseBalanced(equation), List.of(CuratedSet.source()), source, Optional.empty()),
                lower,
                upper);
    }

    private static double[] range(List<List<String>> rows) {
        return new double[] {
            Double.parseDouble(rows.get(0).get(0)),
            Double.parseDouble(rows.get(rows.size() - 1).get(0))
        };
    }

    /**
     * Entropy and heat capacity to the last digit. ΔfH, ΔfG and log10 Kf are printed rounded each by itself, to 0.001: sums
     * of them may differ by half a unit for each coefficient, and ΔG further by what the reference file names as the largest
     * difference between its ΔG and its ΔH − TΔS.
     */
    @ParameterizedTest
    @MethodSource("reactions")
    void givesEveryTabulatedValue(List<String> summary) throws Exception {
        List<List<String>> rows = Reference.rows("reactions/" + summary.get(0) + ".csv");
        double[] range = range(rows);
        ReactionFunction function = function(EQUATIONS.get(summary.get(0)), range[0], range[1]);
        double half = 0.0005;
        for (Map.Entry<Species, Fraction> one :
                Equation.parse(EQUATIONS.get(summary.get(0))).net().entrySet()) {
            half += 0.0005 * Math.abs(one.getValue().doubleValue());
        }
        double inconsistency = Double.parseDouble(summary.get(9));
        for (List<String> row : rows) {
            double t = Double.parseDouble(row.get(0));
            String where = summary.get(0) + " at " + t;
            if (t > 2500) {
                // The curated tables end here; the test of water formation below goes on.
                continue;
            }
            assertEquals(Double.parseDouble(row.get(1)), function.enthalpy(t) / 1000, 2 * half, where);
            assertEquals(Double.parseDouble(row.get(2)), function.entropy(t), 0.00051, where);
            assertEquals(Double.parseDouble(row.get(3)), function.heatCapacity(t), 0.00051, where);
            double gibbs = function.gibbs(t) / 1000;
            double tolerance = inconsistency + half;
            assertEquals(Double.parseDouble(row.get(4)), gibbs, tolerance, where);
            double rtLn10 = Constants.GAS * t * StrictMath.log(10) / 1000;
            assertEquals(Double.parseDouble(row.get(5)), -gibbs / rtLn10, inconsistency / rtLn10 + half, where);
        }
    }

    @ParameterizedTest
    @MethodSource("reactions")
    void givesCrossoversThreeWays(List<String> summary) throws Exception {
        double[] range = range(Reference.rows("reactions/" + summary.get(0) + ".csv"));
        range[1] = summary.get(0).startsWith("mercury") ? 700 : range[1];
        ReactionFunction tables = function(EQUATIONS.get(summary.get(0)), range[0], range[1]);
        double h = tables.enthalpy(298.15);
        double s = tables.entropy(298.15);
        double cp = tables.heatCapacity(298.15);
        ReactionFunction constantCp = ReactionFunction.of(
                List.of(new Participant(
                        1,
                        SpeciesData.of(
                                Species.parse("H2(g)"),
                                "sum",
                                "sum",
                                List.of(PowerSegment.from298(
                                        range[0], range[1], new double[] {0, 0, cp, 0, 0, 0, 0}, h, s))),
                        "sum")),
                range[0],
                range[1]);
        // The curated tables end at 2500 K; the test of water formation below goes on.
        List<Root> roots = CrossoverSearch.roots(
                range[1] > 2500
                        ? function("H2(g) + 1/2 O2(g) = H2O(g)", Optional.of("nasa-9"), range[0], range[1])
                        : tables);
        List<Root> withCp = CrossoverSearch.roots(constantCp);
        if (summary.get(6).equals("none")) {
            assertTrue(roots.isEmpty(), summary.get(0));
            return;
        }
        assertEquals(1, roots.size(), summary.get(0));
        assertEquals(Root.Kind.CROSSING, roots.get(0).kind());
        double published = Double.parseDouble(summary.get(6).replace(" (table)", ""));
        double slope = Math.abs(tables.entropy(published));
        // Half a digit of the printed temperature, and 0.006 kJ/mol of the tables' ΔG over the slope; 1.3 kJ/mol
        // between the two
        // evaluations of water at 4300 K.
        double tolerance = (summary.get(6).contains("table") ? 0.0005 : 0.05) + (range[1] > 2500 ? 1300 : 6) / slope;
        assertEquals(published, roots.get(0).kelvin(), tolerance, summary.get(0));
        assertEquals(
                Double.parseDouble(summary.get(7)), h / s, 0.05 + 5e-4 * h / s / Math.abs(s) + 0.05, summary.get(0));
        if (withCp.size() == 1) {
            assertEquals(Double.parseDouble(summary.get(8)), withCp.get(0).kelvin(), 0.06, summary.get(0));
        } else {
            // With a heat capacity carried this far from 298 K there may be none in the range of the table.
            assertTrue(Double.parseDouble(summary.get(8)) > range[1], summary.get(0) + withCp);
        }
    }

    /** NASA 9 coefficients against NIST-JANAF up to 6000 K: two evaluations of water, apart by 0.03 in log10 K. */
    @Test
    void followsTheFormationOfWaterTo6000Kelvin() throws Exception {
        ReactionFunction function = function("H2(g) + 1/2 O2(g) = H2O(g)", Optional.of("nasa-9"), 200, 6000);
        for (List<String> row : Reference.rows("reactions/water_formation.csv")) {
            double t = Double.parseDouble(row.get(0));
            double rtLn10 = Constants.GAS * t * StrictMath.log(10);
            assertEquals(
                    Double.parseDouble(row.get(5)), -function.gibbs(t) / rtLn10, t > 2500 ? 0.03 : 0.01, "at " + t);
        }
    }

    @Test
    void givesTheBoilingPointOfMercury() throws Exception {
        Node.Group body = new Settings()
                .with("reaction", new Node.Text("Hg(l) = Hg(g)"))
                .with("source", new Node.Text("janaf"))
                .body();
        Node.Quantity bar = Settings.crossover(body);
        // NIST-JANAF: 629.839 K at a fugacity of 1 bar.
        assertEquals(629.839, bar.value().getAsDouble(), 0.06);
        Node.Group atmosphere = new Settings()
                .with("reaction", new Node.Text("Hg(l) = Hg(g)"))
                .with("composition", new Node.Group(Map.of("Hg(g)", Node.Quantity.of(1, "atm"))))
                .body();
        Node.Quantity boiling = (Node.Quantity)
                Settings.items(atmosphere, "crossoversAtComposition").get(0);
        // CRC Handbook: 629.88 K. The ideal gas at 1 atm lies RT² ln(1.01325)/ΔH = 0.73 K above the one at 1 bar;
        // JANAF's
        // 1 bar and the handbook's 1 atm differ by 0.69 K less than that, which is the accuracy of the enthalpy of
        // formation
        // (40 J/mol over 94 J/(mol K) is 0.4 K) and of the fugacity.
        assertEquals(629.88, boiling.value().getAsDouble(), 0.8);
        assertEquals(
                0.73, boiling.value().getAsDouble() - bar.value().getAsDouble(), 0.01, "the Clausius-Clapeyron shift");
    }

    /** USGS Bulletin 2131 for calcite (from memory), Shomate coefficients for CaO and CO2; checked by another program. */
    @Test
    void givesTheDecompositionOfCalcite() throws Exception {
        double[] cp = {-2.1576e6, 0, 99.72, 0.02692, 0, 0, 0};
        SpeciesData calcite = SpeciesData.of(
                Species.parse("CaCO3(s)"),
                "usgs",
                "USGS Bulletin 2131",
                List.of(PowerSegment.from298(298.15, 1200, cp, -1_207_400, 91.7)));
        List<Participant> participants = new ArrayList<>(SpeciesResolver.resolve(
                Equation.parse("C = CaO(s) + CO2(g)"),
                List.of(CuratedSet.source()),
                Optional.of("shomate"),
                Optional.of(new Node.Group(Map.of(
                        "C",
                        new Node.Group(Map.of(
                                "dHf", Node.Quantity.of(0, "J/mol"), "S", Node.Quantity.of(0, "J/(mol.K)"))))))));
        participants.set(0, new Participant(-1, calcite, "test"));
        ReactionFunction function = ReactionFunction.of(participants, 298.15, 1200);
        // The polynomials give ΔfH at 298.15 K within 10 J/mol of the values that the other program starts from: 0.06
        // K.
        assertEquals(178_788.2, function.enthalpy(298.15), 11);
        assertEquals(160.2793, function.entropy(298.15), 0.03);
        assertEquals(1161.268, CrossoverSearch.roots(function).get(0).kelvin(), 0.2, "at 1 bar");
        assertEquals(
                1162.15,
                CrossoverSearch.roots(function.at(StrictMath.log(1.01325)))
                        .get(0)
                        .kelvin(),
                0.2,
                "at 1 atm");
    }

    /** Brute force: 4000 equal steps. Random heat capacities bend ΔG enough for up to several crossovers. */
    private static int missesNothing(int cases, long seed) throws Exception {
        SplittableRandom random = new SplittableRandom(seed);
        Species species = Species.parse("H2(g)");
        int several = 0;
        for (int n = 0; n < cases; n++) {
            double[] c = new double[PowerSegment.POWERS];
            for (int k = 0; k < c.length; k++) {
                c[k] = random.nextDouble(-60, 60) * StrictMath.pow(700, 2 - k);
            }
            double middle = random.nextDouble(300, 1200);
            PowerSegment bare = new PowerSegment(200, 1500, c, 0, 0);
            // ΔG and ΔH small at one temperature make several crossovers likely.
            double s = -bare.entropy(middle) + random.nextDouble(-4, 4);
            double h = -bare.enthalpy(middle) + random.nextDouble(-3000, 3000);
            double joint = random.nextDouble(400, 1300);
            PowerSegment whole = new PowerSegment(200, 1500, c, h, s);
            PowerSegment below = new PowerSegment(200, joint, c, h, s);
            double melting = random.nextDouble(-20, 20);
            PowerSegment above = new PowerSegment(joint, 1500, c, h + melting * joint, s + melting);
            SpeciesData data =
                    SpeciesData.of(species, "random", "random", n % 2 == 0 ? List.of(whole) : List.of(below, above));
            ReactionFunction function = ReactionFunction.of(List.of(new Participant(1, data, "test")), 200, 1500);
            List<Root> roots = CrossoverSearch.roots(function);
            several += roots.size() > 1 ? 1 : 0;
            int steps = 4000;
            double before = function.gibbs(200);
            double at = 200;
            for (int i = 1; i <= steps; i++) {
                double t = 200 + 1300.0 * i / steps;
                double y = function.gibbs(t);
                if (y * before < 0) {
                    boolean found = false;
                    for (Root root : roots) {
                        found |= root.kelvin() >= at - 1e-9 && root.kelvin() <= t + 1e-9;
                    }
                    assertTrue(found, "case " + n + " misses one between " + at + " and " + t + ": " + roots);
                }
                before = y;
                at = t;
            }
            for (Root root : roots) {
                double g = function.gibbs(root.kelvin());
                double size = Math.abs(function.enthalpy(root.kelvin()))
                        + root.kelvin() * Math.abs(function.entropy(root.kelvin()));
                assertTrue(Math.abs(g) <= 1e-9 * size + 1e-6, "case " + n + ": not a zero " + root + " " + g);
            }
        }
        return several;
    }

    @Test
    void missesNoCrossoverOf500RandomHeatCapacities() throws Exception {
        assertTrue(missesNothing(500, 4) > 50, "the cases must be hard ones");
    }

    @Test
    @Tag("long")
    void missesNoCrossoverOf10000RandomHeatCapacities() throws Exception {
        assertTrue(missesNothing(10_000, 5) > 1000, "the cases must be hard ones");
    }
}
