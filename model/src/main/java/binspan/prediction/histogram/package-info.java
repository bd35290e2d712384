/**
 * Histograms of arrival times that a predicted link would show on a time tagger: clicks of each side, coincidences of the pair. Made of one prediction and
 * nothing else, by the captures of optics and the loads of counting, so that the bins of a window sum to what was counted in it.
 */
package binspan.prediction.histogram;
