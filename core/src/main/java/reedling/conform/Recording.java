// SPDX-License-Identifier: Apache-2.0
package reedling.conform;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import reedling.contact.ContactLaw;
import reedling.contact.Stage;
import reedling.material.MaterialPair;

/**
 * Loads of all couples along a drive, every so many steps.
 *
 * @param loads for each kept step, the twelve loads of each couple after one another (N, then N m)
 * @param swaps how often the memory order of a couple changed
 */
record Recording(List<double[]> loads, int swaps) {

    /** Steps between two that are kept. */
    static final int EVERY = 5;

    /**
     * How to drive.
     *
     * @param pair material pair
     * @param steps in the whole motion
     * @param duration of the whole motion, s
     * @param grid as in {@link Drive}
     * @param searchEvery steps between two searches; 0 for none
     */
    record Plan(MaterialPair pair, int steps, double duration, double grid, int searchEvery) {}

    static Recording of(
            Map<Stage, ContactLaw> laws, List<Couple> couples, List<PairMotion> motions, double margin, Plan plan) {
        List<double[]> loads = new ArrayList<>();
        int[] swaps = {0};
        boolean[] swapped = new boolean[couples.size()];
        try (PairBench bench = new PairBench(laws, plan.pair, couples, margin)) {
            new Drive(bench, motions, plan.duration / plan.steps, plan.grid).run(0, plan.steps, (step, drive) -> {
                if (step % EVERY == 0) {
                    loads.add(loads(drive, couples.size()));
                }
                if (plan.searchEvery > 0 && step % plan.searchEvery == 0) {
                    bench.search();
                    for (int p = 0; p < couples.size(); p++) {
                        swaps[0] += bench.swapped(p) == swapped[p] || step == 0 ? 0 : 1;
                        swapped[p] = bench.swapped(p);
                    }
                }
            });
        }
        return new Recording(loads, swaps[0]);
    }

    private static double[] loads(Drive drive, int couples) {
        double[] all = new double[couples * PairMotion.LENGTH];
        for (int k = 0; k < all.length; k++) {
            all[k] = drive.load(k / PairMotion.LENGTH, k % PairMotion.LENGTH);
        }
        return all;
    }

    /** Largest force (N) or torque (N m) of a couple at any time. */
    double largest(int couple, boolean torque) {
        double largest = 0;
        int from = couple * PairMotion.LENGTH + (torque ? PairMotion.ANGLES : 0);
        for (double[] one : loads) {
            for (int k = from; k < from + PairMotion.ANGLES; k++) {
                largest = Math.max(largest, Math.abs(one[k]));
            }
        }
        return largest;
    }

    /** What a load of a couple becomes, for {@link #difference}. */
    interface Turn {
        void apply(double[] loads, int from);
    }

    /**
     * Largest difference from another recording, over the largest force or torque of the couple; not a number counts as
     * infinite.
     *
     * @param turn applied to the twelve loads of each couple of this recording first
     */
    double difference(Recording other, Turn turn) {
        double worst = 0;
        for (int p = 0; p < loads.getFirst().length / PairMotion.LENGTH; p++) {
            double force = Math.max(largest(p, false), 1e-300);
            double torque = Math.max(largest(p, true), 1e-9 * force * Reference.RADIUS);
            for (int k = 0; k < loads.size(); k++) {
                double[] own = loads.get(k).clone();
                turn.apply(own, p * PairMotion.LENGTH);
                for (int c = 0; c < PairMotion.LENGTH; c++) {
                    double apart = Math.abs(
                                    own[p * PairMotion.LENGTH + c] - other.loads.get(k)[p * PairMotion.LENGTH + c])
                            / (c < PairMotion.ANGLES ? force : torque);
                    worst = apart <= worst ? worst : Double.isNaN(apart) ? Double.POSITIVE_INFINITY : apart;
                }
            }
        }
        return worst;
    }
}
