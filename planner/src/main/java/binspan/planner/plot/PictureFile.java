package binspan.planner.plot;

import binspan.planner.io.OutputFileException;
import binspan.planner.io.WholeFile;

/**
 * A file that will hold a picture. Its name is checked at once, so that nobody waits for a study whose picture cannot be
 * written.
 */
public final class PictureFile {
    private static final String HEADLESS = "java.awt.headless";

    private final String file;
    private final PictureFormat format;

    private PictureFile(String file, PictureFormat format) {
        this.file = file;
        this.format = format;
    }

    /**
     * A file by its name.
     *
     * @param file name that ends in .png or .svg
     * @throws OutputFileException if it ends otherwise
     */
    public static PictureFile of(String file) throws OutputFileException {
        PictureFormat format = PictureFormat.of(file)
                .orElseThrow(() -> new OutputFileException(
                        file + ": not the ending of a picture; allowed " + PictureFormat.allowed()));
        return new PictureFile(file, format);
    }

    /**
     * Draws a picture, without a display, and writes it whole or not at all.
     *
     * @param picture what to draw
     * @param replace whether an existing file may be replaced
     * @throws OutputFileException if the file exists and may not be replaced, cannot be written, or if no font is
     *     installed
     */
    public void write(Picture picture, boolean replace) throws OutputFileException {
        byte[] bytes = bytes(picture);
        WholeFile.write(file, out -> out.write(bytes), replace);
    }

    private byte[] bytes(Picture picture) throws OutputFileException {
        if (System.getProperty(HEADLESS) == null) {
            System.setProperty(HEADLESS, "true");
        }
        try {
            PanelChart chart = picture.chart();
            return format == PictureFormat.PNG ? PngImage.of(chart) : SvgText.of(picture, chart);
        } catch (Error | RuntimeException e) {
            if (MissingFonts.isCause(e)) {
                throw new OutputFileException(file + ": not drawn, no fonts found; " + MissingFonts.REMEDY);
            }
            throw e;
        }
    }
}
