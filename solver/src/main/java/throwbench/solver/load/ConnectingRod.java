package throwbench.solver.load;

import java.util.OptionalDouble;

/**
 * The connecting rod as one rigid body whose mass centre lies on the line of centres.
 *
 * @param mass m_c, kg, ≥ 0
 * @param massCentreFromCrankPin b, m, in [0, l]; empty: a third of the length
 * @param inertia I_c about the mass centre, kg m², ≥ 0; empty: that of two lumps at the pins
 */
public record ConnectingRod(double mass, OptionalDouble massCentreFromCrankPin, OptionalDouble inertia) {

    public ConnectingRod {
        if (!(mass >= 0)) {
            throw new IllegalArgumentException("connecting rod mass " + mass + " kg");
        }
    }

    /** b for a rod of length l (m): as given, or l/3. */
    public double massCentre(double rodLength) {
        return massCentreFromCrankPin.orElse(rodLength / 3);
    }

    /** I_c for a rod of length l (m): as given, or m_c b (l − b), which two lumps at the pins would have. */
    public double inertiaAboutMassCentre(double rodLength) {
        double b = massCentre(rodLength);
        return inertia.orElse(mass * b * (rodLength - b));
    }
}
