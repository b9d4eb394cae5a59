package org.wardon.web.guard;

import java.security.SecureRandom;
import java.time.Clock;
import java.time.Duration;
import java.time.Instant;
import java.util.Comparator;
import java.util.Map;
import java.util.Optional;
import java.util.concurrent.ConcurrentHashMap;

/** The sessions of this run; they live in memory only and end with it. */
public final class Sessions {
    /** A session ends after being silent so long. */
    public static final Duration SILENT_MOST = Duration.ofHours(12);

    private static final int MOST = 2_000;

    private final Map<String, Session> sessions = new ConcurrentHashMap<>();
    private final SecureRandom random = new SecureRandom();
    private final Clock clock;

    Sessions(Clock clock) {
        this.clock = clock;
    }

    Session start(boolean admitted) {
        if (sessions.size() >= MOST) {
            makeRoom();
        }
        Session session =
                new Session(Secret.fresh(random), Secret.fresh(random), admitted, clock.instant());
        sessions.put(session.id(), session);
        return session;
    }

    Optional<Session> find(String id) {
        Session session = sessions.get(id);
        if (session == null) {
            return Optional.empty();
        }
        Instant now = clock.instant();
        if (session.seen().plus(SILENT_MOST).isBefore(now)) {
            sessions.remove(id);
            return Optional.empty();
        }
        session.seenAt(now);
        return Optional.of(session);
    }

    void end(Session session) {
        sessions.remove(session.id());
    }

    /** Whoever asks without keeping a cookie must not fill the memory. */
    private synchronized void makeRoom() {
        Instant last = clock.instant().minus(SILENT_MOST);
        sessions.values().removeIf(session -> session.seen().isBefore(last));
        while (sessions.size() >= MOST) {
            sessions.values().stream()
                    .min(Comparator.comparing(Session::admitted).thenComparing(Session::seen))
                    .ifPresent(this::end);
        }
    }
}
