package binspan.study.comparison;

import binspan.scenario.Arm;
import binspan.scenario.Edits;
import binspan.scenario.FibreClass;
import binspan.scenario.FibreSpan;
import binspan.scenario.Scenario;
import binspan.study.tuning.SourcePosition;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * A candidate route for a link: what differs from the scenario that serves as template.
 *
 * @param name name of the route
 * @param alice alice's arm
 * @param bob bob's arm
 */
public record Route(String name, ArmRoute alice, ArmRoute bob) {
    /**
     * One arm of a route; what is absent stays as in the template.
     *
     * @param lengthKm length of the arm's fibre, km
     * @param measuredLossDb measured loss of the arm's fibre with its connectors and splices, dB
     * @param fibre fibre class of all its spans
     */
    public record ArmRoute(OptionalDouble lengthKm, OptionalDouble measuredLossDb, Optional<FibreClass> fibre) {
        /** Nothing differs. */
        public static final ArmRoute AS_TEMPLATE =
                new ArmRoute(OptionalDouble.empty(), OptionalDouble.empty(), Optional.empty());
    }

    /**
     * The template along this route: spans scaled to the length, a measured loss shared among them by length, another fibre class with its own attenuation
     * and dispersion.
     *
     * @throws IllegalArgumentException if the template's arm has no fibre
     */
    public Scenario through(Scenario template) {
        return Edits.withArms(template, along(template.alice(), "alice", alice), along(template.bob(), "bob", bob));
    }

    private static Arm along(Arm template, String name, ArmRoute route) {
        double present = SourcePosition.fibreKm(template);
        double length = route.lengthKm().orElse(present);
        Arm arm = SourcePosition.scaled(template, name, present, length);
        if (route.fibre().isPresent()) {
            FibreClass fibre = route.fibre().get();
            arm = Edits.path(arm, element -> LinkOptions.of(element, fibre));
        }
        if (route.measuredLossDb().isEmpty()) {
            return arm;
        }
        if (!(present > 0.0)) {
            throw new IllegalArgumentException(name + ": has no fibre to carry a measured loss");
        }
        double loss = route.measuredLossDb().getAsDouble();
        double spans = arm.path().stream().filter(FibreSpan.class::isInstance).count();
        return Edits.path(
                arm,
                element -> element instanceof FibreSpan span
                        ? measured(span, length > 0.0 ? loss * span.lengthKm() / length : loss / spans)
                        : element);
    }

    private static FibreSpan measured(FibreSpan span, double lossDb) {
        return new FibreSpan(
                span.label(),
                span.fibre(),
                span.lengthKm(),
                span.attenuationDbPerKm(),
                span.dispersionPsPerNmKm(),
                span.pmdPsPerSqrtKm(),
                OptionalDouble.of(lossDb),
                span.connectors(),
                span.connectorLossDb(),
                span.splices(),
                span.spliceLossDb(),
                span.delayPsPerKmK(),
                span.classicalChannels());
    }
}
