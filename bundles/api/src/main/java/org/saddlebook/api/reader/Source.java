package org.saddlebook.api.reader;

/**
 * A file to read.
 *
 * @param name file name as the user gave it, used in messages
 * @param bytes its bytes; do not change
 */
@SuppressWarnings("ArrayRecordComponent") // compared by nobody; the bytes can be large
public record Source(String name, byte[] bytes) {}
