/** Throws and machines that the tests of several packages try: samples, and random ones. */
package throwbench.solver.trial;
