package throwbench.solver.pump;

import throwbench.solver.chamber.ChamberVolume;
import throwbench.solver.chamber.PressureCurve;
import throwbench.solver.chamber.ValveEvent;
import throwbench.solver.mechanism.Angles;
import throwbench.solver.mechanism.Approach;
import throwbench.solver.mechanism.Sweep;

/**
 * One valve of one chamber: when it stands open, and what the piston drives through it meanwhile. Liquid passes at the rate at
 * which the volume changes.
 *
 * @param throwIndex the chamber's throw
 * @param opens crank angle of that throw, rad
 * @param length crank angle that it stays open, rad; a whole turn when it is held open
 * @param sense what ds/dφ is multiplied by to give flow per radian, m²: the area, positive where the flow goes the pump's way
 *     on the inward stroke
 */
record ValveFlow(int throwIndex, double opens, double length, double sense) {

    static ValveFlow heldOpen(int throwIndex, ChamberVolume volume) {
        return new ValveFlow(throwIndex, 0, Angles.TURN, sense(volume, ValveEvent.Valve.SUCTION));
    }

    /** By the events of a solved cycle; a valve that has none stays shut. */
    static ValveFlow of(int throwIndex, ChamberVolume volume, PressureCurve curve, ValveEvent.Valve valve) {
        double opens = 0;
        double shuts = 0;
        for (ValveEvent event : curve.events()) {
            if (event.valve() == valve && event.opens()) {
                opens = event.crankAngle();
            } else if (event.valve() == valve) {
                shuts = event.crankAngle();
            }
        }
        return new ValveFlow(throwIndex, opens, Angles.wrap(shuts - opens), sense(volume, valve));
    }

    private static double sense(ChamberVolume volume, ValveEvent.Valve valve) {
        boolean inward = volume.growsOn(true) == (valve == ValveEvent.Valve.SUCTION);
        return inward ? volume.area() : -volume.area();
    }

    boolean isOpen(double crankAngle, Approach approach) {
        // an angle within the tolerance of an event counts as the event, like dead centres in a sweep
        double bias = approach == Approach.JUST_AFTER ? Approach.TOLERANCE : -Approach.TOLERANCE;
        return Angles.wrap(crankAngle + bias - opens) < length;
    }

    /** Flow per radian of crank angle, dV/dφ, m³, at the place of a sweep: ds/dφ = −σ x′. */
    double perRadian(Sweep sweep) {
        return -sense * sweep.rotation().sign() * sweep.reach1()[0];
    }

    /** Its derivative, d²V/dφ², m³: d²s/dφ² = −x″. */
    double bend(Sweep sweep) {
        return -sense * sweep.reach2()[0];
    }

    /** What passes in a turn, m³: by the volumes at opening and shutting. */
    double perTurn(Sweep sweep) {
        sweep.turnTo(opens, Approach.JUST_AFTER);
        double before = sweep.travel()[0];
        sweep.turnTo(opens + length, Approach.JUST_AFTER);
        return sense * (sweep.travel()[0] - before);
    }
}
