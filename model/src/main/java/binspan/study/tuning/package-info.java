/** Best settings of a link under its requirements, and how far it reaches as written and re-tuned. */
package binspan.study.tuning;
