package org.saddlebook.data.checks.internal;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.model.StandardState;
import org.saddlebook.api.quantity.Constants;
import org.saddlebook.data.checks.api.MixUp;
import org.saddlebook.data.checks.internal.Stated.Reference;
import org.saddlebook.estimation.api.StudentT;
import org.saddlebook.presentation.api.QuantityText;
import org.saddlebook.presentation.api.Rounding;

/**
 * The whole table against a stated reference: do they differ by a mix-up? Explanations are weighed as in
 * {@link org.saddlebook.data.checks.api.ShiftTest}, here by k at the centre of the table and by the activation energy
 * together: agreement, a difference of its own, a mix-up of the unit of k or its logarithm, temperatures on another
 * scale, an energy in kcal/mol for kJ/mol, or from a slope of log10 k.
 */
final class AgainstReference implements Rule {
    private static final double AGREE = 0.88;
    private static final double OTHER = 0.02;
    private static final double MIXED = 0.10;

    /** Two laboratories, ln k, and activation energies, relative, where the reference states nothing (common practice). */
    private static final double RATE_SPREAD = 0.15;

    private static final double ENERGY_SPREAD = 0.03;

    /** A reaction that is another one. */
    private static final double OTHER_RATE = 2;

    private static final double OTHER_ENERGY = 20_000;

    @Override
    public String id() {
        return "shift-against-reference";
    }

    @Override
    public String title() {
        return "a mix-up against the stated reference";
    }

    /** One explanation by a mistake, with the difference that remains when it is undone. */
    private record Candidate(String id, String meaning, double lnFactor, double lnRate, double energy) {}

    @Override
    public Outcome examine(Subject subject) {
        Optional<Reference> stated = subject.stated().reference();
        if (stated.isEmpty()) {
            return new Outcome.NotExamined(
                    "no reference is stated; \"reference: Ea = ..., A = ..., from ...\" states one");
        }
        if (subject.line().isEmpty() || subject.line().get().degreesOfFreedom() < 1) {
            return new Outcome.NotExamined("it needs three rows at two temperatures");
        }
        if (subject.campaign().choices().standard().isPresent()
                && subject.campaign().choices().standard().get().kind() == StandardState.Kind.PRESSURE
                && stated.get().kind() == Reference.Kind.EYRING) {
            return new Outcome.NotExamined("ΔS‡ of the reference is compared at a standard concentration only");
        }
        return weigh(subject, stated.get());
    }

    private static Outcome weigh(Subject subject, Reference reference) {
        Line line = subject.line().get();
        boolean withEnergy = reference.kind() != Reference.Kind.RATE;
        double kelvin = withEnergy ? line.centreKelvin() : reference.second();
        double wide =
                StudentT.quantile(0.975, line.degreesOfFreedom()) / StudentT.quantile(0.975, Double.POSITIVE_INFINITY);
        double rateSpread = reference.kind() == Reference.Kind.RATE
                        && reference.firstUncertainty().isPresent()
                ? reference.firstUncertainty().getAsDouble() / reference.first()
                : RATE_SPREAD;
        double arm = (1 / kelvin - 1 / line.centreKelvin()) / Constants.GAS;
        double own = Math.sqrt(line.heightUncertainty() * line.heightUncertainty()
                + arm * arm * line.energyUncertainty() * line.energyUncertainty());
        double u = Math.sqrt(wide * wide * own * own + rateSpread * rateSpread);
        double energySpread = reference.firstUncertainty().orElse(ENERGY_SPREAD * Math.abs(reference.first()));
        double uEnergy = Math.sqrt(
                wide * wide * line.energyUncertainty() * line.energyUncertainty() + energySpread * energySpread);
        double lnRatio = at(line, kelvin) - lnReference(subject, reference, 1, kelvin);
        double energyGap = withEnergy ? line.energy() - energy(reference, 1, kelvin) : 0;

        double agree = AGREE * weight(lnRatio, u, energyGap, withEnergy ? uEnergy : 0);
        double other = OTHER
                * weight(
                        lnRatio,
                        Math.sqrt(u * u + OTHER_RATE * OTHER_RATE),
                        energyGap,
                        withEnergy ? Math.sqrt(uEnergy * uEnergy + OTHER_ENERGY * OTHER_ENERGY) : 0);
        List<Candidate> candidates = candidates(subject, reference, kelvin, lnRatio, energyGap);
        double mixed = 0;
        double best = 0;
        Candidate likeliest = null;
        for (Candidate candidate : candidates) {
            double weight = MIXED
                    / candidates.size()
                    * weight(candidate.lnRate(), u, candidate.energy(), withEnergy ? uEnergy : 0);
            mixed += weight;
            if (weight > best) {
                best = weight;
                likeliest = candidate;
            }
        }
        double probability = mixed / (mixed + agree + other);
        if (likeliest == null || !(probability > ShiftedRows.REPORTED)) {
            return new Outcome.Nothing();
        }
        return new Outcome.Found(
                List.of(finding(reference, line, likeliest, kelvin, lnRatio, u, energyGap, probability)));
    }

    private static List<Candidate> candidates(
            Subject subject, Reference reference, double kelvin, double lnRatio, double energyGap) {
        List<Candidate> candidates = new ArrayList<>();
        for (MixUp mixUp : subject.mixUps()) {
            candidates.add(new Candidate(
                    mixUp.id(), mixUp.meaning(), mixUp.lnFactor(), lnRatio + mixUp.lnFactor(), energyGap));
        }
        for (TemperatureMixUps.Scale scale : TemperatureMixUps.all()) {
            List<Row> mended = new ArrayList<>();
            for (Row row : subject.rows()) {
                double right = scale.mend(row.kelvin());
                if (!Double.isNaN(right)) {
                    mended.add(ShiftedTemperatures.at(row, right));
                }
            }
            if (mended.size() == subject.rows().size()) {
                Line.through(mended).ifPresent(line -> {
                    double where = reference.kind() == Reference.Kind.RATE ? kelvin : line.centreKelvin();
                    candidates.add(new Candidate(
                            scale.id(),
                            scale.meaning(),
                            0,
                            at(line, where) - lnReference(subject, reference, 1, where),
                            reference.kind() == Reference.Kind.RATE ? 0 : line.energy() - energy(reference, 1, where)));
                });
            }
        }
        if (reference.kind() != Reference.Kind.RATE) {
            double calorie = Constants.CALORIE;
            double ten = StrictMath.log(10);
            energy(
                    candidates,
                    subject,
                    reference,
                    kelvin,
                    "reference-in-kcal",
                    "the energy of the reference had been in" + " kcal/mol",
                    calorie);
            energy(
                    candidates,
                    subject,
                    reference,
                    kelvin,
                    "reference-in-kj",
                    "the energy of the reference had been" + " converted from kcal/mol once too often",
                    1 / calorie);
            energy(
                    candidates,
                    subject,
                    reference,
                    kelvin,
                    "reference-decadic",
                    "the energy of the reference had been" + " taken from a slope of log10 k without the factor 2.303",
                    ten);
            energy(
                    candidates,
                    subject,
                    reference,
                    kelvin,
                    "reference-decadic-twice",
                    "the factor 2.303 between log10"
                            + " and ln had been applied to the energy of the reference once too often",
                    1 / ten);
        }
        return candidates;
    }

    private static void energy(
            List<Candidate> candidates,
            Subject subject,
            Reference reference,
            double kelvin,
            String id,
            String meaning,
            double factor) {
        Line line = subject.line().get();
        candidates.add(new Candidate(
                id,
                meaning,
                0,
                at(line, kelvin) - lnReference(subject, reference, factor, kelvin),
                line.energy() - energy(reference, factor, kelvin)));
    }

    private static Finding finding(
            Reference reference,
            Line line,
            Candidate candidate,
            double kelvin,
            double lnRatio,
            double u,
            double energyGap,
            double probability) {
        StringBuilder sentence = new StringBuilder("Against the reference");
        if (!reference.source().isEmpty()) {
            sentence.append(" (").append(reference.source()).append(')');
        }
        sentence.append(", k at ")
                .append(QuantityText.temperature(kelvin))
                .append(" is ")
                .append(Say.lowerOrHigher(lnRatio));
        if (reference.kind() != Reference.Kind.RATE) {
            sentence.append(" and the activation energy ")
                    .append(energyGap < 0 ? "lower" : "higher")
                    .append(" by ")
                    .append(Rounding.significant(Math.abs(energyGap) / 1000, 2))
                    .append(" kJ/mol (its standard uncertainty here ")
                    .append(Rounding.significant(line.energyUncertainty() / 1000, 2))
                    .append(')');
        }
        sentence.append(". That is as if ").append(candidate.meaning());
        if (candidate.lnFactor() != 0) {
            sentence.append(" (a factor of ")
                    .append(Say.factor(Math.abs(candidate.lnFactor())))
                    .append(", ")
                    .append(Rounding.significant(Constants.GAS * Math.abs(candidate.lnFactor()), 3))
                    .append(" J/(mol K) in ΔS‡)");
        }
        sentence.append("; then ")
                .append(
                        Math.abs(candidate.lnRate()) < 0.3
                                ? Rounding.significant(100 * Math.abs(candidate.lnRate()), 2) + " %"
                                : "a factor of " + Say.factor(Math.abs(candidate.lnRate())))
                .append(
                        " would remain in k. Which of the two is wrong, if either, this cannot say: look at the units of"
                                + " both.");
        Map<String, Node> evidence = new LinkedHashMap<>();
        evidence.put("temperature", Node.Quantity.of(kelvin, "K"));
        evidence.put("lnRatio", new Node.Scalar(lnRatio));
        evidence.put("lnRatioUncertainty", new Node.Scalar(u));
        if (reference.kind() != Reference.Kind.RATE) {
            evidence.put("energyDifference", Node.Quantity.of(energyGap, "J/mol"));
        }
        evidence.put("entropyDifference", Node.Quantity.of(Constants.GAS * lnRatio, "J/(mol.K)"));
        evidence.put("mixUp", new Node.Text(candidate.id()));
        evidence.put("lnFactor", new Node.Scalar(candidate.lnFactor()));
        evidence.put("probability", new Node.Scalar(probability));
        return new Finding(sentence.toString(), List.of(), evidence);
    }

    private static double at(Line line, double kelvin) {
        return line.height() - line.energy() / Constants.GAS * (1 / kelvin - 1 / line.centreKelvin());
    }

    /** ln k (SI) of the reference with its energy multiplied by a factor. */
    private static double lnReference(Subject subject, Reference reference, double factor, double kelvin) {
        double scaled = factor * reference.first() / (Constants.GAS * kelvin);
        return switch (reference.kind()) {
            case ARRHENIUS -> reference.second() - scaled;
            case EYRING ->
                Constants.LN_BOLTZMANN_OVER_PLANCK
                        + StrictMath.log(kelvin)
                        + (1 - subject.table().order())
                                * StrictMath.log(subject.campaign()
                                        .choices()
                                        .standard()
                                        .orElse(StandardState.ONE_MOLAR)
                                        .value())
                        + reference.second() / Constants.GAS
                        - scaled;
            case RATE -> StrictMath.log(reference.first());
        };
    }

    /** Activation energy of the reference, J/mol; {@code ΔH‡ + RT} for an Eyring reference. */
    private static double energy(Reference reference, double factor, double kelvin) {
        return factor * reference.first() + (reference.kind() == Reference.Kind.EYRING ? Constants.GAS * kelvin : 0);
    }

    private static double weight(double lnRate, double u, double energy, double uEnergyOrZero) {
        double z = lnRate / u;
        double weight = StrictMath.exp(-0.5 * z * z) / u;
        if (uEnergyOrZero > 0) {
            double e = energy / uEnergyOrZero;
            weight *= StrictMath.exp(-0.5 * e * e) / uEnergyOrZero;
        }
        return weight;
    }
}
