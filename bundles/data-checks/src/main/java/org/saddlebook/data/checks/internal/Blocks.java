package org.saddlebook.data.checks.internal;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/**
 * Which rows may have been shifted together: each row alone, rows that follow each other, rows of one name. Of a block and
 * its remainder, which cannot be told apart, the smaller one stands here.
 *
 * @param member for each row whether it belongs to the block
 * @param size number of members
 */
@SuppressWarnings("ArrayRecordComponent") // compared by nobody
record Blocks(boolean[] member, int size) {
    /** More rows than this are looked at singly, from either end, and by name only. */
    private static final int MANY = 60;

    /** The blocks of a table. */
    static List<Blocks> of(List<Row> rows) {
        int n = rows.size();
        Map<String, Blocks> found = new LinkedHashMap<>();
        for (int from = 0; from < n; from++) {
            for (int to = from; to < n; to++) {
                if (n <= MANY || from == to || from == 0) {
                    boolean[] member = new boolean[n];
                    for (int i = from; i <= to; i++) {
                        member[i] = true;
                    }
                    add(found, member);
                }
            }
        }
        Map<String, boolean[]> named = new LinkedHashMap<>();
        for (int i = 0; i < n; i++) {
            String label = rows.get(i).point().label();
            if (!label.isEmpty()) {
                named.computeIfAbsent(label, key -> new boolean[n])[i] = true;
            }
        }
        if (named.size() <= MANY) {
            named.values().forEach(member -> add(found, member));
        }
        return new ArrayList<>(found.values());
    }

    private static void add(Map<String, Blocks> found, boolean[] member) {
        int n = member.length;
        int size = 0;
        for (boolean each : member) {
            size += each ? 1 : 0;
        }
        if (size == 0 || size == n) {
            return;
        }
        boolean turn = 2 * size > n || (2 * size == n && !member[n - 1]);
        boolean[] own = new boolean[n];
        StringBuilder key = new StringBuilder();
        for (int i = 0; i < n; i++) {
            own[i] = member[i] != turn;
            key.append(own[i] ? '1' : '0');
        }
        int ownSize = turn ? n - size : size;
        found.putIfAbsent(key.toString(), new Blocks(own, ownSize));
    }

    /** The rows of the block. */
    List<Row> of(List<Row> rows, boolean inside) {
        List<Row> chosen = new ArrayList<>();
        for (int i = 0; i < member.length; i++) {
            if (member[i] == inside) {
                chosen.add(rows.get(i));
            }
        }
        return chosen;
    }
}
