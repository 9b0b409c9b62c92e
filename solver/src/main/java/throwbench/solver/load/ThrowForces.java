package throwbench.solver.load;

import throwbench.solver.mechanism.Strokes;
import throwbench.solver.mechanism.Sweep;

/**
 * The forces of one throw at the stations of a sweep, one short loop a quantity, in the order of the equations: loads along
 * the rod, crosshead, connecting rod, crank, frame. Vectors are in throw axes, as the force on the named part. Arrays hold
 * one entry a station; they are the owner's to read and this class's to write.
 */
public final class ThrowForces {

    private final ThrowBody body;
    private final double[] inertiaLoad;
    private final double[] rodLoad;
    private final double[] pistonRodLoad;
    private final double[] guideForce;
    private final double[] crossheadPinX;
    private final double[] crossheadPinY;
    private final double[] crankPinX;
    private final double[] crankPinY;
    private final double[] mainBearingX;
    private final double[] mainBearingY;
    private final double[] torque;
    private final double[] rodCentreX;
    private final double[] rodCentreY;
    private final double[] frameX;
    private final double[] frameY;
    private final double[] axial;
    private final double[] rodShare;

    private final double[][] block;

    public ThrowForces(ThrowBody body, int count) {
        this(body, new double[17][count]);
    }

    private ThrowForces(ThrowBody body, double[][] block) {
        this.body = body;
        this.block = block;
        inertiaLoad = block[0];
        rodLoad = block[1];
        pistonRodLoad = block[2];
        guideForce = block[3];
        crossheadPinX = block[4];
        crossheadPinY = block[5];
        crankPinX = block[6];
        crankPinY = block[7];
        mainBearingX = block[8];
        mainBearingY = block[9];
        torque = block[10];
        rodCentreX = block[11];
        rodCentreY = block[12];
        frameX = block[13];
        frameY = block[14];
        axial = block[15];
        rodShare = block[16];
    }

    /** Forces of another throw in these arrays: what stands in them is given up. */
    public ThrowForces over(ThrowBody next) {
        return new ThrowForces(next, block);
    }

    /**
     * Solves every force.
     *
     * @param gasLoad F_gas at every station, N, tension positive
     * @param speed ω, rad/s
     * @param shaftAcceleration α, rad/s²
     */
    public void solve(Sweep sweep, ThrowMotion motion, double[] gasLoad, double[] speed, double[] shaftAcceleration) {
        solveRodLoad(motion, gasLoad);
        pistonRod(sweep.strokes(), motion, gasLoad);
        rodMassCentre(sweep, motion);
        rodMoment(sweep, motion);
        guide(sweep);
        crossheadPin(sweep);
        crankPin();
        crankAndFrame(sweep, motion, speed, shaftAcceleration);
        torque(sweep);
    }

    /** F_in = m_rec d²s/dt² and F_rod = F_gas + F_in alone. */
    public void solveRodLoad(ThrowMotion motion, double[] gasLoad) {
        double mass = body.masses().total();
        double[] a = motion.acceleration;
        for (int i = 0; i < rodLoad.length; i++) {
            inertiaLoad[i] = mass * a[i];
        }
        for (int i = 0; i < rodLoad.length; i++) {
            rodLoad[i] = gasLoad[i] + inertiaLoad[i];
        }
    }

    /** T_pr = F_gas + m_p d²s/dt² + F_pk + m_p g_x, and P = F_gas + F_in + F_pk + m_rec g_x for the crosshead. */
    private void pistonRod(Strokes strokes, ThrowMotion motion, double[] gasLoad) {
        double mass = body.masses().pistonAndRod();
        double weight = mass * body.gravityX();
        double wholeWeight = body.masses().total() * body.gravityX();
        double[] a = motion.acceleration;
        for (int i = 0; i < pistonRodLoad.length; i++) {
            pistonRodLoad[i] = Math.fma(mass, a[i], gasLoad[i] + weight);
        }
        for (int i = 0; i < axial.length; i++) {
            axial[i] = rodLoad[i] + wholeWeight;
        }
        double packing = body.friction().packing();
        if (packing != 0) {
            for (int k = 0; k < strokes.count(); k++) {
                double force = strokes.inward(k) ? packing : -packing;
                for (int i = strokes.from(k); i < strokes.to(k); i++) {
                    pistonRodLoad[i] += force;
                    axial[i] += force;
                }
            }
        }
    }

    /** a_G of the connecting rod. */
    private void rodMassCentre(Sweep sweep, ThrowMotion motion) {
        double fromCrosshead = body.linkage().rodLength() - body.rodMassCentre();
        double[] sin = sweep.sinRod();
        double[] cos = sweep.cosRod();
        double[] a = motion.acceleration;
        double[] b1 = motion.rodVelocity;
        double[] b2 = motion.rodAcceleration;
        for (int i = 0; i < rodCentreX.length; i++) {
            rodCentreX[i] = fromCrosshead * Math.fma(b2[i], sin[i], b1[i] * b1[i] * cos[i]) - a[i];
        }
        for (int i = 0; i < rodCentreY.length; i++) {
            rodCentreY[i] = fromCrosshead * Math.fma(b2[i], cos[i], -b1[i] * b1[i] * sin[i]);
        }
    }

    /** The rod's own share of R_y: what its inertia and weight ask of the crosshead, N. */
    private void rodMoment(Sweep sweep, ThrowMotion motion) {
        double perLength = 1 / body.linkage().rodLength();
        double moment = body.rodMassCentre() * body.rodMass();
        double inertia = body.rodInertia();
        double gx = body.gravityX();
        double gy = body.gravityY();
        double[] sin = sweep.sinRod();
        double[] cos = sweep.cosRod();
        double[] sec = sweep.secRod();
        double[] b2 = motion.rodAcceleration;
        for (int i = 0; i < rodShare.length; i++) {
            double turning = Math.fma(rodCentreX[i] - gx, sin[i], (rodCentreY[i] - gy) * cos[i]);
            rodShare[i] = perLength * Math.fma(inertia, b2[i], -moment * turning) * sec[i];
        }
    }

    /** N, with the guide's friction solved together with it: for each sign of N the equation is linear. */
    private void guide(Sweep sweep) {
        double weight = body.masses().total() * body.gravityY();
        double[] sin = sweep.sinRod();
        double[] sec = sweep.secRod();
        for (int i = 0; i < guideForce.length; i++) {
            guideForce[i] = -Math.fma(axial[i], sin[i] * sec[i], rodShare[i] + weight);
        }
        double mu = body.friction().guideCoefficient();
        if (mu != 0) {
            Strokes strokes = sweep.strokes();
            for (int k = 0; k < strokes.count(); k++) {
                guideFriction(sin, sec, strokes.from(k), strokes.to(k), strokes.inward(k) ? -mu : mu);
            }
        }
    }

    /** @param mu μ with the sign of dx/dt */
    private void guideFriction(double[] sin, double[] sec, int from, int to, double mu) {
        for (int i = from; i < to; i++) {
            double free = guideForce[i];
            guideForce[i] = free / (1 - Math.signum(free) * mu * sin[i] * sec[i]);
            axial[i] -= mu * Math.abs(guideForce[i]);
        }
    }

    /** R on the crosshead: R_x = −P − F_gd, R_y = share − R_x tan β. */
    private void crossheadPin(Sweep sweep) {
        double[] sin = sweep.sinRod();
        double[] sec = sweep.secRod();
        for (int i = 0; i < crossheadPinX.length; i++) {
            crossheadPinX[i] = -axial[i];
        }
        for (int i = 0; i < crossheadPinY.length; i++) {
            crossheadPinY[i] = Math.fma(axial[i], sin[i] * sec[i], rodShare[i]);
        }
    }

    /** C = R + m_c (a_G − g) on the connecting rod's big end. */
    private void crankPin() {
        double mass = body.rodMass();
        double gx = body.gravityX();
        double gy = body.gravityY();
        for (int i = 0; i < crankPinX.length; i++) {
            crankPinX[i] = Math.fma(mass, rodCentreX[i] - gx, crossheadPinX[i]);
        }
        for (int i = 0; i < crankPinY.length; i++) {
            crankPinY[i] = Math.fma(mass, rodCentreY[i] - gy, crossheadPinY[i]);
        }
    }

    /** B = C + (U − W)(σα n̂ − ω² û) on the crankshaft, and the moving parts' inertia on the frame, −d/dt Σ m v. */
    private void crankAndFrame(Sweep sweep, ThrowMotion motion, double[] speed, double[] alpha) {
        double net = body.crankNet();
        double turned = net * sweep.rotation().sign();
        double mass = body.rodMass();
        double reciprocating = body.masses().total();
        double[] sin = sweep.sinPin();
        double[] cos = sweep.cosPin();
        double[] a = motion.acceleration;
        for (int i = 0; i < mainBearingX.length; i++) {
            double centripetal = net * speed[i] * speed[i];
            double x = -Math.fma(turned * alpha[i], sin[i], centripetal * cos[i]);
            mainBearingX[i] = crankPinX[i] + x;
            frameX[i] = Math.fma(reciprocating, a[i], -Math.fma(mass, rodCentreX[i], x));
        }
        for (int i = 0; i < mainBearingY.length; i++) {
            double centripetal = net * speed[i] * speed[i];
            double y = Math.fma(turned * alpha[i], cos[i], -centripetal * sin[i]);
            mainBearingY[i] = crankPinY[i] + y;
            frameY[i] = -Math.fma(mass, rodCentreY[i], y);
        }
    }

    /** σ [x_C C_y − y_C C_x + (U − W) g cos(θ + γ)]. */
    private void torque(Sweep sweep) {
        double arm = body.linkage().crankRadius() * sweep.rotation().sign();
        double weight = body.crankNet() * body.gravity() * sweep.rotation().sign();
        double weightCos = weight * Math.cos(body.axisDirection());
        double weightSin = weight * Math.sin(body.axisDirection());
        double[] sin = sweep.sinPin();
        double[] cos = sweep.cosPin();
        for (int i = 0; i < torque.length; i++) {
            double alongCos = Math.fma(arm, crankPinY[i], weightCos);
            double alongSin = Math.fma(arm, crankPinX[i], weightSin);
            torque[i] = Math.fma(alongCos, cos[i], -alongSin * sin[i]);
        }
    }

    public ThrowBody body() {
        return body;
    }

    /** F_in, N. */
    public double[] inertiaLoad() {
        return inertiaLoad;
    }

    /** F_rod, N, tension positive: the combined load that is judged for reversal. */
    public double[] rodLoad() {
        return rodLoad;
    }

    /** T_pr at the crosshead end of the piston rod, N, tension positive. */
    public double[] pistonRodLoad() {
        return pistonRodLoad;
    }

    /** N on the crosshead, N, positive along +y. */
    public double[] guideForce() {
        return guideForce;
    }

    /** R_x on the crosshead, N. */
    public double[] crossheadPinX() {
        return crossheadPinX;
    }

    /** R_y on the crosshead, N. */
    public double[] crossheadPinY() {
        return crossheadPinY;
    }

    /** C_x on the connecting rod's big end, N. */
    public double[] crankPinX() {
        return crankPinX;
    }

    /** C_y on the connecting rod's big end, N. */
    public double[] crankPinY() {
        return crankPinY;
    }

    /** B_x on the crankshaft, this throw's share, N. */
    public double[] mainBearingX() {
        return mainBearingX;
    }

    /** B_y, N. */
    public double[] mainBearingY() {
        return mainBearingY;
    }

    /** Torque that the driver must deliver for this throw, N·m. */
    public double[] torque() {
        return torque;
    }

    /** Acceleration of the connecting rod's mass centre along x, m/s². */
    public double[] rodCentreAccelerationX() {
        return rodCentreX;
    }

    /** Acceleration of the connecting rod's mass centre along y, m/s². */
    public double[] rodCentreAccelerationY() {
        return rodCentreY;
    }

    /** Inertia of the moving parts on the frame along the throw's x, N. */
    public double[] frameForceX() {
        return frameX;
    }

    /** Inertia of the moving parts on the frame along the throw's y, N. */
    public double[] frameForceY() {
        return frameY;
    }
}
