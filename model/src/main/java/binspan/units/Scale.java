package binspan.units;

/** The one place that owns powers of ten: multiply a number in a trade unit by its scale to obtain SI. */
public final class Scale {
    public static final double PICO = 1e-12;
    public static final double NANO = 1e-9;
    public static final double MILLI = 1e-3;
    public static final double KILO = 1e3;
    public static final double MEGA = 1e6;
    public static final double GIGA = 1e9;
    public static final double TERA = 1e12;

    /** Seconds in an hour. */
    public static final double HOUR = 3600.0;

    private Scale() {}
}
