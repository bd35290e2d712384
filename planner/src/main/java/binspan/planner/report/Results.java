package binspan.planner.report;

import binspan.prediction.LinkCheck;
import binspan.prediction.ResultField;
import binspan.prediction.ResultFields;

/** Figures of a check by their published names. */
final class Results {
    private final LinkCheck check;

    Results(LinkCheck check) {
        this.check = check;
    }

    /** The figure of a name, NaN or infinite where it does not apply. */
    double at(String name) {
        return at(name, 0);
    }

    /** The figure of a name at a port, 0 for port 1. */
    double at(String name, int port) {
        for (ResultField field : ResultFields.ALL) {
            if (field.name().equals(name)) {
                return field.of(check, port);
            }
        }
        throw new IllegalArgumentException("no result " + name);
    }

    /** Whether a figure applies. */
    boolean has(String name) {
        return Double.isFinite(at(name));
    }
}
