package throwbench.app.strip;

import throwbench.app.drawing.Signal;

/**
 * One line in a lane.
 *
 * @param name in the legend
 * @param shortName where the name finds no room
 * @param strong drawn heavier, with the area to zero shaded by sign
 * @param added by the user, and so removable
 */
public record StripTrace(Signal signal, String name, String shortName, Dash dash, boolean strong, boolean added) {}
