/**
 * Pictures of studies: what is to be seen is described by plain records, JFreeChart draws it, and a
 * {@link binspan.planner.plot.PictureFile} holds it as PNG or SVG.
 *
 * <p>A {@link binspan.planner.plot.Picture} has a title, a subtitle and a {@link binspan.planner.plot.Panel}; a
 * {@link binspan.planner.plot.PanelGroup} puts several panels into one picture. No panel knows what a study is. Numbers
 * come in the units that the axes name. Whatever a colour says, a pattern, a dash or a word says as well.
 *
 * <p>Inside, both kinds of axis are linear: a logarithmic one runs over decimal logarithms, called positions, and only
 * its tick labels know. So one kind of tick, image and contour serves both, colour bars included.
 */
package binspan.planner.plot;
