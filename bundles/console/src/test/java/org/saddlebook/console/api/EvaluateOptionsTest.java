package org.saddlebook.console.api;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertSame;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.saddlebook.api.campaign.Campaign;
import org.saddlebook.api.campaign.Choices;
import org.saddlebook.api.campaign.ErrorModel;
import org.saddlebook.api.model.StandardState;
import org.saddlebook.api.problem.InputException;
import org.saddlebook.api.problem.Problem;

class EvaluateOptionsTest {
    @Test
    void foldsEveryOptionIntoTheChoices() throws Exception {
        Campaign campaign = EvaluateOptions.parse(List.of(
                        "--at",
                        "25degC",
                        "--at=310K",
                        "--model",
                        "eyring",
                        "--standard",
                        "1bar",
                        "--seed",
                        "7",
                        "--errors",
                        "stated",
                        "--level",
                        "0.9"))
                .foldInto(Campaign.titled("t"));
        Choices choices = campaign.choices();
        assertEquals(List.of(298.15, 310.0), choices.targetsKelvin());
        assertEquals(List.of("eyring"), choices.models());
        assertEquals(Optional.of(StandardState.ONE_BAR), choices.standard());
        assertEquals(7, choices.seed());
        assertEquals(Optional.of(ErrorModel.STATED), choices.errorModel());
        assertEquals(0.9, choices.level());
    }

    @Test
    void leavesTheCampaignAloneWhereNothingIsGiven() throws Exception {
        Campaign campaign = Campaign.titled("t")
                .withChoices(Choices.defaults().withModels(List.of("arrhenius")).withTargetsKelvin(List.of(300.0)));
        assertSame(campaign, EvaluateOptions.parse(List.of("input")).foldInto(campaign));
    }

    @Test
    void keepsWordsAndTheVerbsOwnOptions() throws Exception {
        EvaluateOptions options =
                EvaluateOptions.parse(List.of("a b.csv", "--json", "--out", "-x"), List.of("--json"), List.of("--out"));
        assertEquals(List.of("a b.csv"), options.others().words());
        assertTrue(options.others().has("--json"));
        assertEquals(Optional.of("-x"), options.others().value("--out"));
    }

    @Test
    void takesWhatFollowsTwoDashesAsWords() throws Exception {
        EvaluateOptions options = EvaluateOptions.parse(List.of("--seed", "3", "--", "--at"));
        assertEquals("--at", options.others().word("INPUT"));
    }

    @ParameterizedTest
    @CsvSource({
        "--att=3K, unknown-option, --att=3K",
        "--at, missing-value, --at",
        "--at=25, missing-unit, --at",
        "--at=-300degC, below-absolute-zero, --at",
        "--standard=1s, , --standard",
        "--seed=-1, wrong-value, --seed",
        "--seed=9007199254740992, wrong-value, --seed",
        "--level=NaN, wrong-value, --level",
        "--level=95, wrong-value, --level",
        "--errors=none, wrong-value, --errors"
    })
    void refusesWithTheArgumentAsPlace(String argument, String code, String place) {
        InputException refusal =
                assertThrows(InputException.class, () -> EvaluateOptions.parse(List.of("input", argument)));
        Problem problem = refusal.problems().get(0);
        assertEquals(place, problem.place().file());
        if (code != null) {
            assertEquals(code, problem.code());
        }
    }

    @Test
    void doesNotTakeTheNextOptionForAValue() {
        InputException refusal =
                assertThrows(InputException.class, () -> EvaluateOptions.parse(List.of("--at", "--seed", "3")));
        assertEquals("missing-value", refusal.problems().get(0).code());
    }

    @Test
    void suggestsTheOptionThatWasMeant() {
        InputException refusal =
                assertThrows(InputException.class, () -> EvaluateOptions.parse(List.of("--modle", "eyring")));
        assertTrue(refusal.problems().get(0).remedy().contains("--model"));
    }

    @Test
    void refusesASingleOptionGivenTwiceAndASecondWord() throws Exception {
        assertThrows(InputException.class, () -> EvaluateOptions.parse(List.of("--seed", "1", "--seed", "2")));
        EvaluateOptions two = EvaluateOptions.parse(List.of("a", "b"));
        assertThrows(InputException.class, () -> two.others().word("INPUT"));
        EvaluateOptions none = EvaluateOptions.parse(List.of());
        assertThrows(InputException.class, () -> none.others().word("INPUT"));
    }
}
