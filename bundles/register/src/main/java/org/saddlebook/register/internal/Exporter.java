package org.saddlebook.register.internal;

import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import org.saddlebook.json.api.JsonArray;
import org.saddlebook.json.api.JsonObject;
import org.saddlebook.json.api.JsonValue;
import org.saddlebook.json.api.PrettyJson;
import org.saddlebook.register.api.Checkpoint;
import org.saddlebook.register.api.Digest;
import org.saddlebook.register.api.Entry;
import org.saddlebook.register.api.Export;
import org.saddlebook.register.api.Head;
import org.saddlebook.register.api.LogRecord;
import org.saddlebook.register.api.MerkleTree;
import org.saddlebook.register.api.PartEntry;
import org.saddlebook.register.api.PartFile;
import org.saddlebook.register.api.RegisterDamagedException;
import org.saddlebook.register.api.SealedRecord;

/** Lays out the export of one entry. */
final class Exporter {
    private static final String JSON = "application/json";

    private final StoredRegister register;
    private final Entry entry;
    private final List<SealedRecord> records;
    private final Head head;
    private final List<PartFile> files = new ArrayList<>();
    private final StringBuilder sums = new StringBuilder();

    Exporter(StoredRegister register, Entry entry, List<SealedRecord> records) {
        this.register = register;
        this.entry = entry;
        this.records = records;
        this.head = Records.head(records);
    }

    Export export() throws RegisterDamagedException {
        if (records.size() != head.size()) {
            throw new RegisterDamagedException("The register has " + records.size() + " records and a tree over "
                    + head.size() + ". Run \"register verify\".");
        }
        List<Digest> leaves = StoredRegister.leaves(records);
        long index = entry.number() - 1;
        Digest leaf = leaves.get((int) index);
        List<Digest> path = MerkleTree.inclusionProof(index, leaves);
        add("record.json", JSON, sealed(entry.number()).bytes());
        add("proof.json", JSON, PrettyJson.bytes(proof(entry.number(), leaf, path)));
        add("checkpoint.json", JSON, PrettyJson.bytes(checkpoint()));
        for (LogRecord later : entry.about()) {
            String name = "about/record-" + later.number();
            Digest laterLeaf = leaves.get((int) later.number() - 1);
            add(name + ".json", JSON, sealed(later.number()).bytes());
            List<Digest> laterPath = MerkleTree.inclusionProof(later.number() - 1, leaves);
            add(name + ".proof.json", JSON, PrettyJson.bytes(proof(later.number(), laterLeaf, laterPath)));
        }
        add("signatures.html", "text/html", SignatureSheet.html(entry, leaf, head));
        for (PartEntry part : entry.record().parts()) {
            sums.append(part.sha256()).append("  parts/").append(part.name()).append('\n');
            files.add(new PartFile("parts/" + part.name(), part.type(), () -> register.open(part)));
        }
        List<PartFile> all = new ArrayList<>();
        byte[] readme = ExportReadme.text(entry, leaf, path, head).getBytes(StandardCharsets.UTF_8);
        all.add(PartFile.of("README.txt", "text/plain", readme));
        all.add(PartFile.of("SHA256SUMS", "text/plain", sums.toString().getBytes(StandardCharsets.UTF_8)));
        all.addAll(files);
        return new Export(entry, all);
    }

    private SealedRecord sealed(long number) {
        return records.get((int) number - 1);
    }

    private void add(String name, String type, byte[] bytes) {
        sums.append(Digest.sha256(bytes)).append("  ").append(name).append('\n');
        files.add(PartFile.of(name, type, bytes));
    }

    private JsonObject proof(long number, Digest leaf, List<Digest> path) {
        List<JsonValue> steps = new ArrayList<>();
        List<Boolean> lefts = ExportReadme.lefts(number - 1, head.size());
        for (int i = 0; i < path.size(); i++) {
            steps.add(JsonObject.builder()
                    .put("side", lefts.get(i) ? "left" : "right")
                    .put("sha256", path.get(i).hex())
                    .build());
        }
        return JsonObject.builder()
                .put("schema", "saddlebook/register-inclusion/1")
                .put("number", (double) number)
                .put("leaf", leaf.hex())
                .put("size", (double) head.size())
                .put("root", head.root().hex())
                .put("path", new JsonArray(steps))
                .build();
    }

    private JsonObject checkpoint() {
        return JsonObject.builder()
                .put("schema", Checkpoint.SCHEMA)
                .put("size", (double) head.size())
                .put("root", head.root().hex())
                .build();
    }
}
