package binspan.planner.cli;

import binspan.planner.report.Version;
import picocli.CommandLine.IVersionProvider;

/** The line of {@code --version}. */
final class VersionLine implements IVersionProvider {
    @Override
    public String[] getVersion() {
        return new String[] {"binspan " + Version.text()};
    }
}
