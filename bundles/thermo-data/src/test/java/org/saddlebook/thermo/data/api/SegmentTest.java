package org.saddlebook.thermo.data.api;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.SplittableRandom;
import org.junit.jupiter.api.Test;
import org.saddlebook.api.problem.InputException;
import org.saddlebook.api.problem.Problem;
import org.saddlebook.reaction.api.Phase;
import org.saddlebook.reaction.api.Species;

class SegmentTest {
    private static final double[] CALCITE = {-2.1576e6, 0, 99.72, 0.02692, 0, 0, 0};

    private static Species species(String text) throws Exception {
        return Species.parse(text);
    }

    /** Cp = dH/dT = T dS/dT for every form, by central differences. */
    @Test
    void heatCapacityIsTheSlopeOfEnthalpyAndEntropy() {
        SplittableRandom random = new SplittableRandom(7);
        for (int i = 0; i < 200; i++) {
            double[] c = new double[9];
            for (int k = 0; k < c.length; k++) {
                c[k] = random.nextDouble(-5, 5) * StrictMath.pow(300, 2 - k);
            }
            c[7] = random.nextDouble(-1e4, 1e4);
            c[8] = random.nextDouble(-20, 20);
            PowerSegment segment = PowerSegment.nasa9(200, 1000, c);
            double t = random.nextDouble(250, 900);
            double step = 0.01;
            double h = (segment.enthalpy(t + step) - segment.enthalpy(t - step)) / (2 * step);
            double s = (segment.entropy(t + step) - segment.entropy(t - step)) / (2 * step);
            double cp = segment.heatCapacity(t);
            double size = 8.3 * 5 * 7 * StrictMath.pow(4, 4);
            assertEquals(cp, h, 1e-6 * size);
            assertEquals(cp, t * s, 1e-6 * size);
        }
    }

    @Test
    void keepsTheValuesAt298() {
        PowerSegment segment = PowerSegment.from298(298.15, 1200, CALCITE, -1_207_400, 91.7);
        assertEquals(-1_207_400, segment.enthalpy(298.15), 1e-6);
        assertEquals(91.7, segment.entropy(298.15), 1e-10);
        assertEquals(99.72 + 0.02692 * 500 - 2.1576e6 / 250_000, segment.heatCapacity(500), 1e-10);
    }

    @Test
    void tableIsExactAtItsRowsAndCloseBetween() {
        PowerSegment truth = PowerSegment.from298(200, 1200, CALCITE, -1_207_400, 91.7);
        double[] t = {200, 250, 298.15, 300, 400, 500, 600, 700, 800, 900, 1000, 1100, 1200};
        double[] cp = new double[t.length];
        double[] h = new double[t.length];
        double[] s = new double[t.length];
        for (int i = 0; i < t.length; i++) {
            cp[i] = Math.rint(truth.heatCapacity(t[i]) * 1000) / 1000;
            h[i] = Math.rint(truth.enthalpy(t[i]));
            s[i] = Math.rint(truth.entropy(t[i]) * 1000) / 1000;
        }
        TableSegment table = new TableSegment(t, cp, h, s);
        for (int i = 0; i < t.length; i++) {
            assertEquals(h[i], table.enthalpy(t[i]), 1e-8);
            assertEquals(s[i], table.entropy(t[i]), 1e-12);
        }
        for (double kelvin = 200; kelvin <= 1200; kelvin += 0.37) {
            // 0.008 q w^3 with q = 1.6e-3 at 300 K and w = 100 K, and the rounding of the rows.
            assertEquals(truth.enthalpy(kelvin), table.enthalpy(kelvin), 13);
            assertEquals(truth.gibbs(kelvin), table.gibbs(kelvin), 4, "at " + kelvin);
        }
    }

    @Test
    void tellsPhaseChangesFromBrokenJointsAndGaps() throws Exception {
        double[] cp = {0, 0, 30, 0, 0, 0, 0};
        PowerSegment solid = PowerSegment.from298(200, 350, cp, 0, 50);
        // Melts at 350 K with 7000 J/mol, so that S rises by 20 J/(mol K).
        PowerSegment liquid = PowerSegment.from298(350, 600, cp, 7000, 70);
        PowerSegment other = PowerSegment.from298(600, 900, cp, 7000, 72);
        PowerSegment same = PowerSegment.from298(900, 1000, cp, 7010, 72);
        PowerSegment far = PowerSegment.from298(1100, 1200, cp, 7010, 72);
        SpeciesData data =
                SpeciesData.of(species("Ga(s)"), "invented", "invented", List.of(solid, liquid, other, same, far));
        assertEquals(
                List.of(Joint.Kind.PHASE_CHANGE, Joint.Kind.BROKEN, Joint.Kind.SMOOTH, Joint.Kind.GAP),
                data.joints().stream().map(Joint::kind).toList());
        assertEquals(7000, data.joints().get(0).enthalpy(), 1e-9);
        assertEquals(Optional.of(liquid), data.segment(350), "the upper one at a joint");
        assertTrue(data.segment(1050).isEmpty());
        assertTrue(data.segment(1201).isEmpty());
        assertEquals(far, data.nearest(1090));
        assertEquals(solid, data.nearest(10));
    }

    @Test
    void refusesWhatCannotBe() throws Exception {
        Species gas = species("N2(g)");
        PowerSegment low = PowerSegment.from298(200, 400, new double[7], 0, 0);
        assertThrows(IllegalArgumentException.class, () -> SpeciesData.of(gas, "x", "x", List.of()));
        assertThrows(IllegalArgumentException.class, () -> SpeciesData.of(gas, "x", "x", List.of(low, low)));
        assertThrows(
                IllegalArgumentException.class,
                () -> SpeciesData.constants(gas, "x", "x", 0, 0)
                        .withUncertainties(OptionalDouble.of(-1), OptionalDouble.empty()));
        assertThrows(IllegalArgumentException.class, () -> PowerSegment.shomate(300, 200, new double[7]));
        assertThrows(IllegalArgumentException.class, () -> PowerSegment.shomate(-1, 200, new double[7]));
        assertThrows(IllegalArgumentException.class, () -> PowerSegment.nasa7(1, 2, new double[8]));
        assertThrows(
                IllegalArgumentException.class,
                () -> PowerSegment.nasa7(1, 2, new double[] {Double.NaN, 0, 0, 0, 0, 0, 0}));
        assertThrows(
                IllegalArgumentException.class,
                () -> new TableSegment(new double[] {2, 1}, new double[2], new double[2], new double[2]));
        assertFalse(SpeciesData.constants(gas, "x", "x", 0, 0).heatCapacityKnown());
    }

    private static final String GOOD = """
            H2O               L 8/89H   2O   1          G   200.000  3500.000 1000.00      1
             3.03399249E+00 2.17691804E-03-1.64072518E-07-9.70419870E-11 1.68200992E-14    2
            -3.00042971E+04 4.96677010E+00 4.19864056E+00-2.03643410E-03 6.52040211E-06    3
            -5.48797062E-09 1.77197817E-12-3.02937267E+04-8.49032208E-01                   4""";

    @Test
    void readsNasa7InPublishedColumns() throws Exception {
        List<SpeciesData> read =
                NasaFiles.nasa7("THERMO ALL\n   300.000  1000.000  5000.000\n! remark\n" + GOOD + "\nEND\n", "f", "r");
        assertEquals(1, read.size());
        assertEquals(species("H2O(g)"), read.get(0).species());
        assertEquals(Joint.Kind.SMOOTH, read.get(0).joints().get(0).kind());
        // NIST-JANAF, 298.15 K: Cp 33.590, S 188.834, dfH -241.826.
        Segment low = read.get(0).segment(298.15).orElseThrow();
        assertEquals(33.590, low.heatCapacity(298.15), 0.03);
        assertEquals(188.834, low.entropy(298.15), 0.01);
        assertEquals(-241_826, low.enthalpy(298.15), 10);
    }

    @Test
    void readsNamesThatAreNoFormulas() throws Exception {
        String ion = GOOD.replace("H2O               L 8/89H   2O   1     ", "oxonium, guess    L 8/89H   3O   1E  -1");
        SpeciesData read = NasaFiles.nasa7(ion, "f", "r").get(0);
        assertEquals(1, read.species().formula().charge());
        assertEquals(Optional.of(Phase.GAS), read.species().phase());
        assertEquals("oxonium,", read.species().modification());
    }

    @Test
    void saysWhereColumnsAreWrong() {
        problem(GOOD.replace("G   200.000", "Q   200.000"), "unknown-phase", 1, "columns 45-45");
        problem(GOOD.replace("1000.00 ", "9000.00 "), "temperature-range", 1, "columns 46-73");
        problem(GOOD.replace("2.17691804E-03", "2.1769x804E-03"), "not-a-number", 2, "columns 16-30");
        problem(GOOD.replace("-01                   4", "-01                  4 "), "line-number", 4, "columns 80-80");
        problem(GOOD.substring(0, GOOD.lastIndexOf('\n')), "line-number", 3, "columns 80-80");
        problem(GOOD.replace("H   2O   1", "J   2O   1"), "unknown-element", 1, "columns 1-80");
    }

    private static void problem(String text, String code, int line, String column) {
        InputException wrong = assertThrows(InputException.class, () -> NasaFiles.nasa7(text, "f", "r"));
        Problem first = wrong.problems().get(0);
        assertEquals(code, first.code(), first.toString());
        assertEquals(line, first.place().line().orElseThrow(), first.toString());
        assertEquals(Optional.of(column), first.place().column());
    }

    @Test
    void saysWhereNasa9IsWrong() {
        String good = """
            N2                Ref-Elm.
             1 tpis78 N   2.00    0.00    0.00    0.00    0.00 0   28.0134000          0.000
                200.000   1000.0007 -2.0 -1.0  0.0  1.0  2.0  3.0  4.0  0.0         8670.104
             2.210371497D+04-3.818461820D+02 6.082738360D+00-8.530914410D-03 1.384646189D-05
            -9.625793620D-09 2.519705809D-12                 7.108460860D+02-1.076003744D+01""";
        assertEquals(1, read9(good).size());
        problem9(good.replace(" 2.0  3.0", " 2.5  3.0"), "exponent", 3);
        problem9(good.replace("1000.0007", " 100.0007"), "temperature-range", 3);
        problem9(good.replace("6.082738360D+00", "6.082738360Q+00"), "not-a-number", 4);
        problem9(good.substring(0, good.lastIndexOf('\n')), "not-a-number", 5);
    }

    private static List<SpeciesData> read9(String text) {
        try {
            return NasaFiles.nasa9(text, "f", "r");
        } catch (InputException wrong) {
            throw new AssertionError(wrong);
        }
    }

    private static void problem9(String text, String code, int line) {
        InputException wrong = assertThrows(InputException.class, () -> NasaFiles.nasa9(text, "f", "r"));
        assertEquals(code, wrong.problems().get(0).code(), wrong.toString());
        assertEquals(line, wrong.problems().get(0).place().line().orElseThrow());
    }
}
