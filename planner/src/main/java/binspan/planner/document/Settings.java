package binspan.planner.document;

import binspan.planner.io.OutputFileException;
import java.io.IOException;
import java.io.StringReader;
import java.io.StringWriter;
import java.nio.file.InvalidPathException;
import java.nio.file.Path;
import java.util.Collections;
import java.util.Map;
import java.util.Optional;
import java.util.Properties;
import java.util.TreeMap;
import java.util.stream.Collectors;

/** What a window remembers: a few settings in a properties file. What is missing or damaged there is as usual, what is unknown is kept. */
public final class Settings {
    private static final String NAME = "settings.properties";
    private static final String THEME = "theme";
    private static final String SCALE = "scalePercent";
    private static final String WIDTH = "windowWidth";
    private static final String HEIGHT = "windowHeight";
    private static final String DIRECTORY = "lastDirectory";
    private static final int USUAL_SCALE = 100;
    private static final int USUAL_WIDTH = 1280;
    private static final int USUAL_HEIGHT = 800;
    private static final int SMALLEST = 50;
    private static final int LARGEST_SCALE = 400;
    private static final int LARGEST_WINDOW = 20_000;

    private final Map<String, String> values;

    private Settings(Map<String, String> values) {
        this.values = Collections.unmodifiableMap(values);
    }

    /** The usual directory of the user. */
    public static Path defaultDirectory() {
        return UserDirectories.present().settings();
    }

    /**
     * Reads the settings of a directory; all as usual if there are none.
     *
     * @param directory where they are kept
     */
    public static Settings read(Path directory) {
        Properties properties = new Properties();
        try {
            properties.load(new StringReader(RememberedFile.read(directory.resolve(NAME))));
        } catch (IOException | IllegalArgumentException e) {
            properties.clear();
        }
        Map<String, String> values = new TreeMap<>();
        properties.stringPropertyNames().forEach(name -> values.put(name, properties.getProperty(name)));
        return new Settings(values);
    }

    /**
     * Writes them.
     *
     * @param directory where they are kept; made if it is missing
     * @throws OutputFileException if they cannot be written
     */
    public void write(Path directory) throws OutputFileException {
        StringWriter text = new StringWriter();
        Properties properties = new Properties();
        properties.putAll(values);
        try {
            properties.store(text, null);
        } catch (IOException e) {
            throw new IllegalStateException("a text in memory cannot fail", e);
        }
        String sorted = text.toString()
                .lines()
                .filter(line -> !line.startsWith("#"))
                .sorted()
                .map(line -> line + "\n")
                .collect(Collectors.joining());
        RememberedFile.write(directory.resolve(NAME), sorted);
    }

    /** {@code light}, {@code dark} or {@code system}. */
    public String theme() {
        String theme = values.getOrDefault(THEME, "");
        return theme.equals("light") || theme.equals("dark") ? theme : "system";
    }

    /** Size of text and controls, percent of the usual. */
    public int scalePercent() {
        return number(SCALE, USUAL_SCALE, LARGEST_SCALE);
    }

    /** Width of the window, pixels. */
    public int windowWidth() {
        return number(WIDTH, USUAL_WIDTH, LARGEST_WINDOW);
    }

    /** Height of the window, pixels. */
    public int windowHeight() {
        return number(HEIGHT, USUAL_HEIGHT, LARGEST_WINDOW);
    }

    /** Directory of the file opened or saved last. */
    public Optional<Path> lastDirectory() {
        try {
            return Optional.ofNullable(values.get(DIRECTORY))
                    .filter(path -> !path.isBlank())
                    .map(Path::of);
        } catch (InvalidPathException e) {
            return Optional.empty();
        }
    }

    /** The same with another theme. */
    public Settings withTheme(String theme) {
        return with(THEME, theme);
    }

    /** The same with another size of text and controls, percent. */
    public Settings withScalePercent(int percent) {
        return with(SCALE, Integer.toString(percent));
    }

    /** The same with another size of the window, pixels. */
    public Settings withWindow(int width, int height) {
        return with(WIDTH, Integer.toString(width)).with(HEIGHT, Integer.toString(height));
    }

    /** The same with another directory. */
    public Settings withLastDirectory(Path directory) {
        return with(DIRECTORY, directory.toAbsolutePath().toString());
    }

    private Settings with(String name, String value) {
        Map<String, String> changed = new TreeMap<>(values);
        changed.put(name, value);
        return new Settings(changed);
    }

    private int number(String name, int usual, int largest) {
        try {
            int number = Integer.parseInt(values.getOrDefault(name, "").strip());
            return number >= SMALLEST && number <= largest ? number : usual;
        } catch (NumberFormatException e) {
            return usual;
        }
    }
}
