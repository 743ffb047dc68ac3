package org.saddlebook.register.api;

import java.util.ArrayList;
import java.util.List;
import java.util.Objects;

/**
 * The tree after a record: enough to go on growing it without reading the earlier leaves.
 *
 * @param size number of records
 * @param root root hash of the RFC 9162 tree over their leaves
 * @param peaks roots of the full subtrees from left to right, one per bit set in {@code size}, largest first
 */
public record Head(long size, Digest root, List<Digest> peaks) {
    /** The head of a register without records: the root is SHA-256 of nothing (RFC 9162, 2.1.1). */
    public static final Head EMPTY = new Head(0, Digest.sha256(new byte[0]), List.of());

    /** Checks that there is one peak per bit of the size. */
    public Head {
        Objects.requireNonNull(root, "root");
        peaks = List.copyOf(peaks);
        if (size < 0 || peaks.size() != Long.bitCount(size)) {
            throw new IllegalArgumentException(peaks.size() + " peaks for a tree of " + size);
        }
    }

    /** The head after one more leaf. */
    public Head grow(Digest leaf) {
        List<Digest> grown = new ArrayList<>(peaks);
        Digest peak = leaf;
        for (long rest = size; (rest & 1) == 1; rest >>= 1) {
            peak = MerkleTree.node(grown.remove(grown.size() - 1), peak);
        }
        grown.add(peak);
        Digest all = grown.get(grown.size() - 1);
        for (int i = grown.size() - 2; i >= 0; i--) {
            all = MerkleTree.node(grown.get(i), all);
        }
        return new Head(size + 1, all, grown);
    }
}
