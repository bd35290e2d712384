package binspan.planner.cli;

import java.io.ByteArrayInputStream;
import java.io.ByteArrayOutputStream;
import java.io.InputStream;
import java.io.OutputStream;
import java.io.PrintStream;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Map;

/**
 * One run of the program with its streams captured.
 *
 * @param status exit status
 * @param out standard output
 * @param err standard error
 */
public record Run(int status, String out, String err) {
    /** Runs a command line with an empty standard input. */
    public static Run of(String... args) {
        return reading(new byte[0], args);
    }

    /** Runs a command line with a standard input. */
    static Run reading(byte[] in, String... args) {
        return with(new ByteArrayInputStream(in), Map.of(), args);
    }

    /** Runs a command line with a standard input and environment variables. */
    static Run with(InputStream in, Map<String, String> environment, String... args) {
        ByteArrayOutputStream out = new ByteArrayOutputStream();
        ByteArrayOutputStream err = new ByteArrayOutputStream();
        int status = Program.run(args, Console.of(in, new OutputSink(out), printer(err), environment));
        return new Run(status, out.toString(StandardCharsets.UTF_8), err.toString(StandardCharsets.UTF_8));
    }

    /** Runs a command line whose standard output goes elsewhere; {@code out} stays empty. */
    static Run writing(OutputStream out, String... args) {
        ByteArrayOutputStream err = new ByteArrayOutputStream();
        InputStream in = new ByteArrayInputStream(new byte[0]);
        int status = Program.run(args, Console.of(in, new OutputSink(out), printer(err), Map.of()));
        return new Run(status, "", err.toString(StandardCharsets.UTF_8));
    }

    private static PrintStream printer(OutputStream stream) {
        return new PrintStream(stream, true, StandardCharsets.UTF_8);
    }

    public List<String> errLines() {
        return err.lines().toList();
    }
}
