package binspan.planner.cli;

import binspan.planner.export.StudyFiles;
import binspan.planner.export.StudyReport;
import binspan.planner.io.OutputFileException;
import binspan.planner.io.Printable;
import binspan.planner.io.WholeFile;
import binspan.planner.plot.PictureFile;
import binspan.planner.report.TextStyle;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.InvalidPathException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import picocli.CommandLine.Option;

/**
 * Where a study's results go. A command calls {@link #check} before it computes and {@link #deliver} once it has; a summary is printed unless data go to
 * standard output.
 */
final class StudyOutput {
    private static final String STANDARD_OUTPUT = "-";
    private static final String CSV = "--csv";
    private static final String JSON = "--json";
    private static final String PLOT = "--plot";

    @Option(names = CSV, paramLabel = "FILE", description = "Write the table as CSV, - for standard output.")
    private String csv;

    @Option(names = JSON, paramLabel = "FILE", description = "Write the table as JSON, - for standard output.")
    private String json;

    @Option(names = PLOT, paramLabel = "FILE", description = "Draw the picture: FILE.png or FILE.svg.")
    private String plot;

    @Option(names = "--force", description = "Replace existing files.")
    private boolean force;

    /**
     * Refuses outputs that cannot be written, before any work is done.
     *
     * @param inputs files that the study reads, which no output replaces
     * @throws UsageException if the options contradict each other
     * @throws OutputFileException if a file exists and may not be replaced, or could not be written
     */
    void check(String... inputs) throws UsageException, OutputFileException {
        if (STANDARD_OUTPUT.equals(csv) && STANDARD_OUTPUT.equals(json)) {
            throw UsageException.of(CSV + " - " + JSON + " -: found standard output twice; allowed for one of them");
        }
        if (plot != null) {
            PictureFile.of(plot);
        }
        Set<Path> taken = new HashSet<>();
        for (String input : inputs) {
            taken.add(place(input));
        }
        for (String file : files()) {
            WholeFile.check(file, force);
            if (!taken.add(place(file))) {
                throw UsageException.of(file + ": found twice on the command line; allowed a file for each output");
            }
        }
    }

    /** Refuses a picture of a study that cannot be drawn, with the reason. */
    void refusePicture(String reason) throws UsageException {
        if (plot != null) {
            throw UsageException.of(PLOT + " " + plot + ": " + reason);
        }
    }

    /** The files to be written. */
    private List<String> files() {
        List<String> files = new ArrayList<>();
        for (String file : new String[] {csv, json, plot}) {
            if (file != null && !file.equals(STANDARD_OUTPUT)) {
                files.add(file);
            }
        }
        return files;
    }

    private static Path place(String file) throws UsageException {
        try {
            return Path.of(file).toAbsolutePath().normalize();
        } catch (InvalidPathException e) {
            throw UsageException.of(file + ": not a file name on this system");
        }
    }

    /** Whether a summary is printed: unless data go to standard output. */
    boolean summarised() {
        return !STANDARD_OUTPUT.equals(csv) && !STANDARD_OUTPUT.equals(json);
    }

    /**
     * Writes everything that was asked for: files first, then what goes to standard output.
     *
     * @throws OutputFileException if a file cannot be written; nothing of it is left
     */
    void deliver(StudyReport report, Console console) throws OutputFileException {
        put(csv, out -> StudyFiles.csv(report, out), console);
        put(json, out -> StudyFiles.json(report, out), console);
        if (plot != null && report.picture().isPresent()) {
            StudyFiles.picture(report, plot, force);
        }
        if (summarised()) {
            console.out().print(report.summary().apply(TextStyle.ofStandardOutput(console.colour())));
            console.out().print(closing(report));
        }
    }

    private void put(String file, WholeFile.Contents contents, Console console) throws OutputFileException {
        if (STANDARD_OUTPUT.equals(file)) {
            try {
                contents.to(console.out());
            } catch (IOException e) {
                throw new UncheckedIOException(e);
            }
        } else if (file != null) {
            WholeFile.write(file, contents, force);
        }
    }

    /** What was written, or how to have it written. */
    private String closing(StudyReport report) {
        List<String> files = files();
        if (!files.isEmpty()) {
            return "\n" + Paragraph.of(Printable.line("Written: " + String.join(", ", files)), 0);
        }
        String drawn = report.picture().isPresent() ? "; " + PLOT + " FILE.png or FILE.svg draws it" : "";
        return "\n" + Paragraph.of(CSV + " FILE or " + JSON + " FILE writes the table" + drawn + ".", 0);
    }
}
