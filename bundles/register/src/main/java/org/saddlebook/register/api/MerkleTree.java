package org.saddlebook.register.api;

import java.security.MessageDigest;
import java.util.ArrayList;
import java.util.List;

/**
 * The Merkle tree of RFC 9162, section 2.1, with SHA-256: a leaf is {@code SHA-256(0x00 || record)}, an interior node
 * {@code SHA-256(0x01 || left || right)}, and the left subtree of n leaves holds the largest power of two below n. Pure
 * functions; indices count from 0, so the record with number N is leaf N - 1.
 */
public final class MerkleTree {
    private MerkleTree() {}

    /** The hash of a leaf: {@code SHA-256(0x00 || record)} (RFC 9162, 2.1.1). */
    public static Digest leaf(byte[] record) {
        MessageDigest sha = Digest.algorithm();
        sha.update((byte) 0x00);
        return Digest.of(sha.digest(record));
    }

    /** The hash of an interior node: {@code SHA-256(0x01 || left || right)} (RFC 9162, 2.1.1). */
    public static Digest node(Digest left, Digest right) {
        MessageDigest sha = Digest.algorithm();
        sha.update((byte) 0x01);
        sha.update(left.bytes());
        return Digest.of(sha.digest(right.bytes()));
    }

    /** The root over these leaf hashes; SHA-256 of nothing when there are none (RFC 9162, 2.1.1). */
    public static Digest root(List<Digest> leaves) {
        Head head = Head.EMPTY;
        for (Digest leaf : leaves) {
            head = head.grow(leaf);
        }
        return head.root();
    }

    /**
     * The inclusion proof of one leaf (PATH(m, D_n) of RFC 9162, 2.1.3.1), from the leaf upwards.
     *
     * @param index of the leaf, from 0
     * @param leaves every leaf hash of the tree
     */
    public static List<Digest> inclusionProof(long index, List<Digest> leaves) {
        if (!(index >= 0 && index < leaves.size())) {
            throw new IllegalArgumentException("leaf " + index + " in a tree of " + leaves.size());
        }
        List<Digest> path = new ArrayList<>();
        path(index, leaves, path);
        return List.copyOf(path);
    }

    private static void path(long index, List<Digest> leaves, List<Digest> path) {
        if (leaves.size() <= 1) {
            return;
        }
        int split = split(leaves.size());
        List<Digest> left = leaves.subList(0, split);
        List<Digest> right = leaves.subList(split, leaves.size());
        if (index < split) {
            path(index, left, path);
            path.add(root(right));
        } else {
            path(index - split, right, path);
            path.add(root(left));
        }
    }

    /**
     * The proof that the tree of the first {@code size} leaves was kept unchanged in the tree of all leaves (PROOF(m, D_n)
     * of RFC 9162, 2.1.4.1).
     *
     * @param size of the earlier tree, at least 1 and at most the number of leaves
     * @param leaves every leaf hash of the later tree
     */
    public static List<Digest> consistencyProof(long size, List<Digest> leaves) {
        if (!(size >= 1 && size <= leaves.size())) {
            throw new IllegalArgumentException("an earlier tree of " + size + " in one of " + leaves.size());
        }
        List<Digest> proof = new ArrayList<>();
        subproof(size, leaves, true, proof);
        return List.copyOf(proof);
    }

    private static void subproof(long size, List<Digest> leaves, boolean whole, List<Digest> proof) {
        if (size == leaves.size()) {
            if (!whole) {
                proof.add(root(leaves));
            }
            return;
        }
        int split = split(leaves.size());
        List<Digest> left = leaves.subList(0, split);
        List<Digest> right = leaves.subList(split, leaves.size());
        if (size <= split) {
            subproof(size, left, whole, proof);
            proof.add(root(right));
        } else {
            subproof(size - split, right, false, proof);
            proof.add(root(left));
        }
    }

    /**
     * Whether the proof shows that the leaf stands at the index in the tree with this root (RFC 9162, 2.1.3.2).
     *
     * @param index of the leaf, from 0
     * @param size number of leaves of the tree
     */
    public static boolean includes(Digest leaf, long index, long size, List<Digest> proof, Digest root) {
        if (!(index >= 0 && index < size)) {
            return false;
        }
        long position = index;
        long last = size - 1;
        Digest hash = leaf;
        for (Digest step : proof) {
            if (last == 0) {
                return false;
            }
            if ((position & 1) == 1 || position == last) {
                hash = node(step, hash);
                while ((position & 1) == 0 && position != 0) {
                    position >>= 1;
                    last >>= 1;
                }
            } else {
                hash = node(hash, step);
            }
            position >>= 1;
            last >>= 1;
        }
        return last == 0 && hash.equals(root);
    }

    /** Whether the proof shows that the earlier tree was kept unchanged in the later one (RFC 9162, 2.1.4.2). */
    public static boolean consistent(
            long earlierSize, Digest earlierRoot, long laterSize, Digest laterRoot, List<Digest> proof) {
        if (!(earlierSize >= 1 && earlierSize <= laterSize)) {
            return false;
        }
        if (earlierSize == laterSize) {
            return proof.isEmpty() && earlierRoot.equals(laterRoot);
        }
        List<Digest> steps = new ArrayList<>(proof);
        if (Long.bitCount(earlierSize) == 1) {
            steps.add(0, earlierRoot);
        }
        if (steps.isEmpty()) {
            return false;
        }
        long position = earlierSize - 1;
        long last = laterSize - 1;
        while ((position & 1) == 1) {
            position >>= 1;
            last >>= 1;
        }
        Digest earlier = steps.get(0);
        Digest later = steps.get(0);
        for (Digest step : steps.subList(1, steps.size())) {
            if (last == 0) {
                return false;
            }
            if ((position & 1) == 1 || position == last) {
                earlier = node(step, earlier);
                later = node(step, later);
                while ((position & 1) == 0 && position != 0) {
                    position >>= 1;
                    last >>= 1;
                }
            } else {
                later = node(later, step);
            }
            position >>= 1;
            last >>= 1;
        }
        return last == 0 && earlier.equals(earlierRoot) && later.equals(laterRoot);
    }

    /** The largest power of two below n, for n of at least 2. */
    private static int split(int n) {
        return Integer.highestOneBit(n - 1);
    }
}
