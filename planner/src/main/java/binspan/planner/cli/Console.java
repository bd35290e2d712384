package binspan.planner.cli;

import java.io.BufferedOutputStream;
import java.io.FileDescriptor;
import java.io.FileOutputStream;
import java.io.IOException;
import java.io.InputStream;
import java.io.PrintStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Map;

/** Where a command reads and writes. Text is UTF-8. */
public final class Console {
    private static final String DEBUG = "BINSPAN_DEBUG";

    private final InputStream in;
    private final OutputSink sink;
    private final PrintStream out;
    private final PrintStream err;
    private final boolean terminal;
    private final Map<String, String> environment;

    private Console(
            InputStream in, OutputSink sink, PrintStream err, boolean terminal, Map<String, String> environment) {
        this.in = in;
        this.sink = sink;
        this.out = new PrintStream(new BufferedOutputStream(sink), false, StandardCharsets.UTF_8);
        this.err = err;
        this.terminal = terminal;
        this.environment = environment;
    }

    /** The streams of the process. */
    public static Console ofSystem() {
        return new Console(
                System.in,
                new OutputSink(new FileOutputStream(FileDescriptor.out)),
                new PrintStream(new FileOutputStream(FileDescriptor.err), true, StandardCharsets.UTF_8),
                isTerminal(),
                System.getenv());
    }

    /** Java 22 to 24 have a console even where there is no terminal, unless told otherwise. */
    @SuppressWarnings("SystemConsoleNull")
    private static boolean isTerminal() {
        System.setProperty("jdk.console", "java.base");
        return System.console() != null;
    }

    /**
     * Other streams, no terminal.
     *
     * @param in standard input
     * @param out standard output
     * @param err standard error
     * @param environment environment variables
     */
    static Console of(InputStream in, OutputSink out, PrintStream err, Map<String, String> environment) {
        return new Console(in, out, err, false, environment);
    }

    /** Whether a terminal shows colours: it has a name other than "dumb", and nobody asked for none. */
    static boolean wantsColour(Map<String, String> environment) {
        return capable(environment) && environment.getOrDefault("NO_COLOR", "").isEmpty();
    }

    private static boolean capable(Map<String, String> environment) {
        return !environment.getOrDefault("TERM", "dumb").equals("dumb");
    }

    /** Whether standard error is the terminal too, where the system tells. */
    private static boolean errorsOnTerminal() {
        try {
            String device = Files.readSymbolicLink(Path.of("/proc/self/fd/2")).toString();
            return device.startsWith("/dev/pts/") || device.startsWith("/dev/tty") || device.equals("/dev/console");
        } catch (IOException | UnsupportedOperationException e) {
            return true;
        }
    }

    InputStream in() {
        return in;
    }

    PrintStream out() {
        return out;
    }

    PrintStream err() {
        return err;
    }

    boolean colour() {
        return terminal && wantsColour(environment);
    }

    /** Whether a line on standard error may be drawn over and over: a person looks on, nothing goes to a pipe or file. */
    boolean showsProgress() {
        return terminal && capable(environment) && errorsOnTerminal();
    }

    /** Environment variables. */
    Map<String, String> environment() {
        return environment;
    }

    /** Whether an own failure prints where it happened. */
    boolean debug() {
        return !environment.getOrDefault(DEBUG, "").isEmpty();
    }

    /** Whether the reader of the output has gone. */
    boolean abandoned() {
        return sink.abandoned();
    }

    /**
     * Writes out what is pending. A reader that has gone is no failure: {@code binspan ... | head -1}.
     *
     * @return whether all output was written, or nobody wanted it
     */
    boolean finish() {
        out.flush();
        return !sink.failed() || sink.abandoned();
    }
}
