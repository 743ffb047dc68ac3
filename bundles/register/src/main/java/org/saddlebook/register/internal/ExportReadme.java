package org.saddlebook.register.internal;

import java.util.ArrayList;
import java.util.List;
import org.saddlebook.register.api.Digest;
import org.saddlebook.register.api.Entry;
import org.saddlebook.register.api.Head;

/** The text in an export that lets a stranger check it with sha256sum. */
final class ExportReadme {
    private ExportReadme() {}

    /** For each step of an inclusion proof, whether the given hash stands to the left (RFC 9162, 2.1.3.2). */
    static List<Boolean> lefts(long index, long size) {
        List<Boolean> lefts = new ArrayList<>();
        long position = index;
        long last = size - 1;
        while (last > 0) {
            if ((position & 1) == 1 || position == last) {
                lefts.add(true);
                while ((position & 1) == 0 && position != 0) {
                    position >>= 1;
                    last >>= 1;
                }
            } else {
                lefts.add(false);
            }
            position >>= 1;
            last >>= 1;
        }
        return lefts;
    }

    static String text(Entry entry, Digest leaf, List<Digest> path, Head head) {
        long number = entry.number();
        StringBuilder text = new StringBuilder(4096);
        text.append("Entry ").append(number).append(" of a Saddlebook register\n\n");
        text.append("Title:   ").append(Words.line(entry.record().title())).append('\n');
        text.append("Entered: ")
                .append(entry.record().time())
                .append(" by ")
                .append(Words.line(entry.record().actor()))
                .append('\n');
        text.append("Status:  ").append(Words.status(entry)).append(" (when this was exported)\n\n");
        text.append("record.json      the record, byte for byte as it was sealed (canonical JSON, RFC 8785)\n");
        text.append("parts/           the files of the entry; record.json names their SHA-256\n");
        text.append("about/           later records that name this entry: reviews, supersession, withdrawal\n");
        text.append("signatures.html  the same for people\n");
        text.append("proof.json       the way from this record to the root of the register's tree (RFC 9162)\n");
        text.append("checkpoint.json  number of records and root hash when this was exported\n");
        text.append("SHA256SUMS       SHA-256 of every file but this one and itself\n\n");
        text.append("How to check it by hand\n-----------------------\n");
        text.append("In a bash shell in this folder (on macOS write \"shasum -a 256\" for \"sha256sum\"):\n\n");
        text.append("1. The files are whole:\n\n    sha256sum --check --quiet SHA256SUMS\n\n");
        text.append("2. The parts are those the record names: the \"sha256\" of each part in record.json equals the\n");
        text.append("   line of that part in SHA256SUMS.\n\n");
        text.append("3. The record is in the register. A leaf is SHA-256 of a zero byte and the record, an interior\n");
        text.append("   node SHA-256 of a one byte, the left hash and the right hash:\n\n");
        text.append("    h=$( { printf '\\000'; cat record.json; } | sha256sum | cut -c1-64 )\n");
        text.append("    node() { printf \"$(printf '01%s%s' \"$1\" \"$2\" | sed 's/../\\\\x&/g')\" | sha256sum")
                .append(" | cut -c1-64; }\n");
        List<Boolean> lefts = lefts(number - 1, head.size());
        for (int i = 0; i < path.size(); i++) {
            if (lefts.get(i)) {
                text.append("    h=$(node ").append(path.get(i)).append(" $h)\n");
            } else {
                text.append("    h=$(node $h ").append(path.get(i)).append(")\n");
            }
        }
        text.append("    echo $h\n\n");
        text.append("   The first line gives the leaf hash ").append(leaf).append(",\n");
        text.append("   the last one must print the root hash\n   ")
                .append(head.root())
                .append(".\n\n");
        text.append("4. Compare that root hash over ")
                .append(head.size())
                .append(" records with one obtained from the register's keeper\n");
        text.append("   or kept from another export. Whoever holds an older checkpoint.json can have the register\n");
        text.append("   held to it: saddlebook register verify --checkpoint FILE\n");
        return text.toString();
    }
}
