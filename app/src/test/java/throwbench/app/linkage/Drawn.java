package throwbench.app.linkage;

import java.util.List;
import throwbench.app.bench.Shown;
import throwbench.app.drawing.Palette;
import throwbench.app.linkage.RecordingPen.Mark;
import throwbench.solver.machine.Machine;
import throwbench.solver.revolution.Instant;

/** A machine drawn by a recording pen at one angle. */
record Drawn(LinkagePicture picture, Instant instant, List<Mark> still, List<Mark> moving, List<Mark> headline) {

    static Drawn of(Machine machine, int throwIndex, double degrees, double width, double height) {
        return of(Machines.shown(machine, throwIndex), LinkageChoice.usual(), degrees, width, height);
    }

    static Drawn of(Shown shown, LinkageChoice choice, double degrees, double width, double height) {
        LinkagePicture picture =
                new LinkagePicture(shown, Palette.LIGHT, choice, width, height, new RecordingPen());
        return at(picture, degrees);
    }

    static Drawn at(LinkagePicture picture, double degrees) {
        Instant instant = new Instant(picture.shown().running(), picture.shown().throwIndex());
        instant.turnTo(Math.toRadians(degrees));
        RecordingPen still = new RecordingPen();
        picture.paintStill(still);
        RecordingPen moving = new RecordingPen();
        picture.paintMoving(moving, instant);
        RecordingPen headline = new RecordingPen();
        picture.paintHeadline(headline, instant);
        return new Drawn(picture, instant, still.marks(), moving.marks(), headline.marks());
    }
}
