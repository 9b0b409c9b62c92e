package throwbench.solver.document.check;

import throwbench.solver.document.attached.AttachedFiles;
import throwbench.solver.document.quantity.PressureMark;

/** What the page says of several keys together. Each value has been judged by itself before. */
public final class Rules {

    private Rules() {}

    /** Adds to the flaws of a file whose values have been judged. */
    public static void judge(Checked checked, AttachedFiles files) {
        Fields machine = Fields.root(checked);
        Roster roster = new Roster(machine);
        site(machine.object("site"));
        drive(machine.object("drive"));
        machine.items("fluids").forEach(FluidRules::judge);
        SeriesRules.judgeStages(roster);
        for (Fields one : machine.items("throws")) {
            ThrowRules.judge(one);
            one.items("chambers").forEach(chamber -> ChamberRules.judge(chamber, roster, files));
        }
        DutyRules duty = new DutyRules(roster);
        machine.items("dutyPoints").forEach(duty::judgePoint);
        machine.items("loadSteps").forEach(duty::judgeChambers);
        machine.object("ranges").items("stages").forEach(duty::judgeRange);
    }

    private static void site(Fields site) {
        site.quantity("ambientPressure")
                .filter(pressure -> pressure.mark() == PressureMark.GAUGE)
                .ifPresent(pressure -> site.fault(
                        "ambientPressure",
                        '"' + pressure.text() + "\", a gauge pressure",
                        "an absolute one, as \"101.325 kPa a\": gauge pressures count from it"));
    }

    private static void drive(Fields drive) {
        String driver = drive.object("driver").kind();
        boolean swings = driver.equals("constant-torque") || driver.equals("slip");
        if (swings && !drive.has("rotatingInertia")) {
            drive.fault(
                    "rotatingInertia",
                    FlawList.MISSING,
                    "the moment of inertia that " + driver + " turns, as \"38 kg m2\"");
        } else if (swings && drive.number("rotatingInertia").orElse(1) == 0) {
            drive.fault("rotatingInertia", drive.said("rotatingInertia"), "more than 0 with " + driver);
        }
    }
}
