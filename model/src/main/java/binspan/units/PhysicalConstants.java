package binspan.units;

/** Exact constants of the International System of Units (BIPM, SI Brochure, 9th edition, 2019). */
public final class PhysicalConstants {
    /** Speed of light in vacuum, m/s. */
    public static final double SPEED_OF_LIGHT = 299_792_458.0;

    /** Planck constant, J s. */
    public static final double PLANCK = 6.626_070_15e-34;

    private PhysicalConstants() {}
}
