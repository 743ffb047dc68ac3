package org.saddlebook.data.checks.internal;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.saddlebook.api.campaign.Campaign;
import org.saddlebook.api.campaign.RateTable;
import org.saddlebook.data.checks.api.MixUp;
import org.saddlebook.data.checks.api.MixUps;

/** What the rules look at: the used rows, the straight line through them, what was stated beside them. */
final class Subject {
    private final Campaign campaign;
    private final RateTable table;
    private final List<Row> rows;
    private final List<MixUp> mixUps;
    private final Optional<Line> line;
    private final Stated stated;
    private ShiftSearch shifts;

    /** The subject of a campaign that has a rate table. */
    Subject(Campaign campaign, Stated stated) {
        this.campaign = campaign;
        this.stated = stated;
        table = campaign.rateTable().orElseThrow();
        List<Row> used = new ArrayList<>();
        for (int i = 0; i < table.points().size(); i++) {
            if (table.points().get(i).excluded().isEmpty()) {
                used.add(Row.of(i + 1, table.points().get(i)));
            }
        }
        rows = List.copyOf(used);
        mixUps = MixUps.of(table.rateUnit(), table.order());
        line = Line.through(rows);
    }

    Campaign campaign() {
        return campaign;
    }

    RateTable table() {
        return table;
    }

    List<Row> rows() {
        return rows;
    }

    List<MixUp> mixUps() {
        return mixUps;
    }

    Stated stated() {
        return stated;
    }

    /** The line of ln k against 1/T; absent for fewer than three rows or a single temperature. */
    Optional<Line> line() {
        return line;
    }

    int distinctTemperatures() {
        return (int) rows.stream().mapToDouble(Row::kelvin).distinct().count();
    }

    /** Every explanation by a shift, weighed once for all rules that ask. */
    ShiftSearch shifts() {
        if (shifts == null) {
            shifts = new ShiftSearch(this);
        }
        return shifts;
    }
}
