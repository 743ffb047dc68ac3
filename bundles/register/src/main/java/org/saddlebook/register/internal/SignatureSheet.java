package org.saddlebook.register.internal;

import java.nio.charset.StandardCharsets;
import org.saddlebook.register.api.Digest;
import org.saddlebook.register.api.Entry;
import org.saddlebook.register.api.Head;
import org.saddlebook.register.api.LogRecord;

/** Who entered, reviewed, superseded or withdrew an entry, on one page. A report never contains its own signatures. */
final class SignatureSheet {
    private SignatureSheet() {}

    static byte[] html(Entry entry, Digest leaf, Head head) {
        StringBuilder page = new StringBuilder(4096);
        page.append(
                        "<!DOCTYPE html>\n<html lang=\"en\">\n<head>\n<meta charset=\"utf-8\">\n<title>Signatures of entry ")
                .append(entry.number())
                .append("</title>\n<style>body{font-family:sans-serif;color:#1F2A30;margin:2em}")
                .append("table{border-collapse:collapse}td,th{border:1px solid #1F2A30;padding:.3em .6em;")
                .append("text-align:left;vertical-align:top}code{font-size:85%}</style>\n</head>\n<body>\n<h1>Entry ")
                .append(entry.number())
                .append(": ")
                .append(escaped(entry.record().title()))
                .append("</h1>\n<p>Status when exported: ")
                .append(Words.status(entry))
                .append(".</p>\n<table>\n<tr><th>Record</th><th>What</th><th>Who</th><th>When (UTC)</th>")
                .append("<th>Meaning</th><th>Reason</th></tr>\n");
        row(page, entry.record());
        for (LogRecord later : entry.about()) {
            row(page, later);
        }
        page.append("</table>\n<p>Leaf hash of record ")
                .append(entry.number())
                .append(":<br><code>")
                .append(leaf)
                .append("</code></p>\n<p>Root hash over ")
                .append(head.size())
                .append(" records when exported:<br><code>")
                .append(head.root())
                .append("</code></p>\n<p>The names are those of the accounts, or given with <code>--as</code>; the ")
                .append("hashes prove that the records were not changed since, not who sat at the keyboard. ")
                .append("<code>README.txt</code> says how to check this export by hand.</p>\n</body>\n</html>\n");
        return page.toString().getBytes(StandardCharsets.UTF_8);
    }

    private static void row(StringBuilder page, LogRecord record) {
        page.append("<tr>");
        cell(page, Long.toString(record.number()));
        cell(page, record.kind().key());
        cell(page, record.actor());
        cell(page, record.time().toString());
        cell(page, record.meaning());
        cell(page, record.reason());
        page.append("</tr>\n");
    }

    private static void cell(StringBuilder page, String text) {
        page.append("<td>").append(escaped(text)).append("</td>");
    }

    private static String escaped(String text) {
        StringBuilder out = new StringBuilder(text.length());
        for (int i = 0; i < text.length(); i++) {
            char c = text.charAt(i);
            switch (c) {
                case '&' -> out.append("&amp;");
                case '<' -> out.append("&lt;");
                case '>' -> out.append("&gt;");
                case '"' -> out.append("&quot;");
                default -> out.append(c < ' ' ? ' ' : c);
            }
        }
        return out.toString();
    }
}
