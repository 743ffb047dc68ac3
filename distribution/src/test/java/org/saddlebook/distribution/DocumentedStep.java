package org.saddlebook.distribution;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;

/**
 * What a document tells the reader to do, in order. A fenced block {@code ```csv NAME} is a file to write; in a block
 * {@code ```console} a line {@code $ saddlebook ...} is a command, what follows is what it shows, and a last line
 * {@code exit code N} states its exit code, 0 where none is stated.
 */
sealed interface DocumentedStep {
    /**
     * A file to write.
     *
     * @param name relative path
     * @param content its lines
     */
    record WriteFile(String name, List<String> content) implements DocumentedStep {}

    /**
     * A command to run.
     *
     * @param line of the document, from 1
     * @param arguments after {@code saddlebook}
     * @param shown lines that must appear
     * @param exitCode expected
     */
    record Run(int line, List<String> arguments, List<String> shown, int exitCode) implements DocumentedStep {}

    /** The steps of a document. */
    static List<DocumentedStep> of(Path document) throws IOException {
        List<DocumentedStep> steps = new ArrayList<>();
        List<String> lines = Files.readAllLines(document);
        int i = 0;
        while (i < lines.size()) {
            String opening = lines.get(i++);
            if (!opening.startsWith("```")) {
                continue;
            }
            int start = i;
            while (i < lines.size() && !lines.get(i).startsWith("```")) {
                i++;
            }
            List<String> block = lines.subList(start, Math.min(i, lines.size()));
            i++;
            String kind = opening.substring(3).strip();
            if (kind.equals("console")) {
                addRuns(document, start + 1, block, steps);
            } else if (kind.startsWith("csv ")) {
                steps.add(new WriteFile(kind.substring(4).strip(), List.copyOf(block)));
            }
        }
        return steps;
    }

    private static void addRuns(Path document, int firstLine, List<String> block, List<DocumentedStep> steps) {
        int i = 0;
        while (i < block.size()) {
            int line = firstLine + i;
            List<String> words = words(block.get(i++));
            boolean ours = words.size() > 1
                    && words.get(0).equals("$")
                    && (words.get(1).equals("saddlebook") || words.get(1).equals("distribution/saddlebook"));
            if (!ours) {
                throw new AssertionError(document + ", line " + line
                        + ": a console block holds lines \"$ saddlebook ...\"" + " and what they show");
            }
            List<String> shown = new ArrayList<>();
            int exitCode = 0;
            while (i < block.size() && !block.get(i).startsWith("$ ")) {
                String text = block.get(i++);
                if (text.startsWith("exit code ")) {
                    exitCode = Integer.parseInt(
                            text.substring("exit code ".length()).strip());
                } else {
                    shown.add(text);
                }
            }
            steps.add(new Run(line, words.subList(2, words.size()), shown, exitCode));
        }
    }

    /** Words of a command; double quotes hold a word together. */
    private static List<String> words(String command) {
        List<String> words = new ArrayList<>();
        StringBuilder word = new StringBuilder();
        boolean quoted = false;
        boolean any = false;
        for (int i = 0; i < command.length(); i++) {
            char c = command.charAt(i);
            if (c == '"') {
                quoted = !quoted;
                any = true;
            } else if (c == ' ' && !quoted) {
                if (any) {
                    words.add(word.toString());
                }
                word.setLength(0);
                any = false;
            } else {
                word.append(c);
                any = true;
            }
        }
        if (any) {
            words.add(word.toString());
        }
        return words;
    }
}
