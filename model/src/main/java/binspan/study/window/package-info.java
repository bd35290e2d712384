/** Operating windows of one parameter: every interval in which all requirements hold, its ends solved. */
package binspan.study.window;
