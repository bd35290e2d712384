package binspan.planner.report;

/** Version of the program. */
public final class Version {
    private Version() {}

    /** The version of the packaged program, "(unpackaged)" when it runs from compiled classes. */
    public static String text() {
        String version = Version.class.getPackage().getImplementationVersion();
        return version == null ? "(unpackaged)" : version;
    }
}
