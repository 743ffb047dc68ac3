package org.saddlebook.register.console.internal;

import java.io.IOException;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeSet;
import org.saddlebook.api.campaign.Campaign;
import org.saddlebook.api.problem.InputException;
import org.saddlebook.api.problem.Problem;
import org.saddlebook.api.service.CampaignFormat;
import org.saddlebook.api.service.Evaluation;
import org.saddlebook.api.service.Progress;
import org.saddlebook.api.task.Cancelled;
import org.saddlebook.json.api.JsonObject;
import org.saddlebook.json.api.JsonReader;
import org.saddlebook.register.api.Entry;
import org.saddlebook.register.api.PartEntry;
import org.saddlebook.register.api.Register;
import org.saddlebook.register.api.RegisterException;
import org.saddlebook.register.console.api.Recomputed;
import org.saddlebook.register.console.api.Recomputed.Agreement;

/** Evaluates a stored entry again with what is installed, and compares. */
final class Recomputation {
    private Recomputation() {}

    /** Whether nothing is wrong but models that are not installed. */
    static boolean onlyAbsentModels(InputException e) {
        for (Problem problem : e.problems()) {
            if (!problem.code().equals("model-not-installed")) {
                return false;
            }
        }
        return true;
    }

    static Recomputed of(Services services, Register register, Entry entry, Progress progress)
            throws InputException, Cancelled, IOException {
        CampaignFormat format = services.need(CampaignFormat.class, "base");
        Evaluation evaluation = services.need(Evaluation.class, "base");
        byte[] campaignBytes = read(register, entry, PartNames.CAMPAIGN);
        byte[] before = read(register, entry, PartNames.FINDINGS);
        String name = "entry " + entry.number() + ", ";
        Campaign campaign = format.readCampaign(name + PartNames.CAMPAIGN, campaignBytes);
        Campaign effective;
        try {
            effective = evaluation.effective(campaign);
        } catch (InputException e) {
            if (onlyAbsentModels(e)) {
                return new Recomputed(Agreement.NOT_POSSIBLE, absent(e), List.of(), List.of());
            }
            throw e;
        }
        byte[] after = format.findings(evaluation.evaluate(effective, progress));
        JsonObject then = object(name + PartNames.FINDINGS, before);
        JsonObject now = object("the new findings", after);
        List<Recomputed.OtherBundle> others = others(Comparison.bundles(then), Comparison.bundles(now));
        boolean same = others.isEmpty();
        if (same && Arrays.equals(before, after)) {
            return new Recomputed(Agreement.IDENTICAL, List.of(), others, List.of());
        }
        List<Recomputed.Difference> differences = new ArrayList<>();
        for (Comparison.Moved moved : Comparison.of(then, now, same, same ? Set.of() : Set.of("software"))) {
            differences.add(new Recomputed.Difference(moved.path(), moved.before(), moved.after()));
        }
        if (!differences.isEmpty()) {
            return new Recomputed(Agreement.DIFFERS, List.of(), others, differences);
        }
        return new Recomputed(same ? Agreement.WRITTEN_DIFFERENTLY : Agreement.AGREES, List.of(), others, differences);
    }

    private static List<String> absent(InputException e) {
        TreeSet<String> models = new TreeSet<>();
        for (Problem problem : e.problems()) {
            models.add(problem.found());
        }
        return List.copyOf(models);
    }

    private static List<Recomputed.OtherBundle> others(Map<String, String> then, Map<String, String> now) {
        List<Recomputed.OtherBundle> others = new ArrayList<>();
        TreeSet<String> names = new TreeSet<>(then.keySet());
        names.addAll(now.keySet());
        for (String name : names) {
            String a = then.getOrDefault(name, "none");
            String b = now.getOrDefault(name, "none");
            if (!a.equals(b)) {
                others.add(new Recomputed.OtherBundle(name, a, b));
            }
        }
        return others;
    }

    private static byte[] read(Register register, Entry entry, String name) throws IOException {
        PartEntry part = register.part(entry, name)
                .orElseThrow(() -> new RegisterException(
                        "Entry " + entry.number() + " has no part " + name + ", so it cannot be recomputed."));
        return register.read(part);
    }

    private static JsonObject object(String name, byte[] json) throws InputException, RegisterException {
        if (JsonReader.read(name, json) instanceof JsonObject object) {
            return object;
        }
        throw new RegisterException("The findings of " + name + " are no JSON object.");
    }
}
