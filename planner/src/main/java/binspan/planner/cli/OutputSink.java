package binspan.planner.cli;

import java.io.IOException;
import java.io.OutputStream;
import java.util.Locale;

/** Standard output that remembers why it failed, which a print stream forgets. */
final class OutputSink extends OutputStream {
    private final OutputStream out;
    private IOException failure;

    OutputSink(OutputStream out) {
        this.out = out;
    }

    @Override
    public void write(int b) throws IOException {
        write(new byte[] {(byte) b}, 0, 1);
    }

    @Override
    public void write(byte[] bytes, int offset, int length) throws IOException {
        try {
            out.write(bytes, offset, length);
        } catch (IOException e) {
            failure = e;
            throw e;
        }
    }

    @Override
    public void flush() throws IOException {
        out.flush();
    }

    boolean failed() {
        return failure != null;
    }

    /** Whether it failed because the reader has closed the pipe; systems word that differently. */
    boolean abandoned() {
        return failure != null
                && failure.getMessage() != null
                && failure.getMessage().toLowerCase(Locale.ROOT).contains("pipe");
    }
}
