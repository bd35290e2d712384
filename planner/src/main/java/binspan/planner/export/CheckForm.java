package binspan.planner.export;

import binspan.planner.io.OutputFileException;
import binspan.planner.io.WholeFile;
import binspan.planner.report.ResultJson;
import binspan.planner.report.TextStyle;
import binspan.planner.report.Verdict;
import binspan.planner.report.WorksheetText;
import binspan.prediction.LinkCheck;

/** What can be told of a checked link. */
public enum CheckForm {
    /** Whether it meets its requirements, and why. */
    VERDICT,
    /** Every result with its name, for programs. */
    JSON,
    /** The calculation line by line. */
    WORKSHEET;

    private static final TextStyle IN_FILES = new TextStyle(false, true);

    /**
     * The text of a check. JSON has no line end and no style, the others end with a line break.
     *
     * @param check what was found
     * @param style colour and characters
     */
    public String text(LinkCheck check, TextStyle style) {
        return switch (this) {
            case JSON -> ResultJson.text(check);
            case WORKSHEET -> WorksheetText.text(check, style);
            case VERDICT -> Verdict.text(check, style);
        };
    }

    /**
     * The text of a check as a file or a clipboard holds it: any character, no colour, a line break at the end.
     *
     * @param check what was found
     */
    public String plain(LinkCheck check) {
        return text(check, IN_FILES) + (this == JSON ? "\n" : "");
    }

    /**
     * Writes the plain text of a check to a file, whole or not at all.
     *
     * @param check what was found
     * @param file its name
     * @param replace whether an existing file may be replaced
     * @throws OutputFileException if the file exists and may not be replaced, or cannot be written
     */
    public void write(LinkCheck check, String file, boolean replace) throws OutputFileException {
        WholeFile.write(file, plain(check), replace);
    }
}
