package binspan.scenario;

import java.util.OptionalDouble;

/**
 * A classical channel in the same fibre.
 *
 * @param launchDbm launched power, dBm
 * @param wavelengthNm vacuum wavelength, nm
 * @param attenuationDbPerKm attenuation at that wavelength, dB/km; otherwise that of the fibre class
 * @param direction with or against the photons
 * @param ramanCoefficientPerKmNm spontaneous Raman cross-section into the photon's band, 1/(km nm)
 */
public record ClassicalChannel(
        double launchDbm,
        double wavelengthNm,
        OptionalDouble attenuationDbPerKm,
        Direction direction,
        double ramanCoefficientPerKmNm) {}
