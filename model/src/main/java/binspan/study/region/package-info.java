/** Operating regions of two parameters: contours, border, area. */
package binspan.study.region;
