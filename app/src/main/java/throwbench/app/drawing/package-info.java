/**
 * The one way anything is drawn: pens, palette, fonts and the text of numbers. Lengths in points of the drawing, y
 * downwards. Knows the solver's results, no view.
 */
@NullMarked
package throwbench.app.drawing;

import org.jspecify.annotations.NullMarked;
