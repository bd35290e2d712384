package binspan.planner.document;

import java.io.IOException;
import java.nio.file.FileSystems;
import java.nio.file.Files;
import java.nio.file.InvalidPathException;
import java.nio.file.Path;
import java.nio.file.attribute.PosixFilePermissions;
import java.util.Locale;
import java.util.Map;

/** Where the systems want a program to keep what it remembers of a user (XDG Base Directory Specification; memory for the others). */
final class UserDirectories {
    private static final String PROGRAM = "binspan";

    private final String system;
    private final Map<String, String> environment;
    private final Path home;

    /** The directories of a user on a system. */
    UserDirectories(String system, Map<String, String> environment, Path home) {
        this.system = system.toLowerCase(Locale.ROOT);
        this.environment = environment;
        this.home = home;
    }

    /** Those of the present user. */
    static UserDirectories present() {
        return new UserDirectories(
                System.getProperty("os.name", ""), System.getenv(), Path.of(System.getProperty("user.home", ".")));
    }

    /** Settings. */
    Path settings() {
        return base("XDG_CONFIG_HOME", ".config").resolve(PROGRAM);
    }

    /** What is not to be lost, yet worth nothing on another machine. */
    Path state() {
        return base("XDG_STATE_HOME", ".local/state").resolve(PROGRAM);
    }

    private Path base(String variable, String usual) {
        if (system.startsWith("mac")) {
            return home.resolve("Library").resolve("Application Support");
        }
        return system.startsWith("windows")
                ? stated("LOCALAPPDATA", home.resolve("AppData").resolve("Local"))
                : stated(variable, home.resolve(usual));
    }

    /** A directory out of the environment; one that is not absolute does not count. */
    private Path stated(String variable, Path otherwise) {
        try {
            Path stated = Path.of(environment.getOrDefault(variable, ""));
            return stated.isAbsolute() ? stated : otherwise;
        } catch (InvalidPathException e) {
            return otherwise;
        }
    }

    /** Makes a directory that only its user may read, where the system knows such. */
    static void make(Path directory) throws IOException {
        if (Files.isDirectory(directory)) {
            return;
        }
        if (FileSystems.getDefault().supportedFileAttributeViews().contains("posix")) {
            Files.createDirectories(
                    directory, PosixFilePermissions.asFileAttribute(PosixFilePermissions.fromString("rwx------")));
        } else {
            Files.createDirectories(directory);
        }
    }
}
