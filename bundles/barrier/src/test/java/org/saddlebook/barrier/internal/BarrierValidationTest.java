package org.saddlebook.barrier.internal;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static org.saddlebook.barrier.internal.ReferenceCampaign.csv;
import static org.saddlebook.barrier.internal.ReferenceCampaign.items;
import static org.saddlebook.barrier.internal.ReferenceCampaign.json;
import static org.saddlebook.barrier.internal.ReferenceCampaign.member;
import static org.saddlebook.barrier.internal.ReferenceCampaign.number;
import static org.saddlebook.barrier.internal.ReferenceCampaign.text;

import java.math.BigDecimal;
import java.math.RoundingMode;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.stream.Stream;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;
import org.saddlebook.api.campaign.Choices;
import org.saddlebook.api.campaign.ErrorModel;
import org.saddlebook.api.campaign.RatePoint;
import org.saddlebook.api.findings.Interval;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.quantity.Constants;
import org.saddlebook.api.quantity.Unit;
import org.saddlebook.json.api.JsonNumber;
import org.saddlebook.json.api.JsonObject;
import org.saddlebook.json.api.JsonValue;
import org.saddlebook.units.api.Converter;
import org.saddlebook.units.api.Units;

/**
 * The analysis against values computed outside (mpmath, SciPy, R; see README.md beside the data) and against published
 * ones. Parameters to 10 significant digits, everything else to 8: that is what double precision leaves after the
 * cancellation in a three-parameter law, and what R and SciPy themselves reach.
 */
@Tag("validation")
class BarrierValidationTest {
    private static final double TEN_DIGITS = 1e-10;
    private static final double EIGHT_DIGITS = 1e-8;

    static Stream<String> tables() throws Exception {
        return ReferenceCampaign.all().stream().map(ReferenceCampaign::name);
    }

    @ParameterizedTest
    @MethodSource("tables")
    void findingsAgreeWithOutsidePrograms(String name) throws Exception {
        ReferenceCampaign campaign = ReferenceCampaign.named(name);
        int compared = 0;
        for (JsonValue entry : items(json("expected/" + name + ".json"), "fits")) {
            String label = name + ", " + text(entry, "model") + ", " + text(entry, "errorModel");
            Node.Group findings = campaign.evaluate(
                    text(entry, "model"), text(entry, "standard"), ErrorModel.of(text(entry, "errorModel")));
            Node.Group law = law(findings);
            if (((JsonObject) entry).has("noDegreeOfFreedom")) {
                assertNothingIsSaidAboutScatter(law, text(entry, "errorModel"), label);
                continue;
            }
            assertEquals("fitted", ((Node.Text) at(law, "outcome")).value(), label);
            compared += compare(findings, law, (JsonObject) member(entry, "values"), campaign.targets(), label);
        }
        assertTrue(compared > 80, () -> "only the arbiter's values were compared");
    }

    /** Without a degree of freedom the scatter is unknown; stated uncertainties still give the parameters theirs. */
    private static void assertNothingIsSaidAboutScatter(Node.Group law, String errorModel, String label) {
        Node.Group parameters = (Node.Group) at(law, "parameters");
        for (Node each : parameters.members().values()) {
            Node.Quantity quantity = (Node.Quantity) each;
            boolean stated = errorModel.equals("stated");
            assertEquals(
                    stated,
                    quantity.standardUncertainty().isPresent()
                            || quantity.standardFactor().isPresent(),
                    label);
        }
    }

    private static int compare(
            Node.Group findings, Node.Group law, JsonObject expected, List<Double> targets, String label) {
        int compared = 0;
        Node.Group parameters = (Node.Group) at(law, "parameters");
        Node.Group statistics = (Node.Group) at(law, "statistics");
        List<Node> predictions = ((Node.Items) at(findings, "predictions")).items();
        assertEquals(targets.size(), predictions.size(), label);
        for (Map.Entry<String, JsonValue> each : expected.members().entrySet()) {
            String key = each.getKey();
            double value = ((JsonNumber) each.getValue()).value();
            int dot = key.indexOf('.');
            String rest = key.substring(dot + 1);
            double found;
            double tolerance = EIGHT_DIGITS;
            switch (key.substring(0, dot)) {
                case "parameter" -> {
                    found = rest.equals("lnA") ? StrictMath.log(value(parameters, "A")) : value(parameters, rest);
                    tolerance = TEN_DIGITS;
                }
                case "uncertainty" -> found = uncertainty(parameters, rest);
                case "limit" ->
                    found = limit((Node.Quantity) at(parameters, rest.substring(0, rest.indexOf('.'))), rest);
                case "covariance" -> found = covariance(law, rest);
                case "statistic" -> found = ((Node.Scalar) at(statistics, rest)).value();
                case "centre" -> found = centre(law, rest);
                case "prediction" -> found = prediction(predictions, targets, rest);
                default -> throw new AssertionError("unknown key " + key);
            }
            assertClose(value, found, tolerance, label + ", " + key);
            compared++;
        }
        return compared;
    }

    private static double uncertainty(Node.Group parameters, String symbol) {
        return symbol.equals("lnA")
                ? StrictMath.log(
                        ((Node.Quantity) at(parameters, "A")).standardFactor().orElseThrow())
                : ((Node.Quantity) at(parameters, symbol)).standardUncertainty().orElseThrow();
    }

    private static double limit(Node.Quantity quantity, String key) {
        Interval interval = quantity.interval().orElseThrow();
        assertEquals(Interval.Kind.BETWEEN, interval.kind(), key);
        return (key.endsWith("ower") ? interval.lower() : interval.upper()).orElseThrow();
    }

    private static double covariance(Node.Group law, String pair) {
        Node.Group covariance = (Node.Group) at(law, "covariance");
        List<String> basis = new ArrayList<>();
        for (Node symbol : ((Node.Items) at(covariance, "basis")).items()) {
            basis.add(((Node.Text) symbol).value().replace("ln ", "ln"));
        }
        int dot = pair.indexOf('.');
        int i = basis.indexOf(pair.substring(0, dot));
        int j = basis.indexOf(pair.substring(dot + 1));
        Node.Matrix matrix = (Node.Matrix) at(covariance, "matrix");
        assertEquals(matrix.get(i, j), matrix.get(j, i), pair);
        return matrix.get(i, j);
    }

    private static double centre(Node.Group law, String key) {
        if (key.equals("kelvin")) {
            return value(law, "derivedAt");
        }
        Node.Quantity gibbs = (Node.Quantity) at((Node.Group) at(law, "derived"), "dG");
        return (key.equals("dG") ? gibbs.value() : gibbs.standardUncertainty()).orElseThrow();
    }

    private static double prediction(List<Node> predictions, List<Double> targets, String key) {
        int dot = key.lastIndexOf('.');
        int index = targets.indexOf(Double.parseDouble(key.substring(0, dot)));
        Node.Group row = (Node.Group) predictions.get(index);
        assertEquals(targets.get(index), value(row, "temperature"));
        String what = key.substring(dot + 1);
        Node.Quantity mean = (Node.Quantity) at(row, "k");
        return switch (what) {
            case "k" -> mean.value().orElseThrow();
            case "uncertaintyLn" -> StrictMath.log(mean.standardFactor().orElseThrow());
            case "lower", "upper" -> limit(mean, what);
            case "newLower", "newUpper" -> limit((Node.Quantity) at(row, "kNewRun"), what);
            default -> throw new AssertionError("unknown key " + key);
        };
    }

    /** Published values, each within one uncertainty; where the source prints none, one of the fit, which is itself checked. */
    @Test
    void publishedValuesLieWithinOneUncertainty() throws Exception {
        for (Map<String, String> row : csv("published.csv")) {
            String label = row.toString();
            Node.Group law = law(ReferenceCampaign.named(row.get("table"))
                    .evaluate(row.get("model"), "1 mol/L", ErrorModel.CONSTANT_RELATIVE));
            Node.Group parameters = (Node.Group) at(law, "parameters");
            double unit = Units.parse(row.get("unit")).factor();
            double found;
            double own;
            switch (row.get("quantity")) {
                case "lnA" -> {
                    found = StrictMath.log(value(parameters, "A"));
                    own = uncertainty(parameters, "lnA");
                }
                case "slope" -> {
                    found = -value(parameters, "Ea") / Constants.GAS;
                    own = uncertainty(parameters, "Ea") / Constants.GAS;
                }
                case "k430" -> {
                    Node.Group findings = ReferenceCampaign.named(row.get("table"))
                            .evaluate(row.get("model"), "1 mol/L", ErrorModel.CONSTANT_RELATIVE);
                    Node.Group first = (Node.Group)
                            ((Node.Items) at(findings, "predictions")).items().get(0);
                    assertEquals(430, value(first, "temperature"));
                    Node.Quantity k = (Node.Quantity) at(first, "k");
                    found = k.value().orElseThrow();
                    own = found * StrictMath.log(k.standardFactor().orElseThrow());
                }
                default -> {
                    found = value(parameters, row.get("quantity")) / unit;
                    own = uncertainty(parameters, row.get("quantity")) / unit;
                }
            }
            BigDecimal published = new BigDecimal(row.get("published"));
            double uncertainty = Double.parseDouble(row.get("uncertainty"));
            assertTrue(Math.abs(found - published.doubleValue()) <= uncertainty, () -> label + ": " + found);
            if (row.get("uncertainty_from").equals("fit")) {
                assertEquals(own, uncertainty, 0.1 * own, label);
            }
            boolean equalAsPrinted = new BigDecimal(found)
                            .setScale(published.scale(), RoundingMode.HALF_EVEN)
                            .subtract(published)
                            .abs()
                            .compareTo(published.ulp().multiply(new BigDecimal("0.5")))
                    <= 0;
            assertEquals(equalAsPrinted, row.get("explanation").startsWith("none"), label + ": " + found);
        }
    }

    /** Fits that the curator of the published tables made with other programs, to the digits stored. */
    @ParameterizedTest
    @ValueSource(
            strings = {"dithionate_hydrolysis", "dinitrogen_pentoxide", "acetaldehyde_pyrolysis", "methyl_isocyanide"})
    void rederivedValuesAgreeToTheirStoredDigits(String name) throws Exception {
        ReferenceCampaign campaign = ReferenceCampaign.named(name);
        JsonValue rederived = member(json(name + ".published.json"), "rederived");

        JsonValue arrhenius = member(rederived, "arrhenius_ln_k_unweighted");
        Node.Group law = law(campaign.evaluate("arrhenius", "1 mol/L", ErrorModel.CONSTANT_RELATIVE));
        Node.Group p = (Node.Group) at(law, "parameters");
        Node.Quantity ea = (Node.Quantity) at(p, "Ea");
        asStored(arrhenius, "lnA", StrictMath.log(value(p, "A")));
        asStored(arrhenius, "A", value(p, "A"));
        asStored(arrhenius, "Ea_kJ_mol", value(p, "Ea") / 1000);
        asStored(arrhenius, "u_lnA", uncertainty(p, "lnA"));
        asStored(arrhenius, "u_Ea_kJ_mol", uncertainty(p, "Ea") / 1000);
        asStored(arrhenius, "correlation_lnA_Ea", correlation(law));
        asStored(arrhenius, "residual_standard_deviation_ln", statistic(law, "s"));
        asStored(arrhenius, "half_width_95_Ea_kJ_mol", (limit(ea, "upper") - limit(ea, "lower")) / 2000);
        assertEquals(number(arrhenius, "degrees_of_freedom"), statistic(law, "dof"));

        JsonValue eyring = member(rederived, "eyring_ln_k_over_T_unweighted");
        law = law(campaign.evaluate("eyring", "1 mol/L", ErrorModel.CONSTANT_RELATIVE));
        p = (Node.Group) at(law, "parameters");
        asStored(eyring, "dH_act_kJ_mol", value(p, "dH") / 1000);
        asStored(eyring, "dS_act_J_mol_K", value(p, "dS"));
        asStored(eyring, "u_dH_kJ_mol", uncertainty(p, "dH") / 1000);
        asStored(eyring, "u_dS_J_mol_K", uncertainty(p, "dS"));
        asStored(eyring, "correlation_dH_dS", correlation(law));
        asStored(eyring, "dG_act_298_kJ_mol", (value(p, "dH") - 298.15 * value(p, "dS")) / 1000);
        asStored(eyring, "residual_standard_deviation_ln", statistic(law, "s"));

        if (!((JsonObject) rederived).has("modified_arrhenius_ln_k_unweighted")) {
            assertEquals("methyl_isocyanide", name, "four points were thought too few for three parameters");
            return;
        }
        JsonValue modified = member(rederived, "modified_arrhenius_ln_k_unweighted");
        double centre = value(law, "derivedAt");
        asStored(modified, "T0_K", centre);
        Choices choices = Choices.defaults()
                .withModels(List.of("modified-arrhenius"))
                .withErrorModel(ErrorModel.CONSTANT_RELATIVE)
                .withReferenceKelvin(centre);
        law = law(ReferenceCampaign.evaluate(campaign.rateUnit(), campaign.order(), campaign.points(), choices));
        p = (Node.Group) at(law, "parameters");
        asStored(modified, "ln_A", StrictMath.log(value(p, "A")));
        asStored(modified, "n", value(p, "n"));
        asStored(modified, "E_kJ_mol", value(p, "E") / 1000);
        asStored(modified, "u_n", uncertainty(p, "n"));
        asStored(modified, "u_E_kJ_mol", uncertainty(p, "E") / 1000);
        asStored(modified, "residual_standard_deviation_ln", statistic(law, "s"));
    }

    /**
     * Evaluated gas-phase expressions: their printed grid, ten digits, leads back to their coefficients. Uncertainties are
     * not compared: the scatter is the rounding of the tenth digit.
     */
    @Test
    void printedGridsLeadBackToTheirExpressions() throws Exception {
        Unit unit = Units.rateConstant("cm3 molecule-1 s-1");
        Converter rate = Converter.of(unit);
        for (JsonValue expression : items(json("expected/grid.json"), "expressions")) {
            List<Map<String, String>> rows = csv("evaluated_grid.csv").stream()
                    .filter(row -> row.get("reaction").equals(text(expression, "reaction"))
                            && row.get("form").equals(text(expression, "form"))
                            && row.get("A").equals(text(expression, "coefficient")))
                    .toList();
            assertEquals(number(expression, "n"), rows.size());
            List<RatePoint> points = new ArrayList<>();
            for (Map<String, String> row : rows) {
                points.add(RatePoint.of(
                        Double.parseDouble(row.get("temperature_K")),
                        rate.toSi(new BigDecimal(row.get("k_cm3_molecule-1_s-1")))));
            }
            String model = text(expression, "model");
            Choices choices =
                    Choices.defaults().withModels(List.of(model)).withErrorModel(ErrorModel.CONSTANT_RELATIVE);
            Node.Group p = (Node.Group) at(law(ReferenceCampaign.evaluate(unit, 2, points, choices)), "parameters");
            for (Map.Entry<String, JsonValue> each :
                    ((JsonObject) member(expression, "fitted")).members().entrySet()) {
                double arbiter = ((JsonNumber) each.getValue()).value();
                double found = value(p, each.getKey());
                String label = text(expression, "coefficient") + ", " + each.getKey();
                assertClose(arbiter, found, TEN_DIGITS, label);
                // What ten printed digits of k leave of the coefficients; the arbiter itself comes no nearer.
                assertClose(number(member(expression, "defined"), each.getKey()), found, EIGHT_DIGITS, label);
            }
            for (Map<String, String> row : rows) {
                double kelvin = Double.parseDouble(row.get("temperature_K"));
                double local = model.equals("arrhenius")
                        ? value(p, "Ea")
                        : value(p, "E") + value(p, "n") * Constants.GAS * kelvin;
                BigDecimal printed = new BigDecimal(row.get("local_Ea_kJ_mol-1"));
                assertEquals(
                        printed.doubleValue(),
                        local / 1000,
                        0.51 * printed.ulp().doubleValue(),
                        row.toString());
            }
        }
    }

    private static void asStored(JsonValue object, String key, double found) {
        double stored = number(object, key);
        // The shortest decimals of the stored number are the digits the curator wrote down.
        double lastDigit = BigDecimal.valueOf(stored).stripTrailingZeros().ulp().doubleValue();
        assertEquals(stored, found, 0.5000001 * lastDigit, key);
    }

    private static double correlation(Node.Group law) {
        return ((Node.Scalar) at((Node.Group) at(law, "covariance"), "correlation")).value();
    }

    private static double statistic(Node.Group law, String key) {
        return ((Node.Scalar) at((Node.Group) at(law, "statistics"), key)).value();
    }

    private static Node.Group law(Node.Group findings) {
        List<Node> models = ((Node.Items) at(findings, "models")).items();
        assertEquals(1, models.size());
        return (Node.Group) models.get(0);
    }

    private static Node at(Node.Group group, String key) {
        return group.get(key)
                .orElseThrow(() -> new AssertionError(
                        "no " + key + " in " + group.members().keySet()));
    }

    private static double value(Node.Group group, String key) {
        return ((Node.Quantity) at(group, key)).value().orElseThrow();
    }

    private static void assertClose(double expected, double found, double relative, String label) {
        assertFalse(Double.isNaN(found), label);
        assertEquals(expected, found, relative * Math.abs(expected), label);
    }
}
