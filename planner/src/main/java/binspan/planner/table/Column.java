package binspan.planner.table;

import java.util.function.IntFunction;

/**
 * A column of a study's own beside parameters and figures of merit.
 *
 * @param name its name
 * @param cells what stands in each row: a number, a flag, a text, or null where it does not apply
 */
public record Column(String name, IntFunction<Object> cells) {}
