package org.wardon.cli;

import java.util.Optional;
import org.jspecify.annotations.Nullable;
import org.wardon.produce.Ripeness;
import picocli.CommandLine.Option;

/** What can be seen of a lot: how ripe, cured or not, which variant. */
final class LooksWords {
    @Option(
            names = "--ripeness",
            paramLabel = "STATE",
            description = "green, turning or ripe (default: unknown).")
    private Ripeness ripeness = Ripeness.UNKNOWN;

    @Option(
            names = "--cured",
            paramLabel = "yes|no",
            description = "Whether bulbs or roots were cured (default: unknown).")
    private @Nullable YesNo cured;

    @Option(
            names = "--variant",
            paramLabel = "NAME",
            description = "A variant that 'look' shows, such as hass of avocado.")
    private @Nullable String variant;

    Ripeness ripeness() {
        return ripeness;
    }

    Optional<Boolean> cured() {
        return Optional.ofNullable(cured).map(answer -> answer == YesNo.YES);
    }

    Optional<String> variant() {
        return Optional.ofNullable(variant);
    }
}
