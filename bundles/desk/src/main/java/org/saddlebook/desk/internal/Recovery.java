package org.saddlebook.desk.internal;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.channels.FileChannel;
import java.nio.channels.FileLock;
import java.nio.channels.OverlappingFileLockException;
import java.nio.file.DirectoryStream;
import java.nio.file.FileVisitResult;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.SimpleFileVisitor;
import java.nio.file.StandardOpenOption;
import java.nio.file.attribute.BasicFileAttributes;
import java.util.ArrayList;
import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;
import org.saddlebook.api.problem.InputException;
import org.saddlebook.api.reader.ReadingRule;
import org.saddlebook.api.service.CampaignFolder;
import org.saddlebook.api.service.Intake;
import org.saddlebook.api.service.Progress;
import org.saddlebook.api.task.Cancelled;
import org.saddlebook.desk.api.DeskState;
import org.saddlebook.json.api.JsonObject;
import org.saddlebook.json.api.JsonReader;
import org.saddlebook.json.api.JsonString;
import org.saddlebook.json.api.PrettyJson;

/**
 * Keeps what is not saved, so that a crash loses nothing: each run of the desk has a folder of its own, locked while it
 * lives; a folder whose lock is free was left by a run that did not end well. Off the event thread.
 */
final class Recovery implements AutoCloseable {
    private static final String LOCK = "lock";

    /** A campaign that an earlier run left. */
    record Left(DeskState state) {}

    private final Path all;
    private final Path own;
    private final FileChannel channel;
    private final FileLock lock;

    private Recovery(Path all, Path own, FileChannel channel, FileLock lock) {
        this.all = all;
        this.own = own;
        this.channel = channel;
        this.lock = lock;
    }

    /** A place for this run, below the user's data folder. */
    static Recovery in(Path dataFolder) throws IOException {
        Path all = dataFolder.resolve("desk").resolve("unsaved");
        Files.createDirectories(all);
        Path own = Files.createTempDirectory(all, "run-");
        FileChannel channel = FileChannel.open(own.resolve(LOCK), StandardOpenOption.CREATE, StandardOpenOption.WRITE);
        return new Recovery(all, own, channel, channel.lock());
    }

    /** Keeps a campaign; replaces what was kept under the same key. */
    synchronized void keep(String key, DeskState state, CampaignFolder folder) throws IOException, InputException {
        folder.save(
                new Intake.Opened(state.campaign(), state.parts(), List.of()),
                own.resolve(key).resolve("campaign"));
        JsonObject.Builder about = JsonObject.builder().put("schema", "saddlebook-unsaved-1");
        state.folder().ifPresent(path -> about.put("folder", path.toString()));
        JsonObject.Builder rule = JsonObject.builder();
        new TreeMap<>(state.rule().options()).forEach(rule::put);
        about.put("rule", rule.build());
        DeskSettings.write(own.resolve(key).resolve("about.json"), PrettyJson.bytes(about.build()));
    }

    /** A campaign was saved or closed: nothing to recover. */
    synchronized void drop(String key) throws IOException {
        delete(own.resolve(key));
    }

    /** What runs that did not end well have left, oldest first; it now belongs to this run and is kept until dropped. */
    Map<String, Left> left(Intake intake, String who) throws IOException {
        Map<String, Left> found = new LinkedHashMap<>();
        for (Path run : folders(all)) {
            if (run.equals(own) || !abandoned(run)) {
                continue;
            }
            for (Path campaign : folders(run)) {
                String key = run.getFileName() + "-" + campaign.getFileName();
                try {
                    DeskState state = read(campaign, intake, who);
                    Files.move(campaign, own.resolve(key));
                    found.put(key, new Left(state));
                } catch (InputException | Cancelled | UncheckedIOException e) {
                    // What cannot be read stays where it is: a person may still want the files.
                    Faults.log(e); // goes to the fault log
                }
            }
            if (folders(run).isEmpty()) {
                delete(run);
            }
        }
        return found;
    }

    private static DeskState read(Path folder, Intake intake, String who)
            throws InputException, Cancelled, IOException {
        ReadingRule rule = ReadingRule.AUTOMATIC;
        Optional<Path> savedIn = Optional.empty();
        Path about = folder.resolve("about.json");
        if (Files.exists(about)
                && JsonReader.read(about.toString(), Files.readAllBytes(about)) instanceof JsonObject o) {
            Map<String, String> options = new TreeMap<>();
            if (o.get("rule").orElse(null) instanceof JsonObject stored) {
                stored.members().forEach((option, value) -> {
                    if (value instanceof JsonString text) {
                        options.put(option, text.value());
                    }
                });
            }
            rule = new ReadingRule(options);
            if (o.get("folder").orElse(null) instanceof JsonString text) {
                savedIn = Optional.of(Path.of(text.value()));
            }
        }
        Intake.Opened opened = intake.open(folder.resolve("campaign"), ReadingRule.AUTOMATIC, who, Progress.NONE);
        DeskState state = Reread.opened(opened, rule);
        if (savedIn.isPresent()) {
            state = state.withFolder(savedIn.get());
        }
        boolean unread = opened.campaign().rateTable().isEmpty()
                && !opened.campaign().sources().isEmpty()
                && opened.campaign().sources().get(0).reader().isEmpty();
        return unread ? again(intake, state, rule, who) : state;
    }

    /** A file that could not be read is read once more, to say again what is wrong with it. */
    private static DeskState again(Intake intake, DeskState state, ReadingRule rule, String who)
            throws InputException, Cancelled, IOException {
        return Reread.again(intake, state, rule, who, Progress.NONE);
    }

    private static boolean abandoned(Path run) {
        Path file = run.resolve(LOCK);
        if (!Files.exists(file)) {
            return true;
        }
        try (FileChannel channel = FileChannel.open(file, StandardOpenOption.WRITE);
                FileLock free = channel.tryLock()) {
            return free != null;
        } catch (IOException | OverlappingFileLockException e) {
            return false;
        }
    }

    private static List<Path> folders(Path folder) throws IOException {
        List<Path> list = new ArrayList<>();
        try (DirectoryStream<Path> entries = Files.newDirectoryStream(folder)) {
            for (Path entry : entries) {
                if (Files.isDirectory(entry)) {
                    list.add(entry);
                }
            }
        }
        Collections.sort(list);
        return list;
    }

    private static void delete(Path tree) throws IOException {
        if (!Files.exists(tree)) {
            return;
        }
        Files.walkFileTree(tree, new SimpleFileVisitor<>() {
            @Override
            public FileVisitResult visitFile(Path file, BasicFileAttributes attributes) throws IOException {
                Files.delete(file);
                return FileVisitResult.CONTINUE;
            }

            @Override
            public FileVisitResult postVisitDirectory(Path folder, IOException failure) throws IOException {
                Files.delete(folder);
                return FileVisitResult.CONTINUE;
            }
        });
    }

    /** The run ends well; what is still kept stays for the next one. */
    @Override
    public void close() throws IOException {
        lock.release();
        channel.close();
        if (folders(own).isEmpty()) {
            delete(own);
        }
    }
}
