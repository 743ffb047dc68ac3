import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.LocalDate;
import java.time.ZoneOffset;
import java.util.List;
import java.util.stream.Stream;

/**
 * Collects what the long checks wrote into one document. Run from the root of the source after
 * {@code mvn verify -Peverything}: {@code java distribution/checks/CollectChecks.java}.
 *
 * <p>Each check leaves a fragment {@code target/checks/NAME.md} in its module, beginning with a second-level heading.
 */
public final class CollectChecks {
    private static final Path DOCUMENT = Path.of("distribution", "docs", "checks.md");

    private CollectChecks() {}

    /** No arguments; ends with status 1 when there is nothing to collect. */
    public static void main(String[] arguments) throws IOException, InterruptedException {
        List<Path> fragments;
        try (Stream<Path> files = Files.walk(Path.of("."), 5)) {
            fragments = files.filter(CollectChecks::isFragment).sorted().toList();
        }
        if (fragments.isEmpty()) {
            System.err.println("Nothing to collect: run mvn verify -Peverything first, in the root of the source.");
            System.exit(1);
        }
        StringBuilder text = new StringBuilder("# Long checks\n\nWritten by `mvn verify -Peverything`, collected at commit `");
        text.append(git("rev-parse", "HEAD"));
        text.append(git("status", "--porcelain", "--untracked-files=no").isEmpty() ? "`" : "` (with uncommitted changes)");
        text.append(" on ").append(LocalDate.now(ZoneOffset.UTC)).append(", Java ");
        text.append(System.getProperty("java.version")).append(", ").append(System.getProperty("os.name")).append(' ');
        text.append(System.getProperty("os.arch")).append(", ");
        text.append(Runtime.getRuntime().availableProcessors()).append(" cores. A table is as old as the last run that wrote it: run the checks first.\n");
        for (Path fragment : fragments) {
            text.append('\n').append(Files.readString(fragment).strip()).append('\n');
        }
        Files.writeString(DOCUMENT, text);
        System.err.println(fragments.size() + " fragments collected into " + DOCUMENT);
    }

    private static boolean isFragment(Path path) {
        return path.toString().endsWith(".md")
                && path.getNameCount() >= 3
                && path.getName(path.getNameCount() - 2).toString().equals("checks")
                && path.getName(path.getNameCount() - 3).toString().equals("target");
    }

    private static String git(String... arguments) throws IOException, InterruptedException {
        ProcessBuilder builder = new ProcessBuilder("git");
        builder.command().addAll(List.of(arguments));
        Process process = builder.redirectError(ProcessBuilder.Redirect.INHERIT).start();
        String answer = new String(process.getInputStream().readAllBytes(), StandardCharsets.UTF_8).strip();
        return process.waitFor() == 0 ? answer : "unknown";
    }
}
