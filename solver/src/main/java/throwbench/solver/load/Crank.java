package throwbench.solver.load;

/**
 * What turns with the crank of one throw, kg m, any sign.
 *
 * @param unbalance U: static moment of webs and pin on the pin's side, without any part of the rod
 * @param counterweight W: static moment opposite the pin
 */
public record Crank(double unbalance, double counterweight) {

    /** U − W: what is left on the pin's side. */
    public double net() {
        return unbalance - counterweight;
    }
}
