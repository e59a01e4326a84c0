// SPDX-License-Identifier: Apache-2.0
package reedling.conform;

import java.util.List;
import java.util.Map;
import reedling.contact.ContactLaw;
import reedling.contact.Stage;
import reedling.material.MaterialPair;

/**
 * Free impacts of couples of grains along x, all at once, with one constant step: leapfrog, the form of kick-drift-kick
 * that a constant step allows. The first body flies towards +x, the second rests.
 *
 * <p>Threads: one.
 */
final class Flight implements AutoCloseable {

    /**
     * How the first body comes.
     *
     * @param couple radii
     * @param closing m/s
     * @param along speed along y, m/s
     */
    record Shot(Couple couple, double closing, double along) {}

    /** What looks on after each force phase. */
    interface Watch {
        void look(Flight flight);
    }

    private final PairBench bench;
    private final List<Shot> shots;
    private final double step;
    private final double[][] centres;
    private final double[][] velocities;
    private final double[][] spins;
    private double time;

    /**
     * @param step s
     */
    Flight(Map<Stage, ContactLaw> laws, MaterialPair pair, List<Shot> shots, double step) {
        this.shots = List.copyOf(shots);
        this.step = step;
        bench = new PairBench(laws, pair, shots.stream().map(Shot::couple).toList(), PairBench.ONE_CELL);
        centres = new double[shots.size()][6];
        velocities = new double[shots.size()][6];
        spins = new double[shots.size()][6];
        for (int p = 0; p < shots.size(); p++) {
            Shot shot = shots.get(p);
            double radii = shot.couple().firstRadius() + shot.couple().secondRadius();
            centres[p][0] = -radii * (1 + 1e-9);
            velocities[p][0] = shot.closing();
            velocities[p][1] = shot.along();
        }
        place();
        bench.search();
    }

    private void place() {
        for (int p = 0; p < shots.size(); p++) {
            bench.place(2 * p, centres[p], velocities[p], spins[p], 0);
            bench.place(2 * p + 1, centres[p], velocities[p], spins[p], 3);
        }
    }

    /** Flies until no couple overlaps any more that has done so, or so many steps have gone. */
    void run(int mostSteps, Watch watch) {
        boolean[] met = new boolean[shots.size()];
        boolean[] parted = new boolean[shots.size()];
        for (int k = 0; k < mostSteps; k++) {
            place();
            bench.evaluate(k == 0 ? 0 : step, false);
            watch.look(this);
            boolean all = true;
            for (int p = 0; p < shots.size(); p++) {
                met[p] |= overlap(p) > 0;
                parted[p] |= met[p] && overlap(p) < 0;
                all &= parted[p];
                move(p);
            }
            time += step;
            if (all) {
                return;
            }
        }
    }

    private void move(int p) {
        for (int c = 0; c < 6; c++) {
            int body = 2 * p + c / 3;
            velocities[p][c] += step * bench.force(body, c % 3) / bench.mass(body);
            spins[p][c] += step * bench.torque(body, c % 3) / bench.inertia(body);
            centres[p][c] += step * velocities[p][c];
        }
    }

    PairBench bench() {
        return bench;
    }

    Shot shot(int p) {
        return shots.get(p);
    }

    /** s. */
    double time() {
        return time;
    }

    /** m; negative apart. */
    double overlap(int p) {
        double squared = 0;
        for (int k = 0; k < 3; k++) {
            double apart = centres[p][3 + k] - centres[p][k];
            squared += apart * apart;
        }
        Couple couple = shots.get(p).couple();
        return couple.firstRadius() + couple.secondRadius() - Math.sqrt(squared);
    }

    /** Speed at which the bodies come together along x, m/s. */
    double closing(int p) {
        return velocities[p][0] - velocities[p][3];
    }

    /** Speed of the surfaces against each other along y, m/s. */
    double sliding(int p) {
        Couple couple = shots.get(p).couple();
        return velocities[p][1]
                - velocities[p][4]
                + couple.firstRadius() * spins[p][2]
                + couple.secondRadius() * spins[p][5];
    }

    @Override
    public void close() {
        bench.close();
    }
}
