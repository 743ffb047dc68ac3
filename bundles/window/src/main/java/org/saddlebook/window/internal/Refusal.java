package org.saddlebook.window.internal;

/** What was stated cannot be evaluated; the message is a sentence for the user. */
final class Refusal extends Exception {
    private static final long serialVersionUID = 1L;

    Refusal(String sentence) {
        super(sentence, null, false, false);
    }
}
