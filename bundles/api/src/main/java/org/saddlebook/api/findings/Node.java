package org.saddlebook.api.findings;

import java.util.Arrays;
import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * One piece of findings, in a closed vocabulary. Because every section uses nothing else, files, comparison, search, the
 * default report part and the default panel work for sections of bundles they do not know, also when that bundle is
 * gone. Trees are immutable.
 *
 * <p>Every tree has one JSON form and every such form one tree, because what would be written alike is refused when it is
 * made:
 *
 * <ul>
 *   <li>a group may not hold {@code unit} together with {@code value}, {@code standardUncertainty},
 *       {@code standardFactor} or {@code interval}, nor hold {@code unit} alone or with {@code cautions} alone: that is a
 *       {@link Quantity};
 *   <li>a group may not hold {@code columns} together with {@code rows}: that is a {@link Table};
 *   <li>a group may not hold {@code figure} together with {@code layers}: that is a {@link Figure};
 *   <li>items may not all be non-empty items of scalars, equally many in each: that is a {@link Matrix};
 *   <li>a matrix has at least one row and one column: use empty {@link Items} for no matrix at all.
 * </ul>
 */
public sealed interface Node {
    /**
     * Named members in order.
     *
     * @param members key (lowerCamelCase, or a symbol) to node; see {@link Node} for keys that do not go together
     */
    record Group(Map<String, Node> members) implements Node {
        /** Copies the members, keeping their order. */
        public Group {
            members = Collections.unmodifiableMap(new LinkedHashMap<>(members));
            String likeness = NodeShape.ofKeys(members.keySet());
            if (!likeness.isEmpty()) {
                throw new IllegalArgumentException("a group with keys " + members.keySet() + " looks like " + likeness);
            }
        }

        /** The member with this key. */
        public Optional<Node> get(String key) {
            return Optional.ofNullable(members.get(key));
        }
    }

    /**
     * A list.
     *
     * @param items the items in order
     */
    record Items(List<Node> items) implements Node {
        /** Copies the items. */
        public Items {
            items = List.copyOf(items);
            if (NodeShape.looksLikeMatrix(items)) {
                throw new IllegalArgumentException("items that are all rows of scalars look like a matrix");
            }
        }
    }

    /**
     * A measured or estimated quantity.
     *
     * @param value in {@code unit}; absent when the data do not determine it at all
     * @param unit UCUM term
     * @param standardUncertainty in {@code unit}; absent when unknown, and never present beside a standard factor
     * @param standardFactor for quantities estimated on a logarithmic scale: exp of the standard uncertainty of ln value;
     *     at least 1
     * @param interval coverage set
     * @param cautions ids of cautions that belong to this number
     */
    record Quantity(
            OptionalDouble value,
            String unit,
            OptionalDouble standardUncertainty,
            OptionalDouble standardFactor,
            Optional<Interval> interval,
            List<String> cautions)
            implements Node {
        /** Checks the components; no component may be NaN. */
        public Quantity {
            Objects.requireNonNull(unit, "unit");
            Objects.requireNonNull(interval, "interval");
            cautions = List.copyOf(cautions);
            if (value.isPresent() && Double.isNaN(value.getAsDouble())) {
                throw new IllegalArgumentException("value must be a number or absent");
            }
            if (standardUncertainty.isPresent() && !(standardUncertainty.getAsDouble() >= 0)) {
                throw new IllegalArgumentException("standard uncertainty must not be negative: " + standardUncertainty);
            }
            if (standardFactor.isPresent() && !(standardFactor.getAsDouble() >= 1)) {
                throw new IllegalArgumentException("standard factor must be at least 1: " + standardFactor);
            }
        }

        /** A value without uncertainty. */
        public static Quantity of(double value, String unit) {
            return new Quantity(
                    OptionalDouble.of(value),
                    unit,
                    OptionalDouble.empty(),
                    OptionalDouble.empty(),
                    Optional.empty(),
                    List.of());
        }

        /** A value with its standard uncertainty. */
        public static Quantity of(double value, String unit, double standardUncertainty) {
            return new Quantity(
                    OptionalDouble.of(value),
                    unit,
                    OptionalDouble.of(standardUncertainty),
                    OptionalDouble.empty(),
                    Optional.empty(),
                    List.of());
        }

        /** The same with this interval. */
        public Quantity withInterval(Interval newInterval) {
            return new Quantity(value, unit, standardUncertainty, standardFactor, Optional.of(newInterval), cautions);
        }

        /** The same with these cautions in place of the present ones. */
        public Quantity withCautions(List<String> newCautions) {
            return new Quantity(value, unit, standardUncertainty, standardFactor, interval, newCautions);
        }
    }

    /**
     * A plain number: count, statistic, weight. Finite.
     *
     * @param value the number
     */
    record Scalar(double value) implements Node {
        /** Checks that the number is finite. */
        public Scalar {
            if (!Double.isFinite(value)) {
                throw new IllegalArgumentException("a scalar must be finite: " + value);
            }
        }
    }

    /**
     * Yes or no.
     *
     * @param value the answer
     */
    record Flag(boolean value) implements Node {}

    /**
     * A word or sentence.
     *
     * @param value the text
     */
    record Text(String value) implements Node {
        /** Checks the text. */
        public Text {
            Objects.requireNonNull(value, "value");
        }
    }

    /**
     * A table of values.
     *
     * @param columns the columns
     * @param rows the rows, each with one cell per column; an empty cell is {@code Text("")}
     */
    record Table(List<Column> columns, List<List<Node>> rows) implements Node {
        /** Checks that every row has one cell per column. */
        public Table {
            columns = List.copyOf(columns);
            rows = rows.stream().map(List::copyOf).toList();
            for (List<Node> row : rows) {
                if (row.size() != columns.size()) {
                    throw new IllegalArgumentException(
                            "row of " + row.size() + " cells in " + columns.size() + " columns");
                }
            }
        }
    }

    /**
     * A column of a table.
     *
     * @param key lowerCamelCase key
     * @param title heading for people
     * @param unit UCUM term of plain numbers in it; empty for words
     */
    record Column(String key, String title, String unit) {
        /** Checks the components. */
        public Column {
            Objects.requireNonNull(key, "key");
            Objects.requireNonNull(title, "title");
            Objects.requireNonNull(unit, "unit");
        }
    }

    /** A rectangle of plain numbers; entries are finite. */
    final class Matrix implements Node {
        private final double[][] entries;

        /** Copies the rows, which must be of equal length, not empty and finite. */
        public Matrix(double[][] entries) {
            if (entries.length == 0 || entries[0].length == 0) {
                throw new IllegalArgumentException("a matrix has at least one row and one column");
            }
            this.entries = new double[entries.length][];
            for (int i = 0; i < entries.length; i++) {
                if (entries[i].length != entries[0].length) {
                    throw new IllegalArgumentException("rows of unequal length");
                }
                for (double entry : entries[i]) {
                    if (!Double.isFinite(entry)) {
                        throw new IllegalArgumentException("matrix entries must be finite: " + entry);
                    }
                }
                this.entries[i] = entries[i].clone();
            }
        }

        /** Number of rows. */
        public int rows() {
            return entries.length;
        }

        /** Number of columns. */
        public int columns() {
            return entries[0].length;
        }

        /** The entry in row i, column j, from 0. */
        public double get(int i, int j) {
            return entries[i][j];
        }

        /** A copy of the entries. */
        public double[][] toArray() {
            double[][] copy = new double[entries.length][];
            for (int i = 0; i < copy.length; i++) {
                copy[i] = entries[i].clone();
            }
            return copy;
        }

        @Override
        public boolean equals(Object other) {
            return other instanceof Matrix matrix && Arrays.deepEquals(entries, matrix.entries);
        }

        @Override
        public int hashCode() {
            return Arrays.deepHashCode(entries);
        }

        @Override
        public String toString() {
            return "Matrix" + Arrays.deepToString(entries);
        }
    }

    /**
     * A figure as neutral data; one renderer draws it everywhere.
     *
     * @param id stable id within the section, lower case with hyphens
     * @param title heading for people
     * @param x horizontal axis
     * @param y vertical axis
     * @param layers what is drawn, from back to front
     * @param cautions ids of cautions that must be drawn with it
     */
    record Figure(String id, String title, Axis x, Axis y, List<Layer> layers, List<String> cautions) implements Node {
        /** Copies the lists. */
        public Figure {
            Objects.requireNonNull(id, "id");
            Objects.requireNonNull(title, "title");
            layers = List.copyOf(layers);
            cautions = List.copyOf(cautions);
        }
    }
}
