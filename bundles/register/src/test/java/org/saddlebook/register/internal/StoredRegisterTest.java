package org.saddlebook.register.internal;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.time.Clock;
import java.time.Instant;
import java.time.ZoneOffset;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalLong;
import java.util.stream.Collectors;
import org.junit.jupiter.api.Test;
import org.saddlebook.api.service.Progress;
import org.saddlebook.register.api.Checkpoint;
import org.saddlebook.register.api.Digest;
import org.saddlebook.register.api.Draft;
import org.saddlebook.register.api.Entry;
import org.saddlebook.register.api.Head;
import org.saddlebook.register.api.LogRecord;
import org.saddlebook.register.api.MerkleTree;
import org.saddlebook.register.api.PartEntry;
import org.saddlebook.register.api.PartFile;
import org.saddlebook.register.api.Receipt;
import org.saddlebook.register.api.RegisterException;
import org.saddlebook.register.api.SealedRecord;
import org.saddlebook.register.api.Verification;

class StoredRegisterTest {
    private static final Clock CLOCK = Clock.fixed(Instant.parse("2026-03-01T10:20:30.456789Z"), ZoneOffset.UTC);

    private final MemoryStore store = new MemoryStore();
    private final StoredRegister register = new StoredRegister(store, CLOCK);

    @Test
    void writesTheRecordInTheDocumentedForm() throws Exception {
        enter("Tröger's base", "abc");
        // SHA-256 of "abc": FIPS 180-4, example. The rest follows from the README's table and RFC 8785.
        String expected = "{\"actor\":\"ada\",\"kind\":\"entered\",\"meaning\":\"\",\"number\":1,\"parts\":[{\"name\":"
                + "\"findings.json\",\"sha256\":\"ba7816bf8f01cfea414140de5dae2223b00361a396177a9cb410ff61f20015ad\","
                + "\"size\":3,\"type\":\"application/json\"}],\"reason\":\"\",\"schema\":"
                + "\"saddlebook/register-record/1\",\"time\":\"2026-03-01T10:20:30.456Z\",\"title\":\"Tröger's base\"}";
        assertEquals(expected, new String(store.records.get(0).bytes(), StandardCharsets.UTF_8));
        assertEquals(
                Digest.sha256(("\0" + expected).getBytes(StandardCharsets.UTF_8)),
                store.records.get(0).receipt().leaf());
    }

    @Test
    void numbersWithoutGapsAndGrowsTheTreeOverUnchangedLeaves() throws Exception {
        List<Receipt> receipts = new ArrayList<>();
        for (int i = 0; i < 9; i++) {
            receipts.add(enter("entry", "content " + i));
        }
        for (int i = 0; i < 9; i++) {
            Receipt receipt = receipts.get(i);
            assertEquals(i + 1, receipt.number());
            assertTrue(MerkleTree.consistent(
                    i + 1, receipt.head().root(), 9, register.head().root(), register.consistencyProof(i + 1)));
            assertTrue(MerkleTree.includes(
                    receipt.leaf(),
                    i,
                    9,
                    register.inclusionProof(i + 1),
                    register.head().root()));
        }
        assertTrue(verify().agrees());
        assertEquals(register.head(), verify().head());
    }

    @Test
    void keepsEqualPartsOnce() throws Exception {
        enter("one", "same");
        enter("two", "same");
        assertEquals(1, store.parts.size());
        assertEquals(1, verify().parts());
    }

    @Test
    void tellsWhereAnEntryStands() throws Exception {
        enter("first", "1");
        register.append(Draft.reviewed("grace", 1, "checked against the notebook"));
        register.enter(Draft.superseding("ada", "second", 1).withReason("point 3 excluded"), List.of(part("2")));
        register.append(Draft.withdrawn("ada", 3, "wrong stock solution"));
        assertEquals(List.of(Entry.Status.SUPERSEDED, Entry.Status.WITHDRAWN), statuses());
        assertEquals(2, register.show(1).about().size());
        assertTrue(verify().agrees());
    }

    @Test
    void refusesWhatContradictsTheLog() throws Exception {
        enter("first", "1");
        register.enter(Draft.superseding("ada", "second", 1), List.of(part("2")));
        register.append(Draft.reviewed("grace", 2, "checked"));
        refused("already superseded by entry 2", Draft.superseding("ada", "third", 1));
        refused("There is no record 9", Draft.reviewed("grace", 9, "checked"));
        refused("There is no record 0", Draft.reviewed("grace", 0, "checked"));
        refused("is no entry: it says that entry 2 is reviewed", Draft.withdrawn("ada", 3, "x"));
        refused("--meaning", Draft.reviewed("grace", 2, " "));
        refused("--reason", Draft.withdrawn("ada", 2, ""));
        register.append(Draft.withdrawn("ada", 2, "wrong stock"));
        refused("was withdrawn by record 4", Draft.reviewed("grace", 2, "checked"));
        assertEquals(4, store.records.size());
        assertTrue(assertThrows(RegisterException.class, () -> register.show(3))
                .getMessage()
                .contains("is no entry"));
        assertTrue(assertThrows(RegisterException.class, () -> register.show(77))
                .getMessage()
                .contains("There is no entry 77"));
    }

    @Test
    void storesNothingWhenAFileChangesWhileItIsEntered() {
        int[] opened = {0};
        PartFile moving = new PartFile("sources/a.csv", "text/csv", () -> {
            opened[0]++;
            return new ByteArrayInputStream(new byte[] {(byte) opened[0]});
        });
        IOException refusal =
                assertThrows(IOException.class, () -> register.enter(Draft.entered("ada", "moving"), List.of(moving)));
        assertTrue(refusal.getMessage().contains("changed while it was being entered"), refusal.getMessage());
        assertTrue(store.parts.isEmpty());
        assertTrue(store.records.isEmpty());
    }

    @Test
    void givesBackTheBytesAndRefusesChangedOnes() throws Exception {
        enter("entry", "bytes");
        PartEntry part = register.part(register.show(1), "findings.json").orElseThrow();
        assertArrayEquals("bytes".getBytes(StandardCharsets.UTF_8), register.read(part));
        store.parts.put(part.sha256(), "Bytes".getBytes(StandardCharsets.UTF_8));
        assertTrue(assertThrows(RegisterException.class, () -> register.read(part))
                .getMessage()
                .contains("not those that were entered"));
    }

    @Test
    void namesAChangedPart() throws Exception {
        enter("one", "1");
        enter("two", "2");
        store.parts.put(Digest.sha256(new byte[] {'2'}), new byte[] {'3'});
        assertEquals(List.of("part-changed@2"), codes(verify()));
    }

    @Test
    void namesAMissingPart() throws Exception {
        enter("one", "1");
        store.parts.clear();
        assertEquals(List.of("part-missing@1"), codes(verify()));
    }

    @Test
    void doesNotTakeAFailingDiskForADifference() throws Exception {
        enter("one", "1");
        store.broken = true;
        assertThrows(RegisterException.class, () -> verify());
    }

    @Test
    void refusesTextWithoutAUtf8Form() {
        String message = assertThrows(RegisterException.class, () -> enter("half \ud83d", "1"))
                .getMessage();
        assertTrue(message.contains("no UTF-8 form"), message);
        assertTrue(store.records.isEmpty());
    }

    @Test
    void namesARecordOfWhichAnyOneByteWasFlipped() throws Exception {
        fill(5);
        SealedRecord honest = store.records.get(2);
        for (int at = 0; at < honest.bytes().length; at++) {
            byte[] bytes = honest.bytes();
            bytes[at] ^= 1;
            store.records.set(2, new SealedRecord(bytes, honest.receipt()));
            List<String> codes = codes(verify());
            assertEquals("record-changed@3", codes.get(0), "byte " + at);
            assertTrue(codes.stream().noneMatch(code -> code.endsWith("@2") || code.endsWith("@4")), codes.toString());
        }
    }

    @Test
    void namesARecordThatWasSealedAnew() throws Exception {
        fill(5);
        SealedRecord old = store.records.get(2);
        byte[] forged = new String(old.bytes(), StandardCharsets.UTF_8)
                .replace("ada", "eve")
                .getBytes(StandardCharsets.UTF_8);
        Digest leaf = MerkleTree.leaf(forged);
        Head head = store.records.get(1).receipt().head().grow(leaf);
        store.records.set(2, new SealedRecord(forged, new Receipt(3, leaf, head)));
        assertEquals(List.of("head-changed@4"), codes(verify()));
    }

    @Test
    void namesAWholeForgedEndOnlyByACheckpointKeptOutside() throws Exception {
        fill(5);
        Checkpoint kept = new Checkpoint(5, register.head().root());
        List<SealedRecord> honest = List.copyOf(store.records);
        store.records.subList(2, 5).clear();
        Head head = honest.get(1).receipt().head();
        for (int i = 2; i < 5; i++) {
            byte[] forged = new String(honest.get(i).bytes(), StandardCharsets.UTF_8)
                    .replace("ada", "eve")
                    .getBytes(StandardCharsets.UTF_8);
            head = head.grow(MerkleTree.leaf(forged));
            store.records.add(new SealedRecord(forged, new Receipt(i + 1, MerkleTree.leaf(forged), head)));
        }
        assertTrue(verify().agrees());
        assertEquals(List.of("history-changed@-"), codes(verify(kept)));
    }

    @Test
    void namesADeletedRecord() throws Exception {
        fill(5);
        Checkpoint kept = new Checkpoint(5, register.head().root());
        SealedRecord last = store.records.remove(4);
        assertTrue(verify().agrees(), "a lost end cannot be told from inside");
        assertEquals(List.of("records-lost@-"), codes(verify(kept)));
        store.records.add(last);
        store.records.remove(2);
        assertEquals(List.of("record-missing@3"), codes(verify()));
    }

    @Test
    void namesRecordsThatChangedPlaces() throws Exception {
        fill(5);
        SealedRecord second = store.records.get(1);
        SealedRecord third = store.records.get(2);
        store.records.set(1, new SealedRecord(third.bytes(), second.receipt()));
        store.records.set(2, new SealedRecord(second.bytes(), third.receipt()));
        assertEquals(
                List.of("record-changed@2", "record-moved@2", "record-changed@3", "record-moved@3"), codes(verify()));
    }

    @Test
    void refusesARecordOfANewerSchemaBySayingSo() throws Exception {
        fill(1);
        byte[] newer = new String(store.records.get(0).bytes(), StandardCharsets.UTF_8)
                .replace(LogRecord.SCHEMA, "saddlebook/register-record/9")
                .getBytes(StandardCharsets.UTF_8);
        Digest leaf = MerkleTree.leaf(newer);
        store.records.set(0, new SealedRecord(newer, new Receipt(1, leaf, Head.EMPTY.grow(leaf))));
        String message = assertThrows(RegisterException.class, register::list).getMessage();
        assertTrue(message.contains("register-record/9"), message);
        assertEquals(List.of("record-unreadable@1"), codes(verify()));
    }

    private void fill(int count) throws IOException {
        for (int i = 1; i <= count; i++) {
            enter("entry " + i, "content");
        }
    }

    private Receipt enter(String title, String content) throws IOException {
        return register.enter(Draft.entered("ada", title), List.of(part(content)));
    }

    private static PartFile part(String content) {
        return PartFile.of("findings.json", "application/json", content.getBytes(StandardCharsets.UTF_8));
    }

    private void refused(String words, Draft draft) {
        String message = assertThrows(RegisterException.class, () -> register.append(draft))
                .getMessage();
        assertTrue(message.contains(words), message);
    }

    private Verification verify(Checkpoint... kept) throws Exception {
        return register.verify(List.of(kept), Progress.NONE);
    }

    private List<Entry.Status> statuses() throws RegisterException {
        return register.list().stream().map(Entry::status).collect(Collectors.toList());
    }

    private static List<String> codes(Verification verification) {
        List<String> codes = new ArrayList<>();
        for (Verification.Difference difference : verification.differences()) {
            OptionalLong number = difference.number();
            codes.add(difference.code() + "@" + (number.isPresent() ? Long.toString(number.getAsLong()) : "-"));
        }
        return codes;
    }
}
