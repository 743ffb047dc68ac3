package org.saddlebook.desk.internal;

/** Where faults are written for those who look for their cause: the launcher leads standard error to its fault log. */
final class Faults {
    private Faults() {}

    static void log(Throwable fault) {
        fault.printStackTrace();
    }
}
