package binspan.planner.document;

import binspan.planner.io.OutputFileException;
import java.nio.file.Files;
import java.nio.file.InvalidPathException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;

/** The files that were opened or saved last, the newest first, one a line of a text file. */
public final class RecentFiles {
    private static final String NAME = "recent-files.txt";
    private static final int MOST = 10;

    private final Path list;

    /**
     * A file of the list.
     *
     * @param file absolute path
     * @param missing whether it is not there at present
     */
    public record Entry(Path file, boolean missing) {}

    /**
     * The list of a directory.
     *
     * @param directory where it is kept; made when first needed
     */
    public RecentFiles(Path directory) {
        list = directory.resolve(NAME);
    }

    /** The usual directory of the user. */
    public static Path defaultDirectory() {
        return UserDirectories.present().settings();
    }

    /** At most ten files; none if the list is missing or damaged. */
    public List<Entry> entries() {
        return files().stream()
                .map(file -> new Entry(file, !Files.isRegularFile(file)))
                .toList();
    }

    /**
     * Puts a file in front. One whose name does not fit a line is left out.
     *
     * @throws OutputFileException if the list cannot be written
     */
    public void add(Path file) throws OutputFileException {
        List<Path> files = new ArrayList<>(files());
        Path absolute = file.toAbsolutePath().normalize();
        files.remove(absolute);
        if (absolute.toString().lines().count() == 1) {
            files.add(0, absolute);
        }
        write(files.subList(0, Math.min(MOST, files.size())));
    }

    /**
     * Takes a file out.
     *
     * @throws OutputFileException if the list cannot be written
     */
    public void remove(Path file) throws OutputFileException {
        List<Path> files = new ArrayList<>(files());
        if (files.remove(file.toAbsolutePath().normalize())) {
            write(files);
        }
    }

    private void write(List<Path> files) throws OutputFileException {
        StringBuilder text = new StringBuilder();
        files.forEach(file -> text.append(file).append('\n'));
        RememberedFile.write(list, text.toString());
    }

    private List<Path> files() {
        List<Path> files = new ArrayList<>();
        try {
            for (String line : RememberedFile.read(list).lines().limit(MOST).toList()) {
                Path file = Path.of(line);
                if (!file.isAbsolute()) {
                    return List.of();
                }
                files.add(file);
            }
        } catch (InvalidPathException e) {
            return List.of();
        }
        return files;
    }
}
