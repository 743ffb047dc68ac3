package org.saddlebook.api.reader;

/**
 * What a reader sees when asked whether it can read a file.
 *
 * @param name file name without folders
 * @param start the first bytes, at most 64 KiB; do not change
 * @param size size of the whole in bytes
 */
@SuppressWarnings("ArrayRecordComponent") // compared by nobody; copying 64 KiB per reader would be waste
public record SourceHead(String name, byte[] start, long size) {}
