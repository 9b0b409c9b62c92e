package throwbench.app.bench;

import java.util.OptionalDouble;
import throwbench.solver.document.MachineDocument;
import throwbench.solver.document.quantity.UnitSystem;
import throwbench.solver.machine.Machine;

/**
 * What is to be shown next: a valid machine, and the user's choices.
 *
 * @param machine what the document describes
 * @param turnTo crank angle of the chosen throw to turn to when it is shown, rad
 */
record Wish(MachineDocument document, Machine machine, Choice choice, OptionalDouble turnTo) {

    /** What the user chose to look at. */
    record Choice(int dutyIndex, int throwIndex, UnitSystem units) {

        /** The same choice where the machine still has it, else its first duty point or throw. */
        Choice within(Machine machine) {
            return new Choice(
                    dutyIndex < machine.dutyPoints().size() ? dutyIndex : 0,
                    throwIndex < machine.throwsInOrder().size() ? throwIndex : 0,
                    units);
        }

        Choice duty(int index) {
            return new Choice(index, throwIndex, units);
        }

        Choice ofThrow(int index) {
            return new Choice(dutyIndex, index, units);
        }

        Choice units(UnitSystem next) {
            return new Choice(dutyIndex, throwIndex, next);
        }
    }

    /** The same machine looked at otherwise. */
    Wish with(Choice next, OptionalDouble angle) {
        return new Wish(document, machine, next, angle);
    }
}
