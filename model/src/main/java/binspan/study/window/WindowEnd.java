package binspan.study.window;

import binspan.prediction.Requirement;
import java.util.Optional;

/**
 * One end of an interval.
 *
 * @param value value of the parameter, still inside
 * @param requirement the requirement that fails just beyond; empty where the range of the study ends
 */
public record WindowEnd(double value, Optional<Requirement> requirement) {}
