package org.saddlebook.intake.internal;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.saddlebook.api.campaign.Campaign;
import org.saddlebook.api.campaign.Choices;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.problem.InputException;
import org.saddlebook.api.reader.Imported.Directive;

/** The statements that a comment line can make. */
enum Statement {
    TITLE,
    NOTES,
    STANDARD_STATE,
    MOLECULARITY,
    TRANSMISSION,
    REFERENCE_TEMPERATURE,
    CONSTANT,
    ERROR_MODEL,
    MODELS,
    AT,
    LEVEL,
    SEED,
    ENTHALPY,
    ENTROPY,
    CORRELATION,
    COVARIANCE,
    THERMOMETER_OFFSET,
    THERMOMETER_GAIN,
    CONCENTRATION_UNCERTAINTY,
    TARGETS,
    TOLERANCE,
    MEASURE_FROM,
    MEASURE_TO,
    RUN_COST,
    REFERENCE,
    VISCOSITY,
    MEDIUM,
    COLLISION_DIAMETER,
    REDUCED_MASS,
    THIRD_BODY,
    TUNNELLING,
    HOLD,
    INTERVALS,
    RESAMPLES,
    FEW_POINTS;

    private static final String SPONTANEITY = "spontaneity";
    private static final String BARRIER = "barrier";
    private static final String DATA_CHECKS = "dataChecks";

    private static final List<String> INTERVAL_METHODS =
            List.of("t", "profile", "bootstrap-residual", "bootstrap-case", "bootstrap-parametric", "monte-carlo");

    /** Words of their own that only look like one of ours. */
    private static final List<String> UNRELATED = List.of("dg", "\u03b4g", "\u2206g", "delta g", "ph");

    /** The keys that make a statement, as readers hand them on: lower case, single spaces. */
    List<String> keys() {
        return switch (this) {
            case TITLE -> List.of("title");
            case NOTES -> List.of("notes", "note");
            case STANDARD_STATE -> List.of("standard state");
            case MOLECULARITY -> List.of("molecularity", "order");
            case TRANSMISSION -> List.of("transmission", "transmission coefficient");
            case REFERENCE_TEMPERATURE -> List.of("reference temperature");
            case CONSTANT -> List.of("constant", "constant kind", "kind of constant");
            case ERROR_MODEL -> List.of("error model");
            case MODELS -> List.of("models", "model");
            case AT -> List.of("at");
            case LEVEL -> List.of("level");
            case SEED -> List.of("seed");
            case ENTHALPY -> List.of("dh", "\u03b4h", "\u2206h", "delta h");
            case ENTROPY -> List.of("ds", "\u03b4s", "\u2206s", "delta s");
            case CORRELATION -> List.of("correlation(dh,ds)", "correlation(dh, ds)", "corr(dh,ds)", "corr(dh, ds)");
            case COVARIANCE -> List.of("cov(dh,ds)", "cov(dh, ds)", "covariance(dh,ds)", "covariance(dh, ds)");
            case THERMOMETER_OFFSET -> List.of("thermometer offset");
            case THERMOMETER_GAIN -> List.of("thermometer gain");
            case CONCENTRATION_UNCERTAINTY -> List.of("concentration uncertainty");
            case TARGETS -> List.of("target temperatures");
            case TOLERANCE -> List.of("tolerance of k");
            case MEASURE_FROM -> List.of("measure from");
            case MEASURE_TO -> List.of("measure to");
            case RUN_COST -> List.of("run cost");
            case REFERENCE -> List.of("reference");
            case VISCOSITY -> List.of("viscosity");
            case MEDIUM -> List.of("medium");
            case COLLISION_DIAMETER -> List.of("collision diameter");
            case REDUCED_MASS -> List.of("reduced mass");
            case THIRD_BODY -> List.of("third body");
            case TUNNELLING -> List.of("tunnelling", "tunneling");
            case HOLD -> List.of("hold");
            case INTERVALS -> List.of("intervals");
            case RESAMPLES -> List.of("resamples");
            case FEW_POINTS -> List.of("bootstrap of few points");
        };
    }

    /** The statement with this key. */
    static Optional<Statement> of(String key) {
        for (Statement statement : values()) {
            if (statement.keys().contains(key)) {
                return Optional.of(statement);
            }
        }
        return Optional.empty();
    }

    /** Keys whose loss would change results; that of a title would not. {@code at} is too short to be misspelt. */
    static List<String> keysWithConsequences() {
        List<String> keys = new ArrayList<>();
        for (Statement statement : values()) {
            if (statement != TITLE && statement != NOTES && statement != AT) {
                keys.addAll(statement.keys());
            }
        }
        return keys;
    }

    /** Whether a key is a word of its own that only looks like one of ours. */
    static boolean isUnrelated(String key) {
        return UNRELATED.contains(key);
    }

    /** A key as people write it. */
    static String shown(String key) {
        return key.equals("dh") || key.contains("(")
                ? key.replace("dh", "dH").replace("ds", "dS")
                : key.equals("ds") ? "dS" : key;
    }

    /** Whether it may stand in several lines. */
    boolean repeatable() {
        return this == NOTES || this == AT;
    }

    /**
     * The campaign with what was stated.
     *
     * @param campaign the campaign so far, with its table
     * @throws InputException when the value cannot be used
     */
    Campaign apply(Campaign campaign, Directive directive) throws InputException {
        Choices choices = campaign.choices();
        return switch (this) {
            case TITLE -> campaign.withTitle(ValueReader.text(directive));
            case NOTES ->
                campaign.withNotes(
                        campaign.notes().isEmpty() ? directive.value() : campaign.notes() + "\n" + directive.value());
            case STANDARD_STATE -> campaign.withChoices(choices.withStandard(ValueReader.standardState(directive)));
            case MOLECULARITY -> campaign.withChoices(choices.withMolecularity(ValueReader.order(directive, campaign)));
            case TRANSMISSION -> campaign.withChoices(choices.withTransmission(ValueReader.positive(directive)));
            case REFERENCE_TEMPERATURE ->
                campaign.withChoices(choices.withReferenceKelvin(ValueReader.kelvin(directive, directive.value())));
            case CONSTANT -> campaign.withChoices(choices.withConstantKind(ValueReader.constantKind(directive)));
            case ERROR_MODEL -> campaign.withChoices(choices.withErrorModel(ValueReader.errorModel(directive)));
            case MODELS -> campaign.withChoices(choices.withModels(ValueReader.words(directive)));
            case AT -> campaign.withChoices(choices.withTargetsKelvin(ValueReader.targets(directive, campaign)));
            case LEVEL -> campaign.withChoices(choices.withLevel(ValueReader.level(directive)));
            case SEED -> campaign.withChoices(choices.withSeed(ValueReader.seed(directive)));
            case ENTHALPY -> Settings.put(campaign, SPONTANEITY, "dH", ValueReader.energy(directive));
            case ENTROPY -> Settings.put(campaign, SPONTANEITY, "dS", ValueReader.entropy(directive));
            case CORRELATION -> Settings.put(campaign, SPONTANEITY, "correlation", ValueReader.correlation(directive));
            case COVARIANCE -> Settings.put(campaign, SPONTANEITY, "covariance", ValueReader.covariance(directive));
            case THERMOMETER_OFFSET ->
                Settings.put(campaign, BARRIER, "thermometerOffset", ValueReader.difference(directive));
            case THERMOMETER_GAIN ->
                Settings.put(campaign, BARRIER, "thermometerGain", ValueReader.fraction(directive));
            case CONCENTRATION_UNCERTAINTY ->
                Settings.put(campaign, BARRIER, "concentrationUncertainty", ValueReader.fraction(directive));
            case TARGETS ->
                Settings.put(campaign, BARRIER, "targets", ValueReader.word(directive, List.of("true", "same-sensor")));
            case TOLERANCE -> Settings.put(campaign, BARRIER, "tolerance", ValueReader.fraction(directive));
            case MEASURE_FROM -> Settings.put(campaign, BARRIER, "measureFrom", kelvin(directive));
            case MEASURE_TO -> Settings.put(campaign, BARRIER, "measureTo", kelvin(directive));
            case RUN_COST ->
                Settings.put(campaign, BARRIER, "runCost", ValueReader.word(directive, List.of("half-life", "equal")));
            case REFERENCE ->
                Settings.put(campaign, DATA_CHECKS, "reference", ReferenceReader.read(directive, campaign));
            case VISCOSITY -> Settings.put(campaign, DATA_CHECKS, "viscosity", ValueReader.viscosity(directive));
            case MEDIUM ->
                Settings.put(campaign, DATA_CHECKS, "medium", ValueReader.word(directive, List.of("solution", "gas")));
            case COLLISION_DIAMETER ->
                Settings.put(campaign, DATA_CHECKS, "collisionDiameter", ValueReader.length(directive));
            case THIRD_BODY -> Settings.put(campaign, BARRIER, "thirdBody", ValueReader.thirdBody(directive));
            case TUNNELLING -> Settings.put(campaign, BARRIER, "tunnelling", TunnellingStatement.read(directive));
            case HOLD -> campaign.withChoices(choices.withFixed(HeldStatement.read(directive, choices.fixed())));
            case REDUCED_MASS -> Settings.put(campaign, DATA_CHECKS, "reducedMass", ValueReader.molarMass(directive));
            case INTERVALS ->
                Settings.put(campaign, BARRIER, "intervals", ValueReader.wordsOf(directive, INTERVAL_METHODS));
            case RESAMPLES ->
                Settings.put(campaign, BARRIER, "resamples", ValueReader.count(directive, 1_000, 1_000_000));
            case FEW_POINTS ->
                Settings.put(
                        campaign,
                        BARRIER,
                        "bootstrapOfFewPoints",
                        ValueReader.word(directive, List.of("refused", "accepted")));
        };
    }

    private static Node kelvin(Directive directive) throws InputException {
        return Node.Quantity.of(ValueReader.kelvin(directive, directive.value()), "K");
    }
}
