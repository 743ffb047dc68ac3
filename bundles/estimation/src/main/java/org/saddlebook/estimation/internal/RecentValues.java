package org.saddlebook.estimation.internal;

import java.util.concurrent.atomic.AtomicReferenceArray;

/** A small memory of a pure function of two numbers. Threads may overwrite each other; what is read is always right. */
public final class RecentValues {
    private static final int PLACES = 64;

    private final AtomicReferenceArray<Entry> entries = new AtomicReferenceArray<>(PLACES);

    private record Entry(double first, double second, double value) {}

    /** The remembered value, or NaN. */
    public double get(double first, double second) {
        Entry entry = entries.get(place(first, second));
        return entry != null && entry.first == first && entry.second == second ? entry.value : Double.NaN;
    }

    /** Remembers a value. */
    public void put(double first, double second, double value) {
        entries.set(place(first, second), new Entry(first, second, value));
    }

    private static int place(double first, double second) {
        long bits = Double.doubleToRawLongBits(first) * 31 + Double.doubleToRawLongBits(second);
        bits *= 0x9E3779B97F4A7C15L;
        return (int) (bits >>> 58);
    }
}
