/**
 * Constants, scales and argument checks that every other package builds on. Quantities inside the model are in SI
 * units; names that end in a trade unit ({@code lengthKm}, {@code windowWidthPs}) hold that unit and are converted
 * once, with {@link binspan.units.Scale}.
 */
package binspan.units;
