package org.saddlebook.barrier.internal;

/** How fitting one rate model ended. */
sealed interface LawOutcome permits FittedLaw, LawOutcome.NotFitted {
    /** Id of the rate model. */
    String id();

    /** Name of the law for people. */
    String title();

    /**
     * No parameters came out.
     *
     * @param id id of the rate model
     * @param title name of the law
     * @param kind why not
     * @param reason a sentence
     */
    record NotFitted(String id, String title, Kind kind, String reason) implements LawOutcome {}

    /** Why there are no parameters; {@code key} is the word used in files. */
    enum Kind {
        /** The data do not determine them. */
        UNDETERMINED("undetermined"),
        /** The law does not apply, or is not installed. */
        REFUSED("refused"),
        /** The contribution broke or the search did not end. */
        FAILED("failed");

        private final String key;

        Kind(String key) {
            this.key = key;
        }

        String key() {
            return key;
        }
    }
}
