package throwbench.app.linkage;

import java.util.ArrayList;
import java.util.List;
import throwbench.app.linkage.parts.Pose;
import throwbench.app.linkage.parts.RodLine.Barrel;
import throwbench.app.linkage.parts.RodLine.Piston;
import throwbench.app.linkage.parts.ThrowLayout;

/**
 * The room of one chamber in its cylinder, along x of the throw, m.
 *
 * @param chamber index in file order
 * @param head whether it lies on the head side of its piston
 * @param cover x of its fixed end
 * @param face x of its moving end relative to the crosshead pin
 * @param whole x of a second fixed end, where it does not end at a face: a plunger's barrel
 * @param plunger whether a plunger dips into it
 * @param radius of the cylinder
 * @param inner radius of what passes through it
 */
record ChamberSpace(
        int chamber,
        boolean head,
        double cover,
        double face,
        double whole,
        boolean plunger,
        double radius,
        double inner) {

    /** Every chamber of a throw, from the crank outwards. */
    static List<ChamberSpace> of(ThrowLayout layout) {
        List<ChamberSpace> spaces = new ArrayList<>();
        for (int i = 0; i < layout.line().pistons().size(); i++) {
            Piston p = layout.line().pistons().get(i);
            Barrel b = layout.line().barrels().get(i);
            p.crankChamber().ifPresent(c -> b.crankCover()
                    .ifPresent(at -> spaces.add(
                            new ChamberSpace(c, false, at.face(), p.crankFace(), 0, false, b.radius(), at.opening()))));
            p.headChamber().ifPresent(c -> b.headCover()
                    .ifPresent(at -> spaces.add(new ChamberSpace(
                            c,
                            true,
                            at.face(),
                            p.headFace(),
                            b.from(),
                            p.plunger(),
                            b.radius(),
                            p.plunger() ? p.radius() : at.opening()))));
        }
        return spaces;
    }

    /** x of its lesser end. */
    double from(Pose pose) {
        return plunger ? whole : head ? pose.wristX() + face : cover;
    }

    /** x of its greater end. */
    double to(Pose pose) {
        return head ? cover : pose.wristX() + face;
    }

    /** Free length between cover and face, m. */
    double free(double wristX) {
        return head ? cover - (wristX + face) : wristX + face - cover;
    }

    /** y from the line of stroke of the middle of its upper half. */
    double upper() {
        return (radius + (plunger ? 0 : inner)) / 2;
    }
}
