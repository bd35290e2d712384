/** Links side by side: other detectors, fibres, elements; many candidate routes. */
package binspan.study.comparison;
