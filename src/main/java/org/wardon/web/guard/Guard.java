package org.wardon.web.guard;

import io.javalin.http.Context;
import io.javalin.http.Cookie;
import io.javalin.http.HandlerType;
import io.javalin.http.SameSite;
import java.time.Clock;
import java.util.Optional;
import java.util.Set;
import java.util.function.IntSupplier;
import org.jspecify.annotations.Nullable;

/** Stands before every route: no handler is reached by a request that has not passed here. */
public final class Guard {
    /** Field of a form that carries the token. */
    public static final String TOKEN_FIELD = "token";

    /** Header that carries it where a script asks. */
    public static final String TOKEN_HEADER = "X-Wardon-Token";

    /** Where the passcode is asked for. */
    public static final String ENTRANCE = "/enter";

    /** Below it lies what never changes and tells nothing. */
    public static final String STATIC = "/static/";

    /** Below it programs ask. */
    public static final String API = "/api/";

    /** Where a program gives the passcode. */
    public static final String API_ENTRANCE = API + "enter";

    private static final String BEARER = "Bearer ";

    private static final String SESSION = "wardon.session";
    private static final Set<HandlerType> METHODS =
            Set.of(HandlerType.GET, HandlerType.HEAD, HandlerType.POST);
    private static final Set<HandlerType> READING = Set.of(HandlerType.GET, HandlerType.HEAD);
    private static final Set<HandlerType> METHODS_OF_API =
            Set.of(
                    HandlerType.GET,
                    HandlerType.HEAD,
                    HandlerType.POST,
                    HandlerType.PUT,
                    HandlerType.DELETE);

    private final Sessions sessions;
    private final Sessions programs;
    private final Hosts hosts;
    private final Optional<Passcode> passcode;
    private final IntSupplier port;
    private final ApiSecret secret;

    /**
     * Sets up the guard.
     *
     * @param address the address listened on
     * @param port the port listened on, asked when a request comes
     * @param passcode what must be known; absent where the machine's own people are trusted
     * @param secret what programs carry
     * @param clock tells how long a session has been silent
     */
    public Guard(
            String address,
            IntSupplier port,
            Optional<Passcode> passcode,
            ApiSecret secret,
            Clock clock) {
        this.sessions = new Sessions(clock);
        this.programs = new Sessions(clock);
        this.secret = secret;
        this.hosts = new Hosts(address, port);
        this.passcode = passcode;
        this.port = port;
    }

    /**
     * Lets a request pass or refuses it.
     *
     * @param http the request
     * @throws Refusal where it may not pass
     */
    public void check(Context http) {
        SafeHeaders.on(http);
        String host = Optional.ofNullable(http.header("Host")).orElse("");
        if (!hosts.known(host)) {
            throw new Refusal(421, "host");
        }
        boolean api = http.path().startsWith(API);
        if (!(api ? METHODS_OF_API : METHODS).contains(http.method())) {
            throw new Refusal(405, "method");
        }
        boolean foreign = isForeign(http);
        checkOrigin(http, host, foreign);
        if (foreign) {
            // The browser keeps our cookie back here: a new one would take the place of the
            // session there is, and the forms that are open would be worth nothing.
            http.header("Refresh", "0; url=http://" + host + asked(http));
            throw new Refusal(200, "foreign-link");
        }
        if (http.path().startsWith(STATIC) || (api && isProgram(http))) {
            return;
        }
        Session session = session(http);
        http.attribute(SESSION, session);
        boolean entrance = http.path().equals(ENTRANCE);
        if (!session.admitted() && api) {
            throw new Refusal(401, "bearer-needed");
        }
        if (!session.admitted() && !entrance) {
            throw new Refusal(401, "passcode");
        }
        if (changes(http) && !Secret.same(session.token(), token(http))) {
            throw new Refusal(403, "token");
        }
    }

    private static boolean changes(Context http) {
        return !READING.contains(http.method());
    }

    /**
     * A request that says who it is by a header is judged by that alone: no foreign page can send
     * one, so it needs no token. One that asks for the entrance need not say who it is.
     */
    private boolean isProgram(Context http) {
        @Nullable String given = http.header("Authorization");
        if (given == null) {
            return http.path().equals(API_ENTRANCE) && changes(http);
        }
        String bearer =
                given.regionMatches(true, 0, BEARER, 0, BEARER.length())
                        ? given.substring(BEARER.length()).strip()
                        : "";
        if (!secret.is(bearer) && programs.find(bearer).isEmpty()) {
            throw new Refusal(401, "bearer");
        }
        return true;
    }

    /**
     * Lets a program in that knows the passcode.
     *
     * @param http the request
     * @param given the passcode given
     * @return what it is to carry from now on, absent where the passcode is wrong
     * @throws Refusal after too many wrong tries, or where none is asked for
     */
    public Optional<String> enterProgram(Context http, String given) {
        Passcode code = passcode.orElseThrow(() -> new Refusal(409, "no-passcode"));
        return code.opens(given, http.ip())
                ? Optional.of(programs.start(true).id())
                : Optional.empty();
    }

    /** Whether another site made the browser ask. */
    private static boolean isForeign(Context http) {
        String site = Optional.ofNullable(http.header("Sec-Fetch-Site")).orElse("none");
        return !site.equals("none") && !site.equals("same-origin");
    }

    /** Path and query as they were sent. */
    private static String asked(Context http) {
        String query = http.queryString();
        return http.req().getRequestURI() + (query == null ? "" : "?" + query);
    }

    /** Foreign pages may lead here by a link, and nothing more. */
    private static void checkOrigin(Context http, String host, boolean foreign) {
        boolean link =
                HandlerType.GET.equals(http.method())
                        && "navigate".equals(http.header("Sec-Fetch-Mode"))
                        && "document".equals(http.header("Sec-Fetch-Dest"));
        if (foreign && !link) {
            throw new Refusal(403, "origin");
        }
        @Nullable String origin = http.header("Origin");
        if (origin != null && !origin.equalsIgnoreCase("http://" + host)) {
            throw new Refusal(403, "origin");
        }
    }

    private Session session(Context http) {
        Optional<Session> known =
                Optional.ofNullable(http.cookie(cookieName())).flatMap(sessions::find);
        if (known.isPresent()) {
            return known.get();
        }
        if (changes(http) && http.path().startsWith(API)) {
            throw new Refusal(401, "bearer-needed");
        }
        if (changes(http)) {
            throw new Refusal(403, "too-old");
        }
        return started(http, passcode.isEmpty());
    }

    private Session started(Context http, boolean admitted) {
        Session session = sessions.start(admitted);
        setCookie(http, cookieName(), session.id(), -1);
        return session;
    }

    /** Cookies know no ports, and two stores may be open on one machine. */
    private String cookieName() {
        return "wardon-session-" + port.getAsInt();
    }

    private static String token(Context http) {
        Uploads.checkSize(http);
        @Nullable String header = http.header(TOKEN_HEADER);
        if (header != null) {
            return header;
        }
        return Optional.ofNullable(Uploads.read(() -> http.formParam(TOKEN_FIELD))).orElse("");
    }

    /**
     * Sets a cookie no script reads and no foreign page sends.
     *
     * @param http the request
     * @param name its name
     * @param value its value
     * @param seconds how long it lasts; -1 until the browser is closed
     */
    public static void setCookie(Context http, String name, String value, int seconds) {
        Cookie cookie = new Cookie(name, value);
        cookie.setPath("/");
        cookie.setMaxAge(seconds);
        cookie.setHttpOnly(true);
        cookie.setSameSite(SameSite.STRICT);
        http.cookie(cookie);
    }

    /**
     * Returns the session of a request that has passed.
     *
     * @param http the request
     * @return its session, absent for static files and where it was refused before
     */
    public static Optional<Session> sessionOf(Context http) {
        return Optional.ofNullable(http.attribute(SESSION));
    }

    /**
     * Returns whether a passcode is asked for.
     *
     * @return true if so
     */
    public boolean asksPasscode() {
        return passcode.isPresent();
    }

    /**
     * Lets a person in who knows the passcode. They get a new session, so that one planted before
     * is worth nothing.
     *
     * @param http the request
     * @param given what was typed
     * @return whether they are in
     * @throws Refusal after too many wrong tries
     */
    public boolean enter(Context http, String given) {
        if (passcode.isEmpty() || !passcode.get().opens(given, http.ip())) {
            return passcode.isEmpty();
        }
        sessionOf(http).ifPresent(sessions::end);
        started(http, true);
        return true;
    }

    /**
     * Ends the session of a request.
     *
     * @param http the request
     */
    public void leave(Context http) {
        sessionOf(http).ifPresent(sessions::end);
        setCookie(http, cookieName(), "", 0);
    }
}
