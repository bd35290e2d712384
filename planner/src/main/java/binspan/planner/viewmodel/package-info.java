/**
 * State and logic of the window without anything that is drawn: view models, which know properties and lists but no
 * controls.
 *
 * <p>{@link binspan.planner.viewmodel.Design} is the link that is being designed; every other model follows it, lets the
 * model library compute in the {@link binspan.planner.viewmodel.Background} and offers what its part of the window
 * shows. All of them are tested without a window.
 */
package binspan.planner.viewmodel;
