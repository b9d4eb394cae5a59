package org.wardon.web;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.net.Socket;
import java.net.URI;
import java.nio.charset.StandardCharsets;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * Sends exactly what it is told, so that nothing polite stands between an attack and the server.
 */
final class RawHttp {
    private static final int PATIENCE_MS = 120_000;
    private static final Pattern COOKIE =
            Pattern.compile("(?i)set-cookie: (wardon-session-\\d+=[^;]*)");
    private static final Pattern TOKEN = Pattern.compile("name=\"token\" value=\"([^\"]+)\"");

    private final String host;
    private final int port;

    RawHttp(String url) {
        URI uri = URI.create(url);
        host = uri.getHost();
        port = uri.getPort();
    }

    String host() {
        return host + ":" + port;
    }

    /** An answer as it came. */
    record Answer(int status, String head, String body) {
        String header(String name) {
            return head.lines()
                    .filter(line -> line.regionMatches(true, 0, name + ":", 0, name.length() + 1))
                    .map(line -> line.substring(name.length() + 1).strip())
                    .findFirst()
                    .orElse("");
        }

        Optional<String> cookie() {
            Matcher cookie = COOKIE.matcher(head);
            return cookie.find() ? Optional.of(cookie.group(1)) : Optional.empty();
        }

        String token() {
            Matcher token = TOKEN.matcher(body);
            return token.find() ? token.group(1) : "";
        }
    }

    /** A browser that has been let in: its cookie and the token of its forms. */
    record Visitor(String cookie, String token) {}

    Visitor visitor(String page) {
        Answer answer = get(page);
        return new Visitor(answer.cookie().orElseThrow(), answer.token());
    }

    Answer get(String path, String... headers) {
        return send("GET", path, "", headers);
    }

    Answer post(Visitor visitor, String path, String form, String... headers) {
        String[] all = new String[headers.length + 2];
        all[0] = "Cookie: " + visitor.cookie();
        all[1] = "Content-Type: application/x-www-form-urlencoded";
        System.arraycopy(headers, 0, all, 2, headers.length);
        return send("POST", path, form, all);
    }

    Answer send(String method, String path, String body, String... headers) {
        StringBuilder request = new StringBuilder(method + " " + path + " HTTP/1.1\r\n");
        boolean ownHost = false;
        for (String header : headers) {
            ownHost |= header.startsWith("Host:");
            request.append(header).append("\r\n");
        }
        if (!ownHost) {
            request.append("Host: ").append(host()).append("\r\n");
        }
        if (!body.isEmpty()) {
            int length = body.getBytes(StandardCharsets.UTF_8).length;
            request.append("Content-Length: ").append(length).append("\r\n");
        }
        return exactly(request.append("Connection: close\r\n\r\n").append(body).toString());
    }

    /** A request that is sent byte by byte, its answer unread. */
    record Slow(Socket socket) implements AutoCloseable {
        /** Sends one more byte; where the server has hung up nothing is sent. */
        void another() {
            try {
                socket.getOutputStream().write('a');
            } catch (IOException e) {
                // Hung up: what a server does to those who are too slow.
            }
        }

        @Override
        public void close() {
            try {
                socket.close();
            } catch (IOException e) {
                throw new UncheckedIOException(e);
            }
        }
    }

    Slow slow(String begun) {
        try {
            Socket socket = new Socket(host, port);
            socket.getOutputStream().write(begun.getBytes(StandardCharsets.UTF_8));
            return new Slow(socket);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    Answer exactly(String request) {
        try (Socket socket = new Socket(host, port)) {
            socket.setSoTimeout(PATIENCE_MS);
            socket.getOutputStream().write(request.getBytes(StandardCharsets.UTF_8));
            socket.getOutputStream().flush();
            String answer =
                    new String(socket.getInputStream().readAllBytes(), StandardCharsets.UTF_8);
            int gap = answer.indexOf("\r\n\r\n");
            return new Answer(
                    Integer.parseInt(answer.substring(9, 12)),
                    answer.substring(0, gap),
                    answer.substring(gap + 4));
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }
}
