package throwbench.solver.revolution;

import org.apache.commons.math3.linear.ArrayRealVector;
import org.apache.commons.math3.linear.LUDecomposition;
import org.apache.commons.math3.linear.MatrixUtils;
import org.apache.commons.math3.linear.RealMatrix;
import org.apache.commons.math3.linear.RealVector;
import org.apache.commons.math3.ode.FirstOrderDifferentialEquations;
import org.apache.commons.math3.ode.nonstiff.DormandPrince853Integrator;
import throwbench.solver.chamber.Side;
import throwbench.solver.load.ThrowBody;
import throwbench.solver.mechanism.Linkage;

/**
 * A second way to the speed of a shaft: Newton and Euler for every body of every throw and for the crankshaft, joint forces and α
 * unknown together, integrated over the crank angle by a general library. Only the pressures come from the program.
 */
final class TiedBodiesShaft implements FirstOrderDifferentialEquations {

    private final RunningMachine running;
    private final double rotatingInertia;
    private final Instant pressures;

    TiedBodiesShaft(RunningMachine running, double rotatingInertia) {
        this.running = running;
        this.rotatingInertia = rotatingInertia;
        this.pressures = new Instant(running, 0);
    }

    /** Speed and time after a part of a turn, from ω at its beginning. */
    double[] integrate(double from, double to, double[] speedAndTime) {
        double[] y = speedAndTime.clone();
        new DormandPrince853Integrator(1e-9, 0.1, 1e-12, 1e-12).integrate(this, from, y, to, y);
        return y;
    }

    @Override
    public int getDimension() {
        return 2;
    }

    @Override
    public void computeDerivatives(double crankAngle, double[] y, double[] yDot) {
        yDot[0] = acceleration(crankAngle, y[0]) / y[0];
        yDot[1] = 1 / y[0];
    }

    /** α at a crank angle and speed: the signs of the guide forces are tried until they agree. */
    double acceleration(double crankAngle, double speed) {
        int throwCount = running.throwsInOrder().size();
        double[] signs = new double[throwCount];
        for (int tries = 0; tries < 1 << throwCount; tries++) {
            for (int i = 0; i < throwCount; i++) {
                signs[i] = (tries >> i & 1) == 0 ? 1 : -1;
            }
            RealVector solved = solve(crankAngle, speed, signs);
            boolean agree = true;
            for (int i = 0; i < throwCount; i++) {
                agree &= solved.getEntry(5 * i + 2) * signs[i] >= 0;
            }
            if (agree) {
                return solved.getEntry(5 * throwCount);
            }
        }
        throw new AssertionError("no signs of the guide forces agree at " + crankAngle);
    }

    /** Unknown for each throw R_x, R_y, N, C_x, C_y, and α at last. */
    private RealVector solve(double crankAngle, double speed, double[] signs) {
        pressures.turnTo(crankAngle);
        int last = 5 * running.throwsInOrder().size();
        RealMatrix m = MatrixUtils.createRealMatrix(last + 1, last + 1);
        RealVector right = new ArrayRealVector(last + 1);
        m.setEntry(last, last, rotatingInertia);
        right.setEntry(last, running.speedCurve().driving().orElseThrow().at(speed));
        for (int i = 0; i < running.throwsInOrder().size(); i++) {
            addThrow(i, crankAngle + running.angleBetween(0, i), speed, signs[i], m, right);
        }
        return new LUDecomposition(m).getSolver().solve(right);
    }

    private void addThrow(int i, double phi, double speed, double sign, RealMatrix m, RealVector right) {
        RunningThrow t = running.throwsInOrder().get(i);
        ThrowBody body = t.body();
        Linkage k = body.linkage();
        double sigma = running.rotation().sign();
        double theta = Math.asin(k.guideOffset() / (k.rodLength() + k.crankRadius())) + sigma * phi;
        double r = k.crankRadius();
        double l = k.rodLength();
        double b = body.rodMassCentre();
        double beta = Math.asin((r * Math.sin(theta) - k.guideOffset()) / l);
        double b1 = r * Math.cos(theta) / (l * Math.cos(beta));
        double b2 = (b1 * b1 * Math.sin(beta) - r * Math.sin(theta) / l) / Math.cos(beta);
        double x1 = -r * Math.sin(theta) - l * Math.sin(beta) * b1;
        double x2 = -r * Math.cos(theta) - l * (Math.cos(beta) * b1 * b1 + Math.sin(beta) * b2);
        // the mass centre lies between pin and crosshead
        double share = b / l;
        double gx1 = -(1 - share) * r * Math.sin(theta) + share * x1;
        double gx2 = -(1 - share) * r * Math.cos(theta) + share * x2;
        double gy1 = (1 - share) * r * Math.cos(theta);
        double gy2 = -(1 - share) * r * Math.sin(theta);
        double w2 = speed * speed;
        double wx = -body.gravity() * Math.sin(body.axisDirection());
        double wy = -body.gravity() * Math.cos(body.axisDirection());
        double mRec = body.masses().total();
        double mRod = body.rodMass();
        double motion = Math.signum(sigma * x1);
        int row = 5 * i;
        int alpha = m.getColumnDimension() - 1;
        // crosshead along x: m x.. - R_x + mu sgn(dx/dt) |N| = F_gas - sgn(dx/dt) packing + m g_x
        m.setEntry(row, alpha, mRec * sigma * x1);
        m.setEntry(row, row, -1);
        m.setEntry(row, row + 2, motion * body.friction().guideCoefficient() * sign);
        right.setEntry(row, gas(i) - motion * body.friction().packing() + mRec * wx - mRec * x2 * w2);
        // crosshead along y: N + R_y + m g_y = 0
        m.setEntry(row + 1, row + 1, 1);
        m.setEntry(row + 1, row + 2, 1);
        right.setEntry(row + 1, -mRec * wy);
        // rod: m a_G = C - R + m g
        m.setEntry(row + 2, row + 3, 1);
        m.setEntry(row + 2, row, -1);
        m.setEntry(row + 2, alpha, -mRod * sigma * gx1);
        right.setEntry(row + 2, mRod * (gx2 * w2 - wx));
        m.setEntry(row + 3, row + 4, 1);
        m.setEntry(row + 3, row + 1, -1);
        m.setEntry(row + 3, alpha, -mRod * sigma * gy1);
        right.setEntry(row + 3, mRod * (gy2 * w2 - wy));
        // rod about its mass centre; it turns against beta. From crosshead to pin: l (-cos beta, sin beta)
        double ux = -Math.cos(beta);
        double uy = Math.sin(beta);
        m.setEntry(row + 4, row + 4, b * ux);
        m.setEntry(row + 4, row + 3, -b * uy);
        m.setEntry(row + 4, row + 1, (l - b) * ux);
        m.setEntry(row + 4, row, -(l - b) * uy);
        m.setEntry(row + 4, alpha, body.rodInertia() * sigma * b1);
        right.setEntry(row + 4, -body.rodInertia() * b2 * w2);
        // crankshaft, in the sense of rotation: J alpha + sigma (P x C) = T_driver + sigma (weight of U - W)
        m.setEntry(alpha, row + 4, sigma * r * Math.cos(theta));
        m.setEntry(alpha, row + 3, -sigma * r * Math.sin(theta));
        right.addToEntry(alpha, sigma * body.crankNet() * (Math.cos(theta) * wy - Math.sin(theta) * wx));
    }

    private double gas(int throwIndex) {
        RunningThrow t = running.throwsInOrder().get(throwIndex);
        double frame = running.machine().site().framePressure();
        double force = 0;
        for (int c = 0; c < t.volumes().size(); c++) {
            double p = pressures.pressure(throwIndex, c) - frame;
            double area = t.volumes().get(c).area();
            force += t.volumes().get(c).side() == Side.HEAD ? -p * area : p * area;
        }
        return force;
    }
}
