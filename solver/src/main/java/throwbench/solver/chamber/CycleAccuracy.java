package throwbench.solver.chamber;

/** How closely an integrated cycle is followed. Cycles in closed form are exact either way. */
public enum CycleAccuracy {
    /** Pressures within 2e-4 of the peak, mass, work and temperature within 1e-4, the periodic state to 1e-8. */
    SOLVE,
    /** For maps: pressures within 5e-4 of the peak, in about half the time. */
    MAP
}
