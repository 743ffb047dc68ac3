package org.saddlebook.launcher.internal;

/** The installation or a file of the administrator cannot be used; the message is written for the user. */
final class Refused extends Exception {
    private static final long serialVersionUID = 1L;

    Refused(String message) {
        super(message, null, false, false);
    }

    /** The four parts of a message that can be acted on. */
    static Refused at(String place, String found, String expected, String remedy) {
        return new Refused(place + ": found " + found + "; expected " + expected + ". " + remedy);
    }
}
