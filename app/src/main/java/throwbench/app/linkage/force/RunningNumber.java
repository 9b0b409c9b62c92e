package throwbench.app.linkage.force;

import org.jspecify.annotations.Nullable;
import throwbench.app.drawing.Readout;

/** The text of a running number; a value whose digits were shown lately costs no new string. */
public final class RunningNumber {

    private static final int KEPT = 512;

    private final Readout readout;
    private final double power;
    private final long[] keys = new long[KEPT];
    private final @Nullable String[] texts = new @Nullable String[KEPT];

    public RunningNumber(Readout readout) {
        this.readout = readout;
        this.power = Math.pow(10, readout.decimals());
    }

    /** The number alone, of an SI value. */
    public String of(double si) {
        long key = Math.round(readout.inUnit(si) * power);
        int slot = Math.floorMod(key, KEPT);
        String kept = texts[slot];
        if (kept != null && keys[slot] == key) {
            return kept;
        }
        String text = readout.number(si);
        keys[slot] = key;
        texts[slot] = text;
        return text;
    }

    public String unit() {
        return readout.unit();
    }

    public Readout readout() {
        return readout;
    }
}
