package org.saddlebook.window.internal;

import java.util.Optional;
import java.util.OptionalDouble;

/** One limit that the user states. Ids are unique within the section, titles are for people; SI inside. */
sealed interface Limit {
    /** Stable id within the section. */
    String id();

    /** Name for people, short. */
    String title();

    /** What is asked for, a sentence. */
    String statement();

    /** The word in settings and findings. */
    String kind();

    /** Whether it needs the fitted rate constant. */
    default boolean needsBarrier() {
        return false;
    }

    /** Whether it needs ΔH and ΔS of the section spontaneity. */
    default boolean needsThermodynamics() {
        return false;
    }

    /** The course of temperature it is judged over; empty for a constant temperature. */
    default Optional<Course> course() {
        return Optional.empty();
    }

    /** The stated barrier it uses, where it uses one. */
    default Optional<StatedBarrier> stated() {
        return Optional.empty();
    }

    /**
     * {@code ΔH − TΔS + RT ln Q ≤ 0}.
     *
     * @param reactionQuotient Q at the stated standard states; positive
     */
    record Allowed(String id, String title, String statement, double reactionQuotient) implements Limit {
        @Override
        public String kind() {
            return "allowed";
        }

        @Override
        public boolean needsThermodynamics() {
            return true;
        }
    }

    /**
     * Equilibrium conversion of the limiting reactant, ideal, from the start that the section spontaneity states: it is at
     * least x where {@code ln K ≥ ln Q(x)}. Without such a start of A ⇌ B from A alone: {@code K/(1+K) ≥ x}.
     *
     * @param conversion x, between 0 and 1
     */
    record Equilibrium(String id, String title, String statement, double conversion) implements Limit {
        @Override
        public String kind() {
            return "equilibrium";
        }

        @Override
        public boolean needsThermodynamics() {
            return true;
        }
    }

    /**
     * Time to a conversion at most so long.
     *
     * @param conversion x, between 0 and 1
     * @param seconds longest time, s; of a course its duration
     * @param course the course of temperature after which the conversion must be reached; empty for a constant one
     */
    record Time(
            String id,
            String title,
            String statement,
            double conversion,
            double seconds,
            RateLaw law,
            Optional<Course> course)
            implements Limit {
        Time(String id, String title, String statement, double conversion, double seconds, RateLaw law) {
            this(id, title, statement, conversion, seconds, law, Optional.empty());
        }

        @Override
        public String kind() {
            return "time";
        }

        @Override
        public boolean needsBarrier() {
            return true;
        }

        @Override
        public boolean needsThermodynamics() {
            return !law.irreversible();
        }
    }

    /**
     * Share of the reactant lost to a competing reaction of the same order: {@code k2/(k1 + k2) ≤ s}.
     *
     * @param share s, between 0 and 1
     */
    record Competing(String id, String title, String statement, double share, StatedBarrier barrier) implements Limit {
        @Override
        public String kind() {
            return "competing";
        }

        @Override
        public boolean needsBarrier() {
            return true;
        }

        @Override
        public Optional<StatedBarrier> stated() {
            return Optional.of(barrier);
        }
    }

    /**
     * Time until so much is lost at least so long.
     *
     * @param conversion share lost at the specification limit, between 0 and 1
     * @param seconds shortest time, s
     * @param law rate law of the loss, irreversible
     * @param barrier barrier of the loss; empty when the fitted reaction is the loss
     * @param course the course of temperature after which no more may be lost; empty for a constant one
     */
    record Hold(
            String id,
            String title,
            String statement,
            double conversion,
            double seconds,
            RateLaw law,
            Optional<StatedBarrier> barrier,
            Optional<Course> course)
            implements Limit {
        @Override
        public String kind() {
            return "hold";
        }

        @Override
        public boolean needsBarrier() {
            return barrier.isEmpty();
        }

        @Override
        public Optional<StatedBarrier> stated() {
            return barrier;
        }
    }

    /**
     * A wall of the equipment.
     *
     * @param lowerKelvin coldest, K; empty for none
     * @param upperKelvin hottest, K; empty for none
     * @param lowerTitle name of the cold wall
     * @param upperTitle name of the hot wall
     */
    record Equipment(
            String id,
            String title,
            String statement,
            OptionalDouble lowerKelvin,
            OptionalDouble upperKelvin,
            String lowerTitle,
            String upperTitle)
            implements Limit {
        @Override
        public String kind() {
            return "equipment";
        }

        /** No wall at all. */
        static Equipment none() {
            return new Equipment("equipment", "equipment", "", OptionalDouble.empty(), OptionalDouble.empty(), "", "");
        }

        boolean holds(double kelvin) {
            return kelvin >= lowerKelvin.orElse(0) && kelvin <= upperKelvin.orElse(Double.POSITIVE_INFINITY);
        }
    }
}
