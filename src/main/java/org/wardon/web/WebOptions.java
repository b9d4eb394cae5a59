package org.wardon.web;

import java.nio.file.Path;
import java.time.Clock;
import java.util.Optional;
import org.wardon.web.guard.Passcode;

/**
 * How the pages are served.
 *
 * @param address address to listen on
 * @param port port to listen on; 0 for any free one
 * @param passcode what people from other machines must know
 * @param home folder of the keeper's own file
 * @param clock the clock of sessions, saves and today
 */
public record WebOptions(
        String address, int port, Optional<Passcode> passcode, Path home, Clock clock) {}
