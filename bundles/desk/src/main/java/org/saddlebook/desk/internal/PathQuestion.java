package org.saddlebook.desk.internal;

import java.nio.file.Path;
import java.util.function.Consumer;

/**
 * A question for a file or folder.
 *
 * @param question a sentence
 * @param start path to start with
 * @param toWrite whether it need not exist
 * @param answer receives the path
 */
record PathQuestion(String question, Path start, boolean toWrite, Consumer<Path> answer) {}
