// SPDX-License-Identifier: Apache-2.0
package reedling.conform;

import java.util.List;

/**
 * Leads the couples of a bench along prescribed motions, step by step, as the engine's step would show them to the laws:
 * positions at the end of a step, velocities and spins of its middle.
 *
 * <p>Threads: one.
 */
final class Drive {

    /** What looks at the bench after each force phase. */
    interface Watch {
        /**
         * @param step 0 at the start
         * @param drive with the poses of now and of the step before
         */
        void look(int step, Drive drive);
    }

    private final PairBench bench;
    private final List<PairMotion> motions;
    private final double step;
    private final double grid;
    private final double[][] now;
    private final double[][] before;
    private final double[] rate = new double[PairMotion.LENGTH];

    /**
     * @param bench with as many couples as there are motions
     * @param step length of a step, s
     */
    Drive(PairBench bench, List<PairMotion> motions, double step) {
        this(bench, motions, step, 0);
    }

    /**
     * @param grid poses are rounded to multiples of it, a power of two, so that they mean the same bits at any place; 0 for
     *     not at all
     */
    Drive(PairBench bench, List<PairMotion> motions, double step, double grid) {
        this.bench = bench;
        this.motions = motions;
        this.step = step;
        this.grid = grid;
        now = new double[motions.size()][PairMotion.LENGTH];
        before = new double[motions.size()][PairMotion.LENGTH];
    }

    /** Drives from one step to another, both included; step 0 begins with a search. */
    void run(int first, int last, Watch watch) {
        for (int k = first; k <= last; k++) {
            for (int p = 0; p < motions.size(); p++) {
                pose(p, (k - 1) * step, before[p]);
                pose(p, k * step, now[p]);
                for (int c = 0; c < PairMotion.LENGTH; c++) {
                    rate[c] = (now[p][c] - before[p][c]) / step;
                }
                place(p);
            }
            if (k == 0) {
                bench.search();
            }
            bench.evaluate(k == 0 ? 0 : step, false);
            watch.look(k, this);
        }
    }

    private void pose(int p, double time, double[] pose) {
        motions.get(p).at(time, pose);
        if (grid > 0) {
            for (int c = 0; c < PairMotion.LENGTH; c++) {
                pose[c] = Math.rint(pose[c] / grid) * grid;
            }
        }
    }

    private void place(int p) {
        double[] spins = new double[6];
        System.arraycopy(rate, PairMotion.ANGLES, spins, 0, 6);
        bench.place(2 * p, now[p], rate, spins, 0);
        bench.place(2 * p + 1, now[p], rate, spins, 3);
    }

    PairBench bench() {
        return bench;
    }

    double[] pose(int couple) {
        return now[couple];
    }

    /** Change of a number of the pose in the last step: metres, then radians. */
    double moved(int couple, int component) {
        return now[couple][component] - before[couple][component];
    }

    /** What acts on the number of the pose: forces (N) on both bodies, then torques (N m). */
    double load(int couple, int component) {
        int body = 2 * couple + component / 3 % 2;
        return component < PairMotion.ANGLES ? bench.force(body, component % 3) : bench.torque(body, component % 3);
    }
}
