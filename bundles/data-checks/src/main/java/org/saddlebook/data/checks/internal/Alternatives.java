package org.saddlebook.data.checks.internal;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.saddlebook.api.findings.Node;
import org.saddlebook.data.checks.api.MixUp;

/**
 * Units in which the whole table would give a usual entropy of activation as well. A shift of a whole table leaves no
 * trace in it, so this is information and no alarm.
 */
final class Alternatives {
    private Alternatives() {}

    /** The table; empty when no other unit gives a usual entropy. */
    static Optional<Node.Table> of(Subject subject) {
        if (subject.line().isEmpty()) {
            return Optional.empty();
        }
        double entropy = EntropyRange.entropy(subject, subject.line().get());
        List<List<Node>> rows = new ArrayList<>();
        for (MixUp mixUp : subject.mixUps()) {
            double would = entropy + mixUp.entropyShift();
            if (!mixUp.unit().isEmpty() && would > EntropyRange.USUAL_LOWEST && would < EntropyRange.USUAL_HIGHEST) {
                rows.add(List.of(
                        new Node.Text(org.saddlebook.presentation.api.UnitText.forPeople(mixUp.unit())),
                        Node.Quantity.of(mixUp.entropyShift(), "J/(mol.K)"),
                        Node.Quantity.of(would, "J/(mol.K)")));
            }
        }
        if (rows.isEmpty()) {
            return Optional.empty();
        }
        return Optional.of(new Node.Table(
                List.of(
                        new Node.Column("unit", "if k were in", ""),
                        new Node.Column("entropyShift", "shift of ΔS‡", ""),
                        new Node.Column("dS", "ΔS‡ would be", "")),
                rows));
    }
}
