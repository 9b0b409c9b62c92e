/** What the solver costs: JMH, average time a call. Every benchmark solves one invented booster, in line or offset. */
package throwbench.solver.benchmarks;
