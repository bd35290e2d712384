/** Pictures of studies: what each study draws, described for the plot package. */
package binspan.planner.picture;
