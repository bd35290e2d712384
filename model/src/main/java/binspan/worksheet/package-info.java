/**
 * The calculation as an engineer would check it by hand: every intermediate with its formula, the numbers put in, value, unit and source, one class
 * for each section of the sheet.
 */
package binspan.worksheet;
