package binspan.optics;

/**
 * One arm from inside the source's passband to behind its analyzer's excess loss.
 *
 * @param lossDb all losses together, the splitting not counted, dB
 * @param fibreLossDb loss of the fibre spans with their connectors and splices, dB
 * @param fibreDispersionPsPerNm dispersion of the fibre alone, ps/nm
 * @param dispersionPsPerNm dispersion with compensators, ps/nm
 * @param groupDelayDispersion beta = -lambda^2/(2 pi c) D L, s^2
 * @param pmdRms rms delay spread by polarization mode dispersion, s
 * @param thermalDelay delay change at the full temperature step, s
 * @param transmittance power transmittance of {@code lossDb}
 * @param strayPhotonsPerSecond light of classical channels (Raman and leakage) behind the excess loss, before the analyzer's splitting, 1/s
 */
public record OpticalPath(
        double lossDb,
        double fibreLossDb,
        double fibreDispersionPsPerNm,
        double dispersionPsPerNm,
        double groupDelayDispersion,
        double pmdRms,
        double thermalDelay,
        double transmittance,
        double strayPhotonsPerSecond) {}
