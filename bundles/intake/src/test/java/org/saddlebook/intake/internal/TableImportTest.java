package org.saddlebook.intake.internal;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static org.saddlebook.intake.internal.IntakeFixture.TABLE;
import static org.saddlebook.intake.internal.IntakeFixture.open;
import static org.saddlebook.intake.internal.IntakeFixture.opener;
import static org.saddlebook.intake.internal.IntakeFixture.problem;
import static org.saddlebook.intake.internal.IntakeFixture.write;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Instant;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import org.saddlebook.api.campaign.Campaign;
import org.saddlebook.api.campaign.Choices;
import org.saddlebook.api.campaign.ConstantKind;
import org.saddlebook.api.campaign.ErrorModel;
import org.saddlebook.api.campaign.HistoryEntry;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.model.StandardState;
import org.saddlebook.api.problem.InputException;
import org.saddlebook.api.problem.Problem;
import org.saddlebook.api.reader.DataReader;
import org.saddlebook.api.reader.Imported;
import org.saddlebook.api.reader.ReadingRule;
import org.saddlebook.api.reader.Source;
import org.saddlebook.api.reader.SourceHead;
import org.saddlebook.api.service.Progress;
import org.saddlebook.api.task.Cancelled;
import org.saddlebook.api.task.Task;
import org.saddlebook.json.api.Sha256;
import org.saddlebook.reader.text.internal.DelimitedTextReader;

class TableImportTest {
    @TempDir
    private Path temp;

    private Campaign campaign(String comments) throws IOException, InputException {
        return open(write(temp, "Release run.csv", comments + TABLE)).campaign();
    }

    private Problem problemOf(String comments) throws IOException {
        return problem(write(temp, "rates.csv", comments + TABLE));
    }

    @Test
    void makesACampaignOfABareTable() throws Exception {
        var opened = open(write(temp, "Release run.csv", TABLE));
        Campaign campaign = opened.campaign();
        assertEquals("Release run", campaign.title());
        assertEquals(3, campaign.rateTable().orElseThrow().points().size());
        assertEquals(Choices.defaults(), campaign.choices());
        byte[] bytes = Files.readAllBytes(temp.resolve("Release run.csv"));
        assertEquals("sources/Release run.csv", campaign.sources().get(0).path());
        assertEquals(Sha256.of(bytes), campaign.sources().get(0).sha256());
        assertEquals(bytes.length, campaign.sources().get(0).size());
        assertEquals("delimited-text", campaign.sources().get(0).reader());
        HistoryEntry entry = campaign.history().get(0);
        assertEquals("a.chemist", entry.who());
        assertEquals(Instant.parse("2026-03-02T09:30:00Z"), entry.when());
        assertEquals("imported", entry.what());
        assertTrue(opened.understood().size() > 0, "says how it was read");
    }

    @Test
    void followsEveryStatement() throws Exception {
        Campaign campaign = campaign("""
                # title: A title
                # notes: first line
                # notes: second line
                # standard state: 1 bar
                # molecularity: 1
                # transmission: 0.5
                # reference temperature: 25 degC
                # constant: pseudo-order
                # error model: constant-relative
                # models: eyring, arrhenius
                # at: 25degC; 77degF, 310K
                # at: 320 K
                # level: 90 %
                # seed: 7
                # dH: -92.2 +- 0.4 kJ/mol
                # dS: -198.8 +- 0.5 J/(mol K)
                # correlation(dH,dS): 0.9
                """);
        assertEquals("A title", campaign.title());
        assertEquals("first line\nsecond line", campaign.notes());
        assertEquals(
                Choices.defaults()
                        .withStandard(StandardState.ONE_BAR)
                        .withMolecularity(1)
                        .withTransmission(0.5)
                        .withReferenceKelvin(298.15)
                        .withConstantKind(ConstantKind.PSEUDO_ORDER)
                        .withErrorModel(ErrorModel.CONSTANT_RELATIVE)
                        .withModels(List.of("eyring", "arrhenius"))
                        .withTargetsKelvin(List.of(298.15, 298.15, 310.0, 320.0))
                        .withLevel(0.9)
                        .withSeed(7),
                campaign.choices());
        assertEquals(
                new Node.Group(Map.of(
                        "dH", Node.Quantity.of(-92200, "J/mol", 400),
                        "dS", Node.Quantity.of(-198.8, "J/(mol.K)", 0.5),
                        "correlation", new Node.Scalar(0.9))),
                campaign.settings().get("spontaneity"));
    }

    @Test
    void followsStatementsOnErrorsCommonToAllRunsAndOnFurtherRuns() throws Exception {
        Campaign campaign = campaign("""
                # thermometer offset: 0.9 degF
                # thermometer gain: 0.2 %
                # concentration uncertainty: 0.02
                # target temperatures: same-sensor
                # tolerance of k: 15 %
                # measure from: 10 degC
                # measure to: 90 degC
                # run cost: equal
                """);
        assertEquals(
                new Node.Group(Map.of(
                        "thermometerOffset", Node.Quantity.of(0.5, "K"),
                        "thermometerGain", new Node.Scalar(0.002),
                        "concentrationUncertainty", new Node.Scalar(0.02),
                        "targets", new Node.Text("same-sensor"),
                        "tolerance", new Node.Scalar(0.15),
                        "measureFrom", Node.Quantity.of(283.15, "K"),
                        "measureTo", Node.Quantity.of(363.15, "K"),
                        "runCost", new Node.Text("equal"))),
                campaign.settings().get("barrier"));
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "thermometer offset: 0.3 kJ/mol | wrong-dimension",
                "thermometer offset: -0.3 K | wrong-value",
                "concentration uncertainty: 200 % | wrong-value",
                "target temperatures: perhaps | wrong-value",
                "tolerance of k: 0 | wrong-value",
                "run cost: free | wrong-value",
            })
    void refusesUnusableStatementsOnErrors(String line, String code) throws IOException {
        assertEquals(code, problemOf("# " + line + "\n").code());
    }

    @Test
    void takesAReferenceToCompareWith() throws Exception {
        Campaign campaign = campaign("""
                # reference: Ea = 85.2 +- 1.1 kJ/mol, A = 1e13 1/s, from a notebook, page 12
                # viscosity: 0.89 mPa.s
                # medium: solution
                # collision diameter: 0.4 nm
                # reduced mass: 20 g/mol
                """);
        assertEquals(
                new Node.Group(Map.of(
                        "reference",
                        new Node.Group(Map.of(
                                "Ea", Node.Quantity.of(85.2, "kJ/mol", 1.1),
                                "A", Node.Quantity.of(1e13, "1/s"),
                                "source", new Node.Text("a notebook, page 12"))),
                        "viscosity",
                        Node.Quantity.of(0.00089, "Pa.s"),
                        "medium",
                        new Node.Text("solution"),
                        "collisionDiameter",
                        Node.Quantity.of(0.4e-9, "m"),
                        "reducedMass",
                        Node.Quantity.of(0.02, "kg/mol"))),
                campaign.settings().get("dataChecks"));
        assertEquals(
                new Node.Group(Map.of(
                        "reference",
                        new Node.Group(
                                Map.of("k", Node.Quantity.of(0.0012, "1/s"), "at", Node.Quantity.of(298.15, "K"))))),
                campaign("# reference: k = 1.2e-3 1/s at 25 degC\n").settings().get("dataChecks"));
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "reference: Ea = 85.2 kJ/mol | wrong-reference",
                "reference: Ea = 85.2 kJ/mol, A = 1e13 L/(mol.s) | wrong-dimension",
                "reference: Ea = 85.2, A = 1e13 1/s | missing-unit",
                "reference: Ea = 85.2 kJ/mol, Ea = 86 kJ/mol | wrong-reference",
                "reference: Smith 2001 | wrong-reference",
                "viscosity: 1 kJ/mol | wrong-dimension",
                "viscosity: -1 mPa.s | wrong-value",
                "medium: glass | wrong-value",
            })
    void refusesAReferenceThatCannotBeUsed(String statement, String code) throws IOException {
        Path file = write(temp, "rates.csv", "# " + statement + "\n" + TABLE);
        Problem problem = problem(file);
        assertEquals(code, problem.code());
        assertEquals(1, problem.place().line().orElseThrow());
    }

    @Test
    void takesACovarianceInItsUnit() throws Exception {
        Campaign campaign = campaign("# cov(dH, dS): 1.5 kJ.J/(mol2.K)\n# constant kind: elementary\n");
        assertEquals(
                new Node.Group(Map.of("covariance", new Node.Scalar(1500))),
                campaign.settings().get("spontaneity"));
        assertEquals(ConstantKind.ELEMENTARY, campaign.choices().constantKind());
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "standart state: 1 bar | standard state",
                "standard sate: 1 barr | standard state",
                "molecularty: 2 | molecularity",
                "error modle: stated | error model",
                "lvel: 0.9 | level",
                "sede: 3 | seed",
                "dJ: 62 kJ/mol | dH",
                "H: 62 kJ/mol | dH",
                "refrence temperature: 300 K | reference temperature",
                "correlation(dH;dS): 0.3 | correlation(dH,dS)",
            })
    void refusesMisspeltStatements(String line, String meant) throws IOException {
        Problem problem = problemOf("# a remark\n# " + line + "\n");
        assertEquals("misspelt-statement", problem.code(), line);
        assertEquals(2, problem.place().line().orElseThrow());
        assertTrue(problem.remedy().contains("\"" + meant + "\""), problem.remedy());
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                "solvent: toluene",
                "pH: 7.4",
                "dG: -5 kJ/mol",
                "feed: 0.5 mL/min",
                "titre: 0.1 mol/L",
                "T: 25 degC",
                "older: see page 7",
                "operator: N. N."
            })
    void keepsRemarksAsFreeText(String line) throws Exception {
        var opened = open(write(temp, "rates.csv", "# " + line + "\n" + TABLE));
        assertEquals(Choices.defaults(), opened.campaign().choices());
        assertEquals(Map.of(), opened.campaign().settings());
        assertTrue(opened.understood().stream().anyMatch(sentence -> sentence.contains("free text")));
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "molecularity: 2 | order-against-unit",
                "order: 2 | order-against-unit",
                "order: -1 | wrong-value",
                "standard state: 1 | missing-unit",
                "standard state: 1 K | wrong-dimension",
                "at: 25 | missing-unit",
                "at: 25,5 degC | missing-unit",
                "at: 300 K,, 310 K | wrong-value",
                "at: -300 degC | below-absolute-zero",
                "transmission: 0 | wrong-value",
                "transmission: NaN | not-finite",
                "level: 95 | wrong-value",
                "level: 0.3 | wrong-value",
                "seed: 1.5 | wrong-value",
                "seed: 9007199254740992 | wrong-value",
                "constant: lump | wrong-value",
                "error model: none | wrong-value",
                "dH: 62 | missing-unit",
                "dH: 62 kJ | wrong-dimension",
                "dS: 62 kJ/mol | wrong-dimension",
                "correlation(dH,dS): 1.5 | wrong-value",
                "title: | wrong-value",
            })
    void refusesValuesThatCannotBe(String line, String code) throws IOException {
        Problem problem = problemOf("# " + line + "\n");
        assertEquals(code, problem.code(), problem.toString());
        assertEquals(1, problem.place().line().orElseThrow());
    }

    @Test
    void refusesOneStatementTwiceAndNamesAllProblems() throws IOException {
        Path file = write(temp, "rates.csv", "# seed: 1\n# seed: 2\n# order: 2\n# molecularity: 1\n" + TABLE);
        InputException e = assertThrows(InputException.class, () -> open(file));
        assertEquals(
                List.of("repeated-statement", "order-against-unit", "repeated-statement"),
                e.problems().stream().map(Problem::code).toList());
    }

    /** A reader of a given confidence. */
    private record Fake(String id, int sure, RuntimeException fault) implements DataReader {
        @Override
        public int confidence(SourceHead head) {
            if (sure < 0) {
                throw fault;
            }
            return sure;
        }

        @Override
        public Imported read(Source source, ReadingRule rule, Task task) {
            if (fault != null) {
                throw fault;
            }
            return new Imported(Optional.empty(), List.of(), List.of("read by " + id));
        }
    }

    @Test
    void asksTheSurestReaderThenTheFirstById() throws Exception {
        Path file = write(temp, "rates.csv", TABLE);
        var opener = opener(new Fake("c", 99, null), new Fake("b", 99, null), new DelimitedTextReader());
        assertEquals("b", open(opener, file).campaign().sources().get(0).reader());
        assertEquals(
                "delimited-text",
                open(opener(new DelimitedTextReader(), new Fake("a", 1, null)), file)
                        .campaign()
                        .sources()
                        .get(0)
                        .reader());
    }

    @Test
    void saysWhichReadersThereAreWhenNoneFits() throws IOException {
        Path file = Files.write(temp.resolve("scan.png"), new byte[] {(byte) 0x89, 'P', 'N', 'G', 13, 10, 26, 10, 0});
        Problem problem = problem(opener(new DelimitedTextReader(), new Fake("other", 0, null)), file);
        assertEquals("no-reader", problem.code());
        assertTrue(problem.expected().contains("delimited-text, other"), problem.expected());
    }

    @Test
    void saysWhichFeatureIsMissingWhenThereIsNoReader() throws IOException {
        Problem problem = problem(opener(), write(temp, "rates.csv", TABLE));
        assertEquals("no-reader", problem.code());
        assertTrue(problem.remedy().contains("reader-text"), problem.remedy());
    }

    @Test
    void namesTheOwnerOfAReaderThatBreaks() throws Exception {
        Path file = write(temp, "rates.csv", TABLE);
        Problem problem = problem(opener(new Fake("x", 99, new IllegalStateException("oops"))), file);
        assertEquals("reader-broke", problem.code());
        assertTrue(
                problem.found().contains(Fake.class.getName())
                        && problem.found().contains("oops"),
                problem.found());
        Fake unsure = new Fake("x", -1, new IllegalStateException("oops"));
        assertEquals("reader-broke", problem(opener(unsure), file).code());
        assertEquals(
                1, open(opener(unsure, new DelimitedTextReader()), file).parts().size());
    }

    @Test
    void letsCancelThrough() throws IOException {
        Path file = write(temp, "rates.csv", TABLE);
        DataReader checking = new DataReader() {
            @Override
            public String id() {
                return "checking";
            }

            @Override
            public int confidence(SourceHead head) {
                return 100;
            }

            @Override
            public Imported read(Source source, ReadingRule rule, Task task) throws Cancelled {
                task.check();
                return new Imported(Optional.empty(), List.of(), List.of());
            }
        };
        Progress cancelled = new Progress() {
            @Override
            public void report(double fraction, String doing) {}

            @Override
            public void check() throws Cancelled {
                throw new Cancelled();
            }
        };
        assertThrows(Cancelled.class, () -> opener(checking).open(file, ReadingRule.AUTOMATIC, "a.chemist", cancelled));
    }

    @Test
    void makesPathsThatEveryFileSystemTakes() {
        assertEquals("sources/a_b_c.csv", TableImport.partPath("a:b\\c.csv"));
        assertEquals("sources/\u00e4 b.csv", TableImport.partPath("\u00e4 b.csv"));
        assertEquals(".hidden", TableImport.title(".hidden"));
        assertEquals("a.b", TableImport.title("a.b.csv"));
    }
}
