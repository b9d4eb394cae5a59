package org.wardon.web.guard;

import java.time.Clock;
import java.time.Duration;
import java.time.Instant;
import java.util.ArrayDeque;
import java.util.Deque;
import java.util.LinkedHashMap;
import java.util.Map;
import org.wardon.errors.BadInput;

/** What everybody must know who comes from another machine; wrong tries are limited. */
public final class Passcode {
    /** Fewest characters. */
    public static final int SHORTEST = 8;

    private static final int TRIES_OF_ONE = 5;
    private static final int TRIES_OF_ALL = 40;
    private static final int MOST_REMEMBERED = 1_000;
    private static final Duration WITHIN = Duration.ofMinutes(5);

    private final String code;
    private final Clock clock;
    private final Map<String, Deque<Instant>> wrong = new LinkedHashMap<>();
    private final Deque<Instant> allWrong = new ArrayDeque<>();

    /**
     * Takes a passcode.
     *
     * @param code at least {@link #SHORTEST} characters; white space around it does not count
     * @param whence where it was given, for messages
     * @param clock tells when somebody tried
     * @throws BadInput where it is too short
     */
    public Passcode(String code, String whence, Clock clock) {
        this.code = code.strip();
        this.clock = clock;
        if (this.code.length() < SHORTEST) {
            throw new BadInput(
                    whence,
                    "",
                    "the passcode has " + this.code.length() + " characters",
                    "accepted: at least " + SHORTEST + ", on one line");
        }
    }

    /**
     * Tries a passcode.
     *
     * @param given what was typed
     * @param from the address it came from
     * @return whether it is right
     * @throws Refusal after too many wrong tries; then the right one is refused too, for a while
     */
    synchronized boolean opens(String given, String from) {
        Instant since = clock.instant().minus(WITHIN);
        Deque<Instant> ofOne = wrong.computeIfAbsent(from, any -> new ArrayDeque<>());
        forget(ofOne, since);
        forget(allWrong, since);
        if (ofOne.size() >= TRIES_OF_ONE || allWrong.size() >= TRIES_OF_ALL) {
            throw new Refusal(429, "too-many-tries", String.valueOf(WITHIN.toMinutes()));
        }
        if (Secret.same(code, given.strip())) {
            wrong.remove(from);
            return true;
        }
        ofOne.add(clock.instant());
        allWrong.add(clock.instant());
        if (wrong.size() > MOST_REMEMBERED) {
            wrong.remove(wrong.keySet().iterator().next());
        }
        return false;
    }

    private static void forget(Deque<Instant> tries, Instant since) {
        while (!tries.isEmpty() && tries.getFirst().isBefore(since)) {
            tries.removeFirst();
        }
    }
}
