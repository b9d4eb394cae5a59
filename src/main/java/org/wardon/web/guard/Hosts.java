package org.wardon.web.guard;

import java.net.InetAddress;
import java.net.UnknownHostException;
import java.util.HashSet;
import java.util.Locale;
import java.util.Set;
import java.util.function.IntSupplier;
import java.util.regex.Pattern;

/**
 * The names under which this server may be asked. A foreign page can make its own name point here;
 * what it cannot do is send another name than its own, so names that are not ours are refused.
 */
final class Hosts {
    private static final Pattern IP_LITERAL =
            Pattern.compile("\\d{1,3}(\\.\\d{1,3}){3}|\\[[0-9a-f:.]+]");

    private final Set<String> names = new HashSet<>(Set.of("localhost", "127.0.0.1", "[::1]"));
    private final boolean everyAddress;
    private final IntSupplier port;

    /**
     * Lists the names.
     *
     * @param address the address listened on
     * @param port the port listened on, known once listening
     */
    Hosts(String address, IntSupplier port) {
        String bound = address.toLowerCase(Locale.ROOT);
        names.add(bound.contains(":") && !bound.startsWith("[") ? "[" + bound + "]" : bound);
        everyAddress = bound.equals("0.0.0.0") || bound.equals("::") || bound.equals("[::]");
        if (everyAddress) {
            try {
                names.add(InetAddress.getLocalHost().getHostName().toLowerCase(Locale.ROOT));
            } catch (UnknownHostException e) {
                // A machine without a name is asked by its address.
            }
        }
        this.port = port;
    }

    boolean known(String host) {
        String given = host.toLowerCase(Locale.ROOT);
        String ending = ":" + port.getAsInt();
        String name;
        if (given.endsWith(ending)) {
            name = given.substring(0, given.length() - ending.length());
        } else if (port.getAsInt() == 80 && !given.matches(".*:\\d+$")) {
            name = given;
        } else {
            return false;
        }
        return names.contains(name) || (everyAddress && IP_LITERAL.matcher(name).matches());
    }
}
