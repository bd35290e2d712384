package binspan.planner.export;

import binspan.planner.io.OutputFileException;
import binspan.planner.io.WholeFile;
import binspan.planner.plot.PictureFile;
import binspan.planner.table.TableCsv;
import binspan.planner.table.TableJson;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.OutputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;

/** What a study leaves behind: its table as CSV or JSON, its picture; files are written whole or not at all. */
public final class StudyFiles {
    private StudyFiles() {}

    /**
     * Writes the table as CSV.
     *
     * @param report what the study has to show
     * @param file name of the file
     * @param replace whether an existing file may be replaced
     * @throws OutputFileException if the file exists and may not be replaced, or cannot be written
     */
    public static void csv(StudyReport report, String file, boolean replace) throws OutputFileException {
        WholeFile.write(file, out -> csv(report, out), replace);
    }

    /**
     * Writes the table as CSV to a stream.
     *
     * @param report what the study has to show
     * @param out where to, buffered; left open
     */
    public static void csv(StudyReport report, OutputStream out) throws IOException {
        TableCsv.write(report.table(), out);
    }

    /**
     * Writes description and table as JSON.
     *
     * @param report what the study has to show
     * @param file name of the file
     * @param replace whether an existing file may be replaced
     * @throws OutputFileException if the file exists and may not be replaced, or cannot be written
     */
    public static void json(StudyReport report, String file, boolean replace) throws OutputFileException {
        WholeFile.write(file, out -> json(report, out), replace);
    }

    /**
     * Writes description and table as JSON to a stream.
     *
     * @param report what the study has to show
     * @param out where to, buffered; left open
     */
    public static void json(StudyReport report, OutputStream out) throws IOException {
        TableJson.write(report.description(), report.table(), out);
    }

    /**
     * Draws the picture.
     *
     * @param report what the study has to show, with a picture
     * @param file name that ends in .png or .svg
     * @param replace whether an existing file may be replaced
     * @throws OutputFileException if the name ends otherwise, if the file exists and may not be replaced or cannot be written, or if no font is installed
     * @throws java.util.NoSuchElementException if the study has no picture
     */
    public static void picture(StudyReport report, String file, boolean replace) throws OutputFileException {
        PictureFile.of(file).write(report.picture().orElseThrow().get(), replace);
    }

    /** The table as the text of a CSV file, for a clipboard; a table that is computed when it is written is computed here. */
    public static String csvText(StudyReport report) {
        return text(out -> csv(report, out));
    }

    /** Description and table as the text of a JSON file. */
    public static String jsonText(StudyReport report) {
        return text(out -> json(report, out));
    }

    private static String text(WholeFile.Contents contents) {
        ByteArrayOutputStream bytes = new ByteArrayOutputStream();
        try {
            contents.to(bytes);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
        return bytes.toString(StandardCharsets.UTF_8);
    }
}
