package binspan.scenario;

import java.util.OptionalDouble;

/**
 * Gating of an avalanche detector, one gate per slot.
 *
 * @param rateMHz gates per second, MHz; absent: one for every slot
 * @param widthNs sensitive width of a gate, ns
 * @param darkProbability dark click probability per gate
 */
public record Gate(OptionalDouble rateMHz, double widthNs, double darkProbability) {}
