package org.saddlebook.register.api;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import org.junit.jupiter.api.Test;

/**
 * Properties of the tree over many random trees. The oracles are written apart from the code under test: the root by the
 * recursive definition of RFC 9162, 2.1.1, the proofs by replaying them over subtree intervals.
 */
class MerkleTreeTest {
    private static final long SEED = 20261201;

    @Test
    void growsToTheRootOfTheRecursiveDefinition() {
        Random random = new Random(SEED);
        List<Digest> leaves = new ArrayList<>();
        Head head = Head.EMPTY;
        for (int n = 1; n <= 300; n++) {
            Digest leaf = randomDigest(random);
            leaves.add(leaf);
            head = head.grow(leaf);
            assertEquals(definition(leaves), head.root(), "n = " + n);
            assertEquals(Long.bitCount(n), head.peaks().size());
        }
    }

    @Test
    void provesEveryLeafOfEveryTreeUpTo40() {
        Random random = new Random(SEED + 1);
        List<Digest> leaves = new ArrayList<>();
        for (int n = 1; n <= 40; n++) {
            leaves.add(randomDigest(random));
            Digest root = definition(leaves);
            for (int i = 0; i < n; i++) {
                List<Digest> proof = MerkleTree.inclusionProof(i, leaves);
                assertEquals(root, replayInclusion(leaves.get(i), i, 0, n, proof, proof.size()), i + " of " + n);
                assertTrue(MerkleTree.includes(leaves.get(i), i, n, proof, root), i + " of " + n);
            }
        }
    }

    @Test
    void provesThatEveryTreeUpTo40KeepsEveryEarlierOne() {
        Random random = new Random(SEED + 2);
        List<Digest> leaves = new ArrayList<>();
        for (int n = 1; n <= 40; n++) {
            leaves.add(randomDigest(random));
            for (int m = 1; m <= n; m++) {
                List<Digest> proof = MerkleTree.consistencyProof(m, leaves);
                Digest earlier = definition(leaves.subList(0, m));
                Digest later = definition(leaves);
                assertTrue(MerkleTree.consistent(m, earlier, n, later, proof), m + " in " + n);
                List<Digest> rest = new ArrayList<>(proof);
                Digest[] roots = replayConsistency(m, n, true, earlier, rest);
                assertEquals(earlier, roots[0], m + " in " + n);
                assertEquals(later, roots[1], m + " in " + n);
                assertTrue(rest.isEmpty());
            }
        }
    }

    @Test
    void refusesProofsThatWereTamperedWith() {
        Random random = new Random(SEED + 3);
        for (int round = 0; round < 400; round++) {
            int n = 2 + random.nextInt(60);
            List<Digest> leaves = new ArrayList<>();
            for (int i = 0; i < n; i++) {
                leaves.add(randomDigest(random));
            }
            Digest root = definition(leaves);
            int index = random.nextInt(n);
            List<Digest> proof = MerkleTree.inclusionProof(index, leaves);
            assertFalse(MerkleTree.includes(flip(leaves.get(index), random), index, n, proof, root));
            assertFalse(MerkleTree.includes(leaves.get(index), index, n, tamper(proof, random), root));
            assertFalse(MerkleTree.includes(leaves.get(index), (index + 1) % n, n, proof, root));
            assertFalse(MerkleTree.includes(leaves.get(index), index, n, proof, flip(root, random)));
            int m = 1 + random.nextInt(n - 1);
            Digest earlier = definition(leaves.subList(0, m));
            List<Digest> kept = MerkleTree.consistencyProof(m, leaves);
            assertFalse(MerkleTree.consistent(m, earlier, n, root, tamper(kept, random)));
            assertFalse(MerkleTree.consistent(m, flip(earlier, random), n, root, kept));
            assertFalse(MerkleTree.consistent(m, earlier, n, flip(root, random), kept));
        }
    }

    @Test
    void refusesToProveWhatIsNotThere() {
        List<Digest> one = List.of(MerkleTree.leaf(new byte[0]));
        assertThrows(IllegalArgumentException.class, () -> MerkleTree.inclusionProof(1, one));
        assertThrows(IllegalArgumentException.class, () -> MerkleTree.inclusionProof(-1, one));
        assertThrows(IllegalArgumentException.class, () -> MerkleTree.consistencyProof(0, one));
        assertThrows(IllegalArgumentException.class, () -> MerkleTree.consistencyProof(2, one));
        assertFalse(MerkleTree.includes(one.get(0), 1, 1, List.of(), one.get(0)));
    }

    private static List<Digest> tamper(List<Digest> proof, Random random) {
        List<Digest> other = new ArrayList<>(proof);
        switch (random.nextInt(3)) {
            case 0 -> other.remove(random.nextInt(other.size()));
            case 1 -> other.add(random.nextInt(other.size() + 1), randomDigest(random));
            default -> {
                int at = random.nextInt(other.size());
                other.set(at, flip(other.get(at), random));
            }
        }
        return other;
    }

    private static Digest flip(Digest digest, Random random) {
        byte[] bytes = digest.bytes();
        bytes[random.nextInt(32)] ^= (byte) (1 << random.nextInt(8));
        return Digest.of(bytes);
    }

    private static Digest randomDigest(Random random) {
        byte[] bytes = new byte[32];
        random.nextBytes(bytes);
        return Digest.of(bytes);
    }

    /** MTH(D_n) of RFC 9162, 2.1.1, with its own hashing. */
    private static Digest definition(List<Digest> leaves) {
        if (leaves.size() == 1) {
            return leaves.get(0);
        }
        int k = 1;
        while (2 * k < leaves.size()) {
            k *= 2;
        }
        return pair(definition(leaves.subList(0, k)), definition(leaves.subList(k, leaves.size())));
    }

    private static Digest pair(Digest left, Digest right) {
        try {
            MessageDigest sha = MessageDigest.getInstance("SHA-256");
            byte[] both = new byte[65];
            both[0] = 1;
            System.arraycopy(left.bytes(), 0, both, 1, 32);
            System.arraycopy(right.bytes(), 0, both, 33, 32);
            return Digest.of(sha.digest(both));
        } catch (NoSuchAlgorithmException e) {
            throw new AssertionError(e);
        }
    }

    /** The root from a leaf and its proof, by the intervals [from, to) of the tree; uses the first {@code steps}. */
    private static Digest replayInclusion(Digest leaf, int index, int from, int to, List<Digest> proof, int steps) {
        if (to - from == 1) {
            assertEquals(0, steps);
            return leaf;
        }
        int k = 1;
        while (2 * k < to - from) {
            k *= 2;
        }
        Digest sibling = proof.get(steps - 1);
        return index < from + k
                ? pair(replayInclusion(leaf, index, from, from + k, proof, steps - 1), sibling)
                : pair(sibling, replayInclusion(leaf, index, from + k, to, proof, steps - 1));
    }

    /** The earlier and the later root from a proof, following SUBPROOF of RFC 9162, 2.1.4.1 backwards. */
    private static Digest[] replayConsistency(int m, int n, boolean whole, Digest earlier, List<Digest> rest) {
        if (m == n) {
            Digest same = whole ? earlier : rest.remove(0);
            return new Digest[] {same, same};
        }
        int k = 1;
        while (2 * k < n) {
            k *= 2;
        }
        if (m <= k) {
            Digest[] left = replayConsistency(m, k, whole, earlier, rest);
            return new Digest[] {left[0], pair(left[1], rest.remove(0))};
        }
        Digest[] right = replayConsistency(m - k, n - k, false, earlier, rest);
        Digest left = rest.remove(0);
        return new Digest[] {pair(left, right[0]), pair(left, right[1])};
    }
}
