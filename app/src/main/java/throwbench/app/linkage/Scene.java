package throwbench.app.linkage;

import java.util.Optional;
import throwbench.app.bench.Shown;
import throwbench.app.drawing.Palette;
import throwbench.app.linkage.parts.Look;
import throwbench.app.linkage.parts.ThrowAxes;
import throwbench.app.linkage.parts.ThrowLayout;

/** What every painter of one picture shares. */
record Scene(
        Shown shown,
        MachineLayout layout,
        Framing framing,
        Palette palette,
        LinkageChoice choice,
        PictureSize size,
        Optional<Ghost> ghost) {

    /** The layout of the shown throw. */
    ThrowLayout own() {
        return layout.of(shown.throwIndex());
    }

    /** The axes of the shown throw in points. */
    ThrowAxes axes() {
        return layout.axes(shown.throwIndex(), framing);
    }

    Look full() {
        return Look.full(palette, size.weight());
    }

    Look outline() {
        return Look.outline(palette, size.weight());
    }

    Look held() {
        return Look.held(palette, size.weight());
    }

    double weight() {
        return size.weight();
    }

    /** Whether a throw other than the shown one is drawn. */
    boolean draws(int throwIndex) {
        return throwIndex != shown.throwIndex() && !choice.alone();
    }
}
