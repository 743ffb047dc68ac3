package org.saddlebook.reader.sheet.internal;

import com.github.miachm.sods.Sheet;
import com.github.miachm.sods.SpreadSheet;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.zip.ZipEntry;
import java.util.zip.ZipOutputStream;

/** Writes small spreadsheets, good and bad ones. */
final class Workbooks {
    private static final String HEAD = "<?xml version=\"1.0\" encoding=\"UTF-8\" standalone=\"yes\"?>\n";
    private static final String MAIN = "http://schemas.openxmlformats.org/spreadsheetml/2006/main";
    private static final String OFFICE = "http://schemas.openxmlformats.org/officeDocument/2006/relationships";
    private static final String PACKAGE = "http://schemas.openxmlformats.org/package/2006/";

    private Workbooks() {}

    /** A number cell. */
    static String number(String value) {
        return "<c><v>" + value + "</v></c>";
    }

    /** A number cell with a format: 1 percent, 2 date. */
    static String formatted(String value, int style) {
        return "<c s=\"" + style + "\"><v>" + value + "</v></c>";
    }

    static String text(String text) {
        return "<c t=\"inlineStr\"><is><t xml:space=\"preserve\">" + text + "</t></is></c>";
    }

    static String formula(String formula, String saved) {
        return "<c><f>" + formula + "</f><v>" + saved + "</v></c>";
    }

    static String fault() {
        return "<c t=\"e\"><f>1/0</f><v>#DIV/0!</v></c>";
    }

    /** Rows of cells as a worksheet; a cell that is not given is left out, references are added. */
    static String sheet(String[]... rows) {
        StringBuilder xml = new StringBuilder(HEAD + "<worksheet xmlns=\"" + MAIN + "\"><sheetData>");
        for (int row = 0; row < rows.length; row++) {
            xml.append("<row r=\"").append(row + 1).append("\">");
            for (int column = 0; column < rows[row].length; column++) {
                String reference = "<c r=\"" + Grid.letters(column) + (row + 1) + "\"";
                xml.append(rows[row][column].isEmpty() ? "" : reference + rows[row][column].substring(2));
            }
            xml.append("</row>");
        }
        return xml + "</sheetData></worksheet>";
    }

    /** Parts of a workbook with these sheets by name; a name that begins with ! is hidden. */
    static Map<String, byte[]> parts(Map<String, String> sheets) {
        StringBuilder types = new StringBuilder(HEAD + "<Types xmlns=\"" + PACKAGE + "content-types\">"
                + "<Default Extension=\"rels\" ContentType=\"application/vnd.openxmlformats-package.relationships+xml\"/>"
                + "<Default Extension=\"xml\" ContentType=\"application/xml\"/><Override PartName=\"/xl/workbook.xml\""
                + " ContentType=\"application/vnd.openxmlformats-officedocument.spreadsheetml.sheet.main+xml\"/>"
                + "<Override PartName=\"/xl/styles.xml\""
                + " ContentType=\"application/vnd.openxmlformats-officedocument.spreadsheetml.styles+xml\"/>");
        StringBuilder list = new StringBuilder();
        StringBuilder relations = new StringBuilder();
        Map<String, byte[]> parts = new LinkedHashMap<>();
        int number = 0;
        for (Map.Entry<String, String> sheet : sheets.entrySet()) {
            number++;
            boolean hidden = sheet.getKey().startsWith("!");
            types.append("<Override PartName=\"/xl/worksheets/sheet")
                    .append(number)
                    .append(".xml\" ContentType=\"application/"
                            + "vnd.openxmlformats-officedocument.spreadsheetml.worksheet+xml\"/>");
            list.append("<sheet name=\"")
                    .append(hidden ? sheet.getKey().substring(1) : sheet.getKey())
                    .append(hidden ? "\" state=\"hidden\"" : "\"")
                    .append(" sheetId=\"")
                    .append(number)
                    .append("\" r:id=\"rId")
                    .append(number)
                    .append("\"/>");
            relations
                    .append("<Relationship Id=\"rId")
                    .append(number)
                    .append("\" Type=\"" + OFFICE + "/worksheet\" Target=\"")
                    .append("worksheets/sheet")
                    .append(number)
                    .append(".xml\"/>");
        }
        add(parts, "[Content_Types].xml", types + "</Types>");
        add(
                parts,
                "_rels/.rels",
                HEAD + "<Relationships xmlns=\"" + PACKAGE + "relationships\"><Relationship Id=\"rId1\" Type=\""
                        + OFFICE + "/officeDocument\" Target=\"xl/workbook.xml\"/></Relationships>");
        add(
                parts,
                "xl/workbook.xml",
                HEAD + "<workbook xmlns=\"" + MAIN + "\" xmlns:r=\"" + OFFICE + "\"><sheets>" + list
                        + "</sheets></workbook>");
        add(
                parts,
                "xl/_rels/workbook.xml.rels",
                HEAD + "<Relationships xmlns=\"" + PACKAGE + "relationships\">" + relations
                        + "<Relationship Id=\"rId99\" Type=\"" + OFFICE
                        + "/styles\" Target=\"styles.xml\"/></Relationships>");
        add(
                parts,
                "xl/styles.xml",
                HEAD + "<styleSheet xmlns=\"" + MAIN + "\"><cellXfs count=\"3\"><xf numFmtId=\"0\"/>"
                        + "<xf numFmtId=\"10\"/><xf numFmtId=\"14\"/></cellXfs></styleSheet>");
        number = 0;
        for (String xml : sheets.values()) {
            add(parts, "xl/worksheets/sheet" + ++number + ".xml", xml);
        }
        return parts;
    }

    static void add(Map<String, byte[]> parts, String name, String text) {
        parts.put(name, text.getBytes(StandardCharsets.UTF_8));
    }

    static byte[] archive(Map<String, byte[]> parts) {
        try {
            ByteArrayOutputStream bytes = new ByteArrayOutputStream();
            try (ZipOutputStream zip = new ZipOutputStream(bytes)) {
                for (Map.Entry<String, byte[]> part : parts.entrySet()) {
                    zip.putNextEntry(new ZipEntry(part.getKey()));
                    zip.write(part.getValue());
                    zip.closeEntry();
                }
            }
            return bytes.toByteArray();
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    static byte[] workbook(String[]... rows) {
        return archive(parts(Map.of("Rates", sheet(rows))));
    }

    /** An OpenDocument spreadsheet with one sheet. */
    static byte[] openDocument(Object[]... rows) {
        Sheet sheet = new Sheet("Rates", rows.length, rows[0].length);
        sheet.getDataRange().setValues(rows);
        SpreadSheet document = new SpreadSheet();
        document.appendSheet(sheet);
        ByteArrayOutputStream bytes = new ByteArrayOutputStream();
        try {
            document.save(bytes);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
        return bytes.toByteArray();
    }
}
