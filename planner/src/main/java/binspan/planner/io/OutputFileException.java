package binspan.planner.io;

/** A file that is not written, with the reason. */
public final class OutputFileException extends Exception {
    private static final long serialVersionUID = 1L;

    /**
     * Makes one.
     *
     * @param message the file's name and what is wrong with it; made printable
     */
    public OutputFileException(String message) {
        super(Printable.line(message));
    }
}
