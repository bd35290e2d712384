package binspan.units;

/** Conversions between attenuation in decibels and power transmittance. */
public final class Decibels {
    /** Attenuation of 1 dB as a natural exponent, ln(10)/10. */
    public static final double NEPERS_PER_DB = Math.log(10.0) / 10.0;

    private Decibels() {}

    /**
     * Power transmittance of an attenuation.
     *
     * @param lossDb attenuation in dB, any sign
     * @return 10^(-lossDb/10)
     */
    public static double transmittance(double lossDb) {
        return Math.exp(-lossDb * NEPERS_PER_DB);
    }

    /**
     * Optical power of a level.
     *
     * @param levelDbm level in dBm (dB against 1 mW)
     * @return power in watts
     */
    public static double watts(double levelDbm) {
        return Scale.MILLI * Math.exp(levelDbm * NEPERS_PER_DB);
    }
}
