package binspan.planner.io;

/**
 * Something wrong in a file.
 *
 * @param place where
 * @param path scenario path of the value, empty for the whole file
 * @param message what was found and what is allowed
 */
record Finding(Place place, String path, String message) {

    /** The finding as one line of output. */
    String line(String file) {
        String at = path.isEmpty() ? "" : path + ": ";
        return Printable.line(file + ":" + place + ": " + at + message);
    }

    /** The finding in parts. */
    FileError error() {
        return new FileError(place.line(), place.column(), path, Printable.line(message));
    }
}
