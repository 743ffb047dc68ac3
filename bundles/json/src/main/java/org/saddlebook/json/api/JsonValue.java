package org.saddlebook.json.api;

/** One JSON value (RFC 8259). Trees are immutable and compared by content; members of objects keep their order. */
public sealed interface JsonValue permits JsonObject, JsonArray, JsonString, JsonNumber, JsonBoolean, JsonNull {
    /** What it is, in a phrase for people: {@code an object}, {@code a number}, ... */
    String kind();
}
