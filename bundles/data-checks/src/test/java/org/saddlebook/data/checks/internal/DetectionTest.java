package org.saddlebook.data.checks.internal;

import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Random;
import java.util.Set;
import java.util.TreeSet;
import java.util.function.Function;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.saddlebook.api.campaign.Campaign;
import org.saddlebook.data.checks.api.MixUp;
import org.saddlebook.presentation.api.Rounding;

/**
 * How often the rules speak on clean campaigns and on campaigns with a planted mistake; both simulated, see
 * {@link Simulated}. The planted ones are clean ones of the same kind with one mistake.
 */
class DetectionTest {
    private static final long SEED = 20261201;

    private record Counts(Map<String, Integer> alarms, int any, int campaigns) {}

    private record Planted(String title, String rule, Function<Random, Campaign> make) {}

    private static final List<Planted> PLANTED = List.of(
            new Planted(
                    "one row, unit of time (min, h for s and the reverse)",
                    "shifted-rows",
                    random -> row(random, DetectionTest::time)),
            new Planted("one row, factor 1000", "shifted-rows", random -> row(random, DetectionTest::thousand)),
            new Planted("one row, log10 for ln", "shifted-rows", random -> row(random, DetectionTest::decadic)),
            new Planted("a file, unit of time", "shifted-rows", random -> file(random, DetectionTest::time)),
            new Planted("a file, factor 1000", "shifted-rows", random -> file(random, DetectionTest::thousand)),
            new Planted("a file, log10 for ln", "shifted-rows", random -> file(random, DetectionTest::decadic)),
            new Planted("one row, °C taken for K", "shifted-temperatures", random -> temperature(random, false)),
            new Planted("a file, °C taken for K", "shifted-temperatures", random -> temperature(random, true)),
            new Planted("a file, °F taken for °C", "shifted-temperatures", DetectionTest::fahrenheit),
            new Planted("whole table, °C taken for K", "celsius-in-reciprocal-temperature", DetectionTest::celsius),
            new Planted(
                    "against reference, unit of time",
                    "shift-against-reference",
                    random -> whole(random, DetectionTest::time)),
            new Planted(
                    "against reference, factor 1000",
                    "shift-against-reference",
                    random -> whole(random, DetectionTest::thousand)),
            new Planted(
                    "against reference, log10 for ln",
                    "shift-against-reference",
                    random -> whole(random, DetectionTest::decadic)),
            new Planted(
                    "against reference, kcal for kJ",
                    "shift-against-reference",
                    random -> new Simulated(random).campaignWithReference(4.184)),
            new Planted("whole table, molecules for moles", "molecules-for-moles", DetectionTest::molecules),
            new Planted("half of the rows copied", "duplicated-rows", DetectionTest::copies));

    @Test
    void aSampleOfCleanCampaignsHardlyAlarms() throws Exception {
        Counts counts = clean(250);
        // 250 campaigns at 2 %: five, plus three standard deviations.
        assertTrue(counts.any() <= 11, counts.toString());
    }

    @Test
    void aSampleOfPlantedShiftsIsFound() throws Exception {
        int found = 0;
        int planted = 0;
        for (Planted kind : PLANTED) {
            found += found(kind, 20);
            planted += 20;
        }
        assertTrue(found >= 0.9 * planted, found + " of " + planted);
    }

    @Test
    @Tag("long")
    void cleanCampaignsAlarmRarelyAndPlantedShiftsAreFound() throws Exception {
        Counts counts = clean(Integer.getInteger("checks.clean", 5000));
        StringBuilder page = new StringBuilder("## Mistake detector\n\n")
                .append("Simulated campaigns, seed ")
                .append(SEED)
                .append(": ΔS‡ −180 to +80 J/(mol K), whole-number temperatures, replicates, scatter 1 to 10 % with")
                .append(
                        " occasional runs three times as bad, in half of them a heat capacity of activation; each clean")
                .append(" one also against a reference 10 % in k and 2 % in Ea apart.\n\n")
                .append("| rule | alarms in 5000 clean campaigns, % |\n|---|---|\n");
        for (Map.Entry<String, Integer> rule : counts.alarms().entrySet()) {
            page.append("| ")
                    .append(rule.getKey())
                    .append(" | ")
                    .append(percent(rule.getValue(), 5000))
                    .append(" |\n");
        }
        page.append("| any | ").append(percent(counts.any(), 5000)).append(" |\n\n");
        page.append("| planted | found, % of 1000 |\n|---|---|\n");
        int shifts = 0;
        int all = 0;
        for (Planted kind : PLANTED) {
            int seen = found(kind, Integer.getInteger("checks.planted", 1000));
            page.append("| ")
                    .append(kind.title())
                    .append(" | ")
                    .append(percent(seen, Integer.getInteger("checks.planted", 1000)))
                    .append(" |\n");
            if (!kind.title().startsWith("whole") && !kind.title().startsWith("half")) {
                shifts += seen;
                all += Integer.getInteger("checks.planted", 1000);
            }
        }
        page.append("| rows, files and against reference together | ")
                .append(percent(shifts, all))
                .append(" |\n");
        System.out.println(page);
        Path fragment = Path.of("target/checks/mistake-detector.md");
        write(fragment, page.toString());
        for (Map.Entry<String, Integer> rule : counts.alarms().entrySet()) {
            assertTrue(rule.getValue() <= 25, rule.toString());
        }
        assertTrue(counts.any() <= 100, counts.toString());
        assertTrue(shifts >= 0.95 * all, shifts + " of " + all);
    }

    private static void write(Path file, String text) throws IOException {
        Files.createDirectories(file.getParent());
        Files.write(file, text.getBytes(StandardCharsets.UTF_8));
    }

    private static String percent(int count, int of) {
        return Rounding.significant(100.0 * count / of, 3);
    }

    private static Counts clean(int campaigns) {
        Map<String, Integer> alarms = new LinkedHashMap<>();
        for (Rule rule : DataChecksEvaluation.RULES) {
            alarms.put(rule.id(), 0);
        }
        int any = 0;
        for (int i = 0; i < campaigns; i++) {
            Random random = new Random(SEED + i);
            Set<String> heard = alarms(new Simulated(random).campaignWithReference(1));
            for (String rule : heard) {
                alarms.merge(rule, 1, Integer::sum);
            }
            any += heard.isEmpty() ? 0 : 1;
        }
        return new Counts(alarms, any, campaigns);
    }

    private static int found(Planted kind, int campaigns) {
        int found = 0;
        for (int i = 0; i < campaigns; i++) {
            Campaign campaign = kind.make().apply(new Random(SEED + 1_000_000 + i));
            found += alarms(campaign).contains(kind.rule()) ? 1 : 0;
        }
        return found;
    }

    private static Set<String> alarms(Campaign campaign) {
        Set<String> heard = new TreeSet<>();
        Subject subject = new Subject(
                campaign,
                campaign.settings().containsKey(DataChecksEvaluation.SECTION)
                        ? Stated.of(campaign.settings().get(DataChecksEvaluation.SECTION))
                        : Stated.NOTHING);
        for (Rule rule : DataChecksEvaluation.RULES) {
            if (rule.examine(subject) instanceof Rule.Outcome.Found) {
                heard.add(rule.id());
            }
        }
        return heard;
    }

    private static double time(Random random) {
        double ln = StrictMath.log(random.nextBoolean() ? 60 : 3600);
        return random.nextBoolean() ? ln : -ln;
    }

    private static double thousand(Random random) {
        return random.nextBoolean() ? StrictMath.log(1000) : -StrictMath.log(1000);
    }

    private static double decadic(Random random) {
        double ln = StrictMath.log(StrictMath.log(10));
        return random.nextBoolean() ? ln : -ln;
    }

    private static Campaign row(Random random, Function<Random, Double> factor) {
        Simulated campaign = new Simulated(random);
        int row = random.nextInt(campaign.size());
        return campaign.shiftRates(row, row + 1, factor.apply(random)).campaign();
    }

    private static Campaign file(Random random, Function<Random, Double> factor) {
        Simulated campaign = new Simulated(random);
        int length = 2 + random.nextInt(Math.max(1, campaign.size() / 2 - 1));
        int from = random.nextBoolean() ? 0 : campaign.size() - length;
        return campaign.shiftRates(from, from + length, factor.apply(random)).campaign();
    }

    private static Campaign whole(Random random, Function<Random, Double> factor) {
        Simulated campaign = new Simulated(random);
        return campaign.shiftRates(0, campaign.size(), factor.apply(random)).campaignWithReference(1);
    }

    private static Campaign temperature(Random random, boolean file) {
        TemperatureMixUps.Scale scale = scale("read-kelvin-meant-celsius");
        for (; ; ) {
            Simulated campaign = new Simulated(random);
            int length = file ? 2 + random.nextInt(Math.max(1, campaign.size() / 2 - 1)) : 1;
            int from = random.nextInt(campaign.size() - length + 1);
            campaign.shiftTemperatures(from, from + length, scale);
            if (campaign.readable()) {
                return campaign.campaign();
            }
        }
    }

    private static Campaign fahrenheit(Random random) {
        Simulated campaign = new Simulated(random);
        int length = 2 + random.nextInt(Math.max(1, campaign.size() / 2 - 1));
        int from = random.nextInt(campaign.size() - length + 1);
        return campaign.shiftTemperatures(from, from + length, scale("read-celsius-meant-fahrenheit"))
                .campaign();
    }

    private static Campaign celsius(Random random) {
        for (; ; ) {
            Simulated campaign = new Simulated(random);
            campaign.shiftTemperatures(0, campaign.size(), scale("read-kelvin-meant-celsius"));
            if (campaign.readable()) {
                return campaign.campaign();
            }
        }
    }

    private static Campaign molecules(Random random) {
        Simulated campaign = new Simulated(random);
        while (campaign.order() != 2) {
            campaign = new Simulated(random);
        }
        MixUp mixUp = org.saddlebook.data.checks.api.MixUps.of(
                        campaign.campaign().rateTable().orElseThrow().rateUnit(), 2)
                .stream()
                .filter(each -> each.id().contains("molecule") && each.id().startsWith("unit"))
                .findFirst()
                .orElseThrow();
        return campaign.shiftRates(0, campaign.size(), -mixUp.lnFactor()).campaign();
    }

    private static Campaign copies(Random random) {
        Simulated campaign = new Simulated(random);
        return campaign.copyRows(0, campaign.size() / 2).campaign();
    }

    private static TemperatureMixUps.Scale scale(String id) {
        return TemperatureMixUps.all().stream()
                .filter(each -> each.id().equals(id))
                .findFirst()
                .orElseThrow();
    }
}
