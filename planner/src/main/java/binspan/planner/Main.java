package binspan.planner;

/** Entry point of the command line. */
public final class Main {

    private Main() {}

    /**
     * Prints the version.
     *
     * @param args command line words, ignored
     */
    public static void main(String[] args) {
        String version = Main.class.getPackage().getImplementationVersion();
        System.out.println("binspan " + (version == null ? "(unpackaged)" : version));
    }
}
