package binspan.planner.plot;

import java.util.Arrays;
import java.util.Locale;
import java.util.Optional;
import java.util.stream.Collectors;

/** What a picture can be written as, by the ending of its file. */
enum PictureFormat {
    PNG,
    SVG;

    private String ending() {
        return "." + name().toLowerCase(Locale.ROOT);
    }

    /** The format of a file, by its ending in small or capital letters. */
    static Optional<PictureFormat> of(String file) {
        String name = file.toLowerCase(Locale.ROOT);
        return Arrays.stream(values())
                .filter(format -> name.endsWith(format.ending()))
                .findFirst();
    }

    /** The endings in words. */
    static String allowed() {
        return Arrays.stream(values()).map(PictureFormat::ending).collect(Collectors.joining(" or "));
    }
}
