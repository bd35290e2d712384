/**
 * The prediction of a link and the verdict on it: all stages in order, requirements with margins, headroom before the first requirement fails,
 * cautions, and the registry of result fields by their published names.
 */
package binspan.prediction;
