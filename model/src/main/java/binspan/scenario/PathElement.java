package binspan.scenario;

import java.util.Optional;

/** One element of the path from the source to the analyzer. */
public sealed interface PathElement permits FibreSpan, LossElement, FilterElement, Compensator {
    /** Unique name by which the element is addressed, if it has one. */
    Optional<String> label();
}
