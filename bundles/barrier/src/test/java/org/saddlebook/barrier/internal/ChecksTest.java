package org.saddlebook.barrier.internal;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;
import java.util.SplittableRandom;
import java.util.TreeMap;
import java.util.function.IntFunction;
import java.util.random.RandomGenerator;
import org.junit.jupiter.api.Test;
import org.saddlebook.api.campaign.Campaign;
import org.saddlebook.api.campaign.Choices;
import org.saddlebook.api.campaign.ErrorModel;
import org.saddlebook.api.campaign.RatePoint;
import org.saddlebook.api.campaign.RateTable;
import org.saddlebook.api.findings.Interval;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.findings.Section;
import org.saddlebook.api.task.Cancelled;
import org.saddlebook.api.task.Task;

/** What stands beside the laws. The campaigns are drawn from laws chosen here. */
class ChecksTest {
    private static final double GAS = 8.31446261815324;

    private static final class Drawing implements Task {
        private final long seed;

        Drawing(long seed) {
            this.seed = seed;
        }

        @Override
        public void progress(double fraction, String doing) {
            assertTrue(fraction >= 0 && fraction <= 1);
        }

        @Override
        public void check() {}

        @Override
        public RandomGenerator random(String stream) {
            return new SplittableRandom(seed * 31 + stream.hashCode());
        }

        @Override
        public <T> List<T> parts(int count, IntFunction<T> part) {
            throw new AssertionError("no parts are asked for");
        }
    }

    private static RateTable table(int perTemperature, double scatter, long seed) {
        SplittableRandom random = new SplittableRandom(seed);
        List<RatePoint> points = new ArrayList<>();
        for (int i = 0; i < 6; i++) {
            double kelvin = 313.15 + 8 * i;
            for (int j = 0; j < perTemperature; j++) {
                double ln = 30 - 100_000 / (GAS * kelvin) + scatter * random.nextGaussian();
                points.add(RatePoint.of(kelvin, StrictMath.exp(ln)));
            }
        }
        return new RateTable(Bench.PER_SECOND, 1, points);
    }

    private static Node.Group body(RateTable table, Map<String, Node> settings, long seed) {
        Map<String, InstalledModel> installed = Bench.models();
        Campaign campaign = Bench.campaign(
                table,
                Choices.defaults()
                        .withErrorModel(ErrorModel.CONSTANT_RELATIVE)
                        .withTargetsKelvin(List.of(298.15, 373.15)),
                installed);
        if (!settings.isEmpty()) {
            campaign = campaign.withSetting("barrier", new Node.Group(settings));
        }
        try {
            Section section = new BarrierEvaluation(campaign, installed, new Drawing(seed)).section();
            return (Node.Group) section.body();
        } catch (Cancelled impossible) {
            throw new AssertionError(impossible);
        }
    }

    private static Map<String, Node> intervals(String... words) {
        Map<String, Node> settings = new TreeMap<>();
        List<Node> items = new ArrayList<>();
        for (String word : words) {
            items.add(new Node.Text(word));
        }
        settings.put("intervals", new Node.Items(items));
        return settings;
    }

    private static Node.Table table(Node.Group body, String group, String key) {
        return TreeReader.member(TreeReader.group(body, group), key, Node.Table.class);
    }

    @Test
    void everyIntervalAskedForStandsBesideTheOthersWithItsCoverage() {
        Node.Group body = body(
                table(2, 0.05, 1),
                intervals("profile", "monte-carlo", "bootstrap-residual", "bootstrap-case", "bootstrap-parametric"),
                1);
        Node.Table table = table(body, "otherIntervals", "table");
        // Arrhenius: two parameters by profile; two and k at two targets by four methods, three of them in two forms.
        long arrhenius = table.rows().stream()
                .filter(row -> row.get(0).equals(new Node.Text("Arrhenius")))
                .count();
        assertEquals(2 + 4 * (1 + 2 * 3), arrhenius);
        String notes = Bench.texts(TreeReader.group(body, "otherIntervals"), "notes");
        for (IntervalMethod method : IntervalMethod.values()) {
            assertTrue(notes.contains(method.coverage()), method.key());
        }
        Interval usual = Bench.parameter(body, "arrhenius", "Ea").interval().orElseThrow();
        for (List<Node> row : table.rows()) {
            if (row.get(0).equals(new Node.Text("Arrhenius")) && row.get(1).equals(new Node.Text("Ea"))) {
                Interval other = ((Node.Quantity) row.get(3)).interval().orElseThrow();
                double ratio = (other.upper().orElseThrow() - other.lower().orElseThrow())
                        / (usual.upper().orElseThrow() - usual.lower().orElseThrow());
                boolean close =
                        other.method().startsWith("profile") || other.method().startsWith("monte");
                assertEquals(1, ratio, close ? 0.04 : 0.35, other.method());
            }
        }
    }

    @Test
    void theSameSeedGivesTheSameResamplesAndAnotherOneOthers() {
        RateTable table = table(2, 0.05, 2);
        Map<String, Node> settings = intervals("bootstrap-residual");
        settings.put("resamples", new Node.Scalar(1000));
        Node first = body(table, settings, 5).get("otherIntervals").orElseThrow();
        assertEquals(first, body(table, settings, 5).get("otherIntervals").orElseThrow());
        assertTrue(!first.equals(body(table, settings, 6).get("otherIntervals").orElseThrow()));
    }

    @Test
    void aBootstrapOfFewPointsIsRefusedUnlessAccepted() {
        RateTable table = table(1, 0.05, 3);
        Node.Group refused = TreeReader.group(body(table, intervals("bootstrap-case"), 1), "otherIntervals");
        assertTrue(refused.get("table").isEmpty());
        assertTrue(Bench.texts(refused, "notes").contains("refused for 6 points"));
        Map<String, Node> settings = intervals("bootstrap-case");
        settings.put("bootstrapOfFewPoints", new Node.Text("accepted"));
        Node.Group accepted = TreeReader.group(body(table, settings, 1), "otherIntervals");
        assertTrue(accepted.get("table").isPresent());
    }

    @Test
    void aMethodThatIsNoneRefusesTheSectionWithTheWordsThatAre() {
        Map<String, InstalledModel> installed = Bench.models();
        Campaign campaign = Bench.campaign(table(1, 0.05, 3), Choices.defaults(), installed)
                .withSetting("barrier", new Node.Group(intervals("guess")));
        try {
            Section section = new BarrierEvaluation(campaign, installed, Bench.TASK).section();
            assertTrue(section.body().toString().contains("bootstrap-parametric"));
        } catch (Cancelled impossible) {
            throw new AssertionError(impossible);
        }
    }

    @Test
    void leftOutTemperaturesArePredictedByAFitToTheRest() {
        RateTable table = table(1, 0.05, 4);
        Node.Table errors = TreeReader.member(body(table, Map.of(), 1), "leaveOneTemperatureOut", Node.Table.class);
        assertEquals(7, errors.rows().size());
        // The residual without the point is r/(1 - h) (Cook and Weisberg 1982, 2.2).
        Node.Group body = body(table, Map.of(), 1);
        Node.Table points = table(body, "residualChecks", "points");
        int column = 0;
        for (int i = 0; i < errors.columns().size(); i++) {
            column = errors.columns()
                            .get(i)
                            .key()
                            .equals(TreeReader.text(TreeReader.group(body, "residualChecks"), "model"))
                    ? i
                    : column;
        }
        for (int i = 0; i < 6; i++) {
            double residual = ((Node.Scalar) points.rows().get(i).get(2)).value();
            double leverage = ((Node.Scalar) points.rows().get(i).get(3)).value();
            assertEquals(
                    residual / (1 - leverage),
                    ((Node.Scalar) errors.rows().get(i).get(column)).value(),
                    1e-9);
        }
    }

    @Test
    void lawsThatAgreeAverageToThemselvesAndDisagreementWidens() {
        Node.Group body = body(table(1, 0.05, 4), Map.of(), 1);
        Node.Group row =
                (Node.Group) TreeReader.items(body, "averagedPredictions").get(0);
        double average = TreeReader.quantity(row, "k").value().orElseThrow();
        double lowest = Double.POSITIVE_INFINITY;
        double highest = 0;
        for (Node each : TreeReader.items(body, "predictions")) {
            Node.Group prediction = (Node.Group) each;
            if (TreeReader.quantity(prediction, "temperature").value().orElseThrow() == 298.15) {
                double k = TreeReader.quantity(prediction, "k").value().orElseThrow();
                lowest = Math.min(lowest, k);
                highest = Math.max(highest, k);
            }
        }
        assertTrue(average > lowest && average < highest);
        assertEquals(highest / lowest, TreeReader.number(row, "spreadBetweenLaws"), 1e-9);
    }

    @Test
    void theStatedCurvatureIsFoundInFourCampaignsOfFive() {
        // Median over campaigns of the curvature stated, then campaigns that have it: how often n's interval excludes
        // none.
        for (int n : new int[] {6, 12}) {
            int per = n / 6;
            List<Double> stated = new ArrayList<>();
            for (int i = 0; i < 400; i++) {
                Node.Group body = new BlindSpot(
                                Measurements.of(table(per, 0.05, 900 + i), ErrorModel.CONSTANT_RELATIVE), 0.95)
                        .node(List.of());
                // s estimates the scatter with a spread; its square is unbiased.
                double size = TreeReader.number(body, "n");
                stated.add(size * size);
            }
            double size = Math.sqrt(
                    stated.stream().mapToDouble(Double::doubleValue).average().orElseThrow());
            int found = 0;
            int campaigns = 2000;
            for (int i = 0; i < campaigns; i++) {
                SplittableRandom random = new SplittableRandom(70_000 + i);
                List<RatePoint> points = new ArrayList<>();
                for (RatePoint point : table(per, 0, 1).points()) {
                    double u = point.kelvin() / 333.15;
                    double bend = size * (StrictMath.log(u) + 1 / u - 1);
                    points.add(RatePoint.of(
                            point.kelvin(), point.rate() * StrictMath.exp(bend + 0.05 * random.nextGaussian())));
                }
                Measurements data =
                        Measurements.of(new RateTable(Bench.PER_SECOND, 1, points), ErrorModel.CONSTANT_RELATIVE);
                InstalledModel model = Bench.models().get("modified-arrhenius");
                FittedLaw law = (FittedLaw) LawFitter.fit(
                        model.model(), org.saddlebook.api.model.RateContext.of(Bench.PER_SECOND, 1), data, () -> {});
                FittedLaw.Estimate extra = law.parameter(law.extraParameter());
                found += Math.abs(extra.value()) > extra.halfWidth(0.95, law.degreesOfFreedom()) ? 1 : 0;
            }
            assertEquals(0.8, (double) found / campaigns, 0.06, "n = " + n);
        }
    }

    @Test
    void aPathThatCannotBeSeenBendsTheLineByTheStatedCurvature() {
        RateTable table = table(2, 0.02, 4);
        Node.Group spot = TreeReader.group(body(table, Map.of(), 1), "blindSpot");
        double size = TreeReader.number(spot, "n");
        Node.Group path = (Node.Group) TreeReader.items(spot, "hiddenPaths").get(0);
        assertEquals(0.5, TreeReader.number(path, "barrierRatio"));
        double share = TreeReader.number(path, "shareAtCentre");
        double centre = TreeReader.quantity(TreeReader.group(body(table, Map.of(), 1), "table"), "centre")
                .value()
                .orElseThrow();
        double ea = Bench.parameter(body(table, Map.of(), 1), "arrhenius", "Ea")
                .value()
                .orElseThrow();
        // A table without scatter whose k has such a path: the modified law shows that exponent.
        List<RatePoint> points = new ArrayList<>();
        for (RatePoint point : table(2, 0, 1).points()) {
            double ratio = share / (1 - share) * StrictMath.exp(ea / 2 / GAS * (1 / point.kelvin() - 1 / centre));
            points.add(RatePoint.of(point.kelvin(), point.rate() * (1 + ratio)));
        }
        Node.Group bent = body(new RateTable(Bench.PER_SECOND, 1, points), Map.of(), 1);
        assertEquals(
                size, Bench.parameter(bent, "modified-arrhenius", "n").value().orElseThrow(), 1e-3 * size);
        double predicted = ((Node.Group) TreeReader.items(bent, "predictions").get(0))
                .get("k")
                .map(k -> ((Node.Quantity) k).value().orElseThrow())
                .orElseThrow();
        double ratio = share / (1 - share) * StrictMath.exp(ea / 2 / GAS * (1 / 298.15 - 1 / centre));
        double truth = StrictMath.exp(30 - 100_000 / (GAS * 298.15)) * (1 + ratio);
        assertEquals(truth / predicted, TreeReader.number(path, "factor"), 0.01);
    }

    @Test
    void aWrongPointIsNamedAndRobustFitsMoveAway() {
        List<RatePoint> points = new ArrayList<>(table(2, 0.02, 7).points());
        RatePoint wrong = points.get(5);
        points.set(5, RatePoint.of(wrong.kelvin(), wrong.rate() * 1.6));
        Node.Group body = body(new RateTable(Bench.PER_SECOND, 1, points), Map.of(), 1);
        assertTrue(Bench.texts(body, "remarks").contains("point 6 lies"));
        Node.Table fits = table(body, "robustFits", "fits");
        double truth = 100_000;
        int column = 2;
        assertEquals("Ea", fits.columns().get(column).key());
        double ordinary =
                ((Node.Quantity) fits.rows().get(0).get(column)).value().orElseThrow();
        double bisquare =
                ((Node.Quantity) fits.rows().get(2).get(column)).value().orElseThrow();
        assertTrue(Math.abs(bisquare - truth) < Math.abs(ordinary - truth));
        assertTrue(Bench.texts(TreeReader.group(body, "robustFits"), "notes").contains("Huber 90.8"));
    }

    @Test
    void fewPointsCarryTheSentenceOnLeverage() {
        Node.Group body = body(table(1, 0.05, 4), Map.of(), 1);
        assertTrue(Bench.texts(TreeReader.group(body, "robustFits"), "notes").contains("do not resist leverage"));
        Node.Group more = body(table(2, 0.05, 4), Map.of(), 1);
        assertTrue(!Bench.texts(TreeReader.group(more, "robustFits"), "notes").contains("do not resist leverage"));
    }

    @Test
    void repeatsShowALawThatMissesTheMeans() {
        List<RatePoint> points = new ArrayList<>();
        for (RatePoint point : table(3, 0.01, 8).points()) {
            double u = point.kelvin() / 333.15;
            points.add(
                    RatePoint.of(point.kelvin(), point.rate() * StrictMath.exp(120 * (StrictMath.log(u) + 1 / u - 1))));
        }
        Node.Group body = body(new RateTable(Bench.PER_SECOND, 1, points), Map.of(), 1);
        assertTrue(Bench.texts(body, "remarks").contains("Arrhenius misses the means"));
        Node.Table tests = table(body, "lackOfFit", "tests");
        assertEquals(3, tests.rows().size());
        // Draper and Smith: 6 groups, 18 runs, 2 parameters.
        assertEquals(4, ((Node.Scalar) tests.rows().get(0).get(2)).value());
        assertEquals(12, ((Node.Scalar) tests.rows().get(0).get(3)).value());
    }

    @Test
    void withoutRepeatsThereIsNoSuchTest() {
        assertTrue(body(table(1, 0.05, 4), Map.of(), 1).get("lackOfFit").isEmpty());
    }

    @Test
    void blocksThatDifferWidenTheInterval() {
        List<RatePoint> points = new ArrayList<>();
        List<RatePoint> from = table(3, 0.01, 12).points();
        for (int i = 0; i < from.size(); i++) {
            int block = i / 3;
            double shift = new SplittableRandom(100 + block).nextGaussian() * 0.15;
            points.add(RatePoint.of(from.get(i).kelvin(), from.get(i).rate() * StrictMath.exp(shift))
                    .withBlock("day " + block));
        }
        Node.Group body = body(new RateTable(Bench.PER_SECOND, 1, points), Map.of(), 1);
        Node.Group blocks = TreeReader.group(body, "blocks");
        assertTrue(TreeReader.number(blocks, "betweenDeviation") > 0.05);
        assertEquals(0.01, TreeReader.number(blocks, "withinDeviation"), 0.006);
        Node.Table estimates = TreeReader.member(blocks, "estimates", Node.Table.class);
        List<Node> ea = estimates.rows().get(1);
        double with = ((Node.Quantity) ea.get(1)).standardUncertainty().orElseThrow();
        double without = ((Node.Quantity) ea.get(2)).standardUncertainty().orElseThrow();
        assertTrue(with > 1.3 * without, with + " " + without);
        assertTrue(Bench.texts(body, "cautions").contains("runs-share-blocks"));
        assertTrue(Bench.texts(body, "remarks").contains("Blocks differ by"));
    }

    @Test
    void theJointRegionReachesBeyondTheSingleInterval() {
        Node.Group body = body(table(1, 0.05, 4), Map.of(), 1);
        Node.Group region = (Node.Group) TreeReader.items(body, "jointRegions").get(0);
        Node.Quantity ea = Bench.parameter(body, "arrhenius", "Ea");
        double single =
                ea.interval().orElseThrow().upper().orElseThrow() - ea.value().orElseThrow();
        double unit = ea.standardUncertainty().orElseThrow();
        // 2 F(0.95; 2, 4) = 13.8885 (SciPy 1.17.1, scipy.stats.f.ppf).
        double joint = TreeReader.quantity(region, "secondHalfWidth").value().orElseThrow();
        assertEquals(Math.sqrt(13.888543816) * unit, joint, 1e-6 * joint);
        assertTrue(joint > single);
        assertTrue(region.get("figure").orElseThrow() instanceof Node.Figure);
    }

    @Test
    void noScatterAndNoFreedomLeaveTheChecksWithAReasonOrAway() {
        Node.Group exact = body(table(1, 0, 4), intervals("profile", "monte-carlo"), 1);
        assertTrue(exact.get("remarks").isPresent());
        double[] two = {300, 320};
        Node.Group pair =
                body(Bench.firstOrder(two, new double[] {1e-4, 1e-3}), intervals("profile", "monte-carlo"), 1);
        assertTrue(Bench.texts(TreeReader.group(pair, "blindSpot"), "notes").contains("Fewer than three"));
        assertTrue(
                Bench.texts(TreeReader.group(pair, "otherIntervals"), "notes").contains("no degree of freedom"));
        assertTrue(Bench.texts(pair, "notes").isEmpty()
                || !Bench.texts(pair, "notes").contains("failed"));
        assertTrue(!Bench.texts(exact, "notes").contains("failed"), Bench.texts(exact, "notes"));
    }

    @Test
    void statedErrorsUseNormalQuantilesForTheBlindSpot() {
        RateTable table = Bench.table(
                Bench.PER_SECOND,
                1,
                new double[] {300, 320, 340},
                new double[] {1e-4, 1e-3, 7e-3},
                OptionalDouble.of(0.05));
        Node.Group spot = new BlindSpot(Measurements.of(table, ErrorModel.STATED), 0.95).node(List.of());
        assertTrue(TreeReader.number(spot, "n") > 0);
    }
}
