package org.wardon.cli;

import java.io.IOException;
import java.net.InetAddress;
import java.net.UnknownHostException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Clock;
import java.time.ZoneId;
import java.util.Map;
import java.util.Optional;
import java.util.concurrent.Callable;
import java.util.concurrent.CountDownLatch;
import org.jspecify.annotations.Nullable;
import org.wardon.errors.BadInput;
import org.wardon.web.WebOptions;
import org.wardon.web.WebServer;
import org.wardon.web.guard.Passcode;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;

/** Serves the pages on this machine. */
@Command(
        name = "open",
        mixinStandardHelpOptions = true,
        description = {
            "Serves the pages of your stores on this machine and prints their address; open it in"
                    + " a browser. Nothing leaves the machine. Ctrl-C ends it."
        })
final class Open implements Callable<Integer> {
    private static final String PASSCODE = "WARDON_PASSCODE";

    @Mixin private Shared shared = new Shared();

    @Parameters(
            arity = "0..1",
            paramLabel = "PLAN",
            description = "Store plan to keep and show first.")
    private @Nullable Path plan;

    @Option(
            names = "--port",
            paramLabel = "N",
            defaultValue = "8480",
            description = "Port to listen on (${DEFAULT-VALUE}); 0 for any free one.")
    private int port;

    @Option(
            names = "--address",
            paramLabel = "A",
            defaultValue = "127.0.0.1",
            description = {
                "Address to listen on (${DEFAULT-VALUE}). Any but this machine's own asks for a"
                        + " passcode."
            })
    private String address = "127.0.0.1";

    @Option(
            names = "--passcode-file",
            paramLabel = "FILE",
            description = {
                "File with the passcode people must type, at least eight characters. It may also"
                        + " stand in WARDON_PASSCODE."
            })
    private @Nullable Path passcodeFile;

    @Option(
            names = "--no-browser",
            description =
                    "Accepted for scripts; no browser is ever opened, the address is printed.")
    private boolean noBrowser;

    @Override
    public Integer call() throws InterruptedException {
        if (port < 0 || port > 65_535) {
            throw new BadInput("--port", "", "is " + port, "accepted: 0 to 65535");
        }
        Clock clock = Clock.system(ZoneId.systemDefault());
        Optional<Passcode> passcode = passcode(System.getenv(), clock);
        if (passcode.isEmpty() && !isOwn(address)) {
            throw new BadInput(
                    "--address",
                    "",
                    "is " + address + ", which other machines can reach",
                    "give a passcode with --passcode-file or " + PASSCODE);
        }
        WebOptions options = new WebOptions(address, port, passcode, shared.folder(), clock);
        try (WebServer server = WebServer.start(options)) {
            String path = plan == null ? "/" : server.bring(plan);
            Terminal terminal = Terminal.ofProcess();
            terminal.out().println(server.url() + path);
            if (!noBrowser) {
                terminal.err().println("Open this address in a browser; Ctrl-C ends the program.");
                server.secretFile()
                        .ifPresent(
                                file ->
                                        terminal.err()
                                                .println(
                                                        "Programs ask at "
                                                                + server.url()
                                                                + "/api with the secret in "
                                                                + file
                                                                + "."));
            }
            waitForTheEnd(server);
        }
        return Exit.OK;
    }

    private Optional<Passcode> passcode(Map<String, String> environment, Clock clock) {
        if (passcodeFile != null) {
            String shown = passcodeFile.toString();
            try {
                return Optional.of(new Passcode(Files.readString(passcodeFile), shown, clock));
            } catch (IOException e) {
                throw new BadInput(
                        shown, "", "the passcode cannot be read", "accepted: a file you may read");
            }
        }
        return Optional.ofNullable(environment.get(PASSCODE))
                .filter(code -> !code.isBlank())
                .map(code -> new Passcode(code, PASSCODE, clock));
    }

    private static boolean isOwn(String address) {
        try {
            return InetAddress.getByName(address).isLoopbackAddress();
        } catch (UnknownHostException e) {
            throw new BadInput(
                    "--address",
                    "",
                    "is '" + address + "', no address of this machine",
                    "accepted: such as 127.0.0.1 or 0.0.0.0");
        }
    }

    /** Serves until the process is told to end, then stops in order. */
    private static void waitForTheEnd(WebServer server) throws InterruptedException {
        CountDownLatch end = new CountDownLatch(1);
        Runtime.getRuntime().addShutdownHook(new Thread(server::close, "stop"));
        end.await();
    }
}
