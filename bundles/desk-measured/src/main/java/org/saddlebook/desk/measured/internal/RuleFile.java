package org.saddlebook.desk.measured.internal;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import java.util.stream.Stream;
import org.saddlebook.api.problem.InputException;
import org.saddlebook.api.reader.ReadingRule;
import org.saddlebook.json.api.JsonObject;
import org.saddlebook.json.api.JsonReader;
import org.saddlebook.json.api.JsonString;
import org.saddlebook.json.api.JsonValue;

/** Reading rules kept for the next file of the same kind: one small JSON file each, in the user's data folder. */
final class RuleFile {
    private static final String SCHEMA = "saddlebook/reading-rule/1";
    private static final String END = ".rule.json";

    private final Path folder;

    RuleFile(Path dataFolder) {
        folder = dataFolder.resolve("reading-rules");
    }

    /** Keeps a rule under a name; one of the same name is replaced. */
    Path save(String name, ReadingRule rule) throws IOException {
        Map<String, JsonValue> options = new LinkedHashMap<>();
        new TreeMap<>(rule.options()).forEach((key, value) -> options.put(key, new JsonString(value)));
        Map<String, JsonValue> all = new LinkedHashMap<>();
        all.put("schema", new JsonString(SCHEMA));
        all.put("name", new JsonString(name));
        all.put("options", new JsonObject(options));
        Files.createDirectories(folder);
        Path file = folder.resolve(fileName(name) + END);
        Path part = Files.createTempFile(folder, ".", ".part");
        try {
            Files.write(part, org.saddlebook.json.api.PrettyJson.bytes(new JsonObject(all)));
            Files.move(part, file, StandardCopyOption.REPLACE_EXISTING);
        } finally {
            Files.deleteIfExists(part);
        }
        return file;
    }

    /** Names of the rules kept, in order. */
    List<String> names() throws IOException {
        List<String> names = new ArrayList<>();
        if (Files.isDirectory(folder)) {
            try (Stream<Path> files = Files.list(folder)) {
                files.map(file -> file.getFileName().toString())
                        .filter(name -> name.endsWith(END))
                        .map(name -> name.substring(0, name.length() - END.length()))
                        .sorted()
                        .forEach(names::add);
            }
        }
        return names;
    }

    /** The rule kept under a name of {@link #names}. */
    ReadingRule read(String name) throws IOException, InputException {
        Path file = folder.resolve(fileName(name) + END);
        Map<String, String> options = new TreeMap<>();
        if (JsonReader.read(file.getFileName().toString(), Files.readAllBytes(file)) instanceof JsonObject object
                && object.get("options").orElse(null) instanceof JsonObject stored) {
            for (Map.Entry<String, JsonValue> option : stored.members().entrySet()) {
                if (option.getValue() instanceof JsonString text) {
                    options.put(option.getKey(), text.value());
                }
            }
        }
        return new ReadingRule(options);
    }

    /** Letters, digits, hyphens and underscores; everything else becomes a hyphen, so that a name cannot lead elsewhere. */
    private static String fileName(String name) {
        StringBuilder safe = new StringBuilder();
        for (int i = 0; i < name.length() && safe.length() < 80; i++) {
            char c = name.charAt(i);
            safe.append(Character.isLetterOrDigit(c) || c == '-' || c == '_' ? c : '-');
        }
        return safe.toString();
    }
}
