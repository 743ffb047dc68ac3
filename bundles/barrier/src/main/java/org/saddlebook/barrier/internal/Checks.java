package org.saddlebook.barrier.internal;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.quantity.Unit;
import org.saddlebook.api.task.Cancelled;
import org.saddlebook.api.task.Contained;
import org.saddlebook.api.task.Task;

/**
 * What stands beside the laws: how they predict what was left out, their average, what curvature would have been missed,
 * residuals, robust fits, repeats, blocks, joint regions, further intervals. Each loses only itself when it fails.
 */
final class Checks {
    private final List<FittedLaw> laws;
    private final FittedLaw carrying;
    private final Unit rateUnit;
    private final double level;
    private final List<Double> targets;
    private final Task task;
    private final Tree tree = new Tree();
    private final List<String> remarks = new ArrayList<>();
    private final List<String> broken = new ArrayList<>();

    /**
     * Checks.
     *
     * @param laws fitted laws, at least one
     * @param carrying the law whose residuals are looked at
     */
    Checks(
            List<FittedLaw> laws,
            FittedLaw carrying,
            Unit rateUnit,
            double level,
            List<Double> targetsKelvin,
            Task task) {
        this.laws = laws;
        this.carrying = carrying;
        this.rateUnit = rateUnit;
        this.level = level;
        this.targets = targetsKelvin;
        this.task = task;
    }

    /** A piece of the section. */
    @FunctionalInterface
    private interface Piece {
        Optional<? extends Node> node() throws Cancelled;
    }

    /** Every group that has something to say, and {@code remarks}: what deserves a line in a summary. */
    Node.Group node(
            LeaveOneOut.Refit refit, Map<String, Double> akaikeWeights, boolean onSameSensor, IntervalRequest request)
            throws Cancelled {
        put("leaveOneTemperatureOut", "leaving out temperatures", () -> LeaveOneOut.table(laws, refit));
        put(
                "averagedPredictions",
                "averaging laws",
                () -> new ModelAverage(laws, akaikeWeights, rateUnit, level, onSameSensor).rows(targets));
        put("blindSpot", "looking for hidden curvature", this::blindSpot);
        Inspection inspection = new Inspection(carrying);
        put("residualChecks", "looking at residuals", () -> Optional.of(inspection.node()));
        remarks.addAll(inspection.remarks());
        RobustCheck robust = new RobustCheck(carrying);
        put("robustFits", "fitting robustly", robust::node);
        remarks.addAll(robust.remarks());
        ReplicateCheck replicates = new ReplicateCheck();
        put("lackOfFit", "testing lack of fit", () -> replicates.node(laws));
        remarks.addAll(replicates.remarks());
        BlockCheck blocks = new BlockCheck(carrying, level, rateUnit, targets);
        put("blocks", "parting the scatter", blocks::node);
        remarks.addAll(blocks.remarks());
        put("jointRegions", "drawing joint regions", () -> new JointRegions(carrying, level).node());
        put(
                "otherIntervals",
                "computing intervals",
                () -> new OtherIntervals(request, rateUnit, level, targets, task).node(laws));
        tree.put("remarks", Tree.texts(remarks));
        return tree.group();
    }

    /** Sentences on what failed; filled by {@link #node}. */
    List<String> broken() {
        return broken;
    }

    private Optional<Node> blindSpot() {
        Node.Group group = new BlindSpot(carrying.data(), level).node(targets);
        for (Node note : TreeReader.items(group, "notes")) {
            remarks.add(((Node.Text) note).value());
        }
        return Optional.of(group);
    }

    private void put(String key, String doing, Piece piece) throws Cancelled {
        Contained<Optional<? extends Node>> answer = task.contain(doing, piece::node);
        if (answer instanceof Contained.Answer<Optional<? extends Node>> given) {
            if (given.value().isPresent()) {
                tree.put(key, given.value().get());
            }
        } else {
            broken.add(((Contained.Broke<Optional<? extends Node>>) answer).reason());
        }
    }
}
