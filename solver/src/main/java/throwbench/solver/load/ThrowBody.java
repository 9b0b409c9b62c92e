package throwbench.solver.load;

import throwbench.solver.mechanism.Linkage;

/**
 * The moving parts of one throw as rigid bodies, every default resolved.
 *
 * @param rodMass m_c, kg
 * @param rodMassCentre b, from the crank pin, m
 * @param rodInertia I_c about the mass centre, kg m²
 * @param crankNet U − W on the pin's side, kg m
 * @param axisDirection γ, rad
 * @param gravity g, m/s²; 0 where weights do not count
 */
public record ThrowBody(
        Linkage linkage,
        ReciprocatingMasses masses,
        double rodMass,
        double rodMassCentre,
        double rodInertia,
        double crankNet,
        Friction friction,
        double axisDirection,
        double gravity) {

    public static ThrowBody of(
            Linkage linkage,
            ReciprocatingMasses masses,
            ConnectingRod rod,
            Crank crank,
            Friction friction,
            double axisDirection,
            double gravity) {
        double l = linkage.rodLength();
        return new ThrowBody(
                linkage,
                masses,
                rod.mass(),
                rod.massCentre(l),
                rod.inertiaAboutMassCentre(l),
                crank.net(),
                friction,
                axisDirection,
                gravity);
    }

    /** g_x: the weight's component along the throw's x, m/s². */
    double gravityX() {
        return -gravity * Math.sin(axisDirection);
    }

    /** g_y, m/s². */
    double gravityY() {
        return -gravity * Math.cos(axisDirection);
    }
}
