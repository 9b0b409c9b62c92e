package throwbench.solver.revolution;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import throwbench.solver.balance.Harmonic;
import throwbench.solver.balance.HarmonicSums;
import throwbench.solver.balance.OrderVector;
import throwbench.solver.balance.TurnQuadrature;
import throwbench.solver.mechanism.Angles;

/**
 * What the torques, the shaking forces and the shaking couples of a machine hold of each order. Lists begin with order 1; phases
 * count from head-end dead centre of the first throw.
 *
 * @param shaftTorque N·m, up to order {@link #TORQUE_ORDERS}
 * @param throwTorques N·m, the same of every throw
 * @param forceX N, up to order {@link #SHAKING_ORDERS}, as the three that follow
 * @param coupleX N·m
 */
public record MachineHarmonics(
        List<Harmonic> shaftTorque,
        List<List<Harmonic>> throwTorques,
        List<Harmonic> forceX,
        List<Harmonic> forceY,
        List<Harmonic> coupleX,
        List<Harmonic> coupleY) {

    public static final int TORQUE_ORDERS = 24;
    public static final int SHAKING_ORDERS = 12;

    /** Order 24 goes through one whole period on it. */
    private static final double LONGEST_PIECE = Angles.TURN / 24;

    private static final List<Column> OF_MACHINE = List.of(
            Column.SHAFT_TORQUE,
            Column.SHAKING_FORCE_X,
            Column.SHAKING_FORCE_Y,
            Column.SHAKING_COUPLE_X,
            Column.SHAKING_COUPLE_Y);

    public MachineHarmonics {
        throwTorques = List.copyOf(throwTorques);
    }

    /** Finds them all in one turn. */
    public static MachineHarmonics of(RunningMachine running) {
        int columns = OF_MACHINE.size();
        int throwCount = running.throwsInOrder().size();
        int[] orders = new int[columns + throwCount];
        Arrays.fill(orders, TORQUE_ORDERS);
        Arrays.fill(orders, 1, columns, SHAKING_ORDERS);
        HarmonicSums sums = new HarmonicSums(orders);
        Instant instant = new Instant(running, 0);
        double[] values = new double[orders.length];
        TurnQuadrature.over(BreakAngles.forMachineIntegrals(running, 0), LONGEST_PIECE, (angle, weight) -> {
            instant.turnTo(angle);
            for (int c = 0; c < columns; c++) {
                values[c] = instant.at(OF_MACHINE.get(c));
            }
            for (int i = 0; i < throwCount; i++) {
                values[columns + i] = instant.at(i, Column.THROW_TORQUE);
            }
            sums.add(angle, weight, values);
        });
        List<List<Harmonic>> throwTorques = new ArrayList<>();
        for (int i = 0; i < throwCount; i++) {
            throwTorques.add(sums.of(columns + i));
        }
        return new MachineHarmonics(sums.of(0), throwTorques, sums.of(1), sums.of(2), sums.of(3), sums.of(4));
    }

    /** The harmonics of any column of a throw or of the machine, over the crank angle of the first throw. */
    public static List<Harmonic> ofColumn(RunningMachine running, int throwIndex, Column column, int orders) {
        HarmonicSums sums = new HarmonicSums(orders);
        Instant instant = new Instant(running, 0);
        double[] value = new double[1];
        double longest = Math.min(LONGEST_PIECE, Angles.TURN / orders);
        TurnQuadrature.over(BreakAngles.forMachineIntegrals(running, 0), longest, (angle, weight) -> {
            value[0] = instant.turnTo(angle).at(throwIndex, column);
            sums.add(angle, weight, value);
        });
        return sums.of(0);
    }

    /** The shaking force of an order, 1 (primary) … {@link #SHAKING_ORDERS}. */
    public OrderVector force(int order) {
        return new OrderVector(forceX.get(order - 1), forceY.get(order - 1));
    }

    /** The shaking couple of an order. */
    public OrderVector couple(int order) {
        return new OrderVector(coupleX.get(order - 1), coupleY.get(order - 1));
    }
}
