package throwbench.solver.benchmarks;

import throwbench.solver.machine.Chamber;
import throwbench.solver.machine.Machine;
import throwbench.solver.machine.Throw;

/**
 * The yardstick: every column of one throw in a single pass by java.lang.Math, as one would write it down first. Constant
 * speed, no gravity, no friction, both ends on ideal valves.
 */
final class PlainLoop {

    static final int COLUMNS = 27;

    private final Throw t;
    private final double framePressure;
    private final double k = 1.29;
    final double[][] columns;

    PlainLoop(Machine machine, int stations) {
        t = machine.throwsInOrder().get(0);
        framePressure = machine.site().framePressure();
        columns = new double[COLUMNS][stations];
    }

    void solve(double omega, double suction, double discharge) {
        double r = t.linkage().crankRadius();
        double l = t.linkage().rodLength();
        double e = t.linkage().guideOffset();
        double thetaH = Math.asin(e / (l + r));
        double xMax = Math.sqrt((l + r) * (l + r) - e * e);
        double stroke = xMax - Math.sqrt((l - r) * (l - r) - e * e);
        double phiC = Math.PI + Math.asin(e / (l - r)) - thetaH;
        Chamber head = t.chambers().get(0);
        Chamber crank = t.chambers().get(1);
        double areaH = head.area();
        double areaC = crank.area();
        double clearanceH = head.clearance().volume(areaH * stroke);
        double clearanceC = crank.clearance().volume(areaC * stroke);
        double low = suction * 0.97;
        double high = discharge * 1.04;
        double mp = t.masses().pistonAndRod();
        double mRec = t.masses().total();
        double mc = t.connectingRod().mass();
        double b = t.connectingRod().massCentre(l);
        double ic = t.connectingRod().inertiaAboutMassCentre(l);
        double net = t.crank().net();
        double u = framePressure * (areaH - areaC);
        int n = columns[0].length;
        for (int i = 0; i < n; i++) {
            double phi = 2 * Math.PI * i / n;
            double theta = thetaH + phi;
            double sin = Math.sin(theta);
            double cos = Math.cos(theta);
            double sinB = (r * sin - e) / l;
            double beta = Math.asin(sinB);
            double cosB = Math.cos(beta);
            double b1 = r * cos / (l * cosB);
            double b2 = (sinB * b1 * b1 - r * sin / l) / cosB;
            double x1 = -r * sin - l * sinB * b1;
            double x2 = -r * cos - l * (cosB * b1 * b1 + sinB * b2);
            double s = xMax - (r * cos + l * cosB);
            double velocity = -x1 * omega;
            double acceleration = -x2 * omega * omega;
            double betaDot = b1 * omega;
            double betaDot2 = b2 * omega * omega;
            double vH = clearanceH + areaH * s;
            double vC = clearanceC + areaC * (stroke - s);
            boolean inward = phi < phiC;
            double pH = inward
                    ? Math.max(low, high * Math.pow(clearanceH / vH, k))
                    : Math.min(high, low * Math.pow((clearanceH + areaH * stroke) / vH, k));
            double pC = inward
                    ? Math.min(high, low * Math.pow((clearanceC + areaC * stroke) / vC, k))
                    : Math.max(low, high * Math.pow(clearanceC / vC, k));
            double gas = areaC * pC - areaH * pH + u;
            double inertia = mRec * acceleration;
            double rod = gas + inertia;
            double agx = -acceleration + (l - b) * (betaDot2 * sinB + betaDot * betaDot * cosB);
            double agy = (l - b) * (betaDot2 * cosB - betaDot * betaDot * sinB);
            double rx = -rod;
            double ry = (ic * betaDot2 - b * mc * (agx * sinB + agy * cosB)) / (l * cosB) - rx * Math.tan(beta);
            double cx = rx + mc * agx;
            double cy = ry + mc * agy;
            double centripetal = net * omega * omega;
            double bx = cx - centripetal * cos;
            double by = cy - centripetal * sin;
            double torque = r * (cos * cy - sin * cx);
            double[][] c = columns;
            c[0][i] = phi;
            c[1][i] = s;
            c[2][i] = velocity;
            c[3][i] = acceleration;
            c[4][i] = beta;
            c[5][i] = betaDot;
            c[6][i] = betaDot2;
            c[7][i] = pH;
            c[8][i] = pC;
            c[9][i] = gas;
            c[10][i] = inertia;
            c[11][i] = rod;
            c[12][i] = gas + mp * acceleration;
            c[13][i] = -ry;
            c[14][i] = rx;
            c[15][i] = ry;
            c[16][i] = cx;
            c[17][i] = cy;
            c[18][i] = bx;
            c[19][i] = by;
            c[20][i] = torque;
            c[21][i] = torque;
            c[22][i] = omega;
            c[23][i] = mRec * acceleration - mc * agx + centripetal * cos;
            c[24][i] = -mc * agy + centripetal * sin;
            c[25][i] = 0;
            c[26][i] = 0;
        }
    }
}
