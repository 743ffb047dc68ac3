package org.saddlebook.intake.internal;

import java.io.IOException;
import java.nio.ByteBuffer;
import java.nio.channels.FileChannel;
import java.nio.file.AtomicMoveNotSupportedException;
import java.nio.file.DirectoryStream;
import java.nio.file.Files;
import java.nio.file.LinkOption;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.nio.file.StandardOpenOption;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Locale;
import java.util.Set;
import org.osgi.service.component.annotations.Activate;
import org.osgi.service.component.annotations.Component;
import org.osgi.service.component.annotations.Reference;
import org.saddlebook.api.campaign.Campaign;
import org.saddlebook.api.campaign.SourcePart;
import org.saddlebook.api.problem.InputException;
import org.saddlebook.api.service.CampaignFolder;
import org.saddlebook.api.service.CampaignFormat;
import org.saddlebook.api.service.Intake;
import org.saddlebook.json.api.Sha256;

/** Saves campaign folders: everything is written beside the target first and then moved into its place. */
@Component(service = CampaignFolder.class)
public final class FolderSaver implements CampaignFolder {
    private final CampaignFormat format;

    /** Called by the framework. */
    @Activate
    public FolderSaver(@Reference CampaignFormat format) {
        this.format = format;
    }

    @Override
    public void save(Intake.Opened opened, Path folder) throws IOException, InputException {
        checkParts(opened);
        Path target = folder.toAbsolutePath().normalize();
        try {
            if (Files.exists(target)) {
                target = target.toRealPath();
                checkReplaceable(target, folder);
            } else if (target.getParent() != null) {
                Files.createDirectories(target.getParent());
            }
            Path fresh = Files.createTempDirectory(target.getParent(), "." + target.getFileName() + ".saving");
            try {
                write(opened, fresh);
                moveIntoPlace(fresh, target);
            } finally {
                deleteTree(fresh);
            }
        } catch (IOException e) {
            throw new IOException("The campaign could not be saved in " + folder + ": " + FileGate.reason(e), e);
        }
    }

    private static void checkParts(Intake.Opened opened) {
        List<SourcePart> sources = opened.campaign().sources();
        if (sources.size() != opened.parts().size()) {
            throw new IllegalArgumentException(
                    sources.size() + " sources and " + opened.parts().size() + " parts");
        }
        Set<String> paths = new HashSet<>(Set.of(InputOpener.DOCUMENT));
        for (int i = 0; i < sources.size(); i++) {
            SourcePart source = sources.get(i);
            if (!Sha256.of(opened.parts().get(i).bytes()).equals(source.sha256())) {
                throw new IllegalArgumentException("part " + source.path() + " is not what its hash says");
            }
            // File systems that ignore letter case would keep one of two.
            if (!paths.add(source.path().toLowerCase(Locale.ROOT))) {
                throw new IllegalArgumentException("two parts at " + source.path());
            }
        }
    }

    /** Refuses folders that hold anything but an earlier save. */
    private void checkReplaceable(Path target, Path shown) throws IOException, InputException {
        if (!Files.isDirectory(target)) {
            throw FileGate.problem(
                    "folder-taken", shown.toString(), "a file", "a new or empty folder", "Name another folder.");
        }
        List<String> files = new ArrayList<>();
        list(target, "", files);
        if (files.isEmpty()) {
            return;
        }
        Set<String> own = new HashSet<>(Set.of(InputOpener.DOCUMENT));
        if (files.contains(InputOpener.DOCUMENT)) {
            Path document = target.resolve(InputOpener.DOCUMENT);
            Campaign earlier = format.readCampaign(
                    shown.resolve(InputOpener.DOCUMENT).toString(), FileGate.read(document, document.toString()));
            for (SourcePart source : earlier.sources()) {
                own.add(source.path());
            }
        }
        for (String file : files) {
            if (!own.contains(file) || !files.contains(InputOpener.DOCUMENT)) {
                throw FileGate.problem(
                        "folder-taken",
                        shown.toString(),
                        "a folder that holds \"" + file + "\"",
                        "a new or empty folder, or one that holds an earlier save of a campaign and nothing else",
                        "Name another folder, or move the file away.");
            }
        }
    }

    /** Paths of everything that is not a folder, below a folder, with forward slashes. */
    private static void list(Path folder, String prefix, List<String> files) throws IOException {
        try (DirectoryStream<Path> entries = Files.newDirectoryStream(folder)) {
            for (Path entry : entries) {
                String name = prefix + entry.getFileName();
                if (Files.isDirectory(entry, LinkOption.NOFOLLOW_LINKS)) {
                    list(entry, name + "/", files);
                } else {
                    files.add(name);
                }
            }
        }
    }

    private void write(Intake.Opened opened, Path fresh) throws IOException {
        List<SourcePart> sources = opened.campaign().sources();
        for (int i = 0; i < sources.size(); i++) {
            Path file = fresh.resolve(sources.get(i).path());
            Files.createDirectories(file.getParent());
            write(file, opened.parts().get(i).bytes());
        }
        write(fresh.resolve(InputOpener.DOCUMENT), format.campaign(opened.campaign()));
    }

    private static void write(Path file, byte[] bytes) throws IOException {
        try (FileChannel channel = FileChannel.open(file, StandardOpenOption.CREATE_NEW, StandardOpenOption.WRITE)) {
            ByteBuffer left = ByteBuffer.wrap(bytes);
            while (left.hasRemaining()) {
                channel.write(left);
            }
            channel.force(true);
        }
    }

    /** Two renames at most; when the second fails, the first is undone. */
    private static void moveIntoPlace(Path fresh, Path target) throws IOException {
        widen(fresh, target.getParent());
        if (!Files.exists(target)) {
            move(fresh, target);
            return;
        }
        Path earlier = Files.createTempDirectory(target.getParent(), "." + target.getFileName() + ".earlier");
        Path kept = earlier.resolve("campaign");
        move(target, kept);
        try {
            move(fresh, target);
        } catch (IOException e) {
            move(kept, target);
            throw e;
        } finally {
            if (Files.exists(target)) {
                deleteTree(earlier);
            }
        }
    }

    /** A temporary folder is the user's alone; the campaign gets the rights that its parent gives new folders. */
    private static void widen(Path fresh, Path parent) throws IOException {
        Path probe = fresh.resolve(".rights");
        if (!Files.getFileStore(parent).supportsFileAttributeView("posix")) {
            return;
        }
        Files.createDirectory(probe);
        Files.setPosixFilePermissions(fresh, Files.getPosixFilePermissions(probe));
        Files.delete(probe);
    }

    private static void move(Path from, Path to) throws IOException {
        try {
            Files.move(from, to, StandardCopyOption.ATOMIC_MOVE);
        } catch (AtomicMoveNotSupportedException e) {
            Files.move(from, to);
        }
    }

    private static void deleteTree(Path tree) throws IOException {
        if (!Files.exists(tree, LinkOption.NOFOLLOW_LINKS)) {
            return;
        }
        if (Files.isDirectory(tree, LinkOption.NOFOLLOW_LINKS)) {
            try (DirectoryStream<Path> entries = Files.newDirectoryStream(tree)) {
                for (Path entry : entries) {
                    deleteTree(entry);
                }
            }
        }
        Files.delete(tree);
    }
}
