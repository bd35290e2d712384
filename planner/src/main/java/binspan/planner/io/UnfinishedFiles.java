package binspan.planner.io;

import java.io.BufferedOutputStream;
import java.io.IOException;
import java.io.OutputStream;
import java.nio.file.CopyOption;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.HashSet;
import java.util.Set;

/** The temporary files that are being written; a program that is stopped (Ctrl-C) takes them with it. */
final class UnfinishedFiles {
    /** The program is being stopped: nothing is begun or finished any more. */
    static final class StoppedException extends IOException {
        private static final long serialVersionUID = 1L;
    }

    private static final Set<Path> PARTS = new HashSet<>();
    private static boolean watched;
    private static boolean stopped;

    private UnfinishedFiles() {}

    /** Begins a file. */
    static synchronized OutputStream begin(Path part) throws IOException {
        watch();
        OutputStream out = Files.newOutputStream(part);
        PARTS.add(part);
        return new BufferedOutputStream(out, 1 << 16);
    }

    /** Gives a file its name once all of it is written. */
    static synchronized void finish(Path part, Path file, CopyOption... options) throws IOException {
        if (stopped) {
            throw new StoppedException();
        }
        Files.move(part, file, options);
    }

    /** Removes what is left of a file, if anything. */
    static synchronized void end(Path part) throws IOException {
        PARTS.remove(part);
        Files.deleteIfExists(part);
    }

    private static void watch() throws IOException {
        if (stopped) {
            throw new StoppedException();
        }
        if (!watched) {
            Runtime.getRuntime().addShutdownHook(new Thread(UnfinishedFiles::stop, "unfinished files"));
            watched = true;
        }
    }

    private static synchronized void stop() {
        stopped = true;
        for (Path part : PARTS) {
            part.toFile().delete();
        }
    }
}
