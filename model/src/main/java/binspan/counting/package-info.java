/**
 * From light to counts: detector load and dead time, click statistics of threshold detectors, coincidences of port pairs in their windows. Rates in
 * 1/s, probabilities per cycle and window.
 */
package binspan.counting;
