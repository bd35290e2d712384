package binspan.optics;

import binspan.scenario.Analyzer;
import binspan.units.Decibels;

/**
 * Power shares of an analyzer's short and long path into its two output ports, excess loss not counted.
 *
 * <p>With i the input splitter's short share, o the output splitter's short-to-port-1 share and e the long path's extra transmittance:
 * s1 = i o, s2 = i (1-o), l1 = (1-i)(1-o) e, l2 = (1-i) o e.
 *
 * @param short1 short path to port 1
 * @param short2 short path to port 2
 * @param long1 long path to port 1
 * @param long2 long path to port 2
 */
public record AnalyzerPaths(double short1, double short2, double long1, double long2) {
    /** The shares of an analyzer. */
    public static AnalyzerPaths of(Analyzer analyzer) {
        double i = analyzer.inputShortFraction();
        double o = analyzer.outputShortToPort1();
        double e = Decibels.transmittance(analyzer.longPathExtraLossDb());
        return new AnalyzerPaths(i * o, i * (1.0 - o), (1.0 - i) * (1.0 - o) * e, (1.0 - i) * o * e);
    }

    /** Share of the short path into a port, 0 for port 1 and 1 for port 2. */
    public double shortTo(int port) {
        return port == 0 ? short1 : short2;
    }

    /** Share of the long path into a port. */
    public double longTo(int port) {
        return port == 0 ? long1 : long2;
    }

    /** Share of all light into a port. */
    public double into(int port) {
        return shortTo(port) + longTo(port);
    }
}
