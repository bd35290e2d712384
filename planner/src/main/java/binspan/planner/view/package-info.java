/**
 * The window: controls, canvases and dialogs, bound to the view models of {@code binspan.planner.viewmodel}. Nothing is
 * computed here but places on the screen.
 */
package binspan.planner.view;
