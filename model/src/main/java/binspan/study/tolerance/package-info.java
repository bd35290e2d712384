/** How surely a link with spread parameters meets its requirements, and what drives failures. */
package binspan.study.tolerance;
