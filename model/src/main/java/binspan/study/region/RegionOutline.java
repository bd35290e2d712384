package binspan.study.region;

import binspan.study.window.PointVerdict;
import java.util.List;

/**
 * What the map says of the whole region.
 *
 * @param border its border
 * @param parts number of parts
 * @param area area in the unit of the first axis times that of the second
 * @param share area as a share of the map in the axes' own scales
 * @param best point with the largest least margin
 */
record RegionOutline(List<MapLine> border, int parts, double area, double share, PointVerdict best) {}
