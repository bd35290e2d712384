package binspan.study.tolerance;

import binspan.prediction.Requirement;

/**
 * The share of builds that meet one requirement.
 *
 * @param requirement which
 * @param required required figure, in the requirement's unit
 * @param share share of builds that meet it
 */
public record RequirementShare(Requirement requirement, double required, BuildShare share) {}
