package org.wardon.web;

import io.javalin.Javalin;
import io.javalin.compression.CompressionStrategy;
import io.javalin.config.JavalinConfig;
import io.javalin.config.SizeUnit;
import java.nio.file.Path;
import java.util.Optional;
import java.util.Set;
import java.util.TreeSet;
import java.util.concurrent.atomic.AtomicInteger;
import org.eclipse.jetty.server.HttpConfiguration;
import org.eclipse.jetty.util.thread.QueuedThreadPool;
import org.wardon.errors.BadInput;
import org.wardon.logbook.KeptPlan;
import org.wardon.web.guard.ApiSecret;
import org.wardon.web.guard.Guard;
import org.wardon.web.guard.Uploads;
import org.wardon.web.pages.PageWords;
import org.wardon.web.pages.Press;
import org.wardon.web.work.Imports;
import org.wardon.web.work.Workbench;

/** The server of the pages. */
public final class WebServer implements AutoCloseable {
    private static final int MOST_THREADS = 48;
    private static final int SILENT_MOST_MS = 30_000;

    /** Whoever sends slower than any line would hold a thread for nothing. */
    private static final int SLOWEST_BYTES_PER_S = 200;

    private static final int HEADERS_MOST_BYTES = 8_192;

    private final WebOptions options;
    private final Workbench bench;
    private final Javalin javalin;
    private final AtomicInteger port = new AtomicInteger();
    private final ApiSecret secret;

    private WebServer(WebOptions options) {
        this.options = options;
        bench = new Workbench(options.home(), options.clock());
        secret = new ApiSecret(options.home());
        Guard guard =
                new Guard(
                        options.address(), port::get, options.passcode(), secret, options.clock());
        Press press = new Press(guard.asksPasscode());
        javalin =
                Javalin.create(
                        config -> {
                            settings(config);
                            new Routes(config.routes, bench, press, guard).add();
                        });
    }

    private void settings(JavalinConfig config) {
        config.startup.showJavalinBanner = false;
        config.startup.showOldJavalinVersionWarning = false;
        config.jsonMapper(new JsonOut());
        config.http.maxRequestSize = Uploads.LARGEST_REQUEST;
        config.http.compressionStrategy = CompressionStrategy.NONE;
        config.http.prefer405over404 = true;
        config.jetty.multipartConfig.maxTotalRequestSize(Uploads.LARGEST_REQUEST, SizeUnit.BYTES);
        config.jetty.multipartConfig.maxFileSize(Uploads.LARGEST_FILE + 1L, SizeUnit.BYTES);
        config.jetty.threadPool = new QueuedThreadPool(MOST_THREADS, 4, SILENT_MOST_MS);
        config.jetty.modifyHttpConfiguration(WebServer::limits);
    }

    /** Jetty is to give up the limit of slowness; a test tells when it no longer works. */
    @SuppressWarnings("removal")
    private static void limits(HttpConfiguration http) {
        http.setRequestHeaderSize(HEADERS_MOST_BYTES);
        http.setSendServerVersion(false);
        http.setSendDateHeader(false);
        http.setIdleTimeout(SILENT_MOST_MS);
        http.setMinRequestDataRate(SLOWEST_BYTES_PER_S);
    }

    /**
     * Starts serving.
     *
     * @param options how
     * @return the server, listening
     * @throws BadInput where address or port cannot be had
     */
    public static WebServer start(WebOptions options) {
        WebServer server = new WebServer(options);
        try {
            server.javalin.start(options.address(), options.port());
            server.port.set(server.javalin.port());
            server.secret.settle();
            return server;
        } catch (RuntimeException e) {
            server.close();
            throw new BadInput(
                    "open",
                    "",
                    "nothing can listen on "
                            + options.address()
                            + " port "
                            + options.port()
                            + ", another program does perhaps",
                    "give another with --port, or 0 for any free one");
        }
    }

    /**
     * Keeps the plan of a file, to be shown first.
     *
     * @param file the plan
     * @return path of its page
     * @throws BadInput where the file cannot be read
     */
    public String bring(Path file) {
        KeptPlan kept =
                new Imports(bench)
                        .fromFile(
                                file,
                                PageWords.english()
                                        .say("note.brought", String.valueOf(file.getFileName())));
        return "/plan/" + kept.id();
    }

    /**
     * Returns where the pages are.
     *
     * @return such as {@code http://127.0.0.1:8480}
     */
    public String url() {
        String host = options.address();
        boolean everywhere = host.equals("0.0.0.0") || host.equals("::");
        String shown = everywhere ? "127.0.0.1" : host.contains(":") ? "[" + host + "]" : host;
        return "http://" + shown + ":" + port.get();
    }

    /**
     * Returns where programs find what they have to carry.
     *
     * @return the file; absent where none could be kept
     */
    public Optional<Path> secretFile() {
        return secret.file();
    }

    /** Every route below a path, such as {@code GET /api/plans}. */
    Set<String> routesBelow(String path) {
        Set<String> routes = new TreeSet<>();
        javalin.unsafe.internalRouter.allHttpHandlers().stream()
                .map(one -> one.endpoint)
                .filter(one -> one.method.isHttpMethod() && one.path.startsWith(path))
                .forEach(one -> routes.add(one.method.name() + " " + one.path));
        return routes;
    }

    @Override
    public void close() {
        javalin.stop();
        bench.close();
    }
}
