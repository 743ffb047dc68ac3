package org.saddlebook.register.api;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.HexFormat;
import java.util.List;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;

/**
 * The tree against published structure and vectors.
 *
 * <p>Sources: the worked example of RFC 9162, section 2.1.5 (seven leaves d0 to d6; its figure of nodes a to l and the
 * proofs it lists), and the eight-leaf vectors that go with the Certificate Transparency log of RFC 6962 (inputs and roots
 * quoted from memory; a slip of memory could not reproduce a SHA-256).
 */
@Tag("validation")
class MerkleTreeValidationTest {
    private static final String[] CT_LEAVES = {
        "", "00", "10", "2021", "3031", "40414243", "5051525354555657", "606162636465666768696a6b6c6d6e6f"
    };

    private static final String[] CT_ROOTS = {
        "6e340b9cffb37a989ca544e6bb780a2c78901d3fb33738768511a30617afa01d",
        "fac54203e7cc696cf0dfcb42c92a1d9dbaf70ad9e621f4bd8d98662f00e3c125",
        "aeb6bcfe274b70a14fb067a5e5578264db0fa9b51af5e0ba159158f329e06e77",
        "d37ee418976dd95753c1c73862b9398fa2a2cf9b4ff0fdfe8b30cd95209614b7",
        "4e3bbb1f7b478dcfe71fb631631519a3bca12c9aefca1612bfce4c13a86264d4",
        "76e67dadbcdf1e10e1b74ddc608abd2f98dfb16fbce75277b5232a127f2087ef",
        "ddb89be403809e325750d3d263cd78929c2942b7942a34b77e122c9594a74c8c",
        "5dc9da79a70659a9ad559cb701ded9a2ab9d823aad2f4960cfe370eff4604328"
    };

    @Test
    void givesTheRootsOfTheCertificateTransparencyVectors() {
        List<Digest> leaves = new ArrayList<>();
        for (int i = 0; i < CT_LEAVES.length; i++) {
            leaves.add(MerkleTree.leaf(HexFormat.of().parseHex(CT_LEAVES[i])));
            assertEquals(CT_ROOTS[i], MerkleTree.root(leaves).hex(), "root of " + (i + 1) + " leaves");
        }
    }

    @Test
    void hashesTheEmptyTreeAsNothing() {
        // FIPS 180-4: SHA-256 of the empty string.
        assertEquals(
                "e3b0c44298fc1c149afbf4c8996fb92427ae41e4649b934ca495991b7852b855",
                MerkleTree.root(List.of()).hex());
    }

    @Test
    void hasTheStructureOfTheExampleInRfc9162() {
        Digest[] d = new Digest[7];
        for (int i = 0; i < 7; i++) {
            d[i] = MerkleTree.leaf(("d" + i).getBytes(StandardCharsets.US_ASCII));
        }
        List<Digest> leaves = List.of(d);
        Digest a = d[0];
        Digest b = d[1];
        Digest c = d[2];
        Digest e = d[4];
        Digest f = d[5];
        Digest g = MerkleTree.node(a, b);
        Digest h = MerkleTree.node(c, d[3]);
        Digest i = MerkleTree.node(e, f);
        Digest j = d[6];
        Digest k = MerkleTree.node(g, h);
        Digest l = MerkleTree.node(i, j);
        assertEquals(MerkleTree.node(k, l), MerkleTree.root(leaves));
        // "The inclusion proof for d0 is [b, h, l]", for d3 [c, g, l], for d4 [f, j, k], for d6 [i, k].
        assertEquals(List.of(b, h, l), MerkleTree.inclusionProof(0, leaves));
        assertEquals(List.of(c, g, l), MerkleTree.inclusionProof(3, leaves));
        assertEquals(List.of(f, j, k), MerkleTree.inclusionProof(4, leaves));
        assertEquals(List.of(i, k), MerkleTree.inclusionProof(6, leaves));
        // The consistency proofs from 3, 4 and 6 leaves: [c, d, g, l], [l], [i, j, k].
        assertEquals(List.of(c, d[3], g, l), MerkleTree.consistencyProof(3, leaves));
        assertEquals(List.of(l), MerkleTree.consistencyProof(4, leaves));
        assertEquals(List.of(i, j, k), MerkleTree.consistencyProof(6, leaves));
        assertTrue(MerkleTree.consistent(
                3, MerkleTree.root(leaves.subList(0, 3)), 7, MerkleTree.root(leaves), List.of(c, d[3], g, l)));
    }
}
