package org.saddlebook.desk.internal;

import java.io.IOException;
import java.nio.file.AtomicMoveNotSupportedException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.util.ArrayList;
import java.util.List;
import org.saddlebook.api.problem.InputException;
import org.saddlebook.json.api.JsonArray;
import org.saddlebook.json.api.JsonBoolean;
import org.saddlebook.json.api.JsonNumber;
import org.saddlebook.json.api.JsonObject;
import org.saddlebook.json.api.JsonReader;
import org.saddlebook.json.api.JsonString;
import org.saddlebook.json.api.JsonValue;
import org.saddlebook.json.api.PrettyJson;

/** What the desk remembers of one user. A damaged file counts as none: nothing in it matters enough to stop. */
final class DeskSettings {
    private static final int RECENT = 12;
    private static final String SCHEMA = "saddlebook-desk-1";

    /** Light or dark. */
    enum Theme {
        LIGHT,
        DARK,
        SYSTEM
    }

    private final Path file;
    private Theme theme = Theme.SYSTEM;
    private List<String> recent = List.of();
    private int width;
    private int height;
    private boolean demoSeen;
    private List<String> setAside = List.of();

    private DeskSettings(Path file) {
        this.file = file;
    }

    /** The settings in a folder, which need not exist. */
    static DeskSettings in(Path folder) {
        DeskSettings settings = new DeskSettings(folder.resolve("desk.json"));
        try {
            if (Files.exists(settings.file)) {
                settings.take(JsonReader.read(settings.file.toString(), Files.readAllBytes(settings.file)));
            }
        } catch (IOException | InputException | IllegalArgumentException e) {
            return new DeskSettings(settings.file);
        }
        return settings;
    }

    private void take(JsonValue value) {
        if (!(value instanceof JsonObject object)) {
            return;
        }
        theme = Theme.valueOf(text(object, "theme", Theme.SYSTEM.name()));
        recent = texts(object, "recent");
        setAside = texts(object, "setAside");
        width = number(object, "width");
        height = number(object, "height");
        demoSeen = object.get("demoSeen").filter(new JsonBoolean(true)::equals).isPresent();
    }

    private static String text(JsonObject object, String key, String otherwise) {
        return object.get(key).orElse(null) instanceof JsonString string ? string.value() : otherwise;
    }

    private static int number(JsonObject object, String key) {
        return object.get(key).orElse(null) instanceof JsonNumber number ? (int) number.value() : 0;
    }

    private static List<String> texts(JsonObject object, String key) {
        List<String> texts = new ArrayList<>();
        if (object.get(key).orElse(null) instanceof JsonArray array) {
            for (JsonValue item : array.items()) {
                if (item instanceof JsonString string) {
                    texts.add(string.value());
                }
            }
        }
        return List.copyOf(texts);
    }

    /** Writes them, whole or not at all. */
    void save() throws IOException {
        byte[] bytes;
        synchronized (this) {
            bytes = PrettyJson.bytes(JsonObject.builder()
                    .put("schema", SCHEMA)
                    .put("theme", theme.name())
                    .put("width", width)
                    .put("height", height)
                    .put("demoSeen", demoSeen)
                    .put("recent", JsonArray.ofStrings(recent))
                    .put("setAside", JsonArray.ofStrings(setAside))
                    .build());
        }
        write(file, bytes);
    }

    /** Writes a small file, whole or not at all. */
    static void write(Path file, byte[] bytes) throws IOException {
        Files.createDirectories(file.getParent());
        Path fresh = Files.createTempFile(file.getParent(), ".desk", ".tmp");
        try {
            Files.write(fresh, bytes);
            try {
                Files.move(fresh, file, StandardCopyOption.ATOMIC_MOVE);
            } catch (AtomicMoveNotSupportedException e) {
                Files.move(fresh, file, StandardCopyOption.REPLACE_EXISTING);
            }
        } finally {
            Files.deleteIfExists(fresh);
        }
    }

    synchronized Theme theme() {
        return theme;
    }

    synchronized void theme(Theme chosen) {
        theme = chosen;
    }

    /** What was opened last, newest first. */
    synchronized List<String> recent() {
        return recent;
    }

    synchronized void opened(String path) {
        List<String> list = new ArrayList<>(recent);
        list.remove(path);
        list.add(0, path);
        recent = List.copyOf(list.subList(0, Math.min(RECENT, list.size())));
    }

    synchronized int width() {
        return width;
    }

    synchronized int height() {
        return height;
    }

    synchronized void size(int wide, int high) {
        width = wide;
        height = high;
    }

    /** Whether the user has worked with a campaign of his own: then the desk starts without the demo. */
    synchronized boolean demoSeen() {
        return demoSeen;
    }

    synchronized void demoSeen(boolean seen) {
        demoSeen = seen;
    }

    /** Ids of panels that kept the event thread in an earlier run and are set aside. */
    synchronized List<String> setAside() {
        return setAside;
    }

    synchronized void setAside(String id, boolean aside) {
        List<String> list = new ArrayList<>(setAside);
        list.remove(id);
        if (aside) {
            list.add(id);
        }
        setAside = List.copyOf(list);
    }
}
