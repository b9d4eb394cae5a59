package org.wardon.cli;

import java.util.Optional;
import picocli.CommandLine.IVersionProvider;

/** Says which version this is. */
final class Version implements IVersionProvider {
    @Override
    public String[] getVersion() {
        String version =
                Optional.ofNullable(Version.class.getPackage().getImplementationVersion())
                        .orElse("built from source");
        return new String[] {"Wardon " + version};
    }
}
