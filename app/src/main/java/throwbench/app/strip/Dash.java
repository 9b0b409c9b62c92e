package throwbench.app.strip;

import throwbench.app.drawing.Pen;

/** How the line of a trace is broken: with its name, what tells traces apart without colour. */
public enum Dash {
    SOLID,
    DASHED,
    DOTTED,
    DASH_DOT,
    LONG,
    SPARSE;

    /** Breaks the pen's lines this way. */
    void on(Pen pen) {
        switch (this) {
            case SOLID -> pen.dash();
            case DASHED -> pen.dash(6, 4);
            case DOTTED -> pen.dash(1.6, 3);
            case DASH_DOT -> pen.dash(9, 3, 1.8, 3);
            case LONG -> pen.dash(14, 5);
            case SPARSE -> pen.dash(3, 7);
        }
    }
}
