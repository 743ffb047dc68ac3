package org.saddlebook.api.task;

import java.util.List;
import java.util.concurrent.Callable;
import java.util.function.IntFunction;
import java.util.random.RandomGenerator;
import org.osgi.annotation.versioning.ProviderType;

/** The running piece of work, as seen by what does it: progress out, cancel in, named random streams, parallel parts. */
@ProviderType
public interface Task {
    /**
     * Reports progress.
     *
     * @param fraction done so far, 0 to 1
     * @param doing what is being done, a short phrase for people
     */
    void progress(double fraction, String doing);

    /** Returns, or throws when the user has cancelled. Call it at least every 50 ms of work. */
    void check() throws Cancelled;

    /**
     * A random stream that depends on the campaign's seed and on its name and on nothing else. Name streams by purpose
     * and chunk ({@code "bootstrap/17"}), never by thread: then results do not depend on the number of cores.
     */
    RandomGenerator random(String stream);

    /**
     * Runs independent parts, possibly at the same time, and returns their results in order of index.
     *
     * @param count number of parts, not negative
     * @param part computes part i; must not depend on other parts nor on the order in which parts run
     */
    <T> List<T> parts(int count, IntFunction<T> part) throws Cancelled;

    /**
     * Runs code of a contributor that may be broken, so that only its own result is lost: whatever it throws becomes
     * {@link Contained.Broke}, and so does silence longer than the host's patience where the host watches it.
     *
     * @param culprit who is named, for example {@code model com.example.law of bundle com.example.kinetics}
     * @param work the code; a task it abandons must not hold locks
     * @throws Cancelled when the user has cancelled
     */
    default <T> Contained<T> contain(String culprit, Callable<T> work) throws Cancelled {
        try {
            T value = work.call();
            return value == null ? new Contained.Broke<>(culprit + " returned nothing") : new Contained.Answer<>(value);
        } catch (Cancelled cancelled) {
            throw cancelled;
        } catch (Exception | LinkageError | StackOverflowError | AssertionError broken) {
            return new Contained.Broke<>(culprit + " failed: " + describe(broken));
        }
    }

    /** A fault in words: its type and message. */
    static String describe(Throwable fault) {
        String message = fault.getMessage();
        String type = fault.getClass().getSimpleName();
        return message == null || message.isBlank() ? type : type + ", " + message;
    }
}
