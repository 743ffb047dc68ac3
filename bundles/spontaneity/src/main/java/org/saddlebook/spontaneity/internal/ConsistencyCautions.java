package org.saddlebook.spontaneity.internal;

/** The cautions of the section consistency. */
final class ConsistencyCautions {
    static final String REVERSIBLE = "consistency-elementary";
    static final String INDEPENDENT = "consistency-independent";

    private ConsistencyCautions() {}
}
