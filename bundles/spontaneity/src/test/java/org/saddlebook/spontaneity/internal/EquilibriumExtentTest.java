package org.saddlebook.spontaneity.internal;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.SplittableRandom;
import org.junit.jupiter.api.Test;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.findings.Section;
import org.saddlebook.spontaneity.api.EquilibriumExtent;

/** Extents against closed forms and against the minimum of the Gibbs energy. */
class EquilibriumExtentTest {
    private static EquilibriumExtent.Member gas(double coefficient, double amount) {
        return new EquilibriumExtent.Member(coefficient, amount, EquilibriumExtent.Kind.GAS);
    }

    private static EquilibriumExtent.Member pure(double coefficient, double amount) {
        return new EquilibriumExtent.Member(coefficient, amount, EquilibriumExtent.Kind.PURE);
    }

    private static EquilibriumExtent.Member solute(double coefficient, double amount) {
        return new EquilibriumExtent.Member(coefficient, amount, EquilibriumExtent.Kind.SOLUTE);
    }

    /** Degree of dissociation of A = 2 B at pressure p: {@code α = √(K/(K + 4p))} (any textbook of physical chemistry). */
    @Test
    void givesTheDissociationOfADimer() {
        for (double k : new double[] {1e-6, 0.1486, 3, 1e5}) {
            for (double p : new double[] {0.01, 1, 30}) {
                double extent = new EquilibriumExtent(List.of(gas(-1, 1), gas(2, 0)), 0, p, 1)
                        .at(StrictMath.log(k))
                        .extent();
                assertEquals(Math.sqrt(k / (k + 4 * p)), extent, 1e-12);
            }
        }
    }

    /** From a stoichiometric feed: {@code y/(1−y)² = √(27 K)/16 · p} for the mole fraction y of ammonia. */
    @Test
    void givesTheSynthesisOfAmmoniaFromAStoichiometricFeed() {
        for (double lnK : new double[] {-12, -9, 0, 6}) {
            for (double p : new double[] {1, 100, 300}) {
                double extent = new EquilibriumExtent(List.of(gas(-1, 1), gas(-3, 3), gas(2, 0)), 0, p, 1)
                        .at(lnK)
                        .extent();
                double y = 2 * extent / (4 - 2 * extent);
                double right = Math.sqrt(27 * StrictMath.exp(lnK)) / 16 * p;
                assertEquals(1, y / ((1 - y) * (1 - y)) / right, 1e-8);
            }
        }
    }

    /** A weak acid in water: {@code x²/(c − x) = K}. */
    @Test
    void givesTheDissociationOfAWeakAcid() {
        double k = 1.75e-5;
        double c = 0.1;
        double extent = new EquilibriumExtent(List.of(solute(-1, 0.2), solute(1, 0), solute(1, 0)), 0, 1, 2)
                .at(StrictMath.log(k))
                .extent();
        double x = (-k + Math.sqrt(k * k + 4 * k * c)) / 2;
        assertEquals(2 * x, extent, 1e-12);
    }

    /** A carbonate under an inert gas: {@code n/(n + inert) p = K}; alone it decomposes wholly or not at all. */
    @Test
    void knowsPurePhases() {
        List<EquilibriumExtent.Member> carbonate = List.of(pure(-1, 1), pure(1, 0), gas(1, 0));
        EquilibriumExtent.Answer open = new EquilibriumExtent(carbonate, 2, 1, 1).at(StrictMath.log(0.2));
        assertEquals(0.5, open.extent(), 1e-12);
        assertFalse(open.usedUp());
        EquilibriumExtent.Answer gone = new EquilibriumExtent(carbonate, 2, 1, 1).at(StrictMath.log(0.5));
        assertEquals(1, gone.extent(), 1e-12);
        assertTrue(gone.usedUp());
        assertEquals(0, new EquilibriumExtent(carbonate, 0, 1, 1).at(-0.1).extent(), 1e-12);
        assertEquals(1, new EquilibriumExtent(carbonate, 0, 1, 1).at(0.1).extent(), 1e-12);
    }

    /** The total Gibbs energy, over RT, of random mixtures has its minimum at the extent (golden section, run here). */
    @Test
    void minimisesTheGibbsEnergy() {
        SplittableRandom random = new SplittableRandom(3);
        for (int n = 0; n < 300; n++) {
            List<EquilibriumExtent.Member> members = new ArrayList<>();
            for (int i = 0; i < 4; i++) {
                double nu = (i < 2 ? -1 : 1) * (1 + random.nextInt(3));
                members.add(gas(nu, random.nextDouble(0.2, 3)));
            }
            double inert = random.nextDouble(0, 2);
            double p = random.nextDouble(0.1, 50);
            double lnK = random.nextDouble(-6, 6);
            EquilibriumExtent system = new EquilibriumExtent(members, inert, p, 1);
            EquilibriumExtent.Answer answer = system.at(lnK);
            double low = system.lower();
            double high = system.upper();
            double golden = (Math.sqrt(5) - 1) / 2;
            for (int i = 0; i < 90; i++) {
                double a = high - golden * (high - low);
                double b = low + golden * (high - low);
                if (total(members, inert, p, lnK, a) < total(members, inert, p, lnK, b)) {
                    high = b;
                } else {
                    low = a;
                }
            }
            assertEquals((low + high) / 2, answer.extent(), 1e-6, "case " + n);
            double step = 1e-5;
            assertEquals(
                    (system.at(lnK + step).extent() - system.at(lnK - step).extent()) / (2 * step),
                    answer.perLnK(),
                    1e-6);
            double more = new EquilibriumExtent(members, inert, p * StrictMath.exp(step), 1)
                    .at(lnK)
                    .extent();
            double less = new EquilibriumExtent(members, inert, p * StrictMath.exp(-step), 1)
                    .at(lnK)
                    .extent();
            assertEquals((more - less) / (2 * step), answer.perLnPressure(), 1e-6);
        }
    }

    /** Σ n (μ°/RT + ln a), with μ° of the reaction put on its first species. */
    private static double total(
            List<EquilibriumExtent.Member> members, double inert, double p, double lnK, double extent) {
        double gas = inert;
        for (EquilibriumExtent.Member one : members) {
            gas += one.amount() + one.coefficient() * extent;
        }
        double sum = inert > 0 ? inert * StrictMath.log(inert / gas * p) : 0;
        for (int i = 0; i < members.size(); i++) {
            EquilibriumExtent.Member one = members.get(i);
            double n = one.amount() + one.coefficient() * extent;
            double standard = i == 0 ? -lnK / one.coefficient() : 0;
            sum += n > 0 ? n * (standard + StrictMath.log(n / gas * p)) : 0;
        }
        return sum;
    }

    @Test
    void writesTheEquilibriumAtEveryTemperature() throws Exception {
        Node.Group body = settings(Node.Quantity.of(1, "mol"), new Node.Scalar(3), Node.Quantity.of(100, "bar"))
                .body();
        List<Node> rows = Settings.items(body, "equilibrium");
        assertEquals(Settings.items(body, "dG").size(), rows.size());
        double before = 1;
        for (Node node : rows) {
            double now =
                    Settings.quantity((Node.Group) node, "conversion").value().getAsDouble();
            assertTrue(now <= before && now >= 0, "an exothermic reaction converts less when hot");
            before = now;
        }
    }

    @Test
    void refusesByName() throws Exception {
        refused("above zero", settings(new Node.Scalar(1), new Node.Scalar(3), Node.Quantity.of(0, "bar")));
        refused("must not be negative", settings(new Node.Scalar(-1), new Node.Scalar(3), Node.Quantity.of(1, "bar")));
        refused("Nothing can react", settings(new Node.Scalar(0), new Node.Scalar(3), Node.Quantity.of(1, "bar")));
        refused("the unit of pressure", settings(new Node.Scalar(1), new Node.Scalar(3), Node.Quantity.of(1, "kg")));
    }

    private static Settings settings(Node nitrogen, Node hydrogen, Node pressure) {
        return new Settings()
                .with("reaction", new Node.Text("N2(g) + 3 H2(g) = 2 NH3(g)"))
                .with(
                        "equilibrium",
                        new Node.Group(Map.of(
                                "amounts",
                                new Node.Group(Map.of("N2", nitrogen, "H2(g)", hydrogen)),
                                "pressure",
                                pressure)));
    }

    private static void refused(String words, Settings settings) throws Exception {
        Section section = settings.section();
        assertEquals(Section.Outcome.REFUSED, section.outcome(), words);
        String reason = Settings.text((Node.Group) section.body(), "reason");
        assertTrue(reason.contains(words), reason);
    }
}
