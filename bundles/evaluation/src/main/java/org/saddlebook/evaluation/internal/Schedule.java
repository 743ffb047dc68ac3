package org.saddlebook.evaluation.internal;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeMap;
import java.util.TreeSet;

/**
 * The order of analyses: each after those it reads, otherwise by section id. Members of a cycle, and they alone, cannot
 * be ordered.
 *
 * @param order section ids in the order in which they run
 * @param cyclic section ids that read each other in a circle
 */
record Schedule(List<String> order, Set<String> cyclic) {
    /**
     * Orders sections.
     *
     * @param reads section id to the ids it reads; ids that nobody writes are ignored
     */
    static Schedule of(Map<String, Set<String>> reads) {
        Map<String, Set<String>> waiting = new TreeMap<>();
        reads.forEach((section, read) -> {
            Set<String> known = new TreeSet<>(read);
            known.retainAll(reads.keySet());
            waiting.put(section, known);
        });
        Set<String> cyclic = new TreeSet<>();
        for (String section : waiting.keySet()) {
            if (reaches(section, section, waiting, new TreeSet<>())) {
                cyclic.add(section);
            }
        }
        waiting.keySet().removeAll(cyclic);
        waiting.values().forEach(read -> read.removeAll(cyclic));
        List<String> order = new ArrayList<>();
        while (!waiting.isEmpty()) {
            String next = waiting.entrySet().stream()
                    .filter(entry -> entry.getValue().isEmpty())
                    .map(Map.Entry::getKey)
                    .findFirst()
                    .orElseThrow();
            waiting.remove(next);
            waiting.values().forEach(read -> read.remove(next));
            order.add(next);
        }
        return new Schedule(List.copyOf(order), Set.copyOf(cyclic));
    }

    private static boolean reaches(String from, String goal, Map<String, Set<String>> reads, Set<String> seen) {
        for (String next : reads.getOrDefault(from, Set.of())) {
            if (next.equals(goal) || (seen.add(next) && reaches(next, goal, reads, seen))) {
                return true;
            }
        }
        return false;
    }
}
