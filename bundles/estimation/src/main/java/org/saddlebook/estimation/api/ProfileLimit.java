package org.saddlebook.estimation.api;

/** One end of a profile interval. */
public sealed interface ProfileLimit {
    /**
     * The profile crosses the limit here.
     *
     * @param value of the parameter
     */
    record At(double value) implements ProfileLimit {}

    /**
     * The profile stays below the limit however far the parameter goes: the data set no limit on this side.
     *
     * @param tried the farthest value looked at, or the edge beyond which the response or its bounds do not reach
     * @param reason a sentence
     */
    record Open(double tried, String reason) implements ProfileLimit {}

    /**
     * The profile could not be followed.
     *
     * @param reached the last value at which it was known
     * @param reason a sentence
     */
    record Lost(double reached, String reason) implements ProfileLimit {}
}
