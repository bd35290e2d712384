package binspan.scenario;

import binspan.units.OpticalFrequency;
import binspan.units.Scale;
import java.util.OptionalDouble;

/**
 * Filter band of one photon at the source; its centre is given in exactly one of three ways.
 *
 * @param wavelengthNm centre as vacuum wavelength, nm
 * @param frequencyTHz centre as frequency, THz
 * @param channel centre as customary channel number, 190 THz + number/10 THz
 * @param bandwidthFwhmGHz full width at half maximum, GHz
 * @param passband shape of the passband
 * @param uncorrelatedPhotonsPerCycle pulsed: photons in the passband that never had a partner, per cycle
 * @param uncorrelatedPhotonsPerSecond continuous: the same as a rate, 1/s
 */
public record Band(
        OptionalDouble wavelengthNm,
        OptionalDouble frequencyTHz,
        OptionalDouble channel,
        double bandwidthFwhmGHz,
        PassbandShape passband,
        double uncorrelatedPhotonsPerCycle,
        double uncorrelatedPhotonsPerSecond) {

    /** Centre frequency in Hz. */
    public double centreHz() {
        if (wavelengthNm.isPresent()) {
            return OpticalFrequency.ofWavelengthNm(wavelengthNm.getAsDouble());
        }
        return frequencyTHz.isPresent()
                ? frequencyTHz.getAsDouble() * Scale.TERA
                : OpticalFrequency.ofChannel(channel.orElseThrow());
    }

    /** Centre as vacuum wavelength in nm. */
    public double centreNm() {
        return wavelengthNm.isPresent() ? wavelengthNm.getAsDouble() : OpticalFrequency.toWavelengthNm(centreHz());
    }
}
